/** The set argument, last of a function: a set id, `id; extrapolate`, `extrapolate` alone, or a range that holds a coefficient block. */
import { refuse, refuseAbsent } from "../core/refusal";
import type { SpeciesFit } from "../core/species/types";
import { allSets } from "../data/library";
import { readText } from "./arguments";
import { BoundedCache } from "./cache";
import { Block, Cell, isTextLeftOut } from "./cell";
import { isCoefficientBlock, readCoefficientBlock } from "./coefficient-block";

export interface SetChoice {
  /** Names the choice in caches. */
  readonly key: string;
  /** Id of a set; undefined: the library's first choice for the species. */
  readonly id?: string;
  /** True if the user asked for values beyond the range. */
  readonly extrapolate: boolean;
  /** Fits typed in cells. */
  readonly fits?: readonly SpeciesFit[];
}

export const FIRST_CHOICE: SetChoice = { key: "", extrapolate: false };

const texts = new BoundedCache<SetChoice>(500);
const blocks = new BoundedCache<SetChoice>(200);

/** True if a text is the id of a set of the library. */
export function isSetId(text: string): boolean {
  const id = text.split(";")[0]!.trim().toLowerCase();
  return allSets().some((set) => set.id === id);
}

/** The choice named by one cell. */
export function setOf(cell: Cell | undefined): SetChoice {
  const text = readText(cell, "set");
  return text === undefined ? FIRST_CHOICE : texts.at(text, () => parseSet(text));
}

/** The choice if the argument is a coefficient block; undefined if it is a cell or a list of set ids. */
export function blockChoice(block: Block | undefined): SetChoice | undefined {
  if (block === undefined || isTextLeftOut(block) || !isCoefficientBlock(block)) return undefined;
  const key = `cells:${JSON.stringify(block)}`;
  return blocks.at(key, () => ({ key, extrapolate: false, fits: readCoefficientBlock(block) }));
}

function parseSet(text: string): SetChoice {
  const words = text.split(";").map((word) => word.trim());
  const last = words[words.length - 1]!.toLowerCase();
  const extrapolate = last === "extrapolate";
  const [id, ...more] = extrapolate ? words.slice(0, -1) : words;
  if (more.length > 0) return refuse(`The set "${text}" is not understood; write a set id such as "nasa-2002" or "nasa-2002; extrapolate"`);
  if (id === undefined || id === "") return { key: "; extrapolate", extrapolate };
  if (!isSetId(id))
    return refuseAbsent(
      `There is no set "${id}"; the sets are ${allSets()
        .map((set) => set.id)
        .join(", ")}`,
    );
  return { key: `${id.toLowerCase()}${extrapolate ? "; extrapolate" : ""}`, id: id.toLowerCase(), extrapolate };
}

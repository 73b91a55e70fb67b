/** Heat capacity of vessel walls with temperature, as printed. Not part of library.ts. */
import { refuseAbsent } from "../core/refusal";
import type { WallForm, WallFormPiece } from "../core/vessel/wall-forms";
import { foldCase } from "./fold";
import { nearest } from "./nearest";
import table from "./walls.json";

/** One piece of a piecewise form, with the expression as printed (as all remarks here for tests and help, not in the add-in). */
export type WallPiece = WallFormPiece & { readonly printed?: string };

/** Heat capacity of one material in one source, J/(kg K). */
export interface WallRecord extends WallForm {
  /** Material and source: `copper-pure@srd69-shomate`. */
  readonly id: string;
  readonly material: string;
  readonly form: "polynomial" | "log10" | "table" | "constant" | "species" | "piecewise";
  readonly pieces?: readonly WallPiece[];
  /** Form `constant`: the temperature of the value. */
  readonly at?: number;
  /** Form `species`: the record of a set, to be divided by the molar mass. */
  readonly species?: string;
  readonly set?: string;
  /** The line as printed, where the coefficients were converted. */
  readonly printed?: string;
  /** Mean value for simple estimates, from the same source. */
  readonly meanValue?: number;
  readonly statedErrorPercent?: number;
  /** Key in sources.json. */
  readonly source: string;
  readonly fromMemory?: boolean;
  readonly flags?: readonly string[];
}

/** The record to take for a wall when the user names no source. */
export interface RecommendedWall {
  readonly wall: string;
  /** Other names that mean it. */
  readonly names?: readonly string[];
  readonly use: string;
  readonly note?: string;
}

const records = table.records as unknown as readonly WallRecord[];

/** Every record. */
export function allWalls(): readonly WallRecord[] {
  return records;
}

/** The recommended record of each common wall. */
export function recommendedWalls(): readonly RecommendedWall[] {
  return table.recommended;
}

/** The record of a recommended wall, a material or an id. Refuses (absent) what is not there, naming the nearest. */
export function wallOf(text: string): WallRecord {
  const wanted = foldCase(text);
  const use = recommendedWalls().find(({ wall, names = [] }) => [wall, ...names].some((name) => foldCase(name) === wanted))?.use ?? text;
  const found = records.find((record) => record.id === use) ?? records.find((record) => foldCase(record.material) === wanted);
  return found ?? refuseMissing(text, wanted);
}

/** Names in a refusal where many hold the text, as "steel". */
const MOST_NAMES = 4;

function refuseMissing(text: string, wanted: string): never {
  const names = [...recommendedWalls().map(({ wall }) => wall), ...records.map(({ material }) => material)];
  const candidates = [...new Set(names)].map((name) => ({ text: foldCase(name), thing: name }));
  const holding = wanted === "" ? [] : candidates.filter((candidate) => candidate.text.includes(wanted)).slice(0, MOST_NAMES);
  const near = holding.length > 0 ? holding : nearest(wanted, candidates);
  refuseAbsent(`"${text}" is not a wall material of the library; nearest: ${near.map(({ thing }) => thing).join(", ")}`);
}

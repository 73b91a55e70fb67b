/** Heat of a fuse, of cotton or of a combustion aid: the kind by name, what was consumed by length or mass. */
import { burningHeat, type BurningKind, type Measure } from "../core/calorimeter/burning-heat";
import { printed, refuse, refuseAbsent, refuseRange } from "../core/refusal";
import { dimensions, dimensionOf, fromBase, parseUnit, toBase } from "../core/units";
import { quantityOf } from "./laboratory";
import { burningKindOf, burningKinds } from "../data/burning-heats";
import { quoted, readText } from "./arguments";
import { spread } from "./broadcast";
import { Block, Cell, finite } from "./cell";

const GRAM = parseUnit("g");
const CENTIMETRE = parseUnit("cm");
const PER_GRAM = parseUnit("J/g");
const PER_CENTIMETRE = parseUnit("J/cm");

/** What a text of another kind of aid may weigh at most, g. */
const MOST_OF_OTHERS = 2;

export function burningCells(kind: Block, consumed: Block, specificHeat?: Block): Block {
  return spread(
    [
      ["kind", kind],
      ["consumed", consumed],
      ["specific_heat", specificHeat],
    ],
    ([kindCell, consumedCell, heatCell]) => {
      const hasOwn = heatCell !== undefined && heatCell !== null;
      const found = readKind(kindCell, hasOwn);
      const amount = readConsumed(consumedCell, found);
      return finite(burningHeat(found, amount.measure, amount.value, hasOwn ? readOwnHeat(heatCell, amount.measure) : undefined));
    },
  );
}

/** A kind of the library, or with a heat of its own any other aid by mass. */
function readKind(cell: Cell | undefined, hasOwnHeat: boolean): BurningKind {
  const text = readText(cell, "kind") ?? refuse('The kind is missing: give a text such as "nickel-chromium wire" or "cotton"');
  const found = burningKindOf(text);
  if (found) return found;
  if (hasOwnHeat) return { kind: text, plain: "mass", mostGrams: MOST_OF_OTHERS };
  const known = burningKinds.map((each) => each.kind).join(", ");
  return refuseAbsent(`"${text}" is not a kind the library holds: ${known}; for another give its specific_heat in J/g`);
}

function readConsumed(cell: Cell | undefined, { plain, kind }: BurningKind): { measure: Measure; value: number } {
  const cure = plain === "length" ? 'centimetres, or a text such as "4.1 cm" or "7 mg"' : 'grams, or a text such as "50 mg"';
  if (typeof cell === "number" && Number.isFinite(cell)) return { measure: plain, value: cell };
  if (cell === undefined || cell === null) return refuse(`What was consumed of ${kind} is missing: give ${cure}`);
  if (typeof cell !== "string") return refuse(`What was consumed of ${kind} is ${quoted(cell)}: give ${cure}`);
  const { value, unit } = quantityOf(cell.trim(), {
    name: `What was consumed of ${kind}`,
    unit: plain === "length" ? "cm" : "g",
    example: plain === "length" ? '"4.1 cm" or "7 mg"' : '"50 mg"',
  });
  if (unit.dimension === dimensions.mass) return { measure: "mass", value: fromBase(toBase(value, unit), GRAM) };
  if (unit.dimension === dimensions.length) return { measure: "length", value: fromBase(toBase(value, unit), CENTIMETRE) };
  return refuse(`What was consumed of ${kind} is "${cell}", neither a length nor a mass: give ${cure}`);
}

/** A heat of the user's own, by the same measure as what was consumed; plain numbers are J/cm or J/g accordingly. */
function readOwnHeat(cell: Cell, measure: Measure): number {
  const [wanted, example] = measure === "length" ? [PER_CENTIMETRE, '"9.6 J/cm"'] : [PER_GRAM, '"17.5 kJ/g"'];
  if (typeof cell === "number") requirePlain(cell, measure);
  const value = typeof cell === "number" ? cell : fromText(cell, wanted.text, example);
  return Number.isFinite(value) && value > 0 ? value : refuse(`The heat of combustion ${quoted(cell)} is not above 0 ${wanted.text}`);
}

/** Plain heats that only make sense in another unit: J/g beside those of any fuel, J/cm beside those of any wire. */
const PER_GRAM_SPAN = { least: 100, most: 150_000 };
const PER_CENTIMETRE_SPAN = { least: 3, most: 100 };

function requirePlain(value: number, measure: Measure): void {
  const [{ least, most }, unit, belowUnit, aboveUnit] =
    measure === "mass" ? [PER_GRAM_SPAN, "J/g", "kJ/g", "J/kg"] : [PER_CENTIMETRE_SPAN, "J/cm", "J/mm", "J/m"];
  const words = `Heat of combustion ${printed(value)} ${unit}`;
  if (value > 0 && value < least) refuseRange(`${words} is below ${least} ${unit}: say "${printed(value)} ${belowUnit}"`);
  if (value > most) refuseRange(`${words} is above ${most} ${unit}: say "${printed(value)} ${aboveUnit}"`);
}

function fromText(cell: Cell, wanted: string, example: string): number {
  if (typeof cell !== "string") return refuse(`The heat of combustion is ${quoted(cell)}: give ${wanted}, or a text such as ${example}`);
  const { value, unit } = quantityOf(cell.trim(), { name: "The heat of combustion", unit: wanted, example });
  if (unit.dimension !== dimensionOf(wanted))
    return refuse(`The heat of combustion "${cell}" does not fit what was consumed: give ${wanted}, or a text such as ${example}`);
  return fromBase(toBase(value, unit), parseUnit(wanted));
}

/** The arguments of VESSEL.LIQUIDFULL: properties of the liquid as values or by temperature, and how the wall yields. */
import { CELSIUS_ZERO } from "../core/constants";
import { printed, refuse, refuseRange } from "../core/refusal";
import { constantProperty, type LiquidProperty, liquidFullRise, propertyLine } from "../core/vessel/liquid-full";
import { type Expected, quoted, readNumber, readQuantity, readTemperature } from "./arguments";
import { spread } from "./broadcast";
import { Block, Cell, CellError, cells, finite, isLeftOut, plain } from "./cell";

/** A quantity whose plain numbers beyond a limit were meant in another unit. */
interface Plain extends Expected {
  readonly limit: number;
  readonly beyond: "above" | "below";
}

const EXPANSION: Plain = { name: "Expansion", unit: "1/K", example: '"210e-6 1/K"', limit: 0.1, beyond: "above" };
const WALL_EXPANSION: Plain = { ...EXPANSION, name: "Expansion of the wall", example: '"36e-6 1/K"' };
const COMPRESSIBILITY: Plain = { name: "Compressibility", unit: "1/Pa", example: '"0.0004 1/MPa"', limit: 1e-6, beyond: "above" };
const MODULUS: Plain = { name: "Modulus", unit: "Pa", example: '"200 GPa"', limit: 1e8, beyond: "below" };
const T1: Expected = { name: "Temperature T1", unit: "K", example: '"25 °C"' };
const T2: Expected = { name: "Temperature T2", unit: "K", example: '"60 °C"' };
/** Plain temperatures of a range below this, K, were perhaps meant in °C. */
const ORDINARY_FROM = CELSIUS_ZERO - 50;

/** A number for each state. Blocks in the order of the worksheet function. */
export function liquidFullCells(
  expansion: Block,
  compressibility: Block,
  first: Block,
  second: Block,
  wall?: Block,
  slenderness?: Block,
  modulus?: Block,
): Block {
  return cells(() => {
    const beta = propertyArgument(expansion, EXPANSION);
    const kappa = propertyArgument(compressibility, COMPRESSIBILITY);
    return spread(
      [
        ["expansion", beta.values],
        ["compressibility", kappa.values],
        ["T1", first],
        ["T2", second],
        ["wall_expansion", wall],
        ["diameter_to_thickness", slenderness],
        ["modulus", modulus],
      ],
      ([betaCell, kappaCell, firstCell, secondCell, wallCell, slendernessCell, modulusCell]) => {
        const vessel = {
          expansion: beta.line ?? constantProperty(readPlain(betaCell, EXPANSION)),
          compressibility: kappa.line ?? constantProperty(readCompressibility(kappaCell)),
          wallExpansion: isBlank(wallCell) ? 0 : readPlain(wallCell, WALL_EXPANSION),
          yielding: yieldingOf(slendernessCell, modulusCell),
        };
        return finite(liquidFullRise(vessel, readTemperature(firstCell, T1), readTemperature(secondCell, T2)));
      },
    );
  });
}

function isBlank(cell: Cell | undefined): boolean {
  return cell === undefined || cell === null;
}

function readPlain(cell: Cell | undefined, expected: Plain): number {
  const value = readQuantity(cell, expected);
  const { name, unit, example, limit, beyond } = expected;
  const outside = typeof cell === "number" && (beyond === "above" ? Math.abs(value) > limit : value < limit);
  if (outside) refuseRange(`${name} ${printed(value)} is a plain number and would be in ${unit}: say it with its unit, such as ${example}`);
  return value;
}

function readCompressibility(cell: Cell | undefined): number {
  const value = readPlain(cell, COMPRESSIBILITY);
  return value > 0 ? value : refuseRange(`Compressibility ${printed(value)} 1/Pa is not above 0 1/Pa`);
}

/** D/(t E), 1/Pa; 0 if the wall is rigid. The modulus is a figure of the wall's material, so it is not assumed. */
function yieldingOf(slenderness: Cell | undefined, modulus: Cell | undefined): number {
  const ratio = isBlank(slenderness) ? 0 : readNumber(slenderness, "Diameter to thickness");
  if (!(ratio >= 0)) refuseRange(`Diameter to thickness ${printed(ratio)} is negative`);
  if (ratio === 0) return 0;
  if (isBlank(modulus))
    refuse('The modulus of the wall is missing: diameter_to_thickness needs it, such as "200 GPa", common for carbon steel');
  const value = readPlain(modulus, MODULUS);
  return value > 0 ? ratio / value : refuseRange(`Modulus ${printed(value)} Pa is not above 0 Pa`);
}

/** Values that broadcast, or two columns temperature | value with 2 rows or more: one line for all states. */
function propertyArgument(block: Block | undefined, expected: Plain): { readonly values?: Block; readonly line?: LiquidProperty } {
  if (block === undefined || isLeftOut(block) || block[0]!.length !== 2 || block.length < 2) return { values: block };
  const rows = block.map((row) => row.map(plain)).filter((row) => row.some((cell) => cell !== null));
  const error = rows.flat().find((cell) => cell instanceof CellError);
  if (error instanceof CellError) throw error;
  const hasHeading = rows[0]?.every((cell) => typeof cell === "string" && !/^\s*[-+.\d]/.test(cell));
  const name = expected.name.toLowerCase();
  const read = expected === COMPRESSIBILITY ? readCompressibility : (cell: Cell | undefined) => readPlain(cell, expected);
  const points = rows
    .slice(hasHeading ? 1 : 0)
    .map(([temperature, value]) => [readPointTemperature(temperature, name), read(value)] as const);
  return { line: propertyLine(points, name) };
}

function readPointTemperature(cell: Cell | undefined, name: string): number {
  const temperature = readTemperature(cell, { name: `Temperature of the ${name}`, unit: "K", example: '"25 °C"' });
  if (typeof cell !== "number" || temperature >= ORDINARY_FROM) return temperature;
  return refuse(`Temperature ${quoted(cell)} of the ${name} is a plain number and would be in K: say "${cell} °C" or "${cell} K"`);
}

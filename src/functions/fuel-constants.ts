/**
 * The constants argument of the net values: left out (derived from the vaporisation of water, RT and the atomic weights), the id of an
 * edition, or the user's own numbers in one row or column, J/g for each per cent.
 */
import type { AviationLine } from "../core/fuel/liquid";
import {
  type Condition,
  derivedGrossPressureConstants,
  derivedNetConstants,
  type GrossPressureConstants,
  type NetConstants,
  requireLikely,
  type WaterFigures,
} from "../core/fuel/net-constants";
import { refuse, refuseAbsent } from "../core/refusal";
import { molarMass, parseFormula } from "../core/species/formula";
import { atomicWeights } from "../data/library";
import { aviationEstimate, liquidEditions, type NetEdition, netEditions, vaporisation } from "../data/net-values";
import { readNumber } from "./arguments";
import { shapeOf } from "./broadcast";
import { Block, Cell, CellError, isTextLeftOut, plain } from "./cell";

const massOf = (formula: string): number => molarMass(parseFormula(formula), atomicWeights);

const WATER: WaterFigures = {
  vaporisation: vaporisation.value * 1000,
  waterMass: massOf("H2O"),
  hydrogenMass: massOf("H2"),
  oxygenMass: massOf("O2"),
  nitrogenMass: massOf("N2"),
};

const DERIVED: Readonly<Record<Condition, NetConstants>> = {
  "constant-pressure": derivedNetConstants("constant-pressure", WATER),
  "constant-volume": derivedNetConstants("constant-volume", WATER),
};
const DERIVED_GROSS = derivedGrossPressureConstants(WATER);

/** The estimate for aviation fuels, J/g. */
export const AVIATION: AviationLine = {
  intercept: aviationEstimate.intercept * 1000,
  slope: aviationEstimate.slope,
  from: aviationEstimate.from * 1000,
  to: aviationEstimate.to * 1000,
};

const NET_NAMES = ["hydrogen", "oxygen", "nitrogen", "moisture"] as const;
const GROSS_NAMES = ["hydrogen", "oxygen", "nitrogen"] as const;

/** The constants of a net value for each condition. Own numbers are checked against the derived ones of the condition asked for. */
export function readNetConstants(block: Block | undefined): (condition: Condition) => NetConstants {
  if (isTextLeftOut(block)) return (condition) => DERIVED[condition];
  const id = textOf(block!);
  if (id !== undefined) {
    const edition = editionOf(netEditions, id);
    return (condition) => netConstantsOf(edition, condition);
  }
  const own = ownConstants(block!, NET_NAMES);
  return (condition) => likely(own, DERIVED[condition], NET_NAMES);
}

function netConstantsOf(edition: NetEdition, condition: Condition): NetConstants {
  if (condition === "constant-pressure") return edition.constantPressure;
  if (edition.constantVolume) return { ...edition.constantVolume, oxygen: 0, nitrogen: 0 };
  return refuseLacking(edition, "net values at constant volume", ({ constantVolume }) => constantVolume !== undefined);
}

/** The constants of the gross value at constant pressure. */
export function readGrossPressureConstants(block: Block | undefined): GrossPressureConstants {
  if (isTextLeftOut(block)) return DERIVED_GROSS;
  const id = textOf(block!);
  if (id === undefined) return likely(ownConstants(block!, GROSS_NAMES), DERIVED_GROSS, GROSS_NAMES);
  const edition = editionOf(netEditions, id);
  return (
    edition.grossPressure ?? refuseLacking(edition, "gross values at constant pressure", ({ grossPressure }) => grossPressure !== undefined)
  );
}

/** The hydrogen constant of liquid fuels, J/g for each per cent. */
export function readLiquidConstant(block: Block | undefined): number {
  const derived = DERIVED["constant-pressure"];
  if (isTextLeftOut(block)) return derived.hydrogen;
  const id = textOf(block!);
  if (id === undefined) return likely(ownConstants(block!, ["hydrogen"]), derived, ["hydrogen"]).hydrogen;
  return editionOf(liquidEditions, id).hydrogen * 1000;
}

/** Constants for each state: the ids of a range spread beside the states, anything else serves all of them. */
export interface ConstantsChoice<Constants> {
  /** The range of ids to spread; undefined if one choice serves all. */
  readonly spread: Block | undefined;
  readonly of: (cell: Cell | undefined) => Constants;
}

/** Reads the constants argument with one of the readers above. A blank among ids stands for the derived constants, as left out does. */
export function constantsChoice<Constants>(
  block: Block | undefined,
  read: (block: Block | undefined) => Constants,
): ConstantsChoice<Constants> {
  if (block !== undefined && block !== null && isColumnOfIds(block)) return { spread: block, of: (cell) => read([[cell ?? null]]) };
  const one = read(block);
  return { spread: undefined, of: () => one };
}

function isColumnOfIds(block: Block): boolean {
  const filled = block
    .flat()
    .map(plain)
    .filter((cell) => cell !== null && !(cell instanceof CellError));
  return block.flat().length > 1 && filled.length > 0 && filled.every((cell) => typeof cell === "string");
}

/** The text of an argument that is one cell of text; undefined for anything else. */
function textOf(block: Block): string | undefined {
  if (block.length !== 1 || block[0]!.length !== 1) return undefined;
  const cell = plain(block[0]![0]);
  return typeof cell === "string" ? cell.trim() : undefined;
}

/** "ISO 1928:2009" and "iso-1928-2009" are the same. */
function editionOf<Edition extends { readonly id: string }>(editions: readonly Edition[], text: string): Edition {
  const id = text.toLowerCase().replace(/[\s:]+/g, "-");
  return (
    editions.find((edition) => edition.id === id) ??
    refuseAbsent(`"${text}" is not an edition with constants for this value; the editions are ${idsOf(editions)}`)
  );
}

function refuseLacking({ id }: NetEdition, what: string, holds: (edition: NetEdition) => boolean): never {
  return refuseAbsent(`The library holds no constants of ${id} for ${what}; it does of ${idsOf(netEditions.filter(holds))}`);
}

function idsOf(editions: readonly { readonly id: string }[]): string {
  return editions.map(({ id }) => id).join(", ");
}

type Own<Name extends string> = Readonly<Record<Name, number>>;

/** The user's numbers by name. An error cell among them comes out unchanged. */
function ownConstants<Name extends string>(block: Block, names: readonly Name[]): Own<Name> {
  const found = block.flat().map(plain);
  for (const cell of found) if (cell instanceof CellError) throw cell;
  const { rows, columns } = shapeOf(block);
  if (found.length !== names.length || (rows !== 1 && columns !== 1)) {
    const wanted = names.length === 1 ? "one number" : `${names.length} numbers in one row or column`;
    refuse(
      `The constants are ${rows} × ${columns} cells; give ${wanted} (${names.join(", ")}, in J/g for each per cent), or the id of an edition`,
    );
  }
  return Object.fromEntries(names.map((name, at) => [name, readNumber(found[at], `The ${name} constant`)])) as Own<Name>;
}

function likely<Name extends (typeof NET_NAMES)[number]>(own: Own<Name>, derived: Own<Name>, names: readonly Name[]): Own<Name> {
  for (const name of names) requireLikely(name, own[name], derived[name]);
  return own;
}

/**
 * The arguments `wall` and `contents` of a vessel: what they hold becomes one HeatStore. A number is J/K. A text is a capacity,
 * "27 kJ/K", a mass at a specific capacity, "0.2 kg at 2.1 kJ/(kg K)", or a mass of a material, "60 kg carbon steel"; several are joined
 * with " + ". Contents also take species, "2 mol N2" (gases by Cv, from their boiling point on; solids and liquids by Cp, Cv = Cp taken), and
 * a block material | amount.
 */
import { printed, Refusal, refuse, refuseAbsent, refuseRange } from "../core/refusal";
import { beginsWithNumber, dimensions, nameOfDimension, parseQuantity, toBase } from "../core/units";
import type { HeatStore } from "../core/vessel/types";
import { constantStore, heldDownTo, substanceStore, sumOf, wallStore, within } from "../core/vessel/wall";
import { isElement } from "../core/species/elements";
import { recordOf } from "../data/library";
import { type WallRecord, wallOf } from "../data/walls";
import { quoted } from "./arguments";
import { BoundedCache } from "./cache";
import { Block, Cell, CellError, isLeftOut, plain } from "./cell";
import type { SetChoice } from "./set";
import { boilingPoint } from "./gas-phase";
import { keyOf } from "./gas-model";
import { capacityOfFit, type Substance, substanceOf, type SubstancePart } from "./substance";

const SUCH_AS = '"27 kJ/K", "60 kg carbon steel" or "0.2 kg at 2.1 kJ/(kg K)"';

/** What the words of an argument may mean: its name in sentences, and how a material becomes a store. */
interface Reading {
  readonly name: string;
  material(amount: Amount, material: string): HeatStore;
}

/** A mass, kg, or an amount of substance, mol; exactly one of them. */
interface Amount {
  readonly text: string;
  readonly mass?: number;
  readonly moles?: number;
}

const WALL: Reading = { name: "The wall", material: ofWall };

const walls = new BoundedCache<HeatStore>(500);
const contents = new BoundedCache<HeatStore>(500);

/** The wall of a cell; undefined if left out. 0 J/K is a wall that takes up nothing. */
export function readWall(cell: Cell | undefined): HeatStore | undefined {
  if (cell === undefined || cell === null) return undefined;
  if (typeof cell === "number") return constantStore(cell, `the wall of ${printed(cell)} J/K`);
  if (typeof cell !== "string") return refuse(`The wall is ${quoted(cell)}: give a number in J/K, or a text such as ${SUCH_AS}`);
  return walls.at(cell, () => ofText(cell, WALL));
}

/** The contents before a set is chosen: cells that broadcast, or one block material | amount. */
export interface ContentsArgument {
  readonly texts?: Block;
  readonly rows?: readonly (readonly [material: string, amount: Cell])[];
  readonly key: string;
}

/** Tells a block material | amount from cells that each hold whole contents. */
export function contentsArgument(block: Block | undefined): ContentsArgument {
  if (block === undefined || isLeftOut(block))
    return refuse(`The contents are missing: give a number in J/K, a text such as ${SUCH_AS}, or a block material | amount`);
  const rows = block.map((row) => row.map(plain));
  if (block[0]!.length !== 2 || !rows.some(([first]) => isMaterial(first))) return { texts: block, key: "" };
  return { rows: rowsOf(rows), key: JSON.stringify(block) };
}

/** A text that does not begin with a number. */
function isMaterial(cell: Cell | undefined): boolean {
  return typeof cell === "string" && !/^\s*[-+.\d\u2212]/.test(cell);
}

function rowsOf(rows: readonly (readonly Cell[])[]): readonly (readonly [string, Cell])[] {
  const error = rows.flat().find((cell) => cell instanceof CellError);
  if (error instanceof CellError) throw error;
  return rows.flatMap(([material, amount], index): (readonly [string, Cell])[] => {
    if (material === null && amount === null) return [];
    if (index === 0 && isMaterial(material) && typeof amount === "string" && !/\d/.test(amount)) return []; // headings
    if (typeof material !== "string")
      return refuse(`Row ${index + 1} of the contents has ${quoted(material)} where a material is expected`);
    return [[material, amount ?? null]];
  });
}

/** The contents that a cell (or the block) means with a set. Refuses contents that store no heat. */
export function readContents(argument: ContentsArgument, cell: Cell | undefined, set: SetChoice): HeatStore {
  const reading: Reading = { name: "The contents", material: (amount, material) => ofContents(amount, material, set) };
  const { rows } = argument;
  if (rows) return contents.at(`${set.key}|${argument.key}`, () => ofRows(rows, reading));
  if (typeof cell === "number") {
    if (!(cell > 0)) refuseRange(`The contents of ${printed(cell)} J/K are not above 0 J/K`);
    return constantStore(cell, `the contents of ${printed(cell)} J/K`);
  }
  if (typeof cell !== "string")
    return refuse(`The contents are ${quoted(cell)}: give a number in J/K, a text such as ${SUCH_AS}, or a block material | amount`);
  return contents.at(`${set.key}|${cell}`, () => ofText(cell, reading));
}

function ofRows(rows: readonly (readonly [string, Cell])[], reading: Reading): HeatStore {
  if (rows.length === 0) refuse("The contents hold no row material | amount");
  return sumOf(rows.map(([material, amount]) => ofRow(material.trim(), amount, reading)));
}

/** A row: a mass or an amount of a material of the library, or a capacity of something that need not be there. */
function ofRow(material: string, amount: Cell, reading: Reading): HeatStore {
  if (typeof amount !== "string" || !beginsWithNumber(amount) || Number.isFinite(Number(amount)))
    return refuse(
      `The amount of ${material} is ${quoted(amount)}: give it with its unit, such as "60 g" or "2 mol", or as a capacity such as "2.1 kJ/K"`,
    );
  return capacityOf(amount, material, reading) ?? reading.material(amountOf(amount, reading), material);
}

const PLUS = /\s+\+\s+/;
const AT = /^(.+?)\s+at\s+(\S.*)$/i;
/** A number, its unit, and what follows. */
const MATERIAL = /^([-+\u2212]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?\s*\p{L}\S*)\s+(?:of\s+)?(\S.*)$/iu;

function ofText(text: string, reading: Reading): HeatStore {
  return sumOf(
    text
      .trim()
      .split(PLUS)
      .map((term) => ofTerm(term.trim(), reading)),
  );
}

function ofTerm(term: string, reading: Reading): HeatStore {
  if (!beginsWithNumber(term) || Number.isFinite(Number(term)))
    return refuse(`${reading.name} "${term}" cannot be read: give a number in J/K, or a text such as ${SUCH_AS}`);
  const capacity = capacityOf(term, term, reading);
  if (capacity) return capacity;
  const match = MATERIAL.exec(term);
  if (!match) return refuse(`${reading.name} "${term}" names no material: give a text such as ${SUCH_AS}`);
  return reading.material(amountOf(match[1]!, reading), match[2]!);
}

/** "27 kJ/K" or "0.2 kg at 2.1 kJ/(kg K)"; undefined for a text that is neither. */
function capacityOf(text: string, label: string, reading: Reading): HeatStore | undefined {
  const at = AT.exec(text);
  if (at) {
    const { mass, moles } = amountOf(MATERIAL.exec(at[1]!)?.[1] ?? at[1]!, reading);
    const { value, dimension } = quantity(at[2]!, reading);
    if (mass !== undefined && dimension === dimensions.specificHeatCapacity) return positive(mass * value, label, reading);
    if (moles !== undefined && dimension === dimensions.molarHeatCapacity) return positive(moles * value, label, reading);
    return refuse(
      `${reading.name} "${text}": ${at[2]!} is ${nameOfDimension(dimension)}; write a mass with kJ/(kg K), or mol with J/(mol K)`,
    );
  }
  if (MATERIAL.test(text)) return undefined;
  const { value, dimension } = quantity(text, reading);
  return dimension === dimensions.heatCapacity ? positive(value, label, reading) : undefined;
}

function positive(capacity: number, label: string, { name }: Reading): HeatStore {
  if (!(capacity > 0 && capacity < Infinity))
    refuseRange(`${name} "${label}": the heat capacity ${printed(capacity)} J/K is not above 0 J/K`);
  return constantStore(capacity, label);
}

function amountOf(text: string, reading: Reading): Amount {
  const { value, dimension } = quantity(text, reading);
  if (dimension !== dimensions.mass && dimension !== dimensions.amount)
    return refuse(`${reading.name} "${text}" is ${nameOfDimension(dimension)}; a mass such as 60 g or an amount such as 2 mol is expected`);
  if (!(value > 0 && value < Infinity)) refuseRange(`${reading.name}: the amount ${text} is not above zero`);
  return dimension === dimensions.mass ? { text, mass: value } : { text, moles: value };
}

function quantity(text: string, { name }: Reading): { value: number; dimension: string } {
  try {
    const { value, unit } = parseQuantity(text);
    return { value: toBase(value, unit), dimension: unit.dimension };
  } catch (thrown) {
    throw thrown instanceof Refusal ? new Refusal(thrown.kind, `${name}: ${thrown.message}`) : thrown;
  }
}

function ofWall(amount: Amount, material: string): HeatStore {
  return ofRecord(amount, material, wallOf(material));
}

/**
 * Metals whose curve begins at room temperature keep the capacity of its beginning below it, down to this, K: vessels are filled and kept
 * in the cold. Steel loses about 3 % to 250 K and 7 % to 223 K (the curve of stainless steel 304 in the data; common practice). Oxides lose
 * a quarter, so they are not held.
 */
const HELD_FROM = 223.15;
const ROOM = 303.15;

/** What a table says of a wall, for the temperatures it has, K. */
export function wallNote({ label, sources = [], heldBelow }: HeatStore, ...temperatures: readonly number[]): string {
  const from = sources.length > 0 ? `; heat capacity by ${sources.join(", ")}` : "";
  if (heldBelow === undefined || Math.min(...temperatures) >= heldBelow) return `${label}${from}`;
  return `${label}${from}; below ${printed(heldBelow)} K the one it has there is held (common practice)`;
}

function held(store: HeatStore): HeatStore {
  return store.from > HELD_FROM && store.from <= ROOM ? heldDownTo(store, HELD_FROM) : store;
}

function ofRecord({ text, mass }: Amount, material: string, record: WallRecord): HeatStore {
  const label = `${text} ${material}`;
  if (mass === undefined) return refuse(`"${label}": a wall material is given by its mass, such as "60 kg ${material}"`);
  const owner = `${record.source} for ${record.material}`;
  if (record.form !== "species") return held(wallStore(mass, record, label, owner));
  const fit = recordOf(record.species!, record.set!);
  // the range of a wall may end before that of the species: at a transition that the wall's record leaves out
  const store = within(substanceStore((1000 * mass) / fit.molarMass, capacityOfFit(fit), label), record.from!, record.to!, owner);
  return isElement(fit.formula) ? held(store) : store;
}

/** A wall material, or else a species or mixture of the library. */
function ofContents(amount: Amount, material: string, set: SetChoice): HeatStore {
  const record = attempt(() => wallOf(material));
  if (!(record instanceof Refusal)) return ofRecord(amount, material, record);
  const found = attempt(() => substanceOf({}, material, set));
  if (found instanceof Refusal) throw found.kind === "absent" ? neither(material, record, found) : found;
  const store = substanceStore(amount.moles ?? amount.mass! / found.molarMass, found.capacity, `${amount.text} ${material}`);
  return notBelowBoiling(store, found);
}

/**
 * A gas that is a liquid at ordinary temperatures is hardly meant as vapour there: contents have no volume, and its Cv is far from the
 * heat capacity of the liquid. It holds from its boiling point at 1 atm on.
 */
function notBelowBoiling(store: HeatStore, { parts }: Substance): HeatStore {
  const [{ species, fit }] = parts as [SubstancePart];
  const boils = parts.length === 1 && fit.phase === "g" ? boilingPoint(keyOf(species)) : undefined;
  if (boils === undefined || boils <= ROOM || boils <= store.from || boils >= store.to) return store;
  const liquid =
    fit.formula === "H2O" ? "liquid water is H2O(l)" : 'the liquid is told by its heat capacity, such as "0.2 kg at 2.1 kJ/(kg K)"';
  return within(store, boils, store.to, `the vapour of ${species}, which boils there at 1 atm; ${liquid}`);
}

/** The value, or the refusal of what the library does not have. */
function attempt<Value>(find: () => Value): Value | Refusal {
  try {
    return find();
  } catch (thrown) {
    if (thrown instanceof Refusal) return thrown;
    throw thrown;
  }
}

function neither(material: string, wall: Refusal, species: Refusal): never {
  const nearest = [wall, species].map(({ message }) => /nearest: (.*)$/.exec(message)?.[1]).filter((names) => names !== undefined);
  return refuseAbsent(`"${material}" is neither a wall material nor a species of the library; nearest: ${nearest.join(", ")}`);
}

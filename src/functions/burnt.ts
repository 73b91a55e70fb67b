/**
 * Combustion in a closed vessel: fuel and oxidant at T0 and P0, then the products with the same energy in the same volume.
 *   V = n R T0 / P0 over the gases put in   U(products, T, V) = U(reactants, T0)   P = n R T / V over the gases formed
 * Solids and liquids have no volume. One mole of fuel stands behind every state; only ratios are shown.
 */
import { GAS_CONSTANT } from "../core/constants";
import { rigid } from "../core/equilibrium/states";
import type { System } from "../core/equilibrium/system";
import type { Equilibrium } from "../core/equilibrium/types";
import { printed, Refusal, refuseRange } from "../core/refusal";
import { constantOf } from "../data/constants";
import { commonShape, type Named } from "./broadcast";
import { type BurnStart, readRatio, readStartPressure, readStartTemperature, startNotes, startOf } from "./burn-start";
import { BoundedCache } from "./cache";
import { Block, Cell } from "./cell";
import { completeCombustion } from "./complete-state";
import { extrapolationNotes, productNotes } from "./product-notes";
import { elementsOf, type ProductArgument, productArgument, productsOf, productSystem, type ProductSystem } from "./products";
import { fuelOf, inletArgument, type InletArgument, oxidantOf } from "./reactants";
import { blockChoice, setOf, type SetChoice } from "./set";

/** A species after the reaction. */
export interface Product {
  readonly name: string;
  readonly condensed: boolean;
  /** Mole fraction in the gas; of a condensed species, mol for each mole of gas. */
  readonly fraction: number;
}

/** The state after the reaction. */
export interface Burnt {
  readonly start: BurnStart;
  readonly kind: "equilibrium" | "complete";
  /** K, Pa. */
  readonly temperature: number;
  readonly pressure: number;
  /** mol of gas for one mole of fuel. */
  readonly gas: number;
  /** In the order of the set or of the list. */
  readonly products: readonly Product[];
  /** True if the user named the species. */
  readonly listed: boolean;
  /** `31 species of nasa-2002`. */
  readonly species: string;
  /** What the solver says of itself; none for complete products. */
  readonly equilibrium?: Equilibrium;
  /** Warnings, each a sentence. */
  readonly notes: readonly string[];
}

/** The arguments that all BURN functions begin and end with, as they came. */
export interface BurnBlocks {
  readonly fuel: Block;
  readonly oxidant: Block;
  readonly equivalence_ratio: Block;
  readonly T0: Block;
  readonly P0: Block;
  readonly products?: Block;
  readonly set?: Block;
}

/** The arguments that spread over ranges, in the order in which `BurnReader.burnt` takes their cells. */
export class BurnReader {
  readonly named: readonly Named[];
  /** Place of the first of the other arguments among the cells. */
  readonly others = 7;
  /** True for a single state, whose outcome is remembered; a sweep starts each state from the one before. */
  private readonly single: boolean;
  private readonly fuel: InletArgument;
  private readonly oxidant: InletArgument;
  private readonly products: ProductArgument;
  private readonly choice: SetChoice | undefined;
  private before: { readonly system: System; readonly equilibrium: Equilibrium } | undefined;

  constructor(blocks: BurnBlocks, others: readonly Named[] = []) {
    this.fuel = inletArgument(blocks.fuel, "fuel");
    this.oxidant = inletArgument(blocks.oxidant, "oxidant");
    this.products = productArgument(blocks.products);
    this.choice = blockChoice(blocks.set);
    this.named = [
      ["fuel", this.fuel.texts],
      ["oxidant", this.oxidant.texts],
      ["equivalence_ratio", blocks.equivalence_ratio],
      ["T0", blocks.T0],
      ["P0", blocks.P0],
      ["products", this.products.texts],
      ["set", this.choice ? undefined : blocks.set],
      ...others,
    ];
    const { rows, columns } = commonShape(this.named);
    this.single = rows === 1 && columns === 1;
  }

  /** The state that the cells of one place ask for. */
  burnt([fuel, oxidant, ratio, temperature, pressure, products, set]: readonly (Cell | undefined)[]): Burnt {
    const choice = this.choice ?? setOf(set);
    const start = startOf(
      fuelOf(fuel, this.fuel.composition, choice),
      oxidantOf(oxidant, this.oxidant.composition, choice),
      readRatio(ratio),
      readStartTemperature(temperature),
      readStartPressure(pressure),
    );
    const wanted = this.products.whole ?? productsOf(products);
    if (wanted.kind === "complete") return complete(start, choice);
    const make = () => this.equilibrium(start, productSystem(wanted, choice, elementsOf(start.reactants)), wanted.listed !== undefined);
    if (!this.single) return make();
    const key = [start.fuel.key, start.oxidant.key, start.ratio, start.temperature, start.pressure, wanted.key].join("|");
    return outcomes.at(key, make);
  }

  private equilibrium(start: BurnStart, chosen: ProductSystem, listed: boolean): Burnt {
    const { system, candidates, label } = chosen;
    const near = this.before?.system === system ? this.before.equilibrium : undefined;
    const found = rigid(system, start.reactants, start.energy, start.volume, near);
    this.before = this.single ? undefined : { system, equilibrium: found };
    const products = candidates
      .map(({ name, capacity }, j) => ({ name, condensed: capacity.phase !== "g", fraction: found.amounts[j]! / found.gas }))
      .filter(({ name }) => !found.leftOut.includes(name));
    return {
      start,
      kind: "equilibrium",
      temperature: found.temperature,
      pressure: found.pressure,
      gas: found.gas,
      products,
      listed,
      species: label,
      equilibrium: found,
      notes: distinct([
        ...startNotes(start),
        ...productNotes(chosen, found, "energy and volume"),
        ...idealNotes(found.pressure, found.temperature),
        ...slowNotes(found.temperature),
      ]),
    };
  }
}

/** Fuel, oxidant and products may have the same to say. */
function distinct(notes: readonly string[]): readonly string[] {
  return [...new Set(notes)];
}

/** Outcomes met last: temperature, pressure and composition of one state often stand in neighbouring cells. */
const outcomes = new BoundedCache<Burnt>(1000);

function complete(start: BurnStart, set: SetChoice): Burnt {
  const { temperature, pressure, products, notes, fitted } = completeCombustion(
    start.reactants,
    start.ratio,
    start.energy,
    start.volume,
    set,
  );
  const gas = products.reduce((sum, { amount }) => sum + amount, 0);
  const fractions = products.map(({ candidate, amount }) => ({ name: candidate.name, condensed: false, fraction: amount / gas }));
  // at ratio 1 no O2 is left: 0, as in the rest of a sweep
  if (!fractions.some(({ name }) => name === "O2")) fractions.push({ name: "O2", condensed: false, fraction: 0 });
  return {
    start,
    kind: "complete",
    temperature,
    pressure,
    gas,
    products: fractions,
    listed: false,
    species: `complete products, ${set.id ?? "each from the library's first choice"}`,
    notes: distinct([...startNotes(start), ...notes, ...extrapolationNotes(fitted, temperature), ...idealNotes(pressure, temperature)]),
  };
}

/** Above this the ideal gas errs by some per cent; below this temperature reactions stop before equilibrium (common practice). */
const IDEAL_UP_TO = 1e7;
const SLOW_BELOW = 1500;

/** Volume that the molecules of hot products take up themselves, m³/mol. */
const COVOLUME = constantOf("covolume").value;
/** Above this temperature, K, repulsion alone counts. */
const HOT_FROM = 1500;

/** Where the ideal gas is far from real ones: hot, P = n R T/(V − n b) tells by how much. Pa, K. */
export function idealNotes(pressure: number, temperature: number): string[] {
  if (pressure <= IDEAL_UP_TO) return [];
  const taken = (COVOLUME * pressure) / (GAS_CONSTANT * temperature);
  const more =
    taken > 0.4
      ? "far higher: the gas would be as dense as a liquid"
      : `higher, by ${temperature < HOT_FROM ? "some per cent and more" : `about ${Math.ceil((100 * taken) / (1 - taken))} % (from a covolume of ${printed(1e6 * COVOLUME)} cm3/mol)`}`;
  return [`The ideal gas is assumed; at ${printed(pressure / 1e6)} MPa the pressure of real gases is ${more}`];
}

function slowNotes(temperature: number): string[] {
  if (temperature >= SLOW_BELOW) return [];
  return [`At ${printed(temperature)} K reactions are slow: products of a real combustion stop before this equilibrium (common practice)`];
}

/**
 * The fraction of a species in a state, by its name in the library or, in a coefficient block, as written there; its gases may go without
 * their phase. Refuses a species that is not among those of the state, naming them, or that has no value at its temperature.
 */
export function fractionOf({ products, species, equilibrium, temperature }: Burnt, name: string, written: string): number {
  const names = [name, written, `${name}(g)`, `${written}(g)`];
  const found = names.flatMap((each) => products.find((product) => product.name === each) ?? [])[0];
  if (found) return found.fraction;
  if (equilibrium?.leftOut.includes(name))
    refuseRange(`${name} has no value at ${printed(temperature)} K, where this combustion ends, and was left out of the equilibrium`);
  throw new Refusal("absent", `${name} is not among the ${species}: ${products.map((product) => product.name).join(", ")}`);
}

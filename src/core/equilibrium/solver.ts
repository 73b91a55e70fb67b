/**
 * The composition of a feed at given temperature and volume, and how it follows them. Everything else (pressure, energy or enthalpy held)
 * is a search over these two.
 */
import { explainTemperature } from "../capacity/range";
import { GAS_CONSTANT } from "../constants";
import type { DoubleDouble } from "../numeric/double-double";
import { printed, Refusal, refuse } from "../refusal";
import { Balances } from "./balances";
import { fadeIn } from "./fade-in";
import { settlePhases } from "./phases";
import { elementError, massActionError } from "./residuals";
import { SpeciesFunctions } from "./species-functions";
import { fullBasis, possibleSpecies, startFrom, startOf } from "./start";
import type { System } from "./system";
import type { Equilibrium } from "./types";

/** How gas, energy and enthalpy change with ln T at fixed volume, or with ln V at fixed temperature. */
export interface Slopes {
  /** mol. */
  readonly gas: number;
  /** J. */
  readonly energy: number;
  /** J. */
  readonly enthalpy: number;
}

/** Changes of ln T and ln V over which slopes are worth following. */
const LONGEST_LEAD = 0.5;

export class Solver {
  /** m³ of gas. */
  volume = NaN;
  readonly balances: Balances;
  /** Condensed phases that are there. */
  present: readonly number[] = [];
  private started = false;
  private failure: Refusal | undefined;
  /** Pressure on contents without gas, Pa. */
  private outside = NaN;
  private readonly possible: readonly boolean[];
  private readonly functions: SpeciesFunctions;
  private readonly potentials: Float64Array;
  private readonly pushes: Float64Array;
  /** d ln n / d ln T at fixed volume and d ln n / d ln V at fixed temperature, at the state reached last, if they were asked for. */
  private byTemperature: Float64Array | undefined;
  private byVolume: Float64Array | undefined;

  constructor(
    readonly system: System,
    readonly totals: readonly DoubleDouble[],
    private readonly neighbour?: Equilibrium,
  ) {
    const count = system.species.length;
    const basis = neighbour && fullBasis(system, totals, neighbour.logAmounts);
    this.possible = basis ? new Array<boolean>(count).fill(true) : possibleSpecies(system, totals);
    if (!this.possible.some((can, j) => can && j < system.gases)) refuseNoGas(system);
    this.balances = new Balances(system, totals, this.possible, basis);
    this.functions = new SpeciesFunctions(system, this.possible);
    this.potentials = new Float64Array(count);
    this.pushes = new Float64Array(count);
  }

  /** K. */
  get temperature(): number {
    return this.functions.temperature;
  }

  get evaluations(): number {
    return this.functions.evaluations;
  }

  /** Condensed species without a value at this temperature. */
  get leftOut(): readonly number[] {
    return this.functions.leftOut;
  }

  /** Refuses a temperature outside the joint range of the gases, naming the gas that sets the limit. */
  requireTemperature(temperature: number): void {
    const { from, to, species } = this.system;
    if (temperature >= from && temperature <= to) return;
    const gases = species.slice(0, this.system.gases);
    const limiting = gases.find(({ capacity }) => (temperature < from ? capacity.from === from : capacity.to === to));
    throw explainTemperature((limiting ?? gases[0]!).capacity, temperature);
  }

  /** The equilibrium at a temperature, K, and a volume of gas, m³. */
  settle(temperature: number, volume: number): void {
    this.lead(temperature, volume);
    if (temperature !== this.temperature) {
      this.requireTemperature(temperature);
      this.functions.evaluate(temperature);
    }
    this.volume = volume;
    this.fillPotentials();
    if (!this.started) this.begin();
    this.present = this.settledFrom(this.present) ?? this.settledFromAnother();
    this.started = true;
  }

  /** The condensed phases that are stable, if the search may begin with these; undefined if their balances have no end. */
  private settledFrom(start: readonly number[]): readonly number[] | undefined {
    try {
      return settlePhases(this.system, this.balances, this.potentials, this.functions.eligible, start, (present) => {
        if (!this.balances.solve(this.potentials, present)) this.fade(present);
      });
    } catch (thrown) {
      if (thrown instanceof Refusal) this.failure = thrown;
      else throw thrown;
    }
    return undefined;
  }

  private fade(present: readonly number[]): void {
    const reached = fadeIn(this.balances, this.potentials, present, this.possible, this.totals);
    if (reached < 1)
      refuse(
        `The equilibrium at ${printed(this.temperature)} K and ${printed(this.volume)} m3 was not found (continuation ended at ${printed(reached)})`,
      );
  }

  /**
   * Phases that leave no choice may leave a gas nothing: FeO alone takes all the oxygen that CO does not, and CO2, though it can form, has
   * none. With one phase more (Fe) the gases have their ratio from the start. Refuses as the first try did if none leads on.
   */
  private settledFromAnother(): readonly number[] {
    const [refused, start] = [this.failure, this.present.filter((species) => this.functions.eligible.includes(species))];
    for (const species of this.functions.eligible) {
      if (start.includes(species)) continue;
      const settled = this.settledFrom([...start, species]);
      if (settled) return settled;
    }
    throw refused;
  }

  /** Carries the logarithms along the slopes known at the last state; what is left of the way is of second order. */
  private lead(temperature: number, volume: number): void {
    const { byTemperature, byVolume, balances } = this;
    this.byTemperature = this.byVolume = undefined;
    if (!this.started) return;
    const warmer = Math.log(temperature / this.temperature);
    const wider = Math.log(volume / this.volume);
    if (byTemperature && Math.abs(warmer) < LONGEST_LEAD) balances.lead(byTemperature, warmer);
    if (byVolume && Math.abs(wider) < LONGEST_LEAD) balances.lead(byVolume, wider);
  }

  private begin(): void {
    const { system, neighbour } = this;
    const start =
      (neighbour && startFrom(system, neighbour, this.possible)) ?? startOf(system, this.totals, this.potentials, this.possible);
    this.balances.logs.set(start.logs);
    this.present = start.present;
  }

  /** γ = g/RT + ln(RT / V p°) of the gases, g/RT of the condensed species. */
  private fillPotentials(): void {
    const { species, gases } = this.system;
    const concentration = Math.log((GAS_CONSTANT * this.temperature) / this.volume);
    for (let j = 0; j < species.length; j++)
      this.potentials[j] = this.functions.gibbs[j]! + (j < gases ? concentration - Math.log(species[j]!.capacity.standardPressure) : 0);
  }

  get gas(): number {
    let sum = 0;
    for (const amount of this.balances.gasAmounts()) sum += amount;
    return sum;
  }

  /** Everything condenses at this pressure: no gas is left. The next state starts anew. */
  condense(pressure: number): void {
    this.balances.dropGas();
    this.volume = 0;
    this.outside = pressure;
    this.started = false;
  }

  get pressure(): number {
    return this.volume === 0 ? this.outside : (this.gas * GAS_CONSTANT * this.temperature) / this.volume;
  }

  /** Σ n times a quantity of the species. */
  private total(quantity: Float64Array): number {
    const amounts = this.balances.gasAmounts();
    let sum = 0;
    for (let j = 0; j < amounts.length; j++) if (amounts[j]! > 0) sum += amounts[j]! * quantity[j]!;
    const { members, condensed } = this.balances.basis;
    for (let k = 0; k < condensed; k++) sum += this.balances.condensedAmount(k) * quantity[members[k]!]!;
    return sum;
  }

  get energy(): number {
    return this.total(this.functions.energies);
  }

  get enthalpy(): number {
    return this.total(this.functions.enthalpies);
  }

  /** How the state follows ln T (at fixed volume) or ln V (at fixed temperature). */
  slopes(along: "temperature" | "volume"): Slopes {
    const { species, gases } = this.system;
    const { temperature, balances } = this;
    const pushes = this.pushes;
    for (let j = 0; j < species.length; j++) {
      if (along === "volume") pushes[j] = j < gases ? 1 : 0;
      else pushes[j] = this.possible[j] ? this.functions.energies[j]! / (species[j]!.fitGasConstant * temperature) : 0;
    }
    const changes = new Float64Array(gases);
    if (!balances.follow(pushes, changes)) return { gas: NaN, energy: NaN, enthalpy: NaN };
    if (along === "temperature") this.byTemperature = changes;
    else this.byVolume = changes;
    const amounts = balances.gasAmounts();
    let [gas, energy, enthalpy] = [0, 0, 0];
    for (let j = 0; j < gases; j++) {
      if (!(amounts[j]! > 0)) continue;
      const change = amounts[j]! * changes[j]!;
      gas += change;
      energy += change * this.functions.energies[j]!;
      enthalpy += change * this.functions.enthalpies[j]!;
    }
    const { members, condensed } = balances.basis;
    for (let k = 0; k < condensed; k++) {
      const change = balances.condensedChange(k, changes);
      energy += change * this.functions.energies[members[k]!]!;
      enthalpy += change * this.functions.enthalpies[members[k]!]!;
    }
    if (along === "volume") return { gas, energy, enthalpy };
    const sensible = temperature * this.heatCapacity;
    return { gas, energy: energy + sensible, enthalpy: enthalpy + sensible + temperature * this.gasConstants() };
  }

  /** Σ n Cv (Cp of condensed species) at fixed composition, J/K. */
  get heatCapacity(): number {
    return this.total(this.functions.capacities);
  }

  /** Σ n R over the gases, each with the R of its fit, J/K: what Cp has above Cv. */
  private gasConstants(): number {
    const amounts = this.balances.gasAmounts();
    let sum = 0;
    for (let j = 0; j < amounts.length; j++) sum += amounts[j]! * this.system.species[j]!.fitGasConstant;
    return sum;
  }

  /** Largest |ln Q − ln K|; 0 where no gas is left. */
  massAction(): number {
    return this.volume === 0 ? 0 : massActionError(this.system, this.balances, this.potentials, this.possible);
  }

  /** Largest difference of an element, relative to what was put in. */
  elementError(amounts: Float64Array): number {
    return elementError(this.system, this.totals, amounts);
  }
}

function refuseNoGas({ species, gases }: System): never {
  const names = species.slice(0, gases).map(({ name }) => name);
  return refuse(`None of the gases (${names.join(", ")}) can form from the feed: an equilibrium here has a gas phase`);
}

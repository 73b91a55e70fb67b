/**
 * The thermodynamic functions of all species at one temperature, evaluated once for each:
 *   g = G/RT = (H/T − S)/R with the R of the fit    U = H − RT of a gas, H of a condensed species    C = Cv of a gas, Cp of a condensed one
 */
import type { System } from "./system";

export class SpeciesFunctions {
  /** K. */
  temperature = NaN;
  /** How often everything was evaluated. */
  evaluations = 0;
  /** g/RT. */
  readonly gibbs: Float64Array;
  /** J/mol. */
  readonly energies: Float64Array;
  readonly enthalpies: Float64Array;
  /** J/(mol K). */
  readonly capacities: Float64Array;
  /** Condensed species that can form and have a value at the temperature, and those that can form and have none. */
  eligible: readonly number[] = [];
  leftOut: readonly number[] = [];

  constructor(
    private readonly system: System,
    private readonly possible: readonly boolean[],
  ) {
    const count = system.species.length;
    this.gibbs = new Float64Array(count);
    this.energies = new Float64Array(count);
    this.enthalpies = new Float64Array(count);
    this.capacities = new Float64Array(count);
  }

  /** Takes the temperature, which the gases must hold. */
  evaluate(temperature: number): void {
    const { species, gases } = this.system;
    this.temperature = temperature;
    this.evaluations++;
    const eligible: number[] = [];
    const leftOut: number[] = [];
    for (let j = 0; j < species.length; j++) {
      if (!this.possible[j]) continue;
      const { capacity, fitGasConstant } = species[j]!;
      const enthalpy = capacity.enthalpy(temperature);
      this.enthalpies[j] = enthalpy;
      this.energies[j] = j < gases ? enthalpy - fitGasConstant * temperature : enthalpy;
      this.capacities[j] = j < gases ? capacity.cv(temperature) : capacity.cp(temperature);
      this.gibbs[j] = (enthalpy / temperature - capacity.entropy(temperature)) / fitGasConstant;
      if (j >= gases) (Number.isNaN(enthalpy) ? leftOut : eligible).push(j);
    }
    this.eligible = eligible;
    this.leftOut = leftOut;
  }
}

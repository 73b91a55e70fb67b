/**
 * Gross value at constant volume, as analysed: gaseous O2, N2, CO2 and SO2, liquid water, at the temperature of the run.
 *
 *   q = (ε θ − Σ Q + Q_soot − Q_S) / m
 *
 * ε energy equivalent, J/K; θ corrected rise, K; Q extraneous heats (ignition, fuse, nitric acid, combustion aids), J; Q_S heat of sulfuric
 * acid, J; Q_soot heat that unburnt carbon would have given, J; m mass of the sample, g. Common practice of oxygen-vessel calorimetry.
 */
import { printed, refuseRange } from "../refusal";

export interface GrossRun {
  readonly equivalent: number;
  readonly rise: number;
  readonly mass: number;
  /** Sum of the extraneous heats, J. */
  readonly heats: number;
  /** Heat of sulfuric acid, J. */
  readonly sulfurHeat: number;
  /** Unburnt carbon left, g. */
  readonly soot: number;
}

/** Soot above this share of the sample is no correction but a failed combustion (common practice). */
const MOST_SOOT = 0.01;

/** No substance of a fuel laboratory gives more: hydrogen, the highest, has 141.9 kJ/g. */
const MOST_ENERGY = 142_500;

/** Gross value, J/g. `sootHeat` is the heat of combustion of carbon, J/g. Refuses a run whose corrections exceed its heat. */
export function grossValue({ equivalent, rise, mass, heats, sulfurHeat, soot }: GrossRun, sootHeat: number): number {
  if (!(mass > 0)) return refuseRange(`Sample mass ${printed(mass)} g is not above 0 g`);
  if (!(heats >= 0 && sulfurHeat >= 0)) return refuseRange(`Heats ${printed(Math.min(heats, sulfurHeat))} J are negative`);
  if (!(soot >= 0 && soot <= MOST_SOOT * mass)) {
    return refuseRange(
      `Soot ${printed(soot)} g is more than ${MOST_SOOT * 100} % of the sample, ${printed(MOST_SOOT * mass)} g: the combustion was incomplete; repeat the run`,
    );
  }
  const released = equivalent * rise;
  const deducted = heats + sulfurHeat;
  if (!(deducted < released))
    return refuseRange(`The heats deducted, ${printed(deducted)} J, are not below the heat released, ${printed(released)} J`);
  const value = (released - deducted + soot * sootHeat) / mass;
  if (!(value <= MOST_ENERGY)) {
    return refuseRange(
      `The value would be ${printed(value)} J/g, above that of hydrogen: check energy equivalent ${printed(equivalent)} J/K, rise ${printed(rise)} K and mass ${printed(mass)} g`,
    );
  }
  return value;
}

import { printed, refuse, refuseRange } from "../refusal";
import type { Capacity } from "./capacity";
import { inverseTableOf } from "./inverse-table";
import { reaches, type Segment, solveInSegment } from "./segments";

/** An energy that misses the end of the range by what this interval holds, K, is taken as the end: it is the rounding of a sum. */
const ROUNDING = 1e-9;

/**
 * Temperature, K, at which the capacity has this energy U, J/mol (per mole of mixture): the inverse of `capacity.energy`, within 1e-9 K.
 *
 * Newton's method inside a bracket it cannot leave, its results tabulated. Where the energy steps up at a joint (heat of a listed
 * transition) an energy inside the step gives the temperature of the joint: the transition is under way. Where a published fit steps
 * down, two temperatures have the same energy: the one in the interval of `start` (K) is given, or else the lower one.
 *
 * Refuses an energy that is not a number; one outside the reach of the range, with that reach; and a search that does not end, with its
 * last bracket.
 */
export function temperatureAtEnergy(capacity: Capacity, energyPerMole: number, start?: number): number {
  const table = inverseTableOf(capacity);
  const temperature = table.temperature(energyPerMole, start !== undefined);
  return Number.isNaN(temperature) ? temperatureBySearch(capacity, table.segments, energyPerMole, start) : temperature;
}

/** The same without the table. */
export function temperatureBySearch(capacity: Capacity, segments: readonly Segment[], energy: number, start?: number): number {
  if (Number.isNaN(energy)) refuse("The energy is not a number");
  const preferred = start === undefined ? undefined : segments.find((segment) => start >= segment.from && start <= segment.to);
  if (preferred !== undefined && reaches(preferred, energy)) return solveInSegment(capacity, preferred, energy);
  for (const [index, segment] of segments.entries()) {
    if (reaches(segment, energy)) return solveInSegment(capacity, segment, energy);
    if (energy < segment.low) return index > 0 ? segment.from : outside(capacity, segments, energy);
  }
  return outside(capacity, segments, energy);
}

function outside(capacity: Capacity, segments: readonly Segment[], energy: number): number {
  const low = segments[0]!.low;
  const high = segments[segments.length - 1]!.high;
  if (Math.abs(energy - low) <= ROUNDING * Math.abs(capacity.cv(capacity.from))) return capacity.from;
  if (Math.abs(energy - high) <= ROUNDING * Math.abs(capacity.cv(capacity.to))) return capacity.to;
  const reach = `${printed(low)} J/mol at ${printed(capacity.from)} K to ${printed(high)} J/mol at ${printed(capacity.to)} K`;
  const [side, label] = energy < low ? ["below", capacity.fromLabel] : ["above", capacity.toLabel];
  return refuseRange(`Energy ${printed(energy)} J/mol is ${side} the reach of ${label}: ${reach}`);
}

/**
 * Energy equivalent of a calorimeter from a run with a certified substance:
 *
 *   ε = (m q f + Σ Q) / θ
 *
 * m mass, g; q certified value, J/g; f condition factor of the certificate; Q extraneous heats (ignition, fuse, nitric acid), J;
 * θ corrected rise, K. Masses in vacuum with a value in vacuum, or both in air (see buoyancy.ts).
 */
import { printed, refuseRange } from "../refusal";

/** Energy equivalents of combustion calorimeters, from micro vessels to those of many litres, J/K (common practice). */
const LEAST = 50;
const MOST = 1_000_000;

/** Energy equivalent, J/K. Refuses a rise or mass that is not above zero and heats that are negative. */
export function energyEquivalent(mass: number, certified: number, rise: number, heats: number, factor = 1): number {
  if (!(rise > 0)) return refuseRange(`Corrected rise ${printed(rise)} K is not above 0 K`);
  if (!(mass > 0)) return refuseRange(`Sample mass ${printed(mass)} g is not above 0 g`);
  if (!(heats >= 0)) return refuseRange(`Heats ${printed(heats)} J are negative`);
  const equivalent = (mass * certified * factor + heats) / rise;
  if (equivalent >= LEAST && equivalent <= MOST) return equivalent;
  return refuseRange(
    `The energy equivalent would be ${printed(equivalent)} J/K, outside ${LEAST} to ${MOST} J/K: check mass ${printed(mass)} g, certified value ${printed(certified)} J/g and rise ${printed(rise)} K`,
  );
}

/**
 * Mass in vacuum from a weighing in air:
 *
 *   m = m_air (1 − ρa/ρw) / (1 − ρa/ρs)
 *
 * ρa density of air, ρw of the weights (or of the balance's calibration weights), ρs of the sample, all in one unit. Archimedes' law.
 */
import { printed, refuseRange } from "../refusal";

/** Densities of air at which a laboratory weighs, g/cm3: high mountains to cold sea level, with room to spare. */
const AIR = { least: 0.0005, most: 0.002 };

/** Mass in vacuum, in the unit of the mass in air; densities in g/cm3. Refuses a sample or weights not denser than air, and air that is none. */
export function massInVacuum(massInAir: number, sampleDensity: number, weightsDensity: number, airDensity: number): number {
  if (!(airDensity >= AIR.least && airDensity <= AIR.most))
    return refuseRange(`Density of the air ${printed(airDensity)} g/cm3 is outside ${AIR.least} to ${AIR.most} g/cm3`);
  for (const [name, density] of [
    ["the sample", sampleDensity],
    ["the weights", weightsDensity],
  ] as const) {
    if (!(density > airDensity))
      return refuseRange(`The density of ${name}, ${printed(density)} g/cm3, is not above that of the air, ${printed(airDensity)} g/cm3`);
  }
  return (massInAir * (1 - airDensity / weightsDensity)) / (1 - airDensity / sampleDensity);
}

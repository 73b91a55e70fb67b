/**
 * What hydrogen, oxygen, nitrogen and moisture take from a gross value, J/g for each per cent by mass, derived at 298.15 K from
 * L = ΔvapH(H2O), the ideal-gas RT and the molar masses M:
 *
 *                        constant pressure            constant volume            gross value at constant pressure
 *   hydrogen   (dry)     (L − RT/2)/M(H2)   212.17    (L − RT)/M(H2)   206.02    RT/(2 M(H2))   6.15   (added)
 *   oxygen     (dry)     RT/M(O2)             0.77    0                          RT/M(O2)       0.77   (taken off)
 *   nitrogen   (dry)     RT/M(N2)             0.88    0                          RT/M(N2)       0.88   (taken off)
 *   moisture             L/M(H2O)            24.43    (L − RT)/M(H2O)   23.05
 *
 * each divided by 100. The start is always the gross value at constant volume: oxygen, CO2, N2 gases, water liquid, the fuel condensed.
 * One mole of H2 of the fuel takes up ½ mol O2 and leaves one of steam, ½ mol more gas; the O2 and N2 of the fuel come out as gas;
 * carbon and sulfur leave as much gas as they take up and have no term.
 * Methods print rounded constants and 0.8 for oxygen and nitrogen alike: see src/data/net-values.json.
 */
import { GAS_CONSTANT, REFERENCE_TEMPERATURE } from "../constants";
import { printed, refuse, refuseRange } from "../refusal";

export type Condition = "constant-pressure" | "constant-volume";

/** Taken from the gross value at constant volume, J/g for each per cent: the first three of the dry sample, moisture of the sample reported. */
export interface NetConstants {
  readonly hydrogen: number;
  readonly oxygen: number;
  readonly nitrogen: number;
  readonly moisture: number;
}

/** From gross at constant volume to gross at constant pressure, J/g for each per cent of the dry sample: hydrogen added, the others taken off. */
export type GrossPressureConstants = Omit<NetConstants, "moisture">;

/** Enthalpy of vaporisation of water at 298.15 K, J/mol, and molar masses, g/mol. */
export interface WaterFigures {
  readonly vaporisation: number;
  readonly waterMass: number;
  readonly hydrogenMass: number;
  readonly oxygenMass: number;
  readonly nitrogenMass: number;
}

const RT = GAS_CONSTANT * REFERENCE_TEMPERATURE;

/** The derived constants of a net value, J/g per per cent. */
export function derivedNetConstants(condition: Condition, figures: WaterFigures): NetConstants {
  const { vaporisation, waterMass, hydrogenMass } = figures;
  if (condition === "constant-volume") {
    const energy = vaporisation - RT;
    return { hydrogen: energy / hydrogenMass / 100, oxygen: 0, nitrogen: 0, moisture: energy / waterMass / 100 };
  }
  const { hydrogen, oxygen, nitrogen } = derivedGrossPressureConstants(figures);
  return { hydrogen: vaporisation / hydrogenMass / 100 - hydrogen, oxygen, nitrogen, moisture: vaporisation / waterMass / 100 };
}

/** The derived constants of a gross value at constant pressure, J/g per per cent. */
export function derivedGrossPressureConstants({ hydrogenMass, oxygenMass, nitrogenMass }: WaterFigures): GrossPressureConstants {
  return { hydrogen: RT / (2 * hydrogenMass) / 100, oxygen: RT / oxygenMass / 100, nitrogen: RT / nitrogenMass / 100 };
}

/** A constant of one's own may differ from the derived one by this factor; printed ones differ by a tenth at most. */
const FARTHEST = 3;

/**
 * Refuses a constant (J/g per per cent) of the wrong sign or size: a decimal point out of place, or another unit. Zero is accepted for
 * oxygen and nitrogen, which some rules leave out, and is all that is accepted where the derived constant is 0.
 */
export function requireLikely(name: "hydrogen" | "oxygen" | "nitrogen" | "moisture", value: number, derived: number): void {
  const given = `The ${name} constant ${printed(value)} J/g per %`;
  if (!Number.isFinite(value)) refuse(`The ${name} constant is not a finite number`);
  if (value < 0) refuseRange(`${given} is negative; give sizes, the formula has the signs`);
  if (value === 0 && (name === "oxygen" || name === "nitrogen")) return;
  if (derived === 0) refuseRange(`${given} has no place at constant volume: give 0`);
  const ratio = value / derived;
  if (ratio > FARTHEST || ratio < 1 / FARTHEST) {
    refuseRange(`${given} is ${printedRatio(ratio)} times the derived ${printed(derived)}; up to a factor of ${FARTHEST} is accepted`);
  }
}

function printedRatio(ratio: number): string {
  return String(Number(ratio.toPrecision(3)));
}

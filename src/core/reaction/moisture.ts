/**
 * Whether the water that an equation writes as vapour or as liquid can be so in a volume: the partial pressure of the vapour against the
 * saturation pressure at the temperature,
 *   p = n(vapour) R T / V   ideal gas; the liquid has no volume
 * Vapour above saturation condenses; liquid below saturation evaporates until the saturation pressure is reached or none is left.
 */
import { GAS_CONSTANT } from "../constants";
import { type SaturationConstants, saturationPressure } from "../water/saturation";

/** Water as the equation writes it, in a volume. */
export interface Moisture {
  /** mol. */
  readonly vapour: number;
  readonly liquid: number;
  /** K. */
  readonly temperature: number;
  /** m³. */
  readonly volume: number;
}

/** What the water would do. Pressures in Pa. */
export interface MoistureFinding {
  readonly kind: "condenses" | "evaporates in part" | "evaporates";
  /** Partial pressure of the vapour as written; of the liquid if all of it were vapour. */
  readonly partial: number;
  readonly saturation: number;
  /** Amount that would change its phase, mol. */
  readonly amount: number;
}

const LOWEST = 190;

/**
 * What the water would do against the equation; undefined if it can be as written, if there is none, and where the saturation pressure is
 * not known or has no meaning (below 190 K, above the critical point).
 */
export function moistureFinding(water: Moisture, constants: SaturationConstants): MoistureFinding | undefined {
  const { vapour, liquid, temperature, volume } = water;
  if (vapour + liquid === 0 || temperature < LOWEST || temperature > constants.criticalTemperature) return undefined;
  const saturation = saturationPressure(temperature, constants);
  const perMole = (GAS_CONSTANT * temperature) / volume;
  const held = saturation / perMole;
  if (vapour > held) return { kind: "condenses", partial: vapour * perMole, saturation, amount: vapour - held };
  if (liquid === 0 || vapour === held) return undefined;
  const all = vapour + liquid;
  const kind = all <= held ? "evaporates" : "evaporates in part";
  return { kind, partial: all * perMole, saturation, amount: Math.min(liquid, held - vapour) };
}

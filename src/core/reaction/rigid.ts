/**
 * A complete reaction in a rigid vessel: the reactants of the left at T1, their gases at P1, become the products of the right at T2.
 * Per mole of the equation as written, volume held and no work done, so the heat into the contents is the change of internal energy:
 *   Q = Σ ν U(T2) of the right − Σ ν U(T1) of the left = ΔrU(T1) + Σ ν [U(T2) − U(T1)] of the right
 * Gases are ideal and have the whole volume, V = n1 R T1/P1; solids and liquids have none, and U = H:
 *   P2 = P1 (n2/n1)(T2/T1)   n1, n2 gas on the left and on the right, mol
 */
import { explainTemperature } from "../capacity/range";
import { GAS_CONSTANT } from "../constants";
import { refuse } from "../refusal";
import { gasOf, limiting, type ReactionPart, requireFormation } from "./reaction";

/** State of the vessel at the beginning. */
export interface RigidStart {
  /** T1, K. */
  readonly temperature: number;
  /** P1, absolute pressure of the gases, Pa. */
  readonly pressure: number;
}

/** Per mole of the equation as written. */
export interface RigidReaction {
  /** Heat into the contents, J; negative: given off. */
  readonly heat: number;
  /** ΔrU(T1), J; undefined if the range of a product does not hold T1. */
  readonly energyOfReaction: number | undefined;
  /** Products from T1 to T2, J; undefined as before. */
  readonly sensible: number | undefined;
  /** Gas on the left and on the right, mol. */
  readonly gasBefore: number;
  readonly gasAfter: number;
  /** P2/P1; 0 if no gas is left. */
  readonly pressureRatio: number;
  /** V, m³. */
  readonly volume: number;
}

/**
 * The reaction in the rigid vessel. Refuses a left side without gas, for which P1 has no meaning; temperatures outside the ranges of the
 * reactants (T1) and the products (T2); and species without formation enthalpy.
 */
export function rigidReaction(parts: readonly ReactionPart[], start: RigidStart, finalTemperature: number): RigidReaction {
  const { temperature, pressure } = start;
  const [gasBefore, gasAfter] = [gasOf(parts, "left"), gasOf(parts, "right")];
  if (gasBefore === 0)
    refuse("No gas stands on the left: the pressure before the reaction has no meaning, and the vessel has no volume to speak of");
  requireFormation(parts);
  const [reactants, products] = [parts.filter(({ left }) => left > 0), parts.filter(({ right }) => right > 0)];
  const before = energyAt(reactants, "left", temperature);
  const after = energyAt(products, "right", finalTemperature);
  const between = limiting(products, temperature) ? undefined : energyAt(products, "right", temperature);
  return {
    heat: after - before,
    energyOfReaction: between === undefined ? undefined : between - before,
    sensible: between === undefined ? undefined : after - between,
    gasBefore,
    gasAfter,
    pressureRatio: (gasAfter / gasBefore) * (finalTemperature / temperature),
    volume: (gasBefore * GAS_CONSTANT * temperature) / pressure,
  };
}

function energyAt(parts: readonly ReactionPart[], side: "left" | "right", temperature: number): number {
  const limit = limiting(parts, temperature);
  if (limit) throw explainTemperature(limit, temperature);
  return parts.reduce((sum, part) => sum + part[side] * part.capacity.energy(temperature), 0);
}

import { GAS_CONSTANT, REFERENCE_TEMPERATURE, STANDARD_PRESSURE } from "../constants";
import type { Phase } from "../species/types";
import type { Capacity } from "./capacity";
import { CurveCapacity } from "./curves";

/** The fence of temperatures, K, of a substance without a known heat capacity: that of extrapolations. */
const LOWEST = 1;
const HIGHEST = 20000;

/**
 * A substance of which only the enthalpy of formation at 298.15 K is known, J/mol: U keeps its value at 298.15 K at every temperature,
 *   U = ΔfH − RT(298.15 K) for a gas, U = ΔfH for a liquid or solid;   H = U + RT for a gas, H = U else.
 * Cp, Cv and S are not known and give NaN, so that it can be put into a balance of energy and never come out of one.
 */
export function fixedEnergy(formationEnthalpy: number, phase: Phase, label: string): Capacity {
  const gasConstant = phase === "g" ? GAS_CONSTANT : 0;
  return new CurveCapacity(
    {
      phase,
      fromLabel: label,
      toLabel: label,
      standardPressure: STANDARD_PRESSURE,
      onFormationScale: true,
      hasEntropy: false,
      gasConstant,
    },
    LOWEST,
    HIGHEST,
    [],
    {
      cp: () => NaN,
      enthalpy: (temperature) => formationEnthalpy + gasConstant * (temperature - REFERENCE_TEMPERATURE),
      entropy: () => NaN,
    },
  );
}

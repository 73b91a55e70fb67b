/**
 * The state of a gas by its cubic equation at temperature and volume, with the phases a pure substance has below its critical temperature:
 * between the volumes of saturated liquid and vapour both stand side by side, at the vapour pressure, their energies by the lever rule.
 *
 * Cv of two phases at constant overall volume, with x_i the share of a phase and dP/dT the slope of the vapour pressure:
 *   Cv = Σ x_i [Cv_i − T (∂v/∂P)_i ((∂P/∂T)_v,i − dP/dT)²]
 *
 * A mixture that would split into two phases is refused: its amounts would need a flash calculation.
 */
import { GAS_CONSTANT } from "../constants";
import { printed, refuseRange } from "../refusal";
import type { CubicGas } from "./cubic-gas";
import { type CubicSaturation, cubicSaturation } from "./saturation";
import { condensing, splits } from "./stability";
import { stableVolume } from "./volumes";

export type GasPhase = "gas" | "supercritical" | "liquid" | "two-phase";

export interface CubicState {
  readonly phase: GasPhase;
  /** Pa. */
  readonly pressure: number;
  /** Difference of the internal energy to the ideal gas at the same temperature, J/mol. */
  readonly residualEnergy: number;
  /** Difference of Cv to the ideal gas, J/(mol K); of two phases with what evaporates. */
  readonly residualCv: number;
  /** Vapour pressure of a pure gas below its critical temperature, Pa. */
  readonly vapourPressure?: number;
  /** Share of the moles that is vapour; only where there are two phases. */
  readonly vapourFraction?: number;
}

/**
 * The state at T in K and overall v in m³/mol. Refuses a volume not above that of the molecules, a gas denser than a liquid, and a mixture
 * that splits.
 */
export function cubicState(gas: CubicGas, temperature: number, volume: number): CubicState {
  requireRoom(gas, volume);
  if (gas.parts.length > 1) return mixtureState(gas, temperature, volume);
  const saturation = cubicSaturation(gas, temperature);
  if (saturation === undefined) return aboveCritical(gas, temperature, volume);
  const { liquid, vapour, pressure } = saturation;
  if (volume >= vapour) return { ...onePhase(gas, temperature, volume, "gas"), vapourPressure: pressure };
  if (volume <= liquid) return { ...onePhase(gas, temperature, volume, "liquid"), vapourPressure: pressure };
  return twoPhases(gas, saturation, (volume - liquid) / (vapour - liquid));
}

/** The volume, m³/mol, that a gas has at T in K and P in Pa: of two possible ones the stable one. Refuses a mixture that splits. */
export function volumeAt(gas: CubicGas, temperature: number, pressure: number): number {
  const volume = stableVolume(gas, temperature, pressure);
  if (gas.parts.length > 1) requireOnePhase(gas, temperature, volume);
  if (temperature >= gas.criticalTemperature) requireTold(gas, temperature, volume);
  return volume;
}

function mixtureState(gas: CubicGas, temperature: number, volume: number): CubicState {
  requireOnePhase(gas, temperature, volume);
  if (isLiquidMixture(gas, temperature, volume)) return onePhase(gas, temperature, volume, "liquid");
  requireTold(gas, temperature, volume);
  return onePhase(gas, temperature, volume, "gas");
}

/**
 * Whether a mixture that is one phase at T in K and v in m³/mol is a liquid: the isotherm of the one fluid it is taken for has a loop, as that
 * of a pure gas below its critical temperature (there a/(b R T) = Ωa/Ωb), and v is on its dense side, below the critical volume Zc b/Ωb of
 * that fluid.
 */
export function isLiquidMixture(gas: CubicGas, temperature: number, volume: number): boolean {
  const { omegaA, omegaB, d1, d2 } = gas.form;
  const hasLoop = gas.attraction(temperature) / (gas.b * GAS_CONSTANT * temperature) > omegaA / omegaB;
  return hasLoop && volume < (gas.b * (1 - (d1 + d2 - 1) * omegaB)) / (3 * omegaB);
}

/** From the critical temperature up a pure gas is called supercritical from the critical pressure up. */
function aboveCritical(gas: CubicGas, temperature: number, volume: number): CubicState {
  requireTold(gas, temperature, volume);
  const state = onePhase(gas, temperature, volume, "supercritical");
  return state.pressure < gas.parts[0]!.critical.pressure ? { ...state, phase: "gas" } : state;
}

/** A gas denser than this, in volumes of its molecules, has pressures of thousands of bar that no cubic equation tells. */
const DENSEST = 1.3;

function requireTold(gas: CubicGas, temperature: number, volume: number): void {
  if (volume >= DENSEST * gas.b) return;
  refuseRange(
    `At ${printed(temperature)} K the molar volume ${printed(1e6 * volume)} cm3/mol is below ${printed(1e6 * DENSEST * gas.b)} cm3/mol, ${DENSEST} times what the molecules take up: denser than a liquid, and ${gas.form.title} tells no pressure of it`,
  );
}

function onePhase(gas: CubicGas, temperature: number, volume: number, phase: GasPhase): CubicState {
  return {
    phase,
    pressure: gas.pressure(temperature, volume),
    residualEnergy: gas.residualEnergy(temperature, volume),
    residualCv: gas.residualCv(temperature, volume),
  };
}

function twoPhases(gas: CubicGas, { temperature, pressure, liquid, vapour, slope }: CubicSaturation, share: number): CubicState {
  const both = (value: (volume: number) => number) => share * value(vapour) + (1 - share) * value(liquid);
  return {
    phase: "two-phase",
    pressure,
    residualEnergy: both((volume) => gas.residualEnergy(temperature, volume)),
    residualCv: both(
      (volume) =>
        gas.residualCv(temperature, volume) -
        (temperature * (gas.pressureByTemperature(temperature, volume) - slope) ** 2) / gas.pressureByVolume(temperature, volume),
    ),
    vapourPressure: pressure,
    vapourFraction: share,
  };
}

function requireOnePhase(gas: CubicGas, temperature: number, volume: number): void {
  if (!splits(gas, temperature, volume)) return;
  const pressure = gas.pressure(temperature, volume);
  // between vapour and liquid the equation may fall below nought, which is no pressure to tell
  const where = `At ${printed(temperature)} K and ${pressure > 0 ? `${printed(pressure)} Pa` : `${printed(1e6 * volume)} cm3/mol`}`;
  const part = condensing(gas, temperature, volume);
  if (part?.vapourPressure)
    refuseRange(
      `${where} ${part.species} would condense out of this mixture: its vapour pressure is ${printed(part.vapourPressure(temperature))} Pa; mixtures are served as one phase only`,
    );
  refuseRange(
    `${where} this mixture is not one gas by ${gas.form.title}: part of it would condense; mixtures are served as one phase only`,
  );
}

function requireRoom(gas: CubicGas, volume: number): void {
  if (volume > gas.b) return;
  refuseRange(
    `The molar volume ${printed(1e6 * volume)} cm3/mol is not above ${printed(1e6 * gas.b)} cm3/mol, which the molecules take up by ${gas.form.title}`,
  );
}

/** P of the ideal gas, Pa. */
export function idealPressure(temperature: number, volume: number): number {
  return (GAS_CONSTANT * temperature) / volume;
}

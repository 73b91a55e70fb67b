/**
 * What is filled into a vessel: a gas of known volume and temperature, by its absolute pressure or by its amount. The arguments volume, T1,
 * charge and model of the vessel functions, and the contents they make.
 */
import { GAS_CONSTANT } from "../core/constants";
import { isLiquidMixture, volumeAt } from "../core/realgas/state";
import { Refusal, refuse } from "../core/refusal";
import { beginsWithNumber, dimensionOf, parseQuantity } from "../core/units";
import { GasContent, type GasState } from "../core/vessel/gas-content";
import { readAmount } from "./amount";
import { type Expected, quoted, readPressure } from "./arguments";
import type { Cell } from "./cell";
import { idealIfClose, type Model, namedModel } from "./gas-model";
import { condensation, requireGases, requireNoLiquid, requireVapour } from "./gas-phase";
import type { Substance } from "./substance";

export const T1: Expected = { name: "Temperature T1", unit: "K", example: '"15 °C"' };
export const T2: Expected = { name: "Temperature T2", unit: "K", example: '"50 °C"' };
export const P1: Expected = { name: "Pressure P1", unit: "Pa", example: '"200 bar"' };
const CHARGE: Expected = { name: "Charge", unit: "Pa", example: '"200 bar", "60 g" or "2 mol"' };

export interface Filling {
  readonly content: GasContent;
  /** The model the user named; undefined if it was left out and the ideal gas has yet to be judged. */
  readonly named: Model | undefined;
  /** Absolute pressure at T1, Pa. */
  readonly pressure: number;
  /** True if the charge was given as a pressure. */
  readonly byPressure: boolean;
}

/** The contents of a vessel, filled at a temperature by the cell `charge`: a plain number or text is pressure, a text may be an amount or a mass. */
export function filled(
  substance: Substance,
  volume: number,
  temperature: number,
  charge: Cell | undefined,
  word: string | undefined,
): Filling {
  requireGases(substance);
  const named = namedModel(substance, word);
  const byPressure = isPressure(charge);
  const given = byPressure ? readPressure(charge, CHARGE) : undefined;
  const moles = given === undefined ? readAmount(charge, substance) : volume / molarVolume(substance, temperature, given, named);
  const content = new GasContent(substance.capacity, moles, volume, named?.kind === "real" ? named.real.gas : undefined);
  return { content, named, byPressure, pressure: given ?? content.at(temperature).pressure };
}

/** The molar volume, m³/mol, of a gas at T and P; of a model left out that of the ideal gas. Refuses liquids. */
export function molarVolume(substance: Substance, temperature: number, pressure: number, model: Model | undefined): number {
  if (model?.kind !== "real") return (GAS_CONSTANT * temperature) / pressure;
  requireVapour(substance, model.real.gas, temperature, pressure);
  const { gas } = model.real;
  const volume = volumeAt(gas, temperature, pressure);
  if (gas.parts.length > 1 && isLiquidMixture(gas, temperature, volume)) requireNoLiquid(substance, { phase: "liquid" }, temperature);
  return volume;
}

/** The model of a filling for the temperatures of a call: the one named, or the ideal gas if it is close enough at all of them. */
export function modelFor(substance: Substance, { named, content }: Filling, temperatures: readonly number[]): Model {
  return (
    named ??
    idealIfClose(
      substance,
      temperatures.map((temperature) => ({ temperature, volume: content.molarVolume })),
    )
  );
}

/** Refuses a liquid that fills the vessel, with the temperature from which it does. */
export function requireTold(substance: Substance, content: GasContent, { phase, temperature }: GasState): void {
  if (phase === "liquid") requireNoLiquid(substance, { phase }, temperature, content.twoPhasesUpTo);
}

/** Refuses an ideal gas of which a part would be liquid. */
export function requireUncondensed(substance: Substance, temperature: number, pressure: number): void {
  const sentence = condensation(substance, temperature, pressure);
  if (sentence) throw new Refusal("range", sentence);
}

function isPressure(cell: Cell | undefined): boolean {
  if (cell === undefined || cell === null)
    return refuse(`The charge is missing: give an absolute pressure in Pa, or a text such as ${CHARGE.example}`);
  if (typeof cell === "number") return true;
  if (typeof cell !== "string")
    return refuse(`The charge is ${quoted(cell)}: give an absolute pressure in Pa, or a text such as ${CHARGE.example}`);
  if (Number.isFinite(Number(cell))) return true;
  if (!beginsWithNumber(cell)) return true; // refused with the other texts that are no pressure
  const { unit } = parseQuantity(cell);
  if (unit.dimension === dimensionOf("Pa")) return true;
  if (unit.dimension === dimensionOf("mol") || unit.dimension === dimensionOf("kg")) return false;
  return refuse(`The charge "${cell}" is neither a pressure nor an amount nor a mass; write a text such as ${CHARGE.example}`);
}

/** The one-number functions on a gas in a vessel: amount, pressure, compressibility, Cv, final pressure and final temperature. */
import { GAS_CONSTANT } from "../core/constants";
import { cubicState, idealPressure } from "../core/realgas/state";
import { dimensionOf, fromBase, parseUnit } from "../core/units";
import { GasContent } from "../core/vessel/gas-content";
import { temperatureAfter } from "../core/vessel/reach";
import { readAmount } from "./amount";
import { HEAT, PRESSURE, readPressure, readQuantity, readTemperature, readText, readVolume } from "./arguments";
import type { Named } from "./broadcast";
import type { Block, Cell } from "./cell";
import { remindingOfCelsius } from "./celsius";
import { idealIfClose, type Model, namedModel, readModel, requireNoModel } from "./gas-model";
import { requireGases, requireOnePhase } from "./gas-phase";
import { HEAT_CAPACITY, inUnit, molarDivisor } from "./result-unit";
import { isSetId } from "./set";
import { eachState } from "./states";
import type { Substance } from "./substance";
import { filled, modelFor, molarVolume, P1, requireTold, requireUncondensed, T1, T2 } from "./vessel-filling";
import { readWall } from "./vessel-wall";

const PASCAL = 'a pressure such as "bar"';

/** The arguments of a function behind the substance, by name, in order. */
export type Given = Readonly<Record<string, Block | undefined>>;

function over(
  substance: Block,
  set: Block | undefined,
  given: Given,
  each: (found: Substance, cells: Readonly<Record<string, Cell>>) => number,
): Block {
  const names = Object.keys(given);
  const named: readonly Named[] = names.map((name) => [name, given[name]] as const);
  return eachState(substance, set, named, (found, values) => {
    requireGases(found);
    requireNoModel(given.unit && values[names.indexOf("unit")]);
    const cells = Object.fromEntries(names.map((name, i) => [name, values[i] ?? null]));
    return remindingOfCelsius([cells.temperature, cells.T1, cells.T2], () => each(found, cells));
  });
}

export function amountCells(substance: Block, given: Given): Block {
  return over(substance, undefined, given, (found, { volume, temperature, pressure, unit, model }) => {
    const room = readVolume(volume);
    const { volume: molar } = placeOf(found, readTemperature(temperature), readPressure(pressure, PRESSURE), readModel(model));
    return amountIn(room / molar, readText(unit, "unit"), found);
  });
}

export function pressureCells(substance: Block, given: Given): Block {
  return over(substance, undefined, given, (found, { amount, volume, temperature, unit, model }) => {
    const molar = readVolume(volume) / readAmount(amount, found);
    const pressure = pressureAt(found, readTemperature(temperature), molar, readModel(model));
    return inUnit(pressure, readText(unit, "unit"), "Pa", PASCAL);
  });
}

export function compressibilityCells(substance: Block, given: Given): Block {
  return over(substance, undefined, given, (found, cells) => {
    const [temperature, pressure] = [readTemperature(cells.temperature), readPressure(cells.pressure, PRESSURE)];
    const { volume, model } = placeOf(found, temperature, pressure, readModel(cells.model));
    return model.kind === "ideal" ? 1 : (pressure * volume) / (GAS_CONSTANT * temperature);
  });
}

export function cvCells(substance: Block, set: Block | undefined, given: Given): Block {
  return over(substance, set, given, (found, { amount, volume, temperature: cell, unit, model }) => {
    const [moles, room, temperature] = [readAmount(amount, found), readVolume(volume), readTemperature(cell)];
    const place = { temperature, volume: room / moles };
    const chosen = namedModel(found, readModel(model)) ?? idealIfClose(found, [place]);
    const state = new GasContent(found.capacity, moles, room, gasOf(chosen)).at(temperature);
    if (state.phase === "ideal gas") requireUncondensed(found, temperature, state.pressure);
    else requireOnePhase(found, { ...state, phase: state.phase }, temperature);
    return state.heatCapacity / moles / molarDivisor(readText(unit, "unit"), HEAT_CAPACITY, found.molarMass);
  });
}

export function finalPressureCells(substance: Block, given: Given): Block {
  return over(substance, undefined, given, (found, cells) => {
    const [first, last] = [readTemperature(cells.T1, T1), readTemperature(cells.T2, T2)];
    const { volume, model } = placeOf(found, first, readPressure(cells.P1, P1), readModel(cells.model));
    const pressure = pressureAt(found, last, volume, model.kind === "ideal" && !model.named ? undefined : model);
    return inUnit(pressure, readText(cells.unit, "unit"), "Pa", PASCAL);
  });
}

export function finalTemperatureCells(substance: Block, set: Block | undefined, given: Given): Block {
  return over(substance, set, given, (found, cells) => {
    const first = readTemperature(cells.T1, T1);
    const filling = filled(found, readVolume(cells.volume), first, cells.charge, readModel(cells.model));
    const last = temperatureAfter(filling.content, readWall(cells.wall), first, readQuantity(cells.heat, HEAT));
    const model = modelFor(found, filling, [first, last]);
    for (const state of [filling.content.at(first), filling.content.at(last)]) {
      if (model.kind === "ideal") requireUncondensed(found, state.temperature, state.pressure);
      else requireTold(found, filling.content, state);
    }
    return inUnit(last, readText(cells.unit, "unit"), "K", 'a temperature such as "°C"');
  });
}

/** The molar volume at T and P, with the model that gives it. */
function placeOf(found: Substance, temperature: number, pressure: number, word: string | undefined): { volume: number; model: Model } {
  const named = namedModel(found, word);
  const volume = molarVolume(found, temperature, pressure, named);
  const model = named ?? idealIfClose(found, [{ temperature, volume }]);
  if (model.kind === "ideal") requireUncondensed(found, temperature, pressure);
  return { volume, model };
}

/** P at T and v by a model, or by its word; of a model left out the ideal gas if it is close enough. Refuses what is not one gas. */
function pressureAt(found: Substance, temperature: number, volume: number, by: Model | string | undefined): number {
  const named = typeof by === "object" ? by : namedModel(found, by);
  const model = named ?? idealIfClose(found, [{ temperature, volume }]);
  if (model.kind === "ideal") {
    const pressure = idealPressure(temperature, volume);
    requireUncondensed(found, temperature, pressure);
    return pressure;
  }
  const state = cubicState(model.real.gas, temperature, volume);
  requireOnePhase(found, state, temperature);
  return state.pressure;
}

function gasOf(model: Model) {
  return model.kind === "real" ? model.real.gas : undefined;
}

/** Moles, or with a unit of mass the mass. */
function amountIn(moles: number, unit: string | undefined, { molarMass }: Substance): number {
  if (unit === undefined) return moles;
  if (!isSetId(unit) && parseUnit(unit).dimension === dimensionOf("kg")) return fromBase(moles * molarMass, parseUnit(unit));
  return inUnit(moles, unit, "mol", 'an amount such as "mol" or "kg"');
}

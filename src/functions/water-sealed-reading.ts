/**
 * The arguments of WATER.SEALED as cells give them: the water as a mass or as the humidity of its vapour, the gas with its partial pressure.
 */
import { printed, refuse, refuseRange } from "../core/refusal";
import { parseQuantity } from "../core/units";
import type { HeatStore, PressureLimit } from "../core/vessel/types";
import { WaterContent } from "../core/vessel/water-content";
import { iapws95 } from "../data/iapws95";
import { type Expected, quoted, readFraction, readPressure, readQuantity, readTemperature, readText } from "./arguments";
import type { Cell } from "./cell";
import { FIRST_CHOICE } from "./set";
import { type Substance, substanceOf } from "./substance";
import { readWall } from "./vessel-wall";
import { water } from "./steam";

const VOLUME: Expected = { name: "Volume", unit: "m3", example: '"2 L"' };
const MASS: Expected = { name: "Mass of water", unit: "kg", example: '"1.2 kg"' };
const FIRST: Expected = { name: "Temperature T1", unit: "K", example: '"20 °C"' };
const SECOND: Expected = { name: "Temperature T2", unit: "K", example: '"180 °C"' };
const PARTIAL: Expected = { name: "Partial pressure of the gas", unit: "Pa", example: '"101325 Pa air"' };
const EXPANSION: Expected = { name: "Wall expansion", unit: "1/K", example: '"36e-6 1/K"' };

/** One state, read. */
export interface Sealed {
  readonly content: WaterContent;
  readonly T1: number;
  readonly T2: number;
  readonly wall?: HeatStore;
  readonly gas?: Gas;
  readonly limit?: PressureLimit;
  /** Relative humidity, if the water was given so. */
  readonly humidity?: number;
}

export interface Gas {
  readonly text: string;
  readonly pressure: number;
  readonly substance: Substance;
}

/** Volume, mass, T1, T2, gas, wall and expansion of one state. */
export function readSealed(
  [volumeCell, massCell, first, second, gasCell, wallCell, expansionCell]: (Cell | undefined)[],
  limit?: PressureLimit,
): Sealed {
  const volume = readQuantity(volumeCell, VOLUME);
  const [T1, T2] = [readKelvin(first, FIRST), readKelvin(second, SECOND)];
  const humidity = humidityOf(massCell);
  const mass = humidity === undefined ? readQuantity(massCell, MASS) : humidity * water.saturation(T1).vapour.density * volume;
  const gas = readGas(gasCell);
  const pad = gas && { pressure: gas.pressure, capacity: gas.substance.capacity };
  const content = new WaterContent(water, { mass, volume, start: T1, expansion: readExpansion(expansionCell) }, pad);
  return { content, T1, T2, wall: readWall(wallCell), gas, limit, humidity };
}

function readKelvin(cell: Cell | undefined, expected: Expected): number {
  const temperature = readTemperature(cell, expected);
  if (typeof cell !== "number" || temperature >= iapws95.from) return temperature;
  return refuseRange(
    `${expected.name} ${printed(temperature)} K is below ${iapws95.from} K, where water freezes; for degrees Celsius write "${printed(temperature)} °C"`,
  );
}

const HUMIDITY = /^(.*?)\s*(?:relative\s+)?(?:humidity|r\.?\s?h\.?)$/i;

/** The share of saturation that a text such as "60 % humidity" tells; undefined for a mass. */
function humidityOf(cell: Cell | undefined): number | undefined {
  const text = typeof cell === "string" ? cell.trim() : "";
  const match = HUMIDITY.exec(text);
  if (!match && !text.endsWith("%")) return undefined;
  if (!match?.[1]!.endsWith("%"))
    return refuse(`Mass of water "${text}": write a mass such as "1.2 kg", or the humidity as "60 % humidity"`);
  const humidity = readFraction(match[1], "The relative humidity");
  if (humidity > 0 && humidity <= 1) return humidity;
  return refuseRange(`The relative humidity ${printed(100 * humidity)} % is not above 0 % and up to 100 %`);
}

const GAS = /^([-+\u2212]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?\s*\p{L}\S*)\s+(?:of\s+)?(\S.*)$/iu;
const DECIMAL_COMMA = /^[-+\u2212]?\d*,\d/;
const SUCH_AS = 'give its absolute partial pressure at T1 and the gas, such as "101325 Pa air"';

function readGas(cell: Cell | undefined): Gas | undefined {
  if (typeof cell === "number" && cell !== 0) return refuse(`The gas is ${quoted(cell)}: ${SUCH_AS}`);
  const text = readText(cell, "gas");
  if (text === undefined) return undefined;
  if (DECIMAL_COMMA.test(text)) parseQuantity(text); // refuses the comma
  const [, pressure, name] = GAS.exec(text) ?? refuse(`The gas is "${text}": ${SUCH_AS}`);
  const substance = substanceOf({}, name, FIRST_CHOICE);
  for (const { species, fit } of substance.parts) {
    if (fit.phase !== "g") refuse(`The gas "${text}" holds ${species}, which is not a gas`);
    if (fit.formula === "H2O") refuse(`The gas "${text}" holds water: name the dry gas, the vapour belongs to the mass of water`);
  }
  return { text, pressure: readPressure(pressure, PARTIAL), substance };
}

/** Above this, 1/K, an expansion was meant in another unit: metals have 30e-6 to 75e-6. */
const MOST_EXPANSION = 1e-3;

function readExpansion(cell: Cell | undefined): number {
  if (cell === undefined || cell === null) return 0;
  const expansion = readQuantity(cell, EXPANSION);
  if (expansion >= 0 && expansion <= MOST_EXPANSION) return expansion;
  return refuseRange(`Wall expansion ${printed(expansion)} 1/K is not from 0 to ${MOST_EXPANSION} 1/K; carbon steel has 36e-6 by volume`);
}

/**
 * Family water: water and steam by IAPWS-95, as one phase or as liquid and vapour together. By mass; the zero of energy is the liquid at the
 * triple point, not the formation from the elements.
 */
import { Refusal } from "../core/refusal";
import { molarMass, parseFormula } from "../core/species/formula";
import { requireTemperature } from "../core/water/limits";
import type { WaterState } from "../core/water/types";
import { atomicWeights } from "../data/library";
import { type Expected, readQuantity, readTemperature, readText } from "./arguments";
import { spread } from "./broadcast";
import { Block, Cell, finite } from "./cell";
import { ENERGY, HEAT_CAPACITY, inUnit, type Kind, massDivisor } from "./result-unit";
import { sealedCells } from "./water-sealed";
import { water } from "./steam";

const DENSITY: Expected = { name: "Density", unit: "kg/m3", example: '"0.8 g/cm3"' };
const PRESSURE_UNIT = 'a pressure such as "MPa"';
/** Molar mass of water, kg/mol. */
const MOLAR_MASS = molarMass(parseFormula("H2O"), atomicWeights) / 1000;

/**
 * Pressure of water in a closed space at a density (mass over volume), by IAPWS-95: of one phase, or the saturation pressure where liquid and vapour stand together.
 * @param density Mass over volume, also as text such as "0.8 g/cm3" [kg/m3] value
 * @param temperature Temperature from 273.16 K to 1273 K, also as text such as "250 °C" [K] value
 * @param unit Unit of the result, such as "MPa" [-] value
 * @returns Absolute pressure [Pa]
 * @source iapws-r6-95 iapws-r14-08
 * @example STILL.WATER.PRESSURE(838.025,500,"MPa") -> ~ 10.0003858
 * @example STILL.WATER.PRESSURE(838.025,400) -> ~ 245769
 * @example STILL.WATER.PRESSURE(1400,300) -> #VALUE! Density 1400 kg/m3 at 300 K would need 2534.16 MPa
 * @customfunction WATER.PRESSURE
 */
export function waterPressure(density: any[][], temperature: any[][], unit?: any[][]): any[][] {
  return eachWater(density, temperature, unit, ({ pressure }, text) => inUnit(pressure, text, "Pa", PRESSURE_UNIT));
}

/**
 * Heat capacity of water at constant volume, by IAPWS-95. Between the densities of liquid and vapour it is that of both phases at constant overall density, evaporation counted.
 * @param density Mass over volume, also as text such as "0.8 g/cm3" [kg/m3] value
 * @param temperature Temperature from 273.16 K to 1273 K, also as text such as "250 °C" [K] value
 * @param unit Unit of the result, such as "kJ/(kg K)" or "J/(mol K)" [-] value
 * @returns Heat capacity by mass [J/(kg K)]
 * @source iapws-r6-95 ciaaw-2021
 * @example STILL.WATER.CV(996.556,300,"kJ/(kg K)") -> ~ 4.13018112
 * @example STILL.WATER.CV(4.532,500) -> ~ 1669.91025
 * @customfunction WATER.CV
 */
export function waterCv(density: any[][], temperature: any[][], unit?: any[][]): any[][] {
  return eachWater(density, temperature, unit, ({ cv }, text) => byMass(cv, text, HEAT_CAPACITY));
}

/**
 * Internal energy of water, by IAPWS-95, zero for the liquid at the triple point. Only differences count: never to be mixed with ENERGY, whose zero is the elements.
 * @param density Mass over volume, also as text such as "0.8 g/cm3" [kg/m3] value
 * @param temperature Temperature from 273.16 K to 1273 K, also as text such as "250 °C" [K] value
 * @param unit Unit of the result, such as "kJ/kg" or "kJ/mol" [-] value
 * @returns Internal energy by mass [J/kg]
 * @source iapws-r6-95 ciaaw-2021
 * @example STILL.WATER.ENERGY(838.025,500,"kJ/kg") -> ~ 965.248
 * @example STILL.WATER.ENERGY(100,"250 °C")-STILL.WATER.ENERGY(100,"25 °C") -> ~ 1247978
 * @customfunction WATER.ENERGY
 */
export function waterEnergy(density: any[][], temperature: any[][], unit?: any[][]): any[][] {
  return eachWater(density, temperature, unit, ({ energy }, text) => byMass(energy, text, ENERGY));
}

/**
 * Saturation pressure of water over the liquid, by IAPWS-95, from the triple point, 273.16 K, to the critical point, 647.096 K.
 * @param temperature Temperature, also as text such as "100 °C" [K] value
 * @param unit Unit of the result, such as "kPa" [-] value
 * @returns Absolute pressure [Pa]
 * @source iapws-r6-95
 * @example STILL.WATER.SATURATION("100 °C","kPa") -> ~ 101.418
 * @example STILL.WATER.SATURATION(450) -> ~ 932203.564
 * @customfunction WATER.SATURATION
 */
export function waterSaturation(temperature: any[][], unit?: any[][]): any[][] {
  return spread(
    [
      ["temperature", temperature],
      ["unit", unit],
    ],
    ([temperatureCell, unitCell]) => {
      const { pressure } = water.saturation(readKelvin(temperatureCell));
      return finite(inUnit(pressure, readText(unitCell, "unit"), "Pa", PRESSURE_UNIT));
    },
  );
}

/**
 * Water heated or cooled in a sealed vessel, with a gas beside it or alone, by IAPWS-95: pressure, phases, heat, and where the liquid fills the vessel or is gone. Not a design or relief calculation.
 * @param volume Volume inside at T1, also as text such as "2 L" [m3] value
 * @param mass Mass of water, also as text such as "1.2 kg", or "60 % humidity" for vapour of that relative humidity at T1 [kg] value
 * @param T1 Temperature at which it was closed, also as text such as "20 °C" [K] value
 * @param T2 Temperature it is brought to, also as text such as "180 °C" [K] value
 * @param gas Absolute partial pressure at T1 and gas, such as "101325 Pa air"; left out, no air is counted [-] value
 * @param wall Wall that is heated with it, such as "10 kg carbon steel", or its heat capacity [J/K] value
 * @param wall_expansion Expansion of the inside volume, three times the linear one: carbon steel 36e-6; left out, the vessel is rigid [1/K] value
 * @param limit Allowed absolute pressure, also as text such as "20 bar", or two columns temperature and allowed pressure [Pa] block
 * @returns One state: label, value, unit, note; a column of states: heading row, then a row for each [-]
 * @lines mass of water | volume | gas | amount of gas | pressure at T1 | pressure at T2 | phase at T1 | phase at T2 | vapour fraction at T2 | liquid at T2 | saturation pressure at T2 | partial pressure of gas at T2 | heat into water | heat into gas | heat into wall | heat in all | liquid-full at | heat from T1 to liquid-full | dew temperature | pressure per kelvin at T2 | limit | pressure at T2 / limit | temperature at limit | holds for
 * @source iapws-r6-95 iapws-r14-08 nasa-2002
 * @example INDEX(STILL.WATER.SEALED("2 L","1.2 kg","20 °C","180 °C","101325 Pa air","10 kg carbon steel",,"20 bar"),6,2) -> ~ 1194741
 * @example INDEX(STILL.WATER.SEALED("1 L","0.9 kg","20 °C","150 °C"),17,2) -> ~ 440.643
 * @example INDEX(STILL.WATER.SEALED(1,"60 % humidity","30 °C","5 °C","101325 Pa air"),19,2) -> ~ 294.05
 * @example STILL.WATER.SEALED("1 L","0.999 kg","20 °C","60 °C","101325 Pa air") -> #VALUE! 0.999 kg of water take up
 * @customfunction WATER.SEALED
 */
export function waterSealed(
  volume: any[][],
  mass: any[][],
  T1: any[][],
  T2: any[][],
  gas?: any[][],
  wall?: any[][],
  wall_expansion?: any[][],
  limit?: any[][],
): any[][] {
  return sealedCells({ volume, mass, T1, T2, gas, wall, expansion: wall_expansion, limit });
}

/** A number of the stable state for each density and temperature. */
function eachWater(density: Block, temperature: Block, unit: Block | undefined, each: (state: WaterState, unit?: string) => number): Block {
  return spread(
    [
      ["density", density],
      ["temperature", temperature],
      ["unit", unit],
    ],
    ([densityCell, temperatureCell, unitCell]) => {
      const ratio = readQuantity(densityCell, DENSITY);
      return finite(each(water.state(readKelvin(temperatureCell), ratio), readText(unitCell, "unit")));
    },
  );
}

function byMass(value: number, text: string | undefined, kind: Kind): number {
  return value / massDivisor(text, kind, MOLAR_MASS);
}

/** A temperature, K, within the limits of the formulation; a plain number below them is refused with a reminder of °C. */
function readKelvin(cell: Cell | undefined): number {
  const temperature = readTemperature(cell);
  if (temperature >= water.constants.from || typeof cell !== "number") return temperature;
  try {
    requireTemperature(water.constants, temperature);
  } catch (thrown) {
    if (!(thrown instanceof Refusal)) throw thrown;
    throw new Refusal(thrown.kind, `${thrown.message}; for degrees Celsius write "${Number(temperature.toPrecision(6))} °C"`);
  }
  return temperature;
}

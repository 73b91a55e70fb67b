/** Family vessel: warming and cooling, thermal inertia, vessels full of liquid, stored energy. */
import { REFERENCE_TEMPERATURE } from "../core/constants";
import { highestSynthesisTemperature, thermalInertia } from "../core/vessel/thermal-inertia";
import { warmUpTemperature, warmUpTime } from "../core/vessel/warm-up";
import { type Expected, FROM, readFraction, readNumber, readQuantity, readTemperature, readText, TO } from "./arguments";
import { spread } from "./broadcast";
import { finite } from "./cell";
import { refuse } from "../core/refusal";
import { type Measured, readMeasured } from "./laboratory";
import { liquidFullCells } from "./liquid-full";
import { inUnit } from "./result-unit";
import { storedCells } from "./stored";
import { readWall } from "./vessel-wall";
import { overContents, readWarming } from "./warm-up";

const TIME: Expected = { name: "Time", unit: "s", example: '"90 min"' };
const ADIABATIC_RISE: Measured = { name: "Adiabatic rise", unit: "K", example: '"120 K"', interval: true, least: "zero" };

/**
 * Time in which a constant power, less a loss to the surroundings, warms a vessel to a temperature; power 0 lets it cool. C dT/dt = P - UA (T - Ta), C by temperature where it is known; all at one temperature.
 * @param contents All that is warmed: heat capacity, text such as "60 kg carbon steel + 2 mol N2" or "0.2 kg at 2.1 kJ/(kg K)", or a block material and amount; solids and liquids by Cp [J/K] value
 * @param power Power, also as text such as "2 kW"; 0 for cooling [W] value
 * @param loss Loss to the surroundings for each kelvin above them, U times A; 0 for none [W/K] value
 * @param ambient Temperature of the surroundings, also as text such as "25 °C" [K] value
 * @param from First temperature, also as text such as "25 °C" [K] value
 * @param to Second temperature, also as text such as "100 °C" [K] value
 * @param set Set id such as "nasa-2002" or a coefficient block, for species among the contents [-] value
 * @returns Time [s]
 * @source thermodynamics en-1993-1-2
 * @example STILL.VESSEL.WARMUP("30 kJ/K",500,2,"25 °C","25 °C","100 °C") -> ~ 5350
 * @example STILL.VESSEL.WARMUP(30000,500,0,298.15,298.15,373.15) -> ~ 4500
 * @example STILL.VESSEL.WARMUP("30 kJ/K",500,2,"25 °C","25 °C","300 °C") -> #VALUE! Temperature to 573.15 K is not reached from 298.15 K: with 500 W, and a loss of 2 W/K to 298.15 K, the temperature tends to T_max = 548.15 K
 * @customfunction VESSEL.WARMUP
 */
export function vesselWarmup(
  contents: any[][],
  power: any[][],
  loss: any[][],
  ambient: any[][],
  from: any[][],
  to: any[][],
  set?: any[][],
): any[][] {
  return overContents(
    contents,
    set,
    [
      ["power", power],
      ["loss", loss],
      ["ambient", ambient],
      ["from", from],
      ["to", to],
    ],
    (store, [powerCell, lossCell, ambientCell, first, second]) =>
      warmUpTime(store, readWarming(powerCell, lossCell, ambientCell), readTemperature(first, FROM), readTemperature(second, TO)),
  );
}

/**
 * Temperature of a vessel that a constant power, less a loss to the surroundings, has warmed for a time; power 0 lets it cool. C dT/dt = P - UA (T - Ta), C by temperature where it is known; all at one temperature.
 * @param contents All that is warmed: heat capacity, text such as "60 kg carbon steel + 2 mol N2" or "0.2 kg at 2.1 kJ/(kg K)", or a block material and amount; solids and liquids by Cp [J/K] value
 * @param power Power, also as text such as "2 kW"; 0 for cooling [W] value
 * @param loss Loss to the surroundings for each kelvin above them, U times A; 0 for none [W/K] value
 * @param ambient Temperature of the surroundings, also as text such as "25 °C" [K] value
 * @param from First temperature, also as text such as "25 °C" [K] value
 * @param time Time, also as text such as "90 min" [s] value
 * @param unit Unit of the result, such as "°C" [-] value
 * @param set Set id such as "nasa-2002" or a coefficient block, for species among the contents [-] value
 * @returns Temperature [K]
 * @source thermodynamics en-1993-1-2
 * @example STILL.VESSEL.WARMTEMP("30 kJ/K",500,2,"25 °C","25 °C","5350 s","°C") -> ~ 100.0
 * @example STILL.VESSEL.WARMTEMP(30000,0,2,298.15,373.15,0) -> 373.15
 * @customfunction VESSEL.WARMTEMP
 */
export function vesselWarmtemp(
  contents: any[][],
  power: any[][],
  loss: any[][],
  ambient: any[][],
  from: any[][],
  time: any[][],
  unit?: any[][],
  set?: any[][],
): any[][] {
  return overContents(
    contents,
    set,
    [
      ["power", power],
      ["loss", loss],
      ["ambient", ambient],
      ["from", from],
      ["time", time],
      ["unit", unit],
    ],
    (store, [powerCell, lossCell, ambientCell, first, timeCell, unitCell]) => {
      const warming = readWarming(powerCell, lossCell, ambientCell);
      const temperature = warmUpTemperature(store, warming, readTemperature(first, FROM), readQuantity(timeCell, TIME));
      return inUnit(temperature, readText(unitCell, "unit"), "K", 'a temperature such as "°C"');
    },
  );
}

/**
 * Thermal inertia phi = 1 + C(wall)/C(contents) at one temperature. Vaporisation is ignored: a liquid that partly evaporates takes up some per cent more (2 to 7 % at 60 % fill, from memory).
 * @param contents Heat capacity, text such as "2 mol N2" or "0.2 kg at 2.1 kJ/(kg K)", or a block material and amount; gases by Cv, solids and liquids by Cp [J/K] value
 * @param wall Wall that shares the heat: text such as "60 kg carbon steel", or heat capacity [J/K] value
 * @param temperature Temperature of both, also as text such as "60 °C"; 298.15 K if left out [K] value
 * @param set Set id such as "nasa-2002" or a coefficient block, for species among the contents [-] value
 * @returns Thermal inertia [-]
 * @source thermal-hazard thermodynamics en-1993-1-2
 * @example STILL.VESSEL.PHI("0.2 kg at 2.1 kJ/(kg K)","1 kg austenitic stainless steel") -> ~ 2.09
 * @example STILL.VESSEL.PHI("1 kJ/K",500) -> 1.5
 * @customfunction VESSEL.PHI
 */
export function vesselPhi(contents: any[][], wall: any[][], temperature?: any[][], set?: any[][]): any[][] {
  return overContents(
    contents,
    set,
    [
      ["wall", wall],
      ["temperature", temperature],
    ],
    (store, [wallCell, cell]) => {
      const at = cell === undefined || cell === null ? REFERENCE_TEMPERATURE : readTemperature(cell);
      const around = readWall(wallCell) ?? refuse('The wall is missing: give a text such as "60 kg carbon steel", or a number in J/K');
      return thermalInertia(store, around, at);
    },
  );
}

/**
 * Highest temperature of a synthesis reaction after a failure of cooling, MTSR = T + accumulation x phi x rise. No second reaction and no vaporisation; not a design or relief calculation.
 * @param temperature Process temperature, also as text such as "60 °C" [K] value
 * @param adiabatic_rise Rise for all the reactants, a difference: "120 K" and "120 °C" are the same; adiabatic, or as seen with the phi given [K] value
 * @param accumulation Share of the reactants that has not reacted yet, 0 to 1, also as text such as "30 %"; 1 if left out [-] value
 * @param phi Thermal inertia of the vessel in which the rise was seen; 1 if left out, for an adiabatic rise [-] value
 * @returns Temperature [K]
 * @source thermal-hazard
 * @example STILL.VESSEL.MTSR("60 °C",120,"30 %") -> ~ 369.15
 * @example STILL.VESSEL.MTSR(333.15,"120 °C",0.3,1.2) -> ~ 376.35
 * @customfunction VESSEL.MTSR
 */
export function vesselMtsr(temperature: any[][], adiabatic_rise: any[][], accumulation?: any[][], phi?: any[][]): any[][] {
  return spread(
    [
      ["temperature", temperature],
      ["adiabatic_rise", adiabatic_rise],
      ["accumulation", accumulation],
      ["phi", phi],
    ],
    ([cell, rise, share, inertia]) =>
      finite(
        highestSynthesisTemperature({
          temperature: readTemperature(cell),
          rise: readMeasured(rise, ADIABATIC_RISE),
          accumulation: share === undefined || share === null ? 1 : readFraction(share, "Accumulation"),
          phi: inertia === undefined || inertia === null ? 1 : readNumber(inertia, "Thermal inertia phi"),
        }),
      ),
  );
}

/**
 * Pressure rise of a vessel quite full of liquid, no gas: (expansion - wall)/(compressibility + D/(t E)), integrated. Takes the liquid as at the starting pressure; not a design or relief calculation: the vessel's own rating governs.
 * @param expansion Volumetric expansion of the liquid, also as text such as "210e-6 1/K"; it may double in 20 K: give two columns temperature and value [1/K] value
 * @param compressibility Isothermal compressibility of the liquid, also as text such as "0.0004 1/MPa", or two columns temperature and value [1/Pa] value
 * @param T1 Temperature at which the vessel is just full, also as text such as "25 °C" [K] value
 * @param T2 Second temperature, also as text such as "60 °C"; below T1 the result is negative, and the liquid boils or a bubble forms before it falls that far [K] value
 * @param wall_expansion Volumetric expansion of the wall, three times the linear one, "36e-6 1/K" for carbon steel; 0 if left out, which gives a higher pressure [1/K] value
 * @param diameter_to_thickness Diameter to wall thickness of a thin cylinder; left out, the wall is rigid, which gives a higher pressure [-] value
 * @param modulus Modulus of elasticity of the wall, such as "200 GPa" for carbon steel; needed with diameter_to_thickness [Pa] value
 * @returns Pressure rise [Pa]
 * @source liquid-full
 * @example STILL.VESSEL.LIQUIDFULL("210e-6 1/K","0.0004 1/MPa",298.15,299.15,"36e-6 1/K") -> ~ 435000
 * @example STILL.VESSEL.LIQUIDFULL(0.00021,4e-10,298.15,299.15,0.000036,10,"200 GPa") -> ~ 387000
 * @example STILL.VESSEL.LIQUIDFULL(0.00021,0.0004,298.15,299.15) -> #VALUE! Compressibility 0.0004 is a plain number and would be in 1/Pa: say it with its unit, such as "0.0004 1/MPa"
 * @customfunction VESSEL.LIQUIDFULL
 */
export function vesselLiquidfull(
  expansion: any[][],
  compressibility: any[][],
  T1: any[][],
  T2: any[][],
  wall_expansion?: any[][],
  diameter_to_thickness?: any[][],
  modulus?: any[][],
): any[][] {
  return liquidFullCells(expansion, compressibility, T1, T2, wall_expansion, diameter_to_thickness, modulus);
}

/**
 * Energy stored in a compressed gas by four usual definitions, and its TNT equivalent. Ideal gas of constant gamma; says nothing on fragments, liquids or reaction. Not a design or relief calculation.
 * @param pressure Absolute pressure, also as text such as "100 bar" [Pa] value
 * @param volume Volume of the vessel, also as text such as "50 L" [m3] value
 * @param gamma Ratio of the heat capacities of the gas, above 1, as GAMMA gives it [-] value
 * @param ambient Absolute pressure of the surroundings, also as text such as "985 mbar"; 101325 Pa if left out [Pa] value
 * @returns One state: label, value, unit, note; a column of states: heading row, then a row for each [-]
 * @lines Brode | isentropic expansion | isentropic, less work on the air | isothermal bound | TNT equivalent | caution | holds for
 * @source brode-1959 stored-energy codata-2022
 * @example INDEX(STILL.VESSEL.STORED("100 bar","50 L",1.4),1,2) -> ~ 1.24e6
 * @example INDEX(STILL.VESSEL.STORED("100 bar","50 L",1.4),5,2) -> ~ 0.218
 * @customfunction VESSEL.STORED
 */
export function vesselStored(pressure: any[][], volume: any[][], gamma: any[][], ambient?: any[][]): any[][] {
  return storedCells(pressure, volume, gamma, ambient);
}

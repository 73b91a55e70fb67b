/** Family vessel: gases in closed vessels, warming and cooling, thermal inertia, vessels full of liquid, stored energy. */
import { REFERENCE_TEMPERATURE } from "../core/constants";
import { highestSynthesisTemperature, thermalInertia } from "../core/vessel/thermal-inertia";
import { warmUpTemperature, warmUpTime } from "../core/vessel/warm-up";
import { readAccumulation } from "./accumulation";
import { type Expected, FROM, readNumber, readQuantity, readTemperature, readText, TO } from "./arguments";
import { spread } from "./broadcast";
import { finite } from "./cell";
import { refuse } from "../core/refusal";
import { type Measured, readMeasured } from "./laboratory";
import { liquidFullCells } from "./liquid-full";
import { inUnit } from "./result-unit";
import { storedCells } from "./stored";
import { amountCells, compressibilityCells, cvCells, finalPressureCells, finalTemperatureCells, pressureCells } from "./vessel-gas";
import { vesselCells } from "./vessel-report";
import { readWall } from "./vessel-wall";
import { overContents, readWarming } from "./warm-up";

const TIME: Expected = { name: "Time", unit: "s", example: '"90 min"' };
const ADIABATIC_RISE: Measured = { name: "Adiabatic rise", unit: "K", example: '"120 K"', interval: true, least: "zero" };

/**
 * Amount of gas in a closed vessel at a temperature and absolute pressure. Ideal gas where it is close enough, or by the equation named. Not a design or relief calculation.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param volume Inside volume, also as text such as "50 L" [m3] value
 * @param temperature Temperature, also as text such as "15 °C" [K] value
 * @param pressure Absolute pressure, also as text such as "200 bar" [Pa] value
 * @param unit Unit of the result, an amount or a mass, such as "kg" [-] value
 * @param model "peng-robinson", "soave" or "ideal"; left out, the ideal gas where both equations differ by less than 1 %, else refused with both [-] value
 * @returns Amount [mol]
 * @source peng-robinson-1976 soave-1972 poling-2001
 * @example STILL.VESSEL.AMOUNT("N2","50 L","15 °C","200 bar",,"peng-robinson") -> ~ 410.04
 * @example STILL.VESSEL.AMOUNT("N2","50 L","15 °C","1 bar","g") -> ~ 58.46
 * @example STILL.VESSEL.AMOUNT("N2","50 L","15 °C","200 bar") -> #VALUE! For N2 at 288.15 K the ideal gas gives 20000000 Pa, Peng-Robinson 20406400 Pa (2 % more): name the model
 * @customfunction VESSEL.AMOUNT
 */
export function vesselAmount(
  substance: any[][],
  volume: any[][],
  temperature: any[][],
  pressure: any[][],
  unit?: any[][],
  model?: any[][],
): any[][] {
  return amountCells(substance, { volume, temperature, pressure, unit, model });
}

/**
 * Absolute pressure of an amount of gas in a closed vessel, by the ideal gas where it is close enough or by the equation named. Not a design or relief calculation; the vessel's own rating governs.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param amount Amount, also as text such as "60 g" [mol] value
 * @param volume Inside volume, also as text such as "50 L" [m3] value
 * @param temperature Temperature, also as text such as "50 °C" [K] value
 * @param unit Unit of the result, such as "bar" [-] value
 * @param model "peng-robinson", "soave" or "ideal"; left out, the ideal gas where both equations differ by less than 1 %, else refused with both [-] value
 * @returns Absolute pressure [Pa]
 * @source peng-robinson-1976 soave-1972 poling-2001
 * @example STILL.VESSEL.PRESSURE("N2","2 mol","10 L",300,"bar") -> ~ 4.989
 * @example STILL.VESSEL.PRESSURE("CO2","1 kg","10 L","25 °C","bar","peng-robinson") -> ~ 41.39
 * @example STILL.VESSEL.PRESSURE("CO2","7.5 kg","10 L","15 °C","bar","peng-robinson") -> #VALUE! At 288.15 K CO2 at this density is liquid beside vapour
 * @customfunction VESSEL.PRESSURE
 */
export function vesselPressure(
  substance: any[][],
  amount: any[][],
  volume: any[][],
  temperature: any[][],
  unit?: any[][],
  model?: any[][],
): any[][] {
  return pressureCells(substance, { amount, volume, temperature, unit, model });
}

/**
 * Compressibility factor Z = P V/(n R T) of a gas at a temperature and absolute pressure. Without a model it is 1 where the ideal gas is close enough, and refused elsewhere.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param temperature Temperature, also as text such as "15 °C" [K] value
 * @param pressure Absolute pressure, also as text such as "200 bar" [Pa] value
 * @param model "peng-robinson", "soave" or "ideal"; left out, the ideal gas where both equations differ by less than 1 %, else refused with both [-] value
 * @returns Compressibility factor [-]
 * @source peng-robinson-1976 soave-1972 poling-2001
 * @example STILL.VESSEL.COMPRESSIBILITY("CO2","25 °C","976245.55 Pa","peng-robinson") -> ~ 0.945
 * @example STILL.VESSEL.COMPRESSIBILITY("N2","15 °C","1 bar") -> 1
 * @customfunction VESSEL.COMPRESSIBILITY
 */
export function vesselCompressibility(substance: any[][], temperature: any[][], pressure: any[][], model?: any[][]): any[][] {
  return compressibilityCells(substance, { temperature, pressure, model });
}

/**
 * Heat capacity at constant volume of a gas in a closed vessel: of the ideal gas, with the part that its density adds by the equation named.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param amount Amount, also as text such as "60 g" [mol] value
 * @param volume Inside volume, also as text such as "50 L" [m3] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param unit Unit of the result, molar or by mass, such as "kJ/(kg K)" [-] value
 * @param model "peng-robinson", "soave" or "ideal"; left out, the ideal gas where both equations differ by less than 1 %, else refused with both [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Cv [J/(mol K)]
 * @source nasa-2002 peng-robinson-1976 soave-1972
 * @example STILL.VESSEL.CV("N2",1,"0.1 L",298.15,,"peng-robinson") -> ~ 22.76
 * @example STILL.VESSEL.CV("N2",1,"30 L",298.15) -> ~ 20.81
 * @customfunction VESSEL.CV
 */
export function vesselCv(
  substance: any[][],
  amount: any[][],
  volume: any[][],
  temperature: any[][],
  unit?: any[][],
  model?: any[][],
  set?: any[][],
): any[][] {
  return cvCells(substance, set, { amount, volume, temperature, unit, model });
}

/**
 * Absolute pressure of a gas heated or cooled in a closed vessel from T1 and P1 to T2, at constant density and composition. Not a design or relief calculation; the vessel's own rating governs.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param T1 Temperature at which it was filled, also as text such as "15 °C" [K] value
 * @param P1 Absolute pressure at T1, also as text such as "200 bar" [Pa] value
 * @param T2 Temperature that is asked for, also as text such as "50 °C" [K] value
 * @param unit Unit of the result, such as "bar" [-] value
 * @param model "peng-robinson", "soave" or "ideal"; left out, the ideal gas where both equations differ by less than 1 %, else refused with both [-] value
 * @returns Absolute pressure at T2 [Pa]
 * @source peng-robinson-1976 soave-1972 poling-2001
 * @example STILL.VESSEL.FINALPRESSURE("N2","15 °C","200 bar","300 °C","bar","peng-robinson") -> ~ 467
 * @example STILL.VESSEL.FINALPRESSURE("N2","15 °C","200 bar","300 °C","bar","ideal") -> ~ 397.81
 * @customfunction VESSEL.FINALPRESSURE
 */
export function vesselFinalpressure(substance: any[][], T1: any[][], P1: any[][], T2: any[][], unit?: any[][], model?: any[][]): any[][] {
  return finalPressureCells(substance, { T1, P1, T2, unit, model });
}

/**
 * Temperature of a closed vessel with gas and wall that has taken up a heat, negative if given off. Composition frozen, no heat lost; not a design or relief calculation.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param volume Inside volume, also as text such as "50 L" [m3] value
 * @param T1 Temperature before, also as text such as "15 °C" [K] value
 * @param charge Absolute pressure at T1, or a text with an amount such as "60 g" or "2 mol" [Pa] value
 * @param heat Heat into gas and wall, also as text such as "12 kJ" [J] value
 * @param wall Wall that is heated too, such as "60 kg carbon steel", or its heat capacity in J/K [J/K] value
 * @param unit Unit of the result, such as "°C" [-] value
 * @param model "peng-robinson", "soave" or "ideal"; left out, the ideal gas where both equations differ by less than 1 %, else refused with both [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Temperature after [K]
 * @source nasa-2002 peng-robinson-1976 soave-1972
 * @example STILL.VESSEL.FINALTEMP("N2","10 L",300,"2 mol","20 kJ") -> ~ 763.70
 * @example STILL.VESSEL.FINALTEMP("N2","10 L",300,"2 mol","20 kJ","1 kJ/K") -> ~ 319.2
 * @customfunction VESSEL.FINALTEMP
 */
export function vesselFinaltemp(
  substance: any[][],
  volume: any[][],
  T1: any[][],
  charge: any[][],
  heat: any[][],
  wall?: any[][],
  unit?: any[][],
  model?: any[][],
  set?: any[][],
): any[][] {
  return finalTemperatureCells(substance, set, { volume, T1, charge, heat, wall, unit, model });
}

/**
 * Time in which a vessel is warmed to a temperature by a constant power, less a loss to the surroundings; power 0 lets it cool. C dT/dt = P - UA (T - Ta), C by temperature where it is known; all at one temperature.
 * @param contents All that is warmed: heat capacity, text such as "60 kg carbon steel + 2 mol N2" or "0.2 kg at 2.1 kJ/(kg K)", or a block material and amount; solids and liquids by Cp, metals below their curve by its lowest value, to 223 K [J/K] value
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
 * Temperature that a vessel has after a time of constant power, less a loss to the surroundings; power 0 lets it cool. C dT/dt = P - UA (T - Ta), C by temperature where it is known; all at one temperature.
 * @param contents All that is warmed: heat capacity, text such as "60 kg carbon steel + 2 mol N2" or "0.2 kg at 2.1 kJ/(kg K)", or a block material and amount; solids and liquids by Cp, metals below their curve by its lowest value, to 223 K [J/K] value
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
 * @param wall Wall that shares the heat: text such as "60 kg carbon steel", or heat capacity; metals below their curve by its lowest value, to 223 K [J/K] value
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
 * @param accumulation Share of the reactants that has not reacted yet, above 0 up to 1, also as text such as "30 %"; 1 if left out [-] value
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
          accumulation: readAccumulation(share),
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
 * @example STILL.VESSEL.LIQUIDFULL(0.00021,4E-10,298.15,299.15,0.000036,10,"200 GPa") -> ~ 386667
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
 * What it takes to bring a closed vessel with gas from T1 to T2: pressure, heat into contents and wall, the ideal gas beside the model, and the vessel's own limit. Frozen composition; not a design or relief calculation.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param volume Inside volume, also as text such as "50 L" [m3] value
 * @param T1 Temperature at which it was filled, also as text such as "15 °C" [K] value
 * @param charge Absolute pressure at T1, or a text with an amount such as "60 g" or "2 mol" [Pa] value
 * @param T2 Temperature that is reached, also as text such as "50 °C" [K] value
 * @param wall Wall that is heated too, such as "60 kg carbon steel", or its heat capacity in J/K [J/K] value
 * @param model "peng-robinson", "soave" or "ideal"; left out, the ideal gas where both equations differ by less than 1 %, else refused with both [-] value
 * @param limit Absolute pressure the vessel may have, or two columns: temperature, allowed absolute pressure [Pa] block
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Table: label, value, unit, note; one row for each state if there are several [-]
 * @lines amount | mass | pressure at T1 | temperature T2 | pressure at T2 | model | phase at T1 | phase at T2 | compressibility at T1 | compressibility at T2 | ideal gas at T2 | above the ideal gas | second virial coefficient at T2 | heat into contents | heat into wall | heat | limit | pressure at T2 / limit | temperature at limit | holds for
 * @source nasa-2002 peng-robinson-1976 soave-1972 poling-2001
 * @example INDEX(STILL.VESSEL.REACH("N2","50 L","15 °C","200 bar","300 °C","60 kg carbon steel","peng-robinson","300 bar"),5,2) -> ~ 46740443
 * @example INDEX(STILL.VESSEL.REACH("air","50 L","25 °C","1 atm","400 °C","60 kg carbon steel"),5,2) -> ~ 228767
 * @customfunction VESSEL.REACH
 */
export function vesselReach(
  substance: any[][],
  volume: any[][],
  T1: any[][],
  charge: any[][],
  T2: any[][],
  wall?: any[][],
  model?: any[][],
  limit?: any[][],
  set?: any[][],
): any[][] {
  return vesselCells({ substance, volume, T1, charge, T2, wall, model, limit, set });
}

/**
 * State of a closed vessel with gas that has taken up a heat, negative if given off: temperature, pressure, the shares of contents and wall, and the vessel's own limit. Frozen composition; not a design or relief calculation.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param volume Inside volume, also as text such as "50 L" [m3] value
 * @param T1 Temperature before, also as text such as "15 °C" [K] value
 * @param charge Absolute pressure at T1, or a text with an amount such as "60 g" or "2 mol" [Pa] value
 * @param heat Heat into gas and wall, also as text such as "12 kJ" [J] value
 * @param wall Wall that is heated too, such as "60 kg carbon steel", or its heat capacity in J/K [J/K] value
 * @param model "peng-robinson", "soave" or "ideal"; left out, the ideal gas where both equations differ by less than 1 %, else refused with both [-] value
 * @param limit Absolute pressure the vessel may have, or two columns: temperature, allowed absolute pressure [Pa] block
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Table: label, value, unit, note; one row for each state if there are several [-]
 * @lines amount | mass | pressure at T1 | temperature T2 | pressure at T2 | Peng-Robinson at T2 | Peng-Robinson above the ideal gas | model | heat into contents | heat into wall | heat | holds for
 * @source nasa-2002 peng-robinson-1976 soave-1972 poling-2001
 * @example INDEX(STILL.VESSEL.ABSORB("N2","10 L",300,"2 mol","20 kJ"),4,2) -> ~ 763.70
 * @example INDEX(STILL.VESSEL.ABSORB("N2","10 L",300,"2 mol","20 kJ"),5,2) -> ~ 1269949
 * @customfunction VESSEL.ABSORB
 */
export function vesselAbsorb(
  substance: any[][],
  volume: any[][],
  T1: any[][],
  charge: any[][],
  heat: any[][],
  wall?: any[][],
  model?: any[][],
  limit?: any[][],
  set?: any[][],
): any[][] {
  return vesselCells({ substance, volume, T1, charge, heat, wall, model, limit, set });
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

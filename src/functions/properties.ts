/**
 * Family properties: heat capacity at constant volume and what belongs to it, at a temperature or between two.
 * Gases are ideal: Cv = Cp − R and U = H − RT, with the gas constant the fit was made with.
 */
import { STANDARD_PRESSURE } from "../core/constants";
import { classicalLimits } from "../core/capacity/limits";
import type { Capacity } from "../core/capacity/capacity";
import { Refusal, refuse } from "../core/refusal";
import { molarMass as massOf, parseFormula } from "../core/species/formula";
import { atomicWeights } from "../data/library";
import { shapeOf } from "../data/shape";
import { FROM, PRESSURE, readPressure, readTemperature, readText, TO } from "./arguments";
import { spread, spreadRows } from "./broadcast";
import { Cell, cells } from "./cell";
import { isComposition } from "./composition";
import { Property, property, valueAt } from "./property";
import { registry } from "./registry";
import { ENERGY, HEAT_CAPACITY, inUnit, Kind, molarDivisor } from "./result-unit";
import { FIRST_CHOICE } from "./set";
import { eachState } from "./states";
import { Substance, substanceArgument, substanceOf } from "./substance";

const CV: Property = { at: (capacity, temperature) => capacity.cv(temperature), kind: HEAT_CAPACITY, check: refuseLiquid };
const CP: Property = { at: (capacity, temperature) => capacity.cp(temperature), kind: HEAT_CAPACITY };
const U: Property = { at: (capacity, temperature) => capacity.energy(temperature), kind: ENERGY, check: requireFormation };
const H: Property = { at: (capacity, temperature) => capacity.enthalpy(temperature), kind: ENERGY, check: requireFormation };

/** The Cv of a liquid is not its Cp, and no set of the library holds it. */
function refuseLiquid({ label, parts }: Substance): void {
  if (!parts.some(({ fit }) => fit.phase === "l")) return;
  refuse(`${label} is liquid, and the Cv of a liquid is not its Cp; use CP.AT${registry.has("WATER.CV") ? ", or WATER.CV for water" : ""}`);
}

function requireFormation({ label, capacity, parts }: Substance): void {
  if (capacity.onFormationScale) return;
  const sets = [
    ...new Set(parts.filter(({ fit }) => fit.onFormationScale === false || fit.formationEnthalpy === null).map(({ fit }) => fit.set)),
  ];
  refuse(`No formation enthalpy of ${label} is known in ${sets.join(", ")}; differences between two temperatures are (CV.INTEGRAL, HEAT)`);
}

function requireEntropy({ label, capacity, parts }: Substance): void {
  if (!capacity.hasEntropy) refuse(`No entropy of ${label} is known in ${[...new Set(parts.map(({ fit }) => fit.set))].join(", ")}`);
}

function requireGas({ label, parts }: Substance, name: string): void {
  if (parts.some(({ fit }) => fit.phase !== "g")) refuse(`${name} is for gases; ${label} holds a liquid or a solid`);
}

/**
 * True heat capacity at constant volume, Cv, at one temperature. Ideal gas: Cv = Cp - R; solid: Cv = Cp taken; liquids are refused.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param unit Unit of the result, molar or by mass, such as "kJ/(kg K)" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Heat capacity at constant volume [J/(mol K)]
 * @source nasa-2002
 * @example STILL.CV.AT("N2",298.15) -> ~ 20.810
 * @example STILL.CV.AT("N2","25 °C","kJ/(kg K)") -> ~ 0.7428
 * @example STILL.CV.AT("H2O(l)",300) -> #VALUE! H2O(l) is liquid, and the Cv of a liquid is not its Cp; use CP.AT
 * @customfunction CV.AT
 */
export function cvAt(substance: any[][], temperature: any[][], unit?: any[][], set?: any[][]): any[][] {
  return property(CV, substance, temperature, unit, set);
}

/**
 * Heat capacity at constant pressure, Cp, at one temperature.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param unit Unit of the result, molar or by mass, such as "kJ/(kg K)" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Heat capacity at constant pressure [J/(mol K)]
 * @source nasa-2002
 * @example STILL.CP.AT("N2",298.15) -> ~ 29.124
 * @example STILL.CP.AT("H2O(l)",298.15) -> ~ 75.35
 * @customfunction CP.AT
 */
export function cpAt(substance: any[][], temperature: any[][], unit?: any[][], set?: any[][]): any[][] {
  return property(CP, substance, temperature, unit, set);
}

/**
 * Ratio of the heat capacities Cp/Cv of an ideal gas at one temperature. Solids and liquids are refused.
 * @param substance Gas such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Ratio of the heat capacities [-]
 * @source nasa-2002
 * @example STILL.GAMMA("Ar",300) -> ~ 1.66667
 * @example STILL.GAMMA("air",300) -> ~ 1.400
 * @customfunction GAMMA
 */
export function gamma(substance: any[][], temperature: any[][], set?: any[][]): any[][] {
  return eachState(substance, set, [["temperature", temperature]], (found, [cell]) => {
    requireGas(found, "GAMMA");
    return valueAt(found.capacity, readTemperature(cell), (capacity, at) => capacity.cp(at) / capacity.cv(at));
  });
}

/**
 * Mean heat capacity at constant volume between two temperatures, (U2 - U1)/(T2 - T1); equal temperatures give the true Cv. Liquids are refused.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param from First temperature, also as text such as "25 °C" [K] value
 * @param to Second temperature, also as text such as "800 °C" [K] value
 * @param unit Unit of the result, molar or by mass, such as "kJ/(kg K)" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Mean heat capacity at constant volume [J/(mol K)]
 * @source nasa-2002
 * @example STILL.CV.MEAN("N2",298.15,1500) -> ~ 23.64
 * @example STILL.CV.MEAN("Ar",300,300) -> ~ 12.472
 * @customfunction CV.MEAN
 */
export function cvMean(substance: any[][], from: any[][], to: any[][], unit?: any[][], set?: any[][]): any[][] {
  return eachState(
    substance,
    set,
    [
      ["from", from],
      ["to", to],
      ["unit", unit],
    ],
    (found, [first, second, unitCell]) => {
      refuseLiquid(found);
      const [start, end] = [readTemperature(first, FROM), readTemperature(second, TO)];
      const mean = start === end ? valueAt(found.capacity, start, CV.at) : energyChange(found.capacity, start, end) / (end - start);
      return divided(mean, unitCell, HEAT_CAPACITY, found);
    },
  );
}

/**
 * Integral of Cv between two temperatures: the change of internal energy U2 - U1 of one mole at constant volume, positive when heated.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param from First temperature, also as text such as "25 °C" [K] value
 * @param to Second temperature, also as text such as "800 °C" [K] value
 * @param unit Unit of the result, molar or by mass, such as "kJ/mol" or "kJ/kg" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Change of internal energy [J/mol]
 * @source nasa-2002
 * @example STILL.CV.INTEGRAL("N2",298.15,1000,"kJ/mol") -> ~ 15.627
 * @example STILL.CV.INTEGRAL("air",300,1000,"kJ/kg") -> ~ 545.12
 * @customfunction CV.INTEGRAL
 */
export function cvIntegral(substance: any[][], from: any[][], to: any[][], unit?: any[][], set?: any[][]): any[][] {
  return eachState(
    substance,
    set,
    [
      ["from", from],
      ["to", to],
      ["unit", unit],
    ],
    (found, [first, second, unitCell]) =>
      divided(energyChange(found.capacity, readTemperature(first, FROM), readTemperature(second, TO)), unitCell, ENERGY, found),
  );
}

/**
 * The classical values of Cv of an ideal gas by equipartition: first with the vibrations frozen, then with the vibrations fully excited.
 * @param substance Gas such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param unit Unit of the results, molar or by mass, such as "kJ/(kg K)" [-] value
 * @returns Two cells side by side: vibrations frozen, vibrations fully excited [J/(mol K)]
 * @source thermodynamics
 * @example STILL.CV.LIMITS("N2") -> ~ {20.786,29.101}
 * @example STILL.CV.LIMITS("Ar") -> ~ {12.4717,12.4717}
 * @customfunction CV.LIMITS
 */
export function cvLimits(substance: any[][], unit?: any[][]): any[][] {
  return cells(() => {
    const argument = substanceArgument(substance);
    return spreadRows(
      [
        ["substance", argument.texts],
        ["unit", unit],
      ],
      2,
      ([text, unitCell]) => {
        const found = substanceOf(argument, text, FIRST_CHOICE);
        requireGas(found, "CV.LIMITS");
        const limits = found.parts.map(({ fit, fraction }) => ({ fraction, ...classicalLimits(fit.molecular ?? shapeOf(fit)) }));
        return (["frozen", "excited"] as const).map((which) =>
          divided(
            limits.reduce((sum, part) => sum + part.fraction * part[which], 0),
            unitCell,
            HEAT_CAPACITY,
            found,
          ),
        );
      },
    );
  });
}

/**
 * Molar internal energy U with the formation enthalpy in it: ideal gas U = H - RT; solids and liquids U = H, the product pV neglected.
 * @param substance Species such as "CO2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param unit Unit of the result, molar or by mass, such as "kJ/mol" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Internal energy [J/mol]
 * @source nasa-2002
 * @example STILL.ENERGY("N2",298.15,"kJ/mol") -> ~ -2.479
 * @example STILL.ENERGY("CO2",298.15,"kJ/mol") -> ~ -395.99
 * @customfunction ENERGY
 */
export function energy(substance: any[][], temperature: any[][], unit?: any[][], set?: any[][]): any[][] {
  return property(U, substance, temperature, unit, set);
}

/**
 * Molar enthalpy H with the formation enthalpy in it: elements in their reference state have H = 0 at 298.15 K.
 * @param substance Species such as "CO2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param unit Unit of the result, molar or by mass, such as "kJ/mol" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Enthalpy [J/mol]
 * @source nasa-2002
 * @example STILL.ENTHALPY("CO2",298.15,"kJ/mol") -> ~ -393.51
 * @example STILL.ENTHALPY("H2O(l)",298.15,"kJ/mol") -> ~ -285.83
 * @customfunction ENTHALPY
 */
export function enthalpy(substance: any[][], temperature: any[][], unit?: any[][], set?: any[][]): any[][] {
  return property(H, substance, temperature, unit, set);
}

/**
 * Molar entropy at a temperature and pressure; ideal gases S = S°(T) - R ln(p/p°), mixtures with the entropy of ideal mixing.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param pressure Absolute pressure, also as text such as "2.5 bar"; 1 bar if left out; without effect on solids and liquids [Pa] value
 * @param unit Unit of the result, molar or by mass, such as "kJ/(kg K)" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Entropy [J/(mol K)]
 * @source nasa-2002
 * @example STILL.ENTROPY("N2",298.15) -> ~ 191.61
 * @example STILL.ENTROPY("N2",298.15,"10 bar") -> ~ 172.46
 * @customfunction ENTROPY
 */
export function entropy(substance: any[][], temperature: any[][], pressure?: any[][], unit?: any[][], set?: any[][]): any[][] {
  return eachState(
    substance,
    set,
    [
      ["temperature", temperature],
      ["pressure", pressure],
      ["unit", unit],
    ],
    (found, [cell, pressureCell, unitCell]) => {
      requireEntropy(found);
      const { capacity } = found;
      const at = pressureCell === undefined || pressureCell === null ? STANDARD_PRESSURE : readPressure(pressureCell, PRESSURE);
      const standard = valueAt(capacity, readTemperature(cell), (held, kelvin) => held.entropy(kelvin));
      return divided(standard - capacity.gasConstant * Math.log(at / capacity.standardPressure), unitCell, HEAT_CAPACITY, found);
    },
  );
}

/**
 * Molar mass of a species, a mixture or any chemical formula, from the CIAAW standard atomic weights.
 * @param substance_or_formula Species, mixture, range of species and mole fractions, or formula such as "C7H6O2" or "CuSO4.5H2O" [-] value
 * @param unit Unit of the result, such as "kg/mol" [-] value
 * @returns Molar mass [g/mol]
 * @source ciaaw-2021
 * @example STILL.MOLARMASS("H2O") -> 18.015
 * @example STILL.MOLARMASS("CuSO4.5H2O") -> ~ 249.68
 * @customfunction MOLARMASS
 */
export function molarmass(substance_or_formula: any[][], unit?: any[][]): any[][] {
  return cells(() => {
    const argument = substanceArgument(substance_or_formula);
    return spread(
      [
        ["substance", argument.texts],
        ["unit", unit],
      ],
      ([text, unitCell]) => {
        const grams = isComposition(substance_or_formula) ? undefined : formulaMass(text);
        const value = grams ?? substanceOf(argument, text, FIRST_CHOICE).molarMass * 1000;
        const wanted = readText(unitCell, "unit");
        return wanted === undefined ? value : inUnit(value / 1000, wanted, "kg/mol", 'a molar mass such as "g/mol" or "kg/mol"');
      },
    );
  });
}

/** The mass of a text that is a formula by itself, g/mol; undefined for names and mixtures. */
function formulaMass(text: Cell | undefined): number | undefined {
  if (typeof text !== "string") return undefined;
  try {
    return massOf(parseFormula(text.trim()), atomicWeights);
  } catch (thrown) {
    if (thrown instanceof Refusal) return undefined;
    throw thrown;
  }
}

/** U(end) − U(start), J/mol. */
function energyChange(capacity: Capacity, start: number, end: number): number {
  return valueAt(capacity, end, U.at) - valueAt(capacity, start, U.at);
}

function divided(value: number, unitCell: Cell | undefined, kind: Kind, { molarMass }: Substance): number {
  const divisor = molarDivisor(readText(unitCell, "unit"), kind, molarMass);
  return divisor === 1 ? value : value / divisor;
}

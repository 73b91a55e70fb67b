/** Family burn: fuels by their gross value, combustion in a closed vessel, and chemical equilibrium. */
import { readText } from "./arguments";
import { spread } from "./broadcast";
import { burnCells } from "./burn-report";
import { BurnReader, fractionOf } from "./burnt";
import { cells, finite } from "./cell";
import { AT_PRESSURE, AT_VOLUME, equilibriumCells, ISOBARIC, RIGID } from "./equilibrium";
import { speciesName } from "./formation-species";
import { grossFuelOf, grossFuelText } from "./fuel-text";
import { refuseProductWord } from "./products";
import { inUnit } from "./result-unit";

/**
 * Temperature after combustion in a closed vessel, without loss of heat: energy and volume held, products at chemical equilibrium. Not a design or relief calculation.
 * @param fuel Species such as "CH4", mixture such as "0.9 CH4 + 0.1 C2H6", text of BURN.FUEL, or a range of species and mole fractions [-] value
 * @param oxidant "air", "O2", a mixture such as "O2 + 3.76 N2" or one of MIX.HUMIDAIR, or a range of species and mole fractions [-] value
 * @param equivalence_ratio Fuel to oxidant, divided by the same where the oxygen just suffices; above 1 is rich [-] value
 * @param T0 Temperature before, also as text such as "25 °C" [K] value
 * @param P0 Absolute pressure before, also as text such as "1 atm" [Pa] value
 * @param products "equilibrium" if left out, "complete" (estimate without dissociation, not a bound; up to ratio 1), or a list of species such as "CO2 CO H2O N2" [-] value
 * @param unit Unit of the result, such as "°C" [-] value
 * @param set Set id such as "gri-1999" or a coefficient block; left out: products of nasa-2002, fuel and oxidant by first choice [-] value
 * @returns Final temperature [K]
 * @source nasa-2002 ciaaw-2021
 * @example STILL.BURN.TEMPERATURE("CH4","O2 + 3.76 N2",1,298.15,"1 atm","CO2 CO H2O H2 O2 N2 OH NO H O") -> ~ 2584.9
 * @example STILL.BURN.TEMPERATURE("CH4","O2 + 3.76 N2",1,298.15,"1 atm","complete") -> ~ 2818.2
 * @example STILL.BURN.TEMPERATURE("CH4","N2",1,298.15,"1 atm") -> #VALUE! N2 is no oxidant: it offers no oxygen; the fuel comes first, then the oxidant
 * @customfunction BURN.TEMPERATURE
 */
export function burnTemperature(
  fuel: any[][],
  oxidant: any[][],
  equivalence_ratio: any[][],
  T0: any[][],
  P0: any[][],
  products?: any[][],
  unit?: any[][],
  set?: any[][],
): any[][] {
  return cells(() => {
    const reader = new BurnReader({ fuel, oxidant, equivalence_ratio, T0, P0, products, set }, [["unit", unit]]);
    return spread(reader.named, (values) =>
      inUnit(finite(reader.burnt(values).temperature), readText(values[reader.others], "unit"), "K", 'a temperature such as "°C"'),
    );
  });
}

/**
 * Absolute pressure after combustion in a closed vessel, without loss of heat: energy and volume held, products at chemical equilibrium. A deflagration at best; not a design or relief calculation.
 * @param fuel Species such as "CH4", mixture such as "0.9 CH4 + 0.1 C2H6", text of BURN.FUEL, or a range of species and mole fractions [-] value
 * @param oxidant "air", "O2", a mixture such as "O2 + 3.76 N2" or one of MIX.HUMIDAIR, or a range of species and mole fractions [-] value
 * @param equivalence_ratio Fuel to oxidant, divided by the same where the oxygen just suffices; above 1 is rich [-] value
 * @param T0 Temperature before, also as text such as "25 °C" [K] value
 * @param P0 Absolute pressure before, also as text such as "1 atm" [Pa] value
 * @param products "equilibrium" if left out, "complete" (estimate without dissociation, not a bound; up to ratio 1), or a list of species such as "CO2 CO H2O N2" [-] value
 * @param unit Unit of the result, such as "bar" [-] value
 * @param set Set id such as "gri-1999" or a coefficient block; left out: products of nasa-2002, fuel and oxidant by first choice [-] value
 * @returns Final absolute pressure [Pa]
 * @source nasa-2002 ciaaw-2021
 * @example STILL.BURN.PRESSURE("H2","O2 + 3.76 N2",1,298.15,"1 atm","CO2 CO H2O H2 O2 N2 OH NO H O","atm") -> ~ 7.999
 * @example STILL.BURN.PRESSURE("CH4","O2 + 3.76 N2",1.2,298.15,"1 atm","complete") -> #VALUE! Complete products hold up to equivalence ratio 1; at 1.2 the oxygen does not suffice: use equilibrium
 * @customfunction BURN.PRESSURE
 */
export function burnPressure(
  fuel: any[][],
  oxidant: any[][],
  equivalence_ratio: any[][],
  T0: any[][],
  P0: any[][],
  products?: any[][],
  unit?: any[][],
  set?: any[][],
): any[][] {
  return cells(() => {
    const reader = new BurnReader({ fuel, oxidant, equivalence_ratio, T0, P0, products, set }, [["unit", unit]]);
    return spread(reader.named, (values) =>
      inUnit(finite(reader.burnt(values).pressure), readText(values[reader.others], "unit"), "Pa", 'a pressure such as "bar"'),
    );
  });
}

/**
 * Mole fraction of one species in the gas after combustion in a closed vessel; of a condensed species such as C(gr), mol for each mole of gas. Traces are right far below what can be measured.
 * @param fuel Species such as "CH4", mixture such as "0.9 CH4 + 0.1 C2H6", text of BURN.FUEL, or a range of species and mole fractions [-] value
 * @param oxidant "air", "O2", a mixture such as "O2 + 3.76 N2" or one of MIX.HUMIDAIR, or a range of species and mole fractions [-] value
 * @param equivalence_ratio Fuel to oxidant, divided by the same where the oxygen just suffices; above 1 is rich [-] value
 * @param T0 Temperature before, also as text such as "25 °C" [K] value
 * @param P0 Absolute pressure before, also as text such as "1 atm" [Pa] value
 * @param species Species such as "NO" [-] value
 * @param products "equilibrium" if left out, "complete" (estimate without dissociation, not a bound; up to ratio 1), or a list of species such as "CO2 CO H2O N2" [-] value
 * @param set Set id such as "gri-1999" or a coefficient block; left out: products of nasa-2002, fuel and oxidant by first choice [-] value
 * @returns Mole fraction in the gas [mol/mol]
 * @source nasa-2002 ciaaw-2021
 * @example STILL.BURN.FRACTION("CH4","air",1,298.15,"1 atm","NO") -> ~ 0.0047
 * @example STILL.BURN.FRACTION("CH4","O2 + 3.76 N2",0.5,298.15,"1 atm","O2","complete") -> ~ 0.0998
 * @customfunction BURN.FRACTION
 */
export function burnFraction(
  fuel: any[][],
  oxidant: any[][],
  equivalence_ratio: any[][],
  T0: any[][],
  P0: any[][],
  species: any[][],
  products?: any[][],
  set?: any[][],
): any[][] {
  return cells(() => {
    const reader = new BurnReader({ fuel, oxidant, equivalence_ratio, T0, P0, products, set }, [["species", species]]);
    return spread(reader.named, (values) => {
      const cell = values[reader.others];
      const name = speciesName(cell);
      refuseProductWord(name);
      return finite(fractionOf(reader.burnt(values), name, String(cell).trim()));
    });
  });
}

/**
 * Text of a dry fuel known by its gross value, for the fuel of BURN: a coal, an oil, a laboratory's sample. Ash is inert and its heating is not counted; the fuel's energy is taken at 25 °C.
 * @param formula Combustible matter without ash, of C, H, O, N, S, such as "C7H6O2" or "CH0.8O0.1N0.015" [-] value
 * @param gross Gross value at constant volume between standard states, of the fuel with its ash; also as text such as "30.1 MJ/kg" [J/g] value
 * @param phase "cr" if left out, "l" or "g"; cr is any solid, and a formula may carry its phase itself [-] value
 * @param ash_percent Ash of the dry fuel; none if left out [%] value
 * @returns Fuel text [-]
 * @source codata-1989 ciaaw-2021
 * @example STILL.BURN.FUEL("C7H6O2",26413.6) -> "C7H6O2(cr), gross 26413.6 J/g"
 * @example STILL.BURN.FUEL("CH0.8O0.1N0.015S0.005","30.1 MJ/kg",,8) -> "CH0.8O0.1N0.015S0.005(cr), gross 30100 J/g, ash 8 %"
 * @example STILL.BURN.FUEL("CH4",55500) -> #VALUE! CH4 is the formula of a gas: give the phase, "g", or "l" or "cr" for a liquid or solid of this composition
 * @customfunction BURN.FUEL
 */
export function burnFuel(formula: any[][], gross: any[][], phase?: any[][], ash_percent?: any[][]): any[][] {
  return spread(
    [
      ["formula", formula],
      ["gross", gross],
      ["phase", phase],
      ["ash_percent", ash_percent],
    ],
    ([formulaCell, grossCell, phaseCell, ashCell]) => grossFuelText(grossFuelOf(formulaCell, grossCell, phaseCell, ashCell)),
  );
}

/**
 * State and composition after combustion in a closed vessel, without loss of heat: energy and volume held, products at chemical equilibrium. A deflagration at best; not a design or relief calculation.
 * @param fuel Species such as "CH4", mixture such as "0.9 CH4 + 0.1 C2H6", text of BURN.FUEL, or a range of species and mole fractions [-] value
 * @param oxidant "air", "O2", a mixture such as "O2 + 3.76 N2" or one of MIX.HUMIDAIR, or a range of species and mole fractions [-] value
 * @param equivalence_ratio Fuel to oxidant, divided by the same where the oxygen just suffices; above 1 is rich [-] value
 * @param T0 Temperature before, also as text such as "25 °C" [K] value
 * @param P0 Absolute pressure before, also as text such as "1 atm" [Pa] value
 * @param products "equilibrium" if left out, "complete" (estimate without dissociation, not a bound; up to ratio 1), or a list of species such as "CO2 CO H2O N2" [-] value
 * @param set Set id such as "gri-1999" or a coefficient block; left out: products of nasa-2002, fuel and oxidant by first choice [-] value
 * @returns One state: label, value, unit, note, with a line for each species; a column of states: heading row, then a row for each [-]
 * @lines final temperature | final pressure | pressure ratio | gas formed to gas put in | fuel in the mixture | mixture | CO2 | CO | H2O | H2 | O2 | N2 | OH | NO | H | O | products | mass-action residual | element residual | assumptions | caution
 * @source nasa-2002 ciaaw-2021
 * @example INDEX(STILL.BURN("CH4","O2 + 3.76 N2",1,298.15,"1 atm","CO2 CO H2O H2 O2 N2 OH NO H O"),3,2) -> ~ 8.795
 * @example INDEX(STILL.BURN("C3H8","O2 + 3.76 N2",1,298.15,"1 atm","complete"),1,2) -> ~ 2902.8
 * @customfunction BURN
 */
export function burn(
  fuel: any[][],
  oxidant: any[][],
  equivalence_ratio: any[][],
  T0: any[][],
  P0: any[][],
  products?: any[][],
  set?: any[][],
): any[][] {
  return burnCells({ fuel, oxidant, equivalence_ratio, T0, P0, products, set });
}

/**
 * Chemical equilibrium of a feed at a temperature and in a volume: composition, pressure, energy. Ideal gas and pure condensed phases.
 * @param feed What is put in, in mol: text such as "1 CH4 + 2 O2 + 7.52 N2", or a range of species and mol [mol] value
 * @param temperature Temperature, also as text such as "2000 °C" [K] value
 * @param volume Volume of the gas, also as text such as "0.34 L" [m3] value
 * @param species Species that may be there, a text such as "CO2 CO H2O N2" or a range; left out: all of the set that the elements allow [-] list
 * @param set Set id such as "gri-1999" or a coefficient block; left out: species of nasa-2002, feed by first choice [-] value
 * @returns One state: label, value, unit, note, with a line for each species; a column of states: heading row, then a row for each [-]
 * @lines temperature | pressure | volume | amount of gas | energy U | enthalpy H | CO2 | CO | O2 | species | mass-action residual | element residual | assumptions | caution
 * @source nasa-2002 ciaaw-2021
 * @example INDEX(STILL.EQUILIBRIUM.ATVOLUME("2 CO + 3 O2",2600,"0.3567 m3","CO2 CO O2","gri-1999"),2,2) -> ~ 245573
 * @example STILL.EQUILIBRIUM.ATVOLUME("1 H2O",3000,1,"H2O(l)") -> #VALUE! The list of species (H2O(l)) holds no gas: an equilibrium here has a gas phase
 * @customfunction EQUILIBRIUM.ATVOLUME
 */
export function equilibriumAtvolume(feed: any[][], temperature: any[][], volume: any[][], species?: any[][], set?: any[][]): any[][] {
  return equilibriumCells(AT_VOLUME, feed, temperature, volume, species, set);
}

/**
 * Chemical equilibrium of a feed at a temperature and a pressure: composition, volume, enthalpy. Ideal gas and pure condensed phases.
 * @param feed What is put in, in mol: text such as "1 CH4 + 2 O2 + 7.52 N2", or a range of species and mol [mol] value
 * @param temperature Temperature, also as text such as "2000 °C" [K] value
 * @param pressure Absolute pressure, also as text such as "1 atm" [Pa] value
 * @param species Species that may be there, a text such as "CO2 CO H2O N2" or a range; left out: all of the set that the elements allow [-] list
 * @param set Set id such as "gri-1999" or a coefficient block; left out: species of nasa-2002, feed by first choice [-] value
 * @returns One state: label, value, unit, note, with a line for each species; a column of states: heading row, then a row for each [-]
 * @lines temperature | pressure | volume | amount of gas | energy U | enthalpy H | CO2 | CO | O2 | N2 | species | mass-action residual | element residual | assumptions | caution
 * @source nasa-2002 ciaaw-2021
 * @example INDEX(STILL.EQUILIBRIUM.ATPRESSURE("3 CO + 2.5 O2 + 8 N2",2600,"5 atm","CO2 CO O2 N2","gri-1999"),7,2) -> ~ 2.7538
 * @example INDEX(STILL.EQUILIBRIUM.ATPRESSURE("1 H2O",300,"1 bar"),4,2) -> 0
 * @customfunction EQUILIBRIUM.ATPRESSURE
 */
export function equilibriumAtpressure(feed: any[][], temperature: any[][], pressure: any[][], species?: any[][], set?: any[][]): any[][] {
  return equilibriumCells(AT_PRESSURE, feed, temperature, pressure, species, set);
}

/**
 * Chemical equilibrium of a feed that reacts in a rigid vessel without loss of heat: energy and volume held. Final temperature, pressure and composition.
 * @param feed What is put in, in mol: text such as "1 CH4 + 2 O2 + 7.52 N2", or a range of species and mol [mol] value
 * @param T0 Temperature before, also as text such as "25 °C" [K] value
 * @param volume Volume of the gas, also as text such as "0.34 L" [m3] value
 * @param species Species that may be there, a text such as "CO2 CO H2O N2" or a range; left out: all of the set that the elements allow [-] list
 * @param set Set id such as "gri-1999" or a coefficient block; left out: species of nasa-2002, feed by first choice [-] value
 * @returns One state: label, value, unit, note, with a line for each species; a column of states: heading row, then a row for each [-]
 * @lines pressure before | temperature | pressure | volume | amount of gas | energy U | enthalpy H | CO2 | CO | H2O | H2 | O2 | N2 | OH | NO | H | O | species | mass-action residual | element residual | assumptions | caution
 * @source nasa-2002 ciaaw-2021
 * @example INDEX(STILL.EQUILIBRIUM.RIGID("1 CH4 + 2 O2 + 7.52 N2",298.15,"0.2574 m3","CO2 CO H2O H2 O2 N2 OH NO H O"),2,2) -> ~ 2584.9
 * @example STILL.EQUILIBRIUM.RIGID("1 H2 + 1 O2",25,1) -> #VALUE! Temperature 25 K is below 200 K, the lower limit of nasa-2002 for H2; for degrees Celsius write "25 °C"
 * @customfunction EQUILIBRIUM.RIGID
 */
export function equilibriumRigid(feed: any[][], T0: any[][], volume: any[][], species?: any[][], set?: any[][]): any[][] {
  return equilibriumCells(RIGID, feed, T0, volume, species, set);
}

/**
 * Chemical equilibrium of a feed that reacts at constant pressure without loss of heat: enthalpy and pressure held. Final temperature, volume and composition.
 * @param feed What is put in, in mol: text such as "1 CH4 + 2 O2 + 7.52 N2", or a range of species and mol [mol] value
 * @param T0 Temperature before, also as text such as "25 °C" [K] value
 * @param pressure Absolute pressure, also as text such as "1 atm" [Pa] value
 * @param species Species that may be there, a text such as "CO2 CO H2O N2" or a range; left out: all of the set that the elements allow [-] list
 * @param set Set id such as "gri-1999" or a coefficient block; left out: species of nasa-2002, feed by first choice [-] value
 * @returns One state: label, value, unit, note, with a line for each species; a column of states: heading row, then a row for each [-]
 * @lines volume before | temperature | pressure | volume | amount of gas | energy U | enthalpy H | CO2 | CO | H2O | H2 | O2 | N2 | OH | NO | H | O | species | mass-action residual | element residual | assumptions | caution
 * @source nasa-2002 ciaaw-2021
 * @example INDEX(STILL.EQUILIBRIUM.ISOBARIC("1 CH4 + 2 O2 + 7.52 N2",298.15,"1 atm","CO2 CO H2O H2 O2 N2 OH NO H O"),2,2) -> ~ 2224
 * @example STILL.EQUILIBRIUM.ISOBARIC("1 H2 + 0.5 O2",298.15,0) -> #VALUE! Pressure 0 Pa is not above 0 Pa; pressures are absolute (see UNITS.ABSOLUTE for gauge readings)
 * @customfunction EQUILIBRIUM.ISOBARIC
 */
export function equilibriumIsobaric(feed: any[][], T0: any[][], pressure: any[][], species?: any[][], set?: any[][]): any[][] {
  return equilibriumCells(ISOBARIC, feed, T0, pressure, species, set);
}

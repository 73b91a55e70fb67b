/** Family burn: fuels by their gross value, combustion in a closed vessel, and chemical equilibrium. */
import { spread } from "./broadcast";
import { grossFuelOf, grossFuelText } from "./fuel-text";

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

/** Family fuel: bases, dry contents, net and gross values, agreement of duplicates, energy and enthalpy of combustion. */
import { toBasis } from "../core/fuel/basis";
import { dryContent } from "../core/fuel/dry";
import { byVolume, netOfAviationFuel, netOfLiquid } from "../core/fuel/liquid";
import { grossAtConstantPressure, netValue } from "../core/fuel/net-value";
import { printed, refuse, refuseRange } from "../core/refusal";
import { agreeCells } from "./agreement";
import { spread } from "./broadcast";
import { cells, finite, isTextLeftOut, plain } from "./cell";
import { combustionCells } from "./combustion";
import {
  basisFigures,
  GROSS_LIQUID,
  LIQUID_DENSITY,
  readBasis,
  readBasisValue,
  readCondition,
  readDrySample,
  readElement,
  readLiquidHydrogen,
  requirePercentages,
} from "./fuel-arguments";
import { AVIATION, constantsChoice, readGrossPressureConstants, readLiquidConstant, readNetConstants } from "./fuel-constants";
import { readMeasured, readPercent } from "./laboratory";

/**
 * Puts a value on another basis: ad (as analysed), d (dry), ar (as received), daf (dry ash-free). Not for net values. Hydrogen and oxygen found as analysed include those of the moisture: FUEL.DRY first.
 * @param value Number per mass (J/g, %, …), or text such as "28 MJ/kg" (result in J/g) or "6.1 %" [-] value
 * @param from Basis of the value: "ad", "d", "ar" or "daf" [-] value
 * @param to Basis of the result: "ad", "d", "ar" or "daf" [-] value
 * @param moisture_ad_percent Moisture of the sample as analysed; needed from or to ad [%] value
 * @param moisture_ar_percent Total moisture as received; needed from or to ar [%] value
 * @param ash_d_percent Ash of the dry sample; needed from or to daf [%] value
 * @returns Value on the basis asked for: in the unit of a plain value or percentage, in J/g for a text [-]
 * @source net-values
 * @example STILL.FUEL.BASIS(27000,"ad","d",10) -> 30000
 * @example STILL.FUEL.BASIS("27 MJ/kg","ad","ar",10,20) -> 24000
 * @example STILL.FUEL.BASIS(27000,"ad","ar",10) -> #VALUE! The moisture as received is missing: the way from ad to ar needs it, in per cent
 * @customfunction FUEL.BASIS
 */
export function fuelBasis(
  value: any[][],
  from: any[][],
  to: any[][],
  moisture_ad_percent?: any[][],
  moisture_ar_percent?: any[][],
  ash_d_percent?: any[][],
): any[][] {
  return spread(
    [
      ["value", value],
      ["from", from],
      ["to", to],
      ["moisture_ad_percent", moisture_ad_percent],
      ["moisture_ar_percent", moisture_ar_percent],
      ["ash_d_percent", ash_d_percent],
    ],
    ([valueCell, fromCell, toCell, ...figures]) => {
      const { value: given, percent } = readBasisValue(valueCell);
      const basis = readBasis(toCell, "to");
      const result = toBasis(given, readBasis(fromCell, "from"), basis, basisFigures(figures));
      if (percent && result > 100)
        refuseRange(`Value ${printed(given)} % would be ${printed(result)} % on the basis ${basis}, above 100 %`);
      return finite(result);
    },
  );
}

/**
 * Content of the dry sample from that found as analysed. For H and O the moisture's own (11.19 % and 88.81 % of it) are taken off first; counted twice in a net value, the hydrogen costs 23.7 J/g per % moisture.
 * @param value_ad_percent Content as analysed, for H and O with that of the moisture [%] value
 * @param moisture_ad_percent Moisture of the sample as analysed [%] value
 * @param element What the content is of: "H", "O", or "C", "N", "S", "Cl", "F", "ash" [-] value
 * @returns Content of the dry sample [%]
 * @source net-values ciaaw-2021
 * @example STILL.FUEL.DRY(6.5,8,"H") -> ~ 6.0921
 * @example STILL.FUEL.DRY(46,8,"C") -> 50
 * @example STILL.FUEL.DRY(0.5,8,"H") -> #VALUE! Hydrogen 0.5 % is less than the 0.895254 % that 8 % moisture holds
 * @customfunction FUEL.DRY
 */
export function fuelDry(value_ad_percent: any[][], moisture_ad_percent: any[][], element: any[][]): any[][] {
  return spread(
    [
      ["value_ad_percent", value_ad_percent],
      ["moisture_ad_percent", moisture_ad_percent],
      ["element", element],
    ],
    ([valueCell, moistureCell, elementCell]) => {
      const { name, share } = readElement(elementCell);
      const content = readPercent(valueCell, name);
      const moisture = readPercent(moistureCell, "Moisture");
      if (name === "Hydrogen") requirePercentages(valueCell, content, [["moisture", moisture]]);
      return finite(dryContent(content, moisture, share, name));
    },
  );
}

/**
 * Net value of the sample at its moisture, from the gross value at constant volume and H, O, N of the dry sample (without the moisture's: FUEL.DRY). The derived constants round to the printed 212.2, 0.8, 24.43; nitrogen 0.88, printed 0.8.
 * @param gross_v_d Gross value at constant volume, dry, also as text such as "20.2 MJ/kg" [J/g] value
 * @param H_d_percent Hydrogen of the dry sample, without that of the moisture [%] value
 * @param O_d_percent Oxygen of the dry sample; may be blank at constant volume [%] value
 * @param N_d_percent Nitrogen of the dry sample; may be blank at constant volume [%] value
 * @param moisture_percent Moisture of the sample reported, such as total moisture as received; 0 for the dry net value [%] value
 * @param condition "constant-pressure" if left out, or "constant-volume" [-] value
 * @param constants Left out: derived. An edition: "iso-1928-2009", "iso-1928-1995", "iso-18125-2017", "en-14918-2009", "iso-21654-2021". Or four numbers for H, O, N, moisture in J/g per % [-] list
 * @returns Net value [J/g]
 * @source net-values nbs-1982 ciaaw-2021 iso-1928-2009 iso-1928-1995 iso-18125-2017 en-14918-2009 iso-21654-2021
 * @example STILL.FUEL.NET(20200,6.1,42.5,0.1,8,,"iso-18125-2017") -> ~ 17166.34
 * @example STILL.FUEL.NET(20200,6.1,42.5,0.1,8,"constant-volume","iso-18125-2017") -> ~ 17243.53
 * @example STILL.FUEL.NET("20.2 MJ/kg",6.1,42.5,0.1,8) -> ~ 17167.5
 * @example STILL.FUEL.NET(20200,0.061,0.425,0.001,0.08) -> #VALUE! H 0.061 %, O 0.425 %, N 0.001 %, moisture 0.08 %: looks like fractions; percent expected (if it is per cent, write the hydrogen as "0.061 %")
 * @customfunction FUEL.NET
 */
export function fuelNet(
  gross_v_d: any[][],
  H_d_percent: any[][],
  O_d_percent: any[][],
  N_d_percent: any[][],
  moisture_percent: any[][],
  condition?: any[][],
  constants?: any[][],
): any[][] {
  return cells(() => {
    const choice = constantsChoice(constants, readNetConstants);
    return spread(
      [
        ["gross_v_d", gross_v_d],
        ["H_d_percent", H_d_percent],
        ["O_d_percent", O_d_percent],
        ["N_d_percent", N_d_percent],
        ["moisture_percent", moisture_percent],
        ["condition", condition],
        ["constants", choice.spread],
      ],
      ([gross, hydrogen, oxygen, nitrogen, moistureCell, conditionCell, id]) => {
        const at = readCondition(conditionCell);
        const sample = readDrySample([gross, hydrogen, oxygen, nitrogen], at);
        const moisture = readPercent(moistureCell, "Moisture");
        requirePercentages(hydrogen, sample.hydrogen, [
          ["O", sample.oxygen],
          ["N", sample.nitrogen],
          ["moisture", moisture],
        ]);
        return finite(netValue(sample, moisture, choice.of(id)(at)));
      },
    );
  });
}

/**
 * Gross value at constant pressure of the dry sample, from that at constant volume: q + 6.15 H - 0.77 O - 0.88 N in J/g and per cent. Methods print 0.8 for O and N alike: name the edition to get theirs.
 * @param gross_v_d Gross value at constant volume, dry, also as text such as "20.2 MJ/kg" [J/g] value
 * @param H_d_percent Hydrogen of the dry sample, without that of the moisture [%] value
 * @param O_d_percent Oxygen of the dry sample [%] value
 * @param N_d_percent Nitrogen of the dry sample [%] value
 * @param constants Left out: derived. An edition: "iso-1928-2009", "iso-18125-2017", "en-14918-2009", "iso-21654-2021". Or three numbers for H, O, N in J/g per % [-] list
 * @returns Gross value at constant pressure, dry [J/g]
 * @source net-values ciaaw-2021 iso-1928-2009 iso-18125-2017 en-14918-2009 iso-21654-2021
 * @example STILL.FUEL.GROSSPRESSURE(20200,6.1,42.5,0.1,"iso-18125-2017") -> ~ 20203.4
 * @example STILL.FUEL.GROSSPRESSURE(20200,6.1,42.5,0.1) -> ~ 20204.5
 * @customfunction FUEL.GROSSPRESSURE
 */
export function fuelGrosspressure(
  gross_v_d: any[][],
  H_d_percent: any[][],
  O_d_percent: any[][],
  N_d_percent: any[][],
  constants?: any[][],
): any[][] {
  return cells(() => {
    const choice = constantsChoice(constants, readGrossPressureConstants);
    return spread(
      [
        ["gross_v_d", gross_v_d],
        ["H_d_percent", H_d_percent],
        ["O_d_percent", O_d_percent],
        ["N_d_percent", N_d_percent],
        ["constants", choice.spread],
      ],
      (values) => {
        const sample = readDrySample(values, "constant-pressure");
        requirePercentages(values[1], sample.hydrogen, [
          ["O", sample.oxygen],
          ["N", sample.nitrogen],
        ]);
        return finite(grossAtConstantPressure(sample, choice.of(values[4])));
      },
    );
  });
}

/**
 * Net value at constant pressure of a liquid hydrocarbon fuel from its gross value and hydrogen; without hydrogen the estimate for aviation fuels, 45 to 48 MJ/kg only. With a density it is by volume, in J/mL (the number of kJ/L).
 * @param gross Gross value at constant volume, also as text such as "45.7 MJ/kg" [J/g] value
 * @param hydrogen_percent Hydrogen; left out, the net value of an aviation fuel is estimated from the gross value alone [%] value
 * @param density Density, also as text such as "845 kg/m3"; given, the result is by volume, in J/mL [g/cm3] value
 * @param constants Left out: derived (212.17 J/g per % hydrogen). "astm-d240" for its 0.2122 MJ/kg, or one number in J/g per % [-] list
 * @returns Net value in J/g; in J/mL if the density is given [J/g]
 * @source net-values nbs-1982 ciaaw-2021 astm-d240-net
 * @example STILL.FUEL.LIQUIDNET("45.70 MJ/kg",13.3,,"astm-d240") -> ~ 42877.7
 * @example STILL.FUEL.LIQUIDNET("45.70 MJ/kg") -> ~ 42906
 * @example STILL.FUEL.LIQUIDNET(45700,13.3,"845 kg/m3","astm-d240") -> ~ 36231.7
 * @customfunction FUEL.LIQUIDNET
 */
export function fuelLiquidnet(gross: any[][], hydrogen_percent?: any[][], density?: any[][], constants?: any[][]): any[][] {
  return cells(() => {
    const choice = constantsChoice(constants, readLiquidConstant);
    const hasOwnConstant = !isTextLeftOut(constants) && typeof plain(constants![0]![0]) === "number";
    return spread(
      [
        ["gross", gross],
        ["hydrogen_percent", hydrogen_percent],
        ["density", density],
        ["constants", choice.spread],
      ],
      ([grossCell, hydrogenCell, densityCell, id]) => {
        const given = readMeasured(grossCell, GROSS_LIQUID);
        if (hydrogenCell === undefined && hasOwnConstant)
          refuse("The constant belongs to the hydrogen, which is left out: give the hydrogen, or leave out the constant");
        // A blank in a range of hydrogens or densities is a gap and is refused; an estimate or another unit never slips into a column.
        const net =
          hydrogenCell === undefined
            ? netOfAviationFuel(given, AVIATION)
            : netOfLiquid(given, readLiquidHydrogen(hydrogenCell), choice.of(id));
        return finite(densityCell === undefined ? net : byVolume(net, readMeasured(densityCell, LIQUID_DENSITY)));
      },
    );
  });
}

/**
 * Whether the 2 to 4 results of a sample agree, what to do next, and the value to report; one sample a row. Two may differ by the repeatability r, three by 1.2 r, four by 1.3 r (ISO 5725-6).
 * @param values Results of a sample in one row, also as texts such as "28.13 MJ/kg"; several samples in several rows [J/g] block
 * @param repeatability Limit of repeatability, also as text such as "0.13 MJ/kg", or a method such as "iso-1928"; one cell, or one for each row [J/g] list
 * @returns One sample: label, value, unit, note; more samples: heading row, then a row for each [-]
 * @lines number of results | mean | range | repeatability | allowed range | verdict | value to report | reported as
 * @source iso-5725-6
 * @example INDEX(STILL.FUEL.AGREE({28000,28130},120),6,2) -> "make a third run: the difference 130 J/g is above 120 J/g"
 * @example INDEX(STILL.FUEL.AGREE({28000,28100},120),7,2) -> 28050
 * @customfunction FUEL.AGREE
 */
export function fuelAgree(values: any[][], repeatability: any[][]): any[][] {
  return agreeCells(values, repeatability);
}

/**
 * Energy, enthalpy of combustion and enthalpy of formation of a compound of C, H, O, N, S, each from any other, with its reaction, at 298.15 K and 1 bar. A value from a vessel goes through CAL.STANDARD first.
 * @param formula Formula such as "C7H6O2", with "(g)" for a gas [-] value
 * @param value What given says; energy in J/g and positive, enthalpy and formation in J/mol, also as text such as "-3226.9 kJ/mol" [-] value
 * @param given "energy" if left out (gross value at constant volume between standard states), "enthalpy" of combustion, or "formation" [-] value
 * @returns One compound: label, value, unit, note; a column of compounds: heading row, then a row for each [-]
 * @lines reaction | molar mass | change of gas | RT | energy of combustion ΔcU° | gross value at constant volume | enthalpy of combustion ΔcH° | gross value at constant pressure | enthalpy of formation ΔfH° | uncertainty from the products | reference temperature
 * @source codata-1989 ciaaw-2021
 * @example INDEX(STILL.FUEL.COMBUSTION("C7H6O2",26413.6),7,2) -> ~ -3226.9
 * @example INDEX(STILL.FUEL.COMBUSTION("C7H6O2","-3226.9 kJ/mol","enthalpy"),6,2) -> ~ 26413.2
 * @customfunction FUEL.COMBUSTION
 */
export function fuelCombustion(formula: any[][], value: any[][], given?: any[][]): any[][] {
  return combustionCells(formula, value, given);
}

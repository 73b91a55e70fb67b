/** Family calorimeter: from the readings of a run to the gross value at constant volume, in the laboratory's units. */
import { massInVacuum } from "../core/calorimeter/buoyancy";
import { buoyancy } from "../data/calorimetry";
import { acidsCells, nitricCells, sulfuricCells, titrationCells } from "./acid-heats";
import { spread } from "./broadcast";
import { burningCells } from "./burning";
import { finite } from "./cell";
import { certificateCells, certificateReportCells } from "./certificate";
import { chargeCells } from "./charge";
import { AIR_DENSITY, DENSITY, readMeasured, readMeasuredOr, SAMPLE_MASS } from "./laboratory";
import { riseCells, riseReportCells } from "./rise";
import { equivalentCells, grossCells } from "./run-heats";
import { seriesCells } from "./series";
import { standardCells } from "./standard";

/**
 * Corrected temperature rise of an oxygen-calorimeter run, for heat exchanged with the jacket and stirring. Many runs at once, a column each; trailing blanks end a run.
 * @param times Times of the readings, one column for all runs or one for each [min] list
 * @param temperatures Temperatures, one column for each run [°C] list
 * @param fire Time of firing, one cell or one for each run in a row [min] list
 * @param end End of the main period; left out: the first reading ten times the 63 % time after firing, with less than 0.01 % of the rise to come, from which five or more readings over five or more minutes drift steadily [min] list
 * @param method "regnault-pfaundler" if left out, "dickinson" (0.60), "dickinson-63" or "adiabatic"; one cell for all runs [-] value
 * @param time_unit Unit of plain times, such as "s" or "h"; minutes if left out; one cell for all runs [-] value
 * @returns Corrected rise, one for each run in a row [K]
 * @source iso-1928 dickinson-1915
 * @example STILL.CAL.RISE({0;1;2;3;4;5;6;7;8;9;10;11;12;13;14;15;16;17;18;19;20;21;22;23;24;25},{22.6;22.6058;22.6116;22.6173;22.6231;22.6289;24.3096;24.8634;25.0462;25.1069;25.1273;25.1345;25.1374;25.1388;25.1398;25.1406;25.1413;25.1421;25.1428;25.1435;25.1442;25.1449;25.1456;25.1463;25.147;25.1477},5,15) -> ~ 2.4995
 * @example STILL.CAL.RISE({0;1;2;3;4;5;6;7;8;9;10;11;12;13;14;15;16;17;18;19;20;21;22;23;24;25},{22.6;22.6058;22.6116;22.6173;22.6231;22.6289;24.3096;24.8634;25.0462;25.1069;25.1273;25.1345;25.1374;25.1388;25.1398;25.1406;25.1413;25.1421;25.1428;25.1435;25.1442;25.1449;25.1456;25.1463;25.147;25.1477},5,15,"dickinson") -> ~ 2.5001
 * @example STILL.CAL.RISE({0;60;120;180;240;300;360;420;480;540;600;660;720;780;840;900;960;1020;1080;1140;1200;1260;1320;1380;1440;1500},{22.6;22.6058;22.6116;22.6173;22.6231;22.6289;24.3096;24.8634;25.0462;25.1069;25.1273;25.1345;25.1374;25.1388;25.1398;25.1406;25.1413;25.1421;25.1428;25.1435;25.1442;25.1449;25.1456;25.1463;25.147;25.1477},300,900,,"s") -> ~ 2.4995
 * @example STILL.CAL.RISE({0;0.001;0.002},{22;22;24},0.001) -> #VALUE! These look like clock times: multiply by 1440, or say the time unit, such as "s" or "d" (as minutes, all are below 1)
 * @customfunction CAL.RISE
 */
export function calRise(
  times: any[][],
  temperatures: any[][],
  fire: any[][],
  end?: any[][],
  method?: any[][],
  time_unit?: any[][],
): any[][] {
  return riseCells(times, temperatures, fire, end, method, time_unit);
}

/**
 * Energy equivalent of a calorimeter from a run with a certified substance: (mass × certified value × factor + heats) / rise.
 * @param mass Mass of the certified substance; in vacuum for a value in vacuum [g] value
 * @param certified Certified value under the conditions of its certificate, such as 26434 for benzoic acid [J/g] value
 * @param rise Corrected rise [K] value
 * @param heats Heats beside the sample's: ignition, fuse, nitric acid; a row for each run, its columns added [J] block
 * @param factor Condition factor of the certificate, from CAL.CERTIFICATE; 1 if left out [-] value
 * @returns Energy equivalent [J/K]
 * @source astm-d240 nist-srm-39j
 * @example STILL.CAL.EQUIVALENT(1.0012,26434,2.499819,{205,42}) -> ~ 10685.86
 * @example STILL.CAL.EQUIVALENT(1.0012,"26.434 MJ/kg",2.499819,{205,42},1.0002) -> ~ 10687.98
 * @example STILL.CAL.EQUIVALENT(1.0012,26.434,2.5) -> #VALUE! Certified value 26.434 J/g is below 100 J/g: say "26.434 MJ/kg"
 * @customfunction CAL.EQUIVALENT
 */
export function calEquivalent(mass: any[][], certified: any[][], rise: any[][], heats?: any[][], factor?: any[][]): any[][] {
  return equivalentCells(mass, certified, rise, heats, factor);
}

/**
 * Condition factor of a benzoic-acid certificate: multiplies its value under other conditions. Refused outside 20 to 40 atm, 2 to 4 g/L, 20 to 30 °C; a vessel without water needs CAL.STANDARD.
 * @param pressure Oxygen pressure, absolute; also as text such as "30 atm" [MPa] value
 * @param volume Volume of the vessel; also as text such as "0.34 L" [mL] value
 * @param sample_mass Mass of benzoic acid [g] value
 * @param water_mass Mass of water put into the vessel [g] value
 * @param temperature Temperature of the reaction; also as text such as "298.15 K" [°C] value
 * @param beyond The words "beyond limits", to have the value outside the limits [-] value
 * @returns Factor [-]
 * @source coops-1956
 * @example STILL.CAL.CERTIFICATE("40 atm",333.3333,1,1,25) -> ~ 1.0002
 * @example STILL.CAL.CERTIFICATE("30 atm","0.34 L",1,5,25,"beyond limits") -> ~ 1.000349
 * @example STILL.CAL.CERTIFICATE(30,340,1,1,25) -> #VALUE! Oxygen pressure 30 MPa is above 6 MPa: say "30 atm" or "30 bar"
 * @customfunction CAL.CERTIFICATE
 */
export function calCertificate(
  pressure: any[][],
  volume: any[][],
  sample_mass: any[][],
  water_mass: any[][],
  temperature: any[][],
  beyond?: any[][],
): any[][] {
  return certificateCells(pressure, volume, sample_mass, water_mass, temperature, beyond);
}

/**
 * Heat of nitric acid formed in the vessel, from the titrated volume. Routine molar heat 60.0 kJ/mol, that is 6.0 J for each mL of 0.1 mol/L.
 * @param volume Volume of titrant used for nitric acid [mL] value
 * @param concentration Concentration of the titrant, in acid equivalents [mol/L] value
 * @param molar_heat Molar heat of nitric acid, such as "59.7 kJ/mol"; 60000 J/mol if left out [J/mol] value
 * @returns Heat, to be deducted [J]
 * @source iso-1928-acids
 * @example STILL.CAL.NITRIC(5,0.1) -> 30
 * @example STILL.CAL.NITRIC(5,0.1,"59.7 kJ/mol") -> 29.85
 * @customfunction CAL.NITRIC
 */
export function calNitric(volume: any[][], concentration: any[][], molar_heat?: any[][]): any[][] {
  return nitricCells(volume, concentration, molar_heat);
}

/**
 * Heat of sulfuric acid from the sulfur of the sample: in full if the acids are "separated", the excess over nitric acid if the "total" acid was titrated as nitric.
 * @param sulfur_percent Sulfur of the sample, as analysed [%] value
 * @param mass Mass of the sample [g] value
 * @param convention "separated" or "total"; the two never mix [-] value
 * @param molar_heat Molar heat of SO2 to sulfuric acid, such as "302 kJ/mol"; 301700 J/mol if left out [J/mol] value
 * @returns Heat, to be deducted [J]
 * @source iso-1928-acids
 * @example STILL.CAL.SULFURIC(1,1,"separated") -> ~ 94.1
 * @example STILL.CAL.SULFURIC(1,1,"total") -> ~ 56.7
 * @customfunction CAL.SULFURIC
 */
export function calSulfuric(sulfur_percent: any[][], mass: any[][], convention: any[][], molar_heat?: any[][]): any[][] {
  return sulfuricCells(sulfur_percent, mass, convention, molar_heat);
}

/**
 * Heat of what burns beside the sample: wire by length or mass, cotton, oil, polyethylene, gelatin. Give what was consumed, not what remained.
 * @param kind "nickel-chromium wire", "iron wire", "platinum wire", "copper wire", "cotton", "paraffin oil", "polyethylene", "gelatin" or "benzoic acid" [-] value
 * @param consumed What was consumed: cm of nickel-chromium and iron wire, g of all others; also as text such as "7 mg" [cm or g] value
 * @param specific_heat Heat of combustion of your own lot, J/cm for a length, J/g for a mass; also as text such as "46.1 kJ/g" [J/cm or J/g] value
 * @returns Heat [J]
 * @source astm-d240 fuse-practice
 * @example STILL.CAL.HEATOF("nickel-chromium wire",4.1) -> 39.36
 * @example STILL.CAL.HEATOF("cotton","50 mg") -> 875
 * @example STILL.CAL.HEATOF("iron wire",15) -> #VALUE! Iron wire consumed 15 cm is above 12 cm, larger than the wire: give what was consumed, the length fitted less the length that remained
 * @customfunction CAL.HEATOF
 */
export function calHeatof(kind: any[][], consumed: any[][], specific_heat?: any[][]): any[][] {
  return burningCells(kind, consumed, specific_heat);
}

/**
 * Mass in vacuum from a weighing in air. Apply it to the standard and to the samples alike, or to neither.
 * @param mass Mass as weighed in air [g] value
 * @param density Density of the sample [g/cm3] value
 * @param weights_density Density of the weights; 8.0 g/cm3 if left out [g/cm3] value
 * @param air_density Density of the air; 0.0012 g/cm3 if left out [g/cm3] value
 * @returns Mass in vacuum [g]
 * @source oiml-d28
 * @example STILL.CAL.BUOYANCY(1,1.32) -> ~ 1.0007598
 * @example STILL.CAL.BUOYANCY(1,1.32,8.4) -> ~ 1.0007669
 * @customfunction CAL.BUOYANCY
 */
export function calBuoyancy(mass: any[][], density: any[][], weights_density?: any[][], air_density?: any[][]): any[][] {
  return spread(
    [
      ["mass", mass],
      ["density", density],
      ["weights_density", weights_density],
      ["air_density", air_density],
    ],
    ([massCell, densityCell, weightsCell, airCell]) =>
      finite(
        massInVacuum(
          readMeasured(massCell, { ...SAMPLE_MASS, name: "Mass" }),
          readMeasured(densityCell, { ...DENSITY, name: "Density of the sample" }),
          readMeasuredOr(weightsCell, { ...DENSITY, name: "Density of the weights" }, buoyancy.weights),
          readMeasuredOr(airCell, AIR_DENSITY, buoyancy.air),
        ),
      ),
  );
}

/**
 * Gross value at constant volume of a run, as analysed, at the temperature of the run (about -1.2 J/g per K to 25 °C, not corrected): (equivalent × rise − heats − sulfuric heat + soot) / mass.
 * @param equivalent Energy equivalent of the calorimeter [J/K] value
 * @param rise Corrected rise [K] value
 * @param mass Mass of the sample; as the certified substance was weighed, in vacuum or in air [g] value
 * @param heats Heats beside the sample's: ignition, fuse, nitric acid, combustion aids; a row for each run, its columns added [J] block
 * @param sulfur_heat Heat of sulfuric acid, from CAL.SULFURIC or CAL.ACIDS, not among the heats [J] value
 * @param soot Soot left, added back with 33 kJ/g; more than 1 % of the sample is refused [g] value
 * @returns Gross value at constant volume, as analysed [J/g]
 * @source calorimetry
 * @example STILL.CAL.GROSS(10200,2.75,1,{50,30,42},112.9) -> ~ 27815.1
 * @example STILL.CAL.GROSS(10200,2.75,"1000 mg",122,112.9,"0.1 mg") -> ~ 27818.4
 * @example STILL.CAL.GROSS(10200,2.75,1,-50) -> #VALUE! Heat -50 J is negative
 * @customfunction CAL.GROSS
 */
export function calGross(
  equivalent: any[][],
  rise: any[][],
  mass: any[][],
  heats?: any[][],
  sulfur_heat?: any[][],
  soot?: any[][],
): any[][] {
  return grossCells(equivalent, rise, mass, heats, sulfur_heat, soot);
}

/**
 * Table of a run's corrected rise: rates, cooling constant, comparison of methods, standard uncertainty, and each fault of the run in words. Rows are counted within the readings.
 * @param times Times of the readings, one column for all runs or one for each [min] list
 * @param temperatures Temperatures, one column for each run [°C] list
 * @param fire Time of firing, one cell or one for each run in a row [min] list
 * @param end End of the main period; left out: the first reading ten times the 63 % time after firing, with less than 0.01 % of the rise to come, from which five or more readings over five or more minutes drift steadily [min] list
 * @param method "regnault-pfaundler" if left out, "dickinson" (0.60), "dickinson-63" or "adiabatic"; one cell for all runs [-] value
 * @param time_unit Unit of plain times, such as "s" or "h"; minutes if left out; one cell for all runs [-] value
 * @returns One run: label, value, unit, note; more runs: heading row, then a row for each [-]
 * @lines corrected rise | standard uncertainty of the rise | expanded uncertainty (95 %) | raw rise | correction | uncertainty from the readings | uncertainty from the trapezoids | uncertainty from heat still to come | uncertainty from bent drifts | uncertainty from the method | drift before firing | standard deviation of the drift before | drift after the main period | standard deviation of the drift after | scatter about the line before | scatter about the line after | mean temperature before firing | mean temperature of the main period | mean temperature after | cooling constant | convergence temperature | split time after firing | 63 % time | late time constant | resolution of the readings | firing | end of the main period | readings before firing | readings of the main period | readings after | rise by Regnault-Pfaundler | rise by Regnault-Pfaundler, refined | rise by Dickinson 0.60 | rise by Dickinson 0.63 | rise by one common drift | rise by mean rate
 * @source iso-1928 dickinson-1915
 * @example INDEX(STILL.CAL.RISE.REPORT({0;1;2;3;4;5;6;7;8;9;10;11;12;13;14;15;16;17;18;19;20;21;22;23;24;25},{22.6;22.6058;22.6116;22.6173;22.6231;22.6289;24.3096;24.8634;25.0462;25.1069;25.1273;25.1345;25.1374;25.1388;25.1398;25.1406;25.1413;25.1421;25.1428;25.1435;25.1442;25.1449;25.1456;25.1463;25.147;25.1477},5,15),1,2) -> ~ 2.4995
 * @example STILL.CAL.RISE.REPORT({0;0.001;0.002},{22;22;24},0.001) -> #VALUE! These look like clock times: multiply by 1440, or say the time unit, such as "s" or "d" (as minutes, all are below 1)
 * @customfunction CAL.RISE.REPORT
 */
export function calRiseReport(
  times: any[][],
  temperatures: any[][],
  fire: any[][],
  end?: any[][],
  method?: any[][],
  time_unit?: any[][],
): any[][] {
  return riseReportCells(times, temperatures, fire, end, method, time_unit);
}

/**
 * Table of the condition factor of a benzoic-acid certificate: each condition, its limits and its share; outside the limits the value stands with a warning.
 * @param pressure Oxygen pressure, absolute; also as text such as "30 atm" [MPa] value
 * @param volume Volume of the vessel; also as text such as "0.34 L" [mL] value
 * @param sample_mass Mass of benzoic acid [g] value
 * @param water_mass Mass of water put into the vessel [g] value
 * @param temperature Temperature of the reaction; also as text such as "298.15 K" [°C] value
 * @param beyond Taken as in CAL.CERTIFICATE, so that both calls can be alike; the table gives the value with or without it [-] value
 * @returns One state: label, value, unit, note; a column of states: heading row, then a row for each [-]
 * @lines condition factor | within limits | oxygen pressure | oxygen pressure, share | sample load | sample load, share | water load | water load, share | temperature | temperature, share
 * @source coops-1956
 * @example INDEX(STILL.CAL.CERTIFICATE.REPORT("40 atm",340,1,1,25),2,2) -> "yes"
 * @example INDEX(STILL.CAL.CERTIFICATE.REPORT("30 atm",340,1,5,25),11,4) -> "Water load 14.7059 g/L is outside 2 to 4 g/L, the limits of the certificate's condition factor"
 * @customfunction CAL.CERTIFICATE.REPORT
 */
export function calCertificateReport(
  pressure: any[][],
  volume: any[][],
  sample_mass: any[][],
  water_mass: any[][],
  temperature: any[][],
  beyond?: any[][],
): any[][] {
  return certificateReportCells(pressure, volume, sample_mass, water_mass, temperature, beyond);
}

/**
 * Table of a calibration series, or of other results of one kind such as gross values: mean, scatter against its limit, outlier, trends, distance from a reference, verdict in words.
 * @param equivalents Energy equivalents of the runs in their order; other results, or texts of one unit, are taken too [J/K] list
 * @param limit_percent Limit of the relative standard deviation; 0.20 % if left out; one cell [%] value
 * @param rises Corrected rises of the same runs, for a trend against the rise [K] list
 * @param reference Earlier mean or accepted value, to compare the mean with; one cell [J/K] value
 * @returns Label, value, unit, note [-]
 * @lines number of runs | mean | standard deviation | relative standard deviation | standard deviation of the mean | relative range | Grubbs' statistic | critical value, 5 % | critical value, 1 % | farthest run | value of the farthest run | slope with the order | t of the slope with the order | p of the slope with the order | slope with the rise | t of the slope with the rise | p of the slope with the rise | lowest rise | highest rise | deviation from the reference | difference from the reference | t of the difference | p of the difference | verdict
 * @source iso-1928 iso-5725-2 calibration-practice
 * @example INDEX(STILL.CAL.SERIES({10186;10201;10194;10209;10198}),2,2) -> 10197.6
 * @example INDEX(STILL.CAL.SERIES({10186;10201;10194;10209;10198}),24,2) -> "accept: mean of 5 runs"
 * @example STILL.CAL.SERIES({10186}) -> #VALUE! A series needs at least 2 runs, not 1
 * @customfunction CAL.SERIES
 */
export function calSeries(equivalents: any[][], limit_percent?: any[][], rises?: any[][], reference?: any[][]): any[][] {
  return seriesCells(equivalents, limit_percent, rises, reference);
}

/**
 * Table of the acids of a run from the total acid and the sulfur content: both conventions side by side, and the size of the mistakes between them.
 * @param total_acid Titrant used for all acid [mL] value
 * @param concentration Concentration of the titrant, in acid equivalents [mol/L] value
 * @param sulfur_percent Sulfur of the sample, as analysed [%] value
 * @param mass Mass of the sample [g] value
 * @param convention "separated" or "total": which heats the first lines give [-] value
 * @returns One run: label, value, unit, note; a column of runs: heading row, then a row for each [-]
 * @lines heat for the column of heats | heat for sulfur_heat | convention | all acid | sulfuric acid | nitric acid | both heats, separated, per gram of sample | both heats, total, per gram of sample | gross value too low by, if deducted twice | gross value too high by, if deducted in part
 * @source iso-1928-acids calorimetry
 * @example INDEX(STILL.CAL.ACIDS(11.737,0.1,1.2,0.9,"separated"),1,2) -> ~ 30.0
 * @example INDEX(STILL.CAL.ACIDS(11.737,0.1,1.2,0.9,"total"),8,2) -> ~ 146.26
 * @customfunction CAL.ACIDS
 */
export function calAcids(
  total_acid: any[][],
  concentration: any[][],
  sulfur_percent: any[][],
  mass: any[][],
  convention: any[][],
): any[][] {
  return acidsCells(total_acid, concentration, sulfur_percent, mass, convention);
}

/**
 * Table of the double titration of the washings: barium hydroxide to neutral, sodium carbonate in excess, hydrochloric acid back.
 * @param barium Volume of barium hydroxide [mL] value
 * @param acid Volume of hydrochloric acid for the back titration [mL] value
 * @param carbonate Volume of sodium carbonate added; 20.0 mL if left out [mL] value
 * @param concentrations Concentrations of barium hydroxide, sodium carbonate and hydrochloric acid, three cells; 0.05, 0.05, 0.1 if left out [mol/L] list
 * @returns One run: label, value, unit, note; a column of runs: heading row, then a row for each [-]
 * @lines heat of nitric acid | heat of sulfuric acid | nitric acid | sulfuric acid | sulfur in the washings
 * @source iso-1928-acids
 * @example INDEX(STILL.CAL.TITRATION(9,15),1,2) -> ~ 30.0
 * @example INDEX(STILL.CAL.TITRATION(9,15),2,2) -> ~ 60.4
 * @customfunction CAL.TITRATION
 */
export function calTitration(barium: any[][], acid: any[][], carbonate?: any[][], concentrations?: any[][]): any[][] {
  return titrationCells(barium, acid, carbonate, concentrations);
}

/**
 * Table of the reduction of a vessel's combustion energy to the standard state (Washburn): every term with the sign it has when added, and the result.
 * @param formula Formula of the substance, such as "C7H6O2" [-] value
 * @param specific_energy Heat of the isothermal vessel process for each gram, ignition, fuse and aids deducted; positive [J/g] value
 * @param mass Mass of the substance, in vacuum [g] value
 * @param volume Volume of the vessel; also as text such as "0.34 L" [mL] value
 * @param water Mass of water put into the vessel [g] value
 * @param pressure Oxygen pressure before firing, absolute [MPa] value
 * @param nitric_mol Nitric acid formed, if its heat is not deducted yet [mol] value
 * @param sulfuric_mol Sulfuric acid formed, if its heat is not deducted yet [mol] value
 * @param temperature Temperature of the reaction; 25 °C if left out [°C] value
 * @param density Density of the substance [g/cm3] value
 * @param form "full" if left out, "three-term" or "percent"; the last two are approximate [-] value
 * @returns One state: label, value, unit, note; a column of states: heading row, then a row for each [-]
 * @lines −ΔcU° | ΔcU° | ΔcU°, molar | correction | form | compound | oxygen pressure at 25 °C | oxygen before, gas | oxygen before, dissolved | oxygen needed | vapour before | liquid water before | pressure after | mole fraction of CO2 after | carbon dioxide after, gas | carbon dioxide after, dissolved | other gas after | oxygen after, dissolved | vapour after | liquid water after | energy of the vessel process ΔU | to 25 °C | compression of the compound | compression of the water | evaporation of water | dissolution of oxygen | oxygen to the pressure of the charge | gas to no pressure | release of carbon dioxide | release of oxygen | condensation of vapour | decomposition of nitric acid | sulfuric acid to 115 H2O | decompression of the water | sum of the terms | not counted
 * @source washburn-1933 hubbard-1956
 * @example INDEX(STILL.CAL.STANDARD("C7H6O2",26434,1,340,1,"30 atm"),1,2) -> ~ 26413.3
 * @example INDEX(STILL.CAL.STANDARD("C7H6O2",26434,1,340,1,"30 atm",,,,,"percent"),4,2) -> ~ -0.0807
 * @example STILL.CAL.STANDARD("C7H6O2",26434,1,340,1,30) -> #VALUE! Oxygen pressure 30 MPa is above 6 MPa: say "30 atm" or "30 bar"
 * @customfunction CAL.STANDARD
 */
export function calStandard(
  formula: any[][],
  specific_energy: any[][],
  mass: any[][],
  volume: any[][],
  water: any[][],
  pressure: any[][],
  nitric_mol?: any[][],
  sulfuric_mol?: any[][],
  temperature?: any[][],
  density?: any[][],
  form?: any[][],
): any[][] {
  return standardCells(formula, specific_energy, mass, volume, water, pressure, nitric_mol, sulfuric_mol, temperature, density, form);
}

/**
 * Table of an oxygen vessel's charge before firing, against the limits of the vessel itself: energy, pressure, oxygen. The vessel's certificate and local rules govern.
 * @param masses Masses of sample and combustion aids [g] list
 * @param specific_energies Specific energies of the same, in the same order [J/g] list
 * @param pressure Oxygen pressure, absolute; one cell [MPa] value
 * @param volume Volume of the vessel; also as text such as "0.34 L"; one cell [mL] value
 * @param energy_limit Greatest energy of a charge, from the certificate of the vessel; one cell [J] value
 * @param pressure_limit Greatest oxygen pressure, absolute, from the certificate of the vessel; one cell [MPa] value
 * @param formula Formula of the sample, or one for each part; where left out, oxygen is reckoned from the heat [-] list
 * @param unknown "unknown" or TRUE if the sample is unknown; one cell [-] value
 * @returns Label, value, unit, note, with cautions [-]
 * @lines verdict | energy of the charge | share of the energy limit | oxygen pressure | share of the pressure limit | oxygen in the vessel | oxygen needed | oxygen, times what is needed | standing caution | standing caution | standing caution | standing caution
 * @source vessel-practice thornton-1917
 * @example INDEX(STILL.CAL.CHARGE(1,26434,"2.5 MPa","0.34 L","33 kJ","4 MPa","C7H6O2"),1,2) -> "caution"
 * @example INDEX(STILL.CAL.CHARGE({1;0.5},{26434;46000},"3 MPa","0.34 L","33 kJ","4 MPa"),1,2) -> "do not fire"
 * @customfunction CAL.CHARGE
 */
export function calCharge(
  masses: any[][],
  specific_energies: any[][],
  pressure: any[][],
  volume: any[][],
  energy_limit: any[][],
  pressure_limit: any[][],
  formula?: any[][],
  unknown?: any[][],
): any[][] {
  return chargeCells(masses, specific_energies, pressure, volume, energy_limit, pressure_limit, formula, unknown);
}

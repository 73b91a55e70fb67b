/**
 * 2,2,4-Trimethylpentane through the whole chain: calibration with benzoic acid, run, reduction, formation, value by weight in air.
 * Outside values: 47.788 MJ/kg by weight in air, the check value of ASTM D240 (from memory); enthalpy of combustion -5461.3 kJ/mol and of
 * formation -259.2 kJ/mol (literature values, from memory); benzoic acid 26 434 J/g (NIST certificate, from memory).
 */
import { temperatureAt } from "../core/calorimeter/rise-model";
import { call, number } from "../functions/helpers";

const EQUIVALENT = 10185;
const TIMES = Array.from({ length: 101 }, (_, i) => [i * 0.25]);
const BRASS = 8.4;
const BENZOIC = 1.32;
const OCTANE = 0.6878;
const HEATS = [[42, 78, 12]];

const lineOf = (table: readonly (readonly unknown[])[], label: string) => Number(table.find((row) => row[0] === label)?.[1]);

/** Corrected rise of a run of the single-body model that releases a heat, through CAL.RISE. */
function riseFrom(heat: number): number {
  const model = { start: 22.8, convergence: 25.5, constant: 0.002, release: 0.75, fire: 5, rise: heat / EQUIVALENT };
  return number(
    "CAL.RISE",
    TIMES,
    TIMES.map(([time]) => [temperatureAt(model, time!)]),
    5,
    15,
  );
}

const reduced = (energy: number, mass: number) => lineOf(call("CAL.STANDARD", "C8H18", energy, mass, 340, 1, "30 atm"), "−ΔcU°");

test("isooctane: 47.788 MJ/kg by weight in air, -259.2 kJ/mol of formation", () => {
  // Energy between standard states from the literature's enthalpy of combustion.
  const literature = lineOf(call("FUEL.COMBUSTION", "C8H18", "-5461.3 kJ/mol", "enthalpy"), "gross value at constant volume");

  // Calibration: masses in vacuum, certificate carried to the conditions of the run.
  const benzoic = number("CAL.BUOYANCY", 1.0003, BENZOIC, BRASS);
  const factor = number("CAL.CERTIFICATE", "30 atm", 340, benzoic, 1, 25);
  const calibration = riseFrom(benzoic * 26434 * factor + 132);
  const equivalent = number("CAL.EQUIVALENT", benzoic, 26434, calibration, HEATS, factor);
  expect(equivalent / EQUIVALENT - 1).toBeLessThan(2e-5); // trapezoids of 15 s
  expect(equivalent / EQUIVALENT - 1).toBeGreaterThan(0);

  // The run: what the vessel gives for that energy between standard states, then back through every step.
  const octane = number("CAL.BUOYANCY", 0.5487, OCTANE, BRASS);
  const vessel = 2 * literature - reduced(literature, octane);
  const gross = number("CAL.GROSS", equivalent, riseFrom(octane * vessel + 132), octane, HEATS);
  expect(Math.abs(gross - vessel)).toBeLessThan(0.2); // the trapezoids of both runs nearly cancel
  const standard = reduced(gross, octane);
  const combustion = call("FUEL.COMBUSTION", "C8H18", standard);
  expect(lineOf(combustion, "enthalpy of combustion ΔcH°")).toBeCloseTo(-5461.3, 1);
  expect(Math.abs(lineOf(combustion, "enthalpy of formation ΔfH°") + 259.2)).toBeLessThan(0.2); // 259.3 by the products' CODATA values

  // By weight in air, as the method reports it.
  const inAir = standard * number("CAL.BUOYANCY", 1, OCTANE, BRASS);
  expect(number("CAL.BUOYANCY", 1, OCTANE, BRASS)).toBeCloseTo(1.0016046, 7);
  expect(Math.abs(inAir - 47788)).toBeLessThan(1); // printed to 1 J/g
});

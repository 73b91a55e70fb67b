import fc from "fast-check";
import { derivedGrossPressureConstants, derivedNetConstants, type WaterFigures } from "../../../src/core/fuel/net-constants";
import { grossAtConstantPressure, netValue } from "../../../src/core/fuel/net-value";
import { molarMass, parseFormula } from "../../../src/core/species/formula";
import { refusedWith } from "../refused";

const weights = new Map([
  ["C", 12.011],
  ["H", 1.008],
  ["N", 14.007],
  ["O", 15.999],
]);
const massOf = (formula: string) => molarMass(parseFormula(formula), weights);
const water: WaterFigures = {
  vaporisation: 44012,
  waterMass: massOf("H2O"),
  hydrogenMass: massOf("H2"),
  oxygenMass: massOf("O2"),
  nitrogenMass: massOf("N2"),
};
const RT = 8.31446261815324 * 298.15;
const pressure = derivedNetConstants("constant-pressure", water);
const volume = derivedNetConstants("constant-volume", water);

const wood = { gross: 20200, hydrogen: 6.1, oxygen: 42.5, nitrogen: 0.1 };
const printedPressure = { hydrogen: 212.2, oxygen: 0.8, nitrogen: 0.8, moisture: 24.43 };
const printedVolume = { hydrogen: 206, oxygen: 0, nitrogen: 0, moisture: 23.05 };

// Recomputed here from the formula with the printed constants, J/g: 20200 - 1294.42 - 34.08 and so on; to the digits shown.
test("wood, by hand", () => {
  expect(netValue(wood, 0, printedPressure)).toBeCloseTo(18871.5, 9);
  expect(netValue(wood, 8, printedPressure)).toBeCloseTo(17166.34, 9);
  expect(netValue(wood, 8, printedVolume)).toBeCloseTo(17243.528, 9);
  expect(grossAtConstantPressure(wood, { hydrogen: 6.15, oxygen: 0.8, nitrogen: 0.8 })).toBeCloseTo(20203.435, 9);
});

test("the derived constants give the same wood within what rounding of the printed ones allows", () => {
  const bound = 0.05 * 6.1 + 0.05 * 42.5 + 0.1 * 0.1 + 0.005 * 8; // half a unit of each printed constant; nitrogen 0.085
  expect(Math.abs(netValue(wood, 8, pressure) - 17166.34)).toBeLessThan(bound);
  expect(Math.abs(netValue(wood, 8, volume) - 17243.53)).toBeLessThan(0.05 * 6.1 + 0.005 * 8 + 0.01);
});

/** A compound C_c H_h O_o N_n, solid or liquid, as a dry sample. */
function sampleOf(c: number, h: number, o: number, n: number, gross: number) {
  const mass = c * weights.get("C")! + h * weights.get("H")! + o * weights.get("O")! + n * weights.get("N")!;
  const share = (symbol: string, count: number) => (100 * count * weights.get(symbol)!) / mass;
  return { mass, sample: { gross, hydrogen: share("H", h), oxygen: share("O", o), nitrogen: share("N", n) } };
}

const compound = fc.tuple(
  fc.integer({ min: 1, max: 20 }),
  fc.integer({ min: 0, max: 40 }),
  fc.integer({ min: 0, max: 20 }),
  fc.integer({ min: 0, max: 8 }),
  fc.double({ min: 8000, max: 55000, noNaN: true }),
);
const possible = compound.filter(([c, h, o, n, gross]) => sampleOf(c, h, o, n, gross).sample.hydrogen <= 26);

test("against stoichiometry: the work of the gas formed, with liquid water for gross and steam for net values", () => {
  fc.assert(
    fc.property(possible, ([c, h, o, n, gross]) => {
      const { mass, sample } = sampleOf(c, h, o, n, gross);
      const gasWithLiquid = o / 2 + n / 2 - h / 4; // mol of gas formed less O2 taken up, per mol: c + n/2 - (c + h/4 - o/2)
      const gasWithSteam = gasWithLiquid + h / 2;
      const grossPressure = grossAtConstantPressure(sample, derivedGrossPressureConstants(water));
      expect(grossPressure).toBeCloseTo(gross - (gasWithLiquid * RT) / mass, 8);
      expect(netValue(sample, 0, pressure)).toBeCloseTo(grossPressure - ((h / 2) * water.vaporisation) / mass, 8);
      expect(netValue(sample, 0, pressure)).toBeCloseTo(netValue(sample, 0, volume) - (gasWithSteam * RT) / mass, 8);
    }),
  );
});

test("net at constant pressure and at constant volume differ by RT of all the gas formed, moisture's steam among it", () => {
  fc.assert(
    fc.property(possible, fc.double({ min: 0, max: 100, noNaN: true }), ([c, h, o, n, gross], moisture) => {
      const { sample } = sampleOf(c, h, o, n, gross);
      const { hydrogen, oxygen, nitrogen } = sample;
      const fromDry = hydrogen / (2 * water.hydrogenMass) + oxygen / water.oxygenMass + nitrogen / water.nitrogenMass;
      const gas = (fromDry * (100 - moisture)) / 100 + moisture / water.waterMass; // mol per 100 g
      expect(netValue(sample, moisture, volume) - netValue(sample, moisture, pressure)).toBeCloseTo((gas * RT) / 100, 8);
    }),
  );
});

test("pure water has the negative of its vaporisation; very wet wood is below zero", () => {
  expect(netValue(wood, 100, pressure)).toBeCloseTo(-44012 / 18.015, 8);
  expect(netValue(wood, 88, pressure)).toBeGreaterThan(0);
  expect(netValue(wood, 89, pressure)).toBeLessThan(0);
});

test("what no fuel is", () => {
  const refused = (change: Partial<typeof wood>, moisture = 8) => refusedWith(() => netValue({ ...wood, ...change }, moisture, pressure));
  expect(refused({ gross: 20.2e6 })).toBe(
    "range: Gross value 20200000 J/g is above 150000 J/g; hydrogen, the highest of fuels, gives 142000 J/g",
  );
  expect(refused({ gross: 0 })).toBe("range: Gross value 0 J/g is not above 0 J/g");
  expect(refused({ gross: NaN })).toBe("range: Gross value NaN J/g is not above 0 J/g");
  expect(refused({ hydrogen: 27 })).toBe("range: Hydrogen 27 % is above 26 %; methane, the richest in hydrogen, has 25.1 %");
  expect(refused({ oxygen: 94.5 })).toBe("range: Hydrogen, oxygen and nitrogen add up to 100.7 %, above 100 %");
  expect(refused({ nitrogen: -0.1 })).toBe("range: Nitrogen -0.1 % is not between 0 % and 100 %");
  expect(refused({}, 100.5)).toBe("range: Moisture 100.5 % is not between 0 % and 100 %");
  expect(refusedWith(() => grossAtConstantPressure({ ...wood, oxygen: 101 }, pressure))).toBe(
    "range: Oxygen 101 % is not between 0 % and 100 %",
  );
});

test("methane's hydrogen passes the limit it gives", () => {
  expect(sampleOf(1, 4, 0, 0, 55500).sample.hydrogen).toBeCloseTo(25.1, 1);
  expect(netValue(sampleOf(1, 4, 0, 0, 55500).sample, 0, pressure)).toBeCloseTo(55500 - 212.2 * 25.13, -1); // to 5 J/g
});

test("a dry net value is above zero; a gross value too small for its hydrogen is refused", () => {
  expect(refusedWith(() => netValue({ ...wood, gross: 1000, hydrogen: 10 }, 0, pressure))).toMatch(
    /^range: The net value of the dry sample would be -1154\.\d+ J\/g: a gross value of 1000 J\/g does not go with 10 % hydrogen$/,
  );
});

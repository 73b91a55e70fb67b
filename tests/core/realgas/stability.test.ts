/** Which mixtures are one phase: known cases, phase boundaries found another way, and that the test always comes to an end. */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../../src/core/constants";
import type { CubicGas } from "../../../src/core/realgas/cubic-gas";
import { cubicSaturation } from "../../../src/core/realgas/saturation";
import { splits } from "../../../src/core/realgas/stability";
import { stableVolume, volumesAt } from "../../../src/core/realgas/volumes";
import { fractionsOf } from "../../laws/realgas-support";
import { criticalPoint, type Equation, EQUATIONS, mixtureOf } from "./gases";

const R = GAS_CONSTANT;
type Fractions = Readonly<Record<string, number>>;

const splitsAt = (gas: CubicGas, t: number, p: number) => splits(gas, t, stableVolume(gas, t, p));

describe("mixtures that are known", () => {
  const AIR: Fractions = { N2: 0.7808, O2: 0.2095, Ar: 0.0093, CO2: 0.0004 };
  const CLEAN: Fractions = { N2: 0.7812, O2: 0.2095, Ar: 0.0093 };
  const NATURAL: Fractions = { CH4: 0.9, C2H6: 0.05, C3H8: 0.015, "n-C4H10": 0.005, N2: 0.02, CO2: 0.01 };
  const SYNGAS: Fractions = { H2: 0.35, CO: 0.4, CO2: 0.2, CH4: 0.01, N2: 0.04 };
  const FLUE: Fractions = { N2: 0.8, CO2: 0.14, O2: 0.06 };
  const OIL: Fractions = { CH4: 0.9, "n-C4H10": 0.1 };
  const BOTTLED: Fractions = { C3H8: 0.6, "n-C4H10": 0.4 };

  test.each<[string, Fractions, number, number, boolean]>([
    ["air in a bottle", AIR, 300, 3e7, false],
    ["cold air of one atmosphere, without CO2", CLEAN, 100, 101325, false],
    ["cold air of one atmosphere, whose 40 Pa of CO2 are far above what it could hold", AIR, 100, 101325, true],
    ["air colder than its dew point of 81.7 K", CLEAN, 80, 101325, true],
    ["air of 35 bar near its critical point", CLEAN, 140, 3.5e6, false],
    ["natural gas in a pipe", NATURAL, 300, 1e7, false],
    ["natural gas, cold and of 40 bar", NATURAL, 220, 4e6, true],
    ["synthesis gas", SYNGAS, 300, 1e7, false],
    ["synthesis gas, cold", SYNGAS, 200, 1e7, true],
    ["flue gas of 100 bar", FLUE, 300, 1e7, false],
    ["methane and butane at 250 K and 60 bar", OIL, 250, 6e6, true],
    ["methane and butane at 350 K and 60 bar", OIL, 350, 6e6, false],
    ["methane and butane at 250 K and 0.5 bar", OIL, 250, 5e4, false],
    ["propane and butane, a gas at 1 bar", BOTTLED, 300, 1e5, false],
    ["propane and butane at 5 bar", BOTTLED, 300, 5e5, true],
    ["propane and butane, a liquid at 20 bar", BOTTLED, 300, 2e6, false],
    ["hydrogen and nitrogen for ammonia", { H2: 0.75, N2: 0.25 }, 300, 2e7, false],
  ])("%s", (_, fractions, t, p, expected) => {
    for (const equation of EQUATIONS) expect([equation, splitsAt(mixtureOf(fractions, equation), t, p)]).toEqual([equation, expected]);
  });

  test("a pressure that is not above 0, and a volume between spinodals, are never one phase", () => {
    const gas = mixtureOf(OIL);
    expect(gas.pressure(150, 5e-5)).toBeLessThan(0);
    expect(splits(gas, 150, 5e-5)).toBe(true);
    expect(gas.pressureByVolume(150, 3e-4)).toBeGreaterThan(0);
    expect(splits(gas, 150, 3e-4)).toBe(true);
  });

  test("no mixture splits above the critical temperature of its heaviest part", () => {
    const gas = mixtureOf(OIL);
    const { temperature } = criticalPoint("n-C4H10");
    for (const p of [1e5, 1e7, 1e8]) expect(splitsAt(gas, temperature, p)).toBe(false);
  });

  test("a part of amount 0 changes nothing", () => {
    for (const [t, p] of [
      [250, 6e6],
      [350, 6e6],
      [300, 3e6],
    ] as const)
      // prettier-ignore
      expect(splitsAt(mixtureOf({ ...OIL, C3H8: 0, CO2: 0 }), t, p)).toBe(splitsAt(mixtureOf(OIL), t, p));
  });
});

/** P, Pa, between two pressures where the answer of the test changes. */
function boundary(gas: CubicGas, t: number, below: number, above: number): number {
  let [low, high] = [below, above];
  const atLow = splitsAt(gas, t, low);
  expect(splitsAt(gas, t, high)).toBe(!atLow);
  while (high / low - 1 > 1e-9) {
    const middle = Math.sqrt(low * high);
    if (splitsAt(gas, t, middle) === atLow) low = middle;
    else high = middle;
  }
  return Math.sqrt(low * high);
}

/**
 * Dew point of a mixture z at T: P and the drop x, by x_i = z_i φ_i(vapour)/φ_i(liquid) and Newton's method in ln P on Σ x − 1, from Raoult's
 * law with the vapour pressures of the equation itself. Written apart from the test of the tangent plane.
 */
function dewPoint(gas: CubicGas, t: number): number {
  const z = gas.parts.map(({ fraction }) => fraction);
  const saturations = gas.parts.map(({ critical }) => {
    const pure = mixtureOf({ [critical.species]: 1 }, gas.form.id as Equation);
    return (
      cubicSaturation(pure, t)?.pressure ?? critical.pressure * Math.exp(5.4 * (1 + critical.acentric) * (1 - critical.temperature / t))
    );
  });
  let p = 1 / z.reduce((sum, fraction, i) => sum + fraction / saturations[i]!, 0);
  let x = z.map((fraction, i) => (fraction * p) / saturations[i]!);
  const drop = (pressure: number, from: readonly number[]) => {
    const vapour = gas.logFugacities(t, volumesAt(gas, t, pressure).thin, pressure);
    let wanted = [...from];
    for (let step = 0; step < 400; step++) {
      const total = wanted.reduce((sum, each) => sum + each, 0);
      const liquid = gas.withFractions(wanted.map((each) => each / total));
      const logs = liquid.logFugacities(t, volumesAt(liquid, t, pressure).dense, pressure);
      const next = z.map((fraction, i) => fraction * Math.exp(vapour[i]! - logs[i]!));
      const moved = Math.max(...next.map((each, i) => Math.abs(each / wanted[i]! - 1)));
      wanted = next;
      if (moved < 1e-13) break;
    }
    return wanted;
  };
  for (let step = 0; step < 60; step++) {
    x = drop(p, x);
    const excess = (pressure: number) => Math.log(drop(pressure, x).reduce((sum, each) => sum + each, 0));
    const change = excess(p) / ((excess(p * 1.0001) - excess(p / 1.0001)) / (2 * Math.log(1.0001)));
    p *= Math.exp(-Math.max(-0.3, Math.min(0.3, change)));
    if (Math.abs(change) < 1e-11) return p;
  }
  throw new Error(`no dew point at ${t} K`);
}

describe("the dew point by equal fugacities", () => {
  test.each<[Fractions, number, Equation]>([
    [{ CH4: 0.9, "n-C4H10": 0.1 }, 300, "peng-robinson"],
    [{ CH4: 0.9, "n-C4H10": 0.1 }, 270, "soave"],
    [{ C3H8: 0.6, "n-C4H10": 0.4 }, 300, "peng-robinson"],
    [{ CO2: 0.5, C3H8: 0.5 }, 280, "peng-robinson"],
    [{ N2: 0.7808, O2: 0.2095, Ar: 0.0093, CO2: 0.0004 }, 100, "peng-robinson"],
    [{ N2: 0.5, C2H6: 0.5 }, 220, "soave"],
    [{ H2S: 0.3, CO2: 0.3, CH4: 0.4 }, 240, "peng-robinson"],
    [{ CH4: 0.98, "n-C7H16": 0.02 }, 300, "peng-robinson"],
  ])("%j at %d K, %s", (fractions, t, equation) => {
    const gas = mixtureOf(fractions, equation);
    const dew = dewPoint(gas, t);
    // A distance of the tangent plane of less than 1e-9 counts as none: the pressure may be some 1e-9 too high.
    expect(Math.abs(boundary(gas, t, 0.5 * dew, 1.2 * dew) / dew - 1)).toBeLessThan(1e-7);
  });
});

describe("water in gases", () => {
  /** The formula of Magnus with constants for water from 0 to 100 °C, Pa (from memory), good to 0.5 % here. */
  const magnus = (t: number) => 611.2 * Math.exp((17.62 * (t - 273.15)) / (t - 30.03));
  const humid = (fraction: number, species = "N2") =>
    mixtureOf({ [species]: 1 - fraction, H2O: fraction }, "peng-robinson", (name) =>
      name === "H2O" ? { ...criticalPoint(name), vapourPressure: magnus } : criticalPoint(name),
    );

  test.each([280, 300, 330, 360])("at %d K and 1 atm the dew point is where x P is the vapour pressure, within 1 %", (t) => {
    const saturated = magnus(t) / 101325;
    // Rounded digits of a saturated gas are served: one per cent.
    expect(splitsAt(humid(0.99 * saturated), t, 101325)).toBe(false);
    expect(splitsAt(humid(1.005 * saturated), t, 101325)).toBe(false);
    expect(splitsAt(humid(1.025 * saturated), t, 101325)).toBe(true);
  });

  test("at 100 bar air takes up more water than x P says: pressure on the liquid, and attraction", () => {
    const t = 300;
    const low = magnus(t) / 1e7;
    // By tables of the enhancement factor (from memory) 1.2 to 1.6 times as much.
    expect(splitsAt(humid(1.15 * low), t, 1e7)).toBe(false);
    expect(splitsAt(humid(1.7 * low), t, 1e7)).toBe(true);
  });

  test("the limit is the fugacity of the liquid: that of its vapour, lifted by v (P − Ps)/(R T)", () => {
    const [t, p] = [320, 1e7];
    let [dry, wet] = [0, 0.02];
    while (wet - dry > 1e-14) {
      const middle = (dry + wet) / 2;
      if (splitsAt(humid(middle), t, p)) wet = middle;
      else dry = middle;
    }
    const gas = humid(wet);
    const water = mixtureOf({ H2O: 1 });
    const saturated = magnus(t);
    const own = Math.log((wet / 1.01) * p) + gas.logFugacities(t, stableVolume(gas, t, p))[1]!;
    const liquid = Math.log(saturated) + water.logFugacity(t, volumesAt(water, t, saturated).thin);
    const lift = (volumesAt(water, t, p).dense * (p - saturated)) / (R * t);
    expect(lift).toBeGreaterThan(0.07);
    expect(Math.abs(own - liquid - lift)).toBeLessThan(1e-10);
  });

  test("much water is never one gas with little air, nor is a mixture with a drop of a third part", () => {
    expect(splitsAt(humid(0.5), 320, 101325)).toBe(true);
    const withVapour = (name: string) => (name === "H2O" ? { ...criticalPoint(name), vapourPressure: magnus } : criticalPoint(name));
    const dry = { N2: 0.89, "n-C7H16": 0.1, H2O: 0.01 };
    // heptane at 300 K has 6.7 kPa: 10 kPa of it condense, beside water that does not
    expect(splitsAt(mixtureOf(dry, "peng-robinson", withVapour), 300, 1e5)).toBe(true);
    expect(splitsAt(mixtureOf({ N2: 0.95, "n-C7H16": 0.04, H2O: 0.01 }, "peng-robinson", withVapour), 300, 1e5)).toBe(false);
  });
});

describe("any mixture, from 195 to 700 K and 1e2 to 5e8 Pa", () => {
  const state = fc.tuple(
    fractionsOf(2, 6),
    fc.constantFrom(...EQUATIONS),
    // from 0.3 of the critical temperature of water: below it the equation tells no liquid of it, and a search may end without an answer
    fc.double({ min: Math.log(195), max: Math.log(700), noNaN: true }).map(Math.exp),
    fc.double({ min: Math.log(1e2), max: Math.log(5e8), noNaN: true }).map(Math.exp),
  );

  test("the test comes to an end with an answer, and both answers are met", () => {
    const answers = [0, 0];
    fc.assert(
      fc.property(state, ([fractions, equation, t, p]) => {
        answers[Number(splitsAt(mixtureOf(fractions, equation), t, p))]!++;
      }),
      { numRuns: 3000 },
    );
    expect(Math.min(...answers)).toBeGreaterThan(400);
  });

  test("a trial that creeps along the tangent plane ends, and another one proves that there are two phases", () => {
    const fractions = {
      CO2: 0.00926025271163552,
      CO: 0.06528215729386577,
      H2: 0.027127562705435992,
      C3H8: 0.1867578084444177,
      NH3: 0.5692662313685917,
      Ar: 0.14230598747605322,
    };
    expect(splitsAt(mixtureOf(fractions, "soave"), 298.3937089327107, 8871181.039511405)).toBe(true);
  });

  test("thin and cold: 2 % of water at 214 K and 100 Pa frosts, and the estimate of Wilson does not hide it", () => {
    const fractions = { O2: 0.020382285146480328, H2O: 0.020382285146480328, CH4: 0.7967714379553286, CO2: 0.16246399175171067 };
    expect(splitsAt(mixtureOf(fractions, "peng-robinson"), 214.27821715807227, 100)).toBe(true);
  });

  test("dense: a gas above its critical temperature parts from liquid water too", () => {
    const fractions = { H2O: 0.9910865019842813, C3H8: 0.004456749007859356, "n-C4H10": 0.004456749007859356 };
    expect(splitsAt(mixtureOf(fractions, "peng-robinson"), 526.6460917940004, 61192108.118740946)).toBe(true);
    const dissolved = { CH4: 0.0072910714924287615, H2O: 0.9927089285075712 };
    expect(splitsAt(mixtureOf(dissolved, "soave"), 489.98514023429004, 483855535.4613683)).toBe(true);
  });

  test("what is one phase is no worse than any other phase tried at random", () =>
    fc.assert(
      fc.property(
        state,
        fc.array(fc.double({ min: 1e-6, max: 1, noNaN: true }), { minLength: 6, maxLength: 6 }),
        ([fractions, equation, t, p], w) => {
          const gas = mixtureOf(fractions, equation);
          const volume = stableVolume(gas, t, p);
          if (splits(gas, t, volume)) return;
          const own = gas.logFugacities(t, volume, p).map((log, i) => log + Math.log(gas.parts[i]!.fraction));
          const amounts = gas.parts.map((_, i) => w[i]!);
          const total = amounts.reduce((sum, each) => sum + each, 0);
          const x = amounts.map((each) => each / total);
          const trial = gas.withFractions(x);
          const logs = trial.logFugacities(t, stableVolume(trial, t, p), p);
          // Gibbs energy of the trial above the tangent plane of the mixture, per R T.
          const above = x.reduce((sum, each, i) => sum + each * (Math.log(each) + logs[i]! - own[i]!), 0);
          if (t < gas.criticalTemperature) expect(above).toBeGreaterThan(-1e-8);
        },
      ),
      { numRuns: 3000 },
    ));

  test("a gas with a trace of another splits just above the vapour pressure of the gas", () =>
    fc.assert(
      fc.property(fc.constantFrom("CO2", "C3H8", "NH3", "CH4"), fc.double({ min: 0.6, max: 0.95, noNaN: true }), (species, tr) => {
        const pure = mixtureOf({ [species]: 1 });
        const t = tr * pure.criticalTemperature;
        const { pressure } = cubicSaturation(pure, t)!;
        const gas = mixtureOf({ [species]: 1 - 1e-6, Ar: 1e-6 });
        const metastable = gas.pressure(t, volumesAt(gas, t, 1.02 * pressure).thin);
        expect(Math.abs(metastable / (1.02 * pressure) - 1)).toBeLessThan(1e-9);
        expect(splits(gas, t, volumesAt(gas, t, 1.02 * pressure).thin)).toBe(true);
        expect(splits(gas, t, volumesAt(gas, t, 0.98 * pressure).thin)).toBe(false);
      }),
    ));
});

/** Figures in circulation about benzoic acid, and the uncertainty budget of a usual run, through the worksheet functions. */
import { number } from "../functions/helpers";

test("6318 calories are two different values of benzoic acid", () => {
  // In air by the International Table calorie, in vacuum by the thermochemical one: both print as 6318 (figures in circulation, from memory).
  const inAir = 26434 * number("CAL.BUOYANCY", 1, 1.32, 8.4);
  expect(number("UNITS", inAir, "J/g", "cal_IT/g")).toBeCloseTo(6318, 0);
  expect(number("UNITS", 26434, "J/g", "cal_th/g")).toBeCloseTo(6318, 0);
  expect(number("UNITS", inAir, "J/g", "Btu_IT/lb")).toBeCloseTo(11373, 0);
});

describe("budget of a usual run: 1 g, 10 200 J/K, 2.75 K, 27 853 J/g", () => {
  // Each contribution is the change of the result when one argument changes by its standard uncertainty. Component sizes are typical ones
  // (common practice, from memory); the contributions and their sum were computed apart from the formulas.
  interface Run {
    readonly equivalent: number;
    readonly rise: number;
    readonly mass: number;
    readonly heats: readonly number[];
    readonly sulfur: number;
    readonly soot: number;
    readonly moisture: number;
  }
  const run: Run = { equivalent: 10200, rise: 2.75, mass: 1, heats: [92, 30], sulfur: 0.797, soot: 0, moisture: 0 };
  const dry = ({ equivalent, rise, mass, heats, sulfur, soot, moisture }: Run) =>
    number(
      "FUEL.BASIS",
      number("CAL.GROSS", equivalent, rise, mass, [[...heats]], number("CAL.SULFURIC", sulfur, mass, "separated"), soot),
      "ad",
      "d",
      moisture,
    );
  const by = (change: Partial<Run>) => Math.abs(dry({ ...run, ...change }) - dry(run));
  const contributions = {
    equivalent: by({ equivalent: 10204.6 }),
    reading: by({ rise: 2.7507 }),
    drift: by({ rise: 2.7505 }),
    mass: by({ mass: 1.0002 }),
    ignition: by({ heats: [97, 30] }),
    nitric: by({ heats: [92, 35] }),
    sulfur: by({ sulfur: 0.847 }),
    soot: by({ soot: 0.0005 }) / Math.sqrt(3), // rectangular
    moisture: by({ moisture: 0.1 }),
  };

  test("the value", () => expect(dry(run)).toBeCloseTo(27853, 0));

  test.each([
    ["equivalent", 12.7],
    ["reading", 7.1],
    ["drift", 5.1],
    ["mass", 5.6],
    ["ignition", 5.0],
    ["nitric", 5.0],
    ["sulfur", 4.7],
    ["soot", 9.5],
    ["moisture", 27.9],
  ] as const)("%s contributes %s J/g", (name, printed) => {
    expect(Math.abs(contributions[name] - printed)).toBeLessThan(0.06);
  });

  test("all together 34.7 J/g, expanded 69 J/g; without moisture 20.8 and 42 J/g", () => {
    const { moisture, ...others } = contributions;
    const as = Math.hypot(...Object.values(others));
    expect(Math.abs(Math.hypot(as, moisture) - 34.7)).toBeLessThan(0.1);
    expect(Math.floor(2 * Math.hypot(as, moisture))).toBe(69); // 69.5: the figures in circulation are cut, not rounded
    expect(Math.abs(as - 20.8)).toBeLessThan(0.1);
    expect(Math.abs(2 * as - 42)).toBeLessThan(0.5);
  });
});

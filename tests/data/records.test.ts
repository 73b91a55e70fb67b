import { checkContinuity, checkGas } from "../../src/core/capacity/plausibility";
import { shapeOf } from "../../src/data/shape";
import computed from "./printed-checks.json";
import { everyRecord, titled } from "./support";

interface Anchors {
  readonly cp298?: number;
  readonly s298?: number;
  readonly h298?: number;
}

const anchors: Readonly<Record<string, Readonly<Record<string, Anchors>>>> = computed.values;

/** Steps at joints that the published fits have; each is named in the flags of its record. */
const STEPS: Readonly<Record<string, readonly number[]>> = {
  "Fe(cr) of srd69-shomate": [700, 1042, 1100],
  "Ni(cr) of srd69-shomate": [600, 700],
  "SiO2(cr,quartz) of srd69-shomate": [847],
};

describe("joints run through but at listed steps, and H(298.15 K) is the formation value", () => {
  test.each(titled(everyRecord))("%s", (name, { record, capacity }) => {
    const doubts = checkContinuity(capacity, record.formationEnthalpy).filter((check) => check.verdict === "doubt");
    const steps = STEPS[name] ?? [];
    expect(doubts.map((doubt) => doubt.check)).toEqual(steps.map((temperature) => `joint at ${temperature} K`));
    for (const temperature of steps) expect(record.flags.join("; ")).toContain(`at ${temperature} K`);
  });
});

describe("298.15 K against values computed by another program from the same coefficients", () => {
  const compared = everyRecord.filter(({ record }) => anchors[record.set]?.[record.species] !== undefined);

  test("nearly all records have them", () => expect(compared.length).toBeGreaterThan(200));

  test.each(titled(compared))("%s", (_, { record, capacity }) => {
    const { cp298, s298, h298 } = anchors[record.set]![record.species]!;
    // The other program printed three decimals (H: one), and the entropy of a fit from 300 K at 300 K.
    if (cp298 !== undefined) expect(Math.abs(capacity.cp(298.15) - cp298)).toBeLessThan(0.00051);
    if (s298 !== undefined) expect(Math.abs(capacity.entropy(Math.max(298.15, capacity.from)) - s298)).toBeLessThan(0.00051);
    if (h298 !== undefined) expect(Math.abs(capacity.enthalpy(298.15) - h298)).toBeLessThan(0.051);
  });
});

/**
 * Gases whose heat capacity leaves the classical bounds, and why. They are warnings: atoms, radicals and molecules with low electronic
 * levels may do so, and a fit may wave about its table.
 */
const WARNINGS: Readonly<Record<string, string>> = {
  "F2 of nasa-2002": "falls near 2750 K: the evaluation counts the dissociation limit of the ground state",
  "Br2 of nasa-2002": "above 1.1 of the classical limit at 2800 K: low electronic states",
  "I2 of nasa-2002": "above 1.1 of the classical limit at 2300 K: low electronic states",
  "O3 of nasa-2002": "above 1.1 of the classical limit at 1900 K: weakly bound, strongly anharmonic",
  "N of nasa-2002": "an atom; the polynomial waves 0.005 J/(mol K) under 5/2 R",
  "N of gri-1999": "an atom; the polynomial waves 0.003 J/(mol K) under 5/2 R",
  "S(g) of nasa-2002": "an atom with levels at 396 and 574 1/cm",
  "S(g) of molecular": "an atom with levels at 396 and 574 1/cm",
  "OH of nasa-2002": "a radical with a level at 140 1/cm: Cp falls below 500 K",
  "OH of gri-1999": "a radical with a level at 140 1/cm: Cp falls below 500 K",
  "OH of molecular": "a radical with a level at 140 1/cm: Cp falls below 500 K",
  "HNO of gri-1999": "above 1.1 of the classical limit at 2550 K: a low electronic state",
  "CN of gri-1999": "a radical with a level at 9246 1/cm",
  "CH of gri-1999": "a radical with low electronic states",
};

test("the gases that leave the classical bounds are the listed ones", () => {
  const warned = everyRecord
    .filter(({ record }) => record.phase === "g")
    .filter(({ record, capacity }) => checkGas(capacity, shapeOf(record)).some((check) => check.verdict === "doubt"))
    .map(({ name }) => name);
  expect(warned.sort()).toEqual(Object.keys(WARNINGS).sort());
});

test("the warning catches a mistyped sign: carbon monoxide with the last coefficient of the textbook cubic turned round", () => {
  const carbonMonoxide = everyRecord.find(({ name }) => name === "CO of gri-1999")!;
  const capacity = { ...carbonMonoxide.capacity, from: 298, to: 1800, phase: "g" as const };
  const cubic = (sign: number) => (t: number) => 28.16 + 0.001675 * t + 5.372e-6 * t ** 2 + sign * 2.222e-9 * t ** 3;
  const checked = (sign: number) => checkGas({ ...capacity, cp: cubic(sign), cv: (t: number) => cubic(sign)(t) - 8.314 }, { atoms: 2 });
  expect(
    checked(+1)
      .filter((check) => check.verdict === "doubt")
      .map((check) => check.check),
  ).toEqual([expect.stringContaining("Cp at most")]);
  expect(checked(-1).filter((check) => check.verdict === "doubt")).toEqual([]);
});

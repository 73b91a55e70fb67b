import { capacityOf } from "../../src/core/capacity";
import { GAS_CONSTANT } from "../../src/core/constants";
import { allSets, recordOf, recordsOf } from "../../src/data/library";
import { DEVIATION_AT, type PrintedRecord } from "../../src/data/records";
import molecular from "../../src/data/sets/molecular.json";

const printed = molecular.species as unknown as Readonly<Record<string, PrintedRecord>>;
const species = Object.keys(printed);

/** S at 1 bar, J/(mol K). */
function entropy(key: string, set: string, temperature: number): number {
  const record = recordOf(key, set);
  return capacityOf(record).entropy(temperature) + GAS_CONSTANT * Math.log(record.standardPressure / 100000);
}

describe("the measured differences in the notes are those of the code", () => {
  test.each(species.filter((key) => printed[key]!.deviation !== undefined))("%s", (key) => {
    const [set, ...percent] = printed[key]!.deviation!;
    const [own, other] = [capacityOf(recordOf(key, "molecular")), capacityOf(recordOf(key, set))];
    DEVIATION_AT.forEach((temperature, i) => {
      const difference = 100 * (own.cp(temperature) / other.cp(temperature) - 1);
      if (percent[i] === null) expect(difference).toBeNaN();
      else expect(Math.abs(difference - percent[i]!)).toBeLessThan(0.0051);
    });
    expect(recordOf(key, "molecular").flags.join("; ")).toContain(`Cp differs from ${set} by ${percent[0]} % at 300 K`);
  });

  test("those without a difference have no other set", () => {
    const alone = species.filter((key) => printed[key]!.deviation === undefined);
    expect(alone).toEqual(["CS2", "SF6", "HI", "CF4", "F", "Cl"]);
    for (const key of alone) expect(recordsOf(key)).toHaveLength(1);
  });
});

/** Printed differences stay under 3 % inside the range: the rule by which the range was chosen. */
test("the ranges keep the rule", () => {
  for (const key of species) {
    const { range, molecular: constants, deviation } = printed[key]!;
    expect([key, range![0]]).toEqual([key, key === "H2" ? 300 : 200]);
    expect([key, range![1]]).toEqual([key, constants!.geometry === "atom" ? 6000 : ["CH4", "O3", "F2", "I2"].includes(key) ? 1000 : 1500]);
    for (const value of deviation?.slice(1) ?? []) if (value !== null) expect(Math.abs(value as number)).toBeLessThan(3);
  }
});

/**
 * Entropies come from constants alone, so they prove rotational constants, symmetry numbers and rotors against a set that does not know
 * them. Tolerances in J/(mol K): 0.03 for atoms and firm polyatomics, 0.25 where anharmonicity and the classical rotation count.
 */
const ENTROPY: Readonly<Record<string, number>> = { H2O2: 1 };

test.each(species.filter((key) => printed[key]!.deviation !== undefined))("the entropy of %s agrees with its other set", (key) => {
  const set = printed[key]!.deviation![0];
  expect(Math.abs(entropy(key, "molecular", 300) - entropy(key, set, 300))).toBeLessThan(ENTROPY[key] ?? 0.25);
});

/** Where no other set is at hand: S(298.15 K) of CODATA and JANAF at 1 bar, from memory. */
test.each([
  ["F", 158.751, 0.004],
  ["Cl", 165.19, 0.004],
  ["HI", 206.59, 0.1],
  ["CS2", 237.98, 0.15],
  ["CF4", 261.4, 0.15],
  ["SF6", 291.7, 0.25],
])("the entropy of %s is %d J/(mol K) within %d", (key, expected, tolerance) =>
  expect(Math.abs(entropy(key, "molecular", 298.15) - expected)).toBeLessThan(tolerance),
);

test("vibrations, rotors and rotation add up to 3N degrees of freedom", () => {
  for (const key of species) {
    const { geometry, vibrations, rotors, rotation } = printed[key]!.molecular!;
    const atoms = [...recordOf(key, "molecular").formula.matchAll(/[A-Z][a-z]?(\d*)/g)].reduce(
      (sum, match) => sum + Number(match[1] || 1),
      0,
    );
    const counted = vibrations.reduce((sum, [, degeneracy]) => sum + degeneracy, 0) + (rotors?.length ?? 0);
    expect([key, counted]).toEqual([key, geometry === "atom" ? 0 : 3 * atoms - (geometry === "linear" ? 5 : 6)]);
    expect([key, rotation.length]).toEqual([key, { atom: 0, linear: 1, nonlinear: 3 }[geometry]]);
  }
});

test("linear molecules are those the shapes name", () => {
  const linear = species.filter((key) => printed[key]!.molecular!.geometry === "linear");
  for (const key of linear) expect([key, recordOf(key, "molecular").molecular!.symmetry >= 1]).toEqual([key, true]);
  expect(allSets().find((set) => set.id === "molecular")!.note).toContain("ortho and para");
});

import fc from "fast-check";
import { capacityOf, type Capacity } from "../../../src/core/capacity";
import { explainTemperature, extrapolated } from "../../../src/core/capacity/range";
import { compileMixture, type MixturePart } from "../../../src/core/mixture/compile";
import {
  benzenePower,
  carbonDioxideShomate,
  graphitePower,
  ironShomate,
  methaneNine,
  methaneSeven,
  nitrogenMolecular,
  nitrogenNine,
  nitrogenShomate,
} from "../capacity/fits";
import { refusedWith } from "../refused";

const gases = [nitrogenNine, methaneNine, methaneSeven, nitrogenShomate, carbonDioxideShomate].map(capacityOf);
const nitrogen = capacityOf(nitrogenNine);
const methane = capacityOf(methaneSeven);
const molecular = capacityOf(nitrogenMolecular);

const sumOf = (parts: readonly MixturePart[], value: (capacity: Capacity) => number) =>
  parts.reduce((sum, { capacity, amount }) => sum + amount * value(capacity), 0);

/** −Σ x R ln x, and each part brought from its own standard pressure to the mixture's. */
const mixingEntropy = (parts: readonly MixturePart[], pressure: number) => {
  const total = parts.reduce((sum, { amount }) => sum + amount, 0);
  const ofPart = ({ capacity, amount }: MixturePart) =>
    amount * capacity.gasConstant * (Math.log(capacity.standardPressure / pressure) - Math.log(amount) + Math.log(total));
  return parts.reduce((sum, part) => sum + ofPart(part), 0);
};

describe("a mixture is the sum of its parts", () => {
  const amounts = fc.array(fc.double({ min: 0, max: 3, noNaN: true }), { minLength: 6, maxLength: 6 });

  test.each([
    ["compiled", 0],
    ["one part molecular", 1],
  ])("%s", (_, share) =>
    fc.assert(
      fc.property(amounts, fc.double({ min: 0, max: 1, noNaN: true }), (numbers, place) => {
        const parts = [...gases, molecular].map((capacity, k) => ({
          capacity,
          amount: numbers[k]! * (capacity === molecular ? share : 1),
        }));
        const amount = parts.reduce((sum, part) => sum + part.amount, 0);
        fc.pre(amount > 1e-6);
        const mixture = compileMixture(parts);
        const t = mixture.from + place * (mixture.to - mixture.from);
        const close = (value: number, expected: number, scale: number) => expect(Math.abs(value - expected)).toBeLessThan(1e-12 * scale);
        const present = parts.filter((part) => part.amount > 0);
        close(
          mixture.cv(t),
          sumOf(present, (part) => part.cv(t)),
          100 * amount,
        );
        close(
          mixture.cp(t),
          sumOf(present, (part) => part.cp(t)),
          100 * amount,
        );
        close(
          mixture.energy(t),
          sumOf(present, (part) => part.energy(t)),
          1e6 * amount,
        );
        close(
          mixture.enthalpy(t),
          sumOf(present, (part) => part.enthalpy(t)),
          1e6 * amount,
        );
        close(
          mixture.entropy(t),
          sumOf(present, (part) => part.entropy(t)) + mixingEntropy(present, mixture.standardPressure),
          1e4 * amount,
        );
        close(
          mixture.gasConstant,
          sumOf(present, (part) => part.gasConstant),
          10 * amount,
        );
        close(mixture.enthalpy(t) - mixture.energy(t), mixture.gasConstant * t, 1e6 * amount);
      }),
    ),
  );

  test("a trace too small to count leaves finite numbers", () => {
    const mixture = compileMixture([
      { capacity: nitrogen, amount: 5e-324 },
      { capacity: capacityOf(methaneNine), amount: 1 },
    ]);
    expect(mixture.entropy(500)).toBeCloseTo(capacityOf(methaneNine).entropy(500), 10);
  });

  test("one part of amount 1 is that part, bit for bit in Cv", () => {
    const alone = compileMixture([{ capacity: nitrogen, amount: 1 }]);
    for (const t of [200, 298.15, 1000, 1000.0001, 6000, 20000]) expect(alone.cv(t)).toBe(nitrogen.cv(t));
    expect(alone.joints).toEqual(nitrogen.joints);
  });

  test("two halves of the same gas have no entropy to gain by mixing", () => {
    // the formula counts parts as different species: the caller joins equal ones
    const halves = compileMixture([
      { capacity: nitrogen, amount: 0.5 },
      { capacity: nitrogen, amount: 0.5 },
    ]);
    expect(halves.entropy(500) - nitrogen.entropy(500)).toBeCloseTo(nitrogen.gasConstant * Math.LN2, 10);
  });

  test("a mixture of mixtures is the mixture of all", () => {
    const inner = compileMixture([
      { capacity: nitrogen, amount: 0.25 },
      { capacity: methane, amount: 0.75 },
    ]);
    const carbonDioxide = capacityOf(carbonDioxideShomate);
    const outer = compileMixture([
      { capacity: inner, amount: 0.4 },
      { capacity: carbonDioxide, amount: 0.6 },
    ]);
    const flat = compileMixture([
      { capacity: nitrogen, amount: 0.1 },
      { capacity: methane, amount: 0.3 },
      { capacity: carbonDioxide, amount: 0.6 },
    ]);
    for (const t of [300, 1000, 1150, 2500]) {
      expect(outer.energy(t)).toBeCloseTo(flat.energy(t), 6);
      expect(outer.entropy(t)).toBeCloseTo(flat.entropy(t), 9);
    }
  });
});

describe("range and labels", () => {
  test("the parts share it, and the part that limits is named", () => {
    const mixture = compileMixture([
      { capacity: nitrogen, amount: 0.5 },
      { capacity: methane, amount: 0.3 },
      { capacity: capacityOf(carbonDioxideShomate), amount: 0.2 },
    ]);
    expect([mixture.from, mixture.to]).toEqual([298, 3500]);
    expect(mixture.joints).toEqual([1000, 1200]);
    expect(explainTemperature(mixture, 5200).message).toBe("Temperature 5200 K is above 3500 K, the upper limit of gri-1999 for CH4");
    expect(explainTemperature(mixture, 250).message).toBe("Temperature 250 K is below 298 K, the lower limit of srd69-shomate for CO2");
    expect(mixture.cv(5200)).toBeNaN();
  });

  test("a part of amount 0 does not limit", () => {
    const mixture = compileMixture([
      { capacity: nitrogen, amount: 1 },
      { capacity: methane, amount: 0 },
    ]);
    expect(mixture.to).toBe(20000);
  });

  test("parts extrapolated each at its own end", () => {
    const mixture = compileMixture([
      { capacity: extrapolated(nitrogen), amount: 0.5 },
      { capacity: extrapolated(methane), amount: 0.5 },
    ]);
    expect(mixture.cv(5000)).toBeCloseTo(0.5 * nitrogen.cv(5000) + 0.5 * methane.cv(3500), 11);
  });

  test("parts without a common temperature", () => {
    const cold = capacityOf({
      ...benzenePower,
      species: "cold",
      celsius: false,
      exponents: [0],
      intervals: [{ from: 100, to: 200, coefficients: [30] }],
    });
    const refused = refusedWith(() =>
      compileMixture([
        { capacity: cold, amount: 0.5 },
        { capacity: capacityOf(carbonDioxideShomate), amount: 0.5 },
      ]),
    );
    expect(refused).toBe("range: The parts share no temperature: srd69-shomate for CO2 begins at 298 K, textbook for cold ends at 200 K");
  });
});

describe("standard pressures and scales", () => {
  test("a common pressure is kept, different ones become 1 bar", () => {
    const carbonDioxide = capacityOf(carbonDioxideShomate);
    expect(compileMixture([{ capacity: methane, amount: 1 }]).standardPressure).toBe(101325);
    expect(
      compileMixture([
        { capacity: methane, amount: 0.5 },
        { capacity: carbonDioxide, amount: 0.5 },
      ]).standardPressure,
    ).toBe(100000);
  });

  test("one part off the formation scale, or without entropy, takes the whole with it", () => {
    const off = capacityOf({ ...nitrogenShomate, onFormationScale: false });
    const mixture = compileMixture([
      { capacity: off, amount: 0.5 },
      { capacity: capacityOf(benzenePower), amount: 0.5 },
    ]);
    expect(mixture.onFormationScale).toBe(false);
    expect(mixture.hasEntropy).toBe(false);
    expect(mixture.entropy(500)).toBeNaN();
  });
});

describe("solids beside gases", () => {
  const graphite = capacityOf(graphitePower);
  const parts = [
    { capacity: nitrogen, amount: 0.2 },
    { capacity: methane, amount: 0.2 },
    { capacity: graphite, amount: 0.6 },
  ];
  const mixture = compileMixture(parts);

  test("only the gases have R T between H and U", () => {
    expect(mixture.gasConstant).toBeCloseTo(0.4 * 8.31451, 12);
    expect(mixture.cv(500)).toBeCloseTo(
      sumOf(parts, (part) => part.cv(500)),
      11,
    );
    expect(mixture.energy(500)).toBeCloseTo(
      sumOf(parts, (part) => part.energy(500)),
      7,
    );
  });

  test("only the gases mix", () => {
    const expected = sumOf(parts, (part) => part.entropy(500)) + 0.4 * 8.31451 * Math.LN2 + 0.2 * 8.31451 * Math.log(101325 / 100000);
    expect(mixture.entropy(500)).toBeCloseTo(expected, 9);
  });

  test("the phase is that of the most demanding part", () => {
    const liquid = capacityOf({ ...graphitePower, phase: "l" });
    const phase = (...capacities: Capacity[]) => compileMixture(capacities.map((capacity) => ({ capacity, amount: 1 }))).phase;
    expect(phase(nitrogen)).toBe("g");
    expect(phase(nitrogen, graphite)).toBe("cr");
    expect(phase(nitrogen, graphite, liquid)).toBe("l");
    expect(phase(capacityOf(ironShomate))).toBe("cr");
  });

  test("so it is not extrapolated", () =>
    expect(refusedWith(() => extrapolated(mixture))).toMatch(/^input: The solid range of textbook for C\(gr\) is not extrapolated/));
});

describe("refusals", () => {
  test.each([-0.1, NaN, Infinity])("an amount of %d", (amount) =>
    expect(refusedWith(() => compileMixture([{ capacity: nitrogen, amount }]))).toBe(
      `input: The amount ${amount} of nasa-2002 for N2 is not a number from 0 up`,
    ),
  );

  test("nothing at all", () => {
    expect(refusedWith(() => compileMixture([]))).toBe("input: The mixture has no part with an amount above 0");
    expect(refusedWith(() => compileMixture([{ capacity: nitrogen, amount: 0 }]))).toBe(
      "input: The mixture has no part with an amount above 0",
    );
  });
});

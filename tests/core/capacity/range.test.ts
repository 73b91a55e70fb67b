import { capacityOf, type Capacity } from "../../../src/core/capacity";
import { explainTemperature, extrapolated } from "../../../src/core/capacity/range";
import { refusedWith } from "../refused";
import { ironShomate, methaneNine, methaneSeven, nitrogenMolecular, nitrogenNine } from "./fits";

const methane = capacityOf(methaneSeven);
const iron = capacityOf(ironShomate);

describe("outside the range", () => {
  test.each([199.99, 3500.001, 0, -5, NaN, Infinity, -Infinity])("%d K has no value", (t) => {
    for (const value of [methane.cp(t), methane.cv(t), methane.enthalpy(t), methane.energy(t), methane.entropy(t)]) expect(value).toBeNaN();
    const out = new Float64Array(3);
    methane.cvInto(Float64Array.of(300, t, 400), out);
    expect([...out]).toEqual([methane.cv(300), NaN, methane.cv(400)]);
  });

  test("the limits themselves have one", () => {
    expect(methane.cv(200)).toBeGreaterThan(20);
    expect(methane.cv(3500)).toBeGreaterThan(90);
    // the neighbouring doubles have none, in the loop neither
    const edges = Float64Array.of(200 * (1 - 2 ** -53), 200, 3500, 3500 * (1 + 2 ** -52));
    const out = new Float64Array(4);
    methane.cvInto(edges, out);
    expect(out[0]).toBeNaN();
    expect(out[3]).toBeNaN();
    expect([...out]).toEqual([...edges].map((t) => methane.cv(t)));
  });

  test("a joint belongs to the interval that ends there", () => {
    const step = iron.enthalpy(700 * (1 + 1e-15)) - iron.enthalpy(700);
    // Step printed with the fit: 140.9 J/mol at 700 K.
    expect(step).toBeCloseTo(140.919, 2);
    expect(iron.enthalpy(700) - iron.enthalpy(700 * (1 - 1e-15))).toBeCloseTo(0, 6);
  });

  test.each([
    [5200, "range: Temperature 5200 K is above 3500 K, the upper limit of gri-1999 for CH4"],
    [150, "range: Temperature 150 K is below 200 K, the lower limit of gri-1999 for CH4"],
    [3500.0000001, "range: Temperature 3500.0000001 K is above 3500 K, the upper limit of gri-1999 for CH4"],
    [0, "input: Temperature 0 K is not above absolute zero (0 K)"],
    [-5, "input: Temperature -5 K is not above absolute zero (0 K)"],
    [NaN, "input: The temperature is not a number"],
    [300, "input: There is no value at 300 K in gri-1999 for CH4"],
  ])("%d K is explained", (t, sentence) => {
    const refusal = explainTemperature(methane, t);
    expect(`${refusal.kind}: ${refusal.message}`).toBe(sentence);
  });
});

describe("extrapolation", () => {
  const cases: [string, Capacity][] = [
    ["seven-term", methane],
    ["nine-term", capacityOf(methaneNine)],
    ["molecular", capacityOf(nitrogenMolecular)],
  ];

  test.each(cases)("%s: inside the range nothing changes", (_, capacity) => {
    const longer = extrapolated(capacity);
    for (const t of [capacity.from, 400, 1000, 1700, capacity.to]) {
      // at the lower limit the interval that ends there is the extrapolation, whose H and S are those of the limit up to rounding
      expect(longer.cv(t)).toBeCloseTo(capacity.cv(t), 12);
      expect(longer.energy(t) / capacity.energy(t)).toBeCloseTo(1, 13);
      expect(longer.entropy(t) / capacity.entropy(t)).toBeCloseTo(1, 13);
    }
  });

  test.each(cases)("%s: Cv is held, U runs straight, S with the logarithm", (_, capacity) => {
    const longer = extrapolated(capacity);
    for (const [end, t] of [
      [capacity.from, capacity.from / 2],
      [capacity.to, capacity.to * 1.5],
    ] as const) {
      expect(longer.cv(t)).toBeCloseTo(capacity.cv(end), 12);
      const straight = capacity.energy(end) + capacity.cv(end) * (t - end);
      expect(Math.abs(longer.energy(t) - straight)).toBeLessThan(1e-11 * (Math.abs(straight) + 1e5));
      expect(longer.entropy(t)).toBeCloseTo(capacity.entropy(end) + capacity.cp(end) * Math.log(t / end), 10);
    }
  });

  test.each(cases)("%s: energy and entropy do not step at the old limits", (_, capacity) => {
    const longer = extrapolated(capacity);
    for (const end of [capacity.from, capacity.to]) {
      const above = end * (1 + 1e-15);
      expect(Math.abs(longer.energy(above) - longer.energy(end))).toBeLessThan(1e-8);
      expect(longer.entropy(above)).toBeCloseTo(longer.entropy(end), 11);
    }
  });

  test("says what it is, and has limits of its own", () => {
    const longer = extrapolated(methane);
    expect([longer.from, longer.to]).toEqual([1, 20000]);
    expect(explainTemperature(longer, 30000).message).toBe(
      "Temperature 30000 K is above 20000 K, the upper limit of the extrapolation of gri-1999 for CH4",
    );
  });

  test("a range that already reaches 20 000 K ends there", () => expect(extrapolated(capacityOf(nitrogenNine)).to).toBe(20000));

  test("refuses a solid", () =>
    expect(refusedWith(() => extrapolated(iron))).toBe(
      "input: The solid range of srd69-shomate for Fe(cr) is not extrapolated: it may end at a change of phase",
    ));
});

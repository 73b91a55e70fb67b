import fc from "fast-check";
import { capacityOf } from "../../../src/core/capacity";
import type { Capacity } from "../../../src/core/capacity/capacity";
import { temperatureAtEnergy, temperatureBySearch } from "../../../src/core/capacity/inverse";
import { segmentsOf } from "../../../src/core/capacity/segments";
import type { SpeciesFit } from "../../../src/core/species/types";
import { refusedWith } from "../refused";
import {
  benzenePower,
  carbonDioxideShomate,
  graphitePower,
  ironShomate,
  methaneNine,
  methaneSeven,
  nitrogenMolecular,
  nitrogenNine,
} from "./fits";

const fits = { nitrogenNine, methaneNine, methaneSeven, carbonDioxideShomate, graphitePower, benzenePower, nitrogenMolecular };

describe("the inverse undoes the energy", () => {
  test.each(Object.entries(fits))("%s, to 1e-9 K", (_, fit) => {
    const capacity = capacityOf(fit);
    const segments = segmentsOf(capacity);
    fc.assert(
      fc.property(fc.double({ min: capacity.from, max: capacity.to, noNaN: true }), (t) => {
        const energy = capacity.energy(t);
        const found = temperatureAtEnergy(capacity, energy);
        // Where the printed fit steps down at a joint a second temperature has the same energy.
        const twice = segments.filter(({ low, high }) => energy >= low && energy <= high).length > 1;
        if (twice) expect(Math.abs(capacity.energy(found) - energy)).toBeLessThan(1e-6);
        else expect(Math.abs(found - t)).toBeLessThan(1e-9);
        expect(found).toBeGreaterThanOrEqual(capacity.from);
        expect(found).toBeLessThanOrEqual(capacity.to);
      }),
      { numRuns: 500 },
    );
  });

  test("the table gives what a search gives", () => {
    const capacity = capacityOf(nitrogenNine);
    const segments = segmentsOf(capacity);
    for (let t = 200; t <= 20000; t *= 1.0037) {
      const energy = capacity.energy(t);
      expect(Math.abs(temperatureAtEnergy(capacity, energy) - temperatureBySearch(capacity, segments, energy))).toBeLessThan(2e-10);
    }
  });

  test("the order of the questions does not change the answers", () => {
    const energies = Array.from({ length: 200 }, (_, k) => -70000 + 1000 * k);
    const [one, other] = [capacityOf(methaneNine), capacityOf(methaneNine)];
    const rising = energies.map((energy) => temperatureAtEnergy(one, energy));
    const falling = [...energies].reverse().map((energy) => temperatureAtEnergy(other, energy));
    expect(falling.reverse()).toEqual(rising);
  });

  test("the ends of the range, exactly", () => {
    const capacity = capacityOf(methaneNine);
    expect(temperatureAtEnergy(capacity, capacity.energy(200))).toBe(200);
    expect(temperatureAtEnergy(capacity, capacity.energy(6000))).toBe(6000);
  });

  test("a sum that misses the end by rounding is the end", () => {
    const capacity = capacityOf(methaneNine);
    expect(temperatureAtEnergy(capacity, capacity.energy(6000) + 1e-8)).toBe(6000);
    expect(temperatureAtEnergy(capacity, capacity.energy(200) - 1e-9)).toBe(200);
  });

  // 2 mol of nitrogen in 10 L, 300 K, and 20 kJ: 763.70 K (computed independently with the same coefficients).
  test("final temperature of a heated gas", () => {
    const capacity = capacityOf(nitrogenNine);
    expect(temperatureAtEnergy(capacity, capacity.energy(300) + 10000)).toBeCloseTo(763.7, 2);
  });
});

describe("steps at a transition", () => {
  const iron = capacityOf(ironShomate);
  const above = (joint: number) => iron.energy(joint * (1 + 2e-16));

  test("an energy inside a step up gives the temperature of the joint", () => {
    expect(above(700)).toBeGreaterThan(iron.energy(700) + 100);
    expect(temperatureAtEnergy(iron, iron.energy(700) + 70)).toBe(700);
    expect(temperatureAtEnergy(iron, iron.energy(700) + 70, 400)).toBe(700);
  });

  test("where the fit steps down, the interval of the start is kept, else the lower one", () => {
    expect(above(1042)).toBeLessThan(iron.energy(1042) - 100);
    const energy = iron.energy(1042) - 50;
    const lower = temperatureAtEnergy(iron, energy);
    const upper = temperatureAtEnergy(iron, energy, 1050);
    expect(lower).toBeLessThan(1042);
    expect(upper).toBeGreaterThan(1042);
    expect(iron.energy(lower)).toBeCloseTo(energy, 6);
    expect(iron.energy(upper)).toBeCloseTo(energy, 6);
    expect(Math.abs(temperatureAtEnergy(iron, energy, 500) - lower)).toBeLessThan(1e-9);
  });

  test("no heat leaves every start where it is", () =>
    fc.assert(
      fc.property(fc.double({ min: 298, max: 1809, noNaN: true }), (t) => {
        expect(Math.abs(temperatureAtEnergy(iron, iron.energy(t), t) - t)).toBeLessThan(1e-9);
      }),
      { numRuns: 1000 },
    ));
});

describe("refusals", () => {
  const capacity = capacityOf(methaneSeven);

  test("above and below the reach", () => {
    expect(refusedWith(() => temperatureAtEnergy(capacity, 1e6))).toBe(
      "range: Energy 1000000 J/mol is above the reach of gri-1999 for CH4: -79630.3 J/mol at 200 K to 187616 J/mol at 3500 K",
    );
    expect(refusedWith(() => temperatureAtEnergy(capacity, -1e6))).toMatch(
      /^range: Energy -1000000 J\/mol is below the reach of gri-1999 for CH4/,
    );
    expect(refusedWith(() => temperatureAtEnergy(capacity, Infinity))).toMatch(/^range: Energy Infinity J\/mol is above the reach/);
  });

  test("an energy that is not a number", () =>
    expect(refusedWith(() => temperatureAtEnergy(capacity, NaN))).toBe("input: The energy is not a number"));

  test("a Cv that is negative: its energy has no inverse", () => {
    const nonsense: SpeciesFit = { ...graphitePower, exponents: [0], intervals: [{ from: 300, to: 400, coefficients: [-1] }] };
    expect(refusedWith(() => temperatureAtEnergy(capacityOf(nonsense), 0))).toBe(
      "input: The energy of textbook for C(gr) does not rise from 300 K to 400 K, so no temperature belongs to an energy",
    );
  });

  test("a search that does not end, with its last bracket", () => {
    const broken = { ...plain(capacity), energy: (t: number) => (t > 250 && t < 3000 ? NaN : t), cv: () => 1 };
    expect(refusedWith(() => temperatureAtEnergy(broken, 1000))).toMatch(
      /^input: The temperature of 1000 J\/mol for gri-1999 for CH4 was not found in 100 steps; it lies between \d+ K and \d+ K$/,
    );
  });

  function plain(of: Capacity): Capacity {
    return Object.assign(Object.create(null) as object, of, { joints: [] }) as Capacity;
  }
});

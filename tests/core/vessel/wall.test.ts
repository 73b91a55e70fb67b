import fc from "fast-check";
import { gaussLegendre, integrate } from "../../../src/core/numeric/gauss-legendre";
import type { HeatStore } from "../../../src/core/vessel/types";
import { capacityAt, constantStore, heatBetween, isConstant, sumOf, wallStore } from "../../../src/core/vessel/wall";
import { specificHeatOf } from "../../../src/core/vessel/wall-forms";
import { allWalls, wallOf } from "../../../src/data/walls";
import { readWall } from "../../../src/functions/vessel-wall";
import computed from "../../data/wall-checks.json";
import { refusedWith } from "../refused";

const kilogram = (id: string): HeatStore => readWall(`1 kg ${id}`)!;
/** Where the printed curve of a store begins, K; below it the capacity may be held. */
const begins = (store: HeatStore): number => store.heldBelow ?? store.from;
const steel = kilogram("carbon steel");
const ids = allWalls().map(({ id }) => id);
const POINTS = gaussLegendre(64);

/** ∫ C dT between two temperatures by quadrature apart from the product's: 64 points on 16 panels between joints. */
function byQuadrature(store: HeatStore, from: number, to: number): number {
  const stops = [from, ...store.joints.filter((joint) => joint > from && joint < to), to];
  return stops
    .slice(1)
    .reduce((sum, stop, index) => sum + integrate((temperature) => store.capacity(temperature), stops[index]!, stop, POINTS, 16), 0);
}

describe("every record of the library", () => {
  test.each(ids)("%s: heat is the integral of the capacity, and the capacity its slope", (id) => {
    const store = kilogram(id);
    const from = Math.max(store.from, 1);
    const to = Math.min(store.to, 2000);
    for (const share of [0.05, 0.31, 0.5, 0.77, 1]) {
      const temperature = from + share * (to - from);
      const heat = heatBetween(store, from, temperature);
      expect(Math.abs(heat / byQuadrature(store, from, temperature) - 1)).toBeLessThan(1e-10);
      const step = 1e-3;
      if (share === 1 || store.joints.some((joint) => Math.abs(joint - temperature) < step)) continue;
      const slope = (store.heat(temperature + step) - store.heat(temperature - step)) / (2 * step);
      expect(Math.abs(slope / store.capacity(temperature) - 1)).toBeLessThan(2e-6);
    }
  });

  test("the quadrature of the log10 form is good to 1e-12 over its whole range", () => {
    for (const { id } of allWalls().filter(({ form }) => form === "log10")) {
      const store = kilogram(id);
      const exact = integrate((temperature) => store.capacity(temperature), store.from, store.to, POINTS, 200);
      expect([id, Math.abs(heatBetween(store, store.from, store.to) / exact - 1) < 1e-12]).toEqual([id, true]);
    }
  });

  test("nothing outside the range, and the range is the printed one", () => {
    for (const record of allWalls()) {
      const store = kilogram(record.id);
      if (record.form === "constant") {
        expect([record.id, isConstant(store)]).toEqual([record.id, true]);
        continue;
      }
      const zero = record.temperature === "degC" ? 273.15 : 0;
      expect([record.id, begins(store), store.to]).toEqual([record.id, record.from! + zero, record.to! + zero]);
      for (const outside of [store.from * 0.999, store.to * 1.001, NaN]) {
        expect(store.capacity(outside)).toBeNaN();
        expect(store.heat(outside)).toBeNaN();
      }
    }
  });

  test("capacities computed from the printed forms by another program", () => {
    for (const [id, values] of Object.entries(computed)) {
      const zero = wallOf(id).temperature === "degC" ? 273.15 : 0;
      for (const [t, value] of Object.entries(values)) {
        // printed to one decimal (to two on some lines); molar masses differ in the fifth figure
        const store = kilogram(id);
        const temperature = Math.min(Math.max(Number(t) + zero, store.from), store.to);
        expect([id, t, Math.abs(store.capacity(temperature) - value) < Math.max(0.051, 2e-4 * value)]).toEqual([id, t, true]);
      }
    }
  });

  test("heat runs through the joints without a step", () => {
    for (const id of ids) {
      const store = kilogram(id);
      for (const joint of store.joints) {
        const step = store.heat(joint * (1 + 1e-12)) - store.heat(joint * (1 - 1e-12));
        expect([id, joint, Math.abs(step) < 1e-11 * joint * store.capacity(joint) + 1e-8]).toEqual([id, joint, true]);
      }
    }
  });
});

describe("carbon steel by hand (EN 1993-1-2, 3.4.1.2)", () => {
  test("20 °C to 600 °C: 425 t + 0.773/2 t² − 1.69e-3/3 t³ + 2.22e-6/4 t⁴", () => {
    const primitive = (t: number) => 425 * t + (0.773 / 2) * t ** 2 - (1.69e-3 / 3) * t ** 3 + (2.22e-6 / 4) * t ** 4;
    expect(heatBetween(steel, 293.15, 873.15)).toBeCloseTo(primitive(600) - primitive(20), 6);
  });

  test("600 °C to 735 °C and 735 °C to 900 °C through the pole forms", () => {
    expect(heatBetween(steel, 873.15, 1008.15)).toBeCloseTo(666 * 135 + 13002 * Math.log(138 / 3), 6);
    expect(heatBetween(steel, 1008.15, 1173.15)).toBeCloseTo(545 * 165 + 17820 * Math.log(169 / 4), 6);
    expect(heatBetween(steel, 1173.15, 1473.15)).toBeCloseTo(650 * 300, 6);
  });

  test("at a joint the piece that begins there: 5000 J/(kg K) at 735 °C, 666 + 13002/138 at 600 °C", () => {
    expect(capacityAt(steel, 1008.15)).toBeCloseTo(5000, 6);
    expect(capacityAt(steel, 873.15)).toBeCloseTo(666 + 13002 / 138, 10);
    expect(capacityAt(steel, 873.1499)).toBeCloseTo(759.92, 2);
    expect(steel.joints).toEqual([293.15, 873.15, 1008.15, 1173.15]);
  });
});

test("60 kg at 0.46 kJ/(kg K) take 10 350 kJ from 25 °C to 400 °C", () => {
  expect(heatBetween(readWall("60 kg at 0.46 kJ/(kg K)")!, 298.15, 673.15)).toBeCloseTo(10_350_000, 5);
});

test("a table is trapezoids: copper 300 K to 600 K (Incropera, table A.1)", () => {
  const copper = kilogram("copper-pure@incropera-a1");
  expect(heatBetween(copper, 300, 600)).toBeCloseTo(((385 + 397) / 2) * 100 + ((397 + 417) / 2) * 200, 8);
  expect(capacityAt(copper, 350)).toBe(391);
});

describe("below room temperature", () => {
  test("carbon steel keeps the 439.8 J/(kg K) of its beginning down to 223.15 K", () => {
    const first = 425 + 0.773 * 20 - 1.69e-3 * 400 + 2.22e-6 * 8000;
    expect(capacityAt(steel, 223.15)).toBeCloseTo(first, 9);
    expect(heatBetween(steel, 243.15, 313.15)).toBeCloseTo(50 * first + heatBetween(steel, 293.15, 313.15), 6);
  });

  test("for want of it, stainless steel 304 of the cryogenic curve: 3 % less at 250 K, 7 % less at 223 K than at 293 K", () => {
    const cold = kilogram("stainless-steel-304@nist-cryogenic");
    expect(cold.capacity(250) / cold.capacity(293.15)).toBeCloseTo(0.973, 3);
    expect(cold.capacity(223.15) / cold.capacity(293.15)).toBeCloseTo(0.931, 3);
    expect(cold.heldBelow).toBeUndefined();
  });

  test("oxides are not held: they lose a quarter", () => {
    for (const id of ["alumina (corundum)", "silica, quartz", "magnesia"]) expect([id, kilogram(id).from]).toEqual([id, 298]);
  });
});

describe("several stores together", () => {
  const both = sumOf([steel, constantStore(100, "goo"), kilogram("copper")]);

  test("range, joints and label of all of them", () => {
    expect([both.from, both.heldBelow, both.to]).toEqual([223.15, 298, 1358]);
    expect(both.toLabel).toBe("srd69-shomate for Cu(cr)");
    expect(both.joints).toEqual([293.15, 298, 873.15, 1008.15, 1173.15]);
    expect(both.label).toBe("1 kg carbon steel + goo + 1 kg copper");
    expect(isConstant(both)).toBe(false);
    expect(isConstant(sumOf([constantStore(1, "a"), constantStore(2, "b")]))).toBe(true);
  });

  test("heat and capacity add up, forwards and backwards", () =>
    fc.assert(
      fc.property(fc.double({ min: 298, max: 1358, noNaN: true }), fc.double({ min: 298, max: 1358, noNaN: true }), (from, to) => {
        const parts = heatBetween(steel, from, to) + 100 * (to - from) + heatBetween(kilogram("copper"), from, to);
        expect(Math.abs(heatBetween(both, from, to) - parts)).toBeLessThan(1e-7);
        expect(heatBetween(both, to, from) + heatBetween(both, from, to)).toBe(0);
      }),
    ));

  test("mass is a factor", () => {
    expect(heatBetween(wallStore(60, wallOf("carbon steel"), "", ""), 300, 900)).toBeCloseTo(60 * heatBetween(steel, 300, 900), 5);
  });
});

describe("refusals", () => {
  test.each([
    [
      () => capacityAt(steel, 1500),
      "range: Temperature 1500 K is above 1473.15 K, the upper limit of en-1993-1-2 for carbon steel (structural)",
    ],
    [
      () => heatBetween(steel, 200, 400),
      "range: Temperature 200 K is below 223.15 K, the lower limit of the capacity held below 293.15 K of en-1993-1-2 for carbon steel (structural)",
    ],
    [() => heatBetween(both(), 298.15, 320), "range: Temperature 320 K is above 300 K, the upper limit of nist-cryogenic for PTFE"],
    [
      () => sumOf([kilogram("stainless-steel-304l-high-temperature@nbs-304l"), kilogram("PTFE")]),
      "input: nbs-304l for stainless steel 304L, high temperature begins at 1400 K and nist-cryogenic for PTFE ends at 300 K: they have no temperature in common",
    ],
    [() => constantStore(-1, "the wall"), "range: Heat capacity -1 J/K of the wall is not 0 J/K or above"],
    [
      () => specificHeatOf({ form: "species", temperature: "K" }),
      `input: "species" is not a form of a wall's heat capacity; the forms are polynomial, piecewise, table, constant, log10`,
    ],
  ])("%#", (call, sentence) => expect(refusedWith(call)).toBe(sentence));

  const both = () => readWall("60 kg carbon steel + 2 kg PTFE")!;
});

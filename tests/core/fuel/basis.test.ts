import fc from "fast-check";
import { type Basis, toBasis } from "../../../src/core/fuel/basis";
import { refusedWith } from "../refused";

const figures = { moistureAsAnalysed: 10, moistureAsReceived: 20, ashDry: 25 };

test("by hand: a mass balance of 100 g as received", () => {
  // 100 g as received: 20 g water, 80 g dry, of which 20 g ash and 60 g combustible. 80 g dry make 80/0.9 g as analysed.
  expect(toBasis(18000, "ar", "d", figures)).toBeCloseTo(22500, 9); // 1800 kJ in 80 g
  expect(toBasis(18000, "ar", "daf", figures)).toBeCloseTo(30000, 9); // in 60 g
  expect(toBasis(18000, "ar", "ad", figures)).toBeCloseTo(20250, 9); // in 88.889 g
  expect(toBasis(30000, "daf", "ar", figures)).toBeCloseTo(18000, 9);
  expect(toBasis(22500, "d", "ad", figures)).toBe(20250);
});

const bases: Basis[] = ["ad", "d", "ar", "daf"];
const basis = fc.constantFrom(...bases);
const percent = fc.double({ min: 0, max: 99, noNaN: true });
const all = fc.record({ moistureAsAnalysed: percent, moistureAsReceived: percent, ashDry: percent });
const value = fc.double({ min: 0.001, max: 50000, noNaN: true });

test("there and back is where one was; a detour over a third basis changes nothing", () => {
  fc.assert(
    fc.property(value, basis, basis, basis, all, (start, from, over, to, given) => {
      const there = toBasis(start, from, to, given);
      expect(toBasis(there, to, from, given) / start).toBeCloseTo(1, 12);
      expect(toBasis(toBasis(start, from, over, given), over, to, given) / there).toBeCloseTo(1, 12);
    }),
  );
});

test("dry is above moist, ash-free above dry; without moisture and ash nothing moves, to the last bit", () => {
  const some = fc.double({ min: 0.001, max: 99, noNaN: true });
  fc.assert(
    fc.property(value, some, some, (start, moisture, ash) => {
      expect(toBasis(start, "ad", "d", { moistureAsAnalysed: moisture })).toBeGreaterThan(start);
      expect(toBasis(start, "d", "daf", { ashDry: ash })).toBeGreaterThan(start);
      expect(toBasis(start, "ar", "daf", { moistureAsReceived: 0, ashDry: 0 })).toBe(start);
    }),
  );
});

test("only what the way needs is looked at", () => {
  const broken = { moistureAsAnalysed: NaN, moistureAsReceived: -5, ashDry: 400 };
  expect(toBasis(5, "d", "d", broken)).toBe(5);
  expect(toBasis(5, "ar", "ar", {})).toBe(5);
  expect(toBasis(90, "ad", "d", { ...broken, moistureAsAnalysed: 10 })).toBe(100);
  expect(toBasis(20, "daf", "d", { ashDry: 50 })).toBe(10);
});

test("what is missing is refused by name", () => {
  expect(refusedWith(() => toBasis(5, "ad", "ar", { moistureAsAnalysed: 1 }))).toBe(
    "input: The moisture as received is missing: the way from ad to ar needs it, in per cent",
  );
  expect(refusedWith(() => toBasis(5, "ad", "daf", { ashDry: 1 }))).toBe(
    "input: The moisture as analysed is missing: the way from ad to daf needs it, in per cent",
  );
  expect(refusedWith(() => toBasis(5, "d", "daf", {}))).toBe(
    "input: The ash of the dry sample is missing: the way from d to daf needs it, in per cent",
  );
});

test("100 % is refused where it divides, and gives zero where it multiplies", () => {
  expect(refusedWith(() => toBasis(5, "ad", "d", { moistureAsAnalysed: 100 }))).toBe(
    "range: The moisture as analysed is 100 %: nothing remains that a value could be referred to, from ad to d",
  );
  expect(refusedWith(() => toBasis(5, "ar", "d", { moistureAsReceived: 100 }))).toContain("The moisture as received is 100 %");
  expect(refusedWith(() => toBasis(5, "d", "daf", { ashDry: 100 }))).toContain("The ash of the dry sample is 100 %");
  expect(toBasis(5, "d", "ar", { moistureAsReceived: 100 })).toBe(0);
  expect(toBasis(5, "daf", "d", { ashDry: 100 })).toBe(0);
});

test("impossible values and figures", () => {
  expect(refusedWith(() => toBasis(-5, "d", "ar", figures))).toBe("range: Value -5 is negative; a content or a gross value is 0 or more");
  expect(refusedWith(() => toBasis(NaN, "d", "d", figures))).toContain("Value NaN");
  expect(refusedWith(() => toBasis(5, "ad", "d", { moistureAsAnalysed: 101 }))).toBe(
    "range: The moisture as analysed, 101 %, is not between 0 % and 100 %",
  );
});

import { dimensionOf, parseUnit, toBase } from "../../src/core/units";
import { allPrecision, criticalRange, precisionOf, rounding } from "../../src/data/precision";
import { sourceOf } from "../../src/data/library";
import * as series from "../../src/data/series-limits";
import { refusedWith } from "../core/refused";

test("every limit has a source that says it is from memory, as the record does", () => {
  const named = [
    ...allPrecision(),
    ...series.relativeDeviationLimits,
    series.relativeRange,
    series.referenceDeviation,
    series.rises,
    series.outlier,
    series.trend,
    { ...criticalRange, fromMemory: true },
    rounding,
  ];
  for (const { source, fromMemory } of named) {
    expect([source, fromMemory]).toEqual([source, true]);
    expect(sourceOf(source).citation).toContain("from memory");
  }
});

test("ids are unique, and are found in any spelling of case and hyphens", () => {
  const ids = allPrecision().map(({ id }) => id);
  expect(new Set(ids).size).toBe(ids.length);
  for (const id of ids) expect(precisionOf(` ${id.toUpperCase().replace("-", " ")} `).id).toBe(id);
});

// A limit ten times too large or too small has been seen in print: between 0.1 % and 2 % of a value of 25 kJ/g, and R above r.
test.each(allPrecision().map((limit) => [limit.id, limit] as const))("%s: specific energies of the right size", (_, limit) => {
  const joulesPerGram = (value: number) => toBase(value, parseUnit(limit.unit)) / 1000;
  expect(dimensionOf(limit.unit)).toBe(dimensionOf("J/g"));
  expect(joulesPerGram(limit.repeatability)).toBeGreaterThan(25);
  expect(joulesPerGram(limit.repeatability)).toBeLessThan(200);
  if (limit.reproducibility === undefined) expect(limit.note).toContain("reproducibility");
  else expect(limit.reproducibility / limit.repeatability).toBeGreaterThan(1.5);
});

// 1 Btu_IT/lb = 2.326 J/g exactly.
test("30 and 62 Btu/lb are the 69 and 143 J/g of the note, within 2 J/g", () => {
  const { repeatability, reproducibility, note } = precisionOf("astm-d5865");
  expect(note).toBe("about 69 and 143 J/g");
  expect(Math.abs(repeatability * 2.326 - 69)).toBeLessThan(2);
  expect(Math.abs(reproducibility! * 2.326 - 143)).toBeLessThan(2);
});

test("one limit of the relative standard deviation is the default", () => {
  expect(series.relativeDeviationLimits.filter(({ isDefault }) => isDefault)).toEqual([series.defaultRelativeDeviation]);
  expect(series.defaultRelativeDeviation).toMatchObject({ percent: 0.2, runs: 5, title: "ISO 1928:1995" });
});

test("an unknown method is refused with the ids", () => {
  expect(refusedWith(() => precisionOf("iso-9831"))).toBe(
    'absent: "iso-9831" is not a method of the precision table; it holds iso-1928, iso-18125, iso-21654, astm-d240, astm-d4809-gross, astm-d4809-net, astm-d5865',
  );
});

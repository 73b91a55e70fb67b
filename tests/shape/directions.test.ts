/** Imports point one way: design of the house, walked over the real files. */
import { readdirSync } from "node:fs";
import { join } from "node:path";
import { CORE_ORDER, fault, MAY_IMPORT } from "./directions";
import { arrows, cycle, SRC, type Arrow } from "./imports";

const all = arrows();
const ours = (from: string, to: string): Arrow => ({ from, to, isPackage: false });
const theirs = (from: string, to: string): Arrow => ({ from, to, isPackage: true });

test("no forbidden arrow", () => {
  expect(all.length).toBeGreaterThan(100);
  expect(all.map(fault).filter((sentence) => sentence !== undefined)).toEqual([]);
});

test("no ring of imports", () => {
  expect(cycle(all)).toBeUndefined();
});

test("every folder has its rule", () => {
  const folders = readdirSync(SRC, { withFileTypes: true }).map(({ name }) => name);
  expect(folders.filter((name) => !(name in MAY_IMPORT))).toEqual([]);
  const core = readdirSync(join(SRC, "core"), { withFileTypes: true }).filter((entry) => entry.isDirectory());
  expect(core.map(({ name }) => name).filter((name) => !CORE_ORDER.includes(name))).toEqual([]);
});

test.each([
  ours("core/units/parse.ts", "core/species/formula.ts"),
  ours("core/capacity/power.ts", "data/library.ts"),
  ours("core/refusal.ts", "core/units/index.ts"),
  ours("data/library.ts", "core/mixture/compile.ts"),
  ours("functions/heat.ts", "handbook/index.ts"),
  ours("pane/index.ts", "recalc/evaluate.ts"),
  ours("book/workbook.ts", "recalc/outcome.ts"),
  ours("functions/heat.ts", "pane/host.ts"),
  theirs("core/capacity/power.ts", "mathjs"),
  theirs("functions/heat.ts", "node:fs"),
  theirs("pane/index.ts", "@odoo/o-spreadsheet"),
  theirs("recalc/engine.ts", "node:fs"),
])("$from may not import $to", (arrow) => {
  expect(fault(arrow)).toContain(arrow.to);
});

test.each([
  ours("core/capacity/power.ts", "core/species/types.ts"),
  ours("core/units/parse.ts", "core/refusal.ts"),
  ours("functions/heat.ts", "core/mixture/compile.ts"),
  ours("tryout/index.ts", "recalc/evaluate.ts"),
  theirs("core/units/parse.ts", "mathjs"),
  theirs("command/index.ts", "node:fs"),
])("$from may import $to", (arrow) => {
  expect(fault(arrow)).toBeUndefined();
});

test("data may know the types of the core, and not what runs there", () => {
  const arrow = ours("data/sets.ts", "core/capacity/capacity.ts");
  expect(fault({ ...arrow, isType: true })).toBeUndefined();
  expect(fault({ ...arrow, isType: false })).toBe("data/sets.ts imports core/capacity/capacity.ts");
});

test("a ring is found and named", () => {
  const ring = [ours("a.ts", "b.ts"), ours("b.ts", "c.ts"), ours("c.ts", "b.ts")];
  expect(cycle(ring)).toEqual(["b.ts", "c.ts", "b.ts"]);
});

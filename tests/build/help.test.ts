/** The help page: its links lead somewhere, and what its rules on equations and burning say is what the functions do. */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { helpPage } from "../../src/build/help.mjs";
import { promised as handbook } from "../../src/handbook/promised";
import { call, number, refusal } from "../functions/helpers";

const shell = readFileSync(join(__dirname, "..", "..", "assets", "help.html"), "utf8");
const page = helpPage(
  shell,
  handbook,
  { sources: [], grades: {} },
  [],
  { editions: [], precision: [], series: [], kinds: [] },
  { recommended: [], walls: [], gases: [] },
);

/** The words of a section, tags and line breaks taken out. */
function words(id: string): string {
  const section = new RegExp(`<section id="${id}">(.*?)</section>`, "s").exec(shell)![1]!;
  return section.replace(/<[^>]*>/g, "").replace(/\s+/g, " ");
}

/** The texts of the warnings of a table. */
const warnings = (table: readonly (readonly unknown[])[]) => table.filter(([label]) => label === "warning").map((row) => String(row[3]));

test("every link inside the page has its place, and every function and rule is linked once", () => {
  const links = [...page.matchAll(/href="#([^"]+)"/g)].map(([, id]) => id!);
  const places = [...page.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id!);
  expect([...links].sort()).toEqual([...new Set(places)].sort());
  expect(new Set(links).size).toBe(links.length);
});

test("the functions that the section on burning names are those of the families, BURN.FUEL aside", () => {
  const named = handbook.filter(({ id, family }) => family === "burn" && !/FUEL/.test(id)).map(({ id }) => id);
  const rows = words("burning");
  for (const id of [...named, "BURN.FUEL", "REACTION.RIGID", "MIX.HUMIDAIR"]) expect([id, rows.includes(id)]).toEqual([id, true]);
});

describe("equations", () => {
  const rules = words("equations");

  test("a phase left out is the gas; what could be several is refused with their names", () => {
    expect(rules).toContain("so H2O is vapour and H2O(l) liquid");
    expect(number("REACTION.ENERGY", "H2 + 1/2 O2 = H2O", 298.15)).toBe(number("REACTION.ENERGY", "H2 + 1/2 O2 = H2O(g)", 298.15));
    expect(rules).toContain("(C(gr) graphite, C(g) atoms)");
    expect(refusal("REACTION.ENERGY", "C + O2 = CO2", 298.15)).toMatch(
      /^#VALUE! "C" stands for several species: write C\(g\).* or C\(gr\)/,
    );
  });

  test("energies are for the equation as written", () => {
    expect(rules).toContain("twice the equation is twice the energy");
    const once = number("REACTION.ENERGY", "CO + 1/2 O2 = CO2", 500);
    expect(number("REACTION.ENERGY", "2 CO + O2 = 2 CO2", 500)).toBeCloseTo(2 * once, 6);
  });

  test("an unbalanced one is refused, a surplus stands on both sides, water that would condense is warned of", () => {
    expect(refusal("REACTION.ENERGY", "CH4 + O2 = CO2 + H2O", 298.15)).toContain("is not balanced: H 4 on the left, 2 on the right");
    expect(rules).toContain('"CH4 + 3 O2 = CO2 + 2 H2O + O2"');
    expect(number("REACTION.ENERGY", "CH4 + 3 O2 = CO2 + 2 H2O + O2", 298.15)).toBeLessThan(-8e5);
    expect(rules).toContain("warns where water would condense or evaporate");
    expect(warnings(call("REACTION.RIGID", "H2 + 1/2 O2 = H2O", 298.15, "1 atm", 298.15)).join()).toContain("would condense");
  });
});

describe("burning", () => {
  const rules = words("burning");
  const burn = (...given: unknown[]) => call("BURN", ...given);
  const line = (table: readonly (readonly unknown[])[], label: string) => Number(table.find(([name]) => name === label)![1]);

  test("the ratio follows from the fuel in per cent as the section says", () => {
    expect(rules).toContain("the ratio is x / (100 − x), times the O2 for one mole of fuel, divided by the O2 in one mole of oxidant");
    const ratio = ((8 / 92) * 2) / 0.20946;
    expect(line(burn("CH4", "air", ratio, 298.15, "1 atm"), "fuel in the mixture")).toBeCloseTo(8, 9);
  });

  test("complete products end at ratio 1 and are hotter than the equilibrium", () => {
    expect(rules).toContain("up to ratio 1: it is hotter than the equilibrium, and still not a bound");
    const [complete, held] = ["complete", undefined].map((products) =>
      number("BURN.TEMPERATURE", "CH4", "air", 1, 298.15, "1 atm", products),
    );
    expect(complete).toBeGreaterThan(held!);
    expect(refusal("BURN.TEMPERATURE", "CH4", "air", 1.01, 298.15, "1 atm", "complete")).toMatch(/^#VALUE! Complete products hold up to/);
  });

  test("soot is among the products of a rich mixture", () => {
    expect(rules).toContain("solids and liquids such as C(gr) included");
    expect(number("BURN.FRACTION", "C2H2", "air", 5, 298.15, "1 atm", "C(gr)")).toBeGreaterThan(0.01);
  });

  test("warned of: real gases above 10 MPa, slow reactions below 1500 K, a gross value away from 25 °C", () => {
    expect(rules).toContain("(above 10 MPa)");
    expect(rules).toContain("(below 1500 K)");
    const [high, low] = ["1.2 MPa", "1.0 MPa"].map((pressure) => burn("CH4", "air", 1, 298.15, pressure));
    expect([line(high!, "final pressure") > 1e7, warnings(high!).some((text) => text.startsWith("The ideal gas is assumed"))]).toEqual([
      true,
      true,
    ]);
    expect([line(low!, "final pressure") < 1e7, warnings(low!)]).toEqual([true, []]);
    const [cool, hot] = [0.3, 0.5].map((ratio) => burn("CH4", "air", ratio, 298.15, "1 atm"));
    expect([line(cool!, "final temperature") < 1500, warnings(cool!).some((text) => text.includes("reactions are slow"))]).toEqual([
      true,
      true,
    ]);
    expect([line(hot!, "final temperature") > 1500, warnings(hot!)]).toEqual([true, []]);
    expect(rules).toContain("a start more than 5 K away is warned of");
    const known = (start: string) => warnings(burn("C7H6O2(cr), gross 26413.6 J/g", "air", 1, start, "1 atm")).join();
    expect([known("29 °C"), known("31 °C").includes("known at 25 °C only")]).toEqual(["", true]);
  });

  test("what a set does not hold cannot form: named where it would; SO3 through a list; no metal dust", () => {
    const warnings = (...values: unknown[]) => JSON.stringify(call("EQUILIBRIUM.ATPRESSURE", ...values));
    expect(warnings("1 H2S + 1 O2", 2500, "1 bar")).toContain("Not among the species, though they can form at 2500 K: SO, S2, HS;");
    expect(warnings("1 CH4 + 4 F2", 1000, "1 bar")).toContain("CF4");
    expect(warnings("2 CH4 + 1 O2", 1200, "1 bar", null, "gri-1999")).toContain("C(gr); the composition");
    expect(warnings("1 SO2 + 1 O2", 800, "1 bar", "SO2 SO3 O2")).not.toContain("Not among");
    expect(refusal("BURN", "Al(cr)", "air", 1, 298.15, "1 bar")).toContain("the oxygen balance is known here for C, H");
  });

  test("sets: nasa-2002 if left out; one that lacks what is sure to form is refused; a fuel it does not hold comes from the first choice", () => {
    expect(rules).toContain("left out, products are those of nasa-2002");
    const labelOf = (table: readonly (readonly unknown[])[]) => String(table.find(([name]) => name === "products")![1]);
    expect(labelOf(burn("CH4", "air", 1, 298.15, "1 atm"))).toMatch(/ of nasa-2002$/);
    expect(refusal("BURN.PRESSURE", "CH4", "air", 1, 298.15, "1 atm", undefined, undefined, "srd69-shomate")).toContain(
      "which may form here",
    );
    expect(warnings(burn("ethanol", "air", 1, 298.15, "1 atm", undefined, "gri-1999")).join()).toContain("Set gri-1999 does not hold");
  });

  test("lines of species: the most abundant first, as listed, or as the set has them; named in rows with their unit", () => {
    expect(rules).toContain("as listed if you give a list, in a column of states as the set has them, else the most abundant first");
    const placeOf = (...given: unknown[]) => burn("CH4", "air", ...given).findIndex(([label]) => label === "CO");
    expect(placeOf(0.5, 298.15, "1 atm")).not.toBe(placeOf(1.3, 298.15, "1 atm"));
    expect(placeOf(0.5, 298.15, "1 atm", "CO2 CO H2O N2 O2")).toBe(placeOf(1.3, 298.15, "1 atm", "CO2 CO H2O N2 O2 H2"));
    expect(rules).toContain("the heading is CO [mol/mol] or CO [mol]");
    expect(burn("CH4", "air", [[0.5], [1.3]], 298.15, "1 atm")[0]).toContain("CO [mol/mol]");
    expect(call("EQUILIBRIUM.ATPRESSURE", "1 CO", [[1000], [2000]], "1 atm")[0]).toContain("CO [mol]");
  });

  test("a set that begins above 20 °C refuses such a start, unless it is carried on", () => {
    expect(rules).toContain('"gri-1999; extrapolate" holds the heat capacity of gases below it');
    const at = ["CH4", "air", 1, "20 °C", "1 atm", undefined, undefined];
    expect(refusal("BURN.PRESSURE", ...at, "gri-1999")).toMatch(
      /^#VALUE! Temperature 293\.15 K is below 298\.15 K, the lower limit of gri-1999/,
    );
    expect(number("BURN.PRESSURE", ...at, "gri-1999; extrapolate") / number("BURN.PRESSURE", ...at)).toBeCloseTo(1, 2);
  });

  test("what is held: the same state by four ways", () => {
    const feed = "1 CH4 + 2 O2 + 7.52 N2";
    const rigid = call("EQUILIBRIUM.RIGID", feed, 298.15, "0.2574 m3");
    const again = call("EQUILIBRIUM.ATVOLUME", feed, line(rigid, "temperature"), line(rigid, "volume"));
    const pressed = call("EQUILIBRIUM.ATPRESSURE", feed, line(rigid, "temperature"), line(rigid, "pressure"));
    expect(line(again, "pressure") / line(rigid, "pressure")).toBeCloseTo(1, 9);
    expect(line(pressed, "volume") / 0.2574).toBeCloseTo(1, 9);
    const flame = call("EQUILIBRIUM.ISOBARIC", feed, 298.15, "1 atm");
    expect([line(flame, "pressure"), line(flame, "temperature") < line(rigid, "temperature")]).toEqual([101325, true]);
  });
});

test("formulas in the rules on equations and burning are read by the functions", () => {
  const equations = [...words("equations").matchAll(/"([^"]*=[^"]*)"/g)].map(([, text]) => text!);
  expect(equations.length).toBeGreaterThan(1);
  for (const text of equations) expect([text, number("REACTION.ENERGY", text, 298.15) < 0]).toEqual([text, true]);
});

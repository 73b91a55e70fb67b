/** Species that would form and are not among those of an equilibrium: the answer says so, for what it matters to. */
import { parseFormula } from "../../src/core/species/formula";
import { furtherProducts } from "../../src/data/further-products";
import { valueOf, warningsOf } from "./burn-helpers";
import { call, refusal } from "./helpers";

const absent = (names: string, temperature: string, way = "") =>
  `Not among the species, though they can form at ${temperature} K: ${names}; the composition and what follows from it are without them${way}`;
const SO3_WAY = "; a list of species, without a set, can hold SO3";
const atPressure = (feed: string, temperature: number, ...more: unknown[]) =>
  call("EQUILIBRIUM.ATPRESSURE", feed, temperature, "1 bar", ...more);

test("sulfur dioxide that cannot go on to SO3, and the list that lets it", () => {
  const whole = atPressure("1 SO2 + 0.5 O2", 800);
  expect(valueOf(whole, "SO2")).toBeCloseTo(1, 9);
  expect(warningsOf(whole)).toEqual([absent("SO3", "800", SO3_WAY)]);
  const listed = atPressure("1 SO2 + 0.5 O2", 800, "SO2 SO3 O2");
  // Kp of SO2 + 1/2 O2 = SO3 at 800 K is 33 to 35 bar^-1/2 in the usual tables, from memory: 88 to 89 % converted
  expect(valueOf(listed, "SO3")).toBeGreaterThan(0.87);
  expect(valueOf(listed, "SO3")).toBeLessThan(0.9);
  expect(warningsOf(listed)).toEqual([]);
});

test("too little oxygen leaves no SO3, ammonia and hydrogen chloride would be a salt", () => {
  expect(warningsOf(atPressure("1 H2S + 0.5 O2", 800))).toEqual([absent("S2, S8", "800")]);
  expect(warningsOf(atPressure("1 H2S + 2 O2", 800))).toEqual([absent("SO3", "800", SO3_WAY)]);
  expect(warningsOf(atPressure("1 NH3 + 1 HCl", 300))).toEqual([absent("NH4Cl(cr)", "300")]);
});

test("sulfur above its boiling point, without its vapour", () => {
  expect(warningsOf(atPressure("1 S(a)", 800))).toEqual([absent("S2, S8", "800")]);
  expect(warningsOf(atPressure("1 S(a)", 298.15))).toEqual([]);
});

test("flames: SO of what burns with sulfur; none for a coal's half per cent, none without sulfur", () => {
  const notes = (fuel: string, oxidant: string, ratio: number) => warningsOf(call("BURN", fuel, oxidant, ratio, 298.15, "1 atm"));
  expect(notes("H2S", "O2 + 3.76 N2", 0.9)[0]).toMatch(/^Not among the species, though they can form at \d+\.\d+ K: SO; the composition/);
  expect(notes("H2S", "O2 + 3.76 N2", 1.5)[0]).toMatch(/K: SO, S2, HS; the composition/);
  expect(notes("CH4", "O2 + 3.76 N2", 1)).toEqual([]);
  expect(notes("CH4", "O2", 1)).toEqual([]);
  expect(notes("CH0.8O0.1N0.015S0.005, gross 33 MJ/kg", "O2 + 3.76 N2", 0.5).some((text) => text.startsWith("Not among"))).toBe(false);
});

test("fluorine that carbon would bind, unless hydrogen binds it", () => {
  expect(warningsOf(call("EQUILIBRIUM.RIGID", "1 CH4 + 4 F2", 298.15, "0.1 m3"))).toEqual([
    expect.stringMatching(/^No free atoms of F .* so that temperature and pressure come out too high$/),
    expect.stringMatching(/^Not among the species, though they can form at \d+\.\d+ K: CF2, C3; /),
  ]);
  expect(warningsOf(atPressure("1 CH4 + 4 F2", 1900))[1]).toBe(absent("CF4", "1900"));
  expect(warningsOf(atPressure("1 CO2 + 4 HF", 1000))).toEqual([]);
});

test("soot in a set without graphite: warned where there is more carbon than oxygen, and only there", () => {
  const rich = atPressure("2 CH4 + 1 O2", 1200, null, "gri-1999");
  expect(warningsOf(rich)).toEqual([absent("C(gr)", "1200", "; a list of species, without a set, can hold C(gr)")]);
  expect(warningsOf(atPressure("2 CH4 + 1 O2", 1200))).toEqual([]);
  expect(warningsOf(atPressure("1 CH4 + 1 O2 + 1 H2O", 1200, null, "gri-1999"))).toEqual([]);
});

test("a coefficient block that brings the species ends the warning", () => {
  const row = ["Cp", "g", "SO3", "power 1", 298, 3000, "J/(mol K)", null, -395770, 256.77, 50, 0.02];
  const table = atPressure("1 SO2 + 0.5 O2", 800, null, [row]);
  expect(valueOf(table, "SO3(g)")).toBeGreaterThan(0.5);
  expect(warningsOf(table)).toEqual([]);
});

test("what is held tells what becomes of a state without free atoms", () => {
  const last = (id: string, ...held: unknown[]) => /so that (.*)$/.exec(warningsOf(call(id, "1 HCl", ...held))[0]!)?.[1];
  expect(last("EQUILIBRIUM.ATVOLUME", 3000, "0.2 m3")).toBe("pressure and energy come out too low");
  expect(last("EQUILIBRIUM.ATPRESSURE", 3000, "1 bar")).toBe("volume and energy come out too low");
  expect(last("EQUILIBRIUM.RIGID", 3000, "0.2 m3")).toBe("temperature and pressure come out too high");
  expect(last("EQUILIBRIUM.ISOBARIC", 3000, "1 bar")).toBe("the temperature comes out too high");
});

test("hydrogen iodide is a main product, and nasa-2002 has none", () => {
  expect(refusal("EQUILIBRIUM.ATPRESSURE", "1 H2 + 1 I2", 700, "1 bar")).toBe(
    "#N/A Set nasa-2002 has no enthalpy of formation with entropy for HI, which may form here: give a coefficient block with it, or give the species as a list",
  );
});

test("the table of such species: formulas that hold their element, temperatures in order", () => {
  for (const { species, element, from, to } of furtherProducts) {
    expect(parseFormula(species).counts.has(element)).toBe(true);
    expect(from).toBeLessThan(to);
  }
});

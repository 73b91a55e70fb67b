import { parseFormula } from "../../src/core/species/formula";
import { organic, oxidants, reactivePairs, selfReactive } from "../../src/data/self-reactive";
import { allSpecies, sourceOf } from "../../src/data/library";
import { speciesOfKey } from "../../src/data/species";
import { hazardLines, traceNotes } from "../../src/functions/hazard";
import { blockChoice, FIRST_CHOICE, type SetChoice } from "../../src/functions/set";
import { substanceArgument, substanceOf } from "../../src/functions/substance";

const LEAD = "these contents can react or decompose; this is not the pressure they would reach: ";
const UNJUDGED = ": limits of flammability are not judged";

/** The finding of a substance text, without the sentence before it; undefined if there is no row. */
function finding(substance: string, temperature?: number, set: SetChoice = FIRST_CHOICE): string | undefined {
  const lines = hazardLines(substanceOf(substanceArgument([[substance]]), substance, set).parts, temperature);
  if (lines.length === 0) return undefined;
  expect(lines).toEqual([{ label: "CAUTION", value: "see note", unit: "", note: expect.stringContaining(LEAD) }]);
  return lines[0]!.note.slice(LEAD.length);
}

describe("contents without a caution", () => {
  test.each([
    "air",
    "N2",
    "CO2",
    "He",
    "H2",
    "SF6",
    "H2O",
    "CCl4(l)",
    "0.5 CO2 + 0.5 N2",
    "0.9 CO2 + 0.1 H2O",
    "0.7 N2 + 0.3 CH4",
    "0.5 CO + 0.5 H2",
    "0.5 SO2 + 0.5 O2",
    "0.5 CaO(cr) + 0.5 O2",
    "0.5 NaCl(cr) + 0.5 Cl2",
    "0.5 SiO2(cr,quartz) + 0.5 O2",
    "0.5 CF4 + 0.5 O2",
    "0.5 HCl + 0.5 Cl2",
  ])("%s", (substance) => expect(finding(substance)).toBeUndefined());

  test("hot air, hot nitrogen", () => {
    expect(finding("air", 3000)).toBeUndefined();
    expect(finding("N2", 3000)).toBeUndefined();
  });
});

describe("species that react by themselves", () => {
  test("acetylene, alone and among others; acetone beside it is not the reason", () => {
    const words = "decomposes with a flame and without air, from little above atmospheric pressure";
    expect(finding("C2H2")).toBe(`C2H2: ${words}`);
    expect(finding("acetylene")).toBe(`C2H2: ${words}`);
    expect(finding("0.6 C2H2 + 0.4 acetone")).toBe(`C2H2 (60 %): ${words}`);
    expect(finding("0.002 C2H2 + 0.998 N2")).toBe(`C2H2 (0.2 %): ${words}`);
  });

  test("those of one kind stand together, each finding once", () =>
    expect(finding("0.25 propyne + 0.25 allene + 0.5 N2O")).toBe(
      "propyne (25 %), allene (25 %): decomposes without air when compressed or hot; " +
        "N2O (50 %): decomposes with heat to nitrogen and oxygen, 3 mol from 2; " +
        `fuel propyne (25 %), allene (25 %) with oxidant N2O (50 %)${UNJUDGED}`,
    ));

  test("an isomer that is not listed has no caution", () => {
    expect(finding("oxirane")).toBe("oxirane: decomposes with a flame and without air; also polymerises");
    expect(finding("acetone")).toBeUndefined();
    expect(finding("C2H5OH")).toBeUndefined();
  });

  test.each(["1,3-C4H6", "C2H4", "HCN", "C2N2", "CH2O", "N2O", "NO", "NO2", "O3", "H2O2", "HNO3", "N2H4", "OH"])(
    "%s is listed",
    (species) => expect(finding(species)).toContain(`${species}: `),
  );

  test("some only when hot; without a temperature they are not named", () => {
    expect(finding("NH3")).toBeUndefined();
    expect(finding("NH3", 699.9)).toBeUndefined();
    expect(finding("NH3", 700)).toBe("NH3: decomposes to nitrogen and hydrogen on hot steel");
    expect(finding("n-C4H10", 400)).toBeUndefined();
    expect(finding("0.5 n-C4H10 + 0.5 C3H8", 700)).toBe(
      "n-C4H10 (50 %), C3H8 (50 %): decomposes by cracking to smaller molecules, which are more gas",
    );
    expect(finding("CH4", 999)).toBeUndefined();
    expect(finding("CH4", 1000)).toBe("CH4: decomposes to hydrogen and carbon");
    expect(finding("CO", 1000)).toBeUndefined();
  });
});

describe("fuel with oxidant", () => {
  test("methane and air, as mixture text and as a range", () => {
    expect(finding("0.095 CH4 + 0.905 air")).toBe(`fuel CH4 (9.5 %) with oxidant O2 (19 %)${UNJUDGED}`);
    const range = substanceArgument([
      ["N2", 0.788],
      ["O2", 0.21],
      ["CO", 0.002],
    ]);
    expect(hazardLines(substanceOf(range, undefined, FIRST_CHOICE).parts)[0]!.note).toBe(
      `${LEAD}fuel CO (0.2 %) with oxidant O2 (21 %)${UNJUDGED}`,
    );
  });

  test.each([
    ["0.5 H2 + 0.5 Cl2", "fuel H2 (50 %) with oxidant Cl2 (50 %)"],
    ["0.5 CH3Cl + 0.5 Br2", "fuel CH3Cl (50 %) with oxidant Br2 (50 %)"],
    ["0.5 NH3 + 0.5 O2", "fuel NH3 (50 %) with oxidant O2 (50 %)"],
    ["0.2 H2S + 0.2 CS2 + 0.6 O2", "fuel H2S (20 %), CS2 (20 %) with oxidant O2 (60 %)"],
    ["0.5 Fe(cr) + 0.5 O2", "fuel Fe(cr) (50 %) with oxidant O2 (50 %)"],
    ["0.5 C(gr) + 0.5 O2", "fuel C(gr) (50 %) with oxidant O2 (50 %)"],
  ])("%s", (substance, words) => expect(finding(substance)).toBe(words + UNJUDGED));

  test("what complete combustion makes, and what has nothing to burn, is no fuel", () => {
    const products = ["CO2", "H2O", "H2O(l)", "SO2", "N2", "Ar", "HCl", "SF6", "CF4", "CCl4(l)"];
    for (const species of products) expect([species, finding(`0.5 ${species} + 0.5 O2`)]).toEqual([species, undefined]);
    expect(finding("0.5 HF + 0.5 O2")).not.toContain("fuel");
  });

  test("every hydrocarbon of the library burns in oxygen and in chlorine", () => {
    const hydrocarbons = allSpecies().filter(({ formula }) => /^C\d*H\d*$/.test(formula));
    expect(hydrocarbons.length).toBeGreaterThan(30);
    for (const { key } of hydrocarbons)
      for (const oxidant of ["O2", "Cl2"])
        expect([key, finding(`0.5 ${key} + 0.5 ${oxidant}`)]).toEqual([
          key,
          expect.stringContaining(`fuel ${key} (50 %) with oxidant ${oxidant} (50 %)`),
        ]);
  });
});

describe("traces", () => {
  const notes = (substance: string, temperature?: number) =>
    traceNotes(substanceOf(substanceArgument([[substance]]), substance, FIRST_CHOICE).parts, temperature);
  const LESS = "Traces that can react, by no more than some 25 K if all of them did: ";

  test.each([
    ["0.00005 CO + 0.99995 air", `fuel CO (0.005 %) with oxidant O2 (20.9 %)${UNJUDGED}`],
    ["0.0001 O2 + 0.9999 H2", `fuel H2 (100 %) with oxidant O2 (0.01 %)${UNJUDGED}`],
    ["0.000005 CH4 + 0.999995 O2", `fuel CH4 (0.0005 %) with oxidant O2 (100 %)${UNJUDGED}`],
    ["0.001 C2H2 + 0.999 N2", "C2H2 (0.1 %): decomposes with a flame and without air, from little above atmospheric pressure"],
    ["0.001 NO + 0.999 N2", "NO (0.1 %): decomposes with heat; under pressure to N2O and NO2"],
    ["0.001 NH3 + 0.999 CO2", "NH3 (0.1 %) and CO2 (99.9 %) form a solid salt"],
  ])("%s: no row, a note", (substance, words) => {
    expect(finding(substance)).toBeUndefined();
    expect(notes(substance)).toEqual([LESS + words]);
  });

  // 5E-4 mol O2 for one mole: CO 0.1 %, CH4 0.025 %, benzene 1/15 %
  test.each([
    ["CO", 1e-3],
    ["CH4", 2.5e-4],
    ["C6H6", 5e-4 / 7.5],
  ])("%s in oxygen up to %s, above it a row", (fuel, most) => {
    const mixed = (share: number) => `${share} ${fuel} + ${1 - share} O2`;
    expect(finding(mixed(most))).toBeUndefined();
    expect(notes(mixed(most))).toHaveLength(1);
    expect(finding(mixed(1.001 * most))).toContain(`fuel ${fuel}`);
    expect(notes(mixed(1.001 * most))).toEqual([]);
  });

  test("radicals are none; much stands in the row, traces in the note", () => {
    expect(finding("0.0001 OH + 0.9999 N2")).toContain("recombines at once");
    expect(finding("0.1 CH4 + 0.8999 O2 + 0.0001 N2O")).toBe(`fuel CH4 (10 %) with oxidant O2 (90 %), N2O (0.01 %)${UNJUDGED}`);
    expect(notes("0.1 CH4 + 0.8999 O2 + 0.0001 N2O")).toEqual([
      `${LESS}N2O (0.01 %): decomposes with heat to nitrogen and oxygen, 3 mol from 2`,
    ]);
    expect(notes("air", 1500)).toEqual([]);
    // its 0.04 % CO2 comes apart
    expect(notes("air", 2500)).toEqual([]);
  });
});

test("vapours that associate, and what comes apart when very hot", () => {
  expect(finding("HF")).toBe("HF: associates to larger molecules, far from any gas of single ones, unless hot and thin");
  expect(finding("CO2", 1999)).toBeUndefined();
  expect(finding("0.5 CO2 + 0.5 H2O", 2000)).toBe(
    "CO2 (50 %), H2O (50 %): decomposes in part, to CO, H2, OH and O2: see EQUILIBRIUM.ATVOLUME",
  );
});

test("pairs that react with each other", () => {
  expect(finding("0.5 NH3 + 0.5 HCl")).toBe("NH3 (50 %) and HCl (50 %) form a solid salt");
  expect(finding("0.01 F2 + 0.99 H2O")).toBe("F2 (1 %) and H2O (99 %) react, as fluorine takes these too");
  expect(finding("0.5 F2 + 0.5 N2")).toBeUndefined();
  expect(finding("0.1 NO + 0.9 air")).toContain("; NO (10 %) and O2 (18.9 %) form NO2");
  expect(finding("0.5 CaC2(cr) + 0.5 H2O(l)")).toBe("CaC2(cr) (50 %) and H2O(l) (50 %) form acetylene");
});

describe("coefficient blocks, whose species are known by their atoms", () => {
  const row = (formula: string, phase = "g") => ["Cp", phase, formula, "power 0", 250, 1500, "J/(mol K)", null, null, null, 60];
  const block = (...rows: unknown[][]) => blockChoice(rows as never)!;

  test("a name the library does not have", () =>
    expect(finding("CH3NO2", undefined, block(row("CH3NO2")))).toBe(
      "CH3NO2(g) if it is nitromethane: decomposes explosively when heated in a closed vessel",
    ));

  test("atoms in any order; isomers may be meant", () => {
    expect(finding("N2H4CH2", undefined, block(row("N2H4CH2")))).toContain("N2H4CH2(g) if it is methylhydrazine: ");
    expect(finding("C2H4O", undefined, block(row("C2H4O")))).toContain("C2H4O(g) if it is oxirane: ");
  });

  test("fuel and oxidant", () =>
    expect(finding("0.5 SiH4 + 0.5 NF3", undefined, block(row("SiH4"), row("NF3")))).toBe(
      `fuel SiH4(g) (50 %) with oxidant NF3(g) (50 %)${UNJUDGED}`,
    ));

  test("solid carbon and sulfur are no atoms", () => {
    expect(finding("C(cr)", undefined, block(row("C", "cr")))).toBeUndefined();
    expect(finding("CH2(cr)", undefined, block(row("CH2", "cr")))).toBeUndefined();
    expect(finding("CH3(g)", undefined, block(row("CH3")))).toContain("CH3(g) if it is methyl: recombines at once");
  });

  test("a compound of carbon with hydrogen cracks", () => {
    expect(finding("C16H34", 700, block(row("C16H34")))).toContain("C16H34(g): decomposes by cracking");
    expect(finding("C16H34", 600, block(row("C16H34")))).toBeUndefined();
  });
});

describe("the lists", () => {
  const keys = selfReactive.flatMap(({ species }) => species ?? []);
  const formulas = [
    ...selfReactive.flatMap(({ others }) => Object.keys(others ?? {})),
    ...oxidants.species,
    ...reactivePairs.flatMap(({ one, other }) => [...one, ...other]),
  ];

  test("name species of the library by key, and others by a formula", () => {
    expect(keys.filter((key) => speciesOfKey(key) === undefined)).toEqual([]);
    for (const formula of formulas) expect(parseFormula(formula).charge).toBe(0);
  });

  test("name no species twice by itself, and give each row a species and a source from memory", () => {
    expect(new Set(keys).size).toBe(keys.length);
    for (const { species, others, source } of selfReactive) {
      expect((species ?? []).length + Object.keys(others ?? {}).length).toBeGreaterThan(0);
      expect(sourceOf(source).citation).toContain("from memory");
    }
    for (const { source } of [organic, oxidants, ...reactivePairs]) expect(sourceOf(source).citation).toContain("from memory");
  });
});

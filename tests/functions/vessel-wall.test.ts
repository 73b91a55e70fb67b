import { boilingPoint } from "../../src/functions/gas-phase";
import { FIRST_CHOICE, setOf } from "../../src/functions/set";
import { contentsArgument, readContents, readWall } from "../../src/functions/vessel-wall";
import { number, refusal } from "./helpers";
import { refusedWith } from "../core/refused";

const read = (block: unknown, set = FIRST_CHOICE) => {
  const given = Array.isArray(block) ? block : [[block]];
  return readContents(contentsArgument(given), given[0][0], set);
};

describe("wall", () => {
  test.each([
    [27_000, 27_000],
    [0, 0],
    ["27 kJ/K", 27_000],
    ["27.6kJ/K", 27_600],
    ["60 kg at 0.46 kJ/(kg K)", 27_600],
    ["60 kg forged steel at 0.46 kJ/(kg K)", 27_600],
    ["2 mol at 25 J/(mol K)", 50],
    ["1000 g Nickel 200", 456],
    ["2 kg of copper-c10200@snap-2007", 770.4],
    ["2 kg INCONEL 625 + 1 kg Nickel 200", 1276],
  ])("%s", (cell, capacity) => expect(readWall(cell)!.capacity(298.15)).toBeCloseTo(capacity, 9));

  test("left out is no wall", () => {
    expect(readWall(null)).toBeUndefined();
    expect(readWall(undefined)).toBeUndefined();
  });

  test("names and their first choice: copper from its set, by molar mass", () => {
    // 24.47 J/(mol K) at 298.15 K (NIST-JANAF) by 63.546 g/mol
    expect(readWall("1 kg copper")!.capacity(298.15)).toBeCloseTo(24.47 / 0.063546, 0);
    expect(readWall("1 kg copper")!.label).toBe("1 kg copper");
    expect(readWall("60 kg carbon steel + 2 kg PTFE")!.label).toBe("60 kg carbon steel + 2 kg PTFE");
  });

  test("the range of a wall ends at a transition that the set of the species goes beyond", () => {
    expect([readWall("1 kg nickel-pure@srd69-shomate")!.to, readWall("1 kg silica, quartz")!.to]).toEqual([600, 847]);
    expect(readWall("1 kg silica, quartz")!.toLabel).toBe("srd69-shomate for silica, quartz");
  });

  test.each([
    ["60 kg carbon stel", 'absent: "carbon stel" is not a wall material of the library; nearest: carbon steel, polycarbonate, tungsten'],
    [
      "60 kg steel",
      'absent: "steel" is not a wall material of the library; nearest: austenitic stainless steel, carbon steel, stainless steel 304, stainless steel 316 (50-300 K branch)',
    ],
    ["60 mol copper", 'input: "60 mol copper": a wall material is given by its mass, such as "60 kg copper"'],
    ["0 kg copper", "range: The wall: the amount 0 kg is not above zero"],
    ["5 m carbon steel", 'input: The wall "5 m" is a length; a mass such as 60 g or an amount such as 2 mol is expected'],
    [
      "60 kg",
      'input: The wall "60 kg" names no material: give a text such as "27 kJ/K", "60 kg carbon steel" or "0.2 kg at 2.1 kJ/(kg K)"',
    ],
    [
      "steel",
      'input: The wall "steel" cannot be read: give a number in J/K, or a text such as "27 kJ/K", "60 kg carbon steel" or "0.2 kg at 2.1 kJ/(kg K)"',
    ],
    ...["carbon steel 60 kg", "nasa-2002", "X5CrNi18-10"].map((text): [string, string] => [
      text,
      `input: The wall "${text}" cannot be read: give a number in J/K, or a text such as "27 kJ/K", "60 kg carbon steel" or "0.2 kg at 2.1 kJ/(kg K)"`,
    ]),
    ["2 kg at 3 J/K", 'input: The wall "2 kg at 3 J/K": 3 J/K is a heat capacity; write a mass with kJ/(kg K), or mol with J/(mol K)'],
    ["-3 J/K", 'range: The wall "-3 J/K": the heat capacity -3 J/K is not above 0 J/K'],
    [-3, "range: Heat capacity -3 J/K of the wall of -3 J/K is not 0 J/K or above"],
    [true, 'input: The wall is TRUE: give a number in J/K, or a text such as "27 kJ/K", "60 kg carbon steel" or "0.2 kg at 2.1 kJ/(kg K)"'],
  ])("refuses %s", (cell, sentence) => expect(refusedWith(() => readWall(cell))).toBe(sentence));
});

describe("contents", () => {
  test("gases by Cv, solids and liquids by Cp, mixtures, and walls", () => {
    expect(read("2 mol N2").capacity(500)).toBeCloseTo(2 * number("CV.AT", "N2", 500), 9);
    expect(read("1 kg H2O(l)").capacity(300)).toBeCloseTo(number("CP.AT", "H2O(l)", 300, "J/(kg K)"), 6);
    expect(read("50 g air").capacity(300)).toBeCloseTo(0.05 * number("CV.AT", "air", 300, "J/(kg K)"), 9);
    expect(read("60 kg carbon steel").capacity(373.15)).toBe(readWall("60 kg carbon steel")!.capacity(373.15));
  });

  test("a block material | amount is the sum of its rows; headings and blank rows are passed over", () => {
    const block = [
      ["material", "amount"],
      ["carbon steel", "60 kg"],
      ["N2", "100 mol"],
      [null, ""],
      ["0.79 N2 + 0.21 O2", "1 mol"],
      ["reaction mass", "0.2 kg at 2.1 kJ/(kg K)"],
      ["stirrer", "12 J/K"],
    ];
    const parts = ["60 kg carbon steel", "100 mol N2", "420 J/K", "12 J/K"].reduce((sum, text) => sum + read(text).capacity(400), 0);
    expect(read(block).capacity(400)).toBeCloseTo(parts + number("CV.AT", "0.79 N2 + 0.21 O2", 400), 8);
    expect(read([["carbon steel", "60 kg"]]).label).toBe("60 kg carbon steel");
  });

  test("a vapour holds from its boiling point at 1 atm on: what is meant below it is the liquid", () => {
    const below = (kelvin: string, boils: string, species: string, liquid: string) =>
      `#VALUE! Temperature ${kelvin} K is below ${boils} K, the lower limit of the vapour of ${species}, which boils there at 1 atm; ${liquid}`;
    const by = 'the liquid is told by its heat capacity, such as "0.2 kg at 2.1 kJ/(kg K)"';
    expect(refusal("VESSEL.PHI", "1 kg H2O", 500)).toBe(below("298.15", "373.124", "H2O", "liquid water is H2O(l)"));
    expect(refusal("VESSEL.PHI", "1 kg toluene + 1 kg carbon steel", 500)).toMatch(
      /^#VALUE! Temperature 298\.15 K is below 38[34]\.\d+ K, the lower limit of the vapour of toluene, which boils there at 1 atm; the liquid is told/,
    );
    expect(refusal("VESSEL.PHI", "1 kg toluene", 500)).toContain(by);
    expect(number("VESSEL.PHI", "1 kg H2O", 500, 400)).toBeCloseTo(1 + 500 / number("CV.AT", "H2O", 400, "J/(kg K)"), 9);
    expect(number("VESSEL.WARMUP", "1 kg toluene", 1000, 0, 300, 400, 450)).toBeGreaterThan(0);
    expect(refusal("VESSEL.WARMUP", "1 kg toluene", 1000, 0, 300, 300, 450)).toContain("the vapour of toluene");
    // boiling points from memory, K: methanol 337.7, benzene 353.2, acetone 329.3
    for (const [key, boils] of Object.entries({ CH3OH: 337.7, C6H6: 353.2, acetone: 329.3 }))
      expect([key, Math.abs(boilingPoint(key)! - boils) < 2]).toEqual([key, true]);
    // gases at room temperature, and what boils little above it, keep the range of their set
    for (const gas of ["N2", "CO2", "SO2", "NH3"]) expect([gas, read(`1 kg ${gas}`).from]).toEqual([gas, 200]);
    const moist = [
      ["material", "amount"],
      ["0.5 H2O + 0.5 N2", "1 kg"],
    ];
    expect(read(moist).from).toBe(200);
  });

  test("a set is for the species among them", () => {
    expect(read("2 mol N2", setOf("gri-1999")).capacity(500)).toBeCloseTo(2 * number("CV.AT", "N2", 500, undefined, "gri-1999"), 9);
    expect(read("2 mol N2").capacity(500)).not.toBe(read("2 mol N2", setOf("gri-1999")).capacity(500));
  });

  test.each([
    ["1 kg pizza", 'absent: "pizza" is neither a wall material nor a species of the library; nearest: Invar, PTFE, tin, N2H4 (diazane)'],
    ["1 kg water", 'input: "water" stands for several species: write H2O (water vapour) or H2O(l) (water, liquid)'],
    [0, "range: The contents of 0 J/K are not above 0 J/K"],
    [
      [["carbon steel", 60]],
      'input: The amount of carbon steel is 60: give it with its unit, such as "60 g" or "2 mol", or as a capacity such as "2.1 kJ/K"',
    ],
    [[["carbon steel", null]], "input: The amount of carbon steel is blank: give it with its unit"],
    [
      [
        ["N2", "2 mol"],
        [7, "2 mol"],
      ],
      "input: Row 2 of the contents has 7 where a material is expected",
    ],
    [[["material", "amount"]], "input: The contents hold no row material | amount"],
  ])("refuses %j", (block, sentence) => expect(refusedWith(() => read(block)).slice(0, sentence.length)).toBe(sentence));

  test("missing contents, and an error cell among the rows", () => {
    expect(refusal("VESSEL.PHI", undefined, 5)).toMatch(/^#VALUE! The contents are missing: give a number in J\/K/);
    const error = { code: "#DIV/0!" };
    expect(
      refusal(
        "VESSEL.PHI",
        [
          ["N2", "2 mol"],
          ["O2", error],
        ],
        5,
      ),
    ).toBe("#DIV/0! ");
  });
});

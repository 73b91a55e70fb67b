import { allSpecies, recordsOf, sourceOf } from "../../src/data/library";
import { call, refusal } from "./helpers";

test("every species and set has a citation, a grade and a range that evaluates at both ends", () => {
  for (const { key, phase } of allSpecies()) {
    for (const record of recordsOf(key)) {
      const [citation, grade, note] = call("SOURCE", key, record.set)[0]!;
      expect(citation).toBe(sourceOf(record.source).citation);
      expect(["A", "B", "C"]).toContain(grade);
      expect(note).toContain(`set ${record.set}`);
      const [from, to] = call("SOURCE.RANGE", key, record.set)[0] as [number, number];
      for (const end of [from, to])
        expect(typeof call(phase === "l" ? "CP.AT" : "CV.AT", key, end, null, record.set)[0]![0]).toBe("number");
    }
  }
});

test("a mixture names its species, and a named one its composition", () => {
  const [citation, grade, note] = call("SOURCE", "air")[0]!;
  expect(citation).toMatch(/^N2, O2, Ar, CO2: McBride/);
  expect(grade).toMatch(/N2/);
  expect(note).toMatch(/^composition: Dry air/);
  expect(call("SOURCE.RANGE", "0.5 N2 + 0.5 CH4")).toEqual([[200, 6000]]);
});

test("sets of a species, first choice on top, as a table with heading", () => {
  const table = call("SOURCE.SETS", "CH4");
  expect(table[0]).toEqual(["set", "form", "from [K]", "to [K]", "grade", "printed reference", "citation"]);
  expect(table[1]![0]).toBe("nasa-2002");
  expect(table.map((row) => row[0])).toEqual(expect.arrayContaining(["gri-1999", "srd69-shomate"]));
  expect(refusal("SOURCE.SETS", "air")).toBe("#VALUE! SOURCE.SETS takes one species, not a mixture");
});

test("solids and liquids say what was taken for them", () => {
  expect(call("SOURCE", "C(gr)")[0]![2]).toContain("solid: Cv = Cp taken, U = H");
  expect(call("SOURCE", "H2O(l)")[0]![2]).toContain("liquid: Cv not known, U = H");
});

test("a column of species gives a row each; a wide range is refused", () => {
  expect(call("SOURCE", [["N2"], ["O2"]]).map((row) => row.length)).toEqual([3, 3]);
  expect(refusal("SOURCE.RANGE", [["N2", "O2"]])).toContain("give the states as one column");
});

test("the note sets the formation enthalpy beside the published one with its uncertainty, and says where sets disagree", () => {
  // CH4: -74.6 +- 0.3 kJ/mol in ANL-05/20 (Burcat and Ruscic)
  expect(call("SOURCE", "CH4")[0]![2]).toContain("formation enthalpy here -74.6 kJ/mol, published -74.6 ± 0.3 kJ/mol");
  // OH: 37.30 kJ/mol today against 39.35 kJ/mol in the set of 1999
  expect(call("SOURCE", "OH")[0]![2]).toMatch(/the sets of OH disagree by more than their grades allow in [^:]*H\(298\.15 K\)/);
  expect(call("SOURCE", "He")[0]![2]).not.toContain("disagree");
});

test("coefficients in cells have a range and no citation", () => {
  const block = [["Cp", "g", "CO", "power 0", 273, 1800, "J/(mol K)", null, null, null, 29]];
  expect(call("SOURCE.RANGE", "CO", block)).toEqual([[273, 1800]]);
  expect(call("SOURCE", "CO", block)[0]).toEqual([
    "coefficients in cells of this workbook, not of the library",
    "not graded",
    expect.stringContaining("SOURCE.CHECK"),
  ]);
});

import { Refusal } from "../../src/core/refusal";
import { allSpecies } from "../../src/data/library";
import { candidatesFor } from "../../src/pane/candidates";
import { subjectOf } from "../../src/pane/subject";

/** The sentence of the refusal that `body` throws. */
function refusal(body: () => unknown): string {
  try {
    body();
  } catch (thrown) {
    if (thrown instanceof Refusal) return thrown.message;
    throw thrown;
  }
  throw new Error("nothing was refused");
}

describe("what the pane is about", () => {
  test("a species by key, name, formula and synonym, with its first choice first", () => {
    for (const typed of ["CO2", "carbon dioxide", "carbonic anhydride"]) {
      const subject = subjectOf(typed);
      expect(subject).toMatchObject({ text: "CO2", phase: "g", parts: [] });
      expect(subject.records[0]?.set).toBe("nasa-2002");
      expect(subject.sources.map(({ set }) => set)).toEqual(subject.records.map(({ set }) => set));
    }
  });

  test("a named mixture with its parts and the source of its composition", () => {
    const air = subjectOf("air");
    expect(air.parts.map(({ species }) => species)).toEqual(["N2", "O2", "Ar", "CO2"]);
    expect(air.parts.reduce((sum, { fraction }) => sum + fraction, 0)).toBeCloseTo(1, 12);
    expect(air.molarMass).toBeCloseTo(28.966, 3);
    expect(air.composition).toContain("Dry air");
    expect(air.sources).toHaveLength(1);
  });

  test("a mixture text", () => {
    expect(subjectOf("0.79 N2 + 0.21 O2").parts).toMatchObject([
      { species: "N2", fraction: 0.79 },
      { species: "O2", fraction: 0.21 },
    ]);
  });

  test("refusals keep the library's sentence", () => {
    expect(refusal(() => subjectOf("unobtainium"))).toContain("unobtainium");
    expect(refusal(() => subjectOf("C"))).toContain("C(gr)");
    expect(refusal(() => subjectOf("0.5 N2 + 0.4 O2"))).toContain("0.9");
  });
});

describe("what the search offers", () => {
  test("everything for an empty query", () => {
    const all = candidatesFor("");
    expect(all.length).toBeGreaterThan(allSpecies().length);
    expect(new Set(all.map(({ text }) => text)).size).toBe(all.length);
  });

  test.each([
    ["CO2", "CO2"],
    ["carbon dioxide", "CO2"],
    ["air", "air"],
    ["dry air", "air"],
  ])("%s finds %s first", (query, text) => {
    expect(candidatesFor(query)[0]?.text).toBe(text);
  });

  test("nothing for nonsense", () => {
    expect(candidatesFor("qqqqqqq")).toEqual([]);
  });

  test("every candidate can be taken", () => {
    for (const { text } of candidatesFor("")) expect(subjectOf(text).text).toBe(text);
  });
});

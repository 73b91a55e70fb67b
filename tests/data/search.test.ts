import fc from "fast-check";
import { allSpecies, namedMixture, searchSpecies } from "../../src/data/library";
import { editDistance, nearest } from "../../src/data/nearest";
import { atomicWeights, findSpecies } from "../../src/data/library";

const keys = (query: string, limit?: number): string[] => searchSpecies(query, limit).map((entry) => entry.key);

describe("search", () => {
  test.each([
    ["N2", "N2"],
    ["nitrogen", "N2"],
    ["ethyl", "C2H5"],
    ["steam", "H2O"],
    ["H3N", "NH3"],
    ["isooct", "i-C8H18"],
    ["buta", "n-C4H10"],
    ["tolune", "toluene"],
    ["methnol", "CH3OH"],
    ["sulphur dioxide", "SO2"],
    ["fe", "Fe(cr)"],
  ])("%s finds %s first or nearly so", (query, key) => expect(keys(query).slice(0, 4)).toContain(key));

  test.each([
    ["meth", "CH4"],
    ["prop", "C3H8"],
    ["carbon d", "CO2"],
  ])("%s finds first what begins so and has most sets: %s", (query, key) => expect(keys(query)[0]).toBe(key));

  test("water in all its phases", () => expect(keys("water")).toEqual(expect.arrayContaining(["H2O", "H2O(l)", "H2O(cr)"])));
  test("isomers of a formula all appear", () => expect(keys("C4H10")).toEqual(expect.arrayContaining(["n-C4H10", "i-C4H10"])));
  test("an empty query lists the beginning, nonsense nothing, and the limit holds", () => {
    expect(keys("", 5)).toEqual(["N2", "O2", "H2", "H2O", "CO2"]);
    expect(keys("qqqqqqq")).toEqual([]);
    expect(keys("e", 7)).toHaveLength(7);
  });
  test("every key finds itself first", () => {
    for (const { key } of allSpecies()) expect([key, keys(key)[0]]).toEqual([key, key]);
  });
});

describe("edit distance", () => {
  test.each([
    ["", "", 0],
    ["n2", "n3", 0.5],
    ["nh3", "n3", 1],
    ["methan", "methane", 1],
    ["toleune", "toluene", 1],
    ["abc", "xyz", 3],
  ])("%s to %s is %d", (a, b, d) => expect(editDistance(a, b)).toBe(d));

  test("is symmetric, zero only for equal texts, and at most the longer length", () => {
    const text = fc.string({ maxLength: 12 });
    fc.assert(
      fc.property(text, text, (a, b) => {
        expect(editDistance(a, b)).toBe(editDistance(b, a));
        expect(editDistance(a, b) === 0).toBe(a === b);
        expect(editDistance(a, b)).toBeLessThanOrEqual(Math.max(a.length, b.length));
      }),
    );
  });

  test("a limit gives the distance or something above the limit", () => {
    const text = fc.string({ maxLength: 10 });
    fc.assert(
      fc.property(text, text, fc.integer({ min: 0, max: 6 }), (a, b, limit) => {
        const [bounded, whole] = [editDistance(a, b, limit), editDistance(a, b)];
        if (whole <= limit) expect(bounded).toBe(whole);
        else expect(bounded).toBeGreaterThan(limit);
      }),
    );
  });

  test("nearest names each thing once", () => {
    const found = nearest("n", [
      { text: "n2", thing: 1 },
      { text: "n", thing: 1 },
      { text: "o", thing: 2 },
    ]);
    expect(found.map(({ thing }) => thing)).toEqual([1, 2]);
  });
});

describe("named mixtures", () => {
  test.each(["air", "Air", "dry air", "DRY-AIR", " air "])("%p is dry air", (text) => expect(namedMixture(text)!.source).toBe("dry-air"));

  test("its fractions are those of the standard, add up to 1, and weigh 28.9656 g/mol within the abridged weights", () => {
    const { parts } = namedMixture("air")!;
    expect(parts).toEqual([
      { species: "N2", fraction: 0.78084 },
      { species: "O2", fraction: 0.20946 },
      { species: "Ar", fraction: 0.0093 },
      { species: "CO2", fraction: 0.0004 },
    ]);
    expect(Math.abs(parts.reduce((sum, part) => sum + part.fraction, 0) - 1)).toBeLessThan(1e-12);
    const mass = parts.reduce((sum, part) => sum + part.fraction * findSpecies(part.species).molarMass, 0);
    expect(Math.abs(mass - 28.9656)).toBeLessThan(0.0005);
  });

  test("what is not a mixture is undefined", () => {
    expect(namedMixture("N2")).toBeUndefined();
    expect(namedMixture("")).toBeUndefined();
    expect(atomicWeights.size).toBe(84);
  });
});

test("no text at all makes the lookup fail otherwise than by a refusal", () => {
  fc.assert(
    fc.property(fc.oneof(fc.string(), fc.string({ unit: fc.constantFrom(..."CHNOSLaglrcs()-,. 0123".split("")) })), (text) => {
      try {
        expect(allSpecies()).toContain(findSpecies(text));
      } catch (refusal) {
        expect(refusal).toMatchObject({ kind: expect.stringMatching(/^(input|absent)$/), message: expect.any(String) });
      }
    }),
    { numRuns: 300 },
  );
});

import { Refusal } from "../../src/core/refusal";
import { allMixtures, allSets, allSources, grades, recordOf, sourceOf } from "../../src/data/library";
import { constants } from "../../src/data/constants";
import { allPairs, virialOf } from "../../src/data/critical";
import { allCritical } from "../../src/data/critical-further";
import printed from "../../src/data/sources.json";
import elements from "../../src/data/elements.json";
import { saturation } from "../../src/data/saturation";
import { allFormationUncertainties } from "../../src/data/uncertainties";
import { allWalls } from "../../src/data/walls";

const used: (readonly [string, string])[] = [
  ...allSets().map((set) => [`set ${set.id}`, set.source] as const),
  ...allSets().flatMap((set) => set.species.map((species) => [`${species} of ${set.id}`, recordOf(species, set.id).source] as const)),
  ...allMixtures().map((mixture) => [mixture.name, mixture.source] as const),
  ...constants.map((constant) => [constant.key, constant.source] as const),
  ...allCritical().map((row) => [row.species, row.source] as const),
  ...allPairs().map((row) => [row.pair.join(" and "), row.source] as const),
  ...allFormationUncertainties().map((row) => [row.species, row.source] as const),
  ...allWalls().map((row) => [row.id, row.source] as const),
  ["elements", elements.source],
  ["saturation over liquid", saturation.liquidSource],
  ["saturation over ice", saturation.iceSource],
  ["virial of argon", virialOf("Ar")!.source],
];

test("every number's source key resolves", () => {
  const unresolved = used.filter(([, key]) => !allSources().some((source) => source.key === key));
  expect(unresolved).toEqual([]);
  expect(used.length).toBeGreaterThan(600);
});

test("source keys are unique, short and printable", () => {
  const keys = printed.sources.map((source) => source.key);
  expect(new Set(keys).size).toBe(keys.length);
  for (const key of keys) expect(key).toMatch(/^[a-z0-9][a-z0-9.-]{2,24}$/);
});

test.each(allSources().map((source) => [source.key, source] as const))("%s has a citation and a licence note", (_, source) => {
  expect(source.citation.length).toBeGreaterThan(20);
  expect((source.licence ?? "").length).toBeGreaterThan(5);
  if (source.year !== undefined) expect(source.year).toBeGreaterThan(1900);
  if (source.url !== undefined)
    expect(source.url).toMatch(
      /^https:\/\/(ntrs\.nasa|webbook\.nist|janaf\.nist|physics\.nist|trc\.nist|www\.bipm|www\.ciaaw|www\.iapws)\./,
    );
});

test("the three grades are explained", () => {
  expect(Object.keys(grades)).toEqual(["A", "B", "C"]);
  for (const words of Object.values(grades)) expect(words.length).toBeGreaterThan(30);
});

test("a key that is not there is refused", () => {
  expect(() => sourceOf("nasa-1971")).toThrow(new Refusal("absent", '"nasa-1971" is not the key of a source') as never);
});

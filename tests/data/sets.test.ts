import { createHash } from "crypto";
import { readdirSync, readFileSync } from "fs";
import { join } from "path";
import { gzipSync } from "zlib";
import { Refusal } from "../../src/core/refusal";
import { allSets, allSpecies, recordOf, recordsOf } from "../../src/data/library";
import committed from "./digests.json";
import { everyRecord, titled } from "./support";

const COEFFICIENTS = { "nine-term": 9, "seven-term": 7, shomate: 8 } as const;

test("set ids are unique, lower case and short, and name their source", () => {
  const ids = allSets().map((set) => set.id);
  expect(new Set(ids).size).toBe(ids.length);
  for (const id of ids) expect(id).toMatch(/^[a-z][a-z0-9-]{2,15}$/);
  for (const set of allSets()) expect(set.source).toBe(set.id);
});

test("the files of the folder are the sets of the library, each under its id", () => {
  const files = readdirSync(join(__dirname, "../../src/data/sets")).map((file) => file.replace(/\.json$/, ""));
  expect(files.sort()).toEqual(
    allSets()
      .map((set) => set.id)
      .sort(),
  );
});

test("every species has a record and every record a species", () => {
  const keys = allSpecies().map((entry) => entry.key);
  expect(new Set(keys).size).toBe(keys.length);
  expect(new Set(allSets().flatMap((set) => set.species))).toEqual(new Set(keys));
  expect(everyRecord).toHaveLength(203 + 54);
});

test.each(titled(everyRecord))("%s is complete", (_, { record, capacity }) => {
  const entry = allSpecies().find((one) => one.key === record.species)!;
  expect(record.phase).toBe(entry.phase);
  expect(record.formula).toBe(entry.formula);
  expect(["A", "B", "C"]).toContain(record.grade);
  expect(record.set === "felder-b2" || record.reference.length >= 4).toBe(true);
  if (record.form in COEFFICIENTS)
    for (const interval of record.intervals)
      expect(interval.coefficients).toHaveLength(COEFFICIENTS[record.form as keyof typeof COEFFICIENTS]);
  if (record.form === "power")
    for (const interval of record.intervals) expect(interval.coefficients).toHaveLength(record.exponents!.length);
  expect(capacity.from).toBeGreaterThanOrEqual(100);
  expect(capacity.cp((capacity.from + capacity.to) / 2)).toBeGreaterThan(0);
  expect(capacity.onFormationScale).toBe(record.set !== "molecular" && record.set !== "felder-b2" && record.species !== "SiC(cr)");
});

/** The digits as they left the tables: bytes of every limit and coefficient. */
function digestOf(species: string, set: string): string {
  const hash = createHash("sha256");
  for (const { from, to, coefficients } of recordOf(species, set).intervals)
    for (const value of [from, to, ...coefficients]) {
      const bytes = Buffer.alloc(8);
      if (value !== null) bytes.writeDoubleBE(value);
      hash.update(value === null ? "null" : bytes);
    }
  return hash.digest("hex").slice(0, 16);
}

test.each(Object.entries(committed.digests))("the digits of %s are those of the table", (set, digests) => {
  const own = Object.fromEntries(
    allSets()
      .find((one) => one.id === set)!
      .species.map((species) => [species, digestOf(species, set)]),
  );
  expect(own).toEqual(digests);
});

/** Typed from the printed tables, independently of the files. */
test.each([
  ["N2", "nasa-2002", 0, 0, 22103.71497],
  ["N2", "nasa-2002", 0, 1, -381.846182],
  ["N2", "nasa-2002", 0, 2, 6.08273836],
  ["N2", "nasa-2002", 0, 8, -10.76003744],
  ["N2", "nasa-2002", 1, 0, 587712.406],
  ["N2", "nasa-2002", 1, 1, -2239.249073],
  ["O2", "nasa-2002", 0, 0, -34255.6342],
  ["O2", "nasa-2002", 0, 1, 484.700097],
  ["H2O", "nasa-2002", 0, 0, -39479.6083],
  ["H2O", "nasa-2002", 0, 1, 575.573102],
  ["CO2", "nasa-2002", 0, 0, 49436.5054],
  ["CO2", "nasa-2002", 0, 7, -45281.9846],
  ["CH4", "gri-1999", 0, 0, 5.14987613],
  ["CH4", "gri-1999", 0, 1, -1.36709788e-2],
  ["O2", "gri-1999", 0, 0, 3.78245636],
  ["H2O", "gri-1999", 0, 0, 4.19864056],
  ["CO2", "gri-1999", 0, 0, 2.35677352],
  ["N2", "gri-1999", 0, 0, 3.298677],
  ["N2", "srd69-shomate", 0, 0, 28.98641],
  ["N2", "srd69-shomate", 1, 0, 19.50583],
  ["CH4", "srd69-shomate", 0, 0, -0.703029],
  ["CH4", "srd69-shomate", 0, 1, 108.4773],
  ["Fe(cr)", "srd69-shomate", 0, 0, 18.42868],
  ["acetone", "felder-b2", 0, 0, 71.96],
  ["acetone", "felder-b2", 0, 1, 20.1e-2],
] as const)("%s of %s, interval %d, coefficient %d is %d", (species, set, interval, index, printed) => {
  expect(recordOf(species, set).intervals[interval]!.coefficients[index]).toBe(printed);
});

describe("refusals", () => {
  const sentence = (call: () => unknown): string => {
    try {
      call();
    } catch (refusal) {
      if (refusal instanceof Refusal) return `${refusal.kind}: ${refusal.message}`;
      throw refusal;
    }
    return "not refused";
  };

  test("an unknown set, a set without the species, a species not there", () => {
    expect(sentence(() => recordOf("CO2", "nasa-1971"))).toBe(
      'absent: "nasa-1971" is not a set of the library; sets for CO2: nasa-2002, srd69-shomate, gri-1999, molecular',
    );
    expect(sentence(() => recordOf("Ar", "srd69-shomate"))).toBe(
      "absent: Set srd69-shomate does not hold Ar; sets that do: nasa-2002, gri-1999, molecular",
    );
    expect(sentence(() => recordsOf("N3"))).toBe('absent: "N3" is not in the library');
  });
});

test("all figures together, even those no function uses yet, stay under the 60 kB gzip of the add-in", () => {
  const folder = join(__dirname, "../../src/data");
  const files = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((file) => file.endsWith(".json"));
  expect(files.length).toBeGreaterThan(20);
  const all = files.map((file) => JSON.stringify(JSON.parse(readFileSync(join(folder, file), "utf8"))));
  expect(gzipSync(all.join(""), { level: 9 }).length).toBeLessThan(60_000);
});

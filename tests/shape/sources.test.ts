/** Every key that names a source is resolved: in the help, in the sets, and wherever a figure names one. */
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { handbook } from "../../src/handbook";
import { SRC } from "./imports";

const data = join(SRC, "data");
const read = (...path: string[]): unknown => JSON.parse(readFileSync(join(data, ...path), "utf8"));

const { sources } = read("sources.json") as { sources: { key: string; citation: string }[] };
const keys = new Set(sources.map(({ key }) => key));

/** Texts that stand under the name `source`, or one that ends in `Source`, anywhere in a file. */
function sourceKeys(value: unknown): string[] {
  if (Array.isArray(value)) return value.flatMap(sourceKeys);
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([name, inner]) =>
    /^source$|Source$/.test(name) && typeof inner === "string" ? [inner] : sourceKeys(inner),
  );
}

const files = [
  ...readdirSync(data).filter((name) => name.endsWith(".json") && name !== "sources.json"),
  ...readdirSync(join(data, "sets")).map((name) => join("sets", name)),
];

test("keys are not used twice, and each has a citation", () => {
  expect(keys.size).toBe(sources.length);
  expect(sources.filter(({ citation }) => !citation.trim()).map(({ key }) => key)).toEqual([]);
});

test.each(files)("%s names sources that are there", (file) => {
  expect([...new Set(sourceKeys(read(file)))].filter((key) => !keys.has(key))).toEqual([]);
});

test.each(readdirSync(join(data, "sets")))("the set %s names its source and bears its file's name", (file) => {
  const set = read("sets", file) as { id: string; source: string };
  expect(`${set.id}.json`).toBe(file);
  expect(keys.has(set.source)).toBe(true);
});

test("every function's help names sources that are there", () => {
  expect(handbook.flatMap(({ id, sources: named }) => named.filter((key) => !keys.has(key)).map((key) => `${id}: ${key}`))).toEqual([]);
});

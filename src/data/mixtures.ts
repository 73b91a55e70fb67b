import { foldCase } from "./fold";
import table from "./mixtures.json";

/** A mixture of gases with a name, in mole fractions that add up to 1. */
export interface NamedMixture {
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly parts: readonly { readonly species: string; readonly fraction: number }[];
  /** Key in sources.json. */
  readonly source: string;
}

const mixtures: readonly NamedMixture[] = table.map((row) => ({
  ...row,
  parts: row.parts.map(([species, fraction]) => ({ species: species as string, fraction: fraction as number })),
}));

/** Every named mixture. */
export function allMixtures(): readonly NamedMixture[] {
  return mixtures;
}

/** The mixture of a name such as `air` or `dry air`, or undefined. */
export function namedMixture(text: string): NamedMixture | undefined {
  const folded = foldCase(text);
  return mixtures.find((mixture) => [mixture.name, ...mixture.synonyms].some((name) => foldCase(name) === folded));
}

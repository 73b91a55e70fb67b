/** Contents of a closed vessel that can react or decompose: from memory, and not complete. Not part of library.ts. */
import table from "./self-reactive.json";

/** What species do by themselves. */
export interface SelfReaction {
  readonly kind: "decomposes" | "polymerises" | "associates" | "recombines";
  /** Follows the kind: `decomposes with heat to nitrogen and oxygen`. */
  readonly words: string;
  /** Lowest temperature, K, from which it counts; left out: at any. */
  readonly from?: number;
  /** Key in sources.json. */
  readonly source: string;
}

/** A self-reaction with the species it belongs to. */
export interface SelfReactive extends SelfReaction {
  /** Keys of the library. */
  readonly species?: readonly string[];
  /** Names by formula of those the library does not hold. */
  readonly others?: Readonly<Record<string, string | undefined>>;
}

/** Species that react when they are together: each of the one with each of the other. Formulas, in any phase. */
export interface ReactivePair {
  readonly one: readonly string[];
  readonly other: readonly string[];
  /** What they do: `form NO2`. */
  readonly words: string;
  readonly source: string;
}

export const selfReactive: readonly SelfReactive[] = table.species as readonly SelfReactive[];

/** What every other compound of carbon with hydrogen does when hot. */
export const organic = table.organic as SelfReaction & { readonly from: number };

/** Formulas of species that burn fuels. */
export const oxidants: { readonly species: readonly string[]; readonly source: string } = table.oxidants;

export const reactivePairs: readonly ReactivePair[] = table.pairs;

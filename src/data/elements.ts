import { refuse } from "../core/refusal";
import table from "./elements.json";

/** One chemical element: abridged standard atomic weight with its stated uncertainty (source key `ciaaw-2021`). */
export interface Element {
  readonly symbol: string;
  readonly number: number;
  readonly name: string;
  /** Abridged standard atomic weight, g/mol. */
  readonly weight: number;
  /** Stated uncertainty of the abridged weight, g/mol. */
  readonly uncertainty: number;
  /** The standard weight or interval of 2021 the abridged value was compared with; absent where it was not seen. */
  readonly standard?: string;
}

/** Every element that has a standard atomic weight, by atomic number. */
export const elements: readonly Element[] = table.elements;

/** The one table of atomic weights, g/mol, by element symbol. */
export const atomicWeights: ReadonlyMap<string, number> = new Map(elements.map((element) => [element.symbol, element.weight]));

/** The element of a symbol. Refuses a symbol that has no standard atomic weight. */
export function elementOf(symbol: string): Element {
  return elements.find((element) => element.symbol === symbol) ?? refuse(`"${symbol}" is not an element with a standard atomic weight`);
}

/**
 * The lines of the species in a table of products, in an order that does not move where that matters: as the user listed them, and in the
 * rows of a sweep as the set has them. Alone and upright, the most abundant first, and traces named together.
 */
import { line, type Line, SEE_NOTE } from "./table";

export interface ShownSpecies {
  readonly name: string;
  /** Share by which traces are told: mole fraction, or share of everything. */
  readonly fraction: number;
  readonly condensed: boolean;
}

const TRACE = 1e-9;

/** What the note of the traces says: what they are a share of, and where they are to be had. */
export interface TraceWords {
  readonly of: string;
  readonly way: string;
}

/** `fixed`: the order as it stands, all of them. */
export function speciesLines<Shown extends ShownSpecies>(
  species: readonly Shown[],
  fixed: boolean,
  lineOf: (species: Shown) => Line,
  { of, way }: TraceWords,
): Line[] {
  if (fixed) return species.map(lineOf);
  const sorted = [...species].sort((a, b) => b.fraction - a.fraction);
  const lines = sorted.filter(({ fraction }) => fraction >= TRACE).map(lineOf);
  const traces = sorted.filter(({ fraction, condensed }) => fraction < TRACE && !condensed).map(({ name }) => name);
  return traces.length === 0 ? lines : [...lines, line("traces", SEE_NOTE, "", `below ${TRACE} of ${of}: ${traces.join(", ")}; ${way}`)];
}

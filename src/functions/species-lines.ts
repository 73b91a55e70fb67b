/**
 * The lines of the species in a table of products, in an order that does not move where that matters: as the user listed them, and in the
 * rows of a sweep as the set has them. Alone and upright, the most abundant first, and traces named together.
 */
import { line, type Line, SEE_NOTE } from "./table";

export interface SpeciesLine {
  /** Share by which traces are told. */
  readonly share: number;
  readonly condensed: boolean;
  readonly line: Line;
}

const TRACE = 1e-9;

/** What the note of the traces says: what they are a share of, and where they are to be had. */
export interface TraceWords {
  readonly of: string;
  readonly way: string;
}

/** `fixed`: the order as it stands, all of them. */
export function speciesLines(species: readonly SpeciesLine[], fixed: boolean, { of, way }: TraceWords): Line[] {
  if (fixed) return species.map((each) => each.line);
  const sorted = [...species].sort((a, b) => b.share - a.share);
  const lines = sorted.filter(({ share }) => share >= TRACE).map((each) => each.line);
  const traces = sorted.filter(({ share, condensed }) => share < TRACE && !condensed).map((each) => each.line.label);
  return traces.length === 0 ? lines : [...lines, line("traces", SEE_NOTE, "", `below ${TRACE} of ${of}: ${traces.join(", ")}; ${way}`)];
}

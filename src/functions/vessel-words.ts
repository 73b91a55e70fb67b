/** What every table on a sealed vessel says in words. */
import { type Line, line, SEE_NOTE } from "./table";

/** The last line of a table. */
export const GOVERN = "not a design or relief calculation: the vessel's own rating, local codes and licensed practice govern";

/** `what` names what the numbers hold for: `frozen composition`. */
export function governLine(what: string): Line {
  return line("holds for", SEE_NOTE, "", `${what}; ${GOVERN}`);
}

/** The argument `accumulation` of VESSEL.MTSR: the share of the reactants that has not reacted yet. */
import { refuseRange } from "../core/refusal";
import { readFraction } from "./arguments";
import type { Cell } from "./cell";

/**
 * Left out it is 1: all of it. A 0 is refused, because older Excel sends 0 for a blank cell, and the temperature would come out far too low.
 */
export function readAccumulation(cell: Cell | undefined): number {
  if (cell === undefined || cell === null) return 1;
  const share = readFraction(cell, "Accumulation");
  if (share === 0)
    refuseRange("Accumulation 0 is no accumulation, or a blank cell: leave the argument out for all of it, or give a share above 0");
  return share;
}

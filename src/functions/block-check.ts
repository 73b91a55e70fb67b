/** The verdict on one fit typed in cells: its own plausibility, and its distance from the library's first choice for the same species. */
import { capacityOf } from "../core/capacity";
import { Check, checkContinuity, checkGas } from "../core/capacity/plausibility";
import { printed, Refusal } from "../core/refusal";
import type { SpeciesFit } from "../core/species/types";
import { findSpecies, recordsOf } from "../data/library";
import { shapeOf } from "../data/shape";

/** Temperatures at which a second source is asked, K. */
const ANCHORS = [298.15, 1000];
/** Evaluations of one gas differ by less than this between 298 and 1000 K, with few exceptions. */
const DIFFERENCE = 0.02;

export function checkBlock(fit: SpeciesFit): Check[] {
  const capacity = capacityOf(fit);
  return [
    ...checkContinuity(capacity, fit.formationEnthalpy),
    ...checkGas(capacity, fit.molecular ? moleculeOf(fit) : shapeOf(fit)),
    ...againstLibrary(fit),
  ];
}

function moleculeOf(fit: SpeciesFit): { atoms: number; linear: boolean } {
  return { atoms: shapeOf(fit).atoms, linear: fit.molecular?.geometry === "linear" };
}

function againstLibrary(fit: SpeciesFit): Check[] {
  const other = firstChoice(fit);
  if (!other) return [{ check: "against the library", verdict: "not applicable", detail: `the library does not hold ${fit.species}` }];
  const [own, known] = [capacityOf(fit), capacityOf(other)];
  return ANCHORS.filter((at) => Number.isFinite(own.cp(at)) && Number.isFinite(known.cp(at))).map((at) => {
    const difference = own.cp(at) / known.cp(at) - 1;
    const verdict = Math.abs(difference) <= DIFFERENCE ? "passed" : "doubt";
    return { check: `Cp(${at} K) against ${other.set}`, verdict, detail: `differs by ${printed(100 * difference)} %` };
  });
}

/** The library's first choice for the species and phase of a fit; undefined if it has none or several. */
function firstChoice(fit: SpeciesFit): SpeciesFit | undefined {
  for (const text of [fit.species, fit.formula]) {
    try {
      const entry = findSpecies(text);
      if (entry.phase === fit.phase) return recordsOf(entry.key)[0];
    } catch (thrown) {
      if (!(thrown instanceof Refusal)) throw thrown;
    }
  }
  return undefined;
}

/**
 * Where the sets of a species disagree beyond their accuracy, in a sentence. Pure.
 *
 * Accuracy taken for a heat capacity, common practice: 1 % for published fits (grades A and B), 3 % for textbook fits and for
 * constants from memory (grade C, whose meaning in the library says 1 to 3 %). Two sets disagree if they differ by more than the
 * larger of the two, somewhere in the range both cover.
 */
import type { SetRecord } from "../data/library";
import { shown } from "./numbers";
import { quantityOf, readingsAt, type Source } from "./points";
import type { Subject } from "./subject";

const ACCURACY_PERCENT: Readonly<Record<SetRecord["grade"], number>> = { A: 1, B: 1, C: 3 };
const STEPS = 200;

export interface Difference {
  /** Largest difference from the first set, percent of the first, with its sign. */
  readonly percent: number;
  /** Where it is, K. */
  readonly temperature: number;
}

/** The largest difference of `other` from `first` over the range both cover; undefined if they share none. */
export function largestDifference(first: Source, other: Source): Difference | undefined {
  const from = Math.max(first.capacity.from, other.capacity.from);
  const to = Math.min(first.capacity.to, other.capacity.to);
  let largest: Difference | undefined;
  for (let i = 0; from <= to && i <= STEPS; i += 1) {
    const temperature = i === STEPS ? to : from + ((to - from) * i) / STEPS;
    const percent = readingsAt([first, other], temperature)[1]?.differencePercent ?? 0;
    if (!largest || Math.abs(percent) > Math.abs(largest.percent)) largest = { percent, temperature };
  }
  return largest;
}

/** One sentence for each set that disagrees with the first choice; empty if none does. */
export function disagreementNotice({ records, sources }: Subject): string {
  const [first, ...others] = sources;
  if (!first) return "";
  const sentences = others.flatMap((other, index) => {
    const allowed = Math.max(accuracy(records[0]), accuracy(records[index + 1]));
    const found = largestDifference(first, other);
    return found && Math.abs(found.percent) > allowed ? [sentence(first, other, found, allowed)] : [];
  });
  return sentences.join(" ");
}

function accuracy(record: SetRecord | undefined): number {
  return record ? ACCURACY_PERCENT[record.grade] : 0;
}

function sentence(first: Source, other: Source, { percent, temperature }: Difference, allowed: number): string {
  const side = percent > 0 ? "above" : "below";
  return (
    `${quantityOf([first])} of ${other.set} is up to ${shown(Math.abs(percent), 2)} % ${side} ${first.set}, at ${shown(temperature, 4)} K: ` +
    `more than the ${allowed} % such records are good for.`
  );
}

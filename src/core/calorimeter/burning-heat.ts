/**
 * Heat of what burns beside the sample: fuse wire by length or mass, cotton, combustion aids.
 *
 *   Q = consumed × heat per cm or per g
 *
 * Only what was consumed counts: the length fitted less the length that remains. A quantity larger than any wire or aid of a run is
 * refused, because it is usually the length that remained, or a quantity in another unit.
 */
import { printed, refuse, refuseRange } from "../refusal";

export type Measure = "length" | "mass";

/** A kind of thing that burns, as the library holds it. */
export interface BurningKind {
  readonly kind: string;
  /** Measure of plain numbers. */
  readonly plain: Measure;
  /** J/cm and J/g; absent where none is known. */
  readonly perCentimetre?: number;
  readonly perGram?: number;
  /** Most that a run can consume: cm and g (common practice). */
  readonly mostCentimetres?: number;
  readonly mostGrams: number;
}

/** Heat, J, of what was consumed, in cm or g. Refuses more than a run can consume, and a measure without a heat. */
export function burningHeat(kind: BurningKind, measure: Measure, consumed: number, ownHeat?: number): number {
  if (!(consumed >= 0)) return refuseRange(`${name(kind)} consumed ${printed(consumed)} ${unitOf(measure)} is negative`);
  requirePossible(kind, measure, consumed);
  const heat = ownHeat ?? (measure === "length" ? kind.perCentimetre : kind.perGram);
  if (heat === undefined) return refuse(`No heat by ${measure} is known for ${kind.kind}: give what was consumed by ${other(measure)}`);
  return consumed * heat;
}

function requirePossible(kind: BurningKind, measure: Measure, consumed: number): void {
  const most = measure === "length" ? kind.mostCentimetres : kind.mostGrams;
  if (most === undefined || consumed <= most) return;
  const cure =
    kind.plain === "length"
      ? "larger than the wire: give what was consumed, the length fitted less the length that remained"
      : 'larger than a run can hold: give grams, or a text such as "50 mg"';
  refuseRange(`${name(kind)} consumed ${printed(consumed)} ${unitOf(measure)} is above ${most} ${unitOf(measure)}, ${cure}`);
}

function unitOf(measure: Measure): string {
  return measure === "length" ? "cm" : "g";
}

function other(measure: Measure): string {
  return measure === "length" ? "mass" : "length";
}

function name({ kind }: BurningKind): string {
  return kind.charAt(0).toUpperCase() + kind.slice(1);
}

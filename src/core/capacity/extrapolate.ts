import { refuse } from "../refusal";
import type { Capacity } from "./capacity";
import { CurveCapacity } from "./curves";
import { CONSTANT_TERM, type LaurentInterval, TERMS } from "./laurent";
import { type CapacityHead, PiecewiseCapacity } from "./piecewise";

/** An extrapolation is fenced too: below and above these temperatures, K, no gas of constant Cv is worth a number. */
const LOWEST = 1;
const HIGHEST = 20000;

/**
 * The same capacity beyond its range, asked for by name: Cv keeps its end value, so U and H run on in a straight line and S with the
 * logarithm of T. No polynomial is ever used outside its range. The new limits are 1 K and 20 000 K, and the labels say
 * "the extrapolation of …". Refuses condensed species, whose end of range is a change of phase, and mixtures that hold one.
 */
export function extrapolated(capacity: Capacity): Capacity {
  if (capacity.phase !== "g")
    refuse(
      `The ${capacity.phase === "l" ? "liquid" : "solid"} range of ${capacity.toLabel} is not extrapolated: it may end at a change of phase`,
    );
  const head = headOf(capacity);
  if (capacity instanceof PiecewiseCapacity) return new PiecewiseCapacity(head, withHeldEnds(capacity));
  return heldCurves(capacity, head);
}

/** What the extrapolation of a capacity is besides its numbers. */
export function headOf(capacity: Capacity): CapacityHead {
  const { phase, standardPressure, onFormationScale, hasEntropy, gasConstant } = capacity;
  return {
    phase,
    standardPressure,
    onFormationScale,
    hasEntropy,
    gasConstant,
    fromLabel: `the extrapolation of ${capacity.fromLabel}`,
    toLabel: `the extrapolation of ${capacity.toLabel}`,
  };
}

function withHeldEnds(capacity: PiecewiseCapacity): LaurentInterval[] {
  const intervals = [...capacity.intervals];
  if (capacity.from > LOWEST) intervals.unshift(heldInterval(capacity, capacity.from, LOWEST, capacity.from));
  if (capacity.to < HIGHEST) intervals.push(heldInterval(capacity, capacity.to, capacity.to, HIGHEST));
  return intervals;
}

/** Constant Cp, with the H and S that the capacity has at the end `at`. */
export function heldInterval(capacity: Capacity, at: number, from: number, to: number): LaurentInterval {
  const constant = capacity.cp(at);
  const cp = new Array<number>(TERMS).fill(0);
  cp[CONSTANT_TERM] = constant;
  return {
    from,
    to,
    cp,
    enthalpyConstant: capacity.enthalpy(at) - constant * at,
    entropyConstant: capacity.entropy(at) - constant * Math.log(at),
  };
}

function heldCurves(capacity: Capacity, head: CapacityHead): Capacity {
  const end = (t: number) => Math.min(Math.max(t, capacity.from), capacity.to);
  const from = Math.min(LOWEST, capacity.from);
  const to = Math.max(HIGHEST, capacity.to);
  return new CurveCapacity(
    head,
    from,
    to,
    [capacity.from, ...capacity.joints, capacity.to].filter((t) => t > from && t < to),
    {
      cp: (t) => capacity.cp(end(t)),
      enthalpy: (t) => capacity.enthalpy(end(t)) + capacity.cp(end(t)) * (t - end(t)),
      entropy: (t) => capacity.entropy(end(t)) + capacity.cp(end(t)) * Math.log(t / end(t)),
    },
  );
}

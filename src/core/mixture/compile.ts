import { STANDARD_PRESSURE } from "../constants";
import type { Capacity } from "../capacity/capacity";
import { CurveCapacity } from "../capacity/curves";
import { type LaurentInterval, TERMS } from "../capacity/laurent";
import { type CapacityHead, PiecewiseCapacity } from "../capacity/piecewise";
import { refuse, refuseRange } from "../refusal";

export interface MixturePart {
  readonly capacity: Capacity;
  /** Mole fraction, or mol: then every value of the result is that of the whole, per the sum of the amounts. */
  readonly amount: number;
}

/**
 * One capacity for an ideal mixture of frozen composition, at the cost of one gas: the coefficient vectors of the parts are added on each
 * interval between two neighbouring joints of any part, inside the range that all parts share. Parts of amount 0 are left out.
 *
 *   Cp, Cv, H, U   Σ x · value of the part, per mole of mixture if the amounts are mole fractions
 *   S              Σ x · S of the part − R Σ x ln y over the gases, y = share among the gases: the gases together at the standard pressure
 *   gasConstant    Σ x R over the gases, each with the R of its fit
 *
 * Solids and liquids may stand beside gases: pure phases of their own, without volume, for which Cv = Cp and U = H.
 * The phase of the result is that of its most demanding part: any liquid makes it "l", else any solid "cr".
 * Parts that hold no polynomial (form molecular, odd exponents) are evaluated one by one behind the same face.
 *
 * Refuses amounts that are negative or not finite, nothing at all, and parts whose ranges share no temperature.
 */
export function compileMixture(parts: readonly MixturePart[]): Capacity {
  for (const { capacity, amount } of parts)
    if (!(amount >= 0 && amount < Infinity)) refuse(`The amount ${amount} of ${nameOf(capacity)} is not a number from 0 up`);
  const present = parts.filter(({ amount }) => amount > 0);
  if (present.length === 0) refuse("The mixture has no part with an amount above 0");
  const { from, to } = sharedRange(present);
  const head = headOf(present);
  const joints = jointsBetween(present, from, to);
  const entropyShift = entropyOfMixing(present) + pressureShift(present, head.standardPressure);
  const polynomials = present.filter(isPolynomial);
  if (polynomials.length < present.length) return sumOfParts(present, head, from, to, joints, entropyShift);
  const limits = [from, ...joints, to];
  return new PiecewiseCapacity(
    head,
    limits.slice(1).map((end, k) => added(polynomials, limits[k]!, end, entropyShift)),
  );
}

type PolynomialPart = MixturePart & { readonly capacity: PiecewiseCapacity };

function isPolynomial(part: MixturePart): part is PolynomialPart {
  return part.capacity instanceof PiecewiseCapacity;
}

/** The sum of the coefficient vectors on an interval that lies inside one interval of every part. */
function added(parts: readonly PolynomialPart[], from: number, to: number, entropyShift: number): LaurentInterval {
  const cp = new Array<number>(TERMS).fill(0);
  let enthalpyConstant = 0;
  let entropyConstant = entropyShift;
  for (const { capacity, amount } of parts) {
    const interval = capacity.intervals.find((candidate) => to <= candidate.to)!;
    for (let k = 0; k < TERMS; k++) cp[k] = cp[k]! + amount * interval.cp[k]!;
    enthalpyConstant += amount * interval.enthalpyConstant;
    entropyConstant += amount * interval.entropyConstant;
  }
  return { from, to, cp, enthalpyConstant, entropyConstant };
}

function sumOfParts(
  parts: readonly MixturePart[],
  head: CapacityHead,
  from: number,
  to: number,
  joints: number[],
  entropyShift: number,
): Capacity {
  const sum = (value: (capacity: Capacity) => number) => parts.reduce((total, { capacity, amount }) => total + amount * value(capacity), 0);
  return new CurveCapacity(head, from, to, joints, {
    cp: (t) => sum((capacity) => capacity.cp(t)),
    enthalpy: (t) => sum((capacity) => capacity.enthalpy(t)),
    entropy: (t) => sum((capacity) => capacity.entropy(t)) + entropyShift,
  });
}

/** The range all parts share; refused, with the two that do not meet, if there is none. */
function sharedRange(parts: readonly MixturePart[]): { from: number; to: number } {
  const lowest = highestLower(parts);
  const highest = lowestUpper(parts);
  if (lowest.from >= highest.to)
    refuseRange(
      `The parts share no temperature: ${lowest.fromLabel} begins at ${lowest.from} K, ${highest.toLabel} ends at ${highest.to} K`,
    );
  return { from: lowest.from, to: highest.to };
}

function highestLower(parts: readonly MixturePart[]): Capacity {
  return parts.map(({ capacity }) => capacity).reduce((high, next) => (next.from > high.from ? next : high));
}

function lowestUpper(parts: readonly MixturePart[]): Capacity {
  return parts.map(({ capacity }) => capacity).reduce((low, next) => (next.to < low.to ? next : low));
}

function jointsBetween(parts: readonly MixturePart[], from: number, to: number): number[] {
  const all = new Set(parts.flatMap(({ capacity }) => capacity.joints).filter((joint) => joint > from && joint < to));
  return [...all].sort((a, b) => a - b);
}

function headOf(parts: readonly MixturePart[]): CapacityHead {
  const capacities = parts.map(({ capacity }) => capacity);
  const phases = new Set(capacities.map(({ phase }) => phase));
  const pressures = new Set(capacities.filter(({ phase }) => phase === "g").map(({ standardPressure }) => standardPressure));
  return {
    phase: phases.has("l") ? "l" : phases.has("cr") ? "cr" : "g",
    fromLabel: highestLower(parts).fromLabel,
    toLabel: lowestUpper(parts).toLabel,
    standardPressure: pressures.size === 1 ? [...pressures][0]! : STANDARD_PRESSURE,
    onFormationScale: capacities.every(({ onFormationScale }) => onFormationScale),
    hasEntropy: capacities.every(({ hasEntropy }) => hasEntropy),
    gasConstant: parts.reduce((sum, { capacity, amount }) => sum + amount * capacity.gasConstant, 0),
  };
}

/** −Σ x R ln y over the gases, J/(mol K). Gases are told by their gas constant, which is 0 for condensed species. */
function entropyOfMixing(parts: readonly MixturePart[]): number {
  const gases = parts.filter(({ capacity }) => capacity.gasConstant > 0);
  const total = gases.reduce((sum, { amount }) => sum + amount, 0);
  return gases.reduce((sum, { capacity, amount }) => sum - amount * capacity.gasConstant * (Math.log(amount) - Math.log(total)), 0);
}

/** Brings the entropies of gases with another standard pressure to the one of the mixture: R ln(p of the part / p of the mixture). */
function pressureShift(parts: readonly MixturePart[], pressure: number): number {
  return parts.reduce(
    (sum, { capacity, amount }) => sum + amount * capacity.gasConstant * Math.log(capacity.standardPressure / pressure),
    0,
  );
}

function nameOf(capacity: Capacity): string {
  return capacity.toLabel;
}

import { REFERENCE_TEMPERATURE } from "../constants";
import { NEAR_ENOUGH } from "./anchor";
import type { Capacity } from "./capacity";
import { headOf, heldInterval } from "./extrapolate";
import { PiecewiseCapacity } from "./piecewise";

/**
 * Many fits of gases begin at 300 K, while formation values and most starts belong to 298.15 K. Such a capacity (a gas on the formation
 * scale that begins less than 2 K above) is carried down to 298.15 K with the Cp of its lower end, as its zero is; every other one comes
 * back as it is. What that leaves out, the change of Cp over the gap, is below 2 J/mol.
 */
export function reachingReference(capacity: Capacity): Capacity {
  const { from, phase, onFormationScale } = capacity;
  const isNear = from > REFERENCE_TEMPERATURE && from - REFERENCE_TEMPERATURE <= NEAR_ENOUGH;
  if (!isNear || phase !== "g" || !onFormationScale || !(capacity instanceof PiecewiseCapacity)) return capacity;
  const head = { ...headOf(capacity), fromLabel: capacity.fromLabel, toLabel: capacity.toLabel };
  return new PiecewiseCapacity(head, [heldInterval(capacity, from, REFERENCE_TEMPERATURE, from), ...capacity.intervals]);
}

/**
 * Complete products of a mixture with enough oxygen: CO2, H2O (vapour), SO2, N2, noble gases, hydrogen halides and surplus O2, by a
 * balance of atoms; and the state they reach in a closed vessel with their energy held:
 *   Σ n U(T) = U of what was put in,   P = n R T / V    n mol, U J/mol with formation, T K, V m³, P Pa
 * No dissociation: the temperature is too high by some 250 K at ratio 1, and neither T nor P is a bound on what is measured.
 */
import type { Capacity } from "../capacity/capacity";
import { temperatureAtEnergy } from "../capacity/inverse";
import { GAS_CONSTANT } from "../constants";
import { compileMixture } from "../mixture/compile";
import { printed, refuse, refuseRange } from "../refusal";
import { ROUNDING } from "./oxygen";
import type { Reactant, Substance } from "./types";

/** Product by its name in tables, mol. */
export interface ProductAmount {
  readonly name: string;
  readonly amount: number;
}

const NOBLE_GASES = ["He", "Ne", "Ar", "Kr", "Xe"];
const HALOGENS = ["F", "Cl", "Br", "I"];
const COVERED = new Set(["C", "H", "O", "N", "S", ...NOBLE_GASES, ...HALOGENS]);

/** Refuses an equivalence ratio above 1. */
export function requireLean(ratio: number): void {
  if (ratio <= 1 + ROUNDING) return;
  refuseRange(`Complete products hold up to equivalence ratio 1; at ${printed(ratio)} the oxygen does not suffice: use equilibrium`);
}

/** Atoms of each element in what was put in, mol. */
export function elementTotals(reactants: readonly Pick<Reactant, "counts" | "amount">[]): ReadonlyMap<string, number> {
  const totals = new Map<string, number>();
  for (const { counts, amount } of reactants)
    for (const [element, count] of counts) totals.set(element, (totals.get(element) ?? 0) + amount * count);
  return totals;
}

/**
 * The complete products, mol, in the order CO2, H2O, SO2, N2, noble gases, hydrogen halides, O2; those of amount 0 are left out.
 *
 * Refuses elements that are not covered, halogens beyond the hydrogen there is, and oxygen that does not suffice.
 */
export function completeProducts(reactants: readonly Reactant[]): readonly ProductAmount[] {
  const totals = elementTotals(reactants);
  const of = (element: string): number => totals.get(element) ?? 0;
  const others = [...totals.keys()].filter((element) => !COVERED.has(element));
  if (others.length > 0)
    refuse(`Complete products are known here for C, H, O, N, S, halogens and noble gases, not for ${others.join(", ")}: use equilibrium`);
  const halogens = HALOGENS.reduce((sum, element) => sum + of(element), 0);
  const water = nearNothing(of("H") - halogens, of("H")) / 2;
  if (water < 0)
    refuse(
      `Complete products bind each halogen atom to hydrogen; here are ${printed(halogens)} mol of halogen for ${printed(of("H"))} mol of hydrogen: use equilibrium`,
    );
  const surplus = surplusOxygen(of("O"), 2 * of("C") + water + 2 * of("S"));
  const amounts: [name: string, amount: number][] = [
    ["CO2", of("C")],
    ["H2O", water],
    ["SO2", of("S")],
    ["N2", of("N") / 2],
    ...NOBLE_GASES.map((gas): [string, number] => [gas, of(gas)]),
    ...HALOGENS.map((halogen): [string, number] => [`H${halogen}`, of(halogen)]),
    ["O2", surplus],
  ];
  return amounts.filter(([, amount]) => amount > 0).map(([name, amount]) => ({ name, amount }));
}

/** O2 left over, mol, from atoms there and atoms bound. */
function surplusOxygen(there: number, bound: number): number {
  const left = nearNothing(there - bound, there);
  if (left < 0)
    refuseRange(
      `Complete products bind ${printed(bound)} mol of oxygen atoms and ${printed(there)} mol are there: the oxygen does not suffice, use equilibrium`,
    );
  return left / 2;
}

/** A difference within the rounding of its larger term is nothing; the ratio itself may have been taken for 1 by as much. */
function nearNothing(difference: number, scale: number): number {
  return Math.abs(difference) <= 2 * ROUNDING * scale ? 0 : difference;
}

/** State of the products in the closed vessel. */
export interface CompleteState {
  /** K. */
  readonly temperature: number;
  /** Pa. */
  readonly pressure: number;
}

/**
 * Temperature and pressure at which the products hold this energy in this volume.
 *
 * energy: U of all that was put in, with formation, J. volume: m³.
 * Refuses products without a gas, a volume that is not above 0, and an energy beyond the range that the products share, naming its limit.
 */
export function completeRigid(
  products: readonly { readonly candidate: Substance; readonly amount: number }[],
  energy: number,
  volume: number,
): CompleteState {
  if (!(volume > 0 && volume < Infinity)) refuseRange(`Volume ${printed(volume)} m³ is not above 0`);
  const total = products.reduce((sum, { amount }) => sum + amount, 0);
  const gas = products.reduce((sum, { candidate, amount }) => sum + (candidate.capacity.phase === "g" ? amount : 0), 0);
  if (!(gas > 0)) refuse("The products hold no gas, so that they have no pressure");
  const capacity = compileMixture(products.map(({ candidate, amount }) => ({ capacity: candidate.capacity, amount: amount / total })));
  const temperature = temperatureInside(capacity, energy / total);
  return { temperature, pressure: (gas * GAS_CONSTANT * temperature) / volume };
}

function temperatureInside(capacity: Capacity, energy: number): number {
  if (energy > capacity.energy(capacity.to))
    refuseRange(`The complete products would be above ${printed(capacity.to)} K, the upper limit of ${capacity.toLabel}`);
  if (energy < capacity.energy(capacity.from))
    refuseRange(`The complete products would be below ${printed(capacity.from)} K, the lower limit of ${capacity.fromLabel}`);
  return temperatureAtEnergy(capacity, energy);
}

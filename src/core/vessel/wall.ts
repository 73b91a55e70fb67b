/**
 * What stores heat in or around a vessel, as one capacity C(T), J/K, with the heat it holds, J: a constant, a mass of a wall material, an
 * amount of a substance, or several of them together. C is the true capacity at T; heat between two temperatures is its exact integral.
 * Temperatures in K.
 */
import type { Capacity } from "../capacity/capacity";
import { printed, refuse, refuseRange } from "../refusal";
import type { HeatStore } from "./types";
import { specificHeatOf, type WallForm } from "./wall-forms";

/** The same capacity, J/K, at every temperature. Refuses a negative one. */
export function constantStore(capacity: number, label: string): HeatStore {
  if (!(capacity >= 0 && capacity < Infinity)) refuseRange(`Heat capacity ${printed(capacity)} J/K of ${label} is not 0 J/K or above`);
  return {
    label,
    from: 0,
    to: Infinity,
    fromLabel: label,
    toLabel: label,
    joints: [],
    heat: (temperature) => capacity * temperature,
    capacity: () => capacity,
  };
}

/** True if the capacity is the same at every temperature. */
export function isConstant({ from, to, joints }: HeatStore): boolean {
  return from === 0 && to === Infinity && joints.length === 0;
}

/** A mass, kg, of a wall material. `owner` names the source of the form in refusals: `en-1993-1-2 for carbon steel`. */
export function wallStore(mass: number, form: WallForm, label: string, owner: string): HeatStore {
  const { from, to, joints, capacity, heat } = specificHeatOf(form);
  const times = (of: (temperature: number) => number) => (temperature: number) => mass * of(temperature);
  return { label, from, to, fromLabel: owner, toLabel: owner, joints, heat: times(heat), capacity: times(capacity) };
}

/** An amount, mol, of a substance at constant volume: U and Cv of gases, H and Cp of solids and liquids (Cv = Cp taken). */
export function substanceStore(amount: number, capacity: Capacity, label: string): HeatStore {
  const { from, to, fromLabel, toLabel, joints } = capacity;
  return {
    label,
    from,
    to,
    fromLabel,
    toLabel,
    joints,
    heat: (temperature) => amount * capacity.energy(temperature),
    capacity: (temperature) => amount * capacity.cv(temperature),
  };
}

/** Several stores at one temperature. Refuses stores whose ranges have nothing in common. */
export function sumOf(stores: readonly HeatStore[]): HeatStore {
  if (stores.length === 1) return stores[0]!;
  const low = stores.reduce((first, second) => (second.from > first.from ? second : first));
  const high = stores.reduce((first, second) => (second.to < first.to ? second : first));
  if (low.from > high.to)
    refuse(
      `${low.fromLabel} begins at ${printed(low.from)} K and ${high.toLabel} ends at ${printed(high.to)} K: they have no temperature in common`,
    );
  const joints = [...new Set(stores.flatMap((store) => store.joints))].filter((joint) => joint > low.from && joint < high.to);
  const total = (of: (store: HeatStore) => number) => stores.reduce((sum, store) => sum + of(store), 0);
  return {
    label: stores.map(({ label }) => label).join(" + "),
    from: low.from,
    to: high.to,
    fromLabel: low.fromLabel,
    toLabel: high.toLabel,
    joints: joints.sort((a, b) => a - b),
    heat: (temperature) => total((store) => store.heat(temperature)),
    capacity: (temperature) => total((store) => store.capacity(temperature)),
  };
}

/** Refuses a temperature, K, outside the range of a store: "Temperature 1500 K is above 1473.15 K, the upper limit of …". */
export function requireInside(store: HeatStore, temperature: number, name = "Temperature"): void {
  if (temperature >= store.from && temperature <= store.to) return;
  const below = temperature < store.from;
  const [limit, whose] = below ? [store.from, `the lower limit of ${store.fromLabel}`] : [store.to, `the upper limit of ${store.toLabel}`];
  const print = printed(temperature) === printed(limit) ? String : printed;
  refuseRange(`${name} ${print(temperature)} K is ${below ? "below" : "above"} ${print(limit)} K, ${whose}`);
}

/** Heat capacity of a store, J/K; refused outside its range. */
export function capacityAt(store: HeatStore, temperature: number): number {
  requireInside(store, temperature);
  return store.capacity(temperature);
}

/** Heat, J, that takes a store from one temperature to another, K; negative when it cools. Refused outside its range. */
export function heatBetween(store: HeatStore, from: number, to: number): number {
  requireInside(store, from);
  requireInside(store, to);
  return store.heat(to) - store.heat(from);
}

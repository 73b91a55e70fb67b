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
  return { label, sources: [owner], from, to, fromLabel: owner, toLabel: owner, joints, heat: times(heat), capacity: times(capacity) };
}

/** An amount, mol, of a substance at constant volume: U and Cv of gases, H and Cp of solids and liquids (Cv = Cp taken). */
export function substanceStore(amount: number, capacity: Capacity, label: string): HeatStore {
  const { from, to, fromLabel, toLabel, joints } = capacity;
  return {
    label,
    sources: [...new Set([fromLabel, toLabel])],
    from,
    to,
    fromLabel,
    toLabel,
    joints,
    heat: (temperature) => amount * capacity.energy(temperature),
    capacity: (temperature) => amount * capacity.cv(temperature),
  };
}

/** A store on a part of its range, K, with the source that holds it there. */
export function within(store: HeatStore, from: number, to: number, owner: string): HeatStore {
  const inside = (of: (temperature: number) => number) => (temperature: number) =>
    temperature >= from && temperature <= to ? of(temperature) : NaN;
  return {
    label: store.label,
    sources: store.sources,
    from: Math.max(from, store.from),
    to: Math.min(to, store.to),
    fromLabel: from > store.from ? owner : store.fromLabel,
    toLabel: to < store.to ? owner : store.toLabel,
    joints: store.joints.filter((joint) => joint > from && joint < to),
    heat: inside((temperature) => store.heat(temperature)),
    capacity: inside((temperature) => store.capacity(temperature)),
  };
}

/** A store whose lowest capacity is held down to a temperature below its range, K; the store itself if it reaches that far. */
export function heldDownTo(store: HeatStore, from: number): HeatStore {
  if (store.from <= from) return store;
  const lowest = store.capacity(store.from);
  const least = store.heat(store.from);
  const isHeld = (temperature: number) => temperature >= from && temperature < store.from;
  return {
    ...store,
    from,
    fromLabel: `the capacity held below ${printed(store.from)} K of ${store.fromLabel}`,
    joints: [store.from, ...store.joints],
    heldBelow: store.from,
    heat: (temperature) => (isHeld(temperature) ? least - lowest * (store.from - temperature) : store.heat(temperature)),
    capacity: (temperature) => (isHeld(temperature) ? lowest : store.capacity(temperature)),
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
    sources: [...new Set(stores.flatMap(({ sources = [] }) => sources))],
    from: low.from,
    to: high.to,
    fromLabel: low.fromLabel,
    toLabel: high.toLabel,
    joints: joints.sort((a, b) => a - b),
    heldBelow: highest(stores.flatMap(({ heldBelow }) => heldBelow ?? [])),
    heat: (temperature) => total((store) => store.heat(temperature)),
    capacity: (temperature) => total((store) => store.capacity(temperature)),
  };
}

function highest(values: readonly number[]): number | undefined {
  return values.length === 0 ? undefined : Math.max(...values);
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

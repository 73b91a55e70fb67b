/**
 * The numbers of the heat-capacity chart: one curve per set over the set's own range, the classical limits, and the reading
 * at one temperature. Gases are drawn as Cv, condensed species as Cp. All values in J/(mol K), temperatures in K.
 * A curve is never drawn outside the range of its set.
 */
import type { Capacity } from "../core/capacity/capacity";
import { type Span, widened } from "./scale";

/** One set of coefficients as the chart needs it. */
export interface Source {
  /** Set id. */
  readonly set: string;
  readonly capacity: Capacity;
}

export interface Curve {
  readonly set: string;
  readonly temperatures: readonly number[];
  readonly values: readonly number[];
}

/** A horizontal line. */
export interface Limit {
  readonly label: string;
  readonly value: number;
}

export interface Chart {
  /** Name and unit of the vertical axis. */
  readonly axis: string;
  readonly curves: readonly Curve[];
  readonly limits: readonly Limit[];
  readonly temperatures: Span;
  readonly values: Span;
}

/** What one set says at one temperature. */
export interface Reading {
  readonly set: string;
  readonly from: number;
  readonly to: number;
  /** null outside the set's range. */
  readonly value: number | null;
  /** Difference from the first set in percent of the first; null for the first itself or where one of the two is outside. */
  readonly differencePercent: number | null;
}

const STEPS = 160;

/** The temperatures all sets cover together, cut at `top` if it is given and leaves anything. */
export function coveredSpan(sources: readonly Source[], top = Infinity): Span {
  const low = Math.min(...sources.map((source) => source.capacity.from));
  const high = Math.max(...sources.map((source) => source.capacity.to));
  return [low, top > low ? Math.min(high, top) : high];
}

/** Curves and axes for a window of temperatures. */
export function chartOf(sources: readonly Source[], limits: readonly Limit[], window: Span): Chart {
  const curves = sources.map((source) => curveOf(source, window));
  return framed(`${quantityOf(sources)}, J/(mol K)`, curves, limits, window);
}

/** Differences of all sets from the first in percent, each over the range it shares with the first; the first itself is the line at zero. */
export function differenceChart(sources: readonly Source[], window: Span): Chart {
  const [first] = sources;
  if (!first) return framed("difference, %", [], [], window);
  const shared: Span = [Math.max(first.capacity.from, window[0]), Math.min(first.capacity.to, window[1])];
  const curves = sources.map((source) => {
    const { set, temperatures } = curveOf(source, shared);
    return { set, temperatures, values: temperatures.map((temperature) => percentFrom(first, source, temperature)) };
  });
  return framed(`difference from ${first.set}, %`, curves, [], window);
}

function percentFrom(first: Source, other: Source, temperature: number): number {
  return (valueAt(other.capacity, temperature) / valueAt(first.capacity, temperature) - 1) * 100;
}

function framed(axis: string, drawn: readonly Curve[], limits: readonly Limit[], temperatures: Span): Chart {
  const curves = drawn.filter((curve) => curve.values.length > 0);
  const all = [...curves.flatMap((curve) => curve.values), ...limits.map((limit) => limit.value)];
  return { axis, curves, limits, temperatures, values: all.length === 0 ? [-1, 1] : widened([Math.min(...all), Math.max(...all)], 5) };
}

/** Cv where every set is of a gas, else Cp. */
export function quantityOf(sources: readonly Source[]): "Cv" | "Cp" {
  return sources.every((source) => source.capacity.phase === "g") ? "Cv" : "Cp";
}

/** One set sampled evenly over the part of its range inside the window; a joint is met from both sides, so that a step shows as a step. */
export function curveOf(source: Source, window: Span): Curve {
  const { capacity, set } = source;
  const from = Math.max(capacity.from, window[0]);
  const to = Math.min(capacity.to, window[1]);
  if (!(to > from)) return { set, temperatures: [], values: [] };
  const temperatures = Array.from({ length: STEPS + 1 }, (_, i) => (i === STEPS ? to : from + ((to - from) * i) / STEPS));
  for (const joint of capacity.joints) if (joint > from && joint < to) temperatures.push(joint * (1 - 1e-9), joint, joint * (1 + 1e-9));
  const sorted = [...new Set(temperatures)].sort((a, b) => a - b);
  const kept = sorted.filter((temperature) => Number.isFinite(valueAt(capacity, temperature)));
  return { set, temperatures: kept, values: kept.map((temperature) => valueAt(capacity, temperature)) };
}

/** What every set says at a temperature, in the order of the sets. */
export function readingsAt(sources: readonly Source[], temperature: number): Reading[] {
  const values = sources.map((source) => {
    const value = valueAt(source.capacity, temperature);
    return Number.isFinite(value) ? value : null;
  });
  const first = values[0] ?? null;
  return sources.map(({ set, capacity }, i) => {
    const value = values[i] ?? null;
    const differencePercent = i === 0 || value === null || first === null ? null : (value / first - 1) * 100;
    return { set, from: capacity.from, to: capacity.to, value, differencePercent };
  });
}

/** Round temperatures for the table of values: 298.15 K and whole hundreds, thinned to at most `most` rows. */
export function tableTemperatures([low, high]: Span, most = 14): number[] {
  const steps = [10, 20, 50, 100, 200, 500, 1000, 2000, 5000];
  const step = steps.find((size) => (high - low) / size <= most - 2) ?? 10000;
  const rows: number[] = [];
  for (let i = Math.ceil(low / step); i * step <= high; i += 1) rows.push(i * step);
  if (low <= 298.15 && 298.15 <= high) rows.push(298.15);
  return rows.sort((a, b) => a - b);
}

function valueAt(capacity: Capacity, temperature: number): number {
  return capacity.phase === "g" ? capacity.cv(temperature) : capacity.cp(temperature);
}

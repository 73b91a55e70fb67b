/**
 * Pressure rise of a vessel full of liquid, without any gas:
 *
 *   dP/dT = (β − β_wall)/(κ + D/(t E))
 *
 * β expansion of the liquid and β_wall volumetric expansion of the wall, 1/K; κ isothermal compressibility of the liquid, 1/Pa; D/t
 * diameter to thickness of a thin cylinder, whose volume grows by (5/4 − ν) D/(t E) for each Pa with closed ends, taken as D/(t E) (ν 0.25;
 * for steel of ν 0.3 that is 5 % more yielding than it is); E modulus of the wall, Pa. With β or κ given at several temperatures, straight lines between them, it is integrated from T1 to T2. κ at the starting
 * pressure is used throughout.
 */
import { integrateAdaptively } from "../numeric/adaptive";
import { printed, refuse, refuseRange } from "../refusal";

/** A property of the liquid by temperature, K. */
export interface LiquidProperty {
  readonly from: number;
  readonly to: number;
  /** Temperatures of its points, K; none for one value. */
  readonly knots: readonly number[];
  at(temperature: number): number;
}

/** The same value at every temperature. */
export function constantProperty(value: number): LiquidProperty {
  return { from: 0, to: Infinity, knots: [], at: () => value };
}

/** Straight lines between points [K, value]. Refuses fewer than two points, and temperatures that do not rise. `name` follows "the". */
export function propertyLine(points: readonly (readonly [temperature: number, value: number])[], name: string): LiquidProperty {
  if (points.length < 2) refuse(`The ${name} by temperature needs 2 points or more, not ${points.length}`);
  const knots = points.map(([temperature]) => temperature);
  for (const [index, knot] of knots.entries())
    if (index > 0 && !(knot > knots[index - 1]!))
      refuse(`The temperatures of the ${name} must rise: ${printed(knot)} K follows ${printed(knots[index - 1]!)} K`);
  return { from: knots[0]!, to: knots[knots.length - 1]!, knots, at: (temperature) => between(points, temperature) };
}

function between(points: readonly (readonly [number, number])[], temperature: number): number {
  const above = Math.max(
    1,
    points.findIndex(([knot]) => temperature <= knot),
  );
  const [[low, first], [high, last]] = [points[above - 1]!, points[above]!];
  return first + ((temperature - low) / (high - low)) * (last - first);
}

export interface LiquidFull {
  /** β, 1/K. */
  readonly expansion: LiquidProperty;
  /** κ, 1/Pa. */
  readonly compressibility: LiquidProperty;
  /** Volumetric, 1/K. */
  readonly wallExpansion: number;
  /** D/(t E), 1/Pa; 0 for a rigid wall. */
  readonly yielding: number;
}

/** Change of pressure, Pa, from T1 to T2, K; negative when it falls. Refuses temperatures outside the points of a property. */
export function liquidFullRise(vessel: LiquidFull, T1: number, T2: number): number {
  for (const [name, property] of [
    ["expansion", vessel.expansion],
    ["compressibility", vessel.compressibility],
  ] as const) {
    requireInside(property, T1, `Temperature T1 ${printed(T1)} K`, name);
    requireInside(property, T2, `Temperature T2 ${printed(T2)} K`, name);
  }
  const slope = (temperature: number) => slopeAt(vessel, temperature);
  const [low, high] = [Math.min(T1, T2), Math.max(T1, T2)];
  const knots = [...vessel.expansion.knots, ...vessel.compressibility.knots].filter((knot) => knot > low && knot < high);
  if (vessel.expansion.knots.length === 0 && vessel.compressibility.knots.length === 0) return slope(T1) * (T2 - T1);
  const stops = [low, ...knots.sort((a, b) => a - b), high];
  const rise = stops.slice(1).reduce((sum, stop, index) => sum + integrateAdaptively(slope, stops[index]!, stop), 0);
  return T1 <= T2 ? rise : -rise;
}

/** dP/dT, Pa/K. */
function slopeAt({ expansion, compressibility, wallExpansion, yielding }: LiquidFull, temperature: number): number {
  return (expansion.at(temperature) - wallExpansion) / (compressibility.at(temperature) + yielding);
}

function requireInside({ from, to }: LiquidProperty, temperature: number, what: string, name: string): void {
  if (temperature >= from && temperature <= to) return;
  refuseRange(`${what} is outside ${printed(from)} K to ${printed(to)} K, where the ${name} is given`);
}

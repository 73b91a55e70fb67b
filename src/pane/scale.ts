/** Axes: round tick values and the straight map from a value to a place on the drawing. */

/** Lower and upper end of an axis. */
export type Span = readonly [low: number, high: number];

/**
 * Tick values at a step of 1, 2 or 5 times a power of ten that lie inside the span; about `wanted` of them.
 * An empty or reversed span gives its lower end alone.
 */
export function ticks([low, high]: Span, wanted: number): number[] {
  if (!(high > low)) return [low];
  const step = roundStep((high - low) / Math.max(1, wanted));
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  const values: number[] = [];
  for (let i = Math.ceil(low / step - 1e-9); i * step <= high + step * 1e-9; i += 1) values.push(Number((i * step).toFixed(decimals)));
  return values;
}

/** The step of 1, 2 or 5 times a power of ten next above `rough`. */
export function roundStep(rough: number): number {
  const power = 10 ** Math.floor(Math.log10(rough));
  const lead = rough / power;
  const round = lead <= 1.0000001 ? 1 : lead <= 2 ? 2 : lead <= 5 ? 5 : 10;
  return round * power;
}

/** The span widened to whole ticks, so that no curve touches the frame. */
export function widened([low, high]: Span, wanted: number): Span {
  if (!(high > low)) return [low - 1, high + 1];
  const step = roundStep((high - low) / Math.max(1, wanted));
  return [Math.floor(low / step) * step, Math.ceil(high / step) * step];
}

/** The map from a value in `domain` to a place in `range`; the ends meet exactly. */
export function linear(domain: Span, range: Span): (value: number) => number {
  const slope = (range[1] - range[0]) / (domain[1] - domain[0]);
  return (value) => range[0] + (value - domain[0]) * slope;
}

/**
 * Heat into a vessel at constant volume, contents and wall at one temperature:
 *
 *   Q = U(T2) − U(T1) + H wall(T2) − H wall(T1)
 *
 * and the temperature at which a given heat has been taken up. J, K.
 */
import { newtonInBracket } from "../numeric/root";
import { printed, Refusal } from "../refusal";
import type { Content, ContentState, HeatStore } from "./types";
import { heatBetween } from "./wall";

export interface Reached<State extends ContentState> {
  readonly before: State;
  readonly after: State;
  /** Heat into the contents, J. */
  readonly contents: number;
  /** Heat into the wall, J; 0 without one. */
  readonly wall: number;
  /** Both, J. */
  readonly heat: number;
}

/** What it takes to bring a vessel from T1 to T2. Refuses temperatures outside the range of contents or wall. */
export function reach<State extends ContentState>(
  content: Content<State>,
  wall: HeatStore | undefined,
  from: number,
  to: number,
): Reached<State> {
  const [before, after] = [content.at(from), content.at(to)];
  const contents = from === to ? 0 : after.energy - before.energy;
  const taken = wall ? heatBetween(wall, from, to) : 0;
  return { before, after, contents, wall: taken, heat: contents + taken };
}

/** Contents that a search for a temperature may ask on its way, without the phases of a mixture being tested. */
export interface Absorbing extends Content {
  trial(temperature: number): { readonly energy: number; readonly heatCapacity: number };
}

/**
 * The temperature, K, of a vessel that has taken up a heat (negative: given off) from T1, within 1e-10 K. No heat is no change.
 * Refuses a heat that leads beyond the range of contents or wall, with the heat that leads to its end.
 */
export function temperatureAfter(content: Absorbing, wall: HeatStore | undefined, from: number, heat: number): number {
  if (heat === 0) return from;
  const initial = content.at(from).energy;
  const needed = (temperature: number) => content.trial(temperature).energy - initial + (wall ? heatBetween(wall, from, temperature) : 0);
  const range = rangeOf(content, wall);
  const [end, label] = heat > 0 ? [range.to, range.toLabel] : [range.from, range.fromLabel];
  const most = needed(end);
  if (heat > 0 ? heat > most : heat < most) throw beyond(heat, most, end, label);
  const surplus = (temperature: number) => ({
    value: needed(temperature) - heat,
    slope: content.trial(temperature).heatCapacity + (wall ? wall.capacity(temperature) : 0),
  });
  const [low, high] = heat > 0 ? [from, end] : [end, from];
  const start = from + heat / surplus(from).slope;
  return newtonInBracket(surplus, low, high, start, { tolerance: 1e-10, what: "The temperature after the heat", unit: " K" });
}

function rangeOf(content: Absorbing, wall: HeatStore | undefined): { from: number; to: number; fromLabel: string; toLabel: string } {
  if (wall === undefined) return content;
  const [lower, upper] = [wall.from > content.from ? wall : content, wall.to < content.to ? wall : content];
  return { from: lower.from, fromLabel: lower.fromLabel, to: upper.to, toLabel: upper.toLabel };
}

function beyond(heat: number, limit: number, temperature: number, label: string): Refusal {
  const [side, which] = heat > 0 ? ["at most", "upper"] : ["at least", "lower"];
  return new Refusal(
    "range",
    `A heat of ${printed(heat)} J leads beyond ${printed(temperature)} K, the ${which} limit of ${label}; from this start it can be ${side} ${printed(limit)} J`,
  );
}

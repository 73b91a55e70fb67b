/**
 * Warming and cooling of a vessel with a constant power and a loss that is proportional to its excess over the surroundings:
 *
 *   C(T) dT/dt = P − UA (T − Ta)        T_max = Ta + P/UA
 *
 * C J/K, P W, UA W/K, Ta K, t s. With dx = dT/(P − UA (T − Ta)), K/W,
 *   T(x) = T1 + (P − UA (T1 − Ta)) (1 − exp(−UA x))/UA,   t = ∫ C(T(x)) dx
 * so the integrand is smooth up to T_max. Constant C: t = C x, that is (C/UA) ln[(T_max − T1)/(T_max − T2)], or C (T2 − T1)/P without
 * loss. C(T): adaptive quadrature between the joints, to better than 1e-10; the heat of a step in the stored heat at a joint (melting,
 * a transition) is taken up there, at the net power of that temperature. One temperature for everything that is warmed.
 */
import { integrateAdaptively } from "../numeric/adaptive";
import { newtonInBracket } from "../numeric/root";
import { printed, refuse, refuseRange } from "../refusal";
import type { HeatStore } from "./types";
import { isConstant, requireInside } from "./wall";

export interface Warming {
  /** W, not negative. */
  readonly power: number;
  /** UA, W/K, not negative. */
  readonly loss: number;
  /** Temperature of the surroundings, K. */
  readonly ambient: number;
}

/** Time, s, from one temperature to another, K. Refuses what is outside the range of the store, and what is not reached, with T_max. */
export function warmUpTime(store: HeatStore, warming: Warming, from: number, to: number): number {
  requireWarming(warming);
  requireInside(store, from, "Temperature from");
  requireInside(store, to, "Temperature to");
  if (from === to) return 0;
  const course = new Course(warming, from);
  if (!course.reaches(to)) refuseReach(warming, from, to);
  if (isConstant(store)) return store.capacity(from) * course.placeOf(to);
  const rising = to > from;
  let elapsed = 0;
  let place = 0;
  for (const joint of jointsBetween(store, from, to)) {
    const next = course.placeOf(joint);
    elapsed += duration(store, course, place, next) + stepDuration(store, course, joint, rising);
    place = next;
  }
  return elapsed + duration(store, course, place, course.placeOf(to));
}

/** Temperature, K, after a time, s. Refuses a time at which the store has left its range, with the time at which it does. */
export function warmUpTemperature(store: HeatStore, warming: Warming, from: number, time: number): number {
  requireWarming(warming);
  requireInside(store, from, "Temperature from");
  if (!(time >= 0 && time < Infinity)) refuseRange(`Time ${printed(time)} s is not 0 s or above`);
  const course = new Course(warming, from);
  if (time === 0 || course.net === 0) return from;
  if (isConstant(store)) return course.temperatureAt(time / store.capacity(from));
  const rising = course.net > 0;
  const end = rising ? store.to : store.from;
  let left = time;
  let place = 0;
  for (const stop of [...jointsBetween(store, from, end), end]) {
    const next = course.reaches(stop) ? course.placeOf(stop) : Infinity;
    const leg = next === Infinity ? Infinity : duration(store, course, place, next);
    if (left < leg) return course.temperatureAt(placeAfter(store, course, place, next, left));
    left -= leg;
    if (stop !== end) left -= stepDuration(store, course, stop, rising);
    if (left <= 0) return stop;
    place = next;
  }
  return refuseTime(store, time, time - left, rising);
}

/** A loss that takes less than this share of the net power changes no digit. */
const NO_LOSS = 1e-17;

/** Temperatures along x from one start. */
class Course {
  /** Net power at the start, W. */
  readonly net: number;

  constructor(
    private readonly warming: Warming,
    private readonly from: number,
  ) {
    this.net = this.netAt(from);
  }

  netAt(temperature: number): number {
    const { power, loss, ambient } = this.warming;
    return power - loss * (temperature - ambient);
  }

  /** Whether the course passes a temperature. */
  reaches(temperature: number): boolean {
    const share = (temperature - this.from) / this.net;
    return share >= 0 && this.warming.loss * share < 1;
  }

  /** x, K/W, of a temperature that is reached. */
  placeOf(temperature: number): number {
    const share = (temperature - this.from) / this.net;
    const lost = this.warming.loss * share;
    return lost < NO_LOSS ? share : (share * -Math.log1p(-lost)) / lost;
  }

  temperatureAt(place: number): number {
    const { loss } = this.warming;
    const lost = loss * place;
    return this.from + this.net * (lost < NO_LOSS ? place : -Math.expm1(-lost) / loss);
  }

  get loss(): number {
    return this.warming.loss;
  }
}

/** Joints passed on the way, in order; heat at a joint is that of its lower side, so a step at the lower end counts. */
function jointsBetween({ joints }: HeatStore, from: number, to: number): number[] {
  const [low, high] = [Math.min(from, to), Math.max(from, to)];
  const passed = joints.filter((joint) => joint >= low && joint < high);
  return from < to ? passed : passed.reverse();
}

/** ∫ C dx between two places of one leg, s. */
function duration(store: HeatStore, course: Course, start: number, end: number): number {
  if (start === end) return 0;
  const ends = [course.temperatureAt(start), course.temperatureAt(end)];
  const [low, high] = [Math.max(Math.min(...ends), store.from), Math.min(Math.max(...ends), store.to)];
  const capacity = (place: number) => store.capacity(Math.min(Math.max(course.temperatureAt(place), low), high));
  return integrateAdaptively(capacity, start, end);
}

/** A step in the heat of less than this many kelvins' worth is rounding. */
const ROUNDING = 1e-9;

/** Time, s, in which the step of the stored heat at a joint is taken up or given off. */
function stepDuration(store: HeatStore, course: Course, joint: number, rising: boolean): number {
  const step = store.heat(joint * (1 + Number.EPSILON)) - store.heat(joint);
  if (!(Math.abs(step) > ROUNDING * store.capacity(joint))) return 0;
  return ((rising ? 1 : -1) * step) / course.netAt(joint);
}

/** The place in a leg at which a time, s, has passed since its start; a leg without end goes on towards T_max. */
function placeAfter(store: HeatStore, course: Course, start: number, end: number, time: number): number {
  let low = start;
  let left = time;
  if (end === Infinity) {
    for (let width = 1 / course.loss; ; width *= 2) {
      const panel = duration(store, course, low, low + width);
      if (panel >= left) {
        end = low + width;
        break;
      }
      left -= panel;
      low += width;
    }
  }
  const capacity = (place: number) => store.capacity(Math.min(Math.max(course.temperatureAt(place), store.from), store.to));
  let known = low;
  let value = -left;
  return newtonInBracket(
    (place) => {
      value += duration(store, course, known, place);
      known = place;
      return { value, slope: capacity(place) };
    },
    low,
    end,
    low + left / capacity((low + end) / 2),
    { tolerance: 1e-9 * (end - low), what: "The temperature after this time" },
  );
}

function requireWarming({ power, loss, ambient }: Warming): void {
  if (!(power >= 0 && power < Infinity)) refuseRange(`Power ${printed(power)} W is negative; 0 W lets a vessel cool`);
  if (!(loss >= 0 && loss < Infinity)) refuseRange(`Loss ${printed(loss)} W/K is negative; 0 W/K is a vessel without loss`);
  if (!(ambient > 0 && ambient < Infinity)) refuseRange(`Ambient temperature ${printed(ambient)} K is not above absolute zero, 0 K`);
}

function refuseReach({ power, loss, ambient }: Warming, from: number, to: number): never {
  const not = `Temperature to ${printed(to)} K is not reached from ${printed(from)} K`;
  if (loss > 0)
    refuseRange(
      `${not}: with ${printed(power)} W, and a loss of ${printed(loss)} W/K to ${printed(ambient)} K, the temperature tends to T_max = ${printed(ambient + power / loss)} K`,
    );
  if (power > 0) refuseRange(`${not}: with ${printed(power)} W and no loss the temperature only rises, without a T_max`);
  return refuse(`${not}: without power and loss the temperature stays as it is`);
}

function refuseTime(store: HeatStore, time: number, known: number, rising: boolean): never {
  const [limit, whose] = rising ? [store.to, `the upper limit of ${store.toLabel}`] : [store.from, `the lower limit of ${store.fromLabel}`];
  return refuseRange(
    `Time ${printed(time)} s is too long: after ${printed(known)} s the temperature reaches ${printed(limit)} K, ${whose}`,
  );
}

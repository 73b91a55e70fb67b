/**
 * What a run should make its reader look at, each as a sentence with the value and its limit. The limits are common practice of
 * calorimetry with a vessel in 2 to 3 kg of water (from memory); those on noise are set so that a good but noisy run is not flagged.
 */
import { printed } from "../../refusal";
import { studentT } from "../../statistics/distributions";
import { upperQuantile } from "../../statistics/special";
import { isAbove, printedAbove } from "../../statistics/above";
import type { RiseAnalysis } from "./analysis";
import { STEADY } from "./end";
import { holdsReadings } from "./evidence";
import { quietSentence } from "./firing";
import { Halves, halvesOf, LEAST_FOR_HALVES } from "./halves";
import { SAME_TIME } from "./grid";
import { Outlier, outlierOf } from "./outlier";
import { driftsDiffer } from "./uncertainty";

const LEAST_READINGS = 5;
/** min */
const SHORTEST_PERIOD = 5;
/** K, and in steps of the resolution. */
const SCATTER = { kelvin: 0.002, steps: 3 };
/** Two-sided level at which two slopes differ. */
const SLOPES_DIFFER = 0.01;
/** Shares of the rise. */
const COARSE_RESOLUTION = 0.0005;
const METHODS_DISAGREE = 0.001;
const COARSE_TRAPEZOID = 0.0001;
const MOST_UNFINISHED = 0.0002;
const NEGLIGIBLE = 0.0001;
/** An outlier is farther off than these steps of the resolution. */
const OUTLIER_STEPS = 2;
/** K, °C, min. */
const USUAL_RISE = { least: 1.5, most: 3.5 };
const USUAL_TEMPERATURE = { least: 5, most: 50 };
const KELVIN = { least: 250, most: 330 };
const LONG_INTERVAL = 0.5;

/** The warnings of an analysed run; none for a good one. */
export function warningsOf(run: RiseAnalysis): readonly string[] {
  return [
    ...temperatures(run),
    ...periodLengths(run),
    ...firing(run),
    ...steadiness(run),
    ...scatter(run),
    ...outliers(run),
    ...resolution(run),
    ...mainPeriod(run),
    ...methods(run),
    ...usualRise(run),
  ];
}

function temperatures({ temperatures: readings, grid }: RiseAnalysis): string[] {
  const used = readings.subarray(0, grid.count);
  const lowest = used.reduce((least, here) => Math.min(least, here));
  const highest = used.reduce((most, here) => Math.max(most, here));
  const { least, most } = USUAL_TEMPERATURE;
  if (lowest >= least && highest <= most) return [];
  const words = `Temperatures from ${printed(lowest)} °C to ${printed(highest)} °C are outside ${least} °C to ${most} °C`;
  if (lowest >= KELVIN.least && highest <= KELVIN.most) return [`${words}: they look like kelvins; the rise is the same`];
  return [`${words}: if they are degrees Fahrenheit, the rise is 1.8 times too large`];
}

function periodLengths({ grid: { times, count, lastFore, firstAfter } }: RiseAnalysis): string[] {
  const periods = [
    { name: "fore-period", readings: lastFore + 1, length: times[lastFore]! - times[0]! },
    { name: "after-period", readings: count - firstAfter, length: times[count - 1]! - times[firstAfter]! },
  ];
  return periods.flatMap(({ name, readings, length }) => [
    ...(readings < LEAST_READINGS ? [`The ${name} holds ${readings} readings, fewer than ${LEAST_READINGS}`] : []),
    ...(length < SHORTEST_PERIOD - 1e-6 ? [`The ${name} lasts ${printed(length)} min, less than ${SHORTEST_PERIOD} min`] : []),
  ]);
}

function firing({ quiet, hidden }: RiseAnalysis): string[] {
  const early = quietSentence(quiet);
  return [
    ...(quiet > 0 ? [early[0]!.toUpperCase() + early.slice(1)] : []),
    ...(hidden > 0
      ? [
          `The first step after firing is too steep: carried back, the readings that follow let the rise begin ${brief(hidden)} min before firing; ` +
            "check the firing time",
        ]
      : []),
  ];
}

/** The halves of both periods, judged by their common scatter at Student's t of 99 %, and by 0.0005 K/min. */
function steadiness({ grid, temperatures: readings, resolution: step }: RiseAnalysis): string[] {
  const { times, count, lastFore, firstAfter } = grid;
  const periods = [
    { name: "before firing", from: 0, to: lastFore },
    { name: "after the main period", from: firstAfter, to: count - 1 },
  ].filter(({ from, to }) => to - from + 1 >= LEAST_FOR_HALVES);
  const halves = periods.map(({ from, to }) => halvesOf(times, readings, from, to));
  const degrees = total(halves, (each) => each.degrees);
  const spread = Math.max(Math.sqrt(total(halves, (each) => each.squares) / degrees), step / Math.sqrt(12));
  return halves.flatMap(({ difference, leverage }, index) => {
    if (Math.abs(difference) <= STEADY) return [];
    const limit = Math.max(STEADY, upperQuantile(studentT(degrees), SLOPES_DIFFER / 2) * spread * leverage);
    if (Math.abs(difference) <= limit) return [];
    return [
      `The drift ${periods[index]!.name} is not steady: its second half is ${brief(Math.abs(difference))} K/min ${difference > 0 ? "above" : "below"} its first, ` +
        `more than ${brief(limit)} K/min`,
    ];
  });
}

function total(halves: readonly Halves[], of: (each: Halves) => number): number {
  return halves.reduce((sum, each) => sum + of(each), 0);
}

function scatter({ fore, after, resolution: step }: RiseAnalysis): string[] {
  const limit = Math.max(SCATTER.kelvin, SCATTER.steps * step);
  return [
    { name: "before firing", line: fore },
    { name: "after the main period", line: after },
  ]
    .filter(({ line }) => line.residual > limit)
    .map(({ name, line }) => `Readings ${name} scatter by ${brief(line.residual)} K about their line, more than ${brief(limit)} K`);
}

function outliers({ grid, temperatures: readings, fore, after, resolution: step, rise }: RiseAnalysis): string[] {
  const { times, count, lastFore, firstAfter } = grid;
  const negligible = Math.max(OUTLIER_STEPS * step, NEGLIGIBLE * rise);
  const sentence = (period: string, found: Outlier | undefined, verdict: (found: Outlier) => string) =>
    found === undefined
      ? []
      : [
          `The reading ${printed(readings[found.index]!)} in row ${found.index + 1} of the readings lies ${brief(Math.abs(found.residual))} K ` +
            `${found.residual > 0 ? "above" : "below"} the line of the ${period}: ${verdict(found)}`,
        ];
  const outlier = ({ statistic, critical }: Outlier) =>
    `an outlier by Grubbs' test at 1 % (${printedAbove(statistic, Number(brief(critical, 3)), 3)}, critical ${brief(critical, 3)})`;
  const late = (found: Outlier) =>
    found.residual < 0 && found.index === firstAfter ? "heat still came at the end of the main period: give a later end" : outlier(found);
  return [
    ...sentence("fore-period", outlierOf(times, readings, [0, lastFore], fore, negligible), outlier),
    ...sentence("after-period", outlierOf(times, readings, [firstAfter, count - 1], after, negligible), late),
  ];
}

function resolution({ resolution: step, rise }: RiseAnalysis): string[] {
  if (step <= COARSE_RESOLUTION * rise) return [];
  return [
    `Readings to ${step} K: resolution alone is ±${brief((step / rise) * 100, 1)} % of the rise, more than ${COARSE_RESOLUTION * 100} %`,
  ];
}

function mainPeriod(run: RiseAnalysis): string[] {
  const { grid, uncertainty, rise } = run;
  const lack = (uncertainty.stillToCome.best / rise) * 100;
  const most = MOST_UNFINISHED * 100;
  return [
    ...(holdsReadings(grid) ? [] : ["The main period holds no readings: whether heat still came at its end is not known"]),
    ...(isAbove(lack, most)
      ? [unfinished(run, `${printedAbove(lack, most)} %`, `more than ${most} %`)]
      : grid.duration < SHORTEST_PERIOD - SAME_TIME
        ? [`The main period lasts ${printedBelow(grid.duration, SHORTEST_PERIOD, 6)} min, less than ${SHORTEST_PERIOD} min`]
        : []),
  ];
}

/** The sentence on a rise that is too low, by what shows it. */
function unfinished({ uncertainty, response }: RiseAnalysis, lack: string, limit: string): string {
  switch (uncertainty.stillToCome.by) {
    case "bend":
      return `The after-period bends: heat still comes, and the rise may be too low by at least about ${lack}, ${limit}; record longer and end the main period later`;
    case "late":
      return `At least about ${lack} of the rise was still to come at the end of the main period, ${limit}: the last of the heat comes slowly; end it later`;
    case "response":
      return `The main period is too short: by its 63 % time of ${brief(response!)} min, at least about ${lack} of the rise was still to come at its end, ${limit}; end it later`;
  }
}

function methods(run: RiseAnalysis): string[] {
  const { method, drifts, comparison, rise, constant, uncertainty, grid } = run;
  if (method === "adiabatic") {
    const apart = Math.abs(drifts.after - drifts.before);
    return apart > STEADY && driftsDiffer(run)
      ? [`The drifts before and after differ by ${brief(apart)} K/min, more than ${STEADY} K/min: the jacket did not follow`]
      : [];
  }
  const apart = Math.abs(comparison.regnaultPfaundler! - comparison.dickinson!) / rise;
  const step = grid.times[grid.lastFore + 1]! - grid.fire;
  return [
    ...(constant <= 0
      ? [`The cooling constant is ${brief(constant)} per min, not above 0: the drift after is not below the drift before`]
      : []),
    ...(apart > METHODS_DISAGREE
      ? [
          `Regnault-Pfaundler and Dickinson differ by ${brief(apart * 100)} %, more than ${METHODS_DISAGREE * 100} %: check the firing time and the periods`,
        ]
      : []),
    ...(method === "regnault-pfaundler" && step > LONG_INTERVAL && uncertainty.trapezoid > COARSE_TRAPEZOID * rise
      ? [
          `The first interval after firing lasts ${printed(step)} min, more than ${LONG_INTERVAL} min, and the trapezoids may be off by ` +
            `${brief((uncertainty.trapezoid / rise) * 100)} % of the rise: read every 30 s or faster, or see the refined value`,
        ]
      : []),
  ];
}

function usualRise({ rise }: RiseAnalysis): string[] {
  const { least, most } = USUAL_RISE;
  if (rise >= least && rise <= most) return [];
  return [`The rise of ${brief(rise, 4)} K is ${rise < least ? "below" : "above"} the usual ${least} K to ${most} K`];
}

/** The value with as few digits, `digits` or more, as still stand below the limit. */
function printedBelow(value: number, limit: number, digits = 2): string {
  return String(-Number(printedAbove(-value, -limit, digits)));
}

function brief(value: number, digits = 2): string {
  return String(Number(value.toPrecision(digits)));
}

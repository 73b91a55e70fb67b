/** The lines of the report on one calorimeter run: the same labels for every run and every method. */
import type { RiseAnalysis } from "../core/calorimeter/rise/analysis";
import { RELEASE_TIMES } from "../core/calorimeter/rise/end";
import { ORIGINAL_SHARE } from "../core/calorimeter/rise/methods";
import { warningsOf } from "../core/calorimeter/rise/warnings";
import { Line, line, Report } from "./table";

const UNKNOWN = "not determined";

/** The report of an analysed run. */
export function riseReport(run: RiseAnalysis, endGiven: boolean): Report {
  return {
    lines: [...result(run), ...uncertaintyParts(run), ...driftLines(run), ...model(run), ...readings(run, endGiven), ...comparison(run)],
    warnings: warningsOf(run),
  };
}

function result({ method, rise, raw, uncertainty }: RiseAnalysis): Line[] {
  const { standard, expanded, factor, degrees } = uncertainty;
  const freedom = degrees >= 1000 ? "more than 1000" : String(Math.floor(degrees));
  return [
    line("corrected rise", rise, "K", method),
    line(
      "standard uncertainty of the rise",
      standard,
      "K",
      "readings, resolution, trapezoids, heat still to come, bent drifts; not the calibration of the thermometer nor the model of the calorimeter",
    ),
    line("expanded uncertainty (95 %)", expanded, "K", `coverage factor ${factor.toFixed(2)}, effective degrees of freedom ${freedom}`),
    line("raw rise", raw, "K", "end of the main period less firing"),
    line("correction", rise - raw, "K", "added to the raw rise"),
  ];
}

function uncertaintyParts({ uncertainty, method }: RiseAnalysis): Line[] {
  const adiabatic = method === "adiabatic";
  return [
    line("uncertainty from the readings", uncertainty.readings, "K", "scatter about the drift lines, not below resolution/√12"),
    line(
      "uncertainty from the trapezoids",
      uncertainty.trapezoid,
      "K",
      adiabatic ? "not used by this method" : "estimated by leaving out every second reading; not corrected",
    ),
    line(
      "uncertainty from heat still to come",
      uncertainty.unfinished,
      "K",
      "an exponential release with the 63 % time, the late time constant or the bend of this run; one far slower than the record cannot be seen",
    ),
    line(
      "uncertainty from bent drifts",
      uncertainty.curvature,
      "K",
      adiabatic ? "not used by this method" : "straight lines in place of exponentials",
    ),
    line(
      "uncertainty from the method",
      Math.hypot(uncertainty.method, uncertainty.unequal),
      "K",
      adiabatic ? "unequal drifts" : "Dickinson: its difference from Regnault-Pfaundler",
    ),
  ];
}

function driftLines({ drifts, fore, after }: RiseAnalysis): Line[] {
  return [
    line("drift before firing", drifts.before, "K/min"),
    line("standard deviation of the drift before", fore.slopeError, "K/min"),
    line("drift after the main period", drifts.after, "K/min"),
    line("standard deviation of the drift after", after.slopeError, "K/min"),
    line("scatter about the line before", fore.residual, "K", "residual standard deviation"),
    line("scatter about the line after", after.residual, "K", "residual standard deviation"),
    line("mean temperature before firing", drifts.meanBefore, "°C"),
    line("mean temperature of the main period", drifts.meanMain, "°C", "trapezoids over the actual intervals"),
    line("mean temperature after", drifts.meanAfter, "°C"),
  ];
}

function model({ constant, convergence, split, share, response, late }: RiseAnalysis): Line[] {
  return [
    line("cooling constant", constant, "1/min", "usual in 2 to 3 kg of water: 0.0015 to 0.003 per min"),
    line("convergence temperature", convergence ?? UNKNOWN, "°C", "where the drift would end: jacket and stirring"),
    line("split time after firing", split ?? UNKNOWN, "min", `Dickinson: ${share.toFixed(2)} of the raw rise, linear between readings`),
    line("63 % time", response ?? UNKNOWN, "min", "from firing to 63 % of the raw rise"),
    line("late time constant", late?.constant ?? UNKNOWN, "min", "how fast the last of the heat that the scatter lets see comes"),
  ];
}

function readings({ grid, resolution }: RiseAnalysis, endGiven: boolean): Line[] {
  const { fire, end, count, lastFore, firstAfter } = grid;
  const rule = `found: at least ${RELEASE_TIMES} times the 63 % time after firing, less than 0.01 % still to come, steady drift over 5 min or more from there`;
  return [
    line("resolution of the readings", resolution > 0 ? resolution : "finer than 0.000001", "K"),
    line("firing", fire, "min"),
    line("end of the main period", end, "min", endGiven ? "given" : rule),
    line("readings before firing", lastFore + 1),
    line("readings of the main period", firstAfter - lastFore - 1, "", "between firing and its end"),
    line("readings after", count - firstAfter),
  ];
}

function comparison({ comparison: found }: RiseAnalysis): Line[] {
  return [
    line("rise by Regnault-Pfaundler", found.regnaultPfaundler ?? UNKNOWN, "K"),
    line("rise by Regnault-Pfaundler, refined", found.refined ?? UNKNOWN, "K", "a ninth of the first step added to its interval"),
    line("rise by Dickinson 0.60", found.dickinson ?? UNKNOWN, "K"),
    line("rise by Dickinson 0.63", found.dickinson63 ?? UNKNOWN, "K", `${ORIGINAL_SHARE} stands for 1 − 1/e`),
    line("rise by one common drift", found.adiabatic, "K", "adiabatic method; only for a jacket that follows"),
    line("rise by mean rate", found.meanRate, "K", "cross-check only, not a reporting method"),
  ];
}

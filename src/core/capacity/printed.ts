import { printed, refuse } from "../refusal";
import type { SpeciesFit } from "../species/types";
import type { CapacityHead } from "./piecewise";

/** Who stands behind a fit, as a refusal names it: `gri-1999 for CO2`, `the coefficient block for CO2`. */
export function labelOf(fit: SpeciesFit): string {
  return `${fit.set === "cells" ? "the coefficient block" : fit.set} for ${fit.species}`;
}

/** The first `needed` coefficients of an interval, all of them numbers; up to `most` may be printed. Refuses anything else. */
export function numbersOf(fit: SpeciesFit, index: number, needed: number, most: number): number[] {
  const coefficients = fit.intervals[index]!.coefficients;
  const allowed = needed === most ? `${needed}` : `${needed} to ${most}`;
  if (coefficients.length < needed || coefficients.length > most)
    refuse(`The form ${fit.form} takes ${allowed} coefficients; interval ${index + 1} of ${labelOf(fit)} has ${coefficients.length}`);
  const blank = coefficients.slice(0, needed).findIndex((coefficient) => coefficient === null);
  if (blank >= 0) refuse(`Coefficient ${blank + 1} of interval ${index + 1} of ${labelOf(fit)} is blank`);
  return coefficients.slice(0, needed) as number[];
}

/** An integration constant as printed, times its scale; null if the source gives none. */
export function constantOf(value: number | null | undefined, scale: number): number | null {
  return value === null || value === undefined ? null : value * scale;
}

/** Refuses a fit whose intervals, coefficients or constants cannot be evaluated, in one sentence. */
export function checkFit(fit: SpeciesFit): void {
  const label = labelOf(fit);
  if (fit.form !== "molecular" && fit.intervals.length === 0) refuse(`There is no temperature interval in ${label}`);
  if (!(fit.gasConstant > 0 && fit.gasConstant < Infinity))
    refuse(`The gas constant ${fit.gasConstant} of ${label} is not a positive number`);
  if (!(fit.standardPressure > 0 && fit.standardPressure < Infinity))
    refuse(`The standard pressure ${fit.standardPressure} Pa of ${label} is not a positive number`);
  if (!Number.isFinite(fit.unitFactor) || fit.unitFactor <= 0)
    refuse(`The unit factor ${fit.unitFactor} of ${label} is not a positive number`);
  fit.intervals.forEach((interval, index) => {
    const name = `Interval ${index + 1} of ${label}`;
    const before = fit.intervals[index - 1];
    if (!(interval.from > 0 && interval.to < Infinity && interval.from < interval.to))
      refuse(`${name} runs from ${interval.from} K to ${interval.to} K; it must begin above 0 K and end above its beginning`);
    if (before !== undefined && before.to !== interval.from)
      refuse(`${name} begins at ${printed(interval.from)} K, but the one before it ends at ${printed(before.to)} K`);
    const wrong = interval.coefficients.find((coefficient) => coefficient !== null && !Number.isFinite(coefficient));
    if (wrong !== undefined) refuse(`${name} holds ${wrong}, which is not a finite number`);
  });
}

/** What a capacity made of this fit is besides its numbers. */
export function headOf(fit: SpeciesFit, onFormationScale: boolean, hasEntropy: boolean): CapacityHead {
  const label = labelOf(fit);
  return {
    phase: fit.phase,
    fromLabel: label,
    toLabel: label,
    standardPressure: fit.standardPressure,
    onFormationScale,
    hasEntropy,
    gasConstant: fit.phase === "g" ? fit.gasConstant : 0,
  };
}

// @ts-check
/**
 * Readings of the invented laboratory's runs: the single-body model of a jacketed calorimeter with first-order release of the heat,
 * with a little noise, rounded to 0.1 mK as a thermometer would print them. The same seed gives the same readings.
 */

/** @typedef {{ heat: number, start: number, seed: number }} RunPlan heat released, J; temperature of the first reading, °C */

/** The invented calorimeter: energy equivalent J/K, cooling constant 1/min, convergence temperature °C, release time min. */
const CALORIMETER = { equivalent: 10185, cooling: 0.0021, convergence: 25.6, release: 0.75 };
const NOISE = 0.00012;
export const FIRE = 5;
export const END = 15;
export const STEP = 0.5;
const LAST = 22;

/** Times of the readings, min. */
export const TIMES = Array.from({ length: LAST / STEP + 1 }, (_, i) => i * STEP);

/** @param {RunPlan} plan @returns {number[]} readings, °C */
export function readingsOf({ heat, start, seed }) {
  const noise = normalNumbers(seed);
  return TIMES.map((time) => Number((temperature(time, start, heat / CALORIMETER.equivalent) + NOISE * noise()).toFixed(4)));
}

/** @param {number} time @param {number} start @param {number} rise */
function temperature(time, start, rise) {
  const { cooling: g, convergence, release } = CALORIMETER;
  const drifting = convergence + (start - convergence) * Math.exp(-g * time);
  const since = time - FIRE;
  if (since <= 0) return drifting;
  return drifting + (rise / (1 - g * release)) * (Math.exp(-g * since) - Math.exp(-since / release));
}

/** Normally distributed numbers from a linear congruential generator (Box and Muller). @param {number} seed */
function normalNumbers(seed) {
  let state = seed >>> 0;
  const uniform = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return (state + 0.5) / 2 ** 32;
  };
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}

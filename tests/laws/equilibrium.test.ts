/**
 * Ten thousand feeds held at temperature and pressure: each comes to an end, keeps its atoms, obeys the law of mass action, and leaves out
 * no condensed phase that would form. What the solver says of itself is not asked: everything is worked out again.
 */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../src/core/constants";
import { atPressure, atVolume } from "../../src/core/equilibrium/states";
import type { Equilibrium } from "../../src/core/equilibrium/types";
import { elementDifference, massAction, problem, type Problem, written } from "./equilibrium-support";

const seen = { withoutGas: 0, withCondensed: 0, belowDoubles: 0, shares: 0 };

function count({ list, feed }: Problem, state: Equilibrium): void {
  if (state.gas === 0) seen.withoutGas++;
  else if (list.some(({ capacity }, j) => capacity.phase !== "g" && state.amounts[j]! > 0)) seen.withCondensed++;
  if (state.logAmounts.some((log) => log < -745 && log > -Infinity)) seen.belowDoubles++;
  if (feed.some(({ amount }) => amount < 1e-9)) seen.shares++;
}

function check(one: Problem): void {
  const { list, system, feed, temperature, pressure } = one;
  const state = atPressure(system, feed, temperature, pressure);
  count(one, state);
  // Amounts are sums of some tens of terms: a few units of the last digit.
  expect(elementDifference(list, feed, state.amounts)).toBeLessThan(2e-14);
  expect(state.amounts.every((n) => n >= 0 && n < Infinity)).toBe(true);
  expect(Math.abs(state.pressure / pressure - 1)).toBeLessThan(1e-13);
  // Ten steps of the balances are usual, 90 the most that was seen; a search that gropes takes hundreds.
  expect(state.iterations).toBeLessThan(150);
  if (state.gas === 0) return checkWithoutGas(one, state);
  const { present, absent } = massAction(list, state);
  // Potentials of up to some 2000 RT (200 K), a few of them in each reaction: their rounding is 1e-12.
  expect(present).toBeLessThan(1e-11);
  expect(absent).toBeLessThan(1e-11);
}

/** Contents that condense completely: what they evaporate into a little room presses less than what presses on them. */
function checkWithoutGas({ system, feed, temperature, pressure }: Problem, state: Equilibrium): void {
  expect(state.volume).toBe(0);
  const moles = feed.reduce((sum, { amount }) => sum + amount, 0);
  const room = (1e-3 * moles * GAS_CONSTANT * temperature) / pressure;
  expect(atVolume(system, feed, temperature, room).pressure).toBeLessThan(pressure);
}

test("every feed comes to an equilibrium that keeps the laws", () => {
  fc.assert(
    fc.property(problem, (one) => {
      try {
        check(one);
      } catch (thrown) {
        throw new Error(`${written(one)}: ${String(thrown)}`);
      }
    }),
    { numRuns: 10_000 },
  );
  // The feeds were of every kind.
  expect(seen.withoutGas).toBeGreaterThan(100);
  expect(seen.withCondensed).toBeGreaterThan(500);
  expect(seen.belowDoubles).toBeGreaterThan(100);
  expect(seen.shares).toBeGreaterThan(500);
});

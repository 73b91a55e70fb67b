/** Equilibria of feeds far from any laboratory: 1e-18 of one beside another, 1e-24 to 1e6 mol, 1e-6 Pa to 1e12 Pa, whatever is held. */
import fc from "fast-check";
import { atPressure, atVolume, isobaric, rigid } from "../../src/core/equilibrium/states";
import { elementDifference, massAction, place, problem, written, type Problem } from "../laws/equilibrium-support";

jest.setTimeout(600_000);

/**
 * The amounts of a problem spread over 18 powers of ten, all of them together over 30, and its pressure over 18. Totals of the elements
 * have some 31 digits, so that a part of 1e-18 of the rest has 13.
 */
const far = fc.tuple(problem, fc.array(place, { minLength: 5, maxLength: 5 }), place, place).map(([one, parts, size, part]): Problem => {
  const feed = one.feed.map((each, k) => ({ ...each, amount: 10 ** (18 * parts[k]! + 12 * size - 24) }));
  const moved = { ...one, feed, pressure: 10 ** (18 * part - 6) };
  return { ...moved, [fc.toStringMethod]: () => written(moved) } as Problem;
});

const near = (value: number, wanted: number) => Math.abs(value / wanted - 1);

function check(one: Problem): void {
  const { list, system, feed, temperature, pressure } = one;
  const state = atPressure(system, feed, temperature, pressure);
  // Components of a trace are sums of amounts that are printed with sixteen digits each.
  expect(elementDifference(list, feed, state.amounts)).toBeLessThan(1e-12);
  if (state.gas === 0) return;
  const { present, absent } = massAction(list, state);
  expect(present).toBeLessThan(1e-10);
  expect(absent).toBeLessThan(1e-10);
  expect(near(atVolume(system, feed, temperature, state.volume).pressure, pressure)).toBeLessThan(1e-11);
  // The temperature of an energy is not one to one where a phase of the set ends, but its energy is what was asked.
  const closed = rigid(system, feed, state.energy, state.volume);
  expect(Math.abs(closed.energy - state.energy)).toBeLessThan(1e-9 * (Math.abs(state.energy) + state.gas * 8.3 * temperature));
  const open = isobaric(system, feed, state.enthalpy, pressure);
  expect(Math.abs(open.enthalpy - state.enthalpy)).toBeLessThan(1e-9 * (Math.abs(state.enthalpy) + state.gas * 8.3 * temperature));
}

test("every feed, near and far, is balanced whatever is held", () => {
  fc.assert(
    fc.property(fc.oneof(problem, far), (one) => {
      try {
        check(one);
      } catch (thrown) {
        throw new Error(`${written(one)}: ${String(thrown)}`);
      }
    }),
    { numRuns: Number(process.env.RUNS ?? 10_000) },
  );
});

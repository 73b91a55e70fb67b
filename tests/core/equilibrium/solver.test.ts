/** What the solver says of its own answer sees a fault, and says nothing without one. */
import { Solver } from "../../../src/core/equilibrium/solver";
import { atVolume } from "../../../src/core/equilibrium/states";
import { totalsOf } from "../../../src/core/equilibrium/system";
import { elementDifference, massAction } from "../../laws/equilibrium-support";
import { feedOf, named, systemOfNames } from "./candidates";

const keys = "CO2 CO H2O H2 O2 OH";
const system = systemOfNames(keys);
const feed = feedOf({ CH4: 1, O2: 2 });

function settled(): Solver {
  const solver = new Solver(system, totalsOf(system, feed));
  solver.settle(2500, 0.1);
  return solver;
}

test("an amount of CO that is one in a thousand too high shows in the elements and in the mass action", () => {
  const solver = settled();
  const amounts = solver.balances.gasAmounts();
  expect(solver.elementError(amounts)).toBeLessThan(1e-15);
  expect(solver.massAction()).toBeLessThan(1e-12);
  const surplus = 0.001 * amounts[1]!;
  amounts[1] = 1.001 * amounts[1]!;
  // Of 1 mol of carbon and 4 mol of oxygen.
  expect(solver.elementError(amounts)).toBeCloseTo(surplus, 12);
  expect(solver.massAction()).toBeCloseTo(Math.log(1.001), 12);
});

test("the fields of a state are what can be worked out from its amounts", () => {
  const state = atVolume(system, feed, 2500, 0.1);
  const list = named(keys);
  expect(state.elements).toBeCloseTo(elementDifference(list, feed, state.amounts), 15);
  expect(Math.abs(state.massAction - massAction(list, state).present)).toBeLessThan(1e-12);
  const sum = (of: (j: number) => number) => list.reduce((total, _, j) => total + state.amounts[j]! * of(j), 0);
  expect(state.gas).toBeCloseTo(
    sum(() => 1),
    13,
  );
  expect(state.energy / sum((j) => list[j]!.capacity.energy(2500))).toBeCloseTo(1, 13);
  expect(state.enthalpy / sum((j) => list[j]!.capacity.enthalpy(2500))).toBeCloseTo(1, 13);
  expect(state.evaluations).toBe(1);
  expect(state.iterations).toBeGreaterThan(1);
});

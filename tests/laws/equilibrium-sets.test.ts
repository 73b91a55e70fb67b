/**
 * Two sets give two flame temperatures, and the difference is what their species differ by. With δu and δγ what U and g/RT of a species
 * are higher in the second set, at the temperature of the first:
 *
 *   δT = [Σ feed δu(T0) − Σ n δu + RT Σ (∂n/∂ln T) δγ] / (∂U/∂T)     all at constant volume and at equilibrium
 *
 * The last term is the shift of the composition, Σ u δn: the response of amounts to potentials is symmetric and ∂n/∂ln T is the same
 * response to u/RT, so that it needs no other.
 */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../src/core/constants";
import { atVolume, rigid } from "../../src/core/equilibrium/states";
import { systemOf } from "../../src/core/equilibrium/system";
import type { Candidate } from "../../src/core/equilibrium/types";
import { candidatesOf, energyOf, feedOf } from "../core/equilibrium/candidates";

const SETS = ["nasa-2002", "gri-1999"] as const;
/** The gases that both sets hold. */
const [first, second] = (() => {
  const [a, b] = SETS.map((set) => candidatesOf(set, "C H O N", "gases"));
  const names = a!.map(({ name }) => name).filter((name) => b!.some((each) => each.name === name));
  return [a!, b!].map((list) => names.map((name) => list.find((each) => each.name === name)!));
})() as [Candidate[], Candidate[]];

/** γ up to what is the same in both sets. */
const potential = ({ capacity, fitGasConstant }: Candidate, t: number) =>
  (capacity.enthalpy(t) / t - capacity.entropy(t)) / fitGasConstant - Math.log(capacity.standardPressure);

/** U as the solver takes it: H less RT, with the R of the fit. */
const energy = ({ capacity, fitGasConstant }: Candidate, t: number) => capacity.enthalpy(t) - fitGasConstant * t;

const START = 300;
const fuels: Record<string, number> = { CH4: 2, H2: 0.5, CO: 0.5, C2H4: 3, C3H8: 5, CH3OH: 1.5, NH3: 0.75 };
const ofBoth = Object.keys(fuels).filter((fuel) => first.some(({ name }) => name === fuel));

test("the flames of two sets differ by what their species differ by", () => {
  let most = 0;
  const cases = fc.record({
    fuel: fc.constantFrom(...ofBoth),
    ratio: fc.integer({ min: 60, max: 160 }).map((percent) => percent / 100),
    pressure: fc.integer({ min: 4, max: 7 }).map((power) => 10 ** power),
  });
  fc.assert(
    fc.property(cases, ({ fuel, ratio, pressure }) => {
      const oxygen = fuels[fuel]! / ratio;
      const amounts = { [fuel]: 1, O2: oxygen, N2: 3.76 * oxygen };
      const elements = new Set(feedOf(amounts, first).flatMap(({ counts }) => [...counts.keys()]));
      const among = (list: readonly Candidate[]) => list.filter(({ counts }) => [...counts.keys()].every((each) => elements.has(each)));
      const [one, other] = [among(first), among(second)];
      const [feed, feedOfOther] = [feedOf(amounts, first), feedOf(amounts, second)];
      const volume = ((1 + 4.76 * oxygen) * GAS_CONSTANT * START) / pressure;
      const state = rigid(systemOf(one), feed, energyOf(feed, START), volume);
      const t = state.temperature;
      const step = 1e-4;
      const [below, above] = [1 - step, 1 + step].map((factor) => atVolume(systemOf(one), feed, t * factor, volume));
      const shifts = one.map((species, j) => {
        const amount = state.amounts[j]!;
        const slope = (above!.amounts[j]! - below!.amounts[j]!) / (2 * step);
        const shift = GAS_CONSTANT * t * slope * (potential(other[j]!, t) - potential(species, t));
        return shift - amount * (energy(other[j]!, t) - energy(species, t));
      });
      const put = energyOf(feedOfOther, START) - energyOf(feed, START);
      const capacity = (above!.energy - below!.energy) / (2 * step * t);
      const expected = (put + shifts.reduce((sum, term) => sum + term, 0)) / capacity;
      const found = rigid(systemOf(other), feedOfOther, energyOf(feedOfOther, START), volume).temperature - t;
      most = Math.max(most, Math.abs(found));
      // First order in δγ. What it leaves is half of δγ of the species that shifts most: OH, whose formation values differ by 2.1 kJ/mol,
      // 0.1 RT at these temperatures, hence at most a tenth of the terms.
      const terms = shifts.reduce((sum, term) => sum + Math.abs(term), Math.abs(put)) / capacity;
      expect(Math.abs(found - expected)).toBeLessThan(0.1 * terms);
      expect(Math.abs(found)).toBeLessThan(1.1 * terms);
    }),
    { numRuns: 60 },
  );
  expect(most).toBeGreaterThan(2);
});

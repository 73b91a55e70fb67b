/** A mixture of any gases of the library is the sum of its parts, whatever their forms and sets. */
import fc from "fast-check";
import { temperatureAtEnergy } from "../../src/core/capacity/inverse";
import { explainTemperature } from "../../src/core/capacity/range";
import { compileMixture } from "../../src/core/mixture/compile";
import { everyCase, sizeOfTerms } from "./support";

const gases = everyCase.map(([, one]) => one).filter(({ record }) => record.phase === "g");
const part = fc.record({ index: fc.nat(gases.length - 1), amount: fc.double({ min: 1e-3, max: 1, noNaN: true }) });
const composition = fc.array(part, { minLength: 2, maxLength: 10 });

const partsOf = (chosen: readonly { index: number; amount: number }[]) =>
  chosen.map(({ index, amount }) => ({ capacity: gases[index]!.capacity, amount }));

test("Cv, U and S are the sums of the parts", () =>
  fc.assert(
    fc.property(composition, fc.double({ min: 0, max: 1, noNaN: true }), (chosen, place) => {
      const parts = partsOf(chosen);
      const mixture = compileMixture(parts);
      const t = mixture.from + place * (mixture.to - mixture.from);
      const sum = (value: (of: (typeof parts)[number]) => number) => parts.reduce((total, one) => total + value(one), 0);
      const rounding = 1e-14 * sum(({ capacity, amount }) => amount * sizeOfTerms(capacity, t));
      expect(Math.abs(mixture.energy(t) - sum(({ capacity, amount }) => amount * capacity.energy(t)))).toBeLessThan(rounding);
      expect(Math.abs(mixture.cv(t) - sum(({ capacity, amount }) => amount * capacity.cv(t)))).toBeLessThan(rounding / t);
      if (!mixture.hasEntropy) return;
      const moles = sum(({ amount }) => amount);
      const entropy = sum(
        ({ capacity, amount }) =>
          amount *
          (capacity.entropy(t) +
            capacity.gasConstant * Math.log((capacity.standardPressure / mixture.standardPressure) * (moles / amount))),
      );
      expect(Math.abs(mixture.entropy(t) - entropy)).toBeLessThan((10 * rounding) / t);
    }),
    { numRuns: 300 },
  ));

test("a part that limits the range is named, and the inverse holds for mixtures too", () =>
  fc.assert(
    fc.property(composition, fc.double({ min: 0.001, max: 0.999, noNaN: true }), (chosen, place) => {
      const mixture = compileMixture(partsOf(chosen));
      const names = chosen.map(({ index }) => `${gases[index]!.record.set} for ${gases[index]!.record.species}`);
      expect(names.some((name) => explainTemperature(mixture, 1e6).message.endsWith(name))).toBe(true);
      const t = mixture.from + place * (mixture.to - mixture.from);
      expect(Math.abs(temperatureAtEnergy(mixture, mixture.energy(t), t) - t)).toBeLessThan(1e-9);
    }),
    { numRuns: 100 },
  ));

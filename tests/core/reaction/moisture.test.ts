import fc from "fast-check";
import { GAS_CONSTANT } from "../../../src/core/constants";
import { moistureFinding } from "../../../src/core/reaction/moisture";
import { saturationPressure } from "../../../src/core/water/saturation";
import { saturation } from "../../../src/data/saturation";

const find = (vapour: number, liquid: number, temperature: number, volume: number) =>
  moistureFinding({ vapour, liquid, temperature, volume }, saturation);

/** Amount of vapour, mol, that saturates a volume. */
const held = (temperature: number, volume: number) => (saturationPressure(temperature, saturation) * volume) / (GAS_CONSTANT * temperature);

test("two mol of vapour in the volume of three mol of gas at 25 °C and 1 atm condense but for 0.094 mol", () => {
  const volume = (3 * GAS_CONSTANT * 298.15) / 101325;
  const found = find(2, 0, 298.15, volume)!;
  // by hand: 2/3 × 101325 = 67550 Pa against 3169.9 Pa (IAPWS, 25 °C); 3 × 3169.9/101325 = 0.0939 mol stay
  expect(found.kind).toBe("condenses");
  expect(found.partial).toBeCloseTo(67550, 6);
  expect(Math.abs(found.saturation - 3169.9)).toBeLessThan(0.5);
  expect(2 - found.amount).toBeCloseTo(0.0939, 4);
  // the same water as liquid evaporates to the same state
  const liquid = find(0, 2, 298.15, volume)!;
  expect(liquid.kind).toBe("evaporates in part");
  expect(liquid.amount).toBeCloseTo(2 - found.amount, 12);
  expect(liquid.partial).toBeCloseTo(67550, 6);
});

test("the state found has vapour at saturation, or no liquid", () => {
  const amount = fc.double({ min: 0, max: 5, noNaN: true });
  fc.assert(
    fc.property(
      amount,
      amount,
      fc.double({ min: 190, max: 647, noNaN: true }),
      fc.double({ min: 1e-3, max: 10, noNaN: true }),
      (vapour, liquid, temperature, volume) => {
        const found = find(vapour, liquid, temperature, volume);
        const limit = held(temperature, volume);
        if (found === undefined) return expect(vapour + liquid === 0 || (liquid === 0 && vapour <= limit)).toBe(true);
        const after = found.kind === "condenses" ? vapour - found.amount : vapour + found.amount;
        expect(found.amount).toBeGreaterThan(0);
        expect(after).toBeCloseTo(found.kind === "evaporates" ? vapour + liquid : limit, 9);
      },
    ),
  );
});

test("all evaporates where there is room", () => {
  expect(find(0, 1, 350, 100)).toMatchObject({ kind: "evaporates", amount: 1 });
});

test("nothing is found without water, where vapour is below saturation, and where there is no saturation pressure", () => {
  expect(find(0, 0, 300, 1)).toBeUndefined();
  expect(find(0.5, 0, 373.15, 1)).toBeUndefined();
  expect(find(100, 0, 700, 0.001)).toBeUndefined();
  expect(find(1, 0, 150, 1)).toBeUndefined();
});

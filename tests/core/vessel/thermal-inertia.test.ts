import fc from "fast-check";
import { highestSynthesisTemperature, thermalInertia } from "../../../src/core/vessel/thermal-inertia";
import { constantStore } from "../../../src/core/vessel/wall";
import { readWall } from "../../../src/functions/vessel-wall";
import { refusedWith } from "../refused";

const steel = readWall("60 kg carbon steel")!;
const contents = constantStore(42.5, "air");

test("phi: 1 without a wall, 1 + ratio with one, and by temperature where the wall's capacity is", () => {
  expect(thermalInertia(contents, constantStore(0, "none"), 300)).toBe(1);
  expect(thermalInertia(contents, constantStore(85, "wall"), 300)).toBe(3);
  expect(thermalInertia(contents, steel, 373.15)).toBeCloseTo(1 + (60 * (425 + 77.3 - 16.9 + 2.22)) / 42.5, 9);
});

const process = { temperature: 333.15, rise: 120, accumulation: 0.3, phi: 1 };

test("60 °C, 120 K, 0.3 accumulated: MTSR 96 °C, computed apart from this program", () => {
  expect(highestSynthesisTemperature(process) - 273.15).toBeCloseTo(96, 10);
});

test("nothing accumulated is no rise, everything with inertia phi is phi times the rise", () =>
  fc.assert(
    fc.property(fc.double({ min: 0, max: 1000, noNaN: true }), fc.double({ min: 1, max: 100, noNaN: true }), (rise, phi) => {
      expect(highestSynthesisTemperature({ temperature: 300, rise, accumulation: 0, phi })).toBe(300);
      const full = highestSynthesisTemperature({ temperature: 300, rise, accumulation: 1, phi });
      expect(Math.abs(full - 300 - phi * rise)).toBeLessThan(1e-9);
    }),
  ));

describe("refusals", () => {
  test.each([
    [() => highestSynthesisTemperature({ ...process, accumulation: 30 }), "Accumulation 30 is not between 0 and 1"],
    [() => highestSynthesisTemperature({ ...process, accumulation: -0.1 }), "Accumulation -0.1 is not between 0 and 1"],
    [() => highestSynthesisTemperature({ ...process, phi: 0.9 }), "Thermal inertia phi 0.9 is below 1, its value without a wall"],
    [() => highestSynthesisTemperature({ ...process, rise: -5 }), "Adiabatic rise -5 K is negative"],
    [() => thermalInertia(constantStore(0, "nothing"), steel, 300), "The heat capacity of the contents, 0 J/K, is not above 0 J/K"],
    [
      () => thermalInertia(contents, steel, 200),
      "Temperature 200 K is below 223.15 K, the lower limit of the capacity held below 293.15 K of en-1993-1-2 for carbon steel (structural)",
    ],
  ])("%#", (call, sentence) => expect(refusedWith(call)).toBe(`range: ${sentence}`));
});

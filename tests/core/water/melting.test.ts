import { melting } from "../../../src/core/water/melting";
import { iapws95 } from "../../../src/data/iapws95";

const curves = iapws95.melting;

// Check values of IAPWS R14-08(2011), Table 3, in MPa (from memory): ice V at 265 K and ice VI at 320 K, to their six digits.
test.each([
  [265, "V", 479.64],
  [320, "VI", 1356.76],
])("%d K: ice %s melts at %d MPa", (temperature, ice, pressure) => {
  const found = melting(curves, temperature)!;
  expect(found.ice).toBe(ice);
  expect(Number((found.pressure / 1e6).toPrecision(6))).toBe(pressure);
});

test("the curves of ice V and ice VI meet where they are joined", () => {
  // Triple-point pressures are printed to 0.1 MPa.
  const joint = curves[1]!.from;
  expect(Math.abs(melting(curves, joint)!.pressure - melting(curves, joint + 1e-9)!.pressure)).toBeLessThan(0.1e6);
});

test("from about 300 K on, and above the last curve, nothing freezes below 1000 MPa", () => {
  expect(melting(curves, 300)!.pressure).toBeLessThan(1e9);
  expect(melting(curves, 301)!.pressure).toBeGreaterThan(1e9);
  expect(melting(curves, 356)).toBeUndefined();
  expect(melting(curves, 250)).toBeUndefined();
});

/** Warnings of water that would condense before, of condensed matter that takes up room after, and of dense gas. */
import { valueOf, warningsOf } from "./burn-helpers";
import { call } from "./helpers";

const WET = "0.12 O2 + 0.44 N2 + 0.44 H2O";

test("steam that would condense at the start is told, in BURN, RIGID and ISOBARIC; humid air at its saturation is not", () => {
  // saturation pressure of water at 25 °C: 3169.8 Pa (IAPWS)
  const told = (share: string) =>
    `H2O put in as vapour has the partial pressure ${share} Pa, above the saturation pressure over liquid water at 298.15 K, 3169.82 Pa: it would condense, and is counted with the energy of vapour`;
  // 7.3333 mol of H2O among 17.6667 mol
  expect(warningsOf(call("BURN", "CH4", WET, 1, 298.15, "1 bar"))).toEqual([told("41509.4")]);
  expect(warningsOf(call("BURN", "CH4", WET, 1, 298.15, "1 bar", "complete"))).toEqual([told("41509.4")]);
  expect(warningsOf(call("BURN", "CH4", WET, 1, 400, "1 bar"))).toEqual([]);
  expect(warningsOf(call("EQUILIBRIUM.ISOBARIC", "1 H2O + 1 H2 + 2 O2", 298.15, "1 bar"))).toEqual([told("25000")]);
  expect(warningsOf(call("EQUILIBRIUM.RIGID", "1 H2O + 1 H2 + 2 O2", 298.15, "0.09915827 m3"))[0]).toMatch(
    /^H2O put in as vapour has the partial pressure 2500\d/,
  );
  // liquid water is put in as such
  expect(warningsOf(call("EQUILIBRIUM.RIGID", "1 H2O(l) + 1 H2 + 2 O2", 298.15, "0.1 m3"))).toEqual([]);
  const saturated = call("MIX.HUMIDAIR", "40 °C", "1 bar", 1)[0]![0];
  expect(warningsOf(call("BURN", "CH4", saturated, 1, "40 °C", "1 bar"))).toEqual([]);
  expect(warningsOf(call("BURN", "CH4", saturated, 1, "10 °C", "1 bar"))).toHaveLength(1);
  expect(warningsOf(call("BURN", "CH4", saturated, 1, 250, "1 bar"))[0]).toContain("over ice at 250 K");
});

test("a fuel that would be liquid in part is told, with its vapour pressure by Peng-Robinson; one below it is not", () => {
  // 1.33 % of 1 bar is asked for. Vapour pressure of n-decane at 300 K: about 205 Pa (handbooks, from memory); the equation is within 15 %
  const note = warningsOf(call("BURN", "n-C10H22", "air", 1, 300, "1 bar")).find((text) => text.includes("put in as vapour"));
  const found =
    /^n-C10H22 put in as vapour has the partial pressure 1333\.34 Pa, above its vapour pressure at 300 K, about ([\d.]+) Pa: it would be liquid in part, and is counted with the energy of vapour$/.exec(
      note!,
    );
  expect(Math.abs(Number(found?.[1]) / 205 - 1)).toBeLessThan(0.15);
  expect(warningsOf(call("BURN", "n-C10H22", "air", 1, 420, "1 bar")).join()).not.toContain("put in as vapour");
  expect(warningsOf(call("BURN", "C3H8", "air", 1, 298.15, "1 bar"))).toEqual([]);
  expect(warningsOf(call("BURN", "C3H8", "O2", 1, 298.15, "80 bar"))[0]).toContain("C3H8 put in as vapour has the partial pressure 1");
});

test("a volume that condensed water fills is told, and a film of it is not", () => {
  const full = call("EQUILIBRIUM.ATVOLUME", "10 H2O", 400, "0.1 L");
  expect(valueOf(full, "H2O(l)")).toBeGreaterThan(9.9);
  expect(warningsOf(full)).toEqual([
    "Solids and liquids of 0.180021 kg in 0.0001 m3 leave less room to the gas than is counted: the pressure comes out too low, and a vessel full of liquid is far above it",
  ]);
  expect(warningsOf(call("EQUILIBRIUM.ATVOLUME", "1 H2O", 400, "10 L"))).toEqual([]);
  // carbon stands among the gases of the set: it is the condensed amount that counts. 12.011 g of it and less in 24.5 L
  expect(warningsOf(call("EQUILIBRIUM.RIGID", "1 C2H2", 298.15, "24.5 L"))).toEqual([]);
  expect(warningsOf(call("EQUILIBRIUM.RIGID", "1 C2H2", 298.15, "0.5 L"))[0]).toMatch(/^Solids and liquids of 0\.02\d+ kg in 0\.0005 m3/);
  expect(warningsOf(call("EQUILIBRIUM.ATPRESSURE", "10 H2O", 300, "1 bar"))).toEqual([]);
});

test("the covolume of hot gas: P = n R T/(V − n b) with b = 27 cm3/mol", () => {
  const warned = (id: string, ...values: unknown[]) => warningsOf(call(id, ...values)).at(-1);
  const table = call("EQUILIBRIUM.ATVOLUME", "1 N2", 3000, "0.5 L");
  // 27 cm3/mol of 500 cm3/mol: 27/473 = 5.7 %
  expect(warningsOf(table)).toEqual([
    `The ideal gas is assumed; at ${(valueOf(table, "pressure") / 1e6).toPrecision(6)} MPa the pressure of real gases is higher, by about 6 % (from a covolume of 27 cm3/mol)`,
  ]);
  expect(warned("EQUILIBRIUM.ATVOLUME", "1 N2", 400, "0.2 L")).toMatch(
    /MPa the pressure of real gases is higher, by some per cent and more$/,
  );
  expect(warned("EQUILIBRIUM.ATVOLUME", "1 N2", 300, "1 mL")).toMatch(/far higher: the gas would be as dense as a liquid$/);
  expect(warned("BURN", "CH4", "O2", 1, 298.15, "100 bar")).toMatch(/^The ideal gas is assumed; .* by about 15 % /);
});

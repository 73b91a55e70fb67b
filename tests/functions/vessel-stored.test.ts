import { call, refusal } from "./helpers";

const value = (rows: readonly (readonly unknown[])[], label: string) => rows.find(([name]) => name === label)?.[1] as number;

test("50 L at 100 bar, gamma 1.4: the energies and 218 g TNT, computed apart from this program", () => {
  const rows = call("VESSEL.STORED", "100 bar", "50 L", 1.4);
  expect(value(rows, "Brode") / 1e6).toBeCloseTo(1.24, 2);
  expect(value(rows, "isentropic expansion") / 1e6).toBeCloseTo(0.913, 3);
  expect(value(rows, "isothermal bound") / 1e6).toBeCloseTo(2.3, 2);
  expect(value(rows, "TNT equivalent") * 1000).toBeCloseTo(218, 0);
  expect(value(rows, "isentropic, less work on the air")).toBeLessThan(value(rows, "isentropic expansion"));
});

test("the table ends in what governs, and cautions before", () => {
  const rows = call("VESSEL.STORED", 1e7, 0.05, 1.4, "1 bar");
  expect(rows.map(([label]) => label)).toEqual([
    "Brode",
    "isentropic expansion",
    "isentropic, less work on the air",
    "isothermal bound",
    "TNT equivalent",
    "caution",
    "holds for",
    "warnings",
  ]);
  expect(rows[5]![3]).toMatch(/^stored energy does not say how a vessel fails: fragments and their range/);
  expect(rows[6]![3]).toBe(
    "ideal gas of constant gamma, ambient pressure 100000 Pa; not a design or relief calculation: the vessel's own rating, local codes and licensed practice govern",
  );
  expect(rows[7]).toEqual(["warnings", "none", "", ""]);
});

test("a column of pressures: a heading row, a row for each, its refusal in its own row", () => {
  const rows = call("VESSEL.STORED", [["10 bar"], ["300 bar"], ["0.5 bar"]], "50 L", 1.4);
  expect(rows).toHaveLength(4);
  expect(rows[0]!.slice(0, 5)).toEqual([
    "Brode [J]",
    "isentropic expansion [J]",
    "isentropic, less work on the air [J]",
    "isothermal bound [J]",
    "TNT equivalent [kg]",
  ]);
  expect(rows[2]!.at(-1)).toBe(
    "At 30000000 Pa a gas is no longer ideal: expect a difference of several per cent or more, see VESSEL.COMPRESSIBILITY",
  );
  expect(rows[3]![0]).toMatchObject({
    message: "Pressure 50000 Pa is not above the ambient pressure, 101325 Pa; pressures are absolute",
  });
});

test("a gamma no ideal gas has is warned of", () => {
  expect(call("VESSEL.STORED", "100 bar", "50 L", 1.7).at(-1)).toEqual([
    "warning",
    "see note",
    "",
    "Gamma 1.7 is above 5/3, that of a gas of atoms: no ideal gas has it, and the energies are too low",
  ]);
  // 5/3 as handbooks round it
  for (const gamma of [5 / 3, 1.667, 1.67]) expect(call("VESSEL.STORED", "90 bar", "50 L", gamma).at(-1)![1]).toBe("none");
});

test("refusals", () => {
  expect(refusal("VESSEL.STORED", "100 bar", "50 L", 1)).toBe("#VALUE! Gamma 1 is not above 1");
  expect(refusal("VESSEL.STORED", "100 bar", "-50 L", 1.4)).toBe("#VALUE! Volume -0.05 m3 is not above 0 m3");
  expect(refusal("VESSEL.STORED", "1 atm", "50 L", 1.4)).toBe(
    "#VALUE! Pressure 101325 Pa is not above the ambient pressure, 101325 Pa; pressures are absolute",
  );
  expect(refusal("VESSEL.STORED", "100 barg", "50 L", 1.4)).toContain("is a gauge pressure");
  expect(refusal("VESSEL.STORED", "100 bar", "50 L", undefined)).toBe("#VALUE! Gamma is missing: give a number");
});

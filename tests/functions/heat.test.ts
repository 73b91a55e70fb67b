import fc from "fast-check";
import { allSpecies, recordsOf } from "../../src/data/library";
import { call, number, refusal } from "./helpers";

test("2 mol N2 from 300 K with 20 kJ reach 763.70 K", () => {
  // Computed independently, set nasa-2002; with constant Cv = 20.8 J/(mol K) one would find 780.8 K
  expect(number("HEAT.FINALTEMP", "N2", 2, 300, "20 kJ")).toBeCloseTo(763.7, 2);
  expect(number("HEAT.FINALTEMP", "N2", "2 mol", 300, 20000, "°C")).toBeCloseTo(490.55, 2);
});

test("heat of a mass, of moles in a range, and its sign", () => {
  expect(number("HEAT", "N2", "28.014 g", 298.15, 1000, "kJ")).toBeCloseTo(15.627, 3);
  expect(number("HEAT", "N2", 1, 1000, 298.15)).toBe(-number("HEAT", "N2", 1, 298.15, 1000));
  const range = [
    ["N2", 3],
    ["O2", 1],
  ];
  expect(number("HEAT", range, null, 300, 900)).toBeCloseTo(3 * number("HEAT", "N2", 1, 300, 900) + number("HEAT", "O2", 1, 300, 900), 6);
  expect(
    number(
      "HEAT",
      [
        ["N2", 0.75],
        ["O2", 0.25],
      ],
      4,
      300,
      900,
    ),
  ).toBeCloseTo(number("HEAT", range, null, 300, 900), 6);
});

test("the third column of a composition names the set of each species", () => {
  const mixed = number(
    "HEAT",
    [
      ["N2", 1, "gri-1999"],
      ["O2", 1, "nasa-2002"],
    ],
    undefined,
    300,
    900,
  );
  const parts = number("HEAT", "N2", 1, 300, 900, null, "gri-1999") + number("HEAT", "O2", 1, 300, 900, null, "nasa-2002");
  expect(mixed).toBeCloseTo(parts, 6);
});

test("the final temperature undoes the heat, for every species and set, to 1e-9 K", () => {
  for (const { key } of allSpecies()) {
    for (const record of recordsOf(key)) {
      const [low, high] = call("SOURCE.RANGE", key, record.set)[0] as [number, number];
      for (const share of [0.1, 0.45, 0.99]) {
        const end = low + share * (high - low);
        if (isInStep(key, record.set, end)) continue;
        const heat = number("HEAT", key, 1, low, end, null, record.set);
        expect(Math.abs(number("HEAT.FINALTEMP", key, 1, low, heat, null, record.set) - end)).toBeLessThan(1e-9);
      }
    }
  }
});

/** Where U falls across a joint (a fault of the printed fit, listed in its flags) one heat belongs to two temperatures. */
function isInStep(key: string, set: string, temperature: number): boolean {
  return recordsOf(key).some(
    (record) =>
      record.set === set &&
      record.flags.some((flag) => /H step -/.test(flag)) &&
      record.intervals.some(({ to }) => Math.abs(to - temperature) < 30),
  );
}

test("no heat leaves the temperature as it is, to the last bit", () => {
  fc.assert(
    fc.property(fc.double({ min: 200, max: 6000, noNaN: true }), (start) =>
      expect(number("HEAT.FINALTEMP", "CH4", 3, start, 0)).toBe(start),
    ),
  );
});

test("broadcast over a column of heats, an error in its own cell only", () => {
  const column = call("HEAT.FINALTEMP", "N2", 1, 300, [[0], ["10 kJ"], ["much"], [1e9]]);
  expect(column[0]![0]).toBe(300);
  expect(column[1]![0]).toBeGreaterThan(700);
  expect(column[2]![0]).toMatchObject({ code: "#VALUE!" });
  expect(column[3]![0]).toMatchObject({
    code: "#VALUE!",
    message: expect.stringContaining("leads beyond 20000 K, the upper limit of nasa-2002 for N2") as string,
  });
});

test("refusals", () => {
  expect(refusal("HEAT", "N2", undefined, 300, 400)).toContain("The amount is missing");
  expect(refusal("HEAT", "N2", -1, 300, 400)).toBe("#VALUE! Amount -1 is not above zero");
  expect(refusal("HEAT", "N2", "2", 300, 400)).toContain('The amount is the text "2"');
  expect(refusal("HEAT", "N2", "2 bar", 300, 400)).toContain("neither an amount nor a mass");
  expect(refusal("HEAT", "N2", 1, 300, 400, "K")).toContain('The unit "K" does not fit this result');
  expect(refusal("HEAT.FINALTEMP", "N2", 1, 300, "5 bar")).toMatch(/pressure; an energy such as kJ is expected/);
  expect(
    refusal(
      "HEAT",
      [
        ["N2", 1],
        ["O2", -1],
      ],
      null,
      300,
      400,
    ),
  ).toContain("The amount of O2 is -1; amounts are not negative");
});

/** The argument `limit` as cells give it, and the lines of a table about it. */
import { Refusal } from "../../src/core/refusal";
import { constantLimit, curveLimit } from "../../src/core/vessel/limit";
import type { Content } from "../../src/core/vessel/types";
import { CellError } from "../../src/functions/cell";
import { limitLines, limitOf, readLimit } from "../../src/functions/vessel-limit";
import { refusedWith } from "../core/refused";

/** An ideal gas with 1000 Pa/K from 200 K to 1000 K. */
const gas: Content = {
  from: 200,
  to: 1000,
  fromLabel: "nasa-2002 for N2",
  toLabel: "nasa-2002 for N2",
  kinks: [],
  at: (temperature) => ({ temperature, pressure: 1000 * temperature, energy: 0 }),
};

describe("reading", () => {
  test("left out, one value, one value for each state", () => {
    for (const block of [undefined, [[""]], [[null]]]) expect(limitOf(readLimit(block), undefined)).toBeUndefined();
    expect(limitOf(readLimit([["20 bar"]]), "20 bar")!.at(500)).toBe(2e6);
    expect(limitOf(readLimit([[2e6]]), 2e6)!.at(500)).toBe(2e6);
    const column = [["20 bar"], [3e6], [null]];
    expect(readLimit(column)).toEqual({ values: column });
    expect(limitOf(readLimit(column), null)).toBeUndefined();
  });

  test("a curve of numbers or texts, with or without a heading, with blank rows", () => {
    const numbers = readLimit([
      [293.15, 2e6],
      [473.15, 1.5e6],
    ]);
    const texts = readLimit([
      ["temperature", "allowed pressure"],
      ["20 °C", "20 bar"],
      ["", ""],
      ["200 °C", "1.5 MPa"],
    ]);
    for (const { curve, values } of [numbers, texts]) {
      expect(values).toBeUndefined();
      expect([curve!.from, curve!.to, curve!.at(293.15)]).toEqual([293.15, 473.15, 2e6]);
      expect(curve!.at(383.15)).toBeCloseTo(1.75e6, 6);
    }
    expect(limitOf(numbers, undefined)).toBe(numbers.curve);
  });

  test("a heading with the units of plain numbers is taken", () =>
    expect(
      readLimit([
        ["T, K", "p [Pa]"],
        [300, 2e6],
        [400, 1e6],
      ]).curve!.at(350),
    ).toBe(1.5e6));

  const refused = (...block: unknown[][]) => refusedWith(() => readLimit(block));

  test("what is neither a value nor a curve is refused", () => {
    expect(refused([300, 2e6])).toBe(
      "input: The limit is a range of 1 row × 2 columns; give one absolute pressure, a column of them, or two columns temperature | allowed absolute pressure with 2 rows or more",
    );
    expect(refused([300, 400, 500], [2e6, 1e6, 1e6])).toContain("a range of 2 rows × 3 columns");
    expect(refused(["T", "p"], [300, 1e6])).toBe("input: A limit that depends on temperature needs 2 points or more, not 1");
    expect(refused([300, 1e6], [300, 1e6])).toBe("input: The temperatures of the limit must rise from point to point: 300 K follows 300 K");
    expect(refused([300, 1e6], [400, null])).toBe(
      'input: Allowed pressure of the limit is missing: give a number in Pa, or a text such as "20 bar"',
    );
  });

  test("numbers meant in another unit are refused with the way out", () => {
    expect(refused([20, 2e6], [200, 1e6])).toBe(
      'input: Temperature 20 of the limit is a plain number and would be in K: say "20 °C" or "20 K"',
    );
    expect(refused([300, 20], [400, 10])).toBe(
      'range: Allowed pressure of the limit 20 is a plain number and would be in Pa: say "20 bar", "20 MPa" or "20 Pa"; pressures are absolute',
    );
    expect(refused(["T, °C", "p"], [250, 2e6], [350, 1e6])).toBe(
      'input: The heading "T, °C" of the limit names °C, but plain numbers are in K: write "200 °C"',
    );
    expect(refused(["T", "p (kPa)"], [300, 2000], [400, 1000])).toBe(
      'input: The heading "p (kPa)" of the limit names kPa, but plain numbers are in Pa: write "20 bar"',
    );
    expect(refusedWith(() => limitOf(readLimit([[25]]), 25))).toBe(
      'range: Limit 25 is a plain number and would be in Pa: say "25 bar", "25 MPa" or "25 Pa"; pressures are absolute',
    );
    expect(refusedWith(() => limitOf(readLimit([["5 barg"]]), "5 barg"))).toContain("UNITS.ABSOLUTE");
    expect(limitOf(readLimit([["500 Pa"]]), "500 Pa")!.at(300)).toBe(500);
  });

  test("an error cell in a curve comes out unchanged", () => {
    const error = new CellError("#DIV/0!");
    let thrown: unknown;
    try {
      readLimit([
        [300, 1e6],
        [error, 1e6],
      ]);
    } catch (cell) {
      thrown = cell;
    }
    expect(thrown).toBe(error);
  });
});

describe("lines", () => {
  const shown = (limit: Parameters<typeof limitLines>[1], T1: number, T2: number) => {
    const { lines, warnings } = limitLines(gas, limit, T1, T2);
    return { cells: lines.map(({ label, value, unit, note }) => [label, value, unit, note]), warnings };
  };

  test("none without a limit", () => expect(shown(undefined, 300, 400)).toEqual({ cells: [], warnings: [] }));

  test("above T2, no warning", () =>
    expect(shown(constantLimit(8e5), 300, 400)).toEqual({
      cells: [
        ["limit", 8e5, "Pa", "absolute, at T2"],
        ["pressure at T2 / limit", 0.5, "", "both absolute"],
        ["temperature at limit", 800, "K", "the limit there is 800000 Pa; above T2 by 400 K"],
      ],
      warnings: [],
    }));

  test("above 0.9 of the limit, and beyond it", () => {
    expect(shown(constantLimit(4.2e5), 300, 400).warnings).toEqual([
      "The pressure at T2, 400000 Pa, is above 0.9 of the limit of 420000 Pa",
    ]);
    const beyond = shown(constantLimit(3.2e5), 300, 400);
    expect(beyond.warnings).toEqual(["The pressure at T2, 400000 Pa, exceeds the limit of 320000 Pa"]);
    expect(beyond.cells[2]).toEqual(["temperature at limit", 320, "K", "the limit there is 320000 Pa; below T2"]);
  });

  test("already exceeded at the start, not reached at all", () => {
    expect(shown(constantLimit(2e5), 300, 400).cells[2]).toEqual([
      "temperature at limit",
      "already exceeded",
      "K",
      "at 300 K the pressure is 300000 Pa, at the limit or above it",
    ]);
    expect(shown(constantLimit(2e6), 300, 400).cells[2]).toEqual([
      "temperature at limit",
      "not reached",
      "K",
      "looked for from 300 K to 1000 K; the upper limit of nasa-2002 for N2",
    ]);
  });

  const dip = curveLimit([
    { temperature: 300, pressure: 6e5 },
    { temperature: 400, pressure: 3e5 },
    { temperature: 500, pressure: 9e5 },
  ]);

  test("a limit that is passed on the way is told, and one that is exceeded at T1 when cooling begins", () => {
    expect(shown(dip, 300, 500).cells[0]).toEqual(["limit", 9e5, "Pa", "absolute, at T2; straight lines between the points given"]);
    expect(shown(dip, 300, 500).warnings).toEqual(["The limit is reached on the way: at 375 K the pressure is 375000 Pa"]);
    expect(shown(constantLimit(4.5e5), 500, 300).warnings).toEqual(["The pressure at T1, 500000 Pa, exceeds the limit of 450000 Pa there"]);
    // T1 outside the curve: nothing is said of it
    const later = curveLimit([
      { temperature: 300, pressure: 4.5e5 },
      { temperature: 480, pressure: 4.5e5 },
    ]);
    expect(shown(later, 500, 300).warnings).toEqual(["The limit is reached on the way: at 450 K the pressure is 450000 Pa"]);
    expect(shown(constantLimit(5.5e5), 500, 300).warnings).toEqual([]);
  });

  test("a T1 outside the curve is left alone, a T2 outside it is refused", () => {
    expect(shown(dip, 250, 310).cells[2]![1]).toBeCloseTo(375, 9);
    expect(shown(dip, 700, 310).cells[2]![1]).toBeCloseTo(375, 9);
    expect(refusedWith(() => limitLines(gas, dip, 300, 550))).toBe(
      "range: Temperature 550 K is outside 300 K to 500 K, where the limit of the vessel is given",
    );
    expect(() => limitLines(gas, dip, 300, 1100)).toThrow(Refusal);
  });
});

/** CAL.RISE and its report in cells: shapes, units, blanks, and the sentences of what is refused. */
import fc from "fast-check";
import { CellError } from "../../src/functions/cell";
import { riseCells, riseReportCells } from "../../src/functions/rise";
import { EXAMPLE, evenTimes, rounded, temperatureAt } from "../core/calorimeter/rise-model";

type Column = unknown[][];

const TIMES: Column = Array.from(evenTimes(1, 25), (time) => [time]);
const TEMPERATURES: Column = Array.from(evenTimes(1, 25), (time) => [rounded(temperatureAt(EXAMPLE, time))]);
const FIRE = [[5]];
const END = [[15]];

/** Columns side by side. */
function beside(...columns: Column[]): Column {
  return columns[0]!.map((_, row) => columns.flatMap((column) => column[row]!));
}

/** A column with one cell changed; rows count from 1, as in a sheet. */
function withCell(column: Column, row: number, cell: unknown): Column {
  return column.map((cells, index) => (index === row - 1 ? [cell] : cells));
}

function sentence(cell: unknown): string {
  return cell instanceof CellError ? `${cell.code} ${cell.message}` : `not refused: ${String(cell)}`;
}

/** The sentence of a call that gives one error cell. */
function refusal(times: Column, temperatures: Column, fire: Column = FIRE, end?: Column, method?: Column, unit?: Column): string {
  const block = riseCells(times, temperatures, fire, end, method, unit);
  return block.length === 1 && block[0]!.length === 1 ? sentence(block[0]![0]) : `not one cell: ${JSON.stringify(block)}`;
}

function one(
  times: Column,
  temperatures: Column,
  fire: Column = FIRE,
  end: Column | undefined = END,
  method?: Column,
  unit?: Column,
): number {
  const block = riseCells(times, temperatures, fire, end, method, unit);
  if (block.length !== 1 || block[0]!.length !== 1 || typeof block[0]![0] !== "number") throw new Error(sentence(block[0]![0]));
  return block[0]![0];
}

const RISE = one(TIMES, TEMPERATURES);

test("the printed run by every method, end given and found", () => {
  // Computed independently: 2.49951, 2.50008, 2.49985 K (true rise 2.5 K)
  expect(RISE).toBeCloseTo(2.49951, 5);
  expect(one(TIMES, TEMPERATURES, FIRE, END, [["Dickinson"]])).toBeCloseTo(2.50008, 5);
  expect(one(TIMES, TEMPERATURES, FIRE, END, [["dickinson-63"]])).toBeCloseTo(2.49985, 5);
  expect(one(TIMES, TEMPERATURES, FIRE, END, [["adiabatic"]])).toBeCloseTo(2.49766, 5);
  for (const end of [undefined, [[null]], [[""]]]) expect(riseCells(TIMES, TEMPERATURES, FIRE, end)).toEqual([[RISE]]);
});

test("a left-out method or time unit may be blank or 0", () => {
  for (const blank of [undefined, [[null]], [[""]], [[0]], [[" "]]])
    expect(riseCells(TIMES, TEMPERATURES, FIRE, END, blank, blank)).toEqual([[RISE]]);
});

test.each([
  { unit: "s", scale: 60 },
  { unit: "min", scale: 1 },
  { unit: "h", scale: 1 / 60 },
  { unit: "d", scale: 1 / 1440 },
])("times in $unit", ({ unit, scale }) => {
  const scaled = TIMES.map(([time]) => [(time as number) * scale]);
  expect(one(scaled, TEMPERATURES, [[5 * scale]], [[15 * scale]], undefined, [[unit]])).toBeCloseTo(RISE, 10);
});

test("texts carry their unit", () => {
  const texts = TIMES.map(([time]) => [`${(time as number) * 60} s`]);
  const kelvins = TEMPERATURES.map(([each]) => [`${((each as number) + 273.15).toFixed(4)} K`]);
  expect(one(texts, kelvins, [["5 min"]], [["0.25 h"]])).toBeCloseTo(RISE, 10);
  expect(one(withCell(TIMES, 3, "120 s"), withCell(TEMPERATURES, 9, "25.0462 °C"), FIRE, [["900 s"]], undefined, [["min"]])).toBe(RISE);
});

test("clock cells work with the unit d", () => {
  const noon = 46000.5;
  const clock = TIMES.map(([time]) => [noon + (time as number) / 1440]);
  expect(one(clock, TEMPERATURES, [[noon + 5 / 1440]], [[noon + 15 / 1440]], undefined, [["d"]])).toBeCloseTo(RISE, 7);
});

test("many runs: a column each, with shared or own times, firing and end", () => {
  const later = TIMES.map(([time]) => [(time as number) + 3]);
  const warmer = TEMPERATURES.map(([each]) => [(each as number) + 1]);
  const three = beside(TEMPERATURES, warmer, TEMPERATURES);
  const [row, ...rest] = riseCells(TIMES, three, FIRE, END);
  expect(rest).toEqual([]);
  expect(row).toHaveLength(3);
  expect(row![0]).toBe(RISE);
  expect(row![1]).toBeCloseTo(RISE, 10);
  expect(row![2]).toBe(RISE);
  expect(riseCells(TIMES, three, [[5, 5, 5]], [[15, null, "15 min"]])[0]![2]).toBe(RISE);
  expect(riseCells(TIMES, three, FIRE, [[15, 16, 17]])[0]![2]).toBe(one(TIMES, TEMPERATURES, FIRE, [[17]]));
  const own = riseCells(beside(TIMES, later), beside(TEMPERATURES, TEMPERATURES), [[5, 8]], [[15, 18]])[0]!;
  expect(own[0]).toBe(RISE);
  expect(own[1]).toBeCloseTo(RISE, 12);
});

test("a column is the same run alone and among others, whatever stands beside it", () => {
  fc.assert(
    fc.property(
      fc.array(fc.double({ min: -3, max: 3, noNaN: true }), { minLength: 1, maxLength: 6 }),
      fc.boolean(),
      (shifts, breakFirst) => {
        const columns: Column[] = shifts.map((shift) => TEMPERATURES.map(([each]) => [(each as number) + shift]));
        if (breakFirst) columns[0] = withCell(columns[0]!, 4, "x");
        const row = riseCells(TIMES, beside(...columns), FIRE, END)[0]!;
        columns.forEach((column, index) => expect(row[index]).toEqual(riseCells(TIMES, column, FIRE, END)[0]![0]));
      },
    ),
  );
});

test("trailing blanks end a run; its neighbour may be longer", () => {
  const short = TEMPERATURES.map((cells, row) => (row < 21 ? cells : [null]));
  const alone = one(TIMES.slice(0, 21), TEMPERATURES.slice(0, 21));
  expect(alone).not.toBe(RISE);
  expect(riseCells(TIMES, beside(short, TEMPERATURES, short), FIRE, END)).toEqual([[alone, RISE, alone]]);
  // Own times that end with the run, and blank cells below all runs.
  const shortTimes = TIMES.map((cells, row) => (row < 21 ? cells : [""]));
  expect(riseCells(beside(shortTimes, TIMES), beside(short, TEMPERATURES), FIRE, END)).toEqual([[alone, RISE]]);
  expect(one([...TIMES, [null], [""]], [...TEMPERATURES, [null], [undefined]])).toBe(RISE);
});

test("error cells come out unchanged, for their run only", () => {
  const broken = withCell(TEMPERATURES, 9, new CellError("#DIV/0!"));
  const row = riseCells(TIMES, beside(TEMPERATURES, broken), FIRE, END)[0]!;
  expect(row[0]).toBe(RISE);
  expect(sentence(row[1])).toBe("#DIV/0! ");
  expect(sentence(riseCells(TIMES, beside(TEMPERATURES, TEMPERATURES), [[5, new CellError("#N/A")]], END)[0]![1])).toBe("#N/A ");
  expect(riseCells(withCell(TIMES, 2, new CellError("#REF!")), beside(TEMPERATURES, TEMPERATURES), FIRE, END)[0]!.map(sentence)).toEqual([
    "#REF! ",
    "#REF! ",
  ]);
  expect(refusal(TIMES, TEMPERATURES, FIRE, END, [[new CellError("#NAME?")]])).toBe("#NAME? ");
});

describe("refused cells are named by their row", () => {
  test.each([
    [8, null, '#VALUE! Row 8 of the readings: Temperature is missing: give a number in °C, or a text such as "298.15 K"'],
    [1, "t/°C", /^#VALUE! Row 1 of the readings: /],
    [
      8,
      "25.1",
      '#VALUE! Row 8 of the readings: Temperature is the text "25.1", not a number: give a number in °C, or a text such as "298.15 K"',
    ],
    [8, "5 min", /^#VALUE! Row 8 of the readings: Temperature "5 min"/],
    [8, Infinity, "#VALUE! Row 8 of the readings: Temperature is not a finite number in °C"],
    [8, true, '#VALUE! Row 8 of the readings: Temperature is TRUE: give a number in °C, or a text such as "298.15 K"'],
  ])("temperature in row %d: %p", (row, cell, expected) => {
    const found = refusal(TIMES, withCell(TEMPERATURES, row, cell));
    if (expected instanceof RegExp) expect(found).toMatch(expected);
    else expect(found).toBe(expected);
  });

  test("times", () => {
    expect(refusal(withCell(TIMES, 7, null), TEMPERATURES)).toBe(
      '#VALUE! Row 7 of the readings: Time is missing: give a number in min, or a text such as "30 s"',
    );
    expect(refusal(TIMES.slice(0, 20), TEMPERATURES)).toBe("#VALUE! Row 21 of the readings holds a temperature but no time");
    expect(refusal([...TIMES].reverse(), TEMPERATURES)).toBe(
      "#VALUE! Time 24 min in row 2 of the readings comes after 25 min in row 1: times must ascend",
    );
    expect(refusal(withCell(TIMES, 7, 5), TEMPERATURES)).toBe(
      "#VALUE! Time 5 min stands in row 6 and again in row 7 of the readings: every reading needs its own time",
    );
  });

  test("a mistyped reading, by both functions", () => {
    const slip = withCell(TEMPERATURES, 9, 38.03);
    const words = "#VALUE! Temperature 38.03 in row 9 of the readings stands 12.9 K above both neighbours: check the reading";
    expect(refusal(TIMES, slip, FIRE, END)).toBe(words);
    expect(refusal(TIMES, slip)).toBe(words);
    expect(sentence(riseReportCells(TIMES, slip, FIRE)[0]![0])).toBe(words);
  });
});

describe("refused as a whole", () => {
  test("clock times", () => {
    const clock = TIMES.map(([time]) => [(time as number) / 1440]);
    const sentenceOf = (why: string) =>
      `#VALUE! These look like clock times: multiply by 1440, or say the time unit, such as "s" or "d" (as minutes, ${why})`;
    expect(refusal(clock, TEMPERATURES, [[5 / 1440]])).toBe(sentenceOf("all are below 1"));
    expect(refusal(clock, TEMPERATURES, [[5 / 1440]], undefined, undefined, [["min"]])).toBe(sentenceOf("all are below 1"));
    const dated = clock.map(([time]) => [46000.5 + (time as number)]);
    expect(refusal(dated, TEMPERATURES, [[46000.5]])).toBe(sentenceOf("their smallest step is 0.000694"));
    // 0.3 s between readings is 0.005 min.
    const every = (step: number) => TIMES.map(([time]) => [100 + (time as number) * step]);
    expect(refusal(every(0.006), TEMPERATURES, [[100.03]], [[100.09]])).toMatch(/^not refused/);
    expect(refusal(every(0.004), TEMPERATURES, [[100.02]], [[100.06]])).toBe(sentenceOf("their smallest step is 0.004"));
  });

  test("seconds taken for minutes, only where no unit says minutes", () => {
    const seconds = TIMES.map(([time]) => [(time as number) * 60]);
    const words = '#VALUE! These look like seconds: say the time unit "s"; as minutes the record would last 1500 min';
    expect(refusal(seconds, TEMPERATURES, [[300]], [[900]])).toBe(words);
    expect(sentence(riseReportCells(seconds, TEMPERATURES, [[300]])[0]![0])).toBe(words);
    expect(one(seconds, TEMPERATURES, [[300]], [[900]], undefined, [["s"]])).toBeCloseTo(RISE, 10);
    expect(refusal(seconds, TEMPERATURES, [[300]], [[900]], undefined, [["min"]])).toMatch(/^not refused/);
    const texts = seconds.map(([time]) => [`${String(time)} min`]);
    expect(refusal(texts, TEMPERATURES, [["300 min"]], [["900 min"]])).toMatch(/^not refused/);
    // 25 steps of 5 min; of 7.3 min without the limit of the step would be 182.5 min
    const every = (step: number) => TIMES.map(([time]) => [(time as number) * step]);
    expect(refusal(every(5), TEMPERATURES, [[25]], [[75]])).toContain("the record would last 125 min");
    expect(refusal(every(4.9), TEMPERATURES, [[24.5]], [[73.5]])).toMatch(/^not refused/);
    const long = (last: number) => TIMES.map(([time]) => [time === 25 ? last : (time as number)]);
    expect(refusal(long(180), TEMPERATURES, FIRE, END)).toMatch(/^not refused/);
    expect(refusal(long(181), TEMPERATURES, FIRE, END)).toContain("the record would last 181 min");
  });

  test("periods and methods", () => {
    expect(refusal(TIMES, TEMPERATURES, [[30]])).toBe("#VALUE! Firing time 30 min is outside the record, 0 min to 25 min");
    expect(refusal(TIMES, TEMPERATURES, [[null]])).toBe(
      '#VALUE! Firing times are missing: give the time of firing in min, or a text such as "5 min"',
    );
    expect(refusal(TIMES, TEMPERATURES, FIRE, [[0]])).toBe("#VALUE! End of the main period 0 min is not after firing at 5 min");
    expect(refusal(TIMES, TEMPERATURES, FIRE, [[40]])).toBe("#VALUE! End of the main period 40 min is outside the record, 0 min to 25 min");
    expect(refusal(TIMES, TEMPERATURES, [[1]], END)).toContain("holds 2 readings; at least 3 are needed");
    expect(refusal(TIMES.slice(0, 17), TEMPERATURES.slice(0, 17), FIRE, END)).toContain("from 15 min on, holds 2 readings");
    expect(refusal(TIMES.slice(0, 17), TEMPERATURES.slice(0, 17))).toContain("record longer, or give the end");
    expect(refusal(TIMES, TEMPERATURES, FIRE, END, [["graphical"]])).toBe(
      '#VALUE! The method "graphical" is not one of regnault-pfaundler, dickinson, dickinson-63, adiabatic',
    );
    expect(refusal(TIMES, TEMPERATURES, FIRE, END, [["dickinson", "adiabatic"]])).toBe(
      "#VALUE! The method must be one cell, not 1 × 2 cells",
    );
    expect(refusal(TIMES, TEMPERATURES, FIRE, END, undefined, [["K"]])).toContain('Time unit "K"');
    expect(refusal(TIMES, TEMPERATURES, [[6]], END)).toBe(
      "#VALUE! Temperature changes by 1.68 K from row 6 to row 7 of the readings, before firing at 6 min: check the firing time",
    );
  });

  test("a run that does not rise", () => {
    const flat = TEMPERATURES.map(() => [25]);
    expect(refusal(TIMES, flat, FIRE, END)).toMatch(/^#VALUE! The temperature does not rise after firing: it is 25 °C at firing and 25 °C/);
    expect(refusal(TIMES, flat)).toMatch(/^#VALUE! The temperature does not rise after firing/);
  });

  test("shapes that do not belong together", () => {
    const two = beside(TEMPERATURES, TEMPERATURES);
    expect(refusal(TIMES, [TEMPERATURES.flat()])).toBe(
      "#VALUE! The temperatures are one row of 26 cells; readings stand in a column, one column for each run",
    );
    expect(refusal([TIMES.flat()], TEMPERATURES)).toBe(
      "#VALUE! The times are one row of 26 cells; readings stand in a column, one column for each run",
    );
    expect(refusal(beside(TIMES, TIMES, TIMES), two)).toBe(
      "#VALUE! There are 3 columns of times and 2 of temperatures; give one column of times, or one for each run",
    );
    expect(refusal(TIMES, two, [[5], [5]])).toBe(
      "#VALUE! Firing times are 2 rows × 1 column; give one cell, or one row with a cell for each of the 2 runs",
    );
    expect(refusal(TIMES, TEMPERATURES, [[5, 5]])).toBe("#VALUE! Firing times are 1 row × 2 columns; give one cell");
    expect(refusal(TIMES, two, FIRE, [[15, 15, 15]])).toBe(
      "#VALUE! Ends of the main period are 1 row × 3 columns; give one cell, or one row with a cell for each of the 2 runs",
    );
    expect(refusal([[null]], TEMPERATURES)).toBe("#VALUE! The times are missing: give a column of readings");
    expect(refusal(TIMES, [[null], [null]])).toBe("#VALUE! There are no readings");
  });
});

describe("the report", () => {
  const upright = riseReportCells(TIMES, TEMPERATURES, FIRE, END);
  const line = (label: string, block = upright) => block.find(([first]) => first === label)!;

  test("one run stands upright, with units and notes", () => {
    expect(upright.every((row) => row.length === 4)).toBe(true);
    expect(line("corrected rise")).toEqual(["corrected rise", RISE, "K", "regnault-pfaundler"]);
    // Printed digits of the run
    expect(line("raw rise")[1]).toBeCloseTo(2.5117, 4);
    expect(line("correction")[1]).toBeCloseTo(-0.01219, 5);
    expect(line("drift before firing").slice(0, 3)).toEqual(["drift before firing", expect.closeTo(0.0057743, 7), "K/min"]);
    expect(line("drift after the main period")[1]).toBeCloseTo(0.0007082, 7);
    expect(line("cooling constant").slice(1, 3)).toEqual([expect.closeTo(0.0020026, 7), "1/min"]);
    expect(line("convergence temperature").slice(1, 3)).toEqual([expect.closeTo(25.4978, 4), "°C"]);
    expect(line("split time after firing").slice(1)).toEqual([
      expect.closeTo(0.8967, 4),
      "min",
      "Dickinson: 0.60 of the raw rise, linear between readings",
    ]);
    expect(line("resolution of the readings")[1]).toBe(0.0001);
    expect(["before firing", "of the main period", "after"].map((part) => line(`readings ${part}`)[1])).toEqual([6, 9, 11]);
    expect(line("rise by mean rate")).toEqual([
      "rise by mean rate",
      expect.closeTo(2.47929, 5),
      "K",
      "cross-check only, not a reporting method",
    ]);
    expect(line("rise by Regnault-Pfaundler, refined")[1]).toBeCloseTo(2.49988, 5);
    expect(line("warning")[3]).toMatch(/^The first interval after firing lasts 1 min/);
  });

  test("the stated interval holds the true rise of the printed run, with its coverage factor", () => {
    const [, expanded, , note] = line("expanded uncertainty (95 %)");
    expect(Math.abs(RISE - 2.5)).toBeLessThan(expanded as number);
    expect(expanded).toBeLessThan(0.001);
    expect(note).toBe("coverage factor 1.96, effective degrees of freedom more than 1000");
    expect(expanded).toBeCloseTo(1.96 * (line("standard uncertainty of the rise")[1] as number), 6);
  });

  test("the end says whether it was given or found", () => {
    expect(line("end of the main period")).toEqual(["end of the main period", 15, "min", "given"]);
    expect(line("end of the main period", riseReportCells(TIMES, TEMPERATURES, FIRE))).toEqual([
      "end of the main period",
      15,
      "min",
      "found: at least 10 times the 63 % time after firing, less than 0.01 % still to come, steady drift over 5 min or more from there",
    ]);
  });

  test("the same labels for every method and record", () => {
    const labels = (block: unknown[][]) => block.map(([first]) => first).filter((first) => !/^warnings?$/.test(String(first)));
    for (const method of ["dickinson", "dickinson-63", "adiabatic"])
      expect(labels(riseReportCells(TIMES, TEMPERATURES, FIRE, END, [[method]]))).toEqual(labels(upright));
    const withoutMain = (_: unknown, row: number) => row <= 5 || row >= 15;
    const few = riseReportCells(TIMES.filter(withoutMain), TEMPERATURES.filter(withoutMain), FIRE, END, [["adiabatic"]]);
    expect(labels(few)).toEqual(labels(upright));
    expect(line("rise by Dickinson 0.60", few)[1]).toBe("not determined");
  });

  test("several runs: a heading with units, a row for each, refused ones as errors", () => {
    const broken = withCell(TEMPERATURES, 8, null);
    const [heading, first, second, third] = riseReportCells(TIMES, beside(TEMPERATURES, broken, TEMPERATURES), FIRE, [[15, 15, null]]);
    expect(heading!.slice(0, 3)).toEqual(["corrected rise [K]", "standard uncertainty of the rise [K]", "expanded uncertainty (95 %) [K]"]);
    expect(heading!.at(-1)).toBe("warnings");
    expect(first![0]).toBe(RISE);
    expect(sentence(second![0])).toContain("Row 8 of the readings: Temperature is missing");
    expect(third).toEqual(first);
    expect([heading, first, second, third].map((row) => row!.length)).toEqual(Array(4).fill(heading!.length));
  });

  test("no cell of any report is blank, endless or no number", () => {
    for (const row of riseReportCells(TIMES, beside(TEMPERATURES, TEMPERATURES), FIRE))
      for (const cell of row) expect(typeof cell === "string" || Number.isFinite(cell)).toBe(true);
  });

  test("readings that come out without any scatter and drift", () => {
    const exact = TIMES.map(([time]) => [(time as number) <= 5 ? 22 : (time as number) < 8 ? 24 : 24.5]);
    const report = riseReportCells(TIMES, exact, FIRE, END);
    expect(line("corrected rise", report)[1]).toBe(2.5);
    expect(line("cooling constant", report)[1]).toBe(0);
    expect(line("convergence temperature", report)[1]).toBe("not determined");
    expect(line("uncertainty from the readings", report)[1]).toBeGreaterThan(0.1);
  });
});

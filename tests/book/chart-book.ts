/**
 * An invented workbook with charts, written by the sample writer: peak pressure of three fuels over the equivalence ratio, measured and
 * calculated, on one sheet; a second sheet with a chart of the first one's cells; a third without charts.
 */
import { bookBytes } from "../../src/build/sample-writer.mjs";

type Sheets = Parameters<typeof bookBytes>[0];
type Chart = NonNullable<Sheets[number]["charts"]>[number];

export const RATIOS = [0.6, 0.8, 1, 1.2, 1.4];
/** Measured pressures in bar by fuel; the third run of the second fuel was lost. */
export const MEASURED: Readonly<Record<string, readonly (number | null)[]>> = {
  "Fuel A": [5.9, 7.2, 8.1, 8, 7.3],
  "Fuel B": [6.4, 7.8, null, 8.9, 8.2],
  "Fuel C": [5.1, 6.3, 7, 6.9, 6.2],
};
const FIRST_ROW = 4;
const LAST_ROW = FIRST_ROW + RATIOS.length - 1;
const column = (index: number) => String.fromCharCode(66 + index);

/** Columns: A the ratio, then measured (B, D, F) and calculated (C, E, G) of each fuel; calculated are formulas. */
function cells(): Sheets[number]["cells"] {
  const fuels = Object.entries(MEASURED);
  const head = [{ at: "A3", text: "ratio" }, ...fuels.flatMap(([fuel], i) => headOf(fuel, i))];
  const rows = RATIOS.flatMap((ratio, i) => {
    const row = FIRST_ROW + i;
    const values = fuels.flatMap(([, measured], f) => [
      ...(measured[i] == null ? [] : [{ at: `${column(2 * f)}${row}`, number: measured[i] as number }]),
      { at: `${column(2 * f + 1)}${row}`, formula: `ROUND(${9.2 - f * 0.7}-8*(A${row}-1.08)^2,3)` },
    ]);
    return [{ at: `A${row}`, number: ratio }, ...values];
  });
  return [{ at: "A1", text: "An invented series in a closed vessel" }, ...head, ...rows];
}

const headOf = (fuel: string, index: number) => [
  { at: `${column(2 * index)}3`, text: `${fuel}, measured` },
  { at: `${column(2 * index + 1)}3`, text: `${fuel}, calculated` },
];

const range = (letter: string) => `${letter}${FIRST_ROW}:${letter}${LAST_ROW}`;

const pressures: Chart = {
  anchor: "B11:H30",
  title: "Peak pressure, measured & calculated",
  x: { title: "equivalence ratio", from: 0.4, to: 1.6 },
  y: { title: "peak pressure, bar" },
  series: Object.keys(MEASURED).flatMap((_, i): Chart["series"] => {
    const accent = (i + 1) as 1 | 2 | 3;
    const [measured, calculated] = [column(2 * i), column(2 * i + 1)];
    return [
      { name: { cell: `${measured}3` }, x: range("A"), y: range(measured), style: "points", accent },
      { name: { cell: `${calculated}3` }, x: range("A"), y: range(calculated), style: "line", accent },
    ];
  }),
};

const elsewhere: Chart = {
  anchor: "A3:F18",
  title: "Measured against calculated",
  x: { title: "calculated, bar" },
  y: { title: "measured, bar" },
  series: [{ name: "Fuel A", x: `'Test series'!${range("C")}`, y: `'Test series'!${range("B")}`, style: "points", accent: 4 }],
};

export const CHART_SHEETS: Sheets = [
  { name: "Test series", widths: [10, 18, 18, 18, 18, 18, 18], cells: cells(), charts: [pressures] },
  { name: "Comparison", widths: [12], cells: [{ at: "A1", text: "The same numbers, one against the other" }], charts: [elsewhere] },
  { name: "Remarks", widths: [40], cells: [{ at: "A1", text: "No charts here" }] },
];

export const chartBook = (): Uint8Array => bookBytes(CHART_SHEETS);

/** The sample workbooks that come with the page, as assets/samples holds them. */
import type { SampleEntry } from "./bar";

export interface SampleFile extends SampleEntry {
  readonly file: string;
  /** Cell selected at first, 0-based: an empty one, for a first formula. */
  readonly start: { readonly row: number; readonly column: number };
}

export const SAMPLES: readonly SampleFile[] = [
  {
    id: "sealed-vessel",
    file: "sealed-vessel.xlsx",
    start: { row: 2, column: 1 },
    title: "Heat in a sealed vessel",
    note: "Invented example: a small job, its sources, units and mixtures",
  },
  {
    id: "fuel-laboratory",
    file: "fuel-laboratory.xlsx",
    start: { row: 2, column: 1 },
    title: "A fuel laboratory",
    note: "Invented example: calibration, runs, results on every basis, certificate",
  },
  {
    id: "closed-vessel-tests",
    file: "closed-vessel-tests.xlsx",
    start: { row: 2, column: 1 },
    title: "Tests in a closed vessel",
    note: "Invented example: fuels in air from lean to rich, measured and calculated, a dust, a charge in oxygen",
  },
  {
    id: "bottle-store",
    file: "bottle-store.xlsx",
    start: { row: 2, column: 1 },
    title: "A store of gas bottles",
    note: "Invented example: bottles on a hot day, ideal and real, filled by mass, a small autoclave",
  },
];

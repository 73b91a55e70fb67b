/** The sample workbooks that come with the page, as assets/samples holds them. */
import type { SampleEntry } from "./bar";

export const SAMPLES: readonly (SampleEntry & { readonly file: string })[] = [
  {
    id: "sealed-vessel",
    file: "sealed-vessel.xlsx",
    title: "Heat in a sealed vessel",
    note: "Invented example: a small job, its sources, units and mixtures",
  },
];

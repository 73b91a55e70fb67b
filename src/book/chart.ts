/** What the house knows of the charts of a workbook file: scatter charts in full, the kind of all others. The parts stay in the package. */

/** A text of a chart: as the file holds it, and the cell it is taken from, where it is taken from one. */
export interface ChartText {
  readonly text: string;
  /** Formula without `=`: `Sheet1!$B$3`. */
  readonly formula?: string;
}

/** Numbers of a series: a formula without `=` (`Sheet1!$A$2:$A$9`, a name, several ranges in brackets), or values that stand in the chart itself. */
export type ChartNumbers = { readonly formula: string } | { readonly values: readonly (number | null)[] };

export interface ChartSeries {
  readonly name?: ChartText;
  /** Left out: 1, 2, 3 … */
  readonly x?: ChartNumbers;
  readonly y: ChartNumbers;
  /** Whether the points are joined, and whether they are marked; a series that is neither is not to be seen in the file either. */
  readonly line: boolean;
  readonly points: boolean;
  /** Number of the theme's accent colour, 1 to 6, where the series asks for one. */
  readonly accent?: number;
}

export interface ChartAxis {
  readonly title?: ChartText;
  /** Ends that the file fixes. */
  readonly from?: number;
  readonly to?: number;
}

export interface BookChart {
  /** Cells that it covers, `F3:M22`; only the first where the file gives a size instead; undefined for one that stands free of the cells. */
  readonly anchor?: string;
  readonly title?: ChartText;
  readonly x: ChartAxis;
  readonly y: ChartAxis;
  readonly series: readonly ChartSeries[];
}

/** The charts of one sheet, from the top to the bottom. */
export interface SheetCharts {
  readonly sheet: string;
  readonly charts: readonly BookChart[];
  /** Charts that are kept in the file and not read further, by their kind in words: `bar chart`. */
  readonly others: readonly string[];
  /** Parts of the package that hold nothing but these charts and their looks. */
  readonly parts: readonly string[];
}

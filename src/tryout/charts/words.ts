/** A chart in words: what is read out in place of the drawing, the figures as rows, and the sentence for charts that are not drawn. Pure. */
import { shown } from "../../pane/numbers";
import type { Dot, Plot } from "./plot";

/** A number to be read beside a drawing: six digits; the cells have the rest. */
const figure = (value: number) => shown(Number(value.toPrecision(6)));

/** `Peak pressure. Across: ratio, 0.6 to 1.4. Up: bar, 5.1 to 9.15. 6 series, 29 points; the figures stand in the table below.` */
export function labelOf(plot: Plot, name: string): string {
  const dots = plot.series.flatMap(({ dots: all }) => all.filter((dot): dot is Dot => dot !== null));
  const series = `${plot.series.length} series, ${dots.length} ${dots.length === 1 ? "point" : "points"}`;
  if (dots.length === 0) return `${name}. ${series}: there is nothing to draw.`;
  const across = rangeOf(
    "Across",
    plot.xTitle,
    dots.map((dot) => dot.x),
  );
  const up = rangeOf(
    "Up",
    plot.yTitle,
    dots.map((dot) => dot.y),
  );
  return `${name}. ${across} ${up} ${series}; the figures stand in the table below.`;
}

function rangeOf(side: string, title: string, values: readonly number[]): string {
  const [low, high] = [values.reduce((a, b) => Math.min(a, b)), values.reduce((a, b) => Math.max(a, b))];
  return `${side}: ${title ? `${title}, ` : ""}${figure(low)} to ${figure(high)}.`;
}

export interface Figures {
  readonly head: readonly string[];
  readonly rows: readonly (readonly string[])[];
  /** Rows that are not listed, because a table of thousands helps nobody: they stand in the cells. */
  readonly more: number;
}

const MOST_ROWS = 500;
const GAP = "\u2013";

/** One row for each point that is drawn, or whose one number is missing: series that share their x values stand side by side. */
export function figuresOf({ series, xTitle }: Plot): Figures[] {
  const groups: Series[number][][] = [];
  for (const each of series) {
    const group = groups.find((members) => compatible(members, each));
    if (group) group.push(each);
    else groups.push([each]);
  }
  return groups.map((members) => figures(members, xTitle));
}

type Series = Plot["series"];

/** Two series share their places if these are the same wherever both have a point. */
function compatible(members: Series, other: Series[number]): boolean {
  return members.every(
    ({ dots }) => dots.length === other.dots.length && dots.every((dot, i) => !dot || !other.dots[i] || dot.x === other.dots[i]?.x),
  );
}

function figures(members: Series, xTitle: string): Figures {
  const count = members[0]?.dots.length ?? 0;
  const rows = Array.from({ length: count }, (_, i) => {
    const place = members.map(({ dots }) => dots[i]).find((dot) => dot)?.x;
    return place === undefined ? [] : [figure(place), ...members.map(({ dots }) => (dots[i] ? figure(dots[i].y) : GAP))];
  }).filter((row) => row.length > 0);
  return {
    head: [xTitle || "x", ...members.map(({ name }) => name)],
    rows: rows.slice(0, MOST_ROWS),
    more: Math.max(0, rows.length - MOST_ROWS),
  };
}

/** `A bar chart and 2 pie charts on this sheet are kept in the file but not drawn here.`; empty if there are none. */
export function keptSentence(others: readonly string[]): string {
  const kinds = [...new Set(others)].map((kind) => {
    const count = others.filter((other) => other === kind).length;
    return count === 1 ? `${/^[aeiou]/.test(kind) ? "an" : "a"} ${kind}` : `${count} ${kind.replace("chart", "charts")}`;
  });
  if (kinds.length === 0) return "";
  const list = kinds.length === 1 ? kinds[0] : `${kinds.slice(0, -1).join(", ")} and ${kinds[kinds.length - 1]}`;
  const sentence = `${list} on this sheet ${others.length === 1 ? "is" : "are"} kept in the file but not drawn here.`;
  return sentence.charAt(0).toUpperCase() + sentence.slice(1);
}

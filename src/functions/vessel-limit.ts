/**
 * The argument `limit`: the absolute pressure a vessel may have, as one number, one for each state, or a curve of its certificate in two
 * columns, temperature | allowed absolute pressure, with straight lines between its points. And the lines that a table shows about it.
 */
import { CELSIUS_ZERO } from "../core/constants";
import { printed, refuse, refuseRange } from "../core/refusal";
import { dimensionOf, isUnit } from "../core/units";
import { constantLimit, curveLimit, limitReached, type LimitReached, requireInside } from "../core/vessel/limit";
import type { Content, PressureLimit } from "../core/vessel/types";
import { type Expected, quoted, readPressure, readTemperature } from "./arguments";
import { isSingle, shapeOf } from "./broadcast";
import { type Block, type Cell, CellError, isLeftOut, plain } from "./cell";
import { line, type Line } from "./table";

/** The argument before a state is chosen: values, one for each state, or one curve for all of them; neither if it was left out. */
export interface LimitArgument {
  readonly values?: Block;
  readonly curve?: PressureLimit;
}

const LIMIT: Expected = { name: "Limit", unit: "Pa", example: '"20 bar"' };
const CURVE_PRESSURE: Expected = { name: "Allowed pressure of the limit", unit: "Pa", example: '"20 bar"' };
const CURVE_TEMPERATURE: Expected = { name: "Temperature of the limit", unit: "K", example: '"200 °C"' };

/** Plain limits below this, Pa, were meant in another unit. */
const LEAST_PLAIN = 1000;
/** Plain temperatures of a curve below this, K, were perhaps meant in °C. */
const ORDINARY_FROM = CELSIUS_ZERO - 50;

/** Tells values from a curve. Refuses a range that is neither, and a curve that cannot be read. */
export function readLimit(block: Block | undefined): LimitArgument {
  if (block === undefined || isLeftOut(block)) return {};
  if (isSingle(block)) return { values: block };
  const { rows, columns } = shapeOf(block);
  if (columns === 1) return { values: block };
  if (columns === 2 && rows >= 2) return { curve: curveOf(block) };
  return refuse(
    `The limit is a range of ${rows} ${rows === 1 ? "row" : "rows"} × ${columns} columns; give one absolute pressure, a column of them, or two columns temperature | allowed absolute pressure with 2 rows or more`,
  );
}

/** The limit of one state; undefined if it has none. */
export function limitOf({ curve }: LimitArgument, cell: Cell | undefined): PressureLimit | undefined {
  if (curve) return curve;
  if (cell === undefined || cell === null) return undefined;
  return constantLimit(readAllowed(cell, LIMIT));
}

function curveOf(block: Block): PressureLimit {
  const rows = block.map((row) => row.map(plain)).filter((row) => row.some((cell) => cell !== null));
  const error = rows.flat().find((cell) => cell instanceof CellError);
  if (error instanceof CellError) throw error;
  const hasHeading = rows[0] !== undefined && isHeading(rows[0]);
  const points = hasHeading ? rows.slice(1) : rows;
  if (hasHeading) for (const [column, expected] of [CURVE_TEMPERATURE, CURVE_PRESSURE].entries()) requireHeading(rows, column, expected);
  return curveLimit(
    points.map(([temperature, pressure]) => ({
      temperature: readCurveTemperature(temperature),
      pressure: readAllowed(pressure, CURVE_PRESSURE),
    })),
  );
}

/** Two texts without a number. */
function isHeading(row: readonly Cell[]): boolean {
  return row.every((cell) => typeof cell === "string" && !/\d/.test(cell));
}

/** Refuses plain numbers below a heading that names another unit than theirs. */
function requireHeading([heading, ...points]: readonly Cell[][], column: number, { unit, example }: Expected): void {
  const title = String(heading![column]);
  if (!points.some((row) => typeof row[column] === "number")) return;
  const named = title.split(/[\s,;:()[\]/|]+/).find((word) => isUnit(word) && dimensionOf(word) === dimensionOf(unit) && word !== unit);
  if (named !== undefined) refuse(`The heading "${title}" of the limit names ${named}, but plain numbers are in ${unit}: write ${example}`);
}

function readCurveTemperature(cell: Cell | undefined): number {
  const temperature = readTemperature(cell, CURVE_TEMPERATURE);
  if (typeof cell !== "number" || temperature >= ORDINARY_FROM) return temperature;
  return refuse(`Temperature ${quoted(cell)} of the limit is a plain number and would be in K: say "${cell} °C" or "${cell} K"`);
}

function readAllowed(cell: Cell | undefined, expected: Expected): number {
  const pressure = readPressure(cell, expected);
  if (typeof cell !== "number" || pressure >= LEAST_PLAIN) return pressure;
  return refuseRange(
    `${expected.name} ${quoted(cell)} is a plain number and would be in Pa: say "${cell} bar", "${cell} MPa" or "${cell} Pa"; pressures are absolute`,
  );
}

/** Above this share of the limit a table warns. */
const NEAR_LIMIT = 0.9;

/** What a table says about a limit, and where it is reached; undefined for a table without one. */
export interface Limited {
  readonly lines: readonly Line[];
  readonly warnings: readonly string[];
  readonly reached?: LimitReached;
}

/**
 * What a table says about the limit for contents heated or cooled from T1 to T2, K: the limit at T2, the pressure as a share of it, and the
 * lowest temperature, from the lower of the two upwards, at which it is reached. Nothing without a limit. Refuses a T2 outside its curve.
 */
export function limitLines(content: Content, limit: PressureLimit | undefined, T1: number, T2: number): Limited {
  if (limit === undefined) return { lines: [], warnings: [] };
  requireInside(limit, T2);
  const pressure = content.at(T2).pressure;
  const allowed = limit.at(T2);
  const start = Math.max(Math.min(T1, T2), limit.from);
  const reached = limitReached(content, limit, start);
  return {
    lines: [
      line("limit", allowed, "Pa", `absolute, at T2${limit.knots.length > 0 ? "; straight lines between the points given" : ""}`),
      line("pressure at T2 / limit", pressure / allowed, "", "both absolute"),
      reachedLine(reached, start, T2),
    ],
    warnings: limitWarnings({ pressure, allowed, T1, T2 }, reached, exceededAtStart(content, limit, T1)),
    reached,
  };
}

function reachedLine(reached: LimitReached, start: number, T2: number): Line {
  const label = "temperature at limit";
  if (reached.kind === "never")
    return line(label, "not reached", "K", `looked for from ${printed(start)} K to ${printed(reached.to)} K; ${reached.because}`);
  const { kind, temperature, pressure } = reached;
  if (kind === "already")
    return line(
      label,
      "already exceeded",
      "K",
      `at ${printed(temperature)} K the pressure is ${printed(pressure)} Pa, at the limit or above it`,
    );
  return line(label, temperature, "K", `the limit there is ${printed(pressure)} Pa; ${sideText(temperature, T2)}`);
}

function sideText(temperature: number, T2: number): string {
  return temperature > T2 ? `above T2 by ${printed(temperature - T2)} K` : temperature < T2 ? "below T2" : "at T2";
}

/** A vessel that is above its limit at T1 already, as when it is cooled; undefined if it is not, or the limit is not given there. */
function exceededAtStart(content: Content, limit: PressureLimit, T1: number): string | undefined {
  if (T1 < limit.from || T1 > limit.to) return undefined;
  const [pressure, allowed] = [content.at(T1).pressure, limit.at(T1)];
  return pressure > allowed ? `The pressure at T1, ${printed(pressure)} Pa, exceeds the limit of ${printed(allowed)} Pa there` : undefined;
}

function limitWarnings(
  { pressure, allowed, T1, T2 }: { pressure: number; allowed: number; T1: number; T2: number },
  reached: LimitReached,
  atStart: string | undefined,
): string[] {
  const at = `The pressure at T2, ${printed(pressure)} Pa,`;
  const first = atStart === undefined || T1 === T2 ? [] : [atStart];
  if (pressure > allowed) return [...first, `${at} exceeds the limit of ${printed(allowed)} Pa`];
  const near = pressure > NEAR_LIMIT * allowed ? [`${at} is above ${NEAR_LIMIT} of the limit of ${printed(allowed)} Pa`] : [];
  if (first.length > 0) return [...first, ...near];
  if (reached.kind === "never" || reached.temperature >= Math.max(T1, T2)) return near;
  return [...near, `The limit is reached on the way: at ${printed(reached.temperature)} K the pressure is ${printed(reached.pressure)} Pa`];
}

/** The table of duplicate results of samples: whether they agree, what to do next, and the value to report. */
import { agreement } from "../core/fuel/agreement";
import { refuse } from "../core/refusal";
import { criticalRange, precisionOf, rounding, type PrecisionLimit } from "../data/precision";
import { cellAt, isSingle, shapeOf } from "./broadcast";
import { Block, Cell, CellError, cells, isLeftOut, plain } from "./cell";
import { type Measured, readMeasured, SPECIFIC_ENERGY } from "./laboratory";
import { line, Report, tableOf } from "./table";

const REPEATABILITY: Measured = {
  name: "Repeatability",
  unit: "J/g",
  example: '"0.13 MJ/kg" or a method such as "iso-1928"',
  least: "positive",
  below: { limit: 1, units: ["MJ/kg"] },
  above: { limit: 1000, units: ["J/kg"] },
};

/** The limit of repeatability in J/g, and the method it was taken from, if it was named by its id. */
interface Repeatability {
  readonly value: number;
  readonly method?: PrecisionLimit;
}

/** The body of FUEL.AGREE: one sample per row of `values`; `repeatability` is one cell, or a column with one for each row. */
export function agreeCells(values: Block, repeatability: Block): Block {
  return cells(() => {
    if (isLeftOut(values)) refuse("The values are missing: give the results of a sample in one row, 2 to 4 of them");
    const { rows } = shapeOf(values);
    requireFitting(repeatability, rows);
    return tableOf(
      values.map((row, index) => () => report(row, cellAt(repeatability, index, 0), rows === 1 ? "The sample" : `Sample ${index + 1}`)),
    );
  });
}

function requireFitting(repeatability: Block, rows: number): void {
  if (isLeftOut(repeatability) || isSingle(repeatability)) return;
  const own = shapeOf(repeatability);
  if (own.columns > 1 || own.rows !== rows)
    refuse(`The repeatability is ${own.rows} × ${own.columns} cells; give one cell, or one column with a cell for each of ${rows} samples`);
}

function report(row: Block[number], limitCell: Cell | undefined, sample: string): Report {
  const given = row.map(plain).filter((cell) => cell !== null);
  const error = [...given, limitCell].find((cell) => cell instanceof CellError);
  if (error instanceof CellError) throw error;
  if (given.length < 2 || given.length > 4)
    refuse(`${sample} has ${given.length} ${given.length === 1 ? "result" : "results"}; give 2 to 4 in its row`);
  const results = given.map((cell, index) =>
    readMeasured(cell, { ...SPECIFIC_ENERGY, name: `Result ${index + 1} of ${sample.charAt(0).toLowerCase()}${sample.slice(1)}` }),
  );
  const { value, method } = readRepeatability(limitCell);
  return reportOf(agreement(results, value, criticalRange.multiples), value, method);
}

function readRepeatability(cell: Cell | undefined): Repeatability {
  if (typeof cell !== "string" || /^\s*[-+\u2212\u2013.\d]/.test(cell)) return { value: readMeasured(cell, REPEATABILITY) };
  const method = precisionOf(cell);
  return { value: readMeasured(`${method.repeatability} ${method.unit}`, REPEATABILITY), method };
}

function reportOf(found: ReturnType<typeof agreement>, repeatability: number, method: PrecisionLimit | undefined): Report {
  const { count, agrees, verdict } = found;
  const multiple = criticalRange.multiples[count - 2]!;
  const whose = method ? `${method.title}, ${method.what}` : "as given";
  const unit = method?.unit === "MJ/kg" || method?.unit === "Btu_IT/lb" ? method.unit : "J/g";
  return {
    lines: [
      line("number of results", count),
      line("mean", found.mean, "J/g"),
      line("range", found.range, "J/g", "highest - lowest"),
      line("repeatability", repeatability, "J/g", whose),
      line(
        "allowed range",
        found.allowed,
        "J/g",
        `${multiple === 1 ? "" : `${multiple} times `}the repeatability (ISO 5725-6, from memory)`,
      ),
      line("verdict", verdict),
      line("value to report", found.report ?? "none yet", "J/g", roundingNote(unit)),
      line("reported as", found.reportedAs),
    ],
    warnings: [
      ...(agrees ? [] : [`The results do not agree: ${verdict}`]),
      ...(method?.fromMemory
        ? [`The repeatability of ${method.id} is from memory, and printed figures in circulation differ: check your edition`]
        : []),
    ],
  };
}

/** How a method of J/g rounds; methods in other units round after the conversion. */
function roundingNote(unit: keyof typeof rounding): string {
  return unit === "J/g" ? `round it ${rounding[unit]}` : `round it after the conversion, ${rounding[unit]}`;
}

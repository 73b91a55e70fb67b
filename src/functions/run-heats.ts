/** Runs with their extraneous heats: one row of heats for each run, its columns added, spread beside the other values of the run. */
import { energyEquivalent } from "../core/calorimeter/energy-equivalent";
import { grossValue } from "../core/calorimeter/gross-value";
import { printed, Refusal, refuse } from "../core/refusal";
import { benzoicAcid, sootHeat } from "../data/calorimetry";
import { readNumber } from "./arguments";
import { commonShape, type Named, shapeOf, spread } from "./broadcast";
import { Block, Cell, CellError, cells, finite, isLeftOut, plain } from "./cell";
import { EQUIVALENT, HEAT_RELEASED, type Measured, readMeasured, readMeasuredOr, RISE, SAMPLE_MASS, SPECIFIC_ENERGY } from "./laboratory";

/** No certified substance has less; figures in calories or Btu do. */
const LEAST_CERTIFIED = 12_000;
const CERTIFIED: Measured = {
  ...SPECIFIC_ENERGY,
  name: "Certified value",
  below: [
    { limit: 100, units: ["MJ/kg"] },
    { limit: LEAST_CERTIFIED, units: ["cal_th/g", "cal_IT/g", "Btu_IT/lb"] },
  ],
};
const SULFUR_HEAT: Measured = { ...HEAT_RELEASED, name: "Heat of sulfuric acid" };
const SOOT: Measured = { name: "Soot", unit: "g", example: '"0.5 mg"', least: "zero" };

/** Farther from 1 than any condition factor: a percentage, or another quantity. */
const FARTHEST_FACTOR = 0.01;

export function equivalentCells(mass: Block, certified: Block, rise: Block, heats?: Block, factor?: Block): Block {
  return eachRun(
    heats,
    [
      ["mass", mass],
      ["certified", certified],
      ["rise", rise],
      ["factor", factor],
    ],
    (added, [massCell, certifiedCell, riseCell, factorCell]) =>
      energyEquivalent(
        readMeasured(massCell, SAMPLE_MASS),
        readCertified(certifiedCell),
        readMeasured(riseCell, RISE),
        added.sum,
        readFactor(factorCell),
      ),
  );
}

/** How near to benzoic acid's energy between standard states a value must be to be taken for it, J/g. */
const NEAR = 0.5;

function readCertified(cell: Cell | undefined): number {
  const value = readMeasured(cell, CERTIFIED);
  if (Math.abs(value - benzoicAcid.standardState) > NEAR) return value;
  return refuse(
    `Certified value ${printed(value)} J/g is the energy of benzoic acid between standard states; a calorimeter is calibrated with the value under the conditions of the certificate, such as ${benzoicAcid.certified} J/g`,
  );
}

function readFactor(cell: Cell | undefined): number {
  if (cell === undefined || cell === null) return 1;
  const factor = readNumber(cell, "The condition factor");
  if (Math.abs(factor - 1) <= FARTHEST_FACTOR) return factor;
  throw new Refusal(
    "range",
    `The condition factor ${printed(factor)} is not within ${FARTHEST_FACTOR} of 1; CAL.CERTIFICATE gives it, such as 1.0002`,
  );
}

export function grossCells(equivalent: Block, rise: Block, mass: Block, heats?: Block, sulfurHeat?: Block, soot?: Block): Block {
  return eachRun(
    heats,
    [
      ["equivalent", equivalent],
      ["rise", rise],
      ["mass", mass],
      ["sulfur_heat", sulfurHeat],
      ["soot", soot],
    ],
    (added, [equivalentCell, riseCell, massCell, sulfurCell, sootCell]) => {
      const sulfur = readMeasuredOr(sulfurCell, SULFUR_HEAT, 0);
      requireOnce(sulfurCell, added.each);
      return grossValue(
        {
          equivalent: readMeasured(equivalentCell, EQUIVALENT),
          rise: readMeasured(riseCell, RISE),
          mass: readMeasured(massCell, SAMPLE_MASS),
          heats: added.sum,
          sulfurHeat: sulfur,
          soot: readMeasuredOr(sootCell, SOOT, 0),
        },
        sootHeat,
      );
    },
  );
}

/** Heats nearer than this share are the same number, rounded. */
const SAME_HEAT = 0.001;

/**
 * The same plain number among the heats and as sulfur heat is a range that takes in the sulfur column: the sulfur would be deducted twice.
 * A heat that happens to be equal is written as a text.
 */
function requireOnce(sulfur: Cell | undefined, heats: readonly Cell[]): void {
  if (typeof sulfur !== "number" || !(sulfur > 0)) return;
  if (heats.some((heat) => typeof heat === "number" && Math.abs(heat / sulfur - 1) < SAME_HEAT))
    refuse(
      `The heat of sulfuric acid ${printed(sulfur)} J also stands among the heats of this run: sulfur would be deducted twice; if it is another heat, write that as the text "${printed(sulfur)} J"`,
    );
}

interface Heats {
  readonly each: readonly Cell[];
  readonly sum: number;
}

/** Hands each run its heats and its other values. Heats of several rows are one row for each run of a column. */
function eachRun(heats: Block | undefined, others: readonly Named[], value: (heats: Heats, cells: (Cell | undefined)[]) => number): Block {
  return cells(() => {
    if (heats === undefined || isLeftOut(heats)) return spread(others, (values) => finite(value({ each: [], sum: 0 }, values)));
    requireColumns(heats, others);
    // The heats of a run travel as one cell: the number of their row, so that they spread as every other value does.
    const rows: Block = heats.map((_, row) => [row]);
    return spread([["heats", rows], ...others], ([row, ...values]) => finite(value(heatsOf(heats[row as number]!), values)));
  });
}

function requireColumns(heats: Block, others: readonly Named[]): void {
  const { rows, columns } = commonShape(others);
  if (rows === 1 && columns === 1 && shapeOf(heats).rows > 1) {
    refuse(
      `Heats of one run stand in one row, its columns added; ${shapeOf(heats).rows} rows would be as many runs: give the heats in a row, or the other values in as many rows`,
    );
  }
  if (columns > 1 && shapeOf(heats).columns > 1) {
    refuse(
      `Heats are one row for each run, their columns added; the runs stand in ${rows} ${rows === 1 ? "row" : "rows"} × ${columns} columns: give the runs as one column`,
    );
  }
}

function heatsOf(row: Block[number]): Heats {
  const each = row.map(plain);
  const error = each.find((cell) => cell instanceof CellError);
  if (error instanceof CellError) throw error;
  return { each, sum: each.reduce<number>((sum, cell) => sum + readMeasuredOr(cell, HEAT_RELEASED, 0), 0) };
}

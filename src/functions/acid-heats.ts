/** Acids of a run: their heats in a convention, the balance of both conventions, and the double titration. */
import { acidBalance, type AcidConvention, type AcidHeats, nitricHeat, sulfuricHeat } from "../core/calorimeter/acids";
import { acidsByTitration, type TitrationConcentrations } from "../core/calorimeter/titration";
import { printed, refuse, refuseRange } from "../core/refusal";
import { acidMolarHeats, titration } from "../data/calorimetry";
import { atomicWeights } from "../data/library";
import { readText } from "./arguments";
import { type Named, spread } from "./broadcast";
import { Block, Cell, cells, finite } from "./cell";
import { CONCENTRATION, MOLAR_HEAT, type Measured, readMeasured, readMeasuredOr, readPercent, SAMPLE_MASS, TITRANT } from "./laboratory";
import { listOf } from "./lists";
import { line, type Report, table } from "./table";

const SULFUR = atomicWeights.get("S")!;

const BARIUM: Measured = { ...TITRANT, name: "Volume of barium hydroxide" };
const HYDROCHLORIC: Measured = { ...TITRANT, name: "Volume of hydrochloric acid" };
const CARBONATE: Measured = { ...TITRANT, name: "Volume of sodium carbonate" };
const NITRIC_HEAT: Measured = { ...MOLAR_HEAT, name: "Molar heat of nitric acid" };
const SULFURIC_HEAT: Measured = { ...MOLAR_HEAT, name: "Molar heat of sulfuric acid", example: '"301.7 kJ/mol"' };
/** Molar heats in use, J/mol: 57 to 61 kJ for nitric, 297 to 303 kJ for sulfuric acid; what is far off is another quantity. */
const NITRIC_SPAN = [40_000, 80_000] as const;
const SULFURIC_SPAN = [250_000, 350_000] as const;

function readMolarHeat(cell: Cell | undefined, measured: Measured, [least, most]: readonly [number, number], usual: number): number {
  const value = readMeasuredOr(cell, measured, usual);
  if (value >= least && value <= most) return value;
  return refuseRange(`${measured.name} ${printed(value)} J/mol is outside ${least} to ${most} J/mol; the usual one is ${usual} J/mol`);
}

const ALL_ACID: Measured = { ...TITRANT, name: "Total acid" };

export function nitricCells(volume: Block, concentration: Block, molarHeat?: Block): Block {
  return spread(
    [
      ["volume", volume],
      ["concentration", concentration],
      ["molar_heat", molarHeat],
    ],
    ([volumeCell, concentrationCell, heatCell]) =>
      finite(
        nitricHeat(
          readMeasured(volumeCell, TITRANT),
          readMeasured(concentrationCell, CONCENTRATION),
          readMolarHeat(heatCell, NITRIC_HEAT, NITRIC_SPAN, acidMolarHeats.nitric),
        ),
      ),
  );
}

export function sulfuricCells(sulfur: Block, mass: Block, convention: Block, molarHeat?: Block): Block {
  return spread(
    [
      ["sulfur_percent", sulfur],
      ["mass", mass],
      ["convention", convention],
      ["molar_heat", molarHeat],
    ],
    ([sulfurCell, massCell, conventionCell, heatCell]) =>
      finite(
        sulfuricHeat(
          readPercent(sulfurCell, "Sulfur"),
          readMeasured(massCell, SAMPLE_MASS),
          readConvention(conventionCell),
          heatsWith(readMolarHeat(heatCell, SULFURIC_HEAT, SULFURIC_SPAN, acidMolarHeats.sulfuric)),
        ),
      ),
  );
}

function heatsWith(sulfuric: number): AcidHeats {
  return { nitric: acidMolarHeats.nitric, sulfuric, sulfurMolarMass: SULFUR };
}

function readConvention(cell: Cell | undefined): AcidConvention {
  const text = readText(cell, "convention");
  const folded = text?.toLowerCase();
  if (folded === "separated" || folded === "total") return folded;
  const words = '"separated" (nitric and sulfuric acid determined apart) or "total" (all acid titrated as nitric)';
  return refuse(text === undefined ? `The convention is missing: say ${words}` : `The convention "${text}" is not ${words}`);
}

export function acidsCells(totalAcid: Block, concentration: Block, sulfur: Block, mass: Block, convention: Block): Block {
  const named: readonly Named[] = [
    ["total_acid", totalAcid],
    ["concentration", concentration],
    ["sulfur_percent", sulfur],
    ["mass", mass],
    ["convention", convention],
  ];
  return table(named, ([acidCell, concentrationCell, sulfurCell, massCell, conventionCell]) => {
    const [percent, grams] = [readPercent(sulfurCell, "Sulfur"), readMeasured(massCell, SAMPLE_MASS)];
    return balanceReport(
      acidBalance(
        readMeasured(acidCell, ALL_ACID),
        readMeasured(concentrationCell, CONCENTRATION),
        percent,
        grams,
        heatsWith(acidMolarHeats.sulfuric),
      ),
      grams,
      readConvention(conventionCell),
    );
  });
}

function balanceReport(balance: ReturnType<typeof acidBalance>, mass: number, convention: AcidConvention): Report {
  const { totalAcid, sulfuricAcid, nitricAcid, separated, total, countedTwice } = balance;
  const chosen = convention === "separated" ? separated : total;
  const other = convention === "separated" ? "total" : "separated";
  return {
    lines: [
      line("heat for the column of heats", chosen.nitric, "J", convention === "separated" ? "nitric acid alone" : "all acid, as if nitric"),
      line(
        "heat for sulfur_heat",
        chosen.sulfuric,
        "J",
        convention === "separated" ? "full heat of sulfuric acid" : "excess of sulfuric over nitric acid",
      ),
      line("convention", convention, "", "one convention for calibration and samples"),
      line("all acid", 1000 * totalAcid, "mmol", "as H+"),
      line("sulfuric acid", 1000 * sulfuricAcid, "mmol", "from the sulfur content"),
      line("nitric acid", 1000 * nitricAcid, "mmol", "the rest"),
      line(
        "both heats, separated, per gram of sample",
        (separated.nitric + separated.sulfuric) / mass,
        "J/g",
        "both conventions deduct the same",
      ),
      line("both heats, total, per gram of sample", (total.nitric + total.sulfuric) / mass, "J/g", "both conventions deduct the same"),
      line(
        "gross value too low by, if deducted twice",
        countedTwice / mass,
        "J/g",
        "all acid as nitric and the full heat of sulfuric acid",
      ),
      line("gross value too high by, if deducted in part", countedTwice / mass, "J/g", "nitric acid alone and the excess only"),
    ],
    warnings:
      countedTwice > 0 ? [`Never add a heat of the convention "${other}" to these: sulfur would be deducted twice, or not in full`] : [],
  };
}

export function titrationCells(barium: Block, acid: Block, carbonate?: Block, concentrations?: Block): Block {
  return cells(() => {
    const strengths = readConcentrations(concentrations);
    return table(
      [
        ["barium", barium],
        ["acid", acid],
        ["carbonate", carbonate],
      ],
      ([bariumCell, acidCell, carbonateCell]) =>
        titrationReport(
          acidsByTitration(
            {
              barium: readMeasured(bariumCell, BARIUM),
              acid: readMeasured(acidCell, HYDROCHLORIC),
              carbonate: readMeasuredOr(carbonateCell, CARBONATE, titration.carbonateVolume),
            },
            strengths,
          ),
        ),
    );
  });
}

function titrationReport({ nitric, sulfuric }: { nitric: number; sulfuric: number }): Report {
  return {
    lines: [
      line("heat of nitric acid", (nitric * acidMolarHeats.nitric) / 1000, "J", 'convention "separated": a heat for the column of heats'),
      line("heat of sulfuric acid", (sulfuric * acidMolarHeats.titratedSulfuric) / 1000, "J", 'convention "separated": for sulfur_heat'),
      line("nitric acid", nitric, "mmol"),
      line("sulfuric acid", sulfuric, "mmol"),
      line("sulfur in the washings", sulfuric * SULFUR, "mg"),
    ],
    warnings: [],
  };
}

/** Concentrations of barium hydroxide, sodium carbonate and hydrochloric acid, mol/L: all three, or left out for the usual ones. */
function readConcentrations(block: Block | undefined): TitrationConcentrations {
  const given = listOf(block, "concentrations");
  if (given.length === 0) return titration;
  if (given.length !== 3)
    return refuse(`Concentrations: ${given.length}; give three: barium hydroxide, sodium carbonate, hydrochloric acid, in mol/L`);
  const names = ["barium hydroxide", "sodium carbonate", "hydrochloric acid"];
  const [barium, carbonate, acid] = given.map((cell, i) => readMeasured(cell, { ...CONCENTRATION, name: `Concentration of ${names[i]}` }));
  return { barium: barium!, carbonate: carbonate!, acid: acid! };
}

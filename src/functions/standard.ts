/**
 * The table of CAL.STANDARD: from the heat of the process in an oxygen vessel to the reaction between standard states at 25 °C.
 * The family file holds the worksheet function; here is what it reads and which form it takes. The lines are in standard-lines.ts.
 */
import { percentCorrection, threeTerms } from "../core/calorimeter/standard-state/approximate";
import { standardReduction } from "../core/calorimeter/standard-state/reduction";
import { pressureAtReference, type VesselRun } from "../core/calorimeter/standard-state/states";
import { printed, Refusal, refuse } from "../core/refusal";
import { combustionOf } from "../core/reaction/combustion";
import { benzoicAcid } from "../data/calorimetry";
import { percentFigures, standardState } from "../data/standard-state";
import { hill } from "../core/species/formula";
import { readText } from "./arguments";
import type { Block, Cell } from "./cell";
import { type Compound, OXYGEN_MASS, oxygenWarning, readCompound } from "./combustion";
import {
  DENSITY,
  type Measured,
  OXYGEN_PRESSURE,
  readMeasured,
  readMeasuredOr,
  SAMPLE_MASS,
  SPECIFIC_ENERGY,
  TEMPERATURE_CELSIUS,
  VESSEL_VOLUME,
  WATER_MASS,
} from "./laboratory";
import { fullLines, percentLines, threeTermLines } from "./standard-lines";
import { type Report, table } from "./table";

const FORMS = ["full", "three-term", "percent"] as const;
type Form = (typeof FORMS)[number];

const acid = (name: string): Measured => ({
  name,
  unit: "mol",
  example: '"0.7 mmol"',
  least: "zero",
  above: { limit: 0.005, units: ["mmol"] },
});
const NITRIC = acid("Nitric acid");
const SULFURIC = acid("Sulfuric acid");

/** Temperatures at which an oxygen vessel is used, °C. */
const COLDEST = 0;
const HOTTEST = 60;

/**
 * Upright table, or one row for each of a column of states. Plain units J/g, g, mL, g, MPa, mol, mol, °C, g/cm3.
 *
 * specific_energy: heat given off by the isothermal process in the vessel for each gram (mass in vacuum), positive, ignition, fuses and aids
 * already deducted. nitric_mol and sulfuric_mol are the acids formed whose heat is still in specific_energy; left out, none is: so a
 * laboratory that has deducted the nitric heat (and sulfur to SO2) leaves them out. With sulfuric_mol the result refers to H2SO4 in 115 H2O,
 * and a line gives it for SO2(g). temperature: of the process, and of the oxygen pressure; left out 25 °C.
 * form: `full` (left out), `three-term`, `percent`.
 */
export function standardCells(
  formula: Block,
  specificEnergy: Block,
  mass: Block,
  volume: Block,
  water: Block,
  pressure: Block,
  nitric?: Block,
  sulfuric?: Block,
  temperature?: Block,
  density?: Block,
  form?: Block,
): Block {
  return table(
    [
      ["formula", formula],
      ["specific_energy", specificEnergy],
      ["mass", mass],
      ["volume", volume],
      ["water", water],
      ["pressure", pressure],
      ["nitric_mol", nitric],
      ["sulfuric_mol", sulfuric],
      ["temperature", temperature],
      ["density", density],
      ["form", form],
    ],
    (values) => {
      const compound = readCompound(values[0]);
      return report(compound, readRun(compound, values), readForm(values[10]));
    },
  );
}

function readRun({ formula, molarMass }: Compound, values: readonly (Cell | undefined)[]): VesselRun {
  const density = readMeasuredOr(values[9], DENSITY, undefined);
  return {
    formula,
    molarMass,
    specificEnergy: readMeasured(values[1], SPECIFIC_ENERGY),
    mass: readMeasured(values[2], SAMPLE_MASS),
    volume: readMeasured(values[3], VESSEL_VOLUME),
    water: readMeasured(values[4], WATER_MASS),
    pressure: readMeasured(values[5], OXYGEN_PRESSURE),
    nitric: readMeasuredOr(values[6], NITRIC, 0),
    sulfuric: readMeasuredOr(values[7], SULFURIC, 0),
    temperature: vesselTemperature(readMeasuredOr(values[8], TEMPERATURE_CELSIUS, 25)),
    ...(density === undefined ? {} : { density }),
  };
}

function vesselTemperature(celsius: number): number {
  if (celsius >= COLDEST && celsius <= HOTTEST) return celsius;
  throw new Refusal(
    "range",
    `Temperature ${printed(celsius)} °C is outside ${COLDEST} °C to ${HOTTEST} °C; temperatures in kelvin are written "298.15 K"`,
  );
}

function readForm(cell: Cell | undefined): Form {
  const text =
    readText(cell, "form")
      ?.toLowerCase()
      .replace(/[\s\u2010-\u2015]+/g, "-") ?? "full";
  return FORMS.find((form) => form === text) ?? refuse(`"${text}" is not a form of the reduction; the forms are ${FORMS.join(", ")}`);
}

function report(compound: Compound, run: VesselRun, form: Form): Report {
  if (form === "full") {
    const reduction = standardReduction(run, standardState);
    const { before } = reduction;
    const supply = (before.oxygenGas + before.oxygenDissolved) / before.oxygenNeeded;
    return {
      lines: fullLines(run, reduction),
      warnings: [
        ...largeCorrection(run, reduction.energy),
        ...supplyWarning(supply),
        ...drynessWarning(run, before),
        ...warnings(compound, run),
      ],
    };
  }
  const lines =
    form === "three-term" ? threeTermLines(run, threeTerms(run, standardState)) : percentLines(run, percentCorrection(run, percentFigures));
  return { lines, warnings: [`The form ${form} is approximate; not for publication`, ...beyondShort(run), ...warnings(compound, run)] };
}

/** Corrections larger than this share of the value come from a mistyped amount. */
const LARGEST = 0.005;

function largeCorrection({ mass, specificEnergy }: VesselRun, energy: number): string[] {
  const share = -energy / mass / specificEnergy - 1;
  if (Math.abs(share) <= LARGEST) return [];
  return [
    `The correction is ${printed(Number((100 * share).toPrecision(3)))} % of the value, usual ones are below ${100 * LARGEST} %: check acids, water, pressure and mass`,
  ];
}

/** Oxygen of a charge by rule: at least twice what complete combustion needs. */
const LEAST_SUPPLY = 2;

function supplyWarning(supply: number): string[] {
  if (supply >= LEAST_SUPPLY) return [];
  return [
    `The vessel holds ${printed(supply)} times the oxygen that is needed; below ${LEAST_SUPPLY} times, combustion may stay incomplete`,
  ];
}

function drynessWarning({ water }: VesselRun, { saturated }: { readonly saturated: boolean }): string[] {
  if (saturated) return [];
  return [
    `${printed(water)} g of water do not saturate the gas before the combustion; the water formed evaporates instead, which the terms count, but the vessel must have been as dry as that`,
  ];
}

/** The short forms are written for C, H and O at 25 °C. */
function beyondShort({ formula, temperature }: VesselRun): string[] {
  const others = ["N", "S"].filter((element) => formula.counts.has(element));
  const found =
    others.length === 0 ? [] : [`The short forms are written for compounds of C, H and O; this one holds ${others.join(" and ")}`];
  if (temperature !== 25) found.push(`The short forms hold at 25 °C; ${printed(temperature)} °C is not corrected for`);
  return found;
}

/** Usual oxygen pressures, MPa: 20 to 40 atm. */
const USUAL_PRESSURE = { least: 2, most: 4.1 };
const NEAR_REFERENCE = 5;

/** Values of benzoic acid that are none of a vessel's process weighed in vacuum, J/g. */
const MISTAKEN = [
  { value: benzoicAcid.standardState, words: "the energy between standard states: it would be reduced twice" },
  { value: benzoicAcid.inAir, words: "the certified value for mass in air: give mass and value in vacuum" },
];
const NEAR = 1;

function mistaken({ formula }: Compound, { specificEnergy }: VesselRun): string[] {
  const found = hill(formula) === benzoicAcid.formula && MISTAKEN.find(({ value }) => Math.abs(value - specificEnergy) <= NEAR);
  return found ? [`${printed(specificEnergy)} J/g looks like ${found.words}`] : [];
}

function warnings(compound: Compound, run: VesselRun): string[] {
  const { formula, molarMass } = compound;
  const { oxygen, sulfurDioxide } = combustionOf(formula);
  const pressure = pressureAtReference(run);
  const found = [...mistaken(compound, run), ...oxygenWarning((run.specificEnergy * molarMass) / 1000 / (oxygen * OXYGEN_MASS))];
  if (pressure < USUAL_PRESSURE.least || pressure > USUAL_PRESSURE.most)
    found.push(
      `Oxygen of ${printed(pressure)} MPa is outside ${USUAL_PRESSURE.least} MPa to ${USUAL_PRESSURE.most} MPa, where the figures of the reduction were proved`,
    );
  if (Math.abs(run.temperature - 25) > NEAR_REFERENCE)
    found.push(
      `${printed(run.temperature)} °C is more than ${NEAR_REFERENCE} K from 25 °C; the correction rests on a usual heat capacity of the compound`,
    );
  if (sulfurDioxide > 0) found.push(...sulfurWarnings(run, (run.mass / molarMass) * sulfurDioxide));
  return found;
}

/** Shares of acid that are taken for all of the sulfur. */
const ALL = 0.98;

function sulfurWarnings({ sulfuric }: VesselRun, sulfur: number): string[] {
  const found = ["Compounds of sulfur need a rotating vessel, which makes the acid uniform (common practice)"];
  if (sulfuric < ALL * sulfur)
    found.push(
      `${printed(sulfur - sulfuric)} mol of sulfur count as SO2(g), whose deviations from the ideal gas and solubility are not counted`,
    );
  return found;
}

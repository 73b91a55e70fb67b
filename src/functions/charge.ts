/** The check of an oxygen vessel's charge before firing, with the cautions that belong to it. */
import { type ChargeCheck, type ChargePart, checkCharge } from "../core/calorimeter/charge";
import { refuse } from "../core/refusal";
import { combustionOf } from "../core/reaction/combustion";
import { chargeRules } from "../data/calorimetry";
import { atomicWeights } from "../data/library";
import { quoted } from "./arguments";
import { Block, Cell, cells } from "./cell";
import { type Measured, OXYGEN_PRESSURE, readMeasured, SAMPLE_MASS, SPECIFIC_ENERGY, VESSEL_VOLUME } from "./laboratory";
import { oxygenWarning, readCompound } from "./combustion";
import { listOf, singleCell } from "./lists";
import { line, type Report, SEE_NOTE, tableOf } from "./table";

const OXYGEN = 2 * atomicWeights.get("O")!;

const ENERGY_LIMIT: Measured = {
  name: "Energy limit of the vessel",
  unit: "J",
  example: '"33 kJ"',
  least: "positive",
  below: { limit: 100, units: ["kJ"] },
};
const PRESSURE_LIMIT: Measured = { ...OXYGEN_PRESSURE, name: "Oxygen-pressure limit of the vessel" };

/** Cautions that stand under every check. Common practice; they defer to the vessel's certificate and to local rules. */
const CAUTIONS = [
  "The certificate of the vessel, its retest interval, local codes and licensed practice govern; this table does not replace them",
  "No oil or grease on oxygen parts; stay clear of the vessel while it is fired",
  "Release the gas slowly under a hood: it can hold carbon monoxide, nitrogen oxides and sulfur dioxide",
  "No explosives, and no volatile or fast-burning samples without a barricade; first charges of unknown samples are small",
];

export function chargeCells(
  masses: Block,
  specificEnergies: Block,
  pressure: Block,
  volume: Block,
  energyLimit: Block,
  pressureLimit: Block,
  formula?: Block,
  unknown?: Block,
): Block {
  return cells(() => {
    const parts = readParts(listOf(masses, "masses"), listOf(specificEnergies, "specific energies"), readFormulas(formula));
    const oxygenPressure = readMeasured(singleCell(pressure, "pressure"), OXYGEN_PRESSURE);
    const limits = {
      energy: readMeasured(singleCell(energyLimit, "energy_limit"), ENERGY_LIMIT),
      pressure: readMeasured(singleCell(pressureLimit, "pressure_limit"), PRESSURE_LIMIT),
    };
    const vessel = readMeasured(singleCell(volume, "volume"), VESSEL_VOLUME);
    const check = checkCharge(parts, oxygenPressure, vessel, limits, readUnknown(unknown), chargeRules, OXYGEN);
    return tableOf([() => reportOf(check, oxygenPressure, parts)]);
  });
}

/** Oxygen for complete combustion, mol for each gram. What carries all the oxygen it needs is refused as the danger it is. */
function oxygenPerGram(text: string): number {
  const { formula, molarMass } = readCompound(text);
  const { counts } = formula;
  const needed = (counts.get("C") ?? 0) + (counts.get("H") ?? 0) / 4 + (counts.get("S") ?? 0);
  if (needed > 0 && (counts.get("O") ?? 0) / 2 >= needed)
    refuse(`${text} carries all the oxygen it needs, as explosives do: do not fire it`);
  return combustionOf(formula).oxygen / molarMass;
}

/** The warning that a part's formula and its specific energy do not belong together. */
function contradiction({ specificEnergy, oxygenPerGram }: ChargePart): string[] {
  return oxygenPerGram === undefined ? [] : oxygenWarning(specificEnergy / 1000 / (oxygenPerGram * OXYGEN));
}

/** A part for each mass; a row whose mass and energy are both blank is no part. */
function readParts(masses: readonly Cell[], energies: readonly Cell[], formulas: readonly Cell[]): ChargePart[] {
  if (masses.length > 0 && energies.length === 0) return refuse("The specific energies are missing: give one for each mass, in J/g");
  if (masses.length !== energies.length)
    return refuse(`Masses: ${masses.length}, specific energies: ${energies.length}; give as many of one as of the other`);
  if (formulas.length > 1 && formulas.length !== masses.length)
    return refuse(`Formulas: ${formulas.length}, masses: ${masses.length}; give one formula for each part, or one for the first`);
  return masses.flatMap((mass, i) => {
    if (mass === null && energies[i] === null) return [];
    const part = { mass: readMeasured(mass, SAMPLE_MASS), specificEnergy: readMeasured(energies[i], SPECIFIC_ENERGY) };
    const formula = formulas[i];
    if (typeof formula !== "string" || formula.trim() === "") return part;
    return { ...part, oxygenPerGram: oxygenPerGram(formula) };
  });
}

function readFormulas(block: Block | undefined): readonly Cell[] {
  const formulas = listOf(block, "formulas");
  const wrong = formulas.find((cell) => cell !== null && cell !== 0 && typeof cell !== "string");
  return wrong === undefined ? formulas : refuse(`The formula is ${quoted(wrong)}; a text such as "C7H6O2" is expected`);
}

function readUnknown(block: Block | undefined): boolean {
  const cell = singleCell(block, "unknown");
  if (cell === undefined || cell === null || cell === 0 || cell === false) return false;
  if (cell === true || cell === 1 || (typeof cell === "string" && cell.trim().toLowerCase() === "unknown")) return true;
  return refuse(`The last argument is ${quoted(cell)}; say "unknown" or TRUE for an unknown sample, or leave it out`);
}

function reportOf(check: ChargeCheck, pressure: number, parts: readonly ChargePart[]): Report {
  const byFormula = parts.every(({ oxygenPerGram }) => oxygenPerGram !== undefined);
  return {
    lines: [
      line("verdict", check.verdict, "", "by the numbers given alone; it knows nothing of the vessel's condition"),
      line("energy of the charge", check.energy, "J"),
      line("share of the energy limit", 100 * check.energyShare, "%", `caution from ${100 * chargeRules.cautionShare} %`),
      line("oxygen pressure", pressure, "MPa", "absolute, at 25 °C"),
      line("share of the pressure limit", 100 * check.pressureShare, "%"),
      line("oxygen in the vessel", check.oxygen * OXYGEN, "g", "ideal gas at 25 °C, volume not lessened by sample and water"),
      line(
        "oxygen needed",
        check.oxygenNeeded * OXYGEN,
        "g",
        byFormula ? "by formula" : `where no formula is given: ${chargeRules.heatPerOxygen / 1000} kJ for each gram`,
      ),
      line("oxygen, times what is needed", check.oxygenRatio, "", `at least ${chargeRules.leastOxygen} is asked for`),
      ...CAUTIONS.map((text) => line("standing caution", SEE_NOTE, "", text)),
    ],
    warnings: [...check.reasons, ...parts.flatMap(contradiction)],
  };
}

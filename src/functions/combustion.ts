/**
 * The table of FUEL.COMBUSTION: reaction, energy, enthalpy and formation of one compound, each from any other, at 298.15 K.
 * The family file holds the worksheet function; here is what it shows.
 */
import { combustionValues, THERMAL_ENERGY, type CombustionValues, type Known } from "../core/fuel/combustion";
import { printed, Refusal, refuse } from "../core/refusal";
import { hill, molarMass, parseFormula, type Formula } from "../core/species/formula";
import { benzoicAcid, chargeRules } from "../data/calorimetry";
import { combustionProducts } from "../data/combustion-products";
import { atomicWeights } from "../data/library";
import { readText } from "./arguments";
import type { Block, Cell } from "./cell";
import { type Measured, readMeasured, SPECIFIC_ENERGY } from "./laboratory";
import { line, type Line, type Report, table } from "./table";

const KINDS = ["energy", "enthalpy", "formation"] as const;
type Kind = (typeof KINDS)[number];

const ENTHALPY: Measured = { name: "Enthalpy of combustion", unit: "J/mol", example: '"-3226.9 kJ/mol"' };
const FORMATION: Measured = { name: "Enthalpy of formation", unit: "J/mol", example: '"-385.2 kJ/mol"' };

/** A plain molar value smaller than this was written in kJ/mol or J/g. */
const LEAST_PLAIN = 20000;

/**
 * Upright table, or one row for each of a column of states.
 * formula: compound of C, H, O, N, S, with (g) if it is a gas. value: what `given` says. given: `energy` (left out) gross value at constant
 * volume between standard states, J/g, positive; `enthalpy` ΔcH°, J/mol, negative; `formation` ΔfH°, J/mol.
 */
export function combustionCells(formula: Block, value: Block, given?: Block): Block {
  return table(
    [
      ["formula", formula],
      ["value", value],
      ["given", given],
    ],
    ([formulaCell, valueCell, givenCell]) => report(readCompound(formulaCell), valueCell, readKind(givenCell)),
  );
}

/** A compound as typed, taken apart, with its molar mass in g/mol. */
export interface Compound {
  readonly text: string;
  readonly formula: Formula;
  readonly molarMass: number;
}

/** Reads the formula of a compound that burns. Refuses solutions, and what is missing or not a text. */
export function readCompound(cell: Cell | undefined): Compound {
  const text = readText(cell, "formula") ?? refuse('The formula is missing: give a text such as "C7H6O2"');
  const formula = parseFormula(text);
  if (formula.suffix?.startsWith("aq")) refuse(`${text} is a solution; give the compound itself, with (l), (s) or (g)`);
  return { text, formula, molarMass: molarMass(formula, atomicWeights) };
}

/** Molar mass of O2, g/mol. */
export const OXYGEN_MASS = molarMass(parseFormula("O2"), atomicWeights);

function readKind(cell: Cell | undefined): Kind {
  const text = readText(cell, "kind of the value")?.toLowerCase() ?? "energy";
  return KINDS.find((kind) => kind === text) ?? refuse(`"${text}" is not a kind of value; the kinds are ${KINDS.join(", ")}`);
}

function readKnown(cell: Cell | undefined, kind: Kind): Known {
  if (kind === "energy") return { kind, gross: readMeasured(cell, SPECIFIC_ENERGY) };
  if (kind === "enthalpy") return { kind, enthalpy: readEnthalpy(cell) / 1000 };
  return { kind, formation: readMolar(cell, FORMATION) / 1000 };
}

function readEnthalpy(cell: Cell | undefined): number {
  const value = readMolar(cell, ENTHALPY);
  if (value < 0) return value;
  throw new Refusal(
    "range",
    `Enthalpy of combustion ${printed(value)} J/mol is not negative: combustion gives off heat, so ΔcH° is written with a minus sign`,
  );
}

/** A molar value in J/mol. A plain number of a size that is usual in kJ/mol or J/g is refused; zero, the value of an element, is not. */
function readMolar(cell: Cell | undefined, measured: Measured): number {
  const value = readMeasured(cell, measured);
  if (typeof cell !== "number" || value === 0 || Math.abs(value) >= LEAST_PLAIN) return value;
  throw new Refusal(
    "range",
    `${measured.name} ${printed(value)} J/mol is below ${LEAST_PLAIN} J/mol in size and looks like kJ/mol or J/g: say "${printed(value)} kJ/mol", or give J/mol`,
  );
}

const PHASES = {
  none: "taken as liquid or solid, because its formula names no phase",
  l: "is liquid",
  cr: "is solid",
  g: "is a gas",
};

function report({ text, formula, molarMass: mass }: Compound, valueCell: Cell | undefined, kind: Kind): Report {
  const known = readKnown(valueCell, kind);
  const values = combustionValues(formula, mass, OXYGEN_MASS, known, combustionProducts);
  return {
    lines: [
      line("reaction", reactionText(text, values), "", "complete combustion; sulfur to SO2(g), nitrogen to N2(g), liquid water"),
      line("molar mass", mass, "g/mol", "abridged atomic weights, CIAAW 2021"),
      line(
        "change of gas",
        values.combustion.gasChange,
        "mol/mol",
        `Δn, gas formed less gas consumed; the compound ${PHASES[formula.phase ?? "none"]}`,
      ),
      ...energyLines(values, kind),
      ...formationLines(values, kind),
      line("reference temperature", 298.15, "K", "standard states at 1 bar"),
    ],
    warnings: combustionWarnings(formula, values, known),
  };
}

function energyLines(values: CombustionValues, kind: Kind): Line[] {
  const given = (own: Kind): string => (kind === own ? "from the value given" : "calculated");
  return [
    line("RT", THERMAL_ENERGY, "kJ/mol", "at 298.15 K; ΔcH° = ΔcU° + Δn RT"),
    line("energy of combustion ΔcU°", values.energy, "kJ/mol", given("energy")),
    line(
      "gross value at constant volume",
      values.grossVolume,
      "J/g",
      "−ΔcU°/M, between standard states; values from a vessel need CAL.STANDARD first",
    ),
    line("enthalpy of combustion ΔcH°", values.enthalpy, "kJ/mol", given("enthalpy")),
    line("gross value at constant pressure", values.grossPressure, "J/g", "−ΔcH°/M"),
  ];
}

function formationLines(values: CombustionValues, kind: Kind): Line[] {
  const { carbonDioxide, water, sulfurDioxide } = combustionProducts;
  const used = values.combustion.sulfurDioxide > 0 ? [carbonDioxide, water, sulfurDioxide] : [carbonDioxide, water];
  const each = used.map(({ species, formation, uncertainty }) => `${species} ${formation} ± ${uncertainty}`).join(", ");
  return [
    line(
      "enthalpy of formation ΔfH°",
      values.formation,
      "kJ/mol",
      kind === "formation" ? "from the value given" : "calculated from the products",
    ),
    line(
      "uncertainty from the products",
      values.productUncertainty,
      "kJ/mol",
      `CODATA 1989: ${each} kJ/mol, each times its amount, in quadrature; that of the value is not in it`,
    ),
  ];
}

/** The reaction for one mole of the compound: "C7H6O2 + 7.5 O2(g) = 7 CO2(g) + 3 H2O(l)". */
function reactionText(compound: string, { combustion }: CombustionValues): string {
  const { carbonDioxide, water, sulfurDioxide } = combustionProducts;
  const products: [number, string][] = [
    [combustion.carbonDioxide, carbonDioxide.species],
    [combustion.water, water.species],
    [combustion.nitrogen, "N2(g)"],
    [combustion.sulfurDioxide, sulfurDioxide.species],
  ];
  const right = products.filter(([amount]) => amount > 0).map(([amount, species]) => term(amount, species));
  return `${compound} + ${term(combustion.oxygen, "O2(g)")} = ${right.join(" + ")}`;
}

/** 12 digits hide the rounding of sums and keep every count a person types. */
function term(amount: number, species: string): string {
  return amount === 1 ? species : `${Number(amount.toPrecision(12))} ${species}`;
}

/** Heat by mass of oxygen, kJ/g: the rule of thumb for organic compounds, and how far the values of compounds spread around it. */
const PER_OXYGEN = chargeRules.heatPerOxygen / 1000;
const SPREAD = chargeRules.heatPerOxygenSpread;

/** The sentence for a value that does not fit the oxygen of its formula, if it does not. */
export function oxygenWarning(perOxygen: number): string[] {
  if (Math.abs(perOxygen / PER_OXYGEN - 1) <= SPREAD) return [];
  return [
    `The value is ${printed(perOxygen)} kJ for each gram of oxygen consumed; organic compounds give ${PER_OXYGEN} kJ within ${100 * SPREAD} %: check formula, value and unit`,
  ];
}

/** Molecules with an odd number of hydrogen and nitrogen atoms are radicals: a mistyped formula. Broken counts are averages. */
function oddAtoms(formula: Formula): string[] {
  const atoms = (formula.counts.get("H") ?? 0) + (formula.counts.get("N") ?? 0);
  if (![...formula.counts.values()].every(Number.isInteger) || atoms % 2 === 0) return [];
  return [`${hill(formula)} has an odd number of hydrogen and nitrogen atoms together, which no stable molecule has: check the formula`];
}

/** Fuels that are gases at 25 °C: hydrocarbons up to four carbon atoms, and these. */
const GASES = new Set(["H2", "CO", "H3N", "H2S"]);

/** True for the formula of a fuel that is a gas at 25 °C; a composition for one carbon atom, CH2 or CH1.8, is not. */
export function isUsuallyGas(formula: Formula): boolean {
  const { counts } = formula;
  if (![...counts.values()].every(Number.isInteger) || (counts.get("C") === 1 && counts.has("H") && counts.get("H") !== 4)) return false;
  const isHydrocarbon = [...counts.keys()].every((element) => element === "C" || element === "H");
  const carbon = counts.get("C") ?? 0;
  return GASES.has(hill(formula)) || (isHydrocarbon && carbon >= 1 && carbon <= 4 && counts.has("H"));
}

function perhapsGas(formula: Formula): string[] {
  if (formula.phase !== undefined || !isUsuallyGas(formula)) return [];
  return [`${hill(formula)} is taken as liquid or solid: for the gas write ${hill(formula)}(g)`];
}

/** Certificate value of benzoic acid, J/g, mass in vacuum and mass in air, and how near a value must be to be taken for it. */
const CERTIFIED = [benzoicAcid.certified, benzoicAcid.inAir];
const NEAR = 5;

/** What is odd about a compound and its value, a sentence each. */
export function combustionWarnings(formula: Formula, { perOxygen, combustion }: CombustionValues, known: Known): string[] {
  const found = [...oxygenWarning(perOxygen), ...oddAtoms(formula), ...perhapsGas(formula)];
  if (known.kind === "energy" && hill(formula) === benzoicAcid.formula && CERTIFIED.some((value) => Math.abs(known.gross - value) <= NEAR))
    found.push(
      `${printed(known.gross)} J/g looks like the certificate value of benzoic acid, which holds in the vessel (30 atm oxygen; ${benzoicAcid.inAir} J/g is for mass in air); between standard states −ΔcU° is ${benzoicAcid.standardState} J/g, 0.077 % less: see CAL.STANDARD`,
    );
  if (combustion.sulfurDioxide > 0)
    found.push(
      "Sulfur is taken to SO2(g), as fuel laboratories do; tables of thermochemistry burn it to H2SO4·115 H2O and their values differ",
    );
  return found;
}

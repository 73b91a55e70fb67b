/**
 * A fuel known by its gross value, as one text: `C7H6O2(cr), gross 26413.6 J/g` and `CH0.8O0.1(cr), gross 30100 J/g, ash 8 %`.
 *   formula   the combustible matter, free of ash: C, H, O, N, S, counts may be broken; phase (cr), (l) or (g)
 *   gross     gross value at constant volume between standard states at 25 °C, J for each gram of the fuel as it is, ash included
 *   ash       per cent of the mass; inert, its heating is not counted
 * Molar heat of the matter: ΔcU = −gross / (1 − ash/100) · M; from it the enthalpy of formation, with CO2, H2O(l) and SO2 of CODATA.
 * The heat capacity of such a fuel is not known: U and H at 25 °C stand for every temperature.
 */
import { fixedEnergy } from "../core/capacity/fixed-energy";
import type { Substance } from "../core/equilibrium/types";
import { combustionValues, type CombustionValues, type Known } from "../core/fuel/combustion";
import { printed, refuse, refuseRange } from "../core/refusal";
import type { Formula } from "../core/species/formula";
import { takePhase } from "../core/species/phase";
import type { Phase } from "../core/species/types";
import { combustionProducts } from "../data/combustion-products";
import { readText } from "./arguments";
import type { Cell } from "./cell";
import { combustionWarnings, isUsuallyGas, OXYGEN_MASS, readCompound } from "./combustion";
import { type Measured, readMeasured, readPercent, SPECIFIC_ENERGY } from "./laboratory";

/** A fuel by its gross value. */
export interface GrossFuel {
  /** Formula of the combustible matter as typed, without its phase. */
  readonly matter: string;
  readonly formula: Formula;
  readonly phase: Phase;
  /** Molar mass of the matter, g/mol. */
  readonly molarMass: number;
  /** Gross value of the fuel, ash included, J/g. */
  readonly gross: number;
  /** Ash, per cent. */
  readonly ash: number;
}

const EXAMPLE = '"C7H6O2(cr), gross 26413.6 J/g, ash 8 %"';
const GROSS: Measured = { ...SPECIFIC_ENERGY, name: "Gross value", example: '"26.4136 MJ/kg"' };

const PHASES: Readonly<Record<string, Phase>> = {
  cr: "cr",
  s: "cr",
  solid: "cr",
  l: "l",
  liquid: "l",
  g: "g",
  gas: "g",
};

/** The fuel of four cells. Phase left out: that of the formula, else a solid; a formula of a gas must say its phase. */
export function grossFuelOf(formula: Cell | undefined, gross: Cell | undefined, phase: Cell | undefined, ash: Cell | undefined): GrossFuel {
  const compound = readCompound(formula);
  const share = ash === undefined || ash === null ? 0 : readPercent(ash, "Ash");
  if (share === 100) refuseRange(`Ash 100 % leaves nothing of ${compound.text} to burn`);
  const chosen = phaseOf(compound.formula, readText(phase, "phase"), compound.text);
  const fuel = {
    matter: takePhase(compound.text).rest,
    formula: { ...compound.formula, phase: chosen, suffix: chosen },
    phase: chosen,
    molarMass: compound.molarMass,
    gross: readMeasured(gross, GROSS),
    ash: share,
  };
  valuesOf(fuel); // refuses what cannot burn
  return fuel;
}

function phaseOf(formula: Formula, text: string | undefined, written: string): Phase {
  const asked =
    text === undefined
      ? undefined
      : (PHASES[text.replace(/[()]/g, "").toLowerCase()] ?? refuse(`The phase "${text}" is not one of cr, l, g`));
  if (asked !== undefined && formula.phase !== undefined && asked !== formula.phase)
    refuse(`The formula ${written} names the phase ${formula.phase}, the argument ${asked}; give one of them`);
  const phase = asked ?? formula.phase;
  if (phase === undefined && isUsuallyGas(formula))
    refuse(`${written} is the formula of a gas: give the phase, "g", or "l" or "cr" for a liquid or solid of this composition`);
  return phase ?? "cr";
}

/** The text of a fuel; it reads back to the same numbers, to the last bit. */
export function grossFuelText(fuel: GrossFuel): string {
  return `${nameOf(fuel)}, gross ${fuel.gross} J/g${fuel.ash === 0 ? "" : `, ash ${fuel.ash} %`}`;
}

/** True if a text means to be a fuel with its gross value. */
export function isGrossFuel(text: string): boolean {
  return /[\s,;]gross\b/i.test(text);
}

/** Reads the text of a fuel; spaces, order, units, and the words' case are free, a plain number is in J/g or per cent. */
export function readGrossFuel(text: string): GrossFuel {
  const [formula, ...parts] = text
    .trim()
    .split(/\s*[,;]\s*|\s+(?=(?:gross|ash)\b)/i)
    .filter((part) => part !== "");
  const values = new Map<string, string>();
  for (const part of parts) {
    const [, word, value] = /^(gross|ash)\b\s*[:=]?\s*(.*)$/i.exec(part) ?? [];
    if (word === undefined || value === undefined)
      return refuse(`In the fuel "${text}" the part "${part}" is neither gross nor ash; write ${EXAMPLE}, with decimal points`);
    if (values.has(word.toLowerCase())) refuse(`The fuel "${text}" gives ${word.toLowerCase()} twice`);
    values.set(word.toLowerCase(), value);
  }
  if (!values.has("gross")) refuse(`The fuel "${text}" has no gross value; write ${EXAMPLE}`);
  return grossFuelOf(formula, numberOrText(values.get("gross")), undefined, numberOrText(values.get("ash")));
}

function numberOrText(text: string | undefined): Cell | undefined {
  return text !== undefined && text !== "" && Number.isFinite(Number(text)) ? Number(text) : text;
}

type Content = Pick<GrossFuel, "formula" | "molarMass" | "gross" | "ash">;

/** What is known of the combustible matter: its gross value without the ash, J/g. */
function knownOf({ gross, ash }: Content): Known {
  return { kind: "energy", gross: gross / (1 - ash / 100) };
}

function valuesOf(fuel: Content): CombustionValues {
  return combustionValues(fuel.formula, fuel.molarMass, OXYGEN_MASS, knownOf(fuel), combustionProducts);
}

/** Enthalpy of formation of the combustible matter at 298.15 K, J/mol. */
export function formationOf(fuel: GrossFuel): number {
  return 1000 * valuesOf(fuel).formation;
}

/** The fuel as a substance that is put in, for one mole of its combustible matter. */
export function grossFuelReactant(fuel: GrossFuel): Substance {
  const name = nameOf(fuel);
  return { name, counts: fuel.formula.counts, capacity: fixedEnergy(formationOf(fuel), fuel.phase, `the gross value of ${name}`) };
}

/** What is odd about the fuel: a gross value that does not fit its formula, a formula that no molecule has, ash. */
export function grossFuelWarnings(fuel: GrossFuel): string[] {
  const name = nameOf(fuel);
  const ash = fuel.ash === 0 ? [] : [`The ash of ${name}, ${printed(fuel.ash)} %, is inert: its heating is not counted`];
  return [...combustionWarnings(fuel.formula, valuesOf(fuel), knownOf(fuel)).map((text) => `${name}: ${text}`), ...ash];
}

function nameOf({ matter, phase }: GrossFuel): string {
  return `${matter}(${phase})`;
}

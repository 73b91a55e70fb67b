/**
 * The substance argument: what the user wrote becomes one heat capacity with its molar mass and its parts.
 * Texts repeat down a column, so what they mean is kept in bounded caches; the result depends on the arguments alone.
 */
import type { Capacity } from "../core/capacity/capacity";
import { capacityOf } from "../core/capacity";
import { extrapolated } from "../core/capacity/range";
import { compileMixture } from "../core/mixture/compile";
import { Refusal, refuse, refuseAbsent } from "../core/refusal";
import { hill, parseFormula } from "../core/species/formula";
import type { SpeciesFit } from "../core/species/types";
import { findSpecies, namedMixture, recordOf, recordsOf } from "../data/library";
import { quoted } from "./arguments";
import { BoundedCache } from "./cache";
import { Block, Cell, isLeftOut } from "./cell";
import { Part, isComposition, partsOfRange, partsOfText, requireFractions, total } from "./composition";
import { SetChoice, setOf } from "./set";

export interface SubstancePart {
  /** Species key of the library, or the species as the coefficient block names it. */
  readonly species: string;
  readonly fraction: number;
  readonly fit: SpeciesFit;
}

export interface Substance {
  /** As sentences name it. */
  readonly label: string;
  readonly capacity: Capacity;
  /** Molar mass, kg/mol. */
  readonly molarMass: number;
  readonly parts: readonly SubstancePart[];
  /** Sum of the amounts of a composition range, mol if they are moles; 1 for everything else. */
  readonly moles: number;
  /** Key of the source of a named composition, such as dry air. */
  readonly compositionSource?: string;
}

/** The substance argument before a set is chosen: a block of texts, or one composition. */
export interface SubstanceArgument {
  readonly texts?: Block;
  readonly composition?: { readonly key: string; readonly parts: readonly Part[] };
}

const resolved = new BoundedCache<BoundedCache<Substance>>(2000);
const capacities = new WeakMap<SpeciesFit, Capacity>();

/** Tells a composition range from one or many substance texts. */
export function substanceArgument(block: Block | undefined): SubstanceArgument {
  if (block === undefined || isLeftOut(block))
    return refuse('The substance is missing: give a species such as "N2", a mixture, or a range of species and amounts');
  if (!isComposition(block)) return { texts: block };
  return { composition: { key: `cells:${JSON.stringify(block)}`, parts: partsOfRange(block) } };
}

/** The substance that a cell (or the composition) means with a set. With `asMoles` the amounts of a composition need not add up to 1. */
export function substanceOf(argument: SubstanceArgument, cell: Cell | undefined, set: SetChoice, asMoles = false): Substance {
  const { composition } = argument;
  if (composition) {
    return cached(`${asMoles ? "mol" : "x"}|${composition.key}`, set, () => mixture("the mixture", composition.parts, set, asMoles));
  }
  if (typeof cell !== "string")
    return refuse(`The substance is ${quoted(cell)}; give a species such as "N2" or a mixture such as "0.79 N2 + 0.21 O2"`);
  return cached(cell, set, () => fromText(cell.trim(), set));
}

function cached(key: string, set: SetChoice, make: () => Substance): Substance {
  return resolved.at(key, () => new BoundedCache<Substance>(200)).at(set.key, make);
}

function fromText(text: string, set: SetChoice): Substance {
  const parts = set.fits && matchingFit(text, set.fits) ? undefined : partsOfText(text);
  if (parts) return { ...mixture(text, parts, set, false), compositionSource: namedMixture(text)?.source };
  const fit = fitOf(text, set);
  return {
    label: fit.species,
    capacity: withRange(capacityOfFit(fit), set),
    molarMass: fit.molarMass / 1000,
    parts: [{ species: fit.species, fraction: 1, fit }],
    moles: 1,
  };
}

function mixture(label: string, parts: readonly Part[], set: SetChoice, asMoles: boolean): Substance {
  if (!asMoles) requireFractions(parts);
  const moles = total(parts);
  const fits = parts.map((part) =>
    fitOf(part.species, part.set === undefined ? set : { ...setOf(part.set), extrapolate: set.extrapolate }),
  );
  const held = parts.map(({ amount }, index) => ({
    species: fits[index]!.species,
    fraction: asMoles ? amount / moles : amount,
    fit: fits[index]!,
  }));
  const capacity = compileMixture(held.map(({ fit, fraction }) => ({ capacity: withRange(capacityOfFit(fit), set), amount: fraction })));
  const molarMass = held.reduce((sum, { fit, fraction }) => sum + fraction * fit.molarMass, 0) / 1000;
  return { label, capacity, molarMass, parts: held, moles: asMoles ? moles : 1 };
}

/** The fit of one species: from the coefficient block if there is one, else from the named set, else the library's first choice. */
export function fitOf(species: string, set: SetChoice): SpeciesFit {
  if (set.fits) {
    return (
      matchingFit(species, set.fits) ??
      refuseAbsent(`The coefficient block has no row for ${species}; it has ${set.fits.map((fit) => fit.species).join(", ")}`)
    );
  }
  const { key } = findSpecies(species);
  return set.id === undefined ? recordsOf(key)[0]! : recordOf(key, set.id);
}

/** The row of a coefficient block for a species: same formula, and the phase if the text names one. */
export function matchingFit(species: string, fits: readonly SpeciesFit[]): SpeciesFit | undefined {
  const wanted = formulaAndPhase(species);
  if (!wanted) return undefined;
  const same = fits.filter(
    (fit) => hill(parseFormula(fit.formula)) === wanted.formula && (wanted.phase === undefined || fit.phase === wanted.phase),
  );
  if (same.length > 1)
    return refuse(`The coefficient block has ${same.length} rows for ${species}; write the phase, such as ${same[0]!.species}`);
  return same[0];
}

function formulaAndPhase(species: string): { formula: string; phase?: string } | undefined {
  try {
    const entry = findSpecies(species);
    return { formula: hill(parseFormula(entry.formula)), phase: entry.phase };
  } catch (thrown) {
    if (!(thrown instanceof Refusal)) throw thrown;
  }
  try {
    const formula = parseFormula(species);
    return { formula: hill(formula), phase: formula.phase };
  } catch (thrown) {
    if (thrown instanceof Refusal) return undefined;
    throw thrown;
  }
}

/** A record of the library is built once; its identity names it. */
export function capacityOfFit(fit: SpeciesFit): Capacity {
  const held = capacities.get(fit);
  if (held) return held;
  const made = capacityOf(fit);
  capacities.set(fit, made);
  return made;
}

function withRange(capacity: Capacity, set: SetChoice): Capacity {
  return set.extrapolate ? extrapolated(capacity) : capacity;
}

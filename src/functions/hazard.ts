/**
 * The first row of a table on a closed vessel whose contents can react or decompose, so that the pressure of frozen composition is not the
 * one they would reach. Three things are looked for:
 *   1  species that do it by themselves (list in the data, some from a temperature on; compounds of C with H crack when hot)
 *   2  pairs that react with each other (list in the data)
 *   3  fuel and oxidant: a fuel is a species whose complete combustion takes up oxygen, mol O2 for one mole:
 *      Σ count × share    C 1   H 1/4   S 1   O −1/2   N and noble gases 0   halogens −1/4   other elements 1/2, as MO, or 1/4, as M2O;
 *      oxidants are a list in the data
 * A species of the library is known by its key. One that only a coefficient block knows is known by its atoms, and may be the
 * species of the lists with the same atoms. Limits of flammability, ignition and speed are not judged. The lists are from memory.
 *
 * Traces, such as 50 ppm CO in air, are named in a note below the table instead: a first row that stands over every calibration gas would
 * soon be read no more. A trace gives off 0.3 kJ for one mole of the contents at most, some 25 K with the Cv of a gas of atoms:
 *   fuel with oxidant  5E-4 mol O2 taken up     at 600 kJ for one mol O2 (H2 484, CO 566)
 *   by themselves      share × atoms of 4E-3    at 80 kJ for one atom (C2H2 57, HN3 72, C2N2 77); atoms and radicals are no trace
 *   pairs              share of 1E-3 of either  at 300 kJ for one mole (NH3 with HCl 176)
 */
import { oxygenUptake, ROUNDING } from "../core/equilibrium/oxygen";
import { Refusal } from "../core/refusal";
import { hill, parseFormula } from "../core/species/formula";
import { organic, oxidants, reactivePairs, type SelfReaction, selfReactive } from "../data/self-reactive";
import { speciesOfKey } from "../data/species";
import type { SubstancePart } from "./substance";
import { type Line, line, SEE_NOTE } from "./table";

const LEAD = "these contents can react or decompose; this is not the pressure they would reach";

/** One part, with what the lists are asked by. */
interface Member {
  /** As the note names it: `CH4 (9.5 %)`. */
  readonly label: string;
  readonly fraction: number;
  /** Key of the library, if it has the species. */
  readonly key?: string;
  readonly formula: string;
  readonly counts: ReadonlyMap<string, number>;
  readonly isGas: boolean;
}

/**
 * The row CAUTION, or none. `temperature`, K, is the hottest the contents become; without it what only happens when hot is not named.
 */
export function hazardLines(parts: readonly SubstancePart[], temperature?: number): Line[] {
  const words = findingsOf(parts, temperature).flatMap(({ isTrace, words }) => (isTrace ? [] : [words]));
  return words.length === 0 ? [] : [line("CAUTION", SEE_NOTE, "", `${LEAD}: ${words.join("; ")}`)];
}

/** What could react in traces, a sentence for the notes below the table, or none. `temperature` as above. */
export function traceNotes(parts: readonly SubstancePart[], temperature?: number): string[] {
  const words = findingsOf(parts, temperature).flatMap(({ isTrace, words }) => (isTrace ? [words] : []));
  return words.length === 0 ? [] : [`Traces that can react, by no more than some 25 K if all of them did: ${words.join("; ")}`];
}

interface Finding {
  readonly words: string;
  readonly isTrace: boolean;
}

function findingsOf(parts: readonly SubstancePart[], temperature = 0): Finding[] {
  const members = parts.filter(({ fraction }) => fraction > 0).map(memberOf);
  return [...byThemselves(members, temperature), ...inPairs(members), ...fuelWithOxidant(members)];
}

/** Most of a trace: mol O2 taken up, share × atoms of what reacts by itself, share of the lesser of a pair. */
const TRACE = { oxygen: 5e-4, atoms: 4e-3, pair: 1e-3 } as const;

function isBelow(sum: number, limit: number): boolean {
  return sum <= limit * (1 + ROUNDING);
}

function sumOf(members: readonly Member[], each: (member: Member) => number): number {
  return members.reduce((sum, member) => sum + member.fraction * each(member), 0);
}

function atomsOf({ counts }: Member): number {
  return [...counts.values()].reduce((sum, count) => sum + count, 0);
}

function memberOf({ species, fraction, fit }: SubstancePart): Member {
  const { counts } = parseFormula(fit.formula);
  return {
    fraction,
    label: fraction === 1 ? species : `${species} (${Number((100 * fraction).toPrecision(3))} %)`,
    key: speciesOfKey(species)?.key,
    formula: hill({ counts, charge: 0 }),
    counts,
    isGas: fit.phase === "g",
  };
}

/** A reaction of a list, and the name of the species it belongs to. */
type Listed = readonly [reaction: SelfReaction, name: string];

const byKey = new Map<string, SelfReaction>();
const byFormula = new Map<string, Listed>();
for (const row of selfReactive) {
  for (const key of row.species ?? []) {
    const { formula, name } = speciesOfKey(key)!;
    byKey.set(key, row);
    if (!byFormula.has(formula)) byFormula.set(formula, [row, name]);
  }
  for (const [formula, name] of Object.entries(row.others ?? {})) {
    const same = plain(formula);
    if (!byFormula.has(same)) byFormula.set(same, [row, name!]);
  }
}

function plain(formula: string): string {
  return hill(parseFormula(formula));
}

/** One finding for each reaction, with everything that does it. */
function byThemselves(members: readonly Member[], temperature: number): Finding[] {
  const found = new Map<SelfReaction, { readonly member: Member; readonly label: string }[]>();
  for (const member of members) {
    const [reaction, label] = ownReaction(member) ?? [];
    if (reaction === undefined || temperature < (reaction.from ?? 0)) continue;
    found.set(reaction, [...(found.get(reaction) ?? []), { member, label: label! }]);
  }
  return [...found].flatMap(([{ kind, words, from }, those]) => {
    const isTrace =
      kind !== "recombines" &&
      isBelow(
        sumOf(
          those.map(({ member }) => member),
          atomsOf,
        ),
        TRACE.atoms,
      );
    // a trace that only comes apart when hot takes up heat and is not worth a word
    return isTrace && from !== undefined ? [] : [{ words: `${those.map(({ label }) => label).join(", ")}: ${kind} ${words}`, isTrace }];
  });
}

function ownReaction(member: Member): Listed | undefined {
  const { key, label, counts } = member;
  const [reaction, taken] = key === undefined ? byAtoms(member) : [byKey.get(key), undefined];
  if (reaction !== undefined) return [reaction, taken === undefined ? label : `${label} if it is ${taken}`];
  return counts.has("C") && counts.has("H") ? [organic, label] : undefined;
}

/** Carbon, sulfur or CH2 in a solid or a liquid are no atoms and radicals. */
function byAtoms({ formula, isGas }: Member): Listed | readonly [undefined, undefined] {
  const listed = byFormula.get(formula);
  return listed === undefined || (listed[0].kind === "recombines" && !isGas) ? [undefined, undefined] : listed;
}

const pairs = reactivePairs.map(({ one, other, words }) => ({ isOne: isOneOf(one), isOther: isOneOf(other), words }));

function inPairs(members: readonly Member[]): Finding[] {
  return pairs.flatMap(({ isOne, isOther, words }) => {
    const some = members.filter(isOne);
    const others = members.filter(isOther);
    if (some.length === 0 || others.length === 0) return [];
    const lesser = Math.min(
      sumOf(some, () => 1),
      sumOf(others, () => 1),
    );
    return [{ words: `${labels(some)} and ${labels(others)} ${words}`, isTrace: isBelow(lesser, TRACE.pair) }];
  });
}

const isOxidant = isOneOf(oxidants.species);

function fuelWithOxidant(members: readonly Member[]): Finding[] {
  const fuels = members.filter(isFuel);
  const burning = members.filter(isOxidant);
  if (fuels.length === 0 || burning.length === 0) return [];
  // no oxidant binds more oxygen, or takes its place, than it has atoms
  const taken = Math.min(sumOf(fuels, uptakeOf), sumOf(burning, atomsOf));
  return [
    {
      words: `fuel ${labels(fuels)} with oxidant ${labels(burning)}: limits of flammability are not judged`,
      isTrace: isBelow(taken, TRACE.oxygen),
    },
  ];
}

function labels(members: readonly Member[]): string {
  return members.map(({ label }) => label).join(", ");
}

function isOneOf(formulas: readonly string[]): (member: Member) => boolean {
  const atoms = new Set(formulas.map(plain));
  return ({ formula }) => atoms.has(formula);
}

function isFuel(member: Member): boolean {
  const moved = [...member.counts].reduce((sum, [element, count]) => sum + Math.abs(count * shareOf(element)), 0);
  return uptakeOf(member) > ROUNDING * moved;
}

/** Oxygen for complete combustion, mol O2 for one mole. */
function uptakeOf({ counts }: Member): number {
  return [...counts].reduce((sum, [element, count]) => sum + count * shareOf(element), 0);
}

/** Elements whose lowest oxide is M2O; of the others without a rule at least MO is taken. */
const AS_M2O: ReadonlySet<string> = new Set(["Li", "Na", "K", "Rb", "Cs", "Cu", "Ag"]);

/** Oxygen that one atom binds, mol O2. */
function shareOf(element: string): number {
  try {
    return oxygenUptake({ name: element, counts: new Map([[element, 1]]) });
  } catch (thrown) {
    if (!(thrown instanceof Refusal)) throw thrown;
    return AS_M2O.has(element) ? 1 / 4 : 1 / 2;
  }
}

/**
 * Oxygen that complete combustion takes up, and the amounts of fuel and oxidant for an equivalence ratio.
 *
 *   uptake of a substance, mol O2 for one mole:  Σ count × share    C 1   H 1/4   S 1   O −1/2   N and noble gases 0   F Cl Br I −1/4
 *   equivalence ratio  φ = (fuel / oxidant) / (fuel / oxidant at stoichiometry) = uptake of the fuel / oxygen that the oxidant offers
 *
 * The products behind the shares: CO2, H2O, SO2, N2, noble gases, and for each atom of a halogen one molecule of hydrogen halide, which
 * takes a hydrogen atom that then binds no oxygen. Negative: the substance offers oxygen (O2 −1, N2O −1/2). Balances of atoms; no figure
 * comes from outside.
 */
import { printed, refuse, refuseRange } from "../refusal";
import type { Reactant } from "./types";

const SHARES: ReadonlyMap<string, number> = new Map([
  ["C", 1],
  ["H", 1 / 4],
  ["S", 1],
  ["O", -1 / 2],
  ["N", 0],
  ...["He", "Ne", "Ar", "Kr", "Xe", "Rn"].map((gas) => [gas, 0] as const),
  ...["F", "Cl", "Br", "I"].map((halogen) => [halogen, -1 / 4] as const),
]);

/** An uptake below this share of the oxygen that its atoms move is the rounding of typed counts and fractions: there is none. */
export const ROUNDING = 1e-12;

/** Oxygen taken up by one mole, mol O2; negative if it offers oxygen. Refuses, by name, elements without a rule. */
export function oxygenUptake({ name, counts }: Pick<Reactant, "name" | "counts">): number {
  let sum = 0;
  for (const [element, count] of counts) {
    const share = SHARES.get(element);
    if (share === undefined)
      return refuse(
        `${name} holds ${element}; the oxygen balance is known here for C, H, S, O, N, the halogens and the noble gases only: use EQUILIBRIUM with a feed in mol`,
      );
    sum += count * share;
  }
  return sum;
}

/** Oxygen taken up by a mixture as its amounts stand, mol O2. What the parts move either way, less than that by `ROUNDING`, is none. */
export function oxygenUptakeOf(parts: readonly Reactant[]): number {
  const each = parts.map((part) => part.amount * oxygenUptake(part));
  const sum = each.reduce((total, uptake) => total + uptake, 0);
  const moved = each.reduce((total, uptake) => total + Math.abs(uptake), 0);
  return Math.abs(sum) <= ROUNDING * moved ? 0 : sum;
}

/**
 * Amounts of fuel and oxidant, mol, for an equivalence ratio: the fuel as its amounts stand (mole fractions: one mole of fuel), the
 * oxidant scaled to it. A part that stands in both with one and the same capacity becomes one.
 *
 * The scale of the oxidant is taken first (its amounts for one mole of oxygen offered), then the fuel's uptake, then the ratio: with
 * whole numbers and ratio 1 oxygen is there to the last bit (1 CH4, 2 O2).
 *
 * Refuses a ratio that is not above 0, a fuel that takes up no oxygen, an oxidant that offers none, and elements without a rule.
 */
export function proportion(fuel: readonly Reactant[], oxidant: readonly Reactant[], ratio: number): readonly Reactant[] {
  if (!(ratio > 0 && ratio < Infinity))
    refuseRange(`Equivalence ratio ${printed(ratio)} is not above 0: it is 1 where the oxygen just suffices, and above 1 in rich mixtures`);
  const needed = oxygenUptakeOf(fuel);
  const offered = -oxygenUptakeOf(oxidant);
  if (!(needed > 0)) refuse(`${namesOf(fuel)} is no fuel: complete combustion takes up no oxygen; the fuel comes first, then the oxidant`);
  if (!(offered > 0)) refuse(`${namesOf(oxidant)} is no oxidant: it offers no oxygen; the fuel comes first, then the oxidant`);
  const scaled = oxidant.map((part) => ({ ...part, amount: ((part.amount / offered) * needed) / ratio }));
  return joined([...fuel, ...scaled]);
}

function namesOf(parts: readonly Reactant[]): string {
  return parts.map(({ name }) => name).join(" + ");
}

/** Parts of one name and capacity added up; the same species from two sets stays apart, as their energies differ. */
function joined(parts: readonly Reactant[]): readonly Reactant[] {
  const sums: Reactant[] = [];
  for (const part of parts) {
    if (part.amount === 0) continue;
    const place = sums.findIndex(({ name, capacity }) => name === part.name && capacity === part.capacity);
    if (place < 0) sums.push(part);
    else sums[place] = { ...part, amount: sums[place]!.amount + part.amount };
  }
  return sums;
}

/**
 * Complete combustion of a compound of carbon, hydrogen, oxygen, nitrogen and sulfur in oxygen:
 *   CaHbOcNdSe + (a + b/4 − c/2 + e) O2(g) = a CO2(g) + b/2 H2O(l) + d/2 N2(g) + e SO2(g)
 * Change of the amount of gas, liquid water, condensed compound: Δn = c/2 + d/2 − b/4; one less if the compound is itself a gas.
 * A balance of atoms; it needs no figure from outside. Counts may be broken, as in CH1.686O0.843.
 */
import { printed, refuse, refuseRange } from "../refusal";
import { hill, type Formula } from "../species/formula";

/** Amounts for one mole of the compound, mol. */
export interface Combustion {
  /** Oxygen consumed. */
  readonly oxygen: number;
  readonly carbonDioxide: number;
  /** Liquid water formed. */
  readonly water: number;
  readonly nitrogen: number;
  readonly sulfurDioxide: number;
  /** Gas formed less gas consumed, Δn; a compound with the suffix (g) counts as gas consumed. */
  readonly gasChange: number;
}

const COVERED: readonly string[] = ["C", "H", "O", "N", "S"];

/** Counts typed as decimal fractions balance to this share of the oxygen that their atoms can bind. */
const ROUNDING = 1e-12;

/**
 * Complete combustion of one mole of a compound, mol of each substance.
 *
 * Refuses a charge, elements other than C H O N S, and what has nothing left to burn: no oxygen taken up (CO2, H2O, N2), or more oxygen
 * in the compound than its carbon, hydrogen and sulfur can bind.
 */
export function combustionOf(formula: Formula): Combustion {
  const name = hill(formula);
  if (formula.charge !== 0) refuse(`${name} carries a charge; combustion is of neutral compounds`);
  requireCovered(formula, name);
  const [carbon, hydrogen, bound, nitrogen, sulfur] = COVERED.map((element) => formula.counts.get(element) ?? 0) as [
    number,
    number,
    number,
    number,
    number,
  ];
  const needed = carbon + hydrogen / 4 + sulfur;
  const oxygen = needed - bound / 2;
  requireBurning(name, oxygen, needed + bound / 2);
  return {
    oxygen,
    carbonDioxide: carbon,
    water: hydrogen / 2,
    nitrogen: nitrogen / 2,
    sulfurDioxide: sulfur,
    gasChange: bound / 2 + nitrogen / 2 - hydrogen / 4 - (formula.phase === "g" ? 1 : 0),
  };
}

function requireCovered({ counts }: Formula, name: string): void {
  const others = [...counts.keys()].filter((element) => !COVERED.includes(element));
  if (others.length === 0) return;
  refuse(
    `${name} holds ${others.join(", ")}; complete combustion is written here for compounds of C, H, O, N and S only (halogens, metals and other elements are not covered)`,
  );
}

function requireBurning(name: string, oxygen: number, scale: number): void {
  if (Math.abs(oxygen) <= ROUNDING * scale) refuse(`${name} takes up no oxygen: there is nothing in it to burn`);
  if (oxygen < 0)
    refuseRange(
      `${name} needs ${printed(oxygen)} mol of oxygen for each mole: it holds more oxygen than its carbon, hydrogen and sulfur can bind, which complete combustion does not cover`,
    );
}

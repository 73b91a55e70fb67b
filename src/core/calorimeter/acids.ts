/**
 * Heats of nitric and sulfuric acid formed in the vessel, in the two conventions of the trade, which never mix:
 *
 *   separated   Q_N = h_N n(HNO3)            Q_S = h_S n(S)              acids determined apart
 *   total       Q_N = h_N n(all acid as H+)  Q_S = (h_S − 2 h_N) n(S)    all acid titrated as if it were nitric
 *
 * With n(all acid) = n(HNO3) + 2 n(S) both sums are the same. h_N heat of N2 + O2 + H2O → HNO3(aq), h_S of SO2 → H2SO4(aq), J/mol;
 * n(S) = S m / M_S. Derived here from the stoichiometry; the molar heats arrive as arguments.
 */
import { printed, refuse, refuseRange } from "../refusal";

export type AcidConvention = "separated" | "total";

/** Molar heats of formation of the two acids in the vessel, J/mol, and the molar mass of sulfur, g/mol. */
export interface AcidHeats {
  readonly nitric: number;
  readonly sulfuric: number;
  readonly sulfurMolarMass: number;
}

const MILLI = 1e-3;

/** Heat of nitric acid, J, from titrant: mL and mol/L of acid equivalents. */
export function nitricHeat(volume: number, concentration: number, molarHeat: number): number {
  if (!(volume >= 0)) return refuseRange(`Volume of titrant ${printed(volume)} mL is negative`);
  return volume * concentration * MILLI * molarHeat;
}

/** Amount of sulfur, mol, in a sample: per cent and g. */
export function sulfurAmount(sulfurPercent: number, mass: number, sulfurMolarMass: number): number {
  return ((sulfurPercent / 100) * mass) / sulfurMolarMass;
}

/** Heat of sulfuric acid, J, to be deducted in a convention. Refuses molar heats that would make the excess negative. */
export function sulfuricHeat(sulfurPercent: number, mass: number, convention: AcidConvention, heats: AcidHeats): number {
  const perMole = convention === "separated" ? heats.sulfuric : heats.sulfuric - 2 * heats.nitric;
  if (!(perMole > 0)) {
    return refuse(
      `A molar heat of sulfuric acid of ${printed(heats.sulfuric)} J/mol is not above twice that of nitric acid, ${printed(2 * heats.nitric)} J/mol`,
    );
  }
  return perMole * sulfurAmount(sulfurPercent, mass, heats.sulfurMolarMass);
}

/** Both conventions for one run, J and mol. */
export interface AcidBalance {
  readonly totalAcid: number;
  readonly sulfuricAcid: number;
  readonly nitricAcid: number;
  readonly separated: { readonly nitric: number; readonly sulfuric: number };
  readonly total: { readonly nitric: number; readonly sulfuric: number };
  /** J too much if the total acid and the full heat of sulfuric acid are both deducted; the same is lacking if neither covers it. */
  readonly countedTwice: number;
}

/** Balance of the acids of one run. Refuses a total acid smaller than what the sulfur alone would give. */
export function acidBalance(volume: number, concentration: number, sulfurPercent: number, mass: number, heats: AcidHeats): AcidBalance {
  const totalAcid = volume * concentration * MILLI;
  const sulfuricAcid = sulfurAmount(sulfurPercent, mass, heats.sulfurMolarMass);
  const nitricAcid = totalAcid - 2 * sulfuricAcid;
  if (nitricAcid < 0) {
    return refuseRange(
      `The total acid, ${printed(1000 * totalAcid)} mmol, is less than the ${printed(2000 * sulfuricAcid)} mmol that ${printed(sulfurPercent)} % sulfur alone would give: check the titration, or whether nitric acid alone was titrated`,
    );
  }
  return {
    totalAcid,
    sulfuricAcid,
    nitricAcid,
    separated: { nitric: heats.nitric * nitricAcid, sulfuric: heats.sulfuric * sulfuricAcid },
    total: { nitric: heats.nitric * totalAcid, sulfuric: (heats.sulfuric - 2 * heats.nitric) * sulfuricAcid },
    countedTwice: 2 * heats.nitric * sulfuricAcid,
  };
}

/**
 * Two short forms of the reduction to the standard state, for a quick look; approximate, not for publication. Both hold at 25 °C for
 * compounds of C, H and O, and know no acids.
 *
 * Three terms (the gas before and after, and the dissolved carbon dioxide), added to the negative energy of the vessel process:
 *   6.59 J/(mol atm) [p_f n_f (1 + 1.69 x (1 + x)) − p_i n_i] + 17.2 kJ/mol n(CO2 dissolved)
 * with ideal gases: the charge in the empty vessel, the gas after it beside the liquid water. Formula recomputed here; good to 4 J/g.
 *
 * Per cent (Washburn 1933, from memory), correction to −ΔU:
 *   (0.30 p / (−ΔU/a)) [−1 + 1.1 (b − 2c)/(4a) − 2/p] %,  p in atm, ΔU in kcal/mol, compound CaHbOc.
 */
import { CALORIE, ATMOSPHERE, type StandardStateConstants } from "./constants";
import { printed, refuse, refuseRange } from "../../refusal";
import { combustionOf } from "../../reaction/combustion";
import { THERMAL_ENERGY } from "./gas";
import type { VesselRun } from "./states";

export interface ThreeTerms {
  /** Oxygen of the charge to its pressure, J; negative. */
  readonly before: number;
  /** Gas after the combustion to no pressure, J. */
  readonly after: number;
  /** Release of the dissolved carbon dioxide, J. */
  readonly dissolved: number;
  /** Pressure after the combustion, MPa. */
  readonly pressure: number;
  /** Mole fraction of carbon dioxide after the combustion. */
  readonly fraction: number;
}

/** The three terms of a run. Refuses too little oxygen and a vessel full of water. */
export function threeTerms(run: VesselRun, { gas, carbonDioxide, water }: StandardStateConstants): ThreeTerms {
  requireShort(run, "three-term");
  const combustion = combustionOf(run.formula);
  const compound = run.mass / run.molarMass;
  const charge = (run.pressure * run.volume) / THERMAL_ENERGY;
  const needed = compound * combustion.oxygen;
  if (needed > charge)
    refuseRange(`Combustion needs ${printed(needed)} mol of oxygen, but the vessel holds ${printed(charge)} mol: it would not be complete`);
  const liquid = (run.water + compound * combustion.water * water.molarMass) / water.density;
  if (!(liquid < run.volume)) refuseRange(`${printed(liquid)} mL of water fill the vessel of ${printed(run.volume)} mL`);
  const perMole = THERMAL_ENERGY / (run.volume - liquid);
  const ratio = (carbonDioxide.solubility * (perMole / ATMOSPHERE) * liquid) / 1000;
  const dissolved = (compound * combustion.carbonDioxide * ratio) / (1 + ratio);
  const amount = charge - needed + compound * (combustion.carbonDioxide + combustion.nitrogen) - dissolved;
  const fraction = (compound * combustion.carbonDioxide - dissolved) / amount;
  const pressure = amount * perMole;
  return {
    before: (-gas.energy * charge * run.pressure) / ATMOSPHERE,
    after: (gas.energy * (1 + gas.energyLinear * fraction * (1 + fraction)) * amount * pressure) / ATMOSPHERE,
    dissolved: -dissolved * carbonDioxide.energy,
    pressure,
    fraction,
  };
}

/** Figures of the percent form, as printed. */
export interface PercentFigures {
  /** 0.30 % kcal/(mol atm). */
  readonly factor: number;
  /** 1.1. */
  readonly oxygen: number;
  /** 2 atm. */
  readonly pressure: number;
}

/** Correction to −ΔU in per cent; negative where the reduction makes the value smaller. Refuses compounds without carbon. */
export function percentCorrection(run: VesselRun, { factor, oxygen, pressure }: PercentFigures): number {
  requireShort(run, "percent");
  const count = (element: string): number => run.formula.counts.get(element) ?? 0;
  const carbon = count("C");
  if (carbon === 0) refuse("The percent form holds for compounds of carbon; use the form full");
  combustionOf(run.formula);
  const atmospheres = run.pressure / ATMOSPHERE;
  const kilocalories = (run.specificEnergy * run.molarMass) / CALORIE / 1000;
  const bracket = -1 + (oxygen * (count("H") - 2 * count("O"))) / (4 * carbon) - pressure / atmospheres;
  return ((factor * atmospheres) / (kilocalories / carbon)) * bracket;
}

function requireShort({ formula, nitric, sulfuric }: VesselRun, form: string): void {
  if (formula.phase === "g") refuse("The compound is a gas; the reduction is written for solids and liquids");
  if (nitric > 0 || sulfuric > 0)
    refuse(`The form ${form} has no terms for acids; leave nitric_mol and sulfuric_mol out, or use the form full`);
}

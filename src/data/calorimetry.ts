/** Figures of oxygen-vessel calorimetry, as printed, with the keys of their sources. */
import type { CertificateConstants } from "../core/calorimeter/certificate";
import type { ChargeRules } from "../core/calorimeter/charge";
import type { TitrationConcentrations } from "../core/calorimeter/titration";
import table from "./calorimetry.json";

/** Coefficients and limits of the condition factor of the benzoic-acid certificate. */
export const certificate: CertificateConstants = table.certificate;

/** Routine molar heats of the acids, J/mol: nitric, sulfuric from a sulfur content, sulfuric from the double titration. */
export const acidMolarHeats = {
  nitric: table.acids.nitric.value,
  sulfuric: table.acids.sulfuric.value,
  titratedSulfuric: table.acids.titratedSulfuric.value,
};

/** Usual concentrations, mol/L, and the usual volume of sodium carbonate, mL, of the double titration. */
export const titration: TitrationConcentrations & { readonly carbonateVolume: number } = table.titration;

/** Heat of combustion of soot, J/g. */
export const sootHeat: number = table.soot.value;

/** Conventional densities of weights and air, g/cm3. */
export const buoyancy = { weights: table.buoyancy.weights.value, air: table.buoyancy.air.value };

/** Thresholds of the charge check. */
export const chargeRules: ChargeRules = {
  ...table.charge,
  heatPerOxygen: table.heatPerOxygen.value,
  heatPerOxygenSpread: table.heatPerOxygen.spread,
};

/** The values of benzoic acid that are taken for one another, J/g. */
export const benzoicAcid: {
  readonly formula: string;
  readonly certified: number;
  readonly inAir: number;
  readonly standardState: number;
} = table.benzoicAcid;

/**
 * Figures of the reduction to the standard state, as printed; they arrive from src/data. Gas figures are per atm, as their source prints
 * them, and are converted where they are used.
 */

/** One atmosphere, MPa; exact by definition. */
export const ATMOSPHERE = 0.101325;

/** Thermochemical calorie, J; exact by definition. */
export const CALORIE = 4.184;

/** What is used for a compound of which nothing else is known, by phase. */
export interface CompoundFigures {
  /** g/mL. */
  readonly density: number;
  /** Thermal expansion by volume, 1/K. */
  readonly expansion: number;
  /** J/(g K). */
  readonly specificHeat: number;
}

export interface GasFigures {
  /** p V = n R T (1 − μ p), μ = pressureFactor (1 + linear x (1 + quadratic x)), x mole fraction of CO2 in the dry gas; 1/atm. */
  readonly pressureFactor: number;
  readonly pressureLinear: number;
  readonly pressureQuadratic: number;
  /** −(∂U/∂p)_T = energy (1 + energyLinear x (1 + x)), J/(mol atm). */
  readonly energy: number;
  readonly energyLinear: number;
  /** Molar heat capacities at constant volume, J/(mol K). */
  readonly heatCapacity: { readonly oxygen: number; readonly carbonDioxide: number };
}

export interface WaterFigures {
  /** g/mol. */
  readonly molarMass: number;
  /** Liquid, g/mL. */
  readonly density: number;
  /** Thermal expansion of the liquid by volume, 1/K. */
  readonly expansion: number;
  /** Liquid, J/(g K). */
  readonly specificHeat: number;
  /** Saturation pressure, MPa. */
  readonly vapourPressure: number;
  /** Energy of vaporisation, J/mol. */
  readonly vaporisation: number;
  /** Second virial coefficients of water vapour with the gases, mL/mol. */
  readonly virialOxygen: number;
  readonly virialCarbonDioxide: number;
}

/** Solubility in water, mol/(L atm), and energy of solution, J/mol (negative: heat is given off). */
export interface Solubility {
  readonly solubility: number;
  readonly energy: number;
}

export interface AcidFigures {
  /** Energy of decomposition of HNO3(aq) into N2, O2 and water, J/mol. */
  readonly nitricDecomposition: number;
  /** Heat of solution of H2SO4 in n mol of water for each mol, kJ/mol, by growing n. */
  readonly dilution: readonly { readonly water: number; readonly heat: number }[];
  /** Water of the standard state of thermochemistry, mol for each mol. */
  readonly referenceWater: number;
  /** Energy of SO2(g) + 1/2 O2(g) + H2O(l) → H2SO4 in the reference water, J/mol. */
  readonly sulfuricFormation: number;
}

/** All at 298.15 K. */
export interface StandardStateConstants {
  readonly gas: GasFigures;
  readonly water: WaterFigures;
  readonly oxygen: Solubility;
  readonly carbonDioxide: Solubility;
  readonly acids: AcidFigures;
  readonly solid: CompoundFigures;
  readonly liquid: CompoundFigures;
}

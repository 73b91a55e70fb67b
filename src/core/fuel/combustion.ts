/**
 * Energy and enthalpy of combustion and enthalpy of formation of one compound, each from any other, at 298.15 K:
 *   ΔcH° = ΔcU° + Δn RT
 *   ΔfH° = a ΔfH°(CO2,g) + b/2 ΔfH°(H2O,l) + e ΔfH°(SO2,g) − ΔcH°
 * Δn is the change of the amount of gas; sulfur goes to SO2(g), nitrogen to N2(g). Gross values are −ΔcU°/M (constant volume) and
 * −ΔcH°/M (constant pressure). Pressure effects of a vessel are not in these relations: they hold between standard states.
 */
import { GAS_CONSTANT, REFERENCE_TEMPERATURE } from "../constants";
import { combustionOf, type Combustion } from "../reaction/combustion";
import type { Formula } from "../species/formula";
import { printed, refuseRange } from "../refusal";

/** Formation value of one product, kJ/mol at 298.15 K. */
export interface Product {
  /** As written in reactions, `CO2(g)`. */
  readonly species: string;
  readonly formation: number;
  /** Uncertainty as printed in the source. */
  readonly uncertainty: number;
}

export interface CombustionProducts {
  readonly carbonDioxide: Product;
  readonly water: Product;
  readonly sulfurDioxide: Product;
}

/** What is known of the compound: gross value at constant volume, J/g (positive); or ΔcH° or ΔfH°, kJ/mol. */
export type Known =
  | { readonly kind: "energy"; readonly gross: number }
  | { readonly kind: "enthalpy"; readonly enthalpy: number }
  | { readonly kind: "formation"; readonly formation: number };

export interface CombustionValues {
  readonly combustion: Combustion;
  /** Δn RT, kJ/mol. */
  readonly gasWork: number;
  /** ΔcU°, kJ/mol, negative. */
  readonly energy: number;
  /** ΔcH°, kJ/mol, negative. */
  readonly enthalpy: number;
  /** ΔfH° of the compound, kJ/mol. */
  readonly formation: number;
  /** −ΔcU° by mass, J/g. */
  readonly grossVolume: number;
  /** −ΔcH° by mass, J/g. */
  readonly grossPressure: number;
  /** Part of the products in the uncertainty of the formation value (or of ΔcH°, if that was calculated), kJ/mol. */
  readonly productUncertainty: number;
  /** Energy by mass of oxygen consumed, kJ/g; near 13 for organic compounds. */
  readonly perOxygen: number;
}

/** RT at 298.15 K, kJ/mol. */
export const THERMAL_ENERGY = (GAS_CONSTANT * REFERENCE_TEMPERATURE) / 1000;

/**
 * All values of a compound from one of them. Molar masses in g/mol, from one table of atomic weights.
 * Refuses what complete combustion does not cover, and a value from which the combustion would not give heat.
 */
export function combustionValues(
  formula: Formula,
  molarMass: number,
  oxygenMass: number,
  known: Known,
  products: CombustionProducts,
): CombustionValues {
  const combustion = combustionOf(formula);
  const gasWork = combustion.gasChange * THERMAL_ENERGY;
  const fromProducts = formationOfProducts(combustion, products);
  const enthalpy = enthalpyFrom(known, molarMass, gasWork, fromProducts);
  const energy = enthalpy - gasWork;
  if (!(energy < 0))
    refuseRange(`The energy of combustion would be ${printed(energy)} kJ/mol; combustion gives off heat, so it is negative`);
  return {
    combustion,
    gasWork,
    energy,
    enthalpy,
    formation: known.kind === "formation" ? known.formation : fromProducts - enthalpy,
    grossVolume: known.kind === "energy" ? known.gross : (-1000 * energy) / molarMass,
    grossPressure: (-1000 * enthalpy) / molarMass,
    productUncertainty: productUncertainty(combustion, products),
    perOxygen: -energy / (combustion.oxygen * oxygenMass),
  };
}

function enthalpyFrom(known: Known, molarMass: number, gasWork: number, fromProducts: number): number {
  if (known.kind === "enthalpy") return known.enthalpy;
  if (known.kind === "formation") return fromProducts - known.formation;
  return (-known.gross * molarMass) / 1000 + gasWork;
}

function formationOfProducts({ carbonDioxide, water, sulfurDioxide }: Combustion, products: CombustionProducts): number {
  return (
    carbonDioxide * products.carbonDioxide.formation + water * products.water.formation + sulfurDioxide * products.sulfurDioxide.formation
  );
}

/** The uncertainties of the products, each times its amount, in quadrature. */
function productUncertainty({ carbonDioxide, water, sulfurDioxide }: Combustion, products: CombustionProducts): number {
  return rootSumSquare(
    carbonDioxide * products.carbonDioxide.uncertainty,
    water * products.water.uncertainty,
    sulfurDioxide * products.sulfurDioxide.uncertainty,
  );
}

function rootSumSquare(...parts: number[]): number {
  return Math.sqrt(parts.reduce((sum, part) => sum + part * part, 0));
}

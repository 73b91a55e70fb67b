import type { CombustionProducts } from "../core/fuel/combustion";
import table from "./combustion-products.json";

/** Formation values of CO2(g), H2O(l) and SO2(g) with their uncertainties, kJ/mol at 298.15 K, and the key of their source. */
export const combustionProducts: CombustionProducts & { readonly source: string } = table;

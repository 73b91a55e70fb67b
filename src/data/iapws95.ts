/** The formulation of water IAPWS-95 with its melting curves and limits, as printed, in K, kg/m³, kJ/(kg K) and MPa. Not part of library.ts. */
import type { FormulationConstants } from "../core/water/formulation-constants";
import table from "./iapws95.json";

/** In SI, with the keys of the sources. */
export const iapws95: FormulationConstants & Record<"source" | "saturatedSource" | "meltingSource", string> = {
  ...table,
  gasConstant: table.gasConstant * 1000,
  highestPressure: table.highestPressure * 1e6,
  melting: table.melting.map((curve) => ({ ...curve, pressure: curve.pressure * 1e6 })),
};

/**
 * Pressure at which water freezes (IAPWS R14-08(2011), eqs. for ice V and ice VI): p = p0 (1 − a (1 − (T/T0)^b)), T0 and p0 of the triple point
 * where the ice begins. From 273.16 K to about 300 K these curves lie below 1000 MPa; ice Ih and ice III melt below 273.16 K.
 */
import type { MeltingCurve } from "./formulation-constants";

/** The ice that forms and its melting pressure, Pa; undefined at a temperature above every curve. */
export function melting(
  curves: readonly MeltingCurve[],
  temperature: number,
): { readonly ice: string; readonly pressure: number } | undefined {
  const curve = curves.find(({ to }) => temperature <= to);
  if (!curve || temperature < curve.from) return undefined;
  const { ice, from, pressure, a, b } = curve;
  return { ice, pressure: pressure * (1 - a * (1 - (temperature / from) ** b)) };
}

/** States of water and steam, by mass. Temperature in K, density in kg/m³, pressure in Pa, J/kg and J/(kg K), speed in m/s. */

/** One phase at a temperature and density; energy and entropy are 0 for the liquid at the triple point. */
export interface WaterPhase {
  readonly temperature: number;
  readonly density: number;
  readonly pressure: number;
  readonly energy: number;
  readonly enthalpy: number;
  readonly entropy: number;
  /** Gibbs energy, J/kg. */
  readonly gibbs: number;
  readonly cv: number;
  readonly cp: number;
  readonly soundSpeed: number;
  /** (∂p/∂ρ) at constant T, J/kg, and (∂p/∂T) at constant density, Pa/K. */
  readonly pressureByDensity: number;
  readonly pressureByTemperature: number;
}

/** Liquid and vapour of equal temperature, pressure and Gibbs energy. */
export interface WaterSaturation {
  readonly temperature: number;
  readonly pressure: number;
  readonly liquid: WaterPhase;
  readonly vapour: WaterPhase;
  /** dp/dT along the saturation line, Pa/K. */
  readonly slope: number;
}

/** The stable state at a temperature and an overall density. */
export interface WaterState {
  readonly phase: "liquid" | "vapour" | "supercritical" | "two-phase";
  readonly temperature: number;
  /** Overall density. */
  readonly density: number;
  readonly pressure: number;
  readonly energy: number;
  readonly entropy: number;
  /** (∂u/∂T) at constant overall density, J/(kg K); of two phases with what evaporates. */
  readonly cv: number;
  /** Mass fraction of vapour; only where there are two phases. */
  readonly vapourFraction?: number;
}

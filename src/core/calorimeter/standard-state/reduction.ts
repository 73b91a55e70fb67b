/**
 * Reduction of the energy of an isothermal process in an oxygen vessel to the reaction between standard states at 298.15 K:
 *   ΔcU° = [ΔU(vessel) + Σ terms] / m
 * ΔU(vessel) = −m q is negative; the terms are those of terms.ts (Washburn 1933; Hubbard, Scott and Waddington 1956).
 */
import { type StandardStateConstants } from "./constants";
import { finalState, initialState, type FinalState, type InitialState, type VesselRun } from "./states";
import { standardTerms, type Term } from "./terms";

export interface Reduction {
  readonly before: InitialState;
  readonly after: FinalState;
  /** Energy of the vessel process, J, negative. */
  readonly vessel: number;
  readonly terms: readonly Term[];
  /** Sum of the terms, J. */
  readonly sum: number;
  /** ΔcU° of the mass burnt, J; products CO2(g), H2O(l), N2(g), and H2SO4 in 115 H2O for the sulfuric acid given. */
  readonly energy: number;
  /** −ΔcU°, J/g. */
  readonly specific: number;
  /** Part of −ΔcU° that is lost if that sulfur goes to SO2(g) instead, J/g. */
  readonly sulfur: number;
}

/** The full reduction of one run. Refuses what `initialState` and `finalState` refuse. */
export function standardReduction(run: VesselRun, constants: StandardStateConstants): Reduction {
  const before = initialState(run, constants);
  const after = finalState(run, before, constants);
  const terms = standardTerms(run, before, after, constants);
  const vessel = -run.mass * run.specificEnergy;
  const sum = terms.reduce((added, { energy }) => added + energy, 0);
  const energy = vessel + sum;
  const sulfur = (-run.sulfuric * constants.acids.sulfuricFormation) / run.mass;
  return { before, after, vessel, terms, sum, energy, specific: -energy / run.mass, sulfur };
}

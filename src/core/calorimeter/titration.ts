/**
 * Nitric and sulfuric acid apart, by titration of the vessel's washings: barium hydroxide to neutral, sodium carbonate in excess,
 * filter, hydrochloric acid back.
 *
 *   n(HNO3) + 2 n(H2SO4) = 2 c_Ba V_Ba          barium takes up both acids
 *   n(HNO3) = 2 c_C V_C − c_HCl V_HCl           carbonate that barium nitrate has not precipitated is found by the acid
 *
 * Derived here from the stoichiometry; the procedure is common practice of coal laboratories.
 */
import { printed, refuseRange } from "../refusal";

/** Volumes, mL. */
export interface TitrationVolumes {
  readonly barium: number;
  readonly carbonate: number;
  readonly acid: number;
}

/** Concentrations of barium hydroxide, sodium carbonate and hydrochloric acid, mol/L. */
export interface TitrationConcentrations {
  readonly barium: number;
  readonly carbonate: number;
  readonly acid: number;
}

/** Amounts of the two acids, mmol. Refuses volumes that would make one negative. */
export function acidsByTitration(volumes: TitrationVolumes, concentrations: TitrationConcentrations): { nitric: number; sulfuric: number } {
  const carbonate = 2 * concentrations.carbonate * volumes.carbonate;
  const back = concentrations.acid * volumes.acid;
  const nitric = carbonate - back;
  if (nitric < -1e-12 * carbonate) {
    return refuseRange(
      `The hydrochloric acid, ${printed(back)} mmol, is more than the carbonate can take, ${printed(carbonate)} mmol: check ${printed(volumes.acid)} mL against ${printed(volumes.carbonate)} mL of carbonate`,
    );
  }
  const all = 2 * concentrations.barium * volumes.barium;
  const sulfuric = (all - nitric) / 2;
  if (sulfuric < -1e-12 * (all + carbonate)) {
    return refuseRange(
      `The nitric acid, ${printed(nitric)} mmol, is more than all acid found with barium hydroxide, ${printed(all)} mmol: check the volumes`,
    );
  }
  return { nitric: Math.max(0, nitric), sulfuric: Math.max(0, sulfuric) };
}

/**
 * The saturation close to the critical point, where the auxiliary equations are too far off to start from and, closer still, the two free
 * energies differ by less than their last digits. With θ = 1 − T/Tc, b the smaller exponent and β of the terms that are not analytic, the
 * formulation itself behaves there as
 *   (ρ' − ρ'')/2 = √θ (B − B1 θ^k),  k = 2b + 1/(2β) − 3 = 0.37        (ρ' + ρ'')/2 = ρc + D θ        p − p(T, ρc) = θ² (P − P1 θ)
 * √θ comes from the analytic terms, θ^k from the cross term of Δ^b. The constants follow from two saturations that are solved, D from the
 * nearer one. Against a solution with 40 digits ρ' − ρ'' is right within 0.6 % and p within 2e-12.
 */
import type { HelmholtzConstants } from "./formulation-constants";
import type { SaturatedDensities } from "./saturated-densities";

/** A saturation that was solved: K, kg/m³, and p − p(T, ρc) in Pa. */
export interface Solved extends SaturatedDensities {
  readonly temperature: number;
  readonly offset: number;
}

export interface CriticalLaw {
  densities(temperature: number): SaturatedDensities;
  /** p − p(T, ρc), Pa. */
  offset(temperature: number): number;
  /** Its derivative with temperature, Pa/K. */
  offsetSlope(temperature: number): number;
}

/** The law through two saturations, the second nearer to the critical point. */
export function criticalLaw(constants: HelmholtzConstants, far: Solved, near: Solved): CriticalLaw {
  const { criticalTemperature, criticalDensity, critical } = constants;
  const [, b, , , , , , beta] = [...critical].sort((one, other) => one[1]! - other[1]!)[0]!;
  const k = 2 * b! + 1 / (2 * beta!) - 3;
  const thetaOf = (temperature: number) => 1 - temperature / criticalTemperature;
  const [away, close] = [thetaOf(far.temperature), thetaOf(near.temperature)];
  const half = ({ liquid, vapour }: SaturatedDensities) => (liquid - vapour) / 2;
  const [width, widthBend] = limitAndBend([away, half(far) / Math.sqrt(away)], [close, half(near) / Math.sqrt(close)], k);
  const [rise, riseBend] = limitAndBend([away, far.offset / away ** 2], [close, near.offset / close ** 2], 1);
  const drift = ((near.liquid + near.vapour) / 2 - criticalDensity) / close;
  return {
    densities: (temperature) => {
      const theta = thetaOf(temperature);
      const middle = criticalDensity + drift * theta;
      const away = Math.sqrt(theta) * (width - widthBend * theta ** k);
      return { liquid: middle + away, vapour: middle - away };
    },
    offset: (temperature) => thetaOf(temperature) ** 2 * (rise - riseBend * thetaOf(temperature)),
    offsetSlope: (temperature) => {
      const theta = thetaOf(temperature);
      return (-theta * (2 * rise - 3 * riseBend * theta)) / criticalTemperature;
    },
  };
}

/** Y and Y1 of y = Y − Y1 θ^exponent through two points. */
function limitAndBend(far: readonly [number, number], near: readonly [number, number], exponent: number): readonly [number, number] {
  const bend = (near[1] - far[1]) / (far[0] ** exponent - near[0] ** exponent);
  return [near[1] + bend * near[0] ** exponent, bend];
}

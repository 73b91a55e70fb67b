/**
 * Factor that carries the certified value of benzoic acid from the conditions of its certificate to those of a run:
 *
 *   f = 1 + a (p − p0) + b (m_s/V − s0) + c (m_w/V − w0) + d (t − t0)
 *
 * p oxygen pressure, m_s/V and m_w/V loads of sample and water per litre of vessel, t temperature of the reaction; a, b, c, d printed in
 * millionths. Source: Coops, Jessup and van Nes 1956, from memory; valid inside the printed limits to about 2 in 100 000.
 */
import { printed, refuseRange } from "../refusal";

/** One term of the factor, in the unit it is printed in. */
export interface CertificateTerm {
  readonly name: string;
  readonly unit: string;
  /** Millionths per unit. */
  readonly coefficient: number;
  /** Value at the conditions of the certificate. */
  readonly reference: number;
  readonly least: number;
  readonly most: number;
}

export interface CertificateConstants {
  readonly pressure: CertificateTerm;
  readonly sampleLoad: CertificateTerm;
  readonly waterLoad: CertificateTerm;
  readonly temperature: CertificateTerm;
  /** Water that saturates the vessel with vapour, g/L. */
  readonly saturatedLoad: number;
}

/** Conditions of a run: MPa absolute, mL, g, g, °C. */
export interface CertificateConditions {
  readonly pressure: number;
  readonly volume: number;
  readonly sampleMass: number;
  readonly waterMass: number;
  readonly temperature: number;
}

/** A condition beside its limits: the value in the unit of the term, and its share of the factor in millionths. */
export interface CertificateShare {
  readonly term: CertificateTerm;
  readonly value: number;
  readonly millionths: number;
  readonly inside: boolean;
}

const MEGAPASCAL_PER_ATMOSPHERE = 0.101325;
const MILLILITRES_PER_LITRE = 1000;

/** Every condition with its share, in the order pressure, sample, water, temperature. */
export function certificateShares(conditions: CertificateConditions, constants: CertificateConstants): readonly CertificateShare[] {
  const { pressure, volume, sampleMass, waterMass, temperature } = conditions;
  if (!(volume > 0)) return refuseRange(`Vessel volume ${printed(volume)} mL is not above 0 mL`);
  const litres = volume / MILLILITRES_PER_LITRE;
  return [
    share(constants.pressure, pressure / MEGAPASCAL_PER_ATMOSPHERE),
    share(constants.sampleLoad, sampleMass / litres),
    share(constants.waterLoad, waterMass / litres),
    share(constants.temperature, temperature),
  ];
}

function share(term: CertificateTerm, value: number): CertificateShare {
  // A limit met exactly may miss it by the last bit of its conversion.
  const slack = 1e-9 * term.most;
  return {
    term,
    value,
    millionths: term.coefficient * (value - term.reference),
    inside: value >= term.least - slack && value <= term.most + slack,
  };
}

/** The factor of the shares. */
export function factorOf(shares: readonly CertificateShare[]): number {
  return 1 + shares.reduce((sum, { millionths }) => sum + millionths, 0) / 1e6;
}

/** The sentence for a condition outside its limits. */
export function outsideLimits({ term: { name, unit, least, most }, value }: CertificateShare): string {
  return `${name} ${printed(value)} ${unit} is outside ${least} to ${most} ${unit}, the limits of the certificate's condition factor`;
}

/**
 * The warning for a vessel with too little water to be saturated before firing; undefined for any other. There the factor fails by more
 * than its limits tell: vapour of the water formed adds its heat of evaporation, some 20 J for each gram of benzoic acid.
 */
export function drynessWarning({ waterMass, volume }: CertificateConditions, { saturatedLoad }: CertificateConstants): string | undefined {
  const saturating = (saturatedLoad * volume) / MILLILITRES_PER_LITRE;
  if (waterMass >= saturating) return undefined;
  return `Water ${printed(waterMass)} g does not saturate the vessel, which takes ${printed(Number(saturating.toPrecision(2)))} g: the factor may be too high by some 0.0008; CAL.STANDARD counts the vapour`;
}

/** The factor; refused outside the printed limits unless `beyond` is true. */
export function certificateFactor(conditions: CertificateConditions, constants: CertificateConstants, beyond = false): number {
  const shares = certificateShares(conditions, constants);
  const outside = shares.find(({ inside }) => !inside);
  if (outside && !beyond) return refuseRange(`${outsideLimits(outside)}; "beyond limits" as last argument gives the value nevertheless`);
  return factorOf(shares);
}

/**
 * Check of a charge before firing, against the limits of the vessel itself: energy of the charge, oxygen pressure, and oxygen sufficiency.
 *
 *   n(O2) = p V / (R T) at 25 °C, ideal gas      needed: by formula, else the heat divided by 13.1 kJ for each gram of oxygen
 *
 * It judges the charge by the numbers given; it knows nothing of the vessel's condition. Thresholds: common practice.
 */
import { GAS_CONSTANT, REFERENCE_TEMPERATURE } from "../constants";
import { printed, refuse, refuseRange } from "../refusal";
import { isAbove } from "../statistics/above";

/** One part of the charge. `oxygenPerGram` in mol/g where the formula is known. */
export interface ChargePart {
  readonly mass: number;
  readonly specificEnergy: number;
  readonly oxygenPerGram?: number;
}

export interface VesselLimits {
  /** Greatest energy of a charge, J, and greatest oxygen pressure, MPa, both from the certificate of the vessel. */
  readonly energy: number;
  readonly pressure: number;
}

export interface ChargeRules {
  /** Share of a limit from which caution is asked for. */
  readonly cautionShare: number;
  /** Oxygen pressure from which caution is asked for, MPa. */
  readonly cautionPressure: number;
  /** Least multiple of the oxygen needed. */
  readonly leastOxygen: number;
  /** Greatest share of the energy limit for an unknown sample. */
  readonly unknownShare: number;
  /** Heat for each gram of oxygen taken up, J/g, where no formula is known. */
  readonly heatPerOxygen: number;
  /** Share by which a compound's own heat may differ from it before formula and heat contradict each other. */
  readonly heatPerOxygenSpread: number;
}

export interface ChargeCheck {
  /** J, and as a share of the limit. */
  readonly energy: number;
  readonly energyShare: number;
  readonly pressureShare: number;
  /** mol */
  readonly oxygen: number;
  readonly oxygenNeeded: number;
  readonly oxygenRatio: number;
  readonly verdict: "do not fire" | "caution" | "within the limits given";
  /** Each reason a sentence, the gravest first. */
  readonly reasons: readonly string[];
}

/** Checks a charge. Pressure MPa absolute, volume mL; `oxygenMolarMass` g/mol. */
export function checkCharge(
  parts: readonly ChargePart[],
  pressure: number,
  volume: number,
  limits: VesselLimits,
  unknown: boolean,
  rules: ChargeRules,
  oxygenMolarMass: number,
): ChargeCheck {
  if (parts.length === 0) return refuse("The charge is empty: give the mass of each part");
  if (!(limits.energy > 0 && limits.pressure > 0)) return refuseRange("The limits of the vessel must be above zero");
  const energy = sum(parts, ({ mass, specificEnergy }) => mass * specificEnergy);
  const oxygen = (pressure * volume) / (GAS_CONSTANT * REFERENCE_TEMPERATURE);
  const oxygenNeeded = sum(parts, (part) => part.mass * oxygenOf(part, rules, oxygenMolarMass));
  const measured = {
    energy,
    energyShare: energy / limits.energy,
    pressureShare: pressure / limits.pressure,
    oxygen,
    oxygenNeeded,
    oxygenRatio: oxygen / oxygenNeeded,
  };
  const forbidding = forbiddingReasons(measured, pressure, limits, unknown, rules);
  const cautioning = cautioningReasons(measured, pressure, limits, unknown, rules);
  const verdict = forbidding.length > 0 ? "do not fire" : cautioning.length > 0 ? "caution" : "within the limits given";
  return { ...measured, verdict, reasons: [...forbidding, ...cautioning] };
}

/** Oxygen needed by a part, mol/g: by formula; where formula and heat contradict each other, the larger of both. */
function oxygenOf({ specificEnergy, oxygenPerGram }: ChargePart, rules: ChargeRules, oxygenMolarMass: number): number {
  const byHeat = specificEnergy / rules.heatPerOxygen / oxygenMolarMass;
  if (oxygenPerGram === undefined) return byHeat;
  const agree = Math.abs(byHeat / oxygenPerGram - 1) <= rules.heatPerOxygenSpread;
  return agree ? oxygenPerGram : Math.max(byHeat, oxygenPerGram);
}

type Measured = Pick<ChargeCheck, "energy" | "energyShare" | "pressureShare" | "oxygenRatio">;

function forbiddingReasons(
  { energy, energyShare, oxygenRatio }: Measured,
  pressure: number,
  limits: VesselLimits,
  unknown: boolean,
  rules: ChargeRules,
): string[] {
  const reasons: string[] = [];
  if (isAbove(energyShare, 1))
    reasons.push(`Do not fire: the charge holds ${printed(energy)} J, above the vessel's limit of ${printed(limits.energy)} J`);
  if (isAbove(pressure, limits.pressure))
    reasons.push(`Do not fire: oxygen at ${printed(pressure)} MPa is above the vessel's limit of ${printed(limits.pressure)} MPa`);
  if (isAbove(rules.leastOxygen, oxygenRatio))
    reasons.push(
      `Do not fire: the oxygen is ${printed(Number(oxygenRatio.toPrecision(3)))} times what complete combustion needs; at least ${rules.leastOxygen} times is asked for`,
    );
  if (unknown && isAbove(energyShare, rules.unknownShare) && !isAbove(energyShare, 1))
    reasons.push(
      `Do not fire: the sample is unknown and the charge is ${percent(energyShare)} of the energy limit; stay below ${percent(rules.unknownShare)}`,
    );
  return reasons;
}

function cautioningReasons(
  { energyShare }: Measured,
  pressure: number,
  limits: VesselLimits,
  unknown: boolean,
  rules: ChargeRules,
): string[] {
  const reasons: string[] = [];
  if (!isAbove(rules.cautionShare, energyShare) && !isAbove(energyShare, 1))
    reasons.push(`Caution: the charge is ${percent(energyShare)} of the vessel's energy limit`);
  if (!isAbove(rules.cautionPressure, pressure) && !isAbove(pressure, limits.pressure))
    reasons.push(`Caution: oxygen at ${printed(pressure)} MPa is at or above 30 atm, ${rules.cautionPressure} MPa`);
  if (unknown && !isAbove(energyShare, rules.unknownShare))
    reasons.push("Caution: the sample is unknown; begin with a small charge and raise it step by step");
  return reasons;
}

function percent(share: number): string {
  return `${printed(Number((100 * share).toPrecision(3)))} %`;
}

function sum<Part>(parts: readonly Part[], of: (part: Part) => number): number {
  return parts.reduce((total, part) => total + of(part), 0);
}

/**
 * Whether a heat capacity looks like one: continuity at its joints, agreement with its formation value, and the bounds that an ideal
 * gas of rigid molecules keeps. A doubt is a reason to look at the page of the source again, never a proof; a misplaced sign or digit
 * in a pasted coefficient shows up here.
 *
 *   joints     |ΔCp|/Cp < 0.5 %, |ΔH| < 0.05 kJ/mol                        common practice
 *   formation  |H(298.15 K) − ΔfH| < 0.05 kJ/mol                           common practice
 *   bounds     Cp ≥ 5/2 R;  1 < γ ≤ 5/3;  Cp ≤ 1.10 × (classical Cv + R)   equipartition; 10 % for anharmonicity and electronic levels
 *   slope      Cp does not fall with temperature                           harmonic oscillators and rotors; not so for atoms
 */
import { GAS_CONSTANT, REFERENCE_TEMPERATURE } from "../constants";
import { printed } from "../refusal";
import type { Capacity } from "./capacity";
import { classicalLimits, type MoleculeShape } from "./limits";

export interface Check {
  readonly check: string;
  readonly verdict: "passed" | "doubt" | "not applicable";
  readonly detail: string;
}

const STEP_OF_CP = 0.005;
const STEP_OF_H = 50;
const ANHARMONICITY = 1.1;
/** Hundredth of R in 50 K: less than any printed table resolves. */
const FALL = 0.01 * GAS_CONSTANT;
const HIGHEST = 3000;
const SAMPLES = 55;

/** Checks that need nothing but the fit and its formation value. */
export function checkContinuity(capacity: Capacity, formationEnthalpy: number | null): Check[] {
  return [
    ...capacity.joints.map((joint) => checkJoint(capacity, joint)),
    checkFormation(capacity, formationEnthalpy),
    checkPositive(capacity),
  ];
}

function checkJoint(capacity: Capacity, joint: number): Check {
  const after = joint * (1 + Number.EPSILON);
  const stepOfCp = capacity.cp(after) - capacity.cp(joint);
  const stepOfH = capacity.enthalpy(after) - capacity.enthalpy(joint);
  const steady = Math.abs(stepOfCp) < STEP_OF_CP * Math.abs(capacity.cp(joint)) && Math.abs(stepOfH) < STEP_OF_H;
  const detail = `Cp steps by ${printed(stepOfCp)} J/(mol K), H by ${printed(stepOfH)} J/mol`;
  return {
    check: `joint at ${joint} K`,
    verdict: steady ? "passed" : "doubt",
    detail: steady ? detail : `${detail}; only a phase transition steps by so much`,
  };
}

function checkFormation(capacity: Capacity, formationEnthalpy: number | null): Check {
  const check = "H(298.15 K) against the formation enthalpy";
  const value = capacity.enthalpy(REFERENCE_TEMPERATURE);
  if (formationEnthalpy === null || !capacity.onFormationScale || Number.isNaN(value)) {
    return { check, verdict: "not applicable", detail: "no formation enthalpy, or 298.15 K is outside the range" };
  }
  const difference = value - formationEnthalpy;
  return { check, verdict: Math.abs(difference) < STEP_OF_H ? "passed" : "doubt", detail: `differs by ${printed(difference)} J/mol` };
}

function checkPositive(capacity: Capacity): Check {
  const found = temperatures(capacity.from, capacity.to).find((at) => !(capacity.cv(at) > 0));
  return {
    check: "Cv above zero",
    verdict: found === undefined ? "passed" : "doubt",
    detail: found === undefined ? "over the whole range" : `${printed(capacity.cv(found))} J/(mol K) at ${printed(found)} K`,
  };
}

/** Checks of an ideal gas against the bounds of its molecule, from 298 K to the end of its range or 3000 K. */
export function checkGas(capacity: Capacity, shape: MoleculeShape): Check[] {
  if (capacity.phase !== "g") return [{ check: "bounds of an ideal gas", verdict: "not applicable", detail: "not a gas" }];
  const at = temperatures(Math.max(capacity.from, 298), Math.min(capacity.to, HIGHEST));
  if (at.length === 0)
    return [
      { check: "bounds of an ideal gas", verdict: "not applicable", detail: `no part of the range lies between 298 and ${HIGHEST} K` },
    ];
  const highest = ANHARMONICITY * (classicalLimits(shape).excited + GAS_CONSTANT);
  return [
    verdictOf(
      "Cp at least 5/2 R",
      at,
      (t) => capacity.cp(t) >= 2.5 * GAS_CONSTANT * (1 - 1e-4),
      (t) => `Cp is ${printed(capacity.cp(t))} J/(mol K)`,
    ),
    verdictOf(
      `Cp at most ${printed(highest)} J/(mol K)`,
      at,
      (t) => capacity.cp(t) <= highest,
      (t) => `Cp is ${printed(capacity.cp(t))} J/(mol K)`,
    ),
    verdictOf(
      "1 < γ ≤ 5/3",
      at,
      (t) => gammaFits(capacity, t),
      (t) => `γ is ${printed(capacity.cp(t) / capacity.cv(t))}`,
    ),
    ...(shape.atoms === 1
      ? []
      : [
          verdictOf(
            "Cp does not fall",
            at.slice(1),
            (t) => capacity.cp(t) >= capacity.cp(t - stepOf(at)) - FALL,
            (t) => `Cp falls to ${printed(capacity.cp(t))} J/(mol K)`,
          ),
        ]),
  ];
}

function gammaFits(capacity: Capacity, temperature: number): boolean {
  const ratio = capacity.cp(temperature) / capacity.cv(temperature);
  return ratio > 1 && ratio <= (5 / 3) * (1 + 1e-4);
}

function verdictOf(
  check: string,
  at: readonly number[],
  holds: (temperature: number) => boolean,
  words: (temperature: number) => string,
): Check {
  const broken = at.find((temperature) => !holds(temperature));
  if (broken === undefined)
    return { check, verdict: "passed", detail: `from ${printed(at[0] ?? NaN)} to ${printed(at[at.length - 1] ?? NaN)} K` };
  return { check, verdict: "doubt", detail: `${words(broken)} at ${printed(broken)} K` };
}

/** Evenly spaced temperatures from one limit to the other, both included; none if the limits do not rise. */
function temperatures(from: number, to: number): number[] {
  if (!(to > from)) return [];
  return Array.from({ length: SAMPLES }, (_, index) => Math.min(from + ((to - from) * index) / (SAMPLES - 1), to));
}

function stepOf(at: readonly number[]): number {
  return at[1]! - at[0]!;
}

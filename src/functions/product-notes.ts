/**
 * What is odd about the species of an equilibrium at the temperature it ended at: some were passed over, atoms or others that form are
 * not among them, fits were carried beyond their range as asked for. Each note is a sentence of the table's warnings.
 */
import type { Capacity } from "../core/capacity/capacity";
import type { Equilibrium } from "../core/equilibrium/types";
import { printed } from "../core/refusal";
import { absentNotes } from "./absent-products";
import type { ProductSystem } from "./products";

/** What becomes of a state without free atoms, by what it holds: they would take up energy and make more gas. */
const WITHOUT_ATOMS = {
  "energy and volume": "temperature and pressure come out too high",
  "enthalpy and pressure": "the temperature comes out too high",
  "temperature and volume": "pressure and energy come out too low",
  "temperature and pressure": "volume and energy come out too low",
} as const;

/** What is odd about the species of a state: passed over, without atoms or others that form in it, beyond their fits. */
export function productNotes(
  { passedOver, withoutAtoms, absent, candidates, fitted }: ProductSystem,
  equilibrium: Equilibrium,
  held: keyof typeof WITHOUT_ATOMS,
): string[] {
  const { temperature } = equilibrium;
  return [
    ...(passedOver.length === 0 ? [] : [`Without enthalpy of formation or entropy, and so passed over: ${passedOver.join(", ")}`]),
    ...(withoutAtoms.length === 0 || temperature < ATOMS_FROM
      ? []
      : [
          `No free atoms of ${withoutAtoms.join(", ")} are among the species; they form at ${printed(temperature)} K, so that ${WITHOUT_ATOMS[held]}`,
        ]),
    ...absentNotes(absent, candidates, equilibrium),
    ...extrapolationNotes(fitted, temperature),
  ];
}

/** Below this, K, free atoms of the halogens and the like are rare. */
const ATOMS_FROM = 1500;

/** One sentence if the temperature, K, lies beyond a fit that is carried on: whose range is the narrowest, and how many there are. */
export function extrapolationNotes(fitted: readonly Capacity[], temperature: number): string[] {
  return [above(fitted, temperature), below(fitted, temperature)].flatMap((sentence) => sentence ?? []);
}

function above(fitted: readonly Capacity[], temperature: number): string | undefined {
  const beyond = fitted.filter(({ to }) => temperature > to).sort((a, b) => a.to - b.to);
  return beyond[0] && carriedOn(temperature, "above", `${printed(beyond[0].to)} K, the upper limit of ${beyond[0].toLabel}`, beyond.length);
}

function below(fitted: readonly Capacity[], temperature: number): string | undefined {
  const beyond = fitted.filter(({ from }) => temperature < from).sort((a, b) => b.from - a.from);
  return (
    beyond[0] && carriedOn(temperature, "below", `${printed(beyond[0].from)} K, the lower limit of ${beyond[0].fromLabel}`, beyond.length)
  );
}

function carriedOn(temperature: number, side: string, limit: string, count: number): string {
  const more = count === 1 ? "" : ` (and beyond that of ${count - 1} more)`;
  return `Extrapolated as asked for: ${printed(temperature)} K is ${side} ${limit}${more}; beyond it the heat capacity is held`;
}

/**
 * The table of REACTION.RIGID: a complete reaction in a rigid vessel, from the reactants at T1 and P1 to the products at T2.
 * The family file holds the worksheet function; here is what it shows.
 */
import { explainTemperature } from "../core/capacity/range";
import { type MoistureFinding, moistureFinding } from "../core/reaction/moisture";
import { formationUncertainty, gasOf, limiting, reacting } from "../core/reaction/reaction";
import { type RigidReaction, rigidReaction, type RigidStart } from "../core/reaction/rigid";
import { printed } from "../core/refusal";
import { sourceOf } from "../data/library";
import { saturation } from "../data/saturation";
import { type Expected, readPressure, readTemperature } from "./arguments";
import { idealNotes } from "./burnt";
import { Block, cells } from "./cell";
import { pressureNotes } from "./equilibrium";
import { heldNotes } from "./formation-species";
import { type FittedPart, type Reaction, reactionOf, requireInside } from "./reaction-parts";
import { setsOf, wholeSets } from "./reaction-sets";
import { outsidePublished } from "./reaction-uncertainty";
import { line, type Line, type Report, SEE_NOTE, table } from "./table";

const T1: Expected = { name: "Temperature T1", unit: "K", example: '"25 °C"' };
const P1: Expected = { name: "Pressure P1", unit: "Pa", example: '"1 atm"' };
const T2: Expected = { name: "Temperature T2", unit: "K", example: '"25 °C"' };

/** Upright table, or one row for each of a column of states. Plain units K, Pa, K; amounts and energies per mole of equation as written. */
export function rigidCells(equation: Block, T1Block: Block, P1Block: Block, T2Block: Block, set?: Block): Block {
  return cells(() => {
    const whole = wholeSets(set);
    return table(
      [
        ["equation", equation],
        ["T1", T1Block],
        ["P1", P1Block],
        ["T2", T2Block],
        ["set", whole ? undefined : set],
      ],
      ([text, first, pressure, second, setCell]) => {
        const reaction = reactionOf(text, whole ?? setsOf(setCell));
        const start = { temperature: readTemperature(first, T1), pressure: readPressure(pressure, P1) };
        return report(reaction, start, readTemperature(second, T2), pressureNotes(pressure));
      },
    );
  });
}

function report({ text, parts }: Reaction, start: RigidStart, end: number, odd: readonly string[]): Report {
  const [reactants, products] = [parts.filter(({ left }) => left > 0), parts.filter(({ right }) => right > 0)];
  requireInside(reactants, start.temperature);
  requireInside(products, end);
  const found = rigidReaction(parts, start, end);
  return {
    lines: [
      line("reaction", text, "", "amounts and energies below are for one mole of it as written"),
      ...energyLines(found, products, start.temperature, end),
      ...uncertaintyLines(parts),
      ...gasLines(found, start, end),
      line("sets", setsText(parts)),
      line("assumptions", SEE_NOTE, "", ASSUMPTIONS),
      line("caution", SEE_NOTE, "", CAUTION),
    ],
    warnings: [
      ...odd,
      ...moistureWarnings(parts, found.volume, start.temperature, "left", "before the reaction"),
      ...moistureWarnings(parts, found.volume, end, "right", "after the reaction"),
      ...dissociationNotes(end),
      ...idealNotes(start.pressure * Math.max(1, found.pressureRatio), end),
      ...heldNotes(parts),
      ...reacting(parts).flatMap((part) => outsidePublished(part.fit, part.published) ?? []),
    ],
  };
}

/** Above this, K, water and carbon dioxide dissociate by a per cent and more at atmospheric pressure. */
const DISSOCIATES_FROM = 2000;

function dissociationNotes(end: number): string[] {
  if (end < DISSOCIATES_FROM) return [];
  return [`At ${printed(end)} K the products of most reactions dissociate, which the equation leaves out: see EQUILIBRIUM.ATVOLUME`];
}

const ASSUMPTIONS =
  "complete reaction as written is assumed, with no other reaction and no dissociation; gases are ideal; solids and liquids have no volume and U = H; walls are not counted";
const CAUTION = "not a design or relief calculation; the vessel's own rating, local codes and licensed practice govern";

function energyLines(
  { heat, energyOfReaction, sensible }: RigidReaction,
  products: readonly FittedPart[],
  first: number,
  second: number,
): Line[] {
  const limit = limiting(products, first);
  const shown = (value: number | undefined) => (value === undefined ? "not known" : value / 1000);
  const reason = limit && explainTemperature(limit, first).message;
  return [
    line("heat into the contents", heat / 1000, "kJ/mol", "from the reactants at T1 to the products at T2; negative: given off"),
    line("energy of reaction ΔrU", shown(energyOfReaction), "kJ/mol", reason ?? `at T1, ${printed(first)} K`),
    line(
      "heating of the products",
      shown(sensible),
      "kJ/mol",
      reason ?? `from ${printed(first)} K to ${printed(second)} K at constant volume`,
    ),
  ];
}

function uncertaintyLines(parts: readonly FittedPart[]): Line[] {
  const { value, unknown } = formationUncertainty(parts);
  return [
    line("uncertainty from formation values", value / 1000, "kJ/mol", uncertaintyNote(parts)),
    line(
      "without published uncertainty",
      unknown.join(", ") || "none",
      "",
      "species whose formation value is not in the uncertainty above",
    ),
  ];
}

function uncertaintyNote(parts: readonly FittedPart[]): string {
  const rows = reacting(parts).flatMap(({ published }) => published.row ?? []);
  const values = rows.map(({ species, uncertainty, fromMemory }) => `${species} ± ${uncertainty}${fromMemory ? " (from memory)" : ""}`);
  const sources = [...new Set(rows.map(({ source }) => sourceOf(source).citation))];
  return [
    "published values, about 95 %, each times its amount, in quadrature as if independent; elements in their reference state are exact",
    ...(values.length > 0 ? [`${values.join(", ")} kJ/mol: ${sources.join("; ")}`] : []),
    "heat capacities are not in it",
  ].join("; ");
}

function gasLines({ gasBefore, gasAfter, pressureRatio, volume }: RigidReaction, { pressure }: RigidStart, end: number): Line[] {
  const none = gasAfter === 0;
  return [
    line("gas before", gasBefore, "mol/mol"),
    line("gas after", gasAfter, "mol/mol"),
    line("change in gas", gasAfter - gasBefore, "mol/mol", "gas formed less gas consumed"),
    line(
      "final pressure P2",
      none ? "no gas left" : pressure * pressureRatio,
      "Pa",
      none
        ? "what remains is the vapour pressure of the liquids and solids, which is not given here"
        : `absolute, at T2, ${printed(end)} K`,
    ),
    line("pressure ratio P2/P1", none ? "no gas left" : pressureRatio, "", "gas after / gas before × T2/T1"),
    line("volume", volume, "m3/mol", "of the vessel for one mole of the equation: gas before × R T1/P1"),
  ];
}

/** `nasa-2002`, or each set with its species. */
function setsText(parts: readonly FittedPart[]): string {
  const species = new Map<string, string[]>();
  for (const { fit } of parts) species.set(fit.set, [...(species.get(fit.set) ?? []), fit.species]);
  return species.size === 1 ? [...species.keys()][0]! : [...species].map(([set, names]) => `${set}: ${names.join(", ")}`).join("; ");
}

/** A change of phase below this share of the gas and of the water is not worth a warning. */
const WORTH_SAYING = 0.01;

function moistureWarnings(
  parts: readonly FittedPart[],
  volume: number,
  temperature: number,
  side: "left" | "right",
  when: string,
): string[] {
  const amount = (phase: string) =>
    parts.filter(({ fit }) => fit.formula === "H2O" && fit.phase === phase).reduce((sum, part) => sum + part[side], 0);
  const water = { vapour: amount("g"), liquid: amount("l"), temperature, volume };
  const finding = moistureFinding(water, saturation);
  if (!finding) return [];
  if (finding.amount < WORTH_SAYING * Math.min(gasOf(parts, side), water.vapour + water.liquid)) return [];
  return [moistureSentence(finding, water, when)];
}

function moistureSentence(
  { kind, partial, saturation: saturated, amount }: MoistureFinding,
  { vapour, liquid, temperature }: { vapour: number; liquid: number; temperature: number },
  when: string,
): string {
  const over = temperature < saturation.tripleTemperature ? "over ice" : "over liquid water";
  const limit = `the saturation pressure ${over} at ${printed(temperature)} K, ${printed(saturated)} Pa`;
  if (kind === "condenses")
    return `Water ${when}: the partial pressure of H2O(g), ${printed(partial)} Pa, is above ${limit}: ${printed(amount)} of ${printed(vapour)} mol would condense, which heat and pressure here do not count`;
  const all = kind === "evaporates" ? "all of it" : `${printed(amount)} of ${printed(liquid)} mol`;
  return `Water ${when}: H2O(l) would evaporate, ${all}, which heat and pressure here do not count: all as vapour it would have the partial pressure ${printed(partial)} Pa, against ${limit}`;
}

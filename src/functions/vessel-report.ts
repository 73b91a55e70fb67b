/**
 * The tables of VESSEL.REACH and VESSEL.ABSORB: a gas in a closed vessel from T1 to T2, or with a heat taken up. The family file holds the
 * worksheet functions; here is what they show. What belongs to the model is in vessel-model-lines.ts.
 */
import { reach, type Reached, temperatureAfter } from "../core/vessel/reach";
import type { GasState } from "../core/vessel/gas-content";
import { printed } from "../core/refusal";
import type { HeatStore, PressureLimit } from "../core/vessel/types";
import { HEAT, readQuantity, readTemperature, readVolume } from "./arguments";
import type { Named } from "./broadcast";
import { type Block, type Cell, cells } from "./cell";
import { remindingOfCelsius } from "./celsius";
import { pressureNotes } from "./equilibrium";
import { idealIfClose, readModel } from "./gas-model";
import { hazardLines, traceNotes } from "./hazard";
import { extrapolationNotes } from "./product-notes";
import { blockChoice, setOf } from "./set";
import { capacityOfFit, type Substance, substanceArgument, substanceOf } from "./substance";
import { line, type Line, type Report, table } from "./table";
import { type Limited, limitLines, limitOf, readLimit } from "./vessel-limit";
import { modelLines, modelWarnings } from "./vessel-model-lines";
import { filled, type Filling, modelFor, requireTold, T1, T2 } from "./vessel-filling";
import { readWall, wallNote } from "./vessel-wall";
import { governLine } from "./vessel-words";

export interface VesselArguments {
  readonly substance: Block;
  readonly volume: Block;
  readonly T1: Block;
  readonly charge: Block;
  /** T2 of REACH, heat of ABSORB. */
  readonly T2?: Block;
  readonly heat?: Block;
  readonly wall?: Block;
  readonly model?: Block;
  readonly limit?: Block;
  readonly set?: Block;
}

const NAMES = ["volume", "T1", "charge", "T2", "heat", "wall", "model"] as const;
type Values = Readonly<Record<(typeof NAMES)[number], Cell | undefined>>;

/** Upright for one state, one row for each of a column of states. */
export function vesselCells(given: VesselArguments): Block {
  return cells(() => {
    const argument = substanceArgument(given.substance);
    const limit = readLimit(given.limit);
    const whole = blockChoice(given.set);
    const named: readonly Named[] = [
      ["substance", argument.texts],
      ["set", whole ? undefined : given.set],
      ["limit", limit.values],
      ...NAMES.map((name) => [name, given[name]] as const),
    ];
    return table(named, ([substanceCell, setCell, limitCell, ...values]) => {
      const found = substanceOf(argument, substanceCell, whole ?? setOf(setCell));
      const by = Object.fromEntries(NAMES.map((name, i) => [name, values[i]])) as Values;
      const allowed = limitOf(limit, limitCell);
      return remindingOfCelsius([by.T1, by.T2], () => reportOf(found, by, allowed, given.heat !== undefined));
    });
  });
}

/** One state: brought to T2, or to the temperature a heat leads to. */
function reportOf(found: Substance, by: Values, limit: PressureLimit | undefined, isHeat: boolean): Report {
  const first = readTemperature(by.T1, T1);
  const filling = filled(found, readVolume(by.volume), first, by.charge, readModel(by.model));
  const wall = readWall(by.wall);
  const last = isHeat ? temperatureAfter(filling.content, wall, first, readQuantity(by.heat, HEAT)) : readTemperature(by.T2, T2);
  const model = modelFor(found, filling, [first, last]);
  const reached = reach(filling.content, wall, first, last);
  for (const state of [reached.before, reached.after]) requireTold(found, filling.content, state);
  const limited = limitLines(filling.content, limit, first, last);
  requireCloseAtLimit(found, filling, limited);
  return {
    lines: [
      ...hazardLines(found.parts, Math.max(first, last)),
      ...contentLines(found, filling, reached),
      ...modelLines(found, model, filling, reached),
      ...heatLines(reached, wall),
      ...limited.lines,
      governLine("frozen composition, contents and wall at one temperature, no leak, no heat lost"),
    ],
    warnings: [
      ...limited.warnings,
      ...modelWarnings(found, model, filling, reached),
      ...traceNotes(found.parts, Math.max(first, last)),
      ...pressureNotes(filling.byPressure ? by.charge : undefined),
      ...extrapolationNotes(
        found.parts.map(({ fit }) => capacityOfFit(fit)),
        last,
      ),
    ],
  };
}

/** The ideal gas of a model left out has to be close enough where it reaches the limit too: that is further up, where it differs more. */
function requireCloseAtLimit(found: Substance, { named, content }: Filling, { reached }: Limited): void {
  if (named !== undefined || reached?.kind !== "reached") return;
  idealIfClose(found, [{ temperature: reached.temperature, volume: content.molarVolume, words: "where it would reach the limit" }]);
}

function contentLines({ molarMass }: Substance, { content, byPressure, pressure }: Filling, { before, after }: Reached<GasState>): Line[] {
  const T1 = `at T1, ${printed(before.temperature)} K`;
  const room = `in ${printed(content.volume)} m3`;
  return [
    line("amount", content.amount, "mol", byPressure ? `from the pressure ${T1}, ${room}` : `as given, ${room}`),
    line("mass", content.amount * molarMass, "kg"),
    line("pressure at T1", pressure, "Pa", byPressure ? "as given, absolute" : `absolute, ${T1}`),
    line("temperature T2", after.temperature, "K"),
    line("pressure at T2", after.pressure, "Pa", "absolute"),
  ];
}

function heatLines({ before, after, contents, wall, heat }: Reached<GasState>, store: HeatStore | undefined): Line[] {
  return [
    line("heat into contents", contents, "J", "rise of their internal energy at constant volume; negative: given off"),
    store
      ? line("heat into wall", wall, "J", wallNote(store, before.temperature, after.temperature))
      : line("heat into wall", 0, "J", "no wall given; the wall of a vessel often takes far more heat than its gas"),
    line("heat", heat, "J", "contents and wall"),
  ];
}

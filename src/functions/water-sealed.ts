/**
 * The table of WATER.SEALED: water, and perhaps a gas, heated or cooled in a sealed vessel. The core (water-content.ts) holds the laws; here
 * is what is shown. Energies of the water count from the liquid at the triple point, and only differences are told.
 */
import { printed } from "../core/refusal";
import { reach, type Reached } from "../core/vessel/reach";
import type { WaterContent, WaterContentState } from "../core/vessel/water-content";
import { iapws95 } from "../data/iapws95";
import type { Named } from "./broadcast";
import { type Block, cells } from "./cell";
import { hazardLines, traceNotes } from "./hazard";
import { FIRST_CHOICE } from "./set";
import { substanceOf } from "./substance";
import { line, type Line, type Report, table } from "./table";
import { requireUncondensed } from "./vessel-filling";
import { limitLines, limitOf, readLimit } from "./vessel-limit";
import { wallNote } from "./vessel-wall";
import { governLine } from "./vessel-words";
import { sealedWarnings } from "./water-sealed-notes";
import { type Gas, readSealed, type Sealed } from "./water-sealed-reading";

/** The arguments as cells. */
export interface SealedBlocks {
  readonly volume: Block;
  readonly mass: Block;
  readonly T1: Block;
  readonly T2: Block;
  readonly gas?: Block;
  readonly wall?: Block;
  readonly expansion?: Block;
  readonly limit?: Block;
}

/** Upright table, or one row for each of a column of states. */
export function sealedCells(blocks: SealedBlocks): Block {
  return cells(() => {
    const limit = readLimit(blocks.limit);
    const named: readonly Named[] = [
      ["volume", blocks.volume],
      ["mass", blocks.mass],
      ["T1", blocks.T1],
      ["T2", blocks.T2],
      ["gas", blocks.gas],
      ["wall", blocks.wall],
      ["wall_expansion", blocks.expansion],
      ["limit", limit.values],
    ];
    return table(named, (values) => report(readSealed(values, limitOf(limit, values[7]))));
  });
}

function report(sealed: Sealed): Report {
  const { content, T1, T2, wall, gas, limit } = sealed;
  if (gas) requireUncondensed(gas.substance, T1, gas.pressure);
  const reached = reach(content, wall, T1, T2);
  const limits = limitLines(content, limit, T1, T2);
  const together = gas ? [...gas.substance.parts, ...substanceOf({}, "H2O", FIRST_CHOICE).parts] : [];
  return {
    lines: [
      ...hazardLines(together, Math.max(T1, T2)),
      ...chargeLines(sealed, reached.after),
      ...stateLines(sealed, reached),
      ...heatLines(sealed, reached),
      ...endLines(sealed),
      ...limits.lines,
      governLine(HOLDS_FOR),
    ],
    warnings: [...limits.warnings, ...sealedWarnings(sealed, reached), ...traceNotes(together, Math.max(T1, T2))],
  };
}

const HOLDS_FOR =
  "water by IAPWS-95, liquid under the total pressure, vapour at its own saturation pressure; the gas is ideal, shares the room of the vapour and does not dissolve; one temperature throughout";

function chargeLines({ content, gas, humidity, T1 }: Sealed, after: WaterContentState): Line[] {
  const { mass, volume, expansion } = content.charge;
  const given = humidity === undefined ? "" : `vapour at ${printed(100 * humidity)} % of the saturated density at T1`;
  const expanded = `at T2; ${printed(volume)} m3 at T1, expansion ${printed(expansion)} 1/K by volume`;
  return [
    line("mass of water", mass, "kg", given),
    line("volume", after.volume, "m3", expansion > 0 ? expanded : "the same at T1 and T2: no expansion of the wall"),
    gas ? line("gas", gas.text, "", `partial pressure at T1, ${printed(T1)} K; ${setsOf(gas)}`) : line("gas", "no air counted", "", NO_AIR),
    line("amount of gas", content.gasAmount, "mol"),
  ];
}

const NO_AIR = 'water alone, as if the air had been drawn off: a vessel closed in air also holds it, give gas as "101325 Pa air"';

function setsOf({ substance }: Gas): string {
  return `heat capacity by ${[...new Set(substance.parts.map(({ fit }) => fit.set))].join(", ")}`;
}

function stateLines({ gas }: Sealed, { before, after }: Reached<WaterContentState>): Line[] {
  const none = "above critical";
  return [
    line("pressure at T1", before.pressure, "Pa", pressureNote(before, gas)),
    line("pressure at T2", after.pressure, "Pa", pressureNote(after, gas)),
    line("phase at T1", before.phase),
    line("phase at T2", after.phase),
    line("vapour fraction at T2", after.vapourFraction ?? none, "kg/kg", "of the water"),
    line("liquid at T2", after.liquidShare ?? none, "m3/m3", "share of the volume"),
    line("saturation pressure at T2", after.saturationPressure ?? none, "Pa", "of water"),
    line("partial pressure of gas at T2", after.gasPressure, "Pa", gas ? `in ${printed(after.gasRoom)} m3` : "no gas"),
  ];
}

function pressureNote({ pressure, gasPressure }: WaterContentState, gas: Gas | undefined): string {
  return gas ? `absolute; water ${printed(pressure - gasPressure)} Pa + gas ${printed(gasPressure)} Pa` : "absolute";
}

function heatLines({ content, wall, T1, T2 }: Sealed, { before, after, wall: taken, heat }: Reached<WaterContentState>): Line[] {
  const grown = after.volume - before.volume;
  const work = grown === 0 ? "" : `; work on the vessel as it grows is left out, p2 dV = ${printed(after.pressure * grown)} J`;
  const same = before.temperature === after.temperature;
  return [
    line("heat into water", same ? 0 : after.waterEnergy - before.waterEnergy, "J", evaporationNote(content, before, after)),
    line("heat into gas", same ? 0 : after.gasEnergy - before.gasEnergy, "J"),
    line("heat into wall", taken, "J", wall ? wallNote(wall, T1, T2) : "no wall counted"),
    line("heat in all", heat, "J", `from T1, ${printed(T1)} K, to T2; negative: given off${work}`),
  ];
}

function evaporationNote(content: WaterContent, before: WaterContentState, after: WaterContentState): string {
  if (before.vapourFraction === undefined || after.vapourFraction === undefined) return "";
  const evaporated = content.charge.mass * (after.vapourFraction - before.vapourFraction);
  if (evaporated === 0) return "nothing evaporates or condenses";
  return `${printed(Math.abs(evaporated))} kg ${evaporated > 0 ? "evaporate" : "condense"}, counted`;
}

/** Where the vessel becomes liquid-full, or the last liquid evaporates, and the heat that leads there. */
function endLines(sealed: Sealed): Line[] {
  const { content, T2 } = sealed;
  const { kind, temperature } = content.phaseEnd;
  const slope = content.pressurePerKelvin(T2);
  const [full, dew] = [kind === "full" ? temperature! : undefined, kind === "dew" ? temperature! : undefined];
  return [
    line("liquid-full at", full ?? (kind === "always full" ? "always" : "never"), "K", fullNote(sealed)),
    line("heat from T1 to liquid-full", ...heatToFull(sealed, full)),
    line("dew temperature", dew ?? "none", "K", dewNote(sealed)),
    line(
      "pressure per kelvin at T2",
      slope ?? (content.isSqueezed(T2) ? "not known" : "not liquid-full"),
      "Pa/K",
      slope === undefined ? "" : "dp/dT at constant amounts",
    ),
  ];
}

function fullNote({ content, gas, T1 }: Sealed): string {
  const { kind, temperature } = content.phaseEnd;
  if (kind === "always full") return "liquid at every temperature: the pressure is that of liquid without a free surface";
  if (kind !== "full") return "the liquid evaporates before it fills the vessel";
  const where = temperature! < T1 ? "below T1: already full there; " : "";
  return gas
    ? `${where}of the water alone; from about there on it squeezes the gas, and the pressure rises steeply`
    : `${where}from there on there is no free surface, and the pressure rises steeply`;
}

function heatToFull({ content, wall, T1 }: Sealed, full: number | undefined): [number | string, string, string] {
  if (full === undefined) return ["none", "J", ""];
  if (full <= T1) return ["none", "J", "full at T1"];
  if (wall && full > wall.to) return ["not known", "J", `${wall.toLabel} ends at ${printed(wall.to)} K`];
  return [reach(content, wall, T1, full).heat, "J", "water, gas and wall"];
}

function dewNote({ content, gas }: Sealed): string {
  const { kind } = content.phaseEnd;
  if (kind === "dew")
    return `liquid below, none above: condensation begins here on cooling${gas ? "; the gas is taken not to shift it" : ""}`;
  return kind === "always vapour" ? `no liquid down to ${iapws95.from} K` : "the vapour disappears first";
}

/**
 * What a table says about the model of a gas: its figures and their sources, the phases, the ideal gas beside it and the published second
 * virial coefficient, where there is one, with the size of the differences.
 */
import { GAS_CONSTANT } from "../core/constants";
import { criticalVolume } from "../core/realgas/saturation";
import { type CubicState, cubicState } from "../core/realgas/state";
import { leastVirialVolume, secondVirial, virialPressure } from "../core/realgas/virial";
import { printed, Refusal } from "../core/refusal";
import type { GasState } from "../core/vessel/gas-content";
import type { Reached } from "../core/vessel/reach";
import { virialOf } from "../data/critical";
import { cubicEquations } from "../data/cubic-equations";
import { CLOSE_ENOUGH, keyOf, type Model, type RealGas, realGasOf } from "./gas-model";
import { condensation } from "./gas-phase";
import type { Substance } from "./substance";
import { line, type Line } from "./table";
import type { Filling } from "./vessel-filling";

export type States = Reached<GasState>;

/**
 * Lines on model, phases and compressibility, and the other models beside it. What only the ideal gas has stands above the line `model`,
 * what only an equation has below it, so that columns of both stand in one order, whichever comes first.
 */
export function modelLines(found: Substance, model: Model, filling: Filling, states: States): Line[] {
  return [
    ...(model.kind === "ideal" ? judgeLines(found, filling, states) : []),
    modelLine(model),
    ...(model.kind === "real" ? [...phaseLines(filling, states), ...compressibilityLines(states), ...idealLines(states)] : []),
    ...virialLines(found, model, filling, states),
  ];
}

function modelLine(model: Model): Line {
  if (model.kind === "ideal")
    return line("model", "ideal gas", "", model.named ? "as named" : "both equations differ by less than 1 % at T1 and T2");
  const { equation, constants, pairs, gas } = model.real;
  const points = constants.map(
    ({ temperature, pressure, acentric, source, fromMemory }, i) =>
      `${gas.parts[i]!.critical.species}: Tc ${temperature} K, pc ${pressure} MPa, acentric factor ${acentric} (${source}${fromMemory ? ", from memory" : ""})`,
  );
  return line(
    "model",
    equation.title,
    "",
    [`${equation.source}; ${points.join("; ")}`, pairText(model.real, pairs.length)].filter(Boolean).join("; "),
  );
}

/** Binary parameters as they are cited; the others are 0, which has to be said. */
function pairText({ pairs, gas, equation }: RealGas, cited: number): string {
  const all = (gas.parts.length * (gas.parts.length - 1)) / 2;
  if (all === 0) return "";
  const own = pairs.map(({ pair, kij, source, fromMemory }) => `${pair.join("-")} ${kij} (${source}${fromMemory ? ", from memory" : ""})`);
  const rest = cited === 0 ? "binary parameters 0" : cited < all ? "the others 0" : "";
  const why = cited === 0 ? `: none is cited for ${equation.id === "soave" ? "this equation" : "these pairs"}` : "";
  return [own.length > 0 ? `binary parameters ${own.join(", ")}` : "", `${rest}${why}`].filter(Boolean).join(", ");
}

function phaseLines({ content }: Filling, { before, after }: States): Line[] {
  const phase = (state: GasState) => (state.phase === "two-phase" ? "liquid and vapour" : state.phase);
  const fraction = (label: string, { vapourFraction }: GasState) =>
    vapourFraction === undefined ? [] : [line(label, vapourFraction, "mol/mol", "share of the amount that is vapour")];
  const end = content.twoPhasesUpTo;
  const isThin = content.gas !== undefined && content.molarVolume > criticalVolume(content.gas);
  return [
    line("phase at T1", phase(before)),
    ...fraction("vapour fraction at T1", before),
    line("phase at T2", phase(after)),
    ...fraction("vapour fraction at T2", after),
    ...(end === undefined || (before.phase !== "two-phase" && after.phase !== "two-phase")
      ? []
      : [
          line(
            "two phases up to",
            end,
            "K",
            isThin ? "above it all is vapour" : "above it liquid fills the vessel and the pressure rises steeply with temperature",
          ),
        ]),
  ];
}

function compressibilityLines({ before, after }: States): Line[] {
  return [
    line("compressibility at T1", before.compressibility, "-", "P V/(n R T)"),
    line("compressibility at T2", after.compressibility, "-", "P V/(n R T)"),
  ];
}

/** What is often written instead: P1 T2/T1. */
function idealLines({ before, after }: States): Line[] {
  const ideal = (before.pressure * after.temperature) / before.temperature;
  return [
    line("ideal gas at T2", ideal, "Pa", "P1 T2/T1, from the same pressure at T1"),
    line("above the ideal gas", 100 * (after.pressure / ideal - 1), "%", "pressure at T2 above P1 T2/T1"),
  ];
}

/** Beside an ideal gas the equation that judges it, where it can tell. */
function judgeLines(found: Substance, { content }: Filling, { after }: States): Line[] {
  const judged = judgedState(found, after.temperature, content.molarVolume);
  if (judged === undefined) return [];
  const beside =
    judged.phase === "two-phase" ? "; its vapour pressure: part of it is liquid" : judged.phase === "liquid" ? "; all of it is liquid" : "";
  return [
    line("Peng-Robinson at T2", judged.pressure, "Pa", `from the same amount${beside}`),
    line("Peng-Robinson above the ideal gas", 100 * (judged.pressure / after.pressure - 1), "%", "at T2, from the same amount"),
  ];
}

/** Pressure by Peng-Robinson, Pa, at K and m³/mol; undefined where it tells none. */
export function judgedPressure(found: Substance, temperature: number, volume: number): number | undefined {
  return judgedState(found, temperature, volume)?.pressure;
}

function judgedState(found: Substance, temperature: number, volume: number): CubicState | undefined {
  try {
    return cubicState(realGasOf(found, cubicEquations[0]!).gas, temperature, volume);
  } catch (thrown) {
    if (thrown instanceof Refusal) return undefined;
    throw thrown;
  }
}

/** The published second virial coefficient of a pure gas at T2, and the pressure it gives at the same amount. */
function virialLines(found: Substance, model: Model, { content }: Filling, { after: { temperature, pressure } }: States): Line[] {
  const { parts } = found;
  const constants = parts.length === 1 ? virialOf(keyOf(parts[0]!.species)) : undefined;
  if (constants === undefined || !(temperature >= constants.from && temperature <= constants.to)) return [];
  const b = secondVirial(temperature, constants);
  const own = model.kind === "real" ? `; ${model.real.equation.title} has ${printed(1e6 * model.real.gas.secondVirial(temperature))}` : "";
  const coefficient = line("second virial coefficient at T2", 1e6 * b, "cm3/mol", `published, ${constants.source}${own}`);
  const critical = criticalVolumeOf(found, content);
  if (critical === undefined || content.molarVolume < leastVirialVolume(temperature, constants, critical))
    return [{ ...coefficient, note: `${coefficient.note}; the gas is too dense for a pressure from it alone` }];
  const virial = virialPressure(temperature, content.molarVolume, constants, critical);
  return [
    coefficient,
    line("second virial at T2", virial, "Pa", `from the same amount; ${differenceText(virial / pressure - 1)} the pressure above`),
  ];
}

function differenceText(difference: number): string {
  const size = Number(Math.abs(100 * difference).toPrecision(2));
  return size === 0 ? "equal to" : `${size} % ${difference > 0 ? "above" : "below"}`;
}

/** Critical volume by the equation, m³/mol; undefined for a gas without critical constants. */
function criticalVolumeOf(found: Substance, { gas }: Filling["content"]): number | undefined {
  const judge = gas ?? judgeOf(found)?.gas;
  return judge && criticalVolume(judge);
}

function judgeOf(found: Substance): RealGas | undefined {
  try {
    return realGasOf(found, cubicEquations[0]!);
  } catch (thrown) {
    if (thrown instanceof Refusal) return undefined;
    throw thrown;
  }
}

/** Light gases whose quantum effects their critical constants do not carry rightly into hot gas. */
const QUANTUM: ReadonlySet<string> = new Set(["He", "H2", "Ne"]);
/** Share, and molar volume in m³/mol (25 bar at 300 K), from which they err by half a per cent and are told. */
const [QUANTUM_SHARE, QUANTUM_VOLUME] = [0.1, 1e-3] as const;

/** Published Z at 300 K and 20 MPa, from second and third virial coefficients from memory: He 1.093, H2 1.12, Ne 1.095. */
function quantumWarnings({ parts }: Substance, { equation }: RealGas, { content }: Filling): string[] {
  const light = parts.filter(({ species, fraction }) => fraction >= QUANTUM_SHARE && QUANTUM.has(keyOf(species)));
  if (equation !== cubicEquations[0] || light.length === 0 || content.molarVolume > QUANTUM_VOLUME) return [];
  const names = light.map(({ species }) => species).join(", ");
  return [
    `Quantum gas (${names}): from a pressure ${equation.title} tells 2 to 4 % too much of it at 300 K and 200 bar (from memory), from an amount too low a pressure; "soave" is nearer there`,
  ];
}

/** Denser than this, in critical volumes, cubic equations err by several per cent (common practice). */
const DENSE = 1.5;

/** An ideal gas that was named where Peng-Robinson is farther from it than a model left out may be. */
function idealWarnings(found: Substance, { content }: Filling, states: readonly GasState[]): string[] {
  return states.flatMap(({ temperature, pressure }, i) => {
    const judged = judgedState(found, temperature, content.molarVolume);
    if (judged === undefined || judged.phase === "two-phase" || judged.phase === "liquid") return [];
    const difference = judged.pressure / pressure - 1;
    if (Math.abs(difference) < CLOSE_ENOUGH) return [];
    return `The ideal gas is named; at T${i + 1} Peng-Robinson stands ${differenceText(difference)} it, from the same amount`;
  });
}

/** What the model does not hold for, each a sentence. */
export function modelWarnings(found: Substance, model: Model, filling: Filling, states: States): string[] {
  const both = [states.before, states.after];
  if (model.kind === "ideal")
    return [
      ...new Set(both.flatMap(({ temperature, pressure }) => condensation(found, temperature, pressure) ?? [])),
      ...idealWarnings(found, filling, both),
    ];
  return [
    ...phaseWarnings(model.real, both),
    ...quantumWarnings(found, model.real, filling),
    ...figureWarnings(found, model.real, filling, both),
  ];
}

function phaseWarnings({ equation }: RealGas, states: readonly GasState[]): string[] {
  if (!states.some(({ phase }) => phase === "two-phase")) return [];
  return [
    `Liquid beside vapour by ${equation.title}: it tells vapour pressures to about 2 % (polar substances worse) and volumes of liquid to 5 to 10 % (common practice), and with them when the vessel is full`,
  ];
}

function figureWarnings(
  found: Substance,
  { equation, gas, constants }: RealGas,
  { content }: Filling,
  states: readonly GasState[],
): string[] {
  const hottest = Math.max(...states.map(({ temperature }) => temperature));
  const isDense = states.some(({ phase }) => phase !== "two-phase") && content.molarVolume < DENSE * pseudoCriticalVolume(gas);
  const acentric = constants.filter((row) => row.acentric > equation.acentricUpTo);
  return [
    ...(isDense
      ? [
          `The gas is dense (${printed(1e6 * content.molarVolume)} cm3/mol): a cubic equation errs by some per cent of the pressure there, by 5 to 15 % near the critical point (common practice)`,
        ]
      : []),
    ...(hottest > gas.attractionEnds
      ? [
          `Above ${printed(gas.attractionEnds)} K the attraction term of ${equation.title} has vanished and grows again: there it is no better than repulsion alone`,
        ]
      : []),
    ...acentric.map(
      ({ species, acentric: factor }) =>
        `The acentric factor of ${species}, ${factor}, is above ${equation.acentricUpTo}, up to which ${equation.title} was fitted`,
    ),
    ...(isMostlyWater(found) ? [`Water is polar: ${equation.title} errs by far more than the WATER functions do`] : []),
  ];
}

function isMostlyWater({ parts }: Substance): boolean {
  return parts.some(({ species, fraction }) => fraction > 0.5 && keyOf(species) === "H2O");
}

/** Critical volume of the equation, mean of the parts by mole fraction, m³/mol. */
function pseudoCriticalVolume({ form, parts }: RealGas["gas"]): number {
  const zc = (1 - (form.d1 + form.d2 - 1) * form.omegaB) / 3;
  return parts.reduce((sum, { fraction, critical }) => sum + (fraction * zc * GAS_CONSTANT * critical.temperature) / critical.pressure, 0);
}

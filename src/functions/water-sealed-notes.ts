/** What is odd or rough about water sealed in a vessel, each a sentence. */
import { printed, Refusal } from "../core/refusal";
import type { Reached } from "../core/vessel/reach";
import { WaterContent, type WaterContentState } from "../core/vessel/water-content";
import { iapws95 } from "../data/iapws95";
import { keyOf } from "./gas-model";
import { condensation } from "./gas-phase";
import type { Substance } from "./substance";
import { judgedPressure } from "./vessel-model-lines";
import type { Sealed } from "./water-sealed-reading";
import { water } from "./steam";

type Change = Pick<Reached<WaterContentState>, "before" | "after">;

/** Warnings of one state. */
export function sealedWarnings(sealed: Sealed, change: Change): string[] {
  return [...fullWarnings(sealed), ...coldWarnings(sealed, change), ...(sealed.gas ? gasWarnings(sealed, change) : [])];
}

/** Nearer than this, K, to where the water fills the vessel the table warns: fillings and temperatures are not known better. */
const NEAR_FULL = 10;

function fullWarnings({ content, T2 }: Sealed): string[] {
  const { kind, temperature: full } = content.phaseEnd;
  if (kind !== "full" && kind !== "always full") return [];
  if (full !== undefined && T2 < full)
    return full - T2 > NEAR_FULL || content.at(T2).phase === "liquid" || content.isSqueezed(T2)
      ? []
      : [`The water fills the vessel at ${printed(full)} K, ${printed(full - T2)} K above T2: from there on the pressure rises steeply`];
  const slope = content.pressurePerKelvin(T2);
  const since = full === undefined ? "at every temperature" : `from ${printed(full)} K on`;
  const steep = slope === undefined ? "" : `: at T2 each kelvin more adds ${printed(slope)} Pa, if the wall does not yield to the pressure`;
  return [`The water fills the vessel ${since}${steep}`];
}

/** Liquid that fills the vessel below the temperature at which it does so on heating: water expands on both sides of 4 °C. */
function coldWarnings({ content }: Sealed, { before, after }: Change): string[] {
  const full = content.phaseEnd.kind === "full" ? content.phaseEnd.temperature! : 0;
  const cold = [before, after].find(
    ({ temperature, phase }) => temperature < full && (phase === "liquid" || content.isSqueezed(temperature)),
  );
  return cold === undefined
    ? []
    : [`At ${printed(cold.temperature)} K the water fills the vessel as well: below 4 °C it expands as it cools, and the pressure rises`];
}

/** A gas squeezed to less than this share of its room at T1 dissolves noticeably. */
const SQUEEZED = 0.5;
/** Partial pressure, Pa, from which a gas at ordinary temperatures differs from the ideal one by some per cent. */
const HIGH_PRESSURE = 5e6;
/** Difference of Peng-Robinson from the ideal gas that is told. */
const DIFFERENT = 0.02;
/** Gases of which water takes up as much as the room above it holds, or more, at ordinary temperatures (from memory). */
const SOLUBLE: ReadonlySet<string> = new Set(
  "CO2 SO2 SO3 H2S NH3 Cl2 Br2 HF HCl HBr HI HCN N2O NO2 C2H2 CH2O CH3CHO CH3OH C2H5OH acetone oxirane".split(" "),
);
/** Mole fraction below which a soluble gas is not worth a word. */
const LITTLE = 0.01;
/** Share of the critical density of water above which vapour and gas do not simply add. */
const DENSE_VAPOUR = 0.3;

function gasWarnings({ content, T2, gas }: Sealed, { before, after }: Change): string[] {
  const dense = Math.max(before.vapourDensity, after.vapourDensity);
  const most = Math.max(before.gasPressure, after.gasPressure);
  const isSqueezed = after.gasRoom < SQUEEZED * before.gasRoom;
  const condensed = condensation(gas!.substance, T2, after.gasPressure);
  return [
    ...(isSqueezed ? [squeezedWarning(content, T2, before, after)] : []),
    ...idealWarnings(gas!.substance, content.gasAmount, isSqueezed ? [before] : [before, after], most),
    ...(condensed === undefined ? [] : [condensed]),
    ...([before, after].some(({ phase }) => phase === "liquid and vapour") ? solubleWarnings(gas!.substance) : []),
    ...(dense > DENSE_VAPOUR * iapws95.criticalDensity
      ? [
          `The water around the gas has ${printed(dense)} kg/m3, above ${DENSE_VAPOUR} of its critical density: adding their pressures is rough there`,
        ]
      : []),
  ];
}

/**
 * How far the gas is from the ideal one it is taken for: by Peng-Robinson at the state where it is furthest, or by its highest pressure. A
 * squeezed gas is no such state: its room follows from its pressure.
 */
function idealWarnings(substance: Substance, amount: number, states: readonly WaterContentState[], most: number): string[] {
  const [furthest] = states
    .map(({ temperature, gasPressure, gasRoom }) => {
      const pressure = judgedPressure(substance, temperature, gasRoom / amount) ?? gasPressure;
      return { gasPressure, pressure, difference: pressure / gasPressure - 1 };
    })
    .sort((one, other) => Math.abs(other.difference) - Math.abs(one.difference));
  if (Math.abs(furthest!.difference) > DIFFERENT) {
    const { gasPressure, pressure, difference } = furthest!;
    const size = `${Number(Math.abs(100 * difference).toPrecision(2))} % ${difference > 0 ? "more" : "less"}`;
    return [`The gas, at ${printed(gasPressure)} Pa, is taken as ideal; Peng-Robinson has ${printed(pressure)} Pa for it alone, ${size}`];
  }
  return most > HIGH_PRESSURE
    ? [`The gas, at ${printed(most)} Pa, is taken as ideal, from which it then differs by some per cent or more`]
    : [];
}

function solubleWarnings({ parts }: Substance): string[] {
  const soluble = parts.filter(({ species, fraction }) => fraction >= LITTLE && SOLUBLE.has(keyOf(species))).map(({ species }) => species);
  if (soluble.length === 0) return [];
  const [dissolve, them] = soluble.length > 1 ? ["dissolve", "them"] : ["dissolves", "it"];
  return [
    `${soluble.join(", ")} ${dissolve} in water, which is not counted: water that has stood under ${them} holds much of ${them} at T1 and gives ${them} off when heated, so that the pressure may be above this one as well as below`,
  ];
}

function squeezedWarning(content: WaterContent, T2: number, before: WaterContentState, after: WaterContentState): string {
  const alone = aloneAt(content, T2);
  const least = alone === undefined ? "" : `; if all of it dissolved, the water alone would have ${printed(alone)} Pa`;
  return `The water squeezes the gas from ${printed(before.gasRoom)} m3 to ${printed(after.gasRoom)} m3: much of it would dissolve, and the pressure is an upper estimate for this amount of gas${least}`;
}

/** Pressure of the same water without the gas, Pa. */
function aloneAt({ charge }: WaterContent, temperature: number): number | undefined {
  try {
    return new WaterContent(water, charge).at(temperature).pressure;
  } catch (thrown) {
    if (thrown instanceof Refusal) return undefined;
    throw thrown;
  }
}

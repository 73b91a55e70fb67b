/** What is odd or rough about water sealed in a vessel, each a sentence. */
import { printed, Refusal } from "../core/refusal";
import type { Reached } from "../core/vessel/reach";
import { WaterContent, type WaterContentState } from "../core/vessel/water-content";
import { iapws95 } from "../data/iapws95";
import type { Sealed } from "./water-sealed-reading";
import { water } from "./steam";

type Change = Pick<Reached<WaterContentState>, "before" | "after">;

/** Warnings of one state. */
export function sealedWarnings(sealed: Sealed, change: Change): string[] {
  return [...fullWarnings(sealed), ...(sealed.gas ? gasWarnings(sealed, change) : [])];
}

/** Nearer than this, K, to where the water fills the vessel the table warns: fillings and temperatures are not known better. */
const NEAR_FULL = 10;

function fullWarnings({ content, T2 }: Sealed): string[] {
  const { kind, temperature: full } = content.phaseEnd;
  if (kind !== "full" && kind !== "always full") return [];
  if (full !== undefined && T2 < full)
    return full - T2 > NEAR_FULL
      ? []
      : [`The water fills the vessel at ${printed(full)} K, ${printed(full - T2)} K above T2: from there on the pressure rises steeply`];
  const slope = content.pressurePerKelvin(T2);
  const since = full === undefined ? "at every temperature" : `from ${printed(full)} K on`;
  return [`The water fills the vessel ${since}${slope === undefined ? "" : `: at T2 each kelvin more adds ${printed(slope)} Pa`}`];
}

/** A gas squeezed to less than this share of its room at T1 dissolves noticeably. */
const SQUEEZED = 0.5;
/** Partial pressure, Pa, from which a gas at ordinary temperatures differs from the ideal one by some per cent. */
const HIGH_PRESSURE = 5e6;
/** Share of the critical density of water above which vapour and gas do not simply add. */
const DENSE_VAPOUR = 0.3;

function gasWarnings({ content, T2 }: Sealed, { before, after }: Change): string[] {
  const dense = Math.max(before.vapourDensity, after.vapourDensity);
  const most = Math.max(before.gasPressure, after.gasPressure);
  return [
    ...(after.gasRoom < SQUEEZED * before.gasRoom ? [squeezedWarning(content, T2, before, after)] : []),
    ...(most > HIGH_PRESSURE
      ? [`The gas, at ${printed(most)} Pa, is taken as ideal, from which it then differs by some per cent or more`]
      : []),
    ...(dense > DENSE_VAPOUR * iapws95.criticalDensity
      ? [
          `The water around the gas has ${printed(dense)} kg/m3, above ${DENSE_VAPOUR} of its critical density: adding their pressures is rough there`,
        ]
      : []),
  ];
}

function squeezedWarning(content: WaterContent, T2: number, before: WaterContentState, after: WaterContentState): string {
  const alone = aloneAt(content, T2);
  const least = alone === undefined ? "" : `; if all of it dissolved, the water alone would have ${printed(alone)} Pa`;
  return `The water squeezes the gas from ${printed(before.gasRoom)} m3 to ${printed(after.gasRoom)} m3: much of it would dissolve, and the pressure is an upper estimate${least}`;
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

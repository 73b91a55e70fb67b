/** Constants between gross and net values, by the edition of the method that prints them. Not part of library.ts. */
import type { AviationLine } from "../core/fuel/liquid";
import type { GrossPressureConstants, NetConstants } from "../core/fuel/net-constants";
import table from "./net-values.json";

/** Where a figure comes from. */
interface Cited {
  readonly title: string;
  /** Key in sources.json. */
  readonly source: string;
  readonly fromMemory: boolean;
}

/** A method for solid fuels; J/g for each per cent. A part is absent where the library does not hold it. */
export interface NetEdition extends Cited {
  readonly id: string;
  readonly constantPressure: NetConstants;
  /** Oxygen and nitrogen have no term at constant volume. */
  readonly constantVolume?: Pick<NetConstants, "hydrogen" | "moisture">;
  readonly grossPressure?: GrossPressureConstants;
}

/** A method for liquid fuels; MJ/kg for each per cent of hydrogen, as printed. */
export interface LiquidEdition extends Cited {
  readonly id: string;
  readonly hydrogen: number;
}

/** Editions for solid fuels, the one to take first. */
export const netEditions: readonly NetEdition[] = table.editions;

/** Editions for liquid fuels. */
export const liquidEditions: readonly LiquidEdition[] = table.liquids;

/** Estimate of the net value of aviation fuels, in MJ/kg as printed. */
export const aviationEstimate: AviationLine & { readonly source: string } = table.aviation;

/** Enthalpy of vaporisation of water at 298.15 K, kJ/mol as printed. */
export const vaporisation: { readonly value: number; readonly source: string } = table.vaporisation;

/** The terms greenhouse-gas inventory handbooks print, MJ/kg for each per cent, and what is wrong with one of them. */
export const inventoryTerms: { readonly oxygen: readonly number[]; readonly note: string } = table.inventories;

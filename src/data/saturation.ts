import type { SaturationConstants } from "../core/water/saturation";
import table from "./saturation.json";

/** Constants of the saturation pressure of water over liquid and ice, with the keys of their sources. */
export const saturation: SaturationConstants & { readonly liquidSource: string; readonly iceSource: string } = table;

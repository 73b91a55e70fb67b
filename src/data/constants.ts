/** Constants with their sources, for display and for tests; the core holds the exact ones it computes with. Not part of library.ts. */
import { refuseAbsent } from "../core/refusal";
import table from "./constants.json";

export interface Constant {
  readonly key: string;
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  /** True if exact by definition. */
  readonly exact?: boolean;
  /** Standard uncertainty in the same unit, where it is not exact. */
  readonly uncertainty?: number;
  /** Key in sources.json. */
  readonly source: string;
  readonly fromMemory?: boolean;
  readonly note?: string;
}

/** Every constant of the library. */
export const constants: readonly Constant[] = table;

/** The constant of a key such as `R` or `cal_th`. Refuses (absent) an unknown key. */
export function constantOf(key: string): Constant {
  return constants.find((constant) => constant.key === key) ?? refuseAbsent(`"${key}" is not the key of a constant`);
}

import { refuseAbsent } from "../core/refusal";
import document from "./sources.json";

/** Where numbers come from. Every number of the library names one of these by key. */
export interface Source {
  readonly key: string;
  /** Full citation, ready for a certificate or a safety file. */
  readonly citation: string;
  /** Year of publication; absent where there is no one publication. */
  readonly year?: number;
  /** What the publisher allows, as far as it was seen; for the page and tests, not in the add-in. */
  readonly licence?: string;
  /** The publisher's own page, where there is one; not in the add-in either. */
  readonly url?: string;
}

/** How good a record is, in one letter; `grades` says what the letters mean. */
export type Grade = "A" | "B" | "C";

const byKey: ReadonlyMap<string, Source> = new Map(document.sources.map((source) => [source.key, source as Source]));

/** What each grade means, in a sentence for the user. */
export const grades: Readonly<Record<Grade, string>> = document.grades;

/** Every source of the library. */
export function allSources(): readonly Source[] {
  return [...byKey.values()];
}

/** The source of a key. Refuses (absent) a key the library does not have. */
export function sourceOf(key: string): Source {
  return byKey.get(key) ?? refuseAbsent(`"${key}" is not the key of a source`);
}

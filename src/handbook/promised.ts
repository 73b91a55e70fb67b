/** The whole handbook, with examples and the lines of tables: for tests. The product reads index.ts. */
import entries from "./handbook.json";
import type { PromisedEntry } from "./index";

export const promised: readonly PromisedEntry[] = entries as readonly PromisedEntry[];

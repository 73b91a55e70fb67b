/** Which folder may import which, and which packages: the house rules of the directions, as one function. */
import type { Arrow } from "./imports";

/** Folders of the core in order: each imports only those above it, and the files beside them. */
export const CORE_ORDER = [
  "numeric",
  "statistics",
  "units",
  "uncertainty",
  "species",
  "capacity",
  "mixture",
  "realgas",
  "water",
  "vessel",
  "reaction",
  "equilibrium",
  "calorimeter",
  "fuel",
  "fitting",
];

/** Files of the core that everyone in it may import. */
const CORE_FILES = ["core/refusal.ts", "core/constants.ts"];

/** Folders, or parts of folders, that each folder may import beside itself. */
export const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  core: [],
  data: ["core/constants.ts", "core/species", "core/units"],
  functions: ["core", "data"],
  handbook: [],
  book: ["data", "handbook"],
  recalc: ["book", "functions", "handbook", "core/statistics"],
  pane: ["core", "data", "functions", "handbook", "book"],
  command: ["book", "recalc", "functions", "handbook"],
  tryout: ["pane", "recalc", "book", "functions", "handbook"],
  build: ["handbook"],
};

/** Folders that may import any type of the core: data are described by its types, and hold nothing that runs. */
const MAY_IMPORT_CORE_TYPES = ["data", "book"];

/** The one way to say no is for everybody. */
const FOR_ALL = "core/refusal.ts";

/** Packages that each folder may import; Node's own modules are packages here. */
export const MAY_USE: Readonly<Record<string, RegExp>> = {
  core: /^$/,
  "core/units": /^mathjs(\/.*)?$/,
  data: /^$/,
  functions: /^$/,
  handbook: /^$/,
  book: /^(@borgar\/fx(\/.*)?|fflate|saxes)$/,
  recalc: /^(@odoo\/o-spreadsheet|@formulajs\/formulajs(\/.*)?|node:worker_threads)$/,
  pane: /^$/,
  command: /^node:.+$/,
  tryout: /^(@odoo\/o-spreadsheet|@odoo\/owl|fflate)$/,
  build: /^(node:.+|typescript|webpack|saxes|fflate|office-addin-manifest)$/,
};

/** What is wrong with an arrow, or undefined. */
export function fault({ from, to, isPackage, isType }: Arrow): string | undefined {
  const folder = folderOf(from);
  if (isPackage) {
    const allowed = MAY_USE[coreFolder(from) ? `core/${coreFolder(from)}` : folder] ?? MAY_USE[folder];
    return allowed?.test(to) ? undefined : `${from} uses the package ${to}`;
  }
  if (folder === folderOf(to)) return folder === "core" ? coreFault(from, to) : undefined;
  if (to === FOR_ALL || (isType && to.startsWith("core/") && MAY_IMPORT_CORE_TYPES.includes(folder))) return undefined;
  const allowed = MAY_IMPORT[folder] ?? [];
  return allowed.some((place) => to === place || to.startsWith(`${place}/`)) ? undefined : `${from} imports ${to}`;
}

function coreFault(from: string, to: string): string | undefined {
  if (CORE_FILES.includes(to)) return undefined;
  const [mine, theirs] = [coreFolder(from), coreFolder(to)];
  if (mine === undefined) return `${from} imports ${to}`;
  if (mine === theirs) return undefined;
  if (theirs !== undefined && CORE_ORDER.indexOf(theirs) < CORE_ORDER.indexOf(mine) && CORE_ORDER.includes(theirs)) return undefined;
  return `${from} imports ${to}, which does not stand above it`;
}

function folderOf(file: string): string {
  return file.split("/")[0] ?? "";
}

/** `units` for core/units/…, undefined for files beside the folders and outside the core. */
function coreFolder(file: string): string | undefined {
  const parts = file.split("/");
  return parts[0] === "core" && parts.length > 2 ? parts[1] : undefined;
}

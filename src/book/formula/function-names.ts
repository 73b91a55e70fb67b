import { futureFunctions } from "./future-functions";

/**
 * How a function is called in a cell, in a file and by the engine.
 *
 * Excel stores an add-in function as `_xldudf_STILL_CV_AT`; `STILL.CV.AT` in any case of letters, `_xldudf_still_cv_at` (as some
 * programs rewrite it on saving) and `_xll.STILL.CV.AT` are met as well. The dots cannot be told from underscores in the stored
 * form, so it is looked up, never turned back by replacing letters. Functions newer than the first version of the format are
 * stored with the prefix `_xlfn.` (some with `_xlfn._xlws.`).
 */
const namespace = "STILL";
const storedPrefix = `_XLDUDF_${namespace}_`;
const newerPrefix = /^(?:_XLFN\.|_XLWS\.|_XLL\.)+/;

/** Functions whose name reads as a cell address to the engine, and the names it knows them by. */
const addresses = new Map([["LOG10", "LOG_10"]]);
const fromAddresses = new Map([...addresses].map(([name, engine]) => [engine, name]));

/** The ids of an add-in's functions (`CV.AT`), ready to be looked up from any of their spellings. */
export class FunctionNames {
  private readonly ids = new Map<string, string>();

  constructor(ids: Iterable<string>) {
    for (const id of ids) this.ids.set(underscored(id), id.toUpperCase());
  }

  /** Canonical name, in capitals and without prefixes: `STILL.CV.AT`, `XLOOKUP`. */
  canonical(written: string): string {
    const name = written.toUpperCase().replace(newerPrefix, "");
    if (name.startsWith(storedPrefix)) return this.stillwall(name.slice(storedPrefix.length));
    if (name.startsWith(`${namespace}.`)) return this.stillwall(name.slice(namespace.length + 1));
    return fromAddresses.get(name) ?? name;
  }

  /** Id (`CV.AT`) of a canonical name, or undefined if it is no function of the add-in. */
  idOf(canonical: string): string | undefined {
    const id = canonical.startsWith(`${namespace}.`) ? canonical.slice(namespace.length + 1) : "";
    return this.ids.get(underscored(id)) === id ? id : undefined;
  }

  /** As a workbook file holds it: `_xldudf_STILL_CV_AT`, `_xlfn.XLOOKUP`. */
  inFile(canonical: string): string {
    const id = this.idOf(canonical);
    if (id !== undefined) return `_xldudf_${namespace}_${underscored(id)}`;
    return (futureFunctions.get(canonical) ?? "") + canonical;
  }

  /** As the engine's tokenizer can read it. */
  inEngine(canonical: string): string {
    return addresses.get(canonical) ?? canonical;
  }

  private stillwall(rest: string): string {
    return `${namespace}.${this.ids.get(underscored(rest)) ?? rest}`;
  }
}

/** True for a canonical name in the add-in's namespace, known or not. */
export function inNamespace(canonical: string): boolean {
  return canonical.startsWith(`${namespace}.`);
}

function underscored(id: string): string {
  return id.toUpperCase().replaceAll(".", "_");
}

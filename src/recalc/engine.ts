import { FunctionNames } from "../book/formula";
import type { WorksheetFunction } from "../functions/registry";
import type { HandbookEntry } from "../handbook";
import { registerBuiltins } from "./builtins";
import { FormulaDoor } from "./compile";
import { hideEngineOnly } from "./engine-only";
import { mendErrors } from "./errors";
import type { EngineLibrary } from "./library";
import { installOrder } from "./order";
import { registerStillwall } from "./stillwall-functions";

/** The spreadsheet engine made ready: its mends applied, the worksheet functions known to it. */
export interface Engine {
  readonly library: EngineLibrary;
  readonly functions: FunctionNames;
  readonly door: FormulaDoor;
}

const prepared = new WeakMap<object, { ids: string; engine: Engine }>();

/**
 * Makes the library ready for Stillwall. May be called again: the mends are applied once, functions are registered anew.
 * The library is the page's global `o_spreadsheet`, or what Node loads.
 */
export function prepareEngine(
  library: EngineLibrary,
  functions: ReadonlyMap<string, WorksheetFunction>,
  handbook: readonly HandbookEntry[],
): Engine {
  const known = prepared.get(library);
  const ids = [...functions.keys()].join();
  if (!known) {
    mendErrors(library);
    registerBuiltins(library);
    hideEngineOnly(library);
    installOrder(library);
  }
  registerStillwall(library, functions, handbook);
  if (known?.ids === ids) return known.engine;
  const names = new FunctionNames(functions.keys());
  const engine = { library, functions: names, door: known?.engine.door ?? new FormulaDoor(library, names) };
  if (known) engine.door.know(names);
  else engine.door.install();
  prepared.set(library, { ids, engine });
  return engine;
}

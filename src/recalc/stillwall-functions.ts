import type { HandbookEntry } from "../handbook";
import type { WorksheetFunction } from "../functions/registry";
import { engineCompute } from "./conversion";
import { engineFunctions, type EngineLibrary, type EngineParameter } from "./library";

/** Registers every worksheet function under its name in a cell, with the handbook's words for autocompletion and argument help. */
export function registerStillwall(
  library: EngineLibrary,
  functions: ReadonlyMap<string, WorksheetFunction>,
  handbook: readonly HandbookEntry[],
): void {
  const help = new Map(handbook.map((entry) => [entry.id, entry]));
  for (const [id, compute] of functions) {
    const entry = help.get(id);
    const name = `STILL.${id}`;
    engineFunctions(library).replace(name, {
      description: entry?.description ?? "",
      category: "Stillwall",
      args: entry ? entry.parameters.map((parameter) => anything(parameter.name, words(parameter), parameter.optional)) : [unnamed],
      compute: engineCompute(name, compute) as never,
      isExported: true,
    });
  }
}

/** Declared as both value and range, or the engine would call the function once for every cell of a range. */
function anything(name: string, description: string, optional: boolean): EngineParameter {
  return { name, description, type: ["ANY", "RANGE"], acceptErrors: true, acceptMatrix: true, ...(optional && { optional }) };
}

const unnamed: EngineParameter = { ...anything("argument", "", true), repeating: true };

function words({ description, unit }: { description: string; unit: string }): string {
  return unit === "-" || unit === "" ? description : `${description} [${unit}]`;
}

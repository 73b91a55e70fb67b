/** Puts every worksheet function into the registry under its id. The id is the function's name: `cvAt` is `CV.AT`. */
import * as burn from "./burn";
import * as calorimeter from "./calorimeter";
import * as fuel from "./fuel";
import * as heat from "./heat";
import * as mixture from "./mixture";
import * as properties from "./properties";
import * as reaction from "./reaction";
import { registry, WorksheetFunction } from "./registry";
import * as sources from "./sources";
import * as units from "./units";
import * as vessel from "./vessel";
import * as water from "./water";

/** The families, in the order in which help lists them. */
export const families: Readonly<Record<string, Readonly<Record<string, WorksheetFunction>>>> = {
  properties,
  heat,
  mixture,
  units,
  sources,
  vessel,
  water,
  reaction,
  burn,
  calorimeter,
  fuel,
};

/** `heatFinaltemp` → `HEAT.FINALTEMP`. */
export function idOf(name: string): string {
  return name.replace(/[A-Z]/g, (capital) => `.${capital}`).toUpperCase();
}

for (const family of Object.values(families)) {
  for (const [name, worksheetFunction] of Object.entries(family)) registry.set(idOf(name), worksheetFunction);
}

export { registry };

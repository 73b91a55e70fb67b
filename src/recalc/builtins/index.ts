import type { EngineLibrary } from "../library";
import { registerAggregate } from "./aggregate";
import { registerArithmetic } from "./arithmetic";
import { registerArrays } from "./arrays";
import { mendBranches } from "./branches";
import { registerConvert } from "./convert";
import { Declarations } from "./declare";
import { registerFormulajs } from "./formulajs";
import { registerHidden } from "./hidden";
import { mendAll } from "./mends";
import { registerOperators } from "./operators";
import { registerRegression } from "./regression";
import { registerRounding } from "./rounding";
import { registerSamples } from "./samples";
import { registerDistributions } from "./statistics";
import { registerText } from "./text";

/** Mends the engine's own functions, and adds those it lacks. Called once. */
export function registerBuiltins(library: EngineLibrary): void {
  const declare = new Declarations(library);
  for (const register of [registerConvert, registerText, registerOperators, registerRounding, registerArithmetic, registerDistributions])
    register(declare);
  for (const register of [registerSamples, registerArrays, registerRegression, registerFormulajs, registerAggregate]) register(declare);
  mendBranches(library);
  mendAll(library);
  registerHidden(library);
}

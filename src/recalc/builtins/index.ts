import type { EngineLibrary } from "../library";
import { registerHidden } from "./hidden";

/** Mends and completes the engine's own functions. */
export function registerBuiltins(library: EngineLibrary): void {
  registerHidden(library);
}

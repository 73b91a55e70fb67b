import type { EngineLibrary } from "../library";

/** Mends and completes the engine's own functions. */
export function registerBuiltins(library: EngineLibrary): void {
  void library;
}

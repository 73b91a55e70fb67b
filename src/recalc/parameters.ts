import { engineFunction, type EngineFunction, type EngineLibrary, type EngineParameter } from "./library";

/** Tells whether a function takes a whole range in an argument, by its declaration; an unknown function takes anything. */
export function takesRange(library: EngineLibrary): (name: string, position: number, count: number) => boolean {
  return (name, position) => {
    const known = engineFunction(library, name);
    return known === undefined || parameterAt(known, position)?.acceptMatrix === true;
  };
}

/** The parameter an argument falls on: those that repeat take turns. */
export function parameterAt({ args }: EngineFunction, position: number): EngineParameter | undefined {
  if (position < args.length) return args[position];
  const repeating = args.filter((parameter) => parameter.repeating);
  const first = args.findIndex((parameter) => parameter.repeating);
  return repeating.length === 0 ? args.at(-1) : repeating[(position - first) % repeating.length];
}

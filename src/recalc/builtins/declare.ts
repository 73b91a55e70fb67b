import { isErrorCode } from "../errors";
import {
  engineFunctions,
  isTable,
  type EngineArgument,
  type EngineCall,
  type EngineLibrary,
  type EngineParameter,
  type EngineResult,
  type EngineValue,
} from "../library";

/** An error a function gives: Excel's code and a sentence. */
export class FunctionError {
  constructor(
    readonly value: string,
    readonly message: string,
  ) {}
}

/** Stops a function with #NUM!: a number outside what the function is defined for. */
export function numError(message: string): never {
  throw new FunctionError("#NUM!", message);
}

export type Scalar = number | string | boolean | null;

/** Reads arguments as the engine's own functions do: texts that hold numbers count, other texts are #VALUE!. */
export interface Reader {
  number(argument: EngineArgument): number;
  text(argument: EngineArgument): string;
}

export function reader(library: EngineLibrary, call: EngineCall): Reader {
  const { toNumber, toString } = library.helpers;
  return {
    number: (argument) => toNumber(argument as never, call.locale as never),
    text: (argument) => toString(argument as never),
  };
}

/** Adds built-in functions to the engine; the description of an argument is its name, `[name]` may be left out, `name…` repeats. */
export class Declarations {
  constructor(readonly library: EngineLibrary) {}

  /** A function of single numbers; the engine applies it to every cell of a range. NaN and infinities become #NUM!. */
  numbers(name: string, parameters: string, compute: (...values: number[]) => number | boolean): void {
    const missing = parameters.includes("[") ? undefined : 0;
    this.add(name, parameters, ["NUMBER"], (read, ...args) => {
      const values = args.map((argument) => (argument === undefined ? missing : read.number(argument)));
      return compute(...(values as number[]));
    });
  }

  /** A function of single values of any kind. */
  scalars(name: string, parameters: string, compute: Compute): void {
    this.add(name, parameters, ["ANY"], compute);
  }

  /** A function of single texts; a number becomes the text that a worksheet shows, 15 digits at most (mends.ts). */
  texts(name: string, parameters: string, compute: (...texts: string[]) => string): void {
    this.add(name, parameters, ["STRING"], (read, ...args) => compute(...args.map((argument) => read.text(argument))));
  }

  /** A function of all the numbers in its arguments: numbers in ranges, and single arguments read as numbers. */
  samples(name: string, parameters: string, compute: (values: number[]) => number): void {
    this.add(name, parameters, ["ANY", "RANGE"], (read, ...args) => compute(args.flatMap((argument) => numbersOf(argument, read))));
  }

  /** A function that takes whole tables, and gives a value or a table. */
  tables(name: string, parameters: string, compute: Compute): void {
    this.add(name, parameters, ["ANY", "RANGE"], compute);
  }

  private add(name: string, parameters: string, type: string[], compute: Compute): void {
    const { library } = this;
    const guarded = function (this: EngineCall, ...args: EngineArgument[]): EngineResult {
      try {
        return result(compute.call(this, reader(library, this), ...args));
      } catch (reason) {
        if (reason instanceof FunctionError) return { value: reason.value, message: reason.message };
        throw reason;
      }
    };
    engineFunctions(library).replace(name, {
      description: `${name}: as in Excel`,
      category: "More",
      args: parameters
        .split(",")
        .filter(Boolean)
        .map((text) => parameter(text.trim(), type)),
      compute: guarded as never,
      isExported: true,
    });
  }
}

type Compute = (this: EngineCall, read: Reader, ...args: EngineArgument[]) => EngineResult | Scalar;

/** The numbers in an argument: in a range those that are numbers, alone whatever can be read as one. @throws the first error value */
export function numbersOf(argument: EngineArgument, read: Reader): number[] {
  if (argument === undefined) return [];
  if (!isTable(argument)) return [read.number(argument)];
  return cellsOf(argument).flatMap(({ value, message = "" }) => {
    if (isErrorCode(value)) throw new FunctionError(value, message);
    return typeof value === "number" ? [value] : [];
  });
}

/** All cells of an argument, row by row. */
export function cellsOf(argument: EngineArgument): EngineValue[] {
  return rowsOf(argument).flat();
}

/** An argument row by row; a single value is one row of one. */
export function rowsOf(argument: EngineArgument): EngineValue[][] {
  if (argument === undefined) return [];
  if (!isTable(argument)) return [[argument as EngineValue]];
  const height = argument[0]?.length ?? 0;
  return Array.from({ length: height }, (_, row) => argument.map((column) => column[row] ?? { value: null }));
}

/** Rows as a table of the engine. */
export function tableOf(rows: readonly (readonly EngineValue[])[]): EngineValue[][] {
  const width = rows[0]?.length ?? 0;
  return Array.from({ length: width }, (_, column) => rows.map((row) => ({ ...row[column]! })));
}

/** What another function of the engine gave: a bare value or one already wrapped. */
export function asResult(outcome: unknown): EngineResult {
  return typeof outcome === "object" && outcome !== null ? (outcome as EngineResult) : { value: outcome };
}

function result(value: EngineResult | Scalar): EngineResult {
  if (typeof value === "number" && !Number.isFinite(value))
    return { value: "#NUM!", message: "The arguments are outside what the function is defined for" };
  return typeof value === "object" && value !== null ? value : { value };
}

function parameter(text: string, type: string[]): EngineParameter {
  const name = text.replace(/[[\]…]/g, "");
  const table = type.some((kind) => kind.startsWith("RANGE"));
  const anything = type.includes("ANY");
  return {
    ...{ name, description: name.replaceAll("_", " "), type },
    ...(anything && { acceptErrors: true }),
    ...(table && { acceptMatrix: true }),
    ...(text.startsWith("[") && { optional: true }),
    ...(text.includes("…") && { repeating: true }),
  };
}

import { asResult, FunctionError, type Declarations } from "./declare";
import { generalText } from "./number-text";
import { scientific } from "./scientific";
import { engineFunction, type EngineArgument, type EngineValue } from "../library";
import { errorNumbers, isErrorCode } from "../errors";
import { first } from "./samples";

/** Texts, kinds of values, and what a format makes of a number. */
export function registerText(declare: Declarations): void {
  declare.scalars("REPT", "text, times", (read, text, times) => {
    const count = Math.trunc(read.number(stop(times)));
    const repeated = read.text(stop(text));
    if (count < 0 || repeated.length * count > 32767) throw new FunctionError("#VALUE!", `The text cannot be repeated ${count} times`);
    return repeated.repeat(count);
  });
  // also the operator &: cell by cell over arrays, where the engine joins an array into one text
  declare.texts("CONCATENATE", "text…", (...texts) => texts.join(""));
  for (const name of ["CODE", "UNICODE"]) {
    declare.scalars(name, "text", (read, text) => read.text(stop(text)).codePointAt(0) ?? valueError("The text is empty"));
  }
  declare.scalars("UNICHAR", "number", (read, number) => {
    const code = Math.trunc(read.number(stop(number)));
    return code > 0 && code <= 0x10ffff ? String.fromCodePoint(code) : valueError(`${code} is no character`);
  });
  declare.tables("T", "value", (_read, argument) => {
    const cell = topLeft(argument);
    return typeof cell.value === "string" ? cell : "";
  });
  declare.tables("N", "value", (_read, argument) => {
    const cell = topLeft(argument);
    if (typeof cell.value === "boolean") return cell.value ? 1 : 0;
    return typeof cell.value === "number" || isErrorCode(cell.value) ? cell : 0;
  });
  declare.tables("TYPE", "value", (_read, argument) => kindOf(argument));
  declare.scalars("ERROR.TYPE", "error", (_read, argument) => {
    const code = (argument as EngineValue | undefined)?.value;
    const number = isErrorCode(code) ? errorNumbers.get(code) : undefined;
    if (number === undefined) throw new FunctionError("#N/A", "The value is not an error");
    return number;
  });
  mendText(declare);
}

/** TEXT: the engine knows no scientific formats, and gives a text back unchanged only if it holds no number. */
function mendText(declare: Declarations): void {
  const engine = engineFunction(declare.library, "TEXT")!.compute as unknown as (this: unknown, ...args: unknown[]) => EngineValue;
  declare.scalars("TEXT", "value, format", function (read, value, format) {
    const cell = stop(value) as EngineValue | undefined;
    const pattern = read.text(stop(format));
    if (typeof cell?.value === "string" && !/^[\s\d.,+\-/:%eE]+$/.test(cell.value)) return cell.value;
    if (typeof cell?.value === "boolean") return String(cell.value).toUpperCase();
    const number = read.number(cell);
    if (/^general$/i.test(pattern)) return generalText(number);
    const text = scientific(number, pattern);
    if (text !== undefined) return text;
    return asResult(engine.call(this, { value: number }, { value: pattern }));
  });
}

function kindOf(argument: EngineArgument): number {
  if (Array.isArray(argument) && (argument.length > 1 || (argument[0] as unknown[]).length > 1)) return 64;
  const { value } = topLeft(argument);
  if (isErrorCode(value)) return 16;
  return typeof value === "string" ? 2 : typeof value === "boolean" ? 4 : 1;
}

function topLeft(argument: EngineArgument): EngineValue {
  return (first(argument) as EngineValue | undefined) ?? { value: null };
}

/** Passes an argument on unless it is an error, which then is the result. */
function stop(argument: EngineArgument): EngineArgument {
  const { value, message = "" } = (argument as EngineValue | undefined) ?? { value: null };
  if (isErrorCode(value)) throw new FunctionError(value, message);
  return argument;
}

function valueError(message: string): never {
  throw new FunctionError("#VALUE!", message);
}

import { isErrorCode } from "../errors";
import {
  engineFunctions,
  isTable,
  type EngineArgument,
  type EngineCall,
  type EngineFunction,
  type EngineLibrary,
  type EngineResult,
  type EngineValue,
} from "../library";
import { parameterAt } from "../parameters";
import { generalText } from "./number-text";

/**
 * What every built-in function needs to agree with Excel:
 *  - a result that is not finite is #NUM! at once, not 0 or a plausible number further on (1/EXP(1000));
 *  - a number outside a function's domain is #NUM!, where the engine says #VALUE!;
 *  - a number that becomes a text has 15 digits.
 */
export function mendAll(library: EngineLibrary): void {
  for (const [name, known] of Object.entries(engineFunctions(library).content)) {
    engineFunctions(library).replace(name, { ...known, compute: mended(name, known) as never });
  }
}

/** Numeric functions whose complaints about a number are #NUM! in Excel. */
const domains = new Set(
  `ACOS ACOSH ASIN ATANH ACOTH LN LOG SQRT POWER LARGE SMALL PERCENTILE PERCENTILE.INC PERCENTILE.EXC QUARTILE QUARTILE.INC QUARTILE.EXC IRR RATE
   NPER XIRR DECIMAL CEILING FLOOR DATE EDATE EOMONTH YEARFRAC EFFECT NOMINAL DB DDB SLN SYD VDB`.split(/\s+/),
);

function mended(name: string, known: EngineFunction): (this: EngineCall, ...args: EngineArgument[]) => EngineResult | unknown {
  const compute = known.compute as unknown as (this: EngineCall, ...args: EngineArgument[]) => EngineResult | unknown;
  const texts = takesTexts(known);
  const domain = domains.has(name);
  return function (this: EngineCall, ...args: EngineArgument[]) {
    const given = texts ? args.map((argument, position) => (texts(position) ? withTexts(argument) : argument)) : args;
    if (!domain) return finite(compute.apply(this, given));
    try {
      return withNum(finite(compute.apply(this, given)), given);
    } catch (reason) {
      throw withNum(reason, given);
    }
  };
}

function takesTexts(known: EngineFunction): ((position: number) => boolean) | undefined {
  const isText = (type: readonly string[]) =>
    type.includes("STRING") || type.includes("RANGE<STRING>")
      ? !type.some((kind) => kind === "ANY" || kind === "NUMBER" || kind === "BOOLEAN")
      : false;
  if (!known.args.some(({ type }) => isText(type))) return undefined;
  return (position) => isText(parameterAt(known, position)?.type ?? []);
}

function withTexts(argument: EngineArgument): EngineArgument {
  if (argument === undefined) return argument;
  if (isTable(argument)) return argument.map((column) => Array.from(column, asText));
  return asText(argument as EngineValue);
}

function asText(cell: EngineValue | undefined): EngineValue {
  if (typeof cell?.value !== "number") return cell as EngineValue;
  const text = generalText(cell.value);
  return text === String(cell.value) ? cell : { ...cell, value: text };
}

function finite(result: unknown): unknown {
  if (typeof result === "number") return Number.isFinite(result) ? result : notFinite();
  if (isTable(result as EngineResult)) return (result as EngineValue[][]).map((column) => Array.from(column, finite));
  const value = (result as EngineValue | null | undefined)?.value;
  return typeof value === "number" && !Number.isFinite(value) ? notFinite() : result;
}

function notFinite(): EngineValue {
  return { value: "#NUM!", message: "The result is too large or not a number" };
}

/** The engine's #VALUE! for a number out of range; a text where a number belongs, and an error that came in, stay as they are. */
function withNum(outcome: unknown, args: readonly EngineArgument[]): unknown {
  const { value, message } = (outcome ?? {}) as EngineValue;
  if (value !== "#VALUE!" || args.some(isTextOrError)) return outcome;
  return { value: "#NUM!", message: String(message ?? "") };
}

function isTextOrError(argument: EngineArgument): boolean {
  if (argument === undefined) return false;
  if (isTable(argument)) return argument.some((column) => column.some((cell) => isErrorCode(cell?.value)));
  const { value } = argument as EngineValue;
  return isErrorCode(value) || (typeof value === "string" && !Number.isFinite(Number(value)));
}

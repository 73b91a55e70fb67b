import * as formulajs from "@formulajs/formulajs";
import { FunctionError, type Declarations } from "./declare";
import { isErrorCode } from "../errors";
import { isTable, type EngineArgument, type EngineValue } from "../library";

/**
 * Conversions between number systems, complex numbers and formats, from @formulajs/formulajs. Its statistical functions keep seven to ten
 * digits or are wrong (T.TEST ignores its kind, F.TEST gives a ratio), its CONVERT and TEXT deviate from Excel: none of those is used.
 * It gives errors as JavaScript errors and takes tables row by row.
 */
const used: Readonly<Record<string, string>> = {
  ...Object.fromEntries(["BIN2DEC", "BIN2HEX", "BIN2OCT", "DEC2BIN", "DEC2HEX", "DEC2OCT"].map((name) => [name, "number, [places]"])),
  ...Object.fromEntries(["HEX2BIN", "HEX2DEC", "HEX2OCT", "OCT2BIN", "OCT2DEC", "OCT2HEX"].map((name) => [name, "number, [places]"])),
  ...Object.fromEntries(["BITAND", "BITOR", "BITXOR", "BITLSHIFT", "BITRSHIFT"].map((name) => [name, "number_1, number_2"])),
  ...Object.fromEntries(
    ["IMABS", "IMAGINARY", "IMARGUMENT", "IMCONJUGATE", "IMEXP", "IMLN", "IMREAL", "IMSQRT", "IMSIN", "IMCOS"].map((name) => [
      name,
      "complex",
    ]),
  ),
  ...Object.fromEntries(["IMSUB", "IMDIV", "IMPOWER"].map((name) => [name, "complex_1, complex_2"])),
  COMPLEX: "real, imaginary, [suffix]",
  BASE: "number, radix, [length]",
  ROMAN: "number, [form]",
  ARABIC: "text",
  FIXED: "number, [decimals], [no_commas]",
  DOLLAR: "number, [decimals]",
  NUMBERVALUE: "text, [decimal_separator], [group_separator]",
};

export function registerFormulajs(declare: Declarations): void {
  for (const [name, parameters] of Object.entries(used)) {
    const compute = (formulajs as unknown as Record<string, (...args: unknown[]) => unknown>)[name]!;
    const upper = name === "BASE" || name.endsWith("2HEX");
    declare.scalars(name, parameters, (_read, ...args) => {
      const given = result(compute(...args.map(value)));
      // Letters of a number are capitals in a worksheet.
      return upper ? String(given).toUpperCase() : given;
    });
  }
}

function value(argument: EngineArgument): unknown {
  if (argument === undefined || isTable(argument)) return undefined;
  const cell = argument as EngineValue;
  if (isErrorCode(cell.value)) throw new FunctionError(cell.value, cell.message ?? "");
  return cell.value;
}

function result(given: unknown): number | string | boolean {
  if (given instanceof Error)
    throw new FunctionError(
      isErrorCode(given.message) ? given.message : "#VALUE!",
      "The arguments are outside what the function is defined for",
    );
  if (typeof given === "number" || typeof given === "string" || typeof given === "boolean") return given;
  throw new FunctionError("#VALUE!", "The function gave no value");
}

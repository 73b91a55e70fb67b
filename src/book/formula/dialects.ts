import type { FunctionNames } from "./function-names";
import type { Dialect } from "./print";

/** Name of the hidden function by which an error literal reaches the engine, which has none of its own. */
export const errorFunction = "ERROR.LITERAL";

/** Text of a workbook file. */
export function fileDialect(names: FunctionNames, sheetName: (name: string) => string = (name) => name): Dialect {
  return {
    functionName: (canonical) => names.inFile(canonical),
    text: (value) => `"${value.replaceAll('"', '""')}"`,
    error: (code) => code,
    sheetName,
    spill: (reference) => `${names.inFile("ANCHORARRAY")}(${reference})`,
  };
}

/** Text for the engine; `sheetName` gives the name under which it knows a sheet. */
export function engineDialect(names: FunctionNames, sheetName: (name: string) => string = (name) => name): Dialect {
  return {
    functionName: (canonical) => names.inEngine(canonical),
    text: engineText,
    error: (code) => `${errorFunction}("${code}")`,
    sheetName,
    spill: (reference) => `${reference}#`,
  };
}

/** The engine has no way to write a quote inside a text, takes a backslash for one, and rewrites line ends: those go as CHAR. */
function engineText(value: string): string {
  const parts = value.split(/(["\\\r\n])/).filter((part) => part !== "");
  if (parts.every((part) => !special(part))) return `"${value}"`;
  const pieces = parts.map((part) => (special(part) ? `CHAR(${part.charCodeAt(0)})` : `"${part}"`));
  return pieces.length === 1 ? pieces[0]! : `CONCATENATE(${pieces.join(",")})`;
}

function special(part: string): boolean {
  return /^["\\\r\n]$/.test(part);
}

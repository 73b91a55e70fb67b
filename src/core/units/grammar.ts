/**
 * From unit text in plain spelling to an expression for mathjs. Read here, because a silent reading would be a wrong number:
 * a product after a slash (`J/mol K` is J/(mol K) for one reader and J K/mol for another) is refused with the way out.
 */
import { refuse } from "../refusal";
import { insideName } from "./names";

const token =
  /\s*(?:([*/()])|((?:mm|cm|in)H2O(?![\p{L}\d])|[\p{L}°%‰][\p{L}]*(?:_[\p{L}\d]+)?)(?: ?\^ ?\(([+-]?\d)\)| ?\^ ?([+-]?\d)|([+-]?\d))?(?![.,]?\d))/uy;

/** One level of brackets while reading. */
interface Level {
  slash: boolean;
  /** True if an operand has been read and no operator since. */
  complete: boolean;
}

/** `plain` without a leading `1` and without the unit, as mathjs reads it. `typed` is quoted in refusals. Throws a Refusal. */
export function insideExpression(plain: string, typed: string): string {
  const levels: Level[] = [{ slash: false, complete: true }];
  const rest = plain.replace(/^1(?= ?[*/])/, "");
  if (rest === plain) levels[0]!.complete = false;
  const out: string[] = [];
  token.lastIndex = 0;
  while (token.lastIndex < rest.length) {
    const at = token.lastIndex;
    const [, sign, name, bracketed, raised, direct] = token.exec(rest) ?? refuseRest(rest.slice(at), typed);
    if (sign === undefined) out.push(readName(levels, typed, insideName(name!, typed), bracketed ?? raised ?? direct));
    else out.push(readSign(levels, typed, sign));
  }
  if (levels.length > 1) refuse(`"${typed}" lacks a closing bracket`);
  if (!levels[0]!.complete) refuse(`"${typed}" is not a whole unit: something is missing at its end`);
  return out.join(" ");
}

function innermost(levels: readonly Level[]): Level {
  return levels[levels.length - 1]!;
}

function readName(levels: Level[], typed: string, inside: string, power: string | undefined): string {
  operand(levels, typed);
  innermost(levels).complete = true;
  if (power === undefined || Number(power) === 1) return inside;
  if (Number(power) === 0) refuse(`"${typed}" has the power 0; whole powers from -9 to 9 are read`);
  return `${inside} ^ ${Number(power)}`;
}

function readSign(levels: Level[], typed: string, sign: string): string {
  const level = innermost(levels);
  if (sign === "(") {
    operand(levels, typed);
    levels.push({ slash: false, complete: false });
  } else if (sign === ")") {
    if (levels.length === 1) refuse(`"${typed}" has a closing bracket too many`);
    if (!level.complete) refuse(`"${typed}" has an empty or unfinished bracket`);
    levels.pop();
    innermost(levels).complete = true;
  } else {
    if (!level.complete) refuse(`"${typed}" has an operator where a unit should stand`);
    if (sign === "*" && level.slash) refuseProductAfterSlash(typed);
    if (sign === "/") level.slash = true;
    level.complete = false;
  }
  return sign;
}

/** An operand may come first, after an operator, or after another operand as an implicit product. */
function operand(levels: readonly Level[], typed: string): void {
  const level = innermost(levels);
  if (level.complete && level.slash) refuseProductAfterSlash(typed);
}

function refuseProductAfterSlash(typed: string): never {
  const [above, ...below] = typed.split("/");
  const clear = below.length === 1 && !typed.includes("(") ? `, such as "${above}/(${below[0]!.trim()})"` : "";
  refuse(`"${typed}" can be read in two ways: put what stands below the line in brackets${clear}`);
}

function refuseRest(rest: string, typed: string): never {
  const shown = rest.trim().slice(0, 12);
  if (/^[\d.,]/.test(shown)) refuse(`"${typed}" has a number where a unit should stand ("${shown}")`);
  refuse(`"${typed}" cannot be read as a unit at "${shown}"`);
}

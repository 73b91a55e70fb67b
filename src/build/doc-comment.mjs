// @ts-check
/**
 * Reads the doc comment of one worksheet function into its handbook entry, or says in one sentence what is wrong with it:
 *
 *   One-line description, under 255 characters.
 *   @param temperature Temperature [K] value        description, unit of a plain number, kind (value, list or block)
 *   @returns True heat capacity [J/(mol K)]         description, unit
 *   @lines mean | standard deviation                labels of a table, in order; tables only
 *   @source nasa-2002                               keys of src/data/sources.json
 *   @example STILL.CV.AT("N2",500) -> ~ 21.27       two or more, each run by the tests
 *   @customfunction CV.AT
 */
import ts from "typescript";
import { brokenRule, camelCase } from "./names.mjs";

/** Longest description that the platform's dialogs show whole. */
const LONGEST = 255;
const KINDS = ["value", "list", "block"];

/** @typedef {import("../handbook/index").PromisedEntry} HandbookEntry */
/** @typedef {import("../handbook/index").HandbookParameter} HandbookParameter */
/** @typedef {import("../handbook/index").ParameterKind} ParameterKind */

/**
 * @param {ts.FunctionDeclaration} node top-level function with a `@customfunction` tag
 * @param {string} family
 * @returns {HandbookEntry}
 */
export function readEntry(node, family) {
  const name = node.name?.text ?? "(a function without a name)";
  const wrong = (/** @type {string} */ what) => new Error(`${family}.ts, ${name}: ${what}`);
  const id = single(textsOf(node, "customfunction"), () => wrong("needs one @customfunction"));
  checkId(id, name, node, wrong);
  const examples = textsOf(node, "example").map((text) => readExample(text, wrong));
  if (examples.length < 2) throw wrong(`has ${examples.length} @example, needs two or more`);
  const sources = textsOf(node, "source").flatMap((text) => text.split(/[\s,]+/).filter(Boolean));
  if (sources.length === 0) throw wrong("has no @source");
  return {
    id,
    name: `STILL.${id}`,
    family,
    description: checkDescription(description(node), "description", wrong),
    parameters: node.parameters.map((parameter) => readParameter(parameter, node, wrong)),
    result: readResult(textsOf(node, "returns"), wrong),
    sources,
    examples,
    ...readLines(textsOf(node, "lines")),
  };
}

/** @typedef {(what: string) => Error} Wrong */

/** @param {string} id @param {string} name @param {ts.FunctionDeclaration} node @param {Wrong} wrong */
function checkId(id, name, node, wrong) {
  const rule = brokenRule(id);
  if (rule) throw wrong(`the name ${id} ${rule}`);
  if (camelCase(id) !== name) throw wrong(`the function of ${id} must be called ${camelCase(id)}`);
  if (!node.modifiers?.some((modifier) => modifier.kind === ts.SyntaxKind.ExportKeyword)) throw wrong("is not exported");
  if (node.type?.getText() !== "any[][]") throw wrong(`returns ${node.type?.getText() ?? "no stated type"}, must return any[][]`);
}

/** @param {ts.ParameterDeclaration} parameter @param {ts.FunctionDeclaration} node @param {Wrong} wrong @returns {HandbookParameter} */
function readParameter(parameter, node, wrong) {
  const name = parameter.name.getText();
  if (parameter.type?.getText() !== "any[][]" || parameter.initializer || parameter.dotDotDotToken)
    throw wrong(`the parameter ${name} must be any[][], without a default`);
  const tag = ts.getJSDocParameterTags(parameter)[0];
  if (!tag) throw wrong(`the parameter ${name} has no @param`);
  const text = oneLine(ts.getTextOfJSDocComment(tag.comment));
  const match = /^(.+?)\s*\[([^[\]]+)\]\s+(\w+)$/.exec(text);
  if (!match?.[1] || !match[2] || !match[3])
    throw wrong(`@param ${name} must end in its unit in brackets and its kind, such as "[K] value"`);
  if (!KINDS.includes(match[3])) throw wrong(`@param ${name} is of the kind "${match[3]}"; the kinds are ${KINDS.join(", ")}`);
  return {
    name,
    description: checkDescription(match[1], `@param ${name}`, wrong),
    unit: match[2].trim(),
    kind: /** @type {ParameterKind} */ (match[3]),
    optional: parameter.questionToken !== undefined,
  };
}

/** @param {string[]} texts */
function readLines(texts) {
  const lines = texts.flatMap((text) => text.split("|").map((label) => label.trim()));
  return lines.length === 0 ? {} : { lines };
}

/** @param {string[]} texts @param {Wrong} wrong */
function readResult(texts, wrong) {
  const text = single(texts, () => wrong("needs one @returns"));
  const match = /^(.+?)\s*\[([^[\]]+)\]$/.exec(text);
  if (!match?.[1] || !match[2]) throw wrong(`@returns must end in its unit in brackets, such as "[J]" or "[-]"`);
  return { description: match[1], unit: match[2].trim() };
}

/** @param {string} text @param {Wrong} wrong */
function readExample(text, wrong) {
  const at = arrowOutsideQuotes(text);
  if (at < 0) throw wrong(`@example ${text} must read "formula -> result"`);
  const formula = text.slice(0, at).trim();
  const result = text.slice(at + 2).trim();
  if (!formula || !result) throw wrong(`@example ${text} must read "formula -> result"`);
  return { formula: formula.replace(/^=/, ""), result };
}

/** Place of the first `->` that is not inside a text: reactions in quotes hold arrows of their own. @param {string} text */
function arrowOutsideQuotes(text) {
  let quoted = false;
  for (let at = 0; at < text.length; at++) {
    if (text[at] === '"') quoted = !quoted;
    if (!quoted && text.startsWith("->", at)) return at;
  }
  return -1;
}

/** @param {string} text @param {string} what @param {Wrong} wrong */
function checkDescription(text, what, wrong) {
  if (!text) throw wrong(`the ${what} is empty`);
  if (text.length >= LONGEST) throw wrong(`the ${what} has ${text.length} characters, must have fewer than ${LONGEST}`);
  return text;
}

/** @param {ts.FunctionDeclaration} node */
function description(node) {
  const comments = ts.getJSDocCommentsAndTags(node).filter(ts.isJSDoc);
  return oneLine(ts.getTextOfJSDocComment(comments.at(-1)?.comment));
}

/** Texts of all tags of one name, in order. @param {ts.FunctionDeclaration} node @param {string} tagName */
function textsOf(node, tagName) {
  return ts
    .getJSDocTags(node)
    .filter((tag) => tag.tagName.text === tagName)
    .map((tag) => oneLine(ts.getTextOfJSDocComment(tag.comment)));
}

/** @param {string | undefined} text */
function oneLine(text) {
  return (text ?? "").replace(/\s+/g, " ").trim();
}

/** @param {string[]} texts @param {() => Error} otherwise */
function single(texts, otherwise) {
  const [first] = texts;
  if (texts.length !== 1 || !first) throw otherwise();
  return first;
}

// @ts-check
/** Checks functions.json of a built add-in against functions.js beside it and against what the platform's dialogs can show. */
import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { brokenRule, storedName } from "./names.mjs";

/** @typedef {import("./functions-json.mjs").FunctionMetadata} FunctionMetadata */

/** Longest description that the dialogs show whole, characters. */
const LONGEST = 255;

/**
 * @param {string} folder dist/addin
 * @returns {string[]} faults
 */
export function checkFunctions(folder) {
  const missing = ["functions.json", "functions.js"].filter((name) => !existsSync(join(folder, name)));
  if (missing.length > 0) return missing.map((name) => `${name} is missing`);
  /** @type {import("./functions-json.mjs").Metadata} */
  const metadata = JSON.parse(readFileSync(join(folder, "functions.json"), "utf8"));
  const associated = associatedIds(readFileSync(join(folder, "functions.js"), "utf8"));
  const ids = metadata.functions.map(({ id }) => id);
  return [
    ...(metadata.functions.length === 0 ? ["functions.json holds no function"] : []),
    ...(metadata.allowErrorForDataTypeAny === true ? [] : ["functions.json does not let error cells through"]),
    ...ids.filter((id) => !associated.includes(id)).map((id) => `${id} is in functions.json and not associated in functions.js`),
    ...associated.filter((id) => !ids.includes(id)).map((id) => `${id} is associated in functions.js and not in functions.json`),
    ...meetingNames(ids),
    ...metadata.functions.flatMap((item) => checkFunction(item, folder)),
  ];
}

/** @param {string} script @returns {string[]} */
export function associatedIds(script) {
  return [...script.matchAll(/CustomFunctions\.associate\(\s*["']([^"']+)["']/g)].map((match) => match[1] ?? "");
}

/** @param {readonly string[]} ids */
function meetingNames(ids) {
  const stored = ids.map(storedName);
  return stored.filter((name, at) => stored.indexOf(name) !== at).map((name) => `two functions are stored as ${name}`);
}

/** @param {FunctionMetadata} item @param {string} folder */
function checkFunction({ id, name, description, helpUrl, parameters }, folder) {
  const faults = [];
  const rule = brokenRule(id);
  if (rule) faults.push(`the name ${id} ${rule}`);
  if (name !== id) faults.push(`${id} is called ${name}`);
  const texts = [{ what: id, text: description }, ...parameters.map((p) => ({ what: `${id}, ${p.name}`, text: p.description }))];
  for (const { what, text = "" } of texts) {
    if (text.length === 0 || text.length > LONGEST)
      faults.push(`${what}: the description has ${text.length} characters, must have 1 to ${LONGEST}`);
    if (/[\r\n]/.test(text)) faults.push(`${what}: the description has more than one line`);
  }
  const anchor = helpUrl?.split("/help.html#")[1];
  const help = join(folder, "help.html");
  if (anchor !== id || !existsSync(help) || !readFileSync(help, "utf8").includes(`id="${id}"`))
    faults.push(`${id}: the help page does not hold it`);
  const optional = parameters.findIndex((parameter) => parameter.optional);
  if (optional >= 0 && parameters.slice(optional).some((parameter) => !parameter.optional)) {
    faults.push(`${id}: a required argument stands after one that may be left out`);
  }
  return faults;
}

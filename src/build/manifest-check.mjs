// @ts-check
/**
 * Checks a built add-in without any network: manifest.xml against the platform's published rules and against the files beside it.
 * Every fault is one sentence. The vendor's own validation needs a remote service and stays a manual step before a release.
 */
import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { checkFunctions } from "./functions-check.mjs";
import { below, child, parseXml } from "./xml.mjs";

/** @typedef {import("./xml.mjs").XmlElement} XmlElement */

/** Order of the elements below OfficeApp; a manifest in another order does not load. */
const ORDER = [
  ..."Id AlternateId Version ProviderName DefaultLocale DisplayName Description IconUrl HighResolutionIconUrl SupportUrl".split(" "),
  ..."AppDomains Hosts Requirements DefaultSettings Permissions VersionOverrides".split(" "),
];
const OVERRIDES_ORDER = ["Description", "Requirements", "Hosts", "Resources"];
const HOST_ORDER = ["Runtimes", "AllFormFactors", "DesktopFormFactor"];
const REQUIRED = "Id Version ProviderName DefaultLocale DisplayName Description IconUrl Hosts DefaultSettings Permissions".split(" ");

/** Longest texts, in characters. */
const LONGEST = { ProviderName: 125, DisplayName: 125, Description: 250 };
const LONGEST_RESOURCE = /** @type {Record<string, number>} */ ({
  "bt:ShortStrings": 125,
  "bt:LongStrings": 250,
  "bt:Urls": 2048,
  "bt:Images": 2048,
});
const LONGEST_ID = 32;

/** Icon sizes that a button must have, px. */
const BUTTON_ICONS = ["16", "32", "80"];

/**
 * @param {string} folder dist/addin
 * @returns {string[]} faults; empty if there are none
 */
export function checkAddin(folder) {
  const file = join(folder, "manifest.xml");
  if (!existsSync(file)) return [`${file} is missing`];
  const root = parseXml(readFileSync(file, "utf8"));
  return [
    ...checkOrder(root, ORDER, "OfficeApp"),
    ...checkBasics(root),
    ...checkHosts(root),
    ...checkResources(root),
    ...checkReferences(root),
    ...checkAddresses(root, folder),
    ...checkFunctions(folder),
  ];
}

/** @param {XmlElement} element @param {readonly string[]} order @param {string} where */
function checkOrder(element, order, where) {
  const faults = element.children
    .filter(({ name }) => !order.includes(name))
    .map(({ name }) => `${where} holds the unknown element ${name}`);
  const places = element.children.map(({ name }) => order.indexOf(name)).filter((place) => place >= 0);
  const wrong = places.findIndex((place, at) => at > 0 && place < (places[at - 1] ?? 0));
  if (wrong > 0) faults.push(`in ${where} the element ${element.children[wrong]?.name} stands too late`);
  return faults;
}

/** @param {XmlElement} root */
function checkBasics(root) {
  const faults = REQUIRED.filter((name) => !child(root, name)).map((name) => `${name} is missing`);
  const id = child(root, "Id")?.text.trim() ?? "";
  if (!/^[0-9a-f]{8}-[0-9a-f]{4}-[1-8][0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/i.test(id)) faults.push(`the Id "${id}" is not a GUID`);
  const version = child(root, "Version")?.text.trim() ?? "";
  if (!/^[1-9]\d{0,4}(\.\d{1,5}){0,3}$/.test(version)) faults.push(`the Version "${version}" is not one to four numbers from 1.0 on`);
  for (const [name, longest] of Object.entries(LONGEST)) {
    const element = child(root, name);
    const text = element?.attributes.DefaultValue ?? element?.text ?? "";
    if (text.length === 0 || text.length > longest) faults.push(`${name} has ${text.length} characters, must have 1 to ${longest}`);
  }
  if (!/^[a-z]{2}-[A-Z]{2}$/.test(child(root, "DefaultLocale")?.text.trim() ?? ""))
    faults.push("DefaultLocale is not a locale such as en-GB");
  const permissions = child(root, "Permissions")?.text.trim();
  if (permissions !== "ReadWriteDocument") faults.push(`Permissions is "${permissions}", must be ReadWriteDocument`);
  return faults;
}

/** The shared runtime: runtime, function page, function file and pane must be one and the same page. @param {XmlElement} root */
function checkHosts(root) {
  const overrides = child(root, "VersionOverrides");
  const host = overrides && below(overrides, "Host")[0];
  if (!overrides || !host) return ["VersionOverrides with a Host is missing"];
  const faults = [...checkOrder(overrides, OVERRIDES_ORDER, "VersionOverrides"), ...checkOrder(host, HOST_ORDER, "Host")];
  const runtimes = below(host, "Runtime");
  if (runtimes.length !== 1 || runtimes[0]?.attributes.lifetime !== "long") faults.push('there must be one Runtime with lifetime="long"');
  const page = runtimes[0]?.attributes.resid;
  const pages = [
    ...below(host, "Page").flatMap((element) => below(element, "SourceLocation")),
    ...below(host, "FunctionFile"),
    ...below(host, "Action").flatMap((element) => below(element, "SourceLocation")),
  ];
  if (pages.length < 3) faults.push("Page, FunctionFile and a button's SourceLocation must all be there");
  for (const { name, attributes } of pages) {
    if (attributes.resid !== page) faults.push(`${name} uses ${attributes.resid}, the Runtime uses ${page}`);
  }
  const functions = below(host, "ExtensionPoint").find(({ attributes }) => attributes["xsi:type"] === "CustomFunctions");
  for (const part of ["Script", "Page", "Metadata", "Namespace"]) {
    if (!functions || !child(functions, part)) faults.push(`the extension point CustomFunctions has no ${part}`);
  }
  for (const icon of below(host, "Icon")) {
    const sizes = icon.children.map(({ attributes }) => attributes.size ?? "");
    for (const size of BUTTON_ICONS) if (!sizes.includes(size)) faults.push(`an Icon has no image of ${size} px`);
  }
  return faults;
}

/** @param {XmlElement} root */
function checkResources(root) {
  const faults = [];
  const seen = new Set();
  for (const group of below(root, "Resources")[0]?.children ?? []) {
    for (const { attributes } of group.children) {
      const { id = "", DefaultValue: value = "" } = attributes;
      if (id.length === 0 || id.length > LONGEST_ID) faults.push(`the resource id "${id}" must have 1 to ${LONGEST_ID} characters`);
      if (seen.has(id)) faults.push(`the resource id "${id}" stands twice`);
      seen.add(id);
      const longest = LONGEST_RESOURCE[group.name] ?? 0;
      if (value.length === 0 || value.length > longest) faults.push(`${id} has ${value.length} characters, must have 1 to ${longest}`);
    }
  }
  const name = namespaceOf(root);
  if (!/^[A-Z][A-Z0-9._]{0,31}$/.test(name)) faults.push(`the namespace "${name}" must be capitals, digits, "." and "_", at most 32`);
  return faults;
}

/** @param {XmlElement} root */
function namespaceOf(root) {
  const resid = below(root, "Namespace")[0]?.attributes.resid;
  return below(root, "bt:String").find(({ attributes }) => attributes.id === resid)?.attributes.DefaultValue ?? "";
}

/** Every resid points at a resource of the right kind, and no resource is left over. @param {XmlElement} root */
function checkReferences(root) {
  const resources = new Map(
    (below(root, "Resources")[0]?.children ?? []).flatMap(({ name, children }) => children.map((item) => [item.attributes.id, name])),
  );
  const references = referencesIn(root);
  const used = new Set(references.map(({ attributes }) => attributes.resid));
  const faults = [];
  for (const { name, attributes } of references) {
    const resid = attributes.resid;
    const kind = resources.get(resid);
    if (!kind) faults.push(`${name} refers to ${resid}, which Resources does not hold`);
    else if ((name === "bt:Image") !== (kind === "bt:Images")) faults.push(`${name} refers to ${resid}, which is one of ${kind}`);
  }
  for (const id of resources.keys()) if (id && !used.has(id)) faults.push(`the resource ${id} is not used`);
  return faults;
}

/** @param {XmlElement} element @returns {XmlElement[]} */
function referencesIn(element) {
  return [...(element.attributes.resid ? [element] : []), ...element.children.flatMap(referencesIn)];
}

/** Every address is https, of one origin, and names a file that is there; a picture has the size its use asks for. @param {XmlElement} root @param {string} folder */
function checkAddresses(root, folder) {
  const elements = [
    ...["IconUrl", "HighResolutionIconUrl", "SupportUrl"].flatMap((name) => below(root, name)),
    ...below(root, "DefaultSettings").flatMap((element) => below(element, "SourceLocation")),
    ...below(root, "bt:Urls").flatMap(({ children }) => children),
    ...below(root, "bt:Images").flatMap(({ children }) => children),
  ];
  const source = below(root, "DefaultSettings")[0]?.children[0]?.attributes.DefaultValue ?? "";
  const base = source.replace(/\/[^/]*$/, "");
  return elements.flatMap((element) => checkAddress(element, base, folder, sizeWanted(root, element)));
}

/** Pixels that the use of an image asks for, undefined for other addresses. @param {XmlElement} root @param {XmlElement} element */
function sizeWanted(root, element) {
  if (element.name === "IconUrl") return 32;
  if (element.name === "HighResolutionIconUrl") return 64;
  const use = below(root, "bt:Image").find(
    ({ attributes }) => attributes.resid !== undefined && attributes.resid === element.attributes.id,
  );
  return use ? Number(use.attributes.size) : undefined;
}

/** @param {XmlElement} element @param {string} base @param {string} folder @param {number | undefined} size */
function checkAddress(element, base, folder, size) {
  const address = element.attributes.DefaultValue ?? "";
  const what = element.attributes.id ?? element.name;
  if (!address.startsWith("https://")) return [`${what}: the address "${address}" is not https`];
  if (!address.startsWith(`${base}/`)) return [`${what}: the address "${address}" does not begin with ${base}/`];
  const file = join(folder, address.slice(base.length + 1));
  if (!existsSync(file)) return [`${what}: ${address} names a file that is not there`];
  if (size === undefined) return [];
  const bytes = readFileSync(file);
  const isPng = bytes.subarray(1, 4).toString("latin1") === "PNG" && bytes.length > 24;
  if (!isPng) return [`${what}: ${address} is not a PNG file`];
  const [width, height] = [bytes.readUInt32BE(16), bytes.readUInt32BE(20)];
  return width === size && height === size ? [] : [`${what}: ${address} has ${width} x ${height} pixels, must have ${size} x ${size}`];
}

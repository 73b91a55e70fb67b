// @ts-check
/** Writes the help page of the functions from the handbook: plain HTML, no script, one section with an anchor for each function. */
import { laboratoryTables } from "./help-laboratory.mjs";
import { vesselTables } from "./help-vessel.mjs";
import { escape } from "./html.mjs";

/** @typedef {import("../handbook/index").PromisedEntry} HandbookEntry */
/** @typedef {ReadonlyMap<string, string>} Sources citation by key */

/** Places in the shell assets/help.html that are filled in. */
const CONTENTS = "<!-- contents -->";
const FUNCTIONS = "<!-- functions -->";
const SETS = "<!-- sets -->";
const LABORATORY = "<!-- laboratory -->";
const VESSELS = "<!-- vessels -->";

/** What an example promises, in words: a rounded number is told by a tilde. */
const ROUNDED = /^~ /;

/**
 * @param {string} shell
 * @param {readonly HandbookEntry[]} handbook
 * @param {{ readonly sources: readonly { key: string, citation: string }[], readonly grades: Readonly<Record<string, string>> }} cited
 * @param {readonly { id: string, title: string, source: string, form: string }[]} sets
 * @param {import("./help-laboratory.mjs").Figures} laboratory
 * @param {import("./help-vessel.mjs").VesselFigures} vessels
 * @returns {string}
 */
export function helpPage(shell, handbook, { sources, grades }, sets, laboratory, vessels) {
  for (const place of [CONTENTS, FUNCTIONS, SETS, LABORATORY, VESSELS])
    if (!shell.includes(place)) throw new Error(`assets/help.html must hold ${place}`);
  const families = [...new Set(handbook.map((entry) => entry.family))];
  const contents = families.map((family) => familyLinks(family, handbook)).join("\n");
  const citations = new Map(sources.map(({ key, citation }) => [key, citation]));
  const functions = handbook.map((entry) => section(entry, citations)).join("\n");
  return shell
    .replace(CONTENTS, () => contents)
    .replace(SETS, () => setTable(sets, citations) + gradeList(grades))
    .replace(LABORATORY, () => laboratoryTables(laboratory, (key) => citations.get(key) ?? key))
    .replace(VESSELS, () => vesselTables(vessels, (key) => citations.get(key) ?? key))
    .replace(FUNCTIONS, () => functions);
}

/** @param {readonly { id: string, title: string, source: string, form: string }[]} sets @param {Sources} citations */
function setTable(sets, citations) {
  const rows = sets.map(
    ({ id, form, source }) =>
      `<tr><th scope="row"><code>${escape(id)}</code></th><td>${escape(form)}</td><td>${escape(citations.get(source) ?? source)}</td></tr>`,
  );
  return `<table><thead><tr><th scope="col">set</th><th scope="col">form</th><th scope="col">source</th></tr></thead>
<tbody>${rows.join("\n")}</tbody></table>`;
}

/** @param {Readonly<Record<string, string>>} grades */
function gradeList(grades) {
  return `<p>Grades: ${Object.entries(grades)
    .map(([grade, meaning]) => `<b>${escape(grade)}</b> ${escape(meaning)}`)
    .join("; ")}.</p>`;
}

/** @param {string} result */
function promised(result) {
  const words = ROUNDED.test(result) ? "gives about" : "gives";
  return `${words} <code>${escape(result.replace(ROUNDED, ""))}</code>`;
}

/** @param {string} family @param {readonly HandbookEntry[]} handbook */
function familyLinks(family, handbook) {
  const links = handbook.filter((entry) => entry.family === family).map((entry) => `<a href="#${entry.id}">${escape(entry.id)}</a>`);
  return `<p><b>${escape(family)}</b> ${links.join(" ")}</p>`;
}

/** @param {HandbookEntry} entry @param {Sources} citations */
function section(entry, citations) {
  const names = entry.parameters.map((parameter) => (parameter.optional ? `[${parameter.name}]` : parameter.name));
  return `<section id="${entry.id}">
<h2>${escape(entry.name)}</h2>
<p class="call"><code>=${escape(entry.name)}(${escape(names.join(", "))})</code></p>
<p>${escape(entry.description)}</p>
${argumentTable(entry)}
<p>Result: ${escape(entry.result.description)}${unitOf(entry.result.unit)}.</p>
${lineList(entry)}<ul>${entry.examples.map((example) => `<li><code>=${escape(example.formula)}</code> ${promised(example.result)}</li>`).join("")}</ul>
<p>${entry.sources.map((key) => `<cite>${escape(citations.get(key) ?? key)}</cite>`).join("<br>")}</p>
</section>`;
}

/** The labels of a table, so that a line can be found by its number. @param {HandbookEntry} entry */
function lineList({ lines }) {
  if (!lines) return "";
  return `<details><summary>Lines of the table, as the first example gives them</summary><ol>${lines.map((label) => `<li>${escape(label)}</li>`).join("")}</ol></details>\n`;
}

/** @param {HandbookEntry} entry */
function argumentTable(entry) {
  const rows = entry.parameters.map(
    ({ name, description, unit, kind, optional }) =>
      `<tr><th scope="row">${escape(name)}</th><td>${escape(description)}${unitOf(unit)}</td><td>${kind}${optional ? ", may be left out" : ""}</td></tr>`,
  );
  return `<table><thead><tr><th scope="col">argument</th><th scope="col">meaning</th><th scope="col">kind</th></tr></thead>
<tbody>${rows.join("\n")}</tbody></table>`;
}

/** @param {string} unit */
function unitOf(unit) {
  return unit === "-" ? "" : ` [${escape(unit)}]`;
}

// @ts-check
/** The looks of the sample workbooks, and the two parts of a workbook that describe looks and dynamic arrays. */

/**
 * @typedef {{ font?: number, fill?: number, border?: number, format?: string, align?: "left" | "center" | "right", wrap?: boolean }} Look
 * Fonts: 0 plain, 1 title, 2 grey italic, 3 bold, 4 grey. Fills: 0 none, 2 heading, 3 input. Borders: 0 none, 1 thin box, 2 line below.
 */

/** @type {Readonly<Record<string, Look>>} */
export const LOOKS = {
  title: { font: 1 },
  remark: { font: 2, wrap: true, align: "left" },
  heading: { font: 3, fill: 2, border: 2 },
  headingRight: { font: 3, fill: 2, border: 2, align: "right" },
  label: {},
  unit: { font: 4 },
  unitRight: { font: 4, align: "right" },
  note: { font: 4 },
  input: { fill: 3, border: 1 },
  inputOne: { fill: 3, border: 1, format: "0.0" },
  inputThree: { fill: 3, border: 1, format: "0.000" },
  inputFour: { fill: 3, border: 1, format: "0.0000" },
  inputLabel: { fill: 3, border: 1, align: "left" },
  inputText: { fill: 3, border: 1, align: "right" },
  text: {},
  textRight: { align: "right" },
  whole: { format: "0" },
  one: { format: "0.0" },
  two: { format: "0.00" },
  three: { format: "0.000" },
  four: { format: "0.0000" },
  five: { format: "0.00000" },
  six: { format: "0.000000" },
  seven: { format: "0.0000000" },
  percent: { format: "0.0%" },
  bold: { font: 3, format: "0.0" },
  inputTwo: { fill: 3, border: 1, format: "0.00" },
  scientific: { format: "0.00E+00" },
};

const FONTS = [
  '<sz val="10"/><color rgb="FF20282A"/><name val="Arial"/>',
  '<b/><sz val="15"/><color rgb="FF98481A"/><name val="Arial"/>',
  '<i/><sz val="9"/><color rgb="FF566164"/><name val="Arial"/>',
  '<b/><sz val="10"/><color rgb="FF20282A"/><name val="Arial"/>',
  '<sz val="9"/><color rgb="FF566164"/><name val="Arial"/>',
];
const solid = (/** @type {string} */ colour) =>
  `<patternFill patternType="solid"><fgColor rgb="FF${colour}"/><bgColor indexed="64"/></patternFill>`;
const FILLS = ['<patternFill patternType="none"/>', '<patternFill patternType="gray125"/>', solid("F3E6DC"), solid("FFF9E3")];
const side = (/** @type {string} */ name, /** @type {string} */ colour) => `<${name} style="thin"><color rgb="FF${colour}"/></${name}>`;
const BORDERS = [
  "<left/><right/><top/><bottom/><diagonal/>",
  `${["left", "right", "top", "bottom"].map((name) => side(name, "D9CFA8")).join("")}<diagonal/>`,
  `<left/><right/><top/>${side("bottom", "98481A")}<diagonal/>`,
];

const FIRST_CUSTOM_FORMAT = 164;

export function stylesXml() {
  const formats = [...new Set(Object.values(LOOKS).flatMap(({ format }) => (format ? [format] : [])))];
  const list = (/** @type {string} */ tag, /** @type {string} */ item, /** @type {readonly string[]} */ entries) =>
    `<${tag} count="${entries.length}">${entries.map((entry) => `<${item}>${entry}</${item}>`).join("")}</${tag}>`;
  const numbers = formats.map((code, i) => `<numFmt numFmtId="${FIRST_CUSTOM_FORMAT + i}" formatCode="${code}"/>`).join("");
  const looks = Object.values(LOOKS).map((look) => lookXml(look, formats));
  return (
    '<styleSheet xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main">' +
    `<numFmts count="${formats.length}">${numbers}</numFmts>` +
    list("fonts", "font", FONTS) +
    list("fills", "fill", FILLS) +
    list("borders", "border", BORDERS) +
    '<cellStyleXfs count="1"><xf numFmtId="0" fontId="0" fillId="0" borderId="0"/></cellStyleXfs>' +
    `<cellXfs count="${looks.length + 1}"><xf numFmtId="0" fontId="0" fillId="0" borderId="0" xfId="0"/>${looks.join("")}</cellXfs>` +
    '<cellStyles count="1"><cellStyle name="Normal" xfId="0" builtinId="0"/></cellStyles></styleSheet>'
  );
}

/** @param {Look} look @param {readonly string[]} formats */
function lookXml({ font = 0, fill = 0, border = 0, format, align, wrap }, formats) {
  const number = format ? FIRST_CUSTOM_FORMAT + formats.indexOf(format) : 0;
  const inside = align || wrap ? `<alignment${align ? ` horizontal="${align}"` : ""}${wrap ? ' vertical="top" wrapText="1"' : ""}/>` : "";
  return (
    `<xf numFmtId="${number}" fontId="${font}" fillId="${fill}" borderId="${border}" xfId="0" applyNumberFormat="1" applyFont="1" ` +
    `applyFill="1" applyBorder="1"${inside ? ` applyAlignment="1">${inside}</xf>` : "/>"}`
  );
}

/** Marks the array formulas that refer to entry 1 as dynamic (they spill). */
export function metadataXml() {
  return (
    '<metadata xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main" xmlns:xda="http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray">' +
    '<metadataTypes count="1"><metadataType name="XLDAPR" minSupportedVersion="120000" copy="1" pasteAll="1" pasteValues="1" merge="1" ' +
    'splitFirst="1" rowColShift="1" clearFormats="1" clearComments="1" assign="1" coerce="1" cellMeta="1"/></metadataTypes>' +
    '<futureMetadata name="XLDAPR" count="1"><bk><extLst><ext uri="{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}">' +
    '<xda:dynamicArrayProperties fDynamic="1" fCollapsed="0"/></ext></extLst></bk></futureMetadata>' +
    '<cellMetadata count="1"><bk><rc t="1" v="0"/></bk></cellMetadata></metadata>'
  );
}

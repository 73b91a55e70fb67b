// @ts-check
/** The theme of a sample that holds charts: the six accents are the colours that the local page draws its curves with, in the light. */

/** Accents 1 to 6 as they stand in src/tryout/charts.css. */
export const ACCENTS = ["98481A", "0B5A66", "5D3FA0", "2F6B1F", "8A1F5C", "1D4F91"];

const colour = (/** @type {string} */ name, /** @type {string} */ value) => `<a:${name}><a:srgbClr val="${value}"/></a:${name}>`;
const font = (/** @type {string} */ name) => `<a:${name}><a:latin typeface="Arial"/><a:ea typeface=""/><a:cs typeface=""/></a:${name}>`;
const three = (/** @type {string} */ entry) => entry.repeat(3);

/** Colours, fonts, and the three fills, lines and effects that the format demands (all plain). Source of the form: ECMA-376-1, 20.1.6.9. */
export function themeXml() {
  const plain = '<a:solidFill><a:schemeClr val="phClr"/></a:solidFill>';
  const ground = [colour("dk1", "20282A"), colour("lt1", "FFFFFF"), colour("dk2", "566164"), colour("lt2", "F0F2F0")];
  const accents = ACCENTS.map((value, i) => colour(`accent${i + 1}`, value));
  const links = [colour("hlink", "0B5A66"), colour("folHlink", "5D3FA0")];
  return (
    '<a:theme xmlns:a="http://schemas.openxmlformats.org/drawingml/2006/main" name="Stillwall"><a:themeElements>' +
    `<a:clrScheme name="Stillwall">${[...ground, ...accents, ...links].join("")}</a:clrScheme>` +
    `<a:fontScheme name="Stillwall">${font("majorFont")}${font("minorFont")}</a:fontScheme>` +
    `<a:fmtScheme name="Stillwall"><a:fillStyleLst>${three(plain)}</a:fillStyleLst><a:lnStyleLst>${three(`<a:ln w="9525">${plain}</a:ln>`)}</a:lnStyleLst>` +
    `<a:effectStyleLst>${three("<a:effectStyle><a:effectLst/></a:effectStyle>")}</a:effectStyleLst><a:bgFillStyleLst>${three(plain)}</a:bgFillStyleLst>` +
    "</a:fmtScheme></a:themeElements></a:theme>"
  );
}

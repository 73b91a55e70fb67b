/**
 * Spellings that mean the same: subscripts and full-width letters, spaces, hyphens and dashes, sulph-/sulf-, aluminum, vapor.
 */

/** The text without spaces, hyphens and typographic variants; upper and lower case stay, and so does the sign of a charge at the end. */
export function fold(text: string): string {
  return text
    .normalize("NFKC")
    .trim()
    .replace(/[\s\u00a0_\u00ad]|[\u002d\u2010-\u2015\u2212](?!$)/g, "")
    .replace(/[\u2018\u2019\u2032]/g, "'");
}

/** The folded text in lower case, with the British and older spellings brought to one. */
export function foldCase(text: string): string {
  return fold(text)
    .toLowerCase()
    .replace(/sulph/g, "sulf")
    .replace(/aluminum/g, "aluminium")
    .replace(/vapor(?!i)/g, "vapour")
    .replace(/caesium/g, "cesium");
}

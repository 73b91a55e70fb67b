/** The many ways of writing the same unit, brought to one: plain spaces, `*`, `/`, `-`, digits on the line, one degree sign. */

const rewrites: readonly (readonly [RegExp, string])[] = [
  [/[\u2010-\u2015\u2212]/g, "-"], // hyphens, dashes, minus sign
  [/[·⋅∙•×∗]/g, "*"],
  [/[÷∕⁄]/g, "/"],
  [/\*\*/g, "^"],
  [/\s+/g, " "],
  [/ per /g, "/"],
  [/\bdeg(?:ree)?s?\.? ?([CFRK])\b/gi, "°$1"],
  [/° /g, "°"],
  [/\b(mm|cm|in) (Hg|H2O)\b/g, "$1$2"],
  [/\b(lb|kg|g)-?mol\b/g, "$1mol"],
  [/(?<=[\p{L}\d)])\.(?=[\p{L}°(])/gu, "*"], // the full stop as multiplication: J/(mol.K)
  [/(?<=[\p{L})])-(?=[\p{L}°(])/gu, "*"], // the hyphen as multiplication: ft-lbf
];

/** `"J/(mol·K)"`, `"m³"`, `"℃"` and their like in plain characters. Superscripts become digits after the name: `m3`, `K-1`. */
export function plainSpelling(text: string): string {
  // The look-alikes of the degree sign first: compatibility folding would make a letter o of them.
  let plain = text.replace(/[º˚]/g, "°").normalize("NFKC");
  for (const [pattern, replacement] of rewrites) plain = plain.replace(pattern, replacement);
  return plain.trim();
}

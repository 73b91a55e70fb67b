/** Brightness and contrast of colours, by WCAG 2 (relative luminance, contrast ratio). Pure. */

/** Relative luminance, 0 (black) to 1 (white), of `#rgb` or `#rrggbb`; undefined for anything else. */
export function luminance(colour: string): number | undefined {
  const hex = /^#?([0-9a-f]{3}|[0-9a-f]{6})$/i.exec(colour.trim())?.[1];
  if (hex === undefined) return undefined;
  const wide = hex.length === 3 ? [...hex].map((digit) => digit + digit).join("") : hex;
  const [red = 0, green = 0, blue = 0] = [0, 2, 4].map((at) => linearised(parseInt(wide.slice(at, at + 2), 16) / 255));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function linearised(channel: number): number {
  return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
}

/** Contrast ratio of two luminances, 1 to 21. */
export function contrast(one: number, other: number): number {
  return (Math.max(one, other) + 0.05) / (Math.min(one, other) + 0.05);
}

/** A background is taken over from the host only if it lies in these bounds, where every text colour of the pane keeps 4.5 : 1. */
export const PALEST_ALLOWED = 0.85;
export const DARKEST_ALLOWED = 0.02;

/** The theme that a background asks for, and whether the pane may wear that very background. */
export function themeOf(background: string): { theme: "light" | "dark"; wearable: boolean } | undefined {
  const light = luminance(background);
  if (light === undefined) return undefined;
  return { theme: light > 0.18 ? "light" : "dark", wearable: light >= PALEST_ALLOWED || light <= DARKEST_ALLOWED };
}

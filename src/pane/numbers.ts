/** Numbers as the pane prints them: a point as decimal sign, no grouping, no digits that the double does not carry. */

/** Up to `digits` significant digits, trailing zeros dropped; powers of ten only below 1e-6 and from 1e15. */
export function shown(value: number, digits = 12): string {
  const rounded = Number(value.toPrecision(digits));
  return String(rounded).replace("-", "\u2212").replace(/e\+?/, "e").replace("e-", "e\u2212");
}

/** A fixed number of decimals, with a true minus sign. */
export function fixed(value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  return Number(text) === 0 ? text.replace("-", "") : text.replace("-", "\u2212");
}

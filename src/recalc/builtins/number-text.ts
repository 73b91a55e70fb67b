/** A number as a text, as Excel joins it to one: 15 significant digits at most, `1E+20` from twenty-one places on. */
export function generalText(value: number): string {
  const rounded = Number(value.toPrecision(15));
  const text = String(rounded);
  const size = Math.abs(rounded);
  if ((size !== 0 && (size >= 1e20 || size < 1e-9)) || text.includes("e")) return exponential(rounded);
  return text;
}

function exponential(value: number): string {
  const [digits, exponent] = value.toExponential().split("e") as [string, string];
  const power = Math.abs(Number(exponent));
  return `${digits}E${exponent.startsWith("-") ? "-" : "+"}${power < 10 ? "0" : ""}${power}`;
}

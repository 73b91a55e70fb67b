/**
 * A number in a scientific format such as `0.00E+00` or `##0.0E+0`, which the engine's own formatter does not know.
 * @returns undefined for a format without exponent
 */
export function scientific(value: number, format: string): string | undefined {
  const sections = format.split(";");
  const section = value < 0 && sections.length > 1 ? sections[1]! : value === 0 && sections.length > 2 ? sections[2]! : sections[0]!;
  const match = /^([^0#?]*)([0#?,]*)(?:\.([0#?]*))?E([+-])([0#?]+)(.*)$/i.exec(section);
  if (!match) return undefined;
  const [, before = "", whole = "", places = "", sign, power = "", after = ""] = match;
  const size = sections.length > 1 && value < 0 ? Math.abs(value) : value;
  const step = Math.max(1, whole.replaceAll(",", "").length);
  const { digits, exponent } = scaled(size, step, places.length, whole);
  const shown = optionalPlaces(digits, places);
  const mark = exponent < 0 ? "-" : sign === "+" ? "+" : "";
  return `${before}${shown}E${mark}${String(Math.abs(exponent)).padStart(power.replace(/[^0]/g, "").length, "0")}${after}`.replaceAll(
    '"',
    "",
  );
}

/** Digits before the point in steps of the pattern's width (engineering notation for `##0`), else one. */
function scaled(value: number, step: number, places: number, whole: string): { digits: string; exponent: number } {
  if (value === 0) return { digits: (0).toFixed(places), exponent: 0 };
  const engineering = step > 1 && whole.includes("#");
  const shift = (exponent: number) => (engineering ? Math.floor(exponent / step) * step : exponent - (step - 1));
  let exponent = shift(exponentOf(value));
  let digits = movePoint(value, -exponent, places);
  if (exponentOf(Number(digits)) > exponentOf(value) - exponent) {
    exponent = shift(exponentOf(value) + 1);
    digits = movePoint(value, -exponent, places);
  }
  return { digits, exponent };
}

function exponentOf(value: number): number {
  return Number(value.toExponential(14).split("e")[1]);
}

function movePoint(value: number, places: number, shown: number): string {
  const [digits, exponent] = value.toExponential(14).split("e") as [string, string];
  return Number(`${digits}e${Number(exponent) + places}`).toFixed(shown);
}

/** `#` after the point stands for a digit only if it is not a trailing zero. */
function optionalPlaces(digits: string, places: string): string {
  const forced = places.replace(/[#?]+$/, "").length;
  let text = digits;
  for (let kept = places.length; kept > forced && text.endsWith("0"); kept--) text = text.slice(0, -1);
  return text.endsWith(".") ? text.slice(0, -1) : text;
}

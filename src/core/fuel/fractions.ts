/**
 * A composition typed as mass fractions where per cent is meant: 0.061 for 6.1 % hydrogen. All its numbers are below 1 and the hydrogen,
 * which is 3 % to 25 % in fuels, is below 0.25. A coke or graphite can have such contents in per cent: whoever means it says so with
 * the sign, "0.2 %", and is then not asked.
 */
export function looksLikeFractions(hydrogen: number, others: readonly number[]): boolean {
  return hydrogen > 0 && hydrogen < 0.25 && others.every((other) => other < 1) && others.some((other) => other > 0);
}

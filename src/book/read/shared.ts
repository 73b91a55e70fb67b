/**
 * Shared formulas: the file writes the formula once, for its first cell, and the other cells of the group only name the
 * group. The text for another cell is the first one with its relative references moved; references that leave the sheet
 * come in again on the other side, as Excel does it.
 */
import { tokenize, translateTokensToA1, translateTokensToR1C1, stringifyTokens, tokenTypes } from "@borgar/fx/xlsx";

/** A formula ready to be written out for any cell of its group; undefined if it holds something that cannot be read. */
export type SharedFormula = (address: string) => string;

/** Prepares the formula of a group from its text at its first cell. */
export function sharedFormula(formula: string, home: string): SharedFormula | undefined {
  const tokens = tokenize(formula, { mergeRefs: true });
  if (tokens.some((token) => token.type === tokenTypes.UNKNOWN || token.unterminated)) return undefined;
  const relative = translateTokensToR1C1(tokens, home);
  return (address) => (address === home ? formula : stringifyTokens(translateTokensToA1(relative, address, { wrapEdges: true })));
}

/** The formula as it reads when moved from one cell to another; undefined if it holds something that cannot be read. */
export function movedFormula(formula: string, from: string, to: string): string | undefined {
  return sharedFormula(formula, from)?.(to);
}

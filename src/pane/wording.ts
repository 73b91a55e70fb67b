/**
 * The words in quotes of an argument's help: either all that the argument takes ("separated" or "total"), or some of them
 * ("iso-1928-2009", or four numbers), or examples of quantities ("30 atm"). Pure: reads the help as it is written, so that a function
 * that comes later has its choices by itself.
 */
import type { HandbookParameter } from "../handbook";

const QUOTED = /"([^"]+)"/g;
/** A text with a number in front is an example of a quantity, one in brackets belongs to another word: neither is a word to choose. */
const NO_WORD = /^[-+.\d(]/;

function wordsOf(description: string): string[] {
  return [...new Set([...description.matchAll(QUOTED)].map(([, word = ""]) => word))].filter((word) => !NO_WORD.test(word));
}

/** All the words the argument takes; empty if it takes anything else too. */
export function choicesOf({ description, unit, kind }: HandbookParameter): readonly string[] {
  const closed = unit === "-" && kind === "value" && !/\bsuch as\b|\bnumbers?\b/i.test(description);
  return closed ? wordsOf(description) : [];
}

/** Words to suggest where others, numbers or cells may be given as well. */
export function suggestionsOf(parameter: HandbookParameter): readonly string[] {
  return choicesOf(parameter).length > 0 ? [] : wordsOf(parameter.description);
}

/** The word that counts if the argument is left out; empty where the help names none. */
export function usualWord(description: string): string {
  return /"([^"]+)" if left out/.exec(description)?.[1] ?? "";
}

/** The loop that most functions share: substance, set and other values spread over their ranges, each state handed its substance. */
import { type Named, spread } from "./broadcast";
import { Block, Cell, cells, finite } from "./cell";
import { blockChoice, setOf } from "./set";
import { Substance, substanceArgument, substanceOf } from "./substance";

/** A number for each state. With `asMoles` the amounts of a composition range are moles and need not add up to 1. */
export function eachState(
  substance: Block,
  set: Block | undefined,
  others: readonly Named[],
  each: (found: Substance, cells: (Cell | undefined)[]) => number,
  asMoles = false,
): Block {
  return cells(() => {
    const argument = substanceArgument(substance);
    const choice = blockChoice(set);
    const named: readonly Named[] = [["substance", argument.texts], ["set", choice ? undefined : set], ...others];
    return spread(named, ([text, setCell, ...values]) =>
      finite(each(substanceOf(argument, text, choice ?? setOf(setCell), asMoles), values)),
    );
  });
}

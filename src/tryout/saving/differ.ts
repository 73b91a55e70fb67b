/**
 * When a recalculated value takes the place of the one in the file, by the rule the command has too. A built-in that newly fails keeps
 * the value of the file: the fault may lie in this program's version of the function.
 */
import { differs as valueDiffers, isError } from "../../book/differ";
import type { BookValue } from "../../book/workbook";

export function differs(before: BookValue, after: BookValue, formula: string): boolean {
  const stillwall = /_xldudf_still_|still\./i.test(formula);
  if (isError(after) && !isError(before) && before !== null && !stillwall) return false;
  return valueDiffers(before, after, stillwall);
}

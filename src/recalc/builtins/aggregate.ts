import { isErrorCode } from "../errors";
import { engineFunction, type EngineArgument, type EngineCall, type EngineResult, type EngineValue } from "../library";
import { asResult, cellsOf, FunctionError, type Declarations } from "./declare";
import { first } from "./samples";

/** The functions AGGREGATE chooses from, by number; from 14 on they take a further argument. */
const choices = [
  "AVERAGE", "COUNT", "COUNTA", "MAX", "MIN", "PRODUCT", "STDEV.S", "STDEV.P", "SUM", "VAR.S", "VAR.P", "MEDIAN", "MODE.SNGL",
  "LARGE", "SMALL", "PERCENTILE.INC", "QUARTILE.INC", "PERCENTILE.EXC", "QUARTILE.EXC",
]; // prettier-ignore

/** What the engine offers to a function about the cells it reads. */
interface Cells {
  getters: { getCell(position: unknown): { compiledFormula?: { usesSymbol(name: string): boolean } } | undefined };
}

/** AGGREGATE. Options 2, 3, 6 and 7 pass over errors, 0 to 3 over cells that are subtotals themselves; hidden rows are not known here. */
export function registerAggregate(declare: Declarations): void {
  declare.tables("AGGREGATE", "function, options, array…", function (read, code, options, ...args): EngineResult {
    const number = Math.trunc(read.number(first(code)));
    const option = Math.trunc(read.number(first(options)));
    const name = choices[number - 1];
    if (!name || !(option >= 0 && option <= 7))
      throw new FunctionError("#VALUE!", `AGGREGATE has no function ${number} with option ${option}`);
    const extra = number >= 14 ? args.slice(1, 2) : [];
    const lists = number >= 14 ? args.slice(0, 1) : args;
    const kept = lists.flatMap(cellsOf).filter((cell) => !passedOver(cell, option, this as unknown as Cells));
    const compute = engineFunction(declare.library, name)!.compute as unknown as (
      this: EngineCall,
      ...given: EngineArgument[]
    ) => EngineResult;
    return asResult(compute.call(this, [kept], ...extra.map(first)));
  });
}

function passedOver(cell: EngineValue, option: number, { getters }: Cells): boolean {
  if (isErrorCode(cell.value)) return [2, 3, 6, 7].includes(option);
  if (option > 3 || !cell.position) return false;
  const formula = getters.getCell(cell.position)?.compiledFormula;
  return formula !== undefined && (formula.usesSymbol("SUBTOTAL") || formula.usesSymbol("AGGREGATE"));
}

/**
 * The corrected temperature rise of calorimeter runs in cells: one number for each run, or the table of what each run tells.
 * A run that is refused is its own error cell; the others are given.
 */
import { analyse } from "../core/calorimeter/rise/analysis";
import { Method, methodOf, METHODS } from "../core/calorimeter/rise/methods";
import { correctedRise } from "../core/calorimeter/rise/rise";
import { readText } from "./arguments";
import { Block, Cell, cells, errorOf, finite, isTextLeftOut } from "./cell";
import { riseReport } from "./rise-report";
import { singleCell } from "./lists";
import { RiseRuns } from "./rise-runs";
import { tableOf } from "./table";

/** Corrected rises, K, one cell for each run in a row. */
export function riseCells(times: Block, temperatures: Block, fire: Block, end?: Block, method?: Block, timeUnit?: Block): Block {
  return cells(() => {
    const chosen = readMethod(method);
    const runs = new RiseRuns(times, temperatures, fire, end, timeUnit);
    const row: Cell[] = new Array(runs.count);
    for (let run = 0; run < runs.count; run++) row[run] = riseCell(runs, run, chosen);
    return [row];
  });
}

/** The table of the same runs: upright for one, a row for each of several. */
export function riseReportCells(times: Block, temperatures: Block, fire: Block, end?: Block, method?: Block, timeUnit?: Block): Block {
  return cells(() => {
    const chosen = readMethod(method);
    const runs = new RiseRuns(times, temperatures, fire, end, timeUnit);
    return tableOf(
      Array.from({ length: runs.count }, (_, index) => () => {
        const { grid, temperatures: readings, endGiven } = runs.read(index);
        return riseReport(analyse(grid, readings, chosen), endGiven);
      }),
    );
  });
}

function riseCell(runs: RiseRuns, index: number, method: Method): Cell {
  try {
    const { grid, temperatures } = runs.read(index);
    return finite(correctedRise(grid, temperatures, method));
  } catch (thrown) {
    return errorOf(thrown);
  }
}

function readMethod(block: Block | undefined): Method {
  const text = isTextLeftOut(block) ? undefined : readText(singleCell(block, "method"), "method");
  return text === undefined ? METHODS[0] : methodOf(text);
}

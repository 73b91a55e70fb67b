import type { EngineLibrary } from "./library";

/** A cell, as the engine names it. */
export interface EnginePosition {
  readonly sheetId: string;
  readonly row: number;
  readonly col: number;
}

interface EngineRange {
  readonly sheetId: string;
  readonly zone: { left: number; right: number; top: number; bottom: number };
}

/** The parts of the engine's evaluator that are used here; they are not in its declared types. */
interface Evaluator {
  evaluate(ranges: Iterable<EngineRange>): void;
  clearEvaluatedRanges(ranges: Iterable<EngineRange>): void;
  computeAndSave(position: EnginePosition): unknown;
  nextRangesToUpdate: Iterable<EngineRange> & { isEmpty(): boolean; hasPosition(position: EnginePosition): boolean };
  getters: {
    getSheetZone(sheetId: string): EngineRange["zone"];
    getCells(sheetId: string): readonly { readonly id: unknown }[];
    getCellPosition(id: unknown): EnginePosition;
  };
}

/**
 * The engine computes a cell by computing first, one inside the other, all that it reads: a thousand cells that follow one another
 * exhaust the stack. Where the order of a workbook is known, its cells are computed in that order, so that every cell finds what it
 * reads already there, however long the chain. The order only saves depth: what a cell gives does not depend on it.
 *
 * At a first calculation the engine visits every cell of every sheet, the empty ones too; sheets have much room for results to spill
 * into, so here it visits them only as far as they hold something.
 *
 * The engine also stops after thirty rounds of results that spill into cells others have read, leaving the rest out of date without
 * a word. Here it goes on until nothing changes, or says that nothing settles.
 */
const mostRounds = 2000;

export class UnsettledError extends Error {}

let upcoming: readonly EnginePosition[] = [];

/** Runs `build`, which makes a model, with the order in which its cells are to be computed. */
export function inOrder<T>(order: readonly EnginePosition[], build: () => T): T {
  upcoming = order;
  try {
    return build();
  } finally {
    upcoming = [];
  }
}

/** Makes every model of the library follow a given order and settle. Called once. */
export function installOrder(library: EngineLibrary): void {
  const registry = library.registries.coreViewsPluginRegistry as unknown as {
    get(key: string): unknown;
    replace(key: string, plugin: unknown): void;
  };
  const Evaluation = registry.get("evaluation") as new (config: unknown) => { evaluator: Evaluator };
  class OrderedEvaluation extends Evaluation {
    constructor(config: unknown) {
      super(config);
      settle(this.evaluator);
      if (upcoming.length > 0) follow(this.evaluator, upcoming);
    }
  }
  registry.replace("evaluation", OrderedEvaluation);
}

function follow(evaluator: Evaluator, order: readonly EnginePosition[]): void {
  const clear = evaluator.clearEvaluatedRanges.bind(evaluator);
  evaluator.clearEvaluatedRanges = (ranges) => {
    const cleared = [...ranges];
    clear(cleared);
    // Later edits reach few cells; only the first calculation needs the order.
    if (upcoming !== order) return;
    const within = bySheet(cleared);
    for (const position of order) {
      if (within(position) && !evaluator.nextRangesToUpdate.hasPosition(position)) evaluator.computeAndSave(position);
    }
  };
}

function settle(evaluator: Evaluator): void {
  const evaluate = evaluator.evaluate.bind(evaluator);
  evaluator.evaluate = (ranges) => {
    evaluate(withoutRoom(evaluator, ranges));
    for (let round = 0; !evaluator.nextRangesToUpdate.isEmpty(); round++) {
      if (round === mostRounds) throw new UnsettledError("Formulas that spill into one another do not settle");
      evaluate([...evaluator.nextRangesToUpdate]);
    }
  };
}

/** The ranges, whole sheets cut to the rows and columns that hold something. */
function withoutRoom({ getters }: Evaluator, ranges: Iterable<EngineRange>): EngineRange[] {
  return [...ranges].map((range) => {
    const { bottom, right } = getters.getSheetZone(range.sheetId);
    const isWhole = range.zone.top === 0 && range.zone.left === 0 && range.zone.bottom === bottom && range.zone.right === right;
    return isWhole ? { ...range, zone: usedZone(getters, range.sheetId) } : range;
  });
}

function usedZone(getters: Evaluator["getters"], sheetId: string): EngineRange["zone"] {
  const zone = { top: 0, left: 0, bottom: 0, right: 0 };
  for (const { id } of getters.getCells(sheetId)) {
    const { row, col } = getters.getCellPosition(id);
    zone.bottom = Math.max(zone.bottom, row);
    zone.right = Math.max(zone.right, col);
  }
  return zone;
}

function bySheet(ranges: readonly EngineRange[]): (position: EnginePosition) => boolean {
  const sheets = new Map<string, EngineRange["zone"][]>();
  for (const { sheetId, zone } of ranges) sheets.set(sheetId, [...(sheets.get(sheetId) ?? []), zone]);
  return ({ sheetId, row, col }) =>
    sheets.get(sheetId)?.some(({ left, right, top, bottom }) => col >= left && col <= right && row >= top && row <= bottom) ?? false;
}

/**
 * The ranges that the charts of the open workbook refer to, kept by the engine: rows inserted, cells moved and sheets renamed shift them as
 * they shift the references of formulas, and undo brings them back.
 */
import { CorePlugin, registries, type Model } from "./engine";

/** A range of the engine, as far as it is looked at here. */
interface EngineRange {
  readonly sheetId: string;
  readonly zone: { readonly top: number; readonly left: number; readonly bottom: number; readonly right: number };
  readonly invalidXc?: string;
  readonly invalidSheetName?: string;
}

/** Ranges in the engine's words by the formula of the chart. */
export type ChartRanges = ReadonlyMap<string, readonly string[]>;

/** Ranges that the next model takes over; set just before the model is made. */
let incoming: ChartRanges = new Map();

export function nextChartRanges(ranges: ChartRanges): void {
  incoming = ranges;
}

export function installChartRanges(): void {
  class Keeper extends CorePlugin {
    static override getters = ["getChartRanges"] as const;
    private readonly wanted = incoming;
    private readonly kept: Record<string, readonly EngineRange[]> = {};

    override import(): void {
      for (const [formula, ranges] of this.wanted)
        this.kept[formula] = ranges.map((range) => this.getters.getRangeFromSheetXC(undefined, range) as EngineRange);
    }

    override adaptRanges({ applyChange }: Parameters<CorePlugin["adaptRanges"]>[0]): void {
      for (const [formula, ranges] of Object.entries(this.kept)) {
        const changes = ranges.map((range) => applyChange(range as never));
        if (changes.every(({ changeType }) => changeType === "NONE")) continue;
        const adapted = changes.map(({ changeType, range }) => (changeType === "REMOVE" ? LOST : range));
        this.history.update("kept" as never, formula as never, adapted as never);
      }
    }

    getChartRanges(formula: string): readonly EngineRange[] | undefined {
      return this.kept[formula];
    }
  }
  registries.corePluginRegistry.add("stillwall_chart_ranges", Keeper as never);
}

/** A range whose cells were removed. */
const LOST: EngineRange = { sheetId: "", zone: { top: 0, left: 0, bottom: -1, right: -1 }, invalidXc: "#REF!" };

/** The places of a formula's cells now, row by row; undefined if it leads to no cells. */
export function placesOf(model: Model, formula: string): { sheetId: string; col: number; row: number }[] | undefined {
  const getters = model.getters as unknown as { getChartRanges?(formula: string): readonly EngineRange[] | undefined };
  const ranges = getters.getChartRanges?.(formula);
  if (!ranges || ranges.length === 0 || ranges.some((range) => range.invalidXc || range.invalidSheetName)) return undefined;
  const places: { sheetId: string; col: number; row: number }[] = [];
  for (const { sheetId, zone } of ranges) {
    for (let row = zone.top; row <= zone.bottom; row++)
      for (let col = zone.left; col <= zone.right; col++) places.push({ sheetId, col, row });
  }
  return places;
}

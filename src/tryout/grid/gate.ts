/**
 * What a formula on the page may refer to, and where it stands. The engine compiles nothing but text that the translator printed
 * (recalc/compile.ts); this plugin gives the translator the workbook on show and the cell that is being edited, which `[@Column]`, names local
 * to a sheet and `@` need.
 */
import { FormulaProblem, toEngine, type BookContext, type FunctionNames } from "../../book/formula";
import type { DefinedName, Workbook } from "../../book/workbook";
import { checkCalls } from "../../recalc/compile";
import type { Engine } from "../../recalc/engine";
import { CompiledFormula, CorePlugin, registries } from "./engine";
import { gridName } from "./sheet-names";

interface CellEdit {
  type: string;
  sheetId?: string;
  col?: number;
  row?: number;
  content?: string;
}

/** The part of the engine's read access that the gate needs. */
interface Getters {
  getSheetIds(): readonly string[];
  getSheetName(sheetId: string): string;
  tryGetSheetName(sheetId: string): string | undefined;
  getNamedRanges(): readonly { name: string; range: unknown }[];
  getRangeString(range: unknown, sheetId: string): string;
}

/** Workbook whose names and tables the next model takes over; set just before the model is made. */
let incoming: Pick<Workbook, "names" | "tables"> = { names: [], tables: [] };

export function nextWorkbook(workbook: Pick<Workbook, "names" | "tables">): void {
  incoming = workbook;
}

/** Registers the plugin and shuts the door for formulas that come already taken apart, from the clipboard of another page. */
export function installGate(engine: Engine): void {
  CompiledFormula.CompileForSerializedFormula = (sheetId, serialized) => {
    if (serialized instanceof CompiledFormula) return serialized;
    return CompiledFormula.Compile('=ERROR.LITERAL("#REF!")', sheetId, undefined as never);
  };
  class Gate extends CorePlugin {
    static override getters = [] as const;
    private readonly context: BookContext;

    constructor(config: ConstructorParameters<typeof CorePlugin>[0]) {
      super(config);
      this.context = liveContext(engine.functions, config.getters as unknown as Getters, incoming);
      engine.door.attach(config.getters, { book: this.context, sheetName: gridName });
    }

    override beforeHandle(command: unknown): void {
      const edit = command as CellEdit;
      if (edit.type !== "UPDATE_CELL" || typeof edit.content !== "string" || !edit.content.startsWith("=")) return;
      const sheet = (this.getters as unknown as Getters).tryGetSheetName(edit.sheetId ?? "") ?? "";
      edit.content = translated(engine, edit.content, this.context, { sheet, row: edit.row ?? 0, column: edit.col ?? 0 });
    }
  }
  registries.corePluginRegistry.add("stillwall_gate", Gate as never);
}

/** The engine's text; what cannot be translated stays as typed and is refused at the compiler's door with the reason. */
function translated(engine: Engine, formula: string, book: BookContext, place: { sheet: string; row: number; column: number }): string {
  try {
    const { text, calls } = toEngine(formula, book, { place, sheetName: gridName });
    return checkCalls(engine.library, calls) ? formula : engine.door.admit(text);
  } catch (reason) {
    if (reason instanceof FormulaProblem) return formula;
    throw reason;
  }
}

/** Sheets and names as they are at the moment of asking; names and tables of the file as they were opened. */
function liveContext(functions: FunctionNames, getters: Getters, { names, tables }: Pick<Workbook, "names" | "tables">): BookContext {
  const sheets = () => getters.getSheetIds().map((id) => getters.getSheetName(id));
  const same = (a: string, b: string) => a.toUpperCase() === b.toUpperCase();
  const local = (name: string, sheet?: string) =>
    names.find((known) => same(known.name, name) && same(gridName(known.sheet ?? ""), sheet ?? ""));
  return {
    functions,
    tables,
    sheetNamed: (name) => sheets().find((known) => same(known, gridName(name))),
    sheetsBetween(first, last) {
      const all = sheets();
      const [from, to] = [first, last].map((name) => all.findIndex((known) => same(known, gridName(name)))) as [number, number];
      return from < 0 || to < 0 ? [] : all.slice(Math.min(from, to), Math.max(from, to) + 1);
    },
    nameFor: (name, sheet) => local(name, sheet) ?? local(name) ?? madeHere(name),
  };
  function madeHere(name: string): DefinedName | undefined {
    const made = getters.getNamedRanges().find((known) => same(known.name, name));
    return made && { name: made.name, formula: getters.getRangeString(made.range, "") };
  }
}

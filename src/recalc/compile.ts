import { FormulaProblem, noBook, toEngine, type BookContext, type FunctionNames } from "../book/formula";
import { engineOnly } from "./engine-only";
import { engineFunction, type EngineLibrary } from "./library";

/** What a typed formula of one workbook may refer to. */
export interface FormulaScope {
  readonly book: BookContext;
  readonly sheetName?: (name: string) => string;
}

/**
 * The one door to the engine's compiler. The engine turns formulas into program text, and its own reading of a formula differs
 * from Excel's (`-2^2`, `6/-3*2`, `LOG10(…)`, quotes in texts), so whatever is typed, pasted or put in a cell is read by the
 * translator first, and only what that prints is compiled. A formula it cannot read gives a cell that says why.
 */
export class FormulaDoor {
  private readonly printed = new Set<string>();
  private readonly scopes = new WeakMap<object, FormulaScope>();
  private alone: FormulaScope;

  constructor(
    private readonly library: EngineLibrary,
    functions: FunctionNames,
  ) {
    this.alone = { book: noBook(functions) };
  }

  /** Takes another list of worksheet functions. */
  know(functions: FunctionNames): void {
    this.alone = { book: noBook(functions) };
    this.printed.clear();
  }

  /** Remembers text the translator has printed already, so that it is not read twice. */
  admit(text: string): string {
    if (this.printed.size > 500000) this.printed.clear();
    this.printed.add(text);
    return text;
  }

  /** Gives the formulas typed in one model the names, tables and sheets of its workbook. */
  attach(getters: object, scope: FormulaScope): void {
    this.scopes.set(getters, scope);
  }

  /** Replaces the compiler's entrances by this door. */
  install(): void {
    const { CompiledFormula } = this.library;
    const compile = CompiledFormula.Compile.bind(CompiledFormula);
    const isBad = CompiledFormula.IsBadExpression.bind(CompiledFormula);
    CompiledFormula.Compile = (formula, sheetId, getters) => {
      const text = this.translated(formula, getters);
      return typeof text === "string" ? compile(text, sheetId, getters) : this.refused(formula, sheetId, text);
    };
    CompiledFormula.IsBadExpression = (formula) => {
      const text = this.translated(formula);
      return typeof text !== "string" || isBad(text);
    };
  }

  private translated(formula: string, getters?: object): string | FormulaProblem {
    if (this.printed.has(formula)) return formula;
    const { book, sheetName } = (getters && this.scopes.get(getters)) ?? this.alone;
    try {
      const { text, calls } = toEngine(formula, book, { sheetName });
      return checkCalls(this.library, calls) ?? this.admit(text);
    } catch (reason) {
      if (reason instanceof FormulaProblem) return reason;
      throw reason;
    }
  }

  private refused(formula: string, sheetId: string, problem: FormulaProblem) {
    const { CompiledFormula, EvaluationError } = this.library;
    const error = new EvaluationError(problem.message, problem.kind === "unknown" ? "#NAME?" : "#BAD_EXPR");
    const nothing = { numbers: [], strings: [] };
    const Compiled = CompiledFormula as unknown as new (...parts: unknown[]) => ReturnType<typeof CompiledFormula.Compile>;
    return new Compiled(sheetId, [], nothing, [], [], true, formula, () => error);
  }
}

/** The first call of a function that is not known here, or with a number of arguments it does not take. */
export function checkCalls(library: EngineLibrary, calls: readonly { name: string; count: number }[]): FormulaProblem | undefined {
  for (const { name, count } of calls) {
    const known = engineFunction(library, name) ?? engineFunction(library, name === "LOG10" ? "LOG_10" : name);
    if (!known || engineOnly.has(name)) return new FormulaProblem("unknown", `The function ${name} is not known here`);
    const { minArgRequired = 0, maxArgPossible = Infinity } = known;
    const limit = count < minArgRequired ? minArgRequired : count > maxArgPossible ? maxArgPossible : undefined;
    if (limit === undefined) continue;
    const plural = limit === 1 ? "" : "s";
    return new FormulaProblem(
      "arguments",
      `${name} takes at ${count < limit ? "least" : "most"} ${limit} argument${plural} and got ${count}`,
    );
  }
  return undefined;
}

import * as library from "@odoo/o-spreadsheet";
import { CellError } from "../../src/functions/cell";
import type { WorksheetFunction } from "../../src/functions/registry";
import { prepareEngine, type Engine } from "../../src/recalc/engine";
import { evaluateFormulas } from "../../src/recalc/evaluate";
import { quietly } from "../../src/recalc/quiet";

/** Functions made up to give what no worksheet function should, and to show what arrives. */
let received: unknown[] = [];
const made: Record<string, WorksheetFunction> = {
  "TRY.NAN": () => [[NaN]],
  "TRY.INFINITY": () => [[1, -Infinity]],
  "TRY.RAGGED": () => [[1, 2], [3]],
  "TRY.NOTHING": () => [],
  "TRY.NOROW": () => [[]],
  "TRY.NULL": () => [[null]],
  "TRY.UNDEFINED": () => undefined as never,
  "TRY.SCALAR": () => 5 as never,
  "TRY.OBJECT": () => [[{ value: 1 }]],
  "TRY.THROWS": () => {
    throw new Error("the pump is dry");
  },
  "TRY.THROWSTEXT": () => {
    throw "no more";
  },
  "TRY.VALUE": () => [[new CellError("#VALUE!", "Temperature 0 K is not above 0 K")]],
  "TRY.ABSENT": () => [[new CellError("#N/A", '"Unobtainium" is not in the library')]],
  "TRY.STRANGE": () => [[new CellError("#ODD!", "an error Excel does not have")]],
  "TRY.BLOCK": () => [
    [1, "two", true],
    [new CellError("#N/A", "absent"), 5, 6],
  ],
  "TRY.ECHO": (...blocks) => {
    received = blocks;
    return [[blocks.length]];
  },
  "TRY.PASS": (block: unknown[][]) => block as never,
};
let engine: Engine;
beforeAll(() => {
  engine = prepareEngine(library, new Map(Object.entries(made)), []);
});

function outcome(formula: string) {
  const [only] = evaluateFormulas([formula], engine);
  return "value" in only! ? only.value : only!.error;
}

describe("results that would be lost inside the engine", () => {
  test.each([
    ["STILL.TRY.NAN()", "gave NaN"],
    ["STILL.TRY.RAGGED()", "rows of different lengths"],
    ["STILL.TRY.NOTHING()", "no cells"],
    ["STILL.TRY.NOROW()", "no cells"],
    ["STILL.TRY.NULL()", "null"],
    ["STILL.TRY.UNDEFINED()", "no cells"],
    ["STILL.TRY.SCALAR()", "no cells"],
    ["STILL.TRY.OBJECT()", "object"],
    ["STILL.TRY.THROWS()", "the pump is dry"],
    ["STILL.TRY.THROWSTEXT()", "no more"],
  ])("%s is an error that says so", (formula, words) => {
    const error = outcome(formula);
    expect(error).toMatchObject({ code: "#VALUE!" });
    expect((error as { message: string }).message).toContain(words);
    expect((error as { message: string }).message).toContain("STILL.TRY.");
    expect((error as { message: string }).message).not.toMatch(/odoo|support ticket/i);
  });

  it("keeps the good cells beside an infinite one", () => {
    expect(outcome("STILL.TRY.INFINITY()")).toEqual([
      [1, { error: { code: "#VALUE!", message: expect.stringContaining("gave -Infinity") } }],
    ]);
  });

  it("turns rows into rows again", () => {
    expect(outcome("STILL.TRY.BLOCK()")).toEqual([
      [1, "two", true],
      [{ error: { code: "#N/A", message: "absent" } }, 5, 6],
    ]);
    expect(outcome("INDEX(STILL.TRY.BLOCK(),1,2)")).toBe("two");
  });
});

describe("refusals are genuine errors", () => {
  test.each([
    ['IFERROR(STILL.TRY.VALUE(),"caught")', "caught"],
    ['IFERROR(STILL.TRY.VALUE()+1,"caught")', "caught"],
    ["ISERROR(STILL.TRY.VALUE())", true],
    ["ISERR(STILL.TRY.VALUE())", true],
    ["ISNA(STILL.TRY.VALUE())", false],
    ["ISNA(STILL.TRY.ABSENT())", true],
    ["ISERR(STILL.TRY.ABSENT())", false],
    ['IFNA(STILL.TRY.ABSENT(),"none")', "none"],
    ["ERROR.TYPE(STILL.TRY.VALUE())", 3],
    ["ERROR.TYPE(STILL.TRY.ABSENT())", 7],
    ["ISNUMBER(STILL.TRY.VALUE())", false],
    ["ISTEXT(STILL.TRY.VALUE())", false],
    ["COUNT(STILL.TRY.BLOCK())", 3],
  ])("%s is %s", (formula, expected) => {
    expect(outcome(formula)).toBe(expected);
  });

  it("keeps the sentence through arithmetic and other functions", () => {
    const error = { code: "#VALUE!", message: "Temperature 0 K is not above 0 K" };
    expect(outcome("STILL.TRY.VALUE()")).toEqual(error);
    expect(outcome("2*STILL.TRY.VALUE()+1")).toEqual(error);
    expect(outcome("SUM(1,STILL.TRY.VALUE())")).toEqual(error);
    expect(outcome("STILL.TRY.PASS(STILL.TRY.VALUE())")).toEqual(error);
  });

  it("takes a code that Excel does not have for #VALUE!", () => {
    expect(outcome("STILL.TRY.STRANGE()")).toEqual({ code: "#VALUE!", message: "an error Excel does not have" });
  });
});

describe("what a worksheet function receives", () => {
  it("gets blocks row by row, undefined for an argument left out, and errors as such", () => {
    outcome('STILL.TRY.ECHO({1,2;"x",TRUE},,5,#N/A,"")');
    expect(received).toEqual([
      [
        [1, 2],
        ["x", true],
      ],
      undefined,
      [[5]],
      [[new CellError("#N/A", "")]],
      [[""]],
    ]);
  });

  it("gets whole ranges in one call, with null for a blank cell", () => {
    const cells = { A1: "1", A2: "'two", B2: "=1/0", D1: "=STILL.TRY.ECHO(A1:B2,C9)" };
    const model = quietly(() => new library.Model({ sheets: [{ id: "s", name: "S", colNumber: 9, rowNumber: 20, cells }] }));
    expect(model.getters.getEvaluatedCell({ sheetId: "s", row: 0, col: 3 }).value).toBe(2);
    expect(received[0]).toEqual([
      [1, null],
      ["two", new CellError("#DIV/0!", expect.anything() as never)],
    ]);
    expect(received[1]).toEqual([[null]]);
  });
});

describe("nothing reaches the engine's compiler but printed formulas", () => {
  const ownCode = (formula: string) =>
    quietly(() => {
      const model = new library.Model();
      const sheetId = model.getters.getActiveSheetId();
      model.dispatch("UPDATE_CELL", { sheetId, col: 0, row: 0, content: formula });
      return model.getters.getEvaluatedCell({ sheetId, col: 0, row: 0 });
    });

  test.each([
    ["=?1+1"], // the engine's own way to a debugger statement
    ["=|N|"], // collides with the cache key of =1
    ["=SUM(?A1)"],
    ["=A1`+process.exit()`"],
    ['=constructor.constructor("return process")()'],
    ["=1;process"],
    ["=';process"],
  ])("%s is refused with a sentence", (formula) => {
    const before = Object.keys(library.functionCache).length;
    const cell = ownCode(formula);
    expect(cell.type).toBe("error");
    expect(cell.message).toMatch(/cannot be read|not known|not defined|not supported/);
    expect(Object.keys(library.functionCache).length).toBe(before);
  });

  test.each([
    ["=-2^2", 4],
    ["=LOG10(100)", 2],
    ['="a""b"', 'a"b'],
    ["=LET(x,3,x*x)", 9],
    ["=6/-3*2", -4],
    ["=_xldudf_STILL_TRY_ECHO(1,2)", 2],
    ["=[2]!_xldudf_STILL_TRY_ECHO(1)", 1],
  ])("%s typed in a cell is %s", (formula, value) => {
    expect(ownCode(formula).value).toBe(value);
  });

  test.each(["__proto__", "constructor", "toString", "hasOwnProperty", "valueOf"])("%s is neither a name nor a function", (name) => {
    expect(outcome(name)).toMatchObject({ code: "#NAME?" });
    expect(outcome(`${name}(1)`)).toMatchObject({ code: "#NAME?" });
    expect(outcome(`STILL.${name}(1)`)).toMatchObject({ code: "#NAME?" });
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
  });
});

describe("functions that Excel does not have", () => {
  test.each(['JOIN(",",{1,2})', "ADD(1,2)", 'SPLIT("a b"," ")'])("%s is refused, or the saved workbook would not work", (formula) => {
    expect(outcome(formula)).toMatchObject({ code: "#NAME?" });
    expect(library.registries.functionRegistry.get(formula.split("(")[0]!).hidden).toBe(true);
  });
});

describe("a failure of the engine", () => {
  it("is no value, and does not send anyone to the maker", () => {
    const registry = library.registries.functionRegistry;
    registry.replace("TRY.BROKEN", { description: "", args: [], compute: () => (undefined as never as { x: number }).x });
    expect(outcome("TRY.BROKEN()")).toMatchObject({
      code: "#ERROR!",
      message: expect.stringMatching(/^The spreadsheet engine failed at this formula\./),
    });
    expect((outcome("TRY.BROKEN()") as { message: string }).message).not.toMatch(/odoo/i);
  });
});

describe("preparing the engine", () => {
  it("may be done again with the same functions", () => {
    expect(prepareEngine(library, new Map(Object.entries(made)), [])).toBe(engine);
  });

  it("shows the handbook's words and units in the argument help", () => {
    const parameter = { name: "temperature", description: "Temperature", unit: "K", kind: "value" as const, optional: false };
    const unit = { name: "unit", description: "Unit of the result", unit: "-", kind: "value" as const, optional: true };
    const entry = {
      id: "TRY.ECHO",
      name: "STILL.TRY.ECHO",
      family: "try",
      description: "Echo",
      parameters: [parameter, unit],
      result: { description: "", unit: "-" },
      sources: [],
      examples: [],
    };
    const described = prepareEngine(library, new Map(Object.entries(made)), [entry]);
    expect(library.registries.functionRegistry.get("STILL.TRY.ECHO")).toMatchObject({
      description: "Echo",
      args: [
        { name: "temperature", description: "Temperature [K]" },
        { name: "unit", description: "Unit of the result", optional: true },
      ],
    });
    expect(evaluateFormulas(["STILL.TRY.ECHO()"], described)[0]).toMatchObject({
      error: { code: "#VALUE!", message: "STILL.TRY.ECHO takes at least 1 argument and got 0" },
    });
  });
});

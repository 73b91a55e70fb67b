import fc from "fast-check";
import { bookContext, FormulaProblem, FunctionNames, noBook, toEngine, toFile, type TranslationOptions } from "../../../src/book/formula";
import { book } from "../../recalc/book";

const functions = new FunctionNames(["CV.AT", "HEAT", "HEAT.FINALTEMP"]);
const alone = noBook(functions);

function engineText(formula: string, options: TranslationOptions = {}): string {
  return toEngine(formula, alone, options).text;
}

function problem(run: () => unknown): FormulaProblem {
  try {
    run();
  } catch (reason) {
    if (reason instanceof FormulaProblem) return reason;
    throw reason;
  }
  throw new Error("no problem was found");
}

describe("names of functions", () => {
  test.each([
    ['_xldudf_STILL_CV_AT("N2",500)'],
    ['_xldudf_still_cv_at("N2",500)'],
    ['STILL.CV.AT("N2",500)'],
    ['still.cv.at("N2",500)'],
    ['[2]!_xldudf_STILL_CV_AT("N2",500)'],
    ['[12]!_xldudf_still_cv_at("N2",500)'],
    ['_xll.STILL.CV.AT("N2",500)'],
  ])("%s is one function", (formula) => {
    expect(engineText(formula)).toBe('=STILL.CV.AT("N2",500)');
    expect(toFile(engineText(formula), functions)).toBe('_xldudf_STILL_CV_AT("N2",500)');
  });

  it("looks underscores up instead of turning them all into dots", () => {
    const similar = new FunctionNames(["A_B.C"]);
    expect(toEngine("_xldudf_STILL_A_B_C(1)", noBook(similar)).calls).toEqual([{ name: "STILL.A_B.C", count: 1 }]);
  });

  it("leaves [n]! alone except before an add-in function", () => {
    expect(problem(() => engineText("[2]!OTHER(1)")).kind).toBe("syntax");
    expect(problem(() => engineText("[1]Sheet1!A1")).message).toContain("another workbook");
    expect(engineText('"[2]!_xldudf_STILL_CV_AT"&1')).toBe('="[2]!_xldudf_STILL_CV_AT"&1');
  });

  it("keeps the prefixes of newer functions in the file and off the engine", () => {
    expect(engineText("_xlfn.XLOOKUP(1,A1:A2,B1:B2)")).toBe("=XLOOKUP(1,A1:A2,B1:B2)");
    expect(engineText("_xlfn._xlws.SORT(A1:A2)")).toBe("=SORT(A1:A2)");
    expect(toFile("=SORT(A1:A2)", functions)).toBe("_xlfn._xlws.SORT(A1:A2)");
    expect(toFile("=STDEV.S(A1:A2)+STDEV(A1)", functions)).toBe("_xlfn.STDEV.S(A1:A2)+STDEV(A1)");
  });

  it("gives LOG10 a name that does not read as a cell", () => {
    expect(engineText("LOG10(100)")).toBe("=LOG_10(100)");
    expect(toFile("=LOG_10(100)", functions)).toBe("LOG10(100)");
  });
});

describe("signs, powers and texts", () => {
  test.each([
    ["-2^2", "=(-2)^2"],
    ["-A1^2", "=(-A1)^2"],
    ["0-2^2", "=0-2^2"],
    ["2^-1*3", "=2^(-1)*3"],
    ["6/-3*2", "=6/(-3)*2"],
    ["2^3^2", "=2^3^2"],
    ["2^(3^2)", "=2^(3^2)"],
    ["1-(2-3)", "=1-(2-3)"],
    ["(1-2)-3", "=1-2-3"],
    ["-5%", "=(-5)%"],
    ["10%^2", "=10%^2"],
    ["-(5%)", "=-(5%)"],
    ["-(0)", "=-0"],
    ["-0", "=-0"],
    ["--A1", "=-(-A1)"],
    ["1=1", "=1=1"],
    ['"a"&1', '="a"&1'],
    ['"a""b"', '=CONCATENATE("a",CHAR(34),"b")'],
    ['"c:\\"', '=CONCATENATE("c:",CHAR(92))'],
    ["#N/A", '=ERROR.LITERAL("#N/A")'],
    ["Sheet1!#REF!+1", '=ERROR.LITERAL("#REF!")+1'],
    ['{1,-2;"x",TRUE}', '={1,-2;"x",TRUE}'],
    ["IF(,1)", "=IF(,1)"],
    ["A1#", "=A1#"],
    ["_xlfn.ANCHORARRAY(A1)", "=A1#"],
    ["@A1:A3", "=SINGLE(A1:A3)"],
    ["'It''s a sheet'!$B$2:C9", "='It''s a sheet'!$B$2:C9"],
    ["1E3+1.5e-300", "=1000+1.5E-300"],
  ])("%s", (file, engine) => {
    expect(engineText(file)).toBe(engine);
  });

  it("comes back to the file with the same meaning", () => {
    for (const formula of ['"a""b"', "#N/A", "_xlfn.ANCHORARRAY(A1)", "(-2)^2", "LOG10(A1)", '"c:\\"']) {
      expect(toFile(engineText(formula), functions)).toBe(formula);
    }
  });

  it("prints what it reads as itself: once printed, a formula stays as it is", () => {
    const leaf = fc.oneof(
      fc.double({ noNaN: true, noDefaultInfinity: true, min: 0 }).map((value) => String(value)),
      fc.constantFrom("A1", "$B$2:C3", "TRUE", '"x ""y"" \\"', "{1,-2;3,4}", "#N/A"),
    );
    const formula = fc.letrec<{ node: string }>((tie) => ({
      node: fc.oneof(
        { depthSize: "small", withCrossShrink: true },
        leaf,
        fc.tuple(tie("node"), fc.constantFrom("+", "-", "*", "/", "^", "&", "=", "<>"), tie("node")).map(([a, op, b]) => `${a}${op}${b}`),
        tie("node").map((a) => `-${a}`),
        tie("node").map((a) => `(${a})`),
        tie("node").map((a) => `(${a})%`),
        fc.tuple(tie("node"), tie("node")).map(([a, b]) => `SUM(${a},${b})`),
      ),
    })).node;
    fc.assert(
      fc.property(formula, (text) => {
        const once = engineText(text);
        expect(engineText(once)).toBe(once);
        expect(engineText(toFile(once, functions))).toBe(once);
      }),
    );
  });
});

describe("LET and LAMBDA", () => {
  test.each([
    ["LET(x,2,y,x*3,x+y)", "=2+2*3"],
    ["_xlfn.LET(_xlpm.x,A1,_xlpm.x^2)", "=A1^2"],
    ["LET(x,-2,x^2)", "=(-2)^2"],
    ["LET(x,1+2,x*3)", "=(1+2)*3"],
    ["LAMBDA(a,b,a*b)(3,4)", "=3*4"],
    ["_xlfn.LAMBDA(_xlpm.a,_xlpm.a+1)(4)", "=4+1"],
    ["LET(f,LAMBDA(x,x+1),f(f(3)))", "=3+1+1"],
    ["LET(x,1,LET(x,2,x)+x)", "=2+1"],
    ["LET(x,1,f,LAMBDA(y,x+y),x,5,f(x))", undefined], // a name may not be given twice
    ["LAMBDA(x,LAMBDA(y,x-y))(5)(3)", "=5-3"],
  ])("%s", (file, engine) => {
    if (engine === undefined) expect(problem(() => engineText(file)).kind).toBe("syntax");
    else expect(engineText(file)).toBe(engine);
  });

  it("captures nothing: a value keeps the names of where it was written", () => {
    expect(engineText("LET(y,1,f,LAMBDA(x,x+y),LET(y,100,f(y)))")).toBe("=100+1");
  });

  it("refuses what it cannot apply, and what grows without end", () => {
    expect(problem(() => engineText("MAP(A1:A3,LAMBDA(x,x+1))")).message).toContain("LAMBDA");
    expect(problem(() => engineText("LAMBDA(x,x)(1,2)")).kind).toBe("arguments");
    expect(problem(() => engineText("LET(f,LAMBDA(g,g(g)),f(f))")).kind).toBe("unsupported");
    const doubling = Array.from({ length: 30 }, (_, i) => `x${i}a,x${i - 1}a+x${i - 1}a`)
      .join(",")
      .replace("x-1a+x-1a", "A1");
    expect(problem(() => engineText(`LET(${doubling},x29a)`)).message).toContain("expands");
  });
});

describe("names, tables and sheets of a workbook", () => {
  const workbook = book({
    sheets: { Data: { A1: 1, C9: 2 }, "It's": { A1: 1 }, Last: { B20: 1 } },
    names: [
      { name: "Mass", formula: "Data!$B$2" },
      { name: "Mass", formula: "Data!$C$3", sheet: "Last" },
      { name: "Twice", formula: "Mass*2" },
      { name: "Left", formula: "Data!A1" },
      { name: "Area", formula: "LAMBDA(a,b,a*b)" },
      { name: "Loop", formula: "Loop+1" },
      { name: "Pi_2", formula: "3.14" },
    ],
    tables: [{ name: "Runs", sheet: "Data", range: "A5:C9", columns: ["No", "Rise, K", "Heat"], headerRow: true, totalsRow: true }],
  });
  const context = bookContext(workbook, functions);
  const at = (sheet: string, row: number, column: number) => ({ place: { sheet, row, column } });
  const text = (formula: string, options = at("Data", 0, 0)) => toEngine(formula, context, options).text;

  test.each([
    ["Mass*2", "=Data!$B$2*2"],
    ["mass", "=Data!$B$2"],
    ["Twice", "=Data!$B$2*2"],
    ["Last!Mass", "=Data!$C$3"],
    ["Area(2,3)", "=2*3"],
    ["-Pi_2", "=-3.14"],
    ["SUM(Runs[Heat])", "=SUM(Data!$C$6:$C$8)"],
    ["SUM(Runs)", "=SUM(Data!$A$6:$C$8)"],
    ["Runs[[#Headers],[Heat]]", "=Data!$C$5"],
    ["Runs[[#Totals],[Heat]]", "=Data!$C$9"],
    ["COUNTA(Runs[#All])", "=COUNTA(Data!$A$5:$C$9)"],
    ["SUM(Runs[[No]:[Heat]])", "=SUM(Data!$A$6:$C$8)"],
    ["SUM(Runs[[#Data],[#Totals],[Heat]])", "=SUM(Data!$C$6:$C$9)"],
    ["SUM(A:A)", "=SUM(A1:A20)"], // 20 rows in use, in the sheet that uses most
    ["SUM($2:$2)", "=SUM(A$2:C$2)"],
    ["ROWS(A:A)", "=1048576"],
    ["SUM((A1:A3,C1))", "=SUM(A1:A3,C1)"],
    ["SUM(Data:Last!B2)", "=SUM(Data!B2,'It''s'!B2,Last!B2)"],
    ["A1:C3 B2:D9", "=$B$2:$C$3"],
    ["A1 C1", '=ERROR.LITERAL("#NULL!")'],
    ["data!A1", "=Data!A1"],
  ])("%s", (formula, expected) => {
    expect(text(formula)).toBe(expected);
  });

  it("resolves by place: the table's own row, names local to a sheet, relative names", () => {
    expect(text("Runs[@Heat]*2", at("Last", 6, 9))).toBe("=Data!$C$7*2");
    expect(text("[@[Rise, K]]", at("Data", 5, 2))).toBe("=Data!$B$6");
    expect(text("Runs[@Heat]", at("Data", 20, 0))).toBe('=ERROR.LITERAL("#VALUE!")');
    expect(text("Mass", at("Last", 0, 0))).toBe("=Data!$C$3");
    expect(text("Left", at("Data", 4, 2))).toBe("=Data!C5");
    expect(text("@B2:B9", at("Data", 4, 5))).toBe("=B5");
  });

  test.each([
    ["Nothing+1", "unknown", "Nothing"],
    ["Runs[Cold]", "unknown", "Cold"],
    ["Other[Heat]", "unknown", "Other"],
    ["Absent!A1", "unknown", "Absent"],
    ["Loop", "unsupported", "itself"],
    ["A1:INDEX(B1:B9,3)", "unsupported", "computed"],
    ["(A1,B1)+1", "unsupported", "union"],
    ["Data:Last!A1+1", "unsupported", "several sheets"],
    ["'[1]Other'!A1", "unsupported", "another workbook"],
    ["SUM(", "syntax", "cannot be read"],
    ["?1+1", "syntax", "cannot be read"],
    ["|N|", "syntax", "cannot be read"],
    ["1 1", "syntax", "cannot be read"],
    ['"open', "syntax", "cannot be read"],
    ["1E400", "syntax", "larger"],
    ["__proto__", "unknown", "__proto__"],
    ["constructor", "unknown", "constructor"],
  ])("%s is refused", (formula, kind, word) => {
    const found = problem(() => text(formula));
    expect(found.kind).toBe(kind);
    expect(found.message).toContain(word);
  });

  it("refuses a formula too long or too deep to be read, without falling over", () => {
    expect(problem(() => text(`1${"+1".repeat(20000)}`)).message).toContain("40001 characters");
    expect(problem(() => text("(".repeat(15000) + "1" + ")".repeat(15000))).message).toContain("deep");
  });
});

describe("cells that hold one value", () => {
  const scalarFunctions = new Set(["ABS", "IF"]);
  const single = (name: string) => !scalarFunctions.has(name);
  const text = (formula: string) => toEngine(formula, alone, { place: { sheet: "S", row: 1, column: 5 }, single }).text;

  test.each([
    ["A1:A9*2", "=A2*2"],
    ["$A$1:$A$9", "=$A$2"],
    ["A1:J1", "=F1"],
    ["A5:A9", '=ERROR.LITERAL("#VALUE!")'],
    ["A1:B9", '=ERROR.LITERAL("#VALUE!")'],
    ["SUM(A1:A9)", "=SINGLE(SUM(A1:A9))"],
    ["SUM(A1:A9*2)", "=SINGLE(SUM(A2*2))"],
    ["SUMPRODUCT(A1:A9*2)", "=SINGLE(SUMPRODUCT(A1:A9*2))"],
    ["ABS(A1:A9)", "=SINGLE(ABS(A2))"],
    ['STILL.CV.AT("N2",A1:A9)', '=SINGLE(STILL.CV.AT("N2",A1:A9))'],
    ["A1+1", "=A1+1"],
  ])("%s", (formula, expected) => {
    expect(text(formula)).toBe(expected);
  });
});

describe("what a formula reads and calls", () => {
  it("lists every reference and every call", () => {
    const { references, calls } = toEngine("SUM(A1:B2,Data!C3)+STILL.HEAT(1,,2)", alone);
    expect(references.map(({ sheet, top, left, bottom, right }) => [sheet, top, left, bottom, right])).toEqual([
      ["", 0, 0, 1, 1],
      ["Data", 2, 2, 2, 2],
    ]);
    expect(calls).toEqual([
      { name: "SUM", count: 2 },
      { name: "STILL.HEAT", count: 3 },
    ]);
  });
});

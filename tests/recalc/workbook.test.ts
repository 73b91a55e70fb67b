import type { BookValue } from "../../src/book/workbook";
import { registry } from "../../src/functions";
import type { Recalculated } from "../../src/recalc/outcome";
import { recalculateWorkbook } from "../../src/recalc/workbook";
import { book, type MadeCell } from "./book";

/** Values of one sheet after calculation, by address. */
async function values(cells: Record<string, MadeCell>): Promise<Record<string, BookValue>> {
  const { outcomes, unevaluated } = await recalculateWorkbook(book({ sheets: { Sheet1: cells } }));
  expect(unevaluated).toEqual([]);
  return Object.fromEntries(outcomes.map(({ address, value }) => [address, value]));
}

function valueAt({ outcomes }: Recalculated, address: string): BookValue | undefined {
  return outcomes.find((outcome) => outcome.address === address)?.value;
}

describe("cells of a workbook", () => {
  it("fill the range of an array formula that reaches beyond all other cells of the file", async () => {
    const made = book({ sheets: { S: { A1: 1, B2: { formula: "={1,2,3;4,5,6}*A1", array: "B2:D3" } } } });
    const { outcomes, unevaluated } = await recalculateWorkbook(made);
    expect(unevaluated).toEqual([]);
    expect(outcomes[0]).toMatchObject({
      address: "B2",
      value: 1,
      spill: [
        [1, 2, 3],
        [4, 5, 6],
      ],
    });
  });

  it("keep what a formula fills beside a first cell that is an error, down, across and in a block", async () => {
    const { outcomes } = await recalculateWorkbook(
      book({
        sheets: {
          S: {
            ...{ A1: "no", A2: 2, A3: 3 },
            B1: { formula: "=1/A1:A3", array: "B1:B3" },
            D1: { formula: "=1/TRANSPOSE(A1:A3)", array: "D1:F1" },
            D3: { formula: "=1/(A1:A3*{1,1})", array: "D3:E5" },
          },
        },
      }),
    );
    const error = expect.objectContaining({ error: "#VALUE!" });
    const spillOf = (address: string) => outcomes.find((outcome) => outcome.address === address)?.spill;
    expect(spillOf("B1")).toEqual([[error], [1 / 2], [1 / 3]]);
    expect(spillOf("D1")).toEqual([[error, 1 / 2, 1 / 3]]);
    expect(spillOf("D3")).toEqual([
      [error, error],
      [1 / 2, 1 / 2],
      [1 / 3, 1 / 3],
    ]);
  });

  it("come to the value of their formula, in any order", async () => {
    expect(await values({ A1: "=A2*2", A2: "=A3+1", A3: 4, B1: "=-A3^2", B2: "=LOG10(100)", B3: '=A1&"x"', B4: "=A1>5" })).toEqual({
      ...{ A1: 10, A2: 5, B1: 16, B2: 2, B3: "10x", B4: true },
    });
  });

  it("keep every bit of a Stillwall number, and mark it", async () => {
    const direct = registry.get("CV.AT")!([["N2"]], [[512.3]])[0]![0];
    const { outcomes } = await recalculateWorkbook(
      book({ sheets: { S: { A1: 512.3, A2: '=_xldudf_STILL_CV_AT("N2",A1)', A3: "=A2*1", A4: '=[2]!_xldudf_STILL_CV_AT("N2",A1)' } } }),
    );
    expect(outcomes.map(({ value, stillwall }) => [value, stillwall])).toEqual([
      [direct, true],
      [direct, false],
      [direct, true],
    ]);
  });

  it("hold texts that look like something else as texts", async () => {
    const cells = {
      A1: "1/2",
      A2: "TRUE",
      A3: "=x",
      A4: "'quoted",
      A5: "007",
      B1: "=LEN(A1)",
      B2: "=ISTEXT(A2)",
      B4: "=LEN(A4)",
      B5: "=LEN(A5)",
    };
    const workbook = book({ sheets: { S: { ...cells, A3: null } } });
    const { outcomes } = await recalculateWorkbook(workbook);
    expect(outcomes.map(({ value }) => value)).toEqual([3, true, 7, 3]);
  });

  it("read numbers at the ends of what a double holds", async () => {
    expect(await values({ A1: 1.5e308, A2: 5e-324, A3: -1e-310, B1: "=A1/2", B2: "=A2", B3: "=A3*-1" })).toEqual({
      B1: 7.5e307,
      B2: 5e-324,
      B3: 1e-310,
    });
  });

  it("hold errors as errors, with the sentence of a refusal", async () => {
    const found = await values({
      A1: '=STILL.CV.AT("N2",0)',
      A2: '=IFERROR(A1,"none")',
      A3: "=A1+1",
      A4: { error: "#N/A" },
      A5: "=ISNA(A4)",
      A6: "=ERROR.TYPE(A1)",
    });
    expect(found).toMatchObject({
      A1: { error: "#VALUE!", message: expect.stringContaining("0 K") },
      A2: "none",
      A3: { error: "#VALUE!" },
      A5: true,
      A6: 3,
    });
  });

  it("count a blank as 0 and as an empty text", async () => {
    expect(await values({ A1: "=Z9", A2: "=Z9=0", A3: '=Z9=""', A4: "=Z9&1", A5: "=COUNT(Z1:Z9)" })).toEqual({
      A1: 0,
      A2: true,
      A3: true,
      A4: "1",
      A5: 0,
    });
  });

  it("are found on sheets of any name", async () => {
    const sheets = {
      "It's": { A1: 3 },
      "Müller-1 5% (a)": { A1: "='It''s'!A1+1" },
      A1: { B1: "='Müller-1 5% (a)'!A1*2", B2: "=INDIRECT(\"'Müller-1 5% (a)'!A1\")" },
    };
    const result = await recalculateWorkbook(book({ sheets }));
    expect(result.unevaluated).toEqual([]);
    expect(result.outcomes.map(({ value }) => value)).toEqual([4, 8, 4]);
  });
});

describe("arrays", () => {
  it("spill, and are read where they spill, even further than before", async () => {
    const result = await recalculateWorkbook(
      book({
        sheets: {
          S: {
            A1: { formula: "=_xlfn.SEQUENCE(4)*B1", array: "A1:A2", dynamic: true, value: 9 },
            A2: 99,
            B1: 10,
            C1: "=SUM(A1:A9)",
            C2: { formula: "=A1#", array: "C2:C3", dynamic: true },
          },
        },
      }),
    );
    expect(result.outcomes.find(({ address }) => address === "A1")).toMatchObject({ value: 10, spill: [[10], [20], [30], [40]] });
    expect(valueAt(result, "C1")).toBe(100);
    expect(result.outcomes.find(({ address }) => address === "C2")?.spill).toEqual([[10], [20], [30], [40]]);
  });

  it("are blocked by cells in their way", async () => {
    const result = await recalculateWorkbook(
      book({ sheets: { S: { A1: { formula: "=_xlfn.SEQUENCE(3)", array: "A1:A2", dynamic: true }, A3: "in the way" } } }),
    );
    expect(valueAt(result, "A1")).toMatchObject({ error: "#SPILL!" });
  });

  it("settle, however many follow one another against the order of the sheet", async () => {
    const cells: Record<string, MadeCell> = {};
    // Each spills two cells and reads the second of the next one; the last stands on the far right.
    const columns = Array.from({ length: 60 }, (_, i) => String.fromCharCode(65 + Math.floor(i / 26)) + String.fromCharCode(65 + (i % 26)));
    columns.forEach((column, i) => {
      const next = columns[i + 1];
      cells[`${column}1`] = {
        formula: next ? `=_xlfn.SEQUENCE(2,1,${next}2)` : "=_xlfn.SEQUENCE(2)",
        array: `${column}1:${column}2`,
        dynamic: true,
      };
    });
    const result = await recalculateWorkbook(book({ sheets: { S: cells } }));
    expect(valueAt(result, "AA1")).toBe(60);
    // The same where the file does not yet know that they spill.
    const fresh = Object.fromEntries(
      Object.entries(cells).map(([address, cell]) => [address, { ...(cell as object), array: address } as MadeCell]),
    );
    expect(valueAt(await recalculateWorkbook(book({ sheets: { S: fresh } })), "AA1")).toBe(60);
  });

  it("that chase each other without end are said not to settle", async () => {
    // A1 spills into B1 only while D1 is blank; C1 spills into D1 only while B1 is not.
    const chase: Record<string, MadeCell> = {
      A1: { formula: "=_xlfn.SEQUENCE(1,IF(D1=0,2,1))", array: "A1", dynamic: true },
      C1: { formula: "=_xlfn.SEQUENCE(1,IF(B1=0,1,2))", array: "C1", dynamic: true },
    };
    await expect(recalculateWorkbook(book({ sheets: { S: chase } }))).rejects.toThrow("do not settle");
  });

  it("of the old kind fill their range, whatever comes out", async () => {
    const result = await recalculateWorkbook(
      book({
        sheets: { S: { A1: 1, A2: 2, B1: { formula: "=A1:A2*10", array: "B1:B3" }, B2: 0, B3: 0, C1: { formula: "=7", array: "C1:D2" } } },
      }),
    );
    expect(result.outcomes[0]?.spill).toEqual([[10], [20], [{ error: "#N/A", message: expect.any(String) }]]);
    expect(result.outcomes[1]?.spill).toEqual([
      [7, 7],
      [7, 7],
    ]);
  });

  it("hold one value in a cell that is no array", async () => {
    expect(
      await values({ A1: 1, A2: 2, A3: 3, B2: "=A1:A3*10", B3: "=SUM(A1:A3)", C1: '=STILL.CV.AT("N2",D1:D2)', D1: 300, D2: 400 }),
    ).toMatchObject({
      ...{ B2: 20, B3: 6, C1: registry.get("CV.AT")!([["N2"]], [[300]])[0]![0] },
    });
  });
});

describe("what cannot be evaluated keeps its value and is reported", () => {
  it("with the reason, and with all that reads it as stale", async () => {
    const result = await recalculateWorkbook(
      book({
        sheets: {
          S: {
            A1: { formula: "=OTHER.ADDIN(1)", value: 5 },
            A2: { formula: "=A1+1", value: 6 },
            A3: { formula: "=IFERROR(A2,0)", value: 6 },
            A4: "=1+1",
            A5: { formula: "=Nowhere", value: 1 },
            A6: { formula: "=[1]Other!A1", value: 2 },
            A7: { formula: "=LN()", value: 3 },
          },
        },
      }),
    );
    expect(result.outcomes.map(({ address }) => address)).toEqual(["A4"]);
    expect(result.stale).toEqual([
      { sheet: "S", address: "A2" },
      { sheet: "S", address: "A3" },
    ]);
    expect(result.unevaluated).toEqual([
      { sheet: "S", address: "A1", reason: expect.stringContaining("OTHER.ADDIN") },
      { sheet: "S", address: "A5", reason: expect.stringContaining("Nowhere") },
      { sheet: "S", address: "A6", reason: expect.stringContaining("another workbook") },
      { sheet: "S", address: "A7", reason: expect.stringContaining("at least 1 argument") },
    ]);
  });

  it("cells the file computes in a way that is not read, and subtotals over hidden rows", async () => {
    const cells: Record<string, MadeCell> = {
      A1: { unread: "The data table A1:A2 is not calculated here", value: 4 },
      A2: "=A1*2",
      B1: 1,
      B2: 2,
      B3: "=SUBTOTAL(9,B1:B2)",
      B4: "=SUM(B1:B2)",
    };
    const made = book({ sheets: { S: cells } });
    const hidden = { ...made, sheets: made.sheets.map((sheet) => ({ ...sheet, hiddenRows: new Set([1]) })) };
    const result = await recalculateWorkbook(hidden);
    expect(result.unevaluated.map(({ address, reason }) => [address, reason])).toEqual([
      ["A1", "The data table A1:A2 is not calculated here"],
      ["B3", "SUBTOTAL over hidden rows is not supported"],
    ]);
    expect(result.stale.map(({ address }) => address)).toEqual(["A2"]);
    expect(valueAt(result, "B4")).toBe(3);
    expect(valueAt(await recalculateWorkbook(made), "B3")).toBe(3);
  });

  it("circles are told from what hangs on them, and are no values", async () => {
    const result = await recalculateWorkbook(book({ sheets: { S: { A1: "=B1", B1: "=IFERROR(A1,7)", C1: "=B1+1", D1: "=2" } } }));
    expect(result.unevaluated.map(({ address }) => address)).toEqual(["A1", "B1"]);
    expect(result.unevaluated[0]?.reason).toContain("circle");
    expect(result.stale.map(({ address }) => address)).toEqual(["C1"]);
    expect(result.outcomes.map(({ address }) => address)).toEqual(["D1"]);
  });

  it("a circle hidden behind INDIRECT is the engine's failure, not a value", async () => {
    const result = await recalculateWorkbook(book({ sheets: { S: { A1: '=INDIRECT("B1")', B1: "=A1+1", C1: "=B1" } } }));
    expect(result.outcomes).toEqual([]);
    expect([...result.unevaluated, ...result.stale].map(({ address }) => address).sort()).toEqual(["A1", "B1", "C1"]);
  });

  it("dates in a workbook that counts from 1904", async () => {
    const result = await recalculateWorkbook(book({ date1904: true, sheets: { S: { A1: "=YEAR(B1)", A2: "=1+1" } } }));
    expect(result.unevaluated[0]).toMatchObject({ address: "A1", reason: expect.stringContaining("1904") });
    expect(valueAt(result, "A2")).toBe(2);
  });
});

describe("the clock", () => {
  const cells: Record<string, MadeCell> = {
    A1: { formula: "=TODAY()", value: 45000 },
    A2: "=A1+1",
    A3: { formula: "=NOW()", value: 45000.5 },
    A4: { formula: "=RAND()", value: 0.25 },
  };

  it("stands still unless it is given: the rest is calculated from the values of the file", async () => {
    const result = await recalculateWorkbook(book({ sheets: { S: cells } }));
    expect(valueAt(result, "A2")).toBe(45001);
    expect(result.volatileKept.map(({ address }) => address)).toEqual(["A1", "A3", "A4"]);
  });

  it("shows the time it is given", async () => {
    const result = await recalculateWorkbook(book({ sheets: { S: cells } }), { now: new Date(2024, 1, 29, 12, 0, 0) });
    expect(valueAt(result, "A1")).toBe(45351); // 29 February 2024
    expect(valueAt(result, "A2")).toBe(45352);
    expect(valueAt(result, "A3")).toBe(45351.5);
    expect(result.volatileKept).toEqual([]);
  });
});

describe("large workbooks", () => {
  it("a chain of 50,000 cells, against the order of the sheet", async () => {
    const length = 50000;
    const cells: Record<string, MadeCell> = { [`A${length}`]: 1 };
    for (let row = 1; row < length; row++) cells[`A${row}`] = `=A${row + 1}+1`;
    const result = await recalculateWorkbook(book({ sheets: { S: cells } }));
    expect(result.unevaluated).toEqual([]);
    expect(valueAt(result, "A1")).toBe(length);
  }, 120000);
});

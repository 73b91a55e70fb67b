import { Readable } from "node:stream";
import { evaluate, evalHelp } from "../../src/command/eval";
import { registry } from "../../src/functions";

let out = "";
let err = "";
beforeEach(() => {
  out = "";
  err = "";
  jest.spyOn(process.stdout, "write").mockImplementation(((text: string, done?: () => void) => {
    out += text;
    done?.();
    return true;
  }) as never);
  jest.spyOn(process.stderr, "write").mockImplementation(((text: string) => {
    err += text;
    return true;
  }) as never);
});
afterEach(() => jest.restoreAllMocks());

function lines(): unknown[] {
  return out
    .trimEnd()
    .split("\n")
    .map((line) => JSON.parse(line) as unknown);
}

describe("stillwall eval --json", () => {
  it("prints one object a line, in order, with every digit", async () => {
    const cv = registry.get("CV.AT")!([["N2"]], [[500]])[0]![0];
    expect(await evaluate(["--json", '=STILL.CV.AT("N2",500)', "=1/3", '="a""b"&TRUE', "=1=1", "={1,2;3,4}"])).toBe(0);
    expect(lines()).toEqual([
      { formula: '=STILL.CV.AT("N2",500)', value: cv },
      { formula: "=1/3", value: 1 / 3 },
      { formula: '="a""b"&TRUE', value: 'a"bTRUE' },
      { formula: "=1=1", value: true },
      {
        formula: "={1,2;3,4}",
        value: [
          [1, 2],
          [3, 4],
        ],
      },
    ]);
  });

  it("gives the code and the sentence of an error, and 1 as status", async () => {
    expect(await evaluate(["--json", '=STILL.CV.AT("N2",0)', '=STILL.CV.AT("Unobtainium",300)', "=NOSUCH(1)", "=SUM(", "=A1"])).toBe(1);
    expect(lines()).toMatchObject([
      { error: { code: "#VALUE!", message: expect.stringContaining("0 K") } },
      { error: { code: "#N/A", message: expect.stringContaining("Unobtainium") } },
      { error: { code: "#NAME?", message: expect.stringContaining("NOSUCH") } },
      { error: { code: "#ERROR!", message: expect.stringContaining("cannot be read") } },
      { error: { code: "#ERROR!", message: expect.stringContaining("no") } },
    ]);
  });

  it("puts an error object in place of a failed cell", async () => {
    expect(await evaluate(["--json", '=STILL.CV.AT("N2",{300;0})'])).toBe(1);
    expect(lines()).toEqual([
      {
        formula: expect.any(String),
        value: [[expect.any(Number)], [{ error: { code: "#VALUE!", message: expect.stringContaining("0 K") } }]],
      },
    ]);
  });

  it("reads one formula a line from standard input, wherever the pieces are cut, and passes blank lines over", async () => {
    const input = Readable.from(["=1+", "1\r\n\n  \n=2+2\n=3", "+3"]);
    expect(await evaluate(["--json"], input)).toBe(0);
    expect(lines()).toEqual([
      { formula: "=1+1", value: 2 },
      { formula: "=2+2", value: 4 },
      { formula: "=3+3", value: 6 },
    ]);
  });

  it("evaluates 10,000 formulas in one process", async () => {
    const input = Readable.from([Array.from({ length: 10000 }, (_, i) => `=STILL.CV.AT("N2",${300 + i / 10})`).join("\n")]);
    const start = process.cpuUsage();
    expect(await evaluate(["--json"], input)).toBe(0);
    const { user } = process.cpuUsage(start);
    expect(lines()).toHaveLength(10000);
    // 0.4 s of processor time here, measured; ten times that is a fault.
    expect(user / 1e6).toBeLessThan(4);
  });
});

describe("stillwall eval for the eye", () => {
  it("prints values, rows and errors", async () => {
    expect(await evaluate(["1/3", "={1,2;3,4}", "=TRUE", '="text"', "=1/0"])).toBe(1);
    expect(out).toMatch(/^0\.3333333333333333\n1\t2\n3\t4\nTRUE\ntext\n#DIV\/0! .+\n$/);
  });

  it("takes a formula that starts with a sign, and one after --", async () => {
    expect(await evaluate(["-2^2", "--", "--A"])).toBe(1);
    expect(out.split("\n")[0]).toBe("4");
  });

  it("explains itself, and says what it does not know", async () => {
    expect(await evaluate(["--help"])).toBe(0);
    expect(out).toBe(evalHelp);
    expect(await evaluate(["--jsn", "=1"])).toBe(2);
    expect(err).toContain("unknown option --jsn");
  });
});

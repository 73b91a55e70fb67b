import fc from "fast-check";
import { OMITTED, readArgument, refersTo, textArgument, writeFormula, type Argument } from "../../src/pane/formula";

const text = (value: string): Argument => ({ kind: "text", value });
const reference = (value: string): Argument => ({ kind: "reference", text: value });

describe("reading a field", () => {
  test.each([
    ["500", { kind: "number", value: 500 }],
    [" 298.15 ", { kind: "number", value: 298.15 }],
    ["1e5", { kind: "number", value: 1e5 }],
    ["-.5", { kind: "number", value: -0.5 }],
    ["", OMITTED],
    ["   ", OMITTED],
    ["25 °C", text("25 °C")],
    ["298,15", text("298,15")],
    ["1e999", text("1e999")],
    ["ambient", text("ambient")],
    ["b2", reference("B2")],
    ["=B2", reference("B2")],
    ["$b$2:c9", reference("$B$2:C9")],
    ["A2#", reference("A2#")],
    ["Runs!b2", reference("Runs!B2")],
    ["'Day 1'!b2:b9", reference("'Day 1'!B2:B9")],
    ["=ambient", reference("ambient")],
    ["XFD1048576", reference("XFD1048576")],
    ["XFE1", text("XFE1")],
    ["A1048577", text("A1048577")],
    ["A0", text("A0")],
    ['=B2),"x', text('=B2),"x')],
  ])("%j", (typed, expected) => {
    expect(readArgument(typed)).toEqual(expected);
  });

  test("a text argument stays text even if it looks like a cell or a number", () => {
    expect(textArgument("N2")).toEqual(text("N2"));
    expect(textArgument(" 12 ")).toEqual(text("12"));
    expect(textArgument(" ")).toEqual(OMITTED);
  });
});

describe("writing the formula", () => {
  test("arguments left out at the end go with their commas, in the middle they keep them", () => {
    const number: Argument = { kind: "number", value: 500 };
    expect(writeFormula("CV.AT", [text("N2"), number, OMITTED, OMITTED])).toBe('=STILL.CV.AT("N2",500)');
    expect(writeFormula("CV.AT", [text("N2"), number, OMITTED, text("gri-1999")])).toBe('=STILL.CV.AT("N2",500,,"gri-1999")');
    expect(writeFormula("CV.AT", [text("N2"), reference("B2:B9"), text("kJ/(kg K)")])).toBe('=STILL.CV.AT("N2",B2:B9,"kJ/(kg K)")');
  });

  test("numbers keep every digit and use Excel's exponent", () => {
    expect(writeFormula("X.Y", [{ kind: "number", value: 0.1 + 0.2 }])).toBe("=STILL.X.Y(0.30000000000000004)");
    expect(writeFormula("X.Y", [{ kind: "number", value: 1e21 }])).toBe("=STILL.X.Y(1E+21)");
  });

  test("whatever is typed stays inside its quotes: nothing can end the text or add an argument", () => {
    fc.assert(
      fc.property(fc.string(), (typed) => {
        const written = writeFormula("X.Y", [text(typed)]);
        const inner = written.slice('=STILL.X.Y("'.length, -'")'.length);
        expect(inner.replaceAll('""', "")).not.toContain('"');
        expect(inner.replaceAll('""', '"')).toBe(typed);
      }),
    );
  });

  test("whatever is typed as a quantity is a number, a text, a reference of letters, digits and $ : ! # . _ or nothing", () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.string(), fc.string({ unit: fc.constantFrom("=", "A", "1", ":", "$", "!", "'", "(", ",", "#") })),
        (typed) => {
          const argument = readArgument(typed);
          if (argument.kind === "reference")
            expect(argument.text).toMatch(/^(?:'[^']*(?:''[^']*)*'!|[\p{L}\p{N}_.]+!)?[\p{L}\p{N}_.$:#]+$/u);
          if (argument.kind === "number") expect(Number.isFinite(argument.value)).toBe(true);
        },
      ),
    );
  });
});

describe("a formula that would feed on itself", () => {
  test.each([
    ["B2", "B2", true],
    ["$B$2", "Sheet1!B2", true],
    ["A1:C9", "B2", true],
    ["C9:A1", "B2", true],
    ["Other!B2", "Sheet1!B2", false],
    ["'Day 1'!B2", "'Day 1'!B2", true],
    ["B3", "B2", false],
    ["A1:A9", "B2", false],
  ])("%s in %s: %s", (typed, address, expected) => {
    expect(refersTo([text("N2"), readArgument(typed)], address)).toBe(expected);
  });

  test("texts never refer, and a name or an unknown address is not judged", () => {
    expect(refersTo([text("B2")], "B2")).toBe(false);
    expect(refersTo([readArgument("=ambient")], "B2")).toBe(false);
    expect(refersTo([readArgument("B2")], "a chart")).toBe(false);
  });
});

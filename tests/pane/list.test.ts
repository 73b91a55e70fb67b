import fc from "fast-check";
import { OMITTED, writeFormula, type Argument } from "../../src/pane/formula";
import { readList, readText } from "../../src/pane/list";

const text = (value: string): Argument => ({ kind: "text", value });
const array = (...rows: (number | string)[][]): Argument => ({ kind: "array", rows });
const reference = (value: string): Argument => ({ kind: "reference", text: value });

describe("a field for a list", () => {
  test.each([
    ["B2:B40", reference("B2:B40")],
    ["b2", reference("B2")],
    ["122", { kind: "number", value: 122 }],
    ["0.2 kJ", text("0.2 kJ")],
    ["", OMITTED],
    ["{50,30,42}", array([50, 30, 42])],
    [" ={22.1; 22.2 ;-3e-2} ", array([22.1], [22.2], [-0.03])],
    ['{"28.1 MJ/kg",28120;"a ""b"", c;",2}', array(["28.1 MJ/kg", 28120], ['a "b", c;', 2])],
    ["{7}", array([7])],
  ])("%j", (typed, expected) => {
    expect(readList(typed)).toEqual(expected);
  });

  test.each(["{}", "{1,}", "{1,2;3}", "{1;;2}", "{B2,1}", "{one}", '{"open}', "{1", "{1}{2}", '{"a"b}', "{{1}}"])(
    "%s is no array constant and stays text, for the function to refuse",
    (typed) => {
      expect(readList(typed)).toEqual(text(typed));
    },
  );

  test("what is written for an array is read as the same array", () => {
    const cell = fc.oneof(
      fc.double({ noNaN: true, noDefaultInfinity: true }).map((value) => value + 0),
      fc.string(),
    );
    const rows = fc
      .integer({ min: 1, max: 4 })
      .chain((width) => fc.array(fc.array(cell, { minLength: width, maxLength: width }), { minLength: 1 }));
    fc.assert(
      fc.property(rows, (given) => {
        const written = writeFormula("X.Y", [{ kind: "array", rows: given }]);
        expect(readList(written.slice("=STILL.X.Y(".length, -1))).toEqual({ kind: "array", rows: given });
      }),
    );
  });

  test("whatever is typed in braces can end neither its text nor the list", () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom("{", "}", '"', ",", ";", "1", "a", " ", ")") }), (typed) => {
        const argument = readList(`{${typed}}`);
        const written = writeFormula("X.Y", [argument]).slice("=STILL.X.Y(".length, -1);
        const outside = written.replaceAll(/"(?:[^"]|"")*"/g, "");
        expect(outside).toMatch(/^(?:\{[\d,;]*\})?$/);
      }),
    );
  });
});

describe("a field for a formula", () => {
  test.each([
    ["CH4", text("CH4")],
    ["CO2", text("CO2")],
    ["C7H6O2", text("C7H6O2")],
    ["C7H6O2(g)", text("C7H6O2(g)")],
    ["=B2", reference("B2")],
    ["=b2:b9", reference("B2:B9")],
    ["B2:B9", reference("B2:B9")],
    ["Samples!B2", reference("Samples!B2")],
    ["=fuel_formula", reference("fuel_formula")],
    ['{"C7H6O2","C10H22"}', array(["C7H6O2", "C10H22"])],
    ["", OMITTED],
  ])("%j", (typed, expected) => {
    expect(readText(typed)).toEqual(expected);
  });
});

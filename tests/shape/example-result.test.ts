import type { Outcome } from "../../src/recalc/evaluate";
import { broken, rowsOf } from "./example-result";

const came = (value: unknown): Outcome => ({ formula: "F", value }) as Outcome;
const refused = (code: string, message: string): Outcome => ({ formula: "F", error: { code, message } });

test.each<[string, Outcome]>([
  ["18.015", came(18.015)],
  ["0.3", came(0.1 + 0.2)], // 15 digits, as a cell shows
  ["~ 21.27", came(21.2650001)],
  ["~ 21.27", came(21.2749999)],
  ["~ -2.479", came(-2.4789575)],
  ["~ 1.23e5", came(123400)],
  ["~ 1900", came(1900.4)],
  ['"0.79 N2 + 0.21 O2"', came("0.79 N2 + 0.21 O2")],
  ['"say ""so"""', came('say "so"')],
  ["TRUE", came(true)],
  ["{1,2;3,4}", came([[1, 2], [3, 4]])], // prettier-ignore
  ['{"a;b","c,d"}', came([["a;b", "c,d"]])],
  ["~ {20.8,29.1}", came([[20.786, 29.101]])],
  ["{1,#N/A}", came([[1, { error: { code: "#N/A", message: "absent" } }]])],
  ["#VALUE! Temperature 0 K …", refused("#VALUE!", "Temperature 0 K is not above 0 K")],
  ["#N/A", refused("#N/A", "nothing of that name")],
])("%s is kept", (promise, outcome) => {
  expect(broken(promise, outcome)).toBeUndefined();
});

test.each<[string, Outcome]>([
  ["18.015", came(18.0150000001)],
  ["~ 21.27", came(21.2649)],
  ["~ 21.270", came(21.2709)],
  ["~ 1.23e5", came(124000)],
  ['"a"', came("b")],
  ['"1"', came(1)],
  ["1", came("1")],
  ["TRUE", came(1)],
  ["{1,2}", came([[1], [2]])],
  ["{1,2}", came([[1, 2, 3]])],
  ["{1,2}", came([[1, 3]])],
  ["1", came([[1, 2]])],
  ["1", refused("#VALUE!", "no")],
  ["#VALUE! Temperature", came(1)],
  ["#VALUE! Temperature", refused("#N/A", "Temperature")],
  ["#VALUE! Temperature", refused("#VALUE!", "Pressure")],
  ["{1,#N/A}", came([[1, { error: { code: "#VALUE!", message: "" } }]])],
  ["about 3", came(3)],
])("%s is seen as broken", (promise, outcome) => {
  expect(broken(promise, outcome)).toMatch(/^gave /);
});

test("array constants split at their separators only", () => {
  expect(rowsOf('{1,"a,b";2,"c;d"}')).toEqual([["1", '"a,b"'], ["2", '"c;d"']]); // prettier-ignore
});

/** Examples are promises: every one is run, through the spreadsheet engine as a cell would, and none is excused. */
import { promised as handbook } from "../../src/handbook/promised";
import { evaluateFormulas } from "../../src/recalc/evaluate";
import { broken } from "./example-result";

const examples = handbook.flatMap(({ id, name, examples }) => examples.map((example) => ({ id, name, ...example })));

test("every function has two or more, and each calls it", () => {
  expect(handbook.length).toBeGreaterThan(0);
  expect(handbook.filter(({ examples }) => examples.length < 2).map(({ id }) => id)).toEqual([]);
  expect(examples.filter(({ name, formula }) => !formula.includes(`${name}(`))).toEqual([]);
});

test("an example of a refusal tells its sentence", () => {
  expect(examples.filter(({ result }) => /^#\S+$/.test(result)).map(({ formula, result }) => `${formula} -> ${result}`)).toEqual([]);
});

test.each(examples.map(({ formula, result }) => [formula, result] as const))("%s -> %s", (formula, result) => {
  const [outcome] = evaluateFormulas([`=${formula}`]);
  expect(outcome && broken(result, outcome)).toBeUndefined();
});

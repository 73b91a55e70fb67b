/** The lines that the help lists for a table are those the table gives. */
import { promised as handbook } from "../../src/handbook/promised";
import { evaluateFormulas } from "../../src/recalc/evaluate";

/** The call of the table inside the first example that takes a line out of it. */
function tableCall(name: string, formulas: readonly string[]): string | undefined {
  const example = formulas.find((formula) => formula.startsWith(`INDEX(${name}(`));
  return example && /^INDEX\((.*\)),\d+,\d+\)$/.exec(example)?.[1];
}

const tables = handbook.filter(({ lines }) => lines !== undefined);

test("every table that stands upright lists its lines", () => {
  const upright = handbook.filter(({ result }) => /label, value, unit, note/i.test(result.description)).map(({ id }) => id);
  expect(tables.map(({ id }) => id)).toEqual(upright);
  expect(upright.length).toBeGreaterThan(8);
});

test.each(tables.map((entry) => [entry.id, entry] as const))("%s", (_, { name, examples, lines }) => {
  const call = tableCall(
    name,
    examples.map(({ formula }) => formula),
  );
  const [outcome] = evaluateFormulas([`=${call}`]);
  const rows = outcome && "value" in outcome ? (outcome.value as readonly (readonly unknown[])[]) : [];
  const labels = rows.map(([label]) => label).filter((label) => label !== "warning" && label !== "warnings");
  expect(labels).toEqual(lines);
});

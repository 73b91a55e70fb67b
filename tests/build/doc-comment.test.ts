import { readHandbook } from "../../src/build/handbook.mjs";
import { folderWith } from "./folders";

const GOOD = `
/**
 * Twice a number, for trying the
 * reader of comments.
 * @param amount Amount, also as text such as "2 mol" [mol] value
 * @param table Rows of "a -> b" [-] block
 * @param unit Unit of the result [-] value
 * @returns Twice the amount [mol]
 * @source first second
 * @source third
 * @example STILL.TWICE.OF(2,{1,2;3,4}) -> 4
 * @example STILL.TWICE.OF("x -> y","a") -> #VALUE! "x -> y" is not a number
 * @customfunction TWICE.OF
 */
export function twiceOf(amount: any[][], table: any[][], unit?: any[][]): any[][] {
  return [[amount, table, unit]];
}
`;

const read = (source: string, name = "trial.ts") => readHandbook(folderWith({ [name]: source }));
const changed = (from: string | RegExp, to: string) => {
  const source = GOOD.replace(from, to);
  expect(source).not.toBe(GOOD);
  return () => read(source);
};

test("a doc comment becomes one entry, word for word", () => {
  expect(read(GOOD)).toEqual([
    {
      id: "TWICE.OF",
      name: "STILL.TWICE.OF",
      family: "trial",
      description: "Twice a number, for trying the reader of comments.",
      parameters: [
        { name: "amount", description: 'Amount, also as text such as "2 mol"', unit: "mol", kind: "value", optional: false },
        { name: "table", description: 'Rows of "a -> b"', unit: "-", kind: "block", optional: false },
        { name: "unit", description: "Unit of the result", unit: "-", kind: "value", optional: true },
      ],
      result: { description: "Twice the amount", unit: "mol" },
      sources: ["first", "second", "third"],
      examples: [
        { formula: "STILL.TWICE.OF(2,{1,2;3,4})", result: "4" },
        { formula: 'STILL.TWICE.OF("x -> y","a")', result: '#VALUE! "x -> y" is not a number' },
      ],
    },
  ]);
});

test.each<[string, string | RegExp, string, RegExp]>([
  ["no description of a parameter", / \* @param table.*\n/, "", /twiceOf: the parameter table has no @param/],
  ["no unit", " [mol] value", " value", /@param amount must end in its unit in brackets and its kind/],
  ["no kind", "[mol] value", "[mol]", /@param amount must end in its unit in brackets and its kind/],
  ["an unknown kind", "[-] block", "[-] matrix", /@param table is of the kind "matrix"; the kinds are value, list, block/],
  ["no result", / \* @returns.*\n/, "", /needs one @returns/],
  ["no unit of the result", "Twice the amount [mol]", "Twice the amount", /@returns must end in its unit/],
  ["no source", / \* @source.*\n \* @source.*\n/, "", /has no @source/],
  ["one example", / \* @example STILL.TWICE.OF\(2.*\n/, "", /has 1 @example, needs two or more/],
  ["an example without result", "{1,2;3,4}) -> 4", "{1,2;3,4})", /must read "formula -> result"/],
  ["a cell address", "@customfunction TWICE.OF", "@customfunction ABC12", /the name ABC12 reads as a cell address/],
  ["an old macro command", "@customfunction TWICE.OF", "@customfunction GOTO", /GOTO is a command of the old macro sheets/],
  ["too short", "@customfunction TWICE.OF", "@customfunction AB", /AB has fewer than 3 characters/],
  ["small letters", "@customfunction TWICE.OF", "@customfunction TWICE.of", /holds something else than capitals/],
  ["another name in TypeScript", "function twiceOf", "function doubleOf", /the function of TWICE.OF must be called twiceOf/],
  ["not exported", "export function", "function", /is not exported/],
  ["another type of argument", "amount: any[][]", "amount: number", /the parameter amount must be any\[\]\[\], without a default/],
  ["a default", "unit?: any[][]", "unit: any[][] = []", /the parameter unit must be any\[\]\[\], without a default/],
  ["another type of result", "): any[][]", "): number", /returns number, must return any\[\]\[\]/],
  ["a long description", "Twice a number,", "Twice ".repeat(50), /the description has \d+ characters, must have fewer than 255/],
  ["no description", / \* Twice a number, for trying the\n \* reader of comments.\n/, "", /the description is empty/],
  [
    "a constant instead of a function",
    "export function twiceOf(",
    "export const twiceOf = (",
    /line 15: @customfunction stands before something else/,
  ],
])("%s is refused", (_, from, to, sentence) => {
  expect(changed(from, to)).toThrow(sentence);
});

test("two families may not share a name, nor meet when a file stores them", () => {
  const other = GOOD.replaceAll("TWICE.OF", "TWICE.OF").replaceAll("Twice a number", "Another");
  expect(() => readHandbook(folderWith({ "one.ts": GOOD, "two.ts": other }))).toThrow(
    /two.ts, TWICE.OF: meets TWICE.OF of one.ts in TWICE_OF/,
  );
});

test("families stand in the order of index.ts, and a file without functions is none", () => {
  const named = (id: string, name: string) => GOOD.replaceAll("TWICE.OF", id).replace("function twiceOf", `function ${name}`);
  const index = `import * as alpha from "./alpha";\nimport * as beta from "./beta";\nexport const families: Readonly<Record<string, unknown>> = { beta, alpha };\n`;
  const folder = folderWith({
    "alpha.ts": named("AAA.ONE", "aaaOne"),
    "beta.ts": named("BBB.TWO", "bbbTwo"),
    "helper.ts": "// speaks of @customfunction, and has none\n",
    "index.ts": index,
  });
  expect(readHandbook(folder).map(({ id }) => id)).toEqual(["BBB.TWO", "AAA.ONE"]);
});

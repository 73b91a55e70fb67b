import { patchMetadata } from "../../src/build/functions-json.mjs";
import { helpPage } from "../../src/build/help.mjs";

const entry = {
  id: "TWICE.OF",
  name: "STILL.TWICE.OF",
  family: "trial",
  description: "Twice a <number>.",
  parameters: [
    { name: "amount", description: "Amount", unit: "mol", kind: "value" as const, optional: false },
    { name: "word", description: "Text & more", unit: "-", kind: "list" as const, optional: true },
  ],
  result: { description: "Twice the amount", unit: "mol" },
  sources: ["first"],
  examples: [{ formula: 'STILL.TWICE.OF(2,"a")', result: "4" }],
};
const metadata = {
  allowCustomDataForDataTypeAny: true,
  functions: [
    {
      id: "TWICE.OF",
      name: "TWICE.OF",
      description: "Twice",
      parameters: [
        { name: "amount", description: "Amount [mol] value", type: "any", dimensionality: "matrix" },
        { name: "word", description: "Text [-] list", type: "any", dimensionality: "matrix", optional: true },
      ],
    },
  ],
};
const BASE = "https://tools.example/still";

test("error cells are let through, help has an address, descriptions are the handbook's", () => {
  const patched = patchMetadata(metadata, [entry], BASE);
  expect(patched.allowErrorForDataTypeAny).toBe(true);
  const [item] = patched.functions;
  expect(item?.helpUrl).toBe(`${BASE}/help.html#TWICE.OF`);
  expect(item?.description).toBe("Twice a <number>.");
  expect(item?.parameters).toEqual([
    { name: "amount", description: "Amount [mol]", type: "any", dimensionality: "matrix" },
    { name: "word", description: "Text & more", type: "any", dimensionality: "matrix", optional: true },
  ]);
});

test("the two readers of a comment must agree", () => {
  const other = { ...entry, parameters: entry.parameters.slice(0, 1) };
  expect(() => patchMetadata(metadata, [other], BASE)).toThrow(/read different functions/);
  expect(() => patchMetadata(metadata, [], BASE)).toThrow(/read different functions/);
  const optional = { ...entry, parameters: entry.parameters.map((parameter) => ({ ...parameter, optional: true })) };
  expect(() => patchMetadata(metadata, [optional], BASE)).toThrow(/read different functions/);
});

test("a function that stands twice is found", () => {
  const twice = { ...metadata, functions: [...metadata.functions, ...metadata.functions] };
  expect(() => patchMetadata(twice, [entry, entry], BASE)).toThrow(/TWICE_OF twice/);
});

test("the help page holds each function with its arguments, examples and sources, escaped", () => {
  const cited = { sources: [{ key: "first", citation: "A. Author: $& Title" }], grades: { A: "good" } };
  const set = { id: "made-up", title: "Made up", source: "first", form: "power" };
  const laboratory = {
    editions: [{ id: "method-1", title: "Method 1", source: "first", constantPressure: { hydrogen: 212.2, moisture: 24.43 } }],
    precision: [{ id: "method-2", title: "Method 2", what: "gross & net", unit: "J/g", repeatability: 120, source: "first" }],
    series: [{ id: "method-3", title: "Method 3", source: "first", runs: 5, percent: 0.2 }],
    kinds: [{ kind: "thread", perGram: 17500, source: "first" }],
  };
  const vessels = {
    recommended: [{ wall: "steel", use: "plain-steel@first", note: "made up" }],
    walls: [
      { id: "plain-steel@first", material: "plain steel", source: "first", temperature: "degC", from: 20, to: 600, fromMemory: true },
    ],
    gases: [{ species: "X2", temperature: 100, pressure: 3.5, acentric: 0.01, source: "first", fromMemory: true }],
  };
  const shell = "<nav><!-- contents --></nav><main><!-- sets --><!-- laboratory --><!-- vessels --><!-- functions --></main>";
  const page = helpPage(shell, [entry], cited, [set], laboratory, vessels);
  expect(page).toContain("steel</th><td>20 to 600 °C</td><td>made up</td><td>A. Author: $&amp; Title, from memory</td>");
  expect(page).toContain("X2</th><td>100 K</td><td>3.5 MPa</td><td>0.01</td><td>first, from memory</td>");
  expect(page).toContain("<code>method-1</code></th><td>H 212.2, M 24.43</td><td>not held</td><td>not held</td>");
  expect(page).toContain("<code>method-2</code></th><td>gross &amp; net</td><td>120 J/g</td><td></td><td>A. Author: $&amp; Title</td>");
  expect(page).toContain('<th scope="row">Method 3</th><td>5</td><td>0.2 %</td>');
  expect(page).toContain("<code>thread</code></th><td></td><td>17500</td>");
  expect(page).toContain('<th scope="row"><code>made-up</code></th><td>power</td><td>A. Author: $&amp; Title</td>');
  expect(page).toContain("<b>A</b> good");
  expect(page).toContain('<a href="#TWICE.OF">TWICE.OF</a>');
  expect(page).toContain('<section id="TWICE.OF">');
  expect(page).toContain("<code>=STILL.TWICE.OF(amount, [word])</code>");
  expect(page).toContain("Twice a &lt;number&gt;.");
  expect(page).toContain("Text &amp; more");
  expect(page).toContain("Amount [mol]");
  expect(page).toContain("<code>=STILL.TWICE.OF(2,&quot;a&quot;)</code> gives <code>4</code>");
  expect(page).toContain("<cite>A. Author: $&amp; Title</cite>");
});

test("a shell without its places is refused", () => {
  expect(() =>
    helpPage(
      "<main></main>",
      [entry],
      { sources: [], grades: {} },
      [],
      { editions: [], precision: [], series: [], kinds: [] },
      { recommended: [], walls: [], gases: [] },
    ),
  ).toThrow(/must hold <!-- contents -->/);
});

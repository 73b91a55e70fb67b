import "../../src/functions";
import { registry } from "../../src/functions/registry";
import { handbook, helpOf, type HandbookEntry } from "../../src/handbook";
import { promised } from "../../src/handbook/promised";
import { sourceOf } from "../../src/data/library";
import { cautionOf, foldedFields, unitNow } from "../../src/pane/fields";
import { writeFormula } from "../../src/pane/formula";
import { draftKey, functionsForLaboratory, laboratoryArguments, laboratoryFields } from "../../src/pane/laboratory";
import { firstLines, isUpright } from "../../src/pane/lines";
import { shown } from "../../src/pane/numbers";
import { previewOf } from "../../src/pane/preview";

const functions = functionsForLaboratory(handbook);
const entryOf = (id: string): HandbookEntry => helpOf(id) as HandbookEntry;

/** Formula and preview for a function with some fields filled. */
function filled(id: string, typed: Record<string, string> = {}) {
  const entry = entryOf(id);
  const fields = laboratoryFields(entry);
  const args = laboratoryArguments(fields, (field) => typed[field.name] ?? field.initial);
  return { formula: writeFormula(id, args), preview: previewOf(entry, fields, args), fields };
}

const RUN = { equivalent: "10200", rise: "2.75", mass: "1", heats: "{50,30,42}", sulfur_heat: "112.9" };

describe("the functions of the laboratory", () => {
  test("are all of both laboratory families and of closed vessels, and none that takes a substance, converts, mixes or cites", () => {
    const ids = functions.map(({ id }) => id);
    expect(handbook.filter(({ family }) => ["vessel", "calorimeter", "fuel"].includes(family)).map(({ id }) => id)).toEqual(
      ids.filter((id) => /^(?:VESSEL|CAL|FUEL)\./.test(id)),
    );
    for (const id of ["CV.AT", "HEAT", "MOLARMASS", "MIX", "MIX.HUMIDAIR", "UNITS", "UNITS.ABSOLUTE", "SOURCE.CHECK"])
      expect(ids).not.toContain(id);
  });

  test("a later family joins by its first argument alone", () => {
    const made = (family: string, name: string): HandbookEntry => ({
      ...entryOf("CAL.NITRIC"),
      family,
      parameters: [{ ...entryOf("CAL.NITRIC").parameters[0]!, name }],
    });
    const later = [made("fit", "temperatures"), made("heat", "substance"), made("burn", "species"), made("units", "value")];
    expect(functionsForLaboratory(later).map(({ family }) => family)).toEqual(["fit"]);
  });

  test("start empty, and say what they need", () => {
    for (const { id } of functions) expect([id, filled(id).preview.kind]).toEqual([id, "waiting"]);
    expect(filled("CAL.GROSS").preview).toEqual({ kind: "waiting", sentence: "Equivalent is needed, in J/K or with its unit." });
    expect(filled("CAL.RISE").preview).toEqual({ kind: "waiting", sentence: "Times are needed, in min or with their unit." });
    expect(filled("CAL.EQUIVALENT").preview).toEqual({ kind: "waiting", sentence: "Mass is needed, in g or with its unit." });
    // a feed takes no units
    expect(filled("EQUILIBRIUM.RIGID").preview).toEqual({ kind: "waiting", sentence: "Feed is needed, in mol." });
  });

  test("carry the caution of their family, and sources that are there", () => {
    expect(cautionOf("calorimeter")).toBe("Limits of the vessel\u2019s own certificate, local codes and licensed practice govern.");
    expect(cautionOf("fuel")).toBe("Values for a certificate remain the responsibility of those who sign it.");
    expect(cautionOf("burn")).toMatch(/^Ideal gas, no loss of heat, deflagration.*licensed practice govern\.$/);
    expect(cautionOf("burn", "EQUILIBRIUM.ATVOLUME")).toMatch(/^Ideal gas and pure solids and liquids at chemical equilibrium.*govern\.$/);
    // the model of the gas is spoken of where there is one
    for (const { family, id, parameters } of functions.filter(({ family: own }) => own === "vessel")) {
      const hasModel = parameters.some(({ name }) => name === "model");
      expect([id, cautionOf(family, id)]).toEqual([
        id,
        expect.stringMatching(
          hasModel
            ? /^Composition frozen; the ideal gas only.*practice govern\.$/
            : /^Not a design or relief calculation; .*practice govern\.$/,
        ),
      ]);
    }
    expect(cautionOf("reaction")).toMatch(/^Complete reaction as written.*licensed practice govern\.$/);
    for (const { id, sources } of functions) {
      expect([id, sources.length]).not.toEqual([id, 0]);
      for (const key of sources) expect(sourceOf(key).citation).not.toBe("");
    }
  });
});

/** The arguments of a call as they would be typed into the fields: texts without their quotes. */
function typedArguments(call: string): string[] {
  const inner = call.slice(call.indexOf("(") + 1, -1);
  const pieces = inner.match(/(?:"(?:[^"]|"")*"|\{[^}]*\}|[^,"{}])+|(?<=^|,)(?=,|$)/g) ?? [];
  return pieces.map((piece) => (/^"/.test(piece) ? piece.slice(1, -1).replaceAll('""', '"') : piece));
}

/** The one call of each example, without the INDEX around it; calls inside calls are cells of a sheet, not what a field holds. */
const promises = functions.map(({ id }) => promised.find((entry) => entry.id === id)!);
const examples = promises
  .flatMap(({ id, examples }) =>
    examples.map(({ formula, result }) => ({ id, call: formula.replace(/^INDEX\((.*),\d+,\d+\)$/, "$1"), result })),
  )
  .filter(({ call }) => call.lastIndexOf("STILL.") === 0);

test("hardly an example is left out", () => {
  expect(examples.length).toBeGreaterThan(0.9 * promises.flatMap((entry) => entry.examples).length);
});

describe("every example of the help, typed field by field", () => {
  test.each(examples)("$call", ({ id, call, result }) => {
    const typed = typedArguments(call);
    const names = entryOf(id).parameters.map(({ name }) => name);
    const { formula, preview } = filled(id, Object.fromEntries(typed.map((value, at) => [names[at] ?? "", value])));
    expect(formula).toBe(`=${call}`);
    const sentence = /^#\S+ ([^…]*)/.exec(result)?.[1];
    if (sentence === undefined) expect(["value", "table"]).toContain(preview.kind);
    else expect(preview).toEqual({ kind: "refused", sentence: expect.stringContaining(sentence) });
  });
});

describe("the preview", () => {
  test("is the worksheet function's own number, with its unit", () => {
    const value = registry.get("CAL.GROSS")?.([[10200]], [[2.75]], [[1]], [[50, 30, 42]], [[112.9]])[0]?.[0];
    expect(filled("CAL.GROSS", RUN)).toMatchObject({
      formula: "=STILL.CAL.GROSS(10200,2.75,1,{50,30,42},112.9)",
      preview: { kind: "value", rows: [[shown(value)]], unit: "J/g" },
    });
  });

  test("is the refusal of the cell, word for word", () => {
    expect(filled("CAL.GROSS", { ...RUN, heats: "-50" }).preview).toEqual({ kind: "refused", sentence: "Heat -50 J is negative" });
    expect(filled("CAL.GROSS", { ...RUN, equivalent: "10,2" }).preview).toEqual({
      kind: "refused",
      sentence: 'Energy equivalent is the text "10,2" with a decimal comma: give the number 10.2',
    });
  });

  test("is left to the sheet as soon as an argument is a range", () => {
    expect(filled("CAL.RISE", { times: "A2:A40", temperatures: "b2:c40", fire: "5" })).toMatchObject({
      formula: "=STILL.CAL.RISE(A2:A40,B2:C40,5)",
      preview: { kind: "sheet" },
    });
  });

  test("names the unit of the result that the arguments ask for", () => {
    expect(filled("FUEL.LIQUIDNET", { gross: "45700", hydrogen_percent: "13.3" }).preview).toMatchObject({ unit: "J/g" });
    expect(filled("FUEL.LIQUIDNET", { gross: "45700", hydrogen_percent: "13.3", density: "0.845" }).preview).toMatchObject({
      unit: "J/mL",
    });
  });

  test("oxygen and nitrogen may be left blank where the function does without them, and are asked for by it where not", () => {
    const dry = { gross_v_d: "20200", H_d_percent: "6.1", moisture_percent: "8" };
    expect(filled("FUEL.NET", { ...dry, condition: "constant-volume" })).toMatchObject({
      formula: '=STILL.FUEL.NET(20200,6.1,,,8,"constant-volume")',
      preview: { kind: "value", unit: "J/g" },
    });
    expect(filled("FUEL.NET", dry).preview).toMatchObject({ kind: "refused", sentence: expect.stringMatching(/^Oxygen|^O /) });
  });
});

describe("a table", () => {
  const acids = { total_acid: "11.737", concentration: "0.1", sulfur_percent: "1.2", mass: "0.9", convention: "separated" };

  test("shows its first lines as label, value, unit, and how much it fills", () => {
    const block = registry.get("CAL.ACIDS")?.([[11.737]], [[0.1]], [[1.2]], [[0.9]], [["separated"]]) ?? [];
    const { preview } = filled("CAL.ACIDS", acids);
    expect(preview).toMatchObject({ kind: "table", rest: expect.stringContaining(`fills ${block.length} rows of 4 cells.`) });
    const [label, value, unit] = block[0] ?? [];
    expect(preview.kind === "table" && preview.lines[0]).toEqual({ label, value: shown(value, 8), unit });
  });

  test("never hides a warning", () => {
    const long = { pressure: "40 atm", volume: "340", sample_mass: "1", water_mass: "5", temperature: "25" };
    const { preview } = filled("CAL.CERTIFICATE.REPORT", long);
    const warning = "Water load 14.7059 g/L is outside 2 to 4 g/L, the limits of the certificate's condition factor";
    expect(preview.kind === "table" && preview.lines.map(({ value }) => value)).toContain(warning);
  });

  test("keeps eight lines and whatever warns behind them", () => {
    const rows = [
      ...Array.from({ length: 12 }, (_, at) => [`line ${at}`, at, "J", ""]),
      ["caution", "hot", "", ""],
      ["warning", "steep", "", ""],
    ];
    expect(isUpright(rows)).toBe(true);
    expect(firstLines(rows, String).map(({ label }) => label)).toEqual([
      ...Array.from({ length: 8 }, (_, at) => `line ${at}`),
      "caution",
      "warning",
    ]);
  });

  test("is told from a heading with rows of runs, which stays as it is", () => {
    expect(
      isUpright([
        ["mean [J/g]", "verdict", "x", "warnings"],
        [1, "agree", 2, "none"],
      ]),
    ).toBe(false);
    const { preview } = filled("FUEL.AGREE", { values: "{28000,28100;27900,27950}", repeatability: "120" });
    expect(preview.kind === "value" && preview.rows.length).toBe(3);
  });
});

describe("the fields", () => {
  const fieldOf = (id: string, name: string) => laboratoryFields(entryOf(id)).find((field) => field.name === name);

  test("a list asks for a range, a formula says how a cell is meant, a choice has its words", () => {
    expect(fieldOf("CAL.RISE", "times")?.description).toMatch(/ A range such as B2:B40$/);
    expect(fieldOf("CAL.RISE", "fire")?.description).toMatch(/ A value, or a range such as B2:B40$/);
    expect(fieldOf("FUEL.AGREE", "values")?.description).toMatch(/ A range such as B2:D9$/);
    expect(fieldOf("FUEL.COMBUSTION", "formula")).toMatchObject({ role: "text", description: expect.stringContaining("=B2") });
    expect(fieldOf("CAL.CHARGE", "formula")?.description).toMatch(/ A cell with its equals sign: =B2, or a range such as B2:B40$/);
    expect(fieldOf("CAL.STANDARD", "form")).toMatchObject({ role: "choice", usual: "full", words: ["full", "three-term", "percent"] });
  });

  test("more than four optional ones are folded", () => {
    expect(foldedFields(laboratoryFields(entryOf("CAL.STANDARD"))).map(({ name }) => name)).toEqual([
      "nitric_mol",
      "sulfuric_mol",
      "temperature",
      "density",
      "form",
    ]);
    expect(foldedFields(laboratoryFields(entryOf("FUEL.NET")))).toEqual([]);
  });

  test("plain times are shown in the unit that is named for them", () => {
    const fields = laboratoryFields(entryOf("CAL.RISE"));
    const units = (typed: string) => fields.map((field) => unitNow(field, fields, ({ name }) => (name === "time_unit" ? typed : "")));
    expect(units(" ").slice(0, 4)).toEqual(["min", "\u00b0C", "min", "min"]);
    expect(units("s").slice(0, 4)).toEqual(["s", "\u00b0C", "s", "s"]);
  });

  test("a function and its report share what was typed, two functions never do", () => {
    expect(draftKey("CAL.RISE.REPORT")).toBe("CAL.RISE");
    expect(new Set(functions.map(({ id }) => draftKey(id))).size).toBe(
      functions.length - functions.filter(({ id }) => /\.REPORT$/.test(id)).length,
    );
  });
});

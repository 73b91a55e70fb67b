import { handbook, type HandbookParameter } from "../../src/handbook";
import { suggestedTexts } from "../../src/pane/suggestions";
import { choicesOf, suggestionsOf, usualWord } from "../../src/pane/wording";
import { choiceWord, labelWord } from "../../src/pane/words";

const parameter = (description: string, more: Partial<HandbookParameter> = {}): HandbookParameter => ({
  name: "x",
  description,
  unit: "-",
  kind: "value",
  optional: false,
  ...more,
});

describe("words in quotes", () => {
  test("are a choice where they are all that is taken", () => {
    expect(choicesOf(parameter('"separated" or "total"; the two never mix'))).toEqual(["separated", "total"]);
    expect(choicesOf(parameter('"full" if left out, "percent"; "full" is exact'))).toEqual(["full", "percent"]);
  });

  test.each([
    ["examples", parameter('Formula such as "C7H6O2"')],
    ["numbers too", parameter('Left out: derived. "astm-d240", or one number')],
    ["a quantity", parameter('Limit, "0.13 MJ/kg" or "iso-1928"', { unit: "J/g" })],
    ["a list", parameter('"a" or "b", one for each', { kind: "list" })],
    ["no words", parameter("Corrected rise")],
  ])("are none with %s", (_name, given) => {
    expect(choicesOf(given)).toEqual([]);
  });

  test("are suggested otherwise, except quantities and what belongs to another word", () => {
    expect(suggestionsOf(parameter('Left out: derived. "astm-d240", or one number'))).toEqual(["astm-d240"]);
    expect(suggestionsOf(parameter('Pressure such as "30 atm" or "-3.2 kJ/mol" or "(g)"'))).toEqual([]);
    expect(suggestionsOf(parameter('"separated" or "total"'))).toEqual([]);
  });

  test("tell the one that counts if the argument is left out", () => {
    expect(usualWord('"energy" if left out (gross value), "enthalpy"')).toBe("energy");
    expect(usualWord('"separated" or "total"')).toBe("");
  });
});

/** Every choice of the two laboratory families, as their help tells it. */
const CHOICES: Readonly<Record<string, readonly string[]>> = {
  "CAL.RISE method": ["regnault-pfaundler", "dickinson", "dickinson-63", "adiabatic"],
  "CAL.CERTIFICATE beyond": ["beyond limits"],
  "CAL.SULFURIC convention": ["separated", "total"],
  "CAL.HEATOF kind": [
    "nickel-chromium wire",
    "iron wire",
    "platinum wire",
    "copper wire",
    "cotton",
    "paraffin oil",
    "polyethylene",
    "gelatin",
    "benzoic acid",
  ],
  "CAL.ACIDS convention": ["separated", "total"],
  "CAL.STANDARD form": ["full", "three-term", "percent"],
  "CAL.CHARGE unknown": ["unknown"],
  "FUEL.BASIS from": ["ad", "d", "ar", "daf"],
  "FUEL.BASIS to": ["ad", "d", "ar", "daf"],
  "FUEL.DRY element": ["H", "O", "C", "N", "S", "Cl", "F", "ash"],
  "FUEL.NET condition": ["constant-pressure", "constant-volume"],
  "FUEL.COMBUSTION given": ["energy", "enthalpy", "formation"],
};

test("the choices of the laboratory are those of its help", () => {
  const found = handbook
    .filter(({ family, id }) => ["calorimeter", "fuel"].includes(family) && !id.endsWith(".REPORT"))
    .flatMap(({ id, parameters }) => parameters.map((one) => [`${id} ${one.name}`, choicesOf(one)] as const))
    .filter(([, words]) => words.length > 0);
  expect(Object.fromEntries(found)).toEqual(CHOICES);
});

test("editions and methods are suggested beside numbers", () => {
  const of = (id: string, name: string) =>
    suggestedTexts(handbook.find((entry) => entry.id === id)?.parameters.find((one) => one.name === name) as HandbookParameter);
  expect(of("FUEL.NET", "constants")).toContain("iso-1928-2009");
  expect(of("FUEL.LIQUIDNET", "constants")).toEqual(["astm-d240"]);
  expect(of("FUEL.AGREE", "repeatability")).toEqual(expect.arrayContaining(["iso-1928", "astm-d240"]));
  expect(of("CAL.RISE", "time_unit")).toEqual(["s", "h"]);
  expect(of("FUEL.COMBUSTION", "formula")).toEqual([]);
});

test.each([
  ["gross_v_d", "Gross value, constant volume, dry"],
  ["H_d_percent", "Hydrogen, dry"],
  ["value_ad_percent", "Value, as analysed"],
  ["moisture_ar_percent", "Moisture, as received"],
  ["sulfuric_mol", "Sulfuric acid"],
  ["specific_energy", "Specific energy"],
  ["T1", "T1"],
  ["to", "To"],
])("%s is labelled %s", (name, label) => {
  expect(labelWord(name)).toBe(label);
});

test("a basis says what its letters mean", () => {
  expect(choiceWord("daf")).toBe("daf, dry ash-free");
  expect(choiceWord("cotton")).toBe("cotton");
});

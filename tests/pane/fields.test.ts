import "../../src/functions";
import { registry } from "../../src/functions/registry";
import { handbook, helpOf, type HandbookEntry } from "../../src/handbook";
import { argumentsOf, cautionOf, fieldsOf, firstFunction, functionsForSubstance } from "../../src/pane/fields";
import { OMITTED, writeFormula } from "../../src/pane/formula";
import { limitsOf } from "../../src/pane/limits";
import { previewOf } from "../../src/pane/preview";
import { subjectOf } from "../../src/pane/subject";
import { suggestedUnits } from "../../src/pane/suggestions";
import { shown } from "../../src/pane/numbers";

/** Molar gas constant, J/(mol K), exact (SI 2019). */
const R = 8.31446261815324;
const functions = functionsForSubstance(handbook);
const entryOf = (id: string): HandbookEntry => helpOf(id) as HandbookEntry;

/** Formula and preview for a function with some fields filled. */
function filled(id: string, substance: string, typed: Record<string, string> = {}) {
  const entry = entryOf(id);
  const subject = subjectOf(substance);
  const fields = fieldsOf(entry, subject);
  const args = argumentsOf(subject, fields, (field) => typed[field.name] ?? field.initial);
  return { formula: writeFormula(id, args), preview: previewOf(entry, fields, args), args };
}

describe("the functions for one substance", () => {
  test("hold properties and heat of the function book, and nothing that wants a list", () => {
    const ids = functions.map(({ id }) => id);
    for (const id of ["CV.AT", "CP.AT", "CV.MEAN", "ENERGY", "ENTHALPY", "ENTROPY", "HEAT", "HEAT.FINALTEMP"]) expect(ids).toContain(id);
    for (const id of ["MIX", "UNITS", "SOURCE.CHECK"]) expect(ids).not.toContain(id);
  });

  test("start with Cv for a gas and with Cp for a liquid", () => {
    expect(firstFunction(functions, subjectOf("N2"))?.id).toBe("CV.AT");
    expect(firstFunction(functions, subjectOf("H2O(l)"))?.id).toBe("CP.AT");
  });

  test("every one of them gives a value, not a refusal, with the fields as they start", () => {
    const waiting = functions.filter(({ id }) => filled(id, "N2").preview.kind !== "value").map(({ id }) => [id, filled(id, "N2").preview]);
    expect(waiting).toEqual([]);
  });

  test("heat shows a caution, a property none", () => {
    expect(cautionOf("heat")).toMatch(/licensed practice govern/);
    expect(cautionOf("properties")).toBe("");
  });
});

describe("formula and preview", () => {
  test("fields start inside the range of the first choice", () => {
    expect(filled("CV.AT", "N2").formula).toBe('=STILL.CV.AT("N2",298.15)');
    const ice = fieldsOf(entryOf("CP.AT"), subjectOf("H2O(cr)"))[0];
    expect(Number(ice?.initial)).toBeLessThanOrEqual(273.15);
  });

  test("the preview is the worksheet function's own number", () => {
    const value = registry.get("CV.AT")?.([["N2"]], [[500]])[0]?.[0];
    expect(filled("CV.AT", "N2", { temperature: "500" }).preview).toEqual({ kind: "value", rows: [[shown(value)]], unit: "J/(mol K)" });
  });

  test("unit and set reach the formula and the preview", () => {
    const { formula, preview } = filled("CV.AT", "N2", { temperature: "500", unit: "kJ/(kg K)", set: "gri-1999" });
    expect(formula).toBe('=STILL.CV.AT("N2",500,"kJ/(kg K)","gri-1999")');
    expect(preview).toMatchObject({ kind: "value", unit: "kJ/(kg K)" });
  });

  test("a temperature outside the range is refused in the words of the cell", () => {
    const { preview } = filled("CV.AT", "CO2", { temperature: "5200", set: "gri-1999" });
    expect(preview).toEqual({ kind: "refused", sentence: "Temperature 5200 K is above 3500 K, the upper limit of gri-1999 for CO2" });
  });

  test("an empty required field waits, a cell is left to the sheet", () => {
    expect(filled("CV.AT", "N2", { temperature: "" }).preview).toEqual({
      kind: "waiting",
      sentence: "Temperature is needed, in K or with its unit.",
    });
    expect(filled("CV.AT", "N2", { temperature: "B2" })).toMatchObject({ formula: '=STILL.CV.AT("N2",B2)', preview: { kind: "sheet" } });
  });

  test("an optional argument in the middle stays left out", () => {
    const { args } = filled("ENTROPY", "N2", { unit: "J/(g K)" });
    expect(args[2]).toEqual(OMITTED);
    expect(filled("ENTROPY", "N2", { unit: "J/(g K)" }).formula).toBe('=STILL.ENTROPY("N2",298.15,,"J/(g K)")');
  });

  test("a liquid's Cv is refused with the way out", () => {
    expect(filled("CV.AT", "H2O(l)").preview).toMatchObject({ kind: "refused", sentence: expect.stringContaining("CP.AT") });
  });

  test("several numbers keep their unit: 5/2 R and 7/2 R", () => {
    expect(filled("CV.LIMITS", "N2").preview).toEqual({ kind: "value", rows: [[shown(2.5 * R), shown(3.5 * R)]], unit: "J/(mol K)" });
  });
});

test("every suggested unit is understood by the function it is suggested for", () => {
  const wrong = functions.flatMap((entry) =>
    suggestedUnits(entry.result.unit)
      .map((unit) => ({ id: entry.id, unit, preview: filled(entry.id, "N2", { unit }).preview }))
      .filter(({ preview }) => preview.kind !== "value"),
  );
  expect(wrong).toEqual([]);
});

describe("the lines of the chart", () => {
  test("5/2 R and 7/2 R for N2 (equipartition), one line for an atom, none for a liquid", () => {
    expect(limitsOf(subjectOf("N2")).map(({ value }) => value)).toEqual([expect.closeTo(2.5 * R, 9), expect.closeTo(3.5 * R, 9)]);
    expect(limitsOf(subjectOf("Ar"))).toEqual([{ label: "classical", value: expect.closeTo(1.5 * R, 9) }]);
    expect(limitsOf(subjectOf("H2O(l)"))).toEqual([]);
  });
});

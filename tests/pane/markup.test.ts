import { formulaRuns } from "../../src/pane/markup";

const drawn = (formula: string) =>
  formulaRuns(formula)
    .map(({ text, place }) => ({ line: text, below: `_${text}`, above: `^${text}` })[place])
    .join("");

test.each([
  ["N2", "N_2"],
  ["C2H6O", "C_2H_6O"],
  ["Ca(OH)2", "Ca(OH)_2"],
  ["C10H22", "C_10H_22"],
  ["NH4+", "NH_4^+"],
  ["Ar", "Ar"],
  ["C1.686H2", "C_1.686H_2"],
])("%s reads %s", (formula, expected) => {
  expect(drawn(formula)).toBe(expected);
});

test("no character is lost", () => {
  for (const formula of ["Al2(SO4)3", "CuSO4", "H2O", "e-", "C(gr)", "Fe0.947O"]) {
    expect(
      formulaRuns(formula)
        .map((run) => run.text)
        .join(""),
    ).toBe(formula);
  }
});

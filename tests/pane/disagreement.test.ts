import { recordsOf } from "../../src/data/library";
import { noticeOf, sentenceOf } from "../../src/pane/disagreement";
import { subjectOf } from "../../src/pane/subject";

test("heat capacity in percent, enthalpy in kJ/mol, entropy in J/(mol K), each with what is allowed", () => {
  const sets = { setA: "one", setB: "other" };
  expect(sentenceOf({ ...sets, property: "Cp", temperature: 3000, difference: -13.2, percent: -11, allowed: 1.68 })).toBe(
    "Cp at 3000 K: other lies 11\u00a0% below one; their grades allow 1.4\u00a0%.",
  );
  expect(sentenceOf({ ...sets, property: "H(298.15 K)", temperature: 298.15, difference: 2047, percent: 5.5, allowed: 1118 })).toBe(
    "H(298.15 K): other lies 2\u00a0kJ/mol above one; their grades allow 1.1\u00a0kJ/mol.",
  );
  expect(sentenceOf({ ...sets, property: "S(298.15 K)", temperature: 298.15, difference: -9.6, percent: -4, allowed: 2.2 })).toBe(
    "S(298.15 K): other lies 9.6\u00a0J/(mol K) below one; their grades allow 2.2\u00a0J/(mol K).",
  );
});

test("OH: the formation values of the sets differ by 2 kJ/mol (39.35 against 37.30), and the notice says so", () => {
  const { first } = noticeOf(subjectOf("OH"));
  expect(recordsOf("OH")[0]?.set).toBe("nasa-2002");
  expect(first.some((sentence) => /^H\(298\.15 K\): gri-1999 lies 2\.?\d*\u00a0kJ\/mol above nasa-2002/.test(sentence))).toBe(true);
});

test("sets that agree give no notice, nor does a mixture", () => {
  expect(noticeOf(subjectOf("Ar"))).toEqual({ first: [], others: [] });
  expect(noticeOf(subjectOf("air"))).toEqual({ first: [], others: [] });
});

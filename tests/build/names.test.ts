import { brokenRule, camelCase, storedName } from "../../src/build/names.mjs";

test.each(["CV.AT", "HEAT", "MIX.TABLE", "GAMMA", "ENERGY", "UNITS", "ABCD12", "XFE1", "ABC12.ONE"])("%s is a good name", (id) => {
  expect(brokenRule(id)).toBeUndefined();
});

test.each<[string, RegExp]>([
  ["CV", /fewer than 3/],
  ["1ST", /does not start with a capital letter/],
  ["CV_AT", /something else than capitals/],
  ["CV..AT", /something else than capitals/],
  ["XFD1048576", /cell address/], // the last cell of a sheet
  ["CO2", /cell address/],
  ["R1C1", /cell address/],
  ["RUN", /old macro/],
  ["ECHO", /old macro/],
  ["GET.CELL", /old macro/],
])("%s is refused", (id, rule) => {
  expect(brokenRule(id)).toMatch(rule);
});

test("a row or a column beyond the sheet is no address", () => {
  expect(brokenRule("XFD1048577")).toBeUndefined();
  expect(brokenRule("XFE1048576")).toBeUndefined();
});

test("ids become TypeScript names and stored names", () => {
  expect(["CV.AT", "GAMMA", "CAL.RISE.REPORT"].map(camelCase)).toEqual(["cvAt", "gamma", "calRiseReport"]);
  expect(storedName("CAL.RISE.REPORT")).toBe("CAL_RISE_REPORT");
});

import { tabAfter } from "../../src/pane/tabs";

test.each([
  ["ArrowRight", 0, 1],
  ["ArrowRight", 1, 0],
  ["ArrowLeft", 0, 1],
  ["ArrowLeft", 1, 0],
  ["Home", 1, 0],
  ["End", 0, 1],
  ["Tab", 0, undefined],
  ["Enter", 0, undefined],
  ["ArrowDown", 0, undefined],
])("%s from tab %i of two leads to %j", (key, at, expected) => {
  expect(tabAfter(key, at, 2)).toBe(expected);
});

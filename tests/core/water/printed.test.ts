import { roundsTo } from "./printed";

test.each([
  [0.9924183524, "0.992418352e-1", false],
  [0.09924183524, "0.992418352e-1", true],
  [0.0992418353, "0.992418352e-1", false],
  [-0.364366650049, "-0.364366650", true],
  [-0.3643666511, "-0.364366650", false],
  [481.20036049, "0.481200360e3", true],
])("%d against %s: %s", (value, printed, isEqual) => {
  expect(roundsTo(value, printed)).toBe(isEqual);
});

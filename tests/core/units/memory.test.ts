/** Bounded memory, the nearest names, and exact ratios as doubles. */
import { BoundedMap } from "../../../src/core/units/bounded";
import { nearest } from "../../../src/core/units/nearest";
import { toRatio } from "../../../src/core/units/ratio";
import { parseQuantity, parseUnit } from "../../../src/core/units";

test("the memory never holds more than its limit, and gives what was put in last", () => {
  const memory = new BoundedMap<number>(10);
  for (let i = 0; i < 1000; i++) {
    memory.set(String(i), i);
    expect(memory.size).toBeLessThanOrEqual(10);
    expect(memory.get(String(i))).toBe(i);
  }
  expect(memory.get("3")).toBeUndefined();
});

test("the same text gives the same object, frozen", () => {
  expect(parseUnit("kJ/(kg K)")).toBe(parseUnit("kJ/(kg K)"));
  expect(parseQuantity("2.5 bar")).toBe(parseQuantity("2.5 bar"));
  expect(Object.isFrozen(parseUnit("kJ"))).toBe(true);
  expect(Object.isFrozen(parseQuantity("2.5 bar"))).toBe(true);
});

test("a hundred thousand different quantities are read without trouble", () => {
  let wrong = 0;
  for (let i = 0; i < 100000; i++) if (parseQuantity(`${i} kJ`).value !== i) wrong++;
  expect(wrong).toBe(0);
});

test("nearest names: exchanged, missing and wrong letters, case as a tenth of one", () => {
  const names = ["bar", "mbar", "MPa", "kPa", "mol", "kelvin"];
  expect(nearest("bra", names)).toEqual(["bar"]);
  expect(nearest("mpa", names)[0]).toBe("MPa");
  expect(nearest("kelvn", names)).toEqual(["kelvin"]);
  expect(nearest("zzzz", names)).toEqual([]);
  expect(nearest("b".repeat(40), names)).toEqual([]);
});

test("a ratio whose integers do not fit in a double is rounded once", () => {
  expect(toRatio(801088317n, 5n * 10n ** 27n)).toEqual({ scale: 1.602176634e-19, numerator: 1.602176634e-19, denominator: 1 });
  expect(toRatio(10n ** 40n + 1n, 3n).scale).toBe(Number(`3.${"3".repeat(38)}7e39`));
  expect(toRatio(5n, 9n)).toEqual({ scale: 5 / 9, numerator: 5, denominator: 9 });
});

/** Conversions as properties over every accepted spelling, and temperatures as points and as intervals. */
import fc from "fast-check";
import { fromBase, intervalFromBase, intervalToBase, isUnit, parseQuantity, parseUnit, toBase } from "../../../src/core/units";
import { acceptedSpellings } from "../../../src/core/units/names";
import { unitRows } from "../../../src/core/units/table";
import { decimal, lastPlace, ulpsApart } from "./exact-decimal";

const anySpelling = fc.constantFrom(...acceptedSpellings());
const anyValue = fc.double({ min: 1e-12, max: 1e12, noNaN: true });

test("every accepted spelling is read, and has a positive size", () => {
  expect(acceptedSpellings().length).toBeGreaterThan(150);
  for (const spelling of acceptedSpellings()) {
    const { scale, numerator, denominator } = parseUnit(spelling);
    expect([spelling, scale > 0 && Number.isFinite(scale), numerator / denominator]).toEqual([spelling, true, scale]);
  }
});

const powersOfTen: Readonly<Record<string, string>> = {
  T: "1e12",
  G: "1e9",
  M: "1e6",
  MM: "1e6",
  k: "1e3",
  h: "1e2",
  d: "1e-1",
  c: "1e-2",
  m: "1e-3",
  μ: "1e-6",
  n: "1e-9",
};

test("every prefix multiplies its unit by its printed power of ten (SI brochure, table 7)", () => {
  for (const { spellings, prefixes } of unitRows) {
    for (const prefix of prefixes?.split(" ") ?? []) {
      const bare = parseUnit(spellings[0]!);
      const exact = decimal(String(bare.numerator))
        .div(decimal(String(bare.denominator)))
        .times(decimal(powersOfTen[prefix]!));
      expect([prefix + spellings[0], ulpsApart(parseUnit(prefix + spellings[0]!).scale, exact) <= 1]).toEqual([
        prefix + spellings[0],
        true,
      ]);
    }
  }
});

test("to the base and back returns the value within two units of the last place", () => {
  fc.assert(
    fc.property(anySpelling, anyValue, (spelling, value) => {
      const unit = parseUnit(spelling);
      const back = intervalFromBase(intervalToBase(value, unit), unit);
      expect(Math.abs(back - value)).toBeLessThanOrEqual(2 * lastPlace(value));
    }),
    { numRuns: 2000 },
  );
});

test("one multiplication or division is correctly rounded: whole numbers of grams, litres, kilojoules", () => {
  for (const [text, per] of [
    ["g", "1000"],
    ["mL", "1000000"],
    ["%", "100"],
    ["µmol", "1000000"],
  ] as const) {
    const off = Array.from({ length: 999 }, (_, i) => ulpsApart(toBase(i + 1, parseUnit(text)), decimal(`${i + 1}/${per}`)));
    expect([text, Math.max(...off) <= 0.5]).toEqual([text, true]);
  }
});

test("a printed quantity is read back bit for bit", () => {
  fc.assert(
    fc.property(anySpelling, fc.double({ noNaN: true, noDefaultInfinity: true }), (spelling, value) => {
      const { value: read, unit } = parseQuantity(`${value} ${spelling}`);
      expect(read).toBe(value + 0); // String(-0) is 0
      expect(unit).toBe(parseUnit(spelling));
    }),
  );
});

test("a compound unit is the product of its parts, with every way of writing it", () => {
  fc.assert(
    fc.property(anySpelling, anySpelling, anySpelling, (a, b, c) => {
      const product = parseUnit(`${a}/(${b} ${c})`);
      expect(parseUnit(`${a} / ${b} / ${c}`).scale).toBe(product.scale);
      expect(parseUnit(`${a}·${b}^-1·${c}⁻¹`).scale).toBe(product.scale);
      const [x, y, z] = [parseUnit(a), parseUnit(b), parseUnit(c)];
      const expected = x.numerator / x.denominator / ((y.numerator / y.denominator) * (z.numerator / z.denominator));
      expect(Math.abs(product.scale / expected - 1)).toBeLessThan(2e-15); // four roundings of 1.1e-16 each and the quotient
    }),
    { numRuns: 500 },
  );
});

test("arbitrary text is read or refused, and never breaks", () => {
  const piece = fc.oneof(
    anySpelling,
    fc.constantFrom("/", "*", "(", ")", "^", "-1", "2", " ", "·", "°", "_", "%", "."),
    fc.string({ maxLength: 3 }),
  );
  fc.assert(
    fc.property(fc.array(piece, { maxLength: 8 }), (pieces) => {
      const text = pieces.join("");
      if (!isUnit(text)) return;
      const { scale, dimension } = parseUnit(text);
      expect(scale).toBeGreaterThan(0);
      expect(dimension).not.toBe("");
    }),
    { numRuns: 3000 },
  );
});

test("temperatures: points on a scale alone, intervals in a rise and in compound units", () => {
  const [celsius, fahrenheit, rankine] = [parseUnit("°C"), parseUnit("°F"), parseUnit("°R")];
  expect(toBase(25, celsius)).toBe(298.15);
  expect(fromBase(298.15, celsius)).toBe(25);
  expect(toBase(77, fahrenheit)).toBe(298.15);
  expect(fromBase(298.15, fahrenheit)).toBe(77);
  expect(toBase(32, fahrenheit)).toBe(273.15);
  expect(toBase(-459.67, fahrenheit)).toBeCloseTo(0, 12);
  expect(toBase(491.67, rankine)).toBe(273.15);
  expect(intervalToBase(9, fahrenheit)).toBe(5);
  expect(intervalToBase(9, celsius)).toBe(9);
  expect(intervalFromBase(5, fahrenheit)).toBe(9);
  expect(parseUnit("J/°C")).toMatchObject({ dimension: parseUnit("J/K").dimension, scale: 1, offset: 0 });
  expect(parseUnit("K/°F").offset).toBe(0);
  expect(parseUnit("(°C)").offset).toBe(273.15);
  expect(parseUnit("°C^1").offset).toBe(273.15);
  expect(parseUnit("°C^2").offset).toBe(0);
});

test("Celsius readings agree with exact kelvins within one unit of the last place, and come back so", () => {
  const celsius = parseUnit("°C");
  let worst = 0;
  for (let hundredths = -27315; hundredths <= 300000; hundredths += 7) {
    const [reading, kelvin] = [hundredths / 100, (hundredths + 27315) / 100];
    const off = Math.max(Math.abs(toBase(reading, celsius) - kelvin), Math.abs(fromBase(kelvin, celsius) - reading));
    worst = Math.max(worst, off / lastPlace(Math.max(kelvin, 273.15)));
  }
  expect(worst).toBeLessThanOrEqual(1);
});

test("Fahrenheit agrees with the defining equation within one unit of the last place at 300 K", () => {
  fc.assert(
    fc.property(fc.integer({ min: -100000, max: 500000 }), (hundredths) => {
      const reading = hundredths / 100;
      const exact = decimal(String(reading)).plus(decimal("459.67")).times(5).div(9); // NIST SP 811, appendix B.8
      expect(Math.abs(toBase(reading, parseUnit("°F")) - exact.toNumber())).toBeLessThanOrEqual(lastPlace(3000));
      expect(Math.abs(fromBase(exact.toNumber(), parseUnit("°F")) - reading)).toBeLessThanOrEqual(lastPlace(5000));
    }),
  );
});

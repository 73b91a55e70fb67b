import fc from "fast-check";
import type { HeatStore } from "../../../src/core/vessel/types";
import { constantStore, heatBetween, wallStore } from "../../../src/core/vessel/wall";
import { type Warming, warmUpTemperature, warmUpTime } from "../../../src/core/vessel/warm-up";
import type { WallForm } from "../../../src/core/vessel/wall-forms";
import { readWall } from "../../../src/functions/vessel-wall";
import { refusedWith } from "../refused";

const AMBIENT = 298.15;
const warming = (power: number, loss: number, ambient = AMBIENT): Warming => ({ power, loss, ambient });
const THIRTY = constantStore(30_000, "30 kJ/K");
const steel = readWall("60 kg carbon steel")!;

/** C = a + b T between 1 K and 5000 K, J/K, as a polynomial that the solver does not know to be simple. */
function straight(a: number, b: number): HeatStore {
  const form: WallForm = { form: "polynomial", temperature: "K", from: 1, to: 5000, exponents: [0, 1], coefficients: [a, b] };
  return wallStore(1, form, "straight", "straight");
}

/** 1000 J/K, and 5000 J at 400 K: ice in a vessel, so to speak. */
const melting: HeatStore = {
  label: "melting",
  from: 200,
  to: 600,
  fromLabel: "melting",
  toLabel: "melting",
  joints: [400],
  capacity: () => 1000,
  heat: (temperature) => 1000 * temperature + (temperature > 400 ? 5000 : 0),
};

describe("constant capacity", () => {
  test("30 kJ/K, 500 W, 2 W/K, 25 °C to 100 °C: 5350 s; 4500 s without loss; computed apart from this program", () => {
    expect(warmUpTime(THIRTY, warming(500, 2), 298.15, 373.15)).toBeCloseTo(15_000 * Math.log(250 / 175), 8);
    expect(warmUpTime(THIRTY, warming(500, 2), 298.15, 373.15)).toBeCloseTo(5350, -1);
    expect(warmUpTime(THIRTY, warming(500, 0), 298.15, 373.15)).toBe(4500);
  });

  test("cooling: Newton's law, half of the excess after (C/UA) ln 2", () => {
    expect(warmUpTime(THIRTY, warming(0, 2), 398.15, 348.15)).toBeCloseTo(15_000 * Math.LN2, 8);
    expect(warmUpTemperature(THIRTY, warming(0, 2), 398.15, 15_000 * Math.LN2)).toBeCloseTo(348.15, 10);
  });

  test("a loss that fades to nothing gives the time without loss", () => {
    expect(warmUpTime(THIRTY, warming(500, 1e-13), 298.15, 373.15)).toBeCloseTo(4500, 8);
  });

  test("after a long time T_max, 275 °C, and never above it", () => {
    expect(warmUpTemperature(THIRTY, warming(500, 2), 298.15, 1e9)).toBe(548.15);
    expect(warmUpTemperature(THIRTY, warming(500, 2), 548.15, 1e9)).toBe(548.15);
    expect(warmUpTemperature(THIRTY, warming(0, 0), 400, 1e9)).toBe(400);
  });

  test("no way is no time, no time is no way", () => {
    expect(warmUpTime(THIRTY, warming(0, 0), 300, 300)).toBe(0);
    expect(warmUpTemperature(steel, warming(500, 2), 300, 0)).toBe(300);
  });

  test("the quadrature gives what the closed form gives", () =>
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 1e5, noNaN: true }),
        fc.double({ min: 0, max: 100, noNaN: true }),
        fc.double({ min: 0.01, max: 0.9999, noNaN: true }),
        (power, loss, share) => {
          const reach = Math.min(600, loss > 0 ? power / loss : 600);
          const to = 298.15 + share * reach;
          const closed = warmUpTime(constantStore(1234, ""), warming(power, loss), 298.15, to);
          expect(Math.abs(warmUpTime(straight(1234, 0), warming(power, loss), 298.15, to) / closed - 1)).toBeLessThan(1e-11);
        },
      ),
    ));
});

describe("capacity by temperature", () => {
  test("without loss the time is the heat by the power", () => {
    for (const to of [400, 873.15, 900, 1008.15, 1100, 1473.15])
      expect(warmUpTime(steel, warming(10_000, 0), 300, to) / (heatBetween(steel, 300, to) / 10_000)).toBeCloseTo(1, 11);
  });

  test("C = a + b T: t UA = (a + b T_max) ln[(T_max − T1)/(T_max − T2)] − b (T2 − T1)", () =>
    fc.assert(
      fc.property(
        fc.double({ min: 100, max: 1e4, noNaN: true }),
        fc.double({ min: 0, max: 20, noNaN: true }),
        fc.double({ min: 0.1, max: 50, noNaN: true }),
        fc.double({ min: 0.01, max: 0.999999, noNaN: true }),
        fc.boolean(),
        (a, b, loss, share, cooling) => {
          const start = cooling ? 900 : 280;
          const [power, last] = [loss * 300, AMBIENT + 300];
          const to = start + share * (last - start);
          const exact = ((a + b * last) * Math.log((last - start) / (last - to)) - b * (to - start)) / loss;
          expect(Math.abs(warmUpTime(straight(a, b), warming(power, loss), start, to) / exact - 1)).toBeLessThan(1e-9);
        },
      ),
    ));

  test("carbon steel past 600 °C as by small steps of Runge and Kutta", () => {
    const course = warming(10_000, 5);
    const slope = (temperature: number) => (10_000 - 5 * (temperature - AMBIENT)) / steel.capacity(temperature);
    let temperature = 298.15;
    const step = 0.5;
    for (let elapsed = 0; elapsed < 2900; elapsed += step) {
      const k1 = slope(temperature);
      const k2 = slope(temperature + (step / 2) * k1);
      const k3 = slope(temperature + (step / 2) * k2);
      const k4 = slope(temperature + step * k3);
      temperature += (step / 6) * (k1 + 2 * k2 + 2 * k3 + k4);
    }
    // the steps cross the small jump of the capacity at 600 °C, which costs them some 5e-6 K
    expect(temperature).toBeGreaterThan(940);
    expect(Math.abs(warmUpTemperature(steel, course, 298.15, 2900) - temperature)).toBeLessThan(2e-5);
  });

  test("two legs take as long as the whole", () =>
    fc.assert(
      fc.property(fc.double({ min: 300, max: 1300, noNaN: true }), (half) => {
        const course = warming(20_000, 10);
        const whole = warmUpTime(steel, course, 299, 1301);
        expect(warmUpTime(steel, course, 299, half) + warmUpTime(steel, course, half, 1301)).toBeCloseTo(whole, 6);
      }),
    ));
});

describe("heat taken up at one temperature", () => {
  test("counts in the time, at the net power there, upwards and downwards", () => {
    expect(warmUpTime(melting, warming(100, 0), 350, 450)).toBeCloseTo((100 * 1000 + 5000) / 100, 8);
    const net = 600 - 2 * (400 - AMBIENT);
    const without = warmUpTime(constantStore(1000, ""), warming(600, 2), 350, 450);
    expect(warmUpTime(melting, warming(600, 2), 350, 450)).toBeCloseTo(without + 5000 / net, 7);
    const cooling = warmUpTime(constantStore(1000, ""), warming(0, 2), 450, 350);
    expect(warmUpTime(melting, warming(0, 2), 450, 350)).toBeCloseTo(cooling + 5000 / (2 * (400 - AMBIENT)), 7);
  });

  test("the joint itself is before the step: up to it no step, down to it the step", () => {
    expect(warmUpTime(melting, warming(100, 0), 350, 400)).toBeCloseTo(500, 9);
    expect(warmUpTime(melting, warming(100, 0), 400, 450)).toBeCloseTo(550, 9);
    const cooling = warmUpTime(constantStore(1000, ""), warming(0, 2), 450, 400);
    expect(warmUpTime(melting, warming(0, 2), 450, 400)).toBeCloseTo(cooling + 5000 / (2 * (400 - AMBIENT)), 7);
  });

  test("meanwhile the temperature stands still", () => {
    const at = (time: number) => warmUpTemperature(melting, warming(100, 0), 350, time);
    expect(at(499)).toBeCloseTo(399.9, 9);
    expect([at(501), at(525), at(549)]).toEqual([400, 400, 400]);
    expect(at(551)).toBeCloseTo(400.1, 9);
    const start = warmUpTime(constantStore(1000, ""), warming(0, 2), 450, 400);
    expect(warmUpTemperature(melting, warming(0, 2), 450, start + 10)).toBe(400);
  });
});

describe("the temperature after a time undoes the time to a temperature", () => {
  const cases: readonly (readonly [string, HeatStore, Warming, number, number])[] = [
    ["constant, heated", THIRTY, warming(500, 2), 298.15, 548],
    ["constant, without loss", THIRTY, warming(500, 0), 298.15, 2000],
    ["carbon steel over its peak", steel, warming(20_000, 10), 298.15, 1473.15],
    ["carbon steel, without loss", steel, warming(20_000, 0), 298.15, 1473.15],
    ["carbon steel towards T_max inside the peak", steel, warming(7100, 10), 298.15, 1008.1],
    ["carbon steel, cooling", steel, warming(0, 10, 293.15), 1473.15, 293.5],
    ["with a step", melting, warming(600, 2), 210, 590],
  ];

  test.each(cases)("%s", (_, store, course, from, to) =>
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (share) => {
        const temperature = from + share * (to - from);
        const time = warmUpTime(store, course, from, temperature);
        const back = warmUpTemperature(store, course, from, time);
        expect(Math.abs(back / temperature - 1)).toBeLessThan(1e-9);
        if (time > 0) expect(Math.abs(warmUpTime(store, course, from, back) - time)).toBeLessThan(1e-9 * Math.max(1, time) + 1e-8);
      }),
    ),
  );
});

describe("refusals", () => {
  test.each([
    [
      () => warmUpTime(THIRTY, warming(500, 2), 298.15, 573.15),
      "range: Temperature to 573.15 K is not reached from 298.15 K: with 500 W, and a loss of 2 W/K to 298.15 K, the temperature tends to T_max = 548.15 K",
    ],
    [
      () => warmUpTime(THIRTY, warming(500, 2), 298.15, 548.15),
      "range: Temperature to 548.15 K is not reached from 298.15 K: with 500 W, and a loss of 2 W/K to 298.15 K, the temperature tends to T_max = 548.15 K",
    ],
    [
      () => warmUpTime(THIRTY, warming(500, 2), 373.15, 298.15),
      "range: Temperature to 298.15 K is not reached from 373.15 K: with 500 W, and a loss of 2 W/K to 298.15 K, the temperature tends to T_max = 548.15 K",
    ],
    [
      () => warmUpTime(THIRTY, warming(0, 2), 298.15, 300),
      "range: Temperature to 300 K is not reached from 298.15 K: with 0 W, and a loss of 2 W/K to 298.15 K, the temperature tends to T_max = 298.15 K",
    ],
    [
      () => warmUpTime(THIRTY, warming(500, 0), 373.15, 298.15),
      "range: Temperature to 298.15 K is not reached from 373.15 K: with 500 W and no loss the temperature only rises, without a T_max",
    ],
    [
      () => warmUpTime(THIRTY, warming(0, 0), 300, 310),
      "input: Temperature to 310 K is not reached from 300 K: without power and loss the temperature stays as it is",
    ],
    [
      () => warmUpTime(steel, warming(500, 2), 200, 300),
      "range: Temperature from 200 K is below 223.15 K, the lower limit of the capacity held below 293.15 K of en-1993-1-2 for carbon steel (structural)",
    ],
    [
      () => warmUpTime(steel, warming(1e5, 0), 298.15, 1500),
      "range: Temperature to 1500 K is above 1473.15 K, the upper limit of en-1993-1-2 for carbon steel (structural)",
    ],
    [
      () => warmUpTemperature(straight(1000, 0), warming(1000, 0), 298.15, 5000),
      "range: Time 5000 s is too long: after 4701.85 s the temperature reaches 5000 K, the upper limit of straight",
    ],
    [
      () => warmUpTemperature(melting, warming(0, 2, 100), 450, 1e6),
      "range: Time 1000000 s is too long: after 634.715 s the temperature reaches 200 K, the lower limit of melting",
    ],
    [() => warmUpTime(THIRTY, warming(-5, 2), 300, 310), "range: Power -5 W is negative; 0 W lets a vessel cool"],
    [() => warmUpTime(THIRTY, warming(5, -2), 300, 310), "range: Loss -2 W/K is negative; 0 W/K is a vessel without loss"],
    [() => warmUpTime(THIRTY, warming(5, 2, 0), 300, 310), "range: Ambient temperature 0 K is not above absolute zero, 0 K"],
    [() => warmUpTemperature(THIRTY, warming(5, 2), 300, -1), "range: Time -1 s is not 0 s or above"],
  ])("%#", (call, sentence) => expect(refusedWith(call)).toBe(sentence));

  test("the time at which the range ends is that of WARMUP: 5000 J more where it melts", () => {
    const exact = 500 * Math.log(350 / 100) + 5000 / (2 * 300);
    expect(exact).toBeCloseTo(634.715, 3);
  });
});

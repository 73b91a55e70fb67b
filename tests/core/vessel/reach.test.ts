/** Heat that takes a vessel to a temperature, and the temperature that a heat takes it to: each undoes the other. */
import fc from "fast-check";
import { capacityOf, type Capacity } from "../../../src/core/capacity";
import { GAS_CONSTANT } from "../../../src/core/constants";
import { compileMixture } from "../../../src/core/mixture/compile";
import type { CubicGas } from "../../../src/core/realgas/cubic-gas";
import { GasContent } from "../../../src/core/vessel/gas-content";
import { reach, temperatureAfter } from "../../../src/core/vessel/reach";
import type { HeatStore } from "../../../src/core/vessel/types";
import { constantStore, substanceStore, sumOf, wallStore } from "../../../src/core/vessel/wall";
import { recordOf } from "../../../src/data/library";
import { wallOf } from "../../../src/data/walls";
import { EQUATIONS, mixtureOf, pureGas } from "../realgas/gases";
import { refusedWith } from "../refused";

const capacity = (species: string, set = "nasa-2002"): Capacity => capacityOf(recordOf(species, set));
const mixed = (fractions: Readonly<Record<string, number>>): Capacity =>
  compileMixture(Object.entries(fractions).map(([species, amount]) => ({ capacity: capacity(species), amount })));

const nitrogen = new GasContent(capacity("N2"), 2, 0.01);

describe("2 mol N2 in 10 L from 300 K, nasa-2002", () => {
  test("20 kJ lead to 763.70 K and 12.70 bar", () => {
    const t = temperatureAfter(nitrogen, undefined, 300, 20000);
    // Computed apart from this program; half a unit of the digits given.
    expect(Math.abs(t - 763.7)).toBeLessThan(0.0051);
    expect(Math.abs(nitrogen.at(t).pressure / 1e5 - 12.7)).toBeLessThan(0.0051);
    expect(Math.abs(nitrogen.at(300).pressure / 1e5 - 4.989)).toBeLessThan(0.00051);
    const there = reach(nitrogen, undefined, 300, t);
    expect(Math.abs(there.heat - 20000)).toBeLessThan(1e-8);
    expect([there.contents, there.wall]).toEqual([there.heat, 0]);
  });
});

describe("50 L of air beside 60 kg of steel of 0.46 kJ/(kg K), from 25 to 400 °C", () => {
  test("the gas takes 16.5 kJ, the wall 10 350 kJ, and the pressure becomes 2.288 bar", () => {
    const air = { N2: 0.78084, O2: 0.20946, Ar: 0.0093, CO2: 0.0004 };
    const amount = (101325 * 0.05) / (GAS_CONSTANT * 298.15);
    const { contents, wall, heat, after } = reach(
      new GasContent(mixed(air), amount, 0.05),
      constantStore(27600, "60 kg steel"),
      298.15,
      673.15,
    );
    // Computed from the formula apart from this program; half a unit of the digits given.
    expect(Math.abs(contents / 1000 - 16.5)).toBeLessThan(0.051);
    expect(wall).toBe(27600 * 673.15 - 27600 * 298.15);
    expect(Math.abs(wall - 10350e3)).toBeLessThan(1e-6);
    expect(heat).toBe(contents + wall);
    expect(Math.abs(after.pressure / 1e5 - 2.288)).toBeLessThan(0.00051);
  });
});

/** Vessels of many kinds: what is in them and how far their heat capacity is known here. */
const steel = wallOf("carbon steel");
const walls: readonly (HeatStore | undefined)[] = [
  undefined,
  constantStore(500, "a block"),
  substanceStore(2, capacity("Ar"), "2 mol Ar"),
  wallStore(5, steel, "5 kg steel", "the wall's source"),
  sumOf([constantStore(10, "a block"), substanceStore(1, capacity("CO2"), "1 mol CO2")]),
];
const wall = fc.constantFrom(...walls);

const AIR = { N2: 0.79, O2: 0.21 };
const contents = fc
  .record({
    kind: fc.constantFrom("ideal" as const, "pure" as const, "mixture" as const),
    species: fc.constantFrom("N2", "CO2", "C3H8", "NH3", "O2"),
    equation: fc.constantFrom(...EQUATIONS),
    looseness: fc.double({ min: Math.log(1.31), max: Math.log(1e4), noNaN: true }).map(Math.exp),
    amount: fc.double({ min: 0.01, max: 500, noNaN: true }),
  })
  .map(({ kind, species, equation, looseness, amount }) => {
    if (kind === "ideal") return new GasContent(capacity(species), amount, amount * looseness * 3e-5);
    const gas: CubicGas = kind === "pure" ? pureGas(species, equation) : mixtureOf(AIR, equation);
    return new GasContent(kind === "pure" ? capacity(species) : mixed(AIR), amount, amount * looseness * gas.b, gas);
  });
/** A place between the lowest and the highest temperature that contents and wall have, up to 1400 K. */
const place = fc.double({ min: 0, max: 1, noNaN: true });

function within(content: GasContent, wall: HeatStore | undefined): (place: number) => number {
  const [low, high] = [Math.max(content.from, wall?.from ?? 0, 215), Math.min(content.to, wall?.to ?? Infinity, 1400)];
  return (where) => low + where * (high - low);
}

/** Size of the numbers that are rounded, J: the terms of a fit, up to some 5e5 J/mol, may be larger than their sum. */
function sizeAt(content: GasContent, wall: HeatStore | undefined, t: number): number {
  return Math.abs(content.trial(t).energy) + 5e5 * content.amount + Math.abs(wall?.heat(t) ?? 0);
}

/** How far off T may be by their rounding, K. */
function rounding(content: GasContent, wall: HeatStore | undefined, from: number, to: number): number {
  const least = Math.min(...[from, to].map((t) => content.trial(t).heatCapacity + (wall?.capacity(t) ?? 0)));
  return (4 * Number.EPSILON * (sizeAt(content, wall, from) + sizeAt(content, wall, to))) / least;
}

describe("any vessel", () => {
  test("the heat that reaches T2 leads to T2, up and down, with and without a wall", () =>
    fc.assert(
      fc.property(contents, wall, place, place, (content, around, first, second) => {
        const [from, to] = [first, second].map(within(content, around)) as [number, number];
        const { heat } = reach(content, around, from, to);
        const found = temperatureAfter(content, around, from, heat);
        expect(Math.abs(found - to)).toBeLessThan(1e-9 + rounding(content, around, from, to));
      }),
      { numRuns: 1000 },
    ));

  test("the temperature after a heat needs that heat: the balance closes", () =>
    fc.assert(
      fc.property(contents, wall, place, fc.double({ min: 0.001, max: 0.999, noNaN: true }), (content, around, first, part) => {
        const at = within(content, around);
        const from = at(first);
        const heat = part * reach(content, around, from, at(1)).heat;
        if (!(heat > 0)) return;
        const to = temperatureAfter(content, around, from, heat);
        const taken = reach(content, around, from, to);
        const size = sizeAt(content, around, from) + sizeAt(content, around, to);
        expect(Math.abs(taken.heat - heat)).toBeLessThan(1e-10 * heat + 8 * Number.EPSILON * size);
      }),
      { numRuns: 500 },
    ));

  test("the way does not matter: by a temperature between, the heat is the same", () =>
    fc.assert(
      fc.property(contents, wall, place, place, place, (content, around, ...places) => {
        const [one, two, three] = places.map(within(content, around)) as [number, number, number];
        const straight = reach(content, around, one, three).heat;
        const byTwo = reach(content, around, one, two).heat + reach(content, around, two, three).heat;
        const size = [one, two, three].reduce((sum, t) => sum + sizeAt(content, around, t), 0);
        expect(Math.abs(straight - byTwo)).toBeLessThanOrEqual(4 * Number.EPSILON * size);
        expect(reach(content, around, three, one).heat + straight).toBe(0);
      }),
    ));

  test("no heat leaves the temperature as it is, to the last bit, and no change of temperature needs none", () =>
    fc.assert(
      fc.property(contents, wall, place, (content, around, first) => {
        const t = within(content, around)(first);
        expect(temperatureAfter(content, around, t, 0)).toBe(t);
        const still = reach(content, around, t, t);
        expect([still.contents, still.wall, still.heat]).toEqual([0, 0, 0]);
        expect(still.before).toEqual(still.after);
      }),
    ));
});

describe("through the end of two phases", () => {
  test.each([
    ["peng-robinson", 37.5],
    ["peng-robinson", 10],
    ["soave", 30],
    ["soave", 12],
  ] as const)("by %s, %d kg of CO2 in 50 L, from 15 °C to 60 °C and back", (equation, mass) => {
    const content = new GasContent(capacity("CO2"), mass / 0.0440095, 0.05, pureGas("CO2", equation));
    const end = content.twoPhasesUpTo!;
    expect(end).toBeGreaterThan(288.15);
    for (const to of [288.5, end - 1e-4, end + 1e-4, 310, 333.15]) {
      const { heat, before, after } = reach(content, undefined, 288.15, to);
      expect(before.phase).toBe("two-phase");
      expect(after.phase === "two-phase").toBe(to < end);
      expect(Math.abs(temperatureAfter(content, undefined, 288.15, heat) - to)).toBeLessThan(1e-9);
      expect(Math.abs(temperatureAfter(content, undefined, to, -heat) - 288.15)).toBeLessThan(1e-9);
    }
  });

  test("evaporation takes more heat than the vapour alone: 1 mol of propane in 1 L", () => {
    const content = new GasContent(capacity("C3H8"), 1, 1e-3, pureGas("C3H8"));
    const { heat } = reach(content, undefined, 250, 310);
    const ideal = reach(new GasContent(capacity("C3H8"), 1, 1e-3), undefined, 250, 310).heat;
    expect(heat).toBeGreaterThan(1.5 * ideal);
  });
});

describe("refusals", () => {
  test("a heat that leads beyond the contents", () => {
    const most = nitrogen.at(20000).energy - nitrogen.at(300).energy;
    expect(refusedWith(() => temperatureAfter(nitrogen, undefined, 300, 2 * most))).toBe(
      `range: A heat of ${Number((2 * most).toPrecision(6))} J leads beyond 20000 K, the upper limit of nasa-2002 for N2; from this start it can be at most ${Number(most.toPrecision(6))} J`,
    );
    const least = nitrogen.at(200).energy - nitrogen.at(300).energy;
    expect(refusedWith(() => temperatureAfter(nitrogen, undefined, 300, -1e6))).toBe(
      `range: A heat of -1000000 J leads beyond 200 K, the lower limit of nasa-2002 for N2; from this start it can be at least ${Number(least.toPrecision(6))} J`,
    );
    // Exactly to the end it is served.
    expect(temperatureAfter(nitrogen, undefined, 300, most)).toBe(20000);
    expect(Math.abs(temperatureAfter(nitrogen, undefined, 300, least) - 200)).toBeLessThan(1e-10);
  });

  test("a heat that leads beyond the wall", () => {
    const store = wallStore(1, steel, "1 kg steel", "the wall's source");
    const heat = reach(nitrogen, store, 300, store.to).heat;
    expect(temperatureAfter(nitrogen, store, 300, heat)).toBe(store.to);
    expect(refusedWith(() => temperatureAfter(nitrogen, store, 300, heat + 1000))).toContain(
      `leads beyond ${Number(store.to.toPrecision(6))} K, the upper limit of the wall's source; from this start it can be at most ${Number(heat.toPrecision(6))} J`,
    );
    expect(refusedWith(() => reach(nitrogen, store, 300, store.to + 1))).toContain("the upper limit of the wall's source");
  });

  test("a start or an end outside the range of the contents", () => {
    expect(refusedWith(() => reach(nitrogen, undefined, 100, 300))).toBe(
      "range: Temperature 100 K is below 200 K, the lower limit of nasa-2002 for N2",
    );
    expect(refusedWith(() => temperatureAfter(nitrogen, undefined, 100, 5))).toBe(
      "range: Temperature 100 K is below 200 K, the lower limit of nasa-2002 for N2",
    );
  });

  test("a heavy pure gas is cooled a little without its equation being asked where it tells nothing", () => {
    const content = new GasContent(capacity("H2O2", "gri-1999"), 1, 1, pureGas("H2O2"));
    const cooled = temperatureAfter(content, undefined, 300, -5);
    expect(cooled).toBeLessThan(300);
    expect(cooled).toBeGreaterThan(299);
    expect(refusedWith(() => temperatureAfter(content, undefined, 300, -1e6))).toContain("the lower limit of Peng-Robinson for H2O2");
  });
});

/** Cv, U, H, S and the inverse against a bare loop of the same polynomial and against an interpreted expression. */
import { capacityOf, type Capacity } from "../../src/core/capacity";
import { temperatureAtEnergy } from "../../src/core/capacity/inverse";
import type { Goal } from "./goals";
import { type BareInterval, bareIntervals, COUNT, nitrogen, rising, shuffled, tenGases } from "./subjects";
import { compare, touched } from "./timing";

/** The part of mathjs that compiles an expression; loaded by the runner, because the product holds its unit part only. */
export interface ExpressionCompiler {
  compile(expression: string): { evaluate(scope: Record<string, number>): number };
}

/** The bare loop: the polynomial by Horner's rule, nothing else. Coefficients as arguments stay in registers. */
// prettier-ignore
function bareLoop(temperatures: Float64Array, out: Float64Array, a0: number, a1: number, a2: number, a3: number, a4: number, a5: number, a6: number): void {
  for (let i = 0; i < temperatures.length; i++) {
    const t = temperatures[i]!;
    const r = 1 / t;
    out[i] = (((a6 * t + a5) * t + a4) * t + a3) * t + a2 + (a0 * r + a1) * r;
  }
}

type Seven = [number, number, number, number, number, number, number];

/** Rising temperatures by hand: one bare loop below the joint, one above it. The joint is looked up once, not in every turn. */
function bareRising([low, high]: readonly BareInterval[], temperatures: Float64Array, out: Float64Array): () => void {
  const joint = temperatures.findIndex((t) => t > low!.to);
  const [below, above] = [temperatures.subarray(0, joint), temperatures.subarray(joint)];
  const [outBelow, outAbove] = [out.subarray(0, joint), out.subarray(joint)];
  const [lowest, highest] = [low!.c as Seven, high!.c as Seven];
  return () => {
    bareLoop(below, outBelow, ...lowest);
    bareLoop(above, outAbove, ...highest);
  };
}

/** Temperatures in any order by hand: the interval is chosen for each. Not used for rising ones, so that the compiler knows one kind only. */
function bareShuffled([low, high]: readonly BareInterval[], temperatures: Float64Array, out: Float64Array): void {
  const [a0, a1, a2, a3, a4, a5, a6] = low!.c as Seven;
  const [b0, b1, b2, b3, b4, b5, b6] = high!.c as Seven;
  const joint = low!.to;
  for (let i = 0; i < temperatures.length; i++) {
    const t = temperatures[i]!;
    const r = 1 / t;
    out[i] =
      t <= joint
        ? (((a6 * t + a5) * t + a4) * t + a3) * t + a2 + (a0 * r + a1) * r
        : (((b6 * t + b5) * t + b4) * t + b3) * t + b2 + (b0 * r + b1) * r;
  }
}

export function capacityGoals(mathjs: ExpressionCompiler): Goal[] {
  const capacity = capacityOf(nitrogen);
  const bare = bareIntervals(nitrogen);
  requireSame(capacity, bare);
  return [
    ...columnGoals(capacity, bare),
    expressionGoal(capacity, bare, mathjs),
    ...propertyGoals(capacity, bare),
    ...mixtureGoals(capacity),
  ];
}

/** The bare loops compute the same numbers, or the comparison would mean nothing. */
function requireSame(capacity: Capacity, bare: readonly BareInterval[]): void {
  const expected = new Float64Array(1000);
  const compareAt = (temperatures: Float64Array) =>
    temperatures.forEach((t, i) => {
      if (!(Math.abs(capacity.cv(t) - expected[i]!) <= 1e-12 * expected[i]!))
        throw new Error(`The bare loop gives ${expected[i]} at ${t} K, the capacity ${capacity.cv(t)}`);
    });
  bareRising(bare, rising(1000), expected)();
  compareAt(rising(1000));
  bareShuffled(bare, shuffled(1000), expected);
  compareAt(shuffled(1000));
}

function columnGoals(capacity: Capacity, bare: readonly BareInterval[]): Goal[] {
  const out = new Float64Array(COUNT);
  const [ordered, mixed] = [rising(), shuffled()];
  const byHand = bareRising(bare, ordered, out);
  const rise = compare({
    bare: () => (byHand(), touched(out)),
    column: () => (capacity.cvInto(ordered, out), touched(out)),
  });
  const mix = compare({
    bare: () => (bareShuffled(bare, mixed, out), touched(out)),
    column: () => (capacity.cvInto(mixed, out), touched(out)),
  });
  return [
    { what: "Cv over 100,000 rising temperatures, against the bare loop", measured: rise.column / rise.bare, unit: "×", atMost: 1.5 },
    { what: "Cv over 100,000 shuffled temperatures, against the bare loop", measured: mix.column / mix.bare, unit: "×", atMost: 1.5 },
  ];
}

function expressionGoal(capacity: Capacity, [low]: readonly BareInterval[], mathjs: ExpressionCompiler): Goal {
  const temperatures = rising(10_000);
  const out = new Float64Array(temperatures.length);
  const compiled = mathjs.compile(low!.c.map((c, k) => `(${c})*T^(${k - 2})`).join(" + "));
  const scope = { T: 0 };
  const expression = () => {
    for (let i = 0; i < temperatures.length; i++) {
      scope.T = temperatures[i]!;
      out[i] = compiled.evaluate(scope);
    }
    return touched(out);
  };
  const times = compare({ expression, column: () => (capacity.cvInto(temperatures, out), touched(out)) }, 9);
  return { what: "Cv, faster than a compiled mathjs expression", measured: times.expression / times.column, unit: "×", atLeast: 200 };
}

function propertyGoals(capacity: Capacity, bare: readonly BareInterval[]): Goal[] {
  const temperatures = rising();
  const out = new Float64Array(COUNT);
  const byHand = bareRising(bare, temperatures, out);
  const energies = temperatures.map((t) => capacity.energy(t));
  // A loop of its own for each: one loop that is handed the property would be a call that cannot be inlined, and measure that.
  const times = compare({
    bare: () => (byHand(), touched(out)),
    U: () => {
      for (let i = 0; i < COUNT; i++) out[i] = capacity.energy(temperatures[i]!);
      return touched(out);
    },
    H: () => {
      for (let i = 0; i < COUNT; i++) out[i] = capacity.enthalpy(temperatures[i]!);
      return touched(out);
    },
    S: () => {
      for (let i = 0; i < COUNT; i++) out[i] = capacity.entropy(temperatures[i]!);
      return touched(out);
    },
    inverse: () => {
      for (let i = 0; i < COUNT; i++) out[i] = temperatureAtEnergy(capacity, energies[i]!);
      return touched(out);
    },
    logarithm: () => {
      for (let i = 0; i < COUNT; i++) out[i] = Math.log(temperatures[i]!);
      return touched(out);
    },
  });
  return (["U", "H", "S", "inverse"] as const).map((name) => ({
    what: `${name === "inverse" ? "Temperature of an energy" : name}, one call each, against the bare loop of Cv`,
    measured: times[name] / times.bare,
    unit: "×",
    atMost: 10,
    note: `a bare logarithm alone ${(times.logarithm / times.bare).toPrecision(2)} ×`,
  }));
}

function mixtureGoals(gas: Capacity): Goal[] {
  const mixture = tenGases();
  const temperatures = rising();
  const out = new Float64Array(COUNT);
  const cv = (capacity: Capacity) => () => (capacity.cvInto(temperatures, out), touched(out));
  const energy = (capacity: Capacity) => () => {
    for (let i = 0; i < COUNT; i++) out[i] = capacity.energy(temperatures[i]!);
    return touched(out);
  };
  const times = compare({ gasCv: cv(gas), mixtureCv: cv(mixture), gasU: energy(gas), mixtureU: energy(mixture) });
  return [
    { what: "Cv of ten gases, against one", measured: times.mixtureCv / times.gasCv, unit: "×", atMost: 1.2 },
    { what: "U of ten gases, against one", measured: times.mixtureU / times.gasU, unit: "×", atMost: 1.2 },
  ];
}

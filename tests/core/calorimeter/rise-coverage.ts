/**
 * A laboratory of seeded runs whose true rise is known, and how often the stated interval of 95 % holds it.
 * Drawn for each run: G 0.0015 to 0.0030 per min, convergence temperature 24 to 27 °C, start 2 to 4 K below it, rise 1.5 to 3.5 K,
 * release 0.4 to 1.0 min, a reading every 1, 0.5, 0.25 or 0.1 min or at uneven times, firing at or between readings, fore-period 5 to
 * 10 min, main period ten times the release to 12 min, after-period 8 to 12 min, noise 0.1 to 1 mK, readings to 0.1 mK.
 */
import { analyse, type RiseAnalysis } from "../../../src/core/calorimeter/rise/analysis";
import { endOf } from "../../../src/core/calorimeter/rise/end";
import { gridOf } from "../../../src/core/calorimeter/rise/grid";
import type { Method } from "../../../src/core/calorimeter/rise/methods";
import { adiabaticAt, type Generator, type Model, rounded, temperatureAt } from "./rise-model";

export const STEPS = [1, 0.5, 0.25, 0.1] as const;

export interface Drawn {
  readonly model: Model;
  readonly times: Float64Array;
  readonly temperatures: Float64Array;
  readonly end: number;
  /** A step of `STEPS`, or "uneven". */
  readonly stratum: string;
  readonly noise: number;
}

/** One run; `drift` makes it an adiabatic one with a common stirring drift of up to 0.5 mK/min. */
export function drawRun(random: Generator, kind: "jacket" | "adiabatic"): Drawn {
  const uneven = random.uniform() < 0.2;
  const step = random.oneOf(STEPS);
  const release = random.uniform(0.4, 1);
  const onGrid = (time: number) => Math.ceil(time / step - 1e-9) * step;
  const fire = onGrid(random.uniform(5, 10));
  const end = fire + onGrid(random.uniform(10 * release, 12));
  const last = end + onGrid(random.uniform(8, 12));
  const convergence = random.uniform(24, 27);
  const model = {
    convergence,
    constant: random.uniform(0.0015, 0.003),
    start: convergence - random.uniform(2, 4),
    fire,
    rise: random.uniform(1.5, 3.5),
    release,
  };
  const times = uneven
    ? unevenTimes(random, fire, end, last)
    : Float64Array.from({ length: Math.round(last / step) + 1 }, (_, k) => k * step);
  const noise = random.uniform(0.0001, 0.001);
  const drift = random.uniform(0, 0.0005);
  const truth = (time: number) => (kind === "jacket" ? temperatureAt(model, time) : adiabaticAt(model, drift, time));
  const temperatures = times.map((time) => rounded(truth(time) + noise * random.normal()));
  return { model, times, temperatures, end, stratum: uneven ? "uneven" : String(step), noise };
}

/** Every minute in the drift periods, 6 to 15 s in the first minutes after firing, then every half minute; a little off each time. */
function unevenTimes(random: Generator, fire: number, end: number, last: number): Float64Array {
  const times: number[] = [];
  for (let time = 0; time < last;) {
    times.push(time);
    const dense = time >= fire - 1e-9 && time < fire + 3;
    const next = time + (dense ? random.uniform(0.1, 0.25) : time > fire && time < end ? random.uniform(0.3, 0.6) : random.uniform(0.5, 1));
    // Firing and the end of the main period are read in half of the runs only.
    const mark = [fire, end].find((each) => time < each - 1e-9 && next > each - 0.05);
    time = mark !== undefined && random.uniform() < 0.5 ? mark : next;
  }
  return Float64Array.from([...times, last]);
}

export interface Coverage {
  readonly runs: number;
  readonly held: number;
}

export interface Study {
  readonly all: Coverage;
  readonly strata: Readonly<Record<string, Coverage>>;
  readonly analysed: readonly { readonly drawn: Drawn; readonly run: RiseAnalysis }[];
}

export function study(random: Generator, runs: number, method: Method, endGiven: boolean): Study {
  const analysed = Array.from({ length: runs }, () => {
    const drawn = drawRun(random, method === "adiabatic" ? "adiabatic" : "jacket");
    const { times, temperatures, model } = drawn;
    const end = endGiven ? drawn.end : endOf(times, temperatures, times.length, model.fire);
    return { drawn, run: analyse(gridOf(times, times.length, model.fire, end), temperatures, method) };
  });
  const strata = [...new Set(analysed.map(({ drawn }) => drawn.stratum))].sort();
  return {
    all: coverageOf(analysed),
    strata: Object.fromEntries(strata.map((each) => [each, coverageOf(analysed.filter(({ drawn }) => drawn.stratum === each))])),
    analysed,
  };
}

export function coverageOf(analysed: Study["analysed"]): Coverage {
  const held = analysed.filter(({ drawn, run }) => Math.abs(run.rise - drawn.model.rise) <= run.uncertainty.expanded);
  return { runs: analysed.length, held: held.length };
}

export function percent({ runs, held }: Coverage): number {
  return (100 * held) / runs;
}

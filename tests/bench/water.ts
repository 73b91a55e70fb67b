/** Water: one phase against the same terms written down plainly, the evaluations of a saturation, and a column of states against a loop. */
import { WaterFormulation } from "../../src/core/water/formulation";
import type { WaterPhase } from "../../src/core/water/types";
import { iapws95 } from "../../src/data/iapws95";
import { registry } from "../../src/functions";
import { water } from "../../src/functions/steam";
import type { Goal } from "./goals";
import { compare } from "./timing";
import { probe } from "./water-probe";

/** Liquid, vapour, near-critical and hot dense states: T, ρ; every temperature another one. */
const STATES = Array.from({ length: 1000 }, (_, k) => {
  const step = k / 1000;
  return [[300 + 200 * step, 1000 - 150 * step], [400 + 400 * step, 0.1 + step], [640 + 20 * step, 280 + 80 * step], [700 + 500 * step, 50 + 400 * step]][k % 4]!;
}) as unknown as readonly (readonly [number, number])[]; // prettier-ignore

const sumOf = ({ pressure, energy, entropy, cv, cp, soundSpeed }: Record<string, number>) =>
  pressure! + energy! + entropy! + cv! + cp! + soundSpeed!;
const over = (of: (temperature: number, density: number) => Record<string, number>) => () =>
  STATES.reduce((sum, [temperature, density]) => sum + sumOf(of(temperature, density)), 0);

/** Counts how often the formulation is evaluated. */
class Counted extends WaterFormulation {
  evaluations = 0;

  override single(temperature: number, density: number): WaterPhase {
    this.evaluations++;
    return super.single(temperature, density);
  }
}

function saturationGoals(): Goal[] {
  const counted = new Counted(iapws95);
  const { criticalTemperature, from } = iapws95;
  const temperatures = [
    ...Array.from({ length: 3740 }, (_, k) => from + 0.1 * k).filter((temperature) => temperature < criticalTemperature),
    ...Array.from({ length: 1000 }, (_, k) => criticalTemperature - 10 ** (-8 * (k / 999))),
    criticalTemperature,
  ];
  const counts = temperatures.map((temperature) => {
    const before = counted.evaluations;
    counted.saturation(temperature);
    return counted.evaluations - before;
  });
  const mean = counts.reduce((sum, count) => sum + count, 0) / counts.length;
  return [
    {
      what: "evaluations of a saturation, worst from 273.16 K to the critical point",
      measured: Math.max(...counts),
      unit: "times",
      atMost: 12,
    },
    { what: "the same, mean", measured: mean, unit: "times" },
  ];
}

export function waterGoals(): Goal[] {
  const [temperature, density] = STATES[0]!;
  if (Math.abs(sumOf(probe(temperature, density)) / sumOf({ ...water.single(temperature, density) }) - 1) > 1e-10)
    throw new Error("The probe is wrong");
  const single = compare({ library: over((t, d) => water.single(t, d) as unknown as Record<string, number>), plain: over(probe) });
  let turn = 0;
  const saturation = compare({ one: () => water.saturation(300 + (turn++ % 340000) * 1e-3).pressure });
  return [
    {
      what: "water, one phase, twelve properties, against the plain 56 terms",
      measured: single.library / single.plain,
      unit: "×",
      atMost: 1.5,
    },
    { what: "the same", measured: single.library, unit: "µs" },
    ...saturationGoals(),
    { what: "saturation at a temperature not met before", measured: saturation.one * 1000, unit: "µs" },
    ...columnGoals(),
  ];
}

const CELLS = 10_000;

/** A column of densities and temperatures in one call, against a loop over the core: mostly one phase, a quarter two phases. */
function columnGoals(): Goal[] {
  const column = (id: string) => (blocks: unknown[][][]) => {
    const cell: unknown = registry.get(id)!(...blocks)[CELLS - 1]![0];
    if (typeof cell !== "number") throw new Error(`${id} gave ${JSON.stringify(cell)}`);
    return cell;
  };
  const at = (k: number) => k / (CELLS - 1);
  const densities = Array.from({ length: CELLS }, (_, k) => [
    k % 4 === 0 ? 10 + 300 * at(k) : k % 4 === 1 ? 0.1 + at(k) : 1050 - 50 * at(k),
  ]);
  const temperatures = Array.from({ length: CELLS }, (_, k) => [400 + 100 * at(k)]);
  const loop = (temperature: (k: number) => number) => () =>
    densities.reduce((sum, [density], k) => sum + water.state(temperature(k), density!).pressure, 0);
  const pressure = column("WATER.PRESSURE");
  const saturation = column("WATER.SATURATION");
  const times = compare(
    {
      column: () => pressure([densities, temperatures]),
      loop: loop((k) => temperatures[k]![0]!),
      isotherm: () => pressure([densities, [[450]]]),
      isothermLoop: loop(() => 450),
      saturation: () => saturation([temperatures]),
      one: () => saturation([temperatures.map(() => [450])]),
    },
    15,
  );
  const each = (milliseconds: number) => (milliseconds * 1000) / CELLS;
  return [
    { what: "WATER.PRESSURE over 10,000 states, against a loop over the core", measured: times.column / times.loop, unit: "×", atMost: 1.5 },
    { what: "the same at one temperature", measured: times.isotherm / times.isothermLoop, unit: "×" },
    { what: "WATER.PRESSURE, each of 10,000 states", measured: each(times.column), unit: "µs" },
    { what: "the same at one temperature", measured: each(times.isotherm), unit: "µs" },
    { what: "WATER.SATURATION, each of 10,000 temperatures", measured: each(times.saturation), unit: "µs" },
    { what: "the same temperature 10,000 times", measured: each(times.one), unit: "µs" },
  ]; // prettier-ignore
}

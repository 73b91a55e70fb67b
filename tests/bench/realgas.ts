/** Real gases by a cubic equation: one state against one Cv of the ideal gas, and what phases cost. */
import { capacityOf } from "../../src/core/capacity";
import { CubicGas } from "../../src/core/realgas/cubic-gas";
import { cubicSaturation } from "../../src/core/realgas/saturation";
import { splits } from "../../src/core/realgas/stability";
import { cubicState } from "../../src/core/realgas/state";
import { stableVolume } from "../../src/core/realgas/volumes";
import { criticalOf, pairOf } from "../../src/data/critical";
import { cubicEquations } from "../../src/data/cubic-equations";
import { recordOf } from "../../src/data/library";
import type { Goal } from "./goals";
import { compare } from "./timing";

const form = cubicEquations.find(({ id }) => id === "peng-robinson")!;

function gasOf(fractions: Readonly<Record<string, number>>): CubicGas {
  const names = Object.keys(fractions);
  const parts = names.map((species) => {
    const { temperature, pressure, acentric } = criticalOf(species)!;
    return { fraction: fractions[species]!, critical: { species, temperature, pressure: 1e6 * pressure, acentric } };
  });
  return new CubicGas(form, parts, (i, j) => pairOf(names[i]!, names[j]!)?.kij ?? 0);
}

/** Every call at a temperature of its own, within 1 K, so that nothing can be remembered. */
const CALLS = 64;
const beside = (temperature: number) => Float64Array.from({ length: CALLS }, (_, k) => temperature + k / CALLS);

function over(temperatures: Float64Array, value: (temperature: number) => number): () => number {
  return () => {
    let sum = 0;
    for (const temperature of temperatures) sum += value(temperature);
    return sum;
  };
}

export function realGasGoals(): Goal[] {
  const gas = gasOf({ CO2: 1 });
  const capacity = capacityOf(recordOf("CO2", "nasa-2002"));
  const naturalGas = gasOf({ CH4: 0.9, C2H6: 0.05, C3H8: 0.015, "n-C4H10": 0.005, N2: 0.02, CO2: 0.01 });
  const volume = 1e-3;
  const [pressed, cold] = [stableVolume(naturalGas, 300, 1e7), stableVolume(naturalGas, 250, 3e6)];
  const warm = beside(350);
  const times = compare({
    ideal: over(warm, (t) => capacity.cv(t)),
    real: over(warm, (t) => gas.pressure(t, volume) + gas.residualEnergy(t, volume) + gas.residualCv(t, volume)),
    saturation: over(beside(280), (t) => cubicSaturation(gas, t)!.pressure),
    nearCritical: over(beside(303), (t) => cubicSaturation(gas, t)!.pressure),
    twoPhases: over(beside(280), (t) => cubicState(gas, t, volume).pressure),
    stable: over(beside(300), (t) => Number(splits(naturalGas, t, pressed))),
    splitting: over(beside(250), (t) => Number(splits(naturalGas, t, cold))),
  });
  const each = (time: number) => (1000 * time) / CALLS;
  return [
    { what: "pressure, energy and Cv of CO2 by Peng-Robinson, against one Cv of the ideal gas", measured: times.real / times.ideal, unit: "×", atMost: 20 },
    { what: "saturation of CO2 at 280 K", measured: each(times.saturation), unit: "µs", atMost: 60 },
    { what: "the same at 303 K, 1 K below the critical point", measured: each(times.nearCritical), unit: "µs" },
    { what: "state of CO2 at 280 K and 1 L/mol, two phases", measured: each(times.twoPhases), unit: "µs" },
    { what: "whether a natural gas of 6 parts is one phase at 300 K and 100 bar", measured: each(times.stable), unit: "µs", atMost: 100 },
    { what: "the same at 250 K and 30 bar", measured: each(times.splitting), unit: "µs" },
  ]; // prettier-ignore
}

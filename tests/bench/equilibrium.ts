/** Equilibria: time and steps of flames with 12 and with 60 species, and how often the properties of all species are evaluated. */
import { capacityOf } from "../../src/core/capacity";
import { GAS_CONSTANT } from "../../src/core/constants";
import { isobaric, rigid } from "../../src/core/equilibrium/states";
import { type System, systemOf } from "../../src/core/equilibrium/system";
import type { Candidate, Equilibrium, Reactant } from "../../src/core/equilibrium/types";
import { parseFormula } from "../../src/core/species/formula";
import { recordOf, setOfId } from "../../src/data/library";
import { registry } from "../../src/functions";
import type { Goal } from "./goals";
import { compare, median } from "./timing";

const START = 298.15;
const ATMOSPHERE = 101325;
/** From lean to rich, and from far below an atmosphere to far above it. */
const RATIOS = Array.from({ length: 23 }, (_, k) => 0.4 + 0.1 * k);
const PRESSURES = [1e3, 1e4, ATMOSPHERE, 1e6, 1e7];

function candidate(key: string, set: string): Candidate {
  const record = recordOf(key, set);
  return {
    name: record.species,
    counts: parseFormula(record.formula).counts,
    capacity: capacityOf(record),
    fitGasConstant: record.gasConstant,
  };
}

const twelve = "CO2 CO H2O H2 O2 N2 OH NO H O N CH4".split(" ").map((key) => candidate(key, "nasa-2002"));

/** The 53 of gri-1999 and seven of nasa-2002, two of them condensed. */
const sixty = [
  ...setOfId("gri-1999")!.species.map((key) => candidate(key, "gri-1999")),
  ..."O3 NO2 C2N2 CH3CN propyne C(gr) H2O(l)".split(" ").map((key) => candidate(key, "nasa-2002")),
]
  .filter(({ name }, j, all) => all.findIndex((each) => each.name === name) === j)
  .concat("He Ne HNO3 i-C4H10".split(" ").map((key) => candidate(key, "nasa-2002")))
  .slice(0, 60);

interface Flame {
  readonly feed: readonly Reactant[];
  readonly energy: number;
  readonly enthalpy: number;
  readonly volume: number;
}

/** Methane in O2 + 3.76 N2 at 298.15 K. */
function flame(list: readonly Candidate[], ratio: number, pressure: number): Flame {
  const oxygen = 2 / ratio;
  const amounts = { CH4: 1, O2: oxygen, N2: 3.76 * oxygen };
  const feed = Object.entries(amounts).map(([key, amount]) => ({ ...list.find(({ name }) => name === key)!, amount }));
  // Fits that begin at 300 K are asked there: a flame 2 K warmer takes the same steps.
  const start = Math.max(START, ...feed.map(({ capacity }) => capacity.from));
  const sum = (of: (each: Reactant) => number) => feed.reduce((total, each) => total + each.amount * of(each), 0);
  return {
    feed,
    energy: sum(({ capacity }) => capacity.energy(start)),
    enthalpy: sum(({ capacity }) => capacity.enthalpy(start)),
    volume: (sum(() => 1) * GAS_CONSTANT * start) / pressure,
  };
}

/** Every flame of the sweep, each from nothing known. */
function sweep(list: readonly Candidate[], system: System): Equilibrium[] {
  return RATIOS.flatMap((ratio) =>
    PRESSURES.map((pressure) => {
      const { feed, energy, volume } = flame(list, ratio, pressure);
      return rigid(system, feed, energy, volume);
    }),
  );
}

export function equilibriumGoals(): Goal[] {
  if (sixty.length !== 60) throw new Error(`${sixty.length} species instead of 60`);
  const [small, large] = [systemOf(twelve), systemOf(sixty)];
  const [fewStates, manyStates] = [sweep(twelve, small), sweep(sixty, large)];
  const one = flame(twelve, 1, ATMOSPHERE);
  const other = flame(sixty, 1, ATMOSPHERE);
  const times = compare({
    few: () => rigid(small, one.feed, one.energy, one.volume).temperature,
    open: () => isobaric(small, one.feed, one.enthalpy, ATMOSPHERE).temperature,
    many: () => rigid(large, other.feed, other.energy, other.volume).temperature,
  });
  const worst = (states: readonly Equilibrium[]) => Math.max(...states.map(({ evaluations }) => evaluations));
  const steps = (states: readonly Equilibrium[]) => median(states.map(({ iterations }) => iterations));
  const states = `${RATIOS.length * PRESSURES.length} flames of CH4, ratio 0.4 to 2.6, 1e3 to 1e7 Pa`;
  return [
    { what: "properties of all 12 species evaluated, worst flame at constant volume", measured: worst(fewStates), unit: "times", atMost: 60, note: states },
    { what: "the same, 60 species", measured: worst(manyStates), unit: "times", atMost: 60 },
    { what: "steps of the balances, 12 species, median", measured: steps(fewStates), unit: "steps" },
    { what: "steps of the balances, 60 species, median", measured: steps(manyStates), unit: "steps" },
    { what: "flame at constant volume, 12 species", measured: times.few * 1000, unit: "µs" },
    { what: "flame at constant pressure, 12 species", measured: times.open * 1000, unit: "µs" },
    { what: "flame at constant volume, 60 species", measured: times.many * 1000, unit: "µs" },
    { what: "60 species against 12", measured: times.many / times.few, unit: "×" },
    ...sweepGoals(),
  ]; // prettier-ignore
}

const CALLS = 1000;

/** 1,000 ratios from 0.5 to 1.5 of CH4 in air in one call, against 1,000 calls: one number for each, and the whole table. */
function sweepGoals(): Goal[] {
  return ["BURN.PRESSURE", "BURN"].flatMap((id) => {
    const burn = registry.get(id)!;
    let turn = 0;
    // A little warmer in every turn: a state that was met before would be remembered, and nothing measured.
    const call = (ratios: readonly (readonly number[])[]): number => {
      const table = burn([["CH4"]], [["air"]], ratios, [[START + 1e-6 * turn]], [[ATMOSPHERE]]);
      const value: unknown = table.flat().find((cell) => typeof cell === "number");
      if (typeof value !== "number") throw new Error(`${id} gave ${JSON.stringify(table).slice(0, 300)}`);
      return value;
    };
    const ratios = Array.from({ length: CALLS }, (_, k) => [0.5 + k / (CALLS - 1)]);
    const times = compare(
      { together: () => (turn++, call(ratios)), single: () => (turn++, ratios.reduce((sum, ratio) => sum + call([ratio]), 0)) },
      5,
    );
    return [
      { what: `${id} of 1,000 ratios in one call, against 1,000 calls`, measured: times.together / times.single, unit: "×", atMost: 0.5 },
      { what: "the same, for each ratio", measured: (times.together * 1000) / CALLS, unit: "µs" },
    ];
  });
}

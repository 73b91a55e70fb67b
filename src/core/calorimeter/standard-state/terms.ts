/**
 * The energies that lead from the vessel process to the reaction between standard states, each with the sign it has when it is added to
 * the negative energy of the vessel process: reactants from their standard states to the vessel before the combustion, products from the
 * vessel after it to theirs. Order of the scheme of Hubbard, Scott and Waddington 1956 (from memory).
 *
 * Before: compound and water are compressed, −T α V Δp (energy of a liquid or solid at constant temperature; the part with the
 * compressibility is a hundred times smaller); water evaporates; oxygen dissolves; oxygen goes from no pressure to that of the charge.
 * After: the gas goes to no pressure and is unmixed; carbon dioxide and oxygen leave the water; vapour condenses; nitric acid is
 * decomposed into N2, O2 and water; sulfuric acid is brought to 115 H2O; the water is decompressed.
 * To 25 °C: ΔU(298.15 K) = ΔU(T) + (C_after − C_before)(298.15 K − T), with the heat capacities of the contents.
 */
import { CELSIUS_ZERO, REFERENCE_TEMPERATURE, STANDARD_PRESSURE } from "../../constants";
import { printed, refuseRange } from "../../refusal";
import type { AcidFigures, StandardStateConstants } from "./constants";
import { gasEnergy, THERMAL_ENERGY } from "./gas";
import { compoundFigures, type FinalState, type InitialState, type VesselRun } from "./states";

export type TermName =
  | "to 25 °C"
  | "compression of the compound"
  | "compression of the water"
  | "evaporation of water"
  | "dissolution of oxygen"
  | "oxygen to the pressure of the charge"
  | "gas to no pressure"
  | "release of carbon dioxide"
  | "release of oxygen"
  | "condensation of vapour"
  | "decomposition of nitric acid"
  | "sulfuric acid to 115 H2O"
  | "decompression of the water";

/** One term, J. */
export interface Term {
  readonly name: TermName;
  readonly energy: number;
}

const STANDARD = STANDARD_PRESSURE / 1e6;

/** All terms in their order, J. */
export function standardTerms(run: VesselRun, before: InitialState, after: FinalState, constants: StandardStateConstants): readonly Term[] {
  const { water, oxygen, carbonDioxide, acids, gas } = constants;
  const figures = compoundFigures(run, constants);
  const term = (name: TermName, energy: number): Term => ({ name, energy: energy === 0 ? 0 : energy });
  return [
    term(
      "to 25 °C",
      (capacityAfter(after, constants) - capacityBefore(run, before, constants)) * (REFERENCE_TEMPERATURE - run.temperature - CELSIUS_ZERO),
    ),
    term("compression of the compound", compression(run.mass, before.pressure, figures)),
    term("compression of the water", compression(before.liquid, before.pressure, water)),
    term("evaporation of water", before.vapour * water.vaporisation),
    term("dissolution of oxygen", before.oxygenDissolved * oxygen.energy),
    term("oxygen to the pressure of the charge", gasEnergy(before.oxygenGas, before.pressure, 0, gas)),
    term("gas to no pressure", -gasEnergy(after.carbonDioxideGas + after.otherGas, after.pressure, after.fraction, gas)),
    term("release of carbon dioxide", -after.carbonDioxideDissolved * carbonDioxide.energy),
    term("release of oxygen", -after.oxygenDissolved * oxygen.energy),
    term("condensation of vapour", -after.vapour * water.vaporisation),
    term("decomposition of nitric acid", run.nitric * acids.nitricDecomposition),
    term("sulfuric acid to 115 H2O", dilution(run.sulfuric, after.liquid / water.molarMass, acids)),
    term("decompression of the water", -compression(after.liquid, after.pressure, water)),
  ];
}

/** Energy of compression from 1 bar to a pressure in MPa of a mass in g: −T α V Δp, J. */
function compression(mass: number, pressure: number, { expansion, density }: { expansion: number; density: number }): number {
  return (-REFERENCE_TEMPERATURE * expansion * mass * (pressure - STANDARD)) / density;
}

/** Heat capacity of the contents before the combustion, J/K. Vapour that forms on warming counts with its heat. */
function capacityBefore(run: VesselRun, state: InitialState, constants: StandardStateConstants): number {
  const { water, gas } = constants;
  return (
    run.mass * compoundFigures(run, constants).specificHeat +
    state.oxygenGas * gas.heatCapacity.oxygen +
    waterCapacity(state, constants) +
    (state.saturated ? shift(state.vapour, water.vaporisation) : 0)
  );
}

/** Heat capacity of the contents after the combustion, J/K. Vapour that forms and carbon dioxide that leaves the water count with their heat. */
function capacityAfter(state: FinalState, constants: StandardStateConstants): number {
  const { water, gas, carbonDioxide } = constants;
  const all = state.carbonDioxideGas + state.carbonDioxideDissolved;
  const shared = all === 0 ? 0 : (state.carbonDioxideDissolved * state.carbonDioxideGas) / all;
  return (
    state.otherGas * gas.heatCapacity.oxygen +
    all * gas.heatCapacity.carbonDioxide +
    waterCapacity(state, constants) +
    (state.saturated ? shift(state.vapour, water.vaporisation) : 0) +
    shift(shared, carbonDioxide.energy)
  );
}

/** Water as if all of it were liquid, J/K: the vapour is some 0.5 % of a gram. */
function waterCapacity({ liquid, vapour }: { liquid: number; vapour: number }, { water }: StandardStateConstants): number {
  return (liquid + vapour * water.molarMass) * water.specificHeat;
}

/** Heat taken up for each kelvin by a substance whose amount in one of two phases follows d ln n/dT = ΔU/RT², J/K. */
function shift(amount: number, energy: number): number {
  return (amount * energy * energy) / (THERMAL_ENERGY * REFERENCE_TEMPERATURE);
}

/** Energy of bringing sulfuric acid from n mol of water for each mol to the reference water, J. Refuses acid stronger than the table. */
function dilution(acid: number, water: number, acids: AcidFigures): number {
  if (acid === 0) return 0;
  return 1000 * acid * (heatOfSolution(water / acid, acids) - heatOfSolution(acids.referenceWater, acids));
}

/** Heat of solution in n mol of water, kJ/mol, straight in ln n between the rows; above the last row its value. */
function heatOfSolution(water: number, { dilution: rows }: AcidFigures): number {
  const least = rows[0]!;
  if (water < least.water)
    refuseRange(
      `Sulfuric acid in ${printed(water)} mol of water for each mol is stronger than ${least.water} mol, the strongest whose heat of dilution is known`,
    );
  const index = rows.findIndex((row) => row.water > water);
  if (index < 0) return rows[rows.length - 1]!.heat;
  const [lower, upper] = [rows[index - 1]!, rows[index]!];
  const share = Math.log(water / lower.water) / Math.log(upper.water / lower.water);
  return lower.heat + share * (upper.heat - lower.heat);
}

/**
 * What is in the vessel before and after the combustion, at 298.15 K: amounts from the balance of atoms, shared between gas and water.
 *
 * Before: compound, oxygen of the charge and in the water, water as liquid and vapour. After: carbon dioxide, oxygen and nitrogen in the
 * gas and in the water, water as liquid and vapour, acids. The gas follows gas.ts; dissolved amounts follow Henry's law in partial
 * pressures; vapour saturates the gas as long as there is liquid. Units: mol, g, mL, MPa.
 * Not counted: air in the vessel beside the oxygen, aids and fuses, dissolved nitrogen, SO2 in the water.
 */
import { REFERENCE_TEMPERATURE, CELSIUS_ZERO } from "../../constants";
import { printed, refuse, refuseRange } from "../../refusal";
import { combustionOf, type Combustion } from "../../reaction/combustion";
import type { Formula } from "../../species/formula";
import { ATMOSPHERE, type StandardStateConstants } from "./constants";
import { gasAmount, gasPressure, vapourDensity } from "./gas";

/** One run, in the units of the laboratory. */
export interface VesselRun {
  readonly formula: Formula;
  /** g/mol. */
  readonly molarMass: number;
  /** Heat given off by the isothermal process in the vessel for each gram of compound, J/g, positive. */
  readonly specificEnergy: number;
  /** Mass of the compound in vacuum, g. */
  readonly mass: number;
  /** Volume of the empty vessel, mL. */
  readonly volume: number;
  /** Water put into the vessel, g. */
  readonly water: number;
  /** Absolute pressure of the oxygen at `temperature`, MPa. */
  readonly pressure: number;
  /** Nitric acid formed, mol. */
  readonly nitric: number;
  /** Sulfuric acid formed, mol; sulfur beyond it counts as SO2(g). */
  readonly sulfuric: number;
  /** Temperature of the vessel process, °C. */
  readonly temperature: number;
  /** Density of the compound, g/mL; left out, that of its phase. */
  readonly density?: number;
}

export interface InitialState {
  readonly combustion: Combustion;
  /** Compound, mol. */
  readonly compound: number;
  /** Pressure of the oxygen at 298.15 K, MPa. */
  readonly pressure: number;
  readonly gasVolume: number;
  readonly oxygenGas: number;
  readonly oxygenDissolved: number;
  readonly vapour: number;
  /** True if liquid is left, so that the vapour is at saturation. */
  readonly saturated: boolean;
  /** Liquid water, g. */
  readonly liquid: number;
  /** Oxygen needed by combustion and acids, mol. */
  readonly oxygenNeeded: number;
}

export interface FinalState {
  readonly pressure: number;
  readonly gasVolume: number;
  readonly carbonDioxideGas: number;
  readonly carbonDioxideDissolved: number;
  /** Oxygen, nitrogen and SO2 of the gas. */
  readonly otherGas: number;
  readonly oxygenDissolved: number;
  /** Mole fraction of carbon dioxide in the dry gas. */
  readonly fraction: number;
  readonly vapour: number;
  readonly saturated: boolean;
  /** Liquid water, g. */
  readonly liquid: number;
}

/** Water for each mole of HNO3 and H2SO4 and oxygen for each, from N2, O2, H2O and SO2, O2, H2O. */
const NITRIC = { water: 0.5, oxygen: 1.25, nitrogen: 0.5 };
const SULFURIC = { water: 1, oxygen: 0.5 };

/** Pressures of a rigid vessel grow with the absolute temperature. */
export function pressureAtReference({ pressure, temperature }: VesselRun): number {
  return (pressure * REFERENCE_TEMPERATURE) / (temperature + CELSIUS_ZERO);
}

/**
 * The vessel before the combustion. Refuses a gas, a vessel without room for gas, more sulfuric acid than sulfur, water that the acids
 * would use up, and less oxygen than combustion and acids need, with the moles.
 */
export function initialState(run: VesselRun, constants: StandardStateConstants): InitialState {
  const { formula, mass, molarMass, volume, water } = run;
  if (formula.phase === "g") refuse("The compound is a gas; the reduction is written for solids and liquids");
  const combustion = combustionOf(formula);
  const compound = mass / molarMass;
  const pressure = pressureAtReference(run);
  const space = volume - mass / compoundFigures(run, constants).density;
  const density = vapourDensity(pressure, 0, constants.gas, constants.water);
  const { vapour, liquid, gasVolume, saturated } = shareWater(water, space, density, constants);
  if (!(gasVolume > 0))
    refuseRange(`Sample and water of ${printed(mass)} g and ${printed(water)} g leave no room for gas in ${printed(volume)} mL`);
  const oxygenGas = gasAmount(pressure, gasVolume, 0, constants.gas);
  const oxygenDissolved = oxygenGas * partition(constants.oxygen.solubility, pressure / oxygenGas, liquid, constants);
  const oxygenNeeded = compound * combustion.oxygen + NITRIC.oxygen * run.nitric + SULFURIC.oxygen * run.sulfuric;
  if (oxygenNeeded > oxygenGas + oxygenDissolved)
    refuseRange(
      `Combustion needs ${printed(oxygenNeeded)} mol of oxygen, but the vessel holds ${printed(oxygenGas + oxygenDissolved)} mol: it would not be complete`,
    );
  requireSulfur(run, compound * combustion.sulfurDioxide);
  return { combustion, compound, pressure, gasVolume, oxygenGas, oxygenDissolved, vapour, saturated, liquid, oxygenNeeded };
}

/** Titrations may find a little more acid than the formula holds sulfur. */
const SULFUR_SLACK = 1.02;

function requireSulfur({ sulfuric }: VesselRun, sulfur: number): void {
  if (sulfuric > SULFUR_SLACK * sulfur)
    refuseRange(`${printed(sulfuric)} mol of sulfuric acid is more than the ${printed(sulfur)} mol of sulfur in the sample can form`);
}

/** Figures of the compound: those of its phase, solid if the formula does not say, with its own density if that is known. */
export function compoundFigures({ formula, density }: VesselRun, { solid, liquid }: StandardStateConstants) {
  const usual = formula.phase === "l" ? liquid : solid;
  return density === undefined ? usual : { ...usual, density };
}

/** Water shared between liquid and vapour in a space in mL: saturated, or all of it vapour. Liquid and gas fill the space together. */
function shareWater(water: number, space: number, vapour: number, { water: figures }: StandardStateConstants) {
  const bound = vapour * figures.molarMass;
  const gasVolume = (space - water / figures.density) / (1 - bound / figures.density);
  if (bound * gasVolume >= water) return { vapour: water / figures.molarMass, liquid: 0, gasVolume: space, saturated: false };
  return { vapour: vapour * gasVolume, liquid: water - bound * gasVolume, gasVolume, saturated: true };
}

/**
 * Dissolved amount over amount in the gas: solubility in mol/(L atm), pressure that one mole exerts in MPa/mol, water in g. Of an amount n
 * the share K/(1 + K) is in the water.
 */
function partition(solubility: number, pressurePerMole: number, liquid: number, { water }: StandardStateConstants): number {
  return (solubility * (pressurePerMole / ATMOSPHERE) * (liquid / water.density)) / 1000;
}

const STEPS = 200;
const SETTLED = 1e-14;

/**
 * The vessel after the combustion. The pressure that one mole exerts, the share of dissolved gas and the vapour depend weakly on one
 * another; they are found by substitution.
 */
export function finalState(run: VesselRun, initial: InitialState, constants: StandardStateConstants): FinalState {
  const amounts = {
    carbonDioxide: initial.compound * initial.combustion.carbonDioxide,
    other: otherAfter(run, initial),
    water: waterAfter(run, initial, constants),
  };
  let state = stateAt({ pressure: initial.pressure, fraction: 0, gas: initial.oxygenGas }, amounts, run.volume, constants);
  for (let step = 0; step < STEPS; step++) {
    const { pressure, fraction, carbonDioxideGas, otherGas } = state;
    const next = stateAt({ pressure, fraction, gas: carbonDioxideGas + otherGas }, amounts, run.volume, constants);
    if (Math.abs(next.pressure - pressure) <= SETTLED * pressure) return next;
    state = next;
  }
  return refuse(`The state after combustion was not found for ${printed(amounts.water)} g of water in ${printed(run.volume)} mL`);
}

/** The state that follows from an estimate of the gas: MPa, mole fraction of carbon dioxide, mol. */
function stateAt(
  estimate: { readonly pressure: number; readonly fraction: number; readonly gas: number },
  { carbonDioxide, other, water }: { readonly carbonDioxide: number; readonly other: number; readonly water: number },
  volume: number,
  constants: StandardStateConstants,
): FinalState {
  const vapour = vapourDensity(estimate.pressure, estimate.fraction, constants.gas, constants.water);
  const shared = shareWater(water, volume, vapour, constants);
  const inWater = (solubility: number): number => {
    const ratio = partition(solubility, estimate.pressure / estimate.gas, shared.liquid, constants);
    return ratio / (1 + ratio);
  };
  const carbonDioxideDissolved = carbonDioxide * inWater(constants.carbonDioxide.solubility);
  const oxygenDissolved = other * inWater(constants.oxygen.solubility);
  const carbonDioxideGas = carbonDioxide - carbonDioxideDissolved;
  const otherGas = other - oxygenDissolved;
  const fraction = carbonDioxideGas / (carbonDioxideGas + otherGas);
  const pressure = gasPressure(carbonDioxideGas + otherGas, shared.gasVolume, fraction, constants.gas);
  return { ...shared, pressure, carbonDioxideGas, carbonDioxideDissolved, otherGas, oxygenDissolved, fraction };
}

/** Oxygen left, nitrogen and SO2, gas and dissolved, mol. Nitric acid beyond the nitrogen of the compound has used up air of the charge. */
function otherAfter(
  { nitric, sulfuric }: VesselRun,
  { compound, combustion, oxygenGas, oxygenDissolved, oxygenNeeded }: InitialState,
): number {
  const sulfurDioxide = Math.max(0, compound * combustion.sulfurDioxide - sulfuric);
  const nitrogen = compound * combustion.nitrogen - NITRIC.nitrogen * nitric;
  return Math.max(0, oxygenGas + oxygenDissolved - oxygenNeeded + nitrogen) + sulfurDioxide;
}

/** All water after the combustion, g. */
function waterAfter(
  { water, nitric, sulfuric }: VesselRun,
  { compound, combustion }: InitialState,
  constants: StandardStateConstants,
): number {
  const formed = compound * combustion.water - NITRIC.water * nitric - SULFURIC.water * sulfuric;
  const after = water + formed * constants.water.molarMass;
  // Carbon burnt without water leaves none; an acid needs some.
  if (after < 0 || (after === 0 && nitric + sulfuric > 0))
    refuseRange(`The acids need ${printed(-formed)} mol of water, but the vessel holds ${printed(water / constants.water.molarMass)} mol`);
  return after;
}

/** The lines of the table of CAL.STANDARD: states, terms with law and size, result. Energies carry the sign they have when added to ΔU. */
import type { ThreeTerms } from "../core/calorimeter/standard-state/approximate";
import type { Reduction } from "../core/calorimeter/standard-state/reduction";
import { compoundFigures, type VesselRun } from "../core/calorimeter/standard-state/states";
import type { TermName } from "../core/calorimeter/standard-state/terms";
import { standardState } from "../data/standard-state";
import { line, type Line } from "./table";

const { gas, water, oxygen, carbonDioxide, acids } = standardState;

const FULL =
  "all terms of Hubbard, Scott and Waddington 1956, figures from memory; benzoic acid at 26434 J/g under certificate conditions gives 26413.2 J/g, accepted 26413.6; its dependence on pressure, loads and temperature agrees with the certificate factor within 10 %";
const THREE_TERM = "approximate; not for publication; good to some 4 J/g (0.015 %) for compounds of C, H and O near 30 atm";
const PERCENT =
  "approximate; not for publication; Washburn 1933 from memory, within 0.005 % of ΔU of the full form for up to 1 g of benzoic acid, sucrose, naphthalene and isooctane in 340 mL at 30 atm";
const NOT_COUNTED = "air left in the vessel, fuse and aids, dissolved nitrogen, heat of dilution of nitric acid";

/** Lines of the full form. */
export function fullLines(run: VesselRun, reduction: Reduction): Line[] {
  return [
    ...resultLines(run, reduction.energy),
    line("form", "full", "", FULL),
    ...beforeLines(run, reduction),
    ...afterLines(reduction),
    line("energy of the vessel process ΔU", reduction.vessel, "J", "minus mass times specific energy; to it the terms are added"),
    ...reduction.terms.map(({ name, energy }) => line(name, energy, "J", notes(run)[name])),
    line("sum of the terms", reduction.sum, "J", "to be added to the negative ΔU"),
    ...sulfurLines(run, reduction),
    line("not counted", NOT_COUNTED),
  ];
}

function beforeLines(run: VesselRun, { before }: Reduction): Line[] {
  return [
    line("compound", before.compound, "mol", `${run.molarMass} g/mol`),
    line("oxygen pressure at 25 °C", before.pressure, "MPa"),
    line("oxygen before, gas", before.oxygenGas, "mol", "p V = n R T (1 − μ p) beside sample and water"),
    line("oxygen before, dissolved", before.oxygenDissolved, "mol", `Henry, ${oxygen.solubility} mol/(L atm)`),
    line("oxygen needed", before.oxygenNeeded, "mol", "by the compound and the acids"),
    line("vapour before", before.vapour, "mol", before.saturated ? "saturated under the oxygen" : "all of the water"),
    line("liquid water before", before.liquid, "g"),
  ];
}

function afterLines({ after }: Reduction): Line[] {
  return [
    line("pressure after", after.pressure, "MPa", "of the dry gas at 25 °C"),
    line("mole fraction of CO2 after", after.fraction, "mol/mol", "x, in the dry gas"),
    line("carbon dioxide after, gas", after.carbonDioxideGas, "mol"),
    line("carbon dioxide after, dissolved", after.carbonDioxideDissolved, "mol", `Henry, ${carbonDioxide.solubility} mol/(L atm)`),
    line("other gas after", after.otherGas, "mol", "oxygen and nitrogen"),
    line("oxygen after, dissolved", after.oxygenDissolved, "mol", `Henry, ${oxygen.solubility} mol/(L atm)`),
    line("vapour after", after.vapour, "mol", after.saturated ? "saturated under the gas" : "all of the water"),
    line("liquid water after", after.liquid, "g"),
  ];
}

function notes(run: VesselRun): Readonly<Record<TermName, string>> {
  const { density, expansion, specificHeat } = compoundFigures(run, standardState);
  const phase = run.formula.phase === "l" ? "a liquid" : "a solid";
  const taken = run.density === undefined ? `${density} g/cm3 taken` : `${density} g/cm3`;
  return {
    "to 25 °C": `(C after − C before)(25 °C − t); ${specificHeat} J/(g K) taken for ${phase}`,
    "compression of the compound": `−T α V Δp; α ${expansion} 1/K taken for ${phase}, density ${taken}`,
    "compression of the water": `−T α V Δp; α ${water.expansion} 1/K`,
    "evaporation of water": `${water.vaporisation / 1000} kJ/mol`,
    "dissolution of oxygen": `${oxygen.energy / 1000} kJ/mol`,
    "oxygen to the pressure of the charge": `−${gas.energy} J/(mol atm) p n`,
    "gas to no pressure": `${gas.energy} J/(mol atm) p n (1 + ${gas.energyLinear} x (1 + x)), Washburn`,
    "release of carbon dioxide": `${-carbonDioxide.energy / 1000} kJ/mol`,
    "release of oxygen": `${-oxygen.energy / 1000} kJ/mol`,
    "condensation of vapour": `−${water.vaporisation / 1000} kJ/mol`,
    "decomposition of nitric acid": `${acids.nitricDecomposition / 1000} kJ/mol to N2, O2 and water; 0 if its heat was deducted before`,
    "sulfuric acid to 115 H2O": "heats of dilution, known to 0.4 kJ/mol; 0 if no acid was given",
    "decompression of the water": `T α V Δp; α ${water.expansion} 1/K`,
  };
}

/** Energy of the mass burnt, J, by mass and by amount, and the correction it makes. */
function resultLines({ mass, molarMass, specificEnergy, sulfuric }: VesselRun, energy: number): Line[] {
  const specific = energy / mass;
  return [
    line("−ΔcU°", -specific, "J/g", sulfuric > 0 ? "as tables of thermochemistry give it" : "the value for FUEL.COMBUSTION, given energy"),
    line("ΔcU°", specific, "J/g", `between standard states at 25 °C: CO2(g), H2O(l), N2(g)${sulfuric > 0 ? ", H2SO4·115 H2O" : ""}`),
    line("ΔcU°, molar", (specific * molarMass) / 1000, "kJ/mol"),
    line("correction", 100 * (-specific / specificEnergy - 1), "%", "of the specific energy"),
  ];
}

function sulfurLines({ sulfuric }: VesselRun, { specific, sulfur }: Reduction): Line[] {
  if (sulfuric === 0) return [];
  return [
    line(
      "−ΔcU°, sulfur to SO2(g)",
      specific - sulfur,
      "J/g",
      `${-acids.sulfuricFormation / 1000} kJ/mol less; the value for FUEL.COMBUSTION, given energy`,
    ),
  ];
}

/** Lines of the three-term form. */
export function threeTermLines(run: VesselRun, { before, after, dissolved, pressure, fraction }: ThreeTerms): Line[] {
  const vessel = -run.mass * run.specificEnergy;
  const sum = before + after + dissolved;
  return [
    ...resultLines(run, vessel + sum),
    line("form", "three-term", "", THREE_TERM),
    line("pressure after", pressure, "MPa", "ideal gas beside the liquid water"),
    line("mole fraction of CO2 after", fraction, "mol/mol", "x"),
    line("energy of the vessel process ΔU", vessel, "J", "minus mass times specific energy; to it the terms are added"),
    line("oxygen to the pressure of the charge", before, "J", `−${gas.energy} J/(mol atm) p n, ideal gas in the empty vessel`),
    line("gas to no pressure", after, "J", `${gas.energy} J/(mol atm) p n (1 + ${gas.energyLinear} x (1 + x))`),
    line(
      "release of carbon dioxide",
      dissolved,
      "J",
      `${-carbonDioxide.energy / 1000} kJ/mol, Henry ${carbonDioxide.solubility} mol/(L atm)`,
    ),
    line("sum of the terms", sum, "J", "to be added to the negative ΔU"),
  ];
}

/** Lines of the percent form. */
export function percentLines(run: VesselRun, percent: number): Line[] {
  const vessel = -run.mass * run.specificEnergy;
  return [
    ...resultLines(run, vessel * (1 + percent / 100)),
    line("form", "percent", "", PERCENT),
    line("energy of the vessel process ΔU", vessel, "J", "minus mass times specific energy"),
  ];
}

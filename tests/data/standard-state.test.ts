/** Figures of the reduction to the standard state against their own sources inside the library, and against one another. */
import { saturationPressure } from "../../src/core/water/saturation";
import { combustionProducts } from "../../src/data/combustion-products";
import { allSources } from "../../src/data/library";
import { saturation } from "../../src/data/saturation";
import { standardState } from "../../src/data/standard-state";
import table from "../../src/data/standard-state.json";
import { number } from "../functions/helpers";

const RT = 2.478957;

test("vapour pressure of water is that of the IAPWS equation to the digits printed", () => {
  expect(standardState.water.vapourPressure).toBeCloseTo(saturationPressure(298.15, saturation) / 1e6, 7);
});

test("heat capacities of the gases are those of nasa-2002", () => {
  expect(standardState.gas.heatCapacity.oxygen).toBeCloseTo(number("CV.AT", "O2", 298.15, null, "nasa-2002"), 1);
  expect(standardState.gas.heatCapacity.carbonDioxide).toBeCloseTo(number("CV.AT", "CO2", 298.15, null, "nasa-2002"), 1);
});

test("energies that follow from CODATA formation values, enthalpy less RT for each mole of gas", () => {
  const { water, carbonDioxide, sulfurDioxide } = combustionProducts;
  // H2O(g) −241.826 kJ/mol
  expect(standardState.water.vaporisation / 1000).toBeCloseTo(-241.826 - water.formation - RT, 3);
  // CO2(aq) −413.26 ± 0.20 kJ/mol; O2(aq) −12.09 kJ/mol (from memory)
  expect(Math.abs(standardState.carbonDioxide.energy / 1000 - (-413.26 - carbonDioxide.formation + RT))).toBeLessThan(0.2);
  expect(Math.abs(standardState.oxygen.energy / 1000 - (-12.09 + RT))).toBeLessThan(0.1);
  // H2SO4 in 115 H2O −887.811 kJ/mol (1982 tables, from memory)
  const sulfuric = -887.811 - sulfurDioxide.formation - water.formation + 1.5 * RT;
  expect(standardState.acids.sulfuricFormation / 1000).toBeCloseTo(sulfuric, 1);
});

test("the energy of oxygen is −T dB/dT, 65 mL/mol: 0.218 mL/(mol K) (from memory)", () => {
  expect(Math.abs(standardState.gas.energy / 0.101325 / 298.15 - 0.218)).toBeLessThan(0.001);
});

test("heats of dilution grow with the water", () => {
  const { dilution } = standardState.acids;
  dilution.slice(1).forEach(({ water, heat }, index) => {
    expect(water).toBeGreaterThan(dilution[index]!.water);
    expect(heat).toBeGreaterThan(dilution[index]!.heat);
  });
});

test("every block names a source of the library", () => {
  const keys = new Set(allSources().map(({ key }) => key));
  const blocks = Object.entries(table).filter(([, block]) => typeof block === "object") as [string, { source: string }][];
  expect(blocks.length).toBe(8);
  expect(blocks.filter(([, { source }]) => !keys.has(source)).map(([name]) => name)).toEqual([]);
  expect(keys.has(combustionProducts.source)).toBe(true);
});

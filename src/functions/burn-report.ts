/** The table of BURN: the state after combustion in a closed vessel, its composition, and how far it can be trusted. */
import { printed } from "../core/refusal";
import { molarMass } from "../core/species/formula";
import { atomicWeights } from "../data/library";
import { type BurnBlocks, BurnReader, type Burnt, type Product } from "./burnt";
import { Block, cells } from "./cell";
import { COMPLETE_WORDS } from "./complete-state";
import { speciesLines } from "./species-lines";
import { line, type Line, type Report, SEE_NOTE, table } from "./table";

const CAUTION =
  "deflagration in one closed vessel, without loss of heat: pressure piling, turbulence, transition to detonation and vent sizing are outside, and whether the mixture ignites is not checked; not a design or relief calculation: the vessel's own rating, local codes and licensed practice govern";
const ASSUMPTIONS = "ideal gas; solids and liquids have no volume and U = H; the energy and the volume are held, walls take up nothing";

/** Upright table, or one row for each of a column of states. Plain units K and Pa. */
export function burnCells(blocks: BurnBlocks): Block {
  return cells(() => {
    const reader = new BurnReader(blocks);
    const sweep = reader.named.some(([, block]) => (block?.length ?? 1) > 1);
    return table(reader.named, (values) => report(reader.burnt(values), sweep));
  });
}

function report(burnt: Burnt, sweep: boolean): Report {
  const { start, temperature, pressure, gas } = burnt;
  return {
    lines: [
      line("final temperature", temperature, "K"),
      line("final pressure", pressure, "Pa", "absolute"),
      line("pressure ratio", pressure / start.pressure, "", "final pressure to P0, both absolute"),
      line("gas formed to gas put in", gas / start.gas, "mol/mol"),
      line(
        "fuel in the mixture",
        100 * fuelShare(burnt),
        "%",
        `mol of fuel to mol of fuel and oxidant; ${sideText(start.ratio)}${concentrationText(start)}`,
      ),
      line("mixture", mixtureText(burnt), "", "mol for one mole of fuel"),
      ...estimateLines(burnt),
      ...productLines(burnt, sweep),
      line("products", burnt.species, "", leftOutText(burnt)),
      ...residualLines(burnt),
      line("assumptions", SEE_NOTE, "", ASSUMPTIONS),
      line("caution", SEE_NOTE, "", CAUTION),
    ],
    warnings: burnt.notes,
  };
}

/** Behind the figures, which stand in the same lines for either kind of products. */
function estimateLines({ kind }: Burnt): Line[] {
  return kind === "complete" ? [line("complete products", SEE_NOTE, "", COMPLETE_WORDS)] : [];
}

function fuelShare({ start }: Burnt): number {
  const fuel = start.fuel.reactants.reduce((sum, { amount }) => sum + amount, 0);
  return fuel / start.reactants.reduce((sum, { amount }) => sum + amount, 0);
}

/** Which side of 1 the ratio lies on, beside the oxidant to what is needed, which others write. */
function sideText(ratio: number): string {
  const side = ratio < 1 ? "lean" : ratio > 1 ? "rich" : "stoichiometric";
  return `${side}: ${printed(1 / ratio)} times the oxidant that just suffices`;
}

/** Of solid and liquid fuels, as dusts and mists are tested: grams in each cubic metre of the gas they stand in. */
function concentrationText({ reactants, volume }: Burnt["start"]): string {
  const condensed = reactants.filter(({ amount, capacity }) => amount > 0 && capacity.phase !== "g");
  const mass = condensed.reduce((sum, { amount, counts }) => sum + amount * molarMass({ counts, charge: 0 }, atomicWeights), 0);
  return mass === 0 ? "" : `; ${printed(mass / volume)} g of solids and liquids, without ash, for each m3 of gas`;
}

function mixtureText({ start }: Burnt): string {
  return start.reactants.map(({ name, amount }) => `${printed(amount)} ${name}`).join(" + ");
}

function productLines({ products, listed, kind }: Burnt, sweep: boolean): Line[] {
  return speciesLines(products, sweep || listed || kind === "complete", productLine, { of: "the gas", way: "see BURN.FRACTION" });
}

function productLine({ name, fraction, condensed }: Product): Line {
  return line(name, fraction, "mol/mol", condensed ? "condensed: mol for each mol of gas" : "mole fraction in the gas");
}

function leftOutText({ equilibrium, temperature }: Burnt): string {
  const leftOut = equilibrium?.leftOut ?? [];
  return leftOut.length === 0 ? "" : `left out, as they have no value at ${printed(temperature)} K: ${leftOut.join(", ")}`;
}

/** How well the answer obeys its own laws; above 1e-9 it is refused. */
function residualLines({ equilibrium }: Burnt): Line[] {
  if (equilibrium === undefined) return [];
  return [
    line("mass-action residual", equilibrium.massAction, "", "largest |ln Q − ln K| over all species"),
    line("element residual", equilibrium.elements, "", "largest relative difference of an element"),
  ];
}

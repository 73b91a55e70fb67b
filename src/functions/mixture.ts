/** Family mixture: mixture text from amounts, its table, and humid air. */
import { saturationPressure } from "../core/water/saturation";
import { Refusal, refuse } from "../core/refusal";
import { findSpecies, namedMixture } from "../data/library";
import { saturation } from "../data/saturation";
import { PRESSURE, quoted, readFraction, readPressure, readQuantity, readTemperature, readText } from "./arguments";
import { shapeOf, spread } from "./broadcast";
import { Block, Cell, CellError, cells, isTextLeftOut, plain } from "./cell";
import { mixtureText, requireFractions, total } from "./composition";
import { FIRST_CHOICE } from "./set";
import { substanceArgument, substanceOf } from "./substance";

type Basis = "mole" | "mass" | "volume" | "pressure";
const BASES: readonly Basis[] = ["mole", "mass", "volume", "pressure"];

/**
 * Mixture text in mole fractions, for the substance argument of the other functions. Fractions must add up to 1; "normalise" scales any amounts on request.
 * @param species Species, one cell each [-] list
 * @param amounts Fractions or amounts of the species, in the same order; also as text such as "79 %" or, for the basis pressure, "0.2 bar" [-] list
 * @param basis What the amounts are: "mole" if left out, "mass", "volume" (ideal gas: as mole) or "pressure" (partial pressures, Dalton: scaled by their sum) [-] value
 * @param normalise The word "normalise", if the amounts are to be scaled to the sum 1 [-] value
 * @returns Mixture text in mole fractions [-]
 * @source ciaaw-2021
 * @example STILL.MIX({"N2","O2"},{0.79,0.21}) -> "0.79 N2 + 0.21 O2"
 * @example STILL.MIX({"N2","O2"},{3,1},"mole","normalise") -> "0.75 N2 + 0.25 O2"
 * @example STILL.MIX({"N2","O2"},{0.7,0.2}) -> #VALUE! The mole fractions add up to 0.9
 * @customfunction MIX
 */
export function mix(species: any[][], amounts: any[][], basis?: any[][], normalise?: any[][]): any[][] {
  return cells(() => {
    const kind = readBasis(basis);
    const scaled = readNormalise(normalise) || kind === "pressure";
    const parts = paired(species, amounts, kind).map(({ text, amount }) => ({ species: text, amount: amount / weightOf(text, kind) }));
    const sum = total(parts);
    if (!scaled) requireGiven(paired(species, amounts, kind), kind);
    if (!(sum > 0)) refuse("The mixture holds no species with an amount above zero");
    const fractions = scaled || kind === "mass" ? parts.map((part) => ({ ...part, amount: part.amount / sum })) : parts;
    return [[mixtureText(fractions.filter((part) => part.amount > 0))]];
  });
}

function readBasis(block: Block | undefined): Basis {
  if (isTextLeftOut(block)) return "mole";
  const text = readText(plain(block![0]![0]), "basis");
  return BASES.find((word) => word === text?.toLowerCase()) ?? refuse(`The basis "${text}" is not one of ${BASES.join(", ")}`);
}

function readNormalise(block: Block | undefined): boolean {
  if (isTextLeftOut(block)) return false;
  const text = readText(plain(block![0]![0]), "fourth argument");
  return (
    text?.toLowerCase() === "normalise" ||
    text?.toLowerCase() === "normalize" ||
    refuse(`The fourth argument is "${text}"; the only word it takes is "normalise"`)
  );
}

/** Mass fractions are divided by the molar mass; the other bases count molecules. */
function weightOf(text: string, kind: Basis): number {
  const { molarMass } = findSpecies(text);
  return kind === "mass" ? molarMass : 1;
}

function requireGiven(parts: readonly { text: string; amount: number }[], kind: Basis): void {
  if (kind === "mole") return requireFractions(parts.map(({ text, amount }) => ({ species: text, amount })));
  const sum = parts.reduce((added, { amount }) => added + amount, 0);
  if (Math.abs(sum - 1) > 1e-6)
    throw new Refusal(
      "range",
      `The ${kind} fractions add up to ${Number(sum.toPrecision(10))}, not to 1 within 0.000001; the word "normalise" as fourth argument scales them`,
    );
}

function paired(species: Block, amounts: Block, kind: Basis): readonly { text: string; amount: number }[] {
  const [names, values] = [flat(species, "species"), flat(amounts, "amounts")];
  if (names.length !== values.length)
    refuse(`There are ${names.length} species and ${values.length} amounts; give as many of one as of the other`);
  return names.flatMap((name, index) => {
    const value = values[index]!;
    for (const cell of [name, value]) if (cell instanceof CellError) throw cell;
    if (name === null && (value === null || value === 0)) return [];
    if (typeof name !== "string") return refuse(`Species ${index + 1} is ${quoted(name)}; a text such as "N2" is expected`);
    const amount = amountOf(value, name, kind);
    return amount >= 0 ? [{ text: name.trim(), amount }] : refuse(`The amount of ${name} is ${amount}; amounts are not negative`);
  });
}

function amountOf(cell: Cell, name: string, kind: Basis): number {
  const words = `The amount of ${name}`;
  return kind === "pressure" ? readQuantity(cell, { name: words, unit: "Pa", example: '"0.2 bar"' }) : readFraction(cell, words);
}

function flat(block: Block, name: string): Cell[] {
  const { rows, columns } = shapeOf(block);
  if (rows > 1 && columns > 1) refuse(`The ${name} are ${rows} rows × ${columns} columns; give one row or one column`);
  return block.flat().map(plain);
}

/**
 * Table of a mixture: species, mole fraction and mass fraction, with a heading row; the table itself may serve as a substance argument.
 * @param substance Mixture text, named mixture such as "air", species, or a range of species and mole fractions [-] block
 * @returns Heading row, then one row for each species [-]
 * @source ciaaw-2021
 * @example STILL.MIX.TABLE("N2") -> {"species","mole fraction","mass fraction";"N2",1,1}
 * @example STILL.MIX.TABLE("0.5 N2 + 0.5 O2") -> ~ {"species","mole fraction","mass fraction";"N2",0.5,0.4668;"O2",0.5,0.5332}
 * @customfunction MIX.TABLE
 */
export function mixTable(substance: any[][]): any[][] {
  return cells(() => {
    const argument = substanceArgument(substance);
    const { rows, columns } = shapeOf(argument.texts ?? [[null]]);
    if (rows * columns > 1) refuse(`MIX.TABLE takes one mixture, not ${rows * columns} cells`);
    const { parts, molarMass } = substanceOf(argument, plain(argument.texts?.[0]?.[0]), FIRST_CHOICE);
    return [
      ["species", "mole fraction", "mass fraction"],
      ...parts.map(({ species, fraction, fit }) => [
        species,
        fraction,
        parts.length === 1 ? 1 : (fraction * fit.molarMass) / 1000 / molarMass,
      ]),
    ];
  });
}

/**
 * Mixture text of humid air: dry air and water vapour at a relative humidity (0 to 1), ideal gases; over ice below the triple point.
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param pressure Absolute pressure, also as text such as "985 mbar" [Pa] value
 * @param relative_humidity Relative humidity from 0 to 1, also as text such as "45 %" [-] value
 * @returns Mixture text in mole fractions [-]
 * @source iapws-sr1-86
 * @example STILL.MIX.HUMIDAIR("25 °C",101325,0) -> "0.78084 N2 + 0.20946 O2 + 0.0093 Ar + 0.0004 CO2"
 * @example STILL.MOLARMASS(STILL.MIX.HUMIDAIR("25 °C",101325,"100 %")) -> ~ 28.62
 * @customfunction MIX.HUMIDAIR
 */
export function mixHumidair(temperature: any[][], pressure: any[][], relative_humidity: any[][]): any[][] {
  return spread(
    [
      ["temperature", temperature],
      ["pressure", pressure],
      ["relative_humidity", relative_humidity],
    ],
    ([t, p, humidity]) => {
      const kelvin = readTemperature(t);
      const pascal = readPressure(p, PRESSURE);
      const relative = readFraction(humidity, "The relative humidity");
      if (!(relative >= 0 && relative <= 1))
        throw new Refusal("range", `The relative humidity ${relative} is not between 0 and 1; write a percentage as "45 %"`);
      const vapour = (relative * saturationPressure(kelvin, saturation)) / pascal;
      if (vapour >= 1)
        throw new Refusal(
          "range",
          `Water vapour alone would have ${Number((vapour * pascal).toPrecision(6))} Pa at ${kelvin} K, which is not below the pressure of ${pascal} Pa`,
        );
      const dry = namedMixture("air")!.parts.map(({ species, fraction }) => ({ species, amount: fraction * (1 - vapour) }));
      return mixtureText(vapour === 0 ? dry : [...dry, { species: "H2O", amount: vapour }]);
    },
  );
}

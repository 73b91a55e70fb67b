/** Family units: conversion with four calories and Btu kept apart, and gauge readings made absolute. */
import { Refusal, refuse } from "../core/refusal";
import { absoluteOfGauge, dimensionOf, fromBase, nameOfDimension, parseUnit, toBase, Unit } from "../core/units";
import { readNumber, readPressure, readText } from "./arguments";
import { spread } from "./broadcast";
import { Cell, cells, finite, isLeftOut } from "./cell";
import { inUnit } from "./result-unit";
import { FIRST_CHOICE } from "./set";
import { substanceArgument, substanceOf } from "./substance";

const PASCAL = dimensionOf("Pa");
const STANDARD_ATMOSPHERE = 101325;

/**
 * Converts a value between units. Molar and mass units are converted into each other if the substance is given.
 * @param value Value in the unit from [-] value
 * @param from Unit of the value, such as "cal_th/g" [-] value
 * @param to Unit of the result, such as "J/kg" [-] value
 * @param substance Species or mixture whose molar mass links amount and mass [-] value
 * @returns Value in the unit to [-]
 * @source si-2019
 * @example STILL.UNITS(1,"Btu_IT/lb","J/g") -> 2.326
 * @example STILL.UNITS(25,"°C","K") -> 298.15
 * @example STILL.UNITS(1,"cal","J") -> #VALUE! "cal" has several sizes: say cal_th
 * @customfunction UNITS
 */
export function units(value: any[][], from: any[][], to: any[][], substance?: any[][]): any[][] {
  return cells(() => {
    const argument = isLeftOut(substance) ? undefined : substanceArgument(substance);
    return spread(
      [
        ["value", value],
        ["from", from],
        ["to", to],
        ["substance", argument?.texts],
      ],
      ([number, fromCell, toCell, text]) => {
        const [source, target] = [unitOf(fromCell, "from"), unitOf(toCell, "to")];
        const molarMass = argument ? substanceOf(argument, text, FIRST_CHOICE).molarMass : undefined;
        return finite(fromBase(linked(toBase(readNumber(number, "The value"), source), source, target, molarMass), target));
      },
    );
  });
}

/**
 * Absolute pressure from a gauge reading: gauge plus atmosphere.
 * @param gauge Gauge reading in the unit from; vacuum is negative [-] value
 * @param from Unit of the reading, such as "bar" or "psi", also written "barg" or "psig" [-] value
 * @param to Unit of the result; pascal if left out [-] value
 * @param atmosphere Atmospheric pressure, also as text such as "985 mbar"; 101325 Pa if left out [Pa] value
 * @returns Absolute pressure [Pa]
 * @source si-2019
 * @example STILL.UNITS.ABSOLUTE(1,"bar") -> 201325
 * @example STILL.UNITS.ABSOLUTE(0,"psig","atm") -> 1
 * @customfunction UNITS.ABSOLUTE
 */
export function unitsAbsolute(gauge: any[][], from: any[][], to?: any[][], atmosphere?: any[][]): any[][] {
  return spread(
    [
      ["gauge", gauge],
      ["from", from],
      ["to", to],
      ["atmosphere", atmosphere],
    ],
    ([number, fromCell, toCell, atmosphereCell]) => {
      const from = requiredText(fromCell, "from");
      const unit = parseUnit(absoluteOfGauge(from) ?? from);
      if (unit.dimension !== PASCAL) refuse(`The unit "${unit.text}" is not a pressure such as "bar" or "psi"`);
      const around =
        atmosphereCell === undefined || atmosphereCell === null
          ? STANDARD_ATMOSPHERE
          : readPressure(atmosphereCell, { name: "Atmosphere", unit: "Pa", example: '"985 mbar"' });
      const absolute = toBase(readNumber(number, "The gauge reading"), unit) + around;
      if (!(absolute > 0))
        throw new Refusal(
          "range",
          `A gauge reading of ${String(number)} ${unit.text} lies below vacuum when the atmosphere is ${around} Pa`,
        );
      return finite(inUnit(absolute, readText(toCell, "unit"), "Pa", 'a pressure such as "bar"'));
    },
  );
}

function requiredText(cell: Cell | undefined, name: string): string {
  return readText(cell, `unit ${name}`) ?? refuse(`The unit ${name} is missing`);
}

function unitOf(cell: Cell | undefined, name: string): Unit {
  return parseUnit(requiredText(cell, name));
}

/** A value in SI units of the source carried to SI units of the target, through the molar mass where one is by mass and the other by amount. */
function linked(base: number, source: Unit, target: Unit, molarMass: number | undefined): number {
  if (source.dimension === target.dimension) return base;
  const power = massPerAmountPower(source, target);
  if (power === 0)
    return refuse(
      `"${source.text}" is ${nameOfDimension(source.dimension)} and "${target.text}" is ${nameOfDimension(target.dimension)}; they cannot be converted into each other`,
    );
  if (molarMass === undefined)
    return refuse(
      `"${source.text}" and "${target.text}" differ by amount against mass; name the substance as fourth argument, such as "CH4"`,
    );
  return base * molarMass ** power;
}

/** The canonical dimension is itself a unit text. +1 if the source times kg/mol has the dimension of the target, −1 if the source divided by it has, else 0. */
function massPerAmountPower(source: Unit, target: Unit): -1 | 0 | 1 {
  if (dimensionOf(`${source.dimension} kg/mol`) === target.dimension) return 1;
  return dimensionOf(`${source.dimension} mol/kg`) === target.dimension ? -1 : 0;
}

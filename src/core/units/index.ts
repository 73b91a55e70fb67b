/** Quantity text with units to SI and back. Built on the unit part of mathjs; the one core folder that imports a package. */
export type { Quantity, Unit } from "./types";
export { absoluteOfGauge, dimensionOf, isUnit, parseUnit } from "./parse";
export { beginsWithNumber, parseQuantity } from "./quantity";
export { fromBase, intervalFromBase, intervalToBase, toBase } from "./convert";
export { dimensions, nameOfDimension, parseUnitOf, requireDimension } from "./dimensions";

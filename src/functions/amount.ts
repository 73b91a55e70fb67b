/** The amount argument: moles as a plain number, or a text such as "2 mol" or "60 g"; left out where the composition range holds moles. */
import { Refusal, refuse } from "../core/refusal";
import { dimensionOf, parseQuantity, toBase } from "../core/units";
import { quoted } from "./arguments";
import type { Cell } from "./cell";
import type { Substance } from "./substance";

const MOLES = dimensionOf("mol");
const MASS = dimensionOf("kg");

/** The amount in mol. */
export function readAmount(cell: Cell | undefined, substance: Substance): number {
  const moles = typeof cell === "number" ? cell : fromText(cell, substance);
  if (Number.isFinite(moles) && moles > 0) return moles;
  throw new Refusal("range", `Amount ${quoted(cell)} is not above zero`);
}

function fromText(cell: Cell | undefined, { molarMass }: Substance): number {
  if (typeof cell !== "string" || Number.isFinite(Number(cell))) {
    return refuse(
      `The amount is ${typeof cell === "string" ? `the text "${cell}"` : quoted(cell)}: give moles as a number, or a text such as "2 mol" or "60 g"`,
    );
  }
  const { value, unit } = parseQuantity(cell);
  if (unit.dimension === MOLES) return toBase(value, unit);
  if (unit.dimension === MASS) return toBase(value, unit) / molarMass;
  return refuse(`The amount "${cell}" is neither an amount nor a mass; write a text such as "2 mol" or "60 g"`);
}

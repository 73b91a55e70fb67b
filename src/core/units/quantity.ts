/** Text of a number with its unit to Quantity, remembered. */
import { Refusal, refuse } from "../refusal";
import { BoundedMap } from "./bounded";
import { parseUnit } from "./parse";
import type { Quantity } from "./types";

const longestText = 140;

const remembered = new BoundedMap<Quantity | Refusal>(20000);

const leadingNumber = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/;
const minus = /^[\u2212\u2013]/;

/** Whether a text begins with a number, as every quantity does. */
export function beginsWithNumber(text: string): boolean {
  return leadingNumber.test(text.trim().replace(minus, "-"));
}

/**
 * Reads `"25 °C"`, `"2.5 bar"`, `"60 g"`, `"1e5 Pa"`, `"8 %"`; a number alone has the unit 1. Throws a Refusal of kind "input":
 * no number, a comma or thousands mark in the number, or what `parseUnit` refuses.
 */
export function parseQuantity(text: string): Quantity {
  const found = remembered.get(text) ?? read(text);
  if (found instanceof Refusal) throw found;
  return found;
}

function read(text: string): Quantity | Refusal {
  if (text.length > longestText) return new Refusal("input", `"${text.slice(0, 40)}…" is not a quantity: it has ${text.length} characters`);
  let found: Quantity | Refusal;
  try {
    found = Object.freeze(newQuantity(text.trim()));
  } catch (refusal) {
    if (!(refusal instanceof Refusal)) throw refusal;
    found = refusal;
  }
  remembered.set(text, found);
  return found;
}

function newQuantity(typed: string): Quantity {
  const plain = typed.replace(minus, "-");
  const number = leadingNumber.exec(plain)?.[0];
  if (number === undefined) refuse(`"${typed}" does not begin with a number; write a quantity as "25 °C"`);
  const rest = plain.slice(number.length);
  refuseMarks(typed, number, rest);
  const value = Number(number);
  if (!Number.isFinite(value)) refuse(`"${typed}" is beyond the largest number a cell can hold`);
  return { value, unit: parseUnit(rest.trim() === "" ? "1" : rest.trim()) };
}

/** Refuses what would make a different number for a different reader. */
function refuseMarks(typed: string, number: string, rest: string): void {
  if (/^,\d{3}(?!\d)/.test(rest))
    refuse(
      `"${typed}" has a comma that can mark thousands or decimals; write ${number}${rest.slice(1, 4)} or ${number}.${rest.slice(1, 4)}`,
    );
  if (/^,\d/.test(rest)) refuse(`"${typed}" has a decimal comma; write a point: "${typed.replace(",", ".")}"`);
  if (/^[\s'’_]\d{3}(?!\d)/.test(rest)) refuse(`"${typed}" has a thousands mark; write the number without it`);
  if (/^\s*[×x*·]\s*10/.test(rest)) refuse(`"${typed}" writes a power of ten in words; write it as 1e5`);
  if (/^[.\d]/.test(rest)) refuse(`"${typed}" does not begin with one readable number`);
}

/**
 * When a new value takes the place of the one in the file. A Stillwall number that differs at all does; a number of a
 * built-in function only if it differs by more than 1e-14 of its size, because two programs may add in another order.
 */
import { storedError } from "./patch/value";
import type { BookValue } from "./workbook";

/** Relative difference below which two numbers of a built-in function count as the same. */
export const BUILT_IN_TOLERANCE = 1e-14;

/** True if the new value is to be written. */
export function differs(old: BookValue, fresh: BookValue, stillwall: boolean): boolean {
  if (isError(old) || isError(fresh)) return !isError(old) || !isError(fresh) || storedError(old.error) !== storedError(fresh.error);
  if (typeof old !== "number" || typeof fresh !== "number") return old !== fresh;
  if (stillwall) return old !== fresh;
  return Math.abs(old - fresh) > BUILT_IN_TOLERANCE * Math.max(Math.abs(old), Math.abs(fresh));
}

/** True if the difference is to be shown: for numbers, if it is seen in 15 digits. */
export function isVisible(old: BookValue, fresh: BookValue): boolean {
  if (typeof old !== "number" || typeof fresh !== "number") return true;
  return old.toPrecision(15) !== fresh.toPrecision(15);
}

export const isError = (value: BookValue): value is { readonly error: string; readonly message?: string } =>
  typeof value === "object" && value !== null;

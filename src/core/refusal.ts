/**
 * The one way to say no. A refusal holds a sentence with what came and what is allowed, and its kind:
 *   "input"   wrong or missing input (a worksheet shows #VALUE!)
 *   "range"   a value outside the stated limits (#VALUE!)
 *   "absent"  something the library does not have (#N/A)
 * It is thrown inside the core and becomes a cell's error only in the last step of a worksheet function.
 * It is not an Error: a column may hold a million refused rows, and a stack trace for each would cost more than the rows.
 */
export type RefusalKind = "input" | "range" | "absent";

export class Refusal {
  constructor(
    readonly kind: RefusalKind,
    readonly message: string,
  ) {}

  toString(): string {
    return this.message;
  }
}

/** Throws the refusal of wrong input: `refuse("Temperature 0 K is not above 0 K")`. */
export function refuse(message: string): never {
  throw new Refusal("input", message);
}

/** Throws the refusal of a value outside its limits. The sentence names the value and the limit. */
export function refuseRange(message: string): never {
  throw new Refusal("range", message);
}

/** Throws the refusal of a thing the library does not hold. The sentence names the nearest things it does hold. */
export function refuseAbsent(message: string): never {
  throw new Refusal("absent", message);
}

/** A number as a refusal prints it: up to six significant digits, so that the sentence stays readable. */
export function printed(value: number): string {
  return String(Number(value.toPrecision(6)));
}

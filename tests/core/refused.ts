import { Refusal, type RefusalKind } from "../../src/core/refusal";

/** The refusal a call ends in; fails the test if the call gives a value or throws anything else. */
export function refusalOf(call: () => unknown): Refusal {
  let value: unknown;
  try {
    value = call();
  } catch (thrown) {
    if (thrown instanceof Refusal) return thrown;
    throw thrown;
  }
  throw new Error(`expected a refusal, got ${String(value)}`);
}

/** Kind and sentence in one text: `range: Temperature 5200 K is above …`. */
export function refusedWith(call: () => unknown): string {
  const refusal = refusalOf(call);
  const kind: RefusalKind = refusal.kind;
  return `${kind}: ${refusal.message}`;
}

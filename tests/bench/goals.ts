/** One line of the report: what was measured beside its goal. */
export interface Goal {
  readonly what: string;
  readonly measured: number;
  readonly unit: string;
  /** The goal: at most, or at least, this. Left out: the number is reported without a goal. */
  readonly atMost?: number;
  readonly atLeast?: number;
  /** A word on how it was measured. */
  readonly note?: string;
}

export function isMet({ measured, atMost = Infinity, atLeast = -Infinity }: Goal): boolean {
  return measured <= atMost && measured >= atLeast;
}

/** `met     1.02 ×   ≤ 1.5   Cv over 100,000 temperatures …` */
export function goalLine(goal: Goal): string {
  const { what, measured, unit, atMost, atLeast, note } = goal;
  const hasGoal = atMost !== undefined || atLeast !== undefined;
  const verdict = hasGoal ? (isMet(goal) ? "met" : "missed") : "";
  const limit = atMost !== undefined ? `≤ ${atMost}` : atLeast !== undefined ? `≥ ${atLeast}` : "";
  return `${verdict.padEnd(7)}${`${significant(measured)} ${unit}`.padStart(12)}  ${limit.padEnd(7)} ${what}${note === undefined ? "" : ` (${note})`}`;
}

function significant(value: number): string {
  return Number(value.toPrecision(3)).toLocaleString("en-GB", { maximumSignificantDigits: 3 });
}

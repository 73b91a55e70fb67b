/** The clock of NOW and TODAY, so that a calculation can be repeated. Left alone it is the computer's. */
let fixed: Date | undefined;

export function clock(): Date {
  return fixed ?? new Date();
}

/** Runs with the clock standing at a time. */
export function atTime<T>(time: Date | undefined, run: () => T): T {
  fixed = time;
  try {
    return run();
  } finally {
    fixed = undefined;
  }
}

/** Days since the start of 1900 as Excel counts them, by the local clock. */
export function serialOf(time: Date): number {
  const local = Date.UTC(
    time.getFullYear(),
    time.getMonth(),
    time.getDate(),
    time.getHours(),
    time.getMinutes(),
    time.getSeconds(),
    time.getMilliseconds(),
  );
  return local / 86400000 + 25569;
}

/** The engine reports its timings and caught errors on the console; a command's output must hold nothing of that. */
export function quietly<T>(run: () => T): T {
  const { debug, warn, error } = console;
  const silent = () => undefined;
  Object.assign(console, { debug: silent, warn: silent, error: silent });
  try {
    return run();
  } finally {
    Object.assign(console, { debug, warn, error });
  }
}

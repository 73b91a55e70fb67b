/** Writes to standard output and waits until it is taken, so that a slow reader holds the command back instead of filling memory. */
export function writeOut(text: string): Promise<void> {
  return new Promise((resolve) => {
    process.stdout.write(text, () => resolve());
  });
}

/** A reader that closes early (`| head`) ends the command quietly. */
export function endWithReader(): void {
  process.stdout.on("error", (error: NodeJS.ErrnoException) => {
    if (error.code === "EPIPE") process.exit(0);
    throw error;
  });
}

/** Resolves when the person presses Ctrl-C or the process is told to end. */
export function untilStopped(): Promise<void> {
  return new Promise((resolve) => {
    process.once('SIGINT', () => resolve()).once('SIGTERM', () => resolve());
  });
}

/**
 * Whether another process of this number is alive. Our own number on something we did not make belongs to an earlier
 * process.
 */
export function isRunning(id: number): boolean {
  if (id === process.pid) return false;
  try {
    process.kill(id, 0);
    return true;
  } catch (error) {
    return (error as NodeJS.ErrnoException).code === 'EPERM';
  }
}

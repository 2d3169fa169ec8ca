import { type OutputKind, type Staging, stageOutput } from '../../src/tables/outputFolder.ts';

/**
 * Lets `write` fill a new folder and puts it in the place of `out` when it succeeds. When it fails, or the person
 * stops it, `out` stays as it was and nothing is left beside it.
 */
export async function stagedRun(
  out: string,
  kind: OutputKind,
  write: (folder: string) => Promise<void>,
): Promise<void> {
  const staging = stageOutput(out, kind);
  const stop = stopper(staging);
  process.on('SIGINT', stop).on('SIGTERM', stop);
  try {
    await write(staging.folder);
    staging.publish();
  } catch (error) {
    staging.discard();
    throw error;
  } finally {
    process.off('SIGINT', stop).off('SIGTERM', stop);
  }
}

/** Ends the process as the shell expects of a stopped one: 128 plus the number of the signal. */
function stopper(staging: Staging): (signal: NodeJS.Signals) => void {
  return (signal) => {
    staging.discard();
    console.error('Stopped. Nothing was written.');
    process.exit(signal === 'SIGINT' ? 130 : 143);
  };
}

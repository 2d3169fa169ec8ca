import { OutputError } from '../../src/tables/outputFolder.ts';
import { UsageError } from './options.ts';
import { ContentError } from './readFolder.ts';

/**
 * Runs a command and sets its exit code. What the person in front can mend is told in its own words; anything else is
 * a fault of the program and keeps its stack.
 */
export async function runCommand(command: () => Promise<void>): Promise<void> {
  try {
    await command();
  } catch (error) {
    const mendable = error instanceof UsageError || error instanceof ContentError || error instanceof OutputError;
    console.error(mendable ? error.message : error);
    process.exitCode = 1;
  }
}

import { NoAdvice } from '../../src/tables/gridWish.ts';
import { OutputError } from '../../src/tables/outputFolder.ts';
import { AuditError } from './auditError.ts';
import { UsageError } from './options.ts';
import { ContentError } from './readFolder.ts';

const MENDABLE = [UsageError, ContentError, OutputError, NoAdvice, AuditError];

/**
 * Runs a command and sets its exit code. What the person in front can mend is told in its own words; anything else is
 * a fault of the program and keeps its stack.
 */
export async function runCommand(command: () => Promise<void>): Promise<void> {
  try {
    await command();
  } catch (error) {
    const mendable = MENDABLE.some((kind) => error instanceof kind);
    console.error(mendable ? (error as Error).message : error);
    process.exitCode = 1;
  }
}

import { mkdtempSync, realpathSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { onTestFinished } from 'vitest';

/** An empty folder that goes when the test ends. */
export function temporaryFolder(): string {
  const folder = mkdtempSync(join(realpathSync(tmpdir()), 'redbound-test-'));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}

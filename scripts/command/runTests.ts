import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { needPrograms } from './needPrograms.ts';
import { runTool } from './runTool.ts';

/** The part of the runner's JSON report that is used here. */
interface Report {
  readonly numPassedTests: number;
  readonly numFailedTests: number;
  readonly numPendingTests: number;
  readonly testResults: readonly {
    readonly status: string;
    readonly assertionResults: readonly { readonly status: string }[];
  }[];
}

/**
 * Runs the tests of some projects, all or those whose path contains one of `filters`, and ends with the line
 * `N passed, N failed`. Sets the exit code.
 */
export async function runTests(projects: readonly string[], filters: readonly string[]): Promise<void> {
  if (!needPrograms()) {
    process.exitCode = 1;
    return;
  }
  const folder = mkdtempSync(join(tmpdir(), 'redbound-report-'));
  const file = join(folder, 'report.json');
  const chosen = projects.flatMap((name) => ['--project', name]);
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
  const code = await runTool('vitest/vitest.mjs', ['run', ...chosen, ...reporters, ...filters]);
  const { passed, failed } = tally(file, code);
  rmSync(folder, { recursive: true });
  console.log(`${passed} passed, ${failed} failed`);
  process.exitCode = failed > 0 ? 1 : 0;
}

/** A file that could not be loaded, or a run that broke off, counts as one failure. */
function tally(file: string, code: number): { passed: number; failed: number } {
  const report = readReport(file);
  if (!report) return { passed: 0, failed: 1 };
  const broken = report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  );
  const failed = report.numFailedTests + broken.length;
  if (report.numPendingTests > 0) console.log(`${report.numPendingTests} skipped`);
  return { passed: report.numPassedTests, failed: failed === 0 && code !== 0 ? 1 : failed };
}

function readReport(file: string): Report | undefined {
  try {
    return JSON.parse(readFileSync(file, 'utf8')) as Report;
  } catch {
    return undefined; // the runner stopped before it wrote one
  }
}

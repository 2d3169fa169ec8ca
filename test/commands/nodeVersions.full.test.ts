import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { projectRoot } from '../support/runScript.ts';

/** The package that brings a Node.js for this machine; there is one for each kind of Linux. */
const NODE_PACKAGE = `node-linux-${process.arch}`;
const VERSIONS = ['22.23.5', '24.21.0', '26.12.1'] as const;

const scratch = mkdtempSync(join(tmpdir(), 'redbound-node-'));
afterAll(() => rmSync(scratch, { recursive: true, force: true }), 120_000);

/** Installs a Node.js beside the tests and gives its program. */
function nodeProgram(version: string): string {
  const folder = join(scratch, version);
  execFileSync('npm', [
    'install',
    '--no-save',
    '--no-audit',
    '--no-fund',
    '--prefix',
    folder,
    `${NODE_PACKAGE}@${version}`,
  ]);
  const program = join(folder, 'node_modules', NODE_PACKAGE, 'bin', 'node');
  expect(execFileSync(program, ['--version'], { encoding: 'utf8' }).trim()).toBe(`v${version}`);
  return program;
}

/** SHA-256 of every table that a Node.js computes, by file name. */
function tablesUnder(version: string): Readonly<Record<string, string>> {
  const out = join(scratch, `tables-${version}`);
  execFileSync(nodeProgram(version), ['scripts/node.mjs', 'tables', '--out', out], { cwd: projectRoot });
  const names = readdirSync(out, { recursive: true, encoding: 'utf8' }).filter((name) => name.endsWith('.csv'));
  const digest = (name: string) =>
    createHash('sha256')
      .update(readFileSync(join(out, name)))
      .digest('hex');
  return Object.fromEntries(names.sort().map((name) => [name, digest(name)]));
}

test('Node.js 22, 24 and 26 write the same bytes for every table', () => {
  const [first, ...others] = VERSIONS.map(tablesUnder);
  expect(Object.keys(first ?? {}).length).toBeGreaterThan(200);
  for (const other of others) expect(other).toEqual(first);
});

import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { projectRoot } from '../support/runScript.ts';

/** Runs a command with a Node.js that takes itself for another version. */
function helpWith(version: string) {
  const versions = JSON.stringify({ ...process.versions, node: version });
  const disguise = `data:text/javascript,Object.defineProperty(process,"versions",{value:${versions}})`;
  const args = ['--import', disguise, join(projectRoot, 'scripts/node.mjs'), 'tables', '--help'];
  return spawnSync(process.execPath, args, { encoding: 'utf8' });
}

describe('a command', () => {
  test.each(['20.20.2', '22.12.0', '22.17.1'])('says in one line that Node.js %s is too old', (version) => {
    const { status, stdout, stderr } = helpWith(version);
    expect(stderr).toMatch(
      new RegExp(`^Redbound needs Node\\.js 22\\.18 or newer .* this is Node\\.js ${version}\\..*\\n$`),
    );
    expect(stdout).toBe('');
    expect(status).toBe(1);
  });

  test.each(['22.18.0', '24.0.0', '26.1.0'])('runs with Node.js %s', (version) => {
    expect(helpWith(version).status).toBe(0);
  });
});

test('package.json asks for the same Node.js', () => {
  const { engines } = JSON.parse(readFileSync(join(projectRoot, 'package.json'), 'utf8'));
  expect(engines.node).toBe('>=22.18');
});

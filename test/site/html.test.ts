import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { findJava } from '../../scripts/command/programs.ts';
import { projectRoot } from '../support/runScript.ts';
import { site } from './harness.ts';

const VALIDATOR = join(projectRoot, 'node_modules/vnu-jar/build/dist/vnu.jar');

/** The validator reads files, so it cannot know that 'self' is where they come from. The browser tests watch the policy. */
const NOT_A_FAULT = '.*Resource violates Content Security Policy.*';

test('every page is valid HTML, and every style sheet valid CSS', () => {
  const java = findJava();
  if (java === undefined)
    throw new Error('The HTML validator needs a Java runtime: install one (npm test does, on Debian).');
  const args = ['-jar', VALIDATOR, '--skip-non-html', '--format', 'gnu', '--filterpattern', NOT_A_FAULT, site.dist];
  const { status, stderr } = spawnSync(java, args, { encoding: 'utf8', maxBuffer: 1e8 });
  expect(stderr.replaceAll(site.dist, '').split('\n').slice(0, 20).join('\n')).toBe('');
  expect(status).toBe(0);
});

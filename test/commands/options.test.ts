import { describe, expect, test } from 'vitest';
import { runScript } from '../support/runScript.ts';

const WITH_FOLDERS = ['build', 'tables', 'dev', 'start'];

describe.each(WITH_FOLDERS)('npm run %s', (name) => {
  test('--help says what it does and names its options', () => {
    const { code, stdout } = runScript(name, ['--help']);
    expect(code).toBe(0);
    expect(stdout).toContain(`npm run ${name} [-- OPTIONS]`);
    for (const option of ['--content DIR', '--out DIR', '--help']) expect(stdout).toContain(option);
  });

  test('refuses an unknown option', () => {
    const { code, stdout, stderr } = runScript(name, ['--contents', 'x']);
    expect(stderr).toBe(`Unknown option '--contents'\nOptions follow a lone --, as in: npm run ${name} -- --help\n`);
    expect(stdout).toBe('');
    expect(code).toBe(1);
  });
});

test.each([
  [['x'], "Unexpected argument 'x'."],
  [['--out'], "Option '--out <value>' argument missing"],
  [['--content', ''], '--content needs a folder.'],
])('%j is refused', (args, message) => {
  const { code, stderr } = runScript('tables', args);
  expect(stderr).toContain(message);
  expect(code).toBe(1);
});

test.each(['check', 'test', 'test-full'])('%s has a help text too', (name) => {
  const { code, stdout } = runScript(name, ['--help']);
  expect(code).toBe(0);
  expect(stdout).toMatch(/^npm (run )?(check|test|test:full)\b/);
});

import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { readContent } from '../../src/inputs/readContent.ts';
import { copyContent, editFile } from '../support/copyContent.ts';
import { runScript } from '../support/runScript.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';

const ASKED = ['--set', 'planck-2018-lensing', '--column', 'D_L_Mpc', '--error', '1e-6'];

test('npm run grid prints segments that a redshift grid can hold, and its table then states the error', () => {
  const content = join(temporaryFolder(), 'content');
  copyContent(content);
  const { code, stdout, stderr } = runScript('grid', [...ASKED, '--method', 'lagrange', '--content', content]);
  expect(stderr).toBe('');
  expect(code).toBe(0);
  const [, rows = '', error = ''] =
    /^# (\d+) rows; the largest error on them is (\S+), at z = \S+$/m.exec(stdout) ?? [];
  writeFileSync(join(content, 'redshift-grids', 'advised.yaml'), `title: Advised grid\n${stdout}`);
  editFile(join(content, 'editions', '2026.1', 'edition.yaml'), (text) =>
    text.replace(/redshift_grids: .*/, 'redshift_grids: [advised]'),
  );
  const read = readContent(content);
  if ('problems' in read) throw new Error(JSON.stringify(read.problems));
  const grid = read.content.redshiftGrids.find(({ id }) => id === 'advised');
  expect(grid?.redshifts).toHaveLength(Number(rows));

  const out = join(temporaryFolder(), 'out');
  expect(runScript('tables', ['--content', content, '--out', out]).code).toBe(0);
  const file = 'editions/2026.1/tables/planck-2018-lensing.distances.advised.interpolation.csv';
  const stated = readFileSync(join(out, file), 'utf8').match(/^D_L_Mpc,[^,]+,[^,]+,([^,]+)/m)?.[1];
  expect(stated).toBe(error);
  expect(Number(error)).toBeLessThanOrEqual(1e-6);
});

test('npm run grid -- --help says what it does and names its options', () => {
  const { code, stdout } = runScript('grid', ['--help']);
  expect(code).toBe(0);
  for (const option of ['--set ID', '--column C', '--error E', '--method M', '--from Z', '--to Z', '--content DIR']) {
    expect(stdout).toContain(option);
  }
});

test.each([
  [
    ['--set', 'plank-2018-lensing'],
    'There is no parameter set "plank-2018-lensing": did you mean planck-2018-lensing?',
  ],
  [['--column', 'd_l_mpc'], 'There is no column "d_l_mpc": did you mean D_L_Mpc?'],
  [['--error', '1.5'], '--error is 1.5; a relative error lies between 0 and 1, as 1e-6 does.'],
  [['--error', 'tiny'], '--error: "tiny" is not a decimal number such as 67.36 or 1e-9.'],
  [['--method', 'cubic'], '--method is "cubic"; it must be linear or lagrange.'],
  [['--from', '-1'], '--from is -1; a redshift is greater than -1 and at most 1000000.'],
  [['--from', '-0.5'], 'D_L_Mpc has no value at z = -0.5. Choose a range where it exists, with --from and --to.'],
  [['--to', '0'], 'The range must rise; it goes from 0 to 0.'],
  [['--set', ''], '--set is missing, as in: npm run grid -- --set planck-2018-lensing --column D_L_Mpc --error 1e-6'],
  [['--content', ''], '--content needs a folder.'],
  [['--steps', '3'], "Unknown option '--steps'\nOptions follow a lone --, as in: npm run grid -- --help"],
])('npm run grid refuses %j in one plain line', (wrong, message) => {
  const { code, stdout, stderr } = runScript('grid', [...ASKED, ...wrong]);
  expect(stderr).toBe(`${message}\n`);
  expect(stdout).toBe('');
  expect(code).toBe(1);
});

import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeEach, describe, expect, test } from 'vitest';
import { editFile } from '../support/copyContent.ts';
import { runScript } from '../support/runScript.ts';
import { smallContent } from '../support/smallContent.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';
import { treeHashes } from '../support/treeHashes.ts';

let parent: string;
let content: string;
let out: string;

beforeEach(() => {
  parent = temporaryFolder();
  content = join(parent, 'content');
  out = join(parent, 'out');
  smallContent(content);
});

const run = (name: string) => runScript(name, ['--content', content, '--out', out]);

describe('npm run tables', () => {
  test('writes the CSV files of every edition and says how many, and where', () => {
    const { code, stdout, stderr } = run('tables');
    expect(stderr).toBe('');
    expect(code).toBe(0);
    const [number = ''] = readdirSync(join(content, 'editions'));
    const files = readdirSync(join(out, 'editions', number, 'tables'));
    expect(files).toHaveLength(9);
    expect(files.every((file) => file.endsWith('.csv'))).toBe(true);
    expect(stdout).toMatch(/1 of 1 parameter sets computed/);
    expect(stdout).toMatch(
      new RegExp(
        `^Written: 5 tables, [\\d,]+ rows, [\\d,]+ cells \\(\\d+ settled in extended precision\\) in [\\d.]+ s, in ${out}\\n$`,
        'm',
      ),
    );
  });

  test('writes the bytes that a built site has, and leaves that site as it is', () => {
    expect(run('build').code).toBe(0);
    const built = treeHashes(out);
    const { code, stdout } = run('tables');
    expect(code).toBe(0);
    expect(stdout).toContain('The site holds these tables already');
    expect(treeHashes(out)).toEqual(built);
  });

  test('refuses to leave a site whose pages show other values than its files', () => {
    expect(run('build').code).toBe(0);
    const built = treeHashes(out);
    const set = /^parameter_sets:\s*- (\S+)/m.exec(readFileSync(editionFile(), 'utf8'))?.[1] ?? '';
    editFile(join(content, 'parameter-sets', `${set}.yaml`), (text) => text.replace(/(H0:[^\d]*)\d/, '$18'));
    const { code, stderr } = run('tables');
    expect(code).toBe(1);
    expect(stderr).toContain(`${out} holds a site whose pages show other values: 9 CSV files differ`);
    expect(treeHashes(out)).toEqual(built);
  });
});

describe('a folder for the output', () => {
  test.each(['tables', 'build'])(
    'that holds strange files is refused by npm run %s before anything is computed',
    (name) => {
      writeFileSync(join(parent, 'notes.txt'), '');
      const { code, stdout, stderr } = runScript(name, ['--content', content, '--out', parent]);
      expect(code).toBe(1);
      expect(stdout).toBe('');
      expect(stderr).toContain(`${parent} contains the content folder`);
    },
  );
});

function editionFile(): string {
  const [number = ''] = readdirSync(join(content, 'editions'));
  return join(content, 'editions', number, 'edition.yaml');
}

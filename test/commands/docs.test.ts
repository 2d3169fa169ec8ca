import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { projectRoot, runScript } from '../support/runScript.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';

const DOCUMENTS = ['README.md', 'DEVELOPERS.md'];

function text(file: string): string {
  return readFileSync(join(projectRoot, file), 'utf8');
}

function matches(document: string, pattern: RegExp): readonly string[] {
  return [...text(document).matchAll(pattern)].map((match) => match[1] ?? '');
}

describe.each(DOCUMENTS)('%s', (document) => {
  test('names only npm commands that exist', () => {
    const { scripts } = JSON.parse(text('package.json'));
    const named = [...matches(document, /npm run ([\w:]+)/g), ...matches(document, /npm (start|test)\b/g)];
    expect(named.length).toBeGreaterThan(0);
    expect(named.filter((name) => !(name in scripts))).toEqual([]);
  });

  test('names only files and folders that exist', () => {
    const named = [
      ...matches(document, /`((?:src|scripts|test|content|\.ci)\/[^`*<{ ]*)`/g),
      ...matches(document, /\]\((?!https?:)([^)#]+)\)/g),
      ...matches(document, /`([\w.]+\.(?:json|ts|md))`/g).filter((name) => !name.includes('*')),
    ];
    expect(named.length).toBeGreaterThan(0);
    expect(named.filter((name) => !existsSync(join(projectRoot, name)))).toEqual([]);
  });
});

test('every command of package.json is described in DEVELOPERS.md and starts a script that exists', () => {
  const { scripts } = JSON.parse(text('package.json')) as { scripts: Record<string, string> };
  for (const [name, command] of Object.entries(scripts)) {
    expect(text('DEVELOPERS.md')).toMatch(new RegExp(`npm (?:run )?${name}\\b`));
    const [, script] = /^node scripts\/node\.mjs ([\w-]+)$/.exec(command) ?? [];
    expect(existsSync(join(projectRoot, `scripts/${script}.ts`)), command).toBe(true);
  }
});

test('the lines of a table in the README are those that npm run tables writes', () => {
  const [, file = '', lines = ''] = /```csv (\S+)\n([\s\S]*?)```/.exec(text('README.md')) ?? [];
  const out = join(temporaryFolder(), 'out');
  expect(runScript('tables', ['--out', out]).code).toBe(0);
  const written = readFileSync(join(out, 'editions/2026.1/tables', file), 'utf8').split('\n');
  const shown = lines.trim().split('\n');
  expect(shown.length).toBeGreaterThan(1);
  expect(shown.filter((line) => !written.includes(line))).toEqual([]);
});

import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeEach, describe, expect, test } from 'vitest';
import type { Certificate } from '../../src/inputs/certificate.ts';
import { editFile } from '../support/copyContent.ts';
import { runScript, startScript } from '../support/runScript.ts';
import { smallContent } from '../support/smallContent.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';

const SETS = ['round-70', 'einstein-de-sitter', 'open-matter'];
const EDITION = 'editions/2026.1';

let parent: string;
let content: string;
let file: string;

beforeEach(() => {
  parent = temporaryFolder();
  content = join(parent, 'content');
  smallContent(content, SETS);
  file = join(content, EDITION, 'audit.json');
  writeFileSync(file, '{}');
});

const certificate = () => JSON.parse(readFileSync(file, 'utf8')) as Certificate;

describe('npm run audit', () => {
  test('refuses a certificate that is none, and says what to do', () => {
    const { code, stderr } = runScript('tables', ['--content', content, '--out', join(parent, 'out')]);
    expect(code).toBe(1);
    expect(stderr).toContain('audit.json:1:1');
    expect(stderr).toContain('run it again');
  });

  test('audits every cell and writes a certificate that speaks of the bytes of every table', () => {
    smallContent(content, SETS);
    const { code, stdout, stderr } = runScript('audit', ['--content', content, '--fresh']);
    expect(stderr).toBe('');
    expect(code).toBe(0);
    expect(stdout).toMatch(/^Audited: [\d,]+ cells of 15 tables, none is wrong, \d+ had been settled; \d+ s, cert/m);
    const out = join(parent, 'out');
    expect(runScript('tables', ['--content', content, '--out', out]).code).toBe(0);
    const { tables, method, edition } = certificate();
    expect({ method, edition, count: tables.length }).toEqual({ method: '1', edition: '2026.1', count: 15 });
    for (const { table, sha256, cells, blank } of tables) {
      const csv = readFileSync(join(out, EDITION, 'tables', `${table}.csv`), 'utf8');
      expect(createHash('sha256').update(csv).digest('hex'), table).toBe(sha256);
      expect(cells).toBeGreaterThan(blank);
    }
  });

  test('goes on where a killed audit stopped', async () => {
    smallContent(content, SETS);
    const running = startScript('audit', ['--content', content, '--fresh']);
    await running.printed(/1 of 3 parameter sets audited/);
    running.stop('SIGKILL');
    await running.ended;
    const { code, stdout } = runScript('audit', ['--content', content]);
    expect(code).toBe(0);
    expect(stdout).toMatch(/^[123] of 3 parameter sets were audited before\.$/m);
    expect(certificate().tables).toHaveLength(15);
  });

  test.each([
    [['--edition', '2026.7'], 'There is no edition "2026.7"'],
    [['--set', 'x'], "Unknown option '--set'"],
  ])('refuses %j in one clear line', (options, words) => {
    smallContent(content, SETS);
    const { code, stderr } = runScript('audit', ['--content', content, ...options]);
    expect(code).toBe(1);
    expect(stderr).toContain(words);
  });

  test('has no edition to audit when none is a draft', () => {
    smallContent(content, SETS);
    editFile(join(content, EDITION, 'edition.yaml'), (text) =>
      text.replace('state: draft', 'state: released\nreleased: 2026-12-01'),
    );
    const { code, stderr } = runScript('audit', ['--content', content]);
    expect(code).toBe(1);
    expect(stderr).toBe('No edition is a draft; name one with --edition.\n');
  });
});

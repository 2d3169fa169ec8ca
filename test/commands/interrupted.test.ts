import { readdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeEach, describe, expect, test } from 'vitest';
import { runScript, startScript } from '../support/runScript.ts';
import { smallContent } from '../support/smallContent.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';
import { treeHashes } from '../support/treeHashes.ts';

let parent: string;
let args: readonly string[];

beforeEach(() => {
  parent = temporaryFolder();
  const content = join(parent, 'content');
  smallContent(content);
  args = ['--content', content, '--out', join(parent, 'out')];
});

describe('npm run build', () => {
  test('refuses bad content with every problem, and leaves the earlier site as it was', () => {
    expect(runScript('build', args).code).toBe(0);
    const built = treeHashes(join(parent, 'out'));
    writeFileSync(join(parent, 'content/parameter-sets/one.yaml'), 'title: One\ncolour: red\n');
    writeFileSync(join(parent, 'content/redshift-grids/two.yaml'), 'title: [\n');
    const { code, stderr } = runScript('build', args);
    expect(code).toBe(1);
    expect(stderr).toMatch(/parameter-sets\/one\.yaml:2:1 {2}.*colour/);
    expect(stderr).toMatch(/redshift-grids\/two\.yaml:\d+:\d+ {2}/);
    expect(stderr).toMatch(/\d+ problems in 2 files\. Nothing was written\.\n$/);
    expect(treeHashes(join(parent, 'out'))).toEqual(built);
    expect(readdirSync(parent).sort()).toEqual(['content', 'out']);
  });

  test('leaves the earlier site as it was, and nothing beside it, when Ctrl-C stops it while it writes', async () => {
    expect(runScript('build', args).code).toBe(0);
    const built = treeHashes(join(parent, 'out'));
    const running = startScript('build', args);
    await running.printed(/Building the pages/);
    running.stop('SIGINT');
    const { code, stderr } = await running.ended;
    expect(stderr).toBe('Stopped. Nothing was written.\n');
    expect(code).toBe(130);
    expect(treeHashes(join(parent, 'out'))).toEqual(built);
    expect(readdirSync(parent).sort()).toEqual(['content', 'out']);
  });

  test('removes what a killed build has left', async () => {
    const running = startScript('build', args);
    await running.printed(/Building the pages/);
    running.stop('SIGKILL');
    await running.ended;
    expect(readdirSync(parent).some((name) => name.startsWith('.out.redbound-'))).toBe(true);
    expect(runScript('tables', args).code).toBe(0);
    expect(readdirSync(parent).sort()).toEqual(['content', 'out']);
  });
});

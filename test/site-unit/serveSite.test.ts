import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeEach, describe, expect, onTestFinished, test } from 'vitest';
import { type ServedSite, serveSite } from '../../src/site/serveSite.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';

let folder: string;

beforeEach(() => {
  folder = join(temporaryFolder(), 'dist');
  mkdirSync(join(folder, 'inner'), { recursive: true });
  writeFileSync(join(folder, 'index.html'), 'home');
  writeFileSync(join(folder, '404.html'), 'not here');
  writeFileSync(join(folder, 'inner/index.html'), 'inner');
  writeFileSync(join(folder, 'inner/t.csv'), 'z\n0\n');
  writeFileSync(join(folder, '../secret.txt'), 'secret');
});

async function serve(base: string, port = 0): Promise<ServedSite> {
  const served = await serveSite(folder, base, port);
  onTestFinished(() => served.close());
  return served;
}

describe('serveSite', () => {
  test('serves the folder below its base path', async () => {
    const { address } = await serve('/a/b/');
    expect(address).toMatch(/^http:\/\/localhost:\d+\/a\/b\/$/);
    expect(await (await fetch(address)).text()).toBe('home');
    expect(await (await fetch(`${address}inner/`)).text()).toBe('inner');
    const csv = await fetch(`${address}inner/t.csv?download`);
    expect(csv.headers.get('content-type')).toMatch(/^text\/csv/);
  });

  test('leads from the root and from the base without its slash to the site', async () => {
    const { address } = await serve('/a/b/');
    for (const path of ['/', '/a/b']) expect((await fetch(new URL(path, address))).url).toBe(address);
  });

  test.each(['/a/b/no/such/', '/a/', '/inner/', '/a/b/..%2fsecret.txt', '/a/bb/'])(
    'finds nothing at %s',
    async (path) => {
      const { address } = await serve('/a/b/');
      const response = await fetch(new URL(path, address));
      expect(response.status).toBe(404);
      expect(await response.text()).toBe('not here');
    },
  );

  test('shows a new build of the same folder', async () => {
    const { address } = await serve('/');
    writeFileSync(join(folder, 'index.html'), 'newer');
    expect(await (await fetch(address)).text()).toBe('newer');
  });

  test('takes the next port when the first is taken', async () => {
    const first = await serve('/');
    const port = Number(new URL(first.address).port);
    const second = await serve('/', port);
    expect(Number(new URL(second.address).port)).toBeGreaterThan(port);
  });
});

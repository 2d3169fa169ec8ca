import { readFileSync } from 'node:fs';
import { createServer } from 'node:http';
import { join } from 'node:path';
import { beforeEach, describe, expect, onTestFinished, test } from 'vitest';
import { editFile } from '../support/copyContent.ts';
import { type Running, startScript } from '../support/runScript.ts';
import { smallContent } from '../support/smallContent.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';

let content: string;
let args: readonly string[];

beforeEach(() => {
  const parent = temporaryFolder();
  content = join(parent, 'content');
  smallContent(content);
  editFile(join(content, 'site.yaml'), (text) => text.replace(/^base:.*$/m, 'base: /shelf/'));
  args = ['--content', content, '--out', join(parent, 'out')];
});

/** Starts a command that serves; it is stopped when the test ends. */
async function serve(name: string): Promise<{ running: Running; address: string }> {
  const running = startScript(name, args);
  onTestFinished(async () => {
    running.stop('SIGKILL');
    await running.ended;
  });
  const [address] = await running.printed(/http:\/\/localhost:\d+\/\S*/);
  return { running, address };
}

async function textAt(address: string): Promise<string> {
  return (await fetch(address)).text();
}

/** Occupies the first port that the commands try, unless somebody else does. */
async function occupyFirstPort(): Promise<void> {
  const server = createServer((_, response) => response.end('somebody else'));
  await new Promise<void>((done) => {
    server.once('error', () => done()).listen(4321, 'localhost', () => done());
  });
  onTestFinished(() => {
    server.close();
  });
}

describe('npm start', () => {
  test('builds and serves below the base path on a free port, until Ctrl-C', async () => {
    await occupyFirstPort();
    const { running, address } = await serve('start');
    expect(address).toMatch(/^http:\/\/localhost:43\d\d\/shelf\/$/);
    expect(address).not.toContain(':4321/');
    expect(await textAt(address)).toContain('<h1');
    const { origin } = new URL(address);
    expect((await fetch(`${origin}/`)).url).toBe(address);
    expect((await fetch(`${address}no/such/page/`)).status).toBe(404);
    expect((await fetch(`${origin}/elsewhere/`)).status).toBe(404);
    running.stop('SIGINT');
    expect((await running.ended).code).toBe(0);
  });
});

describe('npm run dev', () => {
  test('follows a changed content file, and stays up when one is broken', async () => {
    const { running, address } = await serve('dev');
    const site = join(content, 'site.yaml');
    const good = readFileSync(site, 'utf8');
    editFile(site, (text) => text.replace(/^title:.*$/m, 'title: Tables of the second shelf'));
    await running.printed(/The pages show the change/);
    expect(await textAt(address)).toContain('Tables of the second shelf');

    editFile(site, (text) => `${text}\ncolour: red\n`);
    await running.printed(/site\.yaml:\d+:1 {2}.*colour[\s\S]*The pages stay as they were/);
    expect(await textAt(address)).toContain('Tables of the second shelf');

    editFile(site, () => good.replace(/^title:.*$/m, 'title: Tables of the third shelf'));
    await expect.poll(() => textAt(address), { timeout: 20_000 }).toContain('Tables of the third shelf');
    running.stop('SIGINT');
    expect((await running.ended).code).toBe(0);
  });
});

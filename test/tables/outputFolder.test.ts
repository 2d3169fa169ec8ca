import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, readFileSync, symlinkSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeEach, describe, expect, test } from 'vitest';
import { checkOutput, outputKind, stageOutput } from '../../src/tables/outputFolder.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';

let parent: string;
let out: string;
let content: string;

beforeEach(() => {
  parent = temporaryFolder();
  out = join(parent, 'out');
  content = join(parent, 'content');
  mkdirSync(content);
});

/** Puts a finished output with one file in place. */
function publish(text: string): void {
  const staging = stageOutput(out, 'site');
  writeFileSync(join(staging.folder, 'page.html'), text);
  staging.publish();
}

/** The number of a process that has ended. */
function endedProcess(): number {
  return spawnSync(process.execPath, ['-e', '']).pid;
}

describe('checkOutput', () => {
  test('allows a missing folder, an empty one, and one that a command wrote', () => {
    expect(() => checkOutput(out, content)).not.toThrow();
    mkdirSync(out);
    expect(() => checkOutput(out, content)).not.toThrow();
    publish('first');
    expect(() => checkOutput(out, content)).not.toThrow();
  });

  test('refuses a folder with files that no command wrote', () => {
    mkdirSync(out);
    writeFileSync(join(out, 'thesis.tex'), '');
    expect(() => checkOutput(out, content)).toThrow(`${out} holds files that Redbound did not write`);
  });

  test('refuses a file', () => {
    writeFileSync(out, '');
    expect(() => checkOutput(out, content)).toThrow(`${out} is a file: choose a folder with --out.`);
  });

  test.each(['', 'inner'])('refuses the content folder and a folder that contains it (%j)', (inner) => {
    const folder = join(content, inner);
    mkdirSync(folder, { recursive: true });
    expect(() => checkOutput(content, folder)).toThrow('contains the content folder');
  });

  test('allows a folder inside the content folder', () => {
    expect(() => checkOutput(join(content, 'dist'), content)).not.toThrow();
  });

  test('removes what a stopped process left half written, and leaves that of a running one', () => {
    const stopped = join(parent, `.out.redbound-${endedProcess()}-new`);
    const running = join(parent, `.out.redbound-${process.ppid}-new`);
    const stranger = join(parent, '.out.redbound-notes');
    for (const folder of [stopped, running, stranger]) mkdirSync(folder);
    checkOutput(out, content);
    expect(readdirSync(parent).sort()).toEqual([`.out.redbound-${process.ppid}-new`, '.out.redbound-notes', 'content']);
  });

  test('puts the earlier output back when a process stopped between the two renames', () => {
    publish('first');
    const moved = join(parent, `.out.redbound-${endedProcess()}-old`);
    spawnSync('mv', [out, moved]);
    checkOutput(out, content);
    expect(readFileSync(join(out, 'page.html'), 'utf8')).toBe('first');
    expect(existsSync(moved)).toBe(false);
  });
});

describe('stageOutput', () => {
  test('keeps the earlier output until it is published, then replaces it as a whole', () => {
    publish('first');
    const staging = stageOutput(out, 'site');
    writeFileSync(join(staging.folder, 'other.html'), 'second');
    expect(readdirSync(out).sort()).toEqual(['.redbound', 'page.html']);
    staging.publish();
    expect(readdirSync(out).sort()).toEqual(['.redbound', 'other.html']);
    expect(readdirSync(parent).sort()).toEqual(['content', 'out']);
  });

  test('discard leaves the earlier output and nothing else', () => {
    publish('first');
    stageOutput(out, 'site').discard();
    expect(readFileSync(join(out, 'page.html'), 'utf8')).toBe('first');
    expect(readdirSync(parent).sort()).toEqual(['content', 'out']);
  });

  test('replaces the folder that a symbolic link names, not the link', () => {
    const real = join(parent, 'real');
    mkdirSync(real);
    symlinkSync(real, out);
    publish('first');
    expect(readFileSync(join(real, 'page.html'), 'utf8')).toBe('first');
  });

  test('says what the folder holds', () => {
    expect(outputKind(out)).toBeUndefined();
    stageOutput(out, 'tables').publish();
    expect(outputKind(out)).toBe('tables');
    publish('first');
    expect(outputKind(out)).toBe('site');
  });
});

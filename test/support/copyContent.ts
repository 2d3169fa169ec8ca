import { cpSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { projectRoot } from './runScript.ts';

/** Copies the shipped content to `folder`. */
export function copyContent(folder: string): void {
  cpSync(join(projectRoot, 'content'), folder, { recursive: true });
}

/** Changes a file; fails if the change changes nothing. */
export function editFile(path: string, edit: (text: string) => string): void {
  const before = readFileSync(path, 'utf8');
  const after = edit(before);
  if (after === before) throw new Error(`${path}: the edit changed nothing`);
  writeFileSync(path, after);
}

import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { AuditedPart, AuditPart } from '../../src/tables/auditPart.ts';
import { METHOD_VERSION } from '../../src/tables/method.ts';
import { projectRoot } from './projectRoot.ts';

const FOLDER = join(projectRoot, 'node_modules/.cache/redbound/audit');

/** Where the result of a part is kept: named after everything that it depends on. */
function fileOf({ parameters, redshifts, columns }: AuditPart): string {
  const key = JSON.stringify([METHOD_VERSION, parameters, redshifts, columns]);
  return join(FOLDER, `${createHash('sha256').update(key).digest('hex')}.json`);
}

/** What an interrupted audit has found of a part. */
export function keptPart(part: AuditPart): AuditedPart | undefined {
  const file = fileOf(part);
  return existsSync(file) ? (JSON.parse(readFileSync(file, 'utf8')) as AuditedPart) : undefined;
}

/** Keeps the result of a part; a kill at any moment leaves either all of it or nothing. */
export function keepPart(part: AuditPart, audited: AuditedPart): void {
  mkdirSync(FOLDER, { recursive: true });
  const file = fileOf(part);
  const beside = `${file}.${process.pid}`;
  writeFileSync(beside, JSON.stringify(audited));
  renameSync(beside, file);
}

/** Forgets the results of parts. */
export function forgetParts(parts: readonly AuditPart[]): void {
  for (const part of parts) rmSync(fileOf(part), { force: true });
}

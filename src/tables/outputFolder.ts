import {
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  realpathSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { basename, dirname, join, resolve, sep } from 'node:path';
import { isRunning } from './isRunning.ts';

/** What a folder written by a command holds: everything, or the tables alone. */
export type OutputKind = 'site' | 'tables';

/** A folder that must not be written to. The message says which and what to do. */
export class OutputError extends Error {
  override name = 'OutputError';
}

/** An output being written beside its place, until `publish` puts it there. */
export interface Staging {
  /** Write here. */
  readonly folder: string;
  /** Replaces the output by what was written: two renames, so that readers never see half of it. */
  publish(): void;
  /** Removes what was written; the output stays as it was. */
  discard(): void;
}

/** The file that marks a folder as ours to replace. */
const MARKER = '.redbound';
const MARKER_NOTE = 'Written by Redbound. The next build replaces this folder as a whole.';

/**
 * Puts back or removes what interrupted runs left beside the output folder `out`, then makes sure that it may be
 * replaced.
 * @throws OutputError if `out` is a file, holds files that no command wrote, or contains the content folder.
 */
export function checkOutput(out: string, contentFolder: string): void {
  const place = realPlace(out);
  if (`${realPlace(contentFolder)}${sep}`.startsWith(`${place}${sep}`)) {
    throw new OutputError(`${out} contains the content folder ${contentFolder}: choose another folder with --out.`);
  }
  if (existsSync(place) && !statSync(place).isDirectory()) {
    throw new OutputError(`${out} is a file: choose a folder with --out.`);
  }
  recover(place);
  if (existsSync(place) && readdirSync(place).length > 0 && !existsSync(join(place, MARKER))) {
    throw new OutputError(
      `${out} holds files that Redbound did not write (it has no ${MARKER} file): empty it, or choose another folder with --out.`,
    );
  }
}

/** Opens a staging folder beside the output folder `out`, which `checkOutput` must have allowed. */
export function stageOutput(out: string, kind: OutputKind): Staging {
  const place = realPlace(out);
  const folder = besidePlace(place, `${process.pid}-new`);
  mkdirSync(folder, { recursive: true });
  return {
    folder,
    publish: () => {
      writeFileSync(join(folder, MARKER), `${kind}\n${MARKER_NOTE}\n`);
      swap(folder, place);
    },
    discard: () => rmSync(folder, { recursive: true, force: true }),
  };
}

/** What the output folder holds now; undefined when it is missing, empty or not ours. */
export function outputKind(out: string): OutputKind | undefined {
  const marker = join(out, MARKER);
  if (!existsSync(marker)) return undefined;
  return readFileSync(marker, 'utf8').startsWith('site') ? 'site' : 'tables';
}

function swap(folder: string, place: string): void {
  const old = besidePlace(place, `${process.pid}-old`);
  if (existsSync(place)) renameSync(place, old);
  renameSync(folder, place);
  rmSync(old, { recursive: true, force: true });
}

/** Undoes what interrupted runs left: the output goes back to its place, half-written folders go. */
function recover(place: string): void {
  const parent = dirname(place);
  if (!existsSync(parent)) return;
  const left = readdirSync(parent).filter((name) => isLeftover(name, place));
  const old = left.find((name) => name.endsWith('-old'));
  if (old !== undefined && !existsSync(place)) renameSync(join(parent, old), place);
  for (const name of left) rmSync(join(parent, name), { recursive: true, force: true });
}

function isLeftover(name: string, place: string): boolean {
  const prefix = basename(besidePlace(place, ''));
  const process = /^(\d+)-(?:new|old)$/.exec(name.startsWith(prefix) ? name.slice(prefix.length) : '')?.[1];
  return process !== undefined && !isRunning(Number(process));
}

/** Renaming a symbolic link would replace the link, not the folder it names. */
function realPlace(out: string): string {
  const place = resolve(out);
  return existsSync(place) ? realpathSync(place) : place;
}

/** A hidden neighbour, so that the renames stay on one file system. */
function besidePlace(place: string, ending: string): string {
  return join(dirname(place), `.${basename(place)}.redbound-${ending}`);
}

import { existsSync, statSync } from 'node:fs';
import { posix } from 'node:path';
import { checkContent } from './checkContent.ts';
import { readFiles } from './readFiles.ts';
import type { ReadOptions, ReadResult } from './types.ts';

/**
 * Reads and checks a content folder: either everything in it, or every problem of all its files, sorted by file and
 * line. Nothing is written. A problem names its file by the path given here: `content/site.yaml` for "content".
 */
export function readContent(folder: string, options: ReadOptions = {}): ReadResult {
  if (!existsSync(folder) || !statSync(folder).isDirectory()) {
    const wrong = existsSync(folder) ? 'this is no folder' : 'there is no such folder';
    return { problems: [{ file: folder, line: 1, column: 1, wrong, expected: 'the folder that holds site.yaml' }] };
  }
  return checkContent(readFiles(folder), options, (path) => posix.join(folder, path));
}

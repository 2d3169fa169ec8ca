import { type FSWatcher, watch } from 'node:fs';

/** Editors write a file in several steps; wait until they are done, ms. */
const QUIET_TIME = 150;

/** Calls `changed` after each change below `folder`, one call at a time, the last change always included. */
export function watchContent(folder: string, changed: () => Promise<void>): FSWatcher {
  let timer: NodeJS.Timeout | undefined;
  let running: Promise<void> = Promise.resolve();
  return watch(folder, { recursive: true }, () => {
    clearTimeout(timer);
    timer = setTimeout(() => {
      running = running.then(changed);
    }, QUIET_TIME);
  });
}

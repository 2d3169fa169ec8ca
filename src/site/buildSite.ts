import { cpSync, existsSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { isRunning } from '../tables/isRunning.ts';
import { leavePress } from './leavePress.ts';
import type { Press } from './press.ts';

/**
 * Renders the pages of what was pressed into `folder`. `root` is the folder of the Astro configuration, which takes
 * address and base path from what was pressed.
 */
export async function buildSite(press: Press, root: string, folder: string): Promise<void> {
  leavePress(press);
  const { build } = await import('astro'); // it takes a second to load, which help and refusals need not wait for
  const rendered = workshop(join(root, '.astro'));
  try {
    await build({ root, outDir: rendered, logLevel: 'warn' });
    cpSync(rendered, folder, { recursive: true });
  } finally {
    rmSync(rendered, { recursive: true, force: true });
  }
}

/**
 * A folder of this process alone inside the project, from where compiled pages find their packages: Astro puts those of
 * an output folder elsewhere all in one place, where two builds at a time would mix. Removes what killed builds left.
 */
function workshop(parent: string): string {
  for (const name of existsSync(parent) ? readdirSync(parent) : []) {
    const id = /^build-(\d+)$/.exec(name)?.[1];
    if (id !== undefined && !isRunning(Number(id))) rmSync(join(parent, name), { recursive: true, force: true });
  }
  return join(parent, `build-${process.pid}`);
}

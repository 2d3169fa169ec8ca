import { build } from 'astro';
import { leavePress } from './leavePress.ts';
import type { Press } from './press.ts';

/**
 * Renders the pages of what was pressed into `folder`, which is emptied first. `root` is the folder of the Astro
 * configuration, which takes address and base path from what was pressed.
 */
export async function buildSite(press: Press, root: string, folder: string): Promise<void> {
  leavePress(press);
  await build({ root, outDir: folder, logLevel: 'warn' });
}

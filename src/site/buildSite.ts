import { leavePress } from './leavePress.ts';
import type { Press } from './press.ts';

/**
 * Renders the pages of what was pressed into `folder`, which is emptied first. `root` is the folder of the Astro
 * configuration, which takes address and base path from what was pressed.
 */
export async function buildSite(press: Press, root: string, folder: string): Promise<void> {
  leavePress(press);
  const { build } = await import('astro'); // it takes a second to load, which help and refusals need not wait for
  await build({ root, outDir: folder, logLevel: 'warn' });
}

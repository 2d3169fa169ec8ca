import { build } from 'astro';
import { leavePress } from './leavePress.ts';
import type { Press } from './press.ts';

/**
 * Renders the pages of what was pressed into `folder`, which is emptied first. `root` is the folder of the Astro
 * configuration. Address and base path come from the keeper's site.yaml.
 */
export async function buildSite(press: Press, root: string, folder: string): Promise<void> {
  const { site, base } = press.content.site;
  leavePress(press);
  await build({ root, outDir: folder, site, base, logLevel: 'warn' });
}

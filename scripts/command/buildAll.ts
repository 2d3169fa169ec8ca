import { buildSite } from '../../src/site/buildSite.ts';
import type { Press } from '../../src/site/press.ts';
import { checkOutput } from '../../src/tables/outputFolder.ts';
import { pressAll } from './pressAll.ts';
import { projectRoot } from './projectRoot.ts';
import { readFolder } from './readFolder.ts';
import { stagedRun } from './stagedRun.ts';
import { summary } from './summary.ts';

/** Content to finished site in `out`: read and check, compute, render, put in place. */
export async function buildAll(contentFolder: string, out: string): Promise<Press> {
  const started = performance.now();
  checkOutput(out, contentFolder);
  const press = await pressAll(readFolder(contentFolder));
  console.log('Building the pages');
  await stagedRun(out, 'site', (folder) => buildSite(press, projectRoot, folder));
  console.log(summary('Built', press.editions, started, out));
  return press;
}

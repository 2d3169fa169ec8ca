import { join } from 'node:path';
import { copyContent, editFile } from './copyContent.ts';
import { runScript } from './runScript.ts';

/** Builds the shipped content below `base` by the real command, into `folder`/dist. */
export function buildForTests(folder: string, base: string): { content: string; dist: string } {
  const content = join(folder, 'content');
  const dist = join(folder, 'dist');
  copyContent(content);
  editFile(join(content, 'site.yaml'), (text) => text.replace(/^base:.*$/m, `base: ${base}`));
  const { code, stdout, stderr } = runScript('build', ['--content', content, '--out', dist]);
  if (code !== 0) throw new Error(`npm run build failed:\n${stdout}\n${stderr}`);
  return { content, dist };
}

import { setImmediate } from 'node:timers/promises';
import type { Content } from '../../src/inputs/types.ts';
import type { Press } from '../../src/site/press.ts';
import { pressEdition } from '../../src/tables/pressEdition.ts';
import { openProgress } from './progress.ts';

/** Computes the tables of every edition and says how far it is. */
export async function pressAll(content: Content): Promise<Press> {
  const progress = openProgress();
  const editions = [];
  for (const edition of content.editions) {
    await setImmediate(); // lets Ctrl-C through
    editions.push(
      await pressEdition(content, edition, (done, all, set) => {
        progress.step(`Edition ${edition.number}: ${done} of ${all} parameter sets computed, ${set.id}`);
      }),
    );
  }
  progress.done();
  return { content, editions };
}

import { lastPlace } from './roundness.ts';

/** About as many as fit beside a table on a small screen. */
const THUMBS = 16;
/** Shorter tables are seen at once. */
const SHORTEST = 60;

/** The redshifts of the thumb index, as the grid writes them: one round value in each stretch of a long table. */
export function thumbIndex(redshifts: readonly string[]): string[] {
  if (redshifts.length < SHORTEST) return [];
  const stretch = redshifts.length / THUMBS;
  return Array.from({ length: THUMBS }, (_, i) =>
    roundest(redshifts.slice(Math.round(i * stretch), Math.round((i + 1) * stretch))),
  );
}

function roundest(some: readonly string[]): string {
  return some.reduce((best, one) => (roundness(one) > roundness(best) ? one : best));
}

/** Among values of the same last place, halves go before the others: 0.5 before 0.3. */
function roundness(redshift: string): number {
  return lastPlace(redshift) + (/5[0.]*$/.test(redshift) ? 0.5 : 0);
}

import { realMinus } from '../../site/writtenNumber.ts';
import { nearest } from '../nearest.ts';
import type { Parts, Row } from './parts.ts';

/** What came of asking for a redshift: its row, or its neighbours. */
export interface Found {
  readonly rows: readonly Row[];
  readonly exact: boolean;
}

/** The row of a redshift, or the nearest below and above. */
export function findRows({ rows, redshifts }: Parts, z: number): Found {
  const standing = nearest(redshifts, z);
  const at = 'at' in standing ? [standing.at] : [standing.below, standing.above];
  return { rows: at.flatMap((n) => rows[n ?? -1] ?? []), exact: 'at' in standing };
}

/** Puts the bracket in the margin of these rows only, and brings the first into sight. */
export function markRows({ table }: Parts, rows: readonly Row[]): void {
  for (const marked of table.querySelectorAll('tr.asked')) marked.classList.remove('asked');
  for (const { element } of rows) element.classList.add('asked');
  rows[0]?.element.scrollIntoView({ block: 'center' });
}

/**
 * What is said of a redshift that was asked for, as text and links to the rows it names:
 * "2.33 is not on this grid; nearest 2.3 and 2.4."
 */
export function sayFound(asked: string, { rows, exact }: Found): (string | HTMLAnchorElement)[] {
  const [first, second] = rows;
  if (!first) return ['This table has no rows.'];
  if (exact) return [`z = ${realMinus(first.written)}`];
  if (second) return [`${realMinus(asked)} is not on this grid; nearest `, linkTo(first), ' and ', linkTo(second), '.'];
  return [`${realMinus(asked)} lies outside this grid; the nearest row is `, linkTo(first), '.'];
}

function linkTo({ written, element }: Row): HTMLAnchorElement {
  const link = document.createElement('a');
  link.href = `#${element.id}`;
  link.textContent = realMinus(written);
  return link;
}

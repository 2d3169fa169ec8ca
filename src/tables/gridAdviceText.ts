import { csvCell } from './csvCell.ts';
import type { GridAdvice } from './gridAdvice.ts';
import type { GridWish } from './gridWish.ts';
import { ERROR_DIGITS, PLACE_DIGITS } from './interpolationTable.ts';
import { roundedUp } from './roundedUp.ts';

const METHOD_WORDS = { linear: 'linear interpolation', lagrange: '4-point Lagrange interpolation' } as const;

/** The advice as a person reads it; the segments are lines of a redshift grid's file. */
export function gridAdviceText(set: string, wish: GridWish, { segments, rows, largest }: GridAdvice): string {
  const { column, method, wanted, from, to } = wish;
  const error = roundedUp(largest.relative, ERROR_DIGITS);
  return [
    `# ${column} of ${set}: ${METHOD_WORDS[method]}, relative error at most ${wanted.toExponential()}, z from ${from} to ${to}`,
    `# ${rows.toLocaleString('en-US')} rows; the largest error on them is ${error}, at z = ${csvCell(largest.z, PLACE_DIGITS)}`,
    'segments:',
    ...segments.map((segment) => `  - {from: ${segment.from}, to: ${segment.to}, step: ${segment.step}}`),
  ].join('\n');
}

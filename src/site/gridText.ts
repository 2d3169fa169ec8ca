import type { RedshiftGrid } from '../inputs/types.ts';
import { realMinus } from './writtenNumber.ts';

/** "371 redshifts from 0 to 10". */
export function gridExtent({ redshifts }: RedshiftGrid): string {
  const short = (z: string | undefined) => realMinus(String(Number(z)));
  return `${redshifts.length} redshifts from ${short(redshifts[0])} to ${short(redshifts.at(-1))}`;
}

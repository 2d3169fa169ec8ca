import type { RedshiftGrid } from '../inputs/types.ts';
import { shortRedshift } from './shortRedshift.ts';

/** "371 redshifts from 0 to 10". */
export function gridExtent({ redshifts }: RedshiftGrid): string {
  return `${redshifts.length} redshifts from ${shortRedshift(redshifts[0] ?? '')} to ${shortRedshift(redshifts.at(-1) ?? '')}`;
}

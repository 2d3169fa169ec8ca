import { writtenNumber } from './writtenNumber.ts';

/** A redshift without the zeros at its end: "0.5" for 0.50, "10 000" for 10000. Plain text. */
export function shortRedshift(redshift: string): string {
  return writtenNumber(redshift.includes('.') ? redshift.replace(/\.?0+$/, '') : redshift);
}

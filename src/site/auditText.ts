import type { StampAudit } from '../tables/types.ts';
import { writtenNumber } from './writtenNumber.ts';

/** What the audit of a table found, for its colophon. HTML. */
export function auditText(audit: StampAudit | null): string {
  if (audit === null) return 'Not audited yet.';
  const { cells, settled, largestError, date, workingDigits } = audit;
  const doubtful = settled === 0 ? 'none had to be settled' : `${settled} had been settled this way`;
  return (
    `All ${cells.toLocaleString('en-US').replaceAll(',', '\u2009')} cells evaluated again with ${workingDigits} digits on ` +
    `${date}: none differs, ${doubtful}. Largest relative error before rounding: ${writtenNumber(largestError)}.`
  );
}

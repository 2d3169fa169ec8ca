import type { Audited } from '../cosmology/audit/audited.ts';
import { auditMilestones } from '../cosmology/audit/auditMilestones.ts';
import { auditRows } from '../cosmology/audit/auditRows.ts';
import { startAudit } from '../cosmology/audit/startAudit.ts';
import type { MilestoneName } from '../cosmology/milestones.ts';
import type { Parameters } from '../cosmology/parameters.ts';
import type { QuantityId } from '../cosmology/quantities.ts';
import { decidingText, WORKING_DIGITS } from './decidingText.ts';

/** One parameter set to be audited: every column at every redshift of its grids, and the milestones. */
export interface AuditPart {
  readonly set: string;
  readonly parameters: Parameters;
  /** The redshifts of all grids together, each once, as written. */
  readonly redshifts: readonly string[];
  readonly columns: readonly QuantityId[];
}

/** What the audit found; texts decide every rounding (see `decidingText`), null is a blank. Plain data. */
export interface AuditedPart {
  /** `cells[row][column]`, in the order of the part. */
  readonly cells: readonly (readonly (string | null)[])[];
  /** Numbers, words (the fate), or null. */
  readonly milestones: Readonly<Record<MilestoneName, string | null>>;
  /** Largest relative difference between the two working precisions. */
  readonly precisionError: number;
}

/** Audits one part; takes from a second to a minute. */
export async function auditPart({ parameters, redshifts, columns }: AuditPart): Promise<AuditedPart> {
  await startAudit();
  let precisionError = 0;
  const text = (audited: Audited | null): string | null => {
    if (audited === null) return null;
    const value = Number(audited.text);
    if (value !== 0) precisionError = Math.max(precisionError, Number(audited.error) / Math.abs(value));
    return decidingText(audited);
  };
  const cells = auditRows(parameters, redshifts, columns, WORKING_DIGITS).map((row) => row.map(text));
  const milestones = Object.entries(auditMilestones(parameters, WORKING_DIGITS)).map(
    ([name, found]) => [name, typeof found === 'string' ? found : text(found)] as const,
  );
  return {
    cells,
    milestones: Object.fromEntries(milestones) as Record<MilestoneName, string | null>,
    precisionError,
  };
}

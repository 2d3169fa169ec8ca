import type { Certificate } from '../../src/inputs/certificate.ts';
import type { AuditPart } from '../../src/tables/auditPart.ts';
import { auditParts, certify, type PartResult } from '../../src/tables/certify.ts';
import type { Disagreement } from '../../src/tables/compareAudit.ts';
import type { EditionTables } from '../../src/tables/types.ts';
import { AuditError } from './auditError.ts';
import { auditPool } from './auditPool.ts';
import { forgetParts, keepPart, keptPart } from './auditStore.ts';
import { openProgress } from './progress.ts';

/** How many wrong cells are printed one by one. */
const MOST_LINES = 20;

function complaint(disagreements: readonly Disagreement[]): string {
  const lines = disagreements
    .slice(0, MOST_LINES)
    .map(
      ({ table, row, column, published, audited }) =>
        `${table}.csv  ${row}  ${column}  is ${published || 'blank'}, audited ${audited || 'blank'}`,
    );
  const rest = disagreements.length - lines.length;
  return [
    ...lines,
    ...(rest > 0 ? [`and ${rest} more`] : []),
    `${disagreements.length} cells are wrong. No certificate was written.`,
  ].join('\n');
}

/** Massive neutrinos make a set slow; the slow ones go first, so that no thread is left alone with one at the end. */
function slowestFirst(parts: readonly AuditPart[]): readonly AuditPart[] {
  const cost = ({ parameters }: AuditPart) => parameters.m_nu.filter((mass) => Number(mass) > 0).length;
  return [...parts].sort((a, b) => cost(b) - cost(a));
}

/**
 * Audits every cell of an edition, going on where an earlier audit stopped.
 * @throws AuditError listing the cells that are wrong
 */
export async function auditEdition(pressed: EditionTables, fresh: boolean): Promise<Certificate> {
  const started = performance.now();
  const parts = auditParts(pressed);
  if (fresh) forgetParts(parts);
  const results: PartResult[] = parts.flatMap((part) => {
    const audited = keptPart(part);
    return audited === undefined ? [] : [{ part, audited }];
  });
  const { number } = pressed.edition;
  if (results.length > 0) console.log(`${results.length} of ${parts.length} parameter sets were audited before.`);
  const known = new Set(results.map(({ part }) => part.set));
  const progress = openProgress();
  await auditPool(slowestFirst(parts.filter(({ set }) => !known.has(set))), (part, audited) => {
    keepPart(part, audited);
    results.push({ part, audited });
    progress.step(`Edition ${number}: ${results.length} of ${parts.length} parameter sets audited, ${part.set}`);
  });
  progress.done();
  const seconds = Math.round((performance.now() - started) / 1000);
  const verdict = certify(pressed, results, { audited: new Date().toISOString().slice(0, 10), seconds });
  if ('disagreements' in verdict) throw new AuditError(complaint(verdict.disagreements));
  forgetParts(parts);
  return verdict.certificate;
}

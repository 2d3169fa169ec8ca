import { MILESTONE_NAMES, type MilestoneName } from '../cosmology/milestones.ts';
import type { MilestoneValues } from '../cosmology/milestoneValues.ts';
import type { Parameters } from '../cosmology/parameters.ts';
import { isSettled } from '../numerics/isSettled.ts';
import { decidingText, WORKING_DIGITS } from './decidingText.ts';
import { PAGE_DIGITS } from './pageDigits.ts';

/** Decimal text of the audit for a milestone whose double does not decide its digits; undefined for every other. */
export type SettledMilestones = (name: MilestoneName) => string | undefined;

/** Settles those milestones of a set that lie too near a rounding boundary for their bounds, by the audit. */
export async function settleMilestones(
  parameters: Parameters,
  values: MilestoneValues,
  bounds: Readonly<Record<MilestoneName, number>>,
  digits: number,
): Promise<SettledMilestones> {
  const open = MILESTONE_NAMES.filter((name) => {
    const value = values[name];
    return typeof value === 'number' && !isSettled(value, bounds[name], [digits, PAGE_DIGITS]);
  });
  if (open.length === 0) return () => undefined;
  const { startAudit } = await import('../cosmology/audit/startAudit.ts');
  const { auditMilestones } = await import('../cosmology/audit/auditMilestones.ts');
  await startAudit();
  const audited = auditMilestones(parameters, WORKING_DIGITS);
  return (name) => {
    const found = open.includes(name) ? audited[name] : null;
    return found === null || typeof found === 'string' ? undefined : decidingText(found);
  };
}

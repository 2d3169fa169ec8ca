import { pageNumber } from '../../tables/pageCells.ts';
import type { MilestoneTable } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { renderFormula } from '../formula.ts';
import { MILESTONE_TEXT } from '../milestoneText.ts';
import { PAGE_DIGITS } from '../pageDigits.ts';
import { unitHtml } from '../unitText.ts';

/** One milestone, ready to print; symbol, value and unit are HTML. */
export interface MilestoneLine {
  readonly id: string;
  readonly name: string;
  readonly symbol: string;
  readonly definition: string;
  readonly value: string;
  readonly unit: string;
  /** Page of the quantity that says more. */
  readonly address: string;
}

/** The milestones that exist in a set, and the names of those that do not. */
export function milestoneLines({ milestones }: MilestoneTable): { lines: MilestoneLine[]; missing: string[] } {
  const exist = milestones.filter(({ value }) => value !== null);
  return {
    lines: exist.map(({ name, value, unit, audited }) => {
      const text = MILESTONE_TEXT[name];
      return {
        id: name,
        name: text.name,
        symbol: text.symbol === undefined ? '' : renderFormula(text.symbol, 'inline', 'src/site/milestoneText.ts'),
        definition: text.definition,
        value: typeof value === 'number' ? pageNumber(value, PAGE_DIGITS, audited) : (value ?? ''),
        unit: unitHtml(unit),
        address: address.quantity(text.quantity),
      };
    }),
    missing: milestones.filter(({ value }) => value === null).map(({ name }) => MILESTONE_TEXT[name].name),
  };
}

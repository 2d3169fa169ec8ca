import type { MilestoneName } from '../../cosmology/milestones.ts';
import { pageNumber } from '../../tables/pageCells.ts';
import { uncertaintyBelow } from '../../tables/pageUncertainty.ts';
import type { Milestone, MilestoneTable } from '../../tables/types.ts';
import { uncertaintyCell } from '../../tables/uncertaintyCell.ts';
import { warrantedDigits } from '../../tables/warrantedDigits.ts';
import { address } from '../addresses.ts';
import { renderFormula } from '../formula.ts';
import { MILESTONE_TEXT } from '../milestoneText.ts';
import { PAGE_DIGITS } from '../pageDigits.ts';
import { paleDigits } from '../paleDigits.ts';
import { unitHtml } from '../unitText.ts';

/** One milestone, ready to print; symbol, value, u and unit are HTML. */
export interface MilestoneLine {
  readonly id: string;
  readonly name: string;
  readonly symbol: string;
  readonly definition: string;
  /** With the digits that the uncertainty does not warrant in paler ink. */
  readonly value: string;
  /** Standard uncertainty, to stand below the value with its point below that of the value; "" where there is none. */
  readonly u: string;
  readonly unit: string;
  /** Page of the quantity that says more. */
  readonly address: string;
}

/** The milestones that exist in a set, and the names of those that do not. */
export function milestoneLines({ milestones }: MilestoneTable): { lines: MilestoneLine[]; missing: string[] } {
  const exist = milestones.filter(({ value }) => value !== null);
  return {
    lines: exist.map((milestone) => {
      const { name, unit } = milestone;
      const text = MILESTONE_TEXT[name];
      return {
        id: name,
        name: text.name,
        symbol: milestoneSymbol(name),
        definition: text.definition,
        value: valueHtml(milestone),
        u: uncertaintyText(milestone),
        unit: unitHtml(unit),
        address: address.quantity(text.quantity),
      };
    }),
    missing: milestones.filter(({ value }) => value === null).map(({ name }) => MILESTONE_TEXT[name].name),
  };
}

/** MathML; "" for the fate, which is words. */
export function milestoneSymbol(name: MilestoneName): string {
  const { symbol } = MILESTONE_TEXT[name];
  return symbol === undefined ? '' : renderFormula(symbol, 'inline', 'src/site/milestoneText.ts');
}

function valueHtml(milestone: Milestone): string {
  const { value, u } = milestone;
  const text = valueText(milestone);
  return typeof value === 'number' ? paleDigits(text, warrantedDigits(value, u, PAGE_DIGITS)) : text;
}

function valueText({ value, audited }: Milestone): string {
  return typeof value === 'number' ? pageNumber(value, PAGE_DIGITS, audited) : (value ?? '');
}

function uncertaintyText(milestone: Milestone): string {
  const value = valueText(milestone);
  const decimals = value.split('.')[1]?.length ?? 0;
  return uncertaintyBelow(uncertaintyCell(milestone.u), value, { exponent: 0, decimals });
}

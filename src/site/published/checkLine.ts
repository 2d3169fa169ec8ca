import { csvCell } from '../../tables/csvCell.ts';
import { likePrinted } from '../../tables/likePrinted.ts';
import { address } from '../addresses.ts';
import { MILESTONE_TEXT } from '../milestoneText.ts';
import { typographic } from '../typographic.ts';
import { unitHtml } from '../unitText.ts';
import { writtenNumber } from '../writtenNumber.ts';
import { evaluateCheck } from './evaluateCheck.ts';
import type { PublishedCheck } from './publishedSources.ts';
import { GROUND_TEXT, STATUS_TEXT } from './words.ts';

/** One published value beside ours, ready to print; numbers and unit are HTML. */
export interface CheckLine {
  readonly id: string;
  readonly quantity: string;
  /** Page of the quantity of the tables that it is compared with. */
  readonly address: string;
  /** Table or equation of the source, how the value came here, and why a round number suffices. */
  readonly provenance: string;
  /** Nobody has compared the value with its source yet. */
  readonly unchecked: boolean;
  readonly published: string;
  readonly ours: string;
  readonly unit: string;
  readonly difference: string;
  readonly tolerance: string;
  /** Letters of what the tolerance is made of. */
  readonly grounds: string;
  readonly verdict: string;
  readonly agrees: boolean;
  /** Why the two differ; "" if they agree. */
  readonly why: string;
}

const MORE_DECIMALS = 2;
const DIGITS_OF_DIFFERENCE = 2;

/** `source` names the file, so that every line of the page has an anchor of its own. */
export function checkLine(source: string, check: PublishedCheck): CheckLine {
  const { ours, difference, verdict } = evaluateCheck(check);
  const agrees = verdict === 'agrees';
  return {
    id: `${source}.${check.id}`,
    quantity: typographic(sentence(check.quantity)),
    address: quantityAddress(check),
    provenance: typographic(
      [check.where, ratio(check), STATUS_TEXT[check.status], check.toleranceReason].filter(Boolean).join('; '),
    ),
    unchecked: check.status === 'from memory',
    published: writtenNumber(check.published),
    ours: writtenNumber(likePrinted(ours, check.published, MORE_DECIMALS)),
    unit: unitHtml(check.unit),
    difference: signed(difference),
    tolerance: writtenNumber(check.tolerance),
    grounds: check.toleranceFrom.map((ground) => GROUND_TEXT[ground].letter).join(''),
    verdict: agrees ? 'agrees' : 'differs',
    agrees,
    why: agrees ? '' : typographic(check.why ?? 'Nobody knows why yet.'),
  };
}

function sentence(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

function quantityAddress({ what: { of } }: PublishedCheck): string {
  return address.quantity('milestone' in of ? MILESTONE_TEXT[of.milestone].quantity : of.column);
}

function ratio({ ratioOf }: PublishedCheck): string {
  return ratioOf ? `printed as ${ratioOf[0]} and ${ratioOf[1]}` : '';
}

function signed(difference: number): string {
  const text = writtenNumber(csvCell(difference, DIGITS_OF_DIFFERENCE));
  return difference > 0 ? `+${text}` : text;
}

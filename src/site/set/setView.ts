import type { MilestoneName } from '../../cosmology/milestones.ts';
import type { ParameterSet, Source } from '../../inputs/types.ts';
import { pageNumber } from '../../tables/pageCells.ts';
import type { EditionTables, Stamp } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { type ContentsLine, contentsLines } from '../contents.ts';
import { shownState } from '../currentEdition.ts';
import { renderFormula } from '../formula.ts';
import { derivedOf, milestonesOf } from '../lookUp.ts';
import { type Missed, nonlinearCaution } from '../nonlinearCaution.ts';
import { noteHtml } from '../noteHtml.ts';
import { PAGE_DIGITS } from '../pageDigits.ts';
import { type ParameterLine, parameterLines } from '../parameterLines.ts';
import { PARAMETER_TEXT } from '../parameterText.ts';
import type { Press } from '../press.ts';
import { type RunningHead, runningHead } from '../runningHead.ts';
import { isUnchecked, uncertaintySentence } from '../setCautions.ts';
import { setTitle } from '../setTitle.ts';
import { symbolOfName } from '../symbolOfName.ts';
import { realMinus } from '../writtenNumber.ts';
import { type BesideOthers, besideOthers } from './besideOthers.ts';
import { type MilestoneLine, milestoneLines, milestoneSymbol } from './milestoneLines.ts';

/** Everything a parameter-set page prints. */
export interface SetView {
  readonly head: RunningHead;
  readonly title: string;
  readonly kind: ParameterSet['kind'];
  readonly source: Source;
  readonly doiAddress: string | undefined;
  readonly unchecked: boolean;
  /** HTML. */
  readonly uncertainty: string;
  /** Paragraphs of HTML. */
  readonly note: readonly string[];
  readonly parameters: readonly ParameterLine[];
  /** HTML: what follows from the parameters. */
  readonly derived: string;
  /** HTML. */
  readonly correlations: readonly string[];
  readonly milestones: readonly MilestoneLine[];
  readonly missing: readonly string[];
  /** Milestones whose uncertainties are off, a sentence of HTML; "" if there are none. */
  readonly nonlinear: string;
  readonly milestonesFile: { readonly name: string; readonly address: string; readonly checksum: string };
  readonly tables: readonly ContentsLine[];
  readonly beside: BesideOthers;
}

export function setView(press: Press, pressed: EditionTables, id: string): SetView {
  const { edition } = pressed;
  const table = milestonesOf(pressed, id);
  const { set } = table;
  const { lines, missing } = milestoneLines(table);
  return {
    head: runningHead(edition, shownState(press, edition), set),
    title: setTitle(set),
    kind: set.kind,
    source: set.source,
    doiAddress: set.source.doi && `https://doi.org/${set.source.doi}`,
    unchecked: isUnchecked(set),
    uncertainty: uncertaintySentence(set),
    note: (set.note ?? '').split(/\n+/).filter(Boolean).map(noteHtml),
    parameters: parameterLines(set),
    derived: derivedOf(pressed, id).map(derivedHtml).join(', '),
    correlations: set.correlations.map(
      ([one, other, r]) => `<i>r</i>(${symbol(one)}, ${symbol(other)}) = ${realMinus(r)}`,
    ),
    milestones: lines,
    missing,
    nonlinear: table.nonlinear.length === 0 ? '' : nonlinearCaution(table.nonlinear.map(missedMilestone)),
    milestonesFile: {
      name: `${table.id}.csv`,
      address: address.csv(edition.number, table.id),
      checksum: table.checksum,
    },
    tables: contentsLines(pressed, id),
    beside: besideOthers(pressed, set),
  };
}

function missedMilestone(name: MilestoneName): Missed {
  return { symbol: milestoneSymbol(name), where: '' };
}

function derivedHtml({ name, value }: Stamp['derived'][number]): string {
  const symbol = renderFormula(symbolOfName(name), 'inline', 'stamp');
  return `<span class="tied">${symbol} = ${pageNumber(Number(value), PAGE_DIGITS)}</span>`;
}

function symbol(parameter: keyof typeof PARAMETER_TEXT): string {
  return renderFormula(PARAMETER_TEXT[parameter].symbol, 'inline', 'src/site/parameterText.ts');
}

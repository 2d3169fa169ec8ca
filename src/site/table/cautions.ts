import type { Table } from '../../tables/types.ts';
import { nonlinearCaution } from '../nonlinearCaution.ts';
import { isUnchecked, uncertaintySentence } from '../setCautions.ts';
import { realMinus } from '../writtenNumber.ts';
import type { ColumnView } from './columnViews.ts';

/** Below this redshift a peculiar velocity of 300 km/s (0.001 in z) is more than 3 per cent of z. */
const PECULIAR = 0.03;

/** What the cautions of a table depend on. */
type Cautioned = Pick<Table, 'set' | 'topic' | 'redshifts' | 'beyondAntipode' | 'nonlinear'>;

/** What a reader of this table could be misled by, in short sentences of HTML. */
export function cautions(table: Cautioned, columns: readonly Pick<ColumnView, 'id' | 'symbol'>[]): string[] {
  const { set, topic, redshifts, beyondAntipode, nonlinear } = table;
  const lines: string[] = [];
  if (isUnchecked(set)) lines.push('Parameters written down from memory, not yet checked against the paper.');
  lines.push(uncertaintySentence(set));
  if (nonlinear.length > 0) {
    lines.push(
      nonlinearCaution(
        nonlinear.map(({ column, from, to }) => ({
          symbol: columns.find(({ id }) => id === column)?.symbol ?? column,
          where: rangeText(from, to),
        })),
      ),
    );
  }
  if (topic === 'distances' && redshifts.some((z) => Number(z) > 0 && Number(z) < PECULIAR)) {
    lines.push(
      `Below <i>z</i> = ${PECULIAR} peculiar velocities of 300 km/s shift a distance by more than 3 per cent.`,
    );
  }
  const first = beyondAntipode[0];
  if (first !== undefined) {
    lines.push(
      `From <i>z</i> = ${redshifts[first]} on, sources lie beyond the antipode: light has passed the far side of closed space.`,
    );
  }
  if (redshifts.some((z) => Number(z) < 0)) {
    lines.push('Rows with <i>z</i> &lt; 0 lie in the future; what needs an observed source is blank there.');
  }
  return lines;
}

function rangeText(from: string, to: string): string {
  return `<i>z</i> = ${realMinus(from)}${to === from ? '' : ` to ${realMinus(to)}`}`;
}

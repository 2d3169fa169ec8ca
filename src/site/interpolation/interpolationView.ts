import { background } from '../../cosmology/background.ts';
import type { QuantityId } from '../../cosmology/quantities.ts';
import type { Content, ParameterSet } from '../../inputs/types.ts';
import { Decimal } from '../../numerics/decimal.ts';
import { columnsOf } from '../../tables/columns.ts';
import type { Method } from '../../tables/neededStep.ts';
import { stepsNeeded } from '../../tables/stepsNeeded.ts';
import type { EditionTables, Table } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { currentEdition } from '../currentEdition.ts';
import { gridExtent } from '../gridText.ts';
import { renderMarkdown } from '../markdown.ts';
import type { Press } from '../press.ts';
import { quantityLink } from '../quantityLink.ts';
import { setTitle } from '../setTitle.ts';
import { realMinus, writtenNumber } from '../writtenNumber.ts';
import { type ErrorTable, errorTable } from './errorTable.ts';
import { errorText } from './errorText.ts';
import { INTERPOLATION_TEXT } from './interpolationText.ts';

/** The page on interpolation. */
export interface InterpolationView {
  readonly sections: readonly { readonly id: string; readonly title: string; readonly html: string }[];
  readonly edition: { readonly number: string; readonly address: string };
  readonly grids: readonly { readonly title: string; readonly extent: string }[];
  readonly largest: ErrorTable;
  readonly set: { readonly title: string; readonly address: string };
  readonly steps: readonly { readonly id: string; readonly title: string; readonly table: ErrorTable }[];
}

/** Stretches for which steps are given, and the errors wanted. */
const STRETCHES = [
  ['0.01', '0.1'],
  ['0.1', '1'],
  ['1', '10'],
] as const;
const WANTED = ['-4', '-6', '-8'] as const;
const METHODS = { linear: 'Linear', lagrange: 'Four rows' } as const satisfies Record<Method, string>;

export function interpolationView(press: Press): InterpolationView {
  const pressed = currentEdition(press);
  const { number } = pressed.edition;
  const set = shownSet(pressed);
  return {
    sections: INTERPOLATION_TEXT.map(({ id, title, body }) => ({
      id,
      title,
      html: renderMarkdown(body, { where: `src/site/interpolation, section ${id}`, link: quantityLink }),
    })),
    edition: { number, address: address.edition(number) },
    grids: gridsOf(pressed).map((grid) => ({ title: grid.title, extent: gridExtent(grid) })),
    largest: largestTable(press.content, pressed),
    set: { title: setTitle(set), address: address.set(number, set.id) },
    steps: stepTables(press.content, pressed, set),
  };
}

/** The first published set of the edition, or its first set if none is published. */
function shownSet({ tables, milestones }: EditionTables): ParameterSet {
  const sets = [...tables, ...milestones].map(({ set }) => set);
  const shown = sets.find(({ kind }) => kind === 'published') ?? sets[0];
  if (!shown) throw new Error('The current edition has no parameter set.');
  return shown;
}

function gridsOf({ tables }: EditionTables): readonly Table['grid'][] {
  return [...new Map(tables.map(({ grid }) => [grid.id, grid])).values()];
}

/** The largest errors of each column on each grid over all parameter sets. */
function largestTable(content: Content, pressed: EditionTables): ErrorTable {
  const found = new Map<string, number>();
  for (const { grid, interpolation } of pressed.tables) {
    for (const { column, ...errors } of interpolation) {
      for (const method of ['linear', 'lagrange'] as const) {
        const key = `${grid.id} ${method} ${column}`;
        const relative = errors[method]?.relative;
        if (relative !== undefined) found.set(key, Math.max(relative, found.get(key) ?? 0));
      }
    }
  }
  const grids = gridsOf(pressed);
  const groups = grids.map(({ title }) => ({ title, heads: Object.values(METHODS) }));
  return errorTable(content, pressed.edition.topics, 'Largest relative errors', groups, (column) =>
    grids.flatMap(({ id }) =>
      (['linear', 'lagrange'] as const).map((method) => errorText(found.get(`${id} ${method} ${column}`))),
    ),
  );
}

/** For each method the step that each wanted error needs in each stretch. */
function stepTables(content: Content, pressed: EditionTables, set: ParameterSet): InterpolationView['steps'] {
  const { topics, digits } = pressed.edition;
  const columns = topics.flatMap((topic) => columnsOf(topic).map(({ id }): QuantityId => id));
  const model = background(set.parameters);
  const wanted = WANTED.map((power) => Number(`1e${power}`));
  const needed = STRETCHES.map(([from, to]) =>
    stepsNeeded(model, columns, { from: Decimal.parse(from), to: Decimal.parse(to) }, wanted, digits),
  );
  const groups = STRETCHES.map(([from, to]) => ({
    title: `${from} to ${to}`,
    heads: WANTED.map((power) => `10<sup>${realMinus(power)}</sup>`),
  }));
  return (['linear', 'lagrange'] as const).map((method) => ({
    id: `steps-${method}`,
    title: METHODS[method],
    table: errorTable(content, topics, `Steps needed, ${METHODS[method].toLowerCase()}`, groups, (column) =>
      needed.flatMap((byColumn) =>
        (byColumn.get(column)?.[method] ?? []).map((step) => (step ? writtenNumber(String(step)) : '')),
      ),
    ),
  }));
}

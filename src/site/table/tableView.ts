import type { EditionTables, Table } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { type Colophon, colophon } from '../colophon.ts';
import { shownState } from '../currentEdition.ts';
import { gridExtent } from '../gridText.ts';
import type { Press } from '../press.ts';
import { type RunningHead, runningHead } from '../runningHead.ts';
import { setTitle } from '../setTitle.ts';
import { TOPIC_TEXT } from '../topicText.ts';
import { betweenRows } from './betweenRows.ts';
import { type BudgetView, budgetView } from './budgetView.ts';
import { cautions } from './cautions.ts';
import { type ColumnView, columnViews } from './columnViews.ts';
import { type Fit, fitOf } from './fitOf.ts';
import { type RowView, rowViews } from './rowViews.ts';
import { type Thumb, thumbIndex } from './thumbIndex.ts';
import { type TurnTo, turnTo } from './turnTo.ts';

/** Everything a table page prints. */
export interface TableView {
  readonly id: string;
  readonly head: RunningHead;
  readonly topic: string;
  readonly holds: string;
  readonly set: string;
  readonly grid: { readonly title: string; readonly extent: string };
  readonly columns: readonly ColumnView[];
  readonly groups: readonly (readonly RowView[])[];
  readonly fit: Fit;
  readonly thumbs: readonly Thumb[];
  /** HTML. */
  readonly cautions: readonly string[];
  readonly turnTo: TurnTo;
  /** The companion file; null for a set that gives no uncertainties. */
  readonly uncertainties: { readonly name: string; readonly address: string } | null;
  readonly budget: BudgetView | null;
  readonly colophon: Colophon;
}

export function tableView(press: Press, pressed: EditionTables, table: Table): TableView {
  const { edition } = pressed;
  const state = shownState(press, edition);
  const columns = columnViews(press.content, table);
  const text = TOPIC_TEXT[table.topic];
  const page = address.table(edition.number, table.id);
  return {
    id: table.id,
    head: runningHead(edition, state, table.set, text.name),
    topic: text.name,
    holds: text.holds,
    set: setTitle(table.set),
    grid: { title: table.grid.title, extent: gridExtent(table.grid) },
    columns,
    groups: rowViews(table.redshifts, columns),
    fit: fitOf(columns),
    thumbs: thumbIndex(table.redshifts),
    cautions: cautions(table, columns),
    turnTo: turnTo(pressed, table),
    uncertainties: table.uncertaintyCsv === null ? null : uncertaintyFile(edition.number, `${table.id}.u`),
    budget: budgetView(table, columns),
    colophon: colophon(
      press.content.site,
      table.stamp,
      state,
      table.id,
      page,
      betweenRows(edition.number, table, columns),
    ),
  };
}

function uncertaintyFile(edition: string, id: string): { name: string; address: string } {
  return { name: `${id}.csv`, address: address.csv(edition, id) };
}

import type { ScalarParameter } from '../cosmology/parameters.ts';
import type { SiteSettings } from '../inputs/types.ts';
import type { Stamp } from '../tables/types.ts';
import { absoluteAddress } from './absoluteAddress.ts';
import { address } from './addresses.ts';
import { auditText } from './auditText.ts';
import type { ShownState } from './currentEdition.ts';
import { renderFormula } from './formula.ts';
import { type ParameterLine, parameterLines } from './parameterLines.ts';
import { setTitle } from './setTitle.ts';
import { symbolOfName } from './symbolOfName.ts';
import type { BetweenRows } from './table/betweenRows.ts';
import { unitHtml } from './unitText.ts';
import { writtenNumber } from './writtenNumber.ts';

/** The stamp of a table as its page prints it. Symbols, values and units are HTML. */
export interface Colophon {
  readonly edition: string;
  readonly state: ShownState;
  readonly set: { readonly title: string; readonly address: string; readonly citation: string; readonly where: string };
  readonly parameters: readonly ParameterLine[];
  readonly derived: readonly { readonly symbol: string; readonly value: string }[];
  readonly constants: readonly {
    readonly symbol: string;
    readonly value: string;
    readonly unit: string;
    readonly source: string;
  }[];
  /** What interpolation in z between the rows is worth. */
  readonly between: BetweenRows;
  /** What the audit found, in a sentence or two. */
  readonly audit: string;
  readonly method: string;
  /** Address of the methods page. */
  readonly methods: string;
  readonly file: { readonly name: string; readonly address: string; readonly checksum: string };
  readonly licence: SiteSettings['licence'];
  /** A sentence to copy. */
  readonly citation: string;
  /** The stamp in short, for the foot of printed pages. Plain text. */
  readonly foot: string;
}

/** `table` is the id of the table whose stamp it is, `page` the address of its page. */
export function colophon(
  site: SiteSettings,
  stamp: Stamp,
  state: ShownState,
  table: string,
  page: string,
  between: BetweenRows,
): Colophon {
  const { set, edition, checksum } = stamp;
  const title = setTitle(set);
  return {
    edition,
    state,
    set: {
      title,
      address: address.set(edition, set.id),
      citation: set.source.citation,
      where: set.source.where ?? '',
    },
    parameters: parameterLines(set),
    derived: stamp.derived.map(({ name, value }) => ({
      symbol: inline(symbolOfName(name)),
      value: writtenNumber(value),
    })),
    constants: stamp.constants.map((constant) => ({
      symbol: inline(constant.symbol),
      value: writtenNumber(constant.value),
      unit: unitHtml(constant.unit),
      source: constant.source,
    })),
    between,
    audit: auditText(stamp.audit),
    method: stamp.method,
    methods: address.methods(),
    file: { name: `${table}.csv`, address: address.csv(edition, table), checksum },
    licence: site.licence,
    foot: foot(site, stamp, state, table),
    citation:
      `${site.group}: ${site.title}, edition ${edition}${state === 'released' ? '' : ` (${state})`}, ` +
      `table ${table}, SHA-256 ${checksum.slice(0, 12)}. ${absoluteAddress(site, page)}`,
  };
}

function foot(
  site: SiteSettings,
  { set, edition, method, checksum, audit }: Stamp,
  state: ShownState,
  table: string,
): string {
  const values = Object.entries(set.parameters).flatMap(([id, value]) => {
    const u = set.uncertainties[id as ScalarParameter];
    if (value === undefined) return [];
    return [`${id} ${[value].flat().join(', ') || 'massless'}${u === undefined ? '' : ` ± ${u}`}`];
  });
  return (
    `${site.title}, edition ${edition}${state === 'released' ? '' : ` (${state})`}. ${setTitle(set)}: ` +
    `${values.join('; ')}. Method version ${method}${audit === null ? '' : `, audited ${audit.date}`}. ${table}.csv, SHA-256 ${checksum}. ${site.licence.name}.`
  );
}

function inline(latex: string): string {
  return renderFormula(latex, 'inline', 'stamp');
}

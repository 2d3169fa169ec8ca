/**
 * Every address of the site. Nothing else writes one, so that the whole site can stand below a sub-path: `base` is
 * Astro's BASE_URL, "/" outside a build, and ends with a slash.
 */
const base: string = import.meta.env?.BASE_URL ?? '/';

/** An address from its parts: a folder, unless the last part is a file. */
function folder(...parts: readonly string[]): string {
  return base + parts.map((part) => `${part}/`).join('');
}

export const address = {
  home: () => base,
  editions: () => folder('editions'),
  edition: (edition: string) => folder('editions', edition),
  set: (edition: string, set: string) => folder('editions', edition, 'sets', set),
  /** `table` is `<set>.<topic>.<grid>`. */
  table: (edition: string, table: string) => folder('editions', edition, 'tables', table),
  /** The row of one redshift, written as its grid writes it. */
  row: (edition: string, table: string, redshift: string) =>
    `${folder('editions', edition, 'tables', table)}#${rowId(redshift)}`,
  /** The CSV of a table, of what goes with it (`<table>.u`, `<table>.interpolation`) or of `<set>.milestones`. */
  csv: (edition: string, table: string) => `${folder('editions', edition, 'tables')}${table}.csv`,
  quantities: () => folder('quantities'),
  quantity: (column: string) => folder('quantities', column),
  methods: () => folder('methods'),
  checkedAgainst: () => folder('checked-against'),
  interpolation: () => folder('interpolation'),
  search: () => folder('search'),
  icon: () => `${base}favicon.svg`,
  searchIndex: () => `${base}search-index.json`,
} as const;

/** The id of a row, `z=0.50`. */
export function rowId(redshift: string): string {
  return `z=${redshift}`;
}

import { parseArgs } from 'node:util';
import { Decimal } from '../../src/numerics/decimal.ts';
import type { Method } from '../../src/tables/neededStep.ts';
import { contentFolder, optionError, UsageError } from './options.ts';

/** What `npm run grid` is asked. */
export interface GridOptions {
  readonly set: string;
  readonly column: string;
  readonly error: number;
  readonly method: Method;
  readonly from: Decimal;
  readonly to: Decimal;
  readonly content: string;
}

const NAME = 'grid';
const OPTIONS = {
  set: { type: 'string' },
  column: { type: 'string' },
  error: { type: 'string' },
  method: { type: 'string', default: 'linear' },
  from: { type: 'string', default: '0' },
  to: { type: 'string', default: '10' },
  content: { type: 'string' },
  help: { type: 'boolean' },
} as const;

const HELP = `npm run grid -- --set ID --column C --error E [OPTIONS]

Says which steps a redshift grid needs so that interpolating a column between its rows is good to a relative error E,
and prints them as segments for a file in redshift-grids/. The error is the one that tables state.

Options, after a lone --:
  --set ID       a parameter set, such as planck-2018-lensing
  --column C     a column of its tables, such as D_L_Mpc
  --error E      largest relative error, such as 1e-6
  --method M     linear, or lagrange: through the four nearest rows (default: linear)
  --from Z       first redshift (default: 0)
  --to Z         last redshift (default: 10)
  --content DIR  the folder with parameter-sets/, redshift-grids/, editions/, quantities/ and site.yaml
                 (default: content)
  --help         this text`;

/** Redshifts that a grid can have. */
const RANGE = { above: Decimal.parse('-1'), most: Decimal.parse('1e6') } as const;

/**
 * Reads the command line; undefined after printing the help.
 * @throws UsageError for a missing, unknown or unreadable option
 */
export function readGridOptions(args: readonly string[]): GridOptions | undefined {
  const values = parsed(args);
  if (values.help) {
    console.log(HELP);
    return undefined;
  }
  const { method } = values;
  if (method !== 'linear' && method !== 'lagrange') {
    throw new UsageError(`--method is "${method}"; it must be linear or lagrange.`);
  }
  return {
    set: given('set', values.set),
    column: given('column', values.column),
    error: errorSize(given('error', values.error)),
    method,
    from: redshift('from', values.from),
    to: redshift('to', values.to),
    content: contentFolder(values.content),
  };
}

function parsed(args: readonly string[]) {
  try {
    return parseArgs({ args: joinNegative(args), options: OPTIONS, strict: true }).values;
  } catch (error) {
    throw optionError(NAME, error as Error);
  }
}

/** Without this, `--from -0.9` would be read as an option -0. */
function joinNegative(args: readonly string[]): string[] {
  const joined: string[] = [];
  for (const arg of args) {
    const last = joined.at(-1);
    if ((last === '--from' || last === '--to') && /^-[\d.]/.test(arg)) joined[joined.length - 1] = `${last}=${arg}`;
    else joined.push(arg);
  }
  return joined;
}

function given(name: 'set' | 'column' | 'error', value: string | undefined): string {
  if (value === undefined || value.trim() === '') {
    throw new UsageError(
      `--${name} is missing, as in: npm run ${NAME} -- --set planck-2018-lensing --column D_L_Mpc --error 1e-6`,
    );
  }
  return value;
}

function errorSize(text: string): number {
  const error = decimal('error', text).toNumber();
  if (error > 0 && error < 1) return error;
  throw new UsageError(`--error is ${text}; a relative error lies between 0 and 1, as 1e-6 does.`);
}

function redshift(name: 'from' | 'to', text: string): Decimal {
  const z = decimal(name, text);
  if (z.compare(RANGE.above) > 0 && z.compare(RANGE.most) <= 0) return z;
  throw new UsageError(`--${name} is ${text}; a redshift is greater than -1 and at most 1000000.`);
}

function decimal(name: string, text: string): Decimal {
  try {
    return Decimal.parse(text);
  } catch (error) {
    throw new UsageError(`--${name}: ${(error as Error).message}.`);
  }
}

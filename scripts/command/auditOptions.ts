import { parseArgs } from 'node:util';
import { contentFolder, optionError } from './options.ts';

/** What `npm run audit` is asked. */
export interface AuditOptions {
  readonly content: string;
  /** Undefined means every draft edition. */
  readonly edition: string | undefined;
  /** Whether to forget what an interrupted audit has left. */
  readonly fresh: boolean;
}

const NAME = 'audit';
const OPTIONS = {
  content: { type: 'string' },
  edition: { type: 'string' },
  fresh: { type: 'boolean', default: false },
  help: { type: 'boolean' },
} as const;

const HELP = `npm run audit [-- OPTIONS]

Evaluates every cell of an edition a second time, in extended precision, and compares it with the table. When none
differs, writes the certificate editions/NUMBER/audit.json in the content folder. An interrupted audit goes on where
it stopped when the command is given again.

Options, after a lone --:
  --edition N    one edition, such as 2026.1 (default: every draft)
  --fresh        audit everything anew
  --content DIR  the folder with parameter-sets/, redshift-grids/, editions/, quantities/ and site.yaml
                 (default: content)
  --help         this text`;

/**
 * Reads the command line; undefined after printing the help.
 * @throws UsageError for anything unknown on it
 */
export function readAuditOptions(args: readonly string[]): AuditOptions | undefined {
  const values = parsed(args);
  if (values.help) {
    console.log(HELP);
    return undefined;
  }
  return { content: contentFolder(values.content), edition: values.edition, fresh: values.fresh };
}

function parsed(args: readonly string[]) {
  try {
    return parseArgs({ args: [...args], options: OPTIONS, strict: true }).values;
  } catch (error) {
    throw optionError(NAME, error as Error);
  }
}

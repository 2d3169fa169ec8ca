import { resolve } from 'node:path';
import { parseArgs } from 'node:util';
import { projectRoot } from './projectRoot.ts';

/** Where output goes unless `--out` says otherwise. */
export const defaultOut = resolve(projectRoot, 'dist');

/** What a command says about itself. */
export interface CommandHelp {
  /** As typed after `npm run`. */
  readonly name: string;
  /** One sentence. */
  readonly does: string;
  /** What `--out` means here. */
  readonly out: string;
}

export interface Folders {
  readonly content: string;
  /** Undefined when `--out` was not given. */
  readonly out: string | undefined;
}

/** Wrong options on the command line. */
export class UsageError extends Error {
  override name = 'UsageError';
}

/**
 * Reads `--content DIR`, `--out DIR` and `--help`. Folders are relative to where the command was typed.
 * Returns undefined after printing the help.
 * @throws UsageError for anything else on the command line.
 */
export function readOptions(help: CommandHelp, args: readonly string[]): Folders | undefined {
  const values = parse(help, args);
  if (values.help) {
    console.log(helpText(help));
    return undefined;
  }
  return {
    content: contentFolder(values.content),
    out: values.out === undefined ? undefined : typedFolder('out', values.out),
  };
}

/** The folder of `--content`, or the shipped one. */
export function contentFolder(typed: string | undefined): string {
  return typed === undefined ? resolve(projectRoot, 'content') : typedFolder('content', typed);
}

function typedFolder(name: 'content' | 'out', typed: string): string {
  if (typed.trim() === '') throw new UsageError(`--${name} needs a folder.`);
  return resolve(process.env.INIT_CWD ?? process.cwd(), typed);
}

/** What the parser of options found wrong, in one line, and where to read more. */
export function optionError(command: string, error: Error): UsageError {
  const hint = `Options follow a lone --, as in: npm run ${command} -- --help`;
  return new UsageError(`${firstSentence(error)}\n${hint}`);
}

function parse(help: CommandHelp, args: readonly string[]) {
  try {
    const options = { content: { type: 'string' }, out: { type: 'string' }, help: { type: 'boolean' } } as const;
    return parseArgs({ args: [...args], options, strict: true }).values;
  } catch (error) {
    throw optionError(help.name, error as Error);
  }
}

/** Node.js adds advice on positional arguments, which no command takes. */
function firstSentence(error: Error): string {
  return (error.message.split('\n')[0] ?? '').replace(/ To specify a positional.*| This command does not.*/, '');
}

function helpText({ name, does, out }: CommandHelp): string {
  return [
    `npm run ${name} [-- OPTIONS]`,
    '',
    does,
    '',
    'Options, after a lone --:',
    '  --content DIR  the folder with parameter-sets/, redshift-grids/, editions/, quantities/ and site.yaml',
    '                 (default: content)',
    `  --out DIR      ${out}`,
    '  --help         this text',
  ].join('\n');
}

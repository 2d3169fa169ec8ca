import { z } from 'zod';
import type { Checked } from './types.ts';

const count = z.int().min(0);
/** A relative error as text, two digits. */
const size = z.string().regex(/^\d+(\.\d+)?(E-?\d+)?$/);

const entry = z.strictObject({
  /** Name of the file without `.csv`. */
  table: z.string(),
  /** SHA-256 of the bytes that were audited. */
  sha256: z.string().regex(/^[0-9a-f]{64}$/),
  cells: count,
  blank: count,
  /** Cells that the audit had to settle when the table was made. */
  settled: count,
  /** Largest relative error of a double value, before rounding. */
  largestError: size,
});

const schema = z.strictObject({
  edition: z.string(),
  method: z.string(),
  /** The two working precisions, decimal digits. */
  workingDigits: z.tuple([count, count]),
  /** Largest relative difference between the two. */
  precisionError: size,
  audited: z.iso.date(),
  seconds: count,
  cells: count,
  disagreements: z.literal(0),
  /** Largest relative error of the double evaluation by column, over all tables. */
  largestErrors: z.record(z.string(), size),
  tables: z.array(entry),
});

/** What the audit of an edition found: `content/editions/<number>/audit.json`, written by `npm run audit`. */
export type Certificate = Readonly<z.output<typeof schema>>;
export type CertificateEntry = Readonly<z.output<typeof entry>>;

/** Reads a certificate. It is not a keeper's file: whatever is wrong with it, the audit is to be run again. */
export function certificate(file: string, bytes: Uint8Array): Checked<Certificate> {
  const refuse = (wrong: string): Checked<Certificate> => ({
    value: null,
    problems: [{ file, line: 1, column: 1, wrong, expected: 'the file as npm run audit writes it; run it again' }],
  });
  let data: unknown;
  try {
    data = JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
  } catch {
    return refuse('this is no JSON');
  }
  const result = schema.safeParse(data);
  if (result.success) return { value: result.data, problems: [] };
  const [issue] = result.error.issues;
  return refuse(`${issue?.path.join('.') || 'the file'}: ${issue?.message ?? 'not a certificate'}`);
}

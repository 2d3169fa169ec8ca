import { z } from 'zod';
import { MILESTONE_NAMES } from '../../cosmology/milestones.ts';
import { QUANTITIES, type QuantityId } from '../../cosmology/quantities.ts';
import { Decimal } from '../../numerics/decimal.ts';
import { CONVERSIONS, type Conversion } from './conversions.ts';
import { SOURCE_KINDS, STATUSES, TOLERANCE_GROUNDS } from './words.ts';

const COMPUTED_GROUNDS: readonly string[] = ['printed digits', 'input digits', 'mean of chains'];

const words = z.string().trim().min(1);
const decimal = z.string().refine(isDecimal, { error: 'a decimal number in quotes, as printed: "13.797"' });
const positive = decimal.refine((text) => Decimal.parse(text).sign() > 0, { error: 'a number greater than 0' });

/** Decimals as the source prints them. */
const parameters = z
  .strictObject({
    H0: positive,
    Omega_m: decimal.optional(),
    omega_b: decimal.optional(),
    omega_c: decimal.optional(),
    Omega_k: decimal.optional(),
    Omega_DE: decimal.optional(),
    w0: decimal,
    wa: decimal,
    T_CMB: decimal,
    N_eff: decimal,
    m_nu: z.array(decimal),
  })
  .refine(givesMatterOnce, { error: 'either Omega_m, or both omega_b and omega_c' })
  .refine((p) => p.Omega_k === undefined || p.Omega_DE === undefined, { error: 'Omega_k or Omega_DE, not both' });

const roundable = z.enum(['H0', 'Omega_m', 'omega_b', 'omega_c', 'Omega_k', 'Omega_DE']);
const milestone = z.enum(MILESTONE_NAMES);

/** A value of the tables: a milestone, or a column at a redshift, which may itself be a milestone. */
const reading = z.union([
  z.strictObject({ milestone }),
  z.strictObject({
    column: z.enum(Object.keys(QUANTITIES) as [QuantityId, ...QuantityId[]]),
    z: z.union([milestone, decimal]),
  }),
]);

/** What is compared: (of + plus) x times / over, then converted. */
const what = z.strictObject({
  of: reading,
  plus: reading.optional(),
  times: reading.optional(),
  over: reading.optional(),
  as: z.enum(Object.keys(CONVERSIONS) as [Conversion, ...Conversion[]]).optional(),
});

const check = z
  .strictObject({
    id: z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/),
    /** In words, as the sentence of a table: "age today, best fit". */
    quantity: words,
    /** As printed, without its uncertainty. */
    published: decimal,
    /** The two printed rows whose ratio `published` is, where the source prints no such row. */
    ratioOf: z.tuple([decimal, decimal]).optional(),
    /** As printed; "" if there is none. */
    unit: z.string(),
    /** Table, equation or page. */
    where: words.optional(),
    status: z.enum(STATUSES),
    /** Id of one of the file's models. */
    model: words,
    what,
    /** Largest difference that counts as agreement, in the printed unit. */
    tolerance: positive,
    toleranceFrom: z.array(z.enum(TOLERANCE_GROUNDS)).min(1),
    /** Needed where the limit cannot be computed from digits and uncertainties. */
    toleranceReason: words.optional(),
    expectation: z.enum(['agrees', 'disagrees']),
    /** Why the published value differs. */
    why: words.optional(),
  })
  .refine(explainsTolerance, { error: 'a toleranceReason, where the limit cannot be computed' })
  .refine(({ expectation, why }) => (expectation === 'disagrees') === (why !== undefined), {
    error: 'why, for a value that disagrees and no other',
  });

/** A file of test/reference/published. */
export const sourceSchema = z
  .strictObject({
    source: z.strictObject({
      title: words,
      kind: z.enum(SOURCE_KINDS),
      citation: words,
      doi: z
        .string()
        .regex(/^10\.\d{4,9}\/\S+$/)
        .optional(),
      arXiv: z
        .string()
        .regex(/^(\d{4}\.\d{4,5}|[a-z-]+\/\d{7})$/)
        .optional(),
      address: z.url({ protocol: /^https$/ }).optional(),
    }),
    models: z.record(
      words,
      z.strictObject({
        /** Which of its models this is, and what is assumed where the source is silent. */
        about: words,
        parameters,
        /** Parameters known only to their printed digits; the others are exact by convention. */
        rounded: z.array(roundable),
        /** Standard uncertainties of a mean over chains, the larger one where they are asymmetric. */
        uncertainties: z.partialRecord(roundable, positive).optional(),
      }),
    ),
    checks: z.array(check).min(1),
  })
  .refine(({ models, checks }) => checks.every(({ model }) => model in models), {
    error: 'a model of this file in every check',
  })
  .refine(({ checks }) => new Set(checks.map(({ id }) => id)).size === checks.length, {
    error: 'an id of its own for every check',
  });

export type PublishedFile = z.infer<typeof sourceSchema>;
export type Reading = z.infer<typeof reading>;
export type What = z.infer<typeof what>;

function isDecimal(text: string): boolean {
  try {
    return Number.isFinite(Decimal.parse(text).toNumber());
  } catch {
    return false;
  }
}

function givesMatterOnce(p: {
  readonly Omega_m?: string | undefined;
  readonly omega_b?: string | undefined;
  readonly omega_c?: string | undefined;
}): boolean {
  const physical = [p.omega_b, p.omega_c].filter((value) => value !== undefined).length;
  return p.Omega_m === undefined ? physical === 2 : physical === 0;
}

function explainsTolerance(given: {
  readonly toleranceFrom: readonly string[];
  readonly toleranceReason?: string | undefined;
}): boolean {
  const computed = given.toleranceFrom.every((ground) => COMPUTED_GROUNDS.includes(ground));
  return computed || given.toleranceReason !== undefined;
}

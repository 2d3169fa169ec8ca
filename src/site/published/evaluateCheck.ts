import { type Background, background } from '../../cosmology/background.ts';
import { epochs } from '../../cosmology/epochs.ts';
import type { MilestoneName } from '../../cosmology/milestones.ts';
import { milestoneValues } from '../../cosmology/milestoneValues.ts';
import type { Parameters } from '../../cosmology/parameters.ts';
import { QUANTITIES } from '../../cosmology/quantities.ts';
import { CONVERSIONS } from './conversions.ts';
import type { Reading, What } from './sourceSchema.ts';

/** What is needed to compare a published value with ours. */
export interface Comparison {
  readonly published: string;
  readonly tolerance: string;
  readonly inputs: Parameters;
  readonly what: What;
}

export interface Evaluation {
  /** Our value, in the printed unit. */
  readonly ours: number;
  /** Ours minus the published one. */
  readonly difference: number;
  readonly verdict: 'agrees' | 'disagrees';
}

/**
 * A published value beside ours: it agrees if the difference is no larger than the tolerance.
 *
 * @throws Error where the model has no such value
 */
export function evaluateCheck({ published, tolerance, inputs, what }: Comparison): Evaluation {
  const ours = ourValue(inputs, what);
  const difference = ours - Number(published);
  return { ours, difference, verdict: Math.abs(difference) <= Number(tolerance) ? 'agrees' : 'disagrees' };
}

/** (of + plus) x times / over, then converted. */
export function ourValue(inputs: Parameters, { of, plus, times, over, as }: What): number {
  const model = background(inputs);
  const value = (reading: Reading | undefined, absent: number) =>
    reading === undefined ? absent : readValue(model, reading);
  const combined = ((value(of, 0) + value(plus, 0)) * value(times, 1)) / value(over, 1);
  return as === undefined ? combined : CONVERSIONS[as](combined);
}

function readValue(model: Background, reading: Reading): number {
  if ('milestone' in reading) return milestoneOf(model, reading.milestone);
  const z = isMilestone(reading.z) ? milestoneOf(model, reading.z) : Number(reading.z);
  const [epoch] = epochs(model, [z]);
  const value = epoch ? QUANTITIES[reading.column](model, epoch) : null;
  if (value === null) throw new Error(`${reading.column} does not exist at z = ${reading.z} of this model`);
  return value;
}

function milestoneOf(model: Background, name: MilestoneName): number {
  const value = milestoneValues(model)[name];
  if (typeof value !== 'number') throw new Error(`${name} does not exist in this model`);
  return value;
}

/** Names of milestones begin with a letter, decimals do not. */
function isMilestone(z: string): z is MilestoneName {
  return /^[a-z]/i.test(z);
}

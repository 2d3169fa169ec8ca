import { address } from '../../site/addresses.ts';
import type { IndexedSet, SearchIndex } from '../../site/searchIndexTypes.ts';
import { type Hit, upperFirst } from './hit.ts';
import { unitKey } from './query.ts';
import { standing } from './rowHits.ts';
import type { Scope } from './scope.ts';
import { roundsTo, significantDigits, type TypedNumber } from './typedNumber.ts';
import type { Target } from './vocabulary.ts';

/** The named milestones and parameters of one set, those that it has. */
export function namedValues(index: SearchIndex, scope: Scope, set: IndexedSet, targets: readonly Target[]): Hit[] {
  return targets.flatMap((target) => {
    const hit = valueHit(index, scope, set, target);
    return hit ? [hit.hit] : [];
  });
}

/**
 * Milestones and parameters whose value rounds to the typed number, the nearest first; of the named ones only, if any are
 * named. A bare number of a single digit finds nothing: too much rounds to it.
 */
export function matchingValues(
  index: SearchIndex,
  scope: Scope,
  targets: readonly Target[],
  typed: TypedNumber,
): Hit[] {
  if (targets.length === 0 && typed.unit === undefined && significantDigits(typed) < 2) return [];
  const among = targets.length > 0 ? targets : everyTarget(index);
  const found: { hit: Hit; distance: number }[] = [];
  for (const set of scope.sets) {
    for (const target of among) {
      const value = valueHit(index, scope, set, target);
      if (!value || (typed.unit !== undefined && unitKey(value.unit) !== typed.unit)) continue;
      if (roundsTo(value.number, typed)) found.push({ hit: value.hit, distance: Math.abs(value.number - typed.value) });
    }
  }
  return found.sort((a, b) => a.distance - b.distance).map(({ hit }) => hit);
}

function everyTarget(index: SearchIndex): Target[] {
  return [
    ...index.parameters.map((_, at): Target => ({ kind: 'parameter', at })),
    ...index.milestones.map((_, at): Target => ({ kind: 'milestone', at })),
  ];
}

/** The value of a milestone or parameter in a set; undefined where it does not exist, and for a column. */
function valueHit(index: SearchIndex, scope: Scope, set: IndexedSet, { kind, at }: Target) {
  if (kind === 'column') return undefined;
  const thing = kind === 'milestone' ? index.milestones[at] : index.parameters[at];
  const known = kind === 'milestone' ? [set.milestones[thing?.id ?? '']] : set.parameters[thing?.id ?? ''];
  const [written, u] = known ?? [];
  if (!thing || written === undefined) return undefined;
  const { title, unit } = thing;
  const page = address.set(scope.edition.number, set.id);
  const hit: Hit = {
    href: kind === 'milestone' ? `${page}#${thing.id}` : page,
    title: upperFirst(title),
    detail: standing(scope, set, undefined),
    value: u === undefined ? { written, unit } : { written, u, unit },
  };
  return { hit, number: Number(written), unit };
}

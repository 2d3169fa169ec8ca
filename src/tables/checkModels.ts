import { background } from '../cosmology/background.ts';
import { turningPoints } from '../cosmology/turningPoints.ts';
import type { Content, Edition, ParameterSet, RedshiftGrid } from '../inputs/types.ts';

/** A parameter set that the kernel refuses, alone or on one of the grids of an edition. */
export interface ModelProblem {
  readonly set: ParameterSet;
  readonly edition: Edition;
  readonly grid?: RedshiftGrid;
  readonly wrong: string;
  readonly expected: string;
}

/**
 * What only the physics can tell of the sets and grids that editions bind: neutrinos heavier than all matter, and a
 * universe without Big Bang, which has no epochs beyond its bounce.
 */
export function checkModels(content: Content): readonly ModelProblem[] {
  return content.editions.flatMap((edition) =>
    edition.parameterSets.flatMap((id) => {
      const set = content.parameterSets.find((one) => one.id === id);
      return set === undefined ? [] : checkSet(content, edition, set);
    }),
  );
}

function checkSet(content: Content, edition: Edition, set: ParameterSet): readonly ModelProblem[] {
  const model = background(set.parameters);
  if (model.matter < 0) {
    return [
      {
        set,
        edition,
        wrong: `the massive neutrinos alone exceed Omega_m: Omega_bc would be ${model.matter.toPrecision(4)}`,
        expected: 'a larger Omega_m or smaller masses m_nu',
      },
    ];
  }
  const { bounce } = turningPoints(model);
  if (bounce === undefined) return [];
  const limit = Math.expm1(-bounce);
  return edition.redshiftGrids.flatMap((id) => {
    const grid = content.redshiftGrids.find((one) => one.id === id);
    const farthest = grid?.redshifts.at(-1);
    if (grid === undefined || farthest === undefined || Number(farthest) < limit) return [];
    return [
      {
        set,
        edition,
        grid,
        wrong: `${set.id} has no Big Bang: its expansion starts from a bounce at z = ${limit.toPrecision(6)}, and the grid ${id} reaches z = ${farthest}`,
        expected: `a grid that ends below z = ${limit.toPrecision(6)}, or an edition without this set`,
      },
    ];
  });
}

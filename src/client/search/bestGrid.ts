import { nearest, type Standing } from '../nearest.ts';

/** A grid as it is searched. */
export interface Grid {
  readonly id: string;
  readonly title: string;
  /** As written and as numbers, ascending. */
  readonly redshifts: readonly string[];
  readonly numbers: readonly number[];
}

/** The rows of one grid that answer for a redshift. */
export interface Place {
  readonly grid: Grid;
  readonly standing: Standing;
  /** 0 the grid contains the redshift, 1 encloses it, 2 ends short of it. */
  readonly rank: 0 | 1 | 2;
  /** Spacing of the rows there, or how far the grid falls short. */
  readonly distance: number;
}

/**
 * The grid on which to read a redshift: one that contains it before one that only encloses it, that before one that ends
 * short of it; among equals the finest there, and then the first. Undefined without grids.
 */
export function bestGrid(grids: readonly Grid[], z: number): Place | undefined {
  const places = grids.map((grid) => placeOn(grid, z));
  return places.reduce<Place | undefined>((best, place) => (best && !isBetter(place, best) ? best : place), undefined);
}

function placeOn(grid: Grid, z: number): Place {
  const standing = nearest(grid.numbers, z);
  const at = (n: number | undefined): number | undefined => grid.numbers[n ?? -1];
  if ('at' in standing) {
    const low = at(standing.at - 1) ?? z;
    const high = at(standing.at + 1) ?? z;
    const onlyOneNeighbour = low === z || high === z;
    return { grid, standing, rank: 0, distance: (high - low) * (onlyOneNeighbour ? 2 : 1) };
  }
  const low = at(standing.below);
  const high = at(standing.above);
  if (low !== undefined && high !== undefined) return { grid, standing, rank: 1, distance: high - low };
  return { grid, standing, rank: 2, distance: Math.abs(z - (low ?? high ?? Number.POSITIVE_INFINITY)) };
}

function isBetter(a: Place, b: Place): boolean {
  return a.rank !== b.rank ? a.rank < b.rank : a.distance < b.distance;
}

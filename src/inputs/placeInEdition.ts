import type { EditionFile } from './editionProblems.ts';
import type { PlaceInEdition } from './types.ts';

/** Finds the place where an edition lists a parameter set or grid, for problems that only the physics can find. */
export function placeInEdition(editions: readonly EditionFile[]): PlaceInEdition {
  return (kind, id, number) => {
    const listOf = ({ value }: EditionFile) => (kind === 'set' ? value.parameterSets : value.redshiftGrids);
    const found = editions.find(
      (file) => (number === undefined || file.value.number === number) && listOf(file).includes(id),
    );
    if (found === undefined) throw new RangeError(`no edition ${number ?? ''} lists the ${kind} ${id}`);
    const key = kind === 'set' ? 'parameter_sets' : 'redshift_grids';
    return found.yaml.placeOf([key, listOf(found).indexOf(id)]);
  };
}

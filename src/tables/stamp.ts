import type { Background } from '../cosmology/background.ts';
import { CONSTANTS } from '../cosmology/constants.ts';
import { densities } from '../cosmology/densities.ts';
import type { Edition, ParameterSet } from '../inputs/types.ts';
import { csvCell } from './csvCell.ts';
import { METHOD_VERSION } from './method.ts';
import type { Stamp } from './types.ts';

/** Densities of today that follow from the parameters, to the edition's digits. */
function derived(model: Background, digits: number): Stamp['derived'] {
  const today = densities(model, 1);
  const values = {
    // As papers quote it: massive neutrinos included.
    Omega_m: today.matter + today.massiveNeutrinos,
    Omega_bc: today.matter,
    Omega_gamma: today.photons,
    Omega_nu: today.neutrinos,
    Omega_DE: today.darkEnergy,
    Omega_k: today.curvature,
  };
  return Object.entries(values).map(([name, value]) => ({ name, value: csvCell(value, digits) }));
}

/** What a table says of itself in every format: edition, parameters, constants, method version, checksum. */
export function stamp(edition: Edition, set: ParameterSet, model: Background, checksum: string): Stamp {
  return {
    edition: edition.number,
    state: edition.state,
    method: METHOD_VERSION,
    set,
    derived: derived(model, edition.digits),
    constants: CONSTANTS,
    checksum,
  };
}

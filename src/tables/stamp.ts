import type { Background } from '../cosmology/background.ts';
import { CONSTANTS } from '../cosmology/constants.ts';
import { densities } from '../cosmology/densities.ts';
import type { Edition, ParameterSet } from '../inputs/types.ts';
import { certificateEntry } from './certificateEntry.ts';
import { csvCell } from './csvCell.ts';
import { METHOD_VERSION } from './method.ts';
import type { Stamp, StampAudit } from './types.ts';

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

function auditOf({ certificate }: Edition, table: string, checksum: string): StampAudit | null {
  const entry = certificateEntry(certificate, table, checksum);
  if (certificate === undefined || entry === undefined || certificate.method !== METHOD_VERSION) return null;
  const { cells, settled, largestError } = entry;
  return { date: certificate.audited, workingDigits: certificate.workingDigits[0], cells, settled, largestError };
}

/** What a table says of itself in every format: edition, parameters, constants, method version, checksum, audit. */
export function stamp(edition: Edition, set: ParameterSet, model: Background, table: string, checksum: string): Stamp {
  return {
    edition: edition.number,
    state: edition.state,
    method: METHOD_VERSION,
    set,
    derived: derived(model, edition.digits),
    constants: CONSTANTS,
    checksum,
    audit: auditOf(edition, table, checksum),
  };
}

import { type GMPFunctions, init } from 'gmp-wasm';

let loaded: GMPFunctions | undefined;

/** Loads the MPFR library. Extended numbers can be made once this has resolved; later calls cost nothing. */
export async function startExtended(): Promise<void> {
  loaded ??= (await init()).binding;
}

/** The functions of MPFR. Errors: Error when startExtended has not resolved yet. */
export function mpfr(): GMPFunctions {
  if (loaded === undefined) throw new Error('extended numbers are used before startExtended() has resolved');
  return loaded;
}

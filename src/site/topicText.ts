import type { Topic } from '../inputs/types.ts';

/** How a topic is called, and what one finds in it. */
export const TOPIC_TEXT: Readonly<Record<Topic, { readonly name: string; readonly holds: string }>> = {
  distances: { name: 'Distances', holds: 'Comoving, angular and luminosity distance, modulus, scale, volume' },
  times: { name: 'Times', holds: 'Age, lookback and conformal time, expansion rate, redshift drift' },
  densities: { name: 'Densities', holds: 'Critical density, its parts at each redshift, deceleration' },
  horizons: { name: 'Horizons', holds: 'Hubble distance, particle and event horizon, recession velocity' },
};

import { distance } from 'fastest-levenshtein';

/** Names that people write for a key of ours, compared without case and punctuation. */
const ALIASES: Readonly<Record<string, string>> = {
  h: 'H0',
  hubble: 'H0',
  hubbleconstant: 'H0',
  omegal: 'Omega_DE',
  omegalambda: 'Omega_DE',
  omegavac: 'Omega_DE',
  lambda: 'Omega_DE',
  omegamatter: 'Omega_m',
  matter: 'Omega_m',
  curvature: 'Omega_k',
  omegacurvature: 'Omega_k',
  omegabaryon: 'omega_b',
  omegacdm: 'omega_c',
  omegadm: 'omega_c',
  w: 'w0',
  temperature: 'T_CMB',
  neutrinos: 'm_nu',
  neutrinomasses: 'm_nu',
  masses: 'm_nu',
  error: 'u',
  err: 'u',
  sigma: 'u',
  uncertainty: 'u',
  author: 'citation',
  paper: 'citation',
  reference: 'citation',
  table: 'where',
  name: 'title',
  type: 'kind',
  comment: 'note',
  remark: 'note',
  description: 'note',
  start: 'from',
  end: 'to',
  stop: 'to',
  redshifts: 'values',
  status: 'state',
  date: 'released',
  precision: 'digits',
  sets: 'parameter_sets',
  grids: 'redshift_grids',
  url: 'site',
  email: 'contact',
};

/** Two slips in five letters ("plane" for "plain"), one in four. */
const SLIPS_PER_LETTER = 0.4;

/** Where a name that differs only in its case means something else, the suggestion says what it stands for. */
const MEANING: Readonly<Record<string, string>> = { omega_b: 'Omega_b h^2', omega_c: 'Omega_c h^2' };

/**
 * The one of `candidates` that was probably meant by `word`: the same but for case and punctuation, a known other name,
 * or the nearest with few letters to change. Undefined when nothing is near.
 */
export function nearest(word: string, candidates: readonly string[]): string | undefined {
  const plain = bare(word);
  const same = candidates.find((candidate) => bare(candidate) === plain);
  if (same !== undefined) return same;
  const alias = Object.hasOwn(ALIASES, plain) ? ALIASES[plain] : undefined;
  if (alias !== undefined && candidates.includes(alias)) return alias;
  const ranked = candidates
    .map((candidate) => ({ candidate, count: slips(bare(candidate), plain) }))
    .filter(({ candidate, count }) => count <= Math.max(1, Math.floor(SLIPS_PER_LETTER * bare(candidate).length)))
    .sort((a, b) => a.count - b.count);
  // One slip in a name of two letters is another name: "to" is not "w0".
  return plain.length > 2 ? ranked[0]?.candidate : undefined;
}

/** What was expected instead of `word`: the probable one of `candidates`, otherwise all of them. */
export function expectedOneOf(word: string, candidates: readonly string[]): string {
  if (/^\d+$/.test(word) && candidates.some((candidate) => !/^[\d.]+$/.test(candidate))) {
    return 'a key; a decimal has a point, as a comma ends it';
  }
  const guess = nearest(word, candidates);
  if (guess === undefined) return candidates.length === 0 ? 'nothing here' : `one of ${candidates.join(', ')}`;
  const meaning = MEANING[guess];
  return `did you mean ${guess}${meaning === undefined ? '' : ` (${meaning})`}?`;
}

/** Letters to change; the right letters in another order are one slip. */
function slips(a: string, b: string): number {
  const letters = (word: string) => [...word].sort().join('');
  return a !== b && letters(a) === letters(b) ? 1 : distance(a, b);
}

function bare(word: string): string {
  return word.toLowerCase().replaceAll(/[^a-z0-9]/g, '');
}

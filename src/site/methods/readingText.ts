import type { MethodText } from './section.ts';

/** What a reader should keep in mind, our words, and the literature. */
export const READING_TEXT: readonly MethodText[] = [
  {
    id: 'cautions',
    title: 'Cautions',
    body: `
- *Digits are not knowledge.* A table evaluates its parameters as if they were exact, so that programs can be compared
  to the last digit. The parameters are known to a per cent or so, and published sets differ by more than their stated
  uncertainties. If a conclusion depends on which set you choose, say so.
- *Low redshift.* The model has no structure. Peculiar velocities of some 300 km/s shift redshifts by 0.001: below
  $z = 0.03$ they, not the parameters, limit what a single redshift says about distance. Within a few hundred Mpc the
  expansion rate itself varies from place to place.
- *Frame.* Redshifts are meant relative to the background radiation. A heliocentric redshift differs by up to 0.0012.
- *Light between us and the source.* No extinction, no K-correction, no lensing, no evolution of the source is
  contained in [luminosity distance](D_L_Mpc) and [modulus](mu_mag).
- *Proper or comoving.* Lengths and densities at an epoch are proper there unless the name says comoving; the factor
  is a power of $1+z$.
- *Hubble constant in the unit.* No number here is in units with $h$. To compare with one that is, convert it first.
- *One set at a time.* A value is meaningful only with its parameter set. Do not mix a distance from one set with a
  volume from another.
- *The far past and the future.* Beyond $z = 10^8$ the thermal history is not modelled; for $z < 0$ everything rests
  on the form of $w(a)$.`,
  },
  {
    id: 'words',
    title: 'Our words',
    body: `
- **Parameter set**: the cosmological parameters of one model, with their source and uncertainties.
- **Redshift grid**, or grid: a fixed, ordered list of redshifts, each an exact decimal.
- **Quantity**: one function of redshift, a column, with symbol, unit, definition and formula.
- **Topic**: quantities printed together: distances, times, densities, horizons.
- **Table**: one parameter set, one topic, one grid. Its name is these three joined by points.
- **Milestones**: the single epochs and values of today of one parameter set.
- **Edition**: the tables that are released together under one number. It is a draft, released, superseded by a later
  one, or withdrawn. Files of a released edition never change; a mistake gets an erratum and a new edition.
- **Stamp**: the block under every table that says edition, parameters, constants, method version and checksum.
- **Method version**: a number that goes up with every change of the program that alters a digit of any table for the
  same parameter set, grid and number of digits.
- **Checksum**: the SHA-256 of the file, by which anybody can tell that a copy is the one published.`,
  },
  {
    id: 'references',
    title: 'References',
    body: `
Formulas are from these works. Their section and equation numbers, as this site gives them, have not all been compared
with the printed papers yet. Those of Hogg (1999) are meant for version 4 of the preprint; in earlier versions some
are lower by one.

- Carroll, S. M., Press, W. H. & Turner, E. L. (1992), *The cosmological constant*, ARA&A 30, 499
- Chevallier, M. & Polarski, D. (2001), *Accelerating universes with scaling dark matter*, IJMPD 10, 213,
  [gr-qc/0009008](https://arxiv.org/abs/gr-qc/0009008)
- Davis, T. M. & Lineweaver, C. H. (2004), *Expanding confusion: common misconceptions of cosmological horizons and
  the superluminal expansion of the universe*, PASA 21, 97, [astro-ph/0310808](https://arxiv.org/abs/astro-ph/0310808)
- Eisenstein, D. J. et al. (2005), *Detection of the baryon acoustic peak in the large-scale correlation function of
  SDSS luminous red galaxies*, ApJ 633, 560, [astro-ph/0501171](https://arxiv.org/abs/astro-ph/0501171)
- Fixsen, D. J. (2009), *The temperature of the cosmic microwave background*, ApJ 707, 916,
  [arXiv:0911.1955](https://arxiv.org/abs/0911.1955)
- Hogg, D. W. (1999), *Distance measures in cosmology*, [astro-ph/9905116](https://arxiv.org/abs/astro-ph/9905116)
- JCGM (2008), *Evaluation of measurement data: guide to the expression of uncertainty in measurement*, JCGM 100,
  [doi:10.59161/JCGM100-2008E](https://doi.org/10.59161/JCGM100-2008E)
- Komatsu, E. et al. (2011), *Seven-year WMAP observations: cosmological interpretation*, ApJS 192, 18,
  [arXiv:1001.4538](https://arxiv.org/abs/1001.4538)
- Lesgourgues, J. & Pastor, S. (2006), *Massive neutrinos and cosmology*, Phys. Rep. 429, 307,
  [astro-ph/0603494](https://arxiv.org/abs/astro-ph/0603494)
- Linder, E. V. (2003), *Exploring the expansion history of the universe*, PRL 90, 091301,
  [astro-ph/0208512](https://arxiv.org/abs/astro-ph/0208512)
- Loeb, A. (1998), *Direct measurement of cosmological parameters from the cosmic deceleration of extragalactic
  objects*, ApJ 499, L111, [astro-ph/9802122](https://arxiv.org/abs/astro-ph/9802122)
- Peebles, P. J. E. (1993), *Principles of Physical Cosmology*, Princeton University Press
- Planck Collaboration VI (2020), *Cosmological parameters*, A&A 641, A6,
  [arXiv:1807.06209](https://arxiv.org/abs/1807.06209)
- Sandage, A. (1962), *The change of redshift and apparent luminosity of galaxies due to the deceleration of selected
  expanding universes*, ApJ 136, 319
- Weinberg, S. (2008), *Cosmology*, Oxford University Press`,
  },
];

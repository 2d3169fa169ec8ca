import type { MethodText } from './section.ts';

/** The model that the tables evaluate. */
export const MODEL_TEXT: readonly MethodText[] = [
  {
    id: 'model',
    title: 'The model',
    body: String.raw`
The universe is taken as homogeneous and isotropic, filled with components that do not exchange energy: baryons and
cold dark matter, photons, neutrinos, dark energy. One function of the scale factor $a = 1/(1+z)$ then holds
everything, the expansion rate in units of today's:

$$E(a)^2 = \Omega_{\mathrm{bc}} \, a^{-3} + \left[ \Omega_\gamma + \Omega_\nu^{\mathrm{rel}}(a) \right] a^{-4} + \Omega_k \, a^{-2} + \Omega_{\mathrm{DE}} \, a^{-3(1+w_0+w_a)} \, e^{-3 w_a (1-a)}.$$

Each $\Omega$ without an argument is a density today over the critical density today. $\Omega_\nu^{\mathrm{rel}}(a)$
is the sum over neutrino states that the [next section](#neutrinos) gives; it is constant for massless ones. The page
of [$E$](E) says more, and every other quantity follows from $E$ by an algebraic formula or by one of two integrals,
for comoving distance and for time:

$$\int \frac{\mathrm{d} \ln a}{a \, E}, \qquad \int \frac{\mathrm{d} \ln a}{E}.$$

Dark energy has the equation of state $w(a) = w_0 + w_a (1-a)$; with $w_0 = -1$ and $w_a = 0$ it is the cosmological
constant. Its density may be negative. Nothing else is included: no interaction, no decay, no clustering, no effect of
structure on the mean expansion.`,
  },
  {
    id: 'neutrinos',
    title: 'Radiation and neutrinos',
    body: String.raw`
Photons follow from the temperature of the background radiation today, with the radiation constant from the
[constants](#constants):

$$\Omega_\gamma = \frac{8 \pi G}{3 H_0^2} \cdot \frac{a_{\mathrm{rad}} \, T_{\mathrm{CMB}}^4}{c^2}, \qquad a_{\mathrm{rad}} = \frac{8 \pi^5 k_{\mathrm{B}}^4}{15 h_{\mathrm{P}}^3 c^3}.$$

A set with $T_{\mathrm{CMB}} = 0$ neglects radiation, neutrinos included.

A set lists the masses of $n$ neutrino states; an empty list means that all are massless. Each state carries
$N_{\mathrm{eff}}/n$ of the effective number, which fixes its density and temperature:

$$\Omega_\nu^{\mathrm{rel}}(a) = \sum_{i=1}^{n} \frac{7}{8} \left( \frac{4}{11} \right)^{4/3} \frac{N_{\mathrm{eff}}}{n} \, \Omega_\gamma \, \frac{F(y_i)}{F(0)}, \qquad T_\nu = \left( \frac{4}{11} \right)^{1/3} \left( \frac{N_{\mathrm{eff}}}{n} \right)^{1/4} T_{\mathrm{CMB}},$$

$$F(y) = \int_0^\infty \frac{x^2 \sqrt{x^2 + y^2}}{e^x + 1} \, \mathrm{d}x, \qquad y_i = \frac{m_i c^2 \, a}{k_{\mathrm{B}} T_\nu}.$$

$F$ is the energy of a Fermi-Dirac gas that decoupled while it was relativistic. It is evaluated as this integral, not
by a fit. The pressure, which enters [$q$](q) and [$w_{\mathrm{eff}}$](w_eff), is an integral of the same kind.

The photons have been heated by the annihilation of electrons and positrons in this model at all times; so nothing
here is meant for redshifts above some $10^8$.`,
  },
  {
    id: 'closure',
    title: 'What a parameter set gives, and what follows',
    body: String.raw`
The present densities sum to 1,

$$\Omega_{\mathrm{bc}} + \Omega_\gamma + \Omega_\nu + \Omega_k + \Omega_{\mathrm{DE}} = 1.$$

- *Matter* is given in one of two ways. $\Omega_{\mathrm{m}}$ is matter today including neutrinos with mass, as papers
  on the background radiation quote it, so that
  $\Omega_{\mathrm{bc}} = \Omega_{\mathrm{m}} - \Omega_{\nu,\mathrm{massive}}$. Physical densities
  $\omega_{\mathrm{b}}$ and $\omega_{\mathrm{c}}$ exclude neutrinos, so that
  $\Omega_{\mathrm{bc}} = (\omega_{\mathrm{b}} + \omega_{\mathrm{c}})/h^2$ with $h = H_0/(100 \, \mathrm{km/s/Mpc})$.
- *Curvature and dark energy*: at most one of $\Omega_k$ and $\Omega_{\mathrm{DE}}$ is given, and the sum yields the
  other. If neither is, space is flat.
- *Sign of curvature*: $\Omega_k > 0$ is open space, $\Omega_k < 0$ closed. The radius of curvature today is
  $c \, H_0^{-1} \, |\Omega_k|^{-1/2}$.

The derived densities stand in the stamp of every table. Sums of decimals are formed exactly: 0.3 and 0.7 leave a
curvature of exactly nothing.`,
  },
  {
    id: 'constants',
    title: 'Constants',
    lists: 'constants',
    body: String.raw`
No other measured numbers enter the tables than these and the parameters; each stamp repeats them. The solar mass is
$(GM)_\odot / G$, the electronvolt is $e$ in joules, the year is the Julian year. Since $G$ is known to 22 parts in a
million, densities in kilograms or grams hold as many true digits as that; densities in solar masses use $(GM)_\odot$
and are free of it. Through $\Omega_\gamma$ the choice of $G$ reaches the other columns too, far below what the
parameters warrant.`,
  },
  {
    id: 'milestones',
    title: 'Milestones',
    body: String.raw`
Single epochs and values of today, one list for each parameter set.

- *Equality of matter and radiation* is defined as papers on the background radiation define it: baryons and cold dark
  matter on one side, photons and all of $N_{\mathrm{eff}}$ as if massless on the other. Counting a massive neutrino
  as matter would move it by about half a per cent.
- *Onset of acceleration*: the first time at which [$q$](q) falls through zero. It may lie in the future, at $z < 0$.
- *Equality of matter and dark energy*: here massive neutrinos count as matter.
- *Largest angular diameter distance*: where $\mathrm{d}D_A/\mathrm{d}z = 0$ first, going back in time.
- *Fate*: what the equation of state implies if it stays as written for ever. That is an extrapolation, not a
  forecast. A recollapsing model is symmetric in time, so it ends at twice the age of its largest expansion.

A milestone that does not exist for a set is blank.`,
  },
];

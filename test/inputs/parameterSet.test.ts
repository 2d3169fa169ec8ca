import { describe, expect, test } from 'vitest';
import { contentOf, GOOD, report, reportWith } from './goodContent.ts';

const flat = (from: string, to: string) => reportWith('parameter-sets/flat.yaml', from, to);
const plain = (from: string, to: string) => reportWith('parameter-sets/plain.yaml', from, to);

describe('keys', () => {
  test('an unknown key with a near one', () =>
    expect(flat('title:', 'titel:')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:1:1  title is missing  expected a title, as the paper labels the set
      parameter-sets/flat.yaml:1:1  unknown key titel  did you mean title?
      2 problems in 1 file"
    `));
  test('an unknown key far from all', () =>
    expect(flat('note:', 'zzz:')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:17:1  unknown key zzz  expected one of title, kind, source, parameters, correlations, note
    1 problem in 1 file"
  `));
  test.each([
    ['Omega_m', 'omega_m'],
    ['H0', 'h0'],
    ['H0', 'H_0'],
    ['Omega_k', 'Omega_K'],
    ['Omega_k', 'OmegaK'],
    ['w0', 'w'],
    ['wa', 'w_a'],
    ['T_CMB', 'TCMB'],
    ['T_CMB', 'T_cbm'],
    ['N_eff', 'Neff'],
    ['m_nu', 'masses'],
  ])('%s for %s', (meant, written) => {
    expect(flat(`  ${meant}:`, `  ${written}:`)).toContain(`unknown key parameters.${written}  did you mean ${meant}?`);
  });
  test('one slip in the name of the matter density is one problem', () =>
    expect(flat('Omega_m:', 'omega_m:')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:9:3  unknown key parameters.omega_m  did you mean Omega_m?
      1 problem in 1 file"
    `));
  test('Omega_Lambda is Omega_DE, Omega_b is not omega_b', () =>
    expect(flat('  Omega_k: 0', '  Omega_Lambda: 0.7\n  Omega_b: 0.05')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:10:3  unknown key parameters.Omega_Lambda  did you mean Omega_DE?
      parameter-sets/flat.yaml:11:3  unknown key parameters.Omega_b  did you mean omega_b (Omega_b h^2)?
      2 problems in 1 file"
    `));
  test('uncertainty for u', () =>
    expect(flat('u: 0.54', 'sigma: 0.54')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:8:23  unknown key parameters.H0.sigma  did you mean u?
    parameter-sets/flat.yaml:16:17  correlation of H0, which has no uncertainty  expected parameters.H0 as {value: ..., u: ...}
    2 problems in 1 file"
  `));
  test('missing keys', () =>
    expect(flat('  w0: -1\n  wa: 0.0\n', '')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:8:3  parameters.w0 is missing  expected the equation of state today, -1 for a cosmological constant
      parameter-sets/flat.yaml:8:3  parameters.wa is missing  expected the change of the equation of state, 0 for none
      2 problems in 1 file"
    `));
  test('no parameters at all', () =>
    expect(
      flat(GOOD['parameter-sets/flat.yaml']?.match(/ {2}H0[\s\S]*6e-2\]\n/)?.[0] ?? '-', ''),
    ).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:7:1  parameters is empty  expected keys with values: H0, Omega_m, omega_b, omega_c, Omega_k, Omega_DE, w0, wa, T_CMB, N_eff, m_nu
      parameter-sets/flat.yaml:8:17  correlation of H0, which has no uncertainty  expected parameters.H0 as {value: ..., u: ...}
      parameter-sets/flat.yaml:8:21  correlation of Omega_m, which has no uncertainty  expected parameters.Omega_m as {value: ..., u: ...}
      3 problems in 1 file"
    `));
  test('a kind that is none', () =>
    expect(flat('published', 'publish')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:2:7  kind is the text "publish"  did you mean published?
    1 problem in 1 file"
  `));
  test('a published set without DOI and place', () =>
    expect(flat('  doi: 10.1234/abc.5\n  where: Table 1\n', '')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:4:3  source.doi is missing  expected the DOI of the paper, as kind is published
      parameter-sets/flat.yaml:4:3  source.where is missing  expected table and column of the paper, as kind is published
      2 problems in 1 file"
    `));
  test('a DOI with its address', () =>
    expect(flat('10.1234', 'https://doi.org/10.1234')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:5:8  source.doi is the text "https://doi.org/10.1234/abc.5"  expected a DOI such as 10.1051/0004-6361/201833910, without address before it
    1 problem in 1 file"
  `));
  test('a title of digits', () =>
    expect(flat('Flat example', '2018')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:1:8  title is 2018  expected text, so in quotes: "2018"
    1 problem in 1 file"
  `));
  test('a blank title', () =>
    expect(flat('Flat example', '" "')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:1:8  title is the text " "  expected a title, as the paper labels the set
    1 problem in 1 file"
  `));
  test('a source that is text', () =>
    expect(plain('{citation: Convention}', 'Convention')).toMatchInlineSnapshot(`
    "parameter-sets/plain.yaml:3:9  source is the text "Convention"  expected keys with values: citation, doi, where
    1 problem in 1 file"
  `));
});

describe('values', () => {
  test('a Hubble constant that is none', () => {
    const wrong = ['67,36', '"67.36"', '67.36 km/s/Mpc', 'about 67', '', '~', 'true', '[67.36]', '.inf', '.nan', '0x43']
      .concat(['1e999', '-67.36', '0', '0.6736', '6736'])
      .map((value) => plain('H0: 70', `H0: ${value}`).split('\n', 1)[0]);
    expect(wrong.join('\n')).toMatchInlineSnapshot(`
      "parameter-sets/plain.yaml:4:21  unknown key parameters.36  expected a key; a decimal has a point, as a comma ends it
      parameter-sets/plain.yaml:4:18  parameters.H0 is the text "67.36"  expected a number in km/s/Mpc, without quotes: write 67.36
      parameter-sets/plain.yaml:4:18  parameters.H0 is the text "67.36 km/s/Mpc"  expected a number in km/s/Mpc, without further characters: write 67.36
      parameter-sets/plain.yaml:4:18  parameters.H0 is the text "about 67"  expected a number in km/s/Mpc
      parameter-sets/plain.yaml:4:14  parameters.H0 is empty  expected a number in km/s/Mpc
      parameter-sets/plain.yaml:4:18  parameters.H0 is empty  expected a number in km/s/Mpc
      parameter-sets/plain.yaml:4:18  parameters.H0 is true  expected a number in km/s/Mpc
      parameter-sets/plain.yaml:4:18  parameters.H0 is a list of 1  expected a number in km/s/Mpc
      parameter-sets/plain.yaml:4:18  parameters.H0 is .inf  expected a number in km/s/Mpc, finite and in decimal digits
      parameter-sets/plain.yaml:4:18  parameters.H0 is .nan  expected a number in km/s/Mpc, finite and in decimal digits
      parameter-sets/plain.yaml:4:18  parameters.H0 is 0x43  expected a number in km/s/Mpc, finite and in decimal digits
      parameter-sets/plain.yaml:4:18  parameters.H0 is 1e999  expected a number in km/s/Mpc, finite and in decimal digits
      parameter-sets/plain.yaml:4:18  parameters.H0 is -67.36  expected a number in km/s/Mpc, at least 1 and at most 1000
      parameter-sets/plain.yaml:4:18  parameters.H0 is 0  expected a number in km/s/Mpc, at least 1 and at most 1000
      parameter-sets/plain.yaml:4:18  parameters.H0 is 0.6736  expected a number in km/s/Mpc, at least 1 and at most 1000; this looks like h = H0/100: write 67.36
      parameter-sets/plain.yaml:4:18  parameters.H0 is 6736  expected a number in km/s/Mpc, at least 1 and at most 1000"
    `);
  });

  test('a matter density in per cent', () =>
    expect(flat('value: 0.3153', 'value: 31.53')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:9:20  parameters.Omega_m.value is 31.53  expected the matter density over the critical density, at least 0 and at most 10; this looks like per cent: write 0.3153
    1 problem in 1 file"
  `));
  test('a matter density with a per cent sign', () =>
    expect(flat('0.3153', '31.53 %')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:9:20  parameters.Omega_m.value is the text "31.53 %"  expected the matter density over the critical density, no percentage: write 0.3153
    1 problem in 1 file"
  `));
  test('a negative matter density', () =>
    expect(flat('value: 0.3153', 'value: -0.3')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:9:20  parameters.Omega_m.value is -0.3  expected the matter density over the critical density, at least 0 and at most 10
    1 problem in 1 file"
  `));
  test('omega_b below zero', () =>
    expect(plain('omega_b: 0.02', 'omega_b: -0.02')).toMatchInlineSnapshot(`
    "parameter-sets/plain.yaml:4:31  parameters.omega_b is -0.02  expected the baryon density Omega_b h^2, at least 0 and at most 1
    1 problem in 1 file"
  `));
  test('a temperature in mK', () =>
    expect(flat('2.7255', '2725.5')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:13:10  parameters.T_CMB is 2725.5  expected a temperature in K, 0 to neglect radiation, at least 0 and at most 100; this looks like mK: write 2.7255
    1 problem in 1 file"
  `));
  test('a temperature in Celsius', () =>
    expect(flat('2.7255', '-270.4')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:13:10  parameters.T_CMB is -270.4  expected a temperature in K, 0 to neglect radiation, at least 0 and at most 100
    1 problem in 1 file"
  `));
  test('N_eff below zero', () =>
    expect(flat('3.046', '-3.046')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:14:10  parameters.N_eff is -3.046  expected the effective number of neutrino species, at least 0 and at most 100
    1 problem in 1 file"
  `));
  test('a negative mass', () =>
    expect(flat('6e-2', '-6e-2')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:15:16  parameters.m_nu entry 3 is -6e-2  expected a neutrino mass in eV, at least 0 and at most 10
    1 problem in 1 file"
  `));
  test('a mass in meV', () =>
    expect(flat('6e-2', '60')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:15:16  parameters.m_nu entry 3 is 60  expected a neutrino mass in eV, at least 0 and at most 10; this looks like meV: write 0.060
    1 problem in 1 file"
  `));
  test('one mass without a list', () =>
    expect(flat('[0, 0, 6e-2]', '0.06')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:15:9  parameters.m_nu is 0.06  expected a list of neutrino masses in eV: [0, 0, 0.06], or [] if all are massless
    1 problem in 1 file"
  `));
  test('no uncertainty is 0', () =>
    expect(flat('u: 0.54', 'u: 0')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:8:26  parameters.H0.u is 0  expected a standard uncertainty, greater than 0
    1 problem in 1 file"
  `));
  test('a value within a value', () =>
    expect(flat('value: 67.360', 'value: {value: 67.36}')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:8:15  parameters.H0.value is a mapping of keys  expected a number in km/s/Mpc
    1 problem in 1 file"
  `));
  test('an uncertainty alone', () =>
    expect(flat('value: 67.360, ', '')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:8:7  parameters.H0.value is missing  expected a number in km/s/Mpc
    1 problem in 1 file"
  `));
});

describe('values that do not go together', () => {
  test('matter twice', () =>
    expect(plain('wa: 0', 'wa: 0, Omega_m: 0.3')).toMatchInlineSnapshot(`
    "parameter-sets/plain.yaml:4:76  matter is given twice: Omega_m and omega_b, omega_c  expected either Omega_m, or omega_b and omega_c
    1 problem in 1 file"
  `));
  test('matter twice, one of the two physical densities', () =>
    expect(plain('omega_b: 0.02', 'Omega_m: 0.3')).toMatchInlineSnapshot(`
      "parameter-sets/plain.yaml:4:31  matter is given twice: Omega_m and omega_c  expected either Omega_m, or omega_b and omega_c
      1 problem in 1 file"
    `));
  test('half the matter', () =>
    expect(plain('omega_b: 0.02, ', '')).toMatchInlineSnapshot(`
    "parameter-sets/plain.yaml:4:13  parameters.omega_b is missing  expected omega_b and omega_c together, or Omega_m instead
    1 problem in 1 file"
  `));
  test('no matter', () =>
    expect(plain('omega_b: 0.02, omega_c: 0.12, ', '')).toMatchInlineSnapshot(`
    "parameter-sets/plain.yaml:4:13  the matter density is missing  expected Omega_m, or omega_b and omega_c
    1 problem in 1 file"
  `));
  test('curvature and dark energy', () =>
    expect(flat('Omega_k: 0', 'Omega_k: 0\n  Omega_DE: 0.7')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:11:13  both Omega_k and Omega_DE are given  expected one of them: the other follows from the sum being 1
      1 problem in 1 file"
    `));
  test('masses without radiation', () =>
    expect(flat('T_CMB: 2.7255', 'T_CMB: 0')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:13:10  T_CMB is 0, but m_nu has a mass  expected T_CMB greater than 0, or no masses: m_nu: []
    1 problem in 1 file"
  `));
  test('masses without neutrinos', () =>
    expect(flat('N_eff: 3.046', 'N_eff: {value: 0.0, u: 0.2}')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:14:10  N_eff is 0, but m_nu has a mass  expected N_eff greater than 0, or no masses: m_nu: []
      1 problem in 1 file"
    `));
  test('masses of zero need neither', () => expect(plain('m_nu: []', 'm_nu: [0, 0.00]')).toBe('no problems'));
});

describe('correlations', () => {
  const correlations = (text: string) => flat('[[H0, Omega_m, -0.99]]', text);

  test('a parameter without uncertainty', () =>
    expect(correlations('[[H0, w0, 0.5]]')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:16:21  correlation of w0, which has no uncertainty  expected parameters.w0 as {value: ..., u: ...}
    1 problem in 1 file"
  `));
  test('an unknown parameter', () =>
    expect(correlations('[[H0, omega_m, 0.5]]')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:16:21  correlations entry 1 entry 2 is the text "omega_m"  did you mean Omega_m?
    1 problem in 1 file"
  `));
  test('neutrino masses', () =>
    expect(correlations('[[H0, m_nu, 0.5]]')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:16:21  correlations entry 1 entry 2 is the text "m_nu"  expected one of H0, Omega_m, omega_b, omega_c, Omega_k, Omega_DE, w0, wa, T_CMB, N_eff
    1 problem in 1 file"
  `));
  test('a parameter with itself', () =>
    expect(correlations('[[H0, H0, 1]]')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:16:16  H0 is correlated with itself  expected two different parameters
    1 problem in 1 file"
  `));
  test('a coefficient in per cent', () =>
    expect(correlations('[[H0, Omega_m, -97.5]]')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:16:30  correlations entry 1 entry 3 is -97.5  expected a correlation coefficient, at least -1 and at most 1
      1 problem in 1 file"
    `));
  test('a coefficient beyond 1', () =>
    expect(correlations('[[H0, Omega_m, 1.0001]]')).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:16:30  correlations entry 1 entry 3 is 1.0001  expected a correlation coefficient, at least -1 and at most 1
      1 problem in 1 file"
    `));
  test('a pair twice', () =>
    expect(correlations('[[H0, Omega_m, 0.5], [Omega_m, H0, 0.5]]')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:16:36  Omega_m and H0 are correlated twice  expected each pair once
    1 problem in 1 file"
  `));
  test('no coefficient', () =>
    expect(correlations('[[H0, Omega_m]]')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:16:16  correlations entry 1 is a list of 2  expected two parameters and a coefficient: [H0, Omega_m, -0.99]
    1 problem in 1 file"
  `));
  test('a list too few', () =>
    expect(correlations('[H0, Omega_m, -0.99]')).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:16:16  correlations entry 1 is the text "H0"  expected two parameters and a coefficient: [H0, Omega_m, -0.99]
    parameter-sets/flat.yaml:16:20  correlations entry 2 is the text "Omega_m"  expected two parameters and a coefficient: [H0, Omega_m, -0.99]
    parameter-sets/flat.yaml:16:29  correlations entry 3 is -0.99  expected two parameters and a coefficient: [H0, Omega_m, -0.99]
    3 problems in 1 file"
  `));
  test('exactly 1 is allowed', () => expect(correlations('[[H0, Omega_m, -1]]')).toBe('no problems'));

  test('a matrix that no parameters can have', () => {
    const matrix = '[[H0, Omega_m, -0.9], [H0, N_eff, 0.9], [Omega_m, N_eff, 0.9]]';
    const changed = (GOOD['parameter-sets/flat.yaml'] ?? '')
      .replace('N_eff: 3.046', 'N_eff: {value: 3.046, u: 0.1}')
      .replace('[[H0, Omega_m, -0.99]]', matrix);
    expect(report({ 'parameter-sets/flat.yaml': changed })).toMatchInlineSnapshot(`
      "parameter-sets/flat.yaml:16:15  the correlation matrix of H0, Omega_m, N_eff has the eigenvalue -0.800  expected no negative eigenvalue: check the signs, or give more digits
      1 problem in 1 file"
    `);
  });
});

test('correlations and note may be missing', () => {
  const bare = (GOOD['parameter-sets/flat.yaml'] ?? '').replace(/correlations[\s\S]*$/, '');
  const [set] = contentOf({ 'parameter-sets/flat.yaml': bare }).parameterSets;
  expect(set?.correlations).toEqual([]);
  expect(set?.note).toBeUndefined();
});

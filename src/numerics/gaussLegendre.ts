/**
 * The 16-point Gauss-Legendre rule on [-1, 1]: positive nodes and their weights, written with 22 digits.
 *
 * Source: Abramowitz & Stegun (1964), table 25.4; test/reference/gaussLegendre16.json holds 30 digits.
 */
export const NODES: readonly number[] = [
  '0.09501250983763744018532',
  '0.2816035507792589132305',
  '0.4580167776572273863424',
  '0.6178762444026437484467',
  '0.7554044083550030338951',
  '0.8656312023878317438805',
  '0.944575023073232576078',
  '0.9894009349916499325962',
].map(Number);
export const WEIGHTS: readonly number[] = [
  '0.1894506104550684962854',
  '0.1826034150449235888668',
  '0.1691565193950025381893',
  '0.1495959888165767320815',
  '0.1246289712555338720525',
  '0.09515851168249278480993',
  '0.06225352393864789286284',
  '0.02715245941175409485178',
].map(Number);

/** Number of nodes of the rule, both signs counted. */
export const RULE_SIZE = 16;

/** One section of the methods page as it is written. */
export interface MethodText {
  /** Anchor on the page. */
  readonly id: string;
  readonly title: string;
  /**
   * Markdown with formulas, ASCII. `[text](D_L_Mpc)` leads to a quantity, `[text](#blanks)` to a section,
   * `[text](checked-against)` to the page of published values, `[text](interpolation)` to that between the rows.
   */
  readonly body: string;
  /** What the program lists below the text. */
  readonly lists?: 'constants';
}

/**
 * A running sum whose rounding errors are carried along and added at the end.
 *
 * Source: Neumaier (1974), Z. Angew. Math. Mech. 54, 39.
 * Accuracy: relative error about one unit roundoff plus n^2 squares of it, for terms of one sign.
 */
export class CompensatedSum {
  #sum: number;
  #lost = 0;

  constructor(start = 0) {
    this.#sum = start;
  }

  add(term: number): void {
    const sum = this.#sum + term;
    this.#lost += Math.abs(this.#sum) >= Math.abs(term) ? this.#sum - sum + term : term - sum + this.#sum;
    this.#sum = sum;
  }

  get value(): number {
    return this.#sum + this.#lost;
  }
}

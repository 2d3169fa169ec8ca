/** Something whose uncertainty the law of propagation misses: a symbol, and where. Both HTML. */
export interface Missed {
  readonly symbol: string;
  readonly where: string;
}

/** The caution about nonlinearity, a sentence of HTML; those missed at the same redshifts are named together. */
export function nonlinearCaution(missed: readonly Missed[]): string {
  const places = [...new Set(missed.map(({ where }) => where))];
  const parts = places.map((where) => {
    const symbols = missed.filter((one) => one.where === where).map(({ symbol }) => symbol);
    return `${symbols.join(', ')}${where && ` (${where})`}`;
  });
  return (
    'Uncertainties follow from the slopes at the parameters as given. For the full spread of the parameters they are ' +
    `off by more than 10 per cent in ${parts.join('; ')}.`
  );
}

/** The question has no answer: an argument lies outside the domain of the function. */
export class DomainError extends RangeError {
  override readonly name = 'DomainError';
}

/** The method did not get there: an integral or a root was not found to the accuracy that the method promises. */
export class ConvergenceError extends Error {
  override readonly name = 'ConvergenceError';
}

/**
 * Version of the physics and of the rounding. It goes up with every change that alters a digit of any table for the
 * same parameter set, grid and number of digits.
 */
export const METHOD_VERSION = '1';

export { PAGE_DIGITS } from '../tables/pageDigits.ts';

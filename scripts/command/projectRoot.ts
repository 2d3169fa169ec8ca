import { resolve } from 'node:path';

/** The folder of package.json. */
export const projectRoot = resolve(import.meta.dirname, '../..');

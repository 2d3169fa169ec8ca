/**
 * `node scripts/node.mjs COMMAND [...]` runs scripts/COMMAND.ts in the project folder, after making sure that this
 * Node.js can. No command lets Astro report usage or ask for newer versions.
 */
import './requireNode.mjs';
import { fileURLToPath } from 'node:url';

process.env.INIT_CWD = process.env.INIT_CWD || process.cwd(); // where the command was typed; npm says so itself
process.chdir(fileURLToPath(new URL('..', import.meta.url)));
process.env.ASTRO_TELEMETRY_DISABLED = '1';
process.env.ASTRO_DISABLE_UPDATE_CHECK = 'true';
import(`./${process.argv[2]}.ts`);

/**
 * `node scripts/node.mjs COMMAND [...]` runs scripts/COMMAND.ts, after making sure that this Node.js can.
 * No command lets Astro report usage or ask for newer versions.
 */
import './requireNode.mjs';

process.env.ASTRO_TELEMETRY_DISABLED = '1';
process.env.ASTRO_DISABLE_UPDATE_CHECK = 'true';
import(`./${process.argv[2]}.ts`);

/**
 * `node scripts/node.mjs COMMAND [...]` runs scripts/COMMAND.ts, after making sure that this Node.js can.
 * Astro's telemetry is off in every command.
 */
import './requireNode.mjs';

process.env.ASTRO_TELEMETRY_DISABLED = '1';
import('./' + process.argv[2] + '.ts');

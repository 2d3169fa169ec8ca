import { runTests } from './command/runTests.ts';

const help = `npm test [-- PATH ...]

Runs all tests but the slow ones; with PATHs, those whose file name contains one of them.
Installs Chromium and a Java runtime on Debian when they are missing.`;

const args = process.argv.slice(3);
if (args.includes('--help')) console.log(help);
else await runTests(['unit', 'site', 'commands'], args);

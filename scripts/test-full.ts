import { runTests } from './command/runTests.ts';

const help = `npm run test:full [-- PATH ...]

Runs the slow, exhaustive tests, which "npm test" leaves out; with PATHs, those whose file name contains one of them.`;

const args = process.argv.slice(3);
if (args.includes('--help')) console.log(help);
else await runTests(['full'], args);

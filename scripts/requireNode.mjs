/**
 * Stops with one clear line when this Node.js is too old. Plain, old syntax on purpose: an old Node.js must be able to
 * read this file in order to refuse. 22.18 is the first release that runs TypeScript files as they are.
 */
var OLDEST = [22, 18];
var have = process.versions.node.split('.').map(Number);
var newEnough = have[0] > OLDEST[0] || (have[0] === OLDEST[0] && have[1] >= OLDEST[1]);

if (!newEnough || !process.features.typescript) {
  console.error(
    'Redbound needs Node.js ' +
      OLDEST.join('.') +
      ' or newer (24 is best), but this is Node.js ' +
      process.versions.node +
      '. Start it with "npm run ..." after "npm ci", which brings Node.js 24 on Linux; elsewhere install Node.js 24.',
  );
  process.exit(1);
}

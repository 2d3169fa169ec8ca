import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';

const CHROMIUM_NAMES = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'];
const CHROMIUM_APPLICATIONS = [
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
];

/** The browser of the site's tests: what CHROMIUM names, otherwise the first one installed. */
export function findChromium(): string | undefined {
  const named = process.env.CHROMIUM;
  if (named) return existsSync(named) ? named : undefined;
  return onPath(CHROMIUM_NAMES) ?? CHROMIUM_APPLICATIONS.find((path) => existsSync(path));
}

/** The Java runtime that the HTML validator runs in. */
export function findJava(): string | undefined {
  return onPath(['java']);
}

function onPath(names: readonly string[]): string | undefined {
  const folders = (process.env.PATH ?? '').split(delimiter).filter((folder) => folder !== '');
  return names.flatMap((name) => folders.map((folder) => join(folder, name))).find((path) => existsSync(path));
}

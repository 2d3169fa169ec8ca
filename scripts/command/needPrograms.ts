import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { findChromium, findJava } from './programs.ts';

const MISSING = 'The tests need Chromium (or Chrome; CHROMIUM=/path names another) and a Java runtime: install them.';

/**
 * Makes sure that the programs which the tests start are there. On Debian, missing ones are installed by apt.
 * @returns whether they are there; if not, one line has said what to install.
 */
export function needPrograms(): boolean {
  const packages = missingPackages();
  if (packages.length === 0) return true;
  if (isDebian()) aptInstall(packages);
  if (missingPackages().length === 0) return true;
  console.error(MISSING);
  return false;
}

function missingPackages(): readonly string[] {
  return [...(findChromium() ? [] : ['chromium']), ...(findJava() ? [] : ['default-jre-headless'])];
}

function isDebian(): boolean {
  try {
    return /^ID=debian$/m.test(readFileSync('/etc/os-release', 'utf8'));
  } catch {
    return false; // no such file: not a Linux system
  }
}

/** Without the rights of root, apt says so itself. */
function aptInstall(packages: readonly string[]): void {
  console.log(`Installing ${packages.join(' and ')} for the tests`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const sudo = process.getuid?.() === 0 ? [] : ['sudo', '-n'];
  for (const args of [['update'], ['install', '-y', '--no-install-recommends', ...packages]]) {
    const [program = 'apt-get', ...rest] = [...sudo, 'apt-get', ...args];
    spawnSync(program, rest, { env, stdio: ['ignore', 'ignore', 'inherit'] });
  }
}

import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium } from 'playwright-core';
import type { TestProject } from 'vitest/node';
import { serveSite } from '../../src/site/serveSite.ts';
import { buildForTests } from '../support/buildForTests.ts';
import { chromiumPath } from '../support/chromiumPath.ts';

/** What the browser tests are given. */
export interface SiteUnderTest {
  /** Where the served site starts, with its base path. */
  readonly address: string;
  /** Path of the site below its origin. */
  readonly base: string;
  /** The folder that is served. */
  readonly dist: string;
  /** The content that it was built from. */
  readonly content: string;
  /** Where to reach the one Chromium of the run. */
  readonly browser: string;
}

declare module 'vitest' {
  export interface ProvidedContext {
    site: SiteUnderTest;
  }
}

/** A sub-path of two steps, so that an address that forgets the base shows. */
const BASE = '/reference/tables/';

const SWITCHES = [
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-sync',
];

/** Builds the site once below a sub-path, serves it and starts one Chromium for all test files. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const executablePath = chromiumPath();
  const folder = mkdtempSync(join(tmpdir(), 'redbound-site-'));
  const { content, dist } = buildForTests(folder, BASE);
  const served = await serveSite(dist, BASE, 0);
  const browser = await chromium.launchServer({ executablePath, args: SWITCHES, chromiumSandbox: false });
  project.provide('site', { address: served.address, base: BASE, dist, content, browser: browser.wsEndpoint() });
  return async () => {
    await browser.close();
    await served.close();
    rmSync(folder, { recursive: true });
  };
}

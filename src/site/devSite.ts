import { readdirSync } from 'node:fs';
import { join, resolve, sep } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import type { AstroIntegration } from 'astro';
import type { ViteDevServer } from 'vite';
import { leavePress } from './leavePress.ts';
import type { Press } from './press.ts';

/** The pages under Astro's development server. */
export interface DevSite {
  readonly address: string;
  /**
   * Calls `changed` after changes of files below `folder`: one call at a time, the last change always included.
   * Resolves when all of it is watched.
   */
  watch(folder: string, changed: () => Promise<void>): Promise<void>;
  /** Shows another press; open pages reload. */
  show(press: Press): void;
  /** Lays a message over the open pages, until the next `show`. */
  complain(message: string): void;
  close(): Promise<void>;
}

/** Starts the development server for what was pressed. `root` is the folder of the Astro configuration. */
export async function devSite(press: Press, root: string, port: number): Promise<DevSite> {
  leavePress(press);
  const { dev } = await import('astro'); // it takes a second to load, which help and refusals need not wait for
  let server: ViteDevServer | undefined;
  const keepServer: AstroIntegration = {
    name: 'redbound-dev',
    hooks: {
      'astro:server:setup': (setup) => {
        server = setup.server;
      },
    },
  };
  const running = await dev({
    root,
    server: { port },
    logLevel: 'warn',
    devToolbar: { enabled: false },
    integrations: [keepServer],
  });
  return {
    address: `http://localhost:${running.address.port}${press.content.site.base}`,
    watch: (folder, changed) => watchFolder(running.watcher, resolve(folder), changed),
    show: (next) => {
      leavePress(next);
      if (server) reload(server);
    },
    complain: (message) => server?.ws.send({ type: 'error', err: { message, stack: '' } }),
    close: () => running.stop(),
  };
}

/** Editors write a file in several steps; wait until they are done, ms. */
const QUIET_TIME = 150;
/** How often, and how many times, one looks whether all folders are watched. */
const LOOK_EVERY = 50;
const LOOKS = 100;

async function watchFolder(
  watcher: ViteDevServer['watcher'],
  folder: string,
  changed: () => Promise<void>,
): Promise<void> {
  let timer: NodeJS.Timeout | undefined;
  let running: Promise<void> = Promise.resolve();
  watcher.on('all', (_, path) => {
    if (!path.startsWith(`${folder}${sep}`)) return;
    clearTimeout(timer);
    timer = setTimeout(() => {
      running = running.then(changed);
    }, QUIET_TIME);
  });
  watcher.add(folder);
  // The watcher does not say when a folder added to it is scanned, and misses changes until then.
  for (let look = 0; look < LOOKS && !isWatched(watcher, folder); look += 1) await sleep(LOOK_EVERY);
}

function isWatched(watcher: ViteDevServer['watcher'], folder: string): boolean {
  const below = readdirSync(folder, { recursive: true, withFileTypes: true }).filter((entry) => entry.isDirectory());
  const watched = watcher.getWatched();
  return [folder, ...below.map(({ parentPath, name }) => join(parentPath, name))].every((path) => path in watched);
}

/** Modules that keep what they made of the old press are loaded anew. */
function reload(server: ViteDevServer): void {
  for (const environment of Object.values(server.environments)) environment.moduleGraph.invalidateAll();
  server.ws.send({ type: 'full-reload' });
}

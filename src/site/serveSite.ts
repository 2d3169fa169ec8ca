import { readFileSync } from 'node:fs';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import { join } from 'node:path';
import sirv from 'sirv';

/** A site being served on this machine. */
export interface ServedSite {
  /** Where the site starts, with its base path. */
  readonly address: string;
  close(): Promise<void>;
}

/** How many ports are tried, counting up. */
const PORTS_TRIED = 100;

/**
 * Serves a built folder below `base` to this machine alone, on `firstPort` or the next free one; 0 lets the system
 * choose. Outside the base path `/` leads to the site and all else is not found.
 */
export async function serveSite(folder: string, base: string, firstPort: number): Promise<ServedSite> {
  // dev: files are looked up at each request, so a new build shows at once.
  const files = sirv(folder, { dev: true, etag: true });
  const server = createServer((request, response) => {
    const path = request.url ?? '/';
    if (path === '/' && base !== '/') return redirect(response, base);
    if (`${path}/` === base) return redirect(response, base);
    if (!path.startsWith(base)) return notFound(folder, response);
    request.url = `/${path.slice(base.length)}`;
    files(request, response, () => notFound(folder, response));
  });
  const port = await listen(server, firstPort);
  return { address: `http://localhost:${port}${base}`, close: () => close(server) };
}

function redirect(response: ServerResponse<IncomingMessage>, location: string): void {
  response.writeHead(302, { location }).end();
}

function notFound(folder: string, response: ServerResponse<IncomingMessage>): void {
  response.writeHead(404, { 'content-type': 'text/html; charset=utf-8' }).end(readFileSync(join(folder, '404.html')));
}

async function listen(server: Server, firstPort: number): Promise<number> {
  for (let port = firstPort; ; port += 1) {
    try {
      return await listenOn(server, port);
    } catch (error) {
      const taken = (error as NodeJS.ErrnoException).code === 'EADDRINUSE';
      if (!taken || port >= firstPort + PORTS_TRIED - 1) throw error;
    }
  }
}

function listenOn(server: Server, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, 'localhost', () => {
      server.off('error', reject);
      const bound = server.address();
      resolve(typeof bound === 'object' && bound !== null ? bound.port : port);
    });
  });
}

function close(server: Server): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve());
    server.closeAllConnections();
  });
}

import { type SpawnOptions, spawn, spawnSync } from 'node:child_process';
import { join, resolve } from 'node:path';

export const projectRoot = resolve(import.meta.dirname, '../..');

/** How a command ended. */
export interface Ended {
  readonly code: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

/** Arguments and environment as `npm run NAME -- ARGS` has them, but without what a test runner adds. */
function invocation(name: string, args: readonly string[]): [string, string[], SpawnOptions] {
  const { NODE_ENV, VITEST, INIT_CWD, ...env } = process.env;
  return [process.execPath, [join(projectRoot, 'scripts/node.mjs'), name, ...args], { cwd: projectRoot, env }];
}

/** Runs a command to its end. */
export function runScript(name: string, args: readonly string[]): Ended {
  const [program, all, options] = invocation(name, args);
  const { status, stdout, stderr } = spawnSync(program, all, { ...options, encoding: 'utf8' });
  return { code: status, stdout, stderr };
}

/** A command that is still running. */
export interface Running {
  /** Resolves when what it printed so far matches. Rejects when it ends first. */
  printed(pattern: RegExp): Promise<RegExpMatchArray>;
  stop(signal: NodeJS.Signals): void;
  readonly ended: Promise<Ended>;
}

/** Starts a command that is to be watched or stopped. */
export function startScript(name: string, args: readonly string[]): Running {
  const [program, all, options] = invocation(name, args);
  const child = spawn(program, all, { ...options, stdio: ['ignore', 'pipe', 'pipe'] });
  let stdout = '';
  let stderr = '';
  child.stdout?.setEncoding('utf8').on('data', (text: string) => {
    stdout += text;
  });
  child.stderr?.setEncoding('utf8').on('data', (text: string) => {
    stderr += text;
  });
  const ended = new Promise<Ended>((done) => {
    child.on('close', (code) => done({ code, stdout, stderr }));
  });
  return {
    ended,
    stop: (signal) => child.kill(signal),
    printed: (pattern) =>
      new Promise((found, failed) => {
        const look = () => {
          const match = `${stdout}\n${stderr}`.match(pattern);
          if (match) found(match);
        };
        child.stdout?.on('data', look);
        child.stderr?.on('data', look);
        child.on('close', () => failed(new Error(`ended without printing ${pattern}:\n${stdout}\n${stderr}`)));
        look();
      }),
  };
}

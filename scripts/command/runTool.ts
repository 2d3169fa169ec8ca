import { spawn } from 'node:child_process';
import { resolve } from 'node:path';
import { projectRoot } from './projectRoot.ts';

/** Runs a program of node_modules, given by its file there, with this Node.js; resolves to its exit code. */
export function runTool(file: string, args: readonly string[]): Promise<number> {
  const program = resolve(projectRoot, 'node_modules', file);
  const child = spawn(process.execPath, [program, ...args], { cwd: projectRoot, stdio: 'inherit' });
  return new Promise((done, failed) => {
    child.on('error', failed);
    child.on('exit', (code) => done(code ?? 1));
  });
}

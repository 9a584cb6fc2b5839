import { execFile } from 'node:child_process';
import { join } from 'node:path';

/** How a program ended, and what it wrote. */
export interface Ended {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

/** Runs node in the checkout, with some variables of its own. */
export function runNode(args: readonly string[], env: Record<string, string> = {}): Promise<Ended> {
  const cwd = join(__dirname, '../../..');
  return new Promise((done) => {
    execFile(process.execPath, [...args], { cwd, env: { ...process.env, ...env } }, (error, out, err) => {
      const code = error ? (typeof error.code === 'number' ? error.code : 1) : 0;
      done({ code, out, err });
    });
  });
}

/** Runs a piece of module code in a node of its own: the scripts are modules, which a test's node cannot load. */
export function runModule(code: string, env: Record<string, string> = {}): Promise<Ended> {
  return runNode(['--input-type=module', '-e', code], env);
}

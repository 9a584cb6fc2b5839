import { execFileSync } from 'node:child_process';
import { resolve } from 'node:path';

const SCRIPT = resolve(__dirname, '../postgres/cluster.mjs');

export interface BenchServer {
  /** Of a user who may create databases and roles. */
  readonly adminUrl: string;
  /** Stops what was started for the bench. */
  stop(): void;
}

/** The PostgreSQL of DATABASE_URL, else the private test cluster, which is stopped again if it did not run before. */
export function benchServer(): BenchServer {
  const given = process.env['DATABASE_URL'];
  if (given) return { adminUrl: given, stop: () => undefined };
  const running = cluster('url', 'ignore');
  if (running) return { adminUrl: running, stop: () => undefined };
  const adminUrl = cluster('start', 'inherit');
  if (!adminUrl) throw new Error('The test cluster does not start.');
  return { adminUrl, stop: () => void cluster('stop', 'inherit') };
}

function cluster(verb: string, errors: 'ignore' | 'inherit'): string | undefined {
  try {
    const stdio: ('ignore' | 'inherit' | 'pipe')[] = ['ignore', 'pipe', errors];
    return execFileSync(process.execPath, [SCRIPT, verb, 'test'], { encoding: 'utf8', stdio }).trim();
  } catch {
    return undefined;
  }
}

// The kinds of test: how each is run and counted.
import { existsSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { build } from '../build/build.mjs';
import { targetNames } from '../build/targets.mjs';
import { ensureChromium } from '../start/chromium.mjs';
import { Told, runMeanwhile } from '../start/system.mjs';
import counts from './counts.cjs';

/**
 * @typedef {object} Session
 * @property {string} root the checkout
 * @property {string} folder for reports
 * @property {(line: string) => void} log
 * @property {AbortSignal} signal ends what runs
 * @property {() => Promise<string>} adminUrl of the test cluster, which is started when first asked for
 */

/** @type {Record<string, (session: Session) => Promise<import('./counts.cjs').Counts>>} */
export const runners = {
  // No cache: what a rule says of a file may depend on others (types, who may import whom).
  lint: (session) =>
    checks(session, [
      ['eslint', '.', '--max-warnings', '0'],
      ['prettier', '--check', '--log-level', 'warn', '.'],
    ]),
  types: (session) => checks(session, [['tsc', '--noEmit', '-p', 'tsconfig.json']]),
  unit: async (session) => jest(session, 'node', { SEAMWRIGHT_TEST_ADMIN_URL: await session.adminUrl() }),
  client: (session) => jest(session, 'client', {}),
  build: async ({ root, log, signal }) => {
    try {
      const { built, fresh } = await build({ root, only: targetNames, log, signal });
      return {
        passed: built.length + fresh.length,
        failed: 0,
        notes: fresh.length > 0 ? [`unchanged: ${fresh.join(', ')}`] : [],
      };
    } catch (error) {
      if (!(error instanceof Told)) throw error;
      log(error.message);
      return { passed: 0, failed: 1, notes: [] };
    }
  },
  browser: async (session) => {
    const env = {
      SEAMWRIGHT_TEST_ADMIN_URL: await session.adminUrl(),
      SEAMWRIGHT_CHROMIUM: ensureChromium(session.log),
      PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: '1',
    };
    const report = freshReport(session, 'browser');
    const args = ['test', '-c', 'apps/e2e/playwright.config.ts', '--forbid-only', '--reporter=list,json'];
    const code = await bin(session, 'playwright', args, { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: report });
    return counts.settle(readReport(report, counts.countPlaywright), code);
  },
};

/** Runs one of the packages' programs, shown in the terminal. */
async function bin({ root, signal }, program, args, env = {}) {
  const done = await runMeanwhile(join(root, 'node_modules/.bin', program), args, {
    cwd: root,
    env: { ...process.env, ...env },
    shown: true,
    signal,
  });
  if (signal.aborted) throw signal.reason;
  return done.code;
}

/** Programs that answer with their exit code alone: each counts as one test. */
async function checks(session, commands) {
  const result = { passed: 0, failed: 0, notes: [] };
  for (const [program, ...args] of commands) {
    const code = await bin(session, program, args);
    result[code === 0 ? 'passed' : 'failed'] += 1;
    if (code !== 0) result.notes.push(`${program} ended with code ${code}`);
  }
  return result;
}

async function jest(session, project, env) {
  const report = freshReport(session, project);
  const args = ['--ci', '--selectProjects', project, '-w', '2', '--json', `--outputFile=${report}`];
  const code = await bin(session, 'jest', args, env);
  return counts.settle(readReport(report, counts.countJest), code);
}

/** Where a report goes; an earlier one must not be taken for it. */
function freshReport({ folder }, name) {
  const path = join(folder, `${name}.json`);
  rmSync(path, { force: true });
  return path;
}

const readReport = (path, count) => (existsSync(path) ? count(JSON.parse(readFileSync(path, 'utf8'))) : undefined);

// The demo's database: ours in a private cluster, or one in the PostgreSQL that DATABASE_URL names.
import { join } from 'node:path';
import { ensureCluster, removeCluster } from '../postgres/cluster.mjs';
import { Told, lastLines, run } from './system.mjs';

/**
 * @typedef {object} Database
 * @property {string} ownerUrl migrates
 * @property {string} appUrl serves requests
 * @property {string} workerUrl runs jobs
 * @property {() => Promise<void>} stop stops what was started for it
 */

/**
 * The database, migrated to head.
 * @param {object} wish
 * @param {string} wish.root the checkout
 * @param {boolean} wish.reset makes it anew
 * @param {(line: string) => void} wish.log
 * @returns {Promise<Database>}
 */
export async function ensureDatabase({ root, reset, log }) {
  const given = process.env.DATABASE_URL;
  if (!given && reset) {
    log('removing the demo');
    await removeCluster({ name: 'demo', root, log });
  }
  const cluster = given ? undefined : await ensureCluster({ name: 'demo', root, log });
  const stop = async () => cluster?.stop();
  try {
    const adminUrl = given ?? cluster.adminUrl;
    if (given && reset) {
      log('removing the demo');
      await command(root, 'drop', adminUrl);
    }
    log('migrating the database');
    return { ...readUrls(await command(root, 'prepare', adminUrl)), stop };
  } catch (error) {
    await stop();
    throw error;
  }
}

/** Runs one of the database's commands and answers what it printed. */
async function command(root, verb, adminUrl) {
  const env = { ...process.env, DATABASE_URL: adminUrl, SEAMWRIGHT_DATABASE: databaseName() };
  const done = run(join(root, 'node_modules/.bin/tsx'), ['database/cli.ts', verb], { cwd: root, env });
  if (done.code === 0) return done.out;
  const advice = process.env.DATABASE_URL ? await adviceFor(root, adminUrl, env) : '';
  throw new Told(`The database could not be made ready (${verb}):\n${lastLines(done.err || done.out)}${advice}`);
}

const databaseName = () => process.env.SEAMWRIGHT_DATABASE || 'seamwright';

/** The addresses stand in the last line; libraries may have written before it. */
function readUrls(printed) {
  const urls = JSON.parse(printed.trim().split('\n').at(-1));
  for (const name of ['ownerUrl', 'appUrl', 'workerUrl']) {
    if (typeof urls[name] !== 'string') throw new Told(`database/cli.ts prepare did not print ${name}.`);
  }
  return urls;
}

/** What an administrator of a given PostgreSQL can do about a refusal: nothing is said when the rights were there. */
async function adviceFor(root, adminUrl, env) {
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: adminUrl, connectionTimeoutMillis: 5_000 });
  try {
    await client.connect();
    const found = await client.query(
      'select current_user as name, rolsuper or (rolcreatedb and rolcreaterole) as able from pg_roles where rolname = current_user',
    );
    const { name, able } = found.rows[0];
    if (able) return '';
    const sql = run(join(root, 'node_modules/.bin/tsx'), ['database/cli.ts', 'admin-sql'], { cwd: root, env });
    return (
      `\nThe user "${name}" of DATABASE_URL lacks the right to create databases and roles. An administrator may grant it:\n` +
      `  alter role "${name}" createdb createrole;\nor make by hand what is needed:\n${sql.out}`
    );
  } catch (error) {
    return `\nDATABASE_URL cannot be reached: ${error.message}`;
  } finally {
    await client.end().catch(() => undefined);
  }
}

// Where a cluster lies, and as whom it runs.
import { createHash } from 'node:crypto';
import { chmodSync, existsSync, mkdirSync, readFileSync, realpathSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { Told, isRoot, run } from '../start/system.mjs';

/** Our settings inside a data folder, included by its postgresql.conf and written anew at each start. */
export const settingsName = 'seamwright.conf';

/**
 * The folder for everything that a checkout keeps on this machine: clusters, secrets, logs.
 * SEAMWRIGHT_DATA_ROOT overrides it. PostgreSQL refuses to run as root and another user seldom reaches into root's
 * checkout, so that root's data lies under /var/lib, by checkout.
 * @param {string} root the checkout
 * @returns {string}
 */
export function dataRoot(root) {
  if (process.env.SEAMWRIGHT_DATA_ROOT) return resolve(process.env.SEAMWRIGHT_DATA_ROOT);
  if (!isRoot()) return join(root, '.data');
  const checkoutKey = createHash('sha256').update(realpathSync(root)).digest('hex').slice(0, 12);
  return join('/var/lib/seamwright', checkoutKey);
}

/**
 * @typedef {object} Place
 * @property {string} folder holds the data folder, the lock and the log
 * @property {string} data the data folder
 * @property {string} log the server's log
 * @property {string} lock taken while the cluster is made, started or stopped
 */

/**
 * @param {string} root the checkout
 * @param {string} name `demo` or `test`
 * @returns {Place}
 */
export function placeOf(root, name) {
  if (!/^[a-z]+$/.test(name))
    throw new Told(`A cluster's name is made of small letters, such as demo or test; got "${name}".`);
  const folder = join(dataRoot(root), name);
  return { folder, data: join(folder, 'data'), log: join(folder, 'log', 'postgres.log'), lock: join(folder, 'lock') };
}

/**
 * The user that runs PostgreSQL: ourselves, or Debian's `postgres` when we are root.
 * @returns {{uid: number, gid: number} | undefined} undefined for ourselves
 */
export function serverUser() {
  if (!isRoot()) return undefined;
  const uid = run('id', ['-u', 'postgres']);
  const gid = run('id', ['-g', 'postgres']);
  if (uid.code !== 0 || gid.code !== 0) {
    throw new Told(
      'PostgreSQL must not run as root, and there is no user "postgres". Please run:\n' +
        '  useradd --system --user-group --no-create-home postgres',
    );
  }
  return { uid: Number(uid.out), gid: Number(gid.out) };
}

/**
 * Runs one of PostgreSQL's programs as the server's user.
 * @param {string} program
 * @param {string[]} args
 */
export function runAsServer(program, args) {
  const kept = Object.entries(process.env).filter(([key]) => !key.startsWith('PG') && !key.startsWith('LC_'));
  const options = { cwd: '/', env: { ...Object.fromEntries(kept), LC_ALL: 'C.UTF-8' } };
  return isRoot() ? run('runuser', ['-u', 'postgres', '--', program, ...args], options) : run(program, args, options);
}

/**
 * Makes a missing folder, with those above it, so that the server's user may pass through but not list it.
 * A folder that exists keeps the rights it has.
 * @param {string} folder
 */
export function makePassage(folder) {
  if (existsSync(folder)) return;
  makePassage(dirname(folder));
  mkdirSync(folder);
  chmodSync(folder, isRoot() ? 0o711 : 0o700);
}

/**
 * A file's text, empty when there is none.
 * @param {string} path
 */
export function readText(path) {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return '';
  }
}

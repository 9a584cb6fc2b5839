// Makes a cluster's data folder, and tells a whole one from a half-made one.
import { randomBytes } from 'node:crypto';
import { chownSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Told, lastLines } from '../start/system.mjs';
import { readText, runAsServer, serverUser, settingsName } from './place.mjs';

/** The superuser of a private cluster. */
export const adminUser = 'seamwright_admin';

/** Written last into a new data folder: keeps the superuser's password, and says that the folder is whole. */
const markerName = 'seamwright.json';

/**
 * The superuser's password.
 * @param {string} data the data folder
 * @returns {string | undefined} undefined when the folder is missing or half-made
 */
export function passwordIn(data) {
  try {
    const { password } = JSON.parse(readFileSync(join(data, markerName), 'utf8'));
    return typeof password === 'string' ? password : undefined;
  } catch {
    return undefined;
  }
}

/** True when the data folder was made to its end. */
export const isWhole = (data) => passwordIn(data) !== undefined;

/**
 * Makes the data folder aside and moves it into place when it is whole.
 * @param {{bin: string, major: number}} programs
 * @param {import('./place.mjs').Place} place
 * @param {string} name
 * @param {(line: string) => void} log
 */
export function makeDataFolder({ bin, major }, place, name, log) {
  log(`making the ${name} cluster with PostgreSQL ${major}`);
  const user = serverUser();
  const aside = `${place.data}.new`;
  const passwordFile = join(place.folder, 'password.new');
  const password = randomBytes(24).toString('hex');
  for (const old of [place.data, aside, passwordFile]) rmSync(old, { recursive: true, force: true });
  const give = (path) => user && chownSync(path, user.uid, user.gid);
  mkdirSync(aside, { mode: 0o700 });
  give(aside);
  writeFileSync(passwordFile, password, { mode: 0o600 });
  give(passwordFile);
  try {
    requireReach(aside);
    const args = ['-D', aside, '-U', adminUser, '-A', 'scram-sha-256', `--pwfile=${passwordFile}`, '-E', 'UTF8'];
    const done = runAsServer(join(bin, 'initdb'), [
      ...args,
      '--locale=C.UTF-8',
      '-T',
      'english',
      ...(name === 'test' ? ['--no-sync'] : []),
    ]);
    if (done.code !== 0)
      throw new Told(`PostgreSQL could not make its data folder ${aside}:\n${lastLines(done.out + done.err)}`);
  } finally {
    rmSync(passwordFile, { force: true });
  }
  writeFileSync(
    join(aside, 'postgresql.conf'),
    `${readText(join(aside, 'postgresql.conf'))}\ninclude '${settingsName}'\n`,
  );
  writeFileSync(join(aside, markerName), JSON.stringify({ password }), { mode: 0o600 });
  give(join(aside, markerName));
  renameSync(aside, place.data);
}

/** Root's data root may be given by the environment: say it plainly when the server's user can't get there. */
function requireReach(folder) {
  if (runAsServer('test', ['-w', folder]).code === 0) return;
  throw new Told(
    `The user "postgres" cannot reach ${folder}. Choose a SEAMWRIGHT_DATA_ROOT that it may pass to (chmod a+x).`,
  );
}

// Finds PostgreSQL's programs, or installs them.
import { existsSync, readdirSync, realpathSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { Told, installDebian, onPath, run } from '../start/system.mjs';

/** The oldest major version that the migrations are written for. */
export const oldestMajor = 15;

const debianFolder = '/usr/lib/postgresql';
const createClusterFile = '/etc/postgresql-common/createcluster.conf';

/**
 * Every installed PostgreSQL that is new enough, newest first.
 * @returns {{bin: string, major: number}[]}
 */
export function installedPostgres() {
  const folders = existsSync(debianFolder)
    ? readdirSync(debianFolder).map((entry) => join(debianFolder, entry, 'bin'))
    : [];
  const found = onPath('pg_ctl');
  if (found) folders.push(dirname(realpathSync(found)));
  return [...new Set(folders)]
    .filter((bin) => ['postgres', 'initdb', 'pg_ctl'].every((program) => existsSync(join(bin, program))))
    .map((bin) => ({ bin, major: majorOf(run(join(bin, 'postgres'), ['--version']).out) }))
    .filter(({ major }) => major >= oldestMajor)
    .sort((a, b) => b.major - a.major);
}

/** The major version in `postgres (PostgreSQL) 15.9 (Debian …)`; 0 when it cannot be read. */
const majorOf = (text) => Number(/\(PostgreSQL\) (\d+)/.exec(text)?.[1] ?? 0);

/**
 * The programs to use, installed when missing.
 * @param {(line: string) => void} log
 * @param {number} [major] the major version of an existing data folder, which no other can read
 * @returns {{bin: string, major: number} | undefined} undefined when the wanted major version is not installed
 * @throws {Told} when PostgreSQL is missing and cannot be installed
 */
export function postgresBinaries(log, major) {
  const otherwise = 'Or set DATABASE_URL to a PostgreSQL of your own, with the right to create databases and roles.';
  if (installedPostgres().length === 0) {
    installDebian({ packages: ['postgresql'], why: 'Seamwright', before: withoutDebiansCluster, otherwise, log });
  }
  const installed = installedPostgres();
  if (installed.length === 0) {
    throw new Told(
      `Seamwright needs PostgreSQL ${oldestMajor} or later, and this system offers an older one.\n${otherwise}`,
    );
  }
  return major === undefined ? installed[0] : installed.find((one) => one.major === major);
}

/** Debian makes and starts a cluster of its own on port 5432 unless told otherwise; we bring ours. */
const withoutDebiansCluster = `
mkdir -p ${dirname(createClusterFile)}
grep -qs '^[[:space:]]*create_main_cluster' ${createClusterFile} || echo 'create_main_cluster = false' >> ${createClusterFile}`;

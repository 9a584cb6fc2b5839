// What the scripts need from the machine: running programs, being administrator, installing Debian packages.
import { spawn, spawnSync } from 'node:child_process';
import { accessSync, constants, existsSync } from 'node:fs';
import { delimiter, dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of the checkout. */
export const checkout = resolve(dirname(fileURLToPath(import.meta.url)), '../..');

/** A failure that is told to the person as it stands, without a stack: the text says what to do. */
export class Told extends Error {
  name = 'Told';
}

/** True when this process is the superuser. */
export const isRoot = () => process.getuid?.() === 0;

/**
 * Runs a program to its end and gathers what it wrote.
 * @param {string} program
 * @param {string[]} args
 * @param {import('node:child_process').SpawnSyncOptions} [options]
 * @returns {{code: number, out: string, err: string}} `code` is 127 when the program could not be started.
 */
export function run(program, args, options = {}) {
  const done = spawnSync(program, args, {
    stdio: ['ignore', 'pipe', 'pipe'],
    maxBuffer: 64 * 1024 * 1024,
    ...options,
    encoding: 'utf8',
  });
  const code = done.status ?? (done.error ? 127 : 1);
  return { code, out: done.stdout ?? '', err: (done.stderr ?? '') + (done.error ? String(done.error.message) : '') };
}

/**
 * Runs a program to its end while this process goes on reading what its other children write.
 * @param {string} program
 * @param {string[]} args
 * @param {import('node:child_process').SpawnOptions & {shown?: boolean}} [options] `shown` hands the output through
 *   to the terminal instead of gathering it
 * @returns {Promise<{code: number, out: string, err: string}>}
 */
export function runMeanwhile(program, args, { shown = false, ...options } = {}) {
  return new Promise((done) => {
    const gathered = { out: '', err: '' };
    const child = spawn(program, args, { stdio: shown ? 'inherit' : ['ignore', 'pipe', 'pipe'], ...options });
    child.stdout?.setEncoding('utf8').on('data', (text) => (gathered.out += text));
    child.stderr?.setEncoding('utf8').on('data', (text) => (gathered.err += text));
    child.on('error', (error) => done({ code: 127, ...gathered, err: gathered.err + error.message }));
    child.on('close', (code) => done({ code: code ?? 1, ...gathered }));
  });
}

/**
 * Where a program lies on the PATH.
 * @param {string} program
 * @returns {string | undefined}
 */
export function onPath(program) {
  return (process.env.PATH ?? '')
    .split(delimiter)
    .filter(Boolean)
    .map((folder) => join(folder, program))
    .find((file) => {
      try {
        accessSync(file, constants.X_OK);
        return true;
      } catch {
        return false;
      }
    });
}

/** The last lines of a text, for telling what went wrong without telling everything. */
export const lastLines = (text, count = 15) => text.trimEnd().split('\n').slice(-count).join('\n');

/** The one command that an administrator types to install Debian packages. */
export const administratorCommand = (packages) =>
  `sudo sh -c 'apt-get update && apt-get install -y --no-install-recommends ${packages.join(' ')}'`;

/**
 * Installs Debian packages, as root or through sudo without a question.
 * @param {object} wish
 * @param {string[]} wish.packages
 * @param {string} wish.why what needs them, for the messages
 * @param {string} [wish.before] shell lines run as administrator before the installation
 * @param {string} [wish.otherwise] what the person may do instead
 * @param {(line: string) => void} wish.log
 * @throws {Told} when neither is possible, naming the one command an administrator must run
 */
export function installDebian({ packages, why, before = '', otherwise = '', log }) {
  const names = packages.join(' ');
  const instead = otherwise ? `\n${otherwise}` : '';
  if (!onPath('apt-get') && !existsSync('/usr/bin/apt-get')) {
    throw new Told(
      `${why} needs ${names}, and this system has no apt-get: please install it by its own means.${instead}`,
    );
  }
  const elevated = isRoot() ? [] : ['sudo', '-n'];
  if (elevated.length > 0 && run('sudo', ['-n', 'true']).code !== 0) {
    throw new Told(
      `${why} needs ${names}. Please ask an administrator to run:\n  ${administratorCommand(packages)}${instead}`,
    );
  }
  log(`installing Debian's ${names} (once; this may take some minutes)`);
  // A server may be mid-upgrade when we start: wait for its lock. A file we wrote beforehand is kept without a question.
  const options = '-o DPkg::Lock::Timeout=300 -o Dpkg::Options::=--force-confold';
  const script = [
    'set -e',
    'export DEBIAN_FRONTEND=noninteractive',
    `apt-get ${options} update`,
    before,
    `apt-get ${options} install -y --no-install-recommends ${names}`,
  ].join('\n');
  const [program, ...args] = [...elevated, 'sh', '-c', script];
  const done = run(program, args);
  if (done.code !== 0) {
    throw new Told(
      `Debian's ${names} could not be installed:\n${lastLines(done.out + done.err)}\n` +
        `When that is mended, start again, or run:\n  ${administratorCommand(packages)}${instead}`,
    );
  }
}

/**
 * Runs a script's main function: a told failure is printed plainly, any other with its stack; the exit code is 1.
 * @param {() => Promise<void> | void} main
 */
export async function runMain(main) {
  try {
    await main();
  } catch (error) {
    process.stderr.write(`\n${error instanceof Told ? error.message : (error?.stack ?? String(error))}\n`);
    process.exitCode = 1;
  }
}

/** True when the given module is the one that node was asked to run. */
export const isMain = (moduleUrl) =>
  process.argv[1] !== undefined && resolve(process.argv[1]) === fileURLToPath(moduleUrl);

// Installs the npm packages of the lock file when they are missing or stale.
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import locked from './locked.cjs';
import { Told, lastLines, run } from './system.mjs';

/**
 * Makes node_modules what package-lock.json says.
 * @param {object} wish
 * @param {string} wish.root the checkout
 * @param {(line: string) => void} wish.log
 * @throws {Told} with npm's last words
 */
export function ensurePackages({ root, log }) {
  const wanted = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8'));
  // npm writes this list last: it stands for a complete installation, and an interrupted one has none.
  const stale = locked.whyStale(wanted, readInstalled(root));
  if (!stale) return log('packages are up to date');
  log(`installing packages: ${stale} (this may take some minutes)`);
  const done = run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], { cwd: root });
  if (done.code !== 0) {
    throw new Told(
      `npm could not install the packages:\n${lastLines(done.out + done.err, 25)}\n` +
        'Check that the npm registry can be reached and that the disk has room, then start again.',
    );
  }
  const still = locked.whyStale(wanted, readInstalled(root));
  if (still) log(`warning: after installing, ${still}`);
}

function readInstalled(root) {
  try {
    return JSON.parse(readFileSync(join(root, 'node_modules/.package-lock.json'), 'utf8'));
  } catch {
    return undefined;
  }
}

/**
 * Stops early on a Node.js that the packages do not support.
 * @param {string} root the checkout
 */
export function checkNode(root) {
  const wanted = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')).engines.node;
  const [major, minor] = process.versions.node.split('.').map(Number);
  const [, fromMajor, fromMinor, below] = /^>=(\d+)\.(\d+) <(\d+)$/.exec(wanted).map(Number);
  const old = major < fromMajor || (major === fromMajor && minor < fromMinor);
  if (!old && major < below) return;
  throw new Told(
    `Seamwright needs Node.js ${wanted}; this is ${process.versions.node}. Install Node.js ${fromMajor}, then start again.`,
  );
}

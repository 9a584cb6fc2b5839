// A stamp beside a built target: which files it was made from, and their hash.
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import digest from './digest.cjs';

const stampPath = (root, name) => join(root, 'dist/.stamps', `${name}.json`);

/**
 * True when a target's results exist and were made from the files as they are now.
 * @param {string} root
 * @param {{name: string, outputs: string[], settings: string, inputs?: () => string[]}} target without `inputs`, the
 *   files that the last build named are looked at
 */
export function isFresh(root, { name, outputs, settings, inputs }) {
  const stamp = readStamp(root, name);
  if (!stamp || !outputs.every((file) => existsSync(join(root, file)))) return false;
  return stamp.digest === digest.digestOf(root, inputs ? inputs() : stamp.files, settings);
}

/**
 * @param {string} root
 * @param {string} name
 * @param {string[]} files
 * @param {string} hash over these files; where they are known beforehand, taken before the build, so that what changes
 *   while it runs is built again the next time
 */
export function writeStamp(root, name, files, hash) {
  mkdirSync(dirname(stampPath(root, name)), { recursive: true });
  writeFileSync(stampPath(root, name), JSON.stringify({ digest: hash, files }));
}

/** Forgets a target, so that a build that fails half-way counts as none. */
export const removeStamp = (root, name) => rmSync(stampPath(root, name), { force: true });

function readStamp(root, name) {
  try {
    const stamp = JSON.parse(readFileSync(stampPath(root, name), 'utf8'));
    return Array.isArray(stamp.files) ? stamp : undefined;
  } catch {
    return undefined;
  }
}

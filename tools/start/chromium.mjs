// Finds Chromium for the browser tests, or installs Debian's.
import { existsSync } from 'node:fs';
import { Told, installDebian, onPath } from './system.mjs';

const findChromium = () =>
  [process.env.SEAMWRIGHT_CHROMIUM, '/usr/bin/chromium', onPath('chromium'), onPath('google-chrome')].find(
    (path) => path && existsSync(path),
  );

/**
 * The browser's program; SEAMWRIGHT_CHROMIUM names another one.
 * @param {(line: string) => void} log
 * @returns {string}
 * @throws {Told} when there is none and it cannot be installed
 */
export function ensureChromium(log) {
  const otherwise = 'Or set SEAMWRIGHT_CHROMIUM to a Chromium or Chrome that is installed already.';
  if (!findChromium()) installDebian({ packages: ['chromium'], why: 'The browser tests', otherwise, log });
  const found = findChromium();
  if (!found) throw new Told(`Chromium was installed but cannot be found.\n${otherwise}`);
  return found;
}

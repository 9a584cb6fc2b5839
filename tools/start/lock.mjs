// A lock file that names its holder, so that a crash leaves nothing to clear by hand.
import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { randomBytes } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import { Told } from './system.mjs';

/**
 * When a process was born, in the kernel's ticks: tells a process from a later one with the same number.
 * @param {number} pid
 * @returns {string | undefined} undefined where the system does not say
 */
export function birthOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The second field is the name in brackets and may hold spaces: count from its end. Birth is field 22.
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19];
  } catch {
    return undefined;
  }
}

/**
 * True when a process of this number lives (and, if its birth is given, is still the same one).
 * @param {number} pid
 * @param {string} [born]
 */
export function isAlive(pid, born) {
  if (!Number.isInteger(pid) || pid <= 0) return false;
  try {
    process.kill(pid, 0);
  } catch (error) {
    if (error.code !== 'EPERM') return false;
  }
  return born === undefined || birthOf(pid) === born;
}

/**
 * @typedef {{pid: number, born?: string, token: string} & Record<string, unknown>} Holder
 */

/**
 * Who holds a lock, if its holder lives.
 * @param {string} path
 * @returns {Holder | undefined}
 */
export function lockHolder(path) {
  try {
    const holder = JSON.parse(readFileSync(path, 'utf8'));
    return isAlive(holder.pid, holder.born) ? holder : undefined;
  } catch {
    return undefined;
  }
}

/**
 * Takes a lock, or tells who has it.
 * @param {string} path
 * @param {Record<string, unknown>} [notes] told to whoever finds the lock taken
 * @returns {{release: () => void, heldBy?: undefined} | {heldBy: Holder}}
 */
export function takeLock(path, notes = {}) {
  mkdirSync(dirname(path), { recursive: true });
  const token = randomBytes(8).toString('hex');
  const mine = `${path}.${token}`;
  writeFileSync(mine, JSON.stringify({ ...notes, pid: process.pid, born: birthOf(process.pid), token }), {
    mode: 0o600,
  });
  try {
    for (let attempt = 0; attempt < 20; attempt++) {
      try {
        // A link appears with its content or not at all, and never replaces another.
        linkSync(mine, path);
        return { release: () => releaseLock(path, token) };
      } catch (error) {
        if (error.code !== 'EEXIST') throw error;
      }
      const heldBy = lockHolder(path);
      if (heldBy) return { heldBy };
      clearDeadLock(path, `${mine}.dead`);
    }
    throw new Error(`the lock ${path} could be neither taken nor read`);
  } finally {
    rmSync(mine, { force: true });
  }
}

/** Moves a dead holder's file away; if somebody living took the lock in between, it is put back. */
function clearDeadLock(path, aside) {
  try {
    renameSync(path, aside);
    if (lockHolder(aside)) linkSync(aside, path);
  } catch (error) {
    if (error.code !== 'ENOENT' && error.code !== 'EEXIST') throw error;
  } finally {
    rmSync(aside, { force: true });
  }
}

function releaseLock(path, token) {
  if (lockHolder(path)?.token === token) rmSync(path, { force: true });
}

/**
 * Does some work alone, waiting for whoever is at it.
 * @template T
 * @param {string} path
 * @param {() => Promise<T> | T} work
 * @param {number} [patienceMs]
 * @returns {Promise<T>}
 */
export async function alone(path, work, patienceMs = 120_000) {
  const until = Date.now() + patienceMs;
  for (;;) {
    const lock = takeLock(path);
    if (!lock.heldBy) {
      try {
        return await work();
      } finally {
        lock.release();
      }
    }
    if (Date.now() > until) {
      throw new Told(`Process ${lock.heldBy.pid} has been holding ${path} for long. Stop it, then start again.`);
    }
    await pause(100);
  }
}

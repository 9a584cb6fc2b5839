// The processes of a cluster: which run, on which port, and how they end.
import { existsSync, readdirSync, readlinkSync, realpathSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { isAlive } from '../start/lock.mjs';
import { Told } from '../start/system.mjs';
import { postgresBinaries } from './binaries.mjs';
import { readText, runAsServer } from './place.mjs';

const hasProc = existsSync('/proc/self');

/**
 * A pid file from before a crash may name a process that is now something else; PostgreSQL would then refuse to start.
 * It is removed only when no process works in the data folder: two servers on one folder would ruin it.
 */
export function clearForeignPid(place) {
  const { pid } = readPidFile(place) ?? {};
  if (pid !== undefined && isAlive(pid) && hasProc && processesIn(place.data).length === 0) {
    rmSync(join(place.data, 'postmaster.pid'), { force: true });
  }
}

/** Ends the server, politely first. */
export async function haltServer(place, log) {
  if (serverPid(place) === undefined) return;
  const { bin } = postgresBinaries(log, Number(readText(join(place.data, 'PG_VERSION')))) ?? postgresBinaries(log);
  for (const mode of ['fast', 'immediate']) {
    if (runAsServer(join(bin, 'pg_ctl'), ['stop', '-w', '-t', '30', '-s', '-D', place.data, '-m', mode]).code === 0)
      return;
  }
  throw new Told(`PostgreSQL (process ${readPidFile(place)?.pid}) does not stop. Its log is ${place.log}`);
}

/** Ends whatever still works in a data folder that is about to go. */
export async function haltProcesses(place) {
  for (let attempt = 0; attempt < 50; attempt++) {
    const left = [...processesIn(place.data), ...processesIn(`${place.data}.new`)];
    if (left.length === 0) return;
    for (const pid of left) {
      try {
        process.kill(pid, attempt < 10 ? 'SIGQUIT' : 'SIGKILL');
      } catch (error) {
        if (error.code !== 'ESRCH') throw error;
      }
    }
    await pause(100);
  }
}

/** The port of the server in this data folder, once it answers. */
export function runningPort(place) {
  const found = readPidFile(place);
  return found?.status === 'ready' && serverPid(place) !== undefined ? found.port : undefined;
}

/** The process of the server in this data folder, if it lives and is not a later process with the same number. */
function serverPid(place) {
  const pid = readPidFile(place)?.pid;
  if (pid === undefined || !isAlive(pid)) return undefined;
  return !hasProc || processesIn(place.data).includes(pid) ? pid : undefined;
}

/** postmaster.pid, by line: pid, data folder, start, port, socket folder, address, shared memory, status. */
function readPidFile(place) {
  const lines = readText(join(place.data, 'postmaster.pid')).split('\n');
  const pid = Number(lines[0]);
  return pid > 0 ? { pid, port: Number(lines[3]), status: (lines[7] ?? '').trim() } : undefined;
}

/** The processes whose working folder is this one: PostgreSQL's server and its children sit in their data folder. */
function processesIn(folder) {
  if (!hasProc || !existsSync(folder)) return [];
  const real = realpathSync(folder);
  return readdirSync('/proc')
    .filter((entry) => /^\d+$/.test(entry))
    .filter((pid) => {
      try {
        return readlinkSync(`/proc/${pid}/cwd`) === real && /postgres/.test(readText(`/proc/${pid}/comm`));
      } catch {
        return false;
      }
    })
    .map(Number);
}

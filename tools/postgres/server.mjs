// Starts a cluster's server.
import { chownSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { freePort } from '../start/ports.mjs';
import { Told, lastLines } from '../start/system.mjs';
import { makePassage, readText, runAsServer, serverUser, settingsName } from './place.mjs';
import { clearForeignPid, runningPort } from './processes.mjs';

/** Keeps the last port, so that the next start takes the same one when it can. */
const portName = 'seamwright.port';

const commonSettings = {
  listen_addresses: '127.0.0.1',
  unix_socket_directories: '', // a checkout's path may be longer than a socket's may be
  timezone: 'UTC',
  log_timezone: 'UTC',
  log_line_prefix: '%m [%p] %u@%d ',
  jit: 'off', // compiling costs more than our short queries do
};

const settingsByName = {
  demo: { max_connections: '120' },
  // Nothing in the test cluster outlives a crash of the machine, nor needs to.
  test: { max_connections: '200', fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off' },
};

/** The clusters that there may be. */
export const clusterNames = Object.keys(settingsByName);

/** Starts the server on its last port if that is free, else on another; waits until it answers. */
export async function startServer({ bin }, place, name, log) {
  const user = serverUser();
  const settings = { ...commonSettings, ...settingsByName[name] };
  const lines = Object.entries(settings).map(([key, value]) => `${key} = '${value}'\n`);
  writeFileSync(join(place.data, settingsName), lines.join(''));
  makePassage(dirname(place.log));
  writeFileSync(place.log, '', { mode: 0o600 });
  if (user) chownSync(place.log, user.uid, user.gid);
  clearForeignPid(place);
  let preferred = Number(readText(join(place.data, portName))) || undefined;
  for (let attempt = 1; ; attempt++) {
    const recovered = runningPort(place); // started by somebody whose wait was cut short
    if (recovered !== undefined) return recovered;
    const port = await freePort(preferred);
    const done = runAsServer(join(bin, 'pg_ctl'), [
      'start',
      '-w',
      '-t',
      '120',
      '-s',
      '-D',
      place.data,
      '-l',
      place.log,
      '-o',
      `-p ${port}`,
    ]);
    if (done.code === 0) {
      writeFileSync(join(place.data, portName), String(port));
      return port;
    }
    const said = lastLines(`${readText(place.log)}\n${done.out}${done.err}`);
    if (attempt >= 60) throw new Told(`PostgreSQL does not start. Its log is ${place.log}:\n${said}`);
    if (/could not bind|address already in use/i.test(said)) {
      preferred = undefined;
    } else if (/shared memory block .* still in use|lock file .* already exists/i.test(said)) {
      // After a crash the server's children need a moment to notice that it is gone.
      if (attempt === 1) log('waiting for what a crash left behind to end');
      await pause(500);
    } else {
      throw new Told(`PostgreSQL does not start. Its log is ${place.log}:\n${said}`);
    }
    writeFileSync(place.log, '');
  }
}

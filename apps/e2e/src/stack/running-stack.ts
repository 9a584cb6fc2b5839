import { spawn, spawnSync, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { TODAY, type Addresses } from './addresses';

const CHECKOUT = resolve(__dirname, '../../../..');
const DATABASE = 'seamwright_e2e';
/** Building both applications from nothing on a busy machine takes the most of it. */
const START_PATIENCE_MS = 420_000;
const STOP_PATIENCE_MS = 40_000;

/** The stack as `npm start` makes it, on a database and a folder of its own. */
export interface RunningStack {
  readonly addresses: Addresses;
  stop(): Promise<void>;
}

/**
 * Starts the demo anew with the project's own start command and waits until it says that it is ready.
 * @throws Error with the end of what it printed
 */
export async function startStack(adminUrl: string): Promise<RunningStack> {
  const folder = mkdtempSync(join(tmpdir(), 'seamwright-e2e-'));
  const env = {
    ...process.env,
    DATABASE_URL: adminUrl,
    SEAMWRIGHT_DATABASE: DATABASE,
    SEAMWRIGHT_DATA_ROOT: folder,
    SEED_ANCHOR_DAY: TODAY,
  };
  const args = ['tools/start/start.mjs', '--reset', '--port', String(await freePort())];
  const child = spawn(process.execPath, args, { cwd: CHECKOUT, env, stdio: ['ignore', 'pipe', 'pipe'] });
  const stop = async (): Promise<void> => {
    await ended(child);
    rmSync(folder, { recursive: true, force: true });
  };
  try {
    const printed = await readyText(child);
    return { addresses: { ...readAddresses(printed), workerDatabase: workerAddress(env) }, stop };
  } catch (error) {
    await stop();
    throw error;
  }
}

/** What the start command printed once it serves. */
function readyText(child: ChildProcess): Promise<string> {
  return new Promise((done, fail) => {
    let printed = '';
    const giveUp = (why: string): void => {
      clearTimeout(timer);
      fail(new Error(`${why}:\n${printed.slice(-4000)}`));
    };
    const timer = setTimeout(() => giveUp('The stack did not become ready'), START_PATIENCE_MS);
    const hear = (text: string): void => {
      printed += text;
      if (!printed.includes('Ctrl-C stops everything.')) return;
      clearTimeout(timer);
      done(printed);
    };
    child.stdout?.setEncoding('utf8').on('data', hear);
    child.stderr?.setEncoding('utf8').on('data', hear);
    child.once('error', (error) => giveUp(error.message));
    child.once('exit', (code) => giveUp(`The start command ended with code ${code}`));
  });
}

/** The printed rows are a name and an address. */
function readAddresses(printed: string): Omit<Addresses, 'workerDatabase'> {
  const row = (name: string): string => {
    const found = printed.split('\n').find((line) => line.trim().startsWith(name));
    const address = found && /https?:\/\/\S+/.exec(found)?.[0];
    if (!address) throw new Error(`The start command did not print the address of "${name}":\n${printed.slice(-2000)}`);
    return address;
  };
  return {
    storefront: row('storefront '),
    admin: row('administration '),
    cards: row('cards (stand-in)'),
    mail: row('mail (stand-in)'),
  };
}

/** The database's own command tells the addresses of its roles in its last line; repeated, it changes nothing. */
function workerAddress(env: NodeJS.ProcessEnv): string {
  const args = ['database/cli.ts', 'prepare'];
  const asked = spawnSync('node_modules/.bin/tsx', args, { cwd: CHECKOUT, env, encoding: 'utf8' });
  if (asked.status !== 0) throw new Error(`The database's addresses could not be read: ${asked.stderr}`);
  const urls = JSON.parse(asked.stdout.trim().split('\n').at(-1) ?? '') as { workerUrl: string };
  return urls.workerUrl;
}

/** Asks the start command to stop, as Ctrl-C does; what does not stop in time is ended. */
function ended(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve();
  return new Promise((done) => {
    const timer = setTimeout(() => child.kill('SIGKILL'), STOP_PATIENCE_MS);
    child.once('exit', () => {
      clearTimeout(timer);
      done();
    });
    child.kill('SIGTERM');
  });
}

/** Any free port of loopback, with room for the stand-ins after it. */
function freePort(): Promise<number> {
  return new Promise((done, fail) => {
    const server = createServer().once('error', fail);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => done(typeof address === 'object' && address ? address.port : 0));
    });
  });
}

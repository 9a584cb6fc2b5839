// One start, step by step: packages, database, stand-ins, seeds, programs; then it serves until it is told to stop.
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { setImmediate as breathe } from 'node:timers/promises';
import { makePassage, placeOf } from '../postgres/place.mjs';
import { build } from '../build/build.mjs';
import { Children, endLeftovers } from './children.mjs';
import { ensureDatabase } from './database.mjs';
import { addressesOf, choosePorts, environments, snapshotIn } from './environment.mjs';
import { takeLock } from './lock.mjs';
import options from './options.cjs';
import { checkNode, ensurePackages } from './packages.mjs';
import { accepts, answersOk, isFree, until } from './ports.mjs';
import { ensureSecrets } from './secrets.mjs';
import { Told, checkout, lastLines, runMeanwhile } from './system.mjs';

/**
 * @typedef {object} Flavour what `npm start` and `npm run dev` do differently
 * @property {string[]} targets what is built beforehand
 * @property {{storefront: string, admin: string}} statics the folders of the built applications
 * @property {(start: {root: string, env: Record<string, string | undefined>}) => import('./children.mjs').ChildWish[]} programs
 * @property {(children: Children, root: string) => Promise<void>} [before] runs ahead of the programs
 * @property {boolean} patient true when a program that is not ready in time is only told of
 */

/** Thrown to leave the steps early when the person asks to stop. */
class Stopped extends Error {}

const log = (line) => console.log(line);

/**
 * Starts everything and serves until Ctrl-C, SIGTERM or SIGHUP, or until a process dies.
 * @param {Flavour} flavour
 * @param {string[]} words of the command line
 */
export async function runStack(flavour, words) {
  const root = checkout;
  const wish = readWish(words);
  if (wish.help) return log(options.usage);
  checkNode(root);

  const { folder, log: postgresLog } = placeOf(root, 'demo');
  makePassage(folder);
  const lock = lockOrTell(folder, wish.port);
  const signals = listenForStop();
  /** What to undo, the last done first. */
  const undo = [() => lock.release()];
  try {
    const step = async (work) => {
      const result = await work();
      await breathe(); // a signal that came during a long step is heard here
      if (signals.asked()) throw new Stopped();
      return result;
    };
    const listFile = join(folder, 'processes.json');
    await step(() => endLeftovers(listFile, log));
    if (!(await isFree(wish.port))) throw new Told(portTaken(wish.port));
    await step(() => ensurePackages({ root, log }));
    await step(async () => {
      const { built } = await build({ root, only: flavour.targets, log, signal: signals.signal });
      if (built.length === 0) log('nothing to build');
    });

    if (wish.reset) rmSync(snapshotIn(folder), { force: true });
    const database = await step(async () => {
      const made = await ensureDatabase({ root, reset: wish.reset, log });
      undo.push(made.stop);
      return made;
    });

    const secrets = ensureSecrets(join(folder, 'secrets.json'));
    const ports = await choosePorts(wish.port);
    const env = environments({ ports, secrets, database, folder, statics: absolute(root, flavour.statics) });
    const logFile = join(postgresLog, '..', 'seamwright.log');
    makePassage(join(postgresLog, '..'));
    const children = new Children({ cwd: root, logFile, listFile, log });
    undo.push(() => children.stopAll());
    signals.onImpatience(() => children.killAll());
    const orDeath = (work) => Promise.race([children.death, signals.stop, work]);

    await step(() => orDeath(startStandIns(children, env, ports)));
    if (wish.seed) await step(() => orDeath(seed(root, env.seeds)));
    if (flavour.before) await step(() => orDeath(flavour.before(children, root)));
    for (const program of flavour.programs({ root, env: env.server })) children.start(program);
    await step(() => orDeath(awaitReady(ports.http, flavour.patient, logFile)));
    await printWelcome(root, env.seeds, addressesOf(ports), logFile, wish.seed);
    await orDeath(signals.stop);
  } catch (error) {
    await breathe();
    if (!signals.asked()) throw error;
    log('\nstopping');
  } finally {
    for (const back of undo.reverse()) await back();
    signals.forget();
  }
  log('stopped');
}

function readWish(words) {
  try {
    return options.readStartOptions(words, process.env);
  } catch (error) {
    throw new Told(error.message);
  }
}

function lockOrTell(folder, port) {
  const lock = takeLock(join(folder, 'start.lock'), { address: `http://127.0.0.1:${port}/` });
  if (!lock.heldBy) return lock;
  const { address, pid } = lock.heldBy;
  throw new Told(
    `Seamwright runs already at ${address} (process ${pid}). Stop it with Ctrl-C in its terminal, or: kill ${pid}`,
  );
}

const portTaken = (port) =>
  `Port ${port} is taken by another program. Choose another one:\n  npm start -- --port ${port < 65000 ? port + 100 : 4300}`;

const absolute = (root, folders) =>
  Object.fromEntries(Object.entries(folders).map(([name, folder]) => [name, join(root, folder)]));

/** Hears the signals that ask to stop; the second one does not wait for anything. */
function listenForStop() {
  let count = 0;
  let hurry = () => undefined;
  const controller = new AbortController();
  const { signal } = controller;
  const stop = new Promise((_, fail) => signal.addEventListener('abort', () => fail(signal.reason)));
  stop.catch(() => undefined); // heard by whoever waits for it
  const hear = () => {
    count += 1;
    controller.abort(new Stopped());
    if (count < 2) return;
    hurry();
    process.exit(130);
  };
  // npm hands on the signal that the terminal sent to us as well: two at once are one wish.
  let last = 0;
  const onSignal = () => {
    if (Date.now() - last > 500) hear();
    last = Date.now();
  };
  const names = ['SIGINT', 'SIGTERM', 'SIGHUP'];
  for (const name of names) process.on(name, onSignal);
  return {
    stop,
    signal,
    asked: () => signal.aborted,
    onImpatience: (work) => (hurry = work),
    forget: () => names.forEach((name) => process.off(name, onSignal)),
  };
}

async function startStandIns(children, env, ports) {
  const standIn = (name, variables) =>
    children.start({ name, program: process.execPath, args: [`dist/tools/${name}.cjs`], env: variables });
  standIn('stripe-mock', env.stripeMock);
  standIn('mail-catcher', env.mailCatcher);
  for (const port of [ports.stripe, ports.mail, ports.smtp]) {
    if (!(await until(() => accepts(port), 30_000))) throw new Told(`A stand-in does not listen on port ${port}.`);
  }
  log('stand-ins for card processor and mail are up');
}

async function seed(root, env) {
  log('filling the demo, unless it is there');
  const done = await runMeanwhile(join(root, 'node_modules/.bin/tsx'), ['seeds/cli.ts'], { cwd: root, env });
  if (done.code === 0) return;
  throw new Told(
    `The demo could not be filled:\n${lastLines(done.out + done.err, 25)}\n` +
      'Make it anew with: npm start -- --reset (or start without it: npm start -- --no-seed)',
  );
}

async function awaitReady(port, patient, logFile) {
  log('starting the API and its worker');
  const url = `http://127.0.0.1:${port}/readyz`;
  if (await until(() => answersOk(url), patient ? 120_000 : 60_000)) return;
  const said = `The API does not say that it is ready at ${url}. Its log: ${logFile}`;
  if (!patient) throw new Told(said);
  log(said);
}

async function printWelcome(root, env, addresses, logFile, seeded) {
  const rows = [
    ['storefront', addresses.storefront],
    ['administration', addresses.admin],
    ['API', addresses.docs],
    ['cards (stand-in)', addresses.cards],
    ['mail (stand-in)', addresses.mail],
    ['log', logFile],
  ];
  log(`\nSeamwright is ready.\n\n${rows.map(([what, where]) => `  ${what.padEnd(18)}${where}`).join('\n')}\n`);
  if (seeded) {
    const signIns = await runMeanwhile(join(root, 'node_modules/.bin/tsx'), ['seeds/cli.ts', '--sign-ins'], {
      cwd: root,
      env,
    });
    log(
      signIns.code === 0 ? signIns.out.trimEnd() : `The demo sign-ins could not be read:\n${lastLines(signIns.err, 5)}`,
    );
  }
  log('\nCtrl-C stops everything.');
}

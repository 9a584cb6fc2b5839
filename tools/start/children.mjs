// The processes that a start keeps running: their output, their deaths, their end.
import { spawn } from 'node:child_process';
import { createWriteStream, existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { createInterface } from 'node:readline';
import { setTimeout as pause } from 'node:timers/promises';
import { birthOf, isAlive } from './lock.mjs';
import logLine from './log-line.cjs';
import { Told } from './system.mjs';

const keptLines = 20;
const politeMs = 15_000;

/**
 * @typedef {object} ChildWish
 * @property {string} name the prefix of its lines
 * @property {string} program
 * @property {string[]} args
 * @property {Record<string, string | undefined>} env
 * @property {boolean} [chatty] true when all its lines go to the terminal, not warnings alone
 */

/** Starts processes in one working folder, logs them to one file, and ends them in the reverse order. */
export class Children {
  #running = [];
  #stopping = false;
  #log;
  #died;

  /**
   * @param {object} wish
   * @param {string} wish.cwd
   * @param {string} wish.logFile the previous start's is kept beside it as `.1`
   * @param {string} wish.listFile names the living, so that a later start can end what a crash of ours left behind
   * @param {(line: string) => void} wish.log the terminal
   */
  constructor({ cwd, logFile, listFile, log }) {
    this.cwd = cwd;
    this.logFile = logFile;
    this.listFile = listFile;
    this.log = log;
    if (existsSync(logFile)) renameSync(logFile, `${logFile}.1`);
    this.#log = createWriteStream(logFile, { mode: 0o600 });
    /** Fails with the last lines of the first process that ends unasked. */
    this.death = new Promise((_, fail) => (this.#died = fail));
    this.death.catch(() => undefined); // whoever waits for it is told; nobody waiting is no fault
  }

  /**
   * @param {ChildWish} wish
   */
  start({ name, program, args, env, chatty = false }) {
    // In a group of its own: Ctrl-C in the terminal reaches us alone, and we end the processes in order.
    const child = spawn(program, args, { cwd: this.cwd, env, detached: true, stdio: ['ignore', 'pipe', 'pipe'] });
    const entry = { name, child, last: [] };
    this.#running.push(entry);
    for (const stream of ['out', 'err']) {
      createInterface({ input: stream === 'out' ? child.stdout : child.stderr }).on('line', (line) => {
        this.#log.write(`${new Date().toISOString()} [${name}] ${line}\n`);
        entry.last = [...entry.last, line].slice(-keptLines);
        const shown = chatty ? line : logLine.forTerminal(line, stream);
        if (shown !== undefined && !this.#stopping) this.log(`[${name}] ${shown}`);
      });
    }
    child.on('error', (error) => this.#ended(entry, error.message));
    // "close" comes after the last line was read, "exit" may come before it.
    child.on('close', (code, signal) => this.#ended(entry, signal ? `by ${signal}` : `with code ${code}`));
    this.#writeList();
  }

  /** Ends all, the last started first; who does not end in time is killed. */
  async stopAll() {
    this.#stopping = true;
    for (const entry of [...this.#running].reverse()) {
      signalGroup(entry.child.pid, 'SIGTERM');
      const until = Date.now() + politeMs;
      while (this.#running.includes(entry) && Date.now() < until) await pause(20);
      if (this.#running.includes(entry)) {
        this.log(`${entry.name} does not stop and is killed`);
        signalGroup(entry.child.pid, 'SIGKILL');
      }
    }
    rmSync(this.listFile, { force: true });
    await new Promise((done) => this.#log.end(done));
  }

  /** Ends all at once, without ceremony. */
  killAll() {
    for (const { child } of this.#running) signalGroup(child.pid, 'SIGKILL');
  }

  #ended(entry, how) {
    if (!this.#running.includes(entry)) return;
    this.#running = this.#running.filter((one) => one !== entry);
    if (this.#stopping) return;
    this.#writeList();
    const last = entry.last.length > 0 ? `Its last lines:\n${entry.last.map((line) => `  ${line}`).join('\n')}\n` : '';
    this.#died(new Told(`${entry.name} ended ${how}. ${last}The whole log: ${this.logFile}`));
  }

  #writeList() {
    const living = this.#running.map(({ name, child }) => ({ name, pid: child.pid, born: birthOf(child.pid) }));
    writeFileSync(this.listFile, JSON.stringify(living));
  }
}

/**
 * Ends the processes of an earlier start that was itself killed.
 * @param {string} listFile
 * @param {(line: string) => void} log
 */
export async function endLeftovers(listFile, log) {
  if (!existsSync(listFile)) return;
  const living = readList(listFile).filter(({ pid, born }) => born !== undefined && isAlive(pid, born));
  for (const { name, pid } of living) {
    log(`ending ${name} (process ${pid}), left behind by a start that was killed`);
    signalGroup(pid, 'SIGTERM');
  }
  const until = Date.now() + politeMs;
  for (const { pid, born } of living) {
    while (isAlive(pid, born) && Date.now() < until) await pause(50);
    if (isAlive(pid, born)) signalGroup(pid, 'SIGKILL');
  }
  rmSync(listFile, { force: true });
}

function readList(listFile) {
  try {
    return JSON.parse(readFileSync(listFile, 'utf8'));
  } catch {
    return [];
  }
}

/** Signals a process and those it started itself. */
function signalGroup(pid, signal) {
  if (pid === undefined) return;
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import * as z from 'zod';
import type { Clock } from './clock';
import { collectionNames, refill, toRecord, type State, type StateRecord } from './state';

const VERSION = 1;
const kept = z.looseObject({ id: z.string() });
const snapshotSchema = z.object({
  version: z.literal(VERSION),
  clockOffsetMs: z.number(),
  collections: z.object(Object.fromEntries(collectionNames.map((name) => [name, z.array(kept)]))),
});

/** Waits this long after a change before writing, so that a burst of calls is one write. */
const QUIET_MS = 200;

/** Keeps the state in a file, so that a restart goes on where it was. */
export class Snapshot {
  readonly #file: string;
  readonly #state: State;
  readonly #clock: Clock;
  #timer: NodeJS.Timeout | null = null;

  constructor(file: string, state: State, clock: Clock) {
    this.#file = file;
    this.#state = state;
    this.#clock = clock;
  }

  /** Fills the state from the file, when there is one. @throws Error that names the file when it can't be read */
  load(): void {
    if (!existsSync(this.#file)) return;
    const content = readFileSync(this.#file, 'utf8');
    const parsed = snapshotSchema.safeParse(unreadableAsUndefined(content));
    if (!parsed.success) {
      throw new Error(`The snapshot ${this.#file} can't be used. Delete it to start with an empty account.`);
    }
    // Only this class writes the file; the schema proves its outline and that every object has an id.
    refill(this.#state, parsed.data.collections as unknown as StateRecord);
    this.#clock.offsetMs = parsed.data.clockOffsetMs;
  }

  /** Writes soon. */
  changed(): void {
    this.#timer ??= setTimeout(() => this.write(), QUIET_MS).unref();
  }

  /** Writes now: a whole new file takes the old one's place, so that a crash leaves one or the other. */
  write(): void {
    if (this.#timer) clearTimeout(this.#timer);
    this.#timer = null;
    const content = { version: VERSION, clockOffsetMs: this.#clock.offsetMs, collections: toRecord(this.#state) };
    mkdirSync(dirname(this.#file), { recursive: true });
    writeFileSync(`${this.#file}.new`, JSON.stringify(content), { mode: 0o600 });
    renameSync(`${this.#file}.new`, this.#file);
  }
}

function unreadableAsUndefined(content: string): unknown {
  try {
    return JSON.parse(content);
  } catch {
    return undefined;
  }
}

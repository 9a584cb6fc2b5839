import { createHash } from 'node:crypto';
import { SECONDS_PER_DAY, type Clock } from './clock';
import { ApiError } from './errors';
import { keep, type State } from './state';

/** The first answer to a request, to be given again for the same key. `id` is the key. */
export interface KeptAnswer {
  id: string;
  fingerprint: string;
  status: number;
  body: string;
  requestId: string;
  created: number;
}

const LONGEST_KEY = 255;

/** Tells one request from another: same method, path and body, same fingerprint. */
export function fingerprintOfRequest(method: string, path: string, body: string): string {
  return createHash('sha256').update(`${method} ${path}\n${body}`).digest('hex');
}

/** Idempotency keys: kept for a day, one request at a time for each. */
export class Idempotency {
  readonly #state: State;
  readonly #clock: Clock;
  readonly #inUse = new Set<string>();

  constructor(state: State, clock: Clock) {
    this.#state = state;
    this.#clock = clock;
  }

  /**
   * Takes a key for a request, or hands back the answer kept for it; a key that was taken must be released.
   * @throws ApiError 409 while another request holds the key, 400 when it was used with other parameters
   */
  begin(key: string, fingerprint: string): KeptAnswer | undefined {
    if (key.length > LONGEST_KEY) {
      throw new ApiError(400, 'idempotency_error', `Idempotency keys have at most ${LONGEST_KEY} characters.`);
    }
    if (this.#inUse.has(key)) {
      throw new ApiError(
        409,
        'invalid_request_error',
        `There is currently another in-progress request using this Idempotent Key (${key}). Please try again later.`,
        { code: 'idempotency_key_in_use' },
      );
    }
    const kept = this.#state.keptAnswers.get(key);
    if (kept && kept.fingerprint !== fingerprint) {
      throw new ApiError(
        400,
        'idempotency_error',
        'Keys for idempotent requests can only be used with the same parameters they were first used with. ' +
          `Try using a key other than '${key}' if you meant to execute a different request.`,
      );
    }
    if (!kept) this.#inUse.add(key);
    return kept;
  }

  keep(answer: Omit<KeptAnswer, 'created'>): void {
    keep(this.#state.keptAnswers, { ...answer, created: this.#clock.seconds() });
  }

  release(key: string): void {
    this.#inUse.delete(key);
  }

  /** Forgets keys that are a day old. */
  forgetOld(): void {
    const oldest = this.#clock.seconds() - SECONDS_PER_DAY;
    for (const { id, created } of this.#state.keptAnswers.values()) {
      if (created <= oldest) this.#state.keptAnswers.delete(id);
    }
  }
}

import type { Decline } from './test-cards';

/** Which calls a fault meets: all, or those of a method and with a piece of text in their path. */
export interface CallFilter {
  method?: 'GET' | 'POST' | 'DELETE' | undefined;
  pathIncludes?: string | undefined;
}

/** A fault arranged for the next `times` calls that the filter meets. */
export interface ArrangedFault extends CallFilter {
  times: number;
}
export interface SlowAnswer extends ArrangedFault {
  milliseconds: number;
}
/** The work is done and kept, but the caller gets a 500 or a broken connection. */
export interface LostAnswer extends ArrangedFault {
  how: 'error' | 'disconnect';
}
/** Nothing is done; the caller gets this status. */
export interface RefusedCall extends ArrangedFault {
  status: 429 | 500 | 503;
}
export interface ArrangedDecline {
  times: number;
  decline: Decline;
}

function take<Fault extends ArrangedFault>(faults: Fault[], method: string, path: string): Fault | undefined {
  const index = faults.findIndex(
    (fault) =>
      (fault.method === undefined || fault.method === method) &&
      (fault.pathIncludes === undefined || path.includes(fault.pathIncludes)),
  );
  return takeAt(faults, index);
}

function takeAt<Fault extends { times: number }>(faults: Fault[], index: number): Fault | undefined {
  const fault = faults[index];
  if (!fault) return undefined;
  fault.times -= 1;
  if (fault.times <= 0) faults.splice(index, 1);
  return fault;
}

/** Faults arranged by hand, each used up by the calls it meets. They are not part of what a snapshot keeps. */
export class Faults {
  readonly #slow: SlowAnswer[] = [];
  readonly #lost: LostAnswer[] = [];
  readonly #refused: RefusedCall[] = [];
  readonly #declines: ArrangedDecline[] = [];

  answerSlowly(fault: SlowAnswer): void {
    this.#slow.push(fault);
  }
  loseAnswer(fault: LostAnswer): void {
    this.#lost.push(fault);
  }
  refuseCall(fault: RefusedCall): void {
    this.#refused.push(fault);
  }
  declineNext(fault: ArrangedDecline): void {
    this.#declines.push(fault);
  }

  takeSlow(method: string, path: string): SlowAnswer | undefined {
    return take(this.#slow, method, path);
  }
  takeLost(method: string, path: string): LostAnswer | undefined {
    return take(this.#lost, method, path);
  }
  takeRefused(method: string, path: string): RefusedCall | undefined {
    return take(this.#refused, method, path);
  }
  /** The decline arranged for the next card that is asked for money. */
  takeDecline(): Decline | undefined {
    return takeAt(this.#declines, 0)?.decline;
  }

  clear(): void {
    for (const faults of [this.#slow, this.#lost, this.#refused, this.#declines]) faults.length = 0;
  }
}

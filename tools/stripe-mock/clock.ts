/** The stand-in's clock: the clock it was given plus what it was advanced by. Only a reset sets it back. */
export class Clock {
  readonly #base: () => Date;
  #offsetMs = 0;

  constructor(base: () => Date) {
    this.#base = base;
  }

  /** How far this clock is ahead of (or behind) the one it was given, in milliseconds. */
  get offsetMs(): number {
    return this.#offsetMs;
  }

  set offsetMs(offsetMs: number) {
    this.#offsetMs = offsetMs;
  }

  now(): Date {
    return new Date(this.#base().getTime() + this.#offsetMs);
  }

  /** Unix time in whole seconds, as every object of the API tells it. */
  seconds(): number {
    return Math.floor(this.now().getTime() / 1000);
  }

  advance(seconds: number): void {
    this.#offsetMs += seconds * 1000;
  }
}

export const SECONDS_PER_DAY = 86_400;

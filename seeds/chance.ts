/** Chance that falls the same way every time (mulberry32, a public-domain generator): the demo is the same on every machine. */
export class Chance {
  #state: number;

  constructor(seed: number) {
    this.#state = seed >>> 0;
  }

  /** A whole number from `least` to `most`, both included. */
  whole(least: number, most: number): number {
    return least + (this.#next() % (most - least + 1));
  }

  /** True in `percent` of a hundred. */
  happens(percent: number): boolean {
    return this.whole(1, 100) <= percent;
  }

  /** Some of the items, in their order. */
  some<T>(items: readonly T[], count: number): T[] {
    const chosen = new Set<number>();
    while (chosen.size < Math.min(count, items.length)) chosen.add(this.whole(0, items.length - 1));
    return items.filter((_, at) => chosen.has(at));
  }

  #next(): number {
    this.#state = (this.#state + 0x6d2b79f5) >>> 0;
    let t = this.#state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return (t ^ (t >>> 14)) >>> 0;
  }
}

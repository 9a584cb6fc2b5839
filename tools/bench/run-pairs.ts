import type { AgainstFloor, AgainstLimit } from './bench';
import { spreadOf, type Spread } from './statistics';

export interface Measured {
  /** Milliseconds. */
  readonly ours: Spread;
  readonly floor: Spread;
  /** How many times the floor, by median or by p95; a limit stands in the floor's place. */
  readonly ratio: number;
}

type Runnable = Pick<AgainstFloor, 'ours' | 'floor' | 'by'> | Pick<AgainstLimit, 'ours' | 'limitMs'>;

interface Running {
  readonly warmUps: number;
  readonly turns: number;
  /** Milliseconds from any beginning. */
  readonly clock: () => number;
}

/**
 * Times a case and its floor pair by pair, so that whatever else the machine does meets both alike; every other pair
 * the floor goes first. The first turns only warm up. A case with a limit is timed alone.
 */
export async function runPairs(timed: Runnable, { warmUps, turns, clock }: Running): Promise<Measured> {
  const times = { ours: [] as number[], floor: [] as number[] };
  const sides = [
    { work: timed.ours, taken: times.ours },
    ...('floor' in timed ? [{ work: timed.floor, taken: times.floor }] : []),
  ];
  for (let turn = 0; turn < warmUps + turns; turn++) {
    for (const { work, taken } of turn % 2 === 0 ? sides : [...sides].reverse()) {
      const started = clock();
      await work(turn);
      const ended = clock();
      if (turn >= warmUps) taken.push(ended - started);
    }
  }
  const ours = spreadOf(times.ours);
  const floor = 'floor' in timed ? spreadOf(times.floor) : { median: timed.limitMs, p95: timed.limitMs };
  const by = 'floor' in timed ? (timed.by ?? 'median') : 'p95';
  return { ours, floor, ratio: ours[by] / floor[by] };
}

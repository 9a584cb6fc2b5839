import type { BenchCase } from './bench';
import { spreadOf, type Spread } from './statistics';

export interface Measured {
  /** Milliseconds. */
  readonly ours: Spread;
  readonly floor: Spread;
  /** How many times the floor: one median over the other. */
  readonly ratio: number;
}

interface Running {
  readonly warmUps: number;
  readonly turns: number;
  /** Milliseconds from any beginning. */
  readonly clock: () => number;
}

/**
 * Times a case and its floor pair by pair, so that whatever else the machine does meets both alike; every other pair
 * the floor goes first. The first turns only warm up.
 */
export async function runPairs(
  { ours, floor }: Pick<BenchCase, 'ours' | 'floor'>,
  { warmUps, turns, clock }: Running,
): Promise<Measured> {
  const times = { ours: [] as number[], floor: [] as number[] };
  const sides = [
    { work: ours, taken: times.ours },
    { work: floor, taken: times.floor },
  ];
  for (let turn = 0; turn < warmUps + turns; turn++) {
    for (const { work, taken } of turn % 2 === 0 ? sides : [...sides].reverse()) {
      const started = clock();
      await work(turn);
      const ended = clock();
      if (turn >= warmUps) taken.push(ended - started);
    }
  }
  const measured = { ours: spreadOf(times.ours), floor: spreadOf(times.floor) };
  return { ...measured, ratio: measured.ours.median / measured.floor.median };
}

import { STATIONS, type Station, type StationTime } from '@seamwright/catalogue/domain';
import { divideUp, toSafeNumber } from '@seamwright/shared/util';

/** Whole seconds of work at a station. */
export interface StationLoad {
  readonly station: Station;
  readonly seconds: number;
}

interface Work {
  readonly pieces: number;
  readonly outGrams: number;
  readonly yieldPpm: number;
}

/**
 * Seconds at one station: set-up once + kg in × seconds per kg + pieces × seconds per piece, where kg in is kg out over
 * the yield. Exact until the end, then rounded up once to the whole second (domain: "Capacity").
 */
export function secondsAt(time: StationTime, { pieces, outGrams, yieldPpm }: Work): number {
  const perKg = divideUp(BigInt(outGrams) * 1_000_000n * BigInt(time.secondsPerKg), BigInt(yieldPpm) * 1_000n);
  return toSafeNumber(BigInt(time.setUpSeconds) + perKg + BigInt(pieces) * BigInt(time.secondsPerPiece));
}

/** Adds work up by station, in the order in which a piece passes them. */
export function addLoads(loads: readonly StationLoad[]): StationLoad[] {
  return STATIONS.flatMap((station) => {
    const seconds = loads.filter((load) => load.station === station).reduce((total, load) => total + load.seconds, 0);
    return seconds > 0 ? [{ station, seconds }] : [];
  });
}

export const totalSeconds = (loads: readonly StationLoad[]): number =>
  loads.reduce((total, { seconds }) => total + seconds, 0);

/** Whole minutes as they are shown: a minute that has begun counts. */
export const minutesOf = (seconds: number): number => Math.ceil(seconds / 60);

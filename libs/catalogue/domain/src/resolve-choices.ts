import { divideHalfUp, ok, ppm, toSafeNumber, type Ppm, type Result } from '@seamwright/shared/util';
import type { ChoiceValue, ChosenValues } from './choices';
import { chosenValues, resolveOffer, type ResolvedOffer } from './resolve-offer';
import type { SpecificationVersion, StationTime } from './specification-version';

/** A version with everything chosen: what the buyer sees of it, and what it asks of the plant. */
export interface ResolvedSpecification extends ResolvedOffer<SpecificationVersion> {
  /** The version's yield × the factor of each chosen value, rounded half up, never over 1. */
  readonly yieldPpm: Ppm;
  readonly stations: readonly StationTime[];
}

/** As `resolveOffer`, with yield and work. */
export function resolveChoices(version: SpecificationVersion, chosen: ChosenValues): Result<ResolvedSpecification> {
  const offer = resolveOffer(version, chosen);
  if (!offer.ok) return offer;
  const values = chosenValues<ChoiceValue>(version, offer.value.chosen);
  return ok({
    ...offer.value,
    yieldPpm: yieldWith(version.yieldPpm, values),
    stations: worked(version.stations, values),
  });
}

function yieldWith(base: Ppm, values: readonly ChoiceValue[]): Ppm {
  const [over, under] = values.reduce(
    ([n, d], { yieldFactorPpm }) => [n * BigInt(yieldFactorPpm), d * 1_000_000n],
    [BigInt(base), 1n],
  );
  return ppm(Math.min(1_000_000, toSafeNumber(divideHalfUp(over, under))));
}

function worked(stations: readonly StationTime[], values: readonly ChoiceValue[]): StationTime[] {
  const usual = stations.findLast(({ station }) => station !== 'packing')?.station ?? 'trimming';
  const times = new Map(stations.map((time) => [time.station, time]));
  for (const { extraSecondsPerKg, extraSecondsPerPiece, station: at = usual } of values) {
    if (extraSecondsPerKg === 0 && extraSecondsPerPiece === 0) continue;
    const before = times.get(at) ?? { station: at, setUpSeconds: 0, secondsPerKg: 0, secondsPerPiece: 0 };
    times.set(at, {
      ...before,
      secondsPerKg: Math.max(0, before.secondsPerKg + extraSecondsPerKg),
      secondsPerPiece: Math.max(0, before.secondsPerPiece + extraSecondsPerPiece),
    });
  }
  return [...times.values()];
}

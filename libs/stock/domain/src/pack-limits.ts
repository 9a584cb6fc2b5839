import { grams, ok, refuse, type Grams, type Result } from '@seamwright/shared/util';

/** What one piece may weigh, from the resolved specification. */
export interface PieceLimits {
  readonly minGrams: number;
  readonly maxGrams: number;
}

export interface PackLimits {
  readonly minGrams: Grams;
  readonly maxGrams: Grams;
}

/** Limits of a pack's net weight: pieces × piece limits, both ends allowed. Throws RangeError without a piece. */
export function packLimits({ piece }: { readonly piece: PieceLimits }, pieces: number): PackLimits {
  if (!Number.isInteger(pieces) || pieces < 1) throw new RangeError('A pack holds at least one whole piece');
  return { minGrams: grams(piece.minGrams * pieces), maxGrams: grams(piece.maxGrams * pieces) };
}

export const withinLimits = (limits: PackLimits, netGrams: number): boolean =>
  limits.minGrams <= netGrams && netGrams <= limits.maxGrams;

/** `net = gross − tare`. Refuses with `net-not-positive` (gross, tare) when nothing is left. */
export function netWeight(grossGrams: number, tareGrams: number): Result<Grams> {
  const net = grossGrams - tareGrams;
  return net > 0 ? ok(grams(net)) : refuse('net-not-positive', { gross: grossGrams, tare: tareGrams }, '/grossGrams');
}

/**
 * Judges a weighed pack. Inside its limits it needs nothing more; outside it needs a reason, else it is refused with
 * `pack-out-of-limits` (net, min, max in grams).
 */
export function judgePack(
  limits: PackLimits,
  netGrams: number,
  reason: string | null,
): Result<{ readonly outOfLimits: boolean; readonly reason: string | null }> {
  if (withinLimits(limits, netGrams)) return ok({ outOfLimits: false, reason: null });
  const given = reason?.trim() ?? '';
  return given === ''
    ? refuse('pack-out-of-limits', { net: netGrams, min: limits.minGrams, max: limits.maxGrams }, '/reason')
    : ok({ outOfLimits: true, reason: given });
}

import { compareFractions, fraction, type Fraction } from '@seamwright/shared/util';
import type { Blend } from './cutting-scheme';

interface WeighedTrim {
  /** Whole grams, or any other whole weights of one unit. */
  readonly weight: number;
  /** Per cent. */
  readonly visualLean: number;
  readonly tolerance: number;
}

/** Visual lean in per cent, exact: as stated, and with every trim at its least and at its most. */
export interface BlendLean {
  readonly stated: Fraction;
  readonly least: Fraction;
  readonly most: Fraction;
}

/** Visual lean of a mixture, each trim weighted by its grams. Throws RangeError when nothing is weighed. */
export function blendLean(trims: readonly WeighedTrim[]): BlendLean {
  const total = trims.reduce((sum, { weight }) => sum + BigInt(weight), 0n);
  const mean = (leanOf: (trim: WeighedTrim) => number): Fraction =>
    fraction(
      trims.reduce((sum, trim) => sum + BigInt(trim.weight) * BigInt(leanOf(trim)), 0n),
      total,
    );
  return {
    stated: mean(({ visualLean }) => visualLean),
    least: mean(({ visualLean, tolerance }) => Math.max(0, visualLean - tolerance)),
    most: mean(({ visualLean, tolerance }) => Math.min(100, visualLean + tolerance)),
  };
}

/** Whether that mixture is within a blend's band as stated, and whether it stays there whatever the tolerances do. */
export function leanWithin(
  { leastLean, mostLean }: Pick<Blend, 'leastLean' | 'mostLean'>,
  { stated, least, most }: BlendLean,
): 'always' | 'as-stated' | 'no' {
  const inside = (value: Fraction): boolean =>
    compareFractions(value, fraction(BigInt(leastLean))) >= 0 &&
    compareFractions(value, fraction(BigInt(mostLean))) <= 0;
  if (!inside(stated)) return 'no';
  return inside(least) && inside(most) ? 'always' : 'as-stated';
}

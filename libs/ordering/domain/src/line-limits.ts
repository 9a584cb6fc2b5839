import { ok, refuse, type Result } from '@seamwright/shared/util';

/** The heaviest that one line may come to, in grams: more is a mistyped quantity, or a talk with the desk. */
export const MOST_LINE_GRAMS = 5_000_000;

/** Refuses with `line-too-heavy` (grams, most), pointing at `/quantity`, what no van could carry. */
export function checkLineWeight(maxGrams: number): Result<true> {
  return maxGrams > MOST_LINE_GRAMS
    ? refuse('line-too-heavy', { grams: maxGrams, most: MOST_LINE_GRAMS }, '/quantity')
    : ok(true);
}

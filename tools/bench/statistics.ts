/**
 * The value below which the given share of a sample lies, between neighbours in proportion.
 * @param share from 0 to 1
 */
export function quantile(sample: readonly number[], share: number): number {
  if (sample.length === 0) throw new RangeError('An empty sample has no quantiles');
  const sorted = [...sample].sort((one, other) => one - other);
  const place = (sorted.length - 1) * share;
  const below = sorted[Math.floor(place)] ?? 0;
  const above = sorted[Math.ceil(place)] ?? below;
  return below + (above - below) * (place - Math.floor(place));
}

export const median = (sample: readonly number[]): number => quantile(sample, 0.5);

/** What is told of a sample: half of it was faster than the median, all but one in twenty than the 95th percentile. */
export interface Spread {
  readonly median: number;
  readonly p95: number;
}

export const spreadOf = (sample: readonly number[]): Spread => ({
  median: median(sample),
  p95: quantile(sample, 0.95),
});

import { median, quantile, spreadOf } from './statistics';

it('takes the middle of an odd sample and between the middle two of an even one', () => {
  expect(median([9, 1, 5])).toBe(5);
  expect(median([4, 1, 3, 2])).toBe(2.5);
});

it('goes in proportion between neighbours', () => {
  const oneToTwentyOne = Array.from({ length: 21 }, (_, at) => at + 1);
  expect(quantile(oneToTwentyOne, 0.95)).toBe(20);
  expect(quantile([10, 20], 0.95)).toBeCloseTo(19.5, 10);
  expect([quantile([3, 7], 0), quantile([3, 7], 1)]).toEqual([3, 7]);
});

it('leaves the sample in its order', () => {
  const sample = [3, 1, 2];
  expect(spreadOf(sample)).toEqual({ median: 2, p95: 2.9 });
  expect(sample).toEqual([3, 1, 2]);
});

it('refuses an empty sample', () => {
  expect(() => median([])).toThrow(RangeError);
});

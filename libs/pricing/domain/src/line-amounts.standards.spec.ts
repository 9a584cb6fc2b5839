import { lineAmounts } from './line-amounts';

/** The amount of so many grams at so many pence per kg. */
const amount = (estimateGrams: number, priceMinorPerKg: number) => {
  const answer = lineAmounts('kg', priceMinorPerKg, {
    pieces: 1,
    cases: null,
    minGrams: estimateGrams,
    estimateGrams,
    maxGrams: estimateGrams,
  });
  return answer.ok ? answer.value.estimateMinor : null;
};

describe('half-up rounding of a line amount', () => {
  // Half-up to two places as commonly tabulated, computed with exact decimals (common practice, no published source):
  // 2.345 → 2.35, 2.355 → 2.36, 0.125 → 0.13, 0.135 → 0.14; 1.005 → 1.01, which binary floats get wrong as they do 2.345.
  it.each([
    [469, 500, 235],
    [471, 500, 236],
    [125, 100, 13],
    [135, 100, 14],
    [1005, 100, 101],
  ])('%i g at %i p per kg is %i p', (weight, price, expected) => {
    expect(amount(weight, price)).toBe(expected);
  });

  // To whole pounds in pence: 2.5 → 3 and 3.5 → 4 of the same table.
  it.each([
    [5, 500, 3],
    [7, 500, 4],
  ])('%i g at %i p per kg is %i p', (weight, price, expected) => {
    expect(amount(weight, price)).toBe(expected);
  });
});

import { divideHalfUp } from './rounding';

// Source: worked with exact decimals (no published table); 2.345 and 1.005 are the values binary floats get wrong.
describe('half-up rounding, worked values', () => {
  it.each([
    ['2.345', 2345n, 10n, 235n],
    ['2.355', 2355n, 10n, 236n],
    ['0.125', 125n, 10n, 13n],
    ['0.135', 135n, 10n, 14n],
    ['1.005', 1005n, 10n, 101n],
    ['2.5 to no decimals', 25n, 10n, 3n],
    ['3.5 to no decimals', 35n, 10n, 4n],
    ['-0.125, away from zero', -125n, 10n, -13n],
  ])('%s', (_name, thousandths, unit, rounded) => {
    expect(divideHalfUp(thousandths, unit)).toBe(rounded);
  });
});

import fc from 'fast-check';
import { grams } from './weight';
import { formatKg, formatKgWithUnit, parseKg } from './weight-text';

describe('writing a weight', () => {
  it('shows three decimals, and the unit after a space that never breaks', () => {
    expect(formatKg(grams(12_480))).toBe('12.480');
    expect(formatKg(grams(5))).toBe('0.005');
    expect(formatKg(grams(-1_234_500))).toBe('-1,234.500');
    expect(formatKg(grams(12_480), 'de-DE')).toBe('12,480');
    expect(formatKgWithUnit(grams(12_480))).toBe('12.480\u00a0kg');
    expect(formatKg(grams(9007199254740991))).toBe('9,007,199,254,740.991');
  });
});

describe('reading a weight', () => {
  it.each([
    ['12.48', 12_480],
    ['12,48', 12_480],
    ['12,480', 12_480],
    ['12.480 kg', 12_480],
    ['12.480\u2009kg', 12_480],
    ['12.480\u00a0kg', 12_480],
    ['1,234.5', 1_234_500],
    ['1.234,5', 1_234_500],
    ['12', 12_000],
    ['.005', 5],
    ['0', 0],
  ])('takes %p as %d g', (text, expected) => {
    expect(parseKg(text)).toEqual({ ok: true, value: expected });
  });

  it.each([
    ['', 'weight-unreadable'],
    ['kg', 'weight-unreadable'],
    ['12 lb', 'weight-unreadable'],
    ['1e3', 'weight-unreadable'],
    ['1,234,567', 'weight-unreadable'],
    ['12.4805', 'weight-too-many-decimals'],
    ['-1', 'weight-negative'],
    ['9007199254740.992', 'weight-too-large'],
  ])('refuses %p: %s', (text, code) => {
    const result = parseKg(text);
    expect(result.ok ? undefined : result.refusal.code).toBe(code);
  });

  it('gives back every weight that was written', () => {
    fc.assert(
      fc.property(fc.maxSafeNat(), fc.constantFrom('en-GB', 'de-DE', 'fr-FR'), (weight, locale) => {
        expect(parseKg(formatKgWithUnit(grams(weight), locale))).toEqual({ ok: true, value: weight });
      }),
    );
  });
});

import fc from 'fast-check';
import { inForce, overlap, withoutDays, type Validity } from './validity';

const span = (validFrom: string, validUntil: string | null): Validity => ({ validFrom, validUntil });

describe('validity', () => {
  it('keeps what lies before and after the days that are taken', () => {
    expect(withoutDays(span('2026-01-01', null), span('2026-12-01', '2027-01-01'))).toEqual([
      span('2026-01-01', '2026-12-01'),
      span('2027-01-01', null),
    ]);
  });

  it('keeps nothing of what is wholly taken, and all of what is not touched', () => {
    expect(withoutDays(span('2026-12-05', '2026-12-09'), span('2026-12-01', null))).toEqual([]);
    const before = span('2026-11-01', '2026-12-01');
    expect(withoutDays(before, span('2026-12-01', null))).toEqual([before]);
  });

  const day = fc.integer({ min: 1, max: 28 }).map((n) => `2026-02-${String(n).padStart(2, '0')}`);
  const validity = fc
    .tuple(day, fc.option(day))
    .filter(([from, until]) => until === null || from < until)
    .map(([from, until]) => span(from, until));

  it('leaves every day in exactly one of what is left and what was taken, and nothing that overlaps', () => {
    fc.assert(
      fc.property(validity, validity, day, (old, taken, on) => {
        const left = withoutDays(old, taken);
        expect(left.some((part) => inForce(part, on))).toBe(inForce(old, on) && !inForce(taken, on));
        expect(left.some((part) => overlap(part, taken))).toBe(false);
        expect(left.every(({ validFrom, validUntil }) => validUntil === null || validFrom < validUntil)).toBe(true);
      }),
    );
  });
});

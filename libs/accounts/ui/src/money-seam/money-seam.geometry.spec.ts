import fc from 'fast-check';
import type { MoneyFlow } from './money-flow';
import { ACROSS_FROM, LABEL, moneySeam } from './money-seam.geometry';

/** £18,412.60 captured; all but £42.00 of what was paid out is in the bank. */
const week: MoneyFlow = {
  capturedMinor: 1_841_260,
  refundedMinor: 14_210,
  feesMinor: 30_119,
  paidOutMinor: 1_669_317,
  returnedMinor: 0,
  otherMinor: 0,
  openingMinor: 0,
  closingMinor: 127_614,
  inBankMinor: 1_665_117,
  onItsWayMinor: 0,
  bankLessMinor: 4_200,
  bankMoreMinor: 0,
  cardsDifferMinor: 0,
};

const keys = (parts: readonly { key: string }[]) => parts.map(({ key }) => key);
const minors = fc.nat(10_000_000);
const around = fc.integer({ min: -500_000, max: 500_000 });
/** What was paid out is in the bank, on its way or missing. */
const anyFlow: fc.Arbitrary<MoneyFlow> = fc
  .record({
    capturedMinor: minors,
    refundedMinor: minors,
    feesMinor: minors,
    paidOutMinor: minors,
    returnedMinor: minors,
    otherMinor: around,
    openingMinor: around,
    closingMinor: around,
    cardsDifferMinor: minors,
    bankMoreMinor: fc.nat(90_000),
    late: fc.nat(100),
    missing: fc.nat(100),
  })
  .map(({ late, missing, ...flow }) => {
    const onItsWayMinor = Math.floor((flow.paidOutMinor * late) / 200);
    const bankLessMinor = Math.floor((flow.paidOutMinor * missing) / 200);
    const inBankMinor = flow.paidOutMinor - onItsWayMinor - bankLessMinor + flow.bankMoreMinor;
    return { ...flow, onItsWayMinor, bankLessMinor, inBankMinor };
  });

describe('the money seam', () => {
  it('draws widths in proportion to amounts', () => {
    const { ribbons } = moneySeam(week, 1_240);
    const width = (key: string) => ribbons.find((ribbon) => ribbon.key === key)?.width ?? 0;
    expect(keys(ribbons)).toEqual(['paid-out', 'closing', 'fees', 'refunds', 'bank', 'bank-less']);
    expect(width('paid-out')).toBeCloseTo((150 * 1_669_317) / 1_841_260, 0);
    expect(width('closing') / width('paid-out')).toBeCloseTo(127_614 / 1_669_317, 2);
  });

  it('breaks where money is unexplained, and only there', () => {
    expect(keys(moneySeam(week, 1_240).breaks)).toEqual(['bank-less']);
    const whole = { ...week, bankLessMinor: 0, inBankMinor: week.paidOutMinor };
    expect(moneySeam(whole, 1_240).breaks).toEqual([]);
    const more = { ...whole, inBankMinor: week.paidOutMinor + 500, bankMoreMinor: 500, cardsDifferMinor: 900 };
    expect(keys(moneySeam(more, 1_240).breaks)).toEqual(['cards-differ', 'bank-more']);
  });

  it('shows a penny that is missing', () => {
    const penny = { ...week, bankLessMinor: 1, inBankMinor: week.paidOutMinor - 1 };
    const less = moneySeam(penny, 1_240).ribbons.find(({ key }) => key === 'bank-less');
    expect(less?.width).toBeGreaterThanOrEqual(1.5);
  });

  it('lets what is below zero go the other way', () => {
    const owed = { ...week, closingMinor: -5_000, otherMinor: -700 };
    const { labels } = moneySeam(owed, 1_240);
    expect(labels).toEqual(
      expect.arrayContaining([
        expect.objectContaining({ key: 'closing', minor: 5_000, anchor: 'end' }),
        expect.objectContaining({ key: 'other', minor: 700 }),
      ]),
    );
  });

  it('runs down a phone instead of across it', () => {
    const across = moneySeam(week, ACROSS_FROM);
    const down = moneySeam(week, 326);
    const lies = (picture: typeof across) => picture.posts.every(({ width, height }) => width === 8 || height === 8);
    expect(lies(across)).toBe(true);
    expect(down.height).toBeGreaterThan(across.height);
    expect(down.labels.every(({ anchor }) => anchor === 'start')).toBe(true);
  });

  it('draws nothing of nothing', () => {
    const none = Object.fromEntries(Object.keys(week).map((key) => [key, 0])) as unknown as MoneyFlow;
    expect(moneySeam(none, 1_240)).toMatchObject({ ribbons: [], posts: [], labels: [], breaks: [] });
  });

  it('stays in its box with no label of a column on another, whatever the week was', () => {
    fc.assert(
      fc.property(anyFlow, fc.integer({ min: 300, max: 1_600 }), (flow, width) => {
        const picture = moneySeam(flow, width);
        for (const { x, y, width: wide, height } of picture.posts) {
          expect(x).toBeGreaterThanOrEqual(0);
          expect(x + wide).toBeLessThanOrEqual(width);
          expect(y + height).toBeLessThanOrEqual(picture.height);
        }
        for (const one of picture.labels)
          for (const other of picture.labels)
            if (one !== other && one.x === other.x && one.anchor === other.anchor)
              expect(Math.abs(one.y - other.y)).toBeGreaterThanOrEqual(LABEL - 0.1);
      }),
      { numRuns: 100 },
    );
  });
});

import fc from 'fast-check';
import { grams, type Quantity } from '@seamwright/shared/util';
import { PRICE_BASES, PRICE_LEVELS, type PriceCandidate } from './price-candidate';
import { resolvePrice, type PriceQuestion } from './resolve-price';
import { inForce } from './validity';

const aLine = (line: Partial<PriceCandidate> = {}): PriceCandidate => ({
  lineId: 'line',
  level: 'base',
  listName: 'Base list',
  basis: 'kg',
  priceMinor: 1000,
  choiceKey: null,
  validFrom: '2026-01-01',
  validUntil: null,
  breaks: [],
  quoteNumber: null,
  ...line,
});

const pieces = (count: number): Quantity => ({ unit: 'piece', count });

const ask = (candidates: readonly PriceCandidate[], question: Partial<PriceQuestion> = {}) =>
  resolvePrice({
    candidates,
    deliveryDay: '2026-12-04',
    choiceKey: 'trim=6',
    quantity: pieces(10),
    priceChangeMinorPerKg: 0,
    piece: { nominalGrams: 500, piecesPerCase: 8 },
    ...question,
  });

const priceOf = (answer: ReturnType<typeof ask>) => (answer.ok ? answer.value.priceMinor : answer.refusal.code);

describe('price resolution', () => {
  it('takes the most specific level, also when a wider one is cheaper', () => {
    const answer = ask([
      aLine({ level: 'base', priceMinor: 800 }),
      aLine({ level: 'group', priceMinor: 900 }),
      aLine({ level: 'customer', priceMinor: 1100 }),
    ]);
    expect(answer).toMatchObject({ ok: true, value: { level: 'customer', priceMinor: 1100 } });
  });

  it('says of every candidate what became of it', () => {
    const answer = ask([
      aLine({ level: 'base' }),
      aLine({ level: 'customer', listName: 'Last year', validUntil: '2026-12-04' }),
      aLine({ level: 'customer', listName: 'This year', validFrom: '2026-12-04' }),
      aLine({ level: 'agreement', listName: 'Agreed', choiceKey: 'trim=3', quoteNumber: 201 }),
    ]);
    expect(answer.ok && answer.value.candidates.map(({ listName, outcome }) => [listName, outcome])).toEqual([
      ['Agreed', 'other-choices'],
      ['This year', 'won'],
      ['Last year', 'not-in-force'],
      ['Base list', 'lost-to-more-specific'],
    ]);
  });

  it('is "price on request", never zero, when no line is in force', () => {
    expect(priceOf(ask([]))).toBe('price-on-request');
    expect(priceOf(ask([aLine({ validFrom: '2026-12-05' })]))).toBe('price-on-request');
    expect(priceOf(ask([aLine({ priceMinor: 300 })], { priceChangeMinorPerKg: -300 }))).toBe('price-on-request');
  });

  it('ends on the day before its last, which is not part of it', () => {
    const line = aLine({ validFrom: '2026-12-01', validUntil: '2026-12-05' });
    expect(priceOf(ask([line], { deliveryDay: '2026-12-04' }))).toBe(1000);
    expect(priceOf(ask([line], { deliveryDay: '2026-12-05' }))).toBe('price-on-request');
  });

  it('takes the highest break that the ordered quantity reaches', () => {
    const line = aLine({
      breaks: [
        { fromQuantity: 10_000, priceMinor: 950 },
        { fromQuantity: 25_000, priceMinor: 900 },
      ],
    });
    expect(priceOf(ask([line], { quantity: pieces(19) }))).toBe(1000);
    expect(priceOf(ask([line], { quantity: pieces(20) }))).toBe(950);
    expect(priceOf(ask([line], { quantity: { unit: 'case', count: 7 } }))).toBe(900);
  });

  it('counts "about 10 kg" as 10 kg, though whole pieces come to less', () => {
    const line = aLine({ breaks: [{ fromQuantity: 10_000, priceMinor: 950 }] });
    const quantity: Quantity = { unit: 'kg', grams: grams(10_000), notLess: false };
    expect(priceOf(ask([line], { quantity, piece: { nominalGrams: 3_800, piecesPerCase: 2 } }))).toBe(950);
  });

  it('counts breaks of a case price in whole cases', () => {
    const line = aLine({ basis: 'case', priceMinor: 4000, breaks: [{ fromQuantity: 2, priceMinor: 3800 }] });
    expect(priceOf(ask([line], { quantity: pieces(15) }))).toBe(4000);
    expect(priceOf(ask([line], { quantity: pieces(16) }))).toBe(3800);
  });

  it("adds the choices' change per kg, and on the nominal weight of a piece or case, half a penny up", () => {
    const change = { priceChangeMinorPerKg: 45 };
    expect(priceOf(ask([aLine()], change))).toBe(1045);
    // 500 g × 45p per kg is 22.5p; a case of 8 is 4 kg.
    expect(priceOf(ask([aLine({ basis: 'piece' })], change))).toBe(1023);
    expect(priceOf(ask([aLine({ basis: 'case' })], change))).toBe(1180);
  });

  it('adds nothing to a price that was agreed for these very choices', () => {
    const agreed = aLine({ level: 'agreement', choiceKey: 'trim=6', priceMinor: 970 });
    expect(priceOf(ask([agreed, aLine()], { priceChangeMinorPerKg: 45 }))).toBe(970);
  });

  const day = fc.integer({ min: 1, max: 28 }).map((n) => `2026-12-${String(n).padStart(2, '0')}`);
  const line: fc.Arbitrary<PriceCandidate> = fc.record({
    lineId: fc.uuid(),
    level: fc.constantFrom(...PRICE_LEVELS),
    listName: fc.constant('A list'),
    basis: fc.constantFrom(...PRICE_BASES),
    priceMinor: fc.integer({ min: 1, max: 1_000_000 }),
    choiceKey: fc.constantFrom(null, 'trim=6', 'trim=3'),
    validFrom: day,
    validUntil: fc.option(day),
    breaks: fc.uniqueArray(
      fc.record({
        fromQuantity: fc.integer({ min: 2, max: 100_000 }),
        priceMinor: fc.integer({ min: 1, max: 1_000_000 }),
      }),
      { maxLength: 4, selector: ({ fromQuantity }) => fromQuantity },
    ),
    quoteNumber: fc.constant(null),
  });
  const lines = fc.array(line, { maxLength: 8 });
  const count = fc.integer({ min: 1, max: 5_000 });
  const change = fc.integer({ min: -500, max: 500 });

  it('never lets a line win while a more specific one is in force', () => {
    fc.assert(
      fc.property(lines, day, count, (candidates, deliveryDay, n) => {
        const answer = ask(candidates, { deliveryDay, quantity: pieces(n) });
        const eligible = candidates.filter(
          (each) => inForce(each, deliveryDay) && (each.choiceKey === null || each.choiceKey === 'trim=6'),
        );
        if (!answer.ok) return eligible.length === 0;
        const best = Math.min(...eligible.map(({ level }) => PRICE_LEVELS.indexOf(level)));
        return PRICE_LEVELS[best] === answer.value.level;
      }),
    );
  });

  it('answers the same whatever order the candidates come in, with one winner, and with parts that add up', () => {
    fc.assert(
      fc.property(
        lines.chain((all) => fc.tuple(fc.constant(all), fc.shuffledSubarray(all, { minLength: all.length }))),
        day,
        count,
        change,
        ([candidates, shuffled], deliveryDay, n, priceChangeMinorPerKg) => {
          const question = { deliveryDay, quantity: pieces(n), priceChangeMinorPerKg };
          const answer = ask(candidates, question);
          expect(ask(shuffled, question)).toEqual(answer);
          if (!answer.ok) return;
          const { parts, priceMinor, candidates: considered } = answer.value;
          expect(priceMinor).toBeGreaterThan(0);
          expect(parts.reduce((sum, { minor }) => sum + minor, 0)).toBe(priceMinor);
          expect(considered).toHaveLength(candidates.length);
          expect(considered.filter(({ outcome }) => outcome === 'won')).toHaveLength(1);
        },
      ),
    );
  });
});

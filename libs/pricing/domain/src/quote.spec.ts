import type { PlantDate } from '@seamwright/shared/util';
import { agreementValidity, answerQuote, checkQuoteDates, checkQuotedPrices } from './quote';
import { QUOTE_STATES, quoteStates } from './quote.states';

const day = (text: string) => text as PlantDate;
const today = day('2026-12-01');
const dates = (of: { pricesFrom?: string; pricesUntil?: string; answerBy?: string } = {}) => ({
  pricesFrom: day(of.pricesFrom ?? '2026-12-07'),
  pricesUntil: day(of.pricesUntil ?? '2027-01-31'),
  answerBy: day(of.answerBy ?? '2026-12-11'),
});
const codeOf = (result: { ok: boolean; refusal?: { code: string } }) => result.refusal?.code ?? 'fine';

describe('a quote', () => {
  it.each([
    ['fine', {}],
    ['fine', { pricesFrom: '2026-12-07', pricesUntil: '2026-12-07', answerBy: '2026-12-07' }],
    ['quote-prices-backwards', { pricesUntil: '2026-12-06' }],
    ['quote-answer-past', { answerBy: '2026-11-30' }],
    ['quote-answer-after-prices', { answerBy: '2027-02-01' }],
  ])('says %s of its days %j', (code, of) => {
    expect(codeOf(checkQuoteDates(dates(of), today))).toBe(code);
  });

  it('quotes a specification with the same choices once only', () => {
    const line = (choiceKey: string) => ({ specificationId: 's', choiceKey, basis: 'kg' as const, priceMinor: 900 });
    expect(checkQuotedPrices([line('trim=6'), line('trim=3')]).ok).toBe(true);
    expect(checkQuotedPrices([line('trim=6'), line('trim=3'), line('trim=6')])).toMatchObject({
      refusal: { code: 'quote-line-twice', pointer: '/lines/2' },
    });
  });

  it('can be answered on its last day, not after it, even before it is marked as expired', () => {
    const quote = { state: 'sent' as const, answerBy: day('2026-12-11') };
    expect(answerQuote(quote, 'accept', day('2026-12-11'))).toEqual({ ok: true, value: 'accepted' });
    expect(answerQuote(quote, 'decline', day('2026-12-11'))).toEqual({ ok: true, value: 'declined' });
    expect(codeOf(answerQuote(quote, 'accept', day('2026-12-12')))).toBe('quote-expired');
  });

  it.each([
    ['draft', 'quote-not-sent'],
    ['accepted', 'quote-answered'],
    ['declined', 'quote-answered'],
    ['expired', 'quote-expired'],
  ] as const)('refuses an answer while %s with %s', (state, code) => {
    expect(codeOf(answerQuote({ state, answerBy: day('2026-12-11') }, 'accept', today))).toBe(code);
  });

  it('ends once answered or expired', () => {
    const ends = QUOTE_STATES.filter((state) => quoteStates.allowedMoves(state).length === 0);
    expect(ends).toEqual(['accepted', 'declined', 'expired']);
  });

  it('becomes an agreement up to and including its last day', () => {
    expect(agreementValidity(dates({ pricesUntil: '2026-12-31' }))).toEqual({
      validFrom: '2026-12-07',
      validUntil: '2027-01-01',
    });
  });
});

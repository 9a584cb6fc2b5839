import { paymentWords } from './order-payment';
import { orderStages, type OrderLife } from './order-seam';
import { changeWords } from './order-history';
import { quantityWords } from './order-words';

const aLife = (stated: Partial<OrderLife> = {}): OrderLife => ({
  stage: 'confirmed',
  placedAt: '2026-12-01T12:00:00Z',
  releasedAt: null,
  packedAt: null,
  cancelledAt: null,
  deliveryDay: '2026-12-02',
  ...stated,
});
const knots = (order: OrderLife) => orderStages(order, 'en-GB').map(({ label, state }) => `${label}: ${state}`);

describe('the seam of an order', () => {
  it('turns solid as its stages are passed', () => {
    expect(knots(aLife())).toEqual([
      'Placed: passed',
      'Confirmed: now',
      'Cutting: ahead',
      'Packed: ahead',
      'Delivery: ahead',
    ]);
    expect(knots(aLife({ stage: 'in-work' }))).toEqual([
      'Placed: passed',
      'Confirmed: passed',
      'Cutting: now',
      'Packed: ahead',
      'Delivery: ahead',
    ]);
    expect(knots(aLife({ stage: 'done' })).every((knot) => knot.endsWith('passed'))).toBe(true);
  });

  it('says that it waits for payment, or was cancelled', () => {
    expect(knots(aLife({ stage: 'waiting' }))[1]).toBe('Waiting for payment: now');
    expect(knots(aLife({ stage: 'cancelled' }))).toEqual(['Placed: passed', 'Cancelled: now']);
  });
});

describe('words for an order', () => {
  it('say what was ordered and how many pieces it is', () => {
    expect(quantityWords({ unit: 'piece', count: 1 }, 1, 'en-GB')).toBe('1 piece');
    expect(quantityWords({ unit: 'case', count: 2 }, 24, 'en-GB')).toBe('2 cases · 24 pieces');
    expect(quantityWords({ unit: 'kg', grams: 12_000 }, 7, 'en-GB')).toBe('about 12.000\u00a0kg · 7 pieces');
    expect(quantityWords({ unit: 'kg', grams: 12_000, notLess: true }, 7, 'en-GB')).toContain('at least');
  });

  it('say how the card stands, with the amount', () => {
    const words = (state: string) =>
      paymentWords({ state, holdMinor: 7706, capturedMinor: 6074, declineCode: null }, 'GBP', 'en-GB');
    expect(words('pre-authorised').text).toContain('£77.06');
    expect(words('captured').text).toContain('£60.74');
    expect(words('declined')).toMatchObject({ tone: 'bad', word: 'Card declined' });
    expect(words('failed').word).toBe('Card not held');
    expect(words('started').word).toBe('Card being asked');
    expect(paymentWords(null, 'GBP', 'en-GB').word).toBe('On account');
  });

  it('tell the history with its reasons', () => {
    const change = { at: '', by: null, detail: { name: 'Striploin steak', pieces: 2, reason: 'no stock' } };
    expect(changeWords({ ...change, what: 'short' })).toBe('2 of Striploin steak short: no stock');
    expect(changeWords({ ...change, what: 'cancelled' })).toBe('Cancelled: no stock');
  });
});

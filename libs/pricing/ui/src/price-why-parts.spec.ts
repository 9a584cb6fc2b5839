import type { PriceAnswer } from '@seamwright/pricing/domain';
import { priceWhyParts } from './price-why-parts';

const price: PriceAnswer = {
  basis: 'kg',
  priceMinor: 1_945,
  level: 'base',
  listName: 'Base list',
  quoteNumber: null,
  parts: [
    { code: 'list-price', params: { level: 'base', list: 'Base list' }, minor: 2_000 },
    { code: 'quantity-break', params: { basis: 'kg', fromQuantity: 10_000 }, minor: -100 },
    { code: 'choices', params: { basis: 'kg', perKg: 45 }, minor: 45 },
  ],
  candidates: [
    {
      level: 'agreement',
      listName: 'Agreed prices',
      priceMinor: 7_400,
      basis: 'case',
      validFrom: '2026-11-02',
      validUntil: '2026-12-01',
      quoteNumber: 201,
      outcome: 'not-in-force',
    },
    {
      level: 'base',
      listName: 'Base list',
      priceMinor: 2_000,
      basis: 'kg',
      validFrom: '2026-01-01',
      validUntil: null,
      quoteNumber: null,
      outcome: 'won',
    },
  ],
};

describe('why a price', () => {
  const parts = priceWhyParts(price, { currency: 'GBP', locale: 'en-GB' });

  it('tells the list price, what changes it, and what it comes to', () => {
    expect(parts.slice(0, 4).map(({ label, value }) => `${label}: ${value}`)).toEqual([
      'Base list: £20.00/kg',
      expect.stringMatching(/^Ordering 10\.000.kg or more: − £1\.00$/),
      'Choices: + £0.45',
      'Price: £19.45/kg',
    ]);
    expect(parts.findIndex(({ total }) => total)).toBe(3);
  });

  it('names every price that was not used, and why', () => {
    expect(parts.slice(4)).toEqual([
      {
        label: 'Agreed by quote 201',
        value: '£74.00/case',
        note: expect.stringMatching(/in force from .*2 Nov.* until before .*1 Dec/),
      },
    ]);
  });
});

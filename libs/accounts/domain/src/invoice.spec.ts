import type { OrderLine } from '@seamwright/ordering/domain';
import { grams } from '@seamwright/shared/util';
import { invoiceFromPacks } from './invoice';
import { invoiceStanding } from './invoice-standing';

type Line = Pick<
  OrderLine,
  'id' | 'code' | 'name' | 'choiceSummary' | 'basis' | 'priceMinor' | 'pieces' | 'estimateMinor' | 'taxPpm'
>;
const aLine = (of: Partial<Line>): OrderLine =>
  ({
    id: 'a',
    code: 'BF-1',
    name: 'Steak',
    choiceSummary: '6 mm fat',
    basis: 'kg',
    priceMinor: 2400,
    pieces: 10,
    estimateMinor: 6720,
    taxPpm: 0,
    ...of,
  }) as OrderLine;
const packed = (pieces: number, net: number, packs = 1) => ({ pieces, netGrams: grams(net), packs: { length: packs } });
const order = (lines: readonly OrderLine[], deliveryChargeMinor = 650, deliveryTaxPpm = 0) => ({
  lines,
  deliveryChargeMinor,
  deliveryTaxPpm,
});

describe('invoice from packs', () => {
  it('charges weights, pieces and cases as packed, and the delivery', () => {
    const lines = [
      aLine({ id: 'a' }),
      // Three cases of twelve at £30.00: 24 of 36 pieces are two cases.
      aLine({ id: 'b', basis: 'case', priceMinor: 3000, pieces: 36, estimateMinor: 9000, choiceSummary: '' }),
      aLine({ id: 'c', basis: 'piece', priceMinor: 450, pieces: 8, estimateMinor: 3600 }),
    ];
    const packs = new Map([
      ['a', packed(10, 2811, 5)],
      ['b', packed(24, 9000, 2)],
      ['c', packed(8, 4000)],
    ]);
    const draft = invoiceFromPacks(order(lines), packs, 'Delivery');
    // 2.811 kg × £24.00 = £67.464 → £67.46
    expect(draft?.lines.map(({ netMinor }) => netMinor)).toEqual([6746, 6000, 3600, 650]);
    expect(draft?.lines.map(({ quantity }) => quantity)).toEqual([2811, 24, 8, 1]);
    expect(draft?.lines.map(({ position }) => position)).toEqual([1, 2, 3, 4]);
    expect(draft?.lines[0]?.description).toBe('BF-1 Steak, 6 mm fat');
    expect(draft?.total.totalMinor).toBe(16996);
  });

  it('takes tax per rate on the sum of its lines, half up', () => {
    const lines = [aLine({ id: 'a', basis: 'piece', estimateMinor: 33, pieces: 1, taxPpm: 50_000 })];
    const twice = [...lines, { ...(lines[0] as OrderLine), id: 'b' }];
    const packs = new Map([
      ['a', packed(1, 100)],
      ['b', packed(1, 100)],
    ]);
    // 5 % of 66 is 3.30 → 3; line by line it would be 1.65 → 2, twice.
    expect(invoiceFromPacks(order(twice, 0), packs, '')?.total).toMatchObject({ netMinor: 66, taxMinor: 3 });
  });

  it('leaves a line without packs off, and makes none when nothing was packed', () => {
    const lines = [aLine({ id: 'a' }), aLine({ id: 'b' })];
    const draft = invoiceFromPacks(order(lines), new Map([['b', packed(10, 2800)]]), 'Delivery');
    expect(draft?.lines.map(({ orderLineId }) => orderLineId)).toEqual(['b', null]);
    expect(invoiceFromPacks(order(lines), new Map(), 'Delivery')).toBeNull();
  });
});

describe('standing of an invoice', () => {
  const invoice = { totalMinor: 7850, paidMinor: 7706, dueOn: '2026-12-15' };
  it.each([
    [{ ...invoice, paidMinor: 0 }, '2026-12-15', 'open'],
    [invoice, '2026-12-15', 'part-paid'],
    [invoice, '2026-12-16', 'overdue'],
    [{ ...invoice, paidMinor: 7850 }, '2027-01-01', 'paid'],
  ] as const)('%#: on %s', (of, today, standing) => {
    expect(invoiceStanding(of, today as Parameters<typeof invoiceStanding>[1])).toBe(standing);
  });
});

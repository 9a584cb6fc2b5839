import fc from 'fast-check';
import { gramsIn, judgePack, netWeight, packedLines, packLimits, withinLimits, type Pack } from './index';

const resolved = { piece: { minGrams: 266, maxGrams: 294 } };

describe('limits of a pack', () => {
  it('are pieces × the limits of a piece', () => {
    expect(packLimits(resolved, 2)).toEqual({ minGrams: 532, maxGrams: 588 });
    expect(() => packLimits(resolved, 0)).toThrow(RangeError);
    expect(() => packLimits(resolved, 1.5)).toThrow(RangeError);
  });

  it('allow both ends', () => {
    const limits = packLimits(resolved, 1);
    expect([265, 266, 294, 295].map((net) => withinLimits(limits, net))).toEqual([false, true, true, false]);
  });
});

describe('a weighed pack', () => {
  it('needs no reason inside its limits, and keeps none', () => {
    expect(judgePack(packLimits(resolved, 1), 287, 'thick end')).toEqual({
      ok: true,
      value: { outOfLimits: false, reason: null },
    });
  });

  it('is refused outside them without a reason, with the limits, and kept with one', () => {
    const limits = packLimits(resolved, 1);
    for (const reason of [null, '  ']) {
      expect(judgePack(limits, 301, reason)).toMatchObject({
        refusal: { code: 'pack-out-of-limits', params: { net: 301, min: 266, max: 294 }, pointer: '/reason' },
      });
    }
    expect(judgePack(limits, 301, ' customer agreed ')).toEqual({
      ok: true,
      value: { outOfLimits: true, reason: 'customer agreed' },
    });
  });

  it('weighs gross less tare, and more than nothing', () => {
    expect(netWeight(299, 12)).toEqual({ ok: true, value: 287 });
    expect(netWeight(12, 12)).toMatchObject({ refusal: { code: 'net-not-positive' } });
  });
});

describe('grams in by simple yield', () => {
  it('is rounded up once', () => {
    expect(gramsIn(1, 1_000_000)).toBe(1);
    expect(gramsIn(1, 600_000)).toBe(2);
    expect(gramsIn(0, 600_000)).toBe(0);
    expect(() => gramsIn(1, 0)).toThrow(RangeError);
  });

  it('is the least whole weight that gives what is wanted', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 10_000_000 }), fc.integer({ min: 1, max: 1_000_000 }), (out, yieldPpm) => {
        const needed = BigInt(gramsIn(out, yieldPpm));
        expect(needed * BigInt(yieldPpm)).toBeGreaterThanOrEqual(BigInt(out) * 1_000_000n);
        expect((needed - 1n) * BigInt(yieldPpm)).toBeLessThan(BigInt(out) * 1_000_000n);
      }),
    );
  });
});

it('adds packs up by order line', () => {
  const pack = (orderLineId: string, pieces: number, netGrams: number) =>
    ({ orderId: 'O', orderLineId, pieces, netGrams }) as Pack;
  const lines = packedLines([pack('a', 2, 560), pack('b', 1, 290), pack('a', 1, 281)]);
  expect(
    [...lines.values()].map(({ orderLineId, packs, pieces, netGrams }) => [
      orderLineId,
      packs.length,
      pieces,
      netGrams,
    ]),
  ).toEqual([
    ['a', 2, 3, 841],
    ['b', 1, 1, 290],
  ]);
});

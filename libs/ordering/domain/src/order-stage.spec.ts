import type { PlantDate } from '@seamwright/shared/util';
import { checkAmendable, orderStage, type Amending, type OrderFacts } from './order-stage';

const DAY = '2026-12-03' as PlantDate;
const stage = (stated: Partial<OrderFacts>, today = '2026-12-02') =>
  orderStage(
    {
      waitingFor: [],
      releasedAt: null,
      packedAt: null,
      cancelledAt: null,
      deliveryDay: DAY,
      begun: false,
      ...stated,
    },
    today as PlantDate,
  );
const at = new Date('2026-12-02T14:00:00Z');

describe('the stage of an order', () => {
  it('follows from what happened to it', () => {
    expect(stage({ waitingFor: ['payment'] })).toBe('waiting');
    expect(stage({})).toBe('confirmed');
    expect(stage({ releasedAt: at })).toBe('released');
    expect(stage({ releasedAt: at, begun: true })).toBe('in-work');
    expect(stage({ releasedAt: at, begun: true, packedAt: at })).toBe('packed');
    expect(stage({ releasedAt: at, packedAt: at }, '2026-12-03')).toBe('packed');
    expect(stage({ releasedAt: at, packedAt: at }, '2026-12-04')).toBe('done');
    expect(stage({ waitingFor: ['payment'], cancelledAt: at })).toBe('cancelled');
  });
});

describe('changing an order', () => {
  const check = (stated: Partial<Amending>) => {
    const result = checkAmendable({ stage: 'confirmed', cutOffAt: at, now: at, by: 'desk', ...stated });
    return result.ok ? 'allowed' : result.refusal.code;
  };

  it('is the buyer’s until cut-off and the desk’s until release', () => {
    expect(check({ by: 'buyer', now: new Date(at.getTime() - 1) })).toBe('allowed');
    expect(check({ by: 'buyer' })).toBe('cut-off-passed-for-change');
    expect(check({})).toBe('allowed');
    expect(check({ stage: 'waiting' })).toBe('allowed');
    for (const settled of ['released', 'in-work', 'packed', 'done', 'cancelled'] as const)
      expect(check({ stage: settled, by: 'buyer', now: new Date(0) })).toBe('order-settled');
  });
});

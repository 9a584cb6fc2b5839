import { checkOtherCard, type WaitingOrder } from './other-card';

const answer = (stated: Partial<WaitingOrder>): string => {
  const checked = checkOtherCard({ stage: 'waiting', waitingFor: ['payment'], cardState: 'declined', ...stated });
  return checked.ok ? 'allowed' : checked.refusal.code;
};

describe('another card for an order', () => {
  it('may be tried when nothing is held on the last one and nothing will be', () => {
    for (const cardState of ['declined', 'failed', 'released', null]) expect(answer({ cardState })).toBe('allowed');
  });

  it('waits while the last one may still be held', () => {
    for (const cardState of ['started', 'needs-action', 'pre-authorised', 'capturing', 'captured', 'releasing'])
      expect(answer({ cardState })).toBe('card-still-asked');
  });

  it('is not for an order that waits for no payment', () => {
    for (const stage of ['confirmed', 'released', 'in-work', 'packed', 'done', 'cancelled'] as const)
      expect(answer({ stage })).toBe('order-waits-for-no-card');
    expect(answer({ waitingFor: ['credit'] })).toBe('order-waits-for-no-card');
  });
});

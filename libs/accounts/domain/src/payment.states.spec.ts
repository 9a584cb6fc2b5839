import fc from 'fast-check';
import { PAYMENT_STATES, paymentStates, type PaymentMove } from './payment.states';

const MOVES: readonly PaymentMove[] = [
  'ask-holder',
  'authorise',
  'decline',
  'capture',
  'take',
  'release',
  'let-go',
  'fail',
];

describe('payment states', () => {
  it('never leaves an end: declined, captured, released, failed', () => {
    for (const end of ['declined', 'captured', 'released', 'failed'] as const)
      expect(paymentStates.allowedMoves(end)).toEqual([]);
  });

  it('takes money only once, whatever moves are tried', () => {
    fc.assert(
      fc.property(fc.array(fc.constantFrom(...MOVES), { maxLength: 30 }), (moves) => {
        let state: (typeof PAYMENT_STATES)[number] = 'started';
        let taken = 0;
        for (const move of moves) {
          const next = paymentStates.next(state, move);
          if (!next.ok) continue;
          if (next.value === 'captured') taken += 1;
          state = next.value;
        }
        expect(taken).toBeLessThanOrEqual(1);
      }),
    );
  });

  it('begins to capture only what is held', () => {
    const from = PAYMENT_STATES.filter((state) => paymentStates.next(state, 'capture').ok);
    expect(from).toEqual(['pre-authorised']);
  });
});

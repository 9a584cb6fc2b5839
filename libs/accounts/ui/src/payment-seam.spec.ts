import { PAYMENT_STATES } from '@seamwright/accounts/domain';
import { paymentStages, type PaymentLife } from './payment-seam';

const life = (state: PaymentLife['state']): PaymentLife => ({
  state,
  holdMinor: 12_000,
  capturedMinor: 11_200,
  createdAt: '2026-11-30T09:05:00Z',
  capturedAt: state === 'captured' ? '2026-12-01T14:30:00Z' : null,
});
const told = (state: PaymentLife['state']) =>
  paymentStages(life(state), 'GBP', 'en-GB').map((stage) => `${stage.label} ${stage.state}`);

describe('the seam of a card payment', () => {
  it('goes from asked over held to taken', () => {
    expect(told('started')).toEqual(['Asked now', 'Held ahead', 'Taken ahead']);
    expect(told('pre-authorised')).toEqual(['Asked passed', 'Held now', 'Taken ahead']);
    expect(told('captured')).toEqual(['Asked passed', 'Held passed', 'Taken passed']);
  });

  it('ends where the payment ended', () => {
    expect(told('declined')).toEqual(['Asked passed', 'Declined now']);
    expect(told('released')).toEqual(['Asked passed', 'Held passed', 'Let go now']);
  });

  it('says what was held and what was taken, by the plant’s clock', () => {
    const notes = paymentStages(life('captured'), 'GBP', 'en-GB').map(({ note }) => note);
    expect(notes).toEqual(['30 Nov, 09:05', '£120.00', '£112.00, 1 Dec, 14:30']);
  });

  it('has a knot for every state, and one at most where it stands', () => {
    for (const state of PAYMENT_STATES) {
      const stages = paymentStages(life(state), 'GBP', 'en-GB');
      expect(stages.filter((stage) => stage.state === 'now').length).toBe(state === 'captured' ? 0 : 1);
      expect(stages.every(({ label }) => label !== '')).toBe(true);
    }
  });
});

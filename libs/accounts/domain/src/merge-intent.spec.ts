import fc from 'fast-check';
import { minorUnits } from '@seamwright/shared/util';
import { mergeIntent, type Intent } from './merge-intent';
import { letGoMinor, type Payment } from './payment';
import { PAYMENT_STATES } from './payment.states';

const NOW = new Date('2026-12-01T12:00:00Z');

const aPayment = (of: Partial<Payment> = {}): Payment => ({
  id: 'payment',
  rowVersion: 1,
  customerId: 'customer',
  orderId: 'order',
  processorMethodId: 'pm_1',
  currency: 'GBP',
  holdMinor: minorUnits(7706),
  capturedMinor: minorUnits(0),
  toCaptureMinor: null,
  state: 'started',
  processorIntentId: null,
  processorChargeId: null,
  holdEndsAt: null,
  declineCode: null,
  actionUrl: null,
  capturedAt: null,
  createdAt: NOW,
  updatedAt: NOW,
  ...of,
});

const anIntent = (of: Partial<Intent> = {}): Intent => ({
  id: 'pi_1',
  standing: 'held',
  currency: 'GBP',
  amountMinor: 7706,
  capturedMinor: 0,
  chargeId: 'ch_1',
  holdEndsAt: new Date('2026-12-08T12:00:00Z'),
  declineCode: null,
  actionUrl: null,
  paymentId: 'payment',
  ...of,
});

/** The payment after an answer was stored. */
function after(payment: Payment, intent: Intent): Payment {
  const merged = mergeIntent(payment, intent, NOW);
  if (!merged.ok) throw new Error(merged.refusal.code);
  return merged.value ? { ...payment, ...merged.value } : payment;
}

describe('merging what the processor says', () => {
  it('holds, then takes less and lets the rest go', () => {
    const held = after(aPayment(), anIntent());
    expect(held).toMatchObject({ state: 'pre-authorised', processorIntentId: 'pi_1', processorChargeId: 'ch_1' });
    const taken = after({ ...held, state: 'capturing' }, anIntent({ standing: 'captured', capturedMinor: 7370 }));
    expect(taken).toMatchObject({ state: 'captured', capturedMinor: 7370, capturedAt: NOW });
    expect(letGoMinor(taken)).toBe(336);
  });

  it('keeps where the holder confirms only while it is waited for', () => {
    const asked = after(
      aPayment(),
      anIntent({ standing: 'needs-action', actionUrl: 'https://bank.test', chargeId: null }),
    );
    expect(asked).toMatchObject({ state: 'needs-action', actionUrl: 'https://bank.test' });
    expect(after(asked, anIntent())).toMatchObject({ state: 'pre-authorised', actionUrl: null });
  });

  it('says that a hold ran out, and fails when it is gone as it is to be taken', () => {
    const canceled = anIntent({ standing: 'canceled' });
    expect(after(aPayment({ state: 'pre-authorised' }), canceled)).toMatchObject({
      state: 'released',
      declineCode: 'hold-ended',
    });
    expect(after(aPayment({ state: 'capturing' }), canceled)).toMatchObject({
      state: 'failed',
      declineCode: 'hold-ended',
    });
    expect(after(aPayment({ state: 'releasing' }), canceled)).toMatchObject({ state: 'released', declineCode: null });
  });

  it.each([
    ['another amount', { amountMinor: 7705 }],
    ['another currency', { currency: 'EUR' }],
    ['another payment', { paymentId: 'somebody-else' }],
    ['more taken than was held', { capturedMinor: 7707 }],
  ])('refuses %s', (_what, of) => {
    expect(mergeIntent(aPayment(), anIntent(of), NOW)).toMatchObject({
      ok: false,
      refusal: { code: 'intent-not-ours' },
    });
  });

  it('changes nothing on a repeat, from any state', () => {
    const standings = fc.constantFrom<Intent['standing']>(
      'open',
      'needs-action',
      'held',
      'captured',
      'declined',
      'canceled',
    );
    fc.assert(
      fc.property(fc.constantFrom(...PAYMENT_STATES), standings, (state, standing) => {
        const intent = anIntent({ standing, capturedMinor: standing === 'captured' ? 7370 : 0 });
        const once = after(aPayment({ state }), intent);
        expect(mergeIntent(once, intent, NOW)).toMatchObject({ ok: true, value: null });
      }),
    );
  });

  it('does not go back on old news once the money is taken', () => {
    const taken = aPayment({ state: 'captured', capturedMinor: minorUnits(7370), processorIntentId: 'pi_1' });
    expect(after(taken, anIntent()).state).toBe('captured');
    expect(after(taken, anIntent({ standing: 'canceled' })).state).toBe('captured');
  });
});

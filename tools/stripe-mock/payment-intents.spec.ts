import type Stripe from 'stripe';
import { errorOf, hold, MONDAY, startMock, type RunningMock } from './testing/running-mock';

let running: RunningMock;
let stripe: Stripe;

beforeEach(async () => {
  running = await startMock();
  stripe = running.stripe;
});
afterEach(async () => {
  await running.close();
  expect(running.violations).toEqual([]);
});

async function eventTypes(): Promise<string[]> {
  return (await stripe.events.list({ limit: 100 })).data.map(({ type }) => type).reverse();
}

const confirmedSteps = ['payment_intent.created', 'charge.succeeded', 'payment_intent.amount_capturable_updated'];

describe('an intent on its way', () => {
  it('asks for a card, then for confirmation, then holds the amount', async () => {
    const bare = await stripe.paymentIntents.create({ amount: 5000, currency: 'gbp', capture_method: 'manual' });
    expect(bare.status).toBe('requires_payment_method');
    const chosen = await stripe.paymentIntents.update(bare.id, { payment_method: 'pm_card_mastercard' });
    expect(chosen.status).toBe('requires_confirmation');
    const held = await stripe.paymentIntents.confirm(bare.id, {}, {});
    expect(held).toMatchObject({ status: 'requires_capture', amount_capturable: 5000, amount_received: 0 });
    expect(await eventTypes()).toEqual(confirmedSteps);
  });

  it('takes the money at once without manual capture', async () => {
    const taken = await stripe.paymentIntents.create({
      amount: 2500,
      currency: 'GBP',
      payment_method: 'pm_card_visa',
      confirm: true,
      automatic_payment_methods: { enabled: true, allow_redirects: 'never' },
    });
    expect(taken).toMatchObject({ status: 'succeeded', currency: 'gbp', amount_received: 2500 });
    expect(await eventTypes()).toEqual(['payment_intent.created', 'charge.succeeded', 'payment_intent.succeeded']);
  });

  it('changes amount and words before confirmation, and only words after it', async () => {
    const bare = await stripe.paymentIntents.create({ amount: 5000, currency: 'gbp', metadata: { a: '1', b: '2' } });
    const changed = await stripe.paymentIntents.update(bare.id, { amount: 6000, metadata: { a: '', c: '3' } });
    expect(changed).toMatchObject({ amount: 6000, metadata: { b: '2', c: '3' } });
    const held = await hold(stripe, 5000);
    await stripe.paymentIntents.update(held.id, { description: 'Order SW-1001' });
    const error = await errorOf(stripe.paymentIntents.update(held.id, { amount: 7000 }));
    expect(error.code).toBe('payment_intent_unexpected_state');
    expect(await stripe.paymentIntents.retrieve(held.id)).toMatchObject({ amount: 5000, description: 'Order SW-1001' });
  });

  it('can be canceled while it holds, and then neither captured nor canceled again', async () => {
    const held = await hold(stripe, 5000);
    const canceled = await stripe.paymentIntents.cancel(held.id, { cancellation_reason: 'abandoned' });
    expect(canceled).toMatchObject({ status: 'canceled', cancellation_reason: 'abandoned', amount_capturable: 0 });
    expect((await errorOf(stripe.paymentIntents.capture(held.id))).code).toBe('payment_intent_unexpected_state');
    expect((await errorOf(stripe.paymentIntents.cancel(held.id))).code).toBe('payment_intent_unexpected_state');
    expect((await stripe.balanceTransactions.list()).data).toEqual([]);
    expect(await eventTypes()).toEqual([...confirmedSteps, 'payment_intent.canceled']);
  });
});

describe('capture', () => {
  it('takes part of the hold and lets the rest go', async () => {
    const held = await hold(stripe, 5000);
    const captured = await stripe.paymentIntents.capture(held.id, {
      amount_to_capture: 4210,
      expand: ['latest_charge.balance_transaction'],
    });
    expect(captured).toMatchObject({
      status: 'succeeded',
      amount: 5000,
      amount_capturable: 0,
      amount_received: 4210,
      latest_charge: {
        captured: true,
        amount: 5000,
        amount_captured: 4210,
        amount_refunded: 0,
        // 1.5 % of 42.10 is 63.15 pence, half up 63, and 20 more.
        balance_transaction: { type: 'charge', amount: 4210, fee: 83, net: 4127, status: 'pending' },
      },
    });
    expect(await eventTypes()).toEqual([...confirmedSteps, 'charge.captured', 'payment_intent.succeeded']);
  });

  it('takes the whole hold when no amount is named', async () => {
    const held = await hold(stripe, 5000);
    expect((await stripe.paymentIntents.capture(held.id)).amount_received).toBe(5000);
  });

  it('is refused a second time', async () => {
    const held = await hold(stripe, 5000);
    await stripe.paymentIntents.capture(held.id, { amount_to_capture: 1000 });
    const error = await errorOf(stripe.paymentIntents.capture(held.id, { amount_to_capture: 1000 }));
    expect(error).toMatchObject({ statusCode: 400, code: 'payment_intent_unexpected_state' });
    expect(error.payment_intent).toMatchObject({ id: held.id, status: 'succeeded' });
  });

  it('is refused above the hold', async () => {
    const held = await hold(stripe, 5000);
    const error = await errorOf(stripe.paymentIntents.capture(held.id, { amount_to_capture: 5001 }));
    expect(error).toMatchObject({ code: 'amount_too_large', param: 'amount_to_capture' });
    expect((await stripe.paymentIntents.retrieve(held.id)).amount_capturable).toBe(5000);
  });
});

describe('raising a hold', () => {
  const raisable = (card: string) =>
    stripe.paymentIntents.create({
      amount: 5000,
      currency: 'gbp',
      capture_method: 'manual',
      payment_method: card,
      confirm: true,
      payment_method_options: { card: { request_incremental_authorization: 'if_available' } },
    });

  it('works upwards where the card allows it', async () => {
    const held = await raisable('pm_card_visa');
    const raised = await stripe.paymentIntents.incrementAuthorization(held.id, { amount: 6500 });
    expect(raised).toMatchObject({ amount: 6500, amount_capturable: 6500, status: 'requires_capture' });
    const error = await errorOf(stripe.paymentIntents.incrementAuthorization(held.id, { amount: 6500 }));
    expect(error.code).toBe('amount_too_small');
  });

  it('is refused where the card does not allow it or nobody asked for it', async () => {
    for (const held of [await raisable('pm_card_amex'), await hold(stripe, 5000)]) {
      const error = await errorOf(stripe.paymentIntents.incrementAuthorization(held.id, { amount: 6500 }));
      expect(error.code).toBe('payment_intent_unexpected_state');
    }
  });

  it('keeps the earlier hold when the bank declines', async () => {
    const held = await raisable('pm_card_visa');
    await running.control('/decline-next', {});
    const error = await errorOf(stripe.paymentIntents.incrementAuthorization(held.id, { amount: 6500 }));
    expect(error).toMatchObject({ type: 'StripeCardError', code: 'card_declined' });
    expect(await stripe.paymentIntents.retrieve(held.id)).toMatchObject({
      status: 'requires_capture',
      amount: 5000,
      amount_capturable: 5000,
    });
  });
});

describe('the end of a hold', () => {
  const DAYS_7 = 7 * 86_400;

  it('comes by itself after seven days', async () => {
    const held = await hold(stripe, 5000);
    await running.control('/advance-clock', { seconds: DAYS_7 - 1 });
    expect((await stripe.paymentIntents.retrieve(held.id)).status).toBe('requires_capture');
    await running.control('/advance-clock', { seconds: 1 });
    expect(await stripe.paymentIntents.retrieve(held.id)).toMatchObject({
      status: 'canceled',
      cancellation_reason: 'automatic',
      amount_capturable: 0,
      canceled_at: MONDAY.getTime() / 1000 + DAYS_7,
    });
    expect(await eventTypes()).toEqual([...confirmedSteps, 'charge.expired', 'payment_intent.canceled']);
  });

  it('does not touch what was captured in time', async () => {
    const held = await hold(stripe, 5000);
    await stripe.paymentIntents.capture(held.id);
    await running.control('/advance-clock', { seconds: 2 * DAYS_7 });
    expect((await stripe.paymentIntents.retrieve(held.id)).status).toBe('succeeded');
  });
});

describe('refused cards', () => {
  it.each([
    ['pm_card_visa_chargeDeclined', 'card_declined', 'generic_decline'],
    ['pm_card_visa_chargeDeclinedInsufficientFunds', 'card_declined', 'insufficient_funds'],
    ['pm_card_chargeDeclinedExpiredCard', 'expired_card', 'expired_card'],
    ['pm_card_chargeDeclinedIncorrectCvc', 'incorrect_cvc', 'incorrect_cvc'],
  ])('%s says %s / %s', async (card, code, declineCode) => {
    const error = await errorOf(hold(stripe, 5000, card));
    expect(error).toMatchObject({ statusCode: 402, type: 'StripeCardError', code, decline_code: declineCode });
    const intent = await stripe.paymentIntents.retrieve(error.payment_intent?.id ?? '', { expand: ['latest_charge'] });
    expect(intent).toMatchObject({
      status: 'requires_payment_method',
      payment_method: null,
      last_payment_error: { code, decline_code: declineCode },
      latest_charge: { status: 'failed', paid: false, failure_code: code },
    });
    expect(await eventTypes()).toEqual(['payment_intent.created', 'charge.failed', 'payment_intent.payment_failed']);
  });

  it('lets the buyer try again with another card', async () => {
    const error = await errorOf(hold(stripe, 5000, 'pm_card_visa_chargeDeclined'));
    const held = await stripe.paymentIntents.confirm(error.payment_intent?.id ?? '', {
      payment_method: 'pm_card_visa',
    });
    expect(held).toMatchObject({ status: 'requires_capture', last_payment_error: null });
  });

  it('declines the next card when told to, once', async () => {
    await running.control('/decline-next', { declineCode: 'lost_card', message: 'Your card was reported lost.' });
    expect(await errorOf(hold(stripe, 5000))).toMatchObject({ decline_code: 'lost_card' });
    expect((await hold(stripe, 5000)).status).toBe('requires_capture');
  });
});

describe('confirmation by the bank', () => {
  const ask = () =>
    stripe.paymentIntents.create({
      amount: 5000,
      currency: 'gbp',
      capture_method: 'manual',
      payment_method: 'pm_card_authenticationRequired',
      confirm: true,
      return_url: 'http://127.0.0.1:4200/checkout/back?order=7',
    });
  const bankPage = (intent: Stripe.PaymentIntent) => intent.next_action?.redirect_to_url?.url ?? '';
  const answerBank = (intent: Stripe.PaymentIntent, outcome: string) =>
    fetch(bankPage(intent), {
      method: 'POST',
      redirect: 'manual',
      body: new URLSearchParams({ client_secret: intent.client_secret ?? '', outcome }),
    });

  it('sends the buyer to a page and back, and then holds', async () => {
    const asked = await ask();
    expect(asked).toMatchObject({ status: 'requires_action', amount_capturable: 0 });
    const page = await fetch(bankPage(asked));
    expect(await page.text()).toContain('50.00 GBP');
    const back = await answerBank(asked, 'confirmed');
    const address = new URL(back.headers.get('location') ?? '');
    expect(back.status).toBe(303);
    expect(Object.fromEntries(address.searchParams)).toMatchObject({
      order: '7',
      payment_intent: asked.id,
      redirect_status: 'succeeded',
    });
    expect((await stripe.paymentIntents.retrieve(asked.id)).status).toBe('requires_capture');
    expect((await answerBank(asked, 'confirmed')).status).toBe(404);
  });

  it('leaves the intent without a card when the buyer refuses', async () => {
    const asked = await ask();
    expect((await answerBank(asked, 'refused')).headers.get('location')).toContain('redirect_status=failed');
    expect(await stripe.paymentIntents.retrieve(asked.id)).toMatchObject({
      status: 'requires_payment_method',
      last_payment_error: { code: 'payment_intent_authentication_failure' },
    });
  });

  it('can be played by a lever', async () => {
    const asked = await ask();
    await running.control(`/intents/${asked.id}/authenticate`, { outcome: 'confirmed' });
    expect((await stripe.paymentIntents.retrieve(asked.id)).status).toBe('requires_capture');
  });

  it('is a refusal when the buyer is not there to confirm', async () => {
    const bare = await stripe.paymentIntents.create({ amount: 5000, currency: 'gbp', capture_method: 'manual' });
    const error = await errorOf(
      stripe.paymentIntents.confirm(bare.id, { payment_method: 'pm_card_authenticationRequired', off_session: true }),
    );
    expect(error).toMatchObject({ statusCode: 402, code: 'authentication_required' });
  });
});

describe('bad parameters', () => {
  it.each([
    [{ amount: 29, currency: 'gbp' }, 'amount_too_small', 'amount'],
    [{ amount: 100_000_000, currency: 'gbp' }, 'amount_too_large', 'amount'],
    [{ amount: 12.5, currency: 'gbp' }, 'parameter_invalid', 'amount'],
    [{ currency: 'gbp' }, 'parameter_missing', 'amount'],
    [{ amount: 500, currency: 'gbp', colour: 'red' }, 'parameter_unknown', 'colour'],
    [{ amount: 500, currency: 'gbp', customer: 'cus_none' }, 'resource_missing', 'customer'],
    [{ amount: 500, currency: 'gbp', expand: ['colour'] }, undefined, 'expand'],
  ])('%j is refused with %s', async (parameters, code, param) => {
    const create = stripe.paymentIntents.create(parameters as Stripe.PaymentIntentCreateParams);
    expect(await errorOf(create)).toMatchObject({ statusCode: 400, type: 'StripeInvalidRequestError', code, param });
    expect((await stripe.paymentIntents.list()).data).toEqual([]);
  });

  it('answers 404 for an id nobody has, 401 for another key', async () => {
    expect(await errorOf(stripe.paymentIntents.retrieve('pi_none'))).toMatchObject({
      statusCode: 404,
      code: 'resource_missing',
    });
    const answer = await fetch(`${running.url}/v1/payment_intents`, { headers: { Authorization: 'Bearer sk_wrong' } });
    expect(answer.status).toBe(401);
  });
});

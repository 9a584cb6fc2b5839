import type Stripe from 'stripe';
import { errorOf, hold, KEY, startMock, type RunningMock } from './testing/running-mock';

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

const wish: Stripe.PaymentIntentCreateParams = { amount: 5000, currency: 'gbp' };
const post = (body: string, key: string) =>
  fetch(`${running.url}/v1/payment_intents`, {
    method: 'POST',
    headers: {
      Authorization: `Bearer ${KEY}`,
      'Content-Type': 'application/x-www-form-urlencoded',
      'Idempotency-Key': key,
    },
    body,
  });

it('answers the same request with the first answer, byte for byte', async () => {
  const first = await post('amount=5000&currency=gbp', 'order-1');
  const second = await post('amount=5000&currency=gbp', 'order-1');
  expect(await second.text()).toBe(await first.text());
  expect(first.headers.get('idempotent-replayed')).toBeNull();
  expect(second.headers.get('idempotent-replayed')).toBe('true');
  expect(second.headers.get('original-request')).toBe(first.headers.get('request-id'));
  expect((await stripe.paymentIntents.list()).data).toHaveLength(1);
});

it('refuses the key for other parameters or another address', async () => {
  await stripe.paymentIntents.create(wish, { idempotencyKey: 'order-1' });
  const other = await errorOf(stripe.paymentIntents.create({ ...wish, amount: 5001 }, { idempotencyKey: 'order-1' }));
  expect(other).toMatchObject({ statusCode: 400, type: 'StripeIdempotencyError' });
  const elsewhere = await errorOf(stripe.customers.create({}, { idempotencyKey: 'order-1' }));
  expect(elsewhere.type).toBe('StripeIdempotencyError');
});

it('repeats a refused card too', async () => {
  const confirm = () =>
    errorOf(
      stripe.paymentIntents.create(
        { ...wish, payment_method: 'pm_card_visa_chargeDeclined', confirm: true },
        { idempotencyKey: 'order-2' },
      ),
    );
  const first = await confirm();
  const second = await confirm();
  expect(second.payment_intent?.id).toBe(first.payment_intent?.id);
  expect((await stripe.charges.list()).data).toHaveLength(1);
});

it('does not keep a request that failed validation', async () => {
  await errorOf(stripe.paymentIntents.create({ ...wish, amount: 1 }, { idempotencyKey: 'order-3' }));
  expect(await stripe.paymentIntents.create(wish, { idempotencyKey: 'order-3' })).toMatchObject({ amount: 5000 });
});

it('forgets a key after a day', async () => {
  const first = await stripe.paymentIntents.create(wish, { idempotencyKey: 'order-4' });
  await running.control('/advance-clock', { seconds: 86_399 });
  expect((await stripe.paymentIntents.create(wish, { idempotencyKey: 'order-4' })).id).toBe(first.id);
  await running.control('/advance-clock', { seconds: 1 });
  expect((await stripe.paymentIntents.create(wish, { idempotencyKey: 'order-4' })).id).not.toBe(first.id);
});

it('lets one request at a time use a key', async () => {
  await running.control('/answer-slowly', { milliseconds: 300 });
  const slow = post('amount=5000&currency=gbp', 'order-5');
  while (running.mock.state.paymentIntents.size === 0) await new Promise(setImmediate);
  const busy = await post('amount=5000&currency=gbp', 'order-5');
  expect(busy.status).toBe(409);
  expect(await busy.json()).toMatchObject({ error: { code: 'idempotency_key_in_use' } });
  expect((await slow).status).toBe(200);
});

describe('an answer that is lost', () => {
  it.each(['error', 'disconnect'])('by %s: the same call again finds the work done once', async (how) => {
    const held = await hold(stripe, 5000);
    const capture = () =>
      stripe.paymentIntents.capture(held.id, { amount_to_capture: 4000 }, { idempotencyKey: 'capture-1' });
    // The SDK itself repeats a call whose connection broke, once; that answer is lost as well.
    await running.control('/lose-answer', { how, times: how === 'disconnect' ? 2 : 1, pathIncludes: '/capture' });
    const error = await errorOf(capture());
    expect(error.type).toBe(how === 'error' ? 'StripeAPIError' : 'StripeConnectionError');
    expect(await capture()).toMatchObject({ status: 'succeeded', amount_received: 4000 });
    expect((await stripe.balanceTransactions.list()).data).toHaveLength(1);
  });
});

it('does nothing when a call is refused before the work', async () => {
  await running.control('/refuse-call', { status: 503, method: 'POST' });
  expect((await errorOf(stripe.paymentIntents.create(wish, { idempotencyKey: 'order-6' }))).statusCode).toBe(503);
  expect((await stripe.paymentIntents.list()).data).toEqual([]);
  await running.control('/refuse-call', { status: 429 });
  expect((await errorOf(stripe.paymentIntents.list())).type).toBe('StripeRateLimitError');
  expect(await stripe.paymentIntents.create(wish, { idempotencyKey: 'order-6' })).toMatchObject({ amount: 5000 });
});

import type Stripe from 'stripe';
import { errorOf, hold, startMock, type RunningMock } from './testing/running-mock';

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

async function captured(amount: number): Promise<string> {
  const held = await hold(stripe, amount);
  return (await stripe.paymentIntents.capture(held.id)).id;
}

it('gives part back, then the rest; the fee stays paid', async () => {
  const intent = await captured(10_000);
  const part = await stripe.refunds.create({
    payment_intent: intent,
    amount: 4000,
    reason: 'requested_by_customer',
    expand: ['balance_transaction', 'charge'],
  });
  expect(part).toMatchObject({
    status: 'succeeded',
    amount: 4000,
    balance_transaction: { type: 'refund', amount: -4000, fee: 0, net: -4000 },
    charge: { amount_refunded: 4000, refunded: false },
  });
  const rest = await stripe.refunds.create({ payment_intent: intent, expand: ['charge'] });
  expect(rest).toMatchObject({ amount: 6000, charge: { amount_refunded: 10_000, refunded: true } });
  const entries = (await stripe.balanceTransactions.list()).data;
  // 1.5 % of 100.00 and 0.20 are 1.70, and they are not given back.
  expect(entries.reduce((net, entry) => net + entry.net, 0)).toBe(-170);
});

it('never gives back more than was captured', async () => {
  const held = await hold(stripe, 10_000);
  await stripe.paymentIntents.capture(held.id, { amount_to_capture: 7000 });
  const over = await errorOf(stripe.refunds.create({ payment_intent: held.id, amount: 7001 }));
  expect(over).toMatchObject({ statusCode: 400, code: 'amount_too_large', param: 'amount' });
  await stripe.refunds.create({ payment_intent: held.id, amount: 6000 });
  const second = await errorOf(stripe.refunds.create({ payment_intent: held.id, amount: 1001 }));
  expect(second.code).toBe('amount_too_large');
  await stripe.refunds.create({ payment_intent: held.id, amount: 1000 });
  const again = await errorOf(stripe.refunds.create({ payment_intent: held.id }));
  expect(again.code).toBe('charge_already_refunded');
});

it('refuses what was not captured, and what names nothing', async () => {
  const held = await hold(stripe, 10_000);
  const byIntent = await errorOf(stripe.refunds.create({ payment_intent: held.id }));
  expect(byIntent.code).toBe('payment_intent_unexpected_state');
  const byCharge = await errorOf(stripe.refunds.create({ charge: String(held.latest_charge) }));
  expect(byCharge.code).toBe('charge_not_refundable');
  expect((await errorOf(stripe.refunds.create({}))).statusCode).toBe(400);
});

it('lists by charge and tells of each', async () => {
  const first = await captured(5000);
  const second = await captured(6000);
  const refund = await stripe.refunds.create({ payment_intent: first, amount: 1000 });
  await stripe.refunds.create({ payment_intent: second, amount: 2000 });
  const changed = await stripe.refunds.update(refund.id, { metadata: { credit: 'CN-7' } });
  expect(changed.metadata).toEqual({ credit: 'CN-7' });
  expect((await stripe.refunds.list({ payment_intent: first })).data.map(({ id }) => id)).toEqual([refund.id]);
  expect((await stripe.refunds.retrieve(refund.id)).amount).toBe(1000);
  const types = (await stripe.events.list({ types: ['refund.created', 'refund.updated', 'charge.refunded'] })).data;
  expect(types.map(({ type }) => type).reverse()).toEqual([
    'refund.created',
    'charge.refunded',
    'refund.created',
    'charge.refunded',
    'refund.updated',
  ]);
});

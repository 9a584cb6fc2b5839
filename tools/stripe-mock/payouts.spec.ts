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

async function captured(amount: number, card?: string): Promise<string> {
  const held = await hold(stripe, amount, card);
  return (await stripe.paymentIntents.capture(held.id)).id;
}
const payOut = async (body: object = {}) =>
  ((await running.control('/pay-out', body)) as { payouts: Stripe.Payout[] }).payouts;
const nets = (entries: Stripe.BalanceTransaction[]) => entries.reduce((total, { net }) => total + net, 0);
const partsOf = async (payout: string) => (await stripe.balanceTransactions.list({ payout, limit: 100 })).data;
const funds = async () => {
  const { available, pending } = await stripe.balance.retrieve();
  return { available: available[0]?.amount, pending: pending[0]?.amount };
};
const nextDays = (days: number) => running.control('/advance-clock', { seconds: days * 86_400 });

it('keeps captured money pending for two days, then makes it available', async () => {
  await captured(10_000);
  expect(await funds()).toEqual({ available: 0, pending: 9830 });
  expect(await payOut()).toEqual([]);
  await nextDays(2);
  expect(await funds()).toEqual({ available: 9830, pending: 0 });
});

it('sweeps what is available; the parts add up to the payout and its own entry is the negative', async () => {
  const first = await captured(10_000);
  await captured(3333);
  await stripe.refunds.create({ payment_intent: first, amount: 2500 });
  await nextDays(2);
  await captured(8000);
  const [payout] = await payOut();
  // 100.00 − 1.70, 33.33 − (0.49995, half up 0.50, and 0.20), −25.00
  expect(payout?.amount).toBe(9830 + 3263 - 2500);
  const parts = await partsOf(payout?.id ?? '');
  expect(parts.map(({ type }) => type).sort()).toEqual(['charge', 'charge', 'refund']);
  expect(nets(parts)).toBe(payout?.amount);
  const own = await stripe.balanceTransactions.retrieve(String(payout?.balance_transaction));
  expect(own).toMatchObject({ type: 'payout', net: -(payout?.amount ?? 0), source: payout?.id });
  // 80.00 − 1.40 stays behind
  expect(await funds()).toEqual({ available: 0, pending: 7860 });
});

it('pays out what is still pending when told to, each entry once', async () => {
  await captured(10_000);
  const [first] = await payOut({ includePending: true });
  await captured(4000);
  const [second] = await payOut({ includePending: true });
  expect([first?.amount, second?.amount]).toEqual([9830, 3920]);
  expect(nets(await partsOf(second?.id ?? ''))).toBe(3920);
  expect(await payOut({ includePending: true })).toEqual([]);
});

it('is on its way after an hour and at the bank on the next day', async () => {
  await captured(10_000, 'pm_card_bypassPending');
  const [payout] = await payOut();
  const status = async () => (await stripe.payouts.retrieve(payout?.id ?? '')).status;
  expect(await status()).toBe('pending');
  await running.control('/advance-clock', { seconds: 3600 });
  expect(await status()).toBe('in_transit');
  await nextDays(1);
  expect(await status()).toBe('paid');
  const told = (await stripe.events.list({ type: 'payout.*' })).data.map(({ type }) => type);
  expect(told).toEqual(['payout.paid', 'payout.created']);
});

it('comes back when the bank refuses it, and goes out with the next sweep', async () => {
  await captured(10_000, 'pm_card_bypassPending');
  const [payout] = await payOut();
  await running.control(`/payouts/${payout?.id}/fail`, {});
  const failed = await stripe.payouts.retrieve(payout?.id ?? '', { expand: ['failure_balance_transaction'] });
  expect(failed).toMatchObject({
    status: 'failed',
    failure_code: 'account_closed',
    failure_balance_transaction: { type: 'payout_failure', net: 9830, status: 'available' },
  });
  expect(await funds()).toEqual({ available: 9830, pending: 0 });
  const [again] = await payOut();
  expect((await partsOf(again?.id ?? '')).map(({ type }) => type)).toEqual(['payout_failure']);
  await running.control(`/payouts/${again?.id}/arrive`, {});
  expect(await stripe.payouts.retrieve(again?.id ?? '')).toMatchObject({ status: 'paid', amount: 9830 });
  expect(await running.control(`/payouts/${again?.id}/fail`, {})).toMatchObject({
    error: { message: expect.stringContaining('already paid') },
  });
});

it('pays out a chosen amount up to what is available, without naming parts', async () => {
  await captured(10_000, 'pm_card_bypassPending');
  const error = await errorOf(stripe.payouts.create({ amount: 9831, currency: 'gbp' }));
  expect(error.code).toBe('balance_insufficient');
  const chosen = await stripe.payouts.create({ amount: 5000, currency: 'gbp' });
  expect(chosen).toMatchObject({ automatic: false, status: 'pending' });
  expect((await errorOf(stripe.balanceTransactions.list({ payout: chosen.id }))).param).toBe('payout');
  const [swept] = await payOut();
  expect(swept?.amount).toBe(4830);
  expect(nets(await partsOf(swept?.id ?? ''))).toBe(4830);
  expect((await stripe.payouts.list({ status: 'pending' })).data.map(({ id }) => id)).toEqual([swept?.id, chosen.id]);
});

it('keeps currencies apart', async () => {
  await captured(10_000, 'pm_card_bypassPending');
  await stripe.paymentIntents.create({
    amount: 20_000,
    currency: 'eur',
    payment_method: 'pm_card_bypassPending',
    confirm: true,
  });
  const payouts = await payOut();
  expect(payouts.map(({ amount, currency }) => [currency, amount])).toEqual([
    ['gbp', 9830],
    ['eur', 19_680],
  ]);
});

// The whole card thread over the official package, against the stand-in of the card processor.
import express, { type Express } from 'express';
import {
  getReconciliation,
  importBankStatement,
  ledgerBalances,
  listInvoices,
  listPayments,
  refreshReconciliation,
} from '@seamwright/accounts/contracts';
import { stripeProcessor, stripeWebhook } from '@seamwright/accounts/server';
import { openAccountsHouse, type AccountsHouse } from '@seamwright/accounts/server/testing';
import { createLog, problemHandler } from '@seamwright/shared/server';
import { createStripeMock, type StripeMock } from '../../../tools/stripe-mock/index';
import { listenOnLoopback } from '../../../tools/stand-in/loopback-server';

const KEY = 'sk_test_card_payments';
const SECRETS = { present: 'whsec_present_secret', previous: 'whsec_previous_secret' };

interface Listening {
  readonly url: string;
  close(): Promise<void>;
}

let now = new Date('2026-12-01T12:00:00Z');
let mock: StripeMock;
let standIn: Listening;
let receiver: Listening;
let house: AccountsHouse;

beforeAll(async () => {
  const webhooks: Express = express();
  receiver = await listenOnLoopback(webhooks, 0);
  mock = createStripeMock({
    key: KEY,
    now: () => now,
    webhookDelivery: 'on-flush',
    // The stand-in still signs with the secret that is being replaced.
    webhook: { url: `${receiver.url}/api/webhooks/stripe`, secret: SECRETS.previous },
  });
  standIn = await listenOnLoopback(mock.app, 0);
  const { hostname, port } = new URL(standIn.url);
  const processor = stripeProcessor({
    secretKey: KEY,
    webhookSecrets: [SECRETS.present, SECRETS.previous],
    host: hostname,
    port: Number(port),
    protocol: 'http',
  });
  house = await openAccountsHouse(processor);
  const log = createLog('silent', 'test');
  const { database, clock } = house;
  webhooks.post('/api/webhooks/stripe', stripeWebhook({ processor, database, clock, log }));
  webhooks.use(problemHandler(log));
});
afterAll(async () => {
  await house.close();
  await mock.stop();
  await standIn.close();
  await receiver.close();
});

const moveTo = (instant: string): void => {
  now = new Date(instant);
  house.clock.set(now);
  mock.settle();
};
const later = (seconds: number): void => moveTo(new Date(now.getTime() + seconds * 1000).toISOString());
const lose = (pathIncludes: string): void =>
  mock.processor.faults.loseAnswer({ times: 3, method: 'POST', pathIncludes, how: 'disconnect' });
const paymentOf = async (orderId: string) => {
  const { body } = await house.call(house.accountant, listPayments, { query: { orderId } });
  return body.items[0];
};
const intents = () => [...mock.state.paymentIntents.values()];

it('holds the upper bound, charges less, and lets the rest go', async () => {
  const card = await house.keepCard(house.heron.buyer);
  const placed = await house.place({ cardId: card.id });
  expect(placed).toMatchObject({ stage: 'confirmed', payment: { state: 'pre-authorised', holdMinor: 7706 } });
  await house.pack(placed.id);
  await house.drain();
  expect(await paymentOf(placed.id)).toMatchObject({ state: 'captured', capturedMinor: 7370, letGoMinor: 336 });
  const intent = intents().at(-1);
  expect(intent).toMatchObject({ status: 'succeeded', amount: 7706, amount_received: 7370, amount_capturable: 0 });
  expect((await paymentOf(placed.id))?.holdEndsAt).toBe('2026-12-08T12:00:00.000Z');
});

it('keeps the order waiting when the card is declined', async () => {
  const card = await house.keepCard(house.heron.buyer, 'pm_card_chargeCustomerFail');
  const placed = await house.place({ cardId: card.id });
  expect(placed).toMatchObject({ stage: 'waiting', payment: { state: 'declined', declineCode: 'generic_decline' } });
});

it('says why a card can not be kept', async () => {
  await expect(house.keepCard(house.heron.buyer, 'pm_card_visa_chargeDeclinedInsufficientFunds')).rejects.toThrow(
    'card-refused',
  );
  await expect(house.keepCard(house.heron.buyer, 'pm_unheard_of')).rejects.toThrow('method-unknown');
});

it('holds once when the answer was lost after success', async () => {
  const card = await house.keepCard(house.heron.buyer);
  const before = intents().length;
  lose('/v1/payment_intents');
  const placed = await house.place({ cardId: card.id });
  expect(placed).toMatchObject({ stage: 'waiting', payment: { state: 'started' } });
  later(60);
  await house.comeRound();
  expect(await house.order(placed.id)).toMatchObject({ stage: 'confirmed' });
  expect(intents()).toHaveLength(before + 1);

  lose('/capture');
  await house.pack(placed.id);
  await expect(house.drain()).rejects.toThrow('did not answer');
  expect(await paymentOf(placed.id)).toMatchObject({ state: 'capturing' });
  later(60);
  await house.comeRound();
  await house.drain();
  expect(await paymentOf(placed.id)).toMatchObject({ state: 'captured', capturedMinor: 7370 });
  const charges = [...mock.state.charges.values()].filter(({ amount_captured: taken }) => taken > 0);
  expect(charges).toHaveLength(2);
}, 120_000);

it('takes webhooks before the answer, twice, and in reversed order, to the same end', async () => {
  const card = await house.keepCard(house.heron.buyer);
  lose('/v1/payment_intents');
  const placed = await house.place({ cardId: card.id });
  expect(placed.payment?.state).toBe('started');
  // The webhook comes first; the answer never came.
  await mock.flushWebhooks();
  await house.drain();
  expect(await house.order(placed.id)).toMatchObject({ stage: 'confirmed', payment: { state: 'pre-authorised' } });

  await house.pack(placed.id);
  await house.drain();
  await mock.flushWebhooks();
  const reversed = [...mock.state.deliveries.values()].reverse();
  for (const { id } of reversed) mock.webhooks.repeat(id);
  await mock.flushWebhooks();
  await house.drain();
  later(60);
  await house.comeRound();
  expect(await paymentOf(placed.id)).toMatchObject({ state: 'captured', capturedMinor: 7370 });
  expect([...mock.state.deliveries.values()].every(({ status }) => status === 'delivered')).toBe(true);
}, 120_000);

it('refuses what the processor did not sign', async () => {
  const response = await fetch(`${receiver.url}/api/webhooks/stripe`, {
    method: 'POST',
    body: JSON.stringify({ id: 'evt_forged', type: 'payment_intent.succeeded' }),
    headers: { 'content-type': 'application/json', 'stripe-signature': 't=1,v1=00' },
  });
  expect(response.status).toBe(422);
  expect(await response.json()).toMatchObject({ code: 'signature-wrong' });
});

it('is confirmed when the holder confirms with the bank', async () => {
  const card = await house.keepCard(house.heron.buyer, 'pm_card_authenticationRequired');
  const placed = await house.place({ cardId: card.id });
  const waiting = await paymentOf(placed.id);
  expect(waiting).toMatchObject({ state: 'needs-action' });
  expect(waiting?.actionUrl).toContain(`/authenticate/${waiting?.processorIntentId}`);
  await fetch(`${standIn.url}/control/intents/${waiting?.processorIntentId}/authenticate`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ outcome: 'confirmed' }),
  });
  await mock.flushWebhooks();
  await house.drain();
  expect(await house.order(placed.id)).toMatchObject({ stage: 'confirmed' });
});

it('leaves a balance due when packing comes to more than is held', async () => {
  const card = await house.keepCard(house.heron.buyer);
  const placed = await house.place({ cardId: card.id });
  await house.pack(placed.id, 300);
  await house.drain();
  const { body } = await house.call(house.heron.buyer, listInvoices, { query: { standing: 'part-paid' } });
  expect(body.items).toMatchObject([{ totalMinor: 7850, paidMinor: 7706 }]);
});

it('accounts for every penny from the card to the bank', async () => {
  moveTo('2026-12-03T09:00:00Z');
  const [payout] = mock.payOut();
  if (!payout) throw new Error('Nothing was paid out');
  moveTo('2026-12-04T09:00:00Z');
  await mock.flushWebhooks();
  await house.drain();
  const refreshed = await house.call(house.accountant, refreshReconciliation, {});
  expect(refreshed.status).toBe(200);

  // Three orders at £73.70 and one at £77.06; the fee is 1.5 % half up and 20p each: 3 × £1.31 and £1.36.
  const paidOut = 3 * (7370 - 131) + (7706 - 136);
  expect(payout.amount).toBe(paidOut);
  const before = await house.call(house.accountant, getReconciliation, { query: {} });
  expect(before.body.clearing).toMatchObject({ ledgerMinor: 0, toldMinor: 0, processorMinor: 0 });
  expect(before.body.week).toMatchObject({ capturedMinor: 3 * 7370 + 7706, feesMinor: 3 * 131 + 136 });
  expect(before.body.exceptions).toEqual([]);

  // The bank books two pence less than was sent.
  const booked = `£${Math.floor((paidOut - 2) / 100)}.${String((paidOut - 2) % 100).padStart(2, '0')}`;
  const file = {
    name: 'december.csv',
    bytes: Buffer.from(
      `Date,Description,Reference,Amount\n2026-12-04,CARD PAYOUT,${payout.id},"${booked}"\n2026-12-04,RENT,,"-1,200.00"\n`,
    ),
  };
  const taken = await house.call(house.accountant, importBankStatement, { file });
  expect(taken.body).toMatchObject({ lines: 2, matched: 1, sumMinor: paidOut - 2 - 120_000 });
  const twice = await house.call(house.accountant, importBankStatement, { file });
  expect(twice.problem).toMatchObject({ status: 409, code: 'statement-taken-already' });

  const after = await house.call(house.accountant, getReconciliation, { query: { day: '2026-12-03' } });
  expect(after.body.exceptions).toMatchObject([
    { leg: 'bank', kind: 'amount-differs', differenceMinor: -2, payoutId: payout.id },
  ]);
  expect(after.body.payouts).toMatchObject([{ partsNetMinor: paidOut, bankLine: { amountMinor: paidOut - 2 } }]);

  const { body } = await house.call(house.accountant, ledgerBalances, {});
  const balance = Object.fromEntries(body.items.map(({ account, balanceMinor }) => [account, balanceMinor]));
  expect(balance).toMatchObject({
    'card-clearing': 0,
    'card-fees': 3 * 131 + 136,
    'cash-in-transit': 0,
    bank: paidOut - 2,
    'bank-differences': 2,
    receivables: 7850 - 7706,
    sales: -(3 * 7370 + 7850),
  });
});

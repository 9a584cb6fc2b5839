import Stripe from 'stripe';
import { problemsOfObject } from './testing/published-description';
import { hold, MONDAY, startMock, type RunningMock } from './testing/running-mock';
import { startReceiver, type Received } from './testing/webhook-receiver';
import type { Delivery } from './index';

const SECRET = 'whsec_of_the_tests';
type Receiver = Awaited<ReturnType<typeof startReceiver>>;

let running: RunningMock;
let receiver: Receiver;

async function start(statuses: number[] = [], webhookDelivery: 'automatic' | 'on-flush' = 'on-flush'): Promise<void> {
  receiver = await startReceiver(statuses);
  running = await startMock({ webhook: { url: receiver.url, secret: SECRET }, webhookDelivery });
}
afterEach(async () => {
  await running.close();
  await receiver.close();
  expect(running.violations).toEqual([]);
});

const flush = () => running.control('/flush-webhooks', {}) as Promise<{ waiting: number }>;
const advance = (seconds: number) => running.control('/advance-clock', { seconds });
const deliveries = async () => ((await running.control('/deliveries')) as { deliveries: Delivery[] }).deliveries;
const read = ({ payload, signature }: Received, secret = SECRET) =>
  running.stripe.webhooks.constructEvent(payload, signature, secret);

it('are signed so that the official SDK accepts them, and hold published objects', async () => {
  await start();
  const held = await hold(running.stripe, 5000);
  await running.stripe.paymentIntents.capture(held.id, {}, { idempotencyKey: 'capture-7' });
  await running.stripe.refunds.create({ payment_intent: held.id, amount: 100 });
  await running.control('/pay-out', { includePending: true });
  expect(await flush()).toEqual({ waiting: 0 });
  const events = receiver.received.map((received) => read(received));
  expect(events.map(({ type }) => type)).toEqual([
    'payment_intent.created',
    'charge.succeeded',
    'payment_intent.amount_capturable_updated',
    'charge.captured',
    'payment_intent.succeeded',
    'refund.created',
    'charge.refunded',
    'payout.created',
  ]);
  for (const event of events) {
    expect(problemsOfObject('event', event)).toEqual([]);
    const object = event.data.object as { object: string };
    expect(problemsOfObject(object.object, object)).toEqual([]);
  }
  expect(events[3]?.request?.idempotency_key).toBe('capture-7');
  expect(events[7]?.request?.id).toBeNull();
  const kept = await running.stripe.events.retrieve(events[0]?.id ?? '');
  expect(kept).toMatchObject({ pending_webhooks: 0, type: 'payment_intent.created' });
});

it('tell the state at the time of the event, not the present one', async () => {
  await start();
  const held = await hold(running.stripe, 5000);
  await running.stripe.paymentIntents.cancel(held.id);
  await flush();
  const statuses = receiver.received
    .map((received) => read(received).data.object as { object: string; status: string })
    .filter(({ object }) => object === 'payment_intent')
    .map(({ status }) => status);
  expect(statuses).toEqual(['requires_confirmation', 'requires_capture', 'canceled']);
});

it('fail the check with another secret or a changed body', async () => {
  await start();
  await hold(running.stripe, 5000);
  await flush();
  const [first] = receiver.received as [Received];
  expect(() => read(first, 'whsec_other')).toThrow(Stripe.errors.StripeSignatureVerificationError);
  const changed = { ...first, payload: first.payload.replace('5000', '5') };
  expect(() => read(changed)).toThrow(Stripe.errors.StripeSignatureVerificationError);
});

it('are dated by real time however far the clock was advanced', async () => {
  await start();
  await advance(400 * 86_400);
  await hold(running.stripe, 5000);
  await flush();
  expect(read(receiver.received[0] as Received).type).toBe('payment_intent.created');
});

it('are sent again with growing waits until an answer is 2xx', async () => {
  await start([500, 302, 204]);
  await running.stripe.paymentIntents.create({ amount: 500, currency: 'gbp' });
  expect(await flush()).toEqual({ waiting: 1 });
  await advance(9);
  await flush();
  expect(receiver.received).toHaveLength(1);
  await advance(1);
  await flush();
  expect(receiver.received).toHaveLength(2);
  await advance(60);
  expect(await flush()).toEqual({ waiting: 0 });
  expect(new Set(receiver.received.map(({ payload }) => (JSON.parse(payload) as Stripe.Event).id)).size).toBe(1);
  expect(await deliveries()).toMatchObject([
    { status: 'delivered', nextAttemptAt: null, attempts: [{ status: 500 }, { status: 302 }, { status: 204 }] },
  ]);
});

it('are given up after three days', async () => {
  await start();
  await receiver.close();
  await running.stripe.paymentIntents.create({ amount: 500, currency: 'gbp' });
  for (let hours = 0; hours < 80; hours += 1) {
    await flush();
    await advance(3600);
  }
  const [delivery] = await deliveries();
  expect(delivery).toMatchObject({ status: 'given_up', nextAttemptAt: null });
  expect(delivery?.attempts[0]).toMatchObject({ status: null, error: 'ECONNREFUSED' });
  const start3Days = MONDAY.getTime() / 1000 + 3 * 86_400;
  expect(delivery?.attempts.at(-1)?.at).toBeLessThanOrEqual(start3Days);
  const waits = delivery?.attempts.slice(1).map(({ at }, index) => at - (delivery.attempts[index]?.at ?? 0)) ?? [];
  expect(waits).toEqual([...waits].sort((left, right) => left - right));
});

it('can be repeated by hand', async () => {
  await start();
  await running.stripe.paymentIntents.create({ amount: 500, currency: 'gbp' });
  await flush();
  const [sent] = await deliveries();
  await running.control(`/deliveries/${sent?.id}/repeat`, {});
  await flush();
  expect(receiver.received.map(({ payload }) => (JSON.parse(payload) as Stripe.Event).id)).toEqual([
    sent?.event,
    sent?.event,
  ]);
});

it('go only to endpoints that asked for them and are enabled', async () => {
  await start();
  const { stripe } = running;
  const other = await startReceiver();
  const endpoint = await stripe.webhookEndpoints.create({
    url: other.url,
    enabled_events: ['payment_intent.canceled'],
  });
  expect(endpoint.secret).toMatch(/^whsec_/);
  expect((await stripe.webhookEndpoints.retrieve(endpoint.id)).secret).toBeUndefined();
  const first = await stripe.paymentIntents.create({ amount: 500, currency: 'gbp' });
  await stripe.paymentIntents.cancel(first.id);
  await flush();
  expect(other.received.map((received) => read(received, endpoint.secret).type)).toEqual(['payment_intent.canceled']);
  await stripe.webhookEndpoints.update(endpoint.id, { disabled: true });
  const second = await stripe.paymentIntents.create({ amount: 500, currency: 'gbp' });
  await stripe.paymentIntents.cancel(second.id);
  await flush();
  expect(other.received).toHaveLength(1);
  expect((await stripe.webhookEndpoints.list()).data).toHaveLength(2);
  expect(await stripe.webhookEndpoints.del(endpoint.id)).toMatchObject({ deleted: true });
  await other.close();
});

it('go out by themselves unless told to wait', async () => {
  await start([], 'automatic');
  await running.stripe.paymentIntents.create({ amount: 500, currency: 'gbp' });
  while (receiver.received.length === 0) await new Promise(setImmediate);
  expect(read(receiver.received[0] as Received).type).toBe('payment_intent.created');
});

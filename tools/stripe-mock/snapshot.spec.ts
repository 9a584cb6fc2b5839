import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { hold, startMock } from './testing/running-mock';

let folder: string;
let snapshotFile: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'stripe-mock-'));
  snapshotFile = join(folder, 'kept', 'state.json');
});
afterEach(() => rmSync(folder, { recursive: true }));

const webhook = { url: 'http://127.0.0.1:9/webhooks', secret: 'whsec_first' };
const moved = { url: 'http://127.0.0.1:19/webhooks', secret: 'whsec_second' };

it('carries everything over a restart: holds, money, clock, keys, webhooks', async () => {
  const before = await startMock({ snapshotFile, webhook });
  const held = await hold(before.stripe, 5000);
  const taken = await hold(before.stripe, 4000);
  await before.stripe.paymentIntents.capture(taken.id, {}, { idempotencyKey: 'capture-1' });
  await before.control('/advance-clock', { seconds: 3 * 86_400 - 3600 });
  await before.control('/pay-out', {});
  await before.control('/flush-webhooks', {});
  const stateBefore = await before.control('/state');
  await before.close();

  const after = await startMock({ snapshotFile, webhook: moved });
  const stateAfter = (await after.control('/state')) as { webhookEndpoints: object[] };
  expect(stateAfter.webhookEndpoints).toMatchObject([moved]);
  expect(stateAfter).toEqual({ ...(stateBefore as object), webhookEndpoints: stateAfter.webhookEndpoints });
  expect((await after.stripe.paymentIntents.capture(held.id)).amount_received).toBe(5000);
  await after.close();
});

it('replays a kept key after a restart', async () => {
  const before = await startMock({ snapshotFile });
  const made = await before.stripe.customers.create({ name: 'One' }, { idempotencyKey: 'customer-1' });
  await before.close();
  const after = await startMock({ snapshotFile });
  expect((await after.stripe.customers.create({ name: 'One' }, { idempotencyKey: 'customer-1' })).id).toBe(made.id);
  await after.close();
});

it('says what to do about a file it cannot use', async () => {
  const running = await startMock({ snapshotFile });
  await running.close();
  const content = readFileSync(snapshotFile, 'utf8');
  for (const broken of [content.slice(0, 40), '{"version":99}', '']) {
    writeFileSync(snapshotFile, broken);
    await expect(startMock({ snapshotFile })).rejects.toThrow(/Delete it to start with an empty account/);
  }
});

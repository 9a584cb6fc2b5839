import request from 'supertest';
import { hold, MONDAY, startMock, type RunningMock } from './testing/running-mock';

let running: RunningMock;
beforeEach(async () => {
  running = await startMock();
});
afterEach(() => running.close());

const lever = (path: string) => request(running.url).post(`/control${path}`).set('Host', '127.0.0.1');

describe('the levers', () => {
  it('move the clock to a time, never back', async () => {
    const to = '2026-03-09T06:30:00Z';
    expect((await lever('/advance-clock').send({ to })).body).toEqual({ now: '2026-03-09T06:30:00.000Z' });
    const back = await lever('/advance-clock').send({ to: MONDAY.toISOString() });
    expect([back.status, back.body.error.message]).toEqual([400, 'The clock does not go back.']);
  });

  it('refuse what they do not understand', async () => {
    for (const body of [{}, { seconds: -1 }, { seconds: 1.5 }, { seconds: 1, colour: 'red' }]) {
      expect((await lever('/advance-clock').send(body)).status).toBe(400);
    }
    expect((await lever('/deliveries/whd_none/repeat').send({})).status).toBe(404);
    expect((await lever('/intents/pi_none/authenticate').send({ outcome: 'confirmed' })).status).toBe(404);
    expect((await lever('/answer-slowly').type('json').send('{')).status).toBe(400);
  });

  it('forget everything on reset, faults too', async () => {
    await hold(running.stripe, 5000);
    await lever('/advance-clock').send({ seconds: 60 });
    await lever('/decline-next').send({ times: 3 });
    await lever('/reset').send({});
    const state = (await running.control('/state')) as { now: string; events: unknown[] };
    expect(state).toMatchObject({ now: MONDAY.toISOString(), events: [], paymentIntents: [] });
    expect((await hold(running.stripe, 5000)).status).toBe('requires_capture');
  });

  it('begin anew at an earlier day, so that history can be made', async () => {
    await lever('/reset').send({ at: '2026-02-02T08:00:00Z' });
    const held = await hold(running.stripe, 5000);
    expect(held.created).toBe(Date.parse('2026-02-02T08:00:00Z') / 1000);
    await running.stripe.paymentIntents.capture(held.id);
    await lever('/advance-clock').send({ to: MONDAY.toISOString() });
    expect((await running.stripe.balance.retrieve()).available[0]?.amount).toBe(4905);
  });

  it('answer slowly when told to', async () => {
    await lever('/answer-slowly').send({ milliseconds: 120, pathIncludes: 'customers' });
    const begun = performance.now();
    await running.stripe.customers.create({});
    expect(performance.now() - begun).toBeGreaterThanOrEqual(115);
  });

  it('obey this machine only, by its own name and from its own pages', async () => {
    const elsewhere = await request(running.url).post('/control/reset').set('Host', 'shop.example').send({});
    const foreignPage = await lever('/reset').set('Origin', 'http://shop.example').send({});
    expect([elsewhere.status, foreignPage.status]).toEqual([403, 403]);
  });
});

describe('the page', () => {
  const page = async (path = '/') => (await request(running.url).get(path)).text;

  it('says what would be there while it is empty', async () => {
    expect(await page()).toContain('No payment intents yet');
  });

  it('shows money, intents, charges and payouts, and pays out', async () => {
    const held = await hold(running.stripe, 123_456);
    await running.stripe.paymentIntents.capture(held.id);
    const before = await page();
    // 1,234.56 less 18.52 and 0.20
    expect(before).toContain('1,234.56 GBP');
    expect(before).toContain('1,215.84 GBP');
    const pressed = await request(running.url).post('/pay-out');
    expect([pressed.status, pressed.headers['location']]).toEqual([303, '/?note=paid-out']);
    const [payout] = (await running.stripe.payouts.list()).data;
    expect(payout?.amount).toBe(121_584);
    expect(await page('/?note=paid-out')).toContain(payout?.id);
    await request(running.url).post(`/payouts/${payout?.id}/arrive`).expect(303);
    expect((await running.stripe.payouts.retrieve(payout?.id ?? '')).status).toBe('paid');
    const again = await request(running.url).post('/pay-out');
    expect(again.headers['location']).toBe('/?note=nothing-to-pay-out');
  });

  it('escapes what others wrote, repeats no text from the address and fetches nothing', async () => {
    await running.stripe.paymentIntents.create({ amount: 500, currency: 'gbp', description: '<script>x</script>' });
    const response = await request(running.url).get('/?note=%3Cb%3Ehello');
    expect(response.text).toContain('&lt;script&gt;x&lt;/script&gt;');
    expect(response.text).not.toContain('hello');
    expect(response.text).not.toMatch(/(src|href)="https?:/);
    expect(response.headers['content-security-policy']).toContain("default-src 'none'");
  });
});

import fc from 'fast-check';
import type Stripe from 'stripe';
import { listPage } from './lists';
import { errorOf, startMock, type RunningMock } from './testing/running-mock';

const items = (count: number) => Array.from({ length: count }, (_, index) => ({ id: `x_${index}`, created: index }));

describe('paging', () => {
  it('forwards shows every item once, newest first, whatever the page size', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 60 }), fc.integer({ min: 1, max: 100 }), (count, limit) => {
        const seen: string[] = [];
        let page = listPage(items(count), { limit }, 'x', '/x');
        seen.push(...page.data.map(({ id }) => id));
        while (page.has_more) {
          page = listPage(items(count), { limit, starting_after: seen.at(-1) }, 'x', '/x');
          seen.push(...page.data.map(({ id }) => id));
        }
        expect(seen).toEqual(
          items(count)
            .map(({ id }) => id)
            .reverse(),
        );
      }),
    );
  });

  it('backwards shows the ones just newer than the cursor', () => {
    const page = listPage(items(10), { limit: 3, ending_before: 'x_2' }, 'x', '/x');
    expect(page).toMatchObject({ data: [{ id: 'x_5' }, { id: 'x_4' }, { id: 'x_3' }], has_more: true });
    expect(listPage(items(10), { ending_before: 'x_7' }, 'x', '/x')).toMatchObject({
      data: [{ id: 'x_9' }, { id: 'x_8' }],
      has_more: false,
    });
  });

  it('keeps to the time asked for', () => {
    const created = { gte: 3, lt: 5 };
    expect(listPage(items(10), { created }, 'x', '/x').data.map(({ id }) => id)).toEqual(['x_4', 'x_3']);
    expect(listPage(items(10), { created: 7 }, 'x', '/x').data).toHaveLength(1);
  });
});

describe('over HTTP', () => {
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

  it('the SDK walks all pages by itself', async () => {
    for (let made = 0; made < 12; made += 1) await stripe.customers.create({ name: `Customer ${made}` });
    const first = await stripe.customers.list();
    expect([first.data.length, first.has_more]).toEqual([10, true]);
    const names: (string | null | undefined)[] = [];
    for await (const { name } of stripe.customers.list({ limit: 5 })) names.push(name);
    expect(names).toHaveLength(12);
    expect(names[0]).toBe('Customer 11');
  });

  it('a wrong limit or cursor is refused', async () => {
    expect((await errorOf(stripe.charges.list({ limit: 101 }))).param).toBe('limit');
    expect(await errorOf(stripe.charges.list({ starting_after: 'ch_none' }))).toMatchObject({
      code: 'resource_missing',
      param: 'starting_after',
    });
  });

  it('items of a list can be expanded', async () => {
    await stripe.paymentIntents.create({ amount: 500, currency: 'gbp', payment_method: 'pm_card_visa', confirm: true });
    const charges = await stripe.charges.list({ expand: ['data.balance_transaction', 'data.payment_intent'] });
    expect(charges.data).toMatchObject([
      { balance_transaction: { net: 472 }, payment_intent: { status: 'succeeded' } },
    ]);
    const entries = await stripe.balanceTransactions.list({ expand: ['data.source'] });
    expect(entries.data).toMatchObject([{ source: { object: 'charge', amount: 500 } }]);
    const [one] = entries.data;
    expect(await stripe.balanceTransactions.retrieve(one?.id ?? '')).toMatchObject({ fee: 28 });
  });
});

import { resolveChoices } from '@seamwright/catalogue/domain';
import { createTestDatabase, type TestDatabase } from '@seamwright/database/testing';
import { addTestTrade, type TestTrade } from '@seamwright/ordering/server/testing';
import { priceFor } from '@seamwright/pricing/server';
import {
  customersOf,
  inTransaction,
  openDatabase,
  type Caller,
  type Database,
  type Tx,
} from '@seamwright/shared/server';
import { TEST_NOW, watchPlans, type TableRead } from '@seamwright/shared/server/testing';
import { quantity, unwrap, type PlantDate } from '@seamwright/shared/util';
import { lotsOf, packsOfOrders } from '@seamwright/stock/server';
import { countOrdersOfDay, countUnpackedOfDay, newestOrders, orderById, ordersOfDay } from './orders.repository';
import { changesOf } from './order-changes.repository';

// Not the plan is checked but what grows with the years: no query of every day may read one of these from end to end.
const GROWING = ['orders', 'order_lines', 'order_changes', 'packs', 'lots'];
const DAY = '2026-11-20' as PlantDate;

let urls: TestDatabase;
let api: Database;
let trade: TestTrade;
let orderIds: string[];
let primalIds: string[];

beforeAll(async () => {
  urls = await createTestDatabase();
  api = openDatabase(urls.appUrl, { max: 2 });
  trade = await addTestTrade(api, TEST_NOW);
  await fill(urls.ownerUrl, trade);
  const own = await inTransaction(api, trade.heron.buyer, (tx) =>
    tx.selectFrom('orders').select('id').limit(50).execute(),
  );
  orderIds = own.map(({ id }) => id);
  primalIds = [trade.steak.sourceNodeId, trade.shoulder.sourceNodeId];
}, 120_000);
afterAll(async () => {
  await api.close();
  await urls.drop();
});

/** A hundred customers with 3,000 orders, 6,000 lines and packs, and lots and prices beside them. */
async function fill(ownerUrl: string, { heron, steak, rep }: TestTrade): Promise<void> {
  const owner = openDatabase(ownerUrl, { max: 1 });
  const run = (text: string, values: unknown[] = []) => owner.pool.query(text, values);
  const growing = ['orders', 'order_lines', 'packs', 'lots', 'price_lines', 'customers', 'sites'];
  // The audit is no part of this, and the policies are for its owner, too.
  for (const table of growing) await run(`alter table ${table} disable trigger user`);
  await run(`select set_config('seamwright.caller', 'system', false), set_config('seamwright.customers', '*', false),
    set_config('seamwright.purpose', 'seed', false), set_config('seamwright.sites', '*', false)`);
  await run(`insert into customers (id, name, kind, invoice_email, billing_address, created_at)
    select gen_random_uuid(), 'Kitchen ' || n, 'restaurant', 'papers@kitchen.example', '1 Quay Street', '2026-01-01'
    from generate_series(1, 100) as n`);
  await run(`insert into sites (id, customer_id, name, address, postcode)
    select gen_random_uuid(), id, 'Kitchen', '1 Quay Street', 'ZZ1 1AA' from customers where name like 'Kitchen %'`);
  await run(`insert into orders (id, customer_id, site_id, delivery_day, source, settlement, delivery_charge_minor,
      delivery_tax_ppm, placed_at)
    select gen_random_uuid(), s.customer_id, s.id, date '2026-11-30' - n * 30 - (row_number() over ())::integer % 30,
      'desk', 'account', 650, 0, timestamptz '2026-11-30' - n * interval '30 days' - random() * interval '30 days'
    from sites s, generate_series(0, 29) as n`);
  await run(
    `insert into order_lines (id, order_id, customer_id, position, specification_id, version_id, choices, choice_key,
      choice_summary, quantity_unit, quantity_count, pieces, min_grams, estimate_grams, max_grams, basis, price_minor,
      price_why, tax_ppm, min_minor, estimate_minor, max_minor, when_short)
    select gen_random_uuid(), o.id, o.customer_id, n, $1, $2, '{}', '', '', 'piece', 1, 1, 266, 280, 294, 'kg', 2400,
      '{}', 0, 638, 672, 706, 'ask-me'
    from orders o, generate_series(1, 2) as n`,
    [steak.specificationId, steak.id],
  );
  await run(`insert into order_changes (id, order_id, customer_id, at, what)
    select gen_random_uuid(), id, customer_id, placed_at, 'placed' from orders`);
  await run(
    `insert into lots (id, code, node_id, supplier, kill_date, received_on, use_by, received_grams, received_pieces,
      state, origin)
    select gen_random_uuid(), 'L' || n, $1, 'Test supplier', '2026-01-01', '2026-01-02', '2026-12-10', 10000, 2,
      case when n % 200 = 0 then 'released' else 'used-up' end, '{}'
    from generate_series(1, 2000) as n`,
    [steak.sourceNodeId],
  );
  const { personId } = rep as { personId: string };
  await run(
    `insert into packs (id, customer_id, order_id, order_line_id, version_id, lot_id, pieces, net_grams, input_grams,
      tare_grams, out_of_limits, packed_at, packed_by)
    select gen_random_uuid(), l.customer_id, l.order_id, l.id, l.version_id,
      (array(select id from lots order by code))[1 + (row_number() over ())::integer % 2000], 1, 280, 357, 20, false,
      '2026-11-01', $1
    from order_lines l`,
    [personId],
  );
  await run(
    `insert into price_lists (id, level, customer_id, name)
    select gen_random_uuid(), 'customer', id, name from customers where id <> $1`,
    [heron.id],
  );
  await run(`insert into price_lines (id, price_list_id, customer_id, specification_id, basis, price_minor, valid)
    select gen_random_uuid(), l.id, l.customer_id, s.id, 'kg', 2300, daterange('2024-01-01'::date + n * 90, '2024-01-01'::date + n * 90 + 90)
    from price_lists l, specifications s, generate_series(0, 11) as n where l.level = 'customer'`);
  await run('vacuum analyze');
  await owner.close();
}

type Work = (tx: Tx) => Promise<unknown>;

async function readsOf(
  caller: Caller,
  work: Work,
  how?: Parameters<typeof watchPlans>[1],
): Promise<readonly TableRead[]> {
  const { database, reads } = watchPlans(api, how);
  await inTransaction(database, caller, work);
  return reads;
}

/** Growing tables that were read from end to end, with the index whose order was followed. */
const readWhole = (reads: readonly TableRead[]): string[] =>
  reads
    .filter(({ table, key }) => GROWING.includes(table) && key === null)
    .map(({ table, index }) => `${table}, ${index}`);

describe('as the years go by, no growing table is read from end to end', () => {
  const newest = (caller: Caller) => (tx: Tx) =>
    newestOrders(tx, { limit: 50, after: null, customers: customersOf(caller) });

  it('for the newest orders of a customer, which one index gives in order', async () => {
    const { buyer } = trade.heron;
    const reads = await readsOf(buyer, newest(buyer));
    expect(readWhole(reads)).toEqual([]);
    expect(reads[0]).toMatchObject({ table: 'orders', index: 'orders_newest_of_customer' });
  });

  it('for the newest orders of all, which are read in order until there are enough', async () => {
    expect(readWhole(await readsOf(trade.rep, newest(trade.rep)))).toEqual(['orders, orders_newest']);
  });

  it.each<[string, () => [Caller, Work]]>([
    ['an order', () => [trade.heron.buyer, (tx) => orderById(tx, orderIds[0] ?? '')]],
    ['the history of an order', () => [trade.heron.buyer, (tx) => changesOf(tx, orderIds[0] ?? '')]],
    ['the packs of an order’s lines', () => [trade.heron.buyer, (tx) => packsOfOrders(tx, orderIds)]],
    ['the orders of a day', () => [trade.rep, (tx) => ordersOfDay(tx, DAY)]],
    ['counting the orders of a day', () => [trade.rep, (tx) => countOrdersOfDay(tx, DAY)]],
    ['counting what is not packed yet', () => [trade.rep, (tx) => countUnpackedOfDay(tx, DAY)]],
    ['the lots of a primal', () => [trade.rep, (tx) => lotsOf(tx, primalIds, { deliveryDay: DAY, cuttingDay: DAY })]],
  ])('for %s', async (_, asked) => {
    const reads = await readsOf(...asked());
    expect(reads.map(({ table }) => table).some((table) => GROWING.includes(table))).toBe(true);
    expect(readWhole(reads)).toEqual([]);
  });

  it('for a customer’s prices of a specification', async () => {
    const { steak, heron } = trade;
    const resolved = unwrap(resolveChoices(steak, {}));
    const amount = unwrap(quantity({ unit: 'piece', count: 1 }));
    const asked = [{ specificationId: steak.specificationId, resolved, quantity: amount, deliveryDay: DAY }];
    const reads = await readsOf(heron.buyer, (tx) => priceFor(tx, heron.id, asked), 'as-it-would');
    const key = expect.stringContaining('specification_id');
    expect(reads).toContainEqual({ table: 'price_lines', index: 'price_lines_lookup', key });
  });
});

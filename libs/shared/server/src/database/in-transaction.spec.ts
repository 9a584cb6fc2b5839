import { newId } from '@seamwright/shared/util';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { sql } from 'kysely';
import { anonymous, system, type Caller } from './caller';
import { inTransaction, type Tx } from './in-transaction';

const mine = newId();
const theirs = newId();

const customer = (id: string, name: string) => ({
  id,
  name,
  kind: 'restaurant',
  invoiceEmail: 'accounts@kitchen.example',
  billingAddress: '1 Market Row',
  createdAt: TEST_NOW,
});
const names = (tx: Tx) =>
  tx
    .selectFrom('customers')
    .select('name')
    .orderBy('name')
    .execute()
    .then((rows) => rows.map((row) => row.name));

const user: Caller = { kind: 'user', personId: newId(), roles: ['buyer'], customerId: mine, sites: '*' };
const staff = (customers: '*' | string[]): Caller => ({ kind: 'staff', personId: newId(), roles: ['rep'], customers });

describe('inTransaction', () => {
  let house: TestHouse;
  const as = <T>(caller: Caller, work: (tx: Tx) => Promise<T>) => inTransaction(house.database, caller, work);

  beforeAll(async () => {
    house = await openTestHouse();
    await as(system('seed'), (tx) =>
      tx
        .insertInto('customers')
        .values([customer(mine, 'Mine'), customer(theirs, 'Theirs')])
        .execute(),
    );
  });
  afterAll(() => house.close());

  it.each([
    ['nobody sees a row', anonymous, []],
    ['a buyer sees her own customer', user, ['Mine']],
    ['a rep sees the customers assigned', staff([theirs]), ['Theirs']],
    ['a rep with no customer sees none', staff([]), []],
    ['staff for all customers see all', staff('*'), ['Mine', 'Theirs']],
    ['the system sees all', system('job'), ['Mine', 'Theirs']],
  ])('%s', async (_, caller, expected) => {
    expect(await as(caller, names)).toEqual(expected);
  });

  it('lets no one write a row of a customer they do not serve', async () => {
    await expect(
      as(user, (tx) => tx.insertInto('customers').values(customer(newId(), 'Smuggled')).execute()),
    ).rejects.toThrow(/row-level security/);
    const touched = await as(user, (tx) =>
      tx.updateTable('customers').set({ name: 'Taken over' }).where('id', '=', theirs).executeTakeFirst(),
    );
    expect(touched.numUpdatedRows).toBe(0n);
  });

  it('shows no rows on a connection where no caller was set', async () => {
    const { rows } = await house.database.pool.query('select name from customers');
    expect(rows).toEqual([]);
  });

  it('forgets the caller with the transaction', async () => {
    await as(system('job'), names);
    const { rows } = await house.database.pool.query(`select current_setting('seamwright.caller', true) as caller`);
    expect(rows[0].caller || null).toBeNull();
  });

  it('rolls everything back when the work throws', async () => {
    const failing = as(system('seed'), async (tx) => {
      await tx.insertInto('customers').values(customer(newId(), 'Half-stored')).execute();
      throw new Error('no');
    });
    await expect(failing).rejects.toThrow('no');
    expect(await as(system('job'), names)).toEqual(['Mine', 'Theirs']);
  });

  it('reads whole numbers exactly and refuses those past 2^53', async () => {
    const read = (value: string) =>
      as(system('job'), (tx) => sql<{ n: number }>`select ${sql.raw(value)}::bigint as n`.execute(tx));
    expect((await read('9007199254740991')).rows[0]?.n).toBe(9007199254740991);
    await expect(read('9007199254740993')).rejects.toThrow(RangeError);
  });

  it('reads a date as its text, whatever the time zone of the process', async () => {
    const { rows } = await as(system('job'), (tx) => sql<{ d: string }>`select date '2026-03-29' as d`.execute(tx));
    expect(rows[0]?.d).toBe('2026-03-29');
  });

  it('tries again after a deadlock', async () => {
    let tries = 0;
    const result = await as(system('job'), async () => {
      tries += 1;
      if (tries < 3) throw Object.assign(new Error('deadlock detected'), { code: '40P01' });
      return 'done';
    });
    expect([result, tries]).toEqual(['done', 3]);
  });

  it('writes who changed what to the audit', async () => {
    const admin = staff('*');
    await as(admin, (tx) => tx.updateTable('customers').set({ vatNumber: 'GB 000' }).where('id', '=', mine).execute());
    const [entry] = await as(system('job'), (tx) =>
      tx.selectFrom('auditEntries').selectAll().where('rowId', '=', mine).where('action', '=', 'update').execute(),
    );
    expect(entry).toMatchObject({
      tableName: 'customers',
      personId: admin.kind === 'staff' ? admin.personId : '',
      changed: { vat_number: [null, 'GB 000'] },
    });
  });

  it('keeps the audit append-only', async () => {
    await expect(as(system('job'), (tx) => tx.deleteFrom('auditEntries').execute())).rejects.toThrow(
      /permission denied/,
    );
  });
});

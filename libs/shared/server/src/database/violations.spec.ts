import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';
import { system } from './caller';
import { inTransaction, type Tx } from './in-transaction';
import { refusalOfViolation, violates } from './violations';

let house: TestHouse;
beforeAll(async () => {
  house = await openTestHouse();
});
afterAll(() => house.close());

const thrownBy = (work: (tx: Tx) => Promise<unknown>): Promise<unknown> =>
  inTransaction(house.database, system('seed'), work).then(
    () => null,
    (error: unknown) => error,
  );
const addCustomer = (tx: Tx, over: object) =>
  tx
    .insertInto('customers')
    .values({
      id: newId(),
      name: 'Larder',
      kind: 'restaurant',
      invoiceEmail: 'papers@larder.example',
      billingAddress: '1 Market Row',
      createdAt: TEST_NOW,
      ...over,
    })
    .execute();

describe('a rule that the database keeps', () => {
  it('is a refusal with the constraint’s name when it is broken', async () => {
    const id = newId();
    await thrownBy((tx) => addCustomer(tx, { id }));
    const twice = await thrownBy((tx) => addCustomer(tx, { id }));
    expect(refusalOfViolation(twice)).toEqual({ code: 'already-there', params: { constraint: 'customers_pkey' } });
    expect(violates(twice, 'customers_pkey')).toBe(true);
    expect(violates(twice, 'customers_name')).toBe(false);
  });

  it('keeps a NUL out of a text, and out of JSON', async () => {
    const text = await thrownBy((tx) => addCustomer(tx, { name: 'Lar\u0000der' }));
    const json = await thrownBy((tx) =>
      tx
        .insertInto('outboxEvents')
        .values({ type: 'spec', subjectId: newId(), payload: JSON.stringify({ name: '\u0000' }), at: TEST_NOW })
        .execute(),
    );
    expect(refusalOfViolation(text)).toMatchObject({ code: 'invalid' });
    expect(refusalOfViolation(json)).toMatchObject({ code: 'invalid' });
  });

  it('is told apart from faults of the program', async () => {
    const fault = await thrownBy((tx) =>
      tx
        .selectFrom('nowhere' as 'customers')
        .select('id')
        .execute(),
    );
    expect(fault).toBeInstanceOf(Error);
    expect(refusalOfViolation(fault)).toBeNull();
    expect(refusalOfViolation(new Error('something else'))).toBeNull();
    expect(refusalOfViolation('thrown')).toBeNull();
  });
});

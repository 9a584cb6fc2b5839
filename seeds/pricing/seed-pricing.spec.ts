import { inTransaction, system, type Caller } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { SPECIFICATIONS, seedCatalogue } from '../catalogue';
import { seedPeople } from '../people/seed-people';
import { seedPricing } from './seed-pricing';

describe('loading the demo prices', () => {
  let house: TestHouse;
  beforeAll(async () => (house = await openTestHouse()));
  afterAll(() => house.close());

  it('gives every specification a price in force for everybody, and the group and two customers their own', async () => {
    const { people, customers, groups } = await inTransaction(house.database, system('seed'), (tx) =>
      seedPeople(tx, TEST_NOW, 1024),
    );
    const [author, approver] = [...people.values()].map((personId): Caller => ({
      kind: 'staff',
      personId,
      roles: ['technical'],
      customers: '*',
    }));
    if (!author || !approver) throw new Error('the scenario has too few people');
    const specificationIds = await seedCatalogue(house.database, { now: TEST_NOW, author, approver });
    await seedPricing(house.database, { validFrom: '2026-10-01', specificationIds, customers, groups });

    const lists = await inTransaction(house.database, system('seed'), (tx) =>
      tx
        .selectFrom('priceLists')
        .innerJoin('priceLines', 'priceLines.priceListId', 'priceLists.id')
        .select(({ fn }) => ['level', 'name', fn.countAll<number>().as('count')])
        .groupBy(['level', 'name'])
        .orderBy('count', 'desc')
        .execute(),
    );
    expect(lists.map(({ level }) => level).sort()).toEqual(['base', 'customer', 'customer', 'group']);
    expect(lists[0]).toEqual({ level: 'base', name: 'Base list', count: SPECIFICATIONS.length });
  });
});

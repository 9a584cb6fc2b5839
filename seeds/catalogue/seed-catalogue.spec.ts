import { currentVersions, specificationsByCodes } from '@seamwright/catalogue/server';
import { addTestPeople } from '@seamwright/catalogue/server/testing';
import { inTransaction } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { seedCatalogue } from './seed-catalogue';
import { SPECIFICATIONS } from './specifications';

describe('loading the demo catalogue', () => {
  let house: TestHouse;
  beforeAll(async () => {
    house = await openTestHouse();
  });
  afterAll(() => house.close());

  it('puts every specification in force through the use cases', async () => {
    const people = await addTestPeople(house.database, TEST_NOW);
    const ids = await seedCatalogue(house.database, { now: TEST_NOW, ...people });
    const { byId, byCode } = await inTransaction(house.database, people.author, async (tx) => ({
      byId: await currentVersions(tx, [...ids.values()]),
      byCode: await specificationsByCodes(tx, ['LM-104', 'BF-201', 'BF-208', 'PK-301']),
    }));
    expect(byId.size).toBe(SPECIFICATIONS.length);
    expect(byCode.get('LM-104')).toMatchObject({ finish: 'rolled', pieceKind: 'joint', standing: 'current' });
    expect(byCode.get('BF-208')).toMatchObject({ pieceNominalGrams: 5000, piecesPerPack: 1, packsPerCase: 1 });
  });
});

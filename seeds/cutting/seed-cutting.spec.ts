import { faultsOfScheme, type CutNode } from '@seamwright/catalogue/domain';
import { addTestPeople } from '@seamwright/catalogue/server/testing';
import { inTransaction } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { seedCatalogue } from '../catalogue';
import { CUT_TREE } from '../catalogue/cut-tree';
import { contentOf, SCHEMES } from './schemes';
import { seedCutting } from './seed-cutting';

describe('the demo’s schemes', () => {
  const nodes = new Map(
    CUT_TREE.map(({ key, parent, species, level, name }): [string, CutNode] => [
      key,
      { id: key, parentId: parent, species, level, name, uneceItem: null, uneceItemSeen: false, region: null, sort: 0 },
    ]),
  );

  it.each(SCHEMES.map((data) => [data.code, data] as const))('has no fault in %s', (_, data) => {
    expect(
      faultsOfScheme(
        contentOf(data, (key) => key),
        nodes,
      ),
    ).toEqual([]);
  });

  it('have a code each', () => {
    expect(new Set(SCHEMES.map(({ code }) => code)).size).toBe(SCHEMES.length);
  });
});

describe('loading the demo’s cutting', () => {
  let house: TestHouse;
  beforeAll(async () => {
    house = await openTestHouse();
  });
  afterAll(() => house.close());

  it('puts every scheme in force and records 150 tests by both technical people, one of which stands out', async () => {
    const people = await addTestPeople(house.database, TEST_NOW);
    await seedCatalogue(house.database, { now: TEST_NOW, ...people });
    const recorded = await seedCutting(house.database, { now: TEST_NOW, timeZone: 'Europe/London', ...people });
    const kept = await inTransaction(house.database, people.author, async (tx) => ({
      current: await tx
        .selectFrom('cuttingSchemeStandings')
        .select('versionId')
        .where('standing', '=', 'current')
        .execute(),
      tests: await tx.selectFrom('cuttingTests').select(['recordedBy', 'note', 'lossGrams']).execute(),
    }));
    expect(recorded).toBe(150);
    expect(kept.current).toHaveLength(SCHEMES.length);
    expect(kept.tests).toHaveLength(150);
    expect(new Set(kept.tests.map(({ recordedBy }) => recordedBy)).size).toBe(2);
    expect(kept.tests.filter(({ note }) => note !== '')).toHaveLength(1);
  });
});

import {
  getCutTree,
  getSpecification,
  getStaffSpecification,
  listVersions,
  withdrawSpecification,
} from '@seamwright/catalogue/contracts';
import { aChoice, aValue } from '@seamwright/catalogue/domain/testing';
import type { Caller } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';
import {
  addTestPeople,
  addTestSpecification,
  addTestTree,
  type TestPeople,
  type TestTree,
} from '@seamwright/catalogue/server/testing';
import { catalogueImplementations } from './catalogue.implementations';

describe('the catalogue over HTTP', () => {
  let house: TestHouse;
  let tree: TestTree;
  let people: TestPeople;
  const buyer: Caller = { kind: 'user', personId: newId(), roles: ['buyer'], customerId: newId(), sites: '*' };

  beforeAll(async () => {
    house = await openTestHouse({ implementations: () => catalogueImplementations });
    tree = await addTestTree(house.database);
    people = await addTestPeople(house.database, TEST_NOW);
    const trim = aChoice('trim', [
      aValue('6', { yieldFactorPpm: 990_000 }),
      aValue('3', { priceChangeMinorPerKg: 90 }),
    ]);
    const steak = { cutNodeId: tree.steakId, sourceNodeId: tree.striploinId };
    const shoulder = { cutNodeId: tree.rolledShoulderId, sourceNodeId: tree.shoulderId };
    await add('BF-201', steak, { choices: [trim] });
    await add('BF-202', steak, { name: 'Striploin joint', boneState: 'bone-in' });
    await add('LM-101', shoulder, {
      name: 'Shoulder, boned and rolled',
      summary: 'For slow roasting.',
      finish: 'rolled',
    });
  });
  afterAll(() => house.close());

  const add = (code: string, where: { cutNodeId: string; sourceNodeId: string }, content = {}) =>
    addTestSpecification(house.database, { now: TEST_NOW, people, code, ...where, content });

  it('shows a buyer the version in force with its choices, and nothing of what it costs the plant', async () => {
    const { status, body } = await house.call(buyer, getSpecification, { params: { code: 'BF-201' } });
    expect(status).toBe(200);
    expect(body).toMatchObject({
      version: 1,
      name: 'Striploin steak',
      path: [{ name: 'Beef' }, { name: 'Striploin' }, {}],
    });
    expect(body.choices[0]?.values).toMatchObject([{ value: '6' }, { value: '3', priceChangeMinorPerKg: 90 }]);
    expect(JSON.stringify(body)).not.toMatch(/yield|seconds|station|output|author|tare/i);
  });

  it('shows staff the yields, work and versions, and keeps them from buyers', async () => {
    const { body } = await house.call(people.author, getStaffSpecification, { params: { code: 'BF-201' }, query: {} });
    expect(body).toMatchObject({
      yieldPpm: 784_000,
      sourceName: 'Striploin',
      authorName: 'Ada Author',
      approverName: 'Ben Reviewer',
      versions: [{ version: 1, standing: 'current' }],
    });
    expect(body.choices[0]?.values[0]?.yieldFactorPpm).toBe(990_000);
    const refused = await house.call(buyer, getStaffSpecification, { params: { code: 'BF-201' }, query: {} });
    expect(refused.status).toBe(403);
    const missing = { params: { code: 'BF-201' }, query: { version: 9 } };
    expect((await house.call(people.author, getStaffSpecification, missing)).status).toBe(404);
  });

  it('lists the newest versions for technical people', async () => {
    const { body } = await house.call(people.author, listVersions, { query: { limit: 2 } });
    expect(body.items).toMatchObject([
      { code: 'BF-201', primalName: 'Striploin', standing: 'current' },
      { code: 'BF-202' },
    ]);
    const rest = await house.call(people.author, listVersions, { query: { cursor: body.nextCursor ?? '' } });
    expect(rest.body.items.map(({ code }) => code)).toEqual(['LM-101']);
    expect((await house.call(people.author, listVersions, { query: { q: 'rolled' } })).body.items).toHaveLength(1);
  });

  it('gives the cut tree, parents before children', async () => {
    const { body } = await house.call(buyer, getCutTree, {});
    expect(body.nodes.map(({ name }) => name)).toEqual([
      'Lamb',
      'Beef',
      'Shoulder',
      'Striploin',
      'Rolled shoulder',
      'Striploin steak',
    ]);
  });

  it('is closed to whoever is not signed in', async () => {
    expect((await house.call({ kind: 'anonymous' }, getCutTree, {})).status).toBe(401);
  });

  it('withdraws with a reason: neither found nor shown to buyers any more, once only', async () => {
    await add('BF-203', { cutNodeId: tree.steakId, sourceNodeId: tree.striploinId }, { name: 'Minute steak' });
    const withdrawal = { params: { code: 'BF-203' }, body: { reason: 'No longer cut' } };

    expect((await house.call(buyer, withdrawSpecification, { ...withdrawal, ifMatch: 1 })).status).toBe(403);
    expect((await house.call(people.author, withdrawSpecification, withdrawal)).status).toBe(428);
    const outdated = await house.call(people.author, withdrawSpecification, { ...withdrawal, ifMatch: 7 });
    expect(outdated.problem).toMatchObject({ status: 412, code: 'stale' });

    const done = await house.call(people.author, withdrawSpecification, { ...withdrawal, ifMatch: 1 });
    expect(done.body).toMatchObject({ standing: 'withdrawn', rowVersion: 2, versions: [{ reason: 'No longer cut' }] });
    const gone = await house.call(buyer, getSpecification, { params: { code: 'BF-203' } });
    expect(gone.problem).toMatchObject({ status: 404, code: 'specification-withdrawn' });
    expect(gone.problem.detail).toContain('BF-203');
    const again = await house.call(people.author, withdrawSpecification, { ...withdrawal, ifMatch: 2 });
    expect(again.problem).toMatchObject({ status: 409, code: 'move-not-allowed' });
  });

  it('knows nothing of a code that never was', async () => {
    const { problem } = await house.call(buyer, getSpecification, { params: { code: 'ZZ-999' } });
    expect(problem).toMatchObject({ status: 404, code: 'not-found' });
    expect((await house.call(buyer, getSpecification, { params: { code: 'nonsense' } })).status).toBe(404);
  });
});

import { aContent } from '@seamwright/catalogue/domain/testing';
import { inTransaction, system, type Tx } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import {
  addTestPeople,
  addTestSpecification,
  addTestTree,
  type TestPeople,
  type TestTree,
} from '@seamwright/catalogue/server/testing';
import { approveVersion } from './approve-version';
import { currentVersions, versionEntries, versionsByIds } from './specifications.repository';
import { createSpecification, createVersion, submitVersion } from './write-version';

describe('a version on its way to being in force', () => {
  let house: TestHouse;
  let tree: TestTree;
  let people: TestPeople;
  let count = 300;

  beforeAll(async () => {
    house = await openTestHouse();
    tree = await addTestTree(house.database);
    people = await addTestPeople(house.database, TEST_NOW);
  });
  afterAll(() => house.close());

  const as = <T>(who: keyof TestPeople, work: (tx: Tx) => Promise<T>) =>
    inTransaction(house.database, people[who], work);
  const where = () => ({ cutNodeId: tree.steakId, sourceNodeId: tree.striploinId, code: `BF-${++count}` });
  const approved = () => addTestSpecification(house.database, { now: TEST_NOW, people, ...where() });
  const draft = (content = {}) =>
    as('author', async (tx) => {
      const { code, cutNodeId, sourceNodeId } = where();
      const specificationId = await createSpecification(tx, { now: TEST_NOW, code, cutNodeId });
      return createVersion(tx, {
        caller: people.author,
        specificationId,
        content: aContent({ sourceNodeId, ...content }),
      });
    });
  const approve = (who: keyof TestPeople, versionId: string) =>
    as(who, (tx) => approveVersion(tx, { now: TEST_NOW, caller: people[who], versionId }));

  it('is approved by another person, never by its author', async () => {
    const versionId = await draft();
    await as('author', (tx) => submitVersion(tx, versionId));

    await expect(approve('author', versionId)).rejects.toMatchObject({ refusal: { code: 'own-version' } });
    await approve('approver', versionId);

    const version = (await as('approver', (tx) => versionsByIds(tx, [versionId]))).get(versionId);
    expect(version).toMatchObject({ state: 'approved', standing: 'current', version: 1, approvedAt: TEST_NOW });
  });

  it('is not approved before it was sent to review, nor twice', async () => {
    const versionId = await draft();
    await expect(approve('approver', versionId)).rejects.toMatchObject({ refusal: { code: 'move-not-allowed' } });

    await as('author', (tx) => submitVersion(tx, versionId));
    await approve('approver', versionId);
    await expect(approve('approver', versionId)).rejects.toMatchObject({ refusal: { code: 'move-not-allowed' } });
  });

  it('reads back what was written', async () => {
    const version = await approved();
    const { code: _code, ...read } = version;
    expect(read).toMatchObject(aContent({ sourceNodeId: tree.striploinId }));
    expect(version.yieldPpm).toBe(784_000);
  });

  it('never changes once approved: the database refuses', async () => {
    const { id } = await approved();
    const change = as('author', (tx) =>
      tx.updateTable('specificationVersions').set({ fatCoverMm: 12 }).where('id', '=', id).execute(),
    );
    await expect(change).rejects.toMatchObject({ constraint: 'approved_version' });
    const removal = as('author', (tx) => tx.deleteFrom('specificationVersions').where('id', '=', id).execute());
    await expect(removal).rejects.toMatchObject({ constraint: 'approved_version' });
  });

  it('supersedes the version before it', async () => {
    const first = await approved();
    const second = await as('author', async (tx) => {
      const content = aContent({ sourceNodeId: tree.striploinId, fatCoverMm: 3 });
      const id = await createVersion(tx, { caller: people.author, specificationId: first.specificationId, content });
      await submitVersion(tx, id);
      return id;
    });
    await approve('approver', second);

    const current = await as('author', (tx) => currentVersions(tx, [first.specificationId]));
    expect(current.get(first.specificationId)).toMatchObject({ id: second, version: 2, fatCoverMm: 3 });
    const entries = await as('author', (tx) => versionEntries(tx, first.specificationId));
    expect(entries.map(({ version, standing }) => [version, standing])).toEqual([
      [2, 'current'],
      [1, 'superseded'],
    ]);
  });

  it('is told to whoever listens', async () => {
    const version = await approved();
    const told = await inTransaction(house.database, system('job'), (tx) =>
      tx.selectFrom('outboxEvents').selectAll().where('subjectId', '=', version.specificationId).execute(),
    );
    expect(told).toMatchObject([{ type: 'specification-approved', payload: { versionId: version.id } }]);
  });

  it('is refused with every fault and its field', async () => {
    const faulty = draft({ fatCoverMm: -1, steps: [{ text: ' ' }], pieceMinGrams: 300 });
    await expect(faulty).rejects.toMatchObject({
      status: 422,
      errors: [{ pointer: '/fatCoverMm' }, { pointer: '/steps/0' }, { pointer: '/pieceNominalGrams' }],
    });
  });

  it('is written by a person', async () => {
    const nobody = inTransaction(house.database, system('job'), (tx) =>
      createVersion(tx, { caller: system('job'), specificationId: tree.beefId, content: aContent() }),
    );
    await expect(nobody).rejects.toMatchObject({ refusal: { code: 'not-allowed' } });
  });
});

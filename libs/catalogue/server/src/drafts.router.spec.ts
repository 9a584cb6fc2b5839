import {
  addComment,
  approveReviewed,
  discardDraft,
  getDraft,
  getStaffSpecification,
  listComments,
  listDrafts,
  openDraft,
  openSpecification,
  saveDraft,
  sendBackReviewed,
  submitDraft,
} from '@seamwright/catalogue/contracts';
import { aContent } from '@seamwright/catalogue/domain/testing';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import {
  addTestPeople,
  addTestSpecification,
  addTestTree,
  type TestPeople,
  type TestTree,
} from '@seamwright/catalogue/server/testing';
import { catalogueImplementations } from './catalogue.implementations';

describe('writing a specification over HTTP', () => {
  let house: TestHouse;
  let tree: TestTree;
  let people: TestPeople;
  let count = 500;

  beforeAll(async () => {
    house = await openTestHouse({ implementations: () => catalogueImplementations });
    tree = await addTestTree(house.database);
    people = await addTestPeople(house.database, TEST_NOW);
  });
  afterAll(() => house.close());

  const newCode = () => `LM-${++count}`;
  const content = () => ({ ...aContent(), sourceNodeId: tree.shoulderId }) as never;
  const opened = async (code = newCode()) => {
    const body = { code, cutNodeId: tree.rolledShoulderId, name: 'Rolled shoulder' };
    return (await house.call(people.author, openSpecification, { body })).body;
  };
  const saved = async (code: string, rowVersion: number, written: never = content()) =>
    (await house.call(people.author, saveDraft, { params: { code }, body: { content: written }, ifMatch: rowVersion }))
      .body;
  const reviewed = async () => {
    const { code, rowVersion } = await opened();
    const draft = await saved(code, rowVersion);
    const sent = await house.call(people.author, submitDraft, { params: { code }, ifMatch: draft.rowVersion });
    return { code, sent: sent.body };
  };

  it('goes from nothing into force: opened, typed, sent to review, approved by another', async () => {
    const { code, sent } = await reviewed();
    expect(sent).toMatchObject({ code, version: 1, state: 'in-review', standing: null });
    expect((await house.call(people.author, getDraft, { params: { code } })).status).toBe(404);
    const approval = { params: { code, version: 1 }, ifMatch: sent.rowVersion };

    const own = await house.call(people.author, approveReviewed, approval);
    expect([own.status, own.problem?.code]).toEqual([422, 'own-version']);
    const stale = await house.call(people.approver, approveReviewed, { ...approval, ifMatch: sent.rowVersion + 1 });
    expect(stale.status).toBe(412);
    const done = await house.call(people.approver, approveReviewed, approval);
    expect(done.body).toMatchObject({ state: 'approved', standing: 'current', approverName: 'Ben Reviewer' });
  });

  it('keeps what was typed, half done or wrong, and tells all that is missing or wrong before review', async () => {
    const { code, rowVersion, content: first } = await opened();
    expect(first).toEqual({ name: 'Rolled shoulder' });
    const half = { name: 'Rolled shoulder', fatCoverMm: -2, steps: [{ text: '' }] } as never;
    const draft = await saved(code, rowVersion, half);
    expect(draft.content).toEqual(half);

    const refused = await house.call(people.author, submitDraft, { params: { code }, ifMatch: draft.rowVersion });
    expect(refused.status).toBe(422);
    const pointers = refused.problem?.errors?.map(({ pointer }) => pointer) ?? [];
    expect(pointers).toEqual(expect.arrayContaining(['/cuttingLines', '/fatCoverMm', '/steps/0', '/yieldPpm']));
    expect((await house.call(people.author, getDraft, { params: { code } })).body.content).toEqual(half);
  });

  it('is changed by its author only, and not over what another tab saved', async () => {
    const { code, rowVersion } = await opened();
    const body = { content: content() };
    const other = await house.call(people.approver, saveDraft, { params: { code }, body, ifMatch: rowVersion });
    expect([other.status, other.problem?.detail]).toEqual([403, expect.stringContaining('Only Ada Author')]);
    await saved(code, rowVersion);
    const late = await house.call(people.author, saveDraft, { params: { code }, body, ifMatch: rowVersion });
    expect(late.status).toBe(412);
  });

  it('is given back with a reason, and goes to review again under the same number', async () => {
    const { code, sent } = await reviewed();
    const say = { version: 1, pointer: '/cuttingLines', body: 'At which rib?' };
    await house.call(people.approver, addComment, { params: { code }, body: say });
    const back = await house.call(people.approver, sendBackReviewed, {
      params: { code, version: 1 },
      body: { reason: 'Say at which rib it is cut.' },
      ifMatch: sent.rowVersion,
    });
    expect(back.body).toMatchObject({ code, baseVersion: null, authorName: 'Ada Author', content: { fatCoverMm: 6 } });
    const { items } = (await house.call(people.author, listComments, { params: { code } })).body;
    expect(items.map(({ body, pointer, version, saidByName }) => [body, pointer, version, saidByName])).toEqual([
      ['At which rib?', '/cuttingLines', null, 'Ben Reviewer'],
      ['Say at which rib it is cut.', null, null, 'Ben Reviewer'],
    ]);
    const again = await house.call(people.author, submitDraft, { params: { code }, ifMatch: back.body.rowVersion });
    expect(again.body).toMatchObject({ version: 1, state: 'in-review' });
  });

  it('of a next version begins as a copy of the newest, one at a time', async () => {
    const code = newCode();
    const place = { now: TEST_NOW, people, cutNodeId: tree.rolledShoulderId, sourceNodeId: tree.shoulderId };
    await addTestSpecification(house.database, { ...place, code });
    const draft = (await house.call(people.author, openDraft, { params: { code } })).body;
    expect(draft).toMatchObject({ baseVersion: 1, content: { fatCoverMm: 6, name: 'Striploin steak' } });
    const second = await house.call(people.approver, openDraft, { params: { code } });
    expect([second.status, second.problem?.detail]).toEqual([409, expect.stringContaining('Ada Author')]);

    const sent = (await house.call(people.author, submitDraft, { params: { code }, ifMatch: draft.rowVersion })).body;
    expect((await house.call(people.author, openDraft, { params: { code } })).status).toBe(409);
    const approval = { params: { code, version: 2 }, ifMatch: sent.rowVersion };
    await house.call(people.approver, approveReviewed, approval);
    const record = (await house.call(people.author, getStaffSpecification, { params: { code } })).body;
    expect(record.versions.map(({ version, standing }) => [version, standing])).toEqual([
      [2, 'current'],
      [1, 'superseded'],
    ]);
    expect(
      (await house.call(people.approver, sendBackReviewed, { ...approval, body: { reason: 'Late' } })).status,
    ).toBe(409);
  });

  it('is thrown away with its specification when there is no version, and its code is free again', async () => {
    const { code, rowVersion } = await opened();
    const body = { code, cutNodeId: tree.rolledShoulderId, name: 'Another' };
    const twice = await house.call(people.approver, openSpecification, { body });
    expect([twice.status, twice.problem?.detail]).toEqual([409, expect.stringContaining(code)]);
    const listed = (await house.call(people.approver, listDrafts, {})).body.items.map(({ code: each }) => each);
    expect(listed).toContain(code);
    await house.call(people.author, discardDraft, { params: { code }, ifMatch: rowVersion });
    expect((await house.call(people.approver, openSpecification, { body })).status).toBe(201);
  });
});

import {
  addUneceValue,
  correctUneceValue,
  getStaffSpecification,
  listUneceValues,
  readUnece,
} from '@seamwright/catalogue/contracts';
import {
  addTestPeople,
  addTestSpecification,
  addTestTree,
  type TestPeople,
  type TestTree,
} from '@seamwright/catalogue/server/testing';
import { inTransaction, system, type Caller } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';
import { catalogueImplementations } from './catalogue.implementations';

describe('the UNECE code of the house', () => {
  let house: TestHouse;
  let tree: TestTree;
  let people: TestPeople;
  const personId: string = newId();
  const admin: Caller = { kind: 'staff', personId, roles: ['admin'], customers: '*' };

  beforeAll(async () => {
    house = await openTestHouse({ implementations: () => catalogueImplementations });
    tree = await addTestTree(house.database);
    people = await addTestPeople(house.database, TEST_NOW);
  });
  afterAll(() => house.close());

  const CHEEK = { field: 'item' as const, value: '7001', meaning: 'Cheek', species: 'beef' as const, source: null };
  const add = (over: object = {}, caller: Caller = admin) =>
    house.call(caller, addUneceValue, { body: { ...CHEEK, ...over } });
  const specification = (code: string, content: object) =>
    addTestSpecification(house.database, {
      ...{ now: TEST_NOW, people, code, content },
      ...{ cutNodeId: tree.steakId, sourceNodeId: tree.striploinId },
    });
  const codeOf = async (code: string) =>
    (await house.call(people.author, getStaffSpecification, { params: { code }, query: {} })).body.unece;

  it('begins with lists that say what was read and what is from memory', async () => {
    const { body } = await house.call(people.author, listUneceValues, { query: { limit: 200 } });
    expect(body.items.length).toBeGreaterThan(80);
    expect(body.items.filter(({ seen, source }) => seen !== (source !== null))).toEqual([]);
    const fields = [...new Set(body.items.map(({ field }) => field))];
    expect(fields.slice(0, 3)).toEqual(['species', 'item', 'unused']);

    const first = (await house.call(people.author, listUneceValues, { query: { field: 'packing', limit: 3 } })).body;
    const rest = await house.call(people.author, listUneceValues, {
      query: { field: 'packing', cursor: first.nextCursor ?? '' },
    });
    const packing = body.items.filter(({ field }) => field === 'packing');
    expect([...first.items, ...rest.body.items]).toEqual(packing);
  });

  it('is completed and corrected by an administrator, from memory until a source is named', async () => {
    const { status, body } = await add();
    expect([status, body.seen, body.rowVersion]).toEqual([201, false, 1]);
    const correct = (ifMatch: number | undefined, source: string | null, caller: Caller = admin) =>
      house.call(caller, correctUneceValue, {
        ...(ifMatch === undefined ? {} : { ifMatch }),
        params: { id: body.id },
        body: { meaning: 'Cheek meat', source },
      });
    expect((await correct(undefined, null)).status).toBe(428);
    expect((await correct(7, null)).status).toBe(412);
    expect((await correct(1, 'Chapter 5 of the standard', people.author)).status).toBe(403);
    const corrected = await correct(1, 'Chapter 5 of the standard');
    expect(corrected.body).toMatchObject({ meaning: 'Cheek meat', seen: true, rowVersion: 2 });
    expect((await correct(2, null)).body).toMatchObject({ seen: false, source: null });

    const audit = await inTransaction(house.database, admin, (tx) =>
      tx.selectFrom('auditEntries').select(['action', 'personId']).where('rowId', '=', body.id).orderBy('id').execute(),
    );
    expect(audit).toEqual(['insert', 'update', 'update'].map((action) => ({ action, personId })));
  });

  it('refuses a value twice, of the wrong length, or for a species that has one', async () => {
    const refused = async (over: object) => {
      const { status, problem } = await add(over);
      return [status, problem.code, problem.errors[0]?.pointer];
    };
    expect(await refused({ value: '7001' })).toEqual([422, 'unece-value-taken', '/value']);
    expect(await refused({ value: '701' })).toEqual([422, 'unece-field-digits', '/value']);
    expect(await refused({ value: 'x701' })).toEqual([422, 'unece-field-digits', '/value']);
    expect(await refused({ field: 'species', value: '12' })).toEqual([422, 'unece-species-taken', '/species']);
    expect((await add({}, people.author)).status).toBe(403);
  });

  it('is read by field, or refused by field', async () => {
    const read = (code: string) => house.call(people.author, readUnece, { query: { code } });
    // Constructed to exercise the parser: no published example.
    const { body } = await read('40 4990 00 1 1 0 00 0 0 3 0 0 5 0');
    expect(body).toMatchObject({ code: '40499000110000030050', gs1Element: '(7002)40499000110000030050' });
    expect(body.fields).toHaveLength(14);
    const wrong = (await read('4049900011000003005')).problem;
    expect([wrong.status, wrong.errors[0]?.message]).toEqual([422, expect.stringContaining('20')]);
    const faults = (await read('40499001110000030a50')).problem.errors.map(({ pointer }) => pointer);
    expect(faults).toEqual(['/fields/unused', '/fields/weightRange']);
  });

  it('of a specification is built from the version and what its author chose', async () => {
    await specification('BF-501', { uneceItem: '2140', uneceFields: { packing: '5', feeding: '07' } });
    const { reading, faults } = await codeOf('BF-501');
    expect(faults).toEqual([]);
    expect(reading?.code).toMatch(/^..214000.00070000050$/);
    expect(reading?.species).toBe('beef');
    expect(reading?.fields.find(({ field }) => field === 'item')?.meaning).toMatchObject({ seen: true });
  });

  it('of a specification without an item number, or with one that is in no list, is none, and says why', async () => {
    await specification('BF-502', { uneceItem: null });
    await specification('BF-503', { uneceItem: '9999' });
    expect(await codeOf('BF-502')).toMatchObject({ reading: null, faults: [{ pointer: '/uneceItem' }] });
    expect(await codeOf('BF-503')).toMatchObject({ reading: null, faults: [{ pointer: '/uneceFields/item' }] });
  });

  it('keeps a version from review when a value is in no list', async () => {
    const wrong = specification('BF-504', { uneceFields: { packing: '8', feeding: '7' } });
    await expect(wrong).rejects.toMatchObject({
      status: 422,
      errors: [{ pointer: '/uneceFields/feeding' }, { pointer: '/uneceFields/packing' }],
    });
  });

  it('is audited from the day that the house opens, not before', async () => {
    const atFirst = await inTransaction(house.database, system('job'), (tx) =>
      tx
        .selectFrom('auditEntries')
        .select('id')
        .where('tableName', '=', 'unece_field_values')
        .where('personId', 'is', null)
        .execute(),
    );
    expect(atFirst).toEqual([]);
  });
});

import request from 'supertest';
import * as z from 'zod';
import { anyone, defineEndpoint, id, line, ownCustomer, rowVersion, staffOnly } from '@seamwright/shared/contracts';
import { newId } from '@seamwright/shared/util';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { anonymous, system, type Caller } from '../database/caller';
import { inTransaction, type Tx } from '../database/in-transaction';
import { implement, implementOnce } from './implement';
import { notFound, stale } from './problems';

const kitchen = z.strictObject({ id, name: z.string(), rowVersion });
const create = defineEndpoint({
  id: 'kitchens.create',
  summary: 'Adds a kitchen',
  method: 'POST',
  path: '/kitchens',
  access: staffOnly('admin'),
  body: z.strictObject({ name: line(20), seats: z.int().min(1).optional() }),
  response: kitchen,
  status: 201,
  idempotent: true,
});
const get = defineEndpoint({
  id: 'kitchens.get',
  summary: 'One kitchen',
  method: 'GET',
  path: '/kitchens/:kitchenId',
  access: ownCustomer('buyer', 'admin'),
  params: { kitchenId: id },
  query: { depth: z.int().default(1), open: z.boolean().optional() },
  response: kitchen,
});
const rename = defineEndpoint({
  id: 'kitchens.rename',
  summary: 'Renames a kitchen',
  method: 'PATCH',
  path: '/kitchens/:kitchenId',
  access: ownCustomer('admin'),
  params: { kitchenId: id },
  body: z.strictObject({ name: line(20) }),
  response: kitchen,
  guarded: true,
});
const leak = defineEndpoint({
  id: 'kitchens.leak',
  summary: 'Answers more than it declares',
  method: 'GET',
  path: '/leak',
  access: anyone,
  response: z.strictObject({ name: z.string() }),
});
const menu = defineEndpoint({
  id: 'kitchens.menu',
  summary: 'Takes a file and gives it back',
  method: 'POST',
  path: '/menu',
  access: staffOnly('admin'),
  upload: { maxBytes: 1_048_576 },
  file: 'text/plain',
});

const one = async (tx: Tx, kitchenId: string) => {
  const row = await tx
    .selectFrom('customers')
    .select(['id', 'name', 'rowVersion'])
    .where('id', '=', kitchenId)
    .executeTakeFirst();
  if (!row) throw notFound();
  return row;
};

const implementations = [
  implementOnce(create, {
    async make(tx, { now }, { body }) {
      const kitchenId = newId();
      await tx
        .insertInto('customers')
        .values({
          id: kitchenId,
          name: body.name,
          kind: 'pub',
          invoiceEmail: 'a@b.example',
          billingAddress: '-',
          createdAt: now,
        })
        .execute();
      return kitchenId;
    },
    present: (tx, _context, kitchenId) => one(tx, kitchenId),
  }),
  implement(get, ({ database, caller }, { params }) =>
    inTransaction(database, caller, (tx) => one(tx, params.kitchenId)),
  ),
  implement(rename, ({ database, caller, ifMatch }, { params, body }) =>
    inTransaction(database, caller, async (tx) => {
      const before = await one(tx, params.kitchenId);
      const changed = await tx
        .updateTable('customers')
        .set({ name: body.name, rowVersion: before.rowVersion + 1 })
        .where('id', '=', params.kitchenId)
        .where('rowVersion', '=', ifMatch)
        .executeTakeFirst();
      if (changed.numUpdatedRows === 0n) throw stale();
      return one(tx, params.kitchenId);
    }),
  ),
  implement(leak, async () => ({ name: 'Larder', cost: 12 }) as { name: string }),
  implement(menu, async ({ upload }) => ({ fileName: 'menu £.txt', bytes: upload?.bytes ?? Buffer.alloc(0) })),
];

describe('the router made from declarations', () => {
  let house: TestHouse;
  const admin: Caller = { kind: 'staff', personId: newId(), roles: ['admin'], customers: '*' };
  const buyerOf = (customerId: string): Caller => ({
    kind: 'user',
    personId: newId(),
    roles: ['buyer'],
    customerId,
    sites: '*',
  });
  const added = async (name = 'Larder') => (await house.call(admin, create, { body: { name } })).body;

  beforeAll(async () => {
    house = await openTestHouse({ implementations: () => implementations });
  });
  afterAll(() => house.close());

  it('creates once per key, and presents what was made as it is now on a repeat', async () => {
    const idempotencyKey = newId();
    const first = await house.call(admin, create, { body: { name: 'Once' }, idempotencyKey });
    await house.call(admin, rename, { params: { kitchenId: first.body.id }, body: { name: 'Renamed' }, ifMatch: 1 });
    const again = await house.call(admin, create, { body: { name: 'Once' }, idempotencyKey });
    expect([first.status, again.status]).toEqual([201, 201]);
    expect(again.body).toEqual({ id: first.body.id, name: 'Renamed', rowVersion: 2 });
  });

  it('makes one thing when the same key comes five times at once', async () => {
    const idempotencyKey = newId();
    const answers = await Promise.all(
      Array.from({ length: 5 }, () => house.call(admin, create, { body: { name: 'Rush' }, idempotencyKey })),
    );
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201, 201]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    const made = await inTransaction(house.database, system('job'), (tx) =>
      tx.selectFrom('customers').select('id').where('name', '=', 'Rush').execute(),
    );
    expect(made).toHaveLength(1);
  });

  it('refuses a key that was used for another request', async () => {
    const idempotencyKey = newId();
    await house.call(admin, create, { body: { name: 'One thing' }, idempotencyKey });
    const other = await house.call(admin, create, { body: { name: 'Another' }, idempotencyKey });
    expect([other.status, other.problem.code]).toEqual([422, 'key-reused']);
  });

  it('keeps one caller’s keys apart from another’s', async () => {
    const idempotencyKey = newId();
    const colleague: Caller = { ...admin, personId: newId() } as Caller;
    const mine = await house.call(admin, create, { body: { name: 'Shared key' }, idempotencyKey });
    const theirs = await house.call(colleague, create, { body: { name: 'Shared key' }, idempotencyKey });
    expect(theirs.body.id).not.toBe(mine.body.id);
  });

  it('says what was wrong with each field, unknown ones by name, and stores nothing', async () => {
    const answer = await house.call(admin, create, { body: { name: '', seats: 0, colour: 'red' } as { name: string } });
    expect([answer.status, answer.problem.code]).toEqual([422, 'invalid']);
    expect(answer.problem.errors.map(({ pointer }) => pointer).sort()).toEqual(['/colour', '/name', '/seats']);
    expect(answer.headers['content-type']).toContain('application/problem+json');
  });

  it.each([
    ['nobody', anonymous, 401, 'not-signed-in'],
    [
      'another role',
      { kind: 'staff', personId: newId(), roles: ['floor'], customers: '*' } as Caller,
      403,
      'not-allowed',
    ],
  ])('refuses %s before it looks at what was sent', async (_, caller, status, code) => {
    const answer = await house.call(caller, create, { body: {} as { name: string } });
    expect([answer.status, answer.problem.code]).toEqual([status, code]);
  });

  it('answers 404 for what belongs to another customer, as for what is not there or can be no id', async () => {
    const { id: kitchenId } = await added();
    const other = await added('Other');
    const caller = buyerOf(kitchenId);
    expect((await house.call(caller, get, { params: { kitchenId } })).status).toBe(200);
    for (const wrong of [other.id, newId(), 'not-an-id', '../etc']) {
      expect((await house.call(caller, get, { params: { kitchenId: wrong } })).status).toBe(404);
    }
  });

  it('guards edits by the row version', async () => {
    const { id: kitchenId } = await added();
    const edit = (ifMatch: number | undefined) =>
      house.call(admin, rename, { params: { kitchenId }, body: { name: 'New' }, ...(ifMatch ? { ifMatch } : {}) });
    expect((await edit(undefined)).status).toBe(428);
    const done = await edit(1);
    expect([done.status, done.headers['etag'], done.body.rowVersion]).toEqual([200, '"2"', 2]);
    const late = await edit(1);
    expect([late.status, late.problem.code]).toEqual([412, 'stale']);
  });

  it('reads numbers and truth values of a query, and refuses what is neither', async () => {
    const { id: kitchenId } = await added();
    const asked = (query: object) =>
      house.call(admin, get, { params: { kitchenId }, query: query as { depth?: number } });
    expect((await asked({ depth: 3, open: true })).status).toBe(200);
    const wrong = await asked({ depth: 'deep', open: 'perhaps', page: 1 });
    expect(wrong.problem.errors.map(({ pointer }) => pointer).sort()).toEqual(['/depth', '/open', '/page']);
  });

  it('never lets out a field that the contract does not declare', async () => {
    const answer = await house.call(anonymous, leak, {});
    expect([answer.status, answer.problem.code]).toEqual([500, 'unexpected']);
    expect(JSON.stringify(answer.problem)).not.toContain('cost');
  });

  it('takes a file and answers one with its name', async () => {
    const answer = await house.call(admin, menu, { file: { bytes: Buffer.from('lamb'), name: 'menu.txt' } });
    expect(answer.bytes.toString()).toBe('lamb');
    expect(answer.headers['content-disposition']).toBe("attachment; filename*=UTF-8''menu%20%C2%A3.txt");
  });

  it('refuses a file that is too large, and a request without one', async () => {
    const large = await house.call(admin, menu, { file: { bytes: Buffer.alloc(1_048_577), name: 'big.bin' } });
    expect([large.status, large.problem.code]).toEqual([413, 'too-large']);
    const none = await house.call(admin, menu, {});
    expect([none.status, none.problem.code]).toEqual([400, 'file-missing']);
  });

  describe('with requests that no client of ours would send', () => {
    const raw = async (body: string, type = 'application/json', key: string = newId()) => {
      const token = `Test ${JSON.stringify(admin)}`;
      await house.call(admin, get, { params: { kitchenId: newId() } });
      return request(house.app)
        .post('/api/v1/kitchens')
        .set({ authorization: token, 'content-type': type, 'idempotency-key': key })
        .send(body);
    };

    it.each([
      ['unreadable JSON', '{"name":', 'application/json', 400, 'unreadable'],
      ['JSON that is no object', '"name"', 'application/json', 400, 'unreadable'],
      ['another media type', '<name/>', 'application/xml', 415, 'wrong-media-type'],
      ['more than a megabyte', `{"name":"${'x'.repeat(1_100_000)}"}`, 'application/json', 413, 'too-large'],
      ['a list', '[]', 'application/json', 422, 'invalid'],
      ['a NUL in a name', '{"name":"Lar\\u0000der"}', 'application/json', 422, 'invalid'],
      ['a prototype', '{"__proto__":{"name":"x"},"name":"ok","constructor":1}', 'application/json', 422, 'invalid'],
    ])('answers %s with a clear problem', async (_, body, type, status, code) => {
      const answer = await raw(body, type);
      const problem = JSON.parse(answer.text) as { code: string };
      expect([answer.status, problem.code]).toEqual([status, code]);
    });

    it('refuses a deed without a key, or with one too short to be unique', async () => {
      const answer = await raw('{"name":"x"}', 'application/json', 'short');
      expect([answer.status, JSON.parse(answer.text).code]).toEqual([400, 'key-missing']);
    });
  });

  it('stamps what it makes with the clock it was given', async () => {
    const { id: kitchenId } = await added();
    const { createdAt } = await inTransaction(house.database, system('job'), (tx) =>
      tx.selectFrom('customers').select('createdAt').where('id', '=', kitchenId).executeTakeFirstOrThrow(),
    );
    expect(createdAt).toEqual(TEST_NOW);
  });
});

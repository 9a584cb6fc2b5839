// Whatever is sent to any endpoint, the answer is that it was done or a problem that says why not; nothing is half-stored.
import fc from 'fast-check';
import { getCutTree } from '@seamwright/catalogue/contracts';
import { isBuyerRole, type AnyEndpoint } from '@seamwright/shared/contracts';
import { anonymous, type Caller } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import request from 'supertest';
import { listenOnLoopback, type LoopbackServer } from '../../../../tools/stand-in/loopback-server';
import type { AnyInput, Row } from '../permissions/row';
import { everyRow } from '../permissions/rows/every-row';
import { imprintOf, type Imprint } from '../permissions/untouched';
import { addParty } from '../permissions/testing/party';
import { openWorld, type World } from '../permissions/testing/world';
import { fromSchema } from './from-schema';
import { headers, junk, spoilt, WICKED_TEXTS } from './junk';
import { faultOf, knock, pathOf, tokenOf, type Knock } from './knock';

const SEED = 20_261_201;
const TRIES = 30;
/** What a refusal leaves behind on purpose: failures are counted, and a card that was refused is remembered. */
const LEFT_ON_PURPOSE: Readonly<Record<string, readonly string[]>> = {
  'session.sign-in': ['sign_in_failures'],
  'passwords.change': ['sign_in_failures'],
  'cards.add': ['cards', 'idempotency_keys', 'processor_customers'],
};

let world: World;
let listening: LoopbackServer;

beforeAll(async () => {
  world = await openWorld();
  listening = await listenOnLoopback(world.house.app, 0);
  const { staff, own, house } = world;
  for (const caller of [...Object.values(staff), own.buyer, own.owner]) await house.call(caller, getCutTree, {});
});
afterAll(async () => {
  await listening.close();
  await world.house.close();
});

/** Where one endpoint is knocked at: a customer of its own, so that what is changed by chance spoils nothing for the next. */
interface Scene {
  readonly caller: Caller;
  readonly right: AnyInput;
  /** Ids that are somebody's. */
  readonly known: readonly string[];
}

async function sceneOf(row: Row): Promise<Scene> {
  const { house, zoneId, steak, other, tree } = world;
  const { specificationId } = steak;
  const own = await addParty(house.database, { name: `Kitchen ${world.next()}`, zoneId, specificationId });
  const scene = { ...world, own };
  const caller = callerFor(row.endpoint, scene);
  // From now on the house knows the caller by the token alone.
  await house.call(caller, getCutTree, {});
  return {
    caller,
    right: await rightInput(row, scene, caller),
    known: [own.id, other.id, own.siteId, own.priceListId, specificationId, steak.id, tree.striploinId, zoneId],
  };
}

/** Whoever may call, in the widest role. */
function callerFor({ access }: AnyEndpoint, { staff, own }: World): Caller {
  if (access.who === 'anyone') return anonymous;
  const role = access.roles.includes('admin') ? 'admin' : (access.roles[0] ?? 'admin');
  if (!isBuyerRole(role)) return staff[role];
  return role === 'buyer' ? own.buyer : own.owner;
}

function rightInput(row: Row, scene: World, caller: Caller): Promise<AnyInput> | AnyInput {
  if (row.belongsTo === 'customer') return row.input(scene, scene.own);
  return row.belongsTo === 'caller' ? row.input(scene, caller) : row.input(scene);
}

const asTexts = (values: object): Record<string, string> =>
  Object.fromEntries(Object.entries(values).map(([name, value]) => [name, String(value)]));

/** Requests that are wrong somewhere: in the address, the query, the body or the headers. */
function knocksAt({ endpoint }: Row, { right, known }: Scene): fc.Arbitrary<Knock> {
  const rightParams = asTexts(right.params ?? {});
  const wrongParams = Object.fromEntries(
    Object.keys(rightParams).map((name) => [
      name,
      fc.constantFrom(...known, ...WICKED_TEXTS.filter(({ length }) => length < 2_000)),
    ]),
  );
  const rightQuery = { ...right.query };
  const query = Object.keys(endpoint.query.shape).length
    ? fc.oneof(fromSchema(endpoint.query, known), spoilt(rightQuery)).map(asQuery)
    : fc.oneof({ weight: 9, arbitrary: fc.constant({}) }, { weight: 1, arbitrary: fc.constant({ unknown: '1' }) });
  const body = endpoint.body
    ? fc.oneof(
        { weight: 4, arbitrary: fromSchema(endpoint.body, known) },
        { weight: 4, arbitrary: spoilt(right.body) },
        { weight: 1, arbitrary: junk },
      )
    : fc.constant(undefined);
  const mostly = <T>(usual: T, wrong: fc.Arbitrary<T>): fc.Arbitrary<T> =>
    fc.oneof({ weight: 6, arbitrary: fc.constant(usual) }, { weight: 1, arbitrary: wrong });
  return fc.record({
    params: mostly<Record<string, string>>(rightParams, fc.record(wrongParams)),
    query,
    body,
    ifMatch: mostly<string | undefined>(`"${right.ifMatch ?? 1}"`, headers),
    idempotencyKey: fc.oneof(
      { weight: 6, arbitrary: fc.uuid().map((key): string | undefined => key) },
      { weight: 1, arbitrary: headers },
    ),
  });
}

/** What a query string can carry, small enough for a request line. */
function asQuery(value: unknown): Record<string, unknown> {
  if (typeof value !== 'object' || value === null) return { value: String(value).slice(0, 2_000) };
  return Object.fromEntries(
    Object.entries(value).map(([name, each]) => [name, typeof each === 'string' ? each.slice(0, 2_000) : small(each)]),
  );
}

const small = (value: unknown): unknown => (JSON.stringify(value ?? null).length > 2_000 ? '[too much]' : value);

const isDeed = ({ method }: AnyEndpoint): boolean => method !== 'GET';

function touched({ id }: AnyEndpoint, before: Imprint, after: Imprint): string[] {
  const meant = LEFT_ON_PURPOSE[id] ?? [];
  return Object.keys(after).filter((table) => before[table] !== after[table] && !meant.includes(table));
}

const knocked = everyRow.filter(({ endpoint: { upload } }) => upload === null);

it.each(knocked.map((row) => [row.endpoint.id, row] as const))('%s answers whatever is sent', async (_id, row) => {
  const { endpoint } = row;
  const scene = await sceneOf(row);
  let before = isDeed(endpoint) ? await imprintOf(world.house.jobs) : {};
  await fc.assert(
    fc.asyncProperty(knocksAt(row, scene), async (sent) => {
      const heard = await knock(listening.url, endpoint, scene.caller, sent);
      expect([faultOf(heard), heard.status >= 500 ? heard.text : '']).toEqual([null, '']);
      if (!isDeed(endpoint)) return;
      const after = await imprintOf(world.house.jobs);
      if (heard.status >= 400) expect(touched(endpoint, before, after)).toEqual([]);
      before = after;
    }),
    { numRuns: TRIES, seed: SEED, endOnFailure: true },
  );
});

describe('what is no JSON at all', () => {
  const bodied = everyRow.filter(({ endpoint }) => endpoint.body !== undefined);
  const texts = ['{"half":', '\u0000', '['.repeat(100_000), '', '{} {}'];

  it.each(bodied.map(({ endpoint }) => [endpoint.id, endpoint] as const))('is refused by %s', async (_id, endpoint) => {
    const [params] = fc.sample(fromSchema(endpoint.params, [newId()]), { numRuns: 1, seed: SEED });
    const method = endpoint.method.toLowerCase() as 'post' | 'put' | 'patch';
    const caller = callerFor(endpoint, world);
    const answers = [];
    for (const text of texts) {
      const {
        status,
        headers: told,
        text: said,
      } = await request(listening.url)
        [method](pathOf(endpoint, asTexts(params as object)))
        .set({ authorization: tokenOf(caller), 'content-type': 'application/json' })
        .set({ 'if-match': '"1"', 'idempotency-key': newId() })
        .send(text);
      answers.push([status >= 400, faultOf({ status, mediaType: String(told['content-type']), text: said })]);
    }
    expect(answers).toEqual(texts.map(() => [true, null]));
  });
});

it('answers 404 wherever an address can not be read', async () => {
  const addressed = everyRow.filter(({ endpoint: { path } }) => path.includes(':'));
  const answers = await Promise.all(
    addressed.map(async ({ endpoint: { method, path } }) => {
      const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
      const { status } = await request(listening.url)[verb](`/api/v1${path.replace(/:\w+/g, '%E0%A4%A')}`);
      return status;
    }),
  );
  expect(answers.filter((status) => status !== 404)).toEqual([]);
});

describe('files that are not what they should be', () => {
  const taken = everyRow.filter(({ endpoint: { upload } }) => upload !== null);
  const zip = Buffer.concat([Buffer.from('PK\u0003\u0004'), Buffer.alloc(400, 7)]);
  const files: readonly (readonly [string, Buffer])[] = [
    ['nothing', Buffer.alloc(0)],
    ['zeros', Buffer.alloc(2_000)],
    ['the start of a zip', zip],
    ['words', Buffer.from('these are only words\nand more of them')],
    ['a picture', Buffer.from('89504e470d0a1a0a0000000d49484452', 'hex')],
    ['one endless line', Buffer.from('x,'.repeat(200_000))],
    ['no text', Buffer.from([0xff, 0xfe, 0xfd, 0x80, 0x81])],
    ['a statement of impossible days', Buffer.from('Date,Description,Reference,Amount\n2026-02-30,RENT,,-1.00\n')],
    [
      'a statement of endless sums',
      Buffer.from(`Date,Description,Reference,Amount\n2026-12-01,X,,${'9'.repeat(40)}\n`),
    ],
    ['a statement of far days', Buffer.from('Date,Description,Reference,Amount\n999999-12-01,X,,1.00\n')],
  ];
  const cases = taken.flatMap((row) => files.map(([what, bytes]) => [row.endpoint.id, what, row, bytes] as const));

  it.each(cases)('%s refuses %s, and keeps nothing', async (_id, _what, { endpoint }, bytes) => {
    const before = await imprintOf(world.house.jobs);
    const {
      status,
      text,
      headers: told,
    } = await request(listening.url)
      .post(pathOf(endpoint, {}))
      .set({ authorization: tokenOf(callerFor(endpoint, world)), 'idempotency-key': newId() })
      .attach('file', bytes, 'file\u202e.bin');
    expect([status >= 400, faultOf({ status, mediaType: String(told['content-type']), text })]).toEqual([true, null]);
    expect(await imprintOf(world.house.jobs)).toEqual(before);
  });

  it.each(taken.map((row) => [row.endpoint.id, row] as const))(
    '%s refuses a form without its file',
    async (_id, row) => {
      const { endpoint } = row;
      const headersSent = { authorization: tokenOf(callerFor(endpoint, world)), 'idempotency-key': newId() };
      const post = () => request(listening.url).post(pathOf(endpoint, {})).set(headersSent);
      const answers = [
        await post().attach('another', Buffer.from('x'), 'x.csv'),
        await post().field('file', 'only words'),
        await post().set('content-type', 'multipart/form-data').send('no boundary'),
        await post().send({ file: 'x' }),
      ];
      const faults = answers.map(({ status, text, headers: told }) =>
        faultOf({ status, mediaType: String(told['content-type']), text }),
      );
      expect(faults).toEqual([null, null, null, null]);
      expect(answers.every(({ status }) => status >= 400)).toBe(true);
    },
  );
});

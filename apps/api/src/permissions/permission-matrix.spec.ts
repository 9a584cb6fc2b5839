// Who may call what: every endpoint of the house by every role, on what is theirs, another customer's and nobody's.
import { getOrderImport, takeOrders } from '@seamwright/ordering/contracts';
import { isBuyerRole } from '@seamwright/shared/contracts';
import type { Caller } from '@seamwright/shared/server';
import { casesOf, type Case } from './expected';
import type { AnyInput, Row } from './row';
import { everyRow } from './rows/every-row';
import { imprintOf } from './untouched';
import type { Party } from './testing/party';
import { anImport } from './testing/trade';
import { openWorld, type World } from './testing/world';

let world: World;
beforeAll(async () => {
  world = await openWorld();
});
afterAll(() => world.house.close());

const partyOf = ({ whose }: Case): Party => (whose === 'other' ? world.other : world.own);

function inputFor(row: Row, { caller, ...which }: Case): Promise<AnyInput> | AnyInput {
  if (row.belongsTo === 'customer') return row.input(world, partyOf({ caller, ...which }));
  return row.belongsTo === 'caller' ? row.input(world, caller) : row.input(world);
}

/** Whoever only looks can look at the same thing: kept by row, and by whose or who where that matters. */
const looked = new Map<string, AnyInput>();

/** What is sent: made ready anew for a deed, once for those who only look or are denied. */
async function sharedInput(row: Row, asked: Case): Promise<AnyInput> {
  const key = `${row.endpoint.id} ${row.belongsTo === 'caller' ? asked.who : asked.whose}`;
  const known = looked.get(key) ?? (await inputFor(row, asked));
  looked.set(key, known);
  return known;
}

const REFUSED = { 'not-signed-in': [401, 'not-signed-in'], 'not-allowed': [403, 'not-allowed'] } as const;

const isSearch = (row: Row): boolean => row.belongsTo === 'customer' && row.hidden === 'empty';

const itemsOf = (body: unknown): readonly unknown[] | undefined =>
  (body as { readonly items?: readonly unknown[] } | undefined)?.items;

/** What came of a call that should be denied, in words; null when it was denied rightly. */
async function denied(row: Row, asked: Case): Promise<string | null> {
  const input = await sharedInput(row, asked);
  const { status, body, problem } = await world.house.call(asked.caller, row.endpoint, input);
  const got = `${asked.who}, ${asked.whose}: ${status} ${problem.code ?? ''}`.trim();
  if (asked.expected === 'hidden') {
    if (status === 404 && problem.code === 'not-found') return null;
    return isSearch(row) && status === row.endpoint.status && itemsOf(body)?.length === 0
      ? null
      : `${got}, to be hidden`;
  }
  const [wanted, code] = asked.expected === 'done' ? [row.endpoint.status, undefined] : REFUSED[asked.expected];
  return status === wanted && problem.code === code ? null : `${got}, expected ${wanted}`;
}

/** What came of a call that should be done, in words; null when it was. */
async function done(row: Row, asked: Case): Promise<string | null> {
  const input = await (row.endpoint.method === 'GET' ? sharedInput(row, asked) : inputFor(row, asked));
  const { status, body, problem } = await world.house.call(asked.caller, row.endpoint, input);
  const got = `${asked.who}, ${asked.whose}: ${status} ${problem.code ?? ''}`.trim();
  if (status !== row.endpoint.status) return `${got}, expected ${row.endpoint.status}`;
  if (isSearch(row) && !itemsOf(body)?.length) return `${got}, with nothing in it`;
  const kept = asked.who.endsWith('for one') || asked.caller.kind === 'user';
  if (row.belongsTo === 'house' || !kept) return null;
  const told = JSON.stringify(body ?? {});
  const tells = told.includes(world.other.id) || told.includes(world.other.name);
  return tells ? `${got}, tells of another customer` : null;
}

it('has one row for each endpoint of the house', () => {
  const rows = everyRow.map(({ endpoint }) => endpoint.id).sort();
  expect(rows).toEqual(world.house.implementations.map(({ endpoint }) => endpoint.id).sort());
});

it('asks for a customer’s thing wherever the declaration says that it is one', () => {
  const unnamed = everyRow.filter(
    ({ endpoint: { access }, belongsTo }) =>
      access.who === 'roles' && access.customer === 'own' && belongsTo !== 'customer' && belongsTo !== 'caller',
  );
  expect(unnamed.map(({ endpoint }) => endpoint.id)).toEqual([]);
});

it('lets buyers into nothing that belongs to the house but what everybody signed in may see', () => {
  const open = everyRow.filter(
    ({ endpoint: { access }, belongsTo }) =>
      belongsTo === 'house' && access.who === 'roles' && access.roles.some(isBuyerRole),
  );
  expect(open.map(({ endpoint }) => endpoint.id)).toEqual([
    'catalogue.search',
    'catalogue.specification',
    'catalogue.cut-tree',
  ]);
});

it('keeps whoever serves some customers only from a colleague’s workbook, whomever it orders for', async () => {
  const { own, staff } = world;
  const kept = { ...staff.rep, customers: [own.id] } as Caller;
  const params = { importId: await anImport(world, own, staff.admin) };
  const got = await world.house.call(kept, getOrderImport, { params });
  const taken = await world.house.call(kept, takeOrders, { params, body: { how: 'good-rows' } });
  expect([got.status, taken.status]).toEqual([404, 404]);
});

describe.each(everyRow.map((row) => [row.endpoint.id, row] as const))('%s', (_id, row) => {
  it('is denied without a trace to whoever may not', async () => {
    const cases = casesOf(world, row).filter(({ expected }) => expected !== 'done');
    for (const each of cases) await sharedInput(row, each);
    const before = await imprintOf(world.house.jobs);
    const wrong = await Promise.all(cases.map((each) => denied(row, each)));
    expect(wrong.filter((each) => each !== null)).toEqual([]);
    expect(await imprintOf(world.house.jobs)).toEqual(before);
  });

  it('is done for whoever may', async () => {
    const cases = casesOf(world, row).filter(({ expected }) => expected === 'done');
    expect(cases.length).toBeGreaterThan(0);
    const wrong: (string | null)[] = [];
    for (const each of cases) wrong.push(await done(row, each));
    expect(wrong.filter((each) => each !== null)).toEqual([]);
  });
});

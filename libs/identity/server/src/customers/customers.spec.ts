import {
  addSite,
  createCustomer,
  createGroup,
  getCustomer,
  listCustomers,
  listGroups,
  listSites,
  updateCustomer,
  updateSite,
} from '@seamwright/identity/contracts';
import { inTransaction, type Caller } from '@seamwright/shared/server';
import type { TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';
import {
  cookieOf,
  customerFacts,
  makeCustomer,
  makePerson,
  makeSite,
  openIdentityHouse,
  refreshAt,
  signInAt,
  siteFacts,
  staff,
} from '../testing/identity-house';
import { customersByNames } from './customers.repository';

let house: TestHouse;
let accounts: Caller;
let rep: Caller;
let buyer: Caller;
let owner: Caller;
let anchor: string;
let mill: string;
let harbour: string;
let quay: string;

beforeAll(async () => {
  house = await openIdentityHouse();
  anchor = await makeCustomer(house, 'The Blue Anchor');
  mill = await makeCustomer(house, 'Mill Street Kitchen');
  harbour = await makeSite(house, anchor, 'Harbour');
  quay = await makeSite(house, anchor, 'Quay');
  accounts = staff(await makePerson(house, { email: 'accounts@desk.example', roles: ['accounts'] }), 'accounts');
  const repId = await makePerson(house, { email: 'rep@desk.example', roles: ['rep'], customers: [anchor] });
  rep = { kind: 'staff', personId: repId, roles: ['rep'], customers: [anchor] };
  const personId = await makePerson(house, { email: 'jo@anchor.example', roles: ['buyer'], customerId: anchor });
  buyer = { kind: 'user', personId, roles: ['buyer'], customerId: anchor, sites: [harbour] };
  owner = { kind: 'user', personId, roles: ['buyer_owner'], customerId: anchor, sites: '*' };
});
afterAll(() => house.close());

const list = async (caller: Caller, query = {}) =>
  (await house.call(caller, listCustomers, { query })).body.items.map(({ name }) => name);

describe('customers', () => {
  it('are listed by name to all staff, to a rep only the assigned ones, to no buyer', async () => {
    expect(await list(accounts)).toEqual(['Mill Street Kitchen', 'The Blue Anchor']);
    expect(await list(rep)).toEqual(['The Blue Anchor']);
    expect((await house.call(buyer, listCustomers, {})).status).toBe(403);
  });

  it('are found by name or number, and by kind, page by page', async () => {
    expect(await list(accounts, { q: 'blue' })).toEqual(['The Blue Anchor']);
    expect(await list(accounts, { q: '1002' })).toEqual(['Mill Street Kitchen']);
    expect(await list(accounts, { kind: 'hotel' })).toEqual([]);
    const first = (await house.call(accounts, listCustomers, { query: { limit: 1 } })).body;
    expect(first.nextCursor).not.toBeNull();
    expect(await list(accounts, { limit: 1, cursor: first.nextCursor })).toEqual(['The Blue Anchor']);
    expect((await house.call(accounts, listCustomers, { query: { cursor: 'made-up' } })).status).toBe(422);
  });

  it('are seen by their own buyers and by nobody else’s', async () => {
    const get = (caller: Caller, customerId: string) => house.call(caller, getCustomer, { params: { customerId } });
    expect((await get(buyer, anchor)).body).toMatchObject({ name: 'The Blue Anchor', number: 1001, termsDays: 14 });
    expect((await get(buyer, mill)).status).toBe(404);
    expect((await get(rep, mill)).status).toBe(404);
    expect((await get(accounts, newId())).status).toBe(404);
    expect((await get(accounts, 'no-id')).status).toBe(404);
  });

  it('are opened once per key, and not by a rep', async () => {
    const body = customerFacts('Saltmarsh Hotel');
    const key = newId();
    const first = await house.call(accounts, createCustomer, { body, idempotencyKey: key });
    const again = await house.call(accounts, createCustomer, { body, idempotencyKey: key });
    expect(first.status).toBe(201);
    expect(first.headers['etag']).toBe('"1"');
    expect(again.body).toEqual(first.body);
    const other = await house.call(accounts, createCustomer, { body: customerFacts('Other'), idempotencyKey: key });
    expect(other.problem).toMatchObject({ status: 422, code: 'key-reused' });
    expect((await house.call(rep, createCustomer, { body })).status).toBe(403);
  });

  it('say by field what can’t be taken', async () => {
    const body = { ...customerFacts(' '), termsDays: -1, invoiceEmail: 'nothing', kind: 'castle' as 'pub' };
    const { problem } = await house.call(accounts, createCustomer, { body });
    expect(problem.errors.map(({ pointer }) => pointer).sort()).toEqual([
      '/invoiceEmail',
      '/kind',
      '/name',
      '/termsDays',
    ]);
    const unknown = await house.call(accounts, createCustomer, { body: { ...customerFacts('A'), groupId: newId() } });
    expect(unknown.problem).toMatchObject({ code: 'group-unknown', errors: [{ pointer: '/groupId' }] });
  });

  it('are changed with the version that was read, and end their people’s sessions when made inactive', async () => {
    const pier = await makeCustomer(house, 'Pier Café');
    await makePerson(house, { email: 'pia@pier.example', roles: ['buyer'], customerId: pier });
    const cookie = cookieOf(await signInAt(house, 'storefront', 'pia@pier.example'));
    const group = (await house.call(accounts, createGroup, { body: { name: 'Seafront Group' } })).body;
    const change = (ifMatch: number | undefined, active: boolean, caller = accounts) =>
      house.call(caller, updateCustomer, {
        params: { customerId: pier },
        body: { ...customerFacts('Pier Café'), groupId: group.id, active },
        ...(ifMatch === undefined ? {} : { ifMatch }),
      });
    expect((await change(undefined, true)).status).toBe(428);
    expect((await change(1, true)).body).toMatchObject({ rowVersion: 2, groupName: 'Seafront Group', active: true });
    expect((await change(1, true)).problem).toMatchObject({ status: 412, code: 'stale' });
    expect((await refreshAt(house, 'storefront', { cookie })).status).toBe(200);
    const ended = await change(2, false);
    expect(ended.body.active).toBe(false);
    expect((await refreshAt(house, 'storefront', { cookie })).status).toBe(401);
    expect((await change(3, true, rep)).status).toBe(403);
  });

  it('are found by the names of a spreadsheet, without regard to case', async () => {
    const found = await inTransaction(house.database, accounts, (tx) =>
      customersByNames(tx, [' the blue ANCHOR', 'Nobody’s']),
    );
    expect(found.get(' the blue ANCHOR')?.map(({ id }) => id)).toEqual([anchor]);
    expect(found.get('Nobody’s')).toEqual([]);
  });
});

describe('sites', () => {
  const sites = async (caller: Caller, customerId: string) => house.call(caller, listSites, { params: { customerId } });

  it('are those that the caller acts for', async () => {
    expect((await sites(owner, anchor)).body.items.map(({ name }) => name)).toEqual(['Harbour', 'Quay']);
    expect((await sites(buyer, anchor)).body.items.map(({ name }) => name)).toEqual(['Harbour']);
    expect((await sites(owner, mill)).status).toBe(404);
    expect((await sites(rep, mill)).status).toBe(404);
  });

  it('are added by the owner, a rep and accounts, for the own customer', async () => {
    const add = (caller: Caller, customerId: string) =>
      house.call(caller, addSite, { params: { customerId }, body: siteFacts('Boathouse') });
    expect((await add(owner, anchor)).body).toMatchObject({ name: 'Boathouse', customerId: anchor, rowVersion: 1 });
    expect((await add(owner, mill)).status).toBe(404);
    expect((await add(rep, mill)).status).toBe(404);
    expect((await add(buyer, anchor)).status).toBe(403);
    const kept: Caller = { ...owner, sites: [harbour] } as Caller;
    expect((await add(kept, anchor)).status).toBe(403);
  });

  it('are changed with the version that was read', async () => {
    const change = (caller: Caller, customerId: string, ifMatch: number) =>
      house.call(caller, updateSite, {
        params: { customerId, siteId: quay },
        body: { ...siteFacts('Quay'), accessNotes: 'Ring at the side door', active: true },
        ifMatch,
      });
    expect((await change(owner, anchor, 1)).body).toMatchObject({
      accessNotes: 'Ring at the side door',
      rowVersion: 2,
    });
    expect((await change(owner, anchor, 1)).problem.code).toBe('stale');
    expect((await change(owner, mill, 2)).status).toBe(404);
    expect((await change(accounts, mill, 2)).status).toBe(404);
  });
});

describe('groups', () => {
  it('are listed by name and bear each name once', async () => {
    await house.call(accounts, createGroup, { body: { name: 'Cliff Inns' } });
    const twice = await house.call(accounts, createGroup, { body: { name: 'Cliff Inns' } });
    expect(twice.problem).toMatchObject({ status: 409, code: 'already-there' });
    const names = (await house.call(rep, listGroups, {})).body.items.map(({ name }) => name);
    expect(names).toEqual([...names].sort());
    expect(names).toContain('Cliff Inns');
  });
});

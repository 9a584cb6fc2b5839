import {
  endPersonSessions,
  getPerson,
  invitePerson,
  listPeople,
  reInvitePerson,
  updatePerson,
  type PersonView,
} from '@seamwright/identity/contracts';
import { inTransaction, type Caller } from '@seamwright/shared/server';
import { TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';
import {
  asSystem,
  cookieOf,
  makeCustomer,
  makePerson,
  makeSite,
  openIdentityHouse,
  refreshAt,
  signInAt,
  staff,
} from '../testing/identity-house';
import { staffWithRole } from './people.repository';

let house: TestHouse;
let anchor: string;
let mill: string;
let adminId: string;
let admin: Caller;
let ownerId: string;
let owner: Caller;
let buyerId: string;
let millBuyerId: string;
let rep: Caller;
let repId: string;

beforeAll(async () => {
  house = await openIdentityHouse();
  anchor = await makeCustomer(house, 'The Blue Anchor');
  mill = await makeCustomer(house, 'Mill Street Kitchen');
  adminId = await makePerson(house, { email: 'admin@desk.example', roles: ['admin'] });
  admin = staff(adminId, 'admin');
  ownerId = await makePerson(house, { email: 'owner@anchor.example', roles: ['buyer_owner'], customerId: anchor });
  owner = { kind: 'user', personId: ownerId, roles: ['buyer_owner'], customerId: anchor, sites: '*' };
  buyerId = await makePerson(house, { email: 'jo@anchor.example', roles: ['buyer'], customerId: anchor });
  millBuyerId = await makePerson(house, { email: 'chef@mill.example', roles: ['buyer'], customerId: mill });
  repId = await makePerson(house, { email: 'rep@desk.example', roles: ['rep'], customers: [anchor] });
  rep = { kind: 'staff', personId: repId, roles: ['rep'], customers: [anchor] };
});
afterAll(() => house.close());
beforeEach(() => house.clock.set(TEST_NOW));

const get = async (personId: string): Promise<PersonView> =>
  (await house.call(admin, getPerson, { params: { personId } })).body;
const names = async (caller: Caller, query = {}) =>
  (await house.call(caller, listPeople, { query })).body.items.map(({ name }) => name);
/** What a person is, ready to be sent back changed. */
const standing = ({ name, roles, sites, customers }: PersonView) => ({ name, roles, sites, customers, active: true });

describe('who sees whom', () => {
  it('shows everybody to an administrator, buyers of their customers to a rep, colleagues to an owner', async () => {
    expect(await names(admin)).toEqual(['admin', 'chef', 'jo', 'owner', 'rep']);
    expect(await names(admin, { who: 'staff' })).toEqual(['admin', 'rep']);
    expect(await names(admin, { customerId: mill })).toEqual(['chef']);
    expect(await names(rep)).toEqual(['jo', 'owner']);
    expect(await names(rep, { who: 'staff' })).toEqual(['jo', 'owner']);
    expect(await names(owner)).toEqual(['jo', 'owner']);
    expect(await names(owner, { customerId: mill })).toEqual([]);
  });

  it('finds nobody outside one’s care by id', async () => {
    const ask = (caller: Caller, personId: string) => house.call(caller, getPerson, { params: { personId } });
    expect((await ask(owner, millBuyerId)).status).toBe(404);
    expect((await ask(owner, adminId)).status).toBe(404);
    expect((await ask(rep, millBuyerId)).status).toBe(404);
    expect((await ask(rep, adminId)).status).toBe(404);
    expect((await ask(owner, buyerId)).status).toBe(200);
  });

  it('is not for a plain buyer, or for staff of other roles', async () => {
    const buyer: Caller = { kind: 'user', personId: buyerId, roles: ['buyer'], customerId: anchor, sites: '*' };
    expect((await house.call(buyer, listPeople, {})).status).toBe(403);
    expect((await house.call(staff(adminId, 'planner'), listPeople, {})).status).toBe(403);
  });

  it('pages by name and searches names and addresses', async () => {
    const first = (await house.call(admin, listPeople, { query: { limit: 2 } })).body;
    const cursor = first.nextCursor ?? '';
    const second = (await house.call(admin, listPeople, { query: { limit: 2, cursor } })).body;
    expect([...first.items, ...second.items].map(({ name }) => name)).toEqual(['admin', 'chef', 'jo', 'owner']);
    expect(await names(admin, { q: 'MILL.example' })).toEqual(['chef']);
    expect(await names(admin, { q: '%' })).toEqual([]);
  });
});

describe('inviting', () => {
  const invite = (caller: Caller, more: object) =>
    house.call(caller, invitePerson, {
      body: { email: `${newId()}@anchor.example`, name: 'New', customerId: anchor, roles: ['buyer'], ...more },
    });

  it('lets an owner invite colleagues, kept to sites or not', async () => {
    const siteId = await makeSite(house, anchor, 'Harbour');
    const invited = await invite(owner, { sites: [siteId] });
    expect(invited.status).toBe(201);
    expect(invited.body).toMatchObject({ state: 'invited', sites: [siteId], customerName: 'The Blue Anchor' });
  });

  it('keeps an owner to the own customer and from the staff’s roles', async () => {
    expect((await invite(owner, { customerId: mill })).status).toBe(404);
    expect((await invite(owner, { customerId: null, roles: ['admin'] })).status).toBe(403);
    expect((await invite(owner, { roles: ['admin'] })).problem.code).toBe('roles-of-staff');
  });

  it('lets a rep invite buyers of the assigned customers, and no staff', async () => {
    expect((await invite(rep, {})).status).toBe(201);
    expect((await invite(rep, { customerId: mill })).status).toBe(404);
    expect((await invite(rep, { customerId: null, roles: ['rep'] })).status).toBe(403);
  });

  it('refuses an address that is taken, however written, and sites of another customer', async () => {
    expect((await invite(admin, { email: 'JO@anchor.example' })).problem).toMatchObject({
      code: 'email-taken',
      errors: [{ pointer: '/email' }],
    });
    const siteId = await makeSite(house, mill, 'Mill');
    expect((await invite(admin, { sites: [siteId] })).problem.code).toBe('site-unknown');
    expect((await invite(admin, { customerId: null, roles: ['rep'], customers: [newId()] })).problem.code).toBe(
      'customer-unknown',
    );
  });

  it('refuses a role that does not exist and a field that nobody declared', async () => {
    expect((await invite(admin, { roles: ['king'] })).problem.errors[0]?.pointer).toBe('/roles/0');
    expect((await invite(admin, { crown: true })).problem.errors[0]?.pointer).toBe('/crown');
  });
});

describe('changing', () => {
  const change = (caller: Caller, person: PersonView, more: object, ifMatch = person.rowVersion) =>
    house.call(caller, updatePerson, {
      params: { personId: person.id },
      body: { ...standing(person), ...more },
      ifMatch,
    });

  it('changes name, roles and customers, and refuses what was read too long ago', async () => {
    const person = await get(repId);
    const changed = await change(admin, person, { name: 'Robin Reed', customers: [anchor, mill] });
    expect(changed.body).toMatchObject({ name: 'Robin Reed', rowVersion: person.rowVersion + 1 });
    expect([...changed.body.customers].sort()).toEqual([anchor, mill].sort());
    expect((await change(admin, person, { name: 'Late' })).problem.code).toBe('stale');
    const again = await change(admin, changed.body, { roles: ['rep', 'planner'], customers: '*' });
    expect(again.body).toMatchObject({ roles: ['rep', 'planner'], customers: '*' });
    await change(admin, again.body, { roles: ['rep'], customers: [anchor] });
  });

  it('ends the sessions of somebody made inactive, also by the owner', async () => {
    const email = 'leaver@anchor.example';
    const leaver = await get(await makePerson(house, { email, roles: ['buyer'], customerId: anchor }));
    const cookie = cookieOf(await signInAt(house, 'storefront', email));
    const changed = await change(owner, leaver, { active: false });
    expect(changed.body.state).toBe('inactive');
    const reasons = await asSystem(house, (tx) =>
      tx.selectFrom('signInSessions').select('endedBecause').where('personId', '=', leaver.id).execute(),
    );
    expect(reasons).toEqual([{ endedBecause: 'made-inactive' }]);
    await change(owner, changed.body, { active: true });
    expect((await refreshAt(house, 'storefront', { cookie })).body.code).toBe('session-ended');
  });

  it('lets nobody take their own way in away', async () => {
    const self = await get(adminId);
    expect((await change(admin, self, { active: false })).problem.code).toBe('not-yourself');
    expect((await change(admin, self, { roles: ['planner'] })).problem.code).toBe('not-yourself');
    expect((await change(owner, await get(ownerId), { roles: ['buyer'] })).problem.code).toBe('not-yourself');
    expect((await change(admin, self, { name: 'Alex Admin' })).status).toBe(200);
  });

  it('finds nobody outside one’s care', async () => {
    const before = await get(millBuyerId);
    expect((await change(owner, before, { active: false })).status).toBe(404);
    expect((await change(rep, await get(adminId), { active: false })).status).toBe(404);
    const params = { personId: millBuyerId };
    expect((await house.call(owner, endPersonSessions, { params })).status).toBe(404);
    expect((await house.call(owner, reInvitePerson, { params })).status).toBe(404);
    expect(await get(millBuyerId)).toEqual(before);
  });

  it('writes who changed what to the audit', async () => {
    const person = await get(buyerId);
    await change(owner, person, { name: 'Jo Marsh' });
    const [entry] = await asSystem(house, (tx) =>
      tx
        .selectFrom('auditEntries')
        .select(['personId', 'changed', 'customerId'])
        .where('tableName', '=', 'people')
        .where('rowId', '=', buyerId)
        .orderBy('id', 'desc')
        .limit(1)
        .execute(),
    );
    expect(entry).toMatchObject({ personId: ownerId, customerId: anchor, changed: { name: ['jo', 'Jo Marsh'] } });
  });
});

it('signs somebody out everywhere', async () => {
  const cookie = cookieOf(await signInAt(house, 'storefront', 'jo@anchor.example'));
  expect((await house.call(owner, endPersonSessions, { params: { personId: buyerId } })).status).toBe(204);
  expect((await refreshAt(house, 'storefront', { cookie })).body.code).toBe('session-ended');
});

it('names the active staff of a role for upper storeys', async () => {
  const found = await inTransaction(house.database, rep, (tx) => staffWithRole(tx, 'admin'));
  expect(found.map(({ id }) => id)).toEqual([adminId]);
});

import * as identity from '@seamwright/identity/contracts';
import { normaliseEmail } from '@seamwright/identity/domain';
import type { Caller } from '@seamwright/shared/server';
import { ofCaller, ofCustomer, ofHouse, type Row } from '../row';
import { customerFacts, siteFacts, type Party } from '../testing/party';
import { addSomebody, PASSWORD } from '../testing/people';
import type { World } from '../testing/world';

const NEW_PASSWORD = 'French-trimmed rack';

/** A joined buyer of the party with what is read before an edit. */
async function aBuyer(world: World, party: Party) {
  const { id } = await addSomebody(world.house.database, 'buyer', party.id);
  return world.deed(world.staff.admin, identity.getPerson, { params: { personId: id } });
}

/** The secret behind the link of the newest mail to somebody. */
async function mailedToken(world: World, to: string): Promise<string> {
  const mail = await world.asSystem((tx) =>
    tx
      .selectFrom('mails')
      .select('bodyText')
      .where('toAddress', '=', normaliseEmail(to))
      .orderBy('createdAt', 'desc')
      .orderBy('id', 'desc')
      .executeTakeFirst(),
  );
  const token = /#token=([\w-]+)/.exec(mail?.bodyText ?? '')?.[1];
  if (!token) throw new Error(`No link was mailed to ${to}`);
  return token;
}

/** The id of a session of the caller's own; of anybody's when nobody calls. */
async function aSession(world: World, caller: Caller): Promise<string> {
  const personId =
    'personId' in caller ? caller.personId : 'personId' in world.own.buyer ? world.own.buyer.personId : '';
  const { email, customerId } = await world.asSystem((tx) =>
    tx.selectFrom('people').select(['email', 'customerId']).where('id', '=', personId).executeTakeFirstOrThrow(),
  );
  const application = customerId ? 'storefront' : 'admin';
  await world.deed({ kind: 'anonymous' }, identity.signIn, { body: { application, email, password: PASSWORD } });
  const { id } = await world.asSystem((tx) =>
    tx
      .selectFrom('signInSessions')
      .select('id')
      .where('personId', '=', personId)
      .where('endedAt', 'is', null)
      .orderBy('id', 'desc')
      .executeTakeFirstOrThrow(),
  );
  return id;
}

/** The row version of whoever calls; 1 when nobody does. */
async function ownVersion(world: World, caller: Caller): Promise<number> {
  if (caller.kind !== 'user' && caller.kind !== 'staff') return 1;
  return (await world.deed(caller, identity.getMe, {})).rowVersion;
}

async function firstSite(world: World, { id, siteId }: Party) {
  const { items } = await world.deed(world.staff.admin, identity.listSites, { params: { customerId: id } });
  const site = items.find((each) => each.id === siteId);
  if (!site) throw new Error('The site is not there');
  return site;
}

export const identityRows: readonly Row[] = [
  ofHouse(identity.signIn, async (world) => {
    const { email } = await addSomebody(world.house.database, 'buyer', world.own.id);
    return { body: { application: 'storefront' as const, email, password: PASSWORD } };
  }),
  ofHouse(identity.refreshSession, () => ({ body: { application: 'storefront' as const } })),
  ofHouse(identity.signOut, () => ({ query: { application: 'storefront' as const } })),
  ofHouse(identity.forgotPassword, () => ({ body: { email: 'somebody@example.test' } })),
  ofHouse(identity.resetPassword, async (world) => {
    const { email } = await addSomebody(world.house.database, 'buyer', world.own.id);
    await world.deed({ kind: 'anonymous' }, identity.forgotPassword, { body: { email } });
    return { body: { token: await mailedToken(world, email), password: NEW_PASSWORD } };
  }),
  ofHouse(identity.acceptInvitation, async (world) => {
    const { id, email } = await addSomebody(world.house.database, 'buyer', world.own.id, 'invited');
    await world.deed(world.staff.admin, identity.reInvitePerson, { params: { personId: id } });
    return { body: { token: await mailedToken(world, email), password: NEW_PASSWORD } };
  }),

  ofCaller(identity.getMe, () => ({})),
  ofCaller(identity.renameMe, async (world, caller) => ({
    body: { name: 'A new name' },
    ifMatch: await ownVersion(world, caller),
  })),
  ofCaller(identity.listSessions, () => ({})),
  ofCaller(identity.endSession, async (world, caller) => ({ params: { sessionId: await aSession(world, caller) } })),
  ofCaller(identity.signOutEverywhere, () => ({})),
  ofCaller(identity.changePassword, () => ({ body: { currentPassword: PASSWORD, password: PASSWORD } })),

  ofCustomer(identity.listCustomers, (_world, { name }) => ({ query: { q: name } }), 'empty'),
  ofCustomer(identity.getCustomer, (_world, { id }) => ({ params: { customerId: id } })),
  ofHouse(identity.createCustomer, () => ({ body: customerFacts })),
  ofCustomer(identity.updateCustomer, async (world, { id, name }) => {
    const { rowVersion } = await world.deed(world.staff.admin, identity.getCustomer, { params: { customerId: id } });
    return { params: { customerId: id }, body: { ...customerFacts, name, active: true }, ifMatch: rowVersion };
  }),
  ofCustomer(identity.listSites, (_world, { id }) => ({ params: { customerId: id } })),
  ofCustomer(identity.addSite, ({ next }, { id }) => ({
    params: { customerId: id },
    body: siteFacts(`Bar ${next()}`),
  })),
  ofCustomer(identity.updateSite, async (world, party) => {
    const { name, rowVersion } = await firstSite(world, party);
    const params = { customerId: party.id, siteId: party.siteId };
    return { params, body: { ...siteFacts(name), active: true }, ifMatch: rowVersion };
  }),
  ofHouse(identity.listGroups, () => ({})),
  ofHouse(identity.createGroup, ({ next }) => ({ body: { name: `Group ${next()}` } })),

  ofCustomer(identity.listPeople, (_world, { id }) => ({ query: { customerId: id } }), 'empty'),
  ofCustomer(identity.getPerson, async (world, party) => ({ params: { personId: (await aBuyer(world, party)).id } })),
  ofCustomer(identity.invitePerson, ({ next }, { id }) => ({
    body: { email: `new.${next()}@example.test`, customerId: id, name: 'New', roles: ['buyer' as const] },
  })),
  ofCustomer(identity.updatePerson, async (world, party) => {
    const { id, rowVersion } = await aBuyer(world, party);
    const body = { name: 'Renamed', roles: ['buyer' as const], active: true };
    return { params: { personId: id }, body, ifMatch: rowVersion };
  }),
  ofCustomer(identity.reInvitePerson, async (world, party) => {
    const { id } = await addSomebody(world.house.database, 'buyer', party.id, 'invited');
    return { params: { personId: id } };
  }),
  ofCustomer(identity.endPersonSessions, async (world, party) => ({
    params: { personId: (await aBuyer(world, party)).id },
  })),
];

import request from 'supertest';
import {
  acceptInvitation,
  forgotPassword,
  invitePerson,
  reInvitePerson,
  resetPassword,
} from '@seamwright/identity/contracts';
import { anonymous, type Caller } from '@seamwright/shared/server';
import { TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';
import {
  asSystem,
  cookieOf,
  mailedToken,
  makeCustomer,
  makePerson,
  openIdentityHouse,
  refreshAt,
  signInAt,
  staff,
} from '../testing/identity-house';

let house: TestHouse;
let admin: Caller;
let customerId: string;
const later = (seconds: number) => house.clock.set(new Date(TEST_NOW.getTime() + seconds * 1000));
const NEW_PASSWORD = 'French-trimmed rack';

beforeAll(async () => {
  house = await openIdentityHouse();
  customerId = await makeCustomer(house, 'The Blue Anchor');
  admin = staff(await makePerson(house, { email: 'admin@desk.example', roles: ['admin'] }), 'admin');
});
afterAll(() => house.close());
beforeEach(() => house.clock.set(TEST_NOW));

const invite = async (email: string, roles: ('buyer' | 'planner')[] = ['buyer']) => {
  const body = { email, name: 'Somebody', customerId: roles.includes('buyer') ? customerId : null, roles };
  return (await house.call(admin, invitePerson, { body })).body;
};
const accept = (token: string, password = NEW_PASSWORD) =>
  house.call(anonymous, acceptInvitation, { body: { token, password } });

describe('an invitation', () => {
  it('is mailed once with a link to the application of the role, its secret behind the hash sign', async () => {
    const key = newId();
    const body = { email: 'New@Anchor.example', name: 'New', customerId, roles: ['buyer' as const] };
    const first = await house.call(admin, invitePerson, { body, idempotencyKey: key });
    const again = await house.call(admin, invitePerson, { body, idempotencyKey: key });
    expect(first.status).toBe(201);
    expect(again.body).toEqual(first.body);
    expect(first.body).toMatchObject({ email: 'new@anchor.example', state: 'invited' });
    const { link, count } = await mailedToken(house, 'new@anchor.example');
    expect(count).toBe(1);
    expect(link).toMatch(/^https:\/\/desk\.example\/accept-invitation#token=[\w-]{43}$/);

    await invite('plan@desk.example', ['planner']);
    expect((await mailedToken(house, 'plan@desk.example')).link).toMatch(/^https:\/\/desk\.example\/admin\/accept-/);
  });

  it('sets the password, takes the name, and signs in', async () => {
    await invite('kit@anchor.example');
    const { token } = await mailedToken(house, 'kit@anchor.example');
    const response = await request(house.app)
      .post('/api/v1/invitations/use')
      .send({ token, password: NEW_PASSWORD, name: 'Kit Harlow' });
    expect(response.body).toMatchObject({ application: 'storefront', person: { name: 'Kit Harlow' } });
    expect((await refreshAt(house, 'storefront', { cookie: cookieOf(response) })).status).toBe(200);
    expect((await signInAt(house, 'storefront', 'kit@anchor.example', NEW_PASSWORD)).status).toBe(200);
  });

  it('works once, also for two at the same moment', async () => {
    await invite('once@anchor.example');
    const { token } = await mailedToken(house, 'once@anchor.example');
    const statuses = (await Promise.all([accept(token), accept(token)])).map(({ status }) => status);
    expect(statuses.sort()).toEqual([200, 409]);
    expect((await accept(token)).problem.code).toBe('link-not-valid');
  });

  it('works for seven days', async () => {
    await invite('late@anchor.example');
    const { token } = await mailedToken(house, 'late@anchor.example');
    later(7 * 86_400);
    expect((await accept(token)).problem.code).toBe('link-not-valid');
    later(7 * 86_400 - 1);
    expect((await accept(token)).status).toBe(200);
  });

  it('stops working when a newer one was mailed, and can’t be mailed to who has joined', async () => {
    const { id } = await invite('twice@anchor.example');
    const { token: old } = await mailedToken(house, 'twice@anchor.example');
    later(60);
    expect((await house.call(admin, reInvitePerson, { params: { personId: id } })).status).toBe(201);
    const { token, count } = await mailedToken(house, 'twice@anchor.example');
    expect(count).toBe(2);
    expect((await accept(old)).problem.code).toBe('link-not-valid');
    expect((await accept(token)).status).toBe(200);
    const joined = await house.call(admin, reInvitePerson, { params: { personId: id } });
    expect(joined.problem).toMatchObject({ status: 409, code: 'already-joined' });
  });

  it('refuses a weak password at its field and stays good', async () => {
    await invite('weak@anchor.example');
    const { token } = await mailedToken(house, 'weak@anchor.example');
    const refused = await accept(token, 'short');
    expect(refused.problem).toMatchObject({ status: 422, code: 'password-short', errors: [{ pointer: '/password' }] });
    expect((await accept(token)).status).toBe(200);
  });
});

describe('a password reset', () => {
  const ask = (email: string) => house.call(anonymous, forgotPassword, { body: { email } });
  const use = (token: string) => house.call(anonymous, resetPassword, { body: { token, password: NEW_PASSWORD } });
  const join = (email: string) => makePerson(house, { email, roles: ['buyer'], customerId });

  it('answers alike for a known and an unknown address, and mails only the known one', async () => {
    await join('known@anchor.example');
    const known = await ask('KNOWN@anchor.example');
    const unknown = await ask('unknown@anchor.example');
    expect([known.status, unknown.status]).toEqual([202, 202]);
    expect(known.body).toEqual(unknown.body);
    expect((await mailedToken(house, 'known@anchor.example')).link).toMatch(/^https:\/\/desk\.example\/set-password#/);
    expect((await mailedToken(house, 'unknown@anchor.example')).count).toBe(0);
  });

  it('mails nothing to somebody inactive, and at most one mail a minute', async () => {
    const personId = await join('left@anchor.example');
    await asSystem(house, (tx) => tx.updateTable('people').set({ active: false }).where('id', '=', personId).execute());
    await ask('left@anchor.example');
    expect((await mailedToken(house, 'left@anchor.example')).count).toBe(0);

    await join('eager@anchor.example');
    await ask('eager@anchor.example');
    await ask('eager@anchor.example');
    expect((await mailedToken(house, 'eager@anchor.example')).count).toBe(1);
    later(61);
    await ask('eager@anchor.example');
    expect((await mailedToken(house, 'eager@anchor.example')).count).toBe(2);
  });

  it('sets the password once within an hour, and ends the sessions from before', async () => {
    await join('reset@anchor.example');
    const cookie = cookieOf(await signInAt(house, 'storefront', 'reset@anchor.example'));
    await ask('reset@anchor.example');
    const { token } = await mailedToken(house, 'reset@anchor.example');
    later(3600);
    expect((await use(token)).problem.code).toBe('link-not-valid');
    later(3599);
    expect((await use(token)).status).toBe(200);
    expect((await use(token)).problem.code).toBe('link-not-valid');
    expect((await refreshAt(house, 'storefront', { cookie })).body.code).toBe('session-ended');
    expect((await signInAt(house, 'storefront', 'reset@anchor.example')).status).toBe(401);
    expect((await signInAt(house, 'storefront', 'reset@anchor.example', NEW_PASSWORD)).status).toBe(200);
  });

  it('is no invitation, nor the other way round', async () => {
    await join('mixed@anchor.example');
    await ask('mixed@anchor.example');
    expect((await accept((await mailedToken(house, 'mixed@anchor.example')).token)).problem.code).toBe(
      'link-not-valid',
    );
  });
});

it('keeps only hashes of the links, and none of it in the audit', async () => {
  await invite('secret@anchor.example');
  const { token } = await mailedToken(house, 'secret@anchor.example');
  const rows = await asSystem(house, async (tx) => [
    ...(await tx.selectFrom('oneTimeTokens').selectAll().execute()),
    ...(await tx.selectFrom('auditEntries').selectAll().execute()),
  ]);
  expect(rows.length).toBeGreaterThan(5);
  expect(JSON.stringify(rows)).not.toContain(token);
  expect(JSON.stringify(rows)).not.toMatch(/argon2|password_hash/);
});

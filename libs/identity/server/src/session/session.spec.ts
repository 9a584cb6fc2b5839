import type { TestHouse } from '@seamwright/shared/server/testing';
import { TEST_NOW } from '@seamwright/shared/server/testing';
import { hashPassword } from '../passwords';
import { setPasswordHash } from '../people/people.repository';
import {
  asSystem,
  CHEAP_KIB,
  cookieOf,
  makeCustomer,
  makePerson,
  openIdentityHouse,
  ORIGIN,
  PASSWORD,
  refreshAt,
  setCookieOf,
  signInAt,
  signOutAt,
} from '../testing/identity-house';

let house: TestHouse;
let buyer: string;
let customerId: string;
const after = (seconds: number) => house.clock.set(new Date(TEST_NOW.getTime() + seconds * 1000));

beforeAll(async () => {
  house = await openIdentityHouse();
  house.app.set('trust proxy', true);
  customerId = await makeCustomer(house, 'The Blue Anchor');
  buyer = await makePerson(house, { email: 'jo@anchor.example', roles: ['buyer'], customerId });
  await makePerson(house, { email: 'rep@desk.example', roles: ['rep'] });
});
afterAll(() => house.close());
beforeEach(() => house.clock.set(TEST_NOW));

describe('signing in', () => {
  it('gives an access token, who it is, and an httpOnly, same-site cookie below the session’s address', async () => {
    const response = await signInAt(house, 'storefront', 'JO@anchor.example');
    expect(response.status).toBe(200);
    expect(response.body).toMatchObject({
      expiresInSeconds: 600,
      person: { id: buyer, email: 'jo@anchor.example', customerName: 'The Blue Anchor', sites: '*' },
    });
    const cookie = setCookieOf(response);
    expect(cookie).toMatch(
      /^seamwright_storefront=[\w-]{43}; Max-Age=2592000; Path=\/api\/v1\/session; .*HttpOnly; SameSite=Strict$/,
    );
  });

  it('answers alike for an unknown address, a wrong password and somebody inactive', async () => {
    await makePerson(house, { email: 'gone@anchor.example', roles: ['buyer'], customerId });
    await asSystem(house, (tx) =>
      tx.updateTable('people').set({ active: false }).where('email', '=', 'gone@anchor.example').execute(),
    );
    const answers = [
      await signInAt(house, 'storefront', 'nobody@anchor.example'),
      await signInAt(house, 'storefront', 'jo@anchor.example', 'not the password'),
      await signInAt(house, 'storefront', 'gone@anchor.example'),
    ];
    for (const answer of answers) {
      expect(answer.status).toBe(401);
      expect(answer.body).toEqual(answers[0]?.body);
      expect(answer.body.code).toBe('sign-in-refused');
      expect(cookieOf(answer)).toBeUndefined();
    }
  });

  it('refuses somebody whose customer was made inactive', async () => {
    const mill = await makeCustomer(house, 'Mill Street Kitchen');
    await makePerson(house, { email: 'chef@mill.example', roles: ['buyer'], customerId: mill });
    await asSystem(house, (tx) => tx.updateTable('customers').set({ active: false }).where('id', '=', mill).execute());
    expect((await signInAt(house, 'storefront', 'chef@mill.example')).body.code).toBe('sign-in-refused');
  });

  it('says that it is the wrong application only after the right password', async () => {
    expect((await signInAt(house, 'admin', 'jo@anchor.example')).body.code).toBe('sign-in-at-storefront');
    expect((await signInAt(house, 'storefront', 'rep@desk.example')).body.code).toBe('sign-in-at-desk');
    expect((await signInAt(house, 'admin', 'jo@anchor.example', 'not the password')).body.code).toBe('sign-in-refused');
  });

  it('hashes anew at today’s costs when the stored hash was made at others', async () => {
    const email = 'early@anchor.example';
    const early = await makePerson(house, { email, roles: ['buyer'], customerId, password: null });
    const other = await hashPassword(PASSWORD, 2 * CHEAP_KIB);
    await asSystem(house, (tx) => setPasswordHash(tx, early, other));
    expect((await signInAt(house, 'storefront', email)).status).toBe(200);
    const [row] = await asSystem(house, (tx) =>
      tx.selectFrom('people').select('passwordHash').where('id', '=', early).execute(),
    );
    expect(row?.passwordHash).toContain(`m=${CHEAP_KIB},`);
    expect((await signInAt(house, 'storefront', email)).status).toBe(200);
  });
});

describe('the lock-out', () => {
  it('makes a source wait after five failures, whatever it tries then, and leaves every other source alone', async () => {
    for (let tries = 0; tries < 5; tries++)
      await signInAt(house, 'storefront', 'jo@anchor.example', 'not the password', { source: '198.51.100.1' });
    const waiting = await signInAt(house, 'storefront', 'jo@anchor.example', undefined, { source: '198.51.100.1' });
    expect(waiting.status).toBe(429);
    expect(waiting.body).toMatchObject({ code: 'sign-in-wait', detail: expect.stringContaining('30') });

    const elsewhere = await signInAt(house, 'storefront', 'jo@anchor.example', undefined, { source: '198.51.100.2' });
    expect(elsewhere.status).toBe(200);
  });

  it('lets try again after the wait, and forgets the failures with the right password', async () => {
    after(31);
    const from = { source: '198.51.100.1' };
    expect((await signInAt(house, 'storefront', 'jo@anchor.example', undefined, from)).status).toBe(200);
    after(32);
    const wrong = await signInAt(house, 'storefront', 'jo@anchor.example', 'not the password', from);
    expect(wrong.body.code).toBe('sign-in-refused');
    expect((await signInAt(house, 'storefront', 'jo@anchor.example', undefined, from)).status).toBe(200);
  });

  it('counts many tries at once as many', async () => {
    const tries = Array.from({ length: 12 }, () =>
      signInAt(house, 'storefront', 'many@anchor.example', 'not the password', { source: '198.51.100.3' }),
    );
    const codes = (await Promise.all(tries)).map(({ body }) => body.code as string);
    expect(codes.filter((code) => code === 'sign-in-refused')).toHaveLength(5);
    expect(codes.filter((code) => code === 'sign-in-wait')).toHaveLength(7);
  });
});

describe('renewing', () => {
  const signedIn = async () => cookieOf(await signInAt(house, 'storefront', 'jo@anchor.example'));

  it('gives a new access token and turns the cookie over', async () => {
    const cookie = await signedIn();
    after(60);
    const response = await refreshAt(house, 'storefront', { cookie, origin: ORIGIN });
    expect(response.status).toBe(200);
    expect(response.body.session.person.id).toBe(buyer);
    expect(cookieOf(response)).not.toBe(cookie);
  });

  it('says that nobody is signed in without a cookie, or with one it never gave', async () => {
    expect((await refreshAt(house, 'storefront', {})).body).toEqual({ session: null });
    const unknown = await refreshAt(house, 'storefront', { cookie: 'seamwright_storefront=made-up' });
    expect(unknown.body).toEqual({ session: null });
    expect(cookieOf(unknown)).toBe('seamwright_storefront=');
  });

  it('lets two tabs renew with the same cookie within twenty seconds, and both cookies go on', async () => {
    const cookie = await signedIn();
    const [first, second] = await Promise.all([
      refreshAt(house, 'storefront', { cookie }),
      refreshAt(house, 'storefront', { cookie }),
    ]);
    expect([first.status, second.status]).toEqual([200, 200]);
    after(600);
    const onward = await refreshAt(house, 'storefront', { cookie: cookieOf(first) });
    expect(onward.status).toBe(200);
    const twin = await refreshAt(house, 'storefront', { cookie: cookieOf(second) });
    expect(twin.status).toBe(200);
  });

  it('ends the session when an old cookie comes back after the grace', async () => {
    const stolen = await signedIn();
    const mine = cookieOf(await refreshAt(house, 'storefront', { cookie: stolen }));
    after(21);
    const reused = await refreshAt(house, 'storefront', { cookie: stolen });
    expect(reused.status).toBe(401);
    expect(reused.body.code).toBe('session-ended');
    expect(cookieOf(reused)).toBe('seamwright_storefront=');
    expect((await refreshAt(house, 'storefront', { cookie: mine })).body.code).toBe('session-ended');
    const reasons = await asSystem(house, (tx) =>
      tx.selectFrom('signInSessions').select('endedBecause').where('endedAt', 'is not', null).execute(),
    );
    expect(reasons).toContainEqual({ endedBecause: 'reuse' });
  });

  it('ends the session when the token before the predecessor comes back, even at once', async () => {
    const first = await signedIn();
    const second = cookieOf(await refreshAt(house, 'storefront', { cookie: first }));
    await refreshAt(house, 'storefront', { cookie: second });
    expect((await refreshAt(house, 'storefront', { cookie: first })).body.code).toBe('session-ended');
  });

  it('ends thirty days after the last use', async () => {
    const cookie = await signedIn();
    after(30 * 86_400);
    expect((await refreshAt(house, 'storefront', { cookie })).body.code).toBe('session-ended');
  });

  it('does not take the cookie of the other application', async () => {
    const cookie = (await signedIn())?.replace('storefront', 'admin');
    expect((await refreshAt(house, 'admin', { cookie })).body.code).toBe('session-ended');
  });

  it('refuses what a browser says came from another website', async () => {
    const cookie = await signedIn();
    const foreign = await refreshAt(house, 'storefront', { cookie, origin: 'https://elsewhere.example' });
    expect(foreign.status).toBe(403);
    expect(foreign.body.code).toBe('wrong-origin');
    expect((await refreshAt(house, 'storefront', { cookie, origin: ORIGIN })).status).toBe(200);
  });

  it('is over once the person was made inactive', async () => {
    const email = 'leaver@anchor.example';
    const leaver = await makePerson(house, { email, roles: ['buyer'], customerId });
    const cookie = cookieOf(await signInAt(house, 'storefront', email));
    await asSystem(house, (tx) => tx.updateTable('people').set({ active: false }).where('id', '=', leaver).execute());
    expect((await refreshAt(house, 'storefront', { cookie })).body.code).toBe('session-ended');
  });
});

describe('signing out', () => {
  it('ends the session and drops the cookie', async () => {
    const cookie = cookieOf(await signInAt(house, 'storefront', 'jo@anchor.example'));
    const response = await signOutAt(house, 'storefront', { cookie });
    expect(response.status).toBe(204);
    expect(cookieOf(response)).toBe('seamwright_storefront=');
    expect((await refreshAt(house, 'storefront', { cookie })).body.code).toBe('session-ended');
  });

  it('refuses another website and keeps the session', async () => {
    const cookie = cookieOf(await signInAt(house, 'storefront', 'jo@anchor.example'));
    expect((await signOutAt(house, 'storefront', { cookie, origin: 'https://elsewhere.example' })).status).toBe(403);
    expect((await refreshAt(house, 'storefront', { cookie })).status).toBe(200);
  });

  it('does nothing without a session', async () => {
    expect((await signOutAt(house, 'storefront', {})).status).toBe(204);
  });
});

it('keeps no token, and no address or source of a failure, as it was sent', async () => {
  const cookie = cookieOf(await signInAt(house, 'storefront', 'jo@anchor.example'));
  const kept = await asSystem(house, async (tx) => [
    await tx.selectFrom('refreshTokens').selectAll().execute(),
    await tx.selectFrom('signInFailures').selectAll().execute(),
    await tx.selectFrom('auditEntries').selectAll().execute(),
  ]);
  const text = JSON.stringify(kept.map((rows) => rows));
  expect(kept.every((rows) => rows.length > 0)).toBe(true);
  expect(text).not.toContain(cookie?.split('=')[1]);
  expect(text).not.toContain('198.51.100');
  expect(text).not.toMatch(/argon2|password_hash/);
});

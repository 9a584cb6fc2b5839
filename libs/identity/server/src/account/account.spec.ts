import request from 'supertest';
import {
  changePassword,
  endSession,
  getMe,
  listSessions,
  renameMe,
  signOutEverywhere,
} from '@seamwright/identity/contracts';
import { anonymous, type Caller } from '@seamwright/shared/server';
import type { TestHouse } from '@seamwright/shared/server/testing';
import {
  cookieOf,
  makeCustomer,
  makePerson,
  openIdentityHouse,
  PASSWORD,
  refreshAt,
  signInAt,
} from '../testing/identity-house';

let house: TestHouse;
let customerId: string;
const buyer = (personId: string): Caller => ({ kind: 'user', personId, roles: ['buyer'], customerId, sites: '*' });
const join = async (email: string) => buyer(await makePerson(house, { email, roles: ['buyer'], customerId }));

beforeAll(async () => {
  house = await openIdentityHouse();
  customerId = await makeCustomer(house, 'The Blue Anchor');
});
afterAll(() => house.close());

it('shows and renames oneself, guarded by the row version', async () => {
  const jo = await join('jo@anchor.example');
  expect((await house.call(anonymous, getMe, {})).status).toBe(401);
  const me = await house.call(jo, getMe, {});
  expect(me.body).toMatchObject({ name: 'jo', customerName: 'The Blue Anchor', rowVersion: 1 });
  const renamed = await house.call(jo, renameMe, { body: { name: 'Jo Marsh' }, ifMatch: 1 });
  expect(renamed.body).toMatchObject({ name: 'Jo Marsh', rowVersion: 2 });
  expect((await house.call(jo, renameMe, { body: { name: 'Joan' }, ifMatch: 1 })).problem.code).toBe('stale');
});

it('lists one’s own sessions only, ends one of them, and not somebody else’s', async () => {
  const kit = await join('kit@anchor.example');
  const max = await join('max@anchor.example');
  const cookie = cookieOf(await signInAt(house, 'storefront', 'kit@anchor.example'));
  await signInAt(house, 'storefront', 'kit@anchor.example');
  await signInAt(house, 'storefront', 'max@anchor.example');
  const { items } = (await house.call(kit, listSessions, {})).body;
  expect(items).toHaveLength(2);
  expect(items[0]).toMatchObject({ application: 'storefront', device: 'Test browser', here: false });

  const theirs = (await house.call(max, listSessions, {})).body.items[0];
  const notMine = await house.call(kit, endSession, { params: { sessionId: theirs?.id ?? '' } });
  expect(notMine.status).toBe(404);

  for (const { id } of items) await house.call(kit, endSession, { params: { sessionId: id } });
  expect((await house.call(kit, listSessions, {})).body.items).toEqual([]);
  expect((await refreshAt(house, 'storefront', { cookie })).body.code).toBe('session-ended');
  expect((await house.call(max, listSessions, {})).body.items).toHaveLength(1);
});

it('signs out everywhere', async () => {
  const pat = await join('pat@anchor.example');
  const cookies = [
    cookieOf(await signInAt(house, 'storefront', 'pat@anchor.example')),
    cookieOf(await signInAt(house, 'storefront', 'pat@anchor.example')),
  ];
  expect((await house.call(pat, signOutEverywhere, {})).status).toBe(204);
  for (const cookie of cookies)
    expect((await refreshAt(house, 'storefront', { cookie })).body.code).toBe('session-ended');
});

describe('changing one’s password', () => {
  const NEW = 'scored and squared';

  it('asks for the present one and points at its field', async () => {
    const ray = await join('ray@anchor.example');
    const wrong = await house.call(ray, changePassword, { body: { currentPassword: 'not it', password: NEW } });
    expect(wrong.problem).toMatchObject({ code: 'password-wrong', errors: [{ pointer: '/currentPassword' }] });
    const weak = await house.call(ray, changePassword, { body: { currentPassword: PASSWORD, password: 'short' } });
    expect(weak.problem).toMatchObject({ code: 'password-short', errors: [{ pointer: '/password' }] });
  });

  it('makes guessing wait', async () => {
    const guessed = await join('guessed@anchor.example');
    const codes: string[] = [];
    for (let tries = 0; tries < 6; tries++) {
      const { problem } = await house.call(guessed, changePassword, { body: { currentPassword: 'no', password: NEW } });
      codes.push(problem.code);
    }
    expect(codes).toEqual([...Array.from({ length: 5 }, () => 'password-wrong'), 'sign-in-wait']);
  });

  it('ends the other sessions and keeps this one', async () => {
    const ned = await join('ned@anchor.example');
    const here = cookieOf(await signInAt(house, 'storefront', 'ned@anchor.example'));
    const other = cookieOf(await signInAt(house, 'storefront', 'ned@anchor.example'));
    // A first call lets the test house know the caller by the token that the next request sends.
    await house.call(ned, getMe, {});
    const token = `Test ${JSON.stringify(ned)}`;
    const own = request(house.app)
      .get('/api/v1/session/open')
      .set('authorization', token)
      .set('cookie', here ?? '');
    const listed = (await own).body.items as { here: boolean }[];
    expect(listed.map((session) => session.here).sort()).toEqual([false, true]);
    const changed = await request(house.app)
      .post('/api/v1/session/password')
      .set('authorization', token)
      .set('cookie', here ?? '')
      .send({ currentPassword: PASSWORD, password: NEW });
    expect(changed.status).toBe(204);
    expect((await refreshAt(house, 'storefront', { cookie: here })).status).toBe(200);
    expect((await refreshAt(house, 'storefront', { cookie: other })).body.code).toBe('session-ended');
    expect((await signInAt(house, 'storefront', 'ned@anchor.example', NEW)).status).toBe(200);
  });
});

import { TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { asSystem, makePerson, openIdentityHouse, signInAt } from './testing/identity-house';
import { tidyIdentity } from './tidy-identity';

let house: TestHouse;
beforeAll(async () => void (house = await openIdentityHouse()));
afterAll(() => house.close());

it('removes failures after a day and ended sessions after ninety, with their tokens', async () => {
  await makePerson(house, { email: 'rep@desk.example', roles: ['rep'] });
  await signInAt(house, 'admin', 'rep@desk.example');
  await signInAt(house, 'admin', 'rep@desk.example', 'not the password');
  const counts = () =>
    asSystem(house, async (tx) => [
      (await tx.selectFrom('signInFailures').select('id').execute()).length,
      (await tx.selectFrom('signInSessions').select('id').execute()).length,
      (await tx.selectFrom('refreshTokens').select('tokenHash').execute()).length,
    ]);
  await tidyIdentity.run(house.jobs);
  expect(await counts()).toEqual([1, 1, 1]);
  house.clock.set(new Date(TEST_NOW.getTime() + 2 * 86_400_000));
  await tidyIdentity.run(house.jobs);
  expect(await counts()).toEqual([0, 1, 1]);
  house.clock.set(new Date(TEST_NOW.getTime() + 121 * 86_400_000));
  await tidyIdentity.run(house.jobs);
  expect(await counts()).toEqual([0, 0, 0]);
});

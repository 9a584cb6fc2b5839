import request from 'supertest';
import type { Application, Reach } from '@seamwright/identity/domain';
import type { Role } from '@seamwright/shared/contracts';
import { inTransaction, system, type Caller, type Tx } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { createCustomer } from '../customers/customers.repository';
import { addSite } from '../customers/sites.repository';
import { identityImplementations } from '../implementations';
import { hashPassword } from '../passwords';
import { addPerson } from '../people/invite-person';
import { setPasswordHash } from '../people/people.repository';

export const SECRET = 'a secret for tests that is long enough';
export const ORIGIN = 'https://desk.example';
export const PASSWORD = 'boned and rolled';
/** The least that argon2 takes: specs check behaviour, not strength. */
export const CHEAP_KIB = 8;

export const openIdentityHouse = (): Promise<TestHouse> =>
  openTestHouse({
    implementations: ({ clock }) =>
      identityImplementations({ clock, jwtSecrets: [SECRET], publicOrigin: ORIGIN, argonMemoryKib: CHEAP_KIB }),
  });

export const asSystem = <T>(house: TestHouse, work: (tx: Tx) => Promise<T>): Promise<T> =>
  inTransaction(house.database, system('seed'), work);

export const customerFacts = (name: string) => ({
  name,
  kind: 'pub' as const,
  groupId: null,
  invoiceEmail: 'books@anchor.example',
  billingAddress: '1 Quay Street\nHarlow Sands',
  vatNumber: null,
  termsDays: 14,
  termsFrom: 'invoice' as const,
});

export const siteFacts = (name: string) => ({
  name,
  address: '1 Quay Street\nHarlow Sands',
  postcode: 'HS1 4QT',
  contactName: null,
  phone: null,
  accessNotes: null,
});

export const makeCustomer = (house: TestHouse, name: string): Promise<string> =>
  asSystem(house, (tx) => createCustomer(tx, TEST_NOW, customerFacts(name)));

export const makeSite = (house: TestHouse, customerId: string, name: string): Promise<string> =>
  asSystem(house, (tx) => addSite(tx, customerId, siteFacts(name)));

interface Wanted {
  readonly email: string;
  readonly roles: readonly Role[];
  readonly customerId?: string;
  readonly sites?: Reach;
  readonly customers?: Reach;
  readonly password?: string | null;
}

/** A person who has joined, unless the password is null. Gives the id. */
export async function makePerson(house: TestHouse, wanted: Wanted): Promise<string> {
  const { email, roles, customerId = null, sites = '*', customers = '*', password = PASSWORD } = wanted;
  const hash = password === null ? null : await hashPassword(password, CHEAP_KIB);
  return asSystem(house, async (tx) => {
    const id = await addPerson(tx, TEST_NOW, {
      email,
      name: email.split('@')[0] ?? '',
      customerId,
      roles,
      sites,
      customers,
    });
    if (hash) await setPasswordHash(tx, id, hash);
    return id;
  });
}

export const staff = (personId: string, ...roles: Role[]): Caller => ({
  kind: 'staff',
  personId,
  roles,
  customers: '*',
});

/** What a browser sends and gets: cookies, origin, and where it is. */
export interface Browser {
  readonly cookie?: string | undefined;
  readonly origin?: string;
  readonly source?: string;
}

const sent = (call: request.Test, { cookie, origin, source }: Browser): request.Test => {
  if (cookie) call.set('cookie', cookie);
  if (origin) call.set('origin', origin);
  return call.set('x-forwarded-for', source ?? '203.0.113.7').set('user-agent', 'Test browser');
};

export const signInAt = (
  house: TestHouse,
  application: Application,
  email: string,
  password = PASSWORD,
  browser: Browser = {},
) => sent(request(house.app).post('/api/v1/session'), browser).send({ application, email, password });

export const refreshAt = (house: TestHouse, application: Application, browser: Browser) =>
  sent(request(house.app).post('/api/v1/session/refresh'), browser).send({ application });

export const signOutAt = (house: TestHouse, application: Application, browser: Browser) =>
  sent(request(house.app).delete('/api/v1/session').query({ application }), browser);

/** The cookie that an answer set, with its attributes. */
export const setCookieOf = (response: request.Response): string | undefined =>
  (response.headers['set-cookie'] as unknown as string[] | undefined)?.[0];

/** The cookie that an answer set, as a browser sends it back; undefined when it set none. */
export function cookieOf(response: request.Response): string | undefined {
  return setCookieOf(response)?.split(';')[0];
}

/** The secret in the link of the newest mail to somebody. */
export async function mailedToken(
  house: TestHouse,
  to: string,
): Promise<{ token: string; link: string; count: number }> {
  const mails = await asSystem(house, (tx) =>
    tx.selectFrom('mails').select('bodyText').where('toAddress', '=', to).orderBy('createdAt').orderBy('id').execute(),
  );
  const link = /https:\S+/.exec(mails.at(-1)?.bodyText ?? '')?.[0] ?? '';
  return { token: link.split('#token=')[1] ?? '', link, count: mails.length };
}

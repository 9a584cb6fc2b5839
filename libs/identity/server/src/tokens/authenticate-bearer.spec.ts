import type { Request } from 'express';
import { sign } from 'jsonwebtoken';
import { newId } from '@seamwright/shared/util';
import type { SignedInPerson } from '../people/signed-in-person';
import { keyIdOf, signAccessToken } from './access-token';
import { authenticateBearer } from './authenticate-bearer';

const NEW = 'the secret that signs from now on, long enough';
const OLD = 'the secret that signed until yesterday, long enough';
const authenticate = authenticateBearer({ jwtSecrets: [NEW, OLD] });
const request = (authorization?: string) => ({ headers: authorization ? { authorization } : {} }) as unknown as Request;
const ask = (token: string) => authenticate(request(`Bearer ${token}`));
const refused = { refusal: { code: 'not-signed-in' } };

const buyer: SignedInPerson = {
  id: newId(),
  rowVersion: 1,
  name: 'Jo Marsh',
  email: 'jo@anchor.example',
  roles: ['buyer'],
  customerId: newId(),
  customerName: 'The Blue Anchor',
  sites: [newId()],
  customers: '*',
  application: 'storefront',
};

describe('authenticateBearer', () => {
  it('knows a buyer with customer and sites, and staff with customers', async () => {
    expect(await ask(signAccessToken(NEW, buyer))).toEqual({
      kind: 'user',
      personId: buyer.id,
      roles: ['buyer'],
      customerId: buyer.customerId,
      sites: buyer.sites,
    });
    const rep: SignedInPerson = { ...buyer, roles: ['rep'], customerId: null, sites: '*', customers: [newId()] };
    expect(await ask(signAccessToken(NEW, rep))).toMatchObject({ kind: 'staff', customers: rep.customers });
  });

  it('takes what the previous secret signed', async () => {
    expect(await ask(signAccessToken(OLD, buyer))).toMatchObject({ personId: buyer.id });
  });

  it('gives null without a token', async () => {
    expect(await authenticate(request())).toBeNull();
  });

  const claims = { roles: ['admin'], customerId: null, sites: '*', customers: '*', app: 'admin' };
  const subject = newId<'Person'>();

  it.each<[string, () => string]>([
    ['signed with another secret', () => signAccessToken('a secret of somebody else, long enough', buyer)],
    [
      'that claims our key but was signed with another',
      () => sign(claims, 'another secret', { subject, keyid: keyIdOf(NEW) }),
    ],
    ['that ran out', () => sign(claims, NEW, { subject, keyid: keyIdOf(NEW), expiresIn: -1 })],
    ['without a signature', () => sign(claims, '', { subject, keyid: keyIdOf(NEW), algorithm: 'none' })],
    ['of another algorithm', () => sign(claims, NEW, { subject, keyid: keyIdOf(NEW), algorithm: 'HS512' })],
    ['with an unknown role', () => sign({ ...claims, roles: ['king'] }, NEW, { subject, keyid: keyIdOf(NEW) })],
    ['that is no token', () => 'not.a.token'],
  ])('refuses one %s', async (_what, token) => {
    await expect(ask(token())).rejects.toMatchObject(refused);
  });
});

import { createHash } from 'node:crypto';
import { sign } from 'jsonwebtoken';
import * as z from 'zod';
import { id, ROLES } from '@seamwright/shared/contracts';
import type { Caller } from '@seamwright/shared/server';
import type { SignedInPerson } from '../people/signed-in-person';

export const ACCESS_TOKEN_SECONDS = 600;

const reach = z.union([z.literal('*'), z.array(id)]);

/** What an access token says of its bearer. */
export const accessClaims = z.object({
  sub: id,
  roles: z.array(z.enum(ROLES)).min(1),
  customerId: id.nullable(),
  sites: reach,
  customers: reach,
  app: z.enum(['storefront', 'admin']),
});
export type AccessClaims = z.infer<typeof accessClaims>;

/** The name of a secret in a token's head, so that the right one is taken when there are two. */
export const keyIdOf = (secret: string): string => createHash('sha256').update(secret).digest('hex').slice(0, 8);

/** A signed token for ten minutes of real time. */
export function signAccessToken(secret: string, person: SignedInPerson): string {
  const { roles, customerId, sites, customers, application } = person;
  return sign({ roles, customerId, sites, customers, app: application }, secret, {
    algorithm: 'HS256',
    subject: person.id,
    keyid: keyIdOf(secret),
    expiresIn: ACCESS_TOKEN_SECONDS,
  });
}

export function callerOf(claims: AccessClaims): Caller {
  const { sub: personId, roles, customerId, sites, customers } = claims;
  return customerId === null
    ? { kind: 'staff', personId, roles, customers }
    : { kind: 'user', personId, roles, customerId, sites };
}

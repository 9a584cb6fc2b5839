import * as z from 'zod';
import { defineEndpoint, email, id, ROLES } from '@seamwright/shared/contracts';
import { refreshAddress, signInAddress, signOutAddress } from './session.addresses';

export const application = z.enum(['storefront', 'admin']);
/** Everything, or these by id. */
export const reach = z.union([z.literal('*'), z.array(id).max(500)]);
/** Checked against the rule for new passwords by the server; here only so that nothing absurd is hashed. */
export const password = z.string().min(1).max(1000);
export const role = z.enum(ROLES);

/** Who is signed in, as the screens need it. */
export const sessionPerson = z.strictObject({
  id,
  name: z.string(),
  email: z.string(),
  roles: z.array(role),
  customerId: id.nullable(),
  customerName: z.string().nullable(),
  /** The sites that a buyer acts for. */
  sites: reach,
});
export type SessionPerson = z.infer<typeof sessionPerson>;

export const signedIn = z.strictObject({
  accessToken: z.string(),
  expiresInSeconds: z.int().positive(),
  person: sessionPerson,
});
export type SignedIn = z.infer<typeof signedIn>;

export const signIn = defineEndpoint({
  id: 'session.sign-in',
  summary: 'Sign in with e-mail and password',
  ...signInAddress,
  body: z.strictObject({ application, email, password }),
  response: signedIn,
});

/** `session` is null when nobody was signed in; a sign-in that has ended is refused with `session-ended`. */
export const refreshed = z.strictObject({ session: signedIn.nullable() });
export type Refreshed = z.infer<typeof refreshed>;

export const refreshSession = defineEndpoint({
  id: 'session.refresh',
  summary: 'Get a new access token by the cookie of the application',
  ...refreshAddress,
  body: z.strictObject({ application }),
  response: refreshed,
});

export const signOut = defineEndpoint({
  id: 'session.sign-out',
  summary: 'Sign out here',
  ...signOutAddress,
  query: { application },
});

import {
  refreshSession as refreshEndpoint,
  signIn as signInEndpoint,
  signOut as signOutEndpoint,
} from '@seamwright/identity/contracts';
import { implement, type Implementation } from '@seamwright/shared/server';
import type { IdentityParts } from '../identity-parts';
import { refreshSession } from './refresh-session';
import { signIn } from './sign-in';
import { signOut } from './sign-out';

export const sessionRouter = (parts: IdentityParts): Implementation[] => [
  implement(signInEndpoint, (context, { body }) => signIn(parts, context, body)),
  implement(refreshEndpoint, (context, { body }) => refreshSession(parts, context, body.application)),
  implement(signOutEndpoint, (context, { query }) => signOut(parts, context, query.application)),
];

import * as contracts from '@seamwright/identity/contracts';
import { implement, type Implementation } from '@seamwright/shared/server';
import type { IdentityParts } from '../identity-parts';
import { forgotPassword } from './forgot-password';
import { setPasswordByLink } from './set-password-by-link';

export const linksRouter = (parts: IdentityParts): Implementation[] => [
  implement(contracts.forgotPassword, (context, { body }) => forgotPassword(parts, context, body.email)),
  implement(contracts.resetPassword, (context, { body }) => setPasswordByLink(parts, context, 'password-reset', body)),
  implement(contracts.acceptInvitation, (context, { body }) => setPasswordByLink(parts, context, 'invitation', body)),
];

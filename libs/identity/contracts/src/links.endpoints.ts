import * as z from 'zod';
import { anyone, defineEndpoint, email, line } from '@seamwright/shared/contracts';
import { application, password, signedIn } from './session.endpoints';

/** What a mailed link carries behind its `#token=`. */
const token = z.string().min(20).max(200);
const usedLink = signedIn.extend({ application });
export type UsedLink = z.infer<typeof usedLink>;

export const forgotPassword = defineEndpoint({
  id: 'passwords.forgot',
  summary: 'Ask for a link to set a new password; the answer is the same for every address',
  method: 'POST',
  path: '/password-resets',
  access: anyone,
  body: z.strictObject({ email }),
  status: 202,
});

export const resetPassword = defineEndpoint({
  id: 'passwords.reset',
  summary: 'Set a new password by a mailed link, and sign in',
  method: 'POST',
  path: '/password-resets/use',
  access: anyone,
  body: z.strictObject({ token, password }),
  response: usedLink,
});

export const acceptInvitation = defineEndpoint({
  id: 'invitations.accept',
  summary: 'Accept an invitation: set a password and sign in',
  method: 'POST',
  path: '/invitations/use',
  access: anyone,
  body: z.strictObject({ token, password, name: line(120).optional() }),
  response: usedLink,
});

import * as z from 'zod';
import { defineEndpoint, id, instant, line, ROLES, rowVersion, staffOnly } from '@seamwright/shared/contracts';
import { application, password, sessionPerson } from './session.endpoints';

const oneself = staffOnly(...ROLES);

export const me = sessionPerson.extend({ rowVersion });
export type Me = z.infer<typeof me>;

export const getMe = defineEndpoint({
  id: 'session.me',
  summary: 'Who is signed in',
  method: 'GET',
  path: '/session/me',
  access: oneself,
  response: me,
});

export const renameMe = defineEndpoint({
  id: 'session.rename',
  summary: 'Change one’s own name',
  method: 'PATCH',
  path: '/session/me',
  access: oneself,
  guarded: true,
  body: z.strictObject({ name: line(120) }),
  response: me,
});

export const openSession = z.strictObject({
  id,
  application,
  /** The browser's own words for itself. */
  device: z.string(),
  signedInAt: instant,
  lastUsedAt: instant,
  /** Whether it is the one that asks. */
  here: z.boolean(),
});
export type OpenSession = z.infer<typeof openSession>;

export const listSessions = defineEndpoint({
  id: 'session.list',
  summary: 'One’s own sessions that are open, the last used first',
  method: 'GET',
  path: '/session/open',
  access: oneself,
  response: z.strictObject({ items: z.array(openSession) }),
});

export const endSession = defineEndpoint({
  id: 'session.end',
  summary: 'Sign out one of one’s own browsers',
  method: 'DELETE',
  path: '/session/open/:sessionId',
  access: oneself,
  params: { sessionId: id },
});

export const signOutEverywhere = defineEndpoint({
  id: 'session.sign-out-everywhere',
  summary: 'End every session of one’s own',
  method: 'POST',
  path: '/session/sign-out-everywhere',
  access: oneself,
});

export const changePassword = defineEndpoint({
  id: 'passwords.change',
  summary: 'Change one’s own password; the other sessions end',
  method: 'POST',
  path: '/session/password',
  access: oneself,
  body: z.strictObject({ currentPassword: password, password }),
});

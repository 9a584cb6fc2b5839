import { normaliseEmail } from '@seamwright/identity/domain';
import { inTransaction, system, type RequestContext } from '@seamwright/shared/server';
import type { IdentityParts } from '../identity-parts';
import { credentialsByEmail } from '../people/signed-in-person';
import { mailPasswordReset } from './link-mails';
import { hasLinkSince } from './one-time-links';

/** Nobody's mailbox is filled by asking again and again. */
const PAUSE_MS = 60_000;

/** Mails a link to set a new password to somebody who may sign in; says nothing about whether there is such a person. */
export async function forgotPassword(parts: IdentityParts, context: RequestContext, email: string): Promise<undefined> {
  const now = await parts.clock.now();
  await inTransaction(context.database, system('invitation'), async (tx) => {
    const found = await credentialsByEmail(tx, normaliseEmail(email));
    if (!found?.maySignIn) return;
    const since = new Date(now.getTime() - PAUSE_MS);
    if (await hasLinkSince(tx, found.person.id, 'password-reset', since)) return;
    await mailPasswordReset(tx, now, parts.publicOrigin, found.person);
  });
  return undefined;
}

import type { Application } from '@seamwright/identity/domain';
import { inTransaction, system, type RequestContext } from '@seamwright/shared/server';
import type { IdentityParts } from '../identity-parts';
import { refuseOtherOrigin } from './own-origin';
import { dropRefreshToken, readRefreshToken } from './session-cookie';
import { endSession, sessionIdOfToken } from './sessions.repository';

/** Ends the session of the application's cookie and drops the cookie. Without a session it does nothing. */
export async function signOut(
  parts: IdentityParts,
  context: RequestContext,
  application: Application,
): Promise<undefined> {
  refuseOtherOrigin(context, parts.publicOrigin);
  const token = readRefreshToken(context, application);
  if (token) {
    const now = await parts.clock.now();
    await inTransaction(context.database, system('sign-in'), async (tx) => {
      const sessionId = await sessionIdOfToken(tx, token);
      if (sessionId) await endSession(tx, now, sessionId, 'signed-out');
    });
  }
  dropRefreshToken(context, application);
  return undefined;
}

import type { Refreshed } from '@seamwright/identity/contracts';
import { rotationOf, sessionEnd, type Application } from '@seamwright/identity/domain';
import { inTransaction, ProblemError, system, type RequestContext, type Tx } from '@seamwright/shared/server';
import type { IdentityParts } from '../identity-parts';
import { credentialsById, type SignedInPerson } from '../people/signed-in-person';
import { refuseOtherOrigin } from './own-origin';
import { dropRefreshToken, keepRefreshToken, readRefreshToken } from './session-cookie';
import {
  addToken,
  endSession,
  lockSession,
  placeInChain,
  replaceTokens,
  sessionIdOfToken,
  touchSession,
  type IssuedToken,
} from './sessions.repository';
import { presentSignedIn } from './signed-in.presenter';

type Renewal = { person: SignedInPerson; issued: IssuedToken } | 'unknown' | 'ended';

/**
 * Gives a new access token by the cookie's refresh token and puts the next one into the cookie. No or an unknown cookie
 * means that nobody is signed in; an ended session is refused with `session-ended` (401), and so is a token that was
 * used before, whose session ends with it.
 */
export async function refreshSession(
  parts: IdentityParts,
  context: RequestContext,
  application: Application,
): Promise<Refreshed> {
  refuseOtherOrigin(context, parts.publicOrigin);
  const token = readRefreshToken(context, application);
  if (!token) return { session: null };
  const now = await parts.clock.now();
  const renewal = await inTransaction(context.database, system('refresh'), (tx) => renew(tx, now, token, application));
  if (renewal === 'unknown' || renewal === 'ended') {
    dropRefreshToken(context, application);
    if (renewal === 'ended') throw new ProblemError(401, { code: 'session-ended', params: {} });
    return { session: null };
  }
  keepRefreshToken(context, application, now, renewal.issued);
  return { session: presentSignedIn(parts, renewal.person) };
}

async function renew(tx: Tx, now: Date, token: string, application: Application): Promise<Renewal> {
  const sessionId = await sessionIdOfToken(tx, token);
  if (!sessionId) return 'unknown';
  const session = await lockSession(tx, sessionId);
  if (session.endedAt || session.expiresAt <= now || session.application !== application) return 'ended';
  const found = await credentialsById(tx, session.personId);
  if (!found?.maySignIn || found.person.application !== application) return 'ended';

  const { shown, newest } = await placeInChain(tx, sessionId, token);
  const rotation = rotationOf(shown, newest, now);
  if (rotation === 'reuse') {
    await endSession(tx, now, sessionId, 'reuse');
    return 'ended';
  }
  if (rotation === 'fresh') await replaceTokens(tx, now, sessionId);
  // In grace the newest stays good beside its twin: whichever cookie the browser keeps, it works.
  const next = await addToken(tx, now, sessionId, rotation === 'fresh' ? newest + 1 : newest);
  const expiresAt = sessionEnd(session.createdAt, now);
  await touchSession(tx, now, sessionId, expiresAt);
  return { person: found.person, issued: { sessionId, token: next, expiresAt } };
}

import type { Me, OpenSession } from '@seamwright/identity/contracts';
import { checkPassword, type Application } from '@seamwright/identity/domain';
import { inTransaction, notFound, personOf, system, type RequestContext, type Tx } from '@seamwright/shared/server';
import { RefusalError, unwrap } from '@seamwright/shared/util';
import type { IdentityParts } from '../identity-parts';
import { hashPassword, isRightPassword } from '../passwords';
import { renamePerson, setPasswordHash } from '../people/people.repository';
import { credentialsById, type Credentials } from '../people/signed-in-person';
import { dropRefreshToken, readRefreshToken } from '../session/session-cookie';
import { attemptOf, countAttempt, forgive } from '../session/sign-in-attempts';
import { endSession, endSessionsOf, openSessionsOf, sessionIdOfToken } from '../session/sessions.repository';
import { presentSessionPerson } from '../session/signed-in.presenter';

function myId({ caller }: RequestContext): string {
  const personId = personOf(caller);
  if (!personId) throw new RefusalError({ code: 'not-signed-in', params: {} });
  return personId;
}

async function mine(tx: Tx, context: RequestContext): Promise<Credentials> {
  const found = await credentialsById(tx, myId(context));
  if (!found) throw notFound();
  return found;
}

const presentMe = ({ person }: Credentials): Me => ({
  ...presentSessionPerson(person),
  rowVersion: person.rowVersion,
});

export const getMe = (context: RequestContext): Promise<Me> =>
  inTransaction(context.database, context.caller, async (tx) => presentMe(await mine(tx, context)));

export const renameMe = (context: RequestContext, name: string): Promise<Me> =>
  inTransaction(context.database, context.caller, async (tx) => {
    await renamePerson(tx, myId(context), context.ifMatch, name);
    return presentMe(await mine(tx, context));
  });

/** The application that the caller uses: everybody uses one. */
const ownApplication = ({ caller }: RequestContext): Application => (caller.kind === 'user' ? 'storefront' : 'admin');

/** The session that this request's cookie belongs to, if one came along. */
async function sessionHere(context: RequestContext): Promise<string | null> {
  const token = readRefreshToken(context, ownApplication(context));
  if (!token) return null;
  return inTransaction(context.database, system('refresh'), (tx) => sessionIdOfToken(tx, token));
}

export async function listMySessions(parts: IdentityParts, context: RequestContext): Promise<{ items: OpenSession[] }> {
  const here = await sessionHere(context);
  const now = await parts.clock.now();
  const sessions = await inTransaction(context.database, context.caller, (tx) =>
    openSessionsOf(tx, now, myId(context)),
  );
  return {
    items: sessions.map(({ id, application, device, createdAt, lastUsedAt }) => ({
      id,
      application: application as Application,
      device,
      signedInAt: createdAt.toISOString(),
      lastUsedAt: lastUsedAt.toISOString(),
      here: id === here,
    })),
  };
}

export async function endMySession(
  parts: IdentityParts,
  context: RequestContext,
  sessionId: string,
): Promise<undefined> {
  const now = await parts.clock.now();
  const ended = await inTransaction(context.database, context.caller, (tx) =>
    endSession(tx, now, sessionId, 'signed-out', myId(context)),
  );
  if (!ended) throw notFound();
  return undefined;
}

export async function signOutEverywhere(parts: IdentityParts, context: RequestContext): Promise<undefined> {
  const now = await parts.clock.now();
  await inTransaction(context.database, context.caller, (tx) =>
    endSessionsOf(tx, now, myId(context), 'signed-out-everywhere'),
  );
  dropRefreshToken(context, ownApplication(context));
  return undefined;
}

/** Changes one's own password after the present one was shown; every other session of one's own ends. */
export async function changePassword(
  parts: IdentityParts,
  context: RequestContext,
  { currentPassword, password }: { currentPassword: string; password: string },
): Promise<undefined> {
  const { person, passwordHash } = await inTransaction(context.database, context.caller, (tx) => mine(tx, context));
  unwrap(checkPassword(password, person.email));
  const now = await parts.clock.now();
  const attempt = attemptOf(parts.jwtSecrets[0], person.email, context.source);
  await inTransaction(context.database, system('sign-in'), (tx) => countAttempt(tx, attempt, now));
  if (!(await isRightPassword(passwordHash, currentPassword, parts.argonMemoryKib)))
    throw new RefusalError({ code: 'password-wrong', params: {}, pointer: '/currentPassword' });
  const newHash = await hashPassword(password, parts.argonMemoryKib);
  const here = await sessionHere(context);
  await inTransaction(context.database, context.caller, async (tx) => {
    await setPasswordHash(tx, person.id, newHash);
    await endSessionsOf(tx, now, person.id, 'password-changed', here);
  });
  await inTransaction(context.database, system('sign-in'), (tx) => forgive(tx, attempt));
  return undefined;
}

import type { UsedLink } from '@seamwright/identity/contracts';
import { checkPassword } from '@seamwright/identity/domain';
import { conflict, inTransaction, system, type RequestContext, type Tx } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';
import type { IdentityParts } from '../identity-parts';
import { hashPassword } from '../passwords';
import { renamePerson, setPasswordHash } from '../people/people.repository';
import { credentialsById, type SignedInPerson } from '../people/signed-in-person';
import { keepRefreshToken } from '../session/session-cookie';
import { endSessionsOf, startSession } from '../session/sessions.repository';
import { presentSignedIn } from '../session/signed-in.presenter';
import { personOfLink, useUpLinks, type LinkPurpose } from './one-time-links';

export interface LinkUse {
  readonly token: string;
  readonly password: string;
  readonly name?: string | undefined;
}

/**
 * Sets the password of whoever was mailed the link and signs them in; all sessions from before end. Refuses with
 * `link-not-valid` (409) a link that is unknown, used, too old, replaced, or of somebody inactive.
 */
export async function setPasswordByLink(
  parts: IdentityParts,
  context: RequestContext,
  purpose: LinkPurpose,
  { token, password, name }: LinkUse,
): Promise<UsedLink> {
  const now = await parts.clock.now();
  const find = (tx: Tx) => personBehind(tx, now, token, purpose);
  const before = await inTransaction(context.database, system('invitation'), find);
  unwrap(checkPassword(password, before.email));
  const hash = await hashPassword(password, parts.argonMemoryKib);

  const { person, issued } = await inTransaction(context.database, system('invitation'), async (tx) => {
    // Again, and locked: of two uses at once only one gets through.
    const found = await find(tx);
    await useUpLinks(tx, now, found.id);
    await setPasswordHash(tx, found.id, hash);
    if (name) await renamePerson(tx, found.id, found.rowVersion, name);
    await endSessionsOf(tx, now, found.id, 'password-changed');
    const { application } = found;
    const started = await startSession(tx, now, { personId: found.id, application, device: context.userAgent });
    return { person: { ...found, name: name ?? found.name }, issued: started };
  });
  keepRefreshToken(context, person.application, now, issued);
  return { ...presentSignedIn(parts, person), application: person.application };
}

async function personBehind(tx: Tx, now: Date, token: string, purpose: LinkPurpose): Promise<SignedInPerson> {
  const personId = await personOfLink(tx, now, token, purpose);
  const found = personId ? await credentialsById(tx, personId) : null;
  if (!found?.maySignIn) throw conflict('link-not-valid');
  return found.person;
}

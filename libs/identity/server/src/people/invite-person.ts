import { checkStanding, normaliseEmail } from '@seamwright/identity/domain';
import { conflict, type RequestContext, type Tx } from '@seamwright/shared/server';
import { RefusalError, unwrap } from '@seamwright/shared/util';
import { customerById } from '../customers/customers.repository';
import type { IdentityParts } from '../identity-parts';
import { mailInvitation } from '../links/link-mails';
import { insertPerson, personById, type NewPerson } from './people.repository';
import { callerMayLookAfter, personLookedAfter } from './steward';

/** Adds a person without a password; the standing is checked. Gives the id. */
export async function addPerson(tx: Tx, now: Date, person: NewPerson): Promise<string> {
  return insertPerson(tx, now, unwrap(checkStanding({ ...person, email: normaliseEmail(person.email) })));
}

/** Invites somebody to the caller's care: adds them and mails a link. Gives the person's id. */
export async function invitePerson(
  parts: IdentityParts,
  tx: Tx,
  { caller, now }: RequestContext,
  person: NewPerson,
): Promise<string> {
  if (person.customerId !== null) await customerById(tx, person.customerId);
  if (!callerMayLookAfter(caller, person.customerId)) throw new RefusalError({ code: 'not-allowed', params: {} });
  const id = await addPerson(tx, now, person);
  await mailInvitation(tx, await parts.clock.now(), parts.publicOrigin, await personById(tx, id));
  return id;
}

/** Mails a new link to somebody who has not set a password yet; the older link stops working. */
export async function inviteAgain(
  parts: IdentityParts,
  tx: Tx,
  { caller }: RequestContext,
  personId: string,
): Promise<string> {
  const person = await personLookedAfter(tx, caller, personId);
  if (person.state !== 'invited') throw conflict('already-joined');
  await mailInvitation(tx, await parts.clock.now(), parts.publicOrigin, person);
  return personId;
}

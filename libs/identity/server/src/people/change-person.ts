import type { CheckedInput } from '@seamwright/shared/contracts';
import type { updatePerson } from '@seamwright/identity/contracts';
import { checkStanding } from '@seamwright/identity/domain';
import { conflict, inTransaction, personOf, type RequestContext } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';
import type { IdentityParts } from '../identity-parts';
import { endSessionsOf } from '../session/sessions.repository';
import { changePersonRow, personById, type PersonRecord } from './people.repository';
import { personLookedAfter } from './steward';

type Change = CheckedInput<typeof updatePerson>['body'];

/** Changes somebody in the caller's care. Made inactive, their sessions end. Nobody takes their own way in away. */
export async function changePerson(
  parts: IdentityParts,
  context: RequestContext,
  personId: string,
  change: Change,
): Promise<PersonRecord> {
  const realNow = await parts.clock.now();
  return inTransaction(context.database, context.caller, async (tx) => {
    const person = await personLookedAfter(tx, context.caller, personId);
    if (personId === personOf(context.caller) && losesWayIn(person, change)) throw conflict('not-yourself');
    unwrap(checkStanding({ ...change, customerId: person.customerId }));
    await changePersonRow(tx, personId, context.ifMatch, { ...change, customerId: person.customerId });
    if (!change.active) await endSessionsOf(tx, realNow, personId, 'made-inactive');
    return personById(tx, personId);
  });
}

const losesWayIn = ({ roles }: PersonRecord, change: Change): boolean =>
  !change.active ||
  (['admin', 'buyer_owner'] as const).some((key) => roles.includes(key) && !change.roles.includes(key));

/** Signs somebody in the caller's care out everywhere. */
export async function endSessionsOfPerson(
  parts: IdentityParts,
  context: RequestContext,
  personId: string,
): Promise<undefined> {
  const now = await parts.clock.now();
  await inTransaction(context.database, context.caller, async (tx) => {
    await personLookedAfter(tx, context.caller, personId);
    await endSessionsOf(tx, now, personId, 'ended-by-steward');
  });
  return undefined;
}

import { mayLookAfter } from '@seamwright/identity/domain';
import { notFound, rolesOf, type Caller, type Tx } from '@seamwright/shared/server';
import { personById, type PersonRecord } from './people.repository';

/** Whether the caller may look after people of this customer (null: staff). */
export const callerMayLookAfter = (caller: Caller, customerId: string | null): boolean =>
  mayLookAfter({ roles: rolesOf(caller), customerId: caller.kind === 'user' ? caller.customerId : null }, customerId);

/** A person whom the caller looks after; throws `not-found` for anybody else. */
export async function personLookedAfter(tx: Tx, caller: Caller, personId: string): Promise<PersonRecord> {
  const person = await personById(tx, personId);
  if (!callerMayLookAfter(caller, person.customerId)) throw notFound();
  return person;
}

import * as contracts from '@seamwright/identity/contracts';
import {
  implement,
  implementOnce,
  inTransaction,
  pageFrom,
  readCursor,
  rolesOf,
  type Implementation,
} from '@seamwright/shared/server';
import { namePlace } from '../name-place';
import type { IdentityParts } from '../identity-parts';
import { changePerson, endSessionsOfPerson } from './change-person';
import { inviteAgain, invitePerson } from './invite-person';
import { presentPerson } from './people.presenter';
import { peoplePage, personById, recordOf } from './people.repository';
import { personLookedAfter } from './steward';

export const peopleRouter = (parts: IdentityParts): Implementation[] => [
  implement(contracts.listPeople, async ({ database, caller }, { query: { cursor, limit, customerId, who, q } }) => {
    const after = cursor ? readCursor(cursor, namePlace) : null;
    // Only administrators look after staff; a rep's list is of buyers.
    const shown = rolesOf(caller).includes('admin') ? who : 'buyers';
    const rows = await inTransaction(database, caller, (tx) =>
      peoplePage(tx, { customerId, who: shown, q, after, limit }),
    );
    return pageFrom(
      rows,
      limit,
      ({ sortName, id }) => [sortName, id],
      (row) => presentPerson(recordOf(row)),
    );
  }),

  implement(contracts.getPerson, ({ database, caller }, { params }) =>
    inTransaction(database, caller, async (tx) => presentPerson(await personLookedAfter(tx, caller, params.personId))),
  ),

  implementOnce(contracts.invitePerson, {
    make: (tx, context, { body }) => invitePerson(parts, tx, context, body),
    present: async (tx, _context, id) => presentPerson(await personById(tx, id)),
  }),

  implement(contracts.updatePerson, async (context, { params, body }) =>
    presentPerson(await changePerson(parts, context, params.personId, body)),
  ),

  implementOnce(contracts.reInvitePerson, {
    make: (tx, context, { params }) => inviteAgain(parts, tx, context, params.personId),
    present: async (tx, _context, id) => presentPerson(await personById(tx, id)),
  }),

  implement(contracts.endPersonSessions, (context, { params }) => endSessionsOfPerson(parts, context, params.personId)),
];

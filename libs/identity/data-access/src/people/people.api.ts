import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import type { Answer, CallInput } from '@seamwright/shared/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import {
  endPersonSessions,
  getPerson,
  invitePerson,
  listPeople,
  reInvitePerson,
  updatePerson,
  type PersonView,
} from '@seamwright/identity/contracts';

export type NewInvitation = NonNullable<CallInput<typeof invitePerson>['body']>;
export type PersonChange = NonNullable<CallInput<typeof updatePerson>['body']>;

/** People in one's care. */
@Injectable({ providedIn: 'root' })
export class PeopleApi {
  readonly #api = inject(ApiClient);

  list(query: CallInput<typeof listPeople>['query'] = {}): Observable<Answer<typeof listPeople>> {
    return this.#api.call(listPeople, { query });
  }

  get(personId: string): Observable<PersonView> {
    return this.#api.call(getPerson, { params: { personId } });
  }

  /** The key stays the same for every try of one invitation. */
  invite(person: NewInvitation, idempotencyKey: string): Observable<PersonView> {
    return this.#api.call(invitePerson, { body: person, idempotencyKey });
  }

  inviteAgain(personId: string): Observable<PersonView> {
    return this.#api.call(reInvitePerson, { params: { personId } });
  }

  update(personId: string, change: PersonChange, rowVersion: number): Observable<PersonView> {
    return this.#api.call(updatePerson, { params: { personId }, body: change, ifMatch: rowVersion });
  }

  endSessions(personId: string): Observable<undefined> {
    return this.#api.call(endPersonSessions, { params: { personId } });
  }
}

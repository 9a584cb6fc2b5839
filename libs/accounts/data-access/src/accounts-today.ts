import { inject, Injectable } from '@angular/core';
import { forkJoin, map, type Observable } from 'rxjs';
import { getReconciliation, listInvoices, listPayments } from '@seamwright/accounts/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { holdEndsSoon } from './payments/hold-ends';

const MOST_LOOKED_AT = 200;

/** So many, and whether there may be more than were looked at. */
export interface CountedSoFar {
  readonly count: number;
  readonly more: boolean;
}

/** What waits for the accounts desk. */
export interface AccountsWork {
  /** What is not explained in this week's card money. */
  readonly openExceptions: number;
  readonly overdueInvoices: CountedSoFar;
  readonly holdsEndingSoon: CountedSoFar;
}

/** Counts what waits for the accounts desk, for its first page. */
@Injectable({ providedIn: 'root' })
export class AccountsToday {
  readonly #api = inject(ApiClient);

  /** Throws ApiProblem when any of it can't be told. */
  read(now: Date): Observable<AccountsWork> {
    return forkJoin({
      week: this.#api.call(getReconciliation, { query: {} }),
      overdue: this.#api.call(listInvoices, { query: { standing: 'overdue', limit: MOST_LOOKED_AT } }),
      held: this.#api.call(listPayments, { query: { state: 'pre-authorised', limit: MOST_LOOKED_AT } }),
    }).pipe(
      map(({ week, overdue, held }) => ({
        openExceptions: week.exceptions.length,
        overdueInvoices: { count: overdue.items.length, more: overdue.nextCursor !== null },
        holdsEndingSoon: {
          count: held.items.filter((payment) => holdEndsSoon(payment, now)).length,
          more: held.nextCursor !== null,
        },
      })),
    );
  }
}

import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { auditTime, catchError, exhaustMap, filter, map, of, switchMap } from 'rxjs';
import { ledgerBalances, ledgerEntries } from '@seamwright/accounts/contracts';
import { ApiClient, asProblem, LiveEvents } from '@seamwright/shared/data-access';
import { LedgerApiActions, LedgerLiveActions, LedgerPageActions, type EntrySearch } from './ledger.actions';
import { ledgerFeature } from './ledger.feature';

const GATHER_MS = 400;

function page(api: ApiClient, { account, invoiceId }: EntrySearch, cursor: string | null) {
  const query = {
    ...(account === null ? {} : { account }),
    ...(invoiceId === null ? {} : { invoiceId }),
    ...(cursor === null ? {} : { cursor }),
  };
  return api.call(ledgerEntries, { query }).pipe(
    map(({ items, nextCursor }) => LedgerApiActions.entriesLoaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(LedgerApiActions.entriesFailed({ problem: asProblem(error) }))),
  );
}

const loadEntries = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LedgerPageActions.opened),
      switchMap(({ search }) => page(api, search, null)),
    ),
  { functional: true },
);

const loadMore = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LedgerPageActions.moreWanted),
      concatLatestFrom(() => [store.select(ledgerFeature.selectSearch), store.select(ledgerFeature.selectNextCursor)]),
      filter(([, , cursor]) => cursor !== null),
      exhaustMap(([, search, cursor]) => page(api, search, cursor)),
    ),
  { functional: true },
);

const loadBalances = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LedgerPageActions.opened, LedgerLiveActions.changed),
      switchMap(() =>
        api.call(ledgerBalances, {}).pipe(
          map(({ items }) => LedgerApiActions.balancesLoaded({ items })),
          catchError((error: unknown) => of(LedgerApiActions.balancesFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

/** What is invoiced or taken is posted with it. */
const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live.changes('invoice-made', 'payment-changed').pipe(
      auditTime(GATHER_MS),
      map(() => LedgerLiveActions.changed()),
    ),
  { functional: true },
);

const refreshEntries = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LedgerLiveActions.changed),
      concatLatestFrom(() => [store.select(ledgerFeature.selectEntries), store.select(ledgerFeature.selectSearch)]),
      filter(([, entries]) => entries.status !== 'idle'),
      switchMap(([, , search]) => page(api, search, null)),
    ),
  { functional: true },
);

export const ledgerEffects = { loadEntries, loadMore, loadBalances, hearChanges, refreshEntries };

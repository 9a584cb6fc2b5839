import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { auditTime, catchError, exhaustMap, filter, map, of, switchMap } from 'rxjs';
import { listPayments } from '@seamwright/accounts/contracts';
import { ApiClient, asProblem, LiveEvents } from '@seamwright/shared/data-access';
import { PaymentsApiActions, PaymentsLiveActions, PaymentsPageActions, type PaymentSearch } from './payments.actions';
import { paymentsFeature } from './payments.feature';

const GATHER_MS = 400;

function page(api: ApiClient, { state, customerId, orderId }: PaymentSearch, cursor: string | null) {
  const query = {
    ...(state === null ? {} : { state }),
    ...(customerId === null ? {} : { customerId }),
    ...(orderId === null ? {} : { orderId }),
    ...(cursor === null ? {} : { cursor }),
  };
  return api.call(listPayments, { query }).pipe(
    map(({ items, nextCursor }) => PaymentsApiActions.loaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(PaymentsApiActions.failed({ problem: asProblem(error) }))),
  );
}

const load = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PaymentsPageActions.opened),
      switchMap(({ search }) => page(api, search, null)),
    ),
  { functional: true },
);

const loadMore = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PaymentsPageActions.moreWanted),
      concatLatestFrom(() => [
        store.select(paymentsFeature.selectSearch),
        store.select(paymentsFeature.selectNextCursor),
      ]),
      filter(([, , cursor]) => cursor !== null),
      exhaustMap(([, search, cursor]) => page(api, search, cursor)),
    ),
  { functional: true },
);

const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live.changes('payment-changed').pipe(
      auditTime(GATHER_MS),
      map(() => PaymentsLiveActions.changed()),
    ),
  { functional: true },
);

/** The first page is fetched again, without it turning to "loading". */
const refresh = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PaymentsLiveActions.changed),
      concatLatestFrom(() => [store.select(paymentsFeature.selectList), store.select(paymentsFeature.selectSearch)]),
      filter(([, list]) => list.status !== 'idle'),
      switchMap(([, , search]) => page(api, search, null)),
    ),
  { functional: true },
);

export const paymentsEffects = { load, loadMore, hearChanges, refresh };

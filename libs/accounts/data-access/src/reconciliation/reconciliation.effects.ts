import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { auditTime, catchError, exhaustMap, filter, map, of, switchMap } from 'rxjs';
import { getReconciliation, refreshReconciliation } from '@seamwright/accounts/contracts';
import { ApiClient, asProblem, LiveEvents } from '@seamwright/shared/data-access';
import {
  ReconciliationApiActions,
  ReconciliationLiveActions,
  ReconciliationPageActions,
} from './reconciliation.actions';
import { reconciliationFeature } from './reconciliation.feature';

const GATHER_MS = 400;

const weekOf = (api: ApiClient, day: string | null) =>
  api.call(getReconciliation, { query: day === null ? {} : { day } }).pipe(
    map((week) => ReconciliationApiActions.loaded({ week })),
    catchError((error: unknown) => of(ReconciliationApiActions.failed({ problem: asProblem(error) }))),
  );

const load = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(ReconciliationPageActions.opened),
      switchMap(({ day }) => weekOf(api, day)),
    ),
  { functional: true },
);

const askProcessor = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(ReconciliationPageActions.processorAsked),
      exhaustMap(() =>
        api.call(refreshReconciliation, {}).pipe(
          map((told) => ReconciliationApiActions.processorAnswered(told)),
          catchError((error: unknown) => of(ReconciliationApiActions.processorFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live.changes('payment-changed').pipe(
      auditTime(GATHER_MS),
      map(() => ReconciliationLiveActions.changed()),
    ),
  { functional: true },
);

/** The week that is open is fetched again, without it turning to "loading". */
const refresh = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(
        ReconciliationLiveActions.changed,
        ReconciliationApiActions.processorAnswered,
        ReconciliationPageActions.statementTaken,
      ),
      concatLatestFrom(() => [
        store.select(reconciliationFeature.selectWeek),
        store.select(reconciliationFeature.selectDay),
      ]),
      filter(([, week]) => week.status !== 'idle'),
      switchMap(([, , day]) => weekOf(api, day)),
    ),
  { functional: true },
);

export const reconciliationEffects = { load, askProcessor, hearChanges, refresh };

import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { auditTime, catchError, EMPTY, exhaustMap, filter, map, of, switchMap, type Observable } from 'rxjs';
import { getLot, holdLot, listLots, releaseLot, type LotWire } from '@seamwright/stock/contracts';
import type { LotState } from '@seamwright/stock/domain';
import { ApiClient, asProblem, LiveEvents } from '@seamwright/shared/data-access';
import { LotListPageActions, LotPageActions, LotsApiActions, LotsLiveActions } from './lots.actions';
import { lotsFeature } from './lots.feature';

const GATHER_MS = 400;

function page(api: ApiClient, state: LotState | null, cursor: string | null) {
  const query = { ...(state === null ? {} : { state }), ...(cursor === null ? {} : { cursor }) };
  return api.call(listLots, { query }).pipe(
    map(({ items, nextCursor }) => LotsApiActions.listLoaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(LotsApiActions.listFailed({ problem: asProblem(error) }))),
  );
}

const loadList = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LotListPageActions.opened),
      switchMap(({ state }) => page(api, state, null)),
    ),
  { functional: true },
);

const loadMore = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LotListPageActions.moreWanted),
      concatLatestFrom(() => [store.select(lotsFeature.selectShown), store.select(lotsFeature.selectNextCursor)]),
      filter(([, , cursor]) => cursor !== null),
      exhaustMap(([, shown, cursor]) => page(api, shown, cursor)),
    ),
  { functional: true },
);

const refreshList = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LotsLiveActions.changed),
      concatLatestFrom(() => [store.select(lotsFeature.selectList), store.select(lotsFeature.selectShown)]),
      filter(([, list]) => list.status !== 'idle'),
      switchMap(([, , shown]) => page(api, shown, null)),
    ),
  { functional: true },
);

const loadLot = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LotPageActions.opened, LotsLiveActions.changed),
      concatLatestFrom(() => store.select(lotsFeature.selectLotId)),
      switchMap(([, id]) =>
        id === null
          ? EMPTY
          : api.call(getLot, { params: { id } }).pipe(
              map((lot) => LotsApiActions.loaded({ lot })),
              catchError((error: unknown) => of(LotsApiActions.failed({ problem: asProblem(error) }))),
            ),
      ),
    ),
  { functional: true },
);

const moved = (call: Observable<LotWire>) =>
  call.pipe(
    map((lot) => LotsApiActions.moved({ lot })),
    catchError((error: unknown) => of(LotsApiActions.moveFailed({ problem: asProblem(error) }))),
  );

const hold = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LotPageActions.holdPressed),
      exhaustMap(({ lotId: id, rowVersion: ifMatch, reason }) =>
        moved(api.call(holdLot, { params: { id }, ifMatch, body: { reason } })),
      ),
    ),
  { functional: true },
);

const release = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(LotPageActions.releasePressed),
      exhaustMap(({ lotId: id, rowVersion: ifMatch }) => moved(api.call(releaseLot, { params: { id }, ifMatch }))),
    ),
  { functional: true },
);

const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live.changes('lot-changed', 'pack-added', 'pack-voided').pipe(
      auditTime(GATHER_MS),
      map(() => LotsLiveActions.changed()),
    ),
  { functional: true },
);

export const lotsEffects = { loadList, loadMore, refreshList, loadLot, hold, release, hearChanges };

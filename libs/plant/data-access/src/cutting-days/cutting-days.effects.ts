import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { auditTime, catchError, EMPTY, exhaustMap, filter, forkJoin, map, of, switchMap } from 'rxjs';
import {
  closeCuttingDay,
  finishCuttingDay,
  getCuttingDay,
  getCuttingList,
  getPullList,
  getWorkbook,
  listCuttingDays,
  releaseCuttingDay,
} from '@seamwright/plant/contracts';
import { ApiClient, asProblem, LiveEvents, saveFile } from '@seamwright/shared/data-access';
import {
  CuttingDayListPageActions,
  CuttingDayPageActions,
  CuttingDaysApiActions,
  CuttingDaysLiveActions,
  type DayDeed,
} from './cutting-days.actions';
import { cuttingDaysFeature } from './cutting-days.feature';

const ENDPOINTS = {
  close: closeCuttingDay,
  release: releaseCuttingDay,
  finish: finishCuttingDay,
} as const satisfies Record<DayDeed, unknown>;

/** What changes a day's lists. */
const EVENTS = [
  'order-placed',
  'order-confirmed',
  'order-changed',
  'order-cancelled',
  'order-packed',
  'cutting-day-changed',
  'lot-changed',
  'pack-added',
  'pack-voided',
];
/** Many orders may change at once: the lists are fetched once for them. */
const GATHER_MS = 400;

function page(api: ApiClient, cursor: string | null) {
  return api.call(listCuttingDays, { query: cursor === null ? {} : { cursor } }).pipe(
    map(({ items, nextCursor }) => CuttingDaysApiActions.listLoaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(CuttingDaysApiActions.listFailed({ problem: asProblem(error) }))),
  );
}

function papersOf(api: ApiClient, deliveryDay: string) {
  const params = { deliveryDay };
  return forkJoin({
    day: api.call(getCuttingDay, { params }),
    cutting: api.call(getCuttingList, { params }),
    pull: api.call(getPullList, { params }),
  }).pipe(
    map((papers) => CuttingDaysApiActions.papersLoaded({ papers })),
    catchError((error: unknown) => of(CuttingDaysApiActions.papersFailed({ problem: asProblem(error) }))),
  );
}

const loadList = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CuttingDayListPageActions.opened),
      switchMap(() => page(api, null)),
    ),
  { functional: true },
);

const loadMore = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CuttingDayListPageActions.moreWanted),
      concatLatestFrom(() => store.select(cuttingDaysFeature.selectNextCursor)),
      filter(([, cursor]) => cursor !== null),
      exhaustMap(([, cursor]) => page(api, cursor)),
    ),
  { functional: true },
);

const loadPapers = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(
        CuttingDayPageActions.opened,
        CuttingDayPageActions.refreshPressed,
        CuttingDaysApiActions.deedDone,
        CuttingDaysLiveActions.changed,
      ),
      concatLatestFrom(() => store.select(cuttingDaysFeature.selectDeliveryDay)),
      switchMap(([, deliveryDay]) => (deliveryDay === null ? EMPTY : papersOf(api, deliveryDay))),
    ),
  { functional: true },
);

/** The first page of the list is fetched again once it has been opened. */
const refreshList = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CuttingDaysLiveActions.changed),
      concatLatestFrom(() => store.select(cuttingDaysFeature.selectList)),
      filter(([, list]) => list.status !== 'idle'),
      switchMap(() => page(api, null)),
    ),
  { functional: true },
);

const doDeed = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CuttingDayPageActions.deedPressed),
      exhaustMap(({ deed, deliveryDay, rowVersion }) =>
        api.call(ENDPOINTS[deed], { params: { deliveryDay }, ifMatch: rowVersion }).pipe(
          map((day) => CuttingDaysApiActions.deedDone({ deed, day })),
          catchError((error: unknown) => of(CuttingDaysApiActions.deedFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const saveWorkbook = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CuttingDayPageActions.workbookWanted),
      exhaustMap(({ deliveryDay }) =>
        api.download(getWorkbook, { params: { deliveryDay } }).pipe(
          map((file) => {
            saveFile(file);
            return CuttingDaysApiActions.workbookSaved();
          }),
          catchError((error: unknown) => of(CuttingDaysApiActions.workbookFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live.changes(...EVENTS).pipe(
      auditTime(GATHER_MS),
      map(() => CuttingDaysLiveActions.changed()),
    ),
  { functional: true },
);

export const cuttingDaysEffects = {
  loadList,
  loadMore,
  loadPapers,
  refreshList,
  doDeed,
  saveWorkbook,
  hearChanges,
};

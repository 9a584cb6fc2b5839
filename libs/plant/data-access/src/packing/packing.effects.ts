import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { auditTime, catchError, EMPTY, exhaustMap, map, of, switchMap, type Observable } from 'rxjs';
import {
  addPack,
  finishOrder,
  listCuttingDays,
  listPackingOrders,
  markShort,
  voidPack,
  type PackingOrderWire,
} from '@seamwright/plant/contracts';
import { ApiClient, asProblem, LiveEvents } from '@seamwright/shared/data-access';
import {
  PackingApiActions,
  PackingLiveActions,
  ScaleOrdersPageActions,
  ScalePageActions,
  type PackingDeed,
} from './packing.actions';
import { packingFeature } from './packing.feature';

const EVENTS = ['pack-added', 'pack-voided', 'order-changed', 'order-packed', 'cutting-day-changed', 'lot-changed'];
const GATHER_MS = 400;

const loadDays = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(ScaleOrdersPageActions.opened),
      switchMap(() =>
        api.call(listCuttingDays, { query: { state: 'released' } }).pipe(
          map(({ items }) => PackingApiActions.daysLoaded({ days: [...items].reverse() })),
          catchError((error: unknown) => of(PackingApiActions.failed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const loadOrders = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(
        PackingApiActions.daysLoaded,
        ScaleOrdersPageActions.dayChosen,
        ScalePageActions.opened,
        PackingLiveActions.changed,
      ),
      concatLatestFrom(() => store.select(packingFeature.selectDeliveryDay)),
      switchMap(([, deliveryDay]) =>
        deliveryDay === null
          ? EMPTY
          : api.call(listPackingOrders, { query: { deliveryDay } }).pipe(
              map((answer) => PackingApiActions.ordersLoaded(answer)),
              catchError((error: unknown) => of(PackingApiActions.failed({ problem: asProblem(error) }))),
            ),
      ),
    ),
  { functional: true },
);

const answered = (deed: PackingDeed, call: Observable<PackingOrderWire>) =>
  call.pipe(
    map((order) => PackingApiActions.deedDone({ deed, order })),
    catchError((error: unknown) => of(PackingApiActions.deedFailed({ deed, problem: asProblem(error) }))),
  );

const weighPack = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(ScalePageActions.packWeighed),
      exhaustMap(({ orderId, pack, idempotencyKey }) =>
        answered('pack', api.call(addPack, { params: { orderId }, body: pack, idempotencyKey })),
      ),
    ),
  { functional: true },
);

const takePackBack = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(ScalePageActions.packTakenBack),
      exhaustMap((params) =>
        answered('void', api.call(voidPack, { params: { orderId: params.orderId, packId: params.packId } })),
      ),
    ),
  { functional: true },
);

const markLineShort = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(ScalePageActions.shortMarked),
      exhaustMap(({ orderId, lineId, shortPieces, reason }) =>
        answered('short', api.call(markShort, { params: { orderId, lineId }, body: { shortPieces, reason } })),
      ),
    ),
  { functional: true },
);

const finish = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(ScalePageActions.finishPressed),
      exhaustMap(({ orderId }) => answered('finish', api.call(finishOrder, { params: { orderId } }))),
    ),
  { functional: true },
);

const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live.changes(...EVENTS).pipe(
      auditTime(GATHER_MS),
      map(() => PackingLiveActions.changed()),
    ),
  { functional: true },
);

export const packingEffects = { loadDays, loadOrders, weighPack, takePackBack, markLineShort, finish, hearChanges };

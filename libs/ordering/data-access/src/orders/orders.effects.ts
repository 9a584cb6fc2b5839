import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { auditTime, catchError, exhaustMap, filter, map, of, switchMap } from 'rxjs';
import { cancelOrder, getOrder, listOrders, payOrderWith } from '@seamwright/ordering/contracts';
import { ApiClient, asProblem, LiveEvents } from '@seamwright/shared/data-access';
import {
  OrderListPageActions,
  OrderPageActions,
  OrdersApiActions,
  OrdersLiveActions,
  type OrderSearch,
} from './orders.actions';
import { ordersFeature } from './orders.feature';

const GATHER_MS = 400;

function page(api: ApiClient, { deliveryDay, state, customerId }: OrderSearch, cursor: string | null) {
  const query = {
    ...(deliveryDay === null ? {} : { deliveryDay }),
    ...(state === null ? {} : { state }),
    ...(customerId === null ? {} : { customerId }),
    ...(cursor === null ? {} : { cursor }),
  };
  return api.call(listOrders, { query }).pipe(
    map(({ items, nextCursor }) => OrdersApiActions.listLoaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(OrdersApiActions.listFailed({ problem: asProblem(error) }))),
  );
}

const one = (api: ApiClient, orderId: string) =>
  api.call(getOrder, { params: { orderId } }).pipe(
    map((order) => OrdersApiActions.loaded({ order })),
    catchError((error: unknown) => of(OrdersApiActions.failed({ problem: asProblem(error) }))),
  );

const loadList = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(OrderListPageActions.opened),
      switchMap(({ search }) => page(api, search, null)),
    ),
  { functional: true },
);

const loadMore = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(OrderListPageActions.moreWanted),
      concatLatestFrom(() => [store.select(ordersFeature.selectSearch), store.select(ordersFeature.selectNextCursor)]),
      filter(([, , cursor]) => cursor !== null),
      exhaustMap(([, search, cursor]) => page(api, search, cursor)),
    ),
  { functional: true },
);

const loadOrder = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(OrderPageActions.opened),
      switchMap(({ orderId }) => one(api, orderId)),
    ),
  { functional: true },
);

const cancel = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(OrderPageActions.cancelPressed),
      exhaustMap(({ orderId, rowVersion: ifMatch, reason }) =>
        api.call(cancelOrder, { params: { orderId }, ifMatch, body: { reason } }).pipe(
          map((order) => OrdersApiActions.cancelled({ order })),
          catchError((error: unknown) => of(OrdersApiActions.cancelFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const payWith = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(OrderPageActions.otherCardChosen),
      exhaustMap(({ orderId, rowVersion: ifMatch, cardId }) =>
        api.call(payOrderWith, { params: { orderId }, ifMatch, body: { cardId } }).pipe(
          map((order) => OrdersApiActions.cardAsked({ order })),
          catchError((error: unknown) => of(OrdersApiActions.cardFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live
      .changes('order-placed', 'order-confirmed', 'order-changed', 'order-cancelled', 'order-packed', 'pack-added')
      .pipe(map(({ id }) => OrdersLiveActions.changed({ orderId: id }))),
  { functional: true },
);

/** The open order is fetched again, without its page turning to "loading". */
const refreshOrder = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(OrdersLiveActions.changed),
      concatLatestFrom(() => store.select(ordersFeature.selectOrderId)),
      filter(([{ orderId }, open]) => open !== null && (orderId === '' || orderId === open)),
      switchMap(([, open]) => one(api, open ?? '')),
    ),
  { functional: true },
);

/** The first page is fetched again once the list has been opened; many changes at once are one. */
const refreshList = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(OrdersLiveActions.changed, OrdersApiActions.cancelled, OrdersApiActions.cardAsked),
      auditTime(GATHER_MS),
      concatLatestFrom(() => [store.select(ordersFeature.selectList), store.select(ordersFeature.selectSearch)]),
      filter(([, list]) => list.status !== 'idle'),
      switchMap(([, , search]) => page(api, search, null)),
    ),
  { functional: true },
);

export const ordersEffects = { loadList, loadMore, loadOrder, cancel, payWith, hearChanges, refreshOrder, refreshList };

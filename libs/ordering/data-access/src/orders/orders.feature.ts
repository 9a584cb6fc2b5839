import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { OrderDetail, OrderListItem } from '@seamwright/ordering/contracts';
import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { OrderListPageActions, OrderPageActions, OrdersApiActions, type OrderSearch } from './orders.actions';

export interface OrdersState {
  readonly search: OrderSearch;
  readonly list: Remote<readonly OrderListItem[]>;
  readonly nextCursor: string | null;
  readonly orderId: string | null;
  readonly order: Remote<OrderDetail>;
  readonly cancelling: Deed;
  /** Another card is being asked to be held. */
  readonly paying: Deed;
}

interface Deed {
  readonly running: boolean;
  readonly problem: Problem | null;
}

const still: Deed = { running: false, problem: null };
const running: Deed = { running: true, problem: null };

const initial: OrdersState = {
  search: { deliveryDay: null, state: null, customerId: null },
  list: idle(),
  nextCursor: null,
  orderId: null,
  order: idle(),
  cancelling: still,
  paying: still,
};

const same = (one: OrderSearch, other: OrderSearch): boolean =>
  one.deliveryDay === other.deliveryDay && one.state === other.state && one.customerId === other.customerId;

/** Orders, newest first, and the one that is open. */
export const ordersFeature = createFeature({
  name: 'orders',
  reducer: createReducer(
    initial,
    on(OrderListPageActions.opened, (state, { search }): OrdersState => ({
      ...state,
      search,
      list: loading(same(search, state.search) ? state.list : idle()),
      nextCursor: null,
    })),
    on(OrderListPageActions.moreWanted, (state): OrdersState => ({ ...state, list: loading(state.list) })),
    on(OrdersApiActions.listLoaded, (state, { items, nextCursor, first }): OrdersState => ({
      ...state,
      list: loaded(first ? items : [...(state.list.data ?? []), ...items]),
      nextCursor,
    })),
    on(OrdersApiActions.listFailed, (state, { problem }): OrdersState => ({
      ...state,
      list: failed(state.list, problem),
    })),
    on(OrderPageActions.opened, (state, { orderId }): OrdersState => ({
      ...state,
      orderId,
      order: loading(state.orderId === orderId ? state.order : idle()),
      cancelling: still,
      paying: still,
    })),
    on(OrdersApiActions.loaded, (state, { order }): OrdersState =>
      order.id === state.orderId ? { ...state, order: loaded(order) } : state,
    ),
    on(OrdersApiActions.failed, (state, { problem }): OrdersState => ({
      ...state,
      order: failed(state.order, problem),
    })),
    on(OrderPageActions.cancelPressed, (state): OrdersState => ({
      ...state,
      cancelling: running,
    })),
    on(OrdersApiActions.cancelled, (state, { order }): OrdersState => ({
      ...state,
      order: order.id === state.orderId ? loaded(order) : state.order,
      cancelling: still,
    })),
    on(OrdersApiActions.cancelFailed, (state, { problem }): OrdersState => ({
      ...state,
      cancelling: { running: false, problem },
    })),
    on(OrderPageActions.otherCardChosen, (state): OrdersState => ({ ...state, paying: running })),
    on(OrdersApiActions.cardAsked, (state, { order }): OrdersState => ({
      ...state,
      order: order.id === state.orderId ? loaded(order) : state.order,
      paying: still,
    })),
    on(OrdersApiActions.cardFailed, (state, { problem }): OrdersState => ({
      ...state,
      paying: { running: false, problem },
    })),
  ),
  extraSelectors: ({ selectNextCursor }) => ({
    selectHasMore: createSelector(selectNextCursor, (cursor) => cursor !== null),
  }),
});

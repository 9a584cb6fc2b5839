import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { OrderDetail, OrderListItem } from '@seamwright/ordering/contracts';
import type { Problem } from '@seamwright/shared/contracts';

/** What a list of orders shows; null for all. */
export interface OrderSearch {
  readonly deliveryDay: string | null;
  readonly state: 'waiting' | 'confirmed' | 'released' | 'packed' | 'cancelled' | null;
  readonly customerId: string | null;
}

export const OrderListPageActions = createActionGroup({
  source: 'Order List Page',
  events: { Opened: props<{ search: OrderSearch }>(), 'More Wanted': emptyProps() },
});

export const OrderPageActions = createActionGroup({
  source: 'Order Page',
  events: {
    Opened: props<{ orderId: string }>(),
    'Cancel Pressed': props<{ orderId: string; rowVersion: number; reason: string }>(),
    'Other Card Chosen': props<{ orderId: string; rowVersion: number; cardId: string }>(),
  },
});

export const OrdersApiActions = createActionGroup({
  source: 'Orders API',
  events: {
    'List Loaded': props<{ items: OrderListItem[]; nextCursor: string | null; first: boolean }>(),
    'List Failed': props<{ problem: Problem }>(),
    Loaded: props<{ order: OrderDetail }>(),
    Failed: props<{ problem: Problem }>(),
    Cancelled: props<{ order: OrderDetail }>(),
    'Cancel Failed': props<{ problem: Problem }>(),
    /** The other card was asked; the order says whether it is held. */
    'Card Asked': props<{ order: OrderDetail }>(),
    'Card Failed': props<{ problem: Problem }>(),
  },
});

export const OrdersLiveActions = createActionGroup({
  source: 'Orders Live',
  events: {
    /** Orders changed elsewhere; an empty id means any may have. */
    Changed: props<{ orderId: string }>(),
  },
});

import { createFeature, createReducer, on } from '@ngrx/store';
import type { CuttingDayWire, PackingOrderWire } from '@seamwright/plant/contracts';
import type { CuttingDayState } from '@seamwright/plant/domain';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { refused, running, still, type Deed } from '../deed';
import { PackingApiActions, PackingLiveActions, ScaleOrdersPageActions, ScalePageActions } from './packing.actions';

export interface PackingState {
  /** Days on the floor, the earliest delivery first. */
  readonly days: readonly CuttingDayWire[];
  readonly deliveryDay: string | null;
  readonly dayState: CuttingDayState | null;
  readonly orders: Remote<readonly PackingOrderWire[]>;
  readonly deed: Deed;
}

const initial: PackingState = { days: [], deliveryDay: null, dayState: null, orders: idle(), deed: still };

const chosen = (state: PackingState, deliveryDay: string): PackingState => ({
  ...state,
  deliveryDay,
  orders: loading(state.deliveryDay === deliveryDay ? state.orders : idle()),
  deed: still,
});

export const packingFeature = createFeature({
  name: 'packing',
  reducer: createReducer(
    initial,
    on(ScaleOrdersPageActions.opened, (state): PackingState => ({
      ...state,
      orders: loading(state.orders),
      deed: still,
    })),
    on(PackingApiActions.daysLoaded, (state, { days }): PackingState => {
      const deliveryDay = days.some((day) => day.deliveryDay === state.deliveryDay)
        ? state.deliveryDay
        : (days[0]?.deliveryDay ?? null);
      const orders = deliveryDay === null ? loaded<readonly PackingOrderWire[]>([]) : state.orders;
      return { ...state, days, deliveryDay, orders };
    }),
    on(ScaleOrdersPageActions.dayChosen, ScalePageActions.opened, (state, { deliveryDay }): PackingState =>
      chosen(state, deliveryDay),
    ),
    on(PackingApiActions.ordersLoaded, (state, { deliveryDay, state: dayState, orders }): PackingState =>
      deliveryDay === state.deliveryDay ? { ...state, dayState, orders: loaded(orders) } : state,
    ),
    on(PackingApiActions.failed, (state, { problem }): PackingState => ({
      ...state,
      orders: failed(state.orders, problem),
    })),
    on(PackingLiveActions.changed, (state): PackingState =>
      state.deliveryDay === null ? state : { ...state, orders: loading(state.orders) },
    ),
    on(
      ScalePageActions.packWeighed,
      ScalePageActions.packTakenBack,
      ScalePageActions.shortMarked,
      ScalePageActions.finishPressed,
      (state): PackingState => ({ ...state, deed: running }),
    ),
    on(PackingApiActions.deedDone, (state, { order }): PackingState => ({
      ...state,
      deed: still,
      orders: {
        ...state.orders,
        data: state.orders.data?.map((each) => (each.id === order.id ? order : each)) ?? null,
      },
    })),
    on(PackingApiActions.deedFailed, (state, { problem }): PackingState => ({ ...state, deed: refused(problem) })),
  ),
});

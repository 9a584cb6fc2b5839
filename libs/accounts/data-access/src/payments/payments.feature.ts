import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { PaymentWire } from '@seamwright/accounts/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { PaymentsApiActions, PaymentsPageActions, type PaymentSearch } from './payments.actions';

export interface PaymentsState {
  readonly search: PaymentSearch;
  readonly list: Remote<readonly PaymentWire[]>;
  readonly nextCursor: string | null;
}

const initial: PaymentsState = {
  search: { state: null, customerId: null, orderId: null },
  list: idle(),
  nextCursor: null,
};

const same = (one: PaymentSearch, other: PaymentSearch): boolean =>
  one.state === other.state && one.customerId === other.customerId && one.orderId === other.orderId;

/** Card payments, newest first. */
export const paymentsFeature = createFeature({
  name: 'payments',
  reducer: createReducer(
    initial,
    on(PaymentsPageActions.opened, (state, { search }): PaymentsState => ({
      search,
      list: loading(same(search, state.search) ? state.list : idle()),
      nextCursor: null,
    })),
    on(PaymentsPageActions.moreWanted, (state): PaymentsState =>
      state.nextCursor === null ? state : { ...state, list: loading(state.list) },
    ),
    on(PaymentsApiActions.loaded, (state, { items, nextCursor, first }): PaymentsState => ({
      ...state,
      list: loaded(first ? items : [...(state.list.data ?? []), ...items]),
      nextCursor,
    })),
    on(PaymentsApiActions.failed, (state, { problem }): PaymentsState => ({
      ...state,
      list: failed(state.list, problem),
    })),
  ),
  extraSelectors: ({ selectNextCursor }) => ({
    selectHasMore: createSelector(selectNextCursor, (cursor) => cursor !== null),
  }),
});

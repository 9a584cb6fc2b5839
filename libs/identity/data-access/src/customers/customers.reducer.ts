import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import type { CustomerView } from '@seamwright/identity/contracts';
import {
  CustomerPageActions,
  CustomersApiActions,
  CustomersPageActions,
  type CustomersQuery,
} from './customers.actions';

export interface CustomersState {
  readonly query: CustomersQuery;
  readonly list: Remote<{ readonly items: readonly CustomerView[]; readonly nextCursor: string | null }>;
  readonly customer: Remote<CustomerView>;
}

const initial: CustomersState = { query: { q: '', kind: null }, list: idle(), customer: idle() };

export const customersFeature = createFeature({
  name: 'customers',
  reducer: createReducer(
    initial,
    on(CustomersPageActions.opened, CustomersPageActions.moreWanted, (state): CustomersState => ({
      ...state,
      list: loading(state.list),
    })),
    on(CustomersPageActions.searched, (state, { query }): CustomersState => ({
      ...state,
      query,
      list: loading(state.list),
    })),
    on(CustomersApiActions.listed, (state, { items, nextCursor }): CustomersState => ({
      ...state,
      list: loaded({ items, nextCursor }),
    })),
    on(CustomersApiActions.moreListed, (state, { items, nextCursor }): CustomersState => ({
      ...state,
      list: loaded({ items: [...(state.list.data?.items ?? []), ...items], nextCursor }),
    })),
    on(CustomersApiActions.listFailed, (state, { problem }): CustomersState => ({
      ...state,
      list: failed(state.list, problem),
    })),
    on(CustomerPageActions.opened, (state, { customerId }): CustomersState => ({
      ...state,
      // What is shown while it loads is this customer or nothing.
      customer: loading(state.customer.data?.id === customerId ? state.customer : idle()),
    })),
    on(CustomersApiActions.loaded, CustomerPageActions.received, (state, { customer }): CustomersState => ({
      ...state,
      customer: loaded(customer),
    })),
    on(CustomersApiActions.loadFailed, (state, { problem }): CustomersState => ({
      ...state,
      customer: failed(state.customer, problem),
    })),
  ),
});

export const selectCustomer = customersFeature.selectCustomer;

/** What the list page shows. */
export const selectCustomersPage = createSelector(customersFeature.selectCustomersState, ({ query, list }) => ({
  query,
  items: list.data?.items ?? [],
  hasMore: list.data?.nextCursor != null,
  loading: list.status === 'loading',
  problem: list.problem,
  narrowed: query.q !== '' || query.kind !== null,
}));

import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { Problem } from '@seamwright/shared/contracts';
import type { CustomerView } from '@seamwright/identity/contracts';
import type { CustomerKind } from '@seamwright/identity/domain';

/** What the list is narrowed to. */
export interface CustomersQuery {
  readonly q: string;
  readonly kind: CustomerKind | null;
}

export const CustomersPageActions = createActionGroup({
  source: 'Customers Page',
  events: {
    Opened: emptyProps(),
    Searched: props<{ query: CustomersQuery }>(),
    'More Wanted': emptyProps(),
  },
});

export const CustomerPageActions = createActionGroup({
  source: 'Customer Page',
  events: {
    Opened: props<{ customerId: string }>(),
    /** Saved, or the newer state was taken. */
    Received: props<{ customer: CustomerView }>(),
  },
});

export const CustomersApiActions = createActionGroup({
  source: 'Customers API',
  events: {
    Listed: props<{ items: readonly CustomerView[]; nextCursor: string | null }>(),
    'More Listed': props<{ items: readonly CustomerView[]; nextCursor: string | null }>(),
    'List Failed': props<{ problem: Problem }>(),
    Loaded: props<{ customer: CustomerView }>(),
    'Load Failed': props<{ problem: Problem }>(),
  },
});

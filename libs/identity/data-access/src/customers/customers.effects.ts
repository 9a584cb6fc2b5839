import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { catchError, exhaustMap, map, of, switchMap, takeUntil, withLatestFrom } from 'rxjs';
import { asProblem } from '@seamwright/shared/data-access';
import {
  CustomerPageActions,
  CustomersApiActions,
  CustomersPageActions,
  type CustomersQuery,
} from './customers.actions';
import { CustomersApi } from './customers.api';
import { customersFeature } from './customers.reducer';

const asked = ({ q, kind }: CustomersQuery) => ({ ...(q ? { q } : {}), ...(kind ? { kind } : {}) });
const listFailed = (error: unknown) => of(CustomersApiActions.listFailed({ problem: asProblem(error) }));

/** The latest search wins. */
export const list = createEffect(
  (actions = inject(Actions), api = inject(CustomersApi), store = inject(Store)) =>
    actions.pipe(
      ofType(CustomersPageActions.opened, CustomersPageActions.searched),
      withLatestFrom(store.select(customersFeature.selectQuery)),
      switchMap(([, query]) =>
        api.list(asked(query)).pipe(
          map((page) => CustomersApiActions.listed(page)),
          catchError(listFailed),
        ),
      ),
    ),
  { functional: true },
);

/** The next page of the same search; a new search makes it void. */
export const more = createEffect(
  (actions = inject(Actions), api = inject(CustomersApi), store = inject(Store)) =>
    actions.pipe(
      ofType(CustomersPageActions.moreWanted),
      withLatestFrom(store.select(customersFeature.selectCustomersState)),
      exhaustMap(([, { query, list: shown }]) =>
        api.list({ ...asked(query), cursor: shown.data?.nextCursor ?? undefined }).pipe(
          map((page) => CustomersApiActions.moreListed(page)),
          catchError(listFailed),
          takeUntil(actions.pipe(ofType(CustomersPageActions.opened, CustomersPageActions.searched))),
        ),
      ),
    ),
  { functional: true },
);

export const load = createEffect(
  (actions = inject(Actions), api = inject(CustomersApi)) =>
    actions.pipe(
      ofType(CustomerPageActions.opened),
      switchMap(({ customerId }) =>
        api.get(customerId).pipe(
          map((customer) => CustomersApiActions.loaded({ customer })),
          catchError((error: unknown) => of(CustomersApiActions.loadFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

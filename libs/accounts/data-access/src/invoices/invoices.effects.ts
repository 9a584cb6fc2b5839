import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { auditTime, catchError, exhaustMap, filter, map, of, switchMap } from 'rxjs';
import { getInvoice, getInvoicePdf, ledgerEntries, listInvoices } from '@seamwright/accounts/contracts';
import { ApiClient, asProblem, LiveEvents, saveFile } from '@seamwright/shared/data-access';
import {
  InvoiceListPageActions,
  InvoicePageActions,
  InvoicesApiActions,
  InvoicesLiveActions,
  type InvoiceSearch,
} from './invoices.actions';
import { invoicesFeature } from './invoices.feature';

const GATHER_MS = 400;

/** An invoice, its capture and what may come back of it are a handful of entries. */
const MOST_POSTINGS = 50;

function page(api: ApiClient, { standing, customerId }: InvoiceSearch, cursor: string | null) {
  const query = {
    ...(standing === null ? {} : { standing }),
    ...(customerId === null ? {} : { customerId }),
    ...(cursor === null ? {} : { cursor }),
  };
  return api.call(listInvoices, { query }).pipe(
    map(({ items, nextCursor }) => InvoicesApiActions.listLoaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(InvoicesApiActions.listFailed({ problem: asProblem(error) }))),
  );
}

const one = (api: ApiClient, invoiceId: string) =>
  api.call(getInvoice, { params: { invoiceId } }).pipe(
    map((invoice) => InvoicesApiActions.loaded({ invoice })),
    catchError((error: unknown) => of(InvoicesApiActions.failed({ problem: asProblem(error) }))),
  );

const loadList = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(InvoiceListPageActions.opened),
      switchMap(({ search }) => page(api, search, null)),
    ),
  { functional: true },
);

const loadMore = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(InvoiceListPageActions.moreWanted),
      concatLatestFrom(() => [
        store.select(invoicesFeature.selectSearch),
        store.select(invoicesFeature.selectNextCursor),
      ]),
      filter(([, , cursor]) => cursor !== null),
      exhaustMap(([, search, cursor]) => page(api, search, cursor)),
    ),
  { functional: true },
);

const loadInvoice = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(InvoicePageActions.opened),
      switchMap(({ invoiceId }) => one(api, invoiceId)),
    ),
  { functional: true },
);

const loadPostings = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(InvoicePageActions.postingsWanted),
      switchMap(({ invoiceId }) =>
        api.call(ledgerEntries, { query: { invoiceId, limit: MOST_POSTINGS } }).pipe(
          map(({ items }) => InvoicesApiActions.postingsLoaded({ invoiceId, entries: items })),
          catchError((error: unknown) => of(InvoicesApiActions.postingsFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const fetchPaper = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(InvoicePageActions.paperWanted),
      exhaustMap(({ invoiceId }) =>
        api.download(getInvoicePdf, { params: { invoiceId } }).pipe(
          map((file) => {
            saveFile(file);
            return InvoicesApiActions.paperGiven();
          }),
          catchError((error: unknown) => of(InvoicesApiActions.paperFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live.changes('invoice-made', 'payment-changed').pipe(
      auditTime(GATHER_MS),
      map(() => InvoicesLiveActions.changed()),
    ),
  { functional: true },
);

/** The first page is fetched again once the list has been opened, without it turning to "loading". */
const refreshList = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(InvoicesLiveActions.changed),
      concatLatestFrom(() => [store.select(invoicesFeature.selectList), store.select(invoicesFeature.selectSearch)]),
      filter(([, list]) => list.status !== 'idle'),
      switchMap(([, , search]) => page(api, search, null)),
    ),
  { functional: true },
);

const refreshInvoice = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(InvoicesLiveActions.changed),
      concatLatestFrom(() => store.select(invoicesFeature.selectInvoiceId)),
      switchMap(([, invoiceId]) => (invoiceId === null ? of() : one(api, invoiceId))),
    ),
  { functional: true },
);

export const invoicesEffects = {
  loadList,
  loadMore,
  loadInvoice,
  loadPostings,
  fetchPaper,
  hearChanges,
  refreshList,
  refreshInvoice,
};

import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { InvoiceDetail, InvoiceListItem, LedgerEntry } from '@seamwright/accounts/contracts';
import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { InvoiceListPageActions, InvoicePageActions, InvoicesApiActions, type InvoiceSearch } from './invoices.actions';

export interface InvoicesState {
  readonly search: InvoiceSearch;
  readonly list: Remote<readonly InvoiceListItem[]>;
  readonly nextCursor: string | null;
  readonly invoiceId: string | null;
  readonly invoice: Remote<InvoiceDetail>;
  readonly postings: Remote<readonly LedgerEntry[]>;
  readonly paper: { readonly running: boolean; readonly problem: Problem | null };
}

const still = { running: false, problem: null };

const initial: InvoicesState = {
  search: { standing: null, customerId: null },
  list: idle(),
  nextCursor: null,
  invoiceId: null,
  invoice: idle(),
  postings: idle(),
  paper: still,
};

const same = (one: InvoiceSearch, other: InvoiceSearch): boolean =>
  one.standing === other.standing && one.customerId === other.customerId;

/** Invoices, newest first, and the one that is open. */
export const invoicesFeature = createFeature({
  name: 'invoices',
  reducer: createReducer(
    initial,
    on(InvoiceListPageActions.opened, (state, { search }): InvoicesState => ({
      ...state,
      search,
      list: loading(same(search, state.search) ? state.list : idle()),
      nextCursor: null,
    })),
    on(InvoiceListPageActions.moreWanted, (state): InvoicesState =>
      state.nextCursor === null ? state : { ...state, list: loading(state.list) },
    ),
    on(InvoicesApiActions.listLoaded, (state, { items, nextCursor, first }): InvoicesState => ({
      ...state,
      list: loaded(first ? items : [...(state.list.data ?? []), ...items]),
      nextCursor,
    })),
    on(InvoicesApiActions.listFailed, (state, { problem }): InvoicesState => ({
      ...state,
      list: failed(state.list, problem),
    })),
    on(InvoicePageActions.opened, (state, { invoiceId }): InvoicesState => ({
      ...state,
      invoiceId,
      invoice: loading(state.invoiceId === invoiceId ? state.invoice : idle()),
      postings: state.invoiceId === invoiceId ? state.postings : idle(),
      paper: still,
    })),
    on(InvoicesApiActions.loaded, (state, { invoice }): InvoicesState =>
      invoice.id === state.invoiceId ? { ...state, invoice: loaded(invoice) } : state,
    ),
    on(InvoicesApiActions.failed, (state, { problem }): InvoicesState => ({
      ...state,
      invoice: failed(state.invoice, problem),
    })),
    on(InvoicePageActions.postingsWanted, (state): InvoicesState => ({ ...state, postings: loading(state.postings) })),
    on(InvoicesApiActions.postingsLoaded, (state, { invoiceId, entries }): InvoicesState =>
      invoiceId === state.invoiceId ? { ...state, postings: loaded(entries) } : state,
    ),
    on(InvoicesApiActions.postingsFailed, (state, { problem }): InvoicesState => ({
      ...state,
      postings: failed(state.postings, problem),
    })),
    on(InvoicePageActions.paperWanted, (state): InvoicesState => ({
      ...state,
      paper: { running: true, problem: null },
    })),
    on(InvoicesApiActions.paperGiven, (state): InvoicesState => ({ ...state, paper: still })),
    on(InvoicesApiActions.paperFailed, (state, { problem }): InvoicesState => ({
      ...state,
      paper: { running: false, problem },
    })),
  ),
  extraSelectors: ({ selectNextCursor }) => ({
    selectHasMore: createSelector(selectNextCursor, (cursor) => cursor !== null),
  }),
});

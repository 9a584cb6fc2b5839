import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { AccountBalance, LedgerEntry } from '@seamwright/accounts/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { LedgerApiActions, LedgerPageActions, type EntrySearch } from './ledger.actions';

export interface LedgerState {
  readonly balances: Remote<readonly AccountBalance[]>;
  readonly search: EntrySearch;
  readonly entries: Remote<readonly LedgerEntry[]>;
  readonly nextCursor: string | null;
}

const initial: LedgerState = {
  balances: idle(),
  search: { account: null, invoiceId: null },
  entries: idle(),
  nextCursor: null,
};

const same = (one: EntrySearch, other: EntrySearch): boolean =>
  one.account === other.account && one.invoiceId === other.invoiceId;

/** What stands on each account, and the entries that made it so, newest first. */
export const ledgerFeature = createFeature({
  name: 'ledger',
  reducer: createReducer(
    initial,
    on(LedgerPageActions.opened, (state, { search }): LedgerState => ({
      balances: loading(state.balances),
      search,
      entries: loading(same(search, state.search) ? state.entries : idle()),
      nextCursor: null,
    })),
    on(LedgerPageActions.moreWanted, (state): LedgerState =>
      state.nextCursor === null ? state : { ...state, entries: loading(state.entries) },
    ),
    on(LedgerApiActions.balancesLoaded, (state, { items }): LedgerState => ({ ...state, balances: loaded(items) })),
    on(LedgerApiActions.balancesFailed, (state, { problem }): LedgerState => ({
      ...state,
      balances: failed(state.balances, problem),
    })),
    on(LedgerApiActions.entriesLoaded, (state, { items, nextCursor, first }): LedgerState => ({
      ...state,
      entries: loaded(first ? items : [...(state.entries.data ?? []), ...items]),
      nextCursor,
    })),
    on(LedgerApiActions.entriesFailed, (state, { problem }): LedgerState => ({
      ...state,
      entries: failed(state.entries, problem),
    })),
  ),
  extraSelectors: ({ selectNextCursor }) => ({
    selectHasMore: createSelector(selectNextCursor, (cursor) => cursor !== null),
  }),
});

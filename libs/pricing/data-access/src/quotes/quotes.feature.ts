import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { QuoteDetail, QuoteListItem } from '@seamwright/pricing/contracts';
import type { QuoteState } from '@seamwright/pricing/domain';
import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { NewQuotePageActions, QuoteListPageActions, QuotePageActions, QuotesApiActions } from './quotes.actions';

/** What was asked of the server and how it went; a refusal stays until the next try. */
export interface Deed {
  readonly running: boolean;
  readonly problem: Problem | null;
}

export interface QuotesState {
  /** The state that the list shows; null for all. */
  readonly shown: QuoteState | null;
  readonly list: Remote<readonly QuoteListItem[]>;
  readonly nextCursor: string | null;
  readonly quoteId: string | null;
  readonly quote: Remote<QuoteDetail>;
  readonly deed: Deed;
  readonly saving: Deed;
}

const still: Deed = { running: false, problem: null };
const running: Deed = { running: true, problem: null };

const initial: QuotesState = {
  shown: null,
  list: idle(),
  nextCursor: null,
  quoteId: null,
  quote: idle(),
  deed: still,
  saving: still,
};

/** A changed quote in its place in the list. */
const replaced = (list: Remote<readonly QuoteListItem[]>, quote: QuoteDetail): Remote<readonly QuoteListItem[]> => ({
  ...list,
  data:
    list.data?.map((item) =>
      item.id === quote.id
        ? {
            ...item,
            state: quote.state,
            rowVersion: quote.rowVersion,
            sentAt: quote.sentAt,
            decidedAt: quote.decidedAt,
          }
        : item,
    ) ?? null,
});

export const quotesFeature = createFeature({
  name: 'quotes',
  reducer: createReducer(
    initial,
    on(QuoteListPageActions.opened, (state, { state: shown }): QuotesState => ({
      ...state,
      shown,
      list: loading(shown === state.shown ? state.list : idle()),
      nextCursor: null,
    })),
    on(QuoteListPageActions.moreWanted, (state): QuotesState =>
      state.nextCursor === null ? state : { ...state, list: loading(state.list) },
    ),
    on(QuotesApiActions.listLoaded, (state, { items, nextCursor, first }): QuotesState => ({
      ...state,
      list: loaded(first ? items : [...(state.list.data ?? []), ...items]),
      nextCursor,
    })),
    on(QuotesApiActions.listFailed, (state, { problem }): QuotesState => ({
      ...state,
      list: failed(state.list, problem),
    })),
    on(QuotePageActions.opened, (state, { quoteId }): QuotesState => ({
      ...state,
      quoteId,
      quote: loading(state.quoteId === quoteId ? state.quote : idle()),
      deed: still,
    })),
    on(QuotesApiActions.loaded, (state, { quote }): QuotesState => ({
      ...state,
      quote: quote.id === state.quoteId ? loaded(quote) : state.quote,
      list: replaced(state.list, quote),
    })),
    on(QuotesApiActions.failed, (state, { problem }): QuotesState => ({
      ...state,
      quote: failed(state.quote, problem),
    })),
    on(QuotePageActions.deedPressed, (state): QuotesState => ({ ...state, deed: running })),
    on(QuotesApiActions.deedDone, (state, { quote }): QuotesState => ({
      ...state,
      quote: quote.id === state.quoteId ? loaded(quote) : state.quote,
      list: replaced(state.list, quote),
      deed: still,
    })),
    on(QuotesApiActions.deedFailed, (state, { problem }): QuotesState => ({
      ...state,
      deed: { running: false, problem },
    })),
    on(NewQuotePageActions.opened, (state): QuotesState => ({ ...state, saving: still })),
    on(NewQuotePageActions.savePressed, (state): QuotesState => ({ ...state, saving: running })),
    on(QuotesApiActions.saved, (state, { quote }): QuotesState => ({
      ...state,
      saving: still,
      quoteId: quote.id,
      quote: loaded(quote),
    })),
    on(QuotesApiActions.saveFailed, (state, { problem }): QuotesState => ({
      ...state,
      saving: { running: false, problem },
    })),
  ),
  extraSelectors: ({ selectNextCursor }) => ({
    selectHasMore: createSelector(selectNextCursor, (cursor) => cursor !== null),
  }),
});

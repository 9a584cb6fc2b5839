import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { CatalogueListApiActions, CatalogueListPageActions } from './catalogue-list.actions';
import type { CatalogueFilters, FoundPage } from './catalogue-list.state';

interface CatalogueListState {
  readonly filters: CatalogueFilters;
  readonly found: Remote<FoundPage>;
  readonly loadingMore: boolean;
}

const initial: CatalogueListState = { filters: {}, found: idle(), loadingMore: false };

const reducer = createReducer<CatalogueListState>(
  initial,
  on(CatalogueListPageActions.searchAsked, (state, { filters }) => ({
    filters,
    found: loading(state.found),
    loadingMore: false,
  })),
  on(CatalogueListPageActions.tryAgainAsked, (state) => ({ ...state, found: loading(state.found) })),
  on(CatalogueListPageActions.moreAsked, (state) => ({ ...state, loadingMore: true })),
  on(CatalogueListApiActions.found, (state, { page }) => ({ ...state, found: loaded(page) })),
  on(CatalogueListApiActions.moreFound, (state, { page }) => ({
    ...state,
    loadingMore: false,
    found: loaded({ ...page, items: [...(state.found.data?.items ?? []), ...page.items] }),
  })),
  on(CatalogueListApiActions.searchFailed, (state, { problem }) => ({
    ...state,
    loadingMore: false,
    found: failed(state.found, problem),
  })),
);

/** The catalogue as the buyer has narrowed it. */
export const catalogueListFeature = createFeature({
  name: 'catalogueList',
  reducer,
  extraSelectors: ({ selectFound }) => ({
    selectCards: createSelector(selectFound, ({ data }) => data?.items ?? []),
    selectCounts: createSelector(selectFound, ({ data }) => data?.counts ?? null),
    selectHasMore: createSelector(selectFound, ({ data }) => (data?.nextCursor ?? null) !== null),
  }),
});

import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { PriceList, PriceListLine } from '@seamwright/pricing/contracts';
import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import {
  PriceListPageActions,
  PriceListsApiActions,
  PriceListsPageActions,
  type ListSearch,
} from './price-lists.actions';

export interface PriceListsState {
  readonly search: ListSearch;
  readonly lists: Remote<readonly PriceList[]>;
  readonly listsCursor: string | null;
  readonly priceListId: string | null;
  readonly list: Remote<PriceList>;
  readonly lineSearch: string;
  readonly lines: Remote<readonly PriceListLine[]>;
  readonly linesCursor: string | null;
  readonly setting: { readonly running: boolean; readonly problem: Problem | null };
}

const still = { running: false, problem: null };

const initial: PriceListsState = {
  search: { level: null, q: '' },
  lists: idle(),
  listsCursor: null,
  priceListId: null,
  list: idle(),
  lineSearch: '',
  lines: idle(),
  linesCursor: null,
  setting: still,
};

export const priceListsFeature = createFeature({
  name: 'priceLists',
  reducer: createReducer(
    initial,
    on(PriceListsPageActions.searched, (state, { search }): PriceListsState => ({
      ...state,
      search,
      lists: loading(state.lists),
      listsCursor: null,
    })),
    on(PriceListsPageActions.moreWanted, (state): PriceListsState =>
      state.listsCursor === null ? state : { ...state, lists: loading(state.lists) },
    ),
    on(PriceListsApiActions.listsLoaded, (state, { items, nextCursor, first }): PriceListsState => ({
      ...state,
      lists: loaded(first ? items : [...(state.lists.data ?? []), ...items]),
      listsCursor: nextCursor,
    })),
    on(PriceListsApiActions.listsFailed, (state, { problem }): PriceListsState => ({
      ...state,
      lists: failed(state.lists, problem),
    })),
    on(PriceListPageActions.opened, (state, { priceListId }): PriceListsState => ({
      ...state,
      priceListId,
      list: loading(idle<PriceList>()),
      lineSearch: '',
      lines: loading(idle<readonly PriceListLine[]>()),
      linesCursor: null,
      setting: still,
    })),
    on(PriceListsApiActions.listLoaded, (state, { list }): PriceListsState => ({ ...state, list: loaded(list) })),
    on(PriceListsApiActions.listFailed, (state, { problem }): PriceListsState => ({
      ...state,
      list: failed(state.list, problem),
    })),
    on(PriceListPageActions.searched, (state, { q }): PriceListsState => ({
      ...state,
      lineSearch: q,
      lines: loading(state.lines),
      linesCursor: null,
    })),
    on(PriceListPageActions.moreWanted, (state): PriceListsState =>
      state.linesCursor === null ? state : { ...state, lines: loading(state.lines) },
    ),
    on(PriceListsApiActions.linesLoaded, (state, { items, nextCursor, first }): PriceListsState => ({
      ...state,
      lines: loaded(first ? items : [...(state.lines.data ?? []), ...items]),
      linesCursor: nextCursor,
    })),
    on(PriceListsApiActions.linesFailed, (state, { problem }): PriceListsState => ({
      ...state,
      lines: failed(state.lines, problem),
    })),
    on(PriceListPageActions.editOpened, (state): PriceListsState => ({ ...state, setting: still })),
    on(PriceListPageActions.priceSet, (state): PriceListsState => ({
      ...state,
      setting: { running: true, problem: null },
    })),
    on(PriceListsApiActions.priceChanged, (state): PriceListsState => ({ ...state, setting: still })),
    on(PriceListsApiActions.priceRefused, (state, { problem }): PriceListsState => ({
      ...state,
      setting: { running: false, problem },
    })),
  ),
  extraSelectors: ({ selectListsCursor, selectLinesCursor }) => ({
    selectMoreLists: createSelector(selectListsCursor, (cursor) => cursor !== null),
    selectMoreLines: createSelector(selectLinesCursor, (cursor) => cursor !== null),
  }),
});

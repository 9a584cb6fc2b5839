import { createFeature, createReducer, on } from '@ngrx/store';
import type { LotWire } from '@seamwright/stock/contracts';
import type { LotState } from '@seamwright/stock/domain';
import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { LotListPageActions, LotPageActions, LotsApiActions } from './lots.actions';

export interface LotsState {
  /** The state that the list shows; null for all. */
  readonly shown: LotState | null;
  readonly list: Remote<readonly LotWire[]>;
  readonly nextCursor: string | null;
  readonly lotId: string | null;
  readonly lot: Remote<LotWire>;
  readonly move: { readonly running: boolean; readonly problem: Problem | null };
}

const initial: LotsState = {
  shown: null,
  list: idle(),
  nextCursor: null,
  lotId: null,
  lot: idle(),
  move: { running: false, problem: null },
};

export const lotsFeature = createFeature({
  name: 'lots',
  reducer: createReducer(
    initial,
    on(LotListPageActions.opened, (state, { state: shown }): LotsState => ({
      ...state,
      shown,
      list: loading(shown === state.shown ? state.list : idle()),
      nextCursor: null,
    })),
    on(LotListPageActions.moreWanted, (state): LotsState => ({ ...state, list: loading(state.list) })),
    on(LotsApiActions.listLoaded, (state, { items, nextCursor, first }): LotsState => ({
      ...state,
      list: loaded(first ? items : [...(state.list.data ?? []), ...items]),
      nextCursor,
    })),
    on(LotsApiActions.listFailed, (state, { problem }): LotsState => ({ ...state, list: failed(state.list, problem) })),
    on(LotPageActions.opened, (state, { lotId }): LotsState => ({
      ...state,
      lotId,
      lot: loading(state.lotId === lotId ? state.lot : idle()),
      move: initial.move,
    })),
    on(LotsApiActions.loaded, (state, { lot }): LotsState =>
      lot.id === state.lotId ? { ...state, lot: loaded(lot) } : state,
    ),
    on(LotsApiActions.failed, (state, { problem }): LotsState => ({ ...state, lot: failed(state.lot, problem) })),
    on(LotPageActions.holdPressed, LotPageActions.releasePressed, (state): LotsState => ({
      ...state,
      move: { running: true, problem: null },
    })),
    on(LotsApiActions.moved, (state, { lot }): LotsState => ({
      ...state,
      move: initial.move,
      lot: lot.id === state.lotId ? loaded(lot) : state.lot,
      list: { ...state.list, data: state.list.data?.map((each) => (each.id === lot.id ? lot : each)) ?? null },
    })),
    on(LotsApiActions.moveFailed, (state, { problem }): LotsState => ({
      ...state,
      move: { running: false, problem },
    })),
  ),
});

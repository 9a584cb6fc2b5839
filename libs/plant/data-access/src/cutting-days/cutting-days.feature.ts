import { createFeature, createReducer, on } from '@ngrx/store';
import type { CuttingDayWire } from '@seamwright/plant/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { refused, running, still, type Deed } from '../deed';
import {
  CuttingDayListPageActions,
  CuttingDayPageActions,
  CuttingDaysApiActions,
  CuttingDaysLiveActions,
  type DayPapers,
} from './cutting-days.actions';

export interface CuttingDaysState {
  readonly list: Remote<readonly CuttingDayWire[]>;
  readonly nextCursor: string | null;
  readonly deliveryDay: string | null;
  readonly papers: Remote<DayPapers>;
  readonly deed: Deed;
  readonly workbook: Deed;
}

const initial: CuttingDaysState = {
  list: idle(),
  nextCursor: null,
  deliveryDay: null,
  papers: idle(),
  deed: still,
  workbook: still,
};

export const cuttingDaysFeature = createFeature({
  name: 'cuttingDays',
  reducer: createReducer(
    initial,
    on(CuttingDayListPageActions.opened, CuttingDayListPageActions.moreWanted, (state): CuttingDaysState => ({
      ...state,
      list: loading(state.list),
    })),
    on(CuttingDaysApiActions.listLoaded, (state, { items, nextCursor, first }): CuttingDaysState => ({
      ...state,
      list: loaded(first ? items : [...(state.list.data ?? []), ...items]),
      nextCursor,
    })),
    on(CuttingDaysApiActions.listFailed, (state, { problem }): CuttingDaysState => ({
      ...state,
      list: failed(state.list, problem),
    })),
    on(CuttingDayPageActions.opened, (state, { deliveryDay }): CuttingDaysState => ({
      ...state,
      deliveryDay,
      papers: loading(state.deliveryDay === deliveryDay ? state.papers : idle()),
      deed: still,
      workbook: still,
    })),
    on(CuttingDayPageActions.refreshPressed, CuttingDaysLiveActions.changed, (state): CuttingDaysState =>
      state.deliveryDay === null ? state : { ...state, papers: loading(state.papers) },
    ),
    on(CuttingDaysApiActions.papersLoaded, (state, { papers }): CuttingDaysState =>
      papers.day.deliveryDay === state.deliveryDay ? { ...state, papers: loaded(papers) } : state,
    ),
    on(CuttingDaysApiActions.papersFailed, (state, { problem }): CuttingDaysState => ({
      ...state,
      papers: failed(state.papers, problem),
    })),
    on(CuttingDayPageActions.deedPressed, (state): CuttingDaysState => ({ ...state, deed: running })),
    on(CuttingDaysApiActions.deedDone, (state, { day }): CuttingDaysState => ({
      ...state,
      deed: still,
      papers:
        state.papers.data?.day.id === day.id ? { ...state.papers, data: { ...state.papers.data, day } } : state.papers,
    })),
    on(CuttingDaysApiActions.deedFailed, (state, { problem }): CuttingDaysState => ({
      ...state,
      deed: refused(problem),
    })),
    on(CuttingDayPageActions.workbookWanted, (state): CuttingDaysState => ({ ...state, workbook: running })),
    on(CuttingDaysApiActions.workbookSaved, (state): CuttingDaysState => ({ ...state, workbook: still })),
    on(CuttingDaysApiActions.workbookFailed, (state, { problem }): CuttingDaysState => ({
      ...state,
      workbook: refused(problem),
    })),
  ),
});

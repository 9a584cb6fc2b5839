import { createFeature, createReducer, on } from '@ngrx/store';
import type { ReconciliationWire } from '@seamwright/accounts/contracts';
import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { ReconciliationApiActions, ReconciliationPageActions } from './reconciliation.actions';

export interface ReconciliationState {
  readonly day: string | null;
  readonly week: Remote<ReconciliationWire>;
  /** The processor is being asked for what it has not told yet. */
  readonly asking: { readonly running: boolean; readonly problem: Problem | null };
}

const still = { running: false, problem: null };

const initial: ReconciliationState = { day: null, week: idle(), asking: still };

/** A week of card money, from the cards to the bank. */
export const reconciliationFeature = createFeature({
  name: 'reconciliation',
  reducer: createReducer(
    initial,
    on(ReconciliationPageActions.opened, (state, { day }): ReconciliationState => ({
      day,
      week: loading(day === state.day ? state.week : idle()),
      asking: still,
    })),
    on(ReconciliationApiActions.loaded, (state, { week }): ReconciliationState => ({ ...state, week: loaded(week) })),
    on(ReconciliationApiActions.failed, (state, { problem }): ReconciliationState => ({
      ...state,
      week: failed(state.week, problem),
    })),
    on(ReconciliationPageActions.processorAsked, (state): ReconciliationState => ({
      ...state,
      asking: { running: true, problem: null },
    })),
    on(ReconciliationApiActions.processorAnswered, (state): ReconciliationState => ({ ...state, asking: still })),
    on(ReconciliationApiActions.processorFailed, (state, { problem }): ReconciliationState => ({
      ...state,
      asking: { running: false, problem },
    })),
  ),
});

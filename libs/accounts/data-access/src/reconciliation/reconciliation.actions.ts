import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { ReconciliationWire } from '@seamwright/accounts/contracts';
import type { Problem } from '@seamwright/shared/contracts';

export const ReconciliationPageActions = createActionGroup({
  source: 'Reconciliation Page',
  events: {
    /** Any day of the week, or null for this week. */
    Opened: props<{ day: string | null }>(),
    'Processor Asked': emptyProps(),
    'Statement Taken': emptyProps(),
  },
});

export const ReconciliationApiActions = createActionGroup({
  source: 'Reconciliation API',
  events: {
    Loaded: props<{ week: ReconciliationWire }>(),
    Failed: props<{ problem: Problem }>(),
    'Processor Answered': props<{ transactions: number; payouts: number }>(),
    'Processor Failed': props<{ problem: Problem }>(),
  },
});

export const ReconciliationLiveActions = createActionGroup({
  source: 'Reconciliation Live',
  events: { Changed: emptyProps() },
});

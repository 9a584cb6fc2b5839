import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { LotWire } from '@seamwright/stock/contracts';
import type { LotState } from '@seamwright/stock/domain';
import type { Problem } from '@seamwright/shared/contracts';

export const LotListPageActions = createActionGroup({
  source: 'Lot List Page',
  events: { Opened: props<{ state: LotState | null }>(), 'More Wanted': emptyProps() },
});

export const LotPageActions = createActionGroup({
  source: 'Lot Page',
  events: {
    Opened: props<{ lotId: string }>(),
    'Hold Pressed': props<{ lotId: string; rowVersion: number; reason: string }>(),
    'Release Pressed': props<{ lotId: string; rowVersion: number }>(),
  },
});

export const LotsApiActions = createActionGroup({
  source: 'Lots API',
  events: {
    'List Loaded': props<{ items: LotWire[]; nextCursor: string | null; first: boolean }>(),
    'List Failed': props<{ problem: Problem }>(),
    Loaded: props<{ lot: LotWire }>(),
    Failed: props<{ problem: Problem }>(),
    Moved: props<{ lot: LotWire }>(),
    'Move Failed': props<{ problem: Problem }>(),
  },
});

export const LotsLiveActions = createActionGroup({
  source: 'Lots Live',
  events: { Changed: emptyProps() },
});

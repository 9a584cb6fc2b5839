import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { CuttingDayWire, CuttingListWire, PullListWire } from '@seamwright/plant/contracts';
import type { Problem } from '@seamwright/shared/contracts';

/** How a planner moves a day; each is guarded by the row version that was read. */
export type DayDeed = 'close' | 'release' | 'finish';

/** Everything that a day's page shows. */
export interface DayPapers {
  readonly day: CuttingDayWire;
  readonly cutting: CuttingListWire;
  readonly pull: PullListWire;
}

export const CuttingDayListPageActions = createActionGroup({
  source: 'Cutting Day List Page',
  events: { Opened: emptyProps(), 'More Wanted': emptyProps() },
});

export const CuttingDayPageActions = createActionGroup({
  source: 'Cutting Day Page',
  events: {
    Opened: props<{ deliveryDay: string }>(),
    'Refresh Pressed': emptyProps(),
    'Deed Pressed': props<{ deed: DayDeed; deliveryDay: string; rowVersion: number }>(),
    'Workbook Wanted': props<{ deliveryDay: string }>(),
  },
});

export const CuttingDaysApiActions = createActionGroup({
  source: 'Cutting Days API',
  events: {
    'List Loaded': props<{ items: CuttingDayWire[]; nextCursor: string | null; first: boolean }>(),
    'List Failed': props<{ problem: Problem }>(),
    'Papers Loaded': props<{ papers: DayPapers }>(),
    'Papers Failed': props<{ problem: Problem }>(),
    'Deed Done': props<{ deed: DayDeed; day: CuttingDayWire }>(),
    'Deed Failed': props<{ problem: Problem }>(),
    'Workbook Saved': emptyProps(),
    'Workbook Failed': props<{ problem: Problem }>(),
  },
});

export const CuttingDaysLiveActions = createActionGroup({
  source: 'Cutting Days Live',
  events: { Changed: emptyProps() },
});

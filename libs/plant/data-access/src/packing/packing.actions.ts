import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { CuttingDayWire, PackingOrderWire } from '@seamwright/plant/contracts';
import type { CuttingDayState } from '@seamwright/plant/domain';
import type { Problem } from '@seamwright/shared/contracts';

export interface WeighedPack {
  readonly orderLineId: string;
  readonly lotId: string;
  readonly pieces: number;
  readonly grossGrams: number;
  readonly tareGrams: number;
  readonly reason: string | null;
}

export type PackingDeed = 'pack' | 'void' | 'short' | 'finish';

export const ScaleOrdersPageActions = createActionGroup({
  source: 'Scale Orders Page',
  events: { Opened: emptyProps(), 'Day Chosen': props<{ deliveryDay: string }>() },
});

export const ScalePageActions = createActionGroup({
  source: 'Scale Page',
  events: {
    Opened: props<{ deliveryDay: string }>(),
    /** The same key is sent again when the same pack is sent again. */
    'Pack Weighed': props<{ orderId: string; pack: WeighedPack; idempotencyKey: string }>(),
    'Pack Taken Back': props<{ orderId: string; packId: string }>(),
    'Short Marked': props<{ orderId: string; lineId: string; shortPieces: number; reason: string }>(),
    'Finish Pressed': props<{ orderId: string }>(),
  },
});

export const PackingApiActions = createActionGroup({
  source: 'Packing API',
  events: {
    'Days Loaded': props<{ days: CuttingDayWire[] }>(),
    'Orders Loaded': props<{ deliveryDay: string; state: CuttingDayState; orders: PackingOrderWire[] }>(),
    Failed: props<{ problem: Problem }>(),
    'Deed Done': props<{ deed: PackingDeed; order: PackingOrderWire }>(),
    'Deed Failed': props<{ deed: PackingDeed; problem: Problem }>(),
  },
});

export const PackingLiveActions = createActionGroup({
  source: 'Packing Live',
  events: { Changed: emptyProps() },
});

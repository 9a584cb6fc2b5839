import { createActionGroup, emptyProps, props } from '@ngrx/store';
import { newId } from '@seamwright/shared/util';
import type { BasketDetails, BasketDraft, BasketLine } from './basket-draft';

/** Each of these makes another basket, which is another deed: it comes with a key of its own. */
export const BasketActions = createActionGroup({
  source: 'Basket',
  events: {
    'Line Added': (line: Omit<BasketLine, 'id'>) => ({ line: { ...line, id: newId<'BasketLine'>() }, key: newId() }),
    'Line Changed': (lineId: string, change: Partial<Pick<BasketLine, 'quantity' | 'whenShort' | 'note'>>) => ({
      lineId,
      change,
      key: newId(),
    }),
    'Line Removed': (lineId: string) => ({ lineId, key: newId() }),
    'Line Put Back': (line: BasketLine, at: number) => ({ line, at, key: newId() }),
    'Details Changed': (details: Partial<BasketDetails>) => ({ details, key: newId() }),
    Emptied: () => ({ key: newId() }),
  },
});

export const BasketStorageActions = createActionGroup({
  source: 'Basket Storage',
  events: {
    /** Somebody is signed in, and this is the basket that the device keeps for them. */
    Restored: props<{ owner: string; draft: BasketDraft }>(),
    /** Nobody is signed in any more; what the device keeps stays there. */
    'Put Away': emptyProps(),
  },
});

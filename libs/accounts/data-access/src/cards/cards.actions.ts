import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { CardWire } from '@seamwright/accounts/contracts';
import type { Problem } from '@seamwright/shared/contracts';

/** How cards are entered; the key is the one that the processor's form may show. */
export interface CardEntry {
  readonly mode: 'demo' | 'live';
  readonly publishableKey: string | null;
}

export const CardsPageActions = createActionGroup({
  source: 'Cards Page',
  events: {
    Opened: emptyProps(),
    'Add Opened': emptyProps(),
    /** The same key keeps the card once, however often it is sent. */
    Added: props<{ methodId: string; idempotencyKey: string }>(),
    Removed: props<{ cardId: string }>(),
  },
});

export const CardsApiActions = createActionGroup({
  source: 'Cards API',
  events: {
    Loaded: props<{ items: CardWire[] }>(),
    Failed: props<{ problem: Problem }>(),
    'Entry Loaded': props<{ entry: CardEntry }>(),
    'Entry Failed': props<{ problem: Problem }>(),
    Kept: props<{ card: CardWire }>(),
    'Keep Failed': props<{ problem: Problem }>(),
    Forgotten: props<{ cardId: string }>(),
    'Forget Failed': props<{ problem: Problem }>(),
  },
});

import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { NewQuoteWire, QuoteDetail, QuoteListItem } from '@seamwright/pricing/contracts';
import type { QuoteState } from '@seamwright/pricing/domain';
import type { Problem } from '@seamwright/shared/contracts';

/** What can be done with a quote that exists; each is guarded by the row version that was read. */
export type QuoteDeed = 'send' | 'accept' | 'decline';

export const QuoteListPageActions = createActionGroup({
  source: 'Quote List Page',
  events: {
    Opened: props<{ state: QuoteState | null }>(),
    'More Wanted': emptyProps(),
  },
});

export const QuotePageActions = createActionGroup({
  source: 'Quote Page',
  events: {
    Opened: props<{ quoteId: string }>(),
    'Deed Pressed': props<{ deed: QuoteDeed; quoteId: string; rowVersion: number }>(),
  },
});

export const NewQuotePageActions = createActionGroup({
  source: 'New Quote Page',
  events: {
    Opened: emptyProps(),
    /** The same key is sent again when the same quote is saved again. */
    'Save Pressed': props<{ quote: NewQuoteWire; idempotencyKey: string }>(),
  },
});

export const QuotesApiActions = createActionGroup({
  source: 'Quotes API',
  events: {
    'List Loaded': props<{ items: QuoteListItem[]; nextCursor: string | null; first: boolean }>(),
    'List Failed': props<{ problem: Problem }>(),
    Loaded: props<{ quote: QuoteDetail }>(),
    Failed: props<{ problem: Problem }>(),
    'Deed Done': props<{ deed: QuoteDeed; quote: QuoteDetail }>(),
    'Deed Failed': props<{ problem: Problem }>(),
    Saved: props<{ quote: QuoteDetail }>(),
    'Save Failed': props<{ problem: Problem }>(),
  },
});

export const QuotesLiveActions = createActionGroup({
  source: 'Quotes Live',
  events: {
    /** A quote changed elsewhere; an empty id means any may have. */
    Changed: props<{ quoteId: string }>(),
  },
});

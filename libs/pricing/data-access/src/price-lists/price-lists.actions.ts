import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { PriceList, PriceListLine } from '@seamwright/pricing/contracts';
import type { PriceBreak, PriceLevel } from '@seamwright/pricing/domain';
import type { Problem } from '@seamwright/shared/contracts';

/** What a rep looks for; empty words mean all. */
export interface ListSearch {
  readonly level: PriceLevel | null;
  readonly q: string;
}

export interface PriceChange {
  readonly from: string;
  readonly priceMinor: number;
  readonly breaks: readonly PriceBreak[];
}

export const PriceListsPageActions = createActionGroup({
  source: 'Price Lists Page',
  events: {
    Searched: props<{ search: ListSearch }>(),
    'More Wanted': emptyProps(),
  },
});

export const PriceListPageActions = createActionGroup({
  source: 'Price List Page',
  events: {
    Opened: props<{ priceListId: string }>(),
    Searched: props<{ q: string }>(),
    'More Wanted': emptyProps(),
    'Edit Opened': emptyProps(),
    'Price Set': props<{ line: PriceListLine; change: PriceChange }>(),
  },
});

export const PriceListsApiActions = createActionGroup({
  source: 'Price Lists API',
  events: {
    'Lists Loaded': props<{ items: PriceList[]; nextCursor: string | null; first: boolean }>(),
    'Lists Failed': props<{ problem: Problem }>(),
    'List Loaded': props<{ list: PriceList }>(),
    'List Failed': props<{ problem: Problem }>(),
    'Lines Loaded': props<{ items: PriceListLine[]; nextCursor: string | null; first: boolean }>(),
    'Lines Failed': props<{ problem: Problem }>(),
    'Price Changed': props<{ line: PriceListLine }>(),
    'Price Refused': props<{ problem: Problem }>(),
  },
});

import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { Problem } from '@seamwright/shared/contracts';
import type { CatalogueFilters, FoundPage } from './catalogue-list.state';

/** What the buyer does on the catalogue page. */
export const CatalogueListPageActions = createActionGroup({
  source: 'Catalogue page',
  events: {
    'Search asked': props<{ filters: CatalogueFilters }>(),
    'More asked': emptyProps(),
    'Try again asked': emptyProps(),
  },
});

/** What the server answers. */
export const CatalogueListApiActions = createActionGroup({
  source: 'Catalogue API',
  events: {
    Found: props<{ page: FoundPage }>(),
    'More found': props<{ page: FoundPage }>(),
    'Search failed': props<{ problem: Problem }>(),
  },
});

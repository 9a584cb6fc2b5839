import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { PublicSpecification } from '@seamwright/catalogue/contracts';
import type { Problem } from '@seamwright/shared/contracts';

/** What the buyer does on a specification's page. */
export const SpecificationPageActions = createActionGroup({
  source: 'Specification page',
  events: {
    Opened: props<{ code: string }>(),
    'Value chosen': props<{ choice: string; value: string }>(),
    'Try again asked': emptyProps(),
  },
});

/** What the server answers. */
export const SpecificationApiActions = createActionGroup({
  source: 'Specification API',
  events: {
    Loaded: props<{ specification: PublicSpecification }>(),
    'Load failed': props<{ problem: Problem }>(),
  },
});

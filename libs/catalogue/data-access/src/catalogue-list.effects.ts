import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { catchError, exhaustMap, map, of, switchMap, takeUntil } from 'rxjs';
import { searchSpecifications } from '@seamwright/catalogue/contracts';
import { ApiClient, asProblem } from '@seamwright/shared/data-access';
import { CatalogueListApiActions, CatalogueListPageActions } from './catalogue-list.actions';
import { catalogueListFeature } from './catalogue-list.feature';

const searchFailed = (error: unknown) => of(CatalogueListApiActions.searchFailed({ problem: asProblem(error) }));

/** The latest search wins. */
export const search = createEffect(
  (actions = inject(Actions), api = inject(ApiClient), store = inject(Store)) =>
    actions.pipe(
      ofType(CatalogueListPageActions.searchAsked, CatalogueListPageActions.tryAgainAsked),
      concatLatestFrom(() => store.select(catalogueListFeature.selectFilters)),
      switchMap(([, filters]) =>
        api.call(searchSpecifications, { query: { ...filters } }).pipe(
          map((page) => CatalogueListApiActions.found({ page })),
          catchError(searchFailed),
        ),
      ),
    ),
  { functional: true },
);

/** The next page; a new search makes it void. */
export const searchMore = createEffect(
  (actions = inject(Actions), api = inject(ApiClient), store = inject(Store)) =>
    actions.pipe(
      ofType(CatalogueListPageActions.moreAsked),
      concatLatestFrom(() => store.select(catalogueListFeature.selectCatalogueListState)),
      exhaustMap(([, { filters, found }]) =>
        api.call(searchSpecifications, { query: { ...filters, cursor: found.data?.nextCursor ?? undefined } }).pipe(
          map((page) => CatalogueListApiActions.moreFound({ page })),
          catchError(searchFailed),
          takeUntil(actions.pipe(ofType(CatalogueListPageActions.searchAsked))),
        ),
      ),
    ),
  { functional: true },
);

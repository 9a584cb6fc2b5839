import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { catchError, map, of, switchMap } from 'rxjs';
import { getSpecification } from '@seamwright/catalogue/contracts';
import { ApiClient, asProblem } from '@seamwright/shared/data-access';
import { SpecificationApiActions, SpecificationPageActions } from './specification.actions';
import { specificationFeature } from './specification.feature';

/** The specification opened last wins. */
export const loadSpecification = createEffect(
  (actions = inject(Actions), api = inject(ApiClient), store = inject(Store)) =>
    actions.pipe(
      ofType(SpecificationPageActions.opened, SpecificationPageActions.tryAgainAsked),
      concatLatestFrom(() => store.select(specificationFeature.selectCode)),
      switchMap(([, code]) =>
        api.call(getSpecification, { params: { code } }).pipe(
          map((specification) => SpecificationApiActions.loaded({ specification })),
          catchError((error: unknown) => of(SpecificationApiActions.loadFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

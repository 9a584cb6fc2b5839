import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { catchError, concatMap, exhaustMap, map, of, switchMap } from 'rxjs';
import { addCard, cardSettings, listCards, removeCard } from '@seamwright/accounts/contracts';
import { ApiClient, asProblem } from '@seamwright/shared/data-access';
import { CardsApiActions, CardsPageActions } from './cards.actions';

/** A card whose keeping had no answer yet comes with the list later. */
const load = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CardsPageActions.opened),
      switchMap(() =>
        api.call(listCards, {}).pipe(
          map(({ items }) => CardsApiActions.loaded({ items })),
          catchError((error: unknown) => of(CardsApiActions.failed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const loadEntry = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CardsPageActions.opened),
      switchMap(() =>
        api.call(cardSettings, {}).pipe(
          map((entry) => CardsApiActions.entryLoaded({ entry })),
          catchError((error: unknown) => of(CardsApiActions.entryFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const add = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CardsPageActions.added),
      exhaustMap(({ methodId, idempotencyKey }) =>
        api.call(addCard, { body: { methodId }, idempotencyKey }).pipe(
          map((card) => CardsApiActions.kept({ card })),
          catchError((error: unknown) => of(CardsApiActions.keepFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const remove = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(CardsPageActions.removed),
      concatMap(({ cardId }) =>
        api.call(removeCard, { params: { cardId } }).pipe(
          map(() => CardsApiActions.forgotten({ cardId })),
          catchError((error: unknown) => of(CardsApiActions.forgetFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

export const cardsEffects = { load, loadEntry, add, remove };

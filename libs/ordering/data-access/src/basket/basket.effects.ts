import { inject } from '@angular/core';
import { createEffect } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { distinctUntilChanged, filter, map, of, retry, switchMap, tap } from 'rxjs';
import { selectPerson } from '@seamwright/identity/data-access/session';
import { BasketStorageActions } from './basket.actions';
import { BasketStorage } from './basket-storage';
import { basketFeature } from './basket.feature';

/** How long until a basket is read again whose shape could not be loaded. */
const RETRY_MS = 3_000;

/** Brings a person's basket back when they sign in, and what another tab does to it meanwhile. */
const restore = createEffect(
  (store = inject(Store), storage = inject(BasketStorage)) =>
    store.select(selectPerson).pipe(
      map((person) => person?.id ?? null),
      distinctUntilChanged(),
      switchMap((owner) =>
        owner === null
          ? of(BasketStorageActions.putAway())
          : storage.baskets(owner).pipe(
              retry({ delay: RETRY_MS }),
              map((draft) => BasketStorageActions.restored({ owner, draft })),
            ),
      ),
    ),
  { functional: true },
);

const keep = createEffect(
  (store = inject(Store), storage = inject(BasketStorage)) =>
    store.select(basketFeature.selectBasketState).pipe(
      filter(({ owner }) => owner !== null),
      tap(({ owner, draft }) => storage.write(owner ?? '', draft)),
    ),
  { functional: true, dispatch: false },
);

export const basketEffects = { restore, keep };

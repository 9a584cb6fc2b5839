import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { catchError, concat, debounceTime, EMPTY, exhaustMap, filter, map, mergeWith, of, skip, switchMap } from 'rxjs';
import { asProblem } from '@seamwright/shared/data-access';
import { PriceChecks } from '@seamwright/pricing/data-access';
import { BasketActions, BasketStorageActions } from '../basket/basket.actions';
import { basketFeature } from '../basket/basket.feature';
import { DeliveryDays } from '../delivery-days';
import { OrderPlacing } from '../order-placing';
import { BasketPageActions, CheckoutApiActions } from './checkout.actions';
import { checkoutFeature } from './checkout.feature';

/** How long a buyer may go on pressing before the desk is asked. */
const PAUSE_MS = 300;

/** Days are those on which the slowest line can be ready: they are asked for again when that changes. */
const loadDays = createEffect(
  (actions = inject(Actions), store = inject(Store), days = inject(DeliveryDays)) =>
    actions.pipe(
      ofType(
        BasketPageActions.opened,
        BasketPageActions.tryAgainPressed,
        // Refused: a cut-off may have passed, or a price moved, since the page was opened.
        CheckoutApiActions.placeFailed,
        BasketActions.detailsChanged,
      ),
      filter((action) => action.type !== BasketActions.detailsChanged.type || action.details.siteId !== undefined),
      map(() => null),
      mergeWith(
        store.select(checkoutFeature.selectLeadDays).pipe(
          skip(1),
          map(() => null),
        ),
      ),
      concatLatestFrom(() => [store.select(basketFeature.selectDraft), store.select(checkoutFeature.selectLeadDays)]),
      switchMap(([, { siteId }, leadDays]) =>
        days.next({ ...(siteId === null ? {} : { siteId }), leadDays }).pipe(
          // A site that was taken from her, or is no more, must not stop her: the usual one is offered instead.
          catchError((error: unknown) => {
            if (siteId === null || asProblem(error).code !== 'not-found') throw error;
            return days.next({ leadDays });
          }),
          map((answer) => CheckoutApiActions.daysLoaded({ days: answer })),
          catchError((error: unknown) => of(CheckoutApiActions.daysFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

/** Whatever changes what is ordered or when, asks for the prices of the whole basket once it has settled. */
const checkPrices = createEffect(
  (actions = inject(Actions), store = inject(Store), checks = inject(PriceChecks)) =>
    actions.pipe(
      ofType(
        CheckoutApiActions.daysLoaded,
        BasketStorageActions.restored,
        BasketActions.lineAdded,
        BasketActions.lineChanged,
        BasketActions.lineRemoved,
        BasketActions.linePutBack,
        BasketActions.detailsChanged,
      ),
      debounceTime(PAUSE_MS),
      concatLatestFrom(() => [
        store.select(basketFeature.selectLines),
        store.select(checkoutFeature.selectDeliveryDay),
      ]),
      switchMap(([, lines, deliveryDay]) => {
        if (deliveryDay === null || lines.length === 0) return EMPTY;
        const asked = lines.map(({ specificationId, chosen, quantity }) => ({ specificationId, chosen, quantity }));
        const lineIds = lines.map(({ id }) => id);
        return concat(
          of(CheckoutApiActions.pricesAsked()),
          checks.check({ deliveryDay, lines: asked }).pipe(
            map((prices) => CheckoutApiActions.pricesLoaded({ prices, lineIds })),
            catchError((error: unknown) => of(CheckoutApiActions.pricesFailed({ problem: asProblem(error) }))),
          ),
        );
      }),
    ),
  { functional: true },
);

/** The key belongs to the basket as it is: pressing again after a lost answer is the same deed. */
const place = createEffect(
  (actions = inject(Actions), store = inject(Store), placing = inject(OrderPlacing)) =>
    actions.pipe(
      ofType(BasketPageActions.placePressed),
      concatLatestFrom(() => [store.select(checkoutFeature.selectOrder), store.select(basketFeature.selectDraft)]),
      exhaustMap(([, order, { key }]) =>
        order === null
          ? EMPTY
          : placing.place(order, key).pipe(
              map((placed) => CheckoutApiActions.placed({ order: placed })),
              catchError((error: unknown) => of(CheckoutApiActions.placeFailed({ problem: asProblem(error) }))),
            ),
      ),
    ),
  { functional: true },
);

const emptyBasket = createEffect(
  (actions = inject(Actions)) =>
    actions.pipe(
      ofType(CheckoutApiActions.placed),
      map(() => BasketActions.emptied()),
    ),
  { functional: true },
);

export const checkoutEffects = { loadDays, checkPrices, place, emptyBasket };

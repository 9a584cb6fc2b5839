import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { catchError, exhaustMap, filter, map, of, switchMap } from 'rxjs';
import { getPriceList, listPriceLines, listPriceLists, setPriceLine } from '@seamwright/pricing/contracts';
import { ApiClient, asProblem } from '@seamwright/shared/data-access';
import {
  PriceListPageActions,
  PriceListsApiActions,
  PriceListsPageActions,
  type ListSearch,
} from './price-lists.actions';
import { priceListsFeature } from './price-lists.feature';

function listsPage(api: ApiClient, { level, q }: ListSearch, cursor: string | null) {
  const query = {
    ...(level === null ? {} : { level }),
    ...(q === '' ? {} : { q }),
    ...(cursor === null ? {} : { cursor }),
  };
  return api.call(listPriceLists, { query }).pipe(
    map(({ items, nextCursor }) => PriceListsApiActions.listsLoaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(PriceListsApiActions.listsFailed({ problem: asProblem(error) }))),
  );
}

function linesPage(api: ApiClient, priceListId: string, q: string, cursor: string | null) {
  const query = { ...(q === '' ? {} : { q }), ...(cursor === null ? {} : { cursor }) };
  return api.call(listPriceLines, { params: { priceListId }, query }).pipe(
    map(({ items, nextCursor }) => PriceListsApiActions.linesLoaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(PriceListsApiActions.linesFailed({ problem: asProblem(error) }))),
  );
}

const loadLists = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PriceListsPageActions.searched),
      switchMap(({ search }) => listsPage(api, search, null)),
    ),
  { functional: true },
);

const loadMoreLists = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PriceListsPageActions.moreWanted),
      concatLatestFrom(() => [
        store.select(priceListsFeature.selectSearch),
        store.select(priceListsFeature.selectListsCursor),
      ]),
      filter(([, , cursor]) => cursor !== null),
      exhaustMap(([, search, cursor]) => listsPage(api, search, cursor)),
    ),
  { functional: true },
);

const loadList = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PriceListPageActions.opened),
      switchMap(({ priceListId }) =>
        api.call(getPriceList, { params: { priceListId } }).pipe(
          map((list) => PriceListsApiActions.listLoaded({ list })),
          catchError((error: unknown) => of(PriceListsApiActions.listFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

/** A changed price may split a line in two, so the lines are fetched anew. */
const loadLines = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PriceListPageActions.opened, PriceListPageActions.searched, PriceListsApiActions.priceChanged),
      concatLatestFrom(() => [
        store.select(priceListsFeature.selectPriceListId),
        store.select(priceListsFeature.selectLineSearch),
      ]),
      switchMap(([, priceListId, q]) => linesPage(api, priceListId ?? '', q, null)),
    ),
  { functional: true },
);

const loadMoreLines = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PriceListPageActions.moreWanted),
      concatLatestFrom(() => [
        store.select(priceListsFeature.selectPriceListId),
        store.select(priceListsFeature.selectLineSearch),
        store.select(priceListsFeature.selectLinesCursor),
      ]),
      filter(([, , , cursor]) => cursor !== null),
      exhaustMap(([, priceListId, q, cursor]) => linesPage(api, priceListId ?? '', q, cursor)),
    ),
  { functional: true },
);

const setPrice = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(PriceListPageActions.priceSet),
      exhaustMap(({ line, change: { from, priceMinor, breaks } }) =>
        api
          .call(setPriceLine, {
            params: { priceLineId: line.id },
            ifMatch: line.rowVersion,
            body: { from, priceMinor, breaks: [...breaks] },
          })
          .pipe(
            map((changed) => PriceListsApiActions.priceChanged({ line: changed })),
            catchError((error: unknown) => of(PriceListsApiActions.priceRefused({ problem: asProblem(error) }))),
          ),
      ),
    ),
  { functional: true },
);

export const priceListsEffects = { loadLists, loadMoreLists, loadList, loadLines, loadMoreLines, setPrice };

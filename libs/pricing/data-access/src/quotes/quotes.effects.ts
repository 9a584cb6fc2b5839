import { inject } from '@angular/core';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { concatLatestFrom } from '@ngrx/operators';
import { Store } from '@ngrx/store';
import { catchError, exhaustMap, filter, map, of, switchMap } from 'rxjs';
import { acceptQuote, createQuote, declineQuote, getQuote, listQuotes, sendQuote } from '@seamwright/pricing/contracts';
import type { QuoteState } from '@seamwright/pricing/domain';
import { ApiClient, asProblem, LiveEvents } from '@seamwright/shared/data-access';
import {
  NewQuotePageActions,
  QuoteListPageActions,
  QuotePageActions,
  QuotesApiActions,
  QuotesLiveActions,
  type QuoteDeed,
} from './quotes.actions';
import { quotesFeature } from './quotes.feature';

const ENDPOINTS = { send: sendQuote, accept: acceptQuote, decline: declineQuote } as const satisfies Record<
  QuoteDeed,
  unknown
>;

function page(api: ApiClient, state: QuoteState | null, cursor: string | null) {
  const query = { ...(state === null ? {} : { state }), ...(cursor === null ? {} : { cursor }) };
  return api.call(listQuotes, { query }).pipe(
    map(({ items, nextCursor }) => QuotesApiActions.listLoaded({ items, nextCursor, first: cursor === null })),
    catchError((error: unknown) => of(QuotesApiActions.listFailed({ problem: asProblem(error) }))),
  );
}

const loadList = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(QuoteListPageActions.opened),
      switchMap(({ state }) => page(api, state, null)),
    ),
  { functional: true },
);

const loadMore = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(QuoteListPageActions.moreWanted),
      concatLatestFrom(() => [store.select(quotesFeature.selectShown), store.select(quotesFeature.selectNextCursor)]),
      filter(([, , cursor]) => cursor !== null),
      exhaustMap(([, shown, cursor]) => page(api, shown, cursor)),
    ),
  { functional: true },
);

const loadQuote = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(QuotePageActions.opened),
      switchMap(({ quoteId }) =>
        api.call(getQuote, { params: { quoteId } }).pipe(
          map((quote) => QuotesApiActions.loaded({ quote })),
          catchError((error: unknown) => of(QuotesApiActions.failed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const doDeed = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(QuotePageActions.deedPressed),
      exhaustMap(({ deed, quoteId, rowVersion }) =>
        api.call(ENDPOINTS[deed], { params: { quoteId }, ifMatch: rowVersion }).pipe(
          map((quote) => QuotesApiActions.deedDone({ deed, quote })),
          catchError((error: unknown) => of(QuotesApiActions.deedFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const save = createEffect(
  (actions = inject(Actions), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(NewQuotePageActions.savePressed),
      exhaustMap(({ quote, idempotencyKey }) =>
        api.call(createQuote, { body: quote, idempotencyKey }).pipe(
          map((saved) => QuotesApiActions.saved({ quote: saved })),
          catchError((error: unknown) => of(QuotesApiActions.saveFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

const hearChanges = createEffect(
  (live = inject(LiveEvents)) =>
    live
      .changes('quote-sent', 'quote-accepted', 'quote-declined', 'quote-expired')
      .pipe(map(({ id }) => QuotesLiveActions.changed({ quoteId: id }))),
  { functional: true },
);

/** The open quote is fetched again, without its page turning to "loading". */
const refreshQuote = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(QuotesLiveActions.changed),
      concatLatestFrom(() => store.select(quotesFeature.selectQuoteId)),
      filter(([{ quoteId }, open]) => open !== null && (quoteId === '' || quoteId === open)),
      switchMap(([, open]) =>
        api.call(getQuote, { params: { quoteId: open ?? '' } }).pipe(
          map((quote) => QuotesApiActions.loaded({ quote })),
          catchError((error: unknown) => of(QuotesApiActions.failed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

/** The first page of the list is fetched again once it has been opened. */
const refreshList = createEffect(
  (actions = inject(Actions), store = inject(Store), api = inject(ApiClient)) =>
    actions.pipe(
      ofType(QuotesLiveActions.changed),
      concatLatestFrom(() => [store.select(quotesFeature.selectList), store.select(quotesFeature.selectShown)]),
      filter(([, list]) => list.status !== 'idle'),
      switchMap(([, , shown]) => page(api, shown, null)),
    ),
  { functional: true },
);

export const quotesEffects = { loadList, loadMore, loadQuote, doDeed, save, hearChanges, refreshQuote, refreshList };

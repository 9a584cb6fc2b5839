import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { Subject } from 'rxjs';
import { LiveEvents, type LiveChange } from '@seamwright/shared/data-access';
import { NewQuotePageActions, QuoteListPageActions, QuotePageActions } from './quotes.actions';
import { quotesEffects } from './quotes.effects';
import { quotesFeature } from './quotes.feature';

describe('quotes and the server', () => {
  const live = new Subject<LiveChange>();
  let http: HttpTestingController;
  let store: Store;
  const state = () => store.selectSignal(quotesFeature.selectQuotesState)();

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideStore(),
        provideState(quotesFeature),
        provideEffects(quotesEffects),
        { provide: LiveEvents, useValue: { changes: () => live } },
      ],
    });
    store = TestBed.inject(Store);
    http = TestBed.inject(HttpTestingController);
  });
  afterEach(() => http.verify());

  it('asks for a state, and for the next page where the last one ended', () => {
    store.dispatch(QuoteListPageActions.opened({ state: 'sent' }));
    http.expectOne('/api/v1/quotes?state=sent').flush({ items: [], nextCursor: 'abc' });
    store.dispatch(QuoteListPageActions.moreWanted());
    http.expectOne('/api/v1/quotes?state=sent&cursor=abc').flush({ items: [], nextCursor: null });
    store.dispatch(QuoteListPageActions.moreWanted());
    http.expectNone(() => true);
    expect(state().list.status).toBe('loaded');
  });

  it('sends a deed once, guarded by the version that was read', () => {
    const pressed = QuotePageActions.deedPressed({ deed: 'accept', quoteId: 'q1', rowVersion: 7 });
    store.dispatch(pressed);
    store.dispatch(pressed);
    const sent = http.expectOne('/api/v1/quotes/q1/accept');
    expect(sent.request.headers.get('if-match')).toBe('"7"');
    sent.flush(
      { code: 'stale', type: '', title: '', status: 412, detail: 'Changed.', instance: '' },
      { status: 412, statusText: '' },
    );
    expect(state().deed).toMatchObject({ running: false, problem: { code: 'stale', detail: 'Changed.' } });
    // The stream lives on after a refusal.
    store.dispatch(pressed);
    http.expectOne('/api/v1/quotes/q1/accept').flush({ id: 'q1' });
    expect(state().deed.running).toBe(false);
  });

  it('saves under the key of the draft', () => {
    const quote = { customerId: 'c', pricesFrom: 'x', pricesUntil: 'y', answerBy: 'z', notes: '', lines: [] };
    store.dispatch(NewQuotePageActions.savePressed({ quote, idempotencyKey: 'key-1' }));
    const sent = http.expectOne('/api/v1/quotes');
    expect(sent.request.headers.get('idempotency-key')).toBe('key-1');
    expect(sent.request.body).toEqual(quote);
    sent.flush({ id: 'q9' });
    expect(state().quoteId).toBe('q9');
  });

  it('fetches the open quote again when it changed elsewhere, and not when another did', () => {
    store.dispatch(QuotePageActions.opened({ quoteId: 'q1' }));
    http.expectOne('/api/v1/quotes/q1').flush({ id: 'q1', state: 'sent' });
    live.next({ type: 'quote-accepted', id: 'q2' });
    http.expectNone('/api/v1/quotes/q1');
    live.next({ type: 'quote-accepted', id: 'q1' });
    http.expectOne('/api/v1/quotes/q1').flush({ id: 'q1', state: 'accepted' });
    expect(state().quote.data?.state).toBe('accepted');
  });
});

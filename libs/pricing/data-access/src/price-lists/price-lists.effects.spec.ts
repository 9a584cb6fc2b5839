import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import type { PriceListLine } from '@seamwright/pricing/contracts';
import { PriceListPageActions, PriceListsPageActions } from './price-lists.actions';
import { priceListsEffects } from './price-lists.effects';
import { priceListsFeature } from './price-lists.feature';

const line: PriceListLine = {
  id: 'line-1',
  rowVersion: 4,
  specificationId: 's1',
  code: 'BF-901',
  name: 'Steak',
  choiceKey: null,
  basis: 'kg',
  priceMinor: 2_000,
  validFrom: '2026-01-01',
  validUntil: null,
  quoteNumber: null,
  breaks: [],
};

describe('price lists and the server', () => {
  let http: HttpTestingController;
  let store: Store;
  const state = () => store.selectSignal(priceListsFeature.selectPriceListsState)();

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideStore(),
        provideState(priceListsFeature),
        provideEffects(priceListsEffects),
      ],
    });
    store = TestBed.inject(Store);
    http = TestBed.inject(HttpTestingController);
  });
  afterEach(() => http.verify());

  it('asks only for what the last search wants', () => {
    store.dispatch(PriceListsPageActions.searched({ search: { level: null, q: 'ho' } }));
    const first = http.expectOne('/api/v1/price-lists?q=ho');
    store.dispatch(PriceListsPageActions.searched({ search: { level: 'customer', q: 'hotel' } }));
    expect(first.cancelled).toBe(true);
    http.expectOne('/api/v1/price-lists?level=customer&q=hotel').flush({ items: [], nextCursor: null });
    expect(state().lists).toMatchObject({ status: 'loaded', data: [] });
  });

  it('sets a price guarded by its version, then fetches the lines anew, since a line may have become two', () => {
    store.dispatch(PriceListPageActions.opened({ priceListId: 'p1' }));
    http.expectOne('/api/v1/price-lists/p1').flush({ id: 'p1' });
    http.expectOne('/api/v1/price-lists/p1/lines').flush({ items: [line], nextCursor: null });

    const change = { from: '2026-12-14', priceMinor: 2_100, breaks: [] };
    store.dispatch(PriceListPageActions.priceSet({ line, change }));
    const sent = http.expectOne('/api/v1/price-lines/line-1');
    expect(sent.request.headers.get('if-match')).toBe('"4"');
    expect(sent.request.body).toEqual(change);
    sent.flush({ ...line, id: 'line-2', priceMinor: 2_100 });
    http.expectOne('/api/v1/price-lists/p1/lines').flush({ items: [line, line], nextCursor: null });
    expect(state().lines.data).toHaveLength(2);
    expect(state().setting).toEqual({ running: false, problem: null });
  });

  it('keeps the prices on screen when one is refused', () => {
    store.dispatch(PriceListPageActions.priceSet({ line, change: { from: 'x', priceMinor: 1, breaks: [] } }));
    http.expectOne('/api/v1/price-lines/line-1').flush(null, { status: 500, statusText: 'Oh' });
    expect(state().setting.running).toBe(false);
    expect(state().setting.problem?.code).toBe('unexpected');
  });
});

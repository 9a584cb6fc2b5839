import { TestBed } from '@angular/core/testing';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { CatalogueListPageActions } from './catalogue-list.actions';
import * as effects from './catalogue-list.effects';
import { catalogueListFeature } from './catalogue-list.feature';
import type { FoundPage } from './catalogue-list.state';

const page = (codes: string[], nextCursor: string | null = null): FoundPage => ({
  items: codes.map((code) => ({ code }) as FoundPage['items'][number]),
  nextCursor,
  counts: {
    species: [],
    primals: [],
    nodes: [],
    boneStates: [],
    fatBands: [],
    portionBands: [],
    ageingKinds: [],
    packTypes: [],
    inStock: null,
    prices: null,
  },
});

describe('the catalogue list', () => {
  const open = () => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideStore(),
        provideState(catalogueListFeature),
        provideEffects(effects),
      ],
    });
    const store = TestBed.inject(Store);
    const http = TestBed.inject(HttpTestingController);
    const codes = () =>
      store
        .selectSignal(catalogueListFeature.selectCards)()
        .map(({ code }) => code);
    const ask = (q: string) => store.dispatch(CatalogueListPageActions.searchAsked({ filters: { q } }));
    const request = (query: string) => http.expectOne(`/api/v1/specifications?${query}`);
    return { store, http, codes, ask, request };
  };

  it('shows what the latest words find, whichever answer comes first', () => {
    const { ask, request, codes } = open();
    ask('lam');
    const first = request('q=lam');
    ask('lamb');
    expect(first.cancelled).toBe(true);
    request('q=lamb').flush(page(['LM-104']));
    expect(codes()).toEqual(['LM-104']);
  });

  it('adds the next page to what is shown', () => {
    const { ask, request, codes, store } = open();
    ask('lamb');
    request('q=lamb').flush(page(['LM-101'], 'next'));
    store.dispatch(CatalogueListPageActions.moreAsked());
    request('q=lamb&cursor=next').flush(page(['LM-102']));
    expect(codes()).toEqual(['LM-101', 'LM-102']);
    expect(store.selectSignal(catalogueListFeature.selectHasMore)()).toBe(false);
  });

  it('gives up a next page when something else is searched for', () => {
    const { ask, request, codes, store } = open();
    ask('lamb');
    request('q=lamb').flush(page(['LM-101'], 'next'));
    store.dispatch(CatalogueListPageActions.moreAsked());
    const next = request('q=lamb&cursor=next');
    ask('beef');
    expect(next.cancelled).toBe(true);
    request('q=beef').flush(page(['BF-201']));
    expect(codes()).toEqual(['BF-201']);
  });

  it('says what went wrong and can be asked again', () => {
    const { ask, request, codes, store } = open();
    const found = store.selectSignal(catalogueListFeature.selectFound);
    ask('lamb');
    request('q=lamb').flush('', { status: 503, statusText: 'Service Unavailable' });
    expect(found()).toMatchObject({ status: 'failed', problem: { status: 503 } });
    store.dispatch(CatalogueListPageActions.tryAgainAsked());
    request('q=lamb').flush(page(['LM-101']));
    expect([found().problem, codes()]).toEqual([null, ['LM-101']]);
  });
});

import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { Subject } from 'rxjs';
import { LiveEvents, type LiveChange } from '@seamwright/shared/data-access';
import { aLotWire } from '@seamwright/stock/data-access/testing';
import { LotListPageActions, LotPageActions } from './lots.actions';
import { lotsEffects } from './lots.effects';
import { lotsFeature } from './lots.feature';

const changes = new Subject<LiveChange>();
let http: HttpTestingController;
let store: Store;
const state = () => TestBed.runInInjectionContext(() => store.selectSignal(lotsFeature.selectLotsState)());
const { id } = aLotWire();

beforeEach(() => {
  jest.useFakeTimers();
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      { provide: LiveEvents, useValue: { changes: () => changes } },
      provideStore(),
      provideState(lotsFeature),
      provideEffects(lotsEffects),
    ],
  });
  http = TestBed.inject(HttpTestingController);
  store = TestBed.inject(Store);
});
afterEach(() => {
  http.verify();
  jest.useRealTimers();
});

it('lists lots of a state page by page', () => {
  store.dispatch(LotListPageActions.opened({ state: 'released' }));
  http.expectOne('/api/v1/lots?state=released').flush({ items: [aLotWire()], nextCursor: 'c' });
  store.dispatch(LotListPageActions.moreWanted());
  http.expectOne('/api/v1/lots?state=released&cursor=c').flush({ items: [aLotWire({ id: 'b' })], nextCursor: null });
  expect(state().list.data?.map((lot) => lot.id)).toEqual([id, 'b']);
  store.dispatch(LotListPageActions.opened({ state: null }));
  expect(state().list.data).toBeNull();
  http.expectOne('/api/v1/lots').flush({ items: [], nextCursor: null });
});

it('holds a lot as it was read, and shows it so in the list too', () => {
  store.dispatch(LotListPageActions.opened({ state: null }));
  http.expectOne('/api/v1/lots').flush({ items: [aLotWire()], nextCursor: null });
  store.dispatch(LotPageActions.opened({ lotId: id }));
  http.expectOne(`/api/v1/lots/${id}`).flush(aLotWire());
  store.dispatch(LotPageActions.holdPressed({ lotId: id, rowVersion: 3, reason: 'Bag leaks' }));
  const call = http.expectOne(`/api/v1/lots/${id}/hold`);
  expect(call.request.headers.get('if-match')).toBe('"3"');
  expect(call.request.body).toEqual({ reason: 'Bag leaks' });
  call.flush(aLotWire({ state: 'on-hold', holdReason: 'Bag leaks' }));
  expect(state().lot.data?.state).toBe('on-hold');
  expect(state().list.data?.[0]?.state).toBe('on-hold');
});

it('keeps a refusal, and releases afterwards', () => {
  const problem = { type: '', title: '', status: 412, detail: 'Changed', instance: '', code: 'stale' };
  store.dispatch(LotPageActions.releasePressed({ lotId: id, rowVersion: 1 }));
  http.expectOne(`/api/v1/lots/${id}/release`).flush(problem, { status: 412, statusText: 'x' });
  expect(state().move.problem?.code).toBe('stale');
  store.dispatch(LotPageActions.releasePressed({ lotId: id, rowVersion: 2 }));
  http.expectOne(`/api/v1/lots/${id}/release`).flush(aLotWire());
  expect(state().move).toEqual({ running: false, problem: null });
});

it('fetches list and lot again when they changed elsewhere', () => {
  store.dispatch(LotPageActions.opened({ lotId: id }));
  http.expectOne(`/api/v1/lots/${id}`).flush(aLotWire());
  changes.next({ type: 'lot-changed', id });
  jest.advanceTimersByTime(400);
  http.expectOne(`/api/v1/lots/${id}`).flush(aLotWire({ remainingGrams: 1_000 }));
  expect(state().lot.data?.remainingGrams).toBe(1_000);
});

import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { Subject } from 'rxjs';
import { aDay, aPackingLine, aPackingOrder } from '@seamwright/plant/data-access/testing';
import { LiveEvents, type LiveChange } from '@seamwright/shared/data-access';
import { ScaleOrdersPageActions, ScalePageActions } from './packing.actions';
import { packingEffects } from './packing.effects';
import { packingFeature } from './packing.feature';

const changes = new Subject<LiveChange>();
let http: HttpTestingController;
let store: Store;
const state = () => TestBed.runInInjectionContext(() => store.selectSignal(packingFeature.selectPackingState)());
const orderId = aPackingOrder().id;
const pack = { orderLineId: 'l', lotId: 'b', pieces: 2, grossGrams: 578, tareGrams: 18, reason: null };

beforeEach(() => {
  jest.useFakeTimers();
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      { provide: LiveEvents, useValue: { changes: () => changes } },
      provideStore(),
      provideState(packingFeature),
      provideEffects(packingEffects),
    ],
  });
  http = TestBed.inject(HttpTestingController);
  store = TestBed.inject(Store);
});
afterEach(() => {
  http.verify();
  jest.useRealTimers();
});

const answerOrders = (deliveryDay: string, orders = [aPackingOrder()]) =>
  http.expectOne(`/api/v1/packing-orders?deliveryDay=${deliveryDay}`).flush({ deliveryDay, state: 'released', orders });
const open = () => {
  store.dispatch(ScalePageActions.opened({ deliveryDay: '2026-12-04' }));
  answerOrders('2026-12-04');
};

it('opens the earliest day on the floor', () => {
  store.dispatch(ScaleOrdersPageActions.opened());
  const days = [aDay({ deliveryDay: '2026-12-07', id: 'b' }), aDay()];
  http.expectOne('/api/v1/cutting-days?state=released').flush({ items: days, nextCursor: null });
  answerOrders('2026-12-04');
  expect(state()).toMatchObject({ deliveryDay: '2026-12-04', dayState: 'released', orders: { status: 'loaded' } });
  store.dispatch(ScaleOrdersPageActions.dayChosen({ deliveryDay: '2026-12-07' }));
  expect(state().orders.data).toBeNull();
  answerOrders('2026-12-07', []);
  expect(state().orders.data).toEqual([]);
});

it('has nothing to pack when no day is on the floor', () => {
  store.dispatch(ScaleOrdersPageActions.opened());
  http.expectOne('/api/v1/cutting-days?state=released').flush({ items: [], nextCursor: null });
  expect(state().orders).toMatchObject({ status: 'loaded', data: [] });
});

it('sends a pack with the key it was given, and shows the order as it is then', () => {
  open();
  store.dispatch(ScalePageActions.packWeighed({ orderId, pack, idempotencyKey: 'one-key' }));
  const call = http.expectOne(`/api/v1/packing-orders/${orderId}/packs`);
  expect(call.request.headers.get('idempotency-key')).toBe('one-key');
  expect(call.request.body).toEqual(pack);
  call.flush(aPackingOrder({ lines: [aPackingLine({ packedPieces: 2 })] }));
  expect(state().orders.data?.[0]?.lines[0]?.packedPieces).toBe(2);
  expect(state().deed).toEqual({ running: false, problem: null });
});

it('sends one pack for two presses', () => {
  open();
  store.dispatch(ScalePageActions.packWeighed({ orderId, pack, idempotencyKey: 'k' }));
  store.dispatch(ScalePageActions.packWeighed({ orderId, pack, idempotencyKey: 'k' }));
  http.expectOne(`/api/v1/packing-orders/${orderId}/packs`).flush(aPackingOrder());
});

it('keeps a refusal, and goes on listening afterwards', () => {
  open();
  const problem = { type: '', title: '', status: 422, detail: 'Too heavy', instance: '', code: 'pack-out-of-limits' };
  store.dispatch(ScalePageActions.packWeighed({ orderId, pack, idempotencyKey: 'k' }));
  http.expectOne(`/api/v1/packing-orders/${orderId}/packs`).flush(problem, { status: 422, statusText: 'x' });
  expect(state().deed.problem?.code).toBe('pack-out-of-limits');
  store.dispatch(ScalePageActions.packTakenBack({ orderId, packId: 'p' }));
  http.expectOne(`/api/v1/packing-orders/${orderId}/packs/p/void`).flush(aPackingOrder());
  store.dispatch(ScalePageActions.shortMarked({ orderId, lineId: 'l', shortPieces: 1, reason: 'r' }));
  http.expectOne(`/api/v1/packing-orders/${orderId}/lines/l/short`).flush(aPackingOrder());
  store.dispatch(ScalePageActions.finishPressed({ orderId }));
  http.expectOne(`/api/v1/packing-orders/${orderId}/finish`).flush(aPackingOrder({ packedAt: '2026-12-03T10:00:00Z' }));
  expect(state().orders.data?.[0]?.packedAt).toBe('2026-12-03T10:00:00Z');
});

it('fetches the orders again when somebody else packs', () => {
  open();
  changes.next({ type: 'pack-added', id: orderId });
  changes.next({ type: 'pack-added', id: orderId });
  jest.advanceTimersByTime(400);
  expect(state().orders.data).not.toBeNull();
  answerOrders('2026-12-04', [aPackingOrder({ lines: [aPackingLine({ packedPieces: 4 })] })]);
  expect(state().orders.data?.[0]?.lines[0]?.packedPieces).toBe(4);
});

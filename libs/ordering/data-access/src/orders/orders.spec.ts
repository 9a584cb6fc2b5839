import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of, Subject, throwError, type Observable } from 'rxjs';
import {
  cancelOrder,
  getOrder,
  listOrders,
  payOrderWith,
  type OrderDetail,
  type OrderListItem,
} from '@seamwright/ordering/contracts';
import { ApiClient, ApiProblem, LiveEvents, type LiveChange } from '@seamwright/shared/data-access';
import { OrderListPageActions, OrderPageActions, type OrderSearch } from './orders.actions';
import { ordersEffects } from './orders.effects';
import { ordersFeature } from './orders.feature';

const item = (id: string) => ({ id }) as OrderListItem;
const detail = (id: string, rowVersion = 1) => ({ id, rowVersion }) as OrderDetail;
const all: OrderSearch = { deliveryDay: null, state: null, customerId: null };
const stale = new ApiProblem({ type: '', title: '', status: 412, detail: '', instance: '', code: 'stale', errors: [] });

const live = new Subject<LiveChange>();
let calls: { id: string; input: Record<string, unknown> }[];
let answers: Record<string, () => Observable<unknown>>;
let store: Store;
const state = () => store.selectSignal(ordersFeature.selectOrdersState)();
const ofEndpoint = ({ id }: { id: string }) => calls.filter((call) => call.id === id).map(({ input }) => input);

beforeEach(() => {
  jest.useFakeTimers();
  calls = [];
  answers = {
    [listOrders.id]: () => of({ items: [item('a'), item('b')], nextCursor: 'next' }),
    [getOrder.id]: () => of(detail('a')),
    [cancelOrder.id]: () => of(detail('a', 2)),
    [payOrderWith.id]: () => of(detail('a', 3)),
  };
  const call = (endpoint: { id: string }, input: Record<string, unknown>) => {
    calls.push({ id: endpoint.id, input });
    return answers[endpoint.id]?.() ?? of();
  };
  TestBed.configureTestingModule({
    providers: [
      provideStore(),
      provideState(ordersFeature),
      provideEffects(ordersEffects),
      { provide: ApiClient, useValue: { call } },
      { provide: LiveEvents, useValue: { changes: () => live } },
    ],
  });
  store = TestBed.inject(Store);
});
afterEach(() => jest.useRealTimers());

describe('the list of orders', () => {
  it('asks for the day and state wanted, and goes on from the last one', () => {
    store.dispatch(OrderListPageActions.opened({ search: { ...all, deliveryDay: '2026-12-03', state: 'waiting' } }));
    answers[listOrders.id] = () => of({ items: [item('c')], nextCursor: null });
    store.dispatch(OrderListPageActions.moreWanted());
    store.dispatch(OrderListPageActions.moreWanted());
    expect(ofEndpoint(listOrders).map(({ query }) => query)).toEqual([
      { deliveryDay: '2026-12-03', state: 'waiting' },
      { deliveryDay: '2026-12-03', state: 'waiting', cursor: 'next' },
    ]);
    expect(state().list.data?.map(({ id }) => id)).toEqual(['a', 'b', 'c']);
    expect(store.selectSignal(ordersFeature.selectHasMore)()).toBe(false);
  });

  it('keeps old rows when the newest can’t be fetched, and lives on', () => {
    store.dispatch(OrderListPageActions.opened({ search: all }));
    answers[listOrders.id] = () => throwError(() => stale);
    store.dispatch(OrderListPageActions.opened({ search: all }));
    expect(state().list).toMatchObject({ status: 'failed', data: [{ id: 'a' }, { id: 'b' }] });
    answers[listOrders.id] = () => of({ items: [item('z')], nextCursor: null });
    store.dispatch(OrderListPageActions.opened({ search: all }));
    expect(state().list.data?.map(({ id }) => id)).toEqual(['z']);
  });
});

describe('an open order', () => {
  it('is fetched again when it changes elsewhere, not when another does', () => {
    store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
    live.next({ type: 'order-changed', id: 'b' });
    expect(ofEndpoint(getOrder)).toHaveLength(1);
    answers[getOrder.id] = () => of(detail('a', 5));
    live.next({ type: 'pack-added', id: 'a' });
    expect(state().order).toMatchObject({ status: 'loaded', data: { rowVersion: 5 } });
  });

  it('is cancelled at the version that was read', () => {
    store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
    store.dispatch(OrderPageActions.cancelPressed({ orderId: 'a', rowVersion: 1, reason: 'no cover' }));
    expect(ofEndpoint(cancelOrder)).toEqual([{ params: { orderId: 'a' }, ifMatch: 1, body: { reason: 'no cover' } }]);
    expect(state().order.data?.rowVersion).toBe(2);
  });

  it('has another card asked once, at the version that was read', () => {
    const answer = new Subject<OrderDetail>();
    answers[payOrderWith.id] = () => answer;
    store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
    const chosen = OrderPageActions.otherCardChosen({ orderId: 'a', rowVersion: 1, cardId: 'visa' });
    store.dispatch(chosen);
    store.dispatch(chosen);
    expect(ofEndpoint(payOrderWith)).toEqual([{ params: { orderId: 'a' }, ifMatch: 1, body: { cardId: 'visa' } }]);
    expect(state().paying).toEqual({ running: true, problem: null });
    answer.next(detail('a', 3));
    answer.complete();
    expect(state()).toMatchObject({ paying: { running: false }, order: { data: { rowVersion: 3 } } });
  });

  it('says why another card was not asked, until the order is opened again', () => {
    answers[payOrderWith.id] = () => throwError(() => stale);
    store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
    store.dispatch(OrderPageActions.otherCardChosen({ orderId: 'a', rowVersion: 1, cardId: 'visa' }));
    expect(state()).toMatchObject({
      paying: { running: false, problem: { code: 'stale' } },
      order: { data: { id: 'a' } },
    });
    store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
    expect(state().paying.problem).toBeNull();
  });

  it('says when somebody was faster, and keeps what is shown', () => {
    answers[cancelOrder.id] = () => throwError(() => stale);
    store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
    store.dispatch(OrderPageActions.cancelPressed({ orderId: 'a', rowVersion: 1, reason: 'x' }));
    expect(state().cancelling).toMatchObject({ running: false, problem: { code: 'stale' } });
    expect(state().order.data?.id).toBe('a');
  });
});

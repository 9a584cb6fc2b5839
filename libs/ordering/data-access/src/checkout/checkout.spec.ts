import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { NEVER, of, Subject, throwError, type Observable } from 'rxjs';
import type { OrderDetail } from '@seamwright/ordering/contracts';
import { PriceChecks, type PricedLine } from '@seamwright/pricing/data-access';
import { ApiProblem } from '@seamwright/shared/data-access';
import { BasketActions, BasketStorageActions } from '../basket/basket.actions';
import { emptyDraft, type BasketLine } from '../basket/basket-draft';
import { basketFeature } from '../basket/basket.feature';
import { DeliveryDays, type DaysQuestion, type DeliveryDaysNow } from '../delivery-days';
import { OrderPlacing } from '../order-placing';
import { BasketPageActions } from './checkout.actions';
import { checkoutEffects } from './checkout.effects';
import { checkoutFeature } from './checkout.feature';

const line: BasketLine = {
  id: 'line-1',
  specificationId: 'spec-1',
  code: 'BF-901',
  name: 'Striploin steak',
  summary: '',
  chosen: {},
  quantity: { unit: 'piece', count: 10 },
  whenShort: 'ask-me',
  note: '',
};
const DAYS: DeliveryDaysNow = {
  serverTime: '2026-12-01T12:00:00.000Z',
  timeZone: 'Europe/London',
  siteId: 'site-1',
  zoneName: 'Harbour',
  currency: 'GBP',
  deliveryChargeMinor: 650,
  deliveryTaxPpm: 0,
  days: [
    { day: '2026-12-02', cutOffAt: '2026-12-01T14:00:00.000Z', closed: true },
    { day: '2026-12-03', cutOffAt: '2026-12-02T14:00:00.000Z', closed: false },
    { day: '2026-12-04', cutOffAt: '2026-12-03T14:00:00.000Z', closed: false },
  ],
  sites: [{ id: 'site-1', name: 'Kitchen', address: '', zoneName: 'Harbour' }],
  clockAheadMs: 0,
};
const PRICED = {
  ok: true,
  leadDays: 0,
  amounts: { minMinor: 6384, estimateMinor: 6720, maxMinor: 7056 },
} as unknown as PricedLine;
const problem = (code: string, status = 422) =>
  new ApiProblem({ type: '', title: '', status, detail: code, instance: '', code, errors: [] });

const asked: DaysQuestion[] = [];
const placed: { key: string; agreedMaxMinor: number | undefined; deliveryDay: string }[] = [];
let days: (query: DaysQuestion) => Observable<DeliveryDaysNow>;
let answer: () => Observable<OrderDetail>;
let priced: PricedLine;
let store: Store;
const state = () => store.selectSignal(checkoutFeature.selectCheckoutState)();

beforeEach(() => {
  jest.useFakeTimers();
  asked.length = placed.length = 0;
  days = () => of(DAYS);
  answer = () => NEVER;
  priced = PRICED;
  TestBed.configureTestingModule({
    providers: [
      provideStore(),
      provideState(basketFeature),
      provideState(checkoutFeature),
      provideEffects(checkoutEffects),
      { provide: DeliveryDays, useValue: { next: (query: DaysQuestion) => (asked.push(query), days(query)) } },
      { provide: PriceChecks, useValue: { check: () => of({ lines: [priced] }) } },
      {
        provide: OrderPlacing,
        useValue: {
          place: (order: { agreedMaxMinor?: number; deliveryDay: string }, key: string) => {
            placed.push({ key, agreedMaxMinor: order.agreedMaxMinor, deliveryDay: order.deliveryDay });
            return answer();
          },
        },
      },
    ],
  });
  store = TestBed.inject(Store);
  store.dispatch(
    BasketStorageActions.restored({ owner: 'anna', draft: { ...emptyDraft('key-of-anna'), lines: [line] } }),
  );
  store.dispatch(BasketPageActions.opened());
  jest.runOnlyPendingTimers();
});
afterEach(() => jest.useRealTimers());

describe('the checkout', () => {
  it('proposes the first day that is still open, and adds up what it will come to at most', () => {
    expect(store.selectSignal(checkoutFeature.selectDeliveryDay)()).toBe('2026-12-03');
    const totals = store.selectSignal(checkoutFeature.selectTotals)();
    expect([totals?.min.totalMinor, totals?.estimate.totalMinor, totals?.max.totalMinor]).toEqual([7034, 7370, 7706]);
    expect(store.selectSignal(checkoutFeature.selectMayPlace)()).toBe(true);
  });

  it('places with the upper bound that was shown and the basket’s own key, and empties the basket', () => {
    answer = () => of({ id: 'order-1' } as OrderDetail);
    store.dispatch(BasketPageActions.placePressed());
    expect(placed).toEqual([{ key: 'key-of-anna', agreedMaxMinor: 7706, deliveryDay: '2026-12-03' }]);
    expect(store.selectSignal(basketFeature.selectCount)()).toBe(0);
  });

  it('sends the same key again after a lost answer, and places once while one is under way', () => {
    const first = new Subject<OrderDetail>();
    answer = () => first;
    store.dispatch(BasketPageActions.placePressed());
    store.dispatch(BasketPageActions.placePressed());
    expect(placed).toHaveLength(1);
    first.error(problem('offline', 0));
    expect(state().placing.problem?.code).toBe('offline');
    answer = () => NEVER;
    store.dispatch(BasketPageActions.placePressed());
    expect(placed.map(({ key }) => key)).toEqual(['key-of-anna', 'key-of-anna']);
    expect(store.selectSignal(basketFeature.selectCount)()).toBe(1);
  });

  it('is another deed once something was changed', () => {
    store.dispatch(BasketActions.detailsChanged({ deliveryDay: '2026-12-04' }));
    jest.runOnlyPendingTimers();
    store.dispatch(BasketPageActions.placePressed());
    expect(placed[0]?.deliveryDay).toBe('2026-12-04');
    expect(placed[0]?.key).not.toBe('key-of-anna');
  });

  it('can’t be placed while a line has no price, or a card is wanted and none is chosen', () => {
    priced = { ok: false, code: 'price-on-request', message: 'Ask' };
    store.dispatch(BasketActions.lineChanged(line.id, { quantity: { unit: 'piece', count: 11 } }));
    jest.runOnlyPendingTimers();
    expect(store.selectSignal(checkoutFeature.selectMayPlace)()).toBe(false);
    priced = PRICED;
    store.dispatch(BasketActions.detailsChanged({ settlement: 'card' }));
    jest.runOnlyPendingTimers();
    expect(store.selectSignal(checkoutFeature.selectMayPlace)()).toBe(false);
    store.dispatch(BasketActions.detailsChanged({ cardId: 'card-1' }));
    jest.runOnlyPendingTimers();
    expect(store.selectSignal(checkoutFeature.selectMayPlace)()).toBe(true);
  });

  it('falls back to the usual site when the kept one is no longer hers', () => {
    days = (query) => (query.siteId === 'gone' ? throwError(() => problem('not-found', 404)) : of(DAYS));
    store.dispatch(BasketActions.detailsChanged({ siteId: 'gone' }));
    expect(asked.slice(-2)).toEqual([{ siteId: 'gone', leadDays: 0 }, { leadDays: 0 }]);
    expect(store.selectSignal(checkoutFeature.selectSiteId)()).toBe('site-1');
  });

  it('asks for the days on which the slowest line can be ready, once', () => {
    priced = { ...PRICED, leadDays: 3 } as PricedLine;
    store.dispatch(BasketActions.lineChanged(line.id, { note: 'hung' }));
    jest.advanceTimersByTime(2_000);
    expect(asked.map(({ leadDays }) => leadDays)).toEqual([0, 3]);
  });

  it('goes on after a failure to fetch the days', () => {
    days = () => throwError(() => problem('offline', 0));
    store.dispatch(BasketPageActions.tryAgainPressed());
    expect(state().days).toMatchObject({ status: 'failed', data: DAYS });
    days = () => of(DAYS);
    store.dispatch(BasketPageActions.tryAgainPressed());
    expect(state().days.status).toBe('loaded');
  });
});

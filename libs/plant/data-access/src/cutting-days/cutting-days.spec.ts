import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { Subject } from 'rxjs';
import { aDay, somePapers } from '@seamwright/plant/data-access/testing';
import { LiveEvents, type LiveChange } from '@seamwright/shared/data-access';
import { CuttingDayListPageActions, CuttingDayPageActions } from './cutting-days.actions';
import { cuttingDaysEffects } from './cutting-days.effects';
import { cuttingDaysFeature } from './cutting-days.feature';

const DAY = '2026-12-04';
const base = '/api/v1/cutting-days';
const changes = new Subject<LiveChange>();
let http: HttpTestingController;
let store: Store;
const state = () =>
  TestBed.runInInjectionContext(() => store.selectSignal(cuttingDaysFeature.selectCuttingDaysState)());
const refusal = { type: '', title: '', status: 412, detail: 'Changed', instance: '', code: 'stale', errors: [] };

beforeEach(() => {
  jest.useFakeTimers();
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      { provide: LiveEvents, useValue: { changes: () => changes } },
      provideStore(),
      provideState(cuttingDaysFeature),
      provideEffects(cuttingDaysEffects),
    ],
  });
  http = TestBed.inject(HttpTestingController);
  store = TestBed.inject(Store);
});
afterEach(() => {
  http.verify();
  jest.useRealTimers();
});

function answerPapers(papers = somePapers()): void {
  http.expectOne(`${base}/${DAY}`).flush(papers.day);
  http.expectOne(`${base}/${DAY}/cutting-list`).flush(papers.cutting);
  http.expectOne(`${base}/${DAY}/pull-list`).flush(papers.pull);
}

it('fetches the day and its lists together', () => {
  store.dispatch(CuttingDayPageActions.opened({ deliveryDay: DAY }));
  expect(state().papers.status).toBe('loading');
  answerPapers();
  expect(state().papers).toMatchObject({ status: 'loaded', data: { day: { deliveryDay: DAY } } });
});

it('keeps what is shown when fetching it again fails, and says so', () => {
  store.dispatch(CuttingDayPageActions.opened({ deliveryDay: DAY }));
  answerPapers();
  store.dispatch(CuttingDayPageActions.refreshPressed());
  http.expectOne(`${base}/${DAY}`).flush({}, { status: 500, statusText: 'x' });
  http.match(() => true);
  expect(state().papers).toMatchObject({ status: 'failed', data: { day: { deliveryDay: DAY } } });
});

it('fetches once for many live changes, and not before a day is open', () => {
  changes.next({ type: 'order-placed', id: 'a' });
  jest.advanceTimersByTime(400);
  http.expectNone(() => true);
  store.dispatch(CuttingDayPageActions.opened({ deliveryDay: DAY }));
  answerPapers();
  for (const id of ['a', 'b', 'c']) changes.next({ type: 'order-placed', id });
  jest.advanceTimersByTime(400);
  answerPapers(somePapers({ orders: 5 }));
  expect(state().papers.data?.day.orders).toBe(5);
});

it('moves the day with the row version that was read, then fetches its lists again', () => {
  store.dispatch(CuttingDayPageActions.opened({ deliveryDay: DAY }));
  answerPapers();
  store.dispatch(CuttingDayPageActions.deedPressed({ deed: 'close', deliveryDay: DAY, rowVersion: 1 }));
  expect(state().deed.running).toBe(true);
  const call = http.expectOne(`${base}/${DAY}/close`);
  expect(call.request.headers.get('if-match')).toBe('"1"');
  call.flush(aDay({ state: 'closed', rowVersion: 2 }));
  expect(state().deed).toEqual({ running: false, problem: null });
  expect(state().papers.data?.day.state).toBe('closed');
  answerPapers(somePapers({ state: 'closed', rowVersion: 2 }));
});

it('keeps a refusal until the next try', () => {
  store.dispatch(CuttingDayPageActions.deedPressed({ deed: 'finish', deliveryDay: DAY, rowVersion: 1 }));
  http.expectOne(`${base}/${DAY}/finish`).flush(refusal, { status: 412, statusText: 'x' });
  expect(state().deed.problem?.code).toBe('stale');
  store.dispatch(CuttingDayPageActions.deedPressed({ deed: 'finish', deliveryDay: DAY, rowVersion: 2 }));
  expect(state().deed).toEqual({ running: true, problem: null });
  http.expectOne(`${base}/${DAY}/finish`).flush(aDay({ state: 'finished' }));
});

it('saves the workbook', () => {
  const saved: string[] = [];
  Object.assign(URL, { createObjectURL: () => 'blob:x', revokeObjectURL: () => undefined });
  jest.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(function (this: HTMLAnchorElement) {
    saved.push(this.download);
  });
  store.dispatch(CuttingDayPageActions.workbookWanted({ deliveryDay: DAY }));
  expect(state().workbook.running).toBe(true);
  http
    .expectOne(`${base}/${DAY}/workbook`)
    .flush(new Blob(['x']), { headers: { 'content-disposition': "attachment; filename*=UTF-8''cutting.xlsx" } });
  expect(saved).toEqual(['cutting.xlsx']);
  expect(state().workbook.running).toBe(false);
});

it('lists days page by page', () => {
  store.dispatch(CuttingDayListPageActions.opened());
  http.expectOne(base).flush({ items: [aDay()], nextCursor: 'c1' });
  store.dispatch(CuttingDayListPageActions.moreWanted());
  http.expectOne(`${base}?cursor=c1`).flush({ items: [aDay({ id: 'older' })], nextCursor: null });
  expect(state().list.data?.map(({ id }) => id)).toEqual([aDay().id, 'older']);
  store.dispatch(CuttingDayListPageActions.moreWanted());
  http.expectNone(() => true);
});

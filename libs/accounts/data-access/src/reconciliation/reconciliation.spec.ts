import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of, Subject, throwError, type Observable } from 'rxjs';
import { getReconciliation, refreshReconciliation, type ReconciliationWire } from '@seamwright/accounts/contracts';
import { ApiClient, ApiProblem, LiveEvents, type LiveChange } from '@seamwright/shared/data-access';
import { ReconciliationPageActions } from './reconciliation.actions';
import { reconciliationEffects } from './reconciliation.effects';
import { reconciliationFeature } from './reconciliation.feature';

const week = (from: string) => ({ from }) as ReconciliationWire;
const silent = new ApiProblem({
  type: '',
  title: '',
  status: 409,
  detail: '',
  instance: '',
  code: 'processor-silent',
  errors: [],
});

const live = new Subject<LiveChange>();
let asked: unknown[];
let answers: Record<string, () => Observable<unknown>>;
let store: Store;
const state = () => store.selectSignal(reconciliationFeature.selectReconciliationState)();

beforeEach(() => {
  asked = [];
  answers = {
    [getReconciliation.id]: () => of(week('2026-11-23')),
    [refreshReconciliation.id]: () => of({ transactions: 2, payouts: 1 }),
  };
  const call = (endpoint: { id: string }, input: { query?: unknown }) => {
    if (endpoint.id === getReconciliation.id) asked.push(input.query);
    return answers[endpoint.id]?.() ?? of();
  };
  TestBed.configureTestingModule({
    providers: [
      provideStore(),
      provideState(reconciliationFeature),
      provideEffects(reconciliationEffects),
      { provide: ApiClient, useValue: { call } },
      { provide: LiveEvents, useValue: { changes: () => live } },
    ],
  });
  store = TestBed.inject(Store);
});

describe('a week of card money', () => {
  it('is this one, or the one of the day wanted, and never shown under another day', () => {
    store.dispatch(ReconciliationPageActions.opened({ day: null }));
    const answer = new Subject<ReconciliationWire>();
    answers[getReconciliation.id] = () => answer;
    store.dispatch(ReconciliationPageActions.opened({ day: '2026-11-18' }));
    expect(asked).toEqual([{}, { day: '2026-11-18' }]);
    expect(state().week.data).toBeNull();
    answer.next(week('2026-11-16'));
    expect(state().week.data?.from).toBe('2026-11-16');
  });

  it('is fetched again, still in sight, once the processor answered or a statement was taken', () => {
    store.dispatch(ReconciliationPageActions.opened({ day: '2026-11-25' }));
    answers[getReconciliation.id] = () => new Subject();
    store.dispatch(ReconciliationPageActions.processorAsked());
    expect(asked).toHaveLength(2);
    expect(state()).toMatchObject({
      week: { status: 'loaded', data: { from: '2026-11-23' } },
      asking: { running: false },
    });
    store.dispatch(ReconciliationPageActions.statementTaken());
    expect(asked).toEqual([{ day: '2026-11-25' }, { day: '2026-11-25' }, { day: '2026-11-25' }]);
  });

  it('says when the processor is silent, and keeps the week', () => {
    store.dispatch(ReconciliationPageActions.opened({ day: null }));
    answers[refreshReconciliation.id] = () => throwError(() => silent);
    store.dispatch(ReconciliationPageActions.processorAsked());
    expect(state().asking).toMatchObject({ running: false, problem: { code: 'processor-silent' } });
    expect(state().week.data?.from).toBe('2026-11-23');
    expect(asked).toHaveLength(1);
  });
});

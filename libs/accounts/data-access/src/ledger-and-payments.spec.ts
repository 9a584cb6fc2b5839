import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of, Subject, throwError, type Observable } from 'rxjs';
import {
  getReconciliation,
  ledgerBalances,
  ledgerEntries,
  listInvoices,
  listPayments,
} from '@seamwright/accounts/contracts';
import { ApiClient, ApiProblem, LiveEvents, type LiveChange } from '@seamwright/shared/data-access';
import { AccountsToday, type AccountsWork } from './accounts-today';
import { LedgerPageActions } from './ledger/ledger.actions';
import { ledgerEffects } from './ledger/ledger.effects';
import { ledgerFeature } from './ledger/ledger.feature';
import { PaymentsPageActions } from './payments/payments.actions';
import { paymentsEffects } from './payments/payments.effects';
import { paymentsFeature } from './payments/payments.feature';

const offline = new ApiProblem({
  type: '',
  title: '',
  status: 0,
  detail: '',
  instance: '',
  code: 'offline',
  errors: [],
});
const live = new Subject<LiveChange>();
let calls: { id: string; query: unknown }[];
let answers: Record<string, () => Observable<unknown>>;
let store: Store;
const queries = ({ id }: { id: string }) => calls.filter((call) => call.id === id).map(({ query }) => query);

beforeEach(() => {
  jest.useFakeTimers();
  calls = [];
  answers = {
    [ledgerBalances.id]: () => of({ items: [{ account: 'bank' }] }),
    [ledgerEntries.id]: () => of({ items: [{ id: 'two' }], nextCursor: 'next' }),
    [listPayments.id]: () => of({ items: [{ id: 'p' }], nextCursor: null }),
  };
  const call = (endpoint: { id: string }, input: { query?: unknown }) => {
    calls.push({ id: endpoint.id, query: input.query });
    return answers[endpoint.id]?.() ?? of();
  };
  TestBed.configureTestingModule({
    providers: [
      provideStore(),
      provideState(ledgerFeature),
      provideState(paymentsFeature),
      provideEffects(ledgerEffects, paymentsEffects),
      { provide: ApiClient, useValue: { call } },
      { provide: LiveEvents, useValue: { changes: () => live } },
    ],
  });
  store = TestBed.inject(Store);
});
afterEach(() => jest.useRealTimers());

describe('the ledger', () => {
  const state = () => store.selectSignal(ledgerFeature.selectLedgerState)();

  it('shows the entries of an account page by page, beside all balances', () => {
    store.dispatch(LedgerPageActions.opened({ search: { account: 'bank', invoiceId: null } }));
    answers[ledgerEntries.id] = () => of({ items: [{ id: 'one' }], nextCursor: null });
    store.dispatch(LedgerPageActions.moreWanted());
    expect(queries(ledgerEntries)).toEqual([{ account: 'bank' }, { account: 'bank', cursor: 'next' }]);
    expect(state().entries.data?.map(({ id }) => id)).toEqual(['two', 'one']);
    expect(state().balances.data).toEqual([{ account: 'bank' }]);
  });

  it('shows entries though the balances failed', () => {
    answers[ledgerBalances.id] = () => throwError(() => offline);
    store.dispatch(LedgerPageActions.opened({ search: { account: null, invoiceId: 'i' } }));
    expect(state()).toMatchObject({ balances: { status: 'failed' }, entries: { status: 'loaded' } });
  });
});

describe('card payments', () => {
  it('are asked for by state and order, and anew when one changes', () => {
    store.dispatch(PaymentsPageActions.opened({ search: { state: 'captured', customerId: null, orderId: 'o' } }));
    live.next({ type: 'payment-changed', id: 'o' });
    jest.advanceTimersByTime(500);
    expect(queries(listPayments)).toEqual([
      { state: 'captured', orderId: 'o' },
      { state: 'captured', orderId: 'o' },
    ]);
  });
});

describe('what waits for the accounts desk', () => {
  it('is counted from the week, the overdue invoices and the holds', () => {
    answers[getReconciliation.id] = () => of({ exceptions: [{}, {}] });
    answers[listInvoices.id] = () => of({ items: [{}, {}, {}], nextCursor: 'more' });
    answers[listPayments.id] = () =>
      of({
        items: [
          { state: 'pre-authorised', holdEndsAt: '2026-12-02T10:00:00Z' },
          { state: 'pre-authorised', holdEndsAt: '2026-12-07T10:00:00Z' },
        ],
        nextCursor: null,
      });
    let work: AccountsWork | undefined;
    TestBed.inject(AccountsToday)
      .read(new Date('2026-12-01T10:00:00Z'))
      .subscribe((read) => (work = read));
    expect(work).toEqual({
      openExceptions: 2,
      overdueInvoices: { count: 3, more: true },
      holdsEndingSoon: { count: 1, more: false },
    });
  });
});

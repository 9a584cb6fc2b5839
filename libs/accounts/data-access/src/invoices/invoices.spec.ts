import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of, Subject, throwError, type Observable } from 'rxjs';
import {
  getInvoice,
  getInvoicePdf,
  ledgerEntries,
  listInvoices,
  type InvoiceDetail,
  type InvoiceListItem,
  type LedgerEntry,
} from '@seamwright/accounts/contracts';
import { ApiClient, ApiProblem, LiveEvents, type LiveChange } from '@seamwright/shared/data-access';
import { InvoiceListPageActions, InvoicePageActions } from './invoices.actions';
import { invoicesEffects } from './invoices.effects';
import { invoicesFeature } from './invoices.feature';

const item = (id: string) => ({ id }) as InvoiceListItem;
const detail = (id: string, paidMinor = 0) => ({ id, paidMinor }) as InvoiceDetail;
const all = { standing: null, customerId: null };
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
let calls: { id: string; input: Record<string, unknown> }[];
let answers: Record<string, () => Observable<unknown>>;
let store: Store;
const state = () => store.selectSignal(invoicesFeature.selectInvoicesState)();
const ofEndpoint = ({ id }: { id: string }) => calls.filter((call) => call.id === id).map(({ input }) => input);

beforeEach(() => {
  jest.useFakeTimers();
  calls = [];
  answers = {
    [listInvoices.id]: () => of({ items: [item('b'), item('a')], nextCursor: 'next' }),
    [getInvoice.id]: () => of(detail('a')),
    [ledgerEntries.id]: () => of({ items: [{ id: 'entry' } as LedgerEntry], nextCursor: null }),
    [getInvoicePdf.id]: () => throwError(() => offline),
  };
  const call = (endpoint: { id: string }, input: Record<string, unknown>) => {
    calls.push({ id: endpoint.id, input });
    return answers[endpoint.id]?.() ?? of();
  };
  TestBed.configureTestingModule({
    providers: [
      provideStore(),
      provideState(invoicesFeature),
      provideEffects(invoicesEffects),
      { provide: ApiClient, useValue: { call, download: call } },
      { provide: LiveEvents, useValue: { changes: () => live } },
    ],
  });
  store = TestBed.inject(Store);
});
afterEach(() => jest.useRealTimers());

describe('the list of invoices', () => {
  it('asks for the standing and customer wanted, and goes on from the last one', () => {
    store.dispatch(InvoiceListPageActions.opened({ search: { standing: 'overdue', customerId: 'pub' } }));
    answers[listInvoices.id] = () => of({ items: [item('c')], nextCursor: null });
    store.dispatch(InvoiceListPageActions.moreWanted());
    store.dispatch(InvoiceListPageActions.moreWanted());
    expect(ofEndpoint(listInvoices).map(({ query }) => query)).toEqual([
      { standing: 'overdue', customerId: 'pub' },
      { standing: 'overdue', customerId: 'pub', cursor: 'next' },
    ]);
    expect(state().list.data?.map(({ id }) => id)).toEqual(['b', 'a', 'c']);
  });

  it('is not shown for another standing than it was asked for, but stays while the same is fetched anew', () => {
    store.dispatch(InvoiceListPageActions.opened({ search: all }));
    answers[listInvoices.id] = () => throwError(() => offline);
    store.dispatch(InvoiceListPageActions.opened({ search: all }));
    expect(state().list).toMatchObject({ status: 'failed', data: [{ id: 'b' }, { id: 'a' }] });
    store.dispatch(InvoiceListPageActions.opened({ search: { ...all, standing: 'paid' } }));
    expect(state().list.data).toBeNull();
  });

  it('is fetched again when invoices or payments change, once for many changes', () => {
    store.dispatch(InvoiceListPageActions.opened({ search: all }));
    answers[listInvoices.id] = () => of({ items: [item('c')], nextCursor: null });
    live.next({ type: 'invoice-made', id: 'c' });
    live.next({ type: 'payment-changed', id: 'order' });
    jest.advanceTimersByTime(500);
    expect(ofEndpoint(listInvoices)).toHaveLength(2);
    expect(state().list.data?.map(({ id }) => id)).toEqual(['c']);
  });
});

describe('an open invoice', () => {
  it('is fetched again when a payment changes, and keeps its place meanwhile', () => {
    store.dispatch(InvoicePageActions.opened({ invoiceId: 'a' }));
    answers[getInvoice.id] = () => of(detail('a', 500));
    live.next({ type: 'payment-changed', id: 'order' });
    jest.advanceTimersByTime(500);
    expect(state().invoice).toMatchObject({ status: 'loaded', data: { paidMinor: 500 } });
  });

  it('does not take what another one posted for its own', () => {
    const answer = new Subject<unknown>();
    answers[ledgerEntries.id] = () => answer;
    store.dispatch(InvoicePageActions.opened({ invoiceId: 'a' }));
    store.dispatch(InvoicePageActions.postingsWanted({ invoiceId: 'a' }));
    answers[getInvoice.id] = () => of(detail('b'));
    store.dispatch(InvoicePageActions.opened({ invoiceId: 'b' }));
    answer.next({ items: [{ id: 'entry' }], nextCursor: null });
    expect(state().postings.data).toBeNull();
  });

  it('says when its paper can’t be fetched', () => {
    store.dispatch(InvoicePageActions.opened({ invoiceId: 'a' }));
    store.dispatch(InvoicePageActions.paperWanted({ invoiceId: 'a' }));
    expect(state().paper).toMatchObject({ running: false, problem: { code: 'offline' } });
  });
});

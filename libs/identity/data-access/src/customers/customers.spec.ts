import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideStore, Store } from '@ngrx/store';
import { Subject, type Observable } from 'rxjs';
import type { CustomerView } from '@seamwright/identity/contracts';
import { CustomerPageActions, CustomersPageActions } from './customers.actions';
import { CustomersApi } from './customers.api';
import { selectCustomer, selectCustomersPage } from './customers.reducer';
import { provideCustomers } from './provide-customers';

interface Page {
  items: CustomerView[];
  nextCursor: string | null;
}
const customer = (name: string) => ({ id: name, name }) as CustomerView;

let asked: { query: object; answer: Subject<Page> }[];
let gets: { id: string; answer: Subject<CustomerView> }[];
let store: Store;
const page = () => store.selectSignal(selectCustomersPage)();
const names = () => page().items.map(({ name }) => name);
const answer = (index: number, items: string[], nextCursor: string | null = null) =>
  asked[index]?.answer.next({ items: items.map(customer), nextCursor });

beforeEach(() => {
  asked = [];
  gets = [];
  const api = {
    list: (query: object): Observable<Page> => {
      const call = { query, answer: new Subject<Page>() };
      asked.push(call);
      return call.answer;
    },
    get: (id: string): Observable<CustomerView> => {
      const call = { id, answer: new Subject<CustomerView>() };
      gets.push(call);
      return call.answer;
    },
  };
  TestBed.configureTestingModule({
    providers: [provideStore(), provideEffects(), provideCustomers(), { provide: CustomersApi, useValue: api }],
  });
  store = TestBed.inject(Store);
});

describe('the list of customers', () => {
  it('lists, and adds the next page to what is shown', () => {
    store.dispatch(CustomersPageActions.opened());
    answer(0, ['Anchor'], 'next');
    expect(page()).toMatchObject({ hasMore: true, loading: false });
    store.dispatch(CustomersPageActions.moreWanted());
    expect(asked[1]?.query).toEqual({ cursor: 'next' });
    answer(1, ['Mill']);
    expect(names()).toEqual(['Anchor', 'Mill']);
    expect(page().hasMore).toBe(false);
  });

  it('shows the latest search only, whichever answer comes last', () => {
    store.dispatch(CustomersPageActions.searched({ query: { q: 'a', kind: null } }));
    store.dispatch(CustomersPageActions.searched({ query: { q: 'anchor', kind: 'pub' } }));
    expect(asked[1]?.query).toEqual({ q: 'anchor', kind: 'pub' });
    answer(1, ['Anchor']);
    answer(0, ['Abbey']);
    expect(names()).toEqual(['Anchor']);
  });

  it('drops the next page of a search that is no longer shown', () => {
    store.dispatch(CustomersPageActions.opened());
    answer(0, ['Anchor'], 'next');
    store.dispatch(CustomersPageActions.moreWanted());
    store.dispatch(CustomersPageActions.searched({ query: { q: 'mill', kind: null } }));
    answer(2, ['Mill']);
    answer(1, ['Pier']);
    expect(names()).toEqual(['Mill']);
  });

  it('keeps what is shown when a call fails, and lives on', () => {
    store.dispatch(CustomersPageActions.opened());
    answer(0, ['Anchor']);
    store.dispatch(CustomersPageActions.opened());
    asked[1]?.answer.error(new Error('lost'));
    expect(page().problem?.code).toBe('unexpected');
    expect(names()).toEqual(['Anchor']);
    store.dispatch(CustomersPageActions.opened());
    answer(2, ['Mill']);
    expect(page().problem).toBeNull();
    expect(names()).toEqual(['Mill']);
  });
});

describe('one customer', () => {
  const shown = () => store.selectSignal(selectCustomer)();

  it('shows nothing of the one before while the next is fetched', () => {
    store.dispatch(CustomerPageActions.opened({ customerId: 'Anchor' }));
    gets[0]?.answer.next(customer('Anchor'));
    expect(shown().data?.name).toBe('Anchor');
    store.dispatch(CustomerPageActions.opened({ customerId: 'Mill' }));
    expect(shown()).toMatchObject({ status: 'loading', data: null });
  });

  it('takes what was saved', () => {
    store.dispatch(CustomerPageActions.received({ customer: customer('Mill') }));
    expect(shown()).toMatchObject({ status: 'loaded', data: { name: 'Mill' } });
  });
});

import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of, throwError } from 'rxjs';
import type { Role } from '@seamwright/shared/contracts';
import { ApiProblem } from '@seamwright/shared/data-access';
import type { CustomerView } from '@seamwright/identity/contracts';
import {
  CustomersApi,
  PeopleApi,
  provideCustomers,
  SessionApiActions,
  sessionFeature,
} from '@seamwright/identity/data-access';
import { CustomerPage } from './customer.page';

const customerId = '019af000-0000-7000-8000-000000000001';
const anchor: CustomerView = {
  id: customerId,
  rowVersion: 3,
  number: 1001,
  name: 'The Blue Anchor',
  kind: 'pub',
  groupId: null,
  groupName: 'Anchor Inns',
  invoiceEmail: 'books@anchor.example',
  billingAddress: '1 Quay Street',
  vatNumber: null,
  termsDays: 14,
  termsFrom: 'invoice',
  active: true,
};
const harbour = { id: 'harbour', name: 'Harbour kitchen', address: '2 Quay Street', postcode: 'ZZ1 1AA', active: true };

const customers = { get: jest.fn(), groups: jest.fn(), sites: jest.fn() };
const people = { list: jest.fn() };

async function open(role: Role) {
  const id = '019af000-0000-7000-8000-000000000002';
  TestBed.configureTestingModule({
    providers: [
      provideRouter([]),
      provideStore(),
      provideEffects(),
      provideState(sessionFeature),
      provideCustomers(),
      { provide: CustomersApi, useValue: customers },
      { provide: PeopleApi, useValue: people },
    ],
  });
  const person = { id, name: 'Rowan', email: 'rowan@plant.example', customerId: null, customerName: null };
  TestBed.inject(Store).dispatch(SessionApiActions.signedIn({ person: { ...person, roles: [role], sites: '*' } }));
  const fixture = TestBed.createComponent(CustomerPage);
  fixture.componentRef.setInput('customerId', customerId);
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const buttons = () => [...page.querySelectorAll('button')];
  const press = async (words: string) => {
    buttons()
      .find(({ textContent }) => textContent.includes(words))
      ?.click();
    await fixture.whenStable();
  };
  const offers = (words: string): boolean => buttons().some(({ textContent }) => textContent.includes(words));
  return { page, press, offers };
}

beforeEach(() => {
  jest.resetAllMocks();
  customers.get.mockReturnValue(of(anchor));
  customers.groups.mockReturnValue(of([]));
  customers.sites.mockReturnValue(of([harbour]));
  people.list.mockReturnValue(of({ items: [], nextCursor: null }));
});

describe('a customer’s page', () => {
  it('tells whose it is, and where is delivered to', async () => {
    const { page } = await open('admin');
    expect(customers.get).toHaveBeenCalledWith(customerId);
    expect(customers.sites).toHaveBeenCalledWith(customerId);
    expect(page.querySelector('h1')?.textContent).toContain('The Blue Anchor');
    for (const words of ['number 1001', 'Anchor Inns', 'Harbour kitchen']) expect(page.textContent).toContain(words);
  });

  it.each<[Role, { facts: boolean; people: boolean }]>([
    ['admin', { facts: true, people: true }],
    ['accounts', { facts: true, people: false }],
    ['rep', { facts: false, people: true }],
    ['planner', { facts: false, people: false }],
  ])('lets %s do what their role may: %j', async (role, may) => {
    const { offers } = await open(role);
    expect(offers('Save the customer')).toBe(may.facts);
    expect(offers('Invite')).toBe(may.people);
    expect(people.list.mock.calls).toEqual(may.people ? [[{ customerId }]] : []);
  });

  it('shows the facts to read to whoever may not change them', async () => {
    const { page } = await open('planner');
    for (const words of ['books@anchor.example', '1 Quay Street']) expect(page.textContent).toContain(words);
  });

  it('says when it can’t be shown, and tries again on wish', async () => {
    const problem = { type: '', title: '', status: 0, detail: 'No desk.', instance: '', code: 'offline', errors: [] };
    customers.get.mockReturnValueOnce(throwError(() => new ApiProblem(problem)));
    const { page, press } = await open('rep');
    expect(page.textContent).toContain('No desk.');
    await press('again');
    expect(page.querySelector('h1')?.textContent).toContain('The Blue Anchor');
  });

  it('marks a customer that may not order', async () => {
    customers.get.mockReturnValue(of({ ...anchor, active: false }));
    const { page } = await open('rep');
    expect(page.textContent).toContain('not active');
  });
});

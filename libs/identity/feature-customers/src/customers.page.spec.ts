import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of, throwError } from 'rxjs';
import type { Role } from '@seamwright/shared/contracts';
import { ApiProblem } from '@seamwright/shared/data-access';
import type { CustomerView } from '@seamwright/identity/contracts';
import { CustomersApi, provideCustomers, SessionApiActions, sessionFeature } from '@seamwright/identity/data-access';
import { CustomersPage } from './customers.page';

const customer = (over: Partial<CustomerView>): CustomerView => ({
  id: 'anchor',
  rowVersion: 1,
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
  ...over,
});
const anchor = customer({});
const grange = customer({ id: 'grange', number: 1002, name: 'Eskmere Grange', groupName: null, active: false });
const page = (items: CustomerView[], nextCursor: string | null = null) => of({ items, nextCursor });
const offline = () =>
  throwError(
    () =>
      new ApiProblem({ type: '', title: '', status: 0, detail: 'No desk.', instance: '', code: 'offline', errors: [] }),
  );

const api = { list: jest.fn() };
beforeEach(() => {
  jest.useFakeTimers();
  jest.resetAllMocks();
  api.list.mockReturnValue(page([anchor, grange]));
});
afterEach(() => jest.useRealTimers());

async function open(...roles: Role[]) {
  TestBed.configureTestingModule({
    providers: [
      provideRouter([]),
      provideStore(),
      provideEffects(),
      provideState(sessionFeature),
      provideCustomers(),
      { provide: CustomersApi, useValue: api },
    ],
  });
  const id = '019af000-0000-7000-8000-000000000002';
  const person = { id, name: 'Rowan', email: 'rowan@plant.example', roles, customerId: null, customerName: null };
  TestBed.inject(Store).dispatch(SessionApiActions.signedIn({ person: { ...person, sites: '*' } }));
  const fixture = TestBed.createComponent(CustomersPage);
  const shown = fixture.nativeElement as HTMLElement;
  const rest = async (ms = 0) => {
    await jest.advanceTimersByTimeAsync(ms);
    fixture.detectChanges();
  };
  await rest();
  const press = async (words: string) => {
    [...shown.querySelectorAll('button')].find(({ textContent }) => textContent.includes(words))?.click();
    await rest();
  };
  const search = async (text: string) => {
    const field = shown.querySelector<HTMLInputElement>('input[type=search]');
    if (!field) throw new Error('Nothing to search with');
    field.value = text;
    field.dispatchEvent(new Event('input'));
    await rest(200);
  };
  return { shown, press, search };
}

const links = (shown: HTMLElement): (string | null)[] =>
  [...shown.querySelectorAll('a')].map((link) => link.getAttribute('href'));

describe('the customers', () => {
  it('stand by name with number, group, terms and whether they may order, each leading to its page', async () => {
    const { shown } = await open('rep');
    for (const words of ['The Blue Anchor', '1001', 'Anchor Inns', '14 days', 'Eskmere Grange', 'not active'])
      expect(shown.textContent).toContain(words);
    expect(links(shown)).toEqual(expect.arrayContaining(['/customers/anchor', '/customers/grange']));
  });

  it.each<[Role, boolean]>([
    ['admin', true],
    ['accounts', true],
    ['rep', false],
  ])('can be opened anew by %s: %s', async (role, may) => {
    const { shown } = await open(role);
    expect(links(shown).includes('/customers/new')).toBe(may);
  });

  it('are searched for once the typing pauses, and say when none matches', async () => {
    const { shown, search } = await open('rep');
    api.list.mockReturnValue(page([]));
    await search('  gra ');
    expect(api.list.mock.calls.map(([query]) => query as object)).toEqual([{}, { q: 'gra' }]);
    expect(shown.textContent).toContain('No customer matches');
  });

  it('say that there are none yet when nothing was asked for', async () => {
    api.list.mockReturnValue(page([]));
    const { shown } = await open('rep');
    expect(shown.textContent).toContain('No customers yet');
  });

  it('go on from where the page ended', async () => {
    api.list.mockReturnValueOnce(page([anchor], 'on'));
    const { shown, press } = await open('rep');
    api.list.mockReturnValueOnce(page([grange]));
    await press('Show more');
    expect(api.list).toHaveBeenLastCalledWith({ cursor: 'on' });
    expect(shown.textContent).toContain('The Blue Anchor');
    expect(shown.textContent).toContain('Eskmere Grange');
    expect(shown.textContent).not.toContain('Show more');
  });

  it('say what went wrong, and are fetched again on wish', async () => {
    api.list.mockReturnValueOnce(offline());
    const { shown, press } = await open('rep');
    expect(shown.textContent).toContain('No desk.');
    await press('again');
    expect(shown.textContent).not.toContain('No desk.');
    expect(shown.textContent).toContain('The Blue Anchor');
  });
});

import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { of, throwError } from 'rxjs';
import { ApiProblem } from '@seamwright/shared/data-access';
import type { PersonView } from '@seamwright/identity/contracts';
import { CustomersApi, PeopleApi } from '@seamwright/identity/data-access';
import { PeoplePage } from './people.page';

const person = (over: Partial<PersonView>): PersonView => ({
  id: 'rowan',
  rowVersion: 1,
  email: 'rowan@plant.example',
  name: 'Rowan Rep',
  roles: ['rep'],
  customerId: null,
  customerName: null,
  sites: '*',
  customers: '*',
  state: 'active',
  lastSeenAt: null,
  ...over,
});
const rowan = person({});
const tamsin = person({ id: 'tamsin', name: 'Tamsin Packer', email: 'tamsin@plant.example', state: 'invited' });
const problem = new ApiProblem({
  type: '',
  title: '',
  status: 0,
  detail: 'No desk.',
  instance: '',
  code: 'offline',
  errors: [],
});

const people = { list: jest.fn() };
const customers = { list: jest.fn() };

beforeEach(() => {
  jest.useFakeTimers();
  jest.resetAllMocks();
  people.list.mockReturnValue(of({ items: [rowan, tamsin], nextCursor: null }));
  customers.list.mockReturnValue(of({ items: [], nextCursor: null }));
});
afterEach(() => jest.useRealTimers());

async function open() {
  TestBed.configureTestingModule({
    providers: [
      provideRouter([]),
      { provide: PeopleApi, useValue: people },
      { provide: CustomersApi, useValue: customers },
    ],
  });
  const fixture = TestBed.createComponent(PeoplePage);
  const page = fixture.nativeElement as HTMLElement;
  const rest = async (ms = 0) => {
    await jest.advanceTimersByTimeAsync(ms);
    fixture.detectChanges();
  };
  await rest();
  const press = async (words: string) => {
    [...page.querySelectorAll('button')].find(({ textContent }) => textContent.includes(words))?.click();
    await rest();
  };
  const type = (text: string) => {
    const field = page.querySelector<HTMLInputElement>('input[type=search]');
    if (!field) throw new Error('Nothing to search with');
    field.value = text;
    field.dispatchEvent(new Event('input'));
  };
  return { page, press, type, rest };
}

describe('people and roles', () => {
  it('shows the staff, what each may do and how each stands', async () => {
    const { page } = await open();
    expect(people.list).toHaveBeenCalledWith(expect.objectContaining({ who: 'staff' }));
    for (const words of ['Rowan Rep', 'rowan@plant.example', 'Tamsin Packer'])
      expect(page.textContent).toContain(words);
  });

  it('searches once the typing pauses, and not again for the same words', async () => {
    const { type, rest } = await open();
    type('ta');
    type('tam');
    await rest(200);
    type('tam ');
    await rest(200);
    expect(people.list.mock.calls.map(([query]) => (query as { q?: string }).q)).toEqual([undefined, 'tam']);
  });

  it('says so when nobody is of that name', async () => {
    const { page, type, rest } = await open();
    people.list.mockReturnValue(of({ items: [], nextCursor: null }));
    type('zz');
    await rest(200);
    expect(page.textContent).toContain('Nobody of this name');
  });

  it('offers a form to invite somebody, also when the customers to choose from can’t be fetched', async () => {
    customers.list.mockReturnValue(throwError(() => problem));
    const { page, press } = await open();
    await press('Invite');
    expect(page.querySelector('form')).not.toBeNull();
  });

  it('says what went wrong, and fetches the staff again on wish', async () => {
    people.list.mockReturnValueOnce(throwError(() => problem));
    const { page, press } = await open();
    expect(page.textContent).toContain('No desk.');
    await press('again');
    expect(page.textContent).toContain('Rowan Rep');
  });
});

import { TestBed } from '@angular/core/testing';
import { of, throwError } from 'rxjs';
import { ApiProblem } from '@seamwright/shared/data-access';
import type { CustomerView } from '@seamwright/identity/contracts';
import { CustomersApi } from '@seamwright/identity/data-access';
import { Toast } from '@seamwright/shared/ui';
import { CustomerFactsCard } from './customer-facts';

const anchor: CustomerView = {
  id: '019af000-0000-7000-8000-000000000001',
  rowVersion: 3,
  number: 1001,
  name: 'The Blue Anchor',
  kind: 'pub',
  groupId: null,
  groupName: null,
  invoiceEmail: 'books@anchor.example',
  billingAddress: '1 Quay Street',
  vatNumber: null,
  termsDays: 14,
  termsFrom: 'invoice',
  active: true,
};
const newer: CustomerView = { ...anchor, rowVersion: 4, termsDays: 30 };
const problem = (status: number, code: string, errors: { pointer: string; message: string }[] = []) =>
  throwError(() => new ApiProblem({ type: '', title: '', status, detail: 'Said.', instance: '', code, errors }));

const api = { update: jest.fn(), get: jest.fn() };

async function open() {
  jest.resetAllMocks();
  TestBed.configureTestingModule({
    providers: [
      { provide: CustomersApi, useValue: api },
      { provide: Toast, useValue: { show: () => Promise.resolve(false) } },
    ],
  });
  const fixture = TestBed.createComponent(CustomerFactsCard);
  fixture.componentRef.setInput('customer', anchor);
  const received: CustomerView[] = [];
  fixture.componentInstance.received.subscribe((customer) => {
    received.push(customer);
    fixture.componentRef.setInput('customer', customer);
  });
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const field = (name: string) => page.querySelector<HTMLInputElement>(`[formControlName=${name}]`);
  const press = async (words: string) => {
    [...page.querySelectorAll('button')].find(({ textContent }) => textContent.includes(words))?.click();
    await fixture.whenStable();
  };
  const type = (name: string, text: string) => {
    const input = field(name);
    if (!input) throw new Error(`No field ${name}`);
    input.value = text;
    input.dispatchEvent(new Event('input'));
  };
  return { page, field, press, type, received };
}

describe('a customer’s facts', () => {
  it('are saved by the version that was read', async () => {
    const { press, type, received } = await open();
    api.update.mockReturnValue(of({ ...anchor, rowVersion: 4, name: 'Blue Anchor Inn' }));
    type('name', 'Blue Anchor Inn ');
    await press('Save');
    expect(api.update).toHaveBeenCalledWith(anchor.id, expect.objectContaining({ name: 'Blue Anchor Inn' }), 3);
    expect(received).toHaveLength(1);
  });

  it('keep what was typed when somebody else saved first, and show what they changed', async () => {
    const { page, field, press, type } = await open();
    api.update.mockReturnValueOnce(problem(412, 'stale'));
    api.get.mockReturnValue(of(newer));
    type('name', 'Blue Anchor Inn');
    await press('Save');
    expect(page.querySelector('sw-newer-state')?.textContent).toContain('30');
    expect(page.querySelector('sw-newer-state')?.textContent).not.toContain('Quay Street');
    expect(field('name')?.value).toBe('Blue Anchor Inn');

    await press('Keep mine');
    api.update.mockReturnValue(of({ ...newer, rowVersion: 5 }));
    await press('Save');
    expect(api.update).toHaveBeenLastCalledWith(anchor.id, expect.objectContaining({ name: 'Blue Anchor Inn' }), 4);
  });

  it('take the newer state when asked', async () => {
    const { field, press, type, received } = await open();
    api.update.mockReturnValueOnce(problem(412, 'stale'));
    api.get.mockReturnValue(of(newer));
    type('name', 'Blue Anchor Inn');
    await press('Save');
    await press('Take the newer');
    expect(received).toEqual([newer]);
    expect(field('name')?.value).toBe('The Blue Anchor');
    expect(field('termsDays')?.value).toBe('30');
  });

  it('say beside the field what the server refused', async () => {
    const { page, press } = await open();
    api.update.mockReturnValue(problem(422, 'invalid', [{ pointer: '/invoiceEmail', message: 'Not an address.' }]));
    await press('Save');
    expect(page.querySelector('mat-error')?.textContent).toContain('Not an address.');
  });

  it('are not sent while something is wrong', async () => {
    const { page, press, type } = await open();
    type('termsDays', '121');
    await press('Save');
    expect(api.update).not.toHaveBeenCalled();
    expect(page.querySelector('mat-error')?.textContent).toContain('120');
  });
});

import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { of, throwError, type Observable } from 'rxjs';
import { ApiProblem } from '@seamwright/shared/data-access';
import { CustomersApi } from '@seamwright/identity/data-access';
import { NewCustomerPage } from './new-customer.page';

const api = { create: jest.fn(), groups: jest.fn() };
const refused = (status: number, code: string, errors: { pointer: string; message: string }[] = []) =>
  throwError(() => new ApiProblem({ type: '', title: '', status, detail: 'Said.', instance: '', code, errors }));

async function open(groups: Observable<object[]> = of([])) {
  jest.resetAllMocks();
  api.groups.mockReturnValue(groups);
  api.create.mockReturnValue(of({ id: 'anchor' }));
  TestBed.configureTestingModule({ providers: [provideRouter([]), { provide: CustomersApi, useValue: api }] });
  const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
  const fixture = TestBed.createComponent(NewCustomerPage);
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const type = (label: string, text: string) => {
    const named = [...page.querySelectorAll('label')].find(({ textContent }) => textContent.includes(label));
    const field = page.querySelector<HTMLInputElement>(`[id="${named?.getAttribute('for') ?? ''}"]`);
    if (!field) throw new Error(`No field ${label}`);
    field.value = text;
    field.dispatchEvent(new Event('input'));
  };
  const fill = () => {
    type('Name', 'The Blue Anchor ');
    type('Billing address', '1 Quay Street\nZZ1 1AA');
    type('Invoices go to', 'Books@Anchor.example');
  };
  const send = async () => {
    [...page.querySelectorAll('button')].find(({ textContent }) => textContent.includes('Open the account'))?.click();
    await fixture.whenStable();
  };
  return { page, type, fill, send, navigate };
}
const keys = (): string[] => api.create.mock.calls.map(([, key]) => key as string);

describe('opening an account', () => {
  it('sends the facts and leads to the new customer', async () => {
    const { fill, type, send, navigate } = await open();
    fill();
    type('Pays within', '30');
    await send();
    expect(api.create).toHaveBeenCalledWith(
      {
        name: 'The Blue Anchor',
        kind: 'restaurant',
        groupId: null,
        invoiceEmail: 'books@anchor.example',
        billingAddress: '1 Quay Street\nZZ1 1AA',
        vatNumber: null,
        termsDays: 30,
        termsFrom: 'invoice',
      },
      expect.any(String),
    );
    expect(navigate).toHaveBeenCalledWith(['/customers', 'anchor']);
  });

  it('sends nothing while something is missing or can’t be', async () => {
    const { page, fill, type, send } = await open();
    await send();
    fill();
    type('Pays within', '121');
    await send();
    expect(api.create).not.toHaveBeenCalled();
    expect(page.textContent).toContain('120');
  });

  it('tries a lost answer again as the same deed, so that no second account is opened', async () => {
    const { page, fill, send } = await open();
    fill();
    api.create.mockReturnValueOnce(refused(0, 'offline'));
    await send();
    expect(page.textContent).toContain('Said.');
    await send();
    expect(new Set(keys()).size).toBe(1);
    expect(keys()).toHaveLength(2);
  });

  it('says beside the field what was refused, and sends what was mended as another deed', async () => {
    const { page, fill, type, send, navigate } = await open();
    fill();
    api.create.mockReturnValueOnce(refused(422, 'invalid', [{ pointer: '/invoiceEmail', message: 'No such house.' }]));
    await send();
    expect(page.querySelector('mat-error')?.textContent).toContain('No such house.');
    expect(navigate).not.toHaveBeenCalled();
    type('Invoices go to', 'papers@anchor.example');
    await send();
    expect(new Set(keys()).size).toBe(2);
    expect(navigate).toHaveBeenCalledTimes(1);
  });

  it('does without groups when they can’t be fetched', async () => {
    const { fill, send } = await open(refused(0, 'offline'));
    fill();
    await send();
    expect(api.create).toHaveBeenCalledTimes(1);
  });
});

import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { of, Subject, throwError } from 'rxjs';
import { ApiProblem } from '@seamwright/shared/data-access';
import { LinksApi } from '@seamwright/identity/data-access';
import { ForgottenPasswordPage } from './forgotten-password.page';

const links = { forgotPassword: jest.fn() };

async function open() {
  jest.resetAllMocks();
  links.forgotPassword.mockReturnValue(of(undefined));
  TestBed.configureTestingModule({ providers: [provideRouter([]), { provide: LinksApi, useValue: links }] });
  const fixture = TestBed.createComponent(ForgottenPasswordPage);
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const ask = async (email: string) => {
    const field = page.querySelector<HTMLInputElement>('input[type=email]');
    if (!field) throw new Error('No field for the address');
    field.value = email;
    field.dispatchEvent(new Event('input'));
    page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
    await fixture.whenStable();
  };
  return { page, ask };
}

describe('a forgotten password', () => {
  it('has a link mailed, and says the same whether or not the address is known', async () => {
    const { page, ask } = await open();
    await ask(' Chef@Anchor.example ');
    expect(links.forgotPassword).toHaveBeenCalledWith('chef@anchor.example');
    expect(page.querySelector('[role=status]')?.textContent).toContain('If chef@anchor.example is known here');
    expect(page.querySelector('form')).toBeNull();
    expect(page.querySelector('a')?.getAttribute('href')).toBe('/sign-in');
  });

  it('asks for an address before anything is sent', async () => {
    const { page, ask } = await open();
    await ask('chef at anchor');
    expect(links.forgotPassword).not.toHaveBeenCalled();
    expect(page.querySelector('mat-error')?.textContent?.trim()).not.toBe('');
  });

  it('sends once, however often it is pressed', async () => {
    const { ask } = await open();
    links.forgotPassword.mockReturnValue(new Subject());
    await ask('chef@anchor.example');
    await ask('chef@anchor.example');
    expect(links.forgotPassword).toHaveBeenCalledTimes(1);
  });

  it('says why nothing was sent, keeps the address, and can be tried again', async () => {
    const { page, ask } = await open();
    const problem = { type: '', title: '', status: 429, detail: 'Wait.', instance: '', code: 'too-many', errors: [] };
    links.forgotPassword.mockReturnValueOnce(throwError(() => new ApiProblem(problem)));
    await ask('chef@anchor.example');
    expect(page.querySelector('[role=alert]')?.textContent).toContain('Wait.');
    expect(page.querySelector<HTMLInputElement>('input[type=email]')?.value).toBe('chef@anchor.example');
    await ask('chef@anchor.example');
    expect(page.querySelector('[role=status]')?.textContent).toContain('chef@anchor.example');
  });
});

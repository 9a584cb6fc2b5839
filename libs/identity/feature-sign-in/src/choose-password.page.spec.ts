import { TestBed } from '@angular/core/testing';
import { ActivatedRoute, provideRouter } from '@angular/router';
import { of, throwError } from 'rxjs';
import { ApiProblem } from '@seamwright/shared/data-access';
import { LinksApi } from '@seamwright/identity/data-access';
import { ChoosePasswordPage } from './choose-password.page';

const links = { acceptInvitation: jest.fn(), resetPassword: jest.fn() };

async function open(link: 'invitation' | 'password-reset', fragment: string | null) {
  jest.resetAllMocks();
  links.acceptInvitation.mockReturnValue(of({}));
  links.resetPassword.mockReturnValue(of({}));
  TestBed.configureTestingModule({
    providers: [
      provideRouter([]),
      { provide: LinksApi, useValue: links },
      { provide: ActivatedRoute, useValue: { fragment: of(fragment) } },
    ],
  });
  const fixture = TestBed.createComponent(ChoosePasswordPage);
  fixture.componentRef.setInput('link', link);
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const choose = async (password: string) => {
    const field = page.querySelector<HTMLInputElement>('input[autocomplete=new-password]');
    if (field) {
      field.value = password;
      field.dispatchEvent(new Event('input'));
    }
    page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
    await fixture.whenStable();
  };
  return { page, choose };
}

describe('the page of a mailed link', () => {
  it('uses an invitation with the secret behind the hash sign', async () => {
    const { choose } = await open('invitation', 'token=secret');
    await choose('boned and rolled');
    expect(links.acceptInvitation).toHaveBeenCalledWith('secret', 'boned and rolled');
  });

  it('uses a reset', async () => {
    const { choose } = await open('password-reset', 'token=secret');
    await choose('boned and rolled');
    expect(links.resetPassword).toHaveBeenCalledWith('secret', 'boned and rolled');
    expect(links.acceptInvitation).not.toHaveBeenCalled();
  });

  it('refuses a weak password beside the field, by the same rule as the server', async () => {
    const { page, choose } = await open('invitation', 'token=secret');
    await choose('short');
    expect(page.querySelector('mat-error')?.textContent).toContain('12');
    expect(links.acceptInvitation).not.toHaveBeenCalled();
  });

  it('says what to do when the link was spent', async () => {
    const { page, choose } = await open('password-reset', 'token=secret');
    const problem = {
      type: '',
      title: '',
      status: 409,
      detail: 'Used.',
      instance: '',
      code: 'link-not-valid',
      errors: [],
    };
    links.resetPassword.mockReturnValue(throwError(() => new ApiProblem(problem)));
    await choose('boned and rolled');
    expect(page.querySelector('[role=alert]')?.textContent).toContain('Used.');
    expect(page.querySelector('a')?.getAttribute('href')).toBe('/forgotten-password');
  });

  it('says so when part of the link is missing', async () => {
    const { page } = await open('invitation', null);
    expect(page.querySelector('form')).toBeNull();
    expect(page.querySelector('[role=alert]')?.textContent).toContain('missing');
  });
});

import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideState, provideStore, Store } from '@ngrx/store';
import type { Problem } from '@seamwright/shared/contracts';
import {
  IDENTITY_APPLICATION,
  SessionActions,
  SessionApiActions,
  sessionFeature,
} from '@seamwright/identity/data-access';
import { SignInPage } from './sign-in.page';

const refused: Problem = {
  type: '',
  title: '',
  status: 401,
  detail: 'The e-mail address or the password is not right.',
  instance: '',
  code: 'sign-in-refused',
  errors: [],
};

async function open() {
  TestBed.configureTestingModule({
    providers: [
      provideRouter([]),
      provideStore(),
      provideState(sessionFeature),
      { provide: IDENTITY_APPLICATION, useValue: 'storefront' },
    ],
  });
  const store = TestBed.inject(Store);
  const dispatched = jest.spyOn(store, 'dispatch');
  const fixture = TestBed.createComponent(SignInPage);
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const type = async (selector: string, text: string) => {
    const field = page.querySelector<HTMLInputElement>(selector);
    if (!field) throw new Error(`No field ${selector}`);
    field.value = text;
    field.dispatchEvent(new Event('input'));
    await fixture.whenStable();
  };
  const submit = async () => {
    page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
    await fixture.whenStable();
  };
  return { fixture, page, store, dispatched, type, submit };
}

const EMAIL = 'input[type=email]';
const PASSWORD = 'input[autocomplete=current-password]';

describe('the sign-in page', () => {
  it('lets password managers fill it and sends what was typed', async () => {
    const { page, type, submit, dispatched } = await open();
    expect(page.querySelector(EMAIL)?.getAttribute('autocomplete')).toBe('username');
    await type(EMAIL, 'Jo@Anchor.example');
    await type(PASSWORD, 'boned and rolled');
    await submit();
    expect(dispatched).toHaveBeenCalledWith(
      SessionActions.signInSubmitted({ email: 'jo@anchor.example', password: 'boned and rolled' }),
    );
    expect(page.querySelector<HTMLButtonElement>('button[type=submit]')?.disabled).toBe(true);
  });

  it('says beside the fields what is missing, and sends nothing', async () => {
    const { page, submit, dispatched } = await open();
    await submit();
    expect(page.querySelectorAll('mat-error')).toHaveLength(2);
    expect(dispatched).not.toHaveBeenCalledWith(expect.objectContaining({ type: SessionActions.signInSubmitted.type }));
  });

  it('says what was refused and keeps what was typed', async () => {
    const { fixture, page, type, store } = await open();
    await type(EMAIL, 'jo@anchor.example');
    await type(PASSWORD, 'not the password');
    store.dispatch(SessionApiActions.signInRefused({ problem: refused }));
    await fixture.whenStable();
    expect(page.querySelector('[role=alert]')?.textContent).toContain('not right');
    expect(page.querySelector<HTMLInputElement>(EMAIL)?.value).toBe('jo@anchor.example');
  });

  it('shows the password only when asked', async () => {
    const { fixture, page } = await open();
    const password = () => page.querySelector<HTMLInputElement>(PASSWORD)?.type;
    expect(password()).toBe('password');
    page.querySelector<HTMLButtonElement>('button[aria-pressed]')?.click();
    await fixture.whenStable();
    expect(password()).toBe('text');
  });
});

import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { provideEffects } from '@ngrx/effects';
import { provideStore, Store } from '@ngrx/store';
import { ACCESS_TOKEN_SOURCE, ApiClient } from '@seamwright/shared/data-access';
import { getMe } from '@seamwright/identity/contracts';
import { PageLoad } from './page-load';
import { provideIdentity } from './provide-identity';
import { SessionActions } from './session.actions';
import { hasRole, signedIn, signedOut } from './session.guards';
import { selectPerson, selectSignIn } from './session.reducer';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class AnyPage {}

const person = (id = '1') => ({
  id: `019af000-0000-7000-8000-00000000000${id}`,
  name: 'Jo Marsh',
  email: 'jo@anchor.example',
  roles: ['buyer'],
  customerId: '019af000-0000-7000-8000-000000000009',
  customerName: 'The Blue Anchor',
  sites: '*',
});
const session = (accessToken = 'token-1', id = '1') => ({ accessToken, expiresInSeconds: 600, person: person(id) });
const settle = () => new Promise((resolve) => setTimeout(resolve));

let http: HttpTestingController;
let loads: string[];

beforeEach(() => {
  loads = [];
  const load = (address: string) => void loads.push(address);
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideStore(),
      provideEffects(),
      { provide: PageLoad, useValue: { inside: load, outside: load } },
      provideRouter([
        { path: 'sign-in', component: AnyPage, canActivate: [signedOut] },
        { path: 'orders', component: AnyPage, canActivate: [signedIn] },
        { path: 'team', component: AnyPage, canActivate: [signedIn, hasRole('buyer_owner')] },
        { path: '', pathMatch: 'full', component: AnyPage },
      ]),
      provideIdentity('storefront'),
    ],
  });
  http = TestBed.inject(HttpTestingController);
});
afterEach(() => http.verify());

/** Answers the renewal that waits; the lock and the promise around it take a turn. */
async function answerRefresh(answer: object, status = 200): Promise<void> {
  await settle();
  const options = status === 200 ? {} : { status, statusText: 'Refused' };
  http.expectOne('/api/v1/session/refresh').flush(answer, options);
  await settle();
}
const problem = (code: string) => ({ type: '', title: '', status: 401, detail: 'Said.', instance: '', code });
const signedInPerson = () => TestBed.inject(Store).selectSignal(selectPerson)();

describe('the start', () => {
  it('carries on the sign-in of before by the cookie', async () => {
    await answerRefresh({ session: session() });
    expect(signedInPerson()).toMatchObject({ name: 'Jo Marsh' });
    expect(TestBed.inject(ACCESS_TOKEN_SOURCE).current()).toBe('token-1');
  });

  it('lets guards wait for it', async () => {
    const harness = RouterTestingHarness.create('/orders?day=2026-12-04');
    await answerRefresh({ session: session() });
    await harness;
    expect(TestBed.inject(Router).url).toBe('/orders?day=2026-12-04');
  });

  it('sends those who are not signed in to the sign-in page, which keeps the address', async () => {
    const harness = RouterTestingHarness.create('/orders?day=2026-12-04');
    await answerRefresh({ session: null });
    await harness;
    const { queryParams } = TestBed.inject(Router).parseUrl(TestBed.inject(Router).url);
    expect(TestBed.inject(Router).url.startsWith('/sign-in?')).toBe(true);
    expect(queryParams['return']).toBe('/orders?day=2026-12-04');
  });

  it('sends those without the role to their first page', async () => {
    const harness = RouterTestingHarness.create('/team');
    await answerRefresh({ session: session() });
    await harness;
    expect(TestBed.inject(Router).url).toBe('/');
  });
});

describe('signing in', () => {
  const submit = () =>
    TestBed.inject(Store).dispatch(SessionActions.signInSubmitted({ email: 'jo@anchor.example', password: 'secret' }));

  it('goes on to the address that was asked for', async () => {
    const harness = RouterTestingHarness.create('/orders');
    await answerRefresh({ session: null });
    await harness;
    submit();
    const call = http.expectOne({ method: 'POST', url: '/api/v1/session' });
    expect(call.request.body).toEqual({ application: 'storefront', email: 'jo@anchor.example', password: 'secret' });
    call.flush(session());
    await settle();
    expect(TestBed.inject(Router).url).toBe('/orders');
  });

  it('never leaves this application for a prepared address', async () => {
    await answerRefresh({ session: null });
    await RouterTestingHarness.create('/sign-in?return=//elsewhere.example');
    submit();
    http.expectOne({ method: 'POST', url: '/api/v1/session' }).flush(session());
    await settle();
    expect(TestBed.inject(Router).url).toBe('/');
    expect(loads).toEqual([]);
  });

  it('shows what was refused', async () => {
    await answerRefresh({ session: null });
    submit();
    http
      .expectOne({ method: 'POST', url: '/api/v1/session' })
      .flush(problem('sign-in-refused'), { status: 401, statusText: 'Unauthorized' });
    await settle();
    const shown = TestBed.inject(Store).selectSignal(selectSignIn)();
    expect(shown).toMatchObject({ submitting: false, problem: { detail: 'Said.' } });
  });
});

describe('renewing', () => {
  it('asks once for all calls that were refused, and repeats each with the new token', async () => {
    await answerRefresh({ session: session('old') });
    const api = TestBed.inject(ApiClient);
    const names: string[] = [];
    for (let calls = 0; calls < 2; calls++) api.call(getMe, {}).subscribe(({ name }) => names.push(name));
    for (const call of http.match('/api/v1/session/me'))
      call.flush(problem('not-signed-in'), { status: 401, statusText: 'Unauthorized' });
    await answerRefresh({ session: session('new') });
    const repeated = http.match('/api/v1/session/me');
    expect(repeated.map(({ request }) => request.headers.get('authorization'))).toEqual(['Bearer new', 'Bearer new']);
    for (const call of repeated) call.flush({ ...person(), rowVersion: 1 });
    expect(names).toEqual(['Jo Marsh', 'Jo Marsh']);
  });

  it('sends no refused token along when it asks for a new one', async () => {
    await answerRefresh({ session: session('refused') });
    TestBed.inject(ACCESS_TOKEN_SOURCE).renew().subscribe();
    await settle();
    const call = http.expectOne('/api/v1/session/refresh');
    expect(call.request.headers.has('authorization')).toBe(false);
    call.flush({ session: session() });
    await settle();
  });

  it('asks to sign in again when the sign-in has ended, and comes back to the page', async () => {
    await answerRefresh({ session: session() });
    await RouterTestingHarness.create('/orders');
    TestBed.inject(ACCESS_TOKEN_SOURCE).renew().subscribe();
    await answerRefresh(problem('session-ended'), 401);
    expect(signedInPerson()).toBeNull();
    expect(TestBed.inject(Router).url).toBe('/sign-in?return=%2Forders');
    expect(TestBed.inject(Store).selectSignal(selectSignIn)().ended).toBe(true);
  });

  it('keeps the sign-in when only the connection was lost', async () => {
    await answerRefresh({ session: session() });
    const failures: unknown[] = [];
    TestBed.inject(ACCESS_TOKEN_SOURCE)
      .renew()
      .subscribe({ error: (error: unknown) => failures.push(error) });
    await settle();
    http.expectOne('/api/v1/session/refresh').error(new ProgressEvent('offline'));
    await settle();
    expect(failures).toHaveLength(1);
    expect(signedInPerson()).not.toBeNull();
  });

  it('loads the page anew when somebody else signed in from another tab', async () => {
    await answerRefresh({ session: session() });
    TestBed.inject(ACCESS_TOKEN_SOURCE).renew().subscribe();
    await answerRefresh({ session: session('token-2', '2') });
    expect(loads).toEqual(['/']);
  });
});

it('signs out, forgets the token, and begins with an empty page', async () => {
  await answerRefresh({ session: session() });
  TestBed.inject(Store).dispatch(SessionActions.signOutAsked());
  http.expectOne({ method: 'DELETE', url: '/api/v1/session?application=storefront' }).flush(null);
  await settle();
  expect(TestBed.inject(ACCESS_TOKEN_SOURCE).current()).toBeNull();
  expect(signedInPerson()).toBeNull();
  expect(loads).toEqual(['/sign-in']);
});

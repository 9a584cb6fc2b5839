import { TestBed } from '@angular/core/testing';
import { provideStore, Store } from '@ngrx/store';
import { of } from 'rxjs';
import { AccountApi, SessionActions } from '@seamwright/identity/data-access';
import { Confirm } from '@seamwright/shared/ui';
import { MySessions } from './my-sessions';

const here = {
  id: 'here',
  application: 'storefront',
  device: 'Firefox/140.0 (Linux)',
  lastUsedAt: '2026-12-01T12:00:00Z',
  signedInAt: '2026-11-30T08:00:00Z',
  here: true,
};
const api = { sessions: jest.fn(), endSession: jest.fn(), signOutEverywhere: jest.fn() };
const confirm = { ask: jest.fn() };

async function open() {
  jest.resetAllMocks();
  api.sessions.mockReturnValue(of({ items: [here, { ...here, id: 'there', here: false }] }));
  api.endSession.mockReturnValue(of(undefined));
  api.signOutEverywhere.mockReturnValue(of(undefined));
  TestBed.configureTestingModule({
    providers: [provideStore(), { provide: AccountApi, useValue: api }, { provide: Confirm, useValue: confirm }],
  });
  const dispatched = jest.spyOn(TestBed.inject(Store), 'dispatch');
  const fixture = TestBed.createComponent(MySessions);
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const press = async (words: string) => {
    [...page.querySelectorAll('button')].find(({ textContent }) => textContent.includes(words))?.click();
    await fixture.whenStable();
  };
  return { page, press, dispatched };
}

it('lists the browsers, marks this one, and signs out another', async () => {
  const { page, press } = await open();
  expect(page.querySelectorAll('li')).toHaveLength(2);
  expect(page.querySelector('li')?.textContent).toContain('Firefox on Linux');
  expect(page.querySelector('li')?.textContent).toContain('this browser');
  await press('Sign out there');
  expect(api.endSession).toHaveBeenCalledWith('there');
  expect(api.sessions).toHaveBeenCalledTimes(2);
});

it('signs out everywhere only when sure', async () => {
  const { press, dispatched } = await open();
  confirm.ask.mockResolvedValueOnce(false);
  await press('Sign out everywhere');
  expect(api.signOutEverywhere).not.toHaveBeenCalled();
  confirm.ask.mockResolvedValueOnce(true);
  await press('Sign out everywhere');
  expect(api.signOutEverywhere).toHaveBeenCalledTimes(1);
  expect(dispatched).toHaveBeenCalledWith(SessionActions.signOutAsked());
});

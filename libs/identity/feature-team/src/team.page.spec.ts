import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of } from 'rxjs';
import { CustomersApi, PeopleApi, SessionApiActions, sessionFeature } from '@seamwright/identity/data-access';
import { TeamPage } from './team.page';

const customerId = '019af000-0000-7000-8000-000000000001';

it('shows an account owner the colleagues and addresses of the own customer', async () => {
  const people = { list: jest.fn().mockReturnValue(of({ items: [], nextCursor: null })) };
  const customers = {
    sites: jest
      .fn()
      .mockReturnValue(of([{ id: 'harbour', name: 'Harbour', address: '1 Quay', postcode: 'HS1', active: true }])),
  };
  TestBed.configureTestingModule({
    providers: [
      provideRouter([]),
      provideStore(),
      provideState(sessionFeature),
      { provide: PeopleApi, useValue: people },
      { provide: CustomersApi, useValue: customers },
    ],
  });
  const person = {
    id: '019af000-0000-7000-8000-000000000002',
    name: 'Olive Owner',
    email: 'owner@anchor.example',
    roles: ['buyer_owner' as const],
    customerId,
    customerName: 'The Blue Anchor',
    sites: '*' as const,
  };
  TestBed.inject(Store).dispatch(SessionApiActions.signedIn({ person }));
  const fixture = TestBed.createComponent(TeamPage);
  await fixture.whenStable();
  const text = (fixture.nativeElement as HTMLElement).textContent;
  expect(people.list).toHaveBeenCalledWith({ customerId });
  expect(customers.sites).toHaveBeenCalledWith(customerId);
  expect(text).toContain('The Blue Anchor');
  expect(text).toContain('Harbour');
  expect(text).toContain('Invite those who order with you.');
});

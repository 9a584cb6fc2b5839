import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideState, provideStore, Store } from '@ngrx/store';
import { SessionApiActions, sessionFeature } from '@seamwright/identity/data-access/session';
import type { Role } from '@seamwright/shared/contracts';
import { boardsOf } from './home-boards';
import { HomePage } from './home.page';

async function open(...roles: Role[]) {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      provideStore(),
      provideState(sessionFeature),
    ],
  });
  const person = { id: 'p', name: 'Tamsin Vale', email: 't@x.example', customerId: null, customerName: null };
  TestBed.inject(Store).dispatch(SessionApiActions.restored({ person: { ...person, roles, sites: '*' } }));
  const fixture = TestBed.createComponent(HomePage);
  await fixture.whenStable();
  return { fixture, page: fixture.nativeElement as HTMLElement, http: TestBed.inject(HttpTestingController) };
}

describe('the first page', () => {
  it('greets by name, and shows what waits under its heading, with the places below', async () => {
    const { fixture, page, http } = await open('admin');
    expect(page.querySelector('h1')?.textContent).toBe('Good day, Tamsin');
    expect(page.querySelectorAll('sw-loading')).toHaveLength(2);
    http.expectOne('/api/v1/delivery-calendar').flush({ timeZone: 'Europe/London', zones: [], closures: [] });
    http.expectOne(({ url }) => url === '/api/v1/people').flush({ items: [], nextCursor: null });
    await fixture.whenStable();
    expect(page.textContent).toContain('Everybody who was invited has joined.');
    expect(page.textContent).toContain('No closure is planned.');
    expect([...page.querySelectorAll('.places a')].map((link) => link.getAttribute('href'))).toContain('/calendar');
    http.verify();
  });

  it('says when a question failed, and asks it again', async () => {
    const { fixture, page, http } = await open('floor');
    const days = '/api/v1/cutting-days?state=released';
    http.expectOne(days).flush({}, { status: 500, statusText: 'x' });
    await fixture.whenStable();
    page.querySelector<HTMLButtonElement>('sw-error button')?.click();
    http.expectOne(days).flush({ items: [], nextCursor: null });
    await fixture.whenStable();
    expect(page.querySelector('sw-error')).toBeNull();
    expect(page.textContent).toContain('Nothing is left to pack.');
  });

  it('shows a board once to somebody with two roles that share it', () => {
    const both = boardsOf(['planner', 'rep']);
    expect(new Set(both).size).toBe(both.length);
    expect(both).toHaveLength(4);
    expect(boardsOf(['buyer'])).toEqual([]);
  });
});

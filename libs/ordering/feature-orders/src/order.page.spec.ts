import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { EMPTY } from 'rxjs';
import { ordersEffects, ordersFeature } from '@seamwright/ordering/data-access';
import { LiveEvents } from '@seamwright/shared/data-access';
import { OrderPage } from './order.page';

const total = { netMinor: 6720, taxMinor: 0, totalMinor: 6720 };
const declined = {
  id: 'a',
  rowVersion: 4,
  number: 1066,
  customer: { id: 'c', name: 'The Heron Rooms' },
  site: { id: 's', name: 'Heron kitchen' },
  deliveryDay: '2026-12-02',
  stage: 'waiting',
  source: 'storefront',
  settlement: 'card',
  currency: 'GBP',
  customerReference: '',
  placedAt: '2026-12-01T12:00:00.000Z',
  waitingFor: ['payment'],
  note: '',
  placedBy: 'Buyer',
  cutOffAt: '2026-12-01T16:00:00.000Z',
  mayCancel: true,
  cancelledBecause: null,
  releasedAt: null,
  packedAt: null,
  cancelledAt: null,
  deliveryChargeMinor: 650,
  deliveryTaxPpm: 0,
  totals: { min: total, estimate: total, max: total, packed: null },
  payment: { state: 'declined', holdMinor: 7706, capturedMinor: 0, declineCode: 'insufficient_funds' },
  lines: [],
  history: [],
};
const visa = { id: 'visa', brand: 'visa', last4: '4242', expires: '08/29' };

async function opened(order: object) {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      provideStore(),
      provideState(ordersFeature),
      provideEffects(ordersEffects),
      { provide: LiveEvents, useValue: { changes: () => EMPTY } },
    ],
  });
  const http = TestBed.inject(HttpTestingController);
  const fixture = TestBed.createComponent(OrderPage);
  fixture.componentRef.setInput('orderId', 'a');
  const page: HTMLElement = fixture.nativeElement;
  const settled = () => fixture.whenStable();
  await settled();
  http.expectOne('/api/v1/orders/a').flush(order);
  await settled();
  const headings = () => [...page.querySelectorAll('h2')].map(({ textContent }) => textContent?.trim());
  const button = (words: string) =>
    [...page.querySelectorAll('button')].find(({ textContent }) => textContent?.includes(words));
  const text = () => (page.textContent ?? '').replace(/\s+/g, ' ');
  return { http, page, settled, headings, button, text };
}

describe('the page of an order', () => {
  it('whose card was declined says why, and has another one asked at the version that is shown', async () => {
    const { http, page, settled, headings, button, text } = await opened(declined);
    http.expectOne('/api/v1/cards').flush({ items: [visa] });
    await settled();
    expect(headings().indexOf('Payment')).toBeLessThan(headings().indexOf('What it comes to'));
    expect(text()).toContain('Why: not enough money on the card.');
    page.querySelector<HTMLInputElement>('input[type=radio]')?.click();
    await settled();
    button('Pay with this card')?.click();
    await settled();
    const sent = http.expectOne({ method: 'POST', url: '/api/v1/orders/a/card' });
    expect([sent.request.body, sent.request.headers.get('if-match')]).toEqual([{ cardId: 'visa' }, '"4"']);
    expect(button('Asking the bank…')?.disabled).toBe(true);
    sent.flush({ ...declined, rowVersion: 5, payment: { ...declined.payment, state: 'started', declineCode: null } });
    await settled();
    expect(text()).toContain('Card being asked');
    expect(text()).not.toContain('Pay with another card');
  });

  it('says when it changed meanwhile, and keeps what is shown', async () => {
    const { http, page, settled, button, text } = await opened(declined);
    http.expectOne('/api/v1/cards').flush({ items: [visa] });
    await settled();
    page.querySelector<HTMLInputElement>('input[type=radio]')?.click();
    await settled();
    button('Pay with this card')?.click();
    await settled();
    const problem = { type: '', title: 'Changed', status: 412, detail: '', instance: '', code: 'stale', errors: [] };
    http.expectOne('/api/v1/orders/a/card').flush(problem, { status: 412, statusText: 'Precondition Failed' });
    await settled();
    expect(text()).toContain('This order changed since you opened it.');
    expect(text()).toContain('Card declined');
  });

  it('that is confirmed asks for no card', async () => {
    const { http, headings, text } = await opened({ ...declined, stage: 'confirmed', waitingFor: [], payment: null });
    http.expectNone('/api/v1/cards');
    expect(headings().indexOf('Payment')).toBeGreaterThan(headings().indexOf('What it comes to'));
    expect(text()).not.toContain('Pay with another card');
  });
});

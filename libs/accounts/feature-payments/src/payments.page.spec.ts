import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { NEVER } from 'rxjs';
import type { PaymentWire } from '@seamwright/accounts/contracts';
import { paymentsEffects, paymentsFeature } from '@seamwright/accounts/data-access';
import { LiveEvents } from '@seamwright/shared/data-access';
import { PaymentsPage } from './payments.page';

const HOUR_MS = 3_600_000;
const payment = (id: string, change: Partial<PaymentWire> = {}): PaymentWire => ({
  id,
  customer: { id: 'pub', name: 'Test pub' },
  order: { id: 'o1', number: 1_032 },
  state: 'pre-authorised',
  currency: 'GBP',
  holdMinor: 12_000,
  capturedMinor: 0,
  letGoMinor: null,
  holdEndsAt: new Date(Date.now() + 200 * HOUR_MS).toISOString(),
  declineCode: null,
  actionUrl: null,
  processorIntentId: 'pi_1',
  processorChargeId: null,
  createdAt: '2026-11-30T09:05:00Z',
  capturedAt: null,
  ...change,
});

describe('the page of card payments', () => {
  let http: HttpTestingController;

  async function opened(inputs: Record<string, string>, url: string, items: PaymentWire[], nextCursor: string | null) {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([]),
        provideStore(),
        provideState(paymentsFeature),
        provideEffects(paymentsEffects),
        { provide: LiveEvents, useValue: { changes: () => NEVER } },
      ],
    });
    http = TestBed.inject(HttpTestingController);
    const fixture = TestBed.createComponent(PaymentsPage);
    for (const [name, value] of Object.entries(inputs)) fixture.componentRef.setInput(name, value);
    await fixture.whenStable();
    http.expectOne(url).flush({ items, nextCursor });
    await fixture.whenStable();
    const page: HTMLElement = fixture.nativeElement;
    const words = () => (page.textContent ?? '').replace(/\s+/g, ' ');
    return { fixture, page, words };
  }

  it('marks the holds that end soon, and only those', async () => {
    const soon = payment('soon', { holdEndsAt: new Date(Date.now() + 20 * HOUR_MS).toISOString() });
    const { page } = await opened({}, '/api/v1/payments', [soon, payment('later')], null);
    const chips = [...page.querySelectorAll('sw-chip')].map((chip) => (chip.textContent ?? '').trim());
    expect(chips.filter((chip) => chip.startsWith('hold ends'))).toHaveLength(1);
    expect(page.querySelector('td a')?.getAttribute('href')).toBe('/orders/o1');
  });

  it('narrows by state and order, and says when there is none', async () => {
    const { words } = await opened(
      { state: 'declined', orderId: 'o1' },
      '/api/v1/payments?state=declined&orderId=o1',
      [],
      null,
    );
    expect(words()).toContain('No such card payment');
    expect(words()).toContain('Show all orders');
  });

  it('looks further back for the payment that the address names', async () => {
    const { fixture, words } = await opened({ payment: 'old' }, '/api/v1/payments', [payment('new')], 'next');
    const old = payment('old', { state: 'declined', declineCode: 'insufficient_funds' });
    http.expectOne('/api/v1/payments?cursor=next').flush({ items: [old], nextCursor: null });
    await fixture.whenStable();
    expect(words()).toContain('not enough money on the card');
  });

  it('says when the payment that the address names is nowhere', async () => {
    const { words } = await opened({ payment: 'none' }, '/api/v1/payments', [payment('new')], null);
    expect(words()).toContain('The payment that was looked for is not among these.');
  });
});

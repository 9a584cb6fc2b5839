import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { LOCALE_ID } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { NEVER } from 'rxjs';
import type { QuoteDetail } from '@seamwright/pricing/contracts';
import { quotesEffects, quotesFeature } from '@seamwright/pricing/data-access';
import { LiveEvents } from '@seamwright/shared/data-access';
import { Confirm, Toast, type ConfirmQuestion } from '@seamwright/shared/ui';
import { ReceivedQuotePage } from './received-quote.page';

const aQuote = (of: Partial<QuoteDetail> = {}): QuoteDetail => ({
  id: 'q1',
  rowVersion: 2,
  number: 201,
  customerId: 'pub',
  customerName: 'Test pub',
  state: 'sent',
  currency: 'GBP',
  pricesFrom: '2026-12-02',
  pricesUntil: '2026-12-31',
  answerBy: '2026-12-11',
  createdAt: '2026-12-01T12:00:00.000Z',
  sentAt: '2026-12-01T12:05:00.000Z',
  decidedAt: null,
  notes: 'As spoken.',
  writtenBy: 'Rae Rep',
  decidedBy: null,
  lines: [
    {
      id: 'l1',
      specificationId: 's1',
      code: 'LM-901',
      name: 'Boneless shoulder',
      summary: '3 mm fat',
      chosen: { trim: '3' },
      choiceKey: 'trim=3',
      basis: 'kg',
      priceMinor: 980,
      caseWeights: { pieces: 4, cases: 1, minGrams: 7_600, estimateGrams: 8_000, maxGrams: 8_400 },
      caseAmounts: { minMinor: 7_448, estimateMinor: 7_840, maxMinor: 8_232 },
    },
  ],
  ...of,
});

describe('answering a quote', () => {
  const asked: ConfirmQuestion[] = [];
  let agrees = true;

  async function opened(quote = aQuote()) {
    asked.length = 0;
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([]),
        provideStore(),
        { provide: LOCALE_ID, useValue: 'en-GB' },
        provideState(quotesFeature),
        provideEffects(quotesEffects),
        { provide: LiveEvents, useValue: { changes: () => NEVER } },
        { provide: Confirm, useValue: { ask: async (question: ConfirmQuestion) => (asked.push(question), agrees) } },
        { provide: Toast, useValue: { show: async () => false } },
      ],
    });
    const http = TestBed.inject(HttpTestingController);
    const fixture = TestBed.createComponent(ReceivedQuotePage);
    fixture.componentRef.setInput('quoteId', 'q1');
    await fixture.whenStable();
    http.expectOne('/api/v1/quotes/q1').flush(quote);
    await fixture.whenStable();
    const page: HTMLElement = fixture.nativeElement;
    const press = async (words: string) => {
      const button = [...page.querySelectorAll('button')].find(({ textContent }) => textContent?.includes(words));
      button?.click();
      await fixture.whenStable();
    };
    return { fixture, http, page, press };
  }

  it('shows the prices with what a case weighs and costs, and what accepting means', async () => {
    const { page } = await opened();
    const words = page.textContent?.replace(/\s+/g, ' ') ?? '';
    expect(words).toContain('Quote 201');
    expect(words).toMatch(/Boneless shoulder\s*LM-901 · 3 mm fat/);
    expect(words).toContain('£9.80/kg');
    expect(words).toMatch(/≈ 8\.000.kg/);
    expect(words).toContain('Nothing is ordered by accepting.');
  });

  it('accepts only after the buyer confirmed, and then shows the agreement', async () => {
    agrees = true;
    const { fixture, http, page, press } = await opened();
    await press('Accept these prices');
    expect(asked[0]?.text).toMatch(/2 Dec.*31 Dec/);
    const sent = http.expectOne('/api/v1/quotes/q1/accept');
    expect(sent.request.headers.get('if-match')).toBe('"2"');
    sent.flush(aQuote({ state: 'accepted', rowVersion: 3, decidedAt: '2026-12-02T09:00:00.000Z', decidedBy: 'Paul' }));
    await fixture.whenStable();
    expect(page.textContent).toContain('Agreed for deliveries');
    expect(page.textContent).not.toContain('Accept these prices');
  });

  it('does nothing when the buyer thinks again', async () => {
    agrees = false;
    const { http, press } = await opened();
    await press('Decline');
    expect(asked[0]?.destructive).toBe(true);
    http.expectNone('/api/v1/quotes/q1/decline');
  });

  it('says why a late answer was refused, beside the quote', async () => {
    agrees = true;
    const { fixture, http, page, press } = await opened();
    await press('Accept these prices');
    http.expectOne('/api/v1/quotes/q1/accept').flush(
      {
        type: '/problems/quote-expired',
        title: 'Conflict',
        status: 409,
        detail: 'This quote could be answered until 11 Dec. Ask your rep for a new one.',
        instance: '',
        code: 'quote-expired',
        errors: [],
      },
      { status: 409, statusText: 'Conflict' },
    );
    await fixture.whenStable();
    expect(page.querySelector('[role=alert]')?.textContent).toContain('could be answered until');
    expect(page.textContent).toContain('Boneless shoulder');
  });

  it('offers no answer to a quote that has one', async () => {
    const { page } = await opened(aQuote({ state: 'expired' }));
    expect(page.textContent).toContain('Ask your rep for a new one.');
    expect([...page.querySelectorAll('button')].map((button) => button.textContent?.trim())).not.toContain('Decline');
  });
});

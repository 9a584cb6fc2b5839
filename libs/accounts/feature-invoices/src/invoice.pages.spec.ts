import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { NEVER } from 'rxjs';
import type { InvoiceDetail, InvoiceListItem } from '@seamwright/accounts/contracts';
import { invoicesEffects, invoicesFeature } from '@seamwright/accounts/data-access';
import { LiveEvents } from '@seamwright/shared/data-access';
import { creditorReference } from '@seamwright/shared/util';
import { BuyerInvoicePage } from './buyer-invoice.page';
import { BuyerInvoicesPage } from './buyer-invoices.page';
import { DeskInvoicePage } from './desk-invoice.page';

const head: InvoiceListItem = {
  id: 'i1',
  number: 2_291,
  customer: { id: 'pub', name: 'Test pub' },
  order: { id: 'o1', number: 1_032 },
  deliveryDay: '2026-12-02',
  issuedOn: '2026-12-01',
  dueOn: '2026-12-15',
  standing: 'open',
  currency: 'GBP',
  netMinor: 7_370,
  taxMinor: 130,
  totalMinor: 7_500,
  paidMinor: 0,
};
const invoice: InvoiceDetail = {
  ...head,
  reference: creditorReference('2291'),
  billingAddress: '1 High Street',
  lines: [
    {
      position: 1,
      description: 'BF-901 Steak, 280 g',
      packs: 2,
      pieces: 10,
      netGrams: 2_800,
      basis: 'kg',
      quantity: 2_800,
      priceMinor: 2_400,
      taxPpm: 0,
      netMinor: 6_720,
    },
    {
      position: 2,
      description: 'Delivery',
      packs: 0,
      pieces: 0,
      netGrams: 0,
      basis: 'delivery',
      quantity: 1,
      priceMinor: 650,
      taxPpm: 200_000,
      netMinor: 650,
    },
  ],
  taxes: [
    { taxPpm: 0, netMinor: 6_720, taxMinor: 0 },
    { taxPpm: 200_000, netMinor: 650, taxMinor: 130 },
  ],
  payment: null,
};

describe('invoices on screen', () => {
  let http: HttpTestingController;

  function begin() {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([]),
        provideStore(),
        provideState(invoicesFeature),
        provideEffects(invoicesEffects),
        { provide: LiveEvents, useValue: { changes: () => NEVER } },
      ],
    });
    http = TestBed.inject(HttpTestingController);
  }
  const wordsOf = (element: Element) => (element.textContent ?? '').replace(/\s+/g, ' ');

  it('list what stands how, each leading to its page', async () => {
    begin();
    const fixture = TestBed.createComponent(BuyerInvoicesPage);
    fixture.componentRef.setInput('standing', 'open');
    await fixture.whenStable();
    http.expectOne('/api/v1/invoices?standing=open').flush({ items: [head], nextCursor: null });
    await fixture.whenStable();
    const page: HTMLElement = fixture.nativeElement;
    expect(page.querySelector('td a')?.getAttribute('href')).toBe('/invoices/i1');
    expect(wordsOf(page)).toContain('To be paid');
    expect(wordsOf(page)).toContain('£75.00');
  });

  it('show real weights, tax by rate and what is left to pay', async () => {
    begin();
    const fixture = TestBed.createComponent(BuyerInvoicePage);
    fixture.componentRef.setInput('invoiceId', 'i1');
    await fixture.whenStable();
    http.expectOne('/api/v1/invoices/i1').flush(invoice);
    await fixture.whenStable();
    const page: HTMLElement = fixture.nativeElement;
    expect(wordsOf(page)).toMatch(/BF-901 Steak, 280 g ?2 ?10 ?2\.800 ?£24\.00\/kg/);
    expect(wordsOf(page)).toMatch(/VAT 20.?% on £6\.50 ?£1\.30/);
    expect(wordsOf(page)).toMatch(/Left to pay ?£75\.00/);
    expect(wordsOf(page)).toContain('On account');
  });

  it('keep the page when the paper can’t be had, and say why', async () => {
    begin();
    const fixture = TestBed.createComponent(BuyerInvoicePage);
    fixture.componentRef.setInput('invoiceId', 'i1');
    await fixture.whenStable();
    http.expectOne('/api/v1/invoices/i1').flush(invoice);
    await fixture.whenStable();
    const page: HTMLElement = fixture.nativeElement;
    const buttons = [...page.querySelectorAll<HTMLButtonElement>('button')];
    buttons.find((button) => wordsOf(button).includes('Download as PDF'))?.click();
    http.expectOne('/api/v1/invoices/i1/paper').error(new ProgressEvent('error'));
    // A failed download is read before it is told.
    await new Promise((resolve) => setTimeout(resolve));
    await fixture.whenStable();
    expect(wordsOf(page)).toContain('No connection');
    expect(wordsOf(page)).toContain('Invoice 2291');
  });

  it('show the desk what was posted, and again when something was paid', async () => {
    begin();
    const fixture = TestBed.createComponent(DeskInvoicePage);
    fixture.componentRef.setInput('invoiceId', 'i1');
    await fixture.whenStable();
    http.expectOne('/api/v1/invoices/i1').flush(invoice);
    await fixture.whenStable();
    const line = { customerName: null, invoiceNumber: null, currency: 'GBP', debitMinor: 0, creditMinor: 0 };
    const entry = {
      id: 'e',
      number: 7,
      postedOn: '2026-12-01',
      kind: 'invoice',
      sourceKey: 'invoice:i1',
      text: 'Invoice 2291',
      lines: [
        { ...line, account: 'receivables', debitMinor: 7_500 },
        { ...line, account: 'sales', creditMinor: 7_370 },
        { ...line, account: 'tax', creditMinor: 130 },
      ],
    };
    const postings = http.expectOne((request) => request.url === '/api/v1/ledger/entries');
    expect(postings.request.params.get('invoiceId')).toBe('i1');
    postings.flush({ items: [entry], nextCursor: null });
    await fixture.whenStable();
    expect(wordsOf(fixture.nativeElement)).toMatch(/Both sides are the same ?£75\.00 ?£75\.00/);
  });
});

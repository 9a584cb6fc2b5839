import { computed, inject } from '@angular/core';
import { Store } from '@ngrx/store';
import type { InvoiceDetail } from '@seamwright/accounts/contracts';
import { InvoicePageActions, invoicesFeature } from '@seamwright/accounts/data-access';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';

/** What both pages of an invoice show and do. Call it where injection is possible. */
export function invoiceView(invoiceId: () => string) {
  const store = inject(Store);
  const paper = store.selectSignal(invoicesFeature.selectPaper);
  return {
    invoice: store.selectSignal(invoicesFeature.selectInvoice),
    paperProblem: computed(() => paper().problem),
    fetching: computed(() => paper().running),
    currency: HOUSE_CURRENCY,
    crumbs: [{ label: $localize`:@@invoice.crumb:Invoices`, path: '/invoices' }],
    heading: ({ number }: InvoiceDetail): string => $localize`:@@invoice.heading:Invoice ${String(number)}:number:`,
    fetchPaper: () => store.dispatch(InvoicePageActions.paperWanted({ invoiceId: invoiceId() })),
  };
}

import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { InvoiceDetail, InvoiceListItem, LedgerEntry } from '@seamwright/accounts/contracts';
import type { InvoiceStanding } from '@seamwright/accounts/domain';
import type { Problem } from '@seamwright/shared/contracts';

/** Which invoices a list shows; null for all. */
export interface InvoiceSearch {
  readonly standing: InvoiceStanding | null;
  readonly customerId: string | null;
}

export const InvoiceListPageActions = createActionGroup({
  source: 'Invoice List Page',
  events: { Opened: props<{ search: InvoiceSearch }>(), 'More Wanted': emptyProps() },
});

export const InvoicePageActions = createActionGroup({
  source: 'Invoice Page',
  events: {
    Opened: props<{ invoiceId: string }>(),
    /** Accounts also see what the invoice posted. */
    'Postings Wanted': props<{ invoiceId: string }>(),
    'Paper Wanted': props<{ invoiceId: string }>(),
  },
});

export const InvoicesApiActions = createActionGroup({
  source: 'Invoices API',
  events: {
    'List Loaded': props<{ items: InvoiceListItem[]; nextCursor: string | null; first: boolean }>(),
    'List Failed': props<{ problem: Problem }>(),
    Loaded: props<{ invoice: InvoiceDetail }>(),
    Failed: props<{ problem: Problem }>(),
    'Postings Loaded': props<{ invoiceId: string; entries: LedgerEntry[] }>(),
    'Postings Failed': props<{ problem: Problem }>(),
    'Paper Given': emptyProps(),
    'Paper Failed': props<{ problem: Problem }>(),
  },
});

export const InvoicesLiveActions = createActionGroup({
  source: 'Invoices Live',
  events: {
    /** An invoice was made or a payment moved somewhere. */
    Changed: emptyProps(),
  },
});

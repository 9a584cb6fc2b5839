import { INVOICE_STANDINGS, type InvoiceStanding } from '@seamwright/accounts/domain';
import { standingWords } from '@seamwright/accounts/ui';

/** What a list of invoices can be narrowed to; the empty value stands for all. */
export const standingFilters = [
  { value: '', label: $localize`:@@invoices.filter.all:All` },
  ...INVOICE_STANDINGS.map((standing) => ({ value: standing, label: standingWords(standing).word })),
];

/** A standing as it stands in an address; null for anything else. */
export const standingOf = (text: string | undefined): InvoiceStanding | null =>
  INVOICE_STANDINGS.find((standing) => standing === text) ?? null;

import type { InvoiceBasis, InvoiceStanding } from '@seamwright/accounts/domain';
import type { ChipTone } from '@seamwright/shared/ui';

const STANDINGS: Readonly<Record<InvoiceStanding, { readonly tone: ChipTone; readonly word: string }>> = {
  open: { tone: 'info', word: $localize`:@@accounts.standing.open:To be paid` },
  'part-paid': { tone: 'eye', word: $localize`:@@accounts.standing.partPaid:Paid in part` },
  paid: { tone: 'ok', word: $localize`:@@accounts.standing.paid:Paid` },
  overdue: { tone: 'bad', word: $localize`:@@accounts.standing.overdue:Overdue` },
};

/** How an invoice stands, and how it is meant. */
export const standingWords = (standing: InvoiceStanding) => STANDINGS[standing];

const BASES: Readonly<Record<InvoiceBasis, string>> = {
  kg: $localize`:@@accounts.basis.kg:kg`,
  piece: $localize`:@@accounts.basis.piece:piece`,
  case: $localize`:@@accounts.basis.case:case`,
  delivery: '',
};

/** What a price is for; nothing for a delivery. */
export const basisWord = (basis: InvoiceBasis): string => BASES[basis];

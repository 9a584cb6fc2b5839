import type { InvoiceDraft } from '@seamwright/accounts/domain';
import type { Customer } from '@seamwright/identity/domain';
import type { Order } from '@seamwright/ordering/domain';
import { formatMoney, minorUnits, type CurrencyCode } from '@seamwright/shared/util';
import type { Seller } from './parts';

/** All that an invoice says, on paper and in its mail. */
export interface InvoicePaper extends InvoiceDraft {
  readonly number: number;
  readonly deliveryDay: string;
  readonly issuedOn: string;
  readonly dueOn: string;
  readonly currency: string;
  readonly reference: string;
  readonly customer: Pick<Customer, 'number' | 'name' | 'billingAddress' | 'vatNumber'>;
  readonly order: Pick<Order, 'number' | 'siteName' | 'customerReference' | 'settlement'>;
  readonly seller: Seller;
  /** What is being taken from the card, minor units; 0 when nothing is. */
  readonly fromCardMinor: number;
}

export const moneyOn =
  ({ currency }: Pick<InvoicePaper, 'currency'>) =>
  (minor: number): string =>
    formatMoney(minorUnits(minor), currency as CurrencyCode);

/** How it is paid, as known when it is made: from the card, on account, or some of both. */
export function paymentWords(paper: InvoicePaper, dueOn: string): readonly string[] {
  const money = moneyOn(paper);
  const { fromCardMinor } = paper;
  const { totalMinor } = paper.total;
  const due = totalMinor - fromCardMinor;
  const taken = $localize`${money(fromCardMinor)}:amount: is taken from the card that was held for this order.`;
  const toPay = $localize`Please pay ${money(due)}:amount: by ${dueOn}:day:.`;
  if (due === 0) return [taken, $localize`There is nothing left to pay.`];
  if (fromCardMinor > 0) return [taken, toPay];
  if (paper.order.settlement === 'card') return [$localize`The card could not be charged.`, toPay];
  return [toPay];
}

import { sumMoney, minorUnits, type MinorUnits } from '@seamwright/shared/util';
import type { Account } from './chart-of-accounts';

export const ENTRY_KINDS = [
  'invoice',
  'capture',
  'refund',
  'fee',
  'adjustment',
  'payout',
  'payout-failed',
  'payout-received',
] as const;
export type EntryKind = (typeof ENTRY_KINDS)[number];

/** One side of an entry: exactly one of debit and credit is above zero. Minor units. */
export interface JournalLine {
  readonly account: Account;
  readonly debitMinor: MinorUnits;
  readonly creditMinor: MinorUnits;
  readonly customerId: string | null;
  readonly invoiceId: string | null;
}

/** A balanced entry, keyed by the fact that it posts, so that the fact can't be posted twice. */
export interface JournalEntry {
  readonly kind: EntryKind;
  readonly sourceKey: string;
  readonly currency: string;
  readonly lines: readonly JournalLine[];
}

interface Owner {
  readonly customerId: string;
  readonly invoiceId: string | null;
}

/** A line for a signed amount: above zero is debited, below zero credited; none for zero. */
function line(account: Account, signedMinor: number, owner?: Owner): JournalLine[] {
  if (signedMinor === 0) return [];
  const size = minorUnits(Math.abs(signedMinor));
  return [
    {
      account,
      debitMinor: signedMinor > 0 ? size : minorUnits(0),
      creditMinor: signedMinor > 0 ? minorUnits(0) : size,
      customerId: owner?.customerId ?? null,
      invoiceId: owner?.invoiceId ?? null,
    },
  ];
}

/** Whether debits and credits are the same. */
export const balances = (lines: readonly JournalLine[]): boolean =>
  sumMoney(lines.map(({ debitMinor }) => debitMinor)) === sumMoney(lines.map(({ creditMinor }) => creditMinor));

export function postInvoice(
  invoice: Owner & {
    readonly invoiceId: string;
    readonly netMinor: number;
    readonly taxMinor: number;
    readonly currency: string;
  },
): JournalEntry {
  const { netMinor, taxMinor, currency } = invoice;
  return {
    kind: 'invoice',
    sourceKey: `invoice:${invoice.invoiceId}`,
    currency,
    lines: [
      ...line('receivables', netMinor + taxMinor, invoice),
      ...line('sales', -netMinor),
      ...line('tax', -taxMinor),
    ],
  };
}

/** Taken from a card for an invoice; the money is then with the processor. */
export function postCapture(
  capture: Owner & { readonly chargeId: string; readonly amountMinor: number; readonly currency: string },
): JournalEntry {
  return {
    kind: 'capture',
    sourceKey: `capture:${capture.chargeId}`,
    currency: capture.currency,
    lines: [...line('card-clearing', capture.amountMinor), ...line('receivables', -capture.amountMinor, capture)],
  };
}

/** Given back to a card: what the customer owed before, they owe again. `amountMinor` above zero. */
export function postRefund(
  refund: Owner & { readonly refundId: string; readonly amountMinor: number; readonly currency: string },
): JournalEntry {
  return {
    kind: 'refund',
    sourceKey: `refund:${refund.refundId}`,
    currency: refund.currency,
    lines: [...line('receivables', refund.amountMinor, refund), ...line('card-clearing', -refund.amountMinor)],
  };
}

/** What the processor keeps for one of its transactions; below zero when it gives a fee back. */
export function postFee(fee: {
  readonly transactionId: string;
  readonly feeMinor: number;
  readonly currency: string;
}): JournalEntry {
  return {
    kind: 'fee',
    sourceKey: `fee:${fee.transactionId}`,
    currency: fee.currency,
    lines: [...line('card-fees', fee.feeMinor), ...line('card-clearing', -fee.feeMinor)],
  };
}

/**
 * Money that moved at the processor and that nothing of ours explains. It is kept apart until somebody has looked at
 * it, so that the clearing account still equals the processor's balance. `amountMinor` as it changed that balance.
 */
export function postAdjustment(moved: {
  readonly transactionId: string;
  readonly amountMinor: number;
  readonly currency: string;
}): JournalEntry {
  return {
    kind: 'adjustment',
    sourceKey: `adjustment:${moved.transactionId}`,
    currency: moved.currency,
    lines: [...line('card-clearing', moved.amountMinor), ...line('card-adjustments', -moved.amountMinor)],
  };
}

interface PaidOut {
  readonly payoutId: string;
  readonly amountMinor: number;
  readonly currency: string;
}

/** On its way from the processor to the bank. */
export function postPayout(payout: PaidOut): JournalEntry {
  return {
    kind: 'payout',
    sourceKey: `payout:${payout.payoutId}`,
    currency: payout.currency,
    lines: [...line('cash-in-transit', payout.amountMinor), ...line('card-clearing', -payout.amountMinor)],
  };
}

/** It came back to the processor. */
export function postPayoutFailed(payout: PaidOut): JournalEntry {
  return {
    kind: 'payout-failed',
    sourceKey: `payout-failed:${payout.payoutId}`,
    currency: payout.currency,
    lines: [...line('card-clearing', payout.amountMinor), ...line('cash-in-transit', -payout.amountMinor)],
  };
}

/** It is at the bank; what the bank booked more or less than was sent is a difference to be looked at. */
export function postPayoutReceived(
  received: PaidOut & { readonly bankLineId: string; readonly bookedMinor: number },
): JournalEntry {
  return {
    kind: 'payout-received',
    sourceKey: `payout-received:${received.bankLineId}`,
    currency: received.currency,
    lines: [
      ...line('bank', received.bookedMinor),
      ...line('cash-in-transit', -received.amountMinor),
      ...line('bank-differences', received.amountMinor - received.bookedMinor),
    ],
  };
}

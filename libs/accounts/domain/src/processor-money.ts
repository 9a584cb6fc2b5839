/** One movement of our balance at the processor: `net = amount − fee`, minor units, below zero when money leaves. */
export interface ProcessorTransaction {
  readonly id: string;
  readonly type: string;
  /** The charge, refund or payout behind it. */
  readonly sourceId: string | null;
  readonly chargeId: string | null;
  readonly amountMinor: number;
  readonly feeMinor: number;
  readonly netMinor: number;
  readonly currency: string;
  readonly createdAt: Date;
  readonly availableAt: Date;
  /** The payout that it is part of; null while it is not paid out. */
  readonly payoutId: string | null;
}

export const PAYOUT_STATES = ['pending', 'in-transit', 'paid', 'failed', 'canceled'] as const;
export type PayoutState = (typeof PAYOUT_STATES)[number];

/** Money sent by the processor to our bank. */
export interface Payout {
  readonly id: string;
  readonly amountMinor: number;
  readonly currency: string;
  readonly state: PayoutState;
  readonly createdAt: Date;
  readonly arrivalOn: string;
}

export type TransactionKind = 'captured' | 'refunded' | 'paid-out' | 'payout-returned' | 'fee' | 'other';

const KINDS: Readonly<Record<string, TransactionKind>> = {
  charge: 'captured',
  payment: 'captured',
  refund: 'refunded',
  payment_refund: 'refunded',
  payout: 'paid-out',
  payout_failure: 'payout-returned',
  payout_cancel: 'payout-returned',
  stripe_fee: 'fee',
};

/** What a transaction of the processor's type is to us. */
export const transactionKind = (type: string): TransactionKind => KINDS[type] ?? 'other';

/** The parts of the card clearing account, each as a size above zero but `other`. Minor units. */
export interface ClearingParts {
  readonly capturedMinor: number;
  readonly refundedMinor: number;
  readonly feesMinor: number;
  readonly paidOutMinor: number;
  readonly returnedMinor: number;
  readonly otherMinor: number;
}

/** Adds transactions up by what they are. */
export function clearingParts(
  transactions: readonly Pick<ProcessorTransaction, 'type' | 'amountMinor' | 'feeMinor'>[],
): ClearingParts {
  const of = (kind: TransactionKind): number =>
    transactions
      .filter(({ type }) => transactionKind(type) === kind)
      .reduce((sum, { amountMinor }) => sum + amountMinor, 0);
  const kept = transactions.reduce((sum, { feeMinor }) => sum + feeMinor, 0);
  return {
    capturedMinor: of('captured'),
    refundedMinor: 0 - of('refunded'),
    feesMinor: kept - of('fee'),
    paidOutMinor: 0 - of('paid-out'),
    returnedMinor: of('payout-returned'),
    otherMinor: of('other'),
  };
}

/** `captured − refunds − fees − paid out + returned ± other`: what must be with the processor (domain: "Ledger"). */
export const clearingBalance = (parts: ClearingParts): number =>
  parts.capturedMinor -
  parts.refundedMinor -
  parts.feesMinor -
  parts.paidOutMinor +
  parts.returnedMinor +
  parts.otherMinor;

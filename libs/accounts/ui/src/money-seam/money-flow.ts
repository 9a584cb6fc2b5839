/**
 * A week of card money, from the cards to the bank. Whole minor units, each a size at or above zero but the balances
 * and `otherMinor`, which may be below it.
 */
export interface MoneyFlow {
  readonly capturedMinor: number;
  readonly refundedMinor: number;
  readonly feesMinor: number;
  readonly paidOutMinor: number;
  /** Paid out, but sent back to the processor. */
  readonly returnedMinor: number;
  /** What else moved there. */
  readonly otherMinor: number;
  /** At the processor before the week and after it. */
  readonly openingMinor: number;
  readonly closingMinor: number;
  /** Paid out of the week that is in the bank, as the bank booked it. */
  readonly inBankMinor: number;
  /** Paid out and not due at the bank yet. */
  readonly onItsWayMinor: number;
  /** What the bank has less, and more, than was paid out, unexplained. */
  readonly bankLessMinor: number;
  readonly bankMoreMinor: number;
  /** What cards and our books differ by. */
  readonly cardsDifferMinor: number;
}

export type FlowKey =
  | 'captured'
  | 'opening'
  | 'returned'
  | 'other'
  | 'refunds'
  | 'fees'
  | 'closing'
  | 'paid-out'
  | 'on-its-way'
  | 'bank'
  | 'cards-differ'
  | 'bank-less'
  | 'bank-more';

export interface FlowPart {
  readonly key: FlowKey;
  readonly minor: number;
}

const present = (parts: readonly FlowPart[]): FlowPart[] => parts.filter(({ minor }) => minor > 0);

/** What comes to the processor in the week, the cards first. What is below zero goes out instead. */
export const comesIn = (flow: MoneyFlow): FlowPart[] =>
  present([
    { key: 'captured', minor: flow.capturedMinor },
    { key: 'opening', minor: flow.openingMinor },
    { key: 'returned', minor: flow.returnedMinor },
    { key: 'other', minor: flow.otherMinor },
    { key: 'closing', minor: -flow.closingMinor },
  ]);

/** Where it goes, the bank first and the shortest way last. */
export const goesOut = (flow: MoneyFlow): FlowPart[] =>
  present([
    { key: 'paid-out', minor: flow.paidOutMinor },
    { key: 'closing', minor: flow.closingMinor },
    { key: 'opening', minor: -flow.openingMinor },
    { key: 'other', minor: -flow.otherMinor },
    { key: 'fees', minor: flow.feesMinor },
    { key: 'refunds', minor: flow.refundedMinor },
  ]);

/** What becomes of what was paid out. */
export const fromPaidOut = (flow: MoneyFlow): FlowPart[] =>
  present([
    { key: 'bank', minor: flow.inBankMinor - flow.bankMoreMinor },
    { key: 'on-its-way', minor: flow.onItsWayMinor },
    { key: 'bank-less', minor: flow.bankLessMinor },
  ]);

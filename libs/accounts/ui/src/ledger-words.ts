import type { Account, EntryKind } from '@seamwright/accounts/domain';

interface AccountWords {
  readonly name: string;
  /** What stands on it, in a few words. */
  readonly about: string;
}

const ACCOUNT_WORDS: Readonly<Record<Account, AccountWords>> = {
  receivables: {
    name: $localize`:@@accounts.account.receivables:Receivables`,
    about: $localize`:@@accounts.account.receivables.about:What customers owe`,
  },
  sales: {
    name: $localize`:@@accounts.account.sales:Sales`,
    about: $localize`:@@accounts.account.sales.about:What was invoiced, without tax`,
  },
  tax: {
    name: $localize`:@@accounts.account.tax:Tax`,
    about: $localize`:@@accounts.account.tax.about:What was invoiced for the tax office`,
  },
  'card-clearing': {
    name: $localize`:@@accounts.account.cardClearing:Card clearing`,
    about: $localize`:@@accounts.account.cardClearing.about:Taken from cards and still with the processor`,
  },
  'card-fees': {
    name: $localize`:@@accounts.account.cardFees:Card fees`,
    about: $localize`:@@accounts.account.cardFees.about:What the processor keeps`,
  },
  'card-adjustments': {
    name: $localize`:@@accounts.account.cardAdjustments:Card adjustments`,
    about: $localize`:@@accounts.account.cardAdjustments.about:Moved at the processor, and nothing of ours explains it`,
  },
  'cash-in-transit': {
    name: $localize`:@@accounts.account.cashInTransit:Cash in transit`,
    about: $localize`:@@accounts.account.cashInTransit.about:Paid out and not in the bank yet`,
  },
  bank: {
    name: $localize`:@@accounts.account.bank:Bank`,
    about: $localize`:@@accounts.account.bank.about:Payouts that the bank booked`,
  },
  'bank-differences': {
    name: $localize`:@@accounts.account.bankDifferences:Bank differences`,
    about: $localize`:@@accounts.account.bankDifferences.about:Booked by the bank as more or less than was sent`,
  },
};

/** What an account is called, and what stands on it. */
export const accountWords = (account: Account): AccountWords => ACCOUNT_WORDS[account];

const KIND_WORDS: Readonly<Record<EntryKind, string>> = {
  invoice: $localize`:@@accounts.entry.invoice:Invoice`,
  capture: $localize`:@@accounts.entry.capture:Taken from a card`,
  refund: $localize`:@@accounts.entry.refund:Refund`,
  fee: $localize`:@@accounts.entry.fee:Card fee`,
  adjustment: $localize`:@@accounts.entry.adjustment:Adjustment`,
  payout: $localize`:@@accounts.entry.payout:Payout`,
  'payout-failed': $localize`:@@accounts.entry.payoutFailed:Payout sent back`,
  'payout-received': $localize`:@@accounts.entry.payoutReceived:Payout in the bank`,
};

/** What an entry posts. */
export const entryWord = (kind: EntryKind): string => KIND_WORDS[kind];

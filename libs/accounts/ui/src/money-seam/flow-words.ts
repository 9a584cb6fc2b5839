import type { FlowKey } from './money-flow';

const WORDS: Readonly<Record<FlowKey, string>> = {
  captured: $localize`:@@moneySeam.captured:captured`,
  opening: $localize`:@@moneySeam.opening:from before`,
  returned: $localize`:@@moneySeam.returned:sent back`,
  other: $localize`:@@moneySeam.other:other`,
  refunds: $localize`:@@moneySeam.refunds:refunds`,
  fees: $localize`:@@moneySeam.fees:fees`,
  closing: $localize`:@@moneySeam.closing:still at the processor`,
  'paid-out': $localize`:@@moneySeam.paidOut:paid out`,
  'on-its-way': $localize`:@@moneySeam.onItsWay:on its way`,
  bank: $localize`:@@moneySeam.bank:in the bank`,
  'cards-differ': $localize`:@@moneySeam.cardsDiffer:unexplained`,
  'bank-less': $localize`:@@moneySeam.bankLess:unexplained, less`,
  'bank-more': $localize`:@@moneySeam.bankMore:unexplained, more`,
};

/** What a part of the flow is called. */
export const flowWord = (key: FlowKey): string => WORDS[key];

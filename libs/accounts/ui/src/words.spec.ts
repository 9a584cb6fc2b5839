import {
  ACCOUNTS,
  ENTRY_KINDS,
  EXCEPTION_CAUSES,
  EXCEPTION_KINDS,
  INVOICE_STANDINGS,
  LEGS,
} from '@seamwright/accounts/domain';
import { causeWords, exceptionWords, legWords } from './exception-words';
import { standingWords } from './invoice-words';
import { accountWords, entryWord } from './ledger-words';
import { declineWords } from './payment-words';

describe('the words of the books', () => {
  it('tell one thing from another', () => {
    const kinds: readonly (readonly string[])[] = [
      ACCOUNTS.map((account) => accountWords(account).name),
      ENTRY_KINDS.map(entryWord),
      EXCEPTION_KINDS.map((kind) => exceptionWords(kind).word),
      EXCEPTION_CAUSES.map(causeWords),
      LEGS.map(legWords),
      INVOICE_STANDINGS.map((standing) => standingWords(standing).word),
    ];
    for (const words of kinds) expect(new Set(words).size).toBe(words.length);
  });

  it('say why a card was declined, and do not guess', () => {
    expect(declineWords('insufficient_funds')).toBe('not enough money on the card');
    expect(declineWords('do_not_honor')).toBe('the bank did not say why');
  });
});

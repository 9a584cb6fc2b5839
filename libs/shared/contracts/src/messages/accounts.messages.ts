import type { MessageTable } from './message-table';

/** Why a bank refused a card, by the processor's code; what is not here is said in general. */
const DECLINES: Readonly<Record<string, () => string>> = {
  insufficient_funds: () => $localize`there is not enough money on it`,
  expired_card: () => $localize`it has expired`,
  incorrect_cvc: () => $localize`its security code is wrong`,
  authentication_required: () => $localize`the bank wants its holder to confirm`,
  authentication_not_completed: () => $localize`it was not confirmed with the bank`,
};

/** Refusals of accounts, put into words. */
export const accountsMessages = {
  'card-refused': (p) => {
    const why = DECLINES[String(p['reason'])]?.() ?? $localize`the bank did not say why`;
    return $localize`This card was refused: ${why}:why:. Use another one.`;
  },
  'card-not-added-yet': () => $localize`The card processor has not answered yet. The card appears here once it does.`,
  'card-not-kept': () => $localize`This card is not kept any more. Choose another one.`,
  'method-unknown': () => $localize`The card processor does not know this card. Enter it again.`,
  'processor-silent': () => $localize`The card processor does not answer right now. Try again in a moment.`,
  'signature-wrong': () => $localize`This was not signed by the card processor.`,
  'intent-not-ours': (p) => $localize`${p['intent']}:intent: is not the payment that was asked for.`,
  'statement-unreadable': () => $localize`This file can't be read as a statement. Save it as CSV with UTF-8 text.`,
  'statement-empty': () => $localize`There is no booking in this statement.`,
  'statement-too-long': (p) => $localize`At most ${p['most']}:most: bookings can be read at once. Split the file.`,
  'statement-column-missing': (p) =>
    $localize`There is no column headed “${p['column']}:column:”. A statement has Date, Description, Reference, and Amount or Debit and Credit.`,
  'statement-date': (p) => $localize`“${p['text']}:text:” is not a day. Write it as 2026-12-03 or 3/12/2026.`,
  'statement-amount': (p) => $localize`“${p['text']}:text:” is not an amount of money.`,
  'statement-amount-zero': () => $localize`A booking of nothing can't be taken.`,
  'statement-both-sides': () => $localize`A booking has a debit or a credit, not both.`,
  'statement-no-amount': () => $localize`A booking needs a debit or a credit.`,
  'statement-text-long': (p) => $localize`This text is too long: at most ${p['most']}:most: letters.`,
  'statement-has-faults': (p) => $localize`${p['count']}:count: cells can't be read, so nothing was taken.`,
  'statement-taken-already': () => $localize`This statement was taken already. Nothing was taken again.`,
} satisfies MessageTable;

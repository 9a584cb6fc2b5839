import type { PaymentState } from '@seamwright/accounts/domain';
import type { ChipTone } from '@seamwright/shared/ui';

interface StateWords {
  readonly tone: ChipTone;
  readonly word: string;
}

const STATES: Readonly<Record<PaymentState, StateWords>> = {
  started: { tone: 'eye', word: $localize`:@@accounts.payment.started:Being asked` },
  'needs-action': { tone: 'eye', word: $localize`:@@accounts.payment.needsAction:Bank asks its holder` },
  'pre-authorised': { tone: 'ok', word: $localize`:@@accounts.payment.held:Held` },
  declined: { tone: 'bad', word: $localize`:@@accounts.payment.declined:Declined` },
  capturing: { tone: 'info', word: $localize`:@@accounts.payment.capturing:Being taken` },
  captured: { tone: 'ok', word: $localize`:@@accounts.payment.captured:Taken` },
  releasing: { tone: 'info', word: $localize`:@@accounts.payment.releasing:Being let go` },
  released: { tone: 'plain', word: $localize`:@@accounts.payment.released:Let go` },
  failed: { tone: 'bad', word: $localize`:@@accounts.payment.failed:Not held` },
};

/** How a card payment stands, and how it is meant. */
export const paymentStateWords = (state: PaymentState): StateWords => STATES[state];

const DECLINES: Readonly<Record<string, string>> = {
  insufficient_funds: $localize`:@@accounts.decline.funds:not enough money on the card`,
  expired_card: $localize`:@@accounts.decline.expired:the card has expired`,
  incorrect_cvc: $localize`:@@accounts.decline.cvc:the security code is wrong`,
  authentication_required: $localize`:@@accounts.decline.confirm:the bank wants its holder to confirm`,
  authentication_not_completed: $localize`:@@accounts.decline.unconfirmed:it was not confirmed with the bank`,
};

/** Why nothing was held or taken, by the code of the processor. */
export const declineWords = (code: string): string =>
  DECLINES[code] ?? $localize`:@@accounts.decline.other:the bank did not say why`;

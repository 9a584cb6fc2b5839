import type { ErrorDetails } from './errors';

/** Why a card is refused, in the API's codes. */
export interface Decline {
  code: NonNullable<ErrorDetails['code']>;
  decline_code: string;
  message: string;
}

/** A documented test payment method and how its card behaves. */
export interface TestCard {
  brand: 'visa' | 'mastercard' | 'amex';
  last4: string;
  country: string;
  /** Refused when charged. */
  decline?: Decline;
  /** Refused by `decline` already when it is saved to a customer. */
  refusesSaving?: boolean;
  /** The bank wants its customer to confirm. */
  authentication?: boolean;
  /** A hold on it may be raised. */
  raisable?: boolean;
  /** Its money is available at once. */
  bypassesPending?: boolean;
}

export const genericDecline: Decline = {
  code: 'card_declined',
  decline_code: 'generic_decline',
  message: 'Your card was declined.',
};
export const authenticationDecline: Decline = {
  code: 'authentication_required',
  decline_code: 'authentication_required',
  message: 'Your card was declined. This transaction requires authentication.',
};

const visa = { brand: 'visa', country: 'US' } as const;

/** By method id, as the processor's testing guide names them. */
const testCards: Record<string, TestCard> = {
  pm_card_visa: { ...visa, last4: '4242', raisable: true },
  pm_card_mastercard: { brand: 'mastercard', country: 'US', last4: '4444', raisable: true },
  pm_card_amex: { brand: 'amex', country: 'US', last4: '0005' },
  pm_card_bypassPending: { ...visa, last4: '0077', bypassesPending: true },
  pm_card_visa_chargeDeclined: { ...visa, last4: '0002', decline: genericDecline, refusesSaving: true },
  pm_card_visa_chargeDeclinedInsufficientFunds: {
    ...visa,
    last4: '9995',
    decline: {
      code: 'card_declined',
      decline_code: 'insufficient_funds',
      message: 'Your card has insufficient funds.',
    },
    refusesSaving: true,
  },
  pm_card_chargeDeclinedExpiredCard: {
    ...visa,
    last4: '0069',
    decline: { code: 'expired_card', decline_code: 'expired_card', message: 'Your card has expired.' },
    refusesSaving: true,
  },
  pm_card_chargeDeclinedIncorrectCvc: {
    ...visa,
    last4: '0127',
    decline: {
      code: 'incorrect_cvc',
      decline_code: 'incorrect_cvc',
      message: "Your card's security code is incorrect.",
    },
    refusesSaving: true,
  },
  pm_card_chargeCustomerFail: { ...visa, last4: '0341', decline: genericDecline },
  pm_card_authenticationRequired: { ...visa, country: 'IE', last4: '3184', authentication: true },
};

/** Behaviour of the documented method with this id. */
export function testCard(methodId: string): TestCard | undefined {
  return Object.hasOwn(testCards, methodId) ? testCards[methodId] : undefined;
}

/** The fingerprint that every use of a card shares, and by which its behaviour is known again. */
export function fingerprintOf(card: TestCard): string {
  return `standin${card.brand}${card.last4}`;
}

const byFingerprint = new Map(Object.values(testCards).map((card) => [fingerprintOf(card), card]));

/** Behaviour of the card with this fingerprint. */
export function cardByFingerprint(fingerprint: string): TestCard {
  const card = byFingerprint.get(fingerprint);
  if (!card) throw new Error(`No test card has the fingerprint ${fingerprint}`);
  return card;
}

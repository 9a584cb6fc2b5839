import type { Customer } from './customers';
import { cardError, noSuch, refused } from './errors';
import { newId } from './identifiers';
import type { Metadata } from './parameters';
import type { Processor } from './processor';
import { keep, type State } from './state';
import { cardByFingerprint, fingerprintOf, testCard, type TestCard } from './test-cards';

/** A card, known by id only. */
export interface PaymentMethod {
  id: string;
  object: 'payment_method';
  billing_details: BillingDetails;
  card: {
    brand: TestCard['brand'];
    checks: { address_line1_check: null; address_postal_code_check: null; cvc_check: 'pass' | 'fail' };
    country: string;
    exp_month: number;
    exp_year: number;
    fingerprint: string;
    funding: 'credit';
    generated_from: null;
    last4: string;
    networks: { available: string[]; preferred: null };
    three_d_secure_usage: { supported: boolean };
    wallet: null;
  };
  created: number;
  customer: string | null;
  livemode: false;
  metadata: Metadata;
  type: 'card';
}

export interface BillingDetails {
  address: { city: null; country: null; line1: null; line2: null; postal_code: null; state: null };
  email: string | null;
  name: string | null;
  phone: string | null;
}

function emptyBillingDetails(): BillingDetails {
  return {
    address: { city: null, country: null, line1: null, line2: null, postal_code: null, state: null },
    email: null,
    name: null,
    phone: null,
  };
}

/** A method of this card, not yet kept. */
export function methodFor(card: TestCard, id: string, clockDate: Date): PaymentMethod {
  return {
    id,
    object: 'payment_method',
    billing_details: emptyBillingDetails(),
    card: {
      brand: card.brand,
      checks: {
        address_line1_check: null,
        address_postal_code_check: null,
        cvc_check: card.decline?.code === 'incorrect_cvc' ? 'fail' : 'pass',
      },
      country: card.country,
      exp_month: clockDate.getUTCMonth() + 1,
      exp_year: clockDate.getUTCFullYear() + (card.decline?.code === 'expired_card' ? -1 : 1),
      fingerprint: fingerprintOf(card),
      funding: 'credit',
      generated_from: null,
      last4: card.last4,
      networks: { available: [card.brand], preferred: null },
      three_d_secure_usage: { supported: true },
      wallet: null,
    },
    created: Math.floor(clockDate.getTime() / 1000),
    customer: null,
    livemode: false,
    metadata: {},
    type: 'card',
  };
}

/** How the card behind a method behaves. */
export function cardOf(method: PaymentMethod): TestCard {
  return cardByFingerprint(method.card.fingerprint);
}

/** @throws ApiError when no kept method has this id */
export function findPaymentMethod(state: State, id: string, param: string, inPath = false): PaymentMethod {
  const method = state.paymentMethods.get(id);
  if (!method) throw noSuch('PaymentMethod', id, param, inPath);
  return method;
}

/** The method with this id; a documented test id makes a new method of its card, as each use of it does. */
export function usePaymentMethod(
  processor: Processor,
  id: string,
  param = 'payment_method',
  inPath = false,
): PaymentMethod {
  const card = testCard(id);
  if (!card) return findPaymentMethod(processor.state, id, param, inPath);
  return keep(processor.state.paymentMethods, methodFor(card, newId('pm'), processor.clock.now()));
}

export function methodsOfCustomer(state: State, customer: string): PaymentMethod[] {
  return [...state.paymentMethods.values()].filter((method) => method.customer === customer);
}

/** Saves a card to a customer and tells so. @throws ApiError 402 when the card refuses being saved */
export function attachMethod(processor: Processor, method: PaymentMethod, customer: Customer): PaymentMethod {
  if (method.customer === customer.id) return method;
  if (method.customer !== null) {
    throw refused('The payment method you provided has already been attached to a customer.', {
      code: 'resource_already_exists',
      param: 'payment_method',
    });
  }
  const card = cardOf(method);
  if (card.decline && card.refusesSaving) {
    const { message, ...codes } = card.decline;
    throw cardError(message, codes);
  }
  method.customer = customer.id;
  processor.emit('payment_method.attached', method);
  return method;
}

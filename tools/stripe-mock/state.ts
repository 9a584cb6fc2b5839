import type { BalanceTransaction } from './balance-transactions';
import type { Charge } from './charges';
import type { Customer, DeletedCustomer } from './customers';
import type { Event } from './events';
import type { KeptAnswer } from './idempotency';
import type { PaymentIntent } from './payment-intents';
import type { PaymentMethod } from './payment-methods';
import type { Payout } from './payouts';
import type { Refund } from './refunds';
import type { SetupIntent } from './setup-intents';
import type { WebhookEndpoint } from './webhook-endpoints';
import type { Delivery } from './webhooks';

/** Which payout a balance transaction left with. `id` is the balance transaction's. */
export interface PayoutPart {
  id: string;
  payout: string;
}

/** What each collection holds; objects stand in the order they were made. */
export interface Collections {
  customers: Customer | DeletedCustomer;
  paymentMethods: PaymentMethod;
  paymentIntents: PaymentIntent;
  setupIntents: SetupIntent;
  charges: Charge;
  refunds: Refund;
  balanceTransactions: BalanceTransaction;
  payouts: Payout;
  payoutParts: PayoutPart;
  events: Event;
  webhookEndpoints: WebhookEndpoint;
  deliveries: Delivery;
  keptAnswers: KeptAnswer;
}

export type CollectionName = keyof Collections;

/** All that the stand-in remembers, by id. */
export type State = { [Name in CollectionName]: Map<string, Collections[Name]> };

/** The objects of a state as lists, ready for JSON. */
export type StateRecord = { [Name in CollectionName]: Collections[Name][] };

export function emptyState(): State {
  return {
    customers: new Map(),
    paymentMethods: new Map(),
    paymentIntents: new Map(),
    setupIntents: new Map(),
    charges: new Map(),
    refunds: new Map(),
    balanceTransactions: new Map(),
    payouts: new Map(),
    payoutParts: new Map(),
    events: new Map(),
    webhookEndpoints: new Map(),
    deliveries: new Map(),
    keptAnswers: new Map(),
  };
}

/** The names of all collections. */
export const collectionNames = Object.keys(emptyState()) as CollectionName[];

/** Puts an object into its collection under its own id and hands it back. */
export function keep<Kept extends { id: string }>(collection: Map<string, Kept>, object: Kept): Kept {
  collection.set(object.id, object);
  return object;
}

function record<Name extends CollectionName>(state: State, into: Partial<StateRecord>, name: Name): void {
  into[name] = [...state[name].values()] as StateRecord[Name];
}

export function toRecord(state: State): StateRecord {
  const result: Partial<StateRecord> = {};
  for (const name of collectionNames) record(state, result, name);
  return result as StateRecord;
}

function fill<Name extends CollectionName>(state: State, objects: StateRecord, name: Name): void {
  const collection: Map<string, Collections[Name]> = state[name];
  collection.clear();
  for (const object of objects[name]) collection.set(object.id, object);
}

/** Replaces all that a state holds, in place, so that everyone who holds it sees the new content. */
export function refill(state: State, objects: StateRecord): void {
  for (const name of collectionNames) fill(state, objects, name);
}

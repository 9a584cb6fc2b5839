import type { Intent, Payout, ProcessorTransaction } from '@seamwright/accounts/domain';

/** A card as the processor keeps it. */
export interface SavedCard {
  readonly methodId: string;
  readonly brand: string;
  readonly last4: string;
  /** "08/29" */
  readonly expires: string;
}

/** What the processor tells by a webhook: that something became of an object. */
export interface ProcessorEvent {
  readonly id: string;
  readonly type: string;
  readonly objectId: string;
  readonly payload: Readonly<Record<string, unknown>>;
}

export interface HoldWanted {
  readonly paymentId: string;
  readonly orderNumber: number;
  readonly processorCustomerId: string;
  readonly methodId: string;
  readonly amountMinor: number;
  readonly currency: string;
  /** Where the holder comes back to after confirming with the bank. */
  readonly returnUrl: string;
  readonly key: string;
}

/** The card processor, as far as the house needs it. Every deed carries the key that makes its repeat harmless. */
export interface Processor {
  /** Gives the processor's id of our customer. */
  createCustomer(wanted: { customerId: string; name: string; email: string; key: string }): Promise<string>;
  /** Keeps a card for a customer. Throws CardRefused, or ProcessorRefused for a method that is not known. */
  saveCard(wanted: { processorCustomerId: string; methodId: string; key: string }): Promise<SavedCard>;
  /** Forgets a card; one that is forgotten already is left alone. */
  removeCard(methodId: string): Promise<void>;
  /** Holds an amount. A refused card is an answer, not an error. */
  hold(wanted: HoldWanted): Promise<Intent>;
  /** Takes a part of a hold for good, the rest is let go. Throws ProcessorRefused when nothing is held any more. */
  capture(wanted: { intentId: string; amountMinor: number; key: string }): Promise<Intent>;
  /** Lets a hold go. Throws ProcessorRefused when it is gone or taken already. */
  cancel(wanted: { intentId: string; key: string }): Promise<Intent>;
  retrieve(intentId: string): Promise<Intent>;
  /** The movements of our balance: from an instant on, or the parts of one payout. Oldest first. */
  transactions(wanted: { since: Date } | { payoutId: string }): Promise<ProcessorTransaction[]>;
  /** Payouts made from an instant on, oldest first. */
  payouts(since: Date): Promise<Payout[]>;
  payout(id: string): Promise<Payout>;
  /** What the processor holds for us, by currency: available and on its way in. */
  balance(): Promise<readonly { readonly currency: string; readonly amountMinor: number }[]>;
  /** Checks the signature on the bytes as they came. Throws SignatureWrong. */
  constructEvent(rawBody: Buffer, signature: string): ProcessorEvent;
}

/** There was no answer, or one that says to try again: it is not known whether the deed was done. */
export class ProcessorSilent extends Error {
  constructor(cause: unknown) {
    super('The card processor did not answer', { cause });
    this.name = 'ProcessorSilent';
  }
}

/** The deed is not possible as things stand; nothing was done. */
export class ProcessorRefused extends Error {
  constructor(
    readonly code: string,
    cause?: unknown,
  ) {
    super(`The card processor refused: ${code}`, { cause });
    this.name = 'ProcessorRefused';
  }
}

/** The bank refused a card that was to be kept. */
export class CardRefused extends Error {
  constructor(readonly declineCode: string) {
    super(`The card was refused: ${declineCode}`);
    this.name = 'CardRefused';
  }
}

export class SignatureWrong extends Error {
  constructor() {
    super('The signature is not the card processor’s');
    this.name = 'SignatureWrong';
  }
}

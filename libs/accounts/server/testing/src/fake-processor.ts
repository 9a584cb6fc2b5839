import {
  cardFee,
  type FeeSchedule,
  type Intent,
  type Payout,
  type ProcessorTransaction,
} from '@seamwright/accounts/domain';
import {
  CardRefused,
  ProcessorRefused,
  ProcessorSilent,
  SignatureWrong,
  type HoldWanted,
  type Processor,
  type ProcessorEvent,
  type SavedCard,
} from '../../src/index';

export const FAKE_TARIFF: FeeSchedule = { ratePpm: 15_000, fixedMinor: 20 };

type Deed = 'createCustomer' | 'saveCard' | 'removeCard' | 'hold' | 'capture' | 'cancel' | 'retrieve';
/** `lost`: the deed is done, but nobody is told. `silent`: nothing is done. */
type Fault = 'lost' | 'silent';

const DAY_MS = 86_400_000;

/** A card processor in memory: remembers cards, holds and money, and repeats its answer to a key it knows. */
export class FakeProcessor implements Processor {
  readonly calls: { readonly deed: Deed; readonly key: string }[] = [];
  readonly intents = new Map<string, Intent>();
  readonly money: ProcessorTransaction[] = [];
  readonly paidOut: Payout[] = [];
  readonly kept = new Set<string>();
  readonly #answers = new Map<string, unknown>();
  readonly #faults: { readonly deed: Deed; readonly fault: Fault }[] = [];
  #count = 0;

  /** `now` is the processor's own clock. */
  constructor(private readonly now: () => Date) {}

  /** The next call of this deed goes wrong. */
  breakNext(deed: Deed, fault: Fault): void {
    this.#faults.push({ deed, fault });
  }

  createCustomer({ key }: { key: string }): Promise<string> {
    return this.#once('createCustomer', key, () => this.#id('cus'));
  }

  saveCard({ methodId, key }: { methodId: string; key: string }): Promise<SavedCard> {
    return this.#once('saveCard', key, () => {
      if (methodId.endsWith('InsufficientFunds')) throw new CardRefused('insufficient_funds');
      if (!methodId.startsWith('pm_card_')) throw new ProcessorRefused('resource_missing');
      const saved = { methodId: `${this.#id('pm')}_${methodId}`, brand: 'visa', last4: '4242', expires: '12/27' };
      this.kept.add(saved.methodId);
      return saved;
    });
  }

  removeCard(methodId: string): Promise<void> {
    return this.#once('removeCard', `remove:${methodId}:${this.calls.length}`, () => void this.kept.delete(methodId));
  }

  hold(wanted: HoldWanted): Promise<Intent> {
    return this.#once('hold', wanted.key, () => {
      const base: Intent = {
        id: this.#id('pi'),
        standing: 'held',
        currency: wanted.currency,
        amountMinor: wanted.amountMinor,
        capturedMinor: 0,
        chargeId: this.#id('ch'),
        holdEndsAt: new Date(this.now().getTime() + 7 * DAY_MS),
        declineCode: null,
        actionUrl: null,
        paymentId: wanted.paymentId,
      };
      return this.#set(asTheCardSays(base, wanted.methodId));
    });
  }

  capture({ intentId, amountMinor, key }: { intentId: string; amountMinor: number; key: string }): Promise<Intent> {
    return this.#once('capture', key, () => {
      const intent = this.#held(intentId);
      if (amountMinor > intent.amountMinor) throw new ProcessorRefused('amount_too_large');
      this.#move('charge', intent.chargeId ?? '', amountMinor, cardFee(amountMinor, FAKE_TARIFF));
      return this.#set({ ...intent, standing: 'captured', capturedMinor: amountMinor });
    });
  }

  cancel({ intentId, key }: { intentId: string; key: string }): Promise<Intent> {
    return this.#once('cancel', key, () => this.#set({ ...this.#held(intentId), standing: 'canceled' }));
  }

  async retrieve(intentId: string): Promise<Intent> {
    this.calls.push({ deed: 'retrieve', key: intentId });
    const intent = this.intents.get(intentId);
    if (!intent) throw new ProcessorRefused('resource_missing');
    return intent;
  }

  async transactions(wanted: { since: Date } | { payoutId: string }): Promise<ProcessorTransaction[]> {
    if ('payoutId' in wanted) return this.money.filter(({ payoutId }) => payoutId === wanted.payoutId);
    return this.money.filter(({ createdAt }) => createdAt >= wanted.since).map((each) => ({ ...each, payoutId: null }));
  }

  async payouts(since: Date): Promise<Payout[]> {
    return this.paidOut.filter(({ createdAt }) => createdAt >= since);
  }

  async payout(id: string): Promise<Payout> {
    const found = this.paidOut.find((payout) => payout.id === id);
    if (!found) throw new ProcessorRefused('resource_missing');
    return found;
  }

  async balance(): Promise<{ currency: string; amountMinor: number }[]> {
    return [{ currency: 'GBP', amountMinor: this.money.reduce((sum, { netMinor }) => sum + netMinor, 0) }];
  }

  /** The signature is the word itself. */
  constructEvent(rawBody: Buffer, signature: string): ProcessorEvent {
    if (signature !== 'signed') throw new SignatureWrong();
    return JSON.parse(rawBody.toString('utf8')) as ProcessorEvent;
  }

  /** The bank's answer comes after the call: the holder confirmed, or the hold ran out. */
  turn(intentId: string, standing: Intent['standing']): void {
    const intent = this.intents.get(intentId);
    if (intent) this.#set({ ...intent, standing });
  }

  /** Gives a part of a charge back. */
  refund(chargeId: string, amountMinor: number): void {
    this.#move('refund', this.#id('re'), 0 - amountMinor, 0, chargeId);
  }

  /** Sends everything that is there to the bank. */
  payOut(): Payout {
    const parts = this.money.filter(({ payoutId, type }) => payoutId === null && type !== 'payout');
    const amountMinor = parts.reduce((sum, { netMinor }) => sum + netMinor, 0);
    const createdAt = this.now();
    const arrivalOn = new Date(createdAt.getTime() + DAY_MS).toISOString().slice(0, 10);
    const payout: Payout = { id: this.#id('po'), amountMinor, currency: 'GBP', state: 'paid', createdAt, arrivalOn };
    for (const part of parts) this.money[this.money.indexOf(part)] = { ...part, payoutId: payout.id };
    this.paidOut.push(payout);
    this.#move('payout', payout.id, 0 - amountMinor, 0);
    return payout;
  }

  async #once<T>(deed: Deed, key: string, work: () => T): Promise<T> {
    this.calls.push({ deed, key });
    const at = this.#faults.findIndex((fault) => fault.deed === deed);
    const [fault] = at < 0 ? [] : this.#faults.splice(at, 1);
    if (fault?.fault === 'silent') throw new ProcessorSilent(new Error('silent'));
    if (!this.#answers.has(key)) this.#answers.set(key, work());
    if (fault) throw new ProcessorSilent(new Error('lost'));
    return this.#answers.get(key) as T;
  }

  #id(prefix: string): string {
    return `${prefix}_fake${String(++this.#count).padStart(12, '0')}`;
  }

  #set(intent: Intent): Intent {
    this.intents.set(intent.id, intent);
    return intent;
  }

  #held(intentId: string): Intent {
    const intent = this.intents.get(intentId);
    if (intent?.standing !== 'held' && intent?.standing !== 'needs-action')
      throw new ProcessorRefused('payment_intent_unexpected_state');
    return intent;
  }

  #move(type: string, sourceId: string, amountMinor: number, feeMinor: number, chargeId?: string): void {
    const createdAt = this.now();
    this.money.push({
      id: this.#id('txn'),
      type,
      sourceId,
      chargeId: chargeId ?? (type === 'charge' ? sourceId : null),
      amountMinor,
      feeMinor,
      netMinor: amountMinor - feeMinor,
      currency: 'GBP',
      createdAt,
      availableAt: createdAt,
      payoutId: null,
    });
  }
}

function asTheCardSays(intent: Intent, methodId: string): Intent {
  if (methodId.endsWith('chargeCustomerFail'))
    return { ...intent, standing: 'declined', declineCode: 'generic_decline', chargeId: null, holdEndsAt: null };
  if (methodId.endsWith('authenticationRequired'))
    return { ...intent, standing: 'needs-action', actionUrl: 'https://bank.example.test/confirm', chargeId: null };
  return intent;
}

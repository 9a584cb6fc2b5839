import Stripe from 'stripe';
import type { Intent, Payout, PayoutState, ProcessorTransaction } from '@seamwright/accounts/domain';
import {
  CardRefused,
  ProcessorRefused,
  ProcessorSilent,
  SignatureWrong,
  type Processor,
  type ProcessorEvent,
  type SavedCard,
} from './processor';

/** The version of the processor's API that this code was written for. */
const API_VERSION = '2026-10-28.endive';
const TIMEOUT_MS = 15_000;
const NETWORK_RETRIES = 2;
const PAGE = 100;

export interface StripeConfig {
  readonly secretKey: string;
  /** The present secret first, then those that are still accepted while they are changed. */
  readonly webhookSecrets: readonly string[];
  /** Another server than the processor's own: the stand-in. */
  readonly host?: string | undefined;
  readonly port?: number | undefined;
  readonly protocol?: 'http' | 'https' | undefined;
}

const day = (seconds: number): string => new Date(seconds * 1000).toISOString().slice(0, 10);
const instant = (seconds: number): Date => new Date(seconds * 1000);
const seconds = (at: Date): number => Math.floor(at.getTime() / 1000);
const idOf = (held: string | { readonly id: string } | null | undefined): string | null =>
  typeof held === 'string' ? held : (held?.id ?? null);

/** Payment, card and payout calls on the official package. */
export function stripeProcessor(config: StripeConfig): Processor {
  const stripe = new Stripe(config.secretKey, {
    apiVersion: API_VERSION,
    timeout: TIMEOUT_MS,
    maxNetworkRetries: NETWORK_RETRIES,
    telemetry: false,
    ...(config.host ? { host: config.host } : {}),
    ...(config.port ? { port: config.port } : {}),
    ...(config.protocol ? { protocol: config.protocol } : {}),
  });
  const withCharge = { expand: ['latest_charge'] };

  return {
    createCustomer: ({ customerId, name, email, key }) =>
      asked(async () => {
        const made = await stripe.customers.create(
          { name, email, metadata: { customer_id: customerId } },
          { idempotencyKey: key },
        );
        return made.id;
      }),
    saveCard: ({ processorCustomerId, methodId, key }) =>
      asked(async () => {
        const customer = { customer: processorCustomerId };
        return savedCard(await stripe.paymentMethods.attach(methodId, customer, { idempotencyKey: key }));
      }),
    removeCard: (methodId) =>
      asked(async () => {
        await stripe.paymentMethods.detach(methodId);
      }).catch((error: unknown) => {
        if (!(error instanceof ProcessorRefused)) throw error;
      }),
    hold: (wanted) =>
      asked(async () => {
        const intent = await stripe.paymentIntents
          .create(
            {
              amount: wanted.amountMinor,
              currency: wanted.currency.toLowerCase(),
              customer: wanted.processorCustomerId,
              payment_method: wanted.methodId,
              allowed_payment_method_types: ['card'],
              capture_method: 'manual',
              confirm: true,
              return_url: wanted.returnUrl,
              description: `Order ${wanted.orderNumber}`,
              metadata: { payment_id: wanted.paymentId, order_number: String(wanted.orderNumber) },
              ...withCharge,
            },
            { idempotencyKey: wanted.key },
          )
          .catch(declinedIntent);
        return intentOf(intent);
      }),
    capture: ({ intentId, amountMinor, key }) =>
      asked(async () => {
        const wanted = { amount_to_capture: amountMinor, ...withCharge };
        return intentOf(await stripe.paymentIntents.capture(intentId, wanted, { idempotencyKey: key }));
      }),
    cancel: ({ intentId, key }) =>
      asked(async () => intentOf(await stripe.paymentIntents.cancel(intentId, withCharge, { idempotencyKey: key }))),
    retrieve: (intentId) => asked(async () => intentOf(await stripe.paymentIntents.retrieve(intentId, withCharge))),
    transactions: (wanted) =>
      asked(async () => {
        const filter = 'payoutId' in wanted ? { payout: wanted.payoutId } : { created: { gte: seconds(wanted.since) } };
        const found = await all(stripe.balanceTransactions.list({ ...filter, limit: PAGE, expand: ['data.source'] }));
        const payoutId = 'payoutId' in wanted ? wanted.payoutId : null;
        return found.map((entry) => transactionOf(entry, payoutId)).reverse();
      }),
    payouts: (since) =>
      asked(async () => {
        const found = await all(stripe.payouts.list({ created: { gte: seconds(since) }, limit: PAGE }));
        return found.map(payoutOf).reverse();
      }),
    payout: (id) => asked(async () => payoutOf(await stripe.payouts.retrieve(id))),
    balance: () =>
      asked(async () => {
        const { available, pending } = await stripe.balance.retrieve();
        const sums = new Map<string, number>();
        for (const { currency, amount } of [...available, ...pending])
          sums.set(currency, (sums.get(currency) ?? 0) + amount);
        return [...sums].map(([currency, amountMinor]) => ({ currency: currency.toUpperCase(), amountMinor }));
      }),
    constructEvent: (rawBody, signature) => eventOf(stripe, rawBody, signature, config.webhookSecrets),
  };
}

/** Turns the package's errors into ours. */
async function asked<T>(call: () => Promise<T>): Promise<T> {
  try {
    return await call();
  } catch (error) {
    const { errors } = Stripe;
    if (error instanceof errors.StripeCardError)
      throw new CardRefused(error.decline_code ?? error.code ?? 'card_declined');
    if (error instanceof errors.StripeInvalidRequestError && error.code !== 'idempotency_key_in_use')
      throw new ProcessorRefused(error.code ?? 'invalid_request', error);
    if (error instanceof errors.StripeError && !(error instanceof errors.StripeAuthenticationError))
      throw new ProcessorSilent(error);
    throw error;
  }
}

/** A refused card comes as an error that carries the intent. */
function declinedIntent(error: unknown): Stripe.PaymentIntent {
  if (error instanceof Stripe.errors.StripeCardError && error.payment_intent) return error.payment_intent;
  throw error;
}

async function all<Item>(list: AsyncIterable<Item>): Promise<Item[]> {
  const found: Item[] = [];
  for await (const item of list) found.push(item);
  return found;
}

function savedCard({ id, card }: Stripe.PaymentMethod): SavedCard {
  if (!card) throw new ProcessorRefused('not-a-card');
  const month = String(card.exp_month).padStart(2, '0');
  return { methodId: id, brand: card.brand, last4: card.last4, expires: `${month}/${String(card.exp_year).slice(-2)}` };
}

const STANDINGS: Readonly<Record<string, Intent['standing']>> = {
  requires_action: 'needs-action',
  requires_capture: 'held',
  succeeded: 'captured',
  canceled: 'canceled',
};

function intentOf(intent: Stripe.PaymentIntent): Intent {
  const failed = intent.status === 'requires_payment_method' ? intent.last_payment_error : null;
  const charge = typeof intent.latest_charge === 'object' ? intent.latest_charge : null;
  const endsAt = charge?.payment_method_details?.card?.capture_before;
  return {
    id: intent.id,
    standing: failed ? 'declined' : (STANDINGS[intent.status] ?? 'open'),
    currency: intent.currency.toUpperCase(),
    amountMinor: intent.amount,
    capturedMinor: intent.amount_received,
    // The charge of a refused card took nothing.
    chargeId: failed ? null : idOf(intent.latest_charge),
    holdEndsAt: endsAt ? instant(endsAt) : null,
    declineCode: failed ? (failed.decline_code ?? failed.code ?? 'card_declined') : null,
    actionUrl: intent.next_action?.redirect_to_url?.url ?? null,
    paymentId: intent.metadata['payment_id'] ?? null,
  };
}

function transactionOf(entry: Stripe.BalanceTransaction, payoutId: string | null): ProcessorTransaction {
  const { source } = entry;
  const sourceId = idOf(source);
  const behind = typeof source === 'object' && source?.object === 'refund' ? idOf(source.charge) : null;
  return {
    id: entry.id,
    type: entry.type,
    sourceId,
    chargeId: sourceId?.startsWith('ch_') ? sourceId : behind,
    amountMinor: entry.amount,
    feeMinor: entry.fee,
    netMinor: entry.net,
    currency: entry.currency.toUpperCase(),
    createdAt: instant(entry.created),
    availableAt: instant(entry.available_on),
    payoutId,
  };
}

const payoutOf = (payout: Stripe.Payout): Payout => ({
  id: payout.id,
  amountMinor: payout.amount,
  currency: payout.currency.toUpperCase(),
  state: payout.status.replace('_', '-') as PayoutState,
  createdAt: instant(payout.created),
  arrivalOn: day(payout.arrival_date),
});

function eventOf(stripe: Stripe, rawBody: Buffer, signature: string, secrets: readonly string[]): ProcessorEvent {
  for (const secret of secrets) {
    try {
      const event = stripe.webhooks.constructEvent(rawBody, signature, secret);
      const object = event.data.object as { readonly id?: string };
      const payload = JSON.parse(rawBody.toString('utf8')) as Record<string, unknown>;
      return { id: event.id, type: event.type, objectId: object.id ?? '', payload };
    } catch (error) {
      if (!(error instanceof Stripe.errors.StripeSignatureVerificationError)) throw error;
    }
  }
  throw new SignatureWrong();
}

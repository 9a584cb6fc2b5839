import { midnightAfter, postEntry, type BalanceTransaction } from './balance-transactions';
import { noSuch, refused } from './errors';
import { newId } from './identifiers';
import type { Metadata } from './parameters';
import type { Processor } from './processor';
import { keep, type State } from './state';

/** Money sent to the bank, in minor units. */
export interface Payout {
  id: string;
  object: 'payout';
  amount: number;
  arrival_date: number;
  /** Made by a sweep: its parts are known. */
  automatic: boolean;
  balance_transaction: string;
  created: number;
  currency: string;
  description: string | null;
  destination: string;
  failure_balance_transaction: string | null;
  failure_code: string | null;
  failure_message: string | null;
  livemode: false;
  metadata: Metadata;
  method: 'standard';
  original_payout: null;
  reconciliation_status: 'completed' | 'in_progress' | 'not_applicable';
  reversed_by: null;
  source_type: 'card';
  statement_descriptor: string | null;
  status: 'pending' | 'in_transit' | 'paid' | 'failed';
  type: 'bank_account';
}

/** The one bank account that the account pays out to. */
const BANK_ACCOUNT = 'ba_standin00000000000000';
/** A payout goes to the bank an hour after it was made. */
const SUBMITTED_AFTER_SECONDS = 3600;

interface NewPayout {
  amount: number;
  currency: string;
  automatic: boolean;
  description: string;
  metadata: Metadata;
  statementDescriptor: string | null;
}

function makePayout(processor: Processor, made: NewPayout): Payout {
  const { clock, state, timing } = processor;
  const id = newId('po');
  const entry = postEntry(processor, {
    type: 'payout',
    amount: -made.amount,
    currency: made.currency,
    source: id,
    description: made.description,
    availableOn: clock.seconds(),
  });
  const payout = keep<Payout>(state.payouts, {
    id,
    object: 'payout',
    amount: made.amount,
    arrival_date: midnightAfter(clock.seconds(), timing.payoutArrivesAfterDays),
    automatic: made.automatic,
    balance_transaction: entry.id,
    created: clock.seconds(),
    currency: made.currency,
    description: made.description,
    destination: BANK_ACCOUNT,
    failure_balance_transaction: null,
    failure_code: null,
    failure_message: null,
    livemode: false,
    metadata: made.metadata,
    method: 'standard',
    original_payout: null,
    reconciliation_status: made.automatic ? 'completed' : 'not_applicable',
    reversed_by: null,
    source_type: 'card',
    statement_descriptor: made.statementDescriptor,
    status: 'pending',
    type: 'bank_account',
  });
  processor.emit('payout.created', payout);
  return payout;
}

/** Available entries that no sweep has taken yet, by currency. */
function unswept(state: State): Map<string, BalanceTransaction[]> {
  const waiting = new Map<string, BalanceTransaction[]>();
  const ownEntries = new Set(
    [...state.payouts.values()].filter(({ automatic }) => automatic).map((payout) => payout.balance_transaction),
  );
  for (const entry of state.balanceTransactions.values()) {
    if (entry.status !== 'available' || state.payoutParts.has(entry.id) || ownEntries.has(entry.id)) continue;
    waiting.set(entry.currency, [...(waiting.get(entry.currency) ?? []), entry]);
  }
  return waiting;
}

/**
 * Pays out all that is available, one payout for each currency with something in it. The entries it takes are its
 * parts: their net adds up to the payout, and the payout's own entry is the negative of it and not among them.
 */
export function sweep(processor: Processor): Payout[] {
  const made: Payout[] = [];
  for (const [currency, parts] of unswept(processor.state)) {
    const amount = parts.reduce((total, part) => total + part.net, 0);
    if (amount <= 0) continue;
    const payout = makePayout(processor, {
      amount,
      currency,
      automatic: true,
      description: 'Payout of the available balance',
      metadata: {},
      statementDescriptor: null,
    });
    for (const { id } of parts) keep(processor.state.payoutParts, { id, payout: payout.id });
    made.push(payout);
  }
  return made;
}

/** Pays out a chosen amount without naming parts. @throws ApiError when less is available */
export function payOutAmount(processor: Processor, wish: Omit<NewPayout, 'automatic'>): Payout {
  const available = [...processor.state.balanceTransactions.values()]
    .filter((entry) => entry.status === 'available' && entry.currency === wish.currency)
    .reduce((total, entry) => total + entry.net, 0);
  if (wish.amount > available) {
    throw refused('You have insufficient funds in your account for this payout.', {
      code: 'balance_insufficient',
      param: 'amount',
    });
  }
  return makePayout(processor, { ...wish, automatic: false });
}

/** @throws ApiError 404 when there is no payout with this id */
export function findPayout(state: State, id: string): Payout {
  const payout = state.payouts.get(id);
  if (!payout) throw noSuch('payout', id, 'payout', true);
  return payout;
}

function assertUnderWay(payout: Payout): void {
  if (payout.status === 'pending' || payout.status === 'in_transit') return;
  throw refused(`Payout ${payout.id} is already ${payout.status}.`, { param: 'payout' });
}

/** The money reached the bank. @throws ApiError when the payout has already ended */
export function arrive(processor: Processor, payout: Payout): Payout {
  assertUnderWay(payout);
  payout.status = 'paid';
  payout.arrival_date = Math.min(payout.arrival_date, processor.clock.seconds());
  processor.emit('payout.paid', payout);
  return payout;
}

/** The bank sent the money back: it is available again. @throws ApiError when the payout has already ended */
export function fail(processor: Processor, payout: Payout): Payout {
  assertUnderWay(payout);
  const entry = postEntry(processor, {
    type: 'payout_failure',
    amount: payout.amount,
    currency: payout.currency,
    source: payout.id,
    description: 'Payout failed',
    availableOn: processor.clock.seconds(),
  });
  payout.status = 'failed';
  payout.failure_code = 'account_closed';
  payout.failure_message = 'The bank account has been closed.';
  payout.failure_balance_transaction = entry.id;
  processor.emit('payout.failed', payout);
  return payout;
}

/** Moves payouts on as their time comes. */
export function settlePayouts(processor: Processor): void {
  const now = processor.clock.seconds();
  for (const payout of processor.state.payouts.values()) {
    if (payout.status === 'pending' && payout.created + SUBMITTED_AFTER_SECONDS <= now) payout.status = 'in_transit';
    const underWay = payout.status === 'pending' || payout.status === 'in_transit';
    if (underWay && payout.arrival_date <= now) arrive(processor, payout);
  }
}

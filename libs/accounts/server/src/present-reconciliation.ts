import type { ReconciliationWire } from '@seamwright/accounts/contracts';
import {
  clearingParts,
  reconcile,
  transactionKind,
  type Payment,
  type Payout,
  type PaymentToReconcile,
  type ProcessorTransaction,
} from '@seamwright/accounts/domain';
import { ordersByIds } from '@seamwright/ordering/server';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import type { Tx } from '@seamwright/shared/server';
import { addDays, endOfWeek, instantAt, plantToday, type PlantDate } from '@seamwright/shared/util';
import { matchesOfPayouts, unmatchedLinesBetween } from './bank.repository';
import { accountSums } from './journal.repository';
import type { AccountsParts } from './parts';
import { paymentsCapturedWithin, paymentsOfCharges } from './payments.repository';
import {
  keptBalance,
  partsOfPayouts,
  payoutsWithin,
  toldBalance,
  transactionsWithin,
  type Span,
} from './processor-money.repository';

type Parts = Pick<AccountsParts, 'timeZone' | 'tariff'>;

/** Bookings are looked at so many days past the week: payouts arrive later. */
const BOOKED_WITHIN_DAYS = 14;

/** A week of card money as the screen shows it. `day` is any day of the week. */
export async function presentReconciliation(
  tx: Tx,
  { timeZone, tariff }: Parts,
  now: Date,
  day: PlantDate | null,
): Promise<ReconciliationWire> {
  const currency = HOUSE_CURRENCY;
  const today = plantToday(now, timeZone);
  const sunday = endOfWeek(day ?? today);
  const monday = addDays(sunday, -6);
  const span: Span = {
    from: instantAt(monday, '00:00', timeZone),
    until: instantAt(addDays(sunday, 1), '00:00', timeZone),
    currency,
  };
  const moved = await transactionsWithin(tx, span);
  const payouts = await payoutsWithin(tx, span);
  const payoutIds = payouts.map(({ id }) => id);
  const parts = await partsOfPayouts(tx, payoutIds);
  const matches = await matchesOfPayouts(tx, payoutIds);
  const loose = await unmatchedLinesBetween(tx, monday, addDays(sunday, BOOKED_WITHIN_DAYS), currency);
  const payments = await paymentsOfWeek(tx, span, moved);
  const legs = reconcile({
    payments: payments.map(toReconcile),
    charges: moved,
    payouts,
    parts,
    bankLines: [...matches.map(({ line }) => line), ...loose],
    matches,
    tariff,
    today,
  });
  const numbers = await orderNumbers(tx, payments);
  const openingMinor = await toldBalance(tx, currency, span.from);
  const balance = await keptBalance(tx, currency);
  const exceptions = legs.flatMap((leg) => leg.exceptions);
  return {
    from: monday,
    until: sunday,
    currency,
    week: {
      ...clearingParts(moved),
      bankMinor: matches.reduce((sum, { line }) => sum + line.amountMinor, 0),
      openingMinor,
      closingMinor: openingMinor + moved.reduce((sum, { netMinor }) => sum + netMinor, 0),
    },
    clearing: {
      ledgerMinor: await clearingAccount(tx, currency),
      toldMinor: await toldBalance(tx, currency, null),
      processorMinor: balance?.amountMinor ?? null,
      readAt: balance?.readAt.toISOString() ?? null,
    },
    legs: legs.map(({ exceptions: found, ...leg }) => ({ ...leg, exceptions: found.length })),
    payouts: payouts.map((payout) => presentPayout(payout, parts, matches, timeZone)),
    exceptions: exceptions.map((each) => ({ ...each, orderNumber: numbers.get(each.paymentId ?? '') ?? null })),
  };
}

/**
 * Our side of the week: payments whose charge the processor put into it, and payments that we hold to be taken in it
 * and of which the processor told nothing. One that the processor put into a neighbouring week belongs there.
 */
async function paymentsOfWeek(tx: Tx, span: Span, moved: readonly ProcessorTransaction[]): Promise<Payment[]> {
  const chargeIds = moved.flatMap(({ type, chargeId }) =>
    transactionKind(type) === 'captured' && chargeId ? [chargeId] : [],
  );
  const charged = [...(await paymentsOfCharges(tx, chargeIds)).values()];
  const untold = await paymentsCapturedWithin(tx, span);
  return [...charged, ...untold];
}

const toReconcile = ({ id, processorChargeId, capturedMinor }: Payment): PaymentToReconcile => ({
  id,
  chargeId: processorChargeId,
  capturedMinor,
});

async function orderNumbers(tx: Tx, payments: readonly Payment[]): Promise<Map<string, number>> {
  const orders = await ordersByIds(tx, [...new Set(payments.map(({ orderId }) => orderId))]);
  const numberOf = new Map(orders.map(({ id, number }) => [id, number]));
  return new Map(
    payments.flatMap(({ id, orderId }) => {
      const number = numberOf.get(orderId);
      return number === undefined ? [] : [[id, number] as const];
    }),
  );
}

async function clearingAccount(tx: Tx, currency: string): Promise<number> {
  const sum = (await accountSums(tx)).find((each) => each.account === 'card-clearing' && each.currency === currency);
  return sum ? sum.debitMinor - sum.creditMinor : 0;
}

function presentPayout(
  payout: Payout,
  allParts: readonly ProcessorTransaction[],
  matches: Awaited<ReturnType<typeof matchesOfPayouts>>,
  timeZone: string,
): ReconciliationWire['payouts'][number] {
  const parts = allParts.filter(({ payoutId }) => payoutId === payout.id);
  const count = (kind: string): number => parts.filter(({ type }) => transactionKind(type) === kind).length;
  const match = matches.find(({ payoutId }) => payoutId === payout.id);
  return {
    id: payout.id,
    state: payout.state,
    createdOn: plantToday(payout.createdAt, timeZone),
    arrivalOn: payout.arrivalOn,
    amountMinor: payout.amountMinor,
    charges: count('captured'),
    refunds: count('refunded'),
    partsNetMinor: parts.reduce((sum, { netMinor }) => sum + netMinor, 0),
    bankLine: match
      ? {
          id: match.line.id,
          bookedOn: match.line.bookedOn,
          amountMinor: match.line.amountMinor,
          text: match.line.text,
          matchedBy: match.matchedBy,
        }
      : null,
  };
}

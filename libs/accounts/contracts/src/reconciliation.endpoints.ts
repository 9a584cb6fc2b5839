import * as z from 'zod';
import { EXCEPTION_ACTS, EXCEPTION_CAUSES, EXCEPTION_KINDS, LEGS, PAYOUT_STATES } from '@seamwright/accounts/domain';
import { currency, defineEndpoint, id, instant, minor, plantDay, staffOnly } from '@seamwright/shared/contracts';

const exception = z.strictObject({
  leg: z.enum(LEGS),
  kind: z.enum(EXCEPTION_KINDS),
  /** How much the other side has more (less, below zero) than ours because of it. */
  differenceMinor: minor,
  cause: z.enum(EXCEPTION_CAUSES),
  act: z.enum(EXCEPTION_ACTS),
  paymentId: id.nullable(),
  orderNumber: z.int().nullable(),
  chargeId: z.string().nullable(),
  payoutId: z.string().nullable(),
  bankLineId: id.nullable(),
});
export type ExceptionWire = z.infer<typeof exception>;

const leg = z.strictObject({
  leg: z.enum(LEGS),
  oursMinor: minor,
  theirsMinor: minor,
  matchedMinor: minor,
  waitingMinor: minor,
  exceptions: z.int().nonnegative(),
});
export type LegWire = z.infer<typeof leg>;

const payout = z.strictObject({
  id: z.string(),
  state: z.enum(PAYOUT_STATES),
  createdOn: plantDay,
  arrivalOn: plantDay,
  amountMinor: minor,
  charges: z.int().nonnegative(),
  refunds: z.int().nonnegative(),
  partsNetMinor: minor,
  bankLine: z
    .strictObject({
      id,
      bookedOn: plantDay,
      amountMinor: minor,
      text: z.string(),
      matchedBy: z.enum(['reference', 'amount-and-date']),
    })
    .nullable(),
});
export type PayoutWire = z.infer<typeof payout>;

export const reconciliation = z.strictObject({
  /** Monday to Sunday. */
  from: plantDay,
  until: plantDay,
  currency,
  /** The money of the week, each as a size above zero but `otherMinor`. */
  week: z.strictObject({
    capturedMinor: minor,
    refundedMinor: minor,
    feesMinor: minor,
    paidOutMinor: minor,
    returnedMinor: minor,
    otherMinor: minor,
    bankMinor: minor,
    /** At the processor when the week began and when it ended. */
    openingMinor: minor,
    closingMinor: minor,
  }),
  /** Now: the clearing account, the sum of what the processor told, and what it says it holds (null: never asked). */
  clearing: z.strictObject({
    ledgerMinor: minor,
    toldMinor: minor,
    processorMinor: minor.nullable(),
    readAt: instant.nullable(),
  }),
  legs: z.array(leg),
  payouts: z.array(payout),
  exceptions: z.array(exception),
});
export type ReconciliationWire = z.infer<typeof reconciliation>;

const readers = staffOnly('accounts', 'admin');

export const getReconciliation = defineEndpoint({
  id: 'reconciliation.get',
  summary: 'A week of card money, from the card to the bank, with every penny explained or shown as an exception',
  method: 'GET',
  path: '/reconciliation',
  access: readers,
  /** Any day of the week; without it, this week. */
  query: { day: plantDay.optional() },
  response: reconciliation,
});

export const refreshReconciliation = defineEndpoint({
  id: 'reconciliation.refresh',
  summary: 'Asks the processor now for what it has not told yet',
  method: 'POST',
  path: '/reconciliation/refresh',
  access: readers,
  response: z.strictObject({ transactions: z.int().nonnegative(), payouts: z.int().nonnegative() }),
});

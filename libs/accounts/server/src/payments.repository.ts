import { sql } from 'kysely';
import type { Payment, PaymentChange, PaymentState } from '@seamwright/accounts/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import { minorUnits } from '@seamwright/shared/util';

const rows = (tx: Tx) => tx.selectFrom('payments').selectAll();
type Row = Awaited<ReturnType<ReturnType<typeof rows>['executeTakeFirstOrThrow']>>;

const paymentOf = (row: Row): Payment => ({
  ...row,
  state: row.state as PaymentState,
  holdMinor: minorUnits(row.holdMinor),
  capturedMinor: minorUnits(row.capturedMinor),
  toCaptureMinor: row.toCaptureMinor === null ? null : minorUnits(row.toCaptureMinor),
});

export interface NewPayment {
  readonly id: string;
  readonly customerId: string;
  readonly orderId: string;
  readonly processorMethodId: string;
  readonly currency: string;
  readonly holdMinor: number;
}

export async function insertPayment(tx: Tx, now: Date, payment: NewPayment): Promise<void> {
  await tx
    .insertInto('payments')
    .values({ ...payment, state: 'started', createdAt: now, updatedAt: now })
    .execute();
}

/** Locked until the transaction ends; throws `not-found`. */
export async function lockPayment(tx: Tx, id: string): Promise<Payment> {
  return paymentOf(await rows(tx).where('id', '=', id).forUpdate().executeTakeFirstOrThrow(notFound));
}

/** The payment that stands for each of these orders: its newest. */
export async function newestPayments(tx: Tx, orderIds: readonly string[]): Promise<Payment[]> {
  if (orderIds.length === 0) return [];
  const found = await rows(tx)
    .distinctOn('orderId')
    .where('orderId', '=', sql<string>`any(${[...orderIds]}::uuid[])`)
    .orderBy('orderId')
    .orderBy('createdAt', 'desc')
    .orderBy('id', 'desc')
    .execute();
  return found.map(paymentOf);
}

/** The payment behind what the processor speaks of, by our own id or by its ids; undefined when it is not ours. */
export async function paymentBehind(
  tx: Tx,
  { paymentId, intentId }: { readonly paymentId: string | null; readonly intentId: string },
): Promise<Payment | undefined> {
  const row = await rows(tx)
    .where((where) =>
      where.or([where('processorIntentId', '=', intentId), where(sql<string>`id::text`, '=', paymentId ?? '')]),
    )
    .executeTakeFirst();
  return row && paymentOf(row);
}

/** Payments by the processor's charge ids. */
export async function paymentsOfCharges(tx: Tx, chargeIds: readonly string[]): Promise<Map<string, Payment>> {
  if (chargeIds.length === 0) return new Map();
  const found = await rows(tx)
    .where('processorChargeId', 'in', [...chargeIds])
    .execute();
  return new Map(found.map((row) => [row.processorChargeId ?? '', paymentOf(row)]));
}

/** Payments that were taken within a span and of whose charge the processor told nothing yet. */
export async function paymentsCapturedWithin(
  tx: Tx,
  span: { readonly from: Date; readonly until: Date; readonly currency: string },
): Promise<Payment[]> {
  const found = await rows(tx)
    .where('capturedAt', '>=', span.from)
    .where('capturedAt', '<', span.until)
    .where('currency', '=', span.currency)
    .where(({ not, exists, selectFrom }) =>
      not(
        exists(
          selectFrom('processorTransactions as t')
            .select('t.id')
            .whereRef('t.chargeId', '=', 'payments.processorChargeId')
            .where('t.type', 'in', ['charge', 'payment']),
        ),
      ),
    )
    .orderBy('capturedAt')
    .execute();
  return found.map(paymentOf);
}

/** Payments that wait for the processor and were not touched since `before`, oldest first. */
export async function unsettledPayments(tx: Tx, before: Date, limit: number): Promise<Payment[]> {
  const found = await rows(tx)
    .where('state', 'in', ['started', 'needs-action', 'capturing', 'releasing'])
    .where('updatedAt', '<=', before)
    .orderBy('updatedAt')
    .limit(limit)
    .execute();
  return found.map(paymentOf);
}

/** Holds that should have run out and of which nothing was told. */
export async function overdueHolds(tx: Tx, now: Date, limit: number): Promise<Payment[]> {
  const found = await rows(tx)
    .where('state', '=', 'pre-authorised')
    .where('holdEndsAt', '<=', now)
    .orderBy('holdEndsAt')
    .limit(limit)
    .execute();
  return found.map(paymentOf);
}

/** Changes a payment that was locked. */
export async function changePayment(
  tx: Tx,
  now: Date,
  id: string,
  change: Partial<PaymentChange> & { readonly toCaptureMinor?: number },
): Promise<void> {
  await tx
    .updateTable('payments')
    .set({ ...change, updatedAt: now, rowVersion: sql`row_version + 1` })
    .where('id', '=', id)
    .execute();
}

export interface PaymentsQuestion {
  readonly limit: number;
  readonly after: { readonly createdAt: string; readonly id: string } | null;
  readonly state?: PaymentState | undefined;
  readonly customerId?: string | undefined;
  readonly orderId?: string | undefined;
}

const withNames = (tx: Tx) =>
  tx
    .selectFrom('payments as p')
    .innerJoin('orders as o', 'o.id', 'p.orderId')
    .innerJoin('customers as c', 'c.id', 'p.customerId')
    .selectAll('p')
    .select(['o.number as orderNumber', 'c.name as customerName']);

/** A payment with the names that a list shows. */
export interface NamedPayment extends Payment {
  readonly orderNumber: number;
  readonly customerName: string;
}

/** Payments newest first, one more than the limit when there are more. */
export async function paymentsPage(tx: Tx, wanted: PaymentsQuestion): Promise<NamedPayment[]> {
  let query = withNames(tx)
    .orderBy('p.createdAt', 'desc')
    .orderBy('p.id', 'desc')
    .limit(wanted.limit + 1);
  if (wanted.state) query = query.where('p.state', '=', wanted.state);
  if (wanted.customerId) query = query.where('p.customerId', '=', wanted.customerId);
  if (wanted.orderId) query = query.where('p.orderId', '=', wanted.orderId);
  if (wanted.after) {
    const { createdAt, id } = wanted.after;
    query = query.where(sql<boolean>`(p.created_at, p.id) < (${createdAt}::timestamptz, ${id}::uuid)`);
  }
  return (await query.execute()).map((row) => ({ ...row, ...paymentOf(row) }));
}

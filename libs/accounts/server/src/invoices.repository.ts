import { sql } from 'kysely';
import type { InvoiceBasis, InvoiceLine, InvoiceStanding } from '@seamwright/accounts/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import { grams, minorUnits, newId, ppm, type PlantDate } from '@seamwright/shared/util';

export interface NewInvoice {
  readonly id: string;
  readonly number: number;
  readonly customerId: string;
  readonly orderId: string;
  readonly deliveryDay: string;
  readonly issuedOn: string;
  readonly dueOn: string;
  readonly currency: string;
  readonly netMinor: number;
  readonly taxMinor: number;
  readonly totalMinor: number;
  readonly reference: string;
  readonly documentId: string;
}

/** Keeps two deliveries of the same event from making two invoices: the second waits here. */
export async function oneAtATime(tx: Tx, orderId: string): Promise<void> {
  await sql`select pg_advisory_xact_lock(hashtextextended(${`invoice of ${orderId}`}, 0))`.execute(tx);
}

/** The next number without a gap. Its row stays locked until the transaction ends, so it is taken last. */
export async function nextInvoiceNumber(tx: Tx): Promise<number> {
  const { next } = await tx
    .updateTable('counters')
    .set({ next: sql`next + 1` })
    .where('name', '=', 'invoice')
    .returning('next')
    .executeTakeFirstOrThrow();
  return next - 1;
}

export async function insertInvoice(
  tx: Tx,
  now: Date,
  invoice: NewInvoice,
  lines: readonly InvoiceLine[],
): Promise<void> {
  const { id: invoiceId, customerId } = invoice;
  await tx
    .insertInto('invoices')
    .values({ ...invoice, createdAt: now })
    .execute();
  await tx
    .insertInto('invoiceLines')
    .values(lines.map((line) => ({ id: newId(), invoiceId, customerId, ...line })))
    .execute();
}

export async function invoiceIdOfOrder(tx: Tx, orderId: string): Promise<string | null> {
  const row = await tx.selectFrom('invoices').select('id').where('orderId', '=', orderId).executeTakeFirst();
  return row?.id ?? null;
}

/** What is still to be paid of an invoice, by the ledger. */
const dueMinor = sql<number>`coalesce((
  select sum(j.debit_minor - j.credit_minor)::bigint from journal_lines j
  where j.customer_id = i.customer_id and j.invoice_id = i.id and j.account = 'receivables'), 0)`;

const rows = (tx: Tx) =>
  tx
    .selectFrom('invoices as i')
    .innerJoin('orders as o', 'o.id', 'i.orderId')
    .innerJoin('customers as c', 'c.id', 'i.customerId')
    .select([
      'i.id',
      'i.number',
      'i.customerId',
      'i.orderId',
      'i.deliveryDay',
      'i.issuedOn',
      'i.dueOn',
      'i.currency',
      'i.netMinor',
      'i.taxMinor',
      'i.totalMinor',
      'i.reference',
      'i.documentId',
      'c.name as customerName',
      'c.billingAddress',
      'o.number as orderNumber',
      dueMinor.as('dueMinor'),
    ]);

export type InvoiceRecord = Awaited<ReturnType<ReturnType<typeof rows>['executeTakeFirstOrThrow']>>;

export interface InvoicesQuestion {
  readonly limit: number;
  /** The number of the last invoice that was shown. */
  readonly before: number | null;
  readonly customerId?: string | undefined;
  readonly standing?: InvoiceStanding | undefined;
  readonly today: PlantDate;
}

function standsAs(standing: InvoiceStanding, today: PlantDate) {
  switch (standing) {
    case 'paid':
      return sql<boolean>`${dueMinor} <= 0`;
    case 'overdue':
      return sql<boolean>`${dueMinor} > 0 and i.due_on < ${today}::date`;
    case 'part-paid':
      return sql<boolean>`${dueMinor} > 0 and ${dueMinor} < i.total_minor and i.due_on >= ${today}::date`;
    case 'open':
      return sql<boolean>`${dueMinor} >= i.total_minor and i.total_minor > 0 and i.due_on >= ${today}::date`;
  }
}

/** Invoices newest first, one more than the limit when there are more. Who does not see the order does not see it. */
export function invoicesPage(tx: Tx, wanted: InvoicesQuestion): Promise<InvoiceRecord[]> {
  let query = rows(tx)
    .orderBy('i.number', 'desc')
    .limit(wanted.limit + 1);
  if (wanted.before !== null) query = query.where('i.number', '<', wanted.before);
  if (wanted.customerId) query = query.where('i.customerId', '=', wanted.customerId);
  if (wanted.standing) query = query.where(standsAs(wanted.standing, wanted.today));
  return query.execute();
}

/** Throws `not-found`, also for an invoice that the caller may not see. */
export const invoiceById = (tx: Tx, id: string): Promise<InvoiceRecord> =>
  rows(tx).where('i.id', '=', id).executeTakeFirstOrThrow(notFound);

/** The lines of an invoice in their order. */
export async function invoiceLines(tx: Tx, invoiceId: string): Promise<InvoiceLine[]> {
  const found = await tx
    .selectFrom('invoiceLines')
    .select(['position', 'orderLineId', 'description', 'packs', 'pieces', 'netGrams', 'basis', 'quantity'])
    .select(['priceMinor', 'taxPpm', 'netMinor'])
    .where('invoiceId', '=', invoiceId)
    .orderBy('position')
    .execute();
  return found.map((row) => ({
    ...row,
    netGrams: grams(row.netGrams),
    basis: row.basis as InvoiceBasis,
    priceMinor: minorUnits(row.priceMinor),
    taxPpm: ppm(row.taxPpm),
    netMinor: minorUnits(row.netMinor),
  }));
}

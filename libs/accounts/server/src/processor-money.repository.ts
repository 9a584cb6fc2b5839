import { sql } from 'kysely';
import type { Payout, PayoutState, ProcessorTransaction } from '@seamwright/accounts/domain';
import type { Tx } from '@seamwright/shared/server';

const transactionRows = (tx: Tx) => tx.selectFrom('processorTransactions').selectAll();
const payoutRows = (tx: Tx) => tx.selectFrom('processorPayouts').selectAll();
type PayoutRow = Awaited<ReturnType<ReturnType<typeof payoutRows>['executeTakeFirstOrThrow']>>;
const payoutOf = (row: PayoutRow): Payout => ({ ...row, state: row.state as PayoutState });

/** Keeps what the processor told; a transaction that is known already may learn its payout. */
export async function keepTransactions(tx: Tx, transactions: readonly ProcessorTransaction[]): Promise<number> {
  if (transactions.length === 0) return 0;
  const kept = await tx
    .insertInto('processorTransactions')
    .values([...transactions])
    .onConflict((conflict) =>
      conflict
        .column('id')
        .doUpdateSet((set) => ({ payoutId: set.ref('excluded.payoutId') }))
        .where('processorTransactions.payoutId', 'is', null)
        .where(sql<boolean>`excluded.payout_id is not null`),
    )
    .returning(sql<boolean>`xmax = 0`.as('isNew'))
    .execute();
  return kept.filter(({ isNew }) => isNew).length;
}

export async function keepPayouts(tx: Tx, payouts: readonly Payout[]): Promise<number> {
  if (payouts.length === 0) return 0;
  const kept = await tx
    .insertInto('processorPayouts')
    .values([...payouts])
    .onConflict((conflict) =>
      conflict
        .column('id')
        .doUpdateSet((set) => ({ state: set.ref('excluded.state'), arrivalOn: set.ref('excluded.arrivalOn') })),
    )
    .returning(sql<boolean>`xmax = 0`.as('isNew'))
    .execute();
  return kept.filter(({ isNew }) => isNew).length;
}

/** When the newest transaction and payout that we know of were made; null when there is none. */
export async function newestTold(tx: Tx): Promise<{ transaction: Date | null; payout: Date | null }> {
  const newest = await tx
    .selectNoFrom(({ selectFrom }) => [
      selectFrom('processorTransactions')
        .select(sql<Date | null>`max(created_at)`.as('at'))
        .as('transaction'),
      selectFrom('processorPayouts')
        .select(sql<Date | null>`max(created_at)`.as('at'))
        .as('payout'),
    ])
    .executeTakeFirstOrThrow();
  return newest;
}

/** Payouts that are still under way. */
export async function openPayouts(tx: Tx): Promise<Payout[]> {
  return (await payoutRows(tx).where('state', 'in', ['pending', 'in-transit']).orderBy('createdAt').execute()).map(
    payoutOf,
  );
}

/** Payouts whose known parts don't add up to them yet. */
export async function payoutsWithoutParts(tx: Tx): Promise<string[]> {
  const found = await tx
    .selectFrom('processorPayouts as p')
    .select('p.id')
    .where(
      sql<boolean>`p.amount_minor <> coalesce((
        select sum(t.net_minor) from processor_transactions t where t.payout_id = p.id), 0)`,
    )
    .orderBy('p.createdAt')
    .execute();
  return found.map(({ id }) => id);
}

export interface Span {
  readonly from: Date;
  readonly until: Date;
  readonly currency: string;
}

/** Transactions made from an instant until before another. */
export const transactionsWithin = (tx: Tx, { from, until, currency }: Span): Promise<ProcessorTransaction[]> =>
  transactionRows(tx)
    .where('createdAt', '>=', from)
    .where('createdAt', '<', until)
    .where('currency', '=', currency)
    .orderBy('createdAt')
    .orderBy('id')
    .execute();

export const partsOfPayouts = async (tx: Tx, payoutIds: readonly string[]): Promise<ProcessorTransaction[]> =>
  payoutIds.length === 0
    ? []
    : transactionRows(tx)
        .where('payoutId', 'in', [...payoutIds])
        .execute();

export async function payoutsWithin(tx: Tx, { from, until, currency }: Span): Promise<Payout[]> {
  const found = await payoutRows(tx)
    .where('createdAt', '>=', from)
    .where('createdAt', '<', until)
    .where('currency', '=', currency)
    .orderBy('createdAt')
    .execute();
  return found.map(payoutOf);
}

/** What the told transactions add up to before an instant: the balance at the processor then. */
export async function toldBalance(tx: Tx, currency: string, before: Date | null): Promise<number> {
  let query = tx
    .selectFrom('processorTransactions')
    .select(sql<number>`coalesce(sum(net_minor), 0)::bigint`.as('net'))
    .where('currency', '=', currency);
  if (before) query = query.where('createdAt', '<', before);
  return (await query.executeTakeFirstOrThrow()).net;
}

export async function keepBalances(
  tx: Tx,
  now: Date,
  balances: readonly { readonly currency: string; readonly amountMinor: number }[],
): Promise<void> {
  if (balances.length === 0) return;
  await tx
    .insertInto('processorBalances')
    .values(balances.map((balance) => ({ ...balance, readAt: now })))
    .onConflict((conflict) =>
      conflict
        .column('currency')
        .doUpdateSet((set) => ({ amountMinor: set.ref('excluded.amountMinor'), readAt: set.ref('excluded.readAt') })),
    )
    .execute();
}

export const keptBalance = (tx: Tx, currency: string): Promise<{ amountMinor: number; readAt: Date } | undefined> =>
  tx
    .selectFrom('processorBalances')
    .select(['amountMinor', 'readAt'])
    .where('currency', '=', currency)
    .executeTakeFirst();

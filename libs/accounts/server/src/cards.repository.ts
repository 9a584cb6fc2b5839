import { notFound, type Tx } from '@seamwright/shared/server';
import type { SavedCard } from './processor';

export type CardState = 'adding' | 'kept' | 'refused' | 'removing' | 'removed';

export interface CardRecord {
  readonly id: string;
  readonly customerId: string;
  readonly processorMethodId: string;
  readonly state: CardState;
  readonly brand: string | null;
  readonly last4: string | null;
  readonly expires: string | null;
  readonly declineCode: string | null;
}

const rows = (tx: Tx) =>
  tx
    .selectFrom('paymentCards')
    .select(['id', 'customerId', 'processorMethodId', 'state', 'brand', 'last4', 'expires', 'declineCode']);
type Row = Awaited<ReturnType<ReturnType<typeof rows>['executeTakeFirstOrThrow']>>;
const cardOf = (row: Row): CardRecord => ({ ...row, state: row.state as CardState });

export async function insertCard(
  tx: Tx,
  now: Date,
  card: { readonly id: string; readonly customerId: string; readonly methodId: string },
): Promise<void> {
  const { id, customerId, methodId } = card;
  await tx
    .insertInto('paymentCards')
    .values({ id, customerId, processorMethodId: methodId, state: 'adding', createdAt: now, updatedAt: now })
    .execute();
}

/** Throws `not-found`, also for a card that the caller may not see. */
export async function cardById(tx: Tx, id: string): Promise<CardRecord> {
  return cardOf(await rows(tx).where('id', '=', id).executeTakeFirstOrThrow(notFound));
}

/** A customer's kept cards, newest first. */
export async function keptCards(tx: Tx, customerId: string): Promise<CardRecord[]> {
  const found = await rows(tx)
    .where('customerId', '=', customerId)
    .where('state', '=', 'kept')
    .orderBy('createdAt', 'desc')
    .orderBy('id', 'desc')
    .execute();
  return found.map(cardOf);
}

/** Cards that wait for the processor's answer since before an instant. */
export async function unsettledCards(tx: Tx, before: Date, limit: number): Promise<CardRecord[]> {
  const found = await rows(tx)
    .where('state', 'in', ['adding', 'removing'])
    .where('updatedAt', '<=', before)
    .orderBy('updatedAt')
    .limit(limit)
    .execute();
  return found.map(cardOf);
}

/** Moves a card on from the state it was read in; false when it is in another by now. */
export async function moveCard(
  tx: Tx,
  now: Date,
  id: string,
  from: CardState,
  to: { readonly state: CardState; readonly saved?: SavedCard; readonly declineCode?: string },
): Promise<boolean> {
  const { saved } = to;
  const { numUpdatedRows } = await tx
    .updateTable('paymentCards')
    .set({
      state: to.state,
      updatedAt: now,
      ...(to.declineCode ? { declineCode: to.declineCode } : {}),
      ...(saved && {
        processorMethodId: saved.methodId,
        brand: saved.brand,
        last4: saved.last4,
        expires: saved.expires,
      }),
    })
    .where('id', '=', id)
    .where('state', '=', from)
    .executeTakeFirst();
  return numUpdatedRows === 1n;
}

/** The processor's id of a customer; null before the first card. */
export async function processorCustomerOf(tx: Tx, customerId: string): Promise<string | null> {
  const row = await tx
    .selectFrom('processorCustomers')
    .select('processorId')
    .where('customerId', '=', customerId)
    .executeTakeFirst();
  return row?.processorId ?? null;
}

/** Keeps the first id that is told. */
export async function keepProcessorCustomer(tx: Tx, customerId: string, processorId: string): Promise<void> {
  await tx
    .insertInto('processorCustomers')
    .values({ customerId, processorId })
    .onConflict((conflict) => conflict.doNothing())
    .execute();
}

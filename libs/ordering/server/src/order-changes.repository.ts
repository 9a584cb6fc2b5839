import { personOf, type Caller, type Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

export type OrderChange = 'placed' | 'confirmed' | 'released' | 'short' | 'packed' | 'cancelled';

interface NewChange {
  readonly orderId: string;
  readonly customerId: string;
  readonly what: OrderChange;
  readonly detail?: Readonly<Record<string, string | number>>;
}

/** Writes down who changed what and when; such a note is never changed itself. */
export async function noteChanges(
  tx: Tx,
  { now, caller }: { readonly now: Date; readonly caller: Caller | null },
  changes: readonly NewChange[],
): Promise<void> {
  if (changes.length === 0) return;
  const personId = caller ? personOf(caller) : null;
  await tx
    .insertInto('orderChanges')
    .values(
      changes.map(({ detail, ...change }) => ({
        id: newId(),
        ...change,
        at: now,
        personId,
        detail: JSON.stringify(detail ?? {}),
      })),
    )
    .execute();
}

export interface KeptChange {
  readonly at: Date;
  readonly what: OrderChange;
  readonly by: string | null;
  readonly detail: Readonly<Record<string, string | number>>;
}

/** What happened to an order, oldest first. */
export async function changesOf(tx: Tx, orderId: string): Promise<KeptChange[]> {
  const rows = await tx
    .selectFrom('orderChanges as c')
    .leftJoin('people as p', 'p.id', 'c.personId')
    .select(['c.at', 'c.what', 'c.detail', 'p.name as by'])
    .where('c.orderId', '=', orderId)
    .orderBy('c.at')
    .orderBy('c.id')
    .execute();
  return rows.map((row) => ({
    ...row,
    what: row.what as OrderChange,
    detail: row.detail as KeptChange['detail'],
  }));
}

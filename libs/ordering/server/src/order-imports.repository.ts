import type { ImportFault } from '@seamwright/ordering/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import type { ReadWorkbook } from './read-order-workbook';

/** An order as the screen shows it before and after it is placed. */
export interface ShownOrder {
  readonly customer: string;
  readonly site: string;
  readonly deliveryDay: string;
  readonly estimateMinor: number;
  readonly maxMinor: number;
  readonly lines: readonly {
    readonly row: number;
    readonly code: string;
    readonly name: string;
    readonly summary: string;
    readonly pieces: number;
    readonly estimateGrams: number;
    readonly estimateMinor: number;
  }[];
}

/** What is kept of a workbook: its rows as read, and what was shown of them last. */
export interface KeptRows extends ReadWorkbook {
  readonly shown: { readonly orders: readonly ShownOrder[]; readonly faults: readonly ImportFault[] };
}

export interface NewImport {
  readonly id: string;
  readonly fileName: string;
  readonly fileHash: string;
  readonly kept: KeptRows;
  readonly uploadedBy: string;
  readonly uploadedAt: Date;
}

export async function insertImport(tx: Tx, { kept, ...made }: NewImport): Promise<void> {
  await tx
    .insertInto('orderImports')
    .values({ ...made, readRows: JSON.stringify(kept) })
    .execute();
}

/** Throws `not-found`; with `lock`, nobody else can take it until the transaction ends. */
export async function importById(tx: Tx, id: string, lock = false) {
  const query = tx.selectFrom('orderImports').selectAll().where('id', '=', id);
  const row = await (lock ? query.forUpdate() : query).executeTakeFirst();
  if (!row) throw notFound();
  const { readRows, ...rest } = row;
  return { ...rest, kept: readRows as KeptRows };
}

/** When the very same file was taken before, if it was. */
export async function sameFileTakenAt(tx: Tx, fileHash: string, exceptId: string): Promise<Date | null> {
  const row = await tx
    .selectFrom('orderImports')
    .select('takenAt')
    .where('fileHash', '=', fileHash)
    .where('id', '<>', exceptId)
    .where('takenAt', 'is not', null)
    .orderBy('takenAt', 'desc')
    .limit(1)
    .executeTakeFirst();
  return row?.takenAt ?? null;
}

export async function markTaken(
  tx: Tx,
  id: string,
  taken: { readonly how: string; readonly at: Date; readonly orderIds: readonly string[]; readonly kept: KeptRows },
): Promise<void> {
  await tx
    .updateTable('orderImports')
    .set({
      taken: taken.how,
      takenAt: taken.at,
      orderIds: [...taken.orderIds],
      readRows: JSON.stringify(taken.kept),
      rowVersion: (eb) => eb('rowVersion', '+', 1),
    })
    .where('id', '=', id)
    .execute();
}

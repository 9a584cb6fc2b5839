import { notFound, type Tx } from '@seamwright/shared/server';
import { grams } from '@seamwright/shared/util';
import { packedLines, type Pack, type PackedLine } from '@seamwright/stock/domain';

const standingPacks = (tx: Tx) =>
  tx
    .selectFrom('packs')
    .leftJoin('lots', 'lots.id', 'packs.lotId')
    .where('packs.voidedAt', 'is', null)
    .selectAll('packs')
    .select('lots.code as lotCode')
    .orderBy('packs.serial');

type PackRow = Awaited<ReturnType<ReturnType<typeof standingPacks>['executeTakeFirstOrThrow']>>;

const packOf = (row: PackRow): Pack => ({
  id: row.id,
  serial: row.serial,
  customerId: row.customerId,
  orderId: row.orderId,
  orderLineId: row.orderLineId,
  versionId: row.versionId,
  lotId: row.lotId,
  lotCode: row.lotCode,
  pieces: row.pieces,
  netGrams: grams(row.netGrams),
  tareGrams: grams(row.tareGrams),
  outOfLimits: row.outOfLimits,
  reason: row.reason,
  packedAt: row.packedAt,
  packedBy: row.packedBy,
});

/** The standing packs of these orders, added up by order line; a line without a pack is not among them. */
export async function packsOfOrders(tx: Tx, orderIds: readonly string[]): Promise<Map<string, PackedLine>> {
  if (orderIds.length === 0) return new Map();
  const rows = await standingPacks(tx)
    .where('packs.orderId', 'in', [...orderIds])
    .execute();
  return packedLines(rows.map(packOf));
}

/** Throws `not-found`, also for a voided pack. */
export async function packById(tx: Tx, id: string): Promise<Pack> {
  const row = await standingPacks(tx).where('packs.id', '=', id).executeTakeFirst();
  if (!row) throw notFound();
  return packOf(row);
}

export interface NewPack {
  readonly customerId: string;
  readonly orderId: string;
  readonly orderLineId: string;
  readonly versionId: string;
  readonly lotId: string | null;
  readonly pieces: number;
  readonly netGrams: number;
  readonly tareGrams: number;
  /** Grams of primal behind it, by simple yield. */
  readonly inputGrams: number;
  readonly outOfLimits: boolean;
  readonly reason: string | null;
}

export async function insertPack(
  tx: Tx,
  pack: NewPack & { readonly id: string; readonly packedAt: Date; readonly packedBy: string },
): Promise<void> {
  await tx.insertInto('packs').values(pack).execute();
}

/** Marks a standing pack as voided; throws `not-found` when it is voided already. */
export async function markVoided(tx: Tx, id: string, now: Date): Promise<void> {
  const { numUpdatedRows } = await tx
    .updateTable('packs')
    .set({ voidedAt: now })
    .where('id', '=', id)
    .where('voidedAt', 'is', null)
    .executeTakeFirst();
  if (numUpdatedRows === 0n) throw notFound();
}

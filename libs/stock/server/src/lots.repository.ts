import { sql } from 'kysely';
import type { CutNode } from '@seamwright/catalogue/domain';
import { cutNodes } from '@seamwright/catalogue/server';
import { notFound, stale, type Tx } from '@seamwright/shared/server';
import { grams, type PlantDate } from '@seamwright/shared/util';
import type { Lot, LotOrigin, LotState } from '@seamwright/stock/domain';

/** Lots with the name of their primal and what packing, for whichever customer, has left of them. */
const lotsOnHand = (tx: Tx) =>
  tx
    .selectFrom('lots')
    .innerJoin('cutNodes', 'cutNodes.id', 'lots.nodeId')
    .selectAll('lots')
    .select('cutNodes.name as nodeName')
    .select(sql<number>`grams_used_of_lot(lots.id)`.as('usedGrams'));

type LotRow = Awaited<ReturnType<ReturnType<typeof lotsOnHand>['executeTakeFirstOrThrow']>>;

const lotOf = (row: LotRow): Lot => ({
  id: row.id,
  rowVersion: row.rowVersion,
  code: row.code,
  nodeId: row.nodeId,
  nodeName: row.nodeName,
  supplier: row.supplier,
  killDate: row.killDate as PlantDate,
  receivedOn: row.receivedOn as PlantDate,
  useBy: row.useBy as PlantDate | null,
  receivedGrams: grams(row.receivedGrams),
  receivedPieces: row.receivedPieces,
  // Yields are expected values: a lot that cuts better than expected never shows less than nothing.
  remainingGrams: grams(Math.max(0, row.receivedGrams - row.usedGrams)),
  state: row.state as LotState,
  holdReason: row.holdReason,
  origin: row.origin as LotOrigin,
});

export interface LotsWanted {
  readonly state?: LotState;
  readonly nodeId?: string;
  readonly after?: { readonly useBy: string; readonly code: string };
  readonly limit: number;
}

/** First expired first; one more than `limit`, to know whether another page follows. */
export async function listLots(tx: Tx, { state, nodeId, after, limit }: LotsWanted): Promise<Lot[]> {
  let query = lotsOnHand(tx);
  if (state) query = query.where('lots.state', '=', state);
  if (nodeId) query = query.where('lots.nodeId', '=', nodeId);
  if (after)
    query = query.where(
      sql<boolean>`(coalesce(lots.use_by, 'infinity'::date), lots.code) > (${after.useBy}::date, ${after.code})`,
    );
  const rows = await query
    .orderBy(sql`coalesce(lots.use_by, 'infinity'::date)`)
    .orderBy('lots.code')
    .limit(limit + 1)
    .execute();
  return rows.map(lotOf);
}

/** The values that `listLots` sorts by. */
export const lotCursor = (lot: Lot): [string, string] => [lot.useBy ?? 'infinity', lot.code];

/** Throws `not-found`. */
export async function lotById(tx: Tx, id: string): Promise<Lot> {
  const row = await lotsOnHand(tx).where('lots.id', '=', id).executeTakeFirst();
  if (!row) throw notFound();
  return lotOf(row);
}

/** Released lots of these nodes of the cut tree, in no particular order. */
export async function releasedLotsOf(tx: Tx, nodeIds: readonly string[]): Promise<Lot[]> {
  if (nodeIds.length === 0) return [];
  const rows = await lotsOnHand(tx)
    .where('lots.nodeId', 'in', [...nodeIds])
    .where('lots.state', '=', 'released')
    .execute();
  return rows.map(lotOf);
}

/** Every released lot. */
export async function releasedLots(tx: Tx): Promise<Lot[]> {
  return (await lotsOnHand(tx).where('lots.state', '=', 'released').execute()).map(lotOf);
}

export type NewLot = Omit<Lot, 'rowVersion' | 'nodeName' | 'remainingGrams' | 'state' | 'holdReason'>;

export async function insertLot(tx: Tx, lot: NewLot): Promise<void> {
  await tx
    .insertInto('lots')
    .values({ ...lot, state: 'received', origin: JSON.stringify(lot.origin) })
    .execute();
}

/** Moves a lot as it was read; throws `stale` when somebody else moved it meanwhile. */
export async function moveLot(
  tx: Tx,
  { id, rowVersion }: Pick<Lot, 'id' | 'rowVersion'>,
  moved: { readonly state: LotState; readonly holdReason: string | null },
): Promise<void> {
  const { numUpdatedRows } = await tx
    .updateTable('lots')
    .set({ ...moved, rowVersion: rowVersion + 1 })
    .where('id', '=', id)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (numUpdatedRows === 0n) throw stale();
}

/** Nodes of the cut tree that can be bought in, in the tree's order. */
export async function lotPrimals(tx: Tx): Promise<CutNode[]> {
  return [...(await cutNodes(tx)).values()].filter(({ level }) => level === 'primal' || level === 'sub-primal');
}

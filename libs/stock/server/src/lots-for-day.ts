import type { Tx } from '@seamwright/shared/server';
import { firstExpiredFirst, lotFit, type DayOfUse, type Lot } from '@seamwright/stock/domain';
import { releasedLotsOf } from './lots.repository';

/** Lots of these nodes that may be cut for the day, first expired first. */
export async function lotsOf(tx: Tx, nodeIds: readonly string[], onDay: DayOfUse): Promise<Lot[]> {
  const lots = await releasedLotsOf(tx, [...new Set(nodeIds)]);
  return lots.filter((lot) => lotFit(lot, onDay).ok).sort(firstExpiredFirst);
}

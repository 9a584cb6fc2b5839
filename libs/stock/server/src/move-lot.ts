import { emit, stale, type Tx } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';
import { lotStates, type Lot, type LotMove } from '@seamwright/stock/domain';
import { lotById, moveLot } from './lots.repository';

interface Moving {
  readonly now: Date;
  readonly id: string;
  /** The row version that the person saw. */
  readonly ifMatch: number;
  readonly move: Extract<LotMove, 'hold' | 'release'>;
  readonly reason: string | null;
}

/** Puts a lot on hold or releases it. Refuses a move that its state does not allow, and a stale edit. */
export async function moveLotOnce(tx: Tx, { now, id, ifMatch, move, reason }: Moving): Promise<Lot> {
  const lot = await lotById(tx, id);
  if (lot.rowVersion !== ifMatch) throw stale();
  const state = unwrap(lotStates.next(lot.state, move));
  await moveLot(tx, lot, { state, holdReason: move === 'hold' ? reason : null });
  await emit(tx, now, { type: 'lot-changed', subjectId: id, customerId: null });
  return lotById(tx, id);
}

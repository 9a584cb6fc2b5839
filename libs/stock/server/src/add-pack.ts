import { emit, personOf, type Caller, type Tx } from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import type { Pack } from '@seamwright/stock/domain';
import { insertPack, markVoided, packById, type NewPack } from './packs.repository';

interface ByPerson {
  readonly now: Date;
  readonly caller: Caller;
}

/** Keeps a weighed pack and gives its id. Whether it may be packed is for the storey above to judge. Emits `pack-added`. */
export async function addPack(tx: Tx, { now, caller }: ByPerson, pack: NewPack): Promise<string> {
  const packedBy = personOf(caller);
  if (packedBy === null) throw new RefusalError({ code: 'not-allowed', params: {} });
  const id = newId<'Pack'>();
  await insertPack(tx, { ...pack, id, packedAt: now, packedBy });
  await emit(tx, now, packEvent('pack-added', { ...pack, id }));
  return id;
}

/** Takes a pack back: it counts for nothing any more, and stays in the audit. Emits `pack-voided`. */
export async function voidPack(tx: Tx, { now }: ByPerson, id: string): Promise<Pack> {
  const pack = await packById(tx, id);
  await markVoided(tx, id, now);
  await emit(tx, now, packEvent('pack-voided', pack));
  return pack;
}

/** Told by order, since that is what the screens show. */
const packEvent = (type: string, { id, orderId, customerId }: Pick<Pack, 'id' | 'orderId' | 'customerId'>) => ({
  type,
  subjectId: orderId,
  customerId,
  payload: { packId: id },
});

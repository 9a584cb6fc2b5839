import { emit, violates, type Tx } from '@seamwright/shared/server';
import { newId, plantToday, RefusalError } from '@seamwright/shared/util';
import { insertLot, lotPrimals, type NewLot } from './lots.repository';

interface Receiving {
  readonly now: Date;
  readonly timeZone: string;
  readonly lot: Omit<NewLot, 'id'>;
}

const refused = (code: string, pointer: string) => new RefusalError({ code, params: {}, pointer });

/** Books a lot in and gives its id. It waits in `received` until somebody releases it. */
export async function receiveLot(tx: Tx, { now, timeZone, lot }: Receiving): Promise<string> {
  if (lot.killDate > lot.receivedOn) throw refused('lot-killed-after-arrival', '/killDate');
  if (lot.receivedOn > plantToday(now, timeZone)) throw refused('lot-arrives-later', '/receivedOn');
  if (lot.useBy !== null && lot.useBy < lot.receivedOn) throw refused('lot-expired-on-arrival', '/useBy');
  const primals = await lotPrimals(tx);
  if (!primals.some(({ id }) => id === lot.nodeId)) throw refused('lot-primal-unknown', '/nodeId');
  const id = newId<'Lot'>();
  try {
    await insertLot(tx, { ...lot, id });
  } catch (error) {
    if (violates(error, 'lots_code')) throw refused('lot-code-taken', '/code');
    throw error;
  }
  await emit(tx, now, { type: 'lot-changed', subjectId: id, customerId: null });
  return id;
}

import type { ClosureWire } from '@seamwright/ordering/contracts';
import { conflict, notFound, type Tx } from '@seamwright/shared/server';
import { plantToday, RefusalError, type PlantDate } from '@seamwright/shared/util';
import { lockDayToClose } from './lock-days';
import { countOrdersOfDay } from './orders.repository';
import type { DayPort } from './ports';

interface Opening {
  readonly now: Date;
  readonly timeZone: string;
  readonly days: DayPort;
  readonly day: string;
}

interface Closing extends Opening {
  readonly reason: string;
}

/**
 * Closes the plant for a day; orders for it that are being placed are waited for. Refuses `day-past`,
 * `closure-has-orders` (count): those are to be moved first, and what the plant refuses, since it cuts on that day.
 */
export async function closePlant(tx: Tx, { now, timeZone, days, day, reason }: Closing): Promise<ClosureWire> {
  const today = plantToday(now, timeZone);
  if (day < today) throw new RefusalError({ code: 'day-past', params: { day }, pointer: '/day' });
  await lockDayToClose(tx, day as PlantDate);
  const count = await countOrdersOfDay(tx, day as PlantDate);
  if (count > 0) throw conflict('closure-has-orders', { day, count });
  await tx
    .insertInto('plantClosures')
    .values({ day, reason })
    .onConflict((conflicting) => conflicting.column('day').doUpdateSet({ reason }))
    .execute();
  await days.calendarChanged(tx, day as PlantDate, today);
  return { day, reason };
}

/** Opens the plant again. Throws `not-found` when it was not closed. */
export async function openPlant(tx: Tx, { now, timeZone, days, day }: Opening): Promise<undefined> {
  const { numDeletedRows } = await tx.deleteFrom('plantClosures').where('day', '=', day).executeTakeFirst();
  if (numDeletedRows === 0n) throw notFound();
  await days.calendarChanged(tx, day as PlantDate, plantToday(now, timeZone));
  return undefined;
}

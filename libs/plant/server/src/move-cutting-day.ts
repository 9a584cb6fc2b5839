import { conflict, emit, personOf, stale, type Caller, type Tx } from '@seamwright/shared/server';
import { unwrap, type PlantDate } from '@seamwright/shared/util';
import { countUnpackedOfDay, releaseOrdersOfDay } from '@seamwright/ordering/server';
import { cuttingDayStates, type CuttingDay } from '@seamwright/plant/domain';
import { lockDay, saveDay } from './cutting-days.repository';

interface Moving {
  readonly now: Date;
  readonly caller: Caller;
  readonly deliveryDay: PlantDate;
  /** The row version that the planner saw. */
  readonly ifMatch: number;
}

async function lockedDay(tx: Tx, { deliveryDay, ifMatch }: Moving): Promise<CuttingDay> {
  const day = await lockDay(tx, deliveryDay);
  if (day.rowVersion !== ifMatch) throw stale();
  return day;
}

const tell = (tx: Tx, now: Date, day: CuttingDay): Promise<void> =>
  emit(tx, now, {
    type: 'cutting-day-changed',
    subjectId: day.id,
    customerId: null,
    payload: { deliveryDay: day.deliveryDay },
  });

/** Closes a day to orders and releases its confirmed orders. Waits for orders that are being placed; later ones are refused. */
export async function closeDay(tx: Tx, moving: Moving): Promise<void> {
  const { now, caller } = moving;
  const day = await lockedDay(tx, moving);
  const state = unwrap(cuttingDayStates.next(day.state, 'close'));
  await saveDay(tx, day, { state, closedAt: now, closedBy: personOf(caller) });
  await releaseOrdersOfDay(tx, { now, day: day.deliveryDay, caller });
  await tell(tx, now, day);
}

/**
 * Sends a closed day to the floor. The list by simple yield is the plan, so the day passes through `planned` on its
 * way. Orders that were confirmed after closing come along.
 */
export async function releaseDay(tx: Tx, moving: Moving): Promise<void> {
  const { now, caller } = moving;
  const day = await lockedDay(tx, moving);
  const planned = day.state === 'planned' ? day.state : unwrap(cuttingDayStates.next(day.state, 'plan'));
  const state = unwrap(cuttingDayStates.next(planned, 'release'));
  await releaseOrdersOfDay(tx, { now, day: day.deliveryDay, caller });
  await saveDay(tx, day, { state, releasedAt: now });
  await tell(tx, now, day);
}

/** Finishes a day. Refuses with `day-not-packed` (orders) while a released order is not packed. */
export async function finishDay(tx: Tx, moving: Moving): Promise<void> {
  const { now, deliveryDay } = moving;
  const day = await lockedDay(tx, moving);
  const state = unwrap(cuttingDayStates.next(day.state, 'finish'));
  const orders = await countUnpackedOfDay(tx, deliveryDay);
  if (orders > 0) throw conflict('day-not-packed', { orders });
  await saveDay(tx, day, { state, finishedAt: now });
  await tell(tx, now, day);
}

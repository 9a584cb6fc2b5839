import { isWorkingDay, type Closures } from '@seamwright/ordering/domain';
import { addDays, daysBetween, ok, refuse, type PlantDate, type Result } from '@seamwright/shared/util';
import { isBeingCut, type CuttingDayState } from './cutting-day.states';

/** The cutting for one delivery day. */
export interface CuttingDay {
  readonly id: string;
  readonly rowVersion: number;
  readonly deliveryDay: PlantDate;
  readonly cuttingDay: PlantDate;
  readonly state: CuttingDayState;
  readonly closedAt: Date | null;
  readonly releasedAt: Date | null;
  readonly finishedAt: Date | null;
}

const FARTHEST_BACK = 60;

/**
 * The day on which a delivery day's orders are cut: the working day before it. Throws RangeError when the plant is
 * closed for more than 60 days on end.
 */
export function cuttingDayOf(deliveryDay: PlantDate, closures: Closures): PlantDate {
  let day = addDays(deliveryDay, -1);
  while (!isWorkingDay(day, closures)) {
    day = addDays(day, -1);
    if (daysBetween(day, deliveryDay) > FARTHEST_BACK)
      throw new RangeError(`There is no working day within ${FARTHEST_BACK} days before ${deliveryDay}`);
  }
  return day;
}

/**
 * The day on which a delivery day's orders are cut after the plant's calendar has changed: an open day moves with it.
 * Refuses `day-being-cut` (delivery) when the list is fixed and the plant would now be closed on the day of cutting, and
 * `no-day-to-cut` (delivery) when no working day is left before the delivery.
 */
export function cuttingDayAfterChange(
  { deliveryDay, cuttingDay, state }: Pick<CuttingDay, 'deliveryDay' | 'cuttingDay' | 'state'>,
  closures: Closures,
  today: PlantDate,
): Result<PlantDate> {
  if (isBeingCut(state) && closures.has(cuttingDay)) return refuse('day-being-cut', { delivery: deliveryDay });
  if (state !== 'open') return ok(cuttingDay);
  const moved = cuttingDayOf(deliveryDay, closures);
  return moved < today && moved !== cuttingDay ? refuse('no-day-to-cut', { delivery: deliveryDay }) : ok(moved);
}

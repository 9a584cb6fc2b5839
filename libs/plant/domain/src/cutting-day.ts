import { isWorkingDay, type Closures } from '@seamwright/ordering/domain';
import { addDays, daysBetween, type PlantDate } from '@seamwright/shared/util';
import type { CuttingDayState } from './cutting-day.states';

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

import { closuresFor } from '@seamwright/ordering/server';
import { cuttingDayAfterChange } from '@seamwright/plant/domain';
import { conflict, type Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';
import { daysAround, moveCuttingDay } from './cutting-days.repository';

/**
 * Fits the days that are still open into a calendar that has just changed for `day`. Refuses `day-being-cut` and
 * `no-day-to-cut` (day, delivery); a day that nobody has ordered for stands in nobody's way.
 */
export async function fitCalendar(tx: Tx, day: PlantDate, today: PlantDate): Promise<void> {
  const closures = await closuresFor(tx, day);
  for (const each of await daysAround(tx, day)) {
    const cuttingDay = cuttingDayAfterChange(each, closures, today);
    if (cuttingDay.ok) {
      if (cuttingDay.value !== each.cuttingDay) await moveCuttingDay(tx, each, cuttingDay.value);
    } else if (each.orders > 0) {
      const { code, params } = cuttingDay.refusal;
      throw conflict(code, { ...params, day });
    }
  }
}

import { addDays, instantAt, weekdayOf, type PlantDate } from '@seamwright/shared/util';
import { PLANT } from '../scenario/plant';

export const HISTORY_WEEKS = 4;
const SUNDAY = 7;

/** The Monday on which the history begins, whole weeks before the anchor's own week. */
export function startOfHistory(anchor: PlantDate): PlantDate {
  return addDays(anchor, -7 * HISTORY_WEEKS - (weekdayOf(anchor) - 1));
}

/** The days from the start up to the anchor, both included. */
export function daysOfHistory(anchor: PlantDate): PlantDate[] {
  const days: PlantDate[] = [];
  for (let day = startOfHistory(anchor); day <= anchor; day = addDays(day, 1)) days.push(day);
  return days;
}

/** The next day after this one that is not a Sunday: what is cut today goes out then. */
export function nextDelivery(day: PlantDate): PlantDate {
  const next = addDays(day, 1);
  return weekdayOf(next) === SUNDAY ? addDays(next, 1) : next;
}

export const isWorkingDay = (day: PlantDate): boolean => weekdayOf(day) < 6;

export const at = (day: PlantDate, time: string): Date => instantAt(day, time, PLANT.timeZone);

import { addDays, weekdayOf, type PlantDate } from '@seamwright/shared/util';

const isBankDay = (day: PlantDate): boolean => weekdayOf(day) <= 5;

/** Working days (Monday to Friday) from one day to another, whichever comes first; 0 for the same day. */
export function workingDaysBetween(a: PlantDate, b: PlantDate): number {
  const [from, to] = a <= b ? [a, b] : [b, a];
  let days = 0;
  for (let day = from; day < to;) {
    day = addDays(day, 1);
    if (isBankDay(day)) days += 1;
  }
  return days;
}

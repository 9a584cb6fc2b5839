import { addDays, endOfMonth, isPlantDate } from '@seamwright/shared/util';

/** The days that a new quote begins with: from today to the end of next month, to be answered within a week. */
export function proposedDates(now: Date): { pricesFrom: string; pricesUntil: string; answerBy: string } {
  // Written from the wall clock of the person, who may change it: sv-SE writes YYYY-MM-DD.
  const today = new Intl.DateTimeFormat('sv-SE').format(now);
  if (!isPlantDate(today)) return { pricesFrom: '', pricesUntil: '', answerBy: '' };
  const pricesUntil = endOfMonth(addDays(endOfMonth(today), 1));
  return { pricesFrom: today, pricesUntil, answerBy: addDays(today, 7) };
}

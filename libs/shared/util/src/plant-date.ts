import { ok, refuse, type Result } from './result';
import { wholeNumber } from './whole-number';

/** A calendar day at the plant, YYYY-MM-DD, from 1900 to 9999. It has no time and no zone; sorts as text. */
export type PlantDate = string & { readonly __type: 'PlantDate' };

const DAY_MS = 86_400_000;
const FIRST = '1900-01-01';

/** Whether the text is a day of the calendar from 1900 on, written YYYY-MM-DD. */
export function isPlantDate(text: string): text is PlantDate {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text) || text < FIRST) {
    return false;
  }
  const midnight = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(midnight.getTime()) && midnight.toISOString().startsWith(text);
}

/** Reads YYYY-MM-DD. Refuses with `date-unreadable` what is not a day of the calendar from 1900 on. */
export function plantDate(text: string): Result<PlantDate> {
  return isPlantDate(text) ? ok(text) : refuse('date-unreadable', { text });
}

/** The day so many days later (earlier when negative). Throws RangeError outside 1900 to 9999. */
export function addDays(date: PlantDate, days: number): PlantDate {
  return fromDayNumber(dayNumber(date) + wholeNumber(days, 'A number of days'));
}

/** Days from the first date to the second; negative when the second is earlier. */
export function daysBetween(from: PlantDate, to: PlantDate): number {
  return dayNumber(to) - dayNumber(from);
}

/** Day of the week after ISO 8601: 1 Monday to 7 Sunday. */
export function weekdayOf(date: PlantDate): number {
  // Day 0, 1 January 1970, was a Thursday; days before it are negative.
  return ((((dayNumber(date) + 3) % 7) + 7) % 7) + 1;
}

/** Week after ISO 8601: weeks begin on Monday and belong to the year that their Thursday is in. */
export function isoWeekOf(date: PlantDate): { readonly year: number; readonly week: number } {
  const thursday = addDays(date, 4 - weekdayOf(date));
  const year = Number(thursday.slice(0, 4));
  const dayOfYear = daysBetween(`${thursday.slice(0, 4)}-01-01` as PlantDate, thursday);
  return { year, week: Math.floor(dayOfYear / 7) + 1 };
}

/** The Sunday that ends the date's week. */
export function endOfWeek(date: PlantDate): PlantDate {
  return addDays(date, 7 - weekdayOf(date));
}

/** The last day of the date's month. */
export function endOfMonth(date: PlantDate): PlantDate {
  const [year = 0, month = 0] = date.split('-').map(Number);
  return fromDayNumber(Date.UTC(year, month, 0) / DAY_MS);
}

function dayNumber(date: PlantDate): number {
  return Date.parse(`${date}T00:00:00Z`) / DAY_MS;
}

function fromDayNumber(day: number): PlantDate {
  const midnight = new Date(day * DAY_MS);
  const text = Number.isNaN(midnight.getTime()) ? '' : midnight.toISOString().slice(0, 10);
  if (!isPlantDate(text)) {
    throw new RangeError('A date must lie between 1900 and 9999');
  }
  return text;
}
